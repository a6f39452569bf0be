import { DROP_STATE_WORDS } from '@shared/contracts/drop-states';
import type { DropView } from '@shared/contracts/drops';
import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import { formatChance } from './format-chance';
import { leadWitness } from './lead-witness';
import { marginWords, targetWords } from './margin-words';
import { buildName, standingWords } from './sighting-words';

export const QUESTIONS = [
  { id: 'real', question: 'Is it real?' },
  { id: 'where', question: 'Where?' },
  { id: 'left', question: 'How much is left?' },
  { id: 'changed', question: 'What changed?' },
  { id: 'acts', question: 'Who acts?' },
] as const;

export interface Answer {
  id: (typeof QUESTIONS)[number]['id'];
  question: string;
  /** What a lead repeats, and what stands behind it. */
  short: string;
  more: string;
}

/** The five questions everybody asks of a drop, in the order they ask them, each answered in a few words. */
export function fiveAnswers(drop: DropView): Answer[] {
  const answers = [realAnswer(drop), whereAnswer(drop), leftAnswer(drop), changedAnswer(drop), actsAnswer(drop)];
  return QUESTIONS.map((question, i) => ({ ...question, ...answers[i] }));
}

type Words = Pick<Answer, 'short' | 'more'>;

function realAnswer(drop: DropView): Words {
  const { judgement } = leadWitness(drop);
  const chance =
    judgement.adjustedP === null ? '' : `, chance of it by spread alone ${formatChance(judgement.adjustedP)}`;
  const differing = drop.evidence.setUp.filter(({ isDifferent }) => isDifferent).map(({ what }) => what);
  const setUp = differing.length === 0 ? 'set-up alike' : `set-up differs: ${differing.join(', ')}`;
  const runs = judgement.singleRun
    ? 'rests on a single run'
    : `${judgement.buildRuns} runs against ${judgement.referenceRuns}`;
  return { short: `${formatDecibels(-drop.differenceDb)} lost${chance}`, more: `${capital(runs)}, ${setUp}` };
}

function whereAnswer(drop: DropView): Words {
  const { line, detector } = leadWitness(drop);
  const { harmonic } = drop.evidence;
  const place = harmonic === null ? 'No single harmonic fits' : `${harmonic.stage} n=${harmonic.order}`;
  return {
    short: `${formatFrequency(drop.frequencyHz)} on ${line} (${detector})`,
    more: `${place}, ${drop.operatingState}`,
  };
}

/** What is left now: in the newest build that shows the loss, which need not be the one that raised the drop. */
function leftAnswer(drop: DropView): Words {
  const { latest, noLongerSeenIn, evidence } = drop;
  if (noLongerSeenIn !== null) {
    return { short: standingWords(drop), more: `${capital(marginWords(latest.marginDb))} in ${buildName(latest)}` };
  }
  return {
    short: latest.buildId === drop.buildId ? capital(marginWords(latest.marginDb)) : standingWords(drop),
    more: capital(targetWords(latest.marginDb, evidence.targetMarginDb)),
  };
}

function changedAnswer(drop: DropView): Words {
  const { changes } = drop.evidence;
  // A switching frequency or its spreading explains more than the name of a revision.
  const first = changes.find(({ what }) => /switching frequency|frequency spreading/.test(what)) ?? changes[0];
  if (first === undefined) return { short: 'Nothing was declared', more: `Build ${buildName(drop)}` };
  const others = changes.filter((change) => change !== first).map(({ what }) => what);
  return {
    short: `${capital(first.what)} ${first.before} to ${first.now}`,
    more: others.length === 0 ? 'Nothing else was declared' : `Also: ${others.join(', ')}`,
  };
}

function actsAnswer(drop: DropView): Words {
  return {
    short: drop.owner?.name ?? 'Nobody yet',
    more: capital(drop.fixedBy ? `fixed, shown by ${buildName(drop.fixedBy)}` : DROP_STATE_WORDS[drop.state]),
  };
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
