import type { Detector } from '@shared/detectors/detectors';
import { formatDecibels } from '@shared/units/format-decibels';
import type { Reason, Remark } from './band-judgement';
import type { Side } from './side';
import type { Verdict } from './verdict';

export interface Evidence {
  readonly build: Side;
  readonly reference: Side;
  readonly buildMask: Reason | null;
  readonly referenceMask: Reason | null;
  readonly verdict: Verdict;
  readonly detector: Detector;
}

function singleRun({ build, reference }: Evidence): Remark[] {
  const single = [build.runCount === 1 && 'this build', reference.runCount === 1 && 'the reference'].filter(Boolean);
  return single.length === 0 ? [] : [{ code: 'singleRun', text: `single run of ${single.join(' and of ')}` }];
}

/** A masked level is an upper bound: a loss against a masked reference, or a gain into the mask, is at least this large. */
function maskedBound({ buildMask, referenceMask, verdict }: Evidence): Remark[] {
  if (verdict === 'gained' && buildMask) {
    return [{ code: 'buildMasked', text: `the gain is at least this large: this build is ${buildMask.text}` }];
  }
  if (verdict === 'lost' && referenceMask) {
    return [
      { code: 'referenceMasked', text: `the loss is at least this large: the reference is ${referenceMask.text}` },
    ];
  }
  return [];
}

function missingBackground({ build, verdict }: Evidence): Remark[] {
  const isMissing = verdict === 'lost' && build.sweeps.every(({ backgroundLevelDbuv }) => backgroundLevelDbuv === null);
  return isMissing ? [{ code: 'noBackground', text: 'no background was measured with this build' }] : [];
}

/** A peak reading can only overstate, so a PK sweep under the AV line meets both. */
function clearsAverageLine({ build, detector }: Evidence): Remark[] {
  if (detector !== 'PK') return [];
  const margins = build.sweeps.map(({ averageLineMarginDb }) => averageLineMarginDb ?? null);
  const known = margins.filter((marginDb) => marginDb !== null);
  if (known.length < margins.length || known.some((marginDb) => marginDb < 0)) return [];
  return [
    {
      code: 'clearsAverageLine',
      text: `the PK level clears the AV line too, by ${formatDecibels(Math.min(...known))}`,
    },
  ];
}

/** Remarks on what a judgement rests on. None of them changes it. */
export function remarkEvidence(evidence: Evidence): Remark[] {
  return [
    ...singleRun(evidence),
    ...maskedBound(evidence),
    ...missingBackground(evidence),
    ...clearsAverageLine(evidence),
  ];
}
