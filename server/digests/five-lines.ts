import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import type { DigestFacts } from './digest-facts';

/**
 * The five lines a digest opens with, enough to know whether to worry: where it is tightest, what dropped, what came
 * back, what creeps, what is not measured. Each is a whole sentence, also when there is nothing to say.
 */
export function fiveLines(facts: DigestFacts): string[] {
  return [tightest(facts), dropped(facts), recovered(facts), creeping(facts), unmeasured(facts)];
}

function tightest({ products }: DigestFacts): string {
  const measured = products.flatMap(({ name, targetMarginDb, latestBuild }) =>
    latestBuild?.worstMarginDb == null
      ? []
      : [{ name, targetMarginDb, latestBuild, marginDb: latestBuild.worstMarginDb }],
  );
  const [worst] = measured.sort((one, other) => one.marginDb - other.marginDb);
  if (worst === undefined) return 'No build of any product is measured yet.';
  const { latestBuild, marginDb, targetMarginDb } = worst;
  const where = latestBuild.worstFrequencyHz === null ? '' : ` at ${formatFrequency(latestBuild.worstFrequencyHz)}`;
  const build = `${worst.name} ${latestBuild.hardware} / ${latestBuild.firmware}`;
  if (marginDb < 0) return `Over the limit: ${build} is ${formatDecibels(-marginDb)} over${where}.`;
  const target =
    marginDb < targetMarginDb
      ? `under the target of ${formatDecibels(targetMarginDb)}`
      : `target ${formatDecibels(targetMarginDb)}`;
  return `Tightest: ${build} has ${formatDecibels(marginDb)} left${where} (${target}).`;
}

function dropped({ drops: { newOnes, older } }: DigestFacts): string {
  const open = older.length === 0 ? 'none is open from before' : `${counted(older.length, 'drop')} open from before`;
  if (newOnes.length === 0) return `Nothing dropped this week; ${open}.`;
  return `Dropped: ${counted(newOnes.length, 'new drop')} in ${names(newOnes.map(({ product }) => product))}; ${open}.`;
}

function recovered({ gains, drops: { ended } }: DigestFacts): string {
  if (gains.length === 0 && ended.length === 0) return 'Nothing gained margin or was closed this week.';
  const parts: string[] = [];
  const largest = gains
    .filter(({ differenceDb }) => differenceDb !== null)
    .sort((a, b) => (b.differenceDb ?? 0) - (a.differenceDb ?? 0))[0];
  if (largest?.differenceDb != null) {
    parts.push(
      `${largest.product} ${largest.hardware} / ${largest.firmware} gained up to ${formatSignedDecibels(largest.differenceDb)}`,
    );
  }
  if (ended.length > 0) parts.push(`${counted(ended.length, 'drop')} fixed or accepted`);
  return `Gained: ${parts.join('; ')}.`;
}

function creeping({ creep }: DigestFacts): string {
  const [worst] = [...creep].sort((one, other) => one.creep.slopeDbPerBuild - other.creep.slopeDbPerBuild);
  if (worst === undefined) return 'No slow loss is seen.';
  const slope = `${worst.creep.slopeDbPerBuild.toFixed(2)} dB a build`;
  return `Creeping: ${worst.product} loses margin in ${worst.band} (${worst.state}), ${slope}.`;
}

function unmeasured({ products }: DigestFacts): string {
  const missing = products.filter(({ unmeasuredStates }) => unmeasuredStates.length > 0);
  if (missing.length === 0) return 'Every required state of every newest build is measured.';
  return `Not measured: ${missing.map(({ name, unmeasuredStates }) => `${name} (${unmeasuredStates.join(', ')})`).join('; ')}.`;
}

function counted(number: number, noun: string): string {
  return `${number} ${noun}${number === 1 ? '' : 's'}`;
}

function names(all: readonly string[]): string {
  return [...new Set(all)].join(', ');
}
