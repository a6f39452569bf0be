import { BatchTags } from '@shared/contracts/imports';
import { stageGroup, tagsForm } from './tags-form';
import { fillFromLast, tagsOfForm } from './tags-of-form';

function filledForm() {
  const form = tagsForm();
  form.patchValue({
    product: 'psu-240',
    hardware: ' C1 ',
    firmware: '2.4.1',
    bench: 'bench-1',
    takenAt: '2026-03-02T09:20',
    rbwKhz: 9,
    attenuationDb: 0,
  });
  return form;
}

describe('tagsOfForm', () => {
  it('gives tags in the units of the interface and leaves out what is empty', () => {
    expect(tagsOfForm(filledForm().getRawValue(), 'Europe/Stockholm')).toEqual({
      product: 'psu-240',
      hardware: 'C1',
      firmware: '2.4.1',
      bench: 'bench-1',
      kind: 'product',
      takenAt: '2026-03-02T08:20:00.000Z',
      rbwHz: 9000,
      attenuationDb: 0,
      corrected: false,
    });
  });

  it('gives stages in Hz, without the dust of binary fractions', () => {
    const form = filledForm();
    form.controls.switching.push(stageGroup());
    form.controls.switching.at(0).setValue({ stage: 'PFC', frequencyKhz: 66.7, spreadPercent: null });
    form.controls.switching.push(stageGroup());
    const tags = tagsOfForm(form.getRawValue(), 'UTC');
    expect(tags.switching).toEqual([{ stage: 'PFC', frequencyHz: 66_700, spreadPercent: 0 }]);
    expect(BatchTags.safeParse(tags).success).toBe(true);
  });
});

describe('fillFromLast', () => {
  const last: BatchTags = {
    product: 'psu-240',
    hardware: 'C1',
    firmware: '2.4.0',
    state: '230 V full load',
    bench: 'bench-1',
    line: 'L',
    detector: 'QP',
    kind: 'product',
    rbwHz: 9000,
    corrected: true,
  };

  it('fills the set-up of the last sweep in', () => {
    const form = tagsForm();
    fillFromLast(form, last);
    const { line: _line, detector: _detector, kind: _kind, ...setUp } = last;
    expect(tagsOfForm(form.getRawValue(), 'UTC')).toEqual({ ...setUp, kind: 'product' });
  });

  it('does not make the next product a background because the last sweep was one', () => {
    const form = tagsForm();
    fillFromLast(form, { ...last, kind: 'background' });
    expect(form.getRawValue()).toMatchObject({ kind: 'product', line: '', detector: '' });
  });

  it('keeps what the person typed, and fills what they emptied', () => {
    const form = tagsForm();
    const { firmware, hardware } = form.controls;
    firmware.setValue('2.5.0');
    firmware.markAsDirty();
    hardware.setValue('');
    hardware.markAsDirty();
    expect(fillFromLast(form, last)).not.toContain('firmware');
    expect(form.getRawValue()).toMatchObject({ firmware: '2.5.0', hardware: 'C1' });
  });
});
