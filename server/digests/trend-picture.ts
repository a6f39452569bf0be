import type { ProductSummary } from '@shared/contracts/products';
import { createRequire } from 'node:module';
import { resolve } from 'node:path';

const WIDTH = 600;
const HEIGHT = 150;
/** Twice the drawn size, for sharp screens. */
const ZOOM = 2;

const INK = '#4c5c65';
const ACCENT = '#00696d';
const LIMIT = '#14212a';
const TARGET = '#755000';

/**
 * Draws the worst margin of a product's last builds as a PNG, with the limit at 0 dB and the target margin.
 * Gaps are builds that were not measured. The drawing libraries are loaded on first use: they cost a second.
 */
export async function trendPicture({ trend, targetMarginDb }: ProductSummary): Promise<Buffer> {
  const [echarts, { Resvg }] = await Promise.all([import('echarts'), import('@resvg/resvg-js')]);
  const chart = echarts.init(null, null, { renderer: 'svg', ssr: true, width: WIDTH, height: HEIGHT });
  chart.setOption({
    animation: false,
    grid: { left: 48, right: 84, top: 12, bottom: 20 },
    textStyle: { fontFamily: 'Noto Sans', color: INK },
    xAxis: {
      type: 'category',
      data: trend.map((_, index) => String(index + 1)),
      axisLabel: { show: false },
      axisTick: { show: false },
    },
    yAxis: {
      type: 'value',
      min: ({ min }: { min: number }) => Math.floor(Math.min(0, min)),
      splitNumber: 3,
      axisLabel: { formatter: '{value} dB' },
    },
    series: [
      {
        type: 'line',
        data: trend.map((marginDb) => marginDb ?? '-'),
        lineStyle: { color: ACCENT, width: 2 },
        itemStyle: { color: ACCENT },
        symbolSize: 5,
        markLine: {
          silent: true,
          symbol: 'none',
          data: [
            { yAxis: 0, lineStyle: { color: LIMIT, type: 'solid', width: 2 }, label: { formatter: 'limit' } },
            {
              yAxis: targetMarginDb,
              lineStyle: { color: TARGET, type: 'dashed' },
              label: { formatter: `target ${targetMarginDb} dB` },
            },
          ],
        },
      },
    ],
  });
  const svg = chart.renderToSVGString();
  chart.dispose();
  const font = { fontFiles: fontFiles(), loadSystemFonts: false, defaultFontFamily: 'Noto Sans' };
  return new Resvg(svg, { fitTo: { mode: 'zoom', value: ZOOM }, background: 'white', font }).render().asPng();
}

/** The drawer reads TrueType only; the web fonts of the pages would come out as no text at all. */
function fontFiles(): string[] {
  const require = createRequire(resolve('package.json'));
  const file = require.resolve('@expo-google-fonts/noto-sans/400Regular/NotoSans_400Regular.ttf');
  return [file];
}
