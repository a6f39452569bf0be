import { CISPR32_B } from '@shared/limits/tables/cispr-32';
import { limitFor, readTrace } from './spectrum-reading';
import type { SpectrumLimit, SpectrumTrace } from './spectrum-types';

const LIMITS: SpectrumLimit[] = CISPR32_B.lines.map((line) => ({ name: line.detector, line }));

function trace(given: Partial<SpectrumTrace> = {}): SpectrumTrace {
  return {
    id: '1',
    label: 'C1 / 2.5.0, L, QP',
    role: 'build',
    detector: 'QP',
    line: 'L',
    frequenciesHz: Float64Array.of(200e3, 300e3, 400e3),
    levelsDbuv: Float32Array.of(40, 55, 45),
    ...given,
  };
}

describe('readTrace', () => {
  it('reads the highest point of a column with limit and margin', () => {
    const reading = readTrace(trace(), 250e3, 410e3, LIMITS);
    expect(reading).toMatchObject({ frequencyHz: 300e3, levelDbuv: 55 });
    // CISPR 32 class B QP at 300 kHz: 66 to 56 dBuV falling with log f from 150 to 500 kHz (table A.10), 60.24 dBuV.
    expect(reading?.limitDbuv).toBeCloseTo(60.24, 2);
    expect(reading?.marginDb).toBeCloseTo(5.24, 2);
  });

  it('reads the nearest point where the column lies between two', () => {
    expect(readTrace(trace(), 310e3, 312e3, LIMITS)?.frequencyHz).toBe(300e3);
    expect(readTrace(trace(), 390e3, 392e3, LIMITS)?.frequencyHz).toBe(400e3);
  });

  it('reads nothing beyond the ends of a trace', () => {
    expect(readTrace(trace(), 100e3, 150e3, LIMITS)).toBeNull();
    expect(readTrace(trace(), 500e3, 510e3, LIMITS)).toBeNull();
  });

  it('has no margin where no limit applies', () => {
    expect(readTrace(trace(), 250e3, 350e3, [])).toMatchObject({ limitDbuv: null, marginDb: null });
  });
});

it('holds PK against the QP line and AV against its own', () => {
  expect(limitFor(trace({ detector: 'PK' }), LIMITS)?.detector).toBe('QP');
  expect(limitFor(trace({ detector: 'AV' }), LIMITS)?.detector).toBe('AV');
});
