import { mmFromInches } from './length';
import { KG_PER_POUND } from './mass';

/** Exact by definition: the standard acceleration of free fall, m/s². */
const STANDARD_GRAVITY = 9.80665;
/** 1000 pounds-force on a square inch, in newtons on a square millimetre: 6.894757… */
const MPA_PER_KSI = (1000 * KG_PER_POUND * STANDARD_GRAVITY) / mmFromInches(1) ** 2;

/** Thousands of pounds-force per square inch to megapascals, exact: 100 ksi is 689.4757… MPa. */
export const mpaFromKsi = (ksi: number): number => ksi * MPA_PER_KSI;

/** Megapascals to thousands of pounds-force per square inch, exact. */
export const ksiFromMpa = (mpa: number): number => mpa / MPA_PER_KSI;
