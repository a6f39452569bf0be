/**
 * Discrete Fourier transform in place, radix 2: X_k = sum x_m exp(-j 2 pi k m / N).
 *
 * @param real real parts, length N a power of two
 * @param imaginary imaginary parts, same length
 * Throws RangeError when N is not a power of two.
 * Source: Cooley and Tukey 1965, Math. Comput. 19, 297.
 * @example real [1, 0, 0, 0], imaginary zeros -> real [1, 1, 1, 1]
 */
export function fourierTransform(real: Float64Array, imaginary: Float64Array): void {
  const size = real.length;
  if (size < 1 || (size & (size - 1)) !== 0) {
    throw new RangeError(`the transform needs a power of two of samples, got ${size}`);
  }
  reorderByReversedBits(real, imaginary);
  for (let span = 1; span < size; span *= 2) {
    for (let offset = 0; offset < span; offset++) {
      const cosine = Math.cos((Math.PI * offset) / span);
      const sine = -Math.sin((Math.PI * offset) / span);
      for (let top = offset; top < size; top += 2 * span) {
        const bottom = top + span;
        const re = real[bottom] * cosine - imaginary[bottom] * sine;
        const im = real[bottom] * sine + imaginary[bottom] * cosine;
        real[bottom] = real[top] - re;
        imaginary[bottom] = imaginary[top] - im;
        real[top] += re;
        imaginary[top] += im;
      }
    }
  }
}

function reorderByReversedBits(real: Float64Array, imaginary: Float64Array): void {
  const size = real.length;
  for (let index = 1, mirror = 0; index < size; index++) {
    let bit = size >> 1;
    for (; mirror & bit; bit >>= 1) mirror ^= bit;
    mirror ^= bit;
    if (index < mirror) {
      [real[index], real[mirror]] = [real[mirror], real[index]];
      [imaginary[index], imaginary[mirror]] = [imaginary[mirror], imaginary[index]];
    }
  }
}
