import type { BandInput } from './build-input';
import type { Reason, Remark } from './band-judgement';
import { refuseRun } from './refuse-run';
import type { RunMargin } from './run-margin';
import { summariseSide, type Side } from './side';

type SideName = 'this build' | 'the reference';

/** Either two sides that may be compared, or why not. */
export type Comparison =
  | { readonly refused: readonly Reason[] }
  | { readonly build: Side; readonly reference: Side; readonly remarks: readonly Remark[] };

interface Sorted {
  readonly kept: RunMargin[];
  readonly leftOut: Reason[];
}

/** Keeps the sweeps for which `refuse` has no reason. */
function sort(sweeps: readonly RunMargin[], refuse: (sweep: RunMargin) => Reason | null): Sorted {
  const sorted: Sorted = { kept: [], leftOut: [] };
  for (const sweep of sweeps) {
    const reason = refuse(sweep);
    if (reason) sorted.leftOut.push(reason);
    else sorted.kept.push(sweep);
  }
  return sorted;
}

/** The same levels stored twice are one measurement: counting them twice would narrow the interval. */
function refuseRepeated(seenHashes: Set<string>): (sweep: RunMargin) => Reason | null {
  return ({ readingHash }) => {
    if (seenHashes.has(readingHash)) {
      return { code: 'staleTrace', text: 'its levels are identical to those of another sweep (stale trace)' };
    }
    seenHashes.add(readingHash);
    return null;
  };
}

function named(side: SideName, reasons: readonly Reason[]): Reason[] {
  const byCode = new Map(reasons.map((reason) => [reason.code, reason]));
  return [...byCode.values()].map(({ code, text }) => ({ code, text: `${side}: ${text}` }));
}

function remarkLeftOut(side: SideName, reasons: readonly Reason[]): Remark[] {
  if (reasons.length === 0) return [];
  const why = [...new Set(reasons.map(({ text }) => text))].join('; ');
  const sweeps = reasons.length === 1 ? '1 sweep' : `${reasons.length} sweeps`;
  return [{ code: 'runsLeftOut', text: `${side}: ${sweeps} left out: ${why}` }];
}

/**
 * Sorts out the sweeps of a band that may be compared.
 *
 * A sweep is left out when it was taken to another limit line, with an RBW outside CISPR band B, with unknown correction,
 * with part of the band missing, or when its levels repeat those of another sweep. The reference keeps the sweeps of the
 * correction state of the build. A side left empty refuses the comparison.
 *
 * @param band sweeps of both sides and of the previous build
 * @param limitLineKey limit line of the series
 * @returns both sides with a remark for what was left out, or the reasons of the refusal
 * Source: our own definition; levels of unlike correction, detector, line or bandwidth differ without any change of the product.
 */
export function comparableSides(band: BandInput, limitLineKey: string): Comparison {
  if (band.build.length === 0) {
    return { refused: [{ code: 'notMeasured', text: 'this build was not measured in this series and band' }] };
  }
  const byTime = (sweeps: readonly RunMargin[]) => [...sweeps].sort((a, b) => a.takenAt - b.takenAt);
  const ownFault = (sweep: RunMargin) => refuseRun(sweep, limitLineKey);
  const earlierHashes = new Set([...band.reference, ...band.previous].map(({ readingHash }) => readingHash));

  const sound = sort(byTime(band.build), ownFault);
  const fresh = sort(sound.kept, refuseRepeated(earlierHashes));
  const buildLeftOut = [...sound.leftOut, ...fresh.leftOut];
  if (fresh.kept.length === 0) return { refused: named('this build', buildLeftOut) };
  const correction = fresh.kept[0].correction;
  if (fresh.kept.some((sweep) => sweep.correction !== correction)) {
    const text = 'this build: some sweeps hold corrected levels, others do not';
    return { refused: [{ code: 'correctionDiffers', text }] };
  }

  if (band.reference.length === 0) {
    return {
      refused: [{ code: 'noReference', text: 'there is no earlier measurement of this series to compare with' }],
    };
  }
  const soundReference = sort(byTime(band.reference), ownFault);
  const alike = sort(soundReference.kept, (sweep) =>
    sweep.correction === correction
      ? null
      : {
          code: 'correctionDiffers',
          text: `levels are ${correction === 'none' ? '' : 'not '}corrected, those of this build are${correction === 'none' ? ' not' : ''}`,
        },
  );
  const distinct = sort(alike.kept, refuseRepeated(new Set()));
  const referenceLeftOut = [...soundReference.leftOut, ...alike.leftOut, ...distinct.leftOut];
  if (distinct.kept.length === 0) return { refused: named('the reference', referenceLeftOut) };

  return {
    build: summariseSide(fresh.kept),
    reference: summariseSide(distinct.kept),
    remarks: [...remarkLeftOut('this build', buildLeftOut), ...remarkLeftOut('the reference', referenceLeftOut)],
  };
}
