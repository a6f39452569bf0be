import type { Resource } from '@angular/core';
import { computed, Signal } from '@angular/core';
import type { Problem } from '@shared/contracts/problem';
import { problemOf } from '../ui/problem';

/** What the last load failed with, ready for a banner; null while all is well. */
export function problemOfResource(resource: Resource<unknown>): Signal<Problem | null> {
  return computed(() => {
    const error = resource.error();
    return error === undefined ? null : problemOf(error);
  });
}
