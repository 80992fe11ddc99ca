/** What the words after a specification's number choose: `type II class 1A`, `SC 2`, `method D, level 3`. */
export interface Designation {
  readonly type?: string;
  readonly class?: string;
  readonly grade?: string;
  readonly method?: string;
  readonly level?: string;
  readonly serviceCondition?: string;
  readonly feZn?: string;
}

export type DesignationKey = keyof Designation;

const PATTERNS: Readonly<Record<DesignationKey, RegExp>> = {
  type: /\bTY(?:PE)?\.?\s*([IVX]{1,4}[ABC]?|[MZ]|\d+)\b/,
  class: /\bCL(?:ASS)?\.?\s*(\d+[A-Z]?)\b/,
  grade: /\bGR(?:ADE)?\.?\s*([A-G])\b/,
  method: /\bMETHOD\s*([A-D]|\d)\b/,
  level: /\b(?:LEVEL|SENSITIVITY|SENS\.?)\s*(?:LEVEL\s*)?(1\/2|[1-4])\b/,
  serviceCondition: /\bSC\s*(\d)\b/,
  feZn: /\bFE\s*\/\s*ZN\s*(\d+)\b/,
};

/**
 * Reads type, class, grade, method, level and the like from what stands on an order, in upper case. What is not there
 * is not there: nothing is assumed here.
 *
 * Worked example: `Type II, class 1A` has type II and class 1A.
 */
export function readDesignation(typed: string): Designation {
  const text = typed.toUpperCase();
  const found = Object.entries(PATTERNS).flatMap(([key, pattern]) => {
    const value = pattern.exec(text)?.[1];
    return value === undefined ? [] : [[key, value] as const];
  });
  return Object.fromEntries(found);
}
