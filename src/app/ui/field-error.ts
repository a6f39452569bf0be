import { Pipe, PipeTransform } from '@angular/core';
import type { AbstractControl, ValidationErrors } from '@angular/forms';
import { asSentence } from './as-sentence';

/** `<mat-error>{{ form.controls.email | fieldError }}</mat-error>`: the field's first error in plain words. */
@Pipe({ name: 'fieldError', pure: false })
export class FieldErrorPipe implements PipeTransform {
  transform(control: AbstractControl): string {
    return control.errors ? errorText(control.errors) : '';
  }
}

/** Words for Angular's validators and for errors the server sent (key `server`). */
export function errorText(errors: ValidationErrors): string {
  if (typeof errors['server'] === 'string') return sentence(errors['server']);
  if (errors['required']) return 'Please fill this in.';
  if (errors['email']) return 'This is not an e-mail address.';
  const minlength = errors['minlength'] as { requiredLength: number; actualLength: number } | undefined;
  if (minlength) return `Use at least ${minlength.requiredLength} characters; this has ${minlength.actualLength}.`;
  const maxlength = errors['maxlength'] as { requiredLength: number; actualLength: number } | undefined;
  if (maxlength) return `Use at most ${maxlength.requiredLength} characters; this has ${maxlength.actualLength}.`;
  const min = errors['min'] as { min: number } | undefined;
  if (min) return `Must be ${min.min} or more.`;
  const max = errors['max'] as { max: number } | undefined;
  if (max) return `Must be ${max.max} or less.`;
  if (errors['pattern']) return 'This does not have the form it needs.';
  const first = Object.values(errors)[0] as unknown;
  return typeof first === 'string' ? sentence(first) : 'Please check this.';
}

/** Messages of the server go on from the name of the field: "is no e-mail address". */
function sentence(text: string): string {
  return asSentence(/^(is|are|was|has|must|may|does|needs|lies)\b/.test(text) ? `This ${text}` : text);
}
