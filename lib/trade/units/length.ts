/** Exact by definition of the inch. */
const MM_PER_INCH = 25.4;

/** Inches to millimetres, exact: 0.032 in is 0.8128 mm. */
export const mmFromInches = (inches: number): number => inches * MM_PER_INCH;

/** Millimetres to inches, exact: 25.4 mm is 1 in. */
export const inchesFromMm = (mm: number): number => mm / MM_PER_INCH;
