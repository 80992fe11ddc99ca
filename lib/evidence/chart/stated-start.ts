import type { ChartCorrections } from './corrections';
import { dateOrderOf } from './date-order';
import type { DateWriting } from './time-shape';
import { dayOf, writtenTimeIn, type WrittenTime } from './written-time';

/** When the run began, as the lines before the table say; null what they do not. */
export interface StatedStart {
  /** Seconds since 1970. */
  readonly day: number | null;
  /** Seconds of the day. */
  readonly seconds: number | null;
}

const START =
  /start|begin|began|beginn|anfang|début|debut|inicio|inizio|in[ií]cio|load(?:ed)? (?:at|time)|charged/i;
/** Days on which something else happened than the run. */
const SOMETHING_ELSE =
  /print|export|creat|calib|\bdue\b|download|\bend|stop|finish|complet|expir|generat|druck|erstell|kalib|ende\b|\bfin\b|firmware|version|install/i;

export function startOf(preamble: readonly string[], { startedAt }: ChartCorrections): StatedStart {
  if (startedAt !== undefined) {
    const at = Date.parse(`${startedAt.replace(/Z$/, '')}Z`) / 1000;
    return { day: Math.floor(at / 86_400) * 86_400, seconds: at % 86_400 };
  }
  const lines = preamble
    .filter((line) => !SOMETHING_ELSE.test(line))
    .flatMap((line) =>
      piecesOf(line).map((piece) => ({ starts: START.test(line), found: writtenTimeIn(piece) })),
    )
    .filter((one): one is { starts: boolean; found: WrittenTime } => one.found !== null)
    .toSorted((one, other) => Number(other.starts) - Number(one.starts));
  const dated = lines.find(({ found }) => found.date !== null)?.found.date;
  const timed = lines.find(({ starts, found }) => found.seconds !== null && (starts || found.date !== null));
  return {
    day: dated ? dayIn(preamble, dated) : null,
    seconds: timed?.found.seconds ?? null,
  };
}

/** The other dates of the preamble, for telling day from month. */
export const statedDates = (preamble: readonly string[], writing: DateWriting): readonly number[] =>
  preamble
    .flatMap(piecesOf)
    .map((piece) => writtenTimeIn(piece)?.date)
    .filter((date) => date?.writing === writing)
    .map((date) => date?.groups ?? 0);

function dayIn(
  preamble: readonly string[],
  { groups, writing }: NonNullable<WrittenTime['date']>,
): number | null {
  const words = preamble.join(' ');
  const { order } = dateOrderOf([groups], writing, {
    others: statedDates(preamble, writing),
    separator: /\d([-/.])\d{1,2}\1/.exec(words)?.[1] ?? '',
    decimalComma: /;/.test(words),
    halfDays: /\d\s?[ap]\.?m\b/i.test(words),
    words,
  });
  const day = dayOf(groups, writing, order);
  return Number.isNaN(day) ? null : day;
}

const piecesOf = (line: string): readonly string[] =>
  line
    .replaceAll('"', '')
    .split(/[;\t|,]|:\s+|\s{2,}|=/)
    .filter((piece) => /\d/.test(piece));
