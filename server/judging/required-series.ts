import type { Detector, Line } from '@shared/detectors/detectors';
import type { BandJudgement } from '@shared/judging/band-judgement';
import type { RequiredSeries } from '@shared/judging/decide-gate';

export interface MeasurementPlan {
  /** Operating states every build must be measured in. */
  readonly stateNames: readonly string[];
  /** Lines the product is measured on. */
  readonly lines: readonly Line[];
  /** Bands of the QP and of the AV line of the limit plan. */
  readonly bands: Readonly<Record<'QP' | 'AV', readonly string[]>>;
}

/**
 * What must have been measured of a build before it may pass: both lines of the limit plan, in every required state and on
 * every line.
 *
 * A PK reading stands in for QP, for it can only overstate; where it clears the AV line as well, for AV too (common
 * practice, no source).
 *
 * @param judgements of the build; they say what was measured instead
 */
export function requiredSeries(plan: MeasurementPlan, judgements: readonly BandJudgement[]): RequiredSeries[] {
  return plan.stateNames.flatMap((stateName) =>
    plan.lines.flatMap((line) => {
      const measured = judgements.filter(
        (one) => one.stateName === stateName && one.line === line && one.worst !== null,
      );
      const peaks = measured.filter(({ detector }) => detector === 'PK');
      const has = (detector: Detector) => measured.some((one) => one.detector === detector);
      const quasiPeak: Detector = !has('QP') && peaks.length > 0 ? 'PK' : 'QP';
      const cleared = peaks
        .filter(({ remarks }) => remarks.some(({ code }) => code === 'clearsAverageLine'))
        .map(({ band }) => band);
      const averageBands = has('AV') ? plan.bands.AV : plan.bands.AV.filter((band) => !cleared.includes(band));
      return [
        { stateName, line, detector: quasiPeak, bands: plan.bands.QP },
        ...(averageBands.length > 0 ? [{ stateName, line, detector: 'AV' as const, bands: averageBands }] : []),
      ];
    }),
  );
}
