import { spotIn, type Passage, type Spot } from '../../layout/passage';
import type { LabelKey } from './labels';
import { momentsIn, timesIn, type FoundMoment } from './moments';
import { durationsIn, numberFrom, temperaturesIn, type DecimalSign, type FoundQuantity } from './quantities';

/** What a piece of text says about a cycle. */
export interface CycleAttributes {
  readonly temperature?: { readonly value: number; readonly unit: 'F' | 'C' | null; readonly spot: Spot };
  readonly minutes?: { readonly value: number; readonly spot: Spot };
  readonly start?: { readonly moment: FoundMoment; readonly spot: Spot };
  readonly end?: { readonly moment: FoundMoment; readonly spot: Spot };
}

/** What a figure is followed or led by when it is a limit and not what was done. */
const LIMIT_AFTER =
  /^\s*(?:\(?\s*)(?:min(?:imum)?|max(?:imum)?|required|req'?d|or (?:more|less|longer)|nominal)\b(?!\s*[.:]?\s*\d)/i;
const LIMIT_BEFORE =
  /(?:min(?:imum|\.)?(?: of)?|max(?:imum|\.)?(?: of)?|at least|not (?:less|more|exceeding|to exceed)(?: than)?|no (?:less|more) than|required|req'?d|≥|≤|>=|<=|<|>|limit|up to|within|allowed|spec(?:ified)?)\s*:?\s*$|\d\s*(?:°\s?[FC]|hrs?|hours?|min|h)?\s?[-–]\s?$/i;

export const isLimit = (
  text: string,
  { start, end }: { readonly start: number; readonly end: number },
): boolean =>
  LIMIT_AFTER.test(text.slice(end)) || LIMIT_BEFORE.test(text.slice(Math.max(0, start - 24), start));

/** A duration that is the quench delay or the time until the bake, and no time at temperature. */
const OTHER_DURATION =
  /(?:within|delay|transfer|quench(?:ed)?(?:\s+\w+){0,4}|after|before|less than|<|≤)\s*:?\s*(?:\w+\s+){0,1}$/i;
const OTHER_AFTER =
  /^\s*(?:after|of (?:plating|the plating)|quench\s*(?:delay|transfer|lag)|delay|transfer|from furnace|later|interval)/i;

/**
 * Temperature, time at it, start and end in one text.
 *
 * @param asked what the text's label asks for; null in a sentence. @param qualifier unit of the label.
 */
export function cycleAttributesIn(
  passage: Passage,
  sign: DecimalSign,
  asked: LabelKey | null,
  qualifier: string,
): CycleAttributes {
  const { text } = passage;
  const temperature = temperatureOf(passage, sign, asked, qualifier);
  const duration = durationOf(passage, sign, asked, qualifier);
  const moments = momentsIn(text, asked !== null && TIME_KEYS.has(asked)).filter(
    ({ time, day, start: place }) =>
      (time !== null || day !== null) && !(asked !== 'plating_end' && PLATED_THEN.test(text.slice(0, place))),
  );
  const timed = moments.filter(({ time }) => time !== null);
  const first = timed[0] ?? (asked !== null && TIME_KEYS.has(asked) ? moments[0] : undefined);
  const second = timed[1];
  const at = (moment: FoundMoment | undefined): { moment: FoundMoment; spot: Spot } | null => {
    const spot = moment && spotIn(passage, moment.start, moment.end);
    return moment && spot ? { moment, spot } : null;
  };
  const start = asked !== null && END_KEYS.has(asked) ? null : at(first && withDayNearby(first, moments));
  const isEnd = first && second && GOES_ON_TO.test(text.slice(first.end, second.start));
  const endOfBoth =
    second && (asked === null || !START_KEYS.has(asked) || isEnd) ? at(withDayNearby(second, moments)) : null;
  const end = asked !== null && END_KEYS.has(asked) ? at(first) : endOfBoth;
  const paired = asked !== null || end !== null ? start : null;
  return {
    ...(temperature && { temperature }),
    ...(duration && { minutes: duration }),
    ...(paired && { start: paired }),
    ...(end && { end }),
  };
}

/** Between a start and its end: "to", "quenched", a dash. */
const GOES_ON_TO =
  /^[\s,;]*(?:-|–|—|to|until|till|thru|through|bis|[àa]|hasta|out|off|ended|end|finish\w*|quench\w*|discharg\w*|remov\w*|unload\w*)(?![\p{L}])/iu;

/** The time before which the plating ended is none of the bake's. */
const PLATED_THEN = /\bplat(?:ing|ed)\b[^,;.]{0,24}$/i;

const START_KEYS: ReadonlySet<LabelKey> = new Set(['time_in', 'bake_start']);
const END_KEYS: ReadonlySet<LabelKey> = new Set(['time_out', 'bake_end', 'plating_end']);
const TIME_KEYS: ReadonlySet<LabelKey> = new Set([...START_KEYS, ...END_KEYS]);

/** "09:12 to 09:50 on 5 March 2026": the day said once is of both. */
function withDayNearby(moment: FoundMoment, all: readonly FoundMoment[]): FoundMoment {
  if (moment.day) return moment;
  const days = all.filter(({ day }) => day !== null);
  const [only] = days;
  return days.length === 1 && only ? { ...moment, day: only.day } : moment;
}

function temperatureOf(
  passage: Passage,
  sign: DecimalSign,
  asked: LabelKey | null,
  qualifier: string,
): CycleAttributes['temperature'] | null {
  const { text } = passage;
  const found = temperaturesIn(text, sign);
  const plain = found.filter((one) => !isLimit(text, one));
  const best = plain[0] ?? found[0];
  const spot = best && spotIn(passage, best.start, best.end);
  if (best && spot) return { value: best.value, unit: best.unit, spot };
  if (asked !== 'temperature') return null;
  const bare = /^\D{0,3}(\d{2,4}(?:[.,]\d)?)(?!\s*[:/]\s*\d)(?![\d.])/.exec(text);
  const unit = /(?:°|deg\.?\s?|^|\s|\()([FC])\b/i.exec(qualifier)?.[1]?.toUpperCase();
  const place = bare && spotIn(passage, 0, bare[0].length);
  if (!bare || !place) return null;
  return {
    value: numberFrom(bare[1] ?? '', sign),
    unit: unit === 'F' || unit === 'C' ? unit : null,
    spot: place,
  };
}

function durationOf(
  passage: Passage,
  sign: DecimalSign,
  asked: LabelKey | null,
  qualifier: string,
): CycleAttributes['minutes'] | null {
  const { text } = passage;
  const clocks = timesIn(text);
  const found = durationsIn(text, sign).filter(
    (one) => !isOther(text, one) && !clocks.some(({ start, end }) => start < one.end && end > one.start),
  );
  const best = found.find((one) => !isLimit(text, one)) ?? (asked === null ? undefined : found[0]);
  const spot = best && spotIn(passage, best.start, best.end);
  if (best && spot) return { value: best.value, spot };
  if (asked !== 'minutes' && asked !== 'bake') return null;
  const clock = /^\s*(\d{1,3}):(\d\d)(?::\d\d)?\s*$/.exec(text);
  const bare = /^\D{0,3}(\d+(?:[.,]\d+)?)\s*$/.exec(text);
  const place = spotIn(passage, 0, text.length);
  if (!place) return null;
  if (clock) return { value: Number(clock[1]) * 60 + Number(clock[2]), spot: place };
  const hours = /\b(?:h|hrs?|hours?|std|stunden|heures)\b/i.test(qualifier);
  const minutes = /\b(?:min|mins|minutes?|minuten)\b/i.test(qualifier);
  if (!bare || (!hours && !minutes)) return null;
  return { value: numberFrom(bare[1] ?? '', sign) * (hours ? 60 : 1), spot: place };
}

const isOther = (text: string, { start, end, value }: FoundQuantity): boolean =>
  // Under a minute nothing soaks.
  value < 1 ||
  OTHER_AFTER.test(text.slice(end)) ||
  OTHER_DURATION.test(text.slice(Math.max(0, start - 40), start));
