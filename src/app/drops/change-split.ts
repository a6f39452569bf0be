import type { PointMove } from '@shared/judging/band-judgement';
import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';

/** One part of a change of margin: negative takes margin away. */
export interface ChangePart {
  what: 'level' | 'limit';
  marginChangeDb: number;
  text: string;
}

/** A change of margin cut in two: what the level did, and what the slope of the limit did where the worst point moved. */
export function changeSplit({ moved, fromHz, toHz, levelChangeDb, limitChangeDb }: PointMove): ChangePart[] {
  const way = `from ${formatFrequency(fromHz)} to ${formatFrequency(toHz)}`;
  const level = `The level at the worst point ${rise(levelChangeDb)}${moved ? `, going ${way}` : ` at ${formatFrequency(toHz)}`}.`;
  const limit = isNothing(limitChangeDb)
    ? 'The limit is the same at both.'
    : `The limit is ${formatDecibels(Math.abs(limitChangeDb))} ${limitChangeDb > 0 ? 'higher' : 'lower'} there.`;
  return [
    { what: 'level', marginChangeDb: -levelChangeDb, text: level },
    { what: 'limit', marginChangeDb: limitChangeDb, text: limit },
  ];
}

function rise(levelChangeDb: number): string {
  if (isNothing(levelChangeDb)) return 'is the same';
  return `${levelChangeDb > 0 ? 'rose' : 'fell'} by ${formatDecibels(Math.abs(levelChangeDb))}`;
}

/** Less than the 0.1 dB that results are written with. */
function isNothing(changeDb: number): boolean {
  return Math.abs(changeDb) < 0.05;
}
