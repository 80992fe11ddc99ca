import { mmFromInches } from './length';
import { KG_PER_POUND } from './mass';

/** A pound in a cubic inch, in grams in a cubic centimetre: 27.6799… */
const G_PER_CM3_PER_LB_PER_IN3 = (1000 * KG_PER_POUND) / (mmFromInches(1) / 10) ** 3;

/** Pounds per cubic inch to grams per cubic centimetre, exact: 0.100 lb/in³ is 2.76799… g/cm³. */
export const gPerCm3FromLbPerIn3 = (lbPerIn3: number): number => lbPerIn3 * G_PER_CM3_PER_LB_PER_IN3;

/** Grams per cubic centimetre to pounds per cubic inch, exact. */
export const lbPerIn3FromGPerCm3 = (gPerCm3: number): number => gPerCm3 / G_PER_CM3_PER_LB_PER_IN3;
