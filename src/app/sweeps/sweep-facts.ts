import type { SweepView } from '@shared/contracts/sweeps';
import { findLimitSet } from '@shared/limits/limit-sets';
import { formatFrequency } from '@shared/units/format-frequency';
import { KIND_WORDS } from '../ui/kind-words';

export interface Fact {
  readonly name: string;
  readonly text: string;
}

const NOT_STATED = 'not stated';

/** What the sweep is of. */
export function tagFacts(sweep: SweepView): Fact[] {
  return [
    { name: 'Product', text: sweep.productName },
    { name: 'Hardware revision', text: sweep.hardware },
    { name: 'Firmware revision', text: sweep.firmware },
    { name: 'Unit', text: sweep.unit ?? NOT_STATED },
    { name: 'Operating state', text: sweep.state },
    { name: 'Role', text: KIND_WORDS[sweep.kind] },
    { name: 'Run', text: sweep.run },
  ];
}

/** How it was measured. */
export function setUpFacts(sweep: SweepView): Fact[] {
  const { startHz, stopHz, medianStepHz, pointCount } = sweep;
  return [
    { name: 'Bench', text: sweep.bench },
    { name: 'Line', text: sweep.line },
    { name: 'Detector', text: sweep.detector },
    { name: 'RBW', text: sweep.rbwHz === null ? NOT_STATED : formatFrequency(sweep.rbwHz) },
    { name: 'Attenuation', text: sweep.attenuationDb === null ? NOT_STATED : `${sweep.attenuationDb} dB` },
    { name: 'Range', text: `${formatFrequency(startHz)} to ${formatFrequency(stopHz)}` },
    { name: 'Points', text: `${pointCount.toLocaleString('en')}, step ${formatFrequency(medianStepHz)}` },
    {
      name: 'Corrections',
      text: sweep.correction === 'inFile' ? 'already in the file' : 'none: readings as measured',
    },
    { name: 'Limit', text: findLimitSet(sweep.limitSetKey)?.title ?? sweep.limitSetKey },
  ];
}

/** What is asked before the sweep is removed: what goes, what stays. */
export function removalText(sweep: SweepView): string {
  const { id, hardware, firmware, state, line, detector, productName } = sweep;
  return (
    `Sweep ${id} of ${productName} ${hardware} / ${firmware} (${state}, ${line} ${detector}) is removed with its margins, ` +
    'and with its original file unless other sweeps came from it. The build and those after it are judged anew. ' +
    'Drops keep the evidence they were raised on. This cannot be undone; the same file can be imported again.'
  );
}
