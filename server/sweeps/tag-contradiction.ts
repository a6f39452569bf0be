import type { SweepTags } from '@shared/contracts/sweeps';
import type { DelimitedReading, ReadTrace } from '@shared/traces/read-delimited';
import { formatFrequency } from '@shared/units/format-frequency';

export interface TagContradiction {
  message: string;
  found: string;
  expected: string;
  advice?: string;
}

/** Bandwidths that differ less are one setting, written with fewer digits. */
const SAME_BANDWIDTH = 0.001;
/** Many instruments call the phase of a single-phase supply L1. */
const SINGLE_PHASE: readonly string[] = ['L', 'L1'];

/** What the file states of its trace and the tags deny, or null. What only one of them says is no contradiction. */
export function contradictionOf(
  tags: SweepTags,
  trace: ReadTrace,
  { settings, traces }: Pick<DelimitedReading, 'settings' | 'traces'>,
): TagContradiction | null {
  const { detector, line } = trace;
  if (detector !== undefined && detector !== tags.detector) {
    return stated('detector', detector, tags.detector, otherTrace(traces, tags));
  }
  if (line !== undefined && !isSameLine(line, tags.line)) {
    return stated('line', line, tags.line, otherTrace(traces, tags));
  }
  const { rbwHz, attenuationDb } = settings;
  if (rbwHz !== undefined && tags.rbwHz !== undefined && Math.abs(rbwHz / tags.rbwHz - 1) > SAME_BANDWIDTH) {
    return stated('rbwHz', formatFrequency(rbwHz), formatFrequency(tags.rbwHz));
  }
  if (attenuationDb !== undefined && tags.attenuationDb !== undefined && attenuationDb !== tags.attenuationDb) {
    return stated('attenuationDb', `${attenuationDb} dB`, `${tags.attenuationDb} dB`);
  }
  return null;
}

function stated(tag: string, inFile: string, inTags: string, advice?: string): TagContradiction {
  const message = `${tag}: the file says ${inFile}, the tags say ${inTags}`;
  return { message, found: inFile, expected: inTags, ...(advice && { advice }) };
}

/** Points at the trace that would bear the tags out, for a forgotten `trace`. */
function otherTrace(traces: readonly ReadTrace[], tags: SweepTags): string | undefined {
  const index = traces.findIndex(
    ({ detector, line }) =>
      (detector === undefined || detector === tags.detector) && (line === undefined || isSameLine(line, tags.line)),
  );
  return index < 0
    ? undefined
    : `Trace ${index + 1} (${traces[index]?.name}) fits these tags: say "trace": ${index + 1}.`;
}

function isSameLine(a: string, b: string): boolean {
  return a === b || (SINGLE_PHASE.includes(a) && SINGLE_PHASE.includes(b));
}
