import type { BuildSummary } from '@shared/contracts/builds';
import { fixCandidates } from './fix-candidates';

const build = (id: number, position: number, given: Partial<BuildSummary> = {}) =>
  ({
    id,
    position,
    hardware: 'C2',
    firmware: `4.${id}`,
    sweepCount: 6,
    verdict: 'held',
    isStale: false,
    worstMarginDb: 5.14,
    ...given,
  }) as BuildSummary;

it('offers measured builds after the one that lost, the newest first, with how they stand', () => {
  const builds = [
    build(1, 0),
    build(2, 1),
    build(3, 2, { sweepCount: 0 }),
    build(4, 3, { verdict: 'lost', worstMarginDb: -1.2 }),
    build(5, 4, { isStale: true }),
  ];
  expect(fixCandidates(builds, 2)).toEqual([
    { id: 5, words: 'C2 / 4.5: not judged yet, 5.1 dB left' },
    { id: 4, words: 'C2 / 4.4: lost, 1.2 dB over the limit' },
  ]);
});
