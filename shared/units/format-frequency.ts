/** Writes a number with at most `decimals` decimals and no trailing zeros. */
function trimmed(value: number, decimals: number): string {
  return String(Number(value.toFixed(decimals)));
}

/**
 * Writes a frequency for people: whole Hz, kHz to 0.1, MHz to 0.01 (the grid of a 9 kHz receiver is coarser than that).
 * Example: 156200 gives "156.2 kHz", 7210000 gives "7.21 MHz", 150000 gives "150 kHz".
 */
export function formatFrequency(frequencyHz: number): string {
  if (frequencyHz < 999.5) return `${trimmed(frequencyHz, 0)} Hz`;
  if (frequencyHz < 999_950) return `${trimmed(frequencyHz / 1e3, 1)} kHz`;
  return `${trimmed(frequencyHz / 1e6, 2)} MHz`;
}
