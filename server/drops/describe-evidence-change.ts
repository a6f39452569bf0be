import type { DropEvidence } from '@shared/contracts/drops';
import { formatSignedDecibels } from '@shared/units/format-decibels';
import type { DropRow } from './drop-store';

type Judged = Pick<DropRow, 'sentence' | 'differenceDb'> & { readonly evidence: DropEvidence };

/**
 * Says what a reader should know of evidence that changed: another answer, other sweeps, another rule. Null when only
 * figures moved that follow from the rest of the build, such as the spread or the adjusted chance.
 */
export function describeEvidenceChange(before: Judged, now: Judged): string | null {
  const changes = [
    countChange('sweeps of this build', before.evidence.buildSweepIds, now.evidence.buildSweepIds),
    countChange('sweeps of the reference', before.evidence.referenceSweepIds, now.evidence.referenceSweepIds),
    witnessChange(before.evidence, now.evidence),
    ...ruleChanges(before.evidence, now.evidence),
  ].filter((change) => change !== null);
  if (changes.length === 0 && before.sentence === now.sentence) return null;
  const was = `${formatSignedDecibels(now.differenceDb)}, was ${formatSignedDecibels(before.differenceDb)}`;
  const why = changes.length > 0 ? ` (${changes.join('; ')})` : '';
  return `Judged again${why}: ${was}. ${now.sentence}`;
}

function countChange(what: string, before: readonly number[], now: readonly number[]): string | null {
  if (String(before) === String(now)) return null;
  return before.length === now.length ? `other ${what}` : `${now.length} ${what}, were ${before.length}`;
}

function witnessChange(before: DropEvidence, now: DropEvidence): string | null {
  const [then, later] = [before, now].map(({ witnesses }) =>
    witnesses
      .map(({ line, detector }) => `${line} ${detector}`)
      .sort()
      .join(', '),
  );
  return then === later ? null : `seen on ${later}, was ${then}`;
}

function ruleChanges(before: DropEvidence, now: DropEvidence): (string | null)[] {
  const changed = (what: string, pick: (evidence: DropEvidence) => string | number) =>
    pick(before) === pick(now) ? null : `${what} ${pick(now)}, was ${pick(before)}`;
  return [
    changed('limit', ({ limitSetKey, limitSetVersion }) => `${limitSetKey} version ${limitSetVersion}`),
    changed('threshold in dB', ({ thresholdDb }) => thresholdDb),
    changed('target margin in dB', ({ targetMarginDb }) => targetMarginDb),
    changed('method version', ({ methodVersion }) => methodVersion),
    changed('reference', ({ referenceBuilds }) =>
      referenceBuilds.map(({ hardware, firmware }) => `${hardware} / ${firmware}`).join(', '),
    ),
  ];
}
