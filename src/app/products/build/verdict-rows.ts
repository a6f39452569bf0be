import type { VerdictsView } from '@shared/contracts/judging';
import { DETECTORS } from '@shared/detectors/detectors';
import type { Verdict } from '@shared/judging/verdict';

export type BandVerdict = VerdictsView['verdicts'][number];

/** One band of one operating state with the series that were judged in it. */
export interface VerdictRow {
  id: string;
  state: string;
  band: string;
  verdict: Verdict;
  isOverLimit: boolean;
  /** The series the verdict rests on. */
  lead: BandVerdict;
  /** The series with the least margin left; undefined where nothing was measured. */
  tightest: BandVerdict | undefined;
  /** The lead first. */
  series: readonly BandVerdict[];
}

/** What must be looked at first comes first. */
const GRAVEST_FIRST: readonly Verdict[] = ['lost', 'cannotSay', 'gained', 'held'];

/** Bands x states in the order of the answer, each with its gravest verdict. */
export function verdictRows(verdicts: readonly BandVerdict[]): VerdictRow[] {
  const groups = new Map<string, BandVerdict[]>();
  for (const one of verdicts) {
    const id = JSON.stringify([one.state, one.band]);
    const group = groups.get(id);
    if (group) group.push(one);
    else groups.set(id, [one]);
  }
  return [...groups].map(([id, group]) => {
    const series = [...group].sort(byGravity);
    const [lead] = series;
    const binding = bindingSeries(series);
    return {
      id,
      state: lead.state,
      band: lead.band,
      verdict: lead.verdict,
      isOverLimit: binding.some(({ isOverLimit }) => isOverLimit),
      lead,
      tightest: least(binding),
      series,
    };
  });
}

/** PK is held against the QP line and can only overstate (common practice, no source): beside QP it never leads nor counts. */
function bindingSeries(series: readonly BandVerdict[]): BandVerdict[] {
  const hasQuasiPeak = (line: string) => series.some((one) => one.line === line && one.detector === 'QP');
  return series.filter(({ detector, line }) => detector !== 'PK' || !hasQuasiPeak(line));
}

function byGravity(a: BandVerdict, b: BandVerdict): number {
  return (
    GRAVEST_FIRST.indexOf(a.verdict) - GRAVEST_FIRST.indexOf(b.verdict) ||
    Number(a.detector === 'PK') - Number(b.detector === 'PK') ||
    (a.worstMarginDb ?? Infinity) - (b.worstMarginDb ?? Infinity) ||
    DETECTORS.indexOf(a.detector) - DETECTORS.indexOf(b.detector)
  );
}

function least(series: readonly BandVerdict[]): BandVerdict | undefined {
  return series
    .filter(({ worstMarginDb }) => worstMarginDb !== null)
    .reduce<BandVerdict | undefined>(
      (tightest, one) => ((one.worstMarginDb ?? 0) < (tightest?.worstMarginDb ?? Infinity) ? one : tightest),
      undefined,
    );
}

/** How many comparisons came to each verdict, the gravest first; none are left out. */
export function verdictCounts(verdicts: readonly BandVerdict[]): { verdict: Verdict; count: number }[] {
  return GRAVEST_FIRST.map((verdict) => ({
    verdict,
    count: verdicts.filter((one) => one.verdict === verdict).length,
  })).filter(({ count }) => count > 0);
}
