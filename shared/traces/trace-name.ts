import type { Detector, Line } from '../detectors/detectors';
import { LINES } from '../detectors/detectors';

/** The names that instruments and people give the detectors; quasi-peak first, for it holds the word peak. */
const DETECTOR_WORDS: readonly (readonly [Detector, RegExp])[] = [
  ['QP', /(?<![a-z])(?:qpk?|quasi[\s_-]?peak)(?![a-z])/i],
  ['AV', /(?<![a-z])(?:c?avg?|cispr[\s_-]?av(?:erage|g)?|average)(?![a-z])/i],
  ['PK', /(?<![a-z])(?:pk|pk\+|peak|max[\s_-]?peak|pos[\s_-]?peak)(?![a-z])/i],
];

/** Reads the detector from a name, for example "Quasi-Peak L1". Undefined when none or more than one is named. */
export function detectorIn(name: string): Detector | undefined {
  let rest = name;
  const found: Detector[] = [];
  for (const [detector, word] of DETECTOR_WORDS) {
    if (!word.test(rest)) continue;
    found.push(detector);
    rest = rest.replace(word, ' ');
  }
  return found.length === 1 ? found[0] : undefined;
}

/** Reads the conductor from a name, for example "QP_N" or "Phase L1". Undefined when none or more than one is named. */
export function lineIn(name: string): Line | undefined {
  const words = name.split(/[\s_()[\],;:/]+/).flatMap((word) => (word.length > 1 ? word.split('-') : word));
  const found = new Set(LINES.filter((line) => words.some((word) => word.toUpperCase() === line)));
  return found.size === 1 ? [...found][0] : undefined;
}
