import { CHART_FONT } from './axis-look';
import type { ChartPalette } from './chart-palette';

export interface LegendEntry {
  label: string;
  colour: string;
  dash: readonly number[] | 'solid';
}

const ROW_PX = 22;
const SWATCH_PX = 28;

/** A chart's picture with its legend written above it, so that a downloaded picture explains itself. */
export function pictureWithLegend(
  chart: HTMLCanvasElement,
  entries: readonly LegendEntry[],
  scale: number,
  palette: Pick<ChartPalette, 'surface' | 'ink'>,
): HTMLCanvasElement {
  const picture = document.createElement('canvas');
  const context = picture.getContext('2d');
  if (!context || entries.length === 0) return chart;
  const font = `12px ${CHART_FONT}`;
  context.font = font;
  const places = placeEntries(entries, chart.width / scale, (text) => context.measureText(text).width);
  const legendPx = ((places.at(-1)?.row ?? 0) + 1) * ROW_PX + 8;
  picture.width = chart.width;
  picture.height = chart.height + legendPx * scale;

  context.scale(scale, scale);
  context.fillStyle = palette.surface;
  context.fillRect(0, 0, picture.width, picture.height);
  context.font = font;
  context.textBaseline = 'middle';
  for (const { entry, xPx, row } of places) {
    const yPx = 8 + (row + 0.5) * ROW_PX;
    context.strokeStyle = entry.colour;
    context.lineWidth = 2;
    context.setLineDash(entry.dash === 'solid' ? [] : [...entry.dash]);
    context.beginPath();
    context.moveTo(xPx, yPx);
    context.lineTo(xPx + SWATCH_PX, yPx);
    context.stroke();
    context.fillStyle = palette.ink;
    context.fillText(entry.label, xPx + SWATCH_PX + 6, yPx);
  }
  context.drawImage(chart, 0, legendPx, chart.width / scale, chart.height / scale);
  return picture;
}

/** Entries from left to right, in as many rows as they need. */
function placeEntries(entries: readonly LegendEntry[], widthPx: number, measure: (text: string) => number) {
  let xPx = 12;
  let row = 0;
  return entries.map((entry) => {
    const entryPx = SWATCH_PX + 6 + measure(entry.label) + 18;
    if (xPx + entryPx > widthPx && xPx > 12) {
      xPx = 12;
      row++;
    }
    const place = { entry, xPx, row };
    xPx += entryPx;
    return place;
  });
}
