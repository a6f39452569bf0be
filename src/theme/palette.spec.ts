import { readFileSync } from 'node:fs';
import { join } from 'node:path';

type Rgb = readonly number[];
type Matrix = readonly (readonly number[])[];

const SOURCE = readFileSync(join(__dirname, '_palette.scss'), 'utf8');

/** Value of a custom property in the light (0) or dark (1) theme. */
function colour(name: string, theme: 0 | 1): string {
  const value = new RegExp(`--sl-${name}: (.*);`).exec(SOURCE)?.[1];
  const colours = value?.match(/#[0-9a-f]{6}/g);
  if (!colours) throw new Error(`no colour --sl-${name}`);
  return colours[theme] ?? colours[0];
}

/** sRGB to linear light. Source: IEC 61966-2-1; also WCAG 2.2, definition of relative luminance. */
function linear(hex: string): Rgb {
  return [1, 3, 5].map((at) => {
    const channel = parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
}

/** Source: WCAG 2.2, definition of contrast ratio. */
function contrast(a: string, b: string): number {
  const [dark, light] = [a, b].map((hex) => luminance(linear(hex))).sort((x, y) => x - y);
  return (light + 0.05) / (dark + 0.05);
}

function luminance([red, green, blue]: Rgb): number {
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

/**
 * Full colour-vision deficiencies in linear sRGB. Source: Machado, Oliveira, Fernandes, "A Physiologically-based Model
 * for Simulation of Color Vision Deficiency", IEEE TVCG 15(6), 2009, table for severity 1.0.
 */
const VISION: Record<string, Matrix> = {
  common: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protanopia: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deuteranopia: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  tritanopia: [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
};

function seen(rgb: Rgb, vision: Matrix): Rgb {
  return vision.map((row) => Math.min(1, Math.max(0, row[0] * rgb[0] + row[1] * rgb[1] + row[2] * rgb[2])));
}

/** CIE 1976 L*a*b* under D65 from linear sRGB. Source: CIE 15; primaries of IEC 61966-2-1. */
function lab([red, green, blue]: Rgb): Rgb {
  const f = (t: number) => (t > 216 / 24389 ? Math.cbrt(t) : ((24389 / 27) * t + 16) / 116);
  const x = f((0.4124564 * red + 0.3575761 * green + 0.1804375 * blue) / 0.95047);
  const y = f(0.2126729 * red + 0.7151522 * green + 0.072175 * blue);
  const z = f((0.0193339 * red + 0.119192 * green + 0.9503041 * blue) / 1.08883);
  return [116 * y - 16, 500 * (x - y), 200 * (y - z)];
}

/** Least difference of two colours over common vision and the three deficiencies. Source: CIE 15, Delta E*ab. */
function leastDifference(a: string, b: string): number {
  const differences = Object.values(VISION).map((vision) => {
    const [p, q] = [a, b].map((hex) => lab(seen(linear(hex), vision)));
    return Math.hypot(p[0] - q[0], p[1] - q[1], p[2] - q[2]);
  });
  return Math.min(...differences);
}

function pairs<T>(items: readonly T[]): [T, T][] {
  return items.flatMap((a, i) => items.slice(i + 1).map((b): [T, T] => [a, b]));
}

describe('the helpers of this check', () => {
  it('give 21 for black on white and 4.54 for the grey #767676 on white', () => {
    // Source: WCAG 2.2 (21:1 is the greatest ratio); #767676 as the lightest passing grey is common practice, no source.
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 6);
    expect(contrast('#767676', '#ffffff')).toBeCloseTo(4.54, 2);
  });

  it('give L* 53.24, a* 80.09, b* 67.20 for pure red', () => {
    // The L*a*b* of sRGB red under D65 as commonly tabulated; value from memory.
    const [lightness, a, b] = lab(linear('#ff0000'));
    expect(lightness).toBeCloseTo(53.24, 1);
    expect(a).toBeCloseTo(80.09, 1);
    expect(b).toBeCloseTo(67.2, 1);
  });

  it('leave grey grey under every deficiency', () => {
    for (const vision of Object.values(VISION)) {
      for (const channel of seen([0.5, 0.5, 0.5], vision)) expect(channel).toBeCloseTo(0.5, 5);
    }
  });
});

describe.each([
  ['light', 0],
  ['dark', 1],
] as const)('the %s theme', (_, theme) => {
  const texts = [
    'ink',
    'ink-muted',
    'accent',
    'lost',
    'gained',
    'held',
    'unsure',
    'margin-text-over',
    'margin-text-tight',
  ];
  const grounds = ['ground', 'surface', 'surface-low', 'surface-high'];

  it.each(texts.flatMap((text) => grounds.map((ground) => [text, ground])))(
    'writes %s on %s with a contrast of 4.5 or more',
    (text, ground) => {
      expect(contrast(colour(text, theme), colour(ground, theme))).toBeGreaterThanOrEqual(4.5);
    },
  );

  it.each(['lost', 'gained', 'held', 'unsure', 'over'])(
    'writes the chip "%s" with a contrast of 4.5 or more',
    (status) => {
      expect(contrast(colour(status, theme), colour(`${status}-ground`, theme))).toBeGreaterThanOrEqual(4.5);
    },
  );

  it('writes on the accent with a contrast of 4.5 or more', () => {
    expect(contrast(colour('accent-ink', theme), colour('accent', theme))).toBeGreaterThanOrEqual(4.5);
    expect(contrast(colour('accent-ground-ink', theme), colour('accent-ground', theme))).toBeGreaterThanOrEqual(4.5);
  });

  it('keeps the verdicts apart for every vision', () => {
    const verdicts = ['lost', 'gained', 'held', 'unsure'].map((status) => colour(status, theme));
    for (const [a, b] of pairs(verdicts)) expect([a, b, leastDifference(a, b) >= 9]).toEqual([a, b, true]);
  });

  it('keeps the accent and the eight traces apart for every vision, and draws each with 3 or more on paper', () => {
    // 3:1 for graphical objects: WCAG 2.2, 1.4.11. A difference of 15 is about six just noticeable ones; our own choice.
    const traces = ['accent', ...[1, 2, 3, 4, 5, 6, 7, 8].map((trace) => `trace-${trace}`)].map((name) =>
      colour(name, theme),
    );
    for (const [a, b] of pairs(traces)) expect([a, b, leastDifference(a, b) >= 15]).toEqual([a, b, true]);
    for (const trace of traces) expect(contrast(trace, colour('surface', theme))).toBeGreaterThanOrEqual(3);
  });
});

describe('the margin ramp', () => {
  const stops = ['far-over', 'over', 'tight', 'near', 'clear', 'ample', 'plenty'].map((stop) =>
    colour(`margin-${stop}`, 0),
  );
  const [farOver, over, tight, near, clear, ample, plenty] = stops;

  it('steps visibly at 0 dB and at the target for every vision', () => {
    expect(leastDifference(tight, over)).toBeGreaterThanOrEqual(25);
    expect(leastDifference(near, clear)).toBeGreaterThanOrEqual(25);
  });

  it('never lets a margin over the limit look like one above the target', () => {
    for (const bad of [over, farOver]) {
      for (const good of [clear, ample, plenty]) expect(leastDifference(bad, good)).toBeGreaterThanOrEqual(25);
    }
  });

  it.each(stops)('carries black or white text on %s with a contrast of 4.5 or more', (stop) => {
    const inks = [colour('margin-ink-dark', 0), colour('margin-ink-light', 0)];
    expect(Math.max(...inks.map((ink) => contrast(ink, stop)))).toBeGreaterThanOrEqual(4.5);
  });

  it('keeps what was not measured apart from every stop', () => {
    for (const theme of [0, 1] as const) {
      const unmeasured = colour('margin-unmeasured', theme);
      for (const stop of stops) expect(leastDifference(unmeasured, stop)).toBeGreaterThanOrEqual(9);
    }
  });
});
