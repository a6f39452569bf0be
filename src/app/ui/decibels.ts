import { Pipe, PipeTransform } from '@angular/core';
import { formatDecibels } from '@shared/units/format-decibels';

/** `{{ levelDb | decibels }}`: "3.2 dB"; nothing for null. */
@Pipe({ name: 'decibels' })
export class DecibelsPipe implements PipeTransform {
  transform(levelDb: number | null | undefined): string {
    return levelDb === null || levelDb === undefined ? '' : formatDecibels(levelDb);
  }
}
