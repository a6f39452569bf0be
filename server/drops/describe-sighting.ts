import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import type { SightedLoss } from './sighting-store';

type Figures = Pick<SightedLoss, 'differenceDb' | 'marginDb'>;

/** How a build that shows a drop stands to the builds around it. */
export type SightingKind = 'Still there' | 'There again' | 'Already there' | 'No longer seen';

/** "Still there in C2 / 4.1.0: -6.9 dB, 2.5 dB over the limit." */
export function describeSighting(kind: SightingKind, build: string, now: Figures, before?: Figures): string {
  const was = before ? `; was ${figures(before)}` : '';
  return `${kind} in ${build}: ${figures(now)}${was}.`;
}

function figures({ differenceDb, marginDb }: Figures): string {
  return `${formatSignedDecibels(differenceDb)}, ${marginLeft(marginDb)}`;
}

function marginLeft(marginDb: number): string {
  if (marginDb >= 0) return `${formatDecibels(marginDb)} left to the limit`;
  // Rounded to 0.1 dB a margin of -0.04 dB would read "0.0 dB over".
  return marginDb > -0.05 ? 'just over the limit' : `${formatDecibels(-marginDb)} over the limit`;
}
