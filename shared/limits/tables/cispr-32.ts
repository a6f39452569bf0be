import type { LimitSet } from '../limit-set';

const EDITION = 'CISPR 32:2015+A1:2019';
const NOTE = 'Check against your edition of the standard';

/** Mains port, class A. */
export const CISPR32_A: LimitSet = {
  key: 'CISPR32_A',
  version: 1,
  title: 'CISPR 32 class A, AC mains port',
  source: 'CISPR 32 Table A.9; the same values in EN 55032 class A and 47 CFR 15.107(b)',
  edition: EDITION,
  note: NOTE,
  lines: [
    {
      detector: 'QP',
      segments: [
        { fromHz: 150_000, toHz: 500_000, fromDbuv: 79, toDbuv: 79 },
        { fromHz: 500_000, toHz: 30_000_000, fromDbuv: 73, toDbuv: 73 },
      ],
    },
    {
      detector: 'AV',
      segments: [
        { fromHz: 150_000, toHz: 500_000, fromDbuv: 66, toDbuv: 66 },
        { fromHz: 500_000, toHz: 30_000_000, fromDbuv: 60, toDbuv: 60 },
      ],
    },
  ],
};

/** Mains port, class B. */
export const CISPR32_B: LimitSet = {
  key: 'CISPR32_B',
  version: 1,
  title: 'CISPR 32 class B, AC mains port',
  source: 'CISPR 32 Table A.10; the same values in EN 55032 class B, 47 CFR 15.107(a) and 15.207(a)',
  edition: EDITION,
  note: NOTE,
  lines: [
    {
      detector: 'QP',
      segments: [
        { fromHz: 150_000, toHz: 500_000, fromDbuv: 66, toDbuv: 56 },
        { fromHz: 500_000, toHz: 5_000_000, fromDbuv: 56, toDbuv: 56 },
        { fromHz: 5_000_000, toHz: 30_000_000, fromDbuv: 60, toDbuv: 60 },
      ],
    },
    {
      detector: 'AV',
      segments: [
        { fromHz: 150_000, toHz: 500_000, fromDbuv: 56, toDbuv: 46 },
        { fromHz: 500_000, toHz: 5_000_000, fromDbuv: 46, toDbuv: 46 },
        { fromHz: 5_000_000, toHz: 30_000_000, fromDbuv: 50, toDbuv: 50 },
      ],
    },
  ],
};
