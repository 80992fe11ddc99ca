import type { ChartDrawing } from './drawing-of';
import { extremesOf } from './extremes';
import { lineLooks, type LineLook } from './line-look';
import { reduced } from './reduced';
import { bandSpan, timeSpan, wholeSpan, type Span } from './spans';
import { degreeTicks, timeTicks } from './ticks';

export interface PlacedTick {
  readonly at: number;
  readonly says: string;
}

/** One of the two drawings over the same time: the band enlarged, and the whole run. */
export interface PanelPaths {
  readonly top: number;
  readonly bottom: number;
  readonly ticks: readonly PlacedTick[];
  /** Heights of the band's limits, cut to the panel. */
  readonly band: { readonly upper: number; readonly lower: number; readonly set: number };
  readonly lines: readonly { readonly name: string; readonly d: string; readonly look: LineLook }[];
}

/** A chart as paths in units of the picture, for SVG or a PDF; nothing of it is in view or colour yet. */
export interface ChartPaths {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly panels: readonly [detail: PanelPaths, whole: PanelPaths];
  readonly timeTicks: readonly PlacedTick[];
  readonly soak: { readonly from: number; readonly to: number; readonly says: string } | null;
  readonly events: readonly { readonly number: number; readonly x: number; readonly y: number }[];
  readonly legend: readonly { readonly name: string; readonly says: string; readonly look: LineLook }[];
  readonly bandSays: string;
  readonly says: string;
}

const [LEFT, RIGHT, TOP, BETWEEN, BOTTOM] = [48, 12, 44, 30, 26] as const;
/** The share of the height that the enlarged band takes. */
const DETAIL_SHARE = 0.62;
const EVENTS_APART = 20;

/** A chart laid out for a picture of a size, two points at most for each unit of its width. */
export function chartPaths(
  drawing: ChartDrawing,
  { width, height }: { width: number; height: number } = { width: 960, height: 560 },
): ChartPaths {
  const time = timeSpan(drawing);
  const looks = lineLooks(drawing.channels);
  const right = width - RIGHT;
  const x = placer(time, LEFT, right);
  const middle = TOP + (height - TOP - BETWEEN - BOTTOM) * DETAIL_SHARE;
  const readings = reduced(
    drawing.seconds,
    drawing.channels.map(({ values }) => extremesOf(values)),
    { ...time, columns: Math.floor((right - LEFT) / 2) },
  );
  const panel = (span: Span, top: number, bottom: number, ticks: number): PanelPaths => {
    const y = placer(span, bottom, top);
    const within = (degrees: number) => clamped(y(degrees), top, bottom);
    const { upper, lower, set } = drawing.band;
    return {
      top,
      bottom,
      ticks: degreeTicks(span.from, span.to, ticks).map(({ at, says }) => ({ at: y(at), says })),
      band: { upper: within(upper), lower: within(lower), set: within(set) },
      lines: drawing.channels.flatMap(({ name }, at) => {
        const look = looks[at];
        const values = readings.channels[at];
        return look && values ? [{ name, look, d: pathOf(readings.seconds, values, { x, y, span }) }] : [];
      }),
    };
  };
  return {
    width,
    height,
    left: LEFT,
    right,
    panels: [
      panel(bandSpan(drawing), TOP, middle, 6),
      panel(wholeSpan(drawing), middle + BETWEEN, height - BOTTOM, 5),
    ],
    timeTicks: timeTicks(time.from, time.to, width / 110, drawing.counts).map(({ at, says }) => ({
      at: x(at),
      says,
    })),
    soak: drawing.soak && { from: x(drawing.soak.from), to: x(drawing.soak.to), says: drawing.soak.says },
    events: stacked(drawing.events.map(({ number, from }) => ({ number, x: x(from) }))),
    legend: drawing.channels.flatMap(({ name, says, excluded }, at) => {
      const look = looks[at];
      return look ? [{ name, says: excluded === null ? says : 'not counted', look }] : [];
    }),
    bandSays: `band ${drawing.band.lower} to ${drawing.band.upper} °${drawing.unit}`,
    says: drawing.says,
  };
}

type Place = (value: number) => number;

const placer =
  ({ from, to }: Span, start: number, end: number): Place =>
  (value) =>
    Math.round((start + ((value - from) / (to - from)) * (end - start)) * 10) / 10;

const clamped = (value: number, low: number, high: number): number => Math.min(high, Math.max(low, value));

/** Numbers that would stand on each other are put under each other. */
function stacked(events: readonly { number: number; x: number }[]) {
  const rows: number[] = [];
  return events.map(({ number, x }) => {
    const free = rows.findIndex((last) => x - last >= EVENTS_APART);
    const row = free < 0 ? rows.length : free;
    rows[row] = x;
    return { number, x, y: TOP + 14 + (row % 6) * EVENTS_APART };
  });
}

/** A line over the readings that lie in the span; what leaves it is cut where it leaves, and a missing reading lifts the pen. */
function pathOf(
  seconds: readonly number[],
  values: readonly (number | null)[],
  { x, y, span }: { x: Place; y: Place; span: Span },
): string {
  const pieces: string[] = [];
  let before: { x: number; degrees: number } | null = null;
  for (let at = 0; at < seconds.length; at++) {
    const degrees = values[at];
    if (degrees == null) {
      before = null;
      continue;
    }
    const here = { x: x(seconds[at] ?? 0), degrees };
    if (before) pieces.push(...segment(before, here, y, span));
    before = here;
  }
  return pieces.join('').replace(/L(-?[\d.]+ -?[\d.]+)M\1(?=L)/g, 'L$1');
}

interface Point {
  readonly x: number;
  readonly degrees: number;
}

function segment(from: Point, to: Point, y: Place, span: Span): readonly string[] {
  const low = Math.min(from.degrees, to.degrees);
  const high = Math.max(from.degrees, to.degrees);
  if (high < span.from || low > span.to) return [];
  const cut = (point: Point, other: Point): Point => {
    const degrees = clamped(point.degrees, span.from, span.to);
    if (degrees === point.degrees) return point;
    const share = (degrees - point.degrees) / (other.degrees - point.degrees);
    return { x: Math.round((point.x + share * (other.x - point.x)) * 10) / 10, degrees };
  };
  const [start, end] = [cut(from, to), cut(to, from)];
  return [`M${start.x} ${y(start.degrees)}L${end.x} ${y(end.degrees)}`];
}
