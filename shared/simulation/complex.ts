/** A complex number: a phasor, an impedance or a transfer. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

export const complex = (re: number, im = 0): Complex => ({ re, im });

export const add = (a: Complex, b: Complex): Complex => ({ re: a.re + b.re, im: a.im + b.im });

export const subtract = (a: Complex, b: Complex): Complex => ({ re: a.re - b.re, im: a.im - b.im });

export const multiply = (a: Complex, b: Complex): Complex => ({
  re: a.re * b.re - a.im * b.im,
  im: a.re * b.im + a.im * b.re,
});

export const scale = (a: Complex, factor: number): Complex => ({ re: a.re * factor, im: a.im * factor });

export function divide(a: Complex, b: Complex): Complex {
  const square = b.re * b.re + b.im * b.im;
  return { re: (a.re * b.re + a.im * b.im) / square, im: (a.im * b.re - a.re * b.im) / square };
}

export const magnitude = (a: Complex): number => Math.sqrt(a.re * a.re + a.im * a.im);

export const phaseDegrees = (a: Complex): number => (Math.atan2(a.im, a.re) * 180) / Math.PI;

/** Two impedances side by side: a b / (a + b). */
export const parallel = (a: Complex, b: Complex): Complex => divide(multiply(a, b), add(a, b));
