import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { PlotPointer } from './plot-pointer';
import type { PlotMargins, PlotPoint, PlotRange } from './plot-margins';

@Component({
  imports: [PlotPointer],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<div
    [appPlotPointer]="margins"
    (hovered)="hover.set($event)"
    (clicked)="clicks.push($event)"
    (zoomed)="zooms.push($event)"
    (restored)="restores.push(true)"
  ></div>`,
})
class Plot {
  readonly margins: PlotMargins = { left: 100, right: 100, top: 50, bottom: 50 };
  readonly hover = signal<PlotPoint | null>(null);
  readonly clicks: PlotPoint[] = [];
  readonly zooms: PlotRange[] = [];
  readonly restores: boolean[] = [];
}

/** A plot of 1000 x 200 px inside a chart of 1200 x 300 px. */
async function setUp() {
  const fixture = TestBed.createComponent(Plot);
  await fixture.whenStable();
  const element = (fixture.nativeElement as HTMLElement).querySelector('div');
  if (!element) throw new Error('no plot');
  element.getBoundingClientRect = () => new DOMRect(0, 0, 1200, 300);
  const point = (type: string, clientX: number, clientY = 150) =>
    element.dispatchEvent(new MouseEvent(type, { clientX, clientY, button: 0 }));
  return { plot: fixture.componentInstance, element, point };
}

describe('PlotPointer', () => {
  it('tells hover and click as fractions of the plot, nothing outside it', async () => {
    const { plot, point } = await setUp();
    point('pointermove', 350, 100);
    expect(plot.hover()).toEqual({ xFraction: 0.25, yFraction: 0.25 });
    point('pointermove', 50, 100);
    expect(plot.hover()).toBeNull();
    point('pointerdown', 600);
    point('pointerup', 602);
    expect(plot.clicks).toEqual([{ xFraction: 0.502, yFraction: 0.5 }]);
    expect(plot.zooms).toEqual([]);
  });

  it('takes a drag in either direction as a zoom, cut at the edge of the plot, and no click', async () => {
    const { plot, element, point } = await setUp();
    point('pointerdown', 900);
    point('pointermove', 700);
    expect(element.children).toHaveLength(1);
    point('pointermove', 20);
    point('pointerup', 20);
    expect(plot.zooms).toEqual([{ fromFraction: 0, toFraction: 0.8 }]);
    expect(plot.clicks).toEqual([]);
    expect(element.children).toHaveLength(0);
  });

  it('restores on a double click', async () => {
    const { plot, point } = await setUp();
    point('dblclick', 600);
    expect(plot.restores).toEqual([true]);
  });
});
