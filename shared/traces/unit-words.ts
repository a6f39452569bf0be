import type { FrequencyUnit } from '../units/frequency-unit';
import { FREQUENCY_UNITS } from '../units/frequency-unit';
import type { LevelUnit } from '../units/level-unit';

const FREQUENCY_WORD = /(?<![a-z])([kmg]?hz)(?![a-z])/i;
const LEVEL_WORDS: readonly (readonly [LevelUnit | 'dB', RegExp])[] = [
  ['dBuV', /(?<![a-z])db\s*\(?\s*u\s*v(?![a-z]|\s*\/)\)?/i],
  ['dBmV', /(?<![a-z])db\s*\(?\s*mv(?![a-z]|\s*\/)\)?/i],
  ['dBm', /(?<![a-z])db\s*(?:m|\(\s*mw\s*\))(?![a-z]|\s*\/)/i],
  ['dB', /(?<![a-z])db(?![a-z(]|\s*\/)/i],
];
/** Levels over another reference, field strengths and densities, and linear units in brackets. */
const OTHER_LEVEL_WORD = /(?<![a-z])(db\s*\(?\s*[a-z][a-z/]*\)?)|[[(]\s*([um]?[vwa])\s*[\])]|^\s*([um]?[vwa])\s*$/i;

/** A level unit as a file states it: one that is read, plain dB (a ratio, no level), or the text of one that is not read. */
export type StatedLevelUnit = LevelUnit | 'dB' | { readonly other: string };

/** Both mu letters of Unicode are taken for the micro of units; runs of blanks become one. */
function withPlainMicro(text: string): string {
  return text.replace(/[\u00b5\u03bc]/g, 'u').replace(/\s+/g, ' ');
}

/** Finds a frequency unit in a header cell or a preamble value, for example "Frequency [MHz]". */
export function frequencyUnitIn(text: string): FrequencyUnit | undefined {
  const word = FREQUENCY_WORD.exec(text)?.[1].toLowerCase();
  return FREQUENCY_UNITS.find((unit) => unit.toLowerCase() === word);
}

/** Finds a level unit in a header cell or a preamble value, for example "QP [dB(uV)]". */
export function levelUnitIn(text: string): StatedLevelUnit | undefined {
  const plain = withPlainMicro(text);
  for (const [unit, word] of LEVEL_WORDS) if (word.test(plain)) return unit;
  const other = OTHER_LEVEL_WORD.exec(plain);
  const word = other?.slice(1).find((part) => part !== undefined);
  return word === undefined ? undefined : { other: word.trim() };
}

/** Whether a cell holds a unit and nothing else, as in a row of units under a row of names. */
export function isUnitOnly(text: string): boolean {
  return text !== '' && withoutUnit(text) === '' && (frequencyUnitIn(text) ?? levelUnitIn(text)) !== undefined;
}

/** A header cell's name without its unit: "QP [dB(uV)]" gives "QP". */
export function withoutUnit(text: string): string {
  let name = withPlainMicro(text).replace(FREQUENCY_WORD, ' ');
  for (const [, word] of LEVEL_WORDS) name = name.replace(word, ' ');
  return name
    .replace(/[[({]\s*[\])}]/g, ' ')
    .replace(/[\s,:;/[(]+$/, '')
    .replace(/\s+/g, ' ')
    .trim();
}
