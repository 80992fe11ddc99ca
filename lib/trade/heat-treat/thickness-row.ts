import { inchesFromMm } from '../units/length';

/**
 * A printed thickness that was converted to millimetres and rounded to four places is still that thickness. A hundredth
 * of the last printed place, so that nothing which somebody could measure moves into another row.
 */
const SAME_IN = 0.000_01;

/** Inches as the tables print them; null where it is no thickness. */
export const printedInches = (thicknessMm: number): number | null =>
  thicknessMm > 0 && Number.isFinite(thicknessMm) ? inchesFromMm(thicknessMm) : null;

/** Whether a thickness is at most what is printed. */
export const isUpTo = (inches: number, printedIn: number): boolean => inches <= printedIn + SAME_IN;

/** Whether a thickness is less than what is printed. */
export const isBelow = (inches: number, printedIn: number): boolean => inches < printedIn - SAME_IN;
