import { CISPR32_B } from '@shared/limits/tables/cispr-32';
import { FULL_RANGE_HZ } from './frequency-scale';
import { limitCsvRows, limitTable } from './limit-table';

const limits = CISPR32_B.lines.map((line) => ({ name: `class B, ${line.detector}`, line }));

// CISPR 32 table A.10: QP 66 to 56 dBuV from 0.15 to 0.5 MHz, 56 to 5 MHz, 60 to 30 MHz; AV 10 dB below. 300 kHz is
// 66 - 10 log(300/150) / log(500/150) = 60.24.
describe('limitTable', () => {
  it('reads every line at round frequencies, at its breaks and at the ends of the view', () => {
    const { columns, rows } = limitTable(limits, FULL_RANGE_HZ);
    expect(columns.map(({ label }) => label)).toEqual(['dBµV at', 'class B, QP', 'class B, AV']);
    const at = (frequency: string) => rows.filter(([first]) => first === frequency);
    expect(at('150 kHz')).toEqual([['150 kHz', '66.0', '56.0']]);
    expect(at('300 kHz')).toEqual([['300 kHz', '60.2', '50.2']]);
    expect(at('5 MHz')).toEqual([['5 MHz', '56.0', '46.0']]);
    expect(at('30 MHz')).toEqual([['30 MHz', '60.0', '50.0']]);
  });

  it('stays within the view and says where there is no limit', () => {
    const { rows } = limitTable(limits, { fromHz: 100e3, toHz: 200e3 });
    expect(rows.at(0)).toEqual(['100 kHz', 'no limit', 'no limit']);
    expect(rows.at(-1)?.at(0)).toBe('200 kHz');
  });
});

describe('limitCsvRows', () => {
  it('gives both sides of a step', () => {
    const rows = [...limitCsvRows(limits.slice(0, 1))];
    expect(rows.filter(([, , frequencyHz]) => frequencyHz === 5e6)).toEqual([
      ['class B, QP', 'QP', 5e6, 56],
      ['class B, QP', 'QP', 5e6, 60],
    ]);
  });
});
