export interface Spread {
  readonly sd: number;
  readonly degreesOfFreedom: number;
}

/**
 * Draws a measured spread toward a prior one, the more the fewer degrees of freedom it has.
 * Formula: s^2 = (v0 s0^2 + v s^2) / (v0 + v), with v0 + v degrees of freedom.
 * @param measured sd 0 or more in dB, degrees of freedom 0 or more; with 0 the prior comes back
 * @param prior sd above 0 in dB, degrees of freedom above 0
 * @returns the spread to judge with, dB
 * Throws RangeError outside those ranges.
 * Source: Smyth, Statistical Applications in Genetics and Molecular Biology 3 (2004), article 3, section 3 (posterior
 * variance of the moderated t).
 * Example: 0.5 dB with 6 drawn toward 0.7 dB with 4 gives 0.588 dB with 10.
 */
export function shrinkSpread(measured: Spread, prior: Spread): Spread {
  if (!(prior.sd > 0 && prior.degreesOfFreedom > 0 && measured.sd >= 0 && measured.degreesOfFreedom >= 0)) {
    throw new RangeError(
      'a spread and its degrees of freedom must not be negative, those of the prior must be above 0',
    );
  }
  const degreesOfFreedom = prior.degreesOfFreedom + measured.degreesOfFreedom;
  const squares = prior.degreesOfFreedom * prior.sd ** 2 + measured.degreesOfFreedom * measured.sd ** 2;
  return { sd: Math.sqrt(squares / degreesOfFreedom), degreesOfFreedom };
}
