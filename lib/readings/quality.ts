/** How well something was read: 1 poorly, 2 fairly, 3 well. */
export type ReadQuality = 1 | 2 | 3;

const WELL = 0.9;
const FAIRLY = 0.7;

/** In the three grades that are shown, from a confidence of 0 to 1 that is calibrated: of ten read well, nine are right. */
export function qualityOf(confidence: number): ReadQuality {
  if (confidence >= WELL) return 3;
  return confidence >= FAIRLY ? 2 : 1;
}
