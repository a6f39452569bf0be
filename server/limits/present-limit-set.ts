import type { LimitSetView } from '@shared/contracts/limits';
import type { LimitSet } from '@shared/limits/limit-set';

export function presentLimitSet({ lines, ...set }: LimitSet): LimitSetView {
  return { ...set, lines: lines.map(({ detector, segments }) => ({ detector, segments: [...segments] })) };
}
