import { ALLOYS, type Alloy } from '@/lib/trade/alloys/alloy';
import { readMaterial } from '@/lib/trade/alloys/read-material';
import type { ProductForm } from '@/lib/trade/process';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';
import { readTemper } from '@/lib/trade/tempers/read-temper';
import type { Temper } from '@/lib/trade/tempers/temper';

/** A temper behind an alloy's number, or by itself: the T42 of `2024-O to 2024-T42`, `-T6`, `TO T62 CONDITION`. */
const CONDITION = /(?:^|[\s(/,-])([OFW]|AQ|T\d{1,4})(?=$|[\s)/,;.:-])/g;

/** The tempers named in a text, in its order. An O or F by itself is one only behind a dash or alone. */
export function tempersIn(written: string): Temper[] {
  const text = written.toUpperCase();
  return [...text.matchAll(CONDITION)].flatMap(({ 0: whole, 1: name = '' }) => {
    const isLetter = name.length === 1;
    if (isLetter && !whole.startsWith('-') && text.trim() !== name) return [];
    const read = readTemper(TEMPER_DESIGNATIONS, name);
    return read.ok ? [read.stated.temper] : [];
  });
}

/** The first alloy that the tables know in a text, wherever its words stand: `ALUM 2024-O SHEET`. */
export function alloyIn(written: string): Alloy | null {
  for (const { index } of written.matchAll(/(?<![\w.])\w/g)) {
    const read = readMaterial(TEMPER_DESIGNATIONS, written.slice(index));
    if (read.ok && ALLOYS[read.alloy] !== 'plating') return read.alloy;
  }
  return null;
}

export const saysClad = (written: string): boolean => /\b(?:alclad|clad|alc)\b/i.test(written);

const FORMS: readonly (readonly [RegExp, ProductForm])[] = [
  [/\bplate\b/i, 'plate'],
  [/\b(?:bar|rod)\b/i, 'bar'],
  [/\btub(?:e|ing)\b/i, 'tube'],
  [/\bextru/i, 'extrusion'],
  [/\bforg/i, 'forging'],
  [/\bcast/i, 'casting'],
];

export const formIn = (written: string): ProductForm =>
  FORMS.find(([pattern]) => pattern.test(written))?.[1] ?? 'sheet';
