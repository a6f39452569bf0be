import { studentTCdf, studentTQuantile } from './student-t';

describe('studentTQuantile', () => {
  // NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.6.7.2, upper critical values of Student's t.
  it.each([
    [0.95, 1, 6.314],
    [0.95, 4, 2.132],
    [0.95, 10, 1.812],
    [0.95, 30, 1.697],
    [0.975, 8, 2.306],
    [0.99, 5, 3.365],
    [0.999, 4, 7.173],
    [0.999, 60, 3.232],
  ])('gives the table value at p = %d and %d degrees of freedom', (p, degrees, expected) => {
    expect(studentTQuantile(p, degrees)).toBeCloseTo(expected, 3);
  });

  it('refuses a probability of 1 and no degrees of freedom', () => {
    expect(() => studentTQuantile(1, 4)).toThrow(RangeError);
    expect(() => studentTQuantile(0.95, 0)).toThrow(RangeError);
  });
});

describe('studentTCdf', () => {
  it('undoes the quantile far out in the tail, where judgements are made', () => {
    expect(studentTCdf(studentTQuantile(0.0002, 8.5), 8.5)).toBeCloseTo(0.0002, 9);
  });
});
