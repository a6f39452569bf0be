import { createRandom, seedFromText } from './random-generator';

describe('createRandom', () => {
  it('repeats its stream from the same seed and differs from another seed', () => {
    const stream = (seed: number): number[] => {
      const random = createRandom(seed);
      return Array.from({ length: 5 }, () => random.next());
    };
    expect(stream(7)).toEqual(stream(7));
    expect(stream(7)).not.toEqual(stream(8));
  });

  // Source: standard error of mean and variance of 20,000 draws, four times.
  it('gives normal deviates of mean 0 and variance 1', () => {
    const random = createRandom(3);
    const draws = Array.from({ length: 20_000 }, () => random.nextNormal());
    const mean = draws.reduce((sum, z) => sum + z, 0) / draws.length;
    const variance = draws.reduce((sum, z) => sum + z * z, 0) / draws.length;
    expect(Math.abs(mean)).toBeLessThan(4 / Math.sqrt(20_000));
    expect(Math.abs(variance - 1)).toBeLessThan(4 * Math.sqrt(2 / 20_000));
  });
});

describe('seedFromText', () => {
  // Source: published 32-bit FNV-1a vectors: '' 811c9dc5, 'a' e40c292c, 'foobar' bf9cf968.
  it.each([
    ['', 0x811c9dc5],
    ['a', 0xe40c292c],
    ['foobar', 0xbf9cf968],
  ])('hashes %p by FNV-1a', (text, expected) => {
    expect(seedFromText(text)).toBe(expected);
  });
});
