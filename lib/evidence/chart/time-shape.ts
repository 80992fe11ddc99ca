/** Where a group of digits of a written time belongs. */
export const SLOT = {
  /** The three groups of a date; which is day and which is month may only be known after all rows. */
  first: 0,
  second: 1,
  third: 2,
  hour: 3,
  minute: 4,
  second60: 5,
  fraction: 6,
  days: 7,
  /** Eight digits, six digits, fourteen digits without separators. */
  compactDate: 8,
  compactTime: 9,
  compact: 10,
} as const;

/**
 * How a date is written: the year in four digits first or last, two digits for all three, or the month as a word.
 * The year is kept as the first group, then the others as they stand; with the year first, month and day.
 */
export type DateWriting = 'year_first' | 'year_last' | 'short' | 'named';

export interface TimeShape {
  /** The slot of each group of digits from left to right. */
  readonly slots: readonly number[];
  readonly date: DateWriting | null;
  readonly hasTime: boolean;
  readonly halfDays: boolean;
  /** The cell with its groups named: `<0>` to `<2>` of the date, `<h>`, `<m>`, `<s>`. */
  readonly template: string;
}

interface Span {
  readonly at: number;
  readonly length: number;
  readonly slot: number;
}

const MONTH_WORD = String.raw`(?:jan|feb|fév|fev|mar|mär|mrz|maa|apr|avr|abr|mai|may|mei|maj|mag|jun|jui|giu|jul|lug|aug|aoû|aou|ago|sep|set|okt|oct|out|ott|nov|dec|dez|déc|dic)[a-zà-ÿ]*\.?`;

const DATES: readonly { writing: DateWriting; form: RegExp; slots: readonly number[] }[] = [
  {
    writing: 'year_first',
    form: /(?<!\d)(?<g0>(?:19|20)\d\d)[-/.](?<g1>\d{1,2})[-/.](?<g2>\d{1,2})(?!\d)/d,
    slots: [0, 1, 2],
  },
  {
    writing: 'year_last',
    form: /(?<!\d)(?<g0>\d{1,2})[-/. ](?<g1>\d{1,2})[-/. ](?<g2>(?:19|20)\d\d)(?!\d)/d,
    slots: [1, 2, 0],
  },
  {
    writing: 'named',
    form: new RegExp(
      String.raw`(?<!\d)(?<g0>\d{1,2})[-\s./]*${MONTH_WORD}[-\s./,]*(?<g1>(?:19|20)\d\d|\d\d)(?!\d)`,
      'di',
    ),
    slots: [2, 0],
  },
  {
    writing: 'named',
    form: new RegExp(
      String.raw`${MONTH_WORD}[-\s./]*(?<g0>\d{1,2})(?:st|nd|rd|th)?[-\s./,]+(?<g1>(?:19|20)\d\d)(?!\d)`,
      'di',
    ),
    slots: [2, 0],
  },
  {
    writing: 'named',
    form: new RegExp(
      String.raw`(?<!\d)(?<g0>(?:19|20)\d\d)[-\s./]*${MONTH_WORD}[-\s./,]*(?<g1>\d{1,2})(?!\d)`,
      'di',
    ),
    slots: [0, 2],
  },
  {
    writing: 'short',
    form: /(?<![\d.])(?<g0>\d\d?)(?<sep>[-/.])(?<g1>\d\d?)\k<sep>(?<g2>\d\d)(?![\d.])/d,
    slots: [0, 1, 2],
  },
];

const TIME =
  /(?:(?<days>\d+)(?:\s*(?:d|days?|tage?|j)[\s,]+|\.(?=\d\d:)))?(?<!\d)(?<h>\d{1,3})(?<sep>[:h.])(?<m>\d\d)(?:[:m.](?<s>\d\d)(?:[.,:](?<f>\d{1,6}))?)?s?(?!\d)/di;
const HALF_DAY = /(?<![a-z])[ap]\.?\s?m\.?(?![a-z])/i;
/** What may stand beside a date and a time: weekday, zone, the T between them. */
const BESIDE =
  /(?:\b(?:mon|tue|wed|thu|fri|sat|sun|mo|di|mi|do|fr|sa|so)[a-z]*\b\.?)|\b(?:utc|gmt|uhr|[ecmp][sd]t|cest|cet)\b|[+-]\d\d:?\d\d(?=\W*$)|[tz@,;\s-]/gi;

/**
 * How a cell writes a time, a date or both.
 *
 * @returns null where it holds anything else.
 * @example `05.03.2026 08:00:30` has the slots day, month, year, hour, minute, second.
 */
export function timeShapeOf(cell: string): TimeShape | null {
  if (cell.length < 4 || cell.length > 40 || !/\d/.test(cell)) return null;
  const compact = compactShape(cell);
  if (compact) return compact;
  let left = cell;
  const spans: Span[] = [];
  let date: DateWriting | null = null;
  for (const { writing, form, slots } of DATES) {
    const found = form.exec(left);
    if (!found) continue;
    date = writing;
    slots.forEach((slot, at) => spans.push(spanOf(found, `g${at}`, slot)));
    left = blanked(left, found.index, found[0].length);
    break;
  }
  const time = TIME.exec(left);
  // Without a date, points between the groups would make a decimal number a time.
  if (time && (date !== null || time.groups?.['sep'] !== '.')) {
    const parts = [
      ['days', SLOT.days],
      ['h', SLOT.hour],
      ['m', SLOT.minute],
      ['s', SLOT.second60],
      ['f', SLOT.fraction],
    ] as const;
    for (const [name, slot] of parts) {
      if (time.groups?.[name] !== undefined) spans.push(spanOf(time, name, slot));
    }
    left = blanked(left, time.index, time[0].length);
  }
  const halfDays = HALF_DAY.test(left);
  if (spans.length === 0 || left.replace(HALF_DAY, '').replace(BESIDE, '') !== '') return null;
  spans.sort((one, other) => one.at - other.at);
  return {
    slots: spans.map(({ slot }) => slot),
    date,
    hasTime: spans.some(({ slot }) => slot === SLOT.hour),
    halfDays,
    template: templateOf(cell, spans),
  };
}

function compactShape(cell: string): TimeShape | null {
  const found = /^((?:19|20)\d{6})(?:[T_ -]?(\d{6})(?:[.,](\d+))?)?Z?$/.exec(cell);
  if (!found || !isPlausibleDay(found[1] ?? '')) return null;
  const joined = found[2] !== undefined && /^\d{14}/.test(cell);
  const slots = [
    joined ? SLOT.compact : SLOT.compactDate,
    ...(found[2] !== undefined && !joined ? [SLOT.compactTime] : []),
    ...(found[3] === undefined ? [] : [SLOT.fraction]),
  ];
  const template = found[2] === undefined ? 'YYYYMMDD' : 'YYYYMMDD HHmmss';
  return { slots, date: 'year_first', hasTime: found[2] !== undefined, halfDays: false, template };
}

const isPlausibleDay = (digits: string): boolean => {
  const [month, day] = [Number(digits.slice(4, 6)), Number(digits.slice(6, 8))];
  return month >= 1 && month <= 12 && day >= 1 && day <= 31;
};

function spanOf(found: RegExpExecArray, group: string, slot: number): Span {
  const [from, to] = found.indices?.groups?.[group] ?? [0, 0];
  return { at: from, length: to - from, slot };
}

const blanked = (text: string, at: number, length: number): string =>
  text.slice(0, at) + ' '.repeat(length) + text.slice(at + length);

const NAMES = ['0', '1', '2', 'h', 'm', 's', 'f', 'd'];

function templateOf(cell: string, spans: readonly Span[]): string {
  let [template, from] = ['', 0];
  for (const { at, length, slot } of spans) {
    template += `${cell.slice(from, at)}<${NAMES[slot] ?? ''}${length}>`;
    from = at + length;
  }
  return template + cell.slice(from);
}
