import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { provideRouter, Router } from '@angular/router';
import type { OverlayTrace, SweepView } from '@shared/contracts/sweeps';
import { CISPR32_B } from '@shared/limits/tables/cispr-32';
import { encodeFrames } from '@shared/traces/frames';
import { CurrentTeam } from '../session/current-team';
import { CHART_ENGINE } from '../ui/chart/chart-engine';
import { Confirm } from '../ui/confirm';
import type { ConfirmQuestion } from '../ui/confirm-dialog';
import { SweepPage } from './sweep-page';

const sweep: SweepView = {
  id: 12,
  product: 'psu-240',
  productName: 'PSU 240 W',
  team: 'power',
  buildId: 4,
  hardware: 'C1',
  firmware: '2.4.1',
  unit: null,
  state: '230 V full load',
  bench: 'bench-1',
  line: 'L',
  detector: 'QP',
  kind: 'product',
  takenAt: '2026-03-02T09:20:00.000Z',
  run: '2026-03-02-a',
  rbwHz: 9000,
  attenuationDb: null,
  correction: 'none',
  pointCount: 3,
  startHz: 150_000,
  stopHz: 30_000_000,
  medianStepHz: 4500,
  fileName: 'psu.csv',
  trace: 1,
  limitSetKey: 'CISPR32_B',
  worst: { marginDb: -1.5, frequencyHz: 156_200, levelDbuv: 67.2, limitDbuv: 65.7 },
  bands: [{ band: '0.15-0.5 MHz', worst: null, coveredFraction: 0 }],
  remarks: [{ code: 'uncorrected', text: 'levels are uncorrected readings' }],
  importedAt: '2026-03-02T10:00:00.000Z',
  importedBy: 'T. Orrow',
};

function frameOf(sweepId: number): ArrayBuffer {
  const { segments, detector } = CISPR32_B.lines[0];
  const limit = { detector, title: 'CISPR 32 class B, QP', segments };
  const meta = { sweepId, label: 'C1 / 2.4.1, L QP', line: 'L', detector: 'QP', limit } as unknown as OverlayTrace;
  const bytes = encodeFrames({
    grids: [Float64Array.of(150e3, 1e6, 30e6)],
    traces: [
      { grid: 0, meta, levelsDbuv: Float32Array.of(60, 40, 30) },
      { grid: 0, meta: { ...meta, sweepId: 9, label: 'Background of bench-1' }, levelsDbuv: Float32Array.of(9, 9, 9) },
    ],
  });
  return bytes.buffer as ArrayBuffer;
}

async function open({ mayRemove = true, view = sweep, isSure = true } = {}) {
  const asked: ConfirmQuestion[] = [];
  const confirm = {
    ask: (question: ConfirmQuestion) => {
      asked.push(question);
      return Promise.resolve(isSure);
    },
  };
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      { provide: CHART_ENGINE, useValue: () => new Promise<never>(() => undefined) },
      { provide: Confirm, useValue: confirm },
      { provide: CurrentTeam, useValue: { may: () => mayRemove, timeZone: signal('UTC'), targetMarginDb: signal(6) } },
    ],
  });
  const fixture = TestBed.createComponent(SweepPage);
  fixture.componentRef.setInput('team', 'power');
  fixture.componentRef.setInput('sweep', '12');
  const http = TestBed.inject(HttpTestingController);
  fixture.detectChanges();
  http.expectOne('/api/v1/sweeps/12').flush(view);
  await Promise.resolve();
  fixture.detectChanges();
  http.expectOne(({ url, params }) => url === '/api/v1/overlay' && params.get('sweeps') === '12').flush(frameOf(12));
  await fixture.whenStable();
  return { fixture, http, element: fixture.nativeElement as HTMLElement, asked };
}

const removal = (element: HTMLElement) =>
  [...element.querySelectorAll('button')].find(({ textContent }) => textContent?.includes('Remove'));

describe('SweepPage', () => {
  it('shows the sweep with the background of its day, margin, set-up and remarks', async () => {
    const { element } = await open();
    const text = element.textContent ?? '';
    expect(text).toContain('-1.5 dB');
    expect(text).toContain('worst, at 156.2 kHz: level 67.2, limit 65.7 dBµV');
    expect(text).toContain('Background of bench-1');
    expect(text).toContain('none: readings as measured');
    expect(text).toContain('levels are uncorrected readings');
    expect(text).toContain('not measured');
  });

  it('leads to the original file under its own name', async () => {
    const { element } = await open();
    const link = element.querySelector<HTMLAnchorElement>('a[download]');
    expect(link?.getAttribute('href')).toBe('/api/v1/sweeps/12/file');
    expect(link?.getAttribute('download')).toBe('psu.csv');
  });

  it('names what is removed, has it typed, and goes back to the list', async () => {
    const { fixture, http, element, asked } = await open();
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    removal(element)?.click();
    await fixture.whenStable();
    expect(asked[0].text).toContain('Sweep 12 of PSU 240 W C1 / 2.4.1 (230 V full load, L QP)');
    expect(asked[0].name).toBe('sweep 12');
    http.expectOne({ method: 'DELETE', url: '/api/v1/sweeps/12' }).flush(null, { status: 204, statusText: 'Gone' });
    expect(navigate).toHaveBeenCalledWith(['/t', 'power', 'sweeps'], { queryParams: { product: 'psu-240' } });
  });

  it('removes nothing when the person thinks better of it', async () => {
    const { fixture, http, element } = await open({ isSure: false });
    removal(element)?.click();
    await fixture.whenStable();
    http.expectNone({ method: 'DELETE', url: '/api/v1/sweeps/12' });
  });

  it('offers no removal to whom it is not allowed, nor of a sweep of another team', async () => {
    expect(removal((await open({ mayRemove: false })).element)).toBeUndefined();
    TestBed.resetTestingModule();
    expect(removal((await open({ view: { ...sweep, team: 'other' } })).element)).toBeUndefined();
  });
});
