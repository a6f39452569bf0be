import { ImportPlan } from '@shared/contracts/imports';
import { SweepTags } from '@shared/contracts/sweeps';
import { aFile, aReading } from '../../../test/builders/draft-builder';
import { plannedTraces, uploadOf } from './plan-import';

const common = { product: 'psu-240', hardware: 'C1', firmware: '2.4.1', bench: 'bench-1', state: '230 V full load' };
const named = aReading([
  { line: 'L', detector: 'QP' },
  { line: 'N', detector: 'QP' },
]);

function twoFiles() {
  return [
    aFile({ id: 1, file: new File(['x'], 'left-out.csv'), reading: aReading(), traces: [{ isLeftOut: true }] }),
    aFile({
      id: 2,
      file: new File(['y'], 'both-lines.csv'),
      reading: named,
      traces: [{ isLeftOut: false }, { isLeftOut: false, kind: 'background' }],
    }),
    aFile({ id: 3, file: new File(['z'], 'broken.csv'), reading: null, traces: [] }),
  ];
}

describe('plannedTraces', () => {
  it('plans every trace that was read and not left out', () => {
    const planned = plannedTraces(twoFiles(), common);
    expect(planned.map(({ fileName, index }) => `${fileName} ${index}`)).toEqual([
      'both-lines.csv 0',
      'both-lines.csv 1',
    ]);
    expect(planned.flatMap(({ gaps }) => gaps)).toEqual([]);
  });

  it('knows what each trace lacks', () => {
    const [planned] = plannedTraces([aFile()], common);
    expect(planned.gaps.map(({ tag }) => tag)).toEqual(['line', 'detector']);
  });
});

describe('uploadOf', () => {
  it('sends only files with a trace to import and names them by their place among those', () => {
    const files = twoFiles();
    const { files: sent, plan } = uploadOf(files, plannedTraces(files, common), common);
    expect(sent.map(({ name }) => name)).toEqual(['both-lines.csv']);
    expect(plan.items).toEqual([
      { file: 0, tags: { trace: 1, line: 'L', detector: 'QP', kind: 'product', state: '230 V full load' } },
      { file: 0, tags: { trace: 2, line: 'N', detector: 'QP', kind: 'background', state: '230 V full load' } },
    ]);
  });

  it('makes a plan that the server takes, with complete tags for every item', () => {
    const files = twoFiles();
    const { plan } = uploadOf(files, plannedTraces(files, common), common);
    const { tags, items } = ImportPlan.parse(JSON.parse(JSON.stringify(plan)));
    for (const item of items) expect(SweepTags.safeParse({ ...tags, ...item.tags }).success).toBe(true);
  });
});
