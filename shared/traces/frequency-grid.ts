/** First point of a frequency grid that breaks its rule. */
export interface FrequencyFault {
  readonly index: number;
  readonly rule: 'notPositive' | 'falling' | 'repeated';
}

export interface GridDescription {
  readonly pointCount: number;
  readonly startHz: number;
  readonly stopHz: number;
  readonly medianStepHz: number;
}

/**
 * Finds the first point that keeps a grid from being positive and strictly rising.
 * @param frequenciesHz frequencies in Hz, any order
 * @returns the first fault, or null for a sound grid
 * Example: 150000, 154500, 154500 gives {index: 2, rule: 'repeated'}.
 */
export function findFrequencyFault(frequenciesHz: Float64Array): FrequencyFault | null {
  let previousHz = 0;
  for (let index = 0; index < frequenciesHz.length; index++) {
    const frequencyHz = frequenciesHz[index];
    if (!(frequencyHz > 0 && frequencyHz < Infinity)) return { index, rule: 'notPositive' };
    if (frequencyHz <= previousHz) return { index, rule: frequencyHz === previousHz ? 'repeated' : 'falling' };
    previousHz = frequencyHz;
  }
  return null;
}

/**
 * States what identifies a grid to people: points, ends, and the step between points.
 * @param frequenciesHz strictly rising frequencies in Hz, two points at least
 * @returns count, first and last frequency in Hz, median of the steps in Hz (the upper one of an even count)
 * @throws RangeError when the grid has fewer than two points, or is not positive and strictly rising
 * Example: 150 kHz to 30 MHz in steps of 4.5 kHz gives 6634 points and a median step of 4500 Hz.
 */
export function describeGrid(frequenciesHz: Float64Array): GridDescription {
  const pointCount = frequenciesHz.length;
  if (pointCount < 2) throw new RangeError(`A frequency grid has at least 2 points, this one has ${pointCount}.`);
  const fault = findFrequencyFault(frequenciesHz);
  if (fault) {
    throw new RangeError(
      `Frequencies must be above 0 and rise strictly; point ${fault.index} is ${frequenciesHz[fault.index]} Hz (${fault.rule}).`,
    );
  }
  const stepsHz = new Float64Array(pointCount - 1);
  for (let i = 0; i < stepsHz.length; i++) stepsHz[i] = frequenciesHz[i + 1] - frequenciesHz[i];
  stepsHz.sort();
  return {
    pointCount,
    startHz: frequenciesHz[0],
    stopHz: frequenciesHz[pointCount - 1],
    medianStepHz: stepsHz[stepsHz.length >> 1],
  };
}

/**
 * Index of the first point at or above a frequency.
 * @param frequenciesHz strictly rising frequencies in Hz
 * @param frequencyHz frequency sought in Hz
 * @returns 0 to the number of points (all lie below)
 * Example: in 150, 160, 170 the first at or above 160 is index 1.
 */
export function firstIndexAtOrAbove(frequenciesHz: Float64Array, frequencyHz: number): number {
  let low = 0;
  let high = frequenciesHz.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (frequenciesHz[middle] < frequencyHz) low = middle + 1;
    else high = middle;
  }
  return low;
}

/**
 * Index of the first point above a frequency, the end of a range that includes the frequency.
 * Example: in 150, 160, 170 the first above 160 is index 2.
 */
export function firstIndexAbove(frequenciesHz: Float64Array, frequencyHz: number): number {
  const index = firstIndexAtOrAbove(frequenciesHz, frequencyHz);
  return index < frequenciesHz.length && frequenciesHz[index] === frequencyHz ? index + 1 : index;
}
