/** How well something was read: 1 poorly, 2 fairly, 3 well. */
export type ReadQuality = 1 | 2 | 3;

const WELL = 0.9;
const FAIRLY = 0.7;

/** In the three grades that are shown, from a confidence of 0 to 1 that is calibrated: of ten read well, nine are right. */
export const qualityOf = (confidence: number): ReadQuality =>
  confidence >= WELL ? 3 : confidence >= FAIRLY ? 2 : 1;
