/** Rounds to the 0.1 dB that results are reported with; turns -0.0 into 0.0. */
function toTenths(levelDb: number): string {
  const text = levelDb.toFixed(1);
  return text === '-0.0' ? '0.0' : text;
}

/**
 * Writes a level or margin for people, to 0.1 dB. Comparisons are made before rounding.
 * Example: 3.24 gives "3.2 dB".
 */
export function formatDecibels(levelDb: number): string {
  return `${toTenths(levelDb)} dB`;
}

/**
 * Writes a change for people, with its sign, to 0.1 dB.
 * The minus is the plain hyphen-minus, so that pages, e-mail and JSON texts agree.
 * Example: 3.24 gives "+3.2 dB", -3.24 gives "-3.2 dB", 0.01 gives "0.0 dB".
 */
export function formatSignedDecibels(changeDb: number): string {
  const text = toTenths(changeDb);
  return `${text.startsWith('-') || text === '0.0' ? '' : '+'}${text} dB`;
}
