import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { CHART_ENGINE } from './chart-engine';
import { marginRange } from './margin-range';
import { TrendChart } from './trend-chart';
import type { TrendBuild, TrendPoint } from './trend-types';

const BUILDS: TrendBuild[] = ['2.4.0', '2.4.1', '2.5.0'].map((firmware, i) => ({
  id: 10 + i,
  hardware: 'C1',
  firmware,
  builtAt: '2026-03-02T09:20:00Z',
  verdict: i === 2 ? 'lost' : null,
  isReference: i === 0,
  openDrops: i === 2 ? 1 : 0,
}));

function point(marginDb: number): TrendPoint {
  return { marginDb, frequencyHz: 156_200, runs: 2, lowestDb: marginDb - 0.5, highestDb: marginDb + 0.5 };
}

const SERIES = [{ id: 'all', label: 'all bands', points: [point(9.1), null, point(1.4)] }];

describe('TrendChart', () => {
  it('reads out a build by keyboard, says what was not measured, and opens the build', async () => {
    TestBed.configureTestingModule({
      imports: [MatIconTestingModule],
      providers: [{ provide: CHART_ENGINE, useValue: () => new Promise<never>(() => undefined) }],
    });
    const fixture = TestBed.createComponent(TrendChart);
    fixture.componentRef.setInput('builds', BUILDS);
    fixture.componentRef.setInput('series', SERIES);
    fixture.componentRef.setInput('targetMarginDb', 6);
    const chosen: number[] = [];
    fixture.componentInstance.buildChosen.subscribe((id) => chosen.push(id));
    await fixture.whenStable();
    const element = fixture.nativeElement as HTMLElement;
    const press = async (key: string) => {
      element.querySelector('.frame')?.dispatchEvent(new KeyboardEvent('keydown', { key }));
      await fixture.whenStable();
      return [...element.querySelectorAll('app-chart-readout p, app-chart-readout td')].map((part) => part.textContent);
    };
    expect(await press('ArrowLeft')).toEqual([
      'C1 / 2.5.0',
      '2 Mar 2026, lost, 1 open drop',
      '1.4 dB',
      '156.2 kHz',
      '2',
    ]);
    expect(await press('ArrowLeft')).toContain('not measured');
    await press('Enter');
    expect(chosen).toEqual([11]);
  });
});

describe('marginRange', () => {
  it('keeps the limit and the target in view around all spreads', () => {
    expect(marginRange(SERIES, 6)).toEqual({ fromDb: -2, toDb: 15 });
    expect(marginRange([{ id: 'a', label: 'a', points: [point(-3)] }], 6)).toEqual({ fromDb: -5, toDb: 10 });
  });
});
