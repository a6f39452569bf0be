import type { Detector } from '../detectors/detectors';
import type { FrequencyUnit } from '../units/frequency-unit';
import { FREQUENCY_EXPONENT } from '../units/frequency-unit';
import { withoutCommentMark } from './column-headings';
import type { TextLine } from './text-lines';
import { splitCells } from './text-lines';
import { detectorIn } from './trace-name';
import type { StatedLevelUnit } from './unit-words';
import { frequencyUnitIn, levelUnitIn } from './unit-words';

/** One line above the table; the key is empty when the line is plain text. */
export interface PreambleLine {
  readonly line: number;
  readonly key: string;
  readonly value: string;
}

export interface ReadingSettings {
  readonly rbwHz?: number;
  readonly detector?: Detector;
  readonly attenuationDb?: number;
}

/** Something the preamble states, and where. */
export interface Stated<T> {
  readonly value: T;
  readonly line: number;
}

export interface PreambleFacts {
  readonly settings: ReadingSettings;
  readonly frequencyUnits: readonly Stated<FrequencyUnit>[];
  readonly levelUnits: readonly Stated<StatedLevelUnit>[];
  /** Names of the traces in their order. */
  readonly traceNames: readonly string[];
}

const BANDWIDTH_KEY = /(?<![a-z])(?:rbw|res(?:olution)?\.?\s*(?:bandwidth|bw)|if\s*bandwidth|bandwidth|ifbw)(?![a-z])/i;
const ATTENUATION_KEY = /(?<![a-z])att(?:en(?:uation|uator)?)?(?![a-z])/i;
const DETECTOR_KEY = /detector/i;
const UNIT_KEY = /unit|axis/i;
const OTHER_UNIT_KEY = /rbw|vbw|bandwidth|step|span|start|stop|time/i;
const TRACE_KEY = /^trace(?:\s*name)?\s*\d*$/i;
/** A bandwidth without a unit is taken for Hz from here on: no receiver of these bands has less. */
const LEAST_PLAIN_BANDWIDTH_HZ = 100;

/** Splits the lines above a table into keys and values at the first delimiter, colon or equals sign. */
export function readPreamble(lines: readonly TextLine[], delimiter: string): PreambleLine[] {
  return lines.map(({ number: line, text }) => {
    const plain = withoutCommentMark(text).trim();
    const cut = [...plain].findIndex((character) => character === delimiter || character === ':' || character === '=');
    if (cut < 0) return { line, key: '', value: plain };
    const value = splitCells(plain.slice(cut + 1), delimiter).filter((cell) => cell !== '');
    return { line, key: splitCells(plain.slice(0, cut), delimiter)[0], value: value.join(' ') };
  });
}

/** Takes from the preamble what the reading of the table and the tags of a sweep need. */
export function preambleFacts(preamble: readonly PreambleLine[]): PreambleFacts {
  const settings: { rbwHz?: number; detector?: Detector; attenuationDb?: number } = {};
  const frequencyUnits: Stated<FrequencyUnit>[] = [];
  const levelUnits: Stated<StatedLevelUnit>[] = [];
  const traceNames: string[] = [];
  for (const { line, key, value } of preamble) {
    if (BANDWIDTH_KEY.test(key)) settings.rbwHz ??= bandwidthHz(key, value);
    else if (DETECTOR_KEY.test(key)) settings.detector ??= detectorIn(value);
    else if (ATTENUATION_KEY.test(key)) settings.attenuationDb ??= leadingNumber(value);
    else if (TRACE_KEY.test(key)) traceNames.push(value);
    else if (UNIT_KEY.test(key) && !OTHER_UNIT_KEY.test(key)) {
      const frequencyUnit = frequencyUnitIn(value);
      const levelUnit = levelUnitIn(value);
      if (frequencyUnit !== undefined) frequencyUnits.push({ value: frequencyUnit, line });
      if (levelUnit !== undefined) levelUnits.push({ value: levelUnit, line });
    }
  }
  return { settings, frequencyUnits, levelUnits, traceNames };
}

function leadingNumber(text: string): number | undefined {
  const number = /^[+-]?\d+(?:[.,]\d+)?(?:e[+-]?\d+)?/i.exec(text)?.[0];
  return number === undefined ? undefined : Number(number.replace(',', '.'));
}

function bandwidthHz(key: string, value: string): number | undefined {
  const number = leadingNumber(value);
  const unit = frequencyUnitIn(value) ?? frequencyUnitIn(key);
  if (number === undefined || number <= 0) return undefined;
  if (unit !== undefined) return Math.round(number * 10 ** FREQUENCY_EXPONENT[unit]);
  return number >= LEAST_PLAIN_BANDWIDTH_HZ ? number : undefined;
}
