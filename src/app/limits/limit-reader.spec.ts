import { TestBed } from '@angular/core/testing';
import type { LimitSetView } from '@shared/contracts/limits';
import { CISPR32_A, CISPR32_B } from '@shared/limits/tables/cispr-32';
import { LimitReader } from './limit-reader';

async function readAt(frequencyHz: number) {
  const fixture = TestBed.createComponent(LimitReader);
  fixture.componentRef.setInput('sets', JSON.parse(JSON.stringify([CISPR32_B, CISPR32_A])) as LimitSetView[]);
  fixture.componentRef.setInput('frequencyHz', frequencyHz);
  const asked: number[] = [];
  fixture.componentInstance.frequencyChange.subscribe((hz) => asked.push(hz));
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const rows = () =>
    [...element.querySelectorAll('tbody tr')].map((row) =>
      [...row.querySelectorAll('td.number')].map(({ textContent }) => textContent?.trim()),
    );
  return { fixture, element, rows, asked };
}

describe('LimitReader', () => {
  // CISPR 32 tables A.9 and A.10; class B falls with the logarithm of frequency: 66 - 10 log(300/150) / log(500/150).
  it('reads QP and AV of every chosen set at a frequency', async () => {
    const { rows } = await readAt(300_000);
    expect(rows()).toEqual([
      ['60.2', '50.2'],
      ['79.0', '66.0'],
    ]);
  });

  it('gives the lower limit where two segments meet', async () => {
    const { rows } = await readAt(5_000_000);
    expect(rows()[0]).toEqual(['56.0', '46.0']);
  });

  it('says that there is no limit rather than stretching the line', async () => {
    const { rows } = await readAt(100_000);
    expect(rows()[0]).toEqual(['no limit', 'no limit']);
  });

  it('follows the typing, and calls a text wrong only when it is finished', async () => {
    const { fixture, element, asked } = await readAt(150_000);
    const input = element.querySelector('input');
    if (!input) throw new Error('no field');
    input.value = '300 k';
    input.dispatchEvent(new Event('input'));
    expect(asked).toEqual([300_000]);
    input.value = '300 kx';
    input.dispatchEvent(new Event('input'));
    await fixture.whenStable();
    expect(element.querySelector('mat-error')).toBeNull();
    input.dispatchEvent(new Event('blur'));
    await fixture.whenStable();
    expect(element.querySelector('mat-error')).not.toBeNull();
  });
});
