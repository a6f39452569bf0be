import { aFile, aReading } from '../../../test/builders/draft-builder';
import { alikeTraces } from './alike-traces';
import { plannedTraces } from './plan-import';

const three = aReading([
  { line: 'L', detector: 'QP' },
  { line: 'N', detector: 'QP' },
  { line: 'L', detector: 'QP' },
]);

describe('alikeTraces', () => {
  it('points at traces of a file that would be saved as the same thing', () => {
    expect(alikeTraces(plannedTraces([aFile({ reading: three })], {}))).toEqual([
      'Traces 1 and 3 are both L QP. Leave out what is not another run of the same.',
    ]);
  });

  it('has nothing to say once one is left out, or is a background', () => {
    const kept = { isLeftOut: false } as const;
    const leftOut = [kept, kept, { isLeftOut: true }];
    const background = [kept, kept, { isLeftOut: false, kind: 'background' }] as const;
    for (const traces of [leftOut, background]) {
      expect(alikeTraces(plannedTraces([aFile({ reading: three, traces })], {}))).toEqual([]);
    }
  });
});
