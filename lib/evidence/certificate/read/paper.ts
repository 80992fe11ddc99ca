import type { Passage } from '../../layout/passage';
import type { Page } from '../../page';
import { answersOf, type Answer } from './answers';
import { dayOrderOf } from './day-order';
import type { DayOrder } from './dates';
import { decimalSignOf, type DecimalSign } from './quantities';
import { sheetOf, type Sheet } from './sheet';

/** One certificate taken apart, over all its pages, with what is decided for the whole of it. */
export interface Paper {
  readonly sheets: readonly Sheet[];
  readonly answers: readonly Answer[];
  /** Sentences and lines in reading order. */
  readonly paragraphs: readonly Passage[];
  readonly text: string;
  readonly dayOrder: DayOrder | null;
  /** Days that can be read in one way only show it; otherwise it is likely. */
  readonly isDayOrderShown: boolean;
  readonly decimal: DecimalSign;
}

export function paperOf(pages: readonly Page[]): Paper {
  const sheets = pages.map(sheetOf);
  const paragraphs = sheets.flatMap((sheet) => sheet.paragraphs);
  const text = paragraphs.map((paragraph) => paragraph.text).join('\n');
  const decimal = decimalSignOf(text);
  const { order, isShown } = dayOrderOf(text, sheets, decimal);
  return {
    sheets,
    answers: answersOf(sheets),
    paragraphs,
    text,
    decimal,
    dayOrder: order,
    isDayOrderShown: isShown,
  };
}
