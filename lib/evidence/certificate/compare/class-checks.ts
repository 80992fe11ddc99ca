import { readDesignation, type Designation } from '@/lib/trade/finishes/read-designation';
import { z } from 'zod';

import type { Order } from '../../order';
import type { StatedCertificate } from '../certificate';
import type { Check } from './compared';
import { cannotTell, doubtful, meets, notStated, wrong, type Outcome } from './outcome';
import { tempersIn } from './tempers-in';

const ROMAN: Readonly<Record<string, string>> = {
  ...{ I: '1', II: '2', III: '3', IV: '4', V: '5', VI: '6', VII: '7', VIII: '8', IX: '9', X: '10' },
};

/** II and 2 are one type, 1A and 1a one class. */
const sameValue = (written: string): string => {
  const [, roman = '', letter = ''] = /^([IVX]+)([ABC]?)$/.exec(written) ?? [];
  return roman === '' ? written : `${ROMAN[roman] ?? roman}${letter}`;
};

const INSPECTIONS = new Set(['fluorescent_penetrant', 'magnetic_particle']);

/** Type, class and grade are those ordered; of an inspection its type, method and sensitivity. */
export const isOrderedClass: Check = ({ stated, order }) => {
  const isInspection = INSPECTIONS.has(order.process);
  const words = isInspection ? inspectionWords(order) : (order.class_type ?? '');
  if (words.trim() === '') return [];
  const says = isInspection ? inspectionSaid(stated) : (stated.class_type ?? '');
  const asked = { requirement: `class and type ${words}`, ordered: words, stated: says || null };
  if (says === '') return [notStated({ ...asked, stated: null })];
  const [ordered, given] = [designationOf(words), designationOf(says)];
  const keys = Object.keys(ordered);
  if (keys.length > 0) return [designationOutcome(asked, { ordered, given, isInspection })];
  // Conditions are compared as conditions.
  if (tempersIn(words).length > 0) return [];
  return isInspection ? [] : [freeWords(asked, words, says)];
};

type Named = Readonly<Partial<Record<keyof Designation | 'bath' | 'medium' | 'carrier', string>>>;

/** Words that choose something and have no name of their own before them. */
const CHOICES: readonly (readonly ['bath' | 'medium' | 'carrier', RegExp])[] = [
  ['bath', /\b((?:NITRIC|CITRIC)\s*\d)\b/],
  ['medium', /\b(?<!NON-?\s?)(FLUORESCENT|VISIBLE)\b/],
  ['carrier', /\b(WET|DRY)\b/],
];

function designationOf(written: string): Named {
  const chosen = CHOICES.flatMap(([key, pattern]) => {
    const value = pattern.exec(written.toUpperCase())?.[1];
    return value === undefined ? [] : [[key, value.replace(/\s+/g, ' ')] as const];
  });
  const read = Object.entries(readDesignation(written)).map(
    ([key, value]) => [key, sameValue(value)] as const,
  );
  return { ...Object.fromEntries(read), ...Object.fromEntries(chosen) };
}

function designationOutcome(
  asked: { requirement: string; ordered: string; stated: string | null },
  { ordered, given, isInspection }: { ordered: Named; given: Named; isInspection: boolean },
): Outcome {
  const entries = Object.entries(ordered);
  const other = entries.filter(([key, value]) => {
    const stated = new Map(Object.entries(given)).get(key);
    return stated !== undefined && stated !== value;
  });
  if (other.length > 0)
    return wrong(
      isInspection ? 'ndt_type_mismatch' : 'wrong_class_type',
      asked,
      `The order asks for ${asked.ordered}, the certificate says ${asked.stated ?? ''}: another ${other.map(([key]) => KEY_WORDS[key] ?? key).join(' and ')}.`,
    );
  const open = entries.filter(([key]) => !(key in given)).map(([key]) => KEY_WORDS[key] ?? key);
  if (open.length === entries.length)
    return cannotTell(asked, `The certificate does not say which ${open.join(', ')}.`);
  return open.length > 0
    ? meets(asked, `What it says agrees; it does not say which ${open.join(', ')}.`)
    : meets(asked, 'It is what was ordered.');
}

const KEY_WORDS: Readonly<Record<string, string>> = {
  serviceCondition: 'service condition',
  feZn: 'thickness class',
  level: 'sensitivity level',
};

/** Words without a known designation are compared by what has numbers in it: `160-180 ksi`, `H1025`. */
function freeWords(
  asked: { requirement: string; ordered: string; stated: string | null },
  words: string,
  says: string,
): Outcome {
  const numbers = (text: string) => text.toUpperCase().match(/[A-Z]*\d+(?:\.\d+)?[A-Z]*/g) ?? [];
  const [ordered, given] = [numbers(words), numbers(says)];
  const covers = (all: readonly string[], some: readonly string[]) => some.every((one) => all.includes(one));
  if (ordered.length > 0 && given.length > 0 && !covers(ordered, given) && !covers(given, ordered))
    return wrong(
      'wrong_class_type',
      asked,
      `The order asks for ${words}, the certificate says ${says}.`,
      'check',
    );
  const isSame = ordered.length > 0 && covers(given, ordered);
  return isSame
    ? meets(asked, 'It is what was ordered.')
    : cannotTell(asked, 'The words have to be compared.');
}

const NdtAsked = z.looseObject({
  type: z.string().optional(),
  method: z.string().optional(),
  sensitivity: z.union([z.string(), z.number()]).optional(),
  level: z.union([z.string(), z.number()]).optional(),
  personnel_level: z.union([z.string(), z.number()]).optional(),
});

/** What an order asks of an inspection, wherever it says so. */
function ndtAsked({ requirements }: Order): z.output<typeof NdtAsked> {
  const nested = NdtAsked.safeParse(requirements['ndt'] ?? requirements['penetrant']);
  const flat = NdtAsked.safeParse(requirements);
  return { ...(flat.success ? flat.data : {}), ...(nested.success ? nested.data : {}) };
}

const word = (name: string, value: string | number | null | undefined): string[] => {
  if (value == null || value === '') return [];
  const bare = String(value).replace(/^\s*(?:type|method|sensitivity|level|sens\.?)\s*(?:level)?\s*/i, '');
  return [`${name} ${bare}`];
};

function inspectionWords(order: Order): string {
  const { type, method, sensitivity, level } = ndtAsked(order);
  const required = [
    ...word('Type', type),
    ...(method && /^(?:method\s*)?[A-D]$/i.test(method) ? word('Method', method) : []),
    ...word('Level', sensitivity ?? level),
  ];
  return [order.class_type ?? '', ...required].filter((part) => part !== '').join(', ');
}

function inspectionSaid({ ndt, class_type }: StatedCertificate): string {
  const read = [
    ...word('Type', ndt?.type),
    ...(ndt?.method && /^(?:method\s*)?[A-D]$/i.test(ndt.method)
      ? word('Method', ndt.method)
      : [ndt?.method ?? '']),
    ...word('Level', ndt?.sensitivity),
  ];
  return [...read, class_type ?? ''].filter((part) => part !== '').join(', ');
}

const levelNumber = (written: string | number): number => {
  const found = /\b(I{1,3}|[1-3])\b/.exec(String(written).toUpperCase())?.[1];
  return found === undefined ? NaN : Number(ROMAN[found] ?? found);
};

/** Who inspected was qualified to the level that the order asks for. */
export const isQualifiedInspector: Check = ({ stated, order }) => {
  const level = ndtAsked(order).personnel_level;
  if (level === undefined) return [];
  const said = stated.ndt?.personnel_level ?? null;
  const asked = { requirement: `inspector level ≥ ${level}`, ordered: String(level), stated: said };
  if (said === null) return [notStated(asked)];
  const [needed, given] = [levelNumber(level), levelNumber(said)];
  if (Number.isNaN(needed) || Number.isNaN(given)) return [cannotTell(asked, 'The level cannot be read.')];
  if (given >= needed) return [meets(asked, 'The level is high enough.')];
  return [
    doubtful(
      'personnel_level_too_low',
      asked,
      `The order asks for level ${level}, the certificate says ${said}.`,
    ),
  ];
};
