import fc from 'fast-check';
import { bandsFor } from '../limits/bands';
import { CELL_NOT_MEASURED, cellEdgesHz } from '../limits/cells';
import { limitAt } from '../limits/limit-line';
import { CISPR32_A, CISPR32_B } from '../limits/tables/cispr-32';
import { prepareGrid, sweepMargins } from './margins';

const classB = CISPR32_B.lines[0];
const classA = CISPR32_A.lines[0];
const gridHz = Float64Array.from({ length: 6634 }, (_, i) => 150_000 + 4500 * i);
const preparedB = prepareGrid(gridHz, classB, bandsFor(classB), cellEdgesHz());

function flat(levelDbuv: number, length = gridHz.length): Float32Array {
  return new Float32Array(length).fill(levelDbuv);
}

/** A steady line behind a Gaussian filter of 9 kHz (6 dB) on a flat floor. */
function withLine(levels: Float32Array, lineHz: number, levelDbuv: number, hz = gridHz): Float32Array {
  return levels.map((floor, i) => Math.max(floor, levelDbuv - 24.0824 * ((hz[i] - lineHz) / 9000) ** 2));
}

describe('sweepMargins', () => {
  // Class B QP: 66 to 56 dBuV falling with log f, 56, 60 (CISPR 32 Table A.10).
  it('takes limit minus level: a flat 40 dBuV leaves 16 dB from 0.5 to 5 MHz and 20 dB above', () => {
    const { worst, bands } = sweepMargins(flat(40), preparedB);
    expect(worst).toMatchObject({
      marginDb: 16,
      limitDbuv: 56,
      levelDbuv: 40,
      frequencyHz: 501_000,
      interpolated: false,
    });
    expect(bands.map(({ band }) => band)).toEqual(['0.15-0.5 MHz', '0.5-5 MHz', '5-30 MHz']);
    expect(bands[1].worst?.marginDb).toBe(16);
    expect(bands[2].worst?.marginDb).toBe(20);
    // Last point below 0.5 MHz: 496.5 kHz, limit 66 - 10 log10(496.5 / 150) / log10(500 / 150) = 56.0584.
    expect(bands[0].worst?.frequencyHz).toBe(496_500);
    expect(bands[0].worst?.marginDb).toBeCloseTo(16.0584, 3);
  });

  it('finds a line between two points with its true level and frequency, and the limit there', () => {
    const { worst, bands } = sweepMargins(withLine(flat(20), 302_000, 58), preparedB);
    const limitDbuv = limitAt(classB, 302_000) ?? NaN;
    expect(worst?.interpolated).toBe(true);
    expect(worst?.frequencyHz).toBeCloseTo(302_000, -1);
    expect(worst?.levelDbuv).toBeCloseTo(58, 3);
    expect(worst?.limitDbuv).toBeCloseTo(limitDbuv, 3);
    expect(worst?.marginDb).toBeCloseTo(limitDbuv - 58, 3);
    expect(bands[0].worst).toEqual(worst);
  });

  it('states a margin below 0 over the limit, and 0 exactly on it', () => {
    expect(sweepMargins(flat(61), preparedB).worst?.marginDb).toBe(-5);
    expect(sweepMargins(flat(56), preparedB).worst?.marginDb).toBe(0);
  });

  it('gives a point on a band edge to both bands, with the lower limit', () => {
    const edgeHz = Float64Array.from({ length: 12 }, (_, i) => 450_000 + 10_000 * i);
    const prepared = prepareGrid(edgeHz, classA, bandsFor(classA), cellEdgesHz());
    const levels = flat(20, 12);
    levels[5] = 60;
    const { bands } = sweepMargins(levels, prepared);
    // Class A QP at 500 kHz: 73 dBuV, the lower of 79 and 73 (CISPR 32 Table A.9).
    expect(bands[0].worst).toMatchObject({ frequencyHz: 500_000, marginDb: 13 });
    expect(bands[1].worst).toMatchObject({ frequencyHz: 500_000, marginDb: 13 });
  });

  it('keeps the measured point in a band when the line lies beyond its edge, and counts the line in the next band', () => {
    // The points nearest to the line at 5.0001 MHz are 4.998 MHz, where 56 dBuV apply, and 5.0025 MHz, where 60 apply.
    const shiftedHz = gridHz.map((hz) => hz + 1500);
    const prepared = prepareGrid(shiftedHz, classB, bandsFor(classB), cellEdgesHz());
    const { bands, worst } = sweepMargins(withLine(flat(10), 5_000_100, 50, shiftedHz), prepared);
    expect(bands[1].worst).toMatchObject({ frequencyHz: 4_998_000, interpolated: false });
    // 24.0824 dB * (2.1 kHz / 9 kHz)^2 = 1.311 dB below the line's top.
    expect(bands[1].worst?.marginDb).toBeCloseTo(56 - 50 + 1.311, 3);
    expect(worst).toEqual(bands[1].worst);
    expect(bands[2].worst?.marginDb).toBeGreaterThan(10);
  });

  it('counts a line beyond the edge of a band, where the limit steps down, in the next band only', () => {
    const shiftedHz = gridHz.map((hz) => hz + 1500);
    const prepared = prepareGrid(shiftedHz, classA, bandsFor(classA), cellEdgesHz());
    const { bands, worst } = sweepMargins(withLine(flat(10), 500_100, 60, shiftedHz), prepared);
    // Measured at 498 kHz 1.311 dB below the line's top, under 79 dBuV; the line itself stands under 73 dBuV (Table A.9).
    expect(bands[0].worst).toMatchObject({ frequencyHz: 498_000, limitDbuv: 79, interpolated: false });
    expect(bands[0].worst?.marginDb).toBeCloseTo(79 - 60 + 1.311, 3);
    expect(bands[1].worst).toMatchObject({ limitDbuv: 73, interpolated: true });
    expect(bands[1].worst?.frequencyHz).toBeCloseTo(500_100, -1);
    expect(bands[1].worst?.marginDb).toBeCloseTo(13, 3);
    expect(worst).toEqual(bands[1].worst);
  });

  it('never makes a margin better than the measured point, and agrees between all, bands and cells', () => {
    const levelsOf = fc.array(fc.float({ min: 0, max: 80, noNaN: true }), { minLength: 400, maxLength: 400 });
    const spreadHz = Float64Array.from({ length: 400 }, (_, i) => Math.round(150_000 * 200 ** (i / 399)));
    const prepared = [classA, classB].map((line) => prepareGrid(spreadHz, line, bandsFor(line), cellEdgesHz()));
    fc.assert(
      fc.property(levelsOf, fc.constantFrom(...prepared), (numbers, grid) => {
        const levels = Float32Array.from(numbers);
        const { worst, bands, cells } = sweepMargins(levels, grid);
        let measuredDb = Infinity;
        spreadHz.forEach((hz, i) => {
          measuredDb = Math.min(measuredDb, (limitAt(grid.line, hz) ?? Infinity) - levels[i]);
        });
        const worstDb = worst?.marginDb ?? NaN;
        expect(worstDb).toBeLessThanOrEqual(measuredDb);
        expect(Math.min(...bands.map((band) => band.worst?.marginDb ?? Infinity))).toBe(worstDb);
        const measured = [...cells].filter((cell) => cell !== CELL_NOT_MEASURED);
        expect(Math.min(...measured) / 100).toBeLessThanOrEqual(worstDb);
        expect(Math.min(...measured) / 100).toBeGreaterThan(worstDb - 0.0101);
      }),
      { numRuns: 50 },
    );
  });

  it('rounds cells down, marks those without a point, and splits at 0.5 and 5 MHz', () => {
    const edgesHz = cellEdgesHz();
    const someHz = gridHz.subarray(0, 78);
    const prepared = prepareGrid(someHz, classB, bandsFor(classB), edgesHz);
    const { cells } = sweepMargins(flat(40.126, 78), prepared);
    const below = edgesHz.indexOf(500_000) - 1;
    // 56.0584 dBuV at 496.5 kHz minus 40.126 is 15.9324 dB.
    expect(cells[below]).toBe(1593);
    expect(cells[below + 1]).toBe(CELL_NOT_MEASURED);
    expect(cells.at(-1)).toBe(CELL_NOT_MEASURED);
  });

  it('has no worst point and no floor where nothing was measured under a limit', () => {
    const lowHz = Float64Array.from({ length: 20 }, (_, i) => 50_000 + 1000 * i);
    const { worst, bands, cells } = sweepMargins(
      flat(90, 20),
      prepareGrid(lowHz, classB, bandsFor(classB), cellEdgesHz()),
    );
    expect(worst).toBeNull();
    expect(bands[0]).toEqual({
      band: '0.15-0.5 MHz',
      worst: null,
      coveredFraction: 0,
      floorDbuv: null,
      floorMarginDb: null,
    });
    expect(new Set(cells)).toEqual(new Set([CELL_NOT_MEASURED]));
  });

  it('states coverage and floor of a band', () => {
    const { bands } = sweepMargins(withLine(flat(20), 1_000_000, 50), preparedB);
    expect(bands[1].coveredFraction).toBe(1);
    expect(bands[1].floorDbuv).toBeCloseTo(20.05, 6);
    expect(bands[1].floorMarginDb).toBeCloseTo(56 - 20.05, 6);
  });

  it('serves overlapping team bands', () => {
    const own = { key: 'own', fromHz: 300_000, toHz: 700_000 };
    const prepared = prepareGrid(gridHz, classB, bandsFor(classB, [own]), cellEdgesHz());
    const { bands } = sweepMargins(withLine(withLine(flat(20), 402_000, 50), 1_000_500, 55), prepared);
    expect(bands.at(-1)?.band).toBe('own');
    expect(bands.at(-1)?.worst).toEqual(bands[0].worst);
    expect(bands[1].worst?.frequencyHz).toBeCloseTo(1_000_500, -1);
  });

  it('refuses levels that do not fit the grid', () => {
    expect(() => sweepMargins(flat(40, 10), preparedB)).toThrow('10 levels do not fit a grid of 6634 points.');
  });
});
