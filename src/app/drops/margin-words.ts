import { formatDecibels } from '@shared/units/format-decibels';

/** "1.4 dB left", "2.5 dB over the limit"; compared before rounding, so that -0.04 dB is never "0.0 dB left". */
export function marginWords(marginDb: number): string {
  if (marginDb >= 0) return `${formatDecibels(marginDb)} left`;
  return marginDb > -0.05 ? 'just over the limit' : `${formatDecibels(-marginDb)} over the limit`;
}

/** How the margin stands to the target: "5.5 dB short of the target of 3.0 dB". */
export function targetWords(marginDb: number, targetMarginDb: number): string {
  const target = `the target of ${formatDecibels(targetMarginDb)}`;
  const spareDb = marginDb - targetMarginDb;
  if (spareDb < 0) return `${spareDb > -0.05 ? 'just' : formatDecibels(-spareDb)} short of ${target}`;
  return `${formatDecibels(spareDb)} above ${target}`;
}
