import { HARDNESS_SCALES, type HardnessScale } from '@/lib/trade/hardness/hardness-table';
import { mmFromInches } from '@/lib/trade/units/length';

const plain = (written: string): string =>
  written
    .toLowerCase()
    .replace(/[\u00b5\u03bc]/g, 'u')
    .replace(/[^a-z0-9"%/]/g, '');

/** A unit of length; `isDecimal` says which can be turned into each other by moving the point. */
interface LengthUnit {
  readonly names: RegExp;
  readonly micrometres: number;
  readonly system: 'inch' | 'metric';
  readonly says: string;
}

const UM_PER_INCH = mmFromInches(1) * 1000;

const LENGTHS: readonly LengthUnit[] = [
  { names: /^(?:u|micro)(?:in|inch|inches|")$/, micrometres: UM_PER_INCH / 1e6, system: 'inch', says: 'µin' },
  { names: /^(?:mils?|thou)$/, micrometres: UM_PER_INCH / 1e3, system: 'inch', says: 'mil' },
  { names: /^(?:in|inch|inches|")$/, micrometres: UM_PER_INCH, system: 'inch', says: 'in' },
  {
    names: /^(?:um|microns?|micrometers?|micrometres?)$/,
    micrometres: 1,
    system: 'metric',
    says: 'µm',
  },
  { names: /^(?:mm|millimeters?|millimetres?)$/, micrometres: 1000, system: 'metric', says: 'mm' },
];

/** A unit of coating thickness as printed: `µin`, `microinch`, `mils`, `.0001"` is not one. Null where it is not known. */
export const lengthUnit = (written: string): LengthUnit | null =>
  LENGTHS.find(({ names }) => names.test(plain(written))) ?? null;

/** `%IACS`, `% IACS`, `IACS` or `MS/m`; null where it is neither. */
export function conductivityUnit(written: string): '% IACS' | 'MS/m' | null {
  const name = plain(written);
  if (/iacs|^%$/.test(name)) return '% IACS';
  return /^ms\/?m$/.test(name) ? 'MS/m' : null;
}

/** `ksi`, `psi` or `MPa`. */
export function stressUnit(written: string): 'ksi' | 'psi' | 'MPa' | null {
  const name = plain(written);
  if (name === 'ksi' || name === 'psi') return name;
  return /^(?:mpa|n\/mm2)$/.test(name) ? 'MPa' : null;
}

const isScale = (name: string): name is HardnessScale => HARDNESS_SCALES.some((scale) => scale === name);

/** A scale as printed: `HRB`, `HRBW`, `Rockwell "B"`, `Rb`, `BHN`. Null where the tables do not know it. */
export function hardnessScale(written: string): HardnessScale | null {
  const name = hardnessName(written);
  return isScale(name) ? name : null;
}

/** The scale written one way, also where no table knows it. */
export function hardnessName(written: string): string {
  const name = written.toUpperCase().replace(/[^A-Z0-9]/g, '');
  const rockwell = /^(?:ROCKWELL|HR|R)(\d{0,2}[A-Z])W?$/.exec(name)?.[1];
  if (rockwell !== undefined) return `HR${rockwell}`;
  if (/^(?:BHN|HB|HBS|BRINELL)$/.test(name)) return 'HBW';
  if (/^(?:HB500|HBS?10500|HBW10500|BHN500)$/.test(name)) return 'HB500';
  if (/^(?:HBW103000|HB3000|BHN3000|HBW)$/.test(name)) return 'HBW';
  return /^(?:HV\d*|VICKERS|DPH|VPN)$/.test(name) ? 'HV' : name;
}
