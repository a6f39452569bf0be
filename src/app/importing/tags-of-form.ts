import type { BatchTags } from '@shared/contracts/imports';
import { momentOf } from '@shared/time/zoned-time';
import { withoutGaps } from './merge-tags';
import type { TagsForm, TagsFormContent } from './tags-form';

/** The common tags as the server takes them; what is empty is left out. */
export function tagsOfForm(content: TagsFormContent, timeZone: string): BatchTags {
  const { rbwKhz, attenuationDb, switching } = content;
  const stages = switching
    .filter(({ stage, frequencyKhz }) => stage.trim() !== '' && frequencyKhz !== null)
    .map(({ stage, frequencyKhz, spreadPercent }) => ({
      stage: stage.trim(),
      frequencyHz: hertz(frequencyKhz ?? 0),
      spreadPercent: spreadPercent ?? 0,
    }));
  return withoutGaps({
    product: words(content.product),
    hardware: words(content.hardware),
    firmware: words(content.firmware),
    unit: words(content.unit),
    state: words(content.state),
    bench: words(content.bench),
    kind: content.kind,
    takenAt: momentOf(content.takenAt, timeZone),
    run: words(content.run),
    line: content.line || undefined,
    detector: content.detector || undefined,
    rbwHz: rbwKhz === null ? undefined : hertz(rbwKhz),
    attenuationDb: attenuationDb ?? undefined,
    corrected: content.corrected,
    switching: stages.length === 0 ? undefined : stages,
  });
}

/**
 * Fills the form with the set-up of the last sweep; what the person typed into it stays. Line, detector and kind are left
 * alone: they belong to that one trace, and taken over unseen they would mislabel all others.
 * @returns names of the fields that were filled
 */
export function fillFromLast(form: TagsForm, last: BatchTags): string[] {
  const { product, hardware, firmware, unit, state, bench, rbwHz, attenuationDb, corrected } = last;
  const wanted: Record<string, unknown> = withoutGaps({
    product,
    hardware,
    firmware,
    unit,
    state,
    bench,
    corrected,
    rbwKhz: rbwHz === undefined ? undefined : rbwHz / 1e3,
    attenuationDb,
  });
  const filled = Object.entries(wanted).filter(([name]) => {
    const control = form.get(name);
    const isTyped = control?.dirty && control.value !== '' && control.value !== null;
    return control !== null && !isTyped;
  });
  form.patchValue(Object.fromEntries(filled));
  return filled.map(([name]) => name);
}

function words(text: string): string | undefined {
  return text.trim() || undefined;
}

/** kHz in Hz without the dust of binary fractions: 66.7 kHz is 66700 Hz. */
function hertz(frequencyKhz: number): number {
  return Number((frequencyKhz * 1e3).toFixed(3));
}
