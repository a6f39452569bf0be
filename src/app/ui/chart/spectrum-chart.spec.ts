import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { CISPR32_B } from '@shared/limits/tables/cispr-32';
import { CHART_ENGINE } from './chart-engine';
import { SpectrumChart } from './spectrum-chart';
import type { SpectrumTrace, SpectrumView } from './spectrum-types';

const neverLoads = () => new Promise<never>(() => undefined);

function trace(): SpectrumTrace {
  return {
    id: '7',
    label: 'C1 / 2.5.0, L, QP',
    role: 'build',
    detector: 'QP',
    line: 'L',
    frequenciesHz: Float64Array.of(150e3, 1e6, 2e6, 30e6),
    levelsDbuv: Float32Array.of(40, 58, 30, 20),
  };
}

async function show(initialView: Partial<SpectrumView> = {}, traces = [trace()]) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [{ provide: CHART_ENGINE, useValue: neverLoads }],
  });
  const fixture = TestBed.createComponent(SpectrumChart);
  fixture.componentRef.setInput('traces', traces);
  fixture.componentRef.setInput(
    'limits',
    CISPR32_B.lines.map((line) => ({ name: line.detector, line })),
  );
  fixture.componentRef.setInput('initialView', initialView);
  const views: SpectrumView[] = [];
  fixture.componentInstance.viewChanged.subscribe((view) => views.push(view));
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const frame = element.querySelector<HTMLElement>('.frame');
  const press = async (...keys: string[]) => {
    for (const key of keys) frame?.dispatchEvent(new KeyboardEvent('keydown', { key }));
    await fixture.whenStable();
  };
  return { fixture, element, views, press };
}

describe('SpectrumChart', () => {
  it('starts with the view of the address and lists its pins with level, limit and margin', async () => {
    const { element } = await show({ fromHz: 500e3, toHz: 3e6, pinsHz: [1e6] });
    const cells = [...element.querySelectorAll('app-spectrum-pins td.number')].map(({ textContent }) =>
      textContent?.trim(),
    );
    // CISPR 32 class B QP from 0.5 to 5 MHz is 56 dBuV (table A.10): 56 - 58 = -2 dB.
    expect(cells).toEqual(['1 MHz', '58.0', '56.0', '-2.0 dBover limit']);
  });

  it('zooms around the cursor, pins it and returns to the whole range by keyboard, telling every view', async () => {
    const { views, press } = await show();
    await press('ArrowRight', 'Enter', '+', 'Escape');
    expect(views.map(({ pinsHz }) => pinsHz.length)).toEqual([1, 1, 1]);
    expect(views[1].toHz / views[1].fromHz).toBeLessThan(200);
    expect(views[2]).toMatchObject({ fromHz: 150e3, toHz: 30e6 });
  });

  it('reads out every trace at the cursor', async () => {
    const { element, press } = await show({ fromHz: 900e3, toHz: 1.1e6 });
    await press('ArrowRight');
    expect(element.querySelector('app-chart-readout')?.textContent).toContain('58.0');
  });

  it('offers the numbers as a table', async () => {
    const { fixture, element } = await show();
    const button = [...element.querySelectorAll('button')].find(({ textContent }) => textContent?.includes('Table'));
    button?.click();
    await fixture.whenStable();
    expect(element.querySelector('app-chart-table-view')?.textContent).toContain('-2.0 dB');
  });

  it('hides a trace from chart, table and readout', async () => {
    const { fixture, element } = await show({ pinsHz: [1e6] });
    element.querySelector<HTMLButtonElement>('app-spectrum-legend button')?.click();
    await fixture.whenStable();
    expect(element.textContent).not.toContain('58.0');
  });

  it('reads the limit lines where there is no trace, by cursor and as a table', async () => {
    const { fixture, element, press } = await show({ fromHz: 900e3, toHz: 1.1e6, pinsHz: [1e6] }, []);
    await press('ArrowRight');
    const readout = element.querySelector('app-chart-readout')?.textContent?.replace(/\s+/g, ' ');
    // CISPR 32 class B from 0.5 to 5 MHz: QP 56, AV 46 dBuV (table A.10).
    expect(readout).toContain('QP 56.0');
    expect(readout).toContain('AV 46.0');
    expect(element.querySelector('.frame')?.getAttribute('aria-label')).toContain('Limit lines from 900 kHz');
    expect(element.querySelector('app-spectrum-pins')).toBeNull();

    const button = [...element.querySelectorAll('button')].find(({ textContent }) => textContent?.includes('Table'));
    button?.click();
    await fixture.whenStable();
    expect(element.querySelector('app-chart-table-view')?.textContent).toContain('56.0');
  });
});
