import { CELL_COUNT, CELL_NOT_MEASURED } from '@shared/limits/cells';
import { detectorOrderHit, detectorOrderViolations } from './detector-order';
import { constantOffsetHit, findConstantOffset } from './find-constant-offset';
import { sameDayShift } from './same-day-shift';

const cells = (margin: (cell: number) => number) => Int16Array.from({ length: CELL_COUNT }, (_, cell) => margin(cell));
const wavy = (cell: number) => 1_500 + Math.round(400 * Math.sin(cell));

describe('findConstantOffset', () => {
  it('finds a 10 dB limiter that was not entered', () => {
    const offset = findConstantOffset(
      cells((cell) => wavy(cell) - 1_000 + (cell % 3) * 10),
      cells(wavy),
    );
    expect(offset).toMatchObject({ nearDb: 10, cells: CELL_COUNT });
    expect(offset && constantOffsetHit(offset).text).toContain('limiter of 10 dB');
  });

  it('finds it through the noise of two single runs, MAD 0.6 dB', () => {
    const offset = findConstantOffset(
      cells((cell) => wavy(cell) + 1_000 + [-60, 0, 60][cell % 3]),
      cells(wavy),
    );
    expect(offset?.nearDb).toBe(10);
  });

  it('takes a moved harmonic, a tilt and a small shift for the product', () => {
    expect(
      findConstantOffset(
        cells((cell) => wavy(cell) - (cell === 3 ? 900 : 0)),
        cells(wavy),
      ),
    ).toBeNull();
    expect(
      findConstantOffset(
        cells((cell) => wavy(cell) - cell * 10),
        cells(wavy),
      ),
    ).toBeNull();
    expect(
      findConstantOffset(
        cells((cell) => wavy(cell) - 90),
        cells(wavy),
      ),
    ).toBeNull();
  });

  it('says nothing from a few cells', () => {
    const few = cells((cell) => (cell < 11 ? 500 : CELL_NOT_MEASURED));
    expect(
      findConstantOffset(
        few,
        cells(() => 1_500),
      ),
    ).toBeNull();
  });

  it('refuses vectors of unlike length', () => {
    expect(() => findConstantOffset(new Int16Array(3), new Int16Array(4))).toThrow(RangeError);
  });
});

describe('detectorOrderViolations', () => {
  // CISPR 32 class B: the AV line lies 10 dB below the QP line.
  const quasiPeakLimits = new Array<number>(CELL_COUNT).fill(66);
  const averageLimits = new Array<number>(CELL_COUNT).fill(56);
  const peak = { detector: 'PK' as const, cells: cells(() => 1_000), limitsDbuv: quasiPeakLimits };
  const quasiPeak = { detector: 'QP' as const, cells: cells(() => 1_400), limitsDbuv: quasiPeakLimits };
  const average = { detector: 'AV' as const, cells: cells(() => 1_200), limitsDbuv: averageLimits };

  it('accepts PK 56, QP 52, AV 44 dBuV though the AV margin is the smaller one', () => {
    expect(detectorOrderViolations([average, peak, quasiPeak])).toEqual([]);
  });

  it('finds QP and AV swapped', () => {
    const swapped = [
      { ...quasiPeak, cells: cells(() => 2_200) },
      { ...average, cells: cells(() => 400) },
    ];
    const [violation] = detectorOrderViolations(swapped);
    expect(violation).toMatchObject({ higher: 'QP', lower: 'AV', worstExcessDb: 8, comparedCells: CELL_COUNT });
    expect(detectorOrderHit(violation)?.code).toBe('detectorOrder');
  });

  it('compares PK with AV where there is no QP, and leaves out cells that were not measured', () => {
    const high = { ...average, cells: cells((cell) => (cell === 0 ? CELL_NOT_MEASURED : -500)) };
    const gappy = { ...peak, cells: cells((cell) => (cell === 1 ? CELL_NOT_MEASURED : 1_000)) };
    const [violation] = detectorOrderViolations([gappy, high]);
    expect(violation).toMatchObject({ comparedCells: CELL_COUNT - 2, worstExcessDb: 5 });
    expect(violation.cells).toHaveLength(CELL_COUNT - 2);
  });

  it('makes no hit of two noisy cells', () => {
    const noisy = { ...quasiPeak, cells: cells((cell) => (cell < 2 ? 700 : 1_400)) };
    const [violation] = detectorOrderViolations([peak, noisy]);
    expect(violation.cells).toEqual([0, 1]);
    expect(detectorOrderHit(violation)).toBeNull();
  });
});

describe('sameDayShift', () => {
  const shifts = (...differencesDb: number[]) =>
    differencesDb.map((differenceDb, index) => ({ productName: `product ${index + 1}`, differenceDb }));

  it('finds another product that moved the same way', () => {
    expect(sameDayShift(-4.1, shifts(-4.4), 2)?.code).toBe('sameDayShift');
  });

  it('takes a product that stood still, or moved the other way, for evidence that the bench is sound', () => {
    expect(sameDayShift(-4.1, shifts(-4.4, 0), 2)).toBeNull();
    expect(sameDayShift(-4.1, shifts(4.1), 2)).toBeNull();
  });

  it('needs another product, and a change', () => {
    expect(sameDayShift(-4.1, [], 2)).toBeNull();
    expect(sameDayShift(-1, shifts(-1), 2)).toBeNull();
  });
});
