import type { SwitchingStage } from '@shared/contracts/switching';
import { formatFrequency } from '@shared/units/format-frequency';

export interface MergedSwitching {
  switching: SwitchingStage[];
  isChanged: boolean;
  /** One line a stage whose declared frequency is another than the tags say. */
  contradictions: string[];
}

/** Adds the stages that the build does not declare yet. What it declares stays: a person may have corrected it. */
export function mergeSwitching(
  declared: readonly SwitchingStage[],
  given: readonly SwitchingStage[] = [],
): MergedSwitching {
  const switching = [...declared];
  const contradictions: string[] = [];
  for (const stage of given) {
    const standing = switching.find((one) => one.stage === stage.stage);
    if (standing === undefined) switching.push(stage);
    else if (standing.frequencyHz !== stage.frequencyHz || standing.spreadPercent !== stage.spreadPercent) {
      contradictions.push(
        `the tags say that ${stage.stage} switches at ${describe(stage)}, the build declares ${describe(standing)}`,
      );
    }
  }
  return { switching, isChanged: switching.length > declared.length, contradictions };
}

function describe({ frequencyHz, spreadPercent }: SwitchingStage): string {
  const spread = spreadPercent > 0 ? ` spread over ${spreadPercent} %` : '';
  return formatFrequency(frequencyHz) + spread;
}
