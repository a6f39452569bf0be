import type { FormGroup } from '@angular/forms';
import type { Problem } from '@shared/contracts/problem';

/**
 * Puts each error of a problem beside the field it names (`switching.0.frequencyHz` finds nested fields)
 * and returns the paths that found a field. The form's content is untouched.
 */
export function applyProblem(form: FormGroup, problem: Problem): string[] {
  const shown: string[] = [];
  for (const { path, message } of problem.errors ?? []) {
    const control = form.get(path);
    if (!control) continue;
    control.setErrors({ ...control.errors, server: message });
    control.markAsTouched();
    shown.push(path);
  }
  return shown;
}
