import { addDays, daysBetween } from '@/lib/day-words';

import type { Tideline, TidelineBatch } from './contract';
import { daysLate } from './lateness';
import { xOf, type Scale } from './scale';
import { stringOf, widthOfText, type TagString } from './strings';

export const ROW_PX = 30;
const TAG_PX = 24;
const SMALLEST_LANE_PX = 46;
const LANE_PADDING_PX = 8;
/** An undated batch is drawn this long, fading, so that it has a body at all. */
const UNDATED_DAYS = 12;
const MOST_ROWS = { lane: 8, all: 24 };
const WHOLE_IN_FULL_LANE = 3;

/** A batch drawn as its whole tag. */
export interface PlacedTag {
  batch: TidelineBatch;
  row: number;
  x: number;
  width: number;
  /** What has room inside the tag; the rest stands at its right. */
  show: 'all' | 'word' | 'number' | 'mark';
  /** It began left of the page. */
  torn: boolean;
  /** No promised day: the far end fades. */
  fading: boolean;
  late: { days: number; fromX: number } | null;
  /** Words after the tag: `held 13 d, NC-0037`, `12 of 41 back`. */
  after: string | null;
  notches: number[];
  brokenX: number[];
  string: TagString | null;
}

/** A batch drawn as a thin slip, where the lane has too many for tags. */
export interface PlacedSlip {
  batch: TidelineBatch;
  x: number;
  width: number;
  y: number;
  height: number;
}

export interface PlacedLane {
  processorId: string;
  height: number;
  tags: PlacedTag[];
  slips: PlacedSlip[];
  /** Late or held batches beyond the three that stay whole. */
  moreLate: number;
}

/** Lays every lane out. Pure: the same batches, day and width give the same drawing. */
export function layOut(tideline: Tideline, scale: Scale): PlacedLane[] {
  const lanes = tideline.lanes.map((lane) => ({
    lane,
    tags: placeTags(
      tideline,
      scale,
      tideline.batches.filter((batch) => batch.processorId === lane.processorId),
    ),
  }));
  const rowsInAll = lanes.reduce((sum, { tags }) => sum + rowsOf(tags), 0);
  return lanes.map(({ lane, tags }) => {
    const tooFull = rowsOf(tags) > MOST_ROWS.lane || rowsInAll > MOST_ROWS.all;
    return {
      processorId: lane.processorId,
      ...(tooFull
        ? thinOut(tags)
        : { tags, slips: [], moreLate: 0, height: laneHeight(rowsOf(tags) * ROW_PX) }),
    };
  });
}

const rowsOf = (tags: readonly PlacedTag[]): number =>
  tags.reduce((most, tag) => Math.max(most, tag.row + 1), 0);
const laneHeight = (content: number): number => Math.max(SMALLEST_LANE_PX, content + LANE_PADDING_PX);

/** Held first, then late (most first), then undated, then by the day out: the order in which rows are given. */
function placeTags(tideline: Tideline, scale: Scale, batches: readonly TidelineBatch[]): PlacedTag[] {
  const inOrder = batches
    .map((batch) => {
      const late = daysLate(batch, tideline.today, tideline.latenessBasis);
      const group = [batch.stage === 'held', late > 0, isUndated(batch)].findIndex(Boolean) + 1 || 4;
      return { batch, late, group, start: startOf(batch, tideline.today) };
    })
    .sort(
      (a, b) =>
        a.group - b.group ||
        b.late - a.late ||
        a.start.localeCompare(b.start) ||
        a.batch.number.localeCompare(b.batch.number),
    );
  const tags = inOrder.map(({ batch, late }) => placeTag(batch, late, tideline, scale));
  const rows = firstFit(tags.map((tag) => ({ from: tag.x, to: endOf(tag, scale) + 12 })));
  return tags.map((tag, at) => ({ ...tag, row: rows[at] ?? 0 }));
}

function placeTag(
  batch: TidelineBatch,
  lateDays: number,
  tideline: Tideline,
  scale: Scale,
): Omit<PlacedTag, 'row'> {
  const start = xOf(scale, startOf(batch, tideline.today));
  const x = Math.max(0, batch.stage === 'building' ? Math.max(start, scale.todayX + 6) : start);
  const end = Math.max(xOf(scale, endDayOf(batch, tideline)) + scale.dayPx, x + 2 * scale.dayPx);
  const width = Math.max(Math.min(end, scale.widthPx) - x, 44);
  const late = lateDays > 0 ? { days: lateDays, fromX: x + width } : null;
  const tag = {
    batch,
    x,
    width,
    show: showIn(width, batch),
    torn: start < 0,
    fading: isUndated(batch),
    late,
    after: afterWords(batch, tideline),
    notches:
      batch.piecesBack > 0 && batch.piecesBack < batch.pieces
        ? batch.receiptsOn.map((day) => xOf(scale, day) - x).filter((at) => at > 0 && at < width)
        : [],
    brokenX: batch.brokenPromises
      .map((day) => xOf(scale, day) + scale.dayPx - x)
      .filter((at) => at > 0 && at < width),
  };
  return { ...tag, string: stringOf(batch, endOfBody(tag, scale), scale) };
}

const isUndated = (batch: TidelineBatch): boolean =>
  ['dispatched', 'at_processor'].includes(batch.stage) && batch.promisedOn === null;

const startOf = (batch: TidelineBatch, today: string): string =>
  batch.dispatchedOn ?? batch.leavesOn ?? today;

/** The promised day until everything is back; then the day of the last receipt. */
function endDayOf(batch: TidelineBatch, { today }: Tideline): string {
  const start = startOf(batch, today);
  if (batch.stage === 'building')
    return batch.wantedBackOn ?? addDays(start < today ? today : start, UNDATED_DAYS);
  if (batch.piecesBack >= batch.pieces && batch.lastBackOn !== null) return batch.lastBackOn;
  return batch.promisedOn ?? addDays(start, UNDATED_DAYS);
}

function afterWords(batch: TidelineBatch, { today }: Tideline): string | null {
  if (batch.stage === 'held' && batch.nonconformance)
    return `held ${batch.heldSince === null ? 0 : daysBetween(batch.heldSince, today)} d, ${batch.nonconformance.number}`;
  if (batch.stage === 'building' && batch.leavesOn !== null && batch.leavesOn < today)
    return 'should have left';
  if (batch.piecesBack > 0 && batch.piecesBack < batch.pieces)
    return `${batch.piecesBack} of ${batch.pieces} back`;
  if (batch.stage === 'returned')
    return batch.certificatesToProve > 0 ? 'papers in, to prove' : 'no papers yet';
  if (batch.stage === 'proved') return batch.invoice ? 'to pay' : 'no invoice yet';
  return batch.stage === 'settled' ? 'paid, to release' : null;
}

/** Under 216 px the words go outside, under 96 px the number too. */
function showIn(width: number, batch: TidelineBatch): PlacedTag['show'] {
  const word = widthOfText(batch.stage, 7.2);
  if (width < 102) return 'mark';
  if (width < 126 + word) return 'number';
  return width < 190 + word ? 'word' : 'all';
}

/** Where the tag with its flag and words ends, before any string. */
function endOfBody(
  tag: Pick<PlacedTag, 'batch' | 'x' | 'width' | 'late' | 'after' | 'show'>,
  scale: Scale,
): number {
  const body = tag.x + tag.width;
  const outside = outsideWords(tag);
  const words = outside === '' ? 0 : widthOfText(outside, 6.6) + 14;
  return (tag.late ? Math.max(body, scale.todayX) + flagWidth(tag.late.days) : body) + words;
}

/** The flag of a late batch grows with its number of days. */
export const flagWidth = (days: number): number => 54 + widthOfText(String(days), 7.3);

/** What could not stand in the tag, and what stands after it. */
export function outsideWords(tag: Pick<PlacedTag, 'batch' | 'show' | 'after'>): string {
  const inside = {
    mark: `${tag.batch.number} ${tag.batch.stage.replace('_', ' ')}`,
    number: tag.batch.stage.replace('_', ' '),
    word: '',
    all: '',
  }[tag.show];
  return [inside, tag.after ?? ''].filter(Boolean).join(', ');
}

const endOf = (tag: Omit<PlacedTag, 'row'>, scale: Scale): number =>
  Math.max(endOfBody(tag, scale), tag.string?.endX ?? 0);

/** Held, late and undated batches stay whole, three a lane; the rest become slips. */
function thinOut(tags: readonly PlacedTag[]): Omit<PlacedLane, 'processorId'> {
  const pressing = tags.filter((tag) => tag.batch.stage === 'held' || tag.late !== null || tag.fading);
  const whole = pressing.slice(0, WHOLE_IN_FULL_LANE).map((tag, row) => ({ ...tag, row }));
  const rest = tags.filter((tag) => !whole.some((kept) => kept.batch.id === tag.batch.id));
  const slipRows = firstFit(rest.map(({ x, width }) => ({ from: x, to: x + width + 6 })));
  const most = Math.max(0, ...slipRows) + 1;
  const [height, pitch] = most <= 12 ? [7, 9.5] : [3.5, 5.5];
  const top = whole.length * ROW_PX + 4;
  const slips = rest.map((tag, at) => ({
    batch: tag.batch,
    x: tag.x,
    width: tag.width,
    y: top + (slipRows[at] ?? 0) * pitch,
    height,
  }));
  return {
    tags: whole,
    slips,
    moreLate: pressing.length - whole.length,
    height: laneHeight(rest.length > 0 ? top + most * pitch : top),
  };
}

/** Gives each span the first row where it touches no other. */
function firstFit(spans: readonly { from: number; to: number }[]): number[] {
  const rows: { from: number; to: number }[][] = [];
  return spans.map((span) => {
    let row = rows.findIndex((used) => used.every((other) => span.from >= other.to || span.to <= other.from));
    if (row < 0) row = rows.push([]) - 1;
    rows[row]?.push(span);
    return row;
  });
}

export const tagTop = (row: number): number => LANE_PADDING_PX / 2 + row * ROW_PX + (ROW_PX - TAG_PX) / 2;
