import { mmFromInches } from '@/lib/trade/units/length';
import { kgFromPounds } from '@/lib/trade/units/mass';

/** What is measured of a part. Each is kept as typed, and beside it in one SI unit for reckoning. */
export type Quantity = 'length' | 'mass' | 'area';

const IN = mmFromInches(1);
const FT = mmFromInches(12);
const LB = kgFromPounds(1) * 1000;

/** Base units: mm, g, mm². */
const UNITS: Record<Quantity, readonly { words: readonly string[]; factor: number }[]> = {
  length: [
    { words: ['in', 'inch', 'inches', '"', '″'], factor: IN },
    { words: ['ft', 'foot', 'feet', "'", '′'], factor: FT },
    { words: ['mm'], factor: 1 },
    { words: ['cm'], factor: 10 },
    { words: ['m'], factor: 1000 },
  ],
  mass: [
    { words: ['lb', 'lbs', 'pound', 'pounds'], factor: LB },
    { words: ['oz'], factor: LB / 16 },
    { words: ['g'], factor: 1 },
    { words: ['kg'], factor: 1000 },
  ],
  area: [
    { words: ['in²', 'in2', 'sq in', 'sqin', 'in^2'], factor: IN ** 2 },
    { words: ['ft²', 'ft2', 'sq ft', 'sqft', 'ft^2'], factor: FT ** 2 },
    { words: ['mm²', 'mm2', 'sq mm', 'mm^2'], factor: 1 },
    { words: ['cm²', 'cm2', 'sq cm', 'cm^2'], factor: 100 },
    { words: ['dm²', 'dm2', 'sq dm', 'dm^2'], factor: 10_000 },
    { words: ['m²', 'm2', 'sq m', 'm^2'], factor: 1_000_000 },
  ],
};

const EXAMPLES: Record<Quantity, string> = {
  length: '0.040 in or 1 mm',
  mass: '0.41 lb or 186 g',
  area: '1.78 ft² or 1650 cm²',
};
const BASE_UNITS: Record<Quantity, string> = { length: 'mm', mass: 'g', area: 'mm²' };

/** The database keeps ten digits before the point and four after. */
const LARGEST = 9_999_999_999;
const SMALLEST = 0.0001;

export type Measured = { ok: true; value: number; entered: string } | { ok: false; message: string };

/**
 * Reads a measure as typed: `0.040 in`, `1/8"`, `1 1/4 in`, `1.2 kg`.
 *
 * The unit must be there: 0.063 may be inches or millimetres, and a guess that is wrong is a factor of 25.
 *
 * @param name the field in words, as it begins a sentence: "Thickness".
 */
export function readMeasure(typed: string, quantity: Quantity, name: string): Measured {
  const entered = typed.trim().replace(/\s+/g, ' ');
  const like = `Write it like ${EXAMPLES[quantity]}.`;
  const match = /^((?:\d+ )?\d+\/\d+|\d[\d,]*(?:\.\d*)?|\.\d+) ?([^\d\s].*)?$/.exec(entered);
  const number = match && readNumber(match[1] ?? '');
  if (!match || number == null) return { ok: false, message: `${name} cannot be read. ${like}` };
  const word = match[2]?.toLowerCase();
  if (word === undefined) return { ok: false, message: `${name} needs its unit. ${like}` };
  const unit = UNITS[quantity].find(({ words }) => words.includes(word));
  if (!unit) return { ok: false, message: `${name} has a unit that is not known here: ${match[2]}. ${like}` };
  const value = toFourPlaces(number * unit.factor);
  if (value < SMALLEST) return { ok: false, message: `${name} must be more than 0. ${like}` };
  if (value > LARGEST) return { ok: false, message: `${name} is larger than any part. Look at its unit.` };
  return { ok: true, value, entered };
}

/** The SI value in words, where something else was typed: `1.016 mm`. */
export function inBaseUnit(value: number, quantity: Quantity): string {
  const places = quantity === 'length' ? 3 : 1;
  return `${value.toLocaleString('en-US', { maximumFractionDigits: places })} ${BASE_UNITS[quantity]}`;
}

/** Numbers with a comma only between thousands: half the world writes `0,063` for what would be read as 63 here. */
function readNumber(text: string): number | null {
  const [, whole, above, below] = /^(?:(\d+) )?(\d+)\/(\d+)$/.exec(text) ?? [];
  if (above !== undefined)
    return Number(below) === 0 ? null : Number(whole ?? 0) + Number(above) / Number(below);
  if (!text.includes(',')) return Number(text);
  return /^[1-9]\d{0,2}(,\d{3})+(\.\d*)?$/.test(text) ? Number(text.replaceAll(',', '')) : null;
}

/** A value that means four decimals, not what is left of binary fractions: 0.040 in is 1.016 mm, not 1.01599…. */
const toFourPlaces = (value: number): number => Math.round(Number((value * 1e4).toPrecision(15))) / 1e4;
