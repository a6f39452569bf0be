import { CISPR32_A, CISPR32_B } from '@shared/limits/tables/cispr-32';
import type { LimitSetView } from '@shared/contracts/limits';
import { namedLines } from './named-lines';

// JSON of the interface has plain arrays.
const sets = JSON.parse(JSON.stringify([CISPR32_B, CISPR32_A])) as LimitSetView[];
const writtenAt = (rightEndHz: number) => namedLines(sets, rightEndHz).map(({ written }) => written);

describe('namedLines', () => {
  it('writes one name where two lines lie on each other: class B QP and class A AV, 60 dBuV above 5 MHz', () => {
    // CISPR 32 tables A.9 and A.10.
    expect(writtenAt(30e6)).toEqual([
      'CISPR 32 class B, QP and CISPR 32 class A, AV',
      'CISPR 32 class B, AV',
      'CISPR 32 class A, QP',
      '',
    ]);
  });

  it('names each line by itself all the same', () => {
    expect(namedLines(sets, 30e6).map(({ name }) => name)).toEqual([
      'CISPR 32 class B, QP',
      'CISPR 32 class B, AV',
      'CISPR 32 class A, QP',
      'CISPR 32 class A, AV',
    ]);
  });

  it('tells them apart where they part', () => {
    expect(writtenAt(2e6)).not.toContain('');
  });
});
