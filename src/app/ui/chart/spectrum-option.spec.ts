import { CISPR32_B } from '@shared/limits/tables/cispr-32';
import { init, use } from 'echarts/core';
import { SVGRenderer } from 'echarts/renderers';
import './echarts';
import type { ChartPalette } from './chart-palette';
import { FULL_RANGE_HZ } from './frequency-scale';
import { levelRange } from './level-range';
import { spectrumOption } from './spectrum-option';
import type { SpectrumScene } from './spectrum-scene';
import type { SpectrumTrace } from './spectrum-types';
import { traceLooks } from './trace-look';

const PALETTE = new Proxy({ traces: Array<string>(8).fill('#777777') } as unknown as ChartPalette, {
  get: (target, name) => (name === 'traces' ? target.traces : '#123456'),
});

/** 20,000 points with one point of 63.25 dBuV among noise. */
function comb(): SpectrumTrace {
  const frequenciesHz = Float64Array.from({ length: 20_000 }, (_, i) => 150e3 + 1492 * i);
  const levelsDbuv = Float32Array.from({ length: 20_000 }, (_, i) => (i === 7777 ? 63.25 : 20 + (i % 7)));
  return { id: '1', label: 'C1', role: 'build', detector: 'PK', line: 'L', frequenciesHz, levelsDbuv };
}

function scene(given: Partial<SpectrumScene> = {}): SpectrumScene {
  const traces = [comb()];
  const limits = CISPR32_B.lines.map((line) => ({ name: `CISPR 32 class B, ${line.detector}`, line }));
  return {
    traces,
    looks: traceLooks(traces, PALETTE),
    limits,
    marks: [{ frequencyHz: 260e3, label: 'PFC n=4' }],
    pinsHz: [1e6],
    range: FULL_RANGE_HZ,
    levels: levelRange(traces, limits),
    columns: 1200,
    palette: PALETTE,
    ...given,
  };
}

function lineData(option: object): Float64Array[] {
  return (option as { series: { data: unknown }[] }).series
    .map(({ data }) => data)
    .filter((data): data is Float64Array => data instanceof Float64Array);
}

describe('spectrumOption', () => {
  it('thins a trace to two points a column and never lowers its peak', () => {
    const [points] = lineData(spectrumOption(scene()));
    const levels = points.filter((_, i) => i % 2 === 1);
    expect(levels.length).toBeLessThanOrEqual(2 * 1200 + 2);
    expect(Math.max(...levels)).toBe(63.25);
  });

  it('thins anew for a zoomed view, down to every measured point', () => {
    const [points] = lineData(spectrumOption(scene({ range: { fromHz: 1e6, toHz: 1.2e6 } })));
    // 135 points of the 1492 Hz grid lie between 1 and 1.2 MHz; one beyond each end carries the line to the edge.
    const within = comb().frequenciesHz.filter((hz) => hz >= 1e6 && hz <= 1.2e6).length;
    expect(points.length / 2).toBe(within + 2);
  });

  it('is drawn with limit names, harmonics and pins', () => {
    use([SVGRenderer]);
    const chart = init(null, null, { renderer: 'svg', ssr: true, width: 1280, height: 440 });
    chart.setOption(spectrumOption(scene()));
    const picture = chart.renderToSVGString();
    for (const text of ['CISPR 32 class B, QP', 'CISPR 32 class B, AV', 'PFC n=4', '150k', '30M', 'dBµV']) {
      expect(picture).toContain(text);
    }
    chart.dispose();
  });
});
