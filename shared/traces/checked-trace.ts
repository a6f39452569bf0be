import type { FrequencyFault } from './frequency-grid';
import { findFrequencyFault } from './frequency-grid';
import { ReadingError } from './reading-error';

const FEWEST_POINTS = 10;
/** No emission sweep stops below, or starts above: such numbers come from a wrong unit. */
const LOWEST_STOP_HZ = 1_000;
const HIGHEST_START_HZ = 10_000_000_000;
/** Beyond any receiver, and what a margin in centi-dB can hold. */
const HIGHEST_LEVEL_DB = 300;

const FREQUENCY_RULES: Readonly<Record<FrequencyFault['rule'], readonly [expected: string, advice: string]>> = {
  notPositive: ['a frequency above 0', 'Check which column holds the frequency.'],
  falling: ['a frequency above the one before', 'Sort the rows by frequency; one file holds one sweep.'],
  repeated: ['a frequency above the one before', 'Leave repeated points out of the file.'],
};

/** Checks frequencies as a sweep's. `dataLine` is the line of the first point, `column` the table's, from 1. */
export function checkFrequencies(frequenciesHz: Float64Array, dataLine: number, column: number): void {
  const count = frequenciesHz.length;
  if (count < FEWEST_POINTS) {
    throw new ReadingError({
      line: dataLine,
      column: null,
      found: `${count} points`,
      expected: `at least ${FEWEST_POINTS} points`,
      advice: 'A sweep covers a band; a list of a few readings is not one.',
    });
  }
  const fault = findFrequencyFault(frequenciesHz);
  if (fault !== null) {
    const [expected, advice] = FREQUENCY_RULES[fault.rule];
    const before = fault.index === 0 ? '' : ` after ${frequenciesHz[fault.index - 1]} Hz`;
    throw new ReadingError({
      line: dataLine + fault.index,
      column,
      found: `${frequenciesHz[fault.index]} Hz${before}`,
      expected,
      advice,
    });
  }
  if (frequenciesHz[count - 1] < LOWEST_STOP_HZ || frequenciesHz[0] > HIGHEST_START_HZ) {
    throw new ReadingError({
      line: dataLine,
      column,
      found: `a sweep from ${frequenciesHz[0]} Hz to ${frequenciesHz[count - 1]} Hz`,
      expected: 'a sweep of emissions between 1 kHz and 10 GHz',
      advice: 'Check the unit of frequency.',
    });
  }
}

/** Checks levels as a sweep's: believable, and not all the same. */
export function checkLevels(levelsDbuv: Float32Array, dataLine: number, column: number): void {
  const { length } = levelsDbuv;
  let beyond = 0;
  while (beyond < length && Math.abs(levelsDbuv[beyond]) <= HIGHEST_LEVEL_DB) beyond++;
  if (beyond < length) {
    throw new ReadingError({
      line: dataLine + beyond,
      column,
      found: `a level of ${levelsDbuv[beyond]} dBuV`,
      expected: `levels within +-${HIGHEST_LEVEL_DB} dBuV`,
      advice: 'Check which column holds the level, and its unit.',
    });
  }
  if (levelsDbuv.every((level) => level === levelsDbuv[0])) {
    throw new ReadingError({
      line: dataLine,
      column,
      found: `the same level in all ${length} rows`,
      expected: 'levels of a measured sweep',
      advice: 'The trace was blank or not yet swept when it was exported.',
    });
  }
}
