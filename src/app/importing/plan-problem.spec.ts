import type { Problem } from '@shared/contracts/problem';
import { aFile } from '../../../test/builders/draft-builder';
import { plannedTraces } from './plan-import';
import { explainPlanProblem } from './plan-problem';

const refused: Problem = {
  type: '/problems/invalid',
  title: 'The request is not right',
  status: 400,
  detail: 'items.0.tags.rbwHz: too small',
  errors: [
    { path: 'items.0.tags.rbwHz', message: 'too small' },
    { path: 'tags', message: 'something else' },
  ],
};

describe('explainPlanProblem', () => {
  const planned = plannedTraces([aFile()], {});

  it('names file, trace and tag where the server counts items', () => {
    const { detail, errors } = explainPlanProblem(refused, planned);
    expect(detail).toBe('The server did not take these tags.');
    expect(errors).toEqual([
      { path: 'a.csv, trace 1, resolution bandwidth', message: 'too small' },
      { path: 'tags', message: 'something else' },
    ]);
  });

  it('leaves a problem without places as it is', () => {
    const problem = { ...refused, errors: undefined };
    expect(explainPlanProblem(problem, planned)).toBe(problem);
  });
});
