import { Directive, ElementRef, inject, input, output, Renderer2 } from '@angular/core';
import type { PlotMargins, PlotPoint, PlotRange } from './plot-margins';

/** Less than this, px, is an unsteady click and no drag. */
const DRAG_FROM_PX = 6;

/** Turns pointer events over a plot into hover, click, zoom (a drag along x) and restore (a double click). */
@Directive({
  selector: '[appPlotPointer]',
  host: {
    '(pointerdown)': 'begin($event)',
    '(pointermove)': 'move($event)',
    '(pointerup)': 'finish($event)',
    '(pointercancel)': 'cancel()',
    '(pointerleave)': 'leave()',
    '(dblclick)': 'restored.emit()',
  },
})
export class PlotPointer {
  private readonly element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly renderer = inject(Renderer2);

  readonly appPlotPointer = input.required<PlotMargins>();
  readonly canZoom = input(true);

  readonly hovered = output<PlotPoint | null>();
  readonly clicked = output<PlotPoint>();
  readonly zoomed = output<PlotRange>();
  readonly restored = output();

  private start: { xPx: number; fraction: number } | null = null;
  private band: HTMLElement | null = null;

  protected begin(event: PointerEvent): void {
    if (event.button !== 0) return;
    const point = this.pointAt(event);
    if (point) this.start = { xPx: event.clientX, fraction: point.xFraction };
  }

  protected move(event: PointerEvent): void {
    const isDrag = this.start && this.canZoom() && Math.abs(event.clientX - this.start.xPx) >= DRAG_FROM_PX;
    if (this.start && isDrag) {
      if (!this.band) this.element.setPointerCapture?.(event.pointerId);
      this.showBand(this.start.fraction, this.xFraction(event));
      this.hovered.emit(null);
    } else {
      this.hovered.emit(this.pointAt(event));
    }
  }

  protected finish(event: PointerEvent): void {
    const start = this.start;
    const wasDrag = this.band !== null;
    this.cancel();
    if (!start) return;
    if (wasDrag) {
      const ends = [start.fraction, this.xFraction(event)].sort((a, b) => a - b);
      this.zoomed.emit({ fromFraction: ends[0], toFraction: ends[1] });
      return;
    }
    const point = this.pointAt(event);
    if (point) this.clicked.emit(point);
  }

  protected cancel(): void {
    this.start = null;
    this.band?.remove();
    this.band = null;
  }

  protected leave(): void {
    if (!this.band) this.hovered.emit(null);
  }

  private pointAt(event: PointerEvent): PlotPoint | null {
    const { left, right, top, bottom } = this.appPlotPointer();
    const box = this.element.getBoundingClientRect();
    const xFraction = (event.clientX - box.left - left) / (box.width - left - right);
    const yFraction = (event.clientY - box.top - top) / (box.height - top - bottom);
    const isInside = xFraction >= 0 && xFraction <= 1 && yFraction >= 0 && yFraction <= 1;
    return isInside ? { xFraction, yFraction } : null;
  }

  private xFraction(event: PointerEvent): number {
    const { left, right } = this.appPlotPointer();
    const box = this.element.getBoundingClientRect();
    return Math.min(1, Math.max(0, (event.clientX - box.left - left) / (box.width - left - right)));
  }

  private showBand(from: number, to: number): void {
    this.band ??= this.addBand();
    const { left, right, top, bottom } = this.appPlotPointer();
    const plotPx = this.element.clientWidth - left - right;
    Object.assign(this.band.style, {
      left: `${left + Math.min(from, to) * plotPx}px`,
      width: `${Math.abs(to - from) * plotPx}px`,
      top: `${top}px`,
      bottom: `${bottom}px`,
    });
  }

  private addBand(): HTMLElement {
    const band = this.renderer.createElement('div') as HTMLElement;
    Object.assign(band.style, {
      position: 'absolute',
      background: 'color-mix(in srgb, var(--sl-accent) 18%, transparent)',
      pointerEvents: 'none',
    });
    return this.element.appendChild(band);
  }
}
