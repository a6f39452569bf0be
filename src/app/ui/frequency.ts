import { Pipe, PipeTransform } from '@angular/core';
import { formatFrequency } from '@shared/units/format-frequency';

/** `{{ frequencyHz | frequency }}`: "156.2 kHz"; nothing for null. */
@Pipe({ name: 'frequency' })
export class FrequencyPipe implements PipeTransform {
  transform(frequencyHz: number | null | undefined): string {
    return frequencyHz === null || frequencyHz === undefined ? '' : formatFrequency(frequencyHz);
  }
}
