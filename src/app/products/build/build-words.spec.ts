import type { BuildView } from '@shared/contracts/builds';
import type { DropSummary } from '@shared/contracts/drops';
import type { VerdictsView } from '@shared/contracts/judging';
import type { BandJudgement } from '@shared/judging/band-judgement';
import { buildAnswer, marginSentence, mostUseful } from './build-answer';
import { changeRows } from './build-changes';
import { ProbabilityPipe } from './probability';
import { type BandVerdict, verdictCounts, verdictRows } from './verdict-rows';

function band(
  other: Partial<Omit<BandVerdict, 'judgement'>> = {},
  judgement: Partial<BandJudgement> = {},
): BandVerdict {
  return {
    state: 'full load',
    line: 'L',
    detector: 'QP',
    band: '0.15-0.5 MHz',
    verdict: 'held',
    isOverLimit: false,
    differenceDb: 0.1,
    worstMarginDb: 5,
    worstFrequencyHz: 156_000,
    ...other,
    judgement: { thresholdDb: 2, reasons: [], settles: [], ...judgement } as unknown as BandJudgement,
  };
}

function judged(verdicts: BandVerdict[], other: Partial<VerdictsView> = {}): VerdictsView {
  return {
    referenceKind: 'chosen',
    referenceBuilds: [{ id: 11, hardware: 'C2', firmware: '3.6.2' }],
    verdicts,
    ...other,
  } as VerdictsView;
}

const measured = { sweepCount: 18 };

describe('the answer a build opens with', () => {
  it('says that nothing was measured, or not judged yet, before anything else', () => {
    expect(buildAnswer({ sweepCount: 0 }, judged([]), [])).toBe('Nothing was measured on this build.');
    expect(buildAnswer(measured, judged([]), [])).toContain('Not judged yet');
  });

  it("repeats the gravest drop's sentence", () => {
    const drops = [{ sentence: 'Firmware 4.1.0 lost 6.5 dB.' }, { sentence: 'Another.' }] as DropSummary[];
    expect(buildAnswer(measured, judged([band({ verdict: 'lost' })]), drops)).toBe('Firmware 4.1.0 lost 6.5 dB.');
  });

  it('describes the largest loss where no drop stands for it', () => {
    const verdicts = [
      band({ verdict: 'lost', differenceDb: -2.2 }),
      band({ verdict: 'lost', differenceDb: -6.52, line: 'N' }),
    ];
    expect(buildAnswer(measured, judged(verdicts), [])).toBe(
      'Lost 6.5 dB in 0.15-0.5 MHz on N (QP, full load) against C2 / 3.6.2.',
    );
  });

  it('puts a loss before a gain and a gain before what cannot be decided', () => {
    const open = band({ verdict: 'cannotSay' });
    const gained = band({ verdict: 'gained', differenceDb: 5.04 });
    expect(buildAnswer(measured, judged([open, gained, band({ verdict: 'lost', differenceDb: -3 })]), [])).toMatch(
      /^Lost 3.0 dB/,
    );
    expect(buildAnswer(measured, judged([open, gained]), [])).toMatch(/^Gained 5.0 dB/);
  });

  it('says held only when every comparison held', () => {
    expect(buildAnswer(measured, judged([band(), band({ line: 'N' })]), [])).toBe(
      'No change of 2.0 dB or more against C2 / 3.6.2, in 2 comparisons.',
    );
    expect(buildAnswer(measured, judged([band(), band({ verdict: 'cannotSay' })]), [])).toBe(
      'Nothing lost, but 1 of 2 comparisons against C2 / 3.6.2 cannot be decided.',
    );
  });

  it('names a pooled reference by how many builds it holds', () => {
    const pooled = {
      referenceKind: 'pooled' as const,
      referenceBuilds: [1, 2].map((id) => ({ id, hardware: 'C', firmware: `${id}` })),
    };
    expect(buildAnswer(measured, judged([band()], pooled), [])).toContain('2 builds judged held, pooled');
  });

  it('tells a first build from one that could not be compared', () => {
    const refused = (code: 'noReference' | 'rbwOutOfTolerance') =>
      band({ verdict: 'cannotSay', differenceDb: null }, { reasons: [{ code, text: '' }] });
    expect(buildAnswer(measured, judged([refused('noReference')]), [])).toContain('no build to compare with yet');
    expect(buildAnswer(measured, judged([refused('rbwOutOfTolerance')]), [])).toContain('No band could be compared');
  });
});

describe('the margin left', () => {
  it.each([
    [-2.4997, '2.5 dB over the limit at 156 kHz.'],
    [-0.02, 'Just over the limit at 156 kHz.'],
    [1.42, '1.4 dB left to the limit at 156 kHz, below the target of 3.0 dB.'],
    [3, '3.0 dB left to the limit at 156 kHz, at or above the target of 3.0 dB.'],
  ])('is said for %d dB', (marginDb, words) => {
    expect(marginSentence(marginDb, 156_043, 3)).toBe(words);
  });

  it('is not said where nothing was measured', () => {
    expect(marginSentence(null, null, 3)).toBeNull();
  });
});

describe('what settles most', () => {
  it('is what stands first for most of what cannot be said', () => {
    const open = (settles: string[]) => band({ verdict: 'cannotSay' }, { settles });
    const verdicts = [
      open(['two more runs of this build']),
      open(['two more runs of this build', 'x']),
      open(['x']),
      band(),
    ];
    expect(mostUseful(verdicts)).toEqual({ words: 'two more runs of this build', count: 2 });
    expect(mostUseful([band()])).toBeNull();
  });
});

describe('verdicts by state and band', () => {
  const verdicts = [
    band({ detector: 'PK', verdict: 'lost', worstMarginDb: -4, isOverLimit: true }),
    band({ detector: 'QP', verdict: 'lost', worstMarginDb: 1 }),
    band({ detector: 'AV', verdict: 'held', worstMarginDb: 0.5 }),
    band({ band: '5-30 MHz', verdict: 'held' }),
    band({ band: '5-30 MHz', line: 'N', verdict: 'gained' }),
  ];

  it('rests on the gravest series, and on QP before PK', () => {
    const [low, high] = verdictRows(verdicts);
    expect([low.verdict, low.lead.detector]).toEqual(['lost', 'QP']);
    expect([high.verdict, high.lead.line]).toEqual(['gained', 'N']);
  });

  it('takes the least margin from what counts against the limit, whatever its verdict', () => {
    const [low] = verdictRows(verdicts);
    expect(low.tightest?.detector).toBe('AV');
    expect(low.isOverLimit).toBe(false);
  });

  it('lets PK count where QP was not measured on the line', () => {
    const [row] = verdictRows([band({ detector: 'PK', worstMarginDb: -4, isOverLimit: true })]);
    expect(row.isOverLimit).toBe(true);
  });

  it('counts every comparison once, the gravest verdict first', () => {
    expect(verdictCounts(verdicts)).toEqual([
      { verdict: 'lost', count: 2 },
      { verdict: 'gained', count: 1 },
      { verdict: 'held', count: 2 },
    ]);
  });
});

describe('what was changed', () => {
  const build = (other: Partial<BuildView>): BuildView =>
    ({
      hardware: 'C2',
      firmware: '3.6.2',
      commit: '',
      hardwareNotes: '',
      firmwareNotes: '',
      switching: [],
      parameters: [],
      ...other,
    }) as BuildView;

  it('stands side by side and tells what differs', () => {
    const rows = changeRows([
      build({ switching: [{ stage: 'PFC', frequencyHz: 65e3, spreadPercent: 0 }] }),
      build({
        firmware: '4.0.0',
        commit: '71b6ce43',
        firmwareNotes: 'PFC faster.',
        switching: [{ stage: 'PFC', frequencyHz: 78e3, spreadPercent: 4 }],
        parameters: [{ name: 'dead time', value: '180 ns' }],
      }),
    ]);
    expect(rows.map(({ what, cells, isDifferent }) => [what, ...cells.map(({ text }) => text), isDifferent])).toEqual([
      ['Hardware', 'C2', 'C2', false],
      ['Firmware', '3.6.2', '4.0.0', true],
      ['PFC switching', '65 kHz', '78 kHz, spread 4 %', true],
      ['dead time', 'not declared', '180 ns', true],
    ]);
    expect(rows[1].cells[1].note).toBe('commit 71b6ce43: PFC faster.');
  });
});

describe('a probability for people', () => {
  it.each([
    [0.022653, '0.023'],
    [2.7686e-14, '2.8e-14'],
    [1, '1'],
    [null, ''],
  ])('writes %s as "%s"', (p, text) => {
    expect(new ProbabilityPipe().transform(p)).toBe(text);
  });
});
