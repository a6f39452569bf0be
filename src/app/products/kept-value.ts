import type { Resource, Signal } from '@angular/core';
import { linkedSignal } from '@angular/core';

/** A resource's value; while the next one is on its way the one before, so that what is drawn stays in place. */
export function keptValue<T>(resource: Resource<T | undefined>): Signal<T | undefined> {
  return linkedSignal<{ value: T | undefined; isLoading: boolean }, T | undefined>({
    source: () => ({ value: resource.hasValue() ? resource.value() : undefined, isLoading: resource.isLoading() }),
    computation: ({ value, isLoading }, before) => value ?? (isLoading ? before?.value : undefined),
  });
}
