import type { Dice } from './dice';

/** How a house writes. */
export interface Hand {
  readonly day: (iso: string) => string;
  readonly time: (clock: string) => string;
  readonly comma: boolean;
  readonly unit: 'F' | 'C';
  readonly language: 'en' | 'de' | 'fr';
}

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const LONG = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

const parts = (iso: string): [string, string, string] => {
  const [year = '', month = '', day = ''] = iso.split('-');
  return [year, month, day];
};

const ordinal = (day: number): string => {
  const teen = day > 10 && day < 14;
  return `${day}${(teen ? undefined : ['th', 'st', 'nd', 'rd'][day % 10]) ?? 'th'}`;
};

export const DAYS: Record<
  | 'iso'
  | 'us'
  | 'usShort'
  | 'named'
  | 'military'
  | 'militaryLong'
  | 'shortNamed'
  | 'letter'
  | 'ordinal'
  | 'dotted'
  | 'british'
  | 'slashedIso',
  (iso: string) => string
> = {
  iso: (iso) => iso,
  us: (iso) => (([y, m, d]) => `${m}/${d}/${y}`)(parts(iso)),
  usShort: (iso) => (([y, m, d]) => `${Number(m)}/${Number(d)}/${y.slice(2)}`)(parts(iso)),
  named: (iso) => (([y, m, d]) => `${Number(d)} ${LONG[Number(m) - 1] ?? ''} ${y}`)(parts(iso)),
  military: (iso) =>
    (([y, m, d]) => `${d}-${(MONTHS[Number(m) - 1] ?? '').toUpperCase()}-${y.slice(2)}`)(parts(iso)),
  militaryLong: (iso) =>
    (([y, m, d]) => `${d}-${(MONTHS[Number(m) - 1] ?? '').toUpperCase()}-${y}`)(parts(iso)),
  shortNamed: (iso) => (([y, m, d]) => `${d} ${MONTHS[Number(m) - 1] ?? ''} ${y}`)(parts(iso)),
  ordinal: (iso) => (([y, m, d]) => `${LONG[Number(m) - 1] ?? ''} ${ordinal(Number(d))}, ${y}`)(parts(iso)),
  slashedIso: (iso) => iso.replaceAll('-', '/'),
  letter: (iso) => (([y, m, d]) => `${LONG[Number(m) - 1] ?? ''} ${Number(d)}, ${y}`)(parts(iso)),
  dotted: (iso) => (([y, m, d]) => `${d}.${m}.${y}`)(parts(iso)),
  british: (iso) => (([y, m, d]) => `${d}/${m}/${y}`)(parts(iso)),
};

const TIMES: readonly ((clock: string) => string)[] = [
  (clock) => clock,
  (clock) => `${clock.replace(':', '')} hrs`,
  (clock) => {
    const [h = '0', m = '00'] = clock.split(':');
    const hour = Number(h);
    return `${hour % 12 === 0 ? 12 : hour % 12}:${m} ${hour < 12 ? 'AM' : 'PM'}`;
  },
];

function americanHand(dice: Dice): Hand {
  return {
    day: dice.pick([DAYS.us, DAYS.usShort, DAYS.military, DAYS.iso, DAYS.letter]),
    time: dice.pick(TIMES),
    comma: false,
    unit: 'F',
    language: 'en',
  };
}

function europeanHand(dice: Dice, language: Hand['language']): Hand {
  return {
    day: language === 'en' ? dice.pick([DAYS.british, DAYS.named]) : DAYS.dotted,
    time: TIMES[0] ?? ((clock) => clock),
    comma: language !== 'en',
    unit: 'C',
    language,
  };
}

export type House = 'american' | 'british' | 'german' | 'french' | 'nordic';

/** The hand of a house. */
export function handOf(house: House, dice: Dice): Hand {
  if (house === 'american') return americanHand(dice);
  if (house === 'nordic') return { ...europeanHand(dice, 'en'), comma: true };
  return europeanHand(dice, ({ british: 'en', german: 'de', french: 'fr' } as const)[house]);
}

export const moment = (hand: Hand, iso: string): string =>
  `${hand.day(iso.slice(0, 10))} ${hand.time(iso.slice(11))}`;

export const figure = (hand: Hand, value: number, digits?: number): string => {
  const written = digits === undefined ? String(value) : value.toFixed(digits);
  return hand.comma ? written.replace('.', ',') : written;
};

/** Minutes as a house would write them: a few as minutes, many as hours. */
export function lasting(hand: Hand, minutes: number): string {
  const hours = hand.language === 'en' ? 'hours' : 'h';
  return minutes >= 180 ? `${figure(hand, minutes / 60)} ${hours}` : `${minutes} min`;
}

export const degrees = (hand: Hand, value: number): string => `${value}${hand.unit === 'F' ? '°F' : ' °C'}`;
