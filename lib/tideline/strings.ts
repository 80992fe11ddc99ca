import { shortDayWords } from '@/lib/day-words';

import type { TidelineBatch } from './contract';
import { xOf, type Scale } from './scale';

/** The thread from a batch to the assembly that waits for it, or the words that say it is too late for a thread. */
export interface TagString {
  fromX: number;
  /** The knot, on the day of need; null where there is no room for it or the need is before the end: only words are set. */
  knotX: number | null;
  labelX: number;
  labelSide: 'right' | 'left';
  name: string;
  day: string;
  tooLate: boolean;
  endX: number;
}

const KNOT_PX = 3.5;
const GAP_PX = 9;

/** Set widths are measured once for the fonts in use; here an average per character is enough to keep labels apart. */
export const widthOfText = (text: string, perCharacter: number): number => text.length * perCharacter;

/**
 * Null where nobody waits, and where there is no room to say who does: the tag's own sentence and the list have it.
 *
 * @param endX where the tag with its flag and words ends.
 */
export function stringOf(batch: TidelineBatch, endX: number, scale: Scale): TagString | null {
  const { assembly } = batch;
  if (!assembly?.neededOn) return null;
  const name = assembly.name + (assembly.more > 0 ? ` and ${assembly.more} more` : '');
  const day = shortDayWords(assembly.neededOn, { zone: 'UTC', now: new Date(`${scale.today}T12:00:00Z`) });
  const needX = xOf(scale, assembly.neededOn) + scale.dayPx / 2;
  const labelWidth = widthOfText(name, 7.2) + widthOfText(day, 6.4) + GAP_PX;
  const common = { fromX: endX, name, day };
  const tooLate = needX < endX + GAP_PX;
  const labelX = endX + GAP_PX;
  const labelEndX = labelX + labelWidth + (tooLate ? widthOfText('needed ', 6.4) : GAP_PX + 2 * KNOT_PX);
  if (labelEndX > scale.widthPx) return null;
  if (tooLate) return { ...common, knotX: null, labelX, labelSide: 'right', tooLate, endX: labelEndX };

  const knotX = Math.min(needX, scale.widthPx - KNOT_PX);
  const right = knotX + GAP_PX;
  if (right + labelWidth <= scale.widthPx)
    return { ...common, knotX, labelX: right, labelSide: 'right', tooLate, endX: right + labelWidth };
  const leftX = knotX - GAP_PX - labelWidth;
  // The knot would lie in the words: they stand alone.
  if (leftX < labelX) return { ...common, knotX: null, labelX, labelSide: 'right', tooLate, endX: labelEndX };
  return {
    ...common,
    knotX,
    labelX: leftX,
    labelSide: 'left',
    tooLate,
    endX: knotX + KNOT_PX,
  };
}
