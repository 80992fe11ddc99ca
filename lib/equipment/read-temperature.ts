import { celsiusFromFahrenheit } from '@/lib/trade/units/temperature';

export type ReadTemperature = { ok: true; celsius: number; entered: string } | { ok: false; message: string };

/**
 * A temperature as typed, with its scale: `1000 °F`, `540 C`. The scale must be there, as with every measure.
 *
 * @param name the field in words, as it begins a sentence.
 */
export function readTemperature(typed: string, name: string): ReadTemperature {
  const entered = typed.trim().replace(/\s+/g, ' ');
  const [, number, scale] = /^(-?\d+(?:\.\d+)?) ?(?:°|deg(?:rees)? ?)?([CF])$/i.exec(entered) ?? [];
  if (number === undefined || scale === undefined)
    return { ok: false, message: `${name} cannot be read. Write it with its scale, like 1000 °F or 540 °C.` };
  const value = Number(number);
  const celsius = scale.toUpperCase() === 'F' ? celsiusFromFahrenheit(value) : value;
  if (celsius < -273.15 || celsius > HOTTEST_C)
    return { ok: false, message: `${name} is no temperature of a furnace or bath. Look at its scale.` };
  return { ok: true, celsius: Number(celsius.toFixed(4)), entered };
}

const HOTTEST_C = 2000;
