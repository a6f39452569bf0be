import type { ProductSummary } from '@shared/contracts/products';
import { byUrgency, urgencyOf } from './attention';
import { attentionWords, overviewSentence } from './attention-words';

type Latest = NonNullable<ProductSummary['latestBuild']>;

function product(name: string, latest: Partial<Latest> | null, other: Partial<ProductSummary> = {}): ProductSummary {
  return {
    key: name,
    name,
    team: 'charging',
    teamName: 'Charging',
    isShared: false,
    limitSetKey: 'CISPR32_B',
    targetMarginDb: 3,
    buildCount: latest === null ? 0 : 1,
    latestBuild: latest && {
      id: 1,
      hardware: 'C2',
      firmware: '4.1.0',
      builtAt: '2026-11-26T05:00:00.000Z',
      worstMarginDb: 8,
      worstFrequencyHz: 156_043,
      verdict: 'held',
      changeDb: null,
      ...latest,
    },
    previousWorstMarginDb: null,
    openDrops: 0,
    unmeasuredStates: [],
    trend: [],
    ...other,
  };
}

describe('urgency of a product', () => {
  it('puts over the limit before below target before lost before unmeasured before quiet, then the least spare margin', () => {
    const sorted = byUrgency([
      product('quiet', {}),
      product('unmeasured', { worstMarginDb: null }),
      product('lost much, much left', { worstMarginDb: 14, verdict: 'lost' }, { openDrops: 1 }),
      product('below its own target', { worstMarginDb: 4 }, { targetMarginDb: 6 }),
      product('nearly nothing left', { worstMarginDb: 0.4 }),
      product('over', { worstMarginDb: -0.1 }),
      product('quiet but closer', { worstMarginDb: 3.2 }),
    ]);
    expect(sorted.map(({ name }) => name)).toEqual([
      'over',
      'nearly nothing left',
      'below its own target',
      'lost much, much left',
      'unmeasured',
      'quiet but closer',
      'quiet',
    ]);
  });

  it('asks about a required state that was not measured', () => {
    expect(urgencyOf(product('a', {}, { unmeasuredStates: ['120 V'] }))).toBe('openQuestion');
  });
});

describe('a latest build that nobody measured', () => {
  const unmeasured = product('a', { worstMarginDb: null, worstFrequencyHz: null }, { previousWorstMarginDb: -2.5 });

  it('hides nothing of how the last measured build stood', () => {
    expect(urgencyOf(unmeasured)).toBe('over');
    expect(attentionWords(unmeasured)).toBe(
      'build C2 / 4.1.0 is not measured, the last measured build: 2.5 dB over the limit',
    );
  });
});

describe('words of the overview', () => {
  it('says how far over the limit, where, and how many drops are open', () => {
    expect(attentionWords(product('a', { worstMarginDb: -2.4997 }, { openDrops: 9 }))).toBe(
      '2.5 dB over the limit at 156 kHz; 9 open drops',
    );
  });

  it('never calls a margin below zero 0.0 dB', () => {
    expect(attentionWords(product('a', { worstMarginDb: -0.02 }))).toBe('just over the limit at 156 kHz');
  });

  it('names the target only where the margin is below it', () => {
    expect(attentionWords(product('a', { worstMarginDb: 1.42 }))).toBe(
      '1.4 dB left to the limit at 156 kHz, below the target of 3.0 dB',
    );
    expect(attentionWords(product('a', { worstMarginDb: 5 }, { unmeasuredStates: ['120 V', 'idle'] }))).toBe(
      '5.0 dB left to the limit at 156 kHz; not measured in 120 V, idle',
    );
  });

  it.each([
    [[product('a', {})], 'The product keeps its target margin, and no drop is open.'],
    [[product('a', {}), product('b', {})], 'All 2 products keep their target margin, and no drop is open.'],
    [
      [product('a', { worstMarginDb: -1 }), product('b', { worstMarginDb: 1 }), product('c', {})],
      '2 of 3 products need attention: 1 of them is over the limit.',
    ],
    [[product('a', { worstMarginDb: -1 }), product('b', {})], '1 of 2 products needs attention: it is over the limit.'],
    [
      [product('a', { worstMarginDb: null }), product('b', {})],
      'Nothing measured falls below its target. 1 has states or builds still to be measured.',
    ],
  ])('sums up %#', (products, sentence) => {
    expect(overviewSentence(products)).toBe(sentence);
  });
});
