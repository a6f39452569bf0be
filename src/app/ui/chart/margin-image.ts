import type { ChartPalette } from './chart-palette';
import type { MarginGrid } from './margin-grid';
import { marginColour, marginRamp, parseRgb } from './margin-ramp';

/**
 * Draws a margin map of any size as one picture: a pixel a cell first, then enlarged without smoothing, so that no
 * build blends into its neighbours, then the hatch over cells over the limit and the dots where nothing was measured.
 * The lowest frequency is at the bottom.
 */
export function drawMarginImage(
  grid: MarginGrid,
  targetMarginDb: number,
  widthPx: number,
  heightPx: number,
  palette: ChartPalette,
): HTMLCanvasElement {
  const picture = canvasOf(widthPx, heightPx);
  const context = picture.getContext('2d');
  const small = drawCells(grid, targetMarginDb, palette);
  if (!context || !small) return picture;
  context.imageSmoothingEnabled = false;
  context.drawImage(small, 0, 0, widthPx, heightPx);
  const scale = window.devicePixelRatio;
  fillCells(context, grid, hatch(scale, palette), (marginDb) => marginDb < 0);
  fillCells(context, grid, dots(scale, palette), Number.isNaN);
  return picture;
}

function drawCells({ columns, rows, marginsDb }: MarginGrid, targetMarginDb: number, palette: ChartPalette) {
  const small = canvasOf(columns, rows);
  const context = small.getContext('2d');
  if (!context) return null;
  const ramp = marginRamp(palette);
  const unmeasured = parseRgb(palette.unmeasured);
  const image = context.createImageData(columns, rows);
  for (let column = 0; column < columns; column++) {
    for (let row = 0; row < rows; row++) {
      const marginDb = marginsDb[column * rows + row];
      const colour = Number.isNaN(marginDb) ? unmeasured : marginColour(marginDb, targetMarginDb, ramp);
      image.data.set([...colour, 255], 4 * ((rows - 1 - row) * columns + column));
    }
  }
  context.putImageData(image, 0, 0);
  return small;
}

/** Fills every upright run of cells that fit with a pattern. */
function fillCells(
  context: CanvasRenderingContext2D,
  { columns, rows, marginsDb }: MarginGrid,
  pattern: HTMLCanvasElement,
  fits: (marginDb: number) => boolean,
): void {
  context.fillStyle = context.createPattern(pattern, 'repeat') ?? 'transparent';
  const { width, height } = context.canvas;
  for (let column = 0; column < columns; column++) {
    const left = Math.round((column * width) / columns);
    const right = Math.round(((column + 1) * width) / columns);
    for (let row = 0; row < rows; row++) {
      const first = row;
      while (row < rows && fits(marginsDb[column * rows + row])) row++;
      if (row === first) continue;
      const top = Math.round(((rows - row) * height) / rows);
      const bottom = Math.round(((rows - first) * height) / rows);
      context.fillRect(left, top, right - left, bottom - top);
    }
  }
}

function hatch(scale: number, palette: ChartPalette): HTMLCanvasElement {
  const size = Math.round(6 * scale);
  const tile = canvasOf(size, size);
  const context = tile.getContext('2d');
  if (!context) return tile;
  context.strokeStyle = palette.hatch;
  context.globalAlpha = 0.75;
  context.lineWidth = 1.2 * scale;
  for (const shift of [-size, 0, size]) {
    context.moveTo(shift, size);
    context.lineTo(shift + size, 0);
  }
  context.stroke();
  return tile;
}

function dots(scale: number, palette: ChartPalette): HTMLCanvasElement {
  const size = Math.round(6 * scale);
  const tile = canvasOf(size, size);
  const context = tile.getContext('2d');
  if (!context) return tile;
  context.fillStyle = palette.unmeasuredDot;
  context.arc(size / 2, size / 2, 0.8 * scale, 0, 2 * Math.PI);
  context.fill();
  return tile;
}

function canvasOf(width: number, height: number): HTMLCanvasElement {
  const canvas = document.createElement('canvas');
  canvas.width = Math.max(1, Math.round(width));
  canvas.height = Math.max(1, Math.round(height));
  return canvas;
}
