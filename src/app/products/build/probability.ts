import { Pipe, PipeTransform } from '@angular/core';

/** `{{ p | probability }}`: two significant digits, "0.023" or "1.8e-14"; a certainty of 1 stays "1". */
@Pipe({ name: 'probability' })
export class ProbabilityPipe implements PipeTransform {
  transform(p: number | null): string {
    return p === null ? '' : String(Number(p.toPrecision(2)));
  }
}
