import { inject } from '@angular/core';
import { NonNullableFormBuilder, Validators } from '@angular/forms';
import { PASSWORD_LENGTH } from './password-length';

/** What a person new to the installation fills in; called in an injection context. */
export function invitationForm() {
  return inject(NonNullableFormBuilder).group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
    password: ['', [Validators.required, Validators.minLength(PASSWORD_LENGTH)]],
  });
}
