import { toCsv } from '../ui/chart/to-csv';
import { dropView, witness } from '../../../test/builders/drop-builder';
import { witnessRows } from './witness-rows';

it('writes one row for every series under a head row of the same length, numbers unrounded', () => {
  const drop = dropView({ evidence: { witnesses: [witness(), witness({ line: 'N', adjustedP: null })] } });
  const rows = [...witnessRows(drop)];
  expect(rows.map((row) => row.length)).toEqual([27, 27, 27]);
  const column = (name: string) => rows.map((row) => row[rows[0].indexOf(name)]);
  expect(column('differenceDb')).toEqual(['differenceDb', -6.52, -6.52]);
  expect(column('line')).toEqual(['line', 'L', 'N']);
  expect(column('adjustedP')).toEqual(['adjustedP', 2.5e-14, null]);
  expect(toCsv(rows)).toContain('charger-750,C2,4.1.0,230 V full load,0.15-0.5 MHz,L,AV');
});
