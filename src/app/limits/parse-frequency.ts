const FACTORS: Readonly<Record<string, number>> = { '': 1, k: 1e3, m: 1e6, g: 1e9 };

/**
 * Reads a frequency as people write it: "156 kHz", "0.5 MHz", "7,21 M", "5M", "300000".
 *
 * @returns the frequency in Hz; null for what is none, or not above 0
 */
export function parseFrequency(text: string): number | null {
  const match = /^(\d+(?:[.,]\d+)?|[.,]\d+)\s*([kmg]?)(?:hz)?$/i.exec(text.trim());
  if (!match) return null;
  const [, digits = '', letter = ''] = match;
  // Through text, so that 7.21 MHz is 7210000 Hz and not 7209999.999 Hz.
  const frequencyHz = Number((Number(digits.replace(',', '.')) * (FACTORS[letter.toLowerCase()] ?? 1)).toPrecision(12));
  return frequencyHz > 0 ? frequencyHz : null;
}
