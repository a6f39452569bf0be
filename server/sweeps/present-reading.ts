import type { PreviewTrace, ReadingView } from '@shared/contracts/imports';
import { momentOf } from '@shared/time/zoned-time';
import type { Frames } from '@shared/traces/frames';
import { describeGrid } from '@shared/traces/frequency-grid';
import type { DelimitedReading } from '@shared/traces/read-delimited';
import { type RecordedTime, recordedTime } from '@shared/traces/recorded-time';
import { remarksOnSettings } from '@shared/traces/sweep-remarks';

interface ReadFile {
  fileName: string;
  sha256: string;
  /** Of the team, in which its instruments' clocks are taken to run. */
  timeZone: string;
}

/** What a file holds, for the page that imports it. */
export function presentReading(reading: DelimitedReading, { fileName, sha256, timeZone }: ReadFile): ReadingView {
  const { frequencyUnit, delimiter, decimalMark, settings, preamble } = reading;
  const recorded = recordedTime(preamble);
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
    preamble: [...preamble],
    takenAt: recorded && momentOfRecording(recorded, timeZone),
    traces: presentTraces(reading),
    inferred: [...reading.inferred, ...zoneInference(recorded, timeZone)],
    remarks: remarksOnSettings({ rbwHz, grid }),
  };
}

function momentOfRecording({ wallTime, offset }: RecordedTime, timeZone: string): string | null {
  return offset === null ? (momentOf(wallTime, timeZone) ?? null) : new Date(wallTime + offset).toISOString();
}

function zoneInference(recorded: RecordedTime | null, timeZone: string): ReadingView['inferred'] {
  if (recorded === null || recorded.offset !== null) return [];
  const value = recorded.wallTime.replace('T', ' ');
  return [{ what: 'taken at', value, why: `line ${recorded.line} says so without a zone; read in ${timeZone}` }];
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
