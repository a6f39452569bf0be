import { groupBy } from '@shared/collections/group-by';
import type { DropEvidence } from '@shared/contracts/drops';
import type { SwitchingStage } from '@shared/contracts/switching';
import { formatFrequency } from '@shared/units/format-frequency';
import type { JudgedBuild } from './judged-build-store';

type Change = DropEvidence['changes'][number];
type Declaring = Pick<JudgedBuild, 'hardware' | 'firmware' | 'switching' | 'parameters'>;

const NOT_DECLARED = 'not declared';

/**
 * What the team declared to be different between a reference build and a later one: revisions, switching frequencies,
 * spreading, and the parameters of every build after the reference up to the later one.
 *
 * @param since builds after the reference, the later one last
 */
export function declaredChanges(reference: Declaring, build: Declaring, since: readonly Declaring[]): Change[] {
  const changes = [
    { what: 'Hardware', before: reference.hardware, now: build.hardware },
    { what: 'Firmware', before: reference.firmware, now: build.firmware },
    ...switchingChanges(reference.switching, build.switching),
    ...parameterChanges(reference, since),
  ];
  return changes.filter(({ before, now }) => before !== now);
}

function switchingChanges(before: readonly SwitchingStage[], now: readonly SwitchingStage[]): Change[] {
  const stages = [...new Set([...before, ...now].map(({ stage }) => stage))];
  return stages.flatMap((stage) => {
    const then = before.find((one) => one.stage === stage);
    const later = now.find((one) => one.stage === stage);
    return [
      { what: `${stage} switching frequency`, before: frequencyOf(then), now: frequencyOf(later) },
      { what: `${stage} frequency spreading`, before: spreadOf(then), now: spreadOf(later) },
    ];
  });
}

function frequencyOf(stage: SwitchingStage | undefined): string {
  return stage ? formatFrequency(stage.frequencyHz) : NOT_DECLARED;
}

function spreadOf(stage: SwitchingStage | undefined): string {
  return stage?.spreadPercent ? `${stage.spreadPercent} %` : 'none';
}

/** What was stated under each name, oldest first; before it, what the reference itself stated. */
function parameterChanges(reference: Declaring, since: readonly Declaring[]): Change[] {
  const stated = groupBy(
    since.flatMap(({ parameters }) => parameters),
    ({ name }) => name,
  );
  return [...stated].map(([what, parameters]) => ({
    what,
    before: valuesOf(reference.parameters.filter(({ name }) => name === what)) || NOT_DECLARED,
    now: valuesOf(parameters),
  }));
}

function valuesOf(parameters: Declaring['parameters']): string {
  return [...new Set(parameters.map(({ value }) => value))].join('; ');
}
