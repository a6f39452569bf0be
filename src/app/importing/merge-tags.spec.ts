import type { BatchTags } from '@shared/contracts/imports';
import type { DraftFile, ReadTrace } from './draft-file';
import { traceTags } from './merge-tags';
import { aFile, aReading } from '../../../test/builders/draft-builder';

const common: BatchTags = { state: '230 V full load', line: 'L', detector: 'QP', kind: 'product', run: 'run-a' };
const tagsOf = (file: Partial<DraftFile>, trace: Partial<ReadTrace> = {}) =>
  traceTags(aFile({ reading: aReading([trace]), ...file }), 0, common);

describe('traceTags', () => {
  it('takes from the common tags what neither file nor trace says', () => {
    expect(tagsOf({})).toEqual({
      trace: 1,
      state: '230 V full load',
      line: 'L',
      detector: 'QP',
      kind: 'product',
    });
  });

  it('believes the file more than the common tags, and the person more than the file', () => {
    expect(tagsOf({}, { line: 'N', detector: 'AV' })).toMatchObject({ line: 'N', detector: 'AV' });
    const chosen = { traces: [{ isLeftOut: false, line: 'L1', detector: 'PK' }] } as const;
    expect(tagsOf(chosen, { line: 'L', detector: 'AV' })).toMatchObject({ line: 'L1', detector: 'PK' });
  });

  it('lays what is different about a file over the common tags, and a role of a trace over both', () => {
    const file = { choice: { state: '115 V', kind: 'background', run: 'run-b' } } as const;
    expect(tagsOf(file)).toMatchObject({ state: '115 V', kind: 'background', run: 'run-b' });
    expect(tagsOf({ ...file, traces: [{ isLeftOut: false, kind: 'product' }] })).toMatchObject({ kind: 'product' });
  });

  it('names the units that were chosen for the file', () => {
    expect(tagsOf({ units: { levelUnit: 'dBm' } })).toMatchObject({ levelUnit: 'dBm' });
  });

  it('never holds an undefined that would hide a common tag', () => {
    const tags = tagsOf({ choice: { state: undefined, run: undefined } });
    expect(Object.values(tags)).not.toContain(undefined);
    expect(tags).not.toHaveProperty('run');
  });

  it('says which trace a file does not have', () => {
    expect(() => traceTags(aFile(), 3, common)).toThrow('a.csv has no trace 4');
  });
});
