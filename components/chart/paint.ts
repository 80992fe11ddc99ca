import type uPlot from 'uplot';

import type { ChartDrawing } from '@/lib/evidence/chart/drawing-of';

import type { Palette } from './use-palette';

/** Under the lines: the soak's window and the band between its limits. */
export function paintGround(plot: uPlot, { soak, band }: ChartDrawing, palette: Palette): void {
  const { ctx, bbox } = plot;
  const x = (seconds: number) => inside(plot.valToPos(seconds, 'x', true), bbox.left, bbox.left + bbox.width);
  const y = (degrees: number) => inside(plot.valToPos(degrees, 'y', true), bbox.top, bbox.top + bbox.height);
  ctx.save();
  if (soak) {
    ctx.fillStyle = palette['dispatched-wash'];
    ctx.fillRect(x(soak.from), bbox.top, Math.max(1, x(soak.to) - x(soak.from)), bbox.height);
  }
  ctx.globalAlpha = 0.75;
  ctx.fillStyle = palette['proved-wash'];
  ctx.fillRect(bbox.left, y(band.upper), bbox.width, Math.max(1, y(band.lower) - y(band.upper)));
  ctx.globalAlpha = 1;
  ctx.strokeStyle = palette['proved-ink'];
  ctx.lineWidth = devicePixelRatio;
  for (const limit of [band.upper, band.lower])
    line(ctx, [bbox.left, y(limit)], [bbox.left + bbox.width, y(limit)]);
  ctx.setLineDash([devicePixelRatio, 4 * devicePixelRatio]);
  line(ctx, [bbox.left, y(band.set)], [bbox.left + bbox.width, y(band.set)]);
  ctx.restore();
}

/** Over the lines: the soak's ends, its length in words, the band's name and the numbers of the events. */
export function paintMarks(plot: uPlot, drawing: ChartDrawing, palette: Palette, inWords: boolean): void {
  const { ctx, bbox } = plot;
  const { soak, band, unit, events } = drawing;
  const size = devicePixelRatio;
  const x = (seconds: number) => plot.valToPos(seconds, 'x', true);
  const isSeen = (at: number) => at >= bbox.left && at <= bbox.left + bbox.width;
  ctx.save();
  ctx.strokeStyle = palette.ink;
  ctx.lineWidth = size;
  const ends = soak ? [x(soak.from), x(soak.to)].filter(isSeen) : [];
  for (const end of ends)
    line(ctx, [end, bbox.top - (inWords ? 8 * size : 0)], [end, bbox.top + bbox.height]);
  if (inWords) {
    // What is drawn before may have left another: the words stand on their line. Below 14.5 px the i loses its dot.
    ctx.textBaseline = 'alphabetic';
    ctx.font = `600 ${14.5 * size}px ${palette.cond}`;
    ctx.fillStyle = palette['proved-ink'];
    const upper = plot.valToPos(band.upper, 'y', true);
    ctx.textAlign = 'left';
    ctx.fillText(`band ${band.lower} to ${band.upper} °${unit}`, bbox.left + 8 * size, upper - 6 * size);
    if (soak) soakWords(plot, soak, palette);
    numbers(plot, events, palette);
  }
  ctx.restore();
}

function soakWords(plot: uPlot, soak: NonNullable<ChartDrawing['soak']>, palette: Palette): void {
  const { ctx, bbox } = plot;
  const size = devicePixelRatio;
  const right = bbox.left + bbox.width;
  const from = inside(plot.valToPos(soak.from, 'x', true), bbox.left, right);
  const to = inside(plot.valToPos(soak.to, 'x', true), bbox.left, right);
  if (to <= from) return;
  const height = bbox.top - 8 * size;
  line(ctx, [from, height], [to, height]);
  ctx.fillStyle = palette.ink;
  ctx.textAlign = 'center';
  const half = ctx.measureText(soak.says).width / 2;
  const middle = inside(
    (from + to) / 2,
    Math.min(bbox.left + half, right - half),
    Math.max(right - half, bbox.left + half),
  );
  ctx.fillText(soak.says, middle, height - 5 * size);
}

const DISC = 9;

function numbers(plot: uPlot, events: ChartDrawing['events'], palette: Palette): void {
  const { ctx, bbox } = plot;
  const size = devicePixelRatio;
  const lastAt: number[] = [];
  ctx.textAlign = 'center';
  ctx.textBaseline = 'middle';
  ctx.font = `600 ${12 * size}px ${palette.mono}`;
  for (const { number, from, code } of events) {
    const at = plot.valToPos(from, 'x', true);
    if (at < bbox.left - DISC || at > bbox.left + bbox.width + DISC) continue;
    // Numbers that would stand on each other go under each other.
    const free = lastAt.findIndex((last) => at - last >= 2.4 * DISC * size);
    const row = free < 0 ? lastAt.length : free;
    lastAt[row] = at;
    const height = bbox.top + (14 + row * 2.4 * DISC) * size;
    ctx.fillStyle = code === 'quench' ? palette.ink : palette['held-ink'];
    ctx.beginPath();
    ctx.arc(at, height, DISC * size, 0, 2 * Math.PI);
    ctx.fill();
    ctx.fillStyle = palette.paper;
    ctx.fillText(String(number), at, height);
  }
}

function line(
  ctx: CanvasRenderingContext2D,
  [fromX, fromY]: readonly [number, number],
  [toX, toY]: readonly [number, number],
): void {
  ctx.beginPath();
  ctx.moveTo(fromX, fromY);
  ctx.lineTo(toX, toY);
  ctx.stroke();
}

const inside = (value: number, low: number, high: number): number => Math.min(high, Math.max(low, value));
