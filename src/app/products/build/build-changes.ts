import type { BuildView } from '@shared/contracts/builds';
import type { SwitchingStage } from '@shared/contracts/switching';
import { formatFrequency } from '@shared/units/format-frequency';

/** What was declared about a build, beside the same of builds it is compared with. */
export interface ChangeRow {
  what: string;
  cells: readonly ChangeCell[];
  isDifferent: boolean;
}

export interface ChangeCell {
  text: string;
  note: string;
}

/**
 * Revisions, switching frequencies and parameters of builds side by side, the build in question last. A row is different
 * where not all cells say the same.
 */
export function changeRows(builds: readonly BuildView[]): ChangeRow[] {
  const row = (what: string, cellOf: (build: BuildView) => ChangeCell): ChangeRow => {
    const cells = builds.map(cellOf);
    return { what, cells, isDifferent: new Set(cells.map(({ text }) => text)).size > 1 };
  };
  const stages = [...new Set(builds.flatMap(({ switching }) => switching.map(({ stage }) => stage)))];
  const names = [...new Set(builds.flatMap(({ parameters }) => parameters.map(({ name }) => name)))];
  return [
    row('Hardware', ({ hardware, hardwareNotes }) => ({ text: hardware, note: hardwareNotes })),
    row('Firmware', ({ firmware, commit, firmwareNotes }) => ({
      text: firmware,
      note: [commit && `commit ${commit}`, firmwareNotes].filter(Boolean).join(': '),
    })),
    ...stages.map((stage) =>
      row(`${stage} switching`, ({ switching }) => ({ text: stageText(switching, stage), note: '' })),
    ),
    ...names.map((name) =>
      row(name, ({ parameters }) => ({
        text: parameters.find((parameter) => parameter.name === name)?.value ?? 'not declared',
        note: '',
      })),
    ),
  ];
}

function stageText(switching: readonly SwitchingStage[], name: string): string {
  const stage = switching.find((one) => one.stage === name);
  if (!stage) return 'not declared';
  const spread = stage.spreadPercent > 0 ? `, spread ${stage.spreadPercent} %` : '';
  return `${formatFrequency(stage.frequencyHz)}${spread}`;
}
