import { Pipe, PipeTransform } from '@angular/core';
import { formatSignedDecibels } from '@shared/units/format-decibels';

/** `{{ changeDb | signedDecibels }}`: "+3.2 dB", for changes; nothing for null. */
@Pipe({ name: 'signedDecibels' })
export class SignedDecibelsPipe implements PipeTransform {
  transform(changeDb: number | null | undefined): string {
    return changeDb === null || changeDb === undefined ? '' : formatSignedDecibels(changeDb);
  }
}
