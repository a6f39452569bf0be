import type { ReadingView } from '../../shared/contracts/imports';
import type { DraftFile, ReadTrace } from '../../src/app/importing/draft-file';

/** What the server recognised in a file: one trace of which nothing is stated, unless the case says otherwise. */
export function aReading(traces: readonly Partial<ReadTrace>[] = [{}], change: Partial<ReadingView> = {}): ReadingView {
  return {
    fileName: 'a.csv',
    sha256: 'a'.repeat(64),
    pointCount: 6634,
    startHz: 150_000,
    stopHz: 29_998_500,
    medianStepHz: 4500,
    frequencyUnit: 'Hz',
    delimiter: ',',
    decimalMark: '.',
    rbwHz: null,
    attenuationDb: null,
    preamble: [],
    takenAt: null,
    inferred: [],
    remarks: [],
    ...change,
    traces: traces.map((trace, index) => ({
      trace: index + 1,
      name: `Trace ${index + 1}`,
      levelUnit: 'dBuV',
      detector: null,
      line: null,
      highestDbuv: 50,
      ...trace,
    })),
  };
}

/** A file that was read, with nothing chosen for it yet. */
export function aFile(change: Partial<DraftFile> = {}): DraftFile {
  const reading = change.reading === undefined ? aReading() : change.reading;
  return {
    id: 1,
    file: new File(['150000,50\n'], 'a.csv'),
    units: {},
    problem: null,
    choice: {},
    traces: (reading?.traces ?? []).map(() => ({ isLeftOut: false })),
    ...change,
    reading,
  };
}
