import type { DropEvidence } from '@shared/contracts/drops';
import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import type { JudgedSweep } from './judged-sweep-store';
import { limitLineKey } from './series-plan';

type Row = DropEvidence['setUp'][number];

/**
 * The set-up of both sides of a comparison, row by row.
 *
 * @param dayOf writes a moment as a date in the team's time zone
 */
export function setUpTable(
  build: readonly JudgedSweep[],
  reference: readonly JudgedSweep[],
  dayOf: (at: number) => string,
): Row[] {
  const row = (what: string, write: (sweep: JudgedSweep) => string): Row => {
    const sides = { build: listed(build, write), reference: listed(reference, write) };
    return { what, ...sides, isDifferent: sides.build !== sides.reference };
  };
  return [
    row('Bench', ({ bench }) => bench),
    row('LISN', ({ lisn }) => lisn || 'not stated'),
    row('Receiver', ({ receiver }) => receiver || 'not stated'),
    row('Unit', ({ unit }) => unit ?? 'not stated'),
    row('Operating state', ({ stateName }) => stateName),
    row('Lines and detectors', ({ line, detector }) => `${line} ${detector}`),
    row('RBW', ({ rbwHz }) => (rbwHz === null ? 'not stated' : formatFrequency(rbwHz))),
    row('Attenuation', ({ attenuationDb }) => (attenuationDb === null ? 'not stated' : formatDecibels(attenuationDb))),
    row('Step', ({ stepHz }) => formatFrequency(stepHz)),
    row('Corrections', ({ correction }) => (correction === 'inFile' ? 'in the file' : 'none applied')),
    row('Limit line', (sweep) => limitLineKey(sweep.limitSetKey, sweep.limitSetVersion, sweep.detector)),
    // Two dates are no difference of the set-up.
    { ...row('Taken', ({ takenAt }) => dayOf(takenAt)), isDifferent: false },
  ];
}

function listed(sweeps: readonly JudgedSweep[], write: (sweep: JudgedSweep) => string): string {
  return [...new Set(sweeps.map(write))].sort().join(', ');
}
