import type { Stage } from '@/lib/batches/stage';

/** What a stage is called on the screen. */
export const STAGE_WORDS: Record<Stage, string> = {
  building: 'building',
  dispatched: 'dispatched',
  at_processor: 'at processor',
  returned: 'returned',
  proved: 'proved',
  settled: 'settled',
  stocked: 'stocked',
  held: 'held',
  cancelled: 'cancelled',
};

/** Sets the three tones of a stage (`--te` edge, `--ti` ink, `--tw` wash) for what stands inside. */
export const STAGE_TONES: Record<Stage, string> = {
  building: 's-building',
  dispatched: 's-dispatched',
  at_processor: 's-atproc',
  returned: 's-returned',
  proved: 's-proved',
  settled: 's-settled',
  stocked: 's-stocked',
  held: 's-held',
  cancelled: 's-cancelled',
};
