import { FormArray, FormControl, FormGroup, Validators } from '@angular/forms';
import { applyProblem } from './apply-problem';
import { errorText } from './field-error';

const PROBLEM = {
  type: '/problems/invalid',
  title: 'Not valid',
  status: 400,
  detail: 'Some fields need another look.',
};

it('puts each error beside its field, nested ones too, keeps what was typed and names what it could place', () => {
  const form = new FormGroup({
    email: new FormControl('mira@quay'),
    switching: new FormArray([new FormGroup({ frequencyHz: new FormControl(-1) })]),
  });
  const shown = applyProblem(form, {
    ...PROBLEM,
    errors: [
      { path: 'email', message: 'is no e-mail address' },
      { path: 'switching.0.frequencyHz', message: 'must be above 0' },
      { path: 'elsewhere', message: 'is wrong' },
    ],
  });
  expect(shown).toEqual(['email', 'switching.0.frequencyHz']);
  expect(errorText(form.controls.email.errors ?? {})).toBe('This is no e-mail address.');
  expect(form.controls.email.touched).toBe(true);
  expect(form.getRawValue()).toEqual({ email: 'mira@quay', switching: [{ frequencyHz: -1 }] });
});

it('lets the field be right again as soon as it is changed', () => {
  const form = new FormGroup({ name: new FormControl('bench-1', Validators.required) });
  applyProblem(form, { ...PROBLEM, errors: [{ path: 'name', message: 'is taken' }] });
  expect(form.invalid).toBe(true);
  form.controls.name.setValue('bench-2');
  expect(form.valid).toBe(true);
});

describe('errorText', () => {
  it.each([
    [{ required: true }, 'Please fill this in.'],
    [{ minlength: { requiredLength: 12, actualLength: 4 } }, 'Use at least 12 characters; this has 4.'],
    [{ min: { min: 0, actual: -1 } }, 'Must be 0 or more.'],
    [{ own: 'the end lies before the start' }, 'The end lies before the start.'],
    [{ own: true }, 'Please check this.'],
  ])('says %j in plain words', (errors, words) => {
    expect(errorText(errors)).toBe(words);
  });
});
