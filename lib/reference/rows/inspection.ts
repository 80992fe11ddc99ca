import { z } from 'zod';

import { SAMPLE_LETTERS } from '@/lib/trade/sampling/code-letter';
import { NDT_DESIGNATIONS } from '@/lib/trade/tables/ndt-designations';
import { CODE_LETTERS } from '@/lib/trade/tables/sampling-code-letters';
import { SINGLE_SAMPLING_NORMAL } from '@/lib/trade/tables/single-sampling-normal';
import { SINGLE_SAMPLING_REDUCED } from '@/lib/trade/tables/single-sampling-reduced';
import { SINGLE_SAMPLING_TIGHTENED } from '@/lib/trade/tables/single-sampling-tightened';

import { replaceable } from '../replaceable';
import { whole, words } from '../row-fields';

const letter = z.enum(SAMPLE_LETTERS);
const cell = z.union([z.enum(['down', 'up']), z.tuple([whole(0, 1000), whole(0, 1000)])]).exactOptional();

const singleSampling = z.strictObject({
  letter,
  sampleSize: whole(1, 100_000),
  // By acceptable quality level, in nonconforming pieces per hundred.
  cells: z.strictObject({
    ...{ 0.1: cell, 0.15: cell, 0.25: cell, 0.4: cell, 0.65: cell },
    ...{ 1: cell, 1.5: cell, 2.5: cell, 4: cell, 6.5: cell },
  }),
});

/** Non-destructive testing and sampling. */
export const INSPECTION_ROWS = [
  replaceable(
    NDT_DESIGNATIONS,
    z.strictObject({
      method: z.enum(['penetrant', 'magnetic_particle']),
      key: z.enum(['type', 'method', 'level', 'medium']),
      value: words(40),
      says: words(),
    }),
  ),
  replaceable(
    CODE_LETTERS,
    z.strictObject({
      lotFrom: whole(1, 10_000_000),
      lotTo: whole(1, 10_000_000).nullable(),
      letters: z.strictObject({
        ...{ S1: letter, S2: letter, S3: letter, S4: letter },
        ...{ I: letter, II: letter, III: letter },
      }),
    }),
    { rising: 'lotFrom' },
  ),
  replaceable(SINGLE_SAMPLING_NORMAL, singleSampling),
  replaceable(SINGLE_SAMPLING_TIGHTENED, singleSampling),
  replaceable(SINGLE_SAMPLING_REDUCED, singleSampling),
];
