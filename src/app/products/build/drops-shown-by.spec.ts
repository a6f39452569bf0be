import type { DropSummary } from '@shared/contracts/drops';
import { dropsShownBy } from './drops-shown-by';

const sighting = (buildId: number, marginDb: number) => ({
  buildId,
  hardware: 'C2',
  firmware: `4.${buildId}`,
  differenceDb: marginDb - 5,
  marginDb,
  frequencyHz: 156_000,
  isOverLimit: marginDb < 0,
});
const drop = (id: number, seenIn: ReturnType<typeof sighting>[], state: DropSummary['state'] = 'new') =>
  ({ ...seenIn[0], id, state, seenIn, sentence: `Drop ${id}.` }) as DropSummary;

describe('dropsShownBy', () => {
  const drops = [
    drop(1, [sighting(16, 13.3)]),
    drop(2, [sighting(14, -1.6), sighting(16, -2.5)]),
    drop(3, [sighting(14, 6)]),
    drop(4, [sighting(16, -9)], 'withdrawn'),
  ];

  it('puts what is carried on from an earlier build first when it is graver, with the numbers of this build', () => {
    const shown = dropsShownBy(drops, 16);
    expect(shown.map(({ id }) => id)).toEqual([2, 1]);
    expect(shown[0]).toMatchObject({
      marginDb: -2.5,
      isOverLimit: true,
      sentence: 'Still there since C2 / 4.14. Drop 2.',
    });
  });

  it('shows a build its own drops in their own words', () => {
    expect(dropsShownBy(drops, 14).map(({ sentence }) => sentence)).toEqual(['Drop 2.', 'Drop 3.']);
  });
});
