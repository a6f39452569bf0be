import type { SweepTags } from '@shared/contracts/sweeps';
import type { DelimitedReading, ReadTrace } from '@shared/traces/read-delimited';
import { type DelimitedOptions, readDelimited } from '@shared/traces/read-delimited';
import { ReadingError } from '@shared/traces/reading-error';
import type { ProblemCode } from '@shared/contracts/problem';
import { ServiceError } from '../service-error';
import { contradictionOf } from './tag-contradiction';

/** Ten times the finest usual scan; more would hold up everybody else for a second, and no receiver resolves it. */
const MOST_POINTS = 300_000;

export interface SweepReading {
  reading: DelimitedReading;
  trace: ReadTrace;
}

/**
 * Reads an instrument's file.
 *
 * @throws ServiceError `unreadable` with line and column; `contradiction` when only the units given with it are at fault;
 *   `tooLarge` for more points than any scan has
 */
export function readFile(bytes: Uint8Array, units: DelimitedOptions): DelimitedReading {
  const reading = readOrExplain(bytes, units);
  const points = reading.frequenciesHz.length;
  if (points > MOST_POINTS) {
    throw new ServiceError('tooLarge', `the file holds ${points} points; at most ${MOST_POINTS} are read`, {
      advice: 'Export the scan on a coarser grid; half the bandwidth is the step the standard asks for.',
    });
  }
  return reading;
}

function readOrExplain(bytes: Uint8Array, units: DelimitedOptions): DelimitedReading {
  try {
    return readDelimited(bytes, units);
  } catch (error) {
    if (!(error instanceof ReadingError)) throw error;
    throw problemOfFile(isReadable(bytes) ? 'contradiction' : 'unreadable', error);
  }
}

/**
 * Reads an instrument's file and takes the trace that the tags mean.
 *
 * @throws ServiceError as readFile; `contradiction` also for a trace the file does not have and for tags it does not bear out
 */
export function readSweepFile(bytes: Uint8Array, tags: SweepTags): SweepReading {
  const { frequencyUnit, levelUnit } = tags;
  const reading = readFile(bytes, { frequencyUnit, levelUnit });
  const trace = reading.traces[tags.trace - 1];
  if (trace === undefined) {
    const names = reading.traces.map(({ name }, index) => `${index + 1} ${name}`).join(', ');
    throw new ServiceError('contradiction', `trace: the file has no trace ${tags.trace}; it holds ${names}`);
  }
  const contradiction = contradictionOf(tags, trace, reading);
  if (contradiction !== null) throw new ServiceError('contradiction', contradiction.message, contradiction);
  return { reading, trace };
}

/** Whether the file reads well when nothing is said about it. */
function isReadable(bytes: Uint8Array): boolean {
  try {
    readDelimited(bytes);
    return true;
  } catch (error) {
    if (error instanceof ReadingError) return false;
    throw error;
  }
}

function problemOfFile(code: ProblemCode, error: ReadingError): ServiceError {
  const { line, column, found, expected, advice, needs, message } = error;
  return new ServiceError(code, message, {
    ...(line !== null && { line }),
    ...(column !== null && { column }),
    found,
    expected,
    ...(advice !== '' && { advice }),
    ...(needs && { needs }),
  });
}
