import { readTemper, type StatedTemper } from '../tempers/read-temper';
import type { TemperRow } from '../tables/tempers';
import type { Source } from '../source';
import type { Table } from '../table';
import { ALLOYS, familyOf, type Alloy, type AlloyFamily } from './alloy';

export interface Material {
  readonly alloy: Alloy;
  readonly family: AlloyFamily;
  /** The words say clad or Alclad. Nothing said is not the same as bare. */
  readonly saysClad: boolean;
  /** What stands behind the alloy's number, when it is a temper that the table knows. */
  readonly temper?: StatedTemper;
}

export type MaterialVerdict =
  | ({ readonly ok: true } & Material)
  | { readonly ok: false; readonly reason: 'unknown_alloy'; readonly source?: Source };

/**
 * Reads the material of a drawing: `2024-T3`, `Alclad 7075-O`, `AA 6061`, `17-4 PH`, `Ti 6Al-4V`.
 *
 * A former name such as 24S is no alloy here: `presentName` proposes what it is today, and somebody decides.
 *
 * @param tempers the temper designations that may follow the alloy.
 * @returns refused as `unknown_alloy` when no name of the list is found.
 * @example readMaterial(TEMPER_DESIGNATIONS, 'Alclad 2024-T3') is {alloy: '2024', saysClad: true, temper: {temper: 'T3'}}
 */
export function readMaterial(tempers: Table<TemperRow>, written: string): MaterialVerdict {
  const saysClad = /\b(?:alclad|clad|alc)\b/i.test(written);
  const plain = written
    .replace(
      /\b(?:alclad|clad|alc|aluminium alloy|aluminum alloy|aluminium|aluminum|aa|al|aisi|sae)\b/gi,
      ' ',
    )
    .trim();
  const alloy = NAMES.find(({ pattern }) => pattern.test(plain));
  if (!alloy) return readWhole(written);
  const rest = plain.replace(alloy.pattern, '');
  const temper = rest.trim() === '' ? undefined : readTemper(tempers, rest);
  return {
    ok: true,
    alloy: alloy.name,
    family: familyOf(alloy.name),
    saysClad,
    ...(temper?.ok ? { temper: temper.stated } : {}),
  };
}

/** Names in which the word aluminium is part of the name. */
function readWhole(written: string): MaterialVerdict {
  const whole = NAMES.find(({ pattern }) => pattern.test(written.trim()));
  if (!whole) return { ok: false, reason: 'unknown_alloy' };
  return { ok: true, alloy: whole.name, family: familyOf(whole.name), saysClad: false };
}

const isAlloy = (name: string): name is Alloy => name in ALLOYS;

/** Longest first, so that `AZ31B` is not read as something shorter; spaces and dashes within a name are free. */
const NAMES = Object.keys(ALLOYS)
  .filter(isAlloy)
  .sort((a, b) => b.length - a.length)
  .map((name) => {
    const letters = [...name.replace(/[ -]/g, '')].join('[ -]?');
    return { name, pattern: new RegExp(`^${letters}(?![0-9A-Za-z])`, 'i') };
  });
