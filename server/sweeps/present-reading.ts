import type { PreviewTrace, ReadingView } from '@shared/contracts/imports';
import type { Frames } from '@shared/traces/frames';
import { describeGrid } from '@shared/traces/frequency-grid';
import type { DelimitedReading } from '@shared/traces/read-delimited';
import { remarksOnSettings } from '@shared/traces/sweep-remarks';

/** What a file holds, for the page that imports it. */
export function presentReading(reading: DelimitedReading, fileName: string, sha256: string): ReadingView {
  const { frequencyUnit, delimiter, decimalMark, settings, inferred } = reading;
  const grid = describeGrid(reading.frequenciesHz);
  const rbwHz = settings.rbwHz ?? null;
  return {
    fileName,
    sha256,
    ...grid,
    frequencyUnit,
    delimiter,
    decimalMark,
    rbwHz,
    attenuationDb: settings.attenuationDb ?? null,
    traces: presentTraces(reading),
    inferred: [...inferred],
    remarks: remarksOnSettings({ rbwHz, grid }),
  };
}

/** Every trace of a file in full. */
export function frameReading(reading: DelimitedReading): Frames<PreviewTrace> {
  return {
    grids: [reading.frequenciesHz],
    traces: presentTraces(reading).map((meta, index) => ({
      grid: 0,
      meta,
      levelsDbuv: reading.traces[index]?.levelsDbuv ?? new Float32Array(),
    })),
  };
}

function presentTraces({ traces }: DelimitedReading): PreviewTrace[] {
  return traces.map(({ name, levelUnit, detector, line, levelsDbuv }, index) => ({
    trace: index + 1,
    name,
    levelUnit,
    detector: detector ?? null,
    line: line ?? null,
    highestDbuv: levelsDbuv.reduce((highest, level) => Math.max(highest, level), -Infinity),
  }));
}
