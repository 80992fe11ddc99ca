import type { Requirements } from '@/lib/evidence/order';
import { fahrenheitDifferenceFromCelsius, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

import { readLimit, type Limit } from './limit-words';

/** A requirement in the words of an order. */
export interface AskedInWords {
  characteristic: string;
  limit: string;
  unit: string;
}

/** What one requirement asks for in figures, and where a certificate answers it. */
export interface AskedInFigures {
  asked: Requirements;
  /** Fields of a reading that speak of it, its cycles and readings named by their step and kind: `cycles[solution].minutes`. */
  fields: RegExp;
}

interface Form {
  characteristic: RegExp;
  fields: RegExp | ((asked: Requirements) => RegExp);
  /** Null where the words hold no figure that can be compared. */
  asked(limits: readonly Limit[], words: AskedInWords): Requirements | null;
}

const isCelsius = ({ unit }: Limit) => /c$/i.test(unit.replace(/[^a-z]/gi, ''));
const isHours = ({ unit }: Limit) => /^h/i.test(unit);

/** Set temperature and tolerance from the two ends, in °F as the order of the comparison has them. */
function settingOf(limit: Limit | undefined): { set_f: number; tolerance_f: number } | null {
  if (!limit || limit.min === null || limit.max === null) return null;
  const [middle, half] = [(limit.min + limit.max) / 2, (limit.max - limit.min) / 2];
  return isCelsius(limit)
    ? { set_f: fahrenheitFromCelsius(middle), tolerance_f: fahrenheitDifferenceFromCelsius(half) }
    : { set_f: middle, tolerance_f: half };
}

const ends = ({ min, max }: Limit) => ({ ...(min !== null && { min }), ...(max !== null && { max }) });

const isTemperature = ({ unit }: Limit) => /[°º]|^[FC]$/i.test(unit);

/** A step in a furnace: temperature where one is given, time where one is given. */
function stepOf(limits: readonly Limit[]) {
  const setting = settingOf(limits.find(isTemperature));
  const time = limits.find((limit) => !isTemperature(limit) && /^(h|min)/i.test(limit.unit));
  const inMinutes = time && isHours(time) ? 60 : 1;
  const minutes = (value: number | null) => (value === null ? undefined : value * inMinutes);
  const [least, most] = [minutes(time?.min ?? null), minutes(time?.max ?? null)];
  if (!setting && least === undefined && most === undefined) return null;
  return {
    ...setting,
    ...(least !== undefined && { soak_min_minutes: least }),
    ...(most !== undefined && most !== least && { soak_max_minutes: most }),
  };
}

type AskedStep = NonNullable<ReturnType<typeof stepOf>>;

/** Temperature and time of a step may be two requirements, each with its own answer on the certificate. */
function partOf({ set_f, soak_min_minutes, soak_max_minutes }: AskedStep): string {
  if (soak_min_minutes === undefined && soak_max_minutes === undefined) return 'set_temp';
  return set_f === undefined ? '(minutes|soak_\\w+)' : '\\w+';
}

const furnaceStep = (key: string, characteristic: RegExp): Form => ({
  characteristic,
  fields: (asked) => new RegExp(`^cycles\\[${key}\\]\\.${partOf(asked[key] as AskedStep)}$`),
  asked: (limits) => {
    const step = stepOf(limits);
    return step && { [key]: step };
  },
});

const FORMS: readonly Form[] = [
  furnaceStep('solution', /^solution|^soak/i),
  {
    characteristic: /^quench.*delay/i,
    fields: /^quench_delay_s$/,
    asked: ([limit]) => (limit?.max == null ? null : { quench: { max_delay_seconds: limit.max } }),
  },
  {
    characteristic: /^quench/i,
    fields: /^quench_medium/,
    asked: ([limit]) =>
      limit?.max == null
        ? null
        : {
            quench: { max_medium_temp_f: isCelsius(limit) ? fahrenheitFromCelsius(limit.max) : limit.max },
          },
  },
  {
    characteristic: /^(natural )?age|^ageing|^artificial/i,
    fields: /^cycles\[\w*age\]/,
    asked: (limits, { characteristic }) => {
      const setting = settingOf(limits.find(isTemperature));
      const time = limits.find(isHours);
      if (!setting && !time) return null;
      const kind = /natural/i.test(characteristic) || !setting ? 'natural' : 'artificial';
      return {
        age: {
          kind,
          ...(time?.min != null && { min_hours: time.min }),
          ...(time?.max != null && time.max !== time.min && { max_hours: time.max }),
          ...setting,
        },
      };
    },
  },
  furnaceStep('austenitize', /^austeniti[sz]|^harden(ing)? temp/i),
  furnaceStep('temper', /^temper(ing)?\b/i),
  furnaceStep('stress_relief', /^stress relief/i),
  {
    characteristic: /hardness/i,
    fields: /^readings\[hardness\]/,
    asked: ([limit]) => (limit?.scale == null ? null : { hardness: { scale: limit.scale, ...ends(limit) } }),
  },
  {
    characteristic: /conductivity/i,
    fields: /^readings\[conductivity\]/,
    asked: ([limit]) => (limit && /iacs/i.test(limit.unit) ? { conductivity_pct_iacs: ends(limit) } : null),
  },
  {
    characteristic: /thickness/i,
    fields: /^readings\[thickness\]/,
    asked: ([limit]) =>
      limit && limit.unit !== '' ? { thickness: { unit: limit.unit, ...ends(limit) } } : null,
  },
  {
    characteristic: /bake.*(start|begin|within|delay)|(start|begin).*bake/i,
    fields: /^(plating_end|bake_start)$/,
    asked: ([limit]) => (limit?.max == null ? null : { bake: { max_hours_after_plating: limit.max } }),
  },
  {
    characteristic: /bake|embrittlement/i,
    fields: /^(bake_(start|end)|cycles\[(embrittlement_relief|bake)\])/,
    asked: (limits) => {
      const setting = settingOf(limits.find(isTemperature));
      const time = limits.find(isHours);
      if (!setting && !time) return null;
      return {
        bake: { ...setting, ...(time?.min != null && { min_hours: time.min }) },
      };
    },
  },
];

/**
 * What a requirement in words asks for in figures.
 *
 * @returns null where it holds no figure that a certificate can be compared with: a person reads it.
 */
export function askedInFigures(words: AskedInWords): AskedInFigures | null {
  const form = FORMS.find(({ characteristic }) => characteristic.test(words.characteristic.trim()));
  if (!form) return null;
  const limits = words.limit.split(/[,;]\s+/).flatMap((part) => readLimit(part, words.unit) ?? []);
  const asked = form.asked(limits, words);
  return asked && { asked, fields: typeof form.fields === 'function' ? form.fields(asked) : form.fields };
}
