import { bandsFor } from './bands';
import type { LimitLine } from './limit-line';
import { CISPR32_A, CISPR32_B } from './tables/cispr-32';

describe('bandsFor', () => {
  it.each([
    ['class A', CISPR32_A],
    ['class B', CISPR32_B],
  ])('cuts %s at its breaks and at 0.5 and 5 MHz', (_name, set) => {
    expect(bandsFor(set.lines[0])).toEqual([
      { key: '0.15-0.5 MHz', fromHz: 150_000, toHz: 500_000 },
      { key: '0.5-5 MHz', fromHz: 500_000, toHz: 5_000_000 },
      { key: '5-30 MHz', fromHz: 5_000_000, toHz: 30_000_000 },
    ]);
  });

  it('appends the team bands as they are', () => {
    const own = { key: 'around the second harmonic', fromHz: 250_000, toHz: 280_000 };
    expect(bandsFor(CISPR32_B.lines[0], [own]).at(-1)).toBe(own);
  });

  it('makes no band of a stretch without a limit', () => {
    const gapped: LimitLine = {
      detector: 'PK',
      segments: [
        { fromHz: 150_000, toHz: 300_000, fromDbuv: 70, toDbuv: 70 },
        { fromHz: 530_000, toHz: 1_800_000, fromDbuv: 54, toDbuv: 54 },
      ],
    };
    expect(bandsFor(gapped).map(({ key }) => key)).toEqual(['0.15-0.3 MHz', '0.53-1.8 MHz']);
  });
});
