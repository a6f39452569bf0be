import type { ChartPalette } from './chart-palette';

export type Rgb = readonly [number, number, number];

/** The stops of the ramp: three stretches that do not meet, so that 0 dB and the target margin are seen as steps. */
export interface MarginRamp {
  plenty: Rgb;
  ample: Rgb;
  clear: Rgb;
  near: Rgb;
  tight: Rgb;
  over: Rgb;
  farOver: Rgb;
}

/** Margin above the target, dB, at which the ramp is half way and all the way to "plenty". */
export const AMPLE_ABOVE_TARGET_DB = 10;
export const PLENTY_ABOVE_TARGET_DB = 20;
/** How far over the limit the ramp is at its end, dB. */
export const FAR_OVER_DB = 10;

/**
 * Colour of a margin.
 * @param marginDb margin to the limit in dB; below 0 is over the limit
 * @param targetMarginDb the team's target in dB, 0 or more
 * @returns red, green, blue, 0 to 255, whole numbers
 * Source: our own definition (the product's one ramp).
 */
export function marginColour(marginDb: number, targetMarginDb: number, ramp: MarginRamp): Rgb {
  if (marginDb < 0) return mix(ramp.over, ramp.farOver, -marginDb / FAR_OVER_DB);
  if (marginDb < targetMarginDb) return mix(ramp.tight, ramp.near, marginDb / targetMarginDb);
  const aboveDb = marginDb - targetMarginDb;
  if (aboveDb < AMPLE_ABOVE_TARGET_DB) return mix(ramp.clear, ramp.ample, aboveDb / AMPLE_ABOVE_TARGET_DB);
  const beyondDb = aboveDb - AMPLE_ABOVE_TARGET_DB;
  return mix(ramp.ample, ramp.plenty, beyondDb / (PLENTY_ABOVE_TARGET_DB - AMPLE_ABOVE_TARGET_DB));
}

/** The ramp in the colours of the present theme. */
export function marginRamp(palette: ChartPalette): MarginRamp {
  return {
    plenty: parseRgb(palette.marginPlenty),
    ample: parseRgb(palette.marginAmple),
    clear: parseRgb(palette.marginClear),
    near: parseRgb(palette.marginNear),
    tight: parseRgb(palette.marginTight),
    over: parseRgb(palette.marginOver),
    farOver: parseRgb(palette.marginFarOver),
  };
}

/** Reads a computed colour, "rgb(11, 58, 91)". */
export function parseRgb(colour: string): Rgb {
  const [red = 0, green = 0, blue = 0] = (colour.match(/[\d.]+/g) ?? []).map(Number);
  return [red, green, blue];
}

function mix(from: Rgb, to: Rgb, share: number): Rgb {
  const t = Math.min(1, share);
  const at = (channel: 0 | 1 | 2) => Math.round(from[channel] + (to[channel] - from[channel]) * t);
  return [at(0), at(1), at(2)];
}
