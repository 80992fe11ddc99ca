import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

import type { Cycle } from '../certificate';
import { halfOfLastPlace, sideOf } from './range';
import { sayNumber } from './say';

export interface Setting {
  readonly set_f: number;
  readonly tolerance_f: number;
}

export interface JudgedTemperature {
  readonly side: 'below' | 'within' | 'above' | 'unit_not_stated';
  /** As printed, with °F beside it where it was converted. */
  readonly stated: string;
  readonly note: string;
}

/**
 * A set temperature beside a setting in °F. What is printed in °C is converted, and half of its last printed place is
 * allowed for its rounding; without a unit it is only judged where neither unit would do.
 */
export function judgeTemperature({ set_temp, unit }: Cycle, setting: Setting): JudgedTemperature | null {
  if (set_temp === null) return null;
  const inF = sideOf(set_temp, limitsOf(setting));
  const asF = fahrenheitFromCelsius(set_temp);
  // A step of 1 °C is 1.8 °F.
  const inC = sideOf(asF, limitsOf(setting), halfOfLastPlace(set_temp) * 1.8);
  if (unit === 'F') return { side: inF, stated: `${sayNumber(set_temp)} °F`, note: '' };
  if (unit === 'C')
    return {
      side: inC,
      stated: `${sayNumber(set_temp)} °C`,
      note: ` ${sayNumber(set_temp)} °C is ${sayNumber(asF)} °F, give or take its rounding.`,
    };
  const isNeither = inF !== 'within' && inC !== 'within';
  return { side: isNeither ? inF : 'unit_not_stated', stated: sayNumber(set_temp), note: '' };
}

const limitsOf = ({ set_f, tolerance_f }: Setting) => ({
  min: set_f - tolerance_f,
  max: set_f + tolerance_f,
});

/** `920 ± 10 °F (488 to 499 °C)`. */
export function saySetting(setting: Setting): string {
  const { min, max } = limitsOf(setting);
  const [low, high] = [min, max].map((value) => Math.round(celsiusFromFahrenheit(value)));
  return `${sayNumber(setting.set_f)} ± ${sayNumber(setting.tolerance_f)} °F (${low} to ${high} °C)`;
}
