import type { ProductSummary } from '@shared/contracts/products';
import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import { type Urgency, urgencyOf } from './attention';

/** What a lead can repeat about one product: "2.5 dB over the limit at 156 kHz; 9 open drops". */
export function attentionWords(product: ProductSummary): string {
  const { latestBuild, openDrops, unmeasuredStates } = product;
  if (latestBuild === null) return 'no build yet';
  const parts = [
    marginWords(product),
    openDrops > 0 ? `${openDrops} open ${openDrops === 1 ? 'drop' : 'drops'}` : '',
    latestBuild.worstMarginDb !== null && unmeasuredStates.length > 0
      ? `not measured in ${unmeasuredStates.join(', ')}`
      : '',
  ];
  return parts.filter(Boolean).join('; ');
}

function marginWords(product: ProductSummary): string {
  const { latestBuild, previousWorstMarginDb, targetMarginDb } = product;
  if (latestBuild === null) return '';
  const { hardware, firmware, worstMarginDb, worstFrequencyHz } = latestBuild;
  if (worstMarginDb !== null) return reachWords(worstMarginDb, worstFrequencyHz, targetMarginDb);
  const before =
    previousWorstMarginDb === null
      ? ''
      : `, the last measured build: ${reachWords(previousWorstMarginDb, null, targetMarginDb)}`;
  return `build ${hardware} / ${firmware} is not measured${before}`;
}

function reachWords(marginDb: number, frequencyHz: number | null, targetMarginDb: number): string {
  const place = frequencyHz === null ? '' : ` at ${formatFrequency(frequencyHz)}`;
  // Rounded to 0.1 dB a margin of -0.04 dB would read "0.0 dB" though the limit is exceeded.
  if (marginDb < 0) return `${marginDb > -0.05 ? 'just' : formatDecibels(-marginDb)} over the limit${place}`;
  const left = `${formatDecibels(marginDb)} left to the limit${place}`;
  return marginDb < targetMarginDb ? `${left}, below the target of ${formatDecibels(targetMarginDb)}` : left;
}

const NEED_ATTENTION: readonly Urgency[] = ['over', 'belowTarget', 'lost'];

export function needsAttention(product: ProductSummary): boolean {
  return NEED_ATTENTION.includes(urgencyOf(product));
}

/** The one sentence at the top of the overview. */
export function overviewSentence(products: readonly ProductSummary[]): string {
  const count = products.length;
  const noun = count === 1 ? 'product' : 'products';
  const urgent = products.filter(needsAttention).length;
  const over = products.filter((product) => urgencyOf(product) === 'over').length;
  const open = products.filter((product) => urgencyOf(product) === 'openQuestion').length;
  if (urgent > 0) {
    const which =
      count === 1 ? 'The product needs' : `${urgent} of ${count} ${noun} ${urgent === 1 ? 'needs' : 'need'}`;
    return `${which} attention${overWords(over, urgent)}.`;
  }
  if (open > 0) {
    const which = open === count ? (count === 1 ? 'It has' : 'All have') : `${open} ${open === 1 ? 'has' : 'have'}`;
    return `Nothing measured falls below its target. ${which} states or builds still to be measured.`;
  }
  return count === 1
    ? 'The product keeps its target margin, and no drop is open.'
    : `All ${count} products keep their target margin, and no drop is open.`;
}

function overWords(over: number, urgent: number): string {
  if (over === 0) return '';
  if (over < urgent) return `: ${over} of them ${over === 1 ? 'is' : 'are'} over the limit`;
  return over === 1 ? ': it is over the limit' : ': all of them are over the limit';
}
