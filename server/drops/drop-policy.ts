import { DROP_STATE_WORDS, type DropMove, type DropState, type DropWitness } from '@shared/contracts/drops';
import type { BandJudgement } from '@shared/judging/band-judgement';
import { USABLE_REASONS } from '@shared/judging/choose-reference';
import { formatDecibels } from '@shared/units/format-decibels';

type MoveTarget = DropMove['state'];

/** Where a drop may go from a state. `new` and `withdrawn` are the job's to give. */
const MOVES: Record<DropState, readonly MoveTarget[]> = {
  new: ['checking', 'causeKnown', 'fixed', 'accepted'],
  checking: ['causeKnown', 'fixed', 'accepted'],
  causeKnown: ['checking', 'fixed', 'accepted'],
  fixed: ['checking'],
  accepted: ['checking'],
  withdrawn: [],
};

export function movesFrom(state: DropState): readonly MoveTarget[] {
  return MOVES[state];
}

/** Why a drop may not be moved like this, in one line; null when it may. Whether a fix shows is `fixFault`'s to say. */
export function moveFault(from: DropState, { state: to, note, fixedByBuildId }: DropMove): string | null {
  if (!MOVES[from].includes(to)) {
    return `a drop that is ${DROP_STATE_WORDS[from]} cannot become ${DROP_STATE_WORDS[to]}`;
  }
  if (to === 'accepted' && note === '') return 'note: to accept a drop needs a reason';
  if ((from === 'fixed' || from === 'accepted') && note === '') return 'note: to reopen a drop needs a reason';
  if (to === 'fixed' && fixedByBuildId === undefined) return 'fixedByBuildId: fixed must name the build that shows it';
  return null;
}

/** A build that may have the margin back. */
interface LaterBuild {
  readonly name: string;
  readonly judgements: readonly BandJudgement[];
}

/** A build named as the one that shows the fix. */
export interface FixingBuild extends LaterBuild {
  /** Newest build that shows the loss. */
  readonly lastSeenIn: string;
  readonly isNewer: boolean;
  readonly isStale: boolean;
}

interface Place {
  readonly stateId: number;
  readonly band: string;
}

/**
 * Why a build does not show that a drop is fixed, in one line; null when it does. It must be judged, newer than every build that
 * shows the loss, and have the margin back.
 */
export function fixFault(place: Place, witnesses: readonly DropWitness[], fix: FixingBuild): string | null {
  if (!fix.isNewer) return `build ${fix.name} is not newer than ${fix.lastSeenIn}, which shows the loss`;
  if (fix.isStale) return `build ${fix.name} has sweeps that are not judged yet: judge it first`;
  return lossFault(place, witnesses, fix);
}

/**
 * Why a build does not show that a loss is gone, in one line; null when it does.
 *
 * It must be measured in every series that lost, not lost there itself, and nearer to the margin before the loss than to the
 * margin with it: compared with builds that all have the loss, one that still has it would be "held".
 */
export function lossFault(place: Place, witnesses: readonly DropWitness[], later: LaterBuild): string | null {
  for (const witness of witnesses) {
    const fault = seriesFault(place, witness, later);
    if (fault !== null) return fault;
  }
  return null;
}

function seriesFault(
  { stateId, band }: Place,
  { line, detector, judgement: lost }: DropWitness,
  fix: LaterBuild,
): string | null {
  const where = `${lost.stateName}, ${line} ${detector}, ${band}`;
  const now = fix.judgements.find(
    (one) => one.stateId === stateId && one.band === band && one.line === line && one.detector === detector,
  );
  if (now === undefined || now.meanMarginDb === null) return `build ${fix.name} was not measured in ${where}`;
  if (now.verdict === 'lost') return `build ${fix.name} is itself judged lost in ${where}`;
  const stop = now.reasons.find(({ code }) => !USABLE_REASONS.includes(code));
  if (stop !== undefined) return `build ${fix.name} cannot show it in ${where}: ${stop.text}`;
  const beforeDb = lost.referenceMeanMarginDb ?? Infinity;
  const withLossDb = lost.meanMarginDb ?? beforeDb;
  if (now.meanMarginDb * 2 >= beforeDb + withLossDb) return null;
  const figures = `${formatDecibels(now.meanMarginDb)} of margin, ${formatDecibels(withLossDb)} with the loss, ${formatDecibels(beforeDb)} before it`;
  return `build ${fix.name} still has the loss in ${where}: ${figures}`;
}
