import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import type { AxisBuild } from './build-axis';
import { CHART_ENGINE } from './chart-engine';
import { MarginMap, MarginMapCell } from './margin-map';

const BUILDS: AxisBuild[] = ['2.4.0', '2.4.1', '2.5.0'].map((firmware, i) => ({
  id: 10 + i,
  hardware: 'C1',
  firmware,
  builtAt: '2026-03-02T09:20:00Z',
  verdict: i === 2 ? 'lost' : 'held',
  isReference: i === 0,
}));

async function show() {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [{ provide: CHART_ENGINE, useValue: () => new Promise<never>(() => undefined) }],
  });
  const fixture = TestBed.createComponent(MarginMap);
  fixture.componentRef.setInput('builds', BUILDS);
  fixture.componentRef.setInput('edgesHz', [150e3, 500e3, 5e6, 30e6]);
  fixture.componentRef.setInput('cells', [
    [9, 12, null],
    [8, 12, 15],
    [-1.5, 4, 15],
  ]);
  fixture.componentRef.setInput('targetMarginDb', 6);
  const chosen: MarginMapCell[] = [];
  fixture.componentInstance.cellChosen.subscribe((cell) => chosen.push(cell));
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const press = async (...keys: string[]) => {
    for (const key of keys) element.querySelector('.frame')?.dispatchEvent(new KeyboardEvent('keydown', { key }));
    await fixture.whenStable();
  };
  return { fixture, element, chosen, press };
}

describe('MarginMap', () => {
  it('starts the keyboard at the latest build and opens the cell under the cursor', async () => {
    const { element, chosen, press } = await show();
    await press('ArrowRight');
    expect(element.querySelector('app-chart-readout')?.textContent).toContain('-1.5 dB of margin, over limit');
    await press('ArrowUp', 'Enter', 'ArrowLeft', 'ArrowLeft', 'ArrowUp', 'Enter');
    expect(chosen).toEqual([
      { buildId: 12, fromHz: 500e3, toHz: 5e6, marginDb: 4 },
      { buildId: 10, fromHz: 5e6, toHz: 30e6, marginDb: null },
    ]);
  });

  it('says of a cell that it was not measured instead of giving it a number', async () => {
    const { element, press } = await show();
    await press('ArrowLeft', 'ArrowLeft', 'ArrowLeft', 'ArrowUp', 'ArrowUp');
    expect(element.querySelector('app-chart-readout .title')?.textContent).toBe('not measured');
  });

  it('offers one row a build as a table, with what is below target, over limit and not measured', async () => {
    const { fixture, element } = await show();
    const button = [...element.querySelectorAll('button')].find(({ textContent }) => textContent?.includes('Table'));
    button?.click();
    await fixture.whenStable();
    const rows = [...element.querySelectorAll('tbody tr')].map((row) =>
      [...row.querySelectorAll('td')].map(({ textContent }) => textContent),
    );
    expect(rows[0]).toEqual(['C1 / 2.4.0', 'held', '9.0 dB', '150 kHz to 500 kHz', '0', '0', '1']);
    expect(rows[2]).toEqual(['C1 / 2.5.0', 'lost', '-1.5 dB', '150 kHz to 500 kHz', '2', '1', '0']);
  });
});
