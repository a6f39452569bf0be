import { InjectionToken } from '@angular/core';
import type { init } from 'echarts/core';

export interface ChartEngine {
  init: typeof init;
}

/** Loads the drawing library when the first chart appears; the one place that names it. */
export const CHART_ENGINE = new InjectionToken<() => Promise<ChartEngine>>('CHART_ENGINE', {
  providedIn: 'root',
  factory: () => () => import('./echarts'),
});
