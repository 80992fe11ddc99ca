import { z } from 'zod';

import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { ANNEALS } from '@/lib/trade/tables/anneals';
import { CLAD_REHEATS_MIL, CLAD_REHEATS_TO, CLAD_TREATMENTS_AMS } from '@/lib/trade/tables/clad-reheats';
import { MELTING } from '@/lib/trade/tables/melting';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { QUENCH_BATHS, QUENCH_MEDIA, QUENCH_RULES } from '@/lib/trade/tables/quench-media';
import { SOAK_TIMES } from '@/lib/trade/tables/soak-times';
import { SOLUTION_TEMPERATURES } from '@/lib/trade/tables/solution-temperatures';

import { replaceable } from '../replaceable';
import {
  alloy,
  alloys,
  degreesF,
  fahrenheit,
  form,
  hours,
  inches,
  listOf,
  minutes,
  percent,
  seconds,
  span,
  temper,
  whole,
} from '../row-fields';

const solutionForm = z.enum(['sheet', 'plate', 'bar', 'tube', 'extrusion', 'forging', 'rivet wire']);

const soak = z.strictObject({ minMin: minutes(), maxCladMin: minutes().exactOptional() });

const cladReheats = z.strictObject({
  limitIn: inches().nullable(),
  includesLimit: z.boolean(),
  max: whole(0, 20),
  counts: z.enum(['reheats', 'solution_treatments']),
  maxWithApproval: whole(0, 20).exactOptional(),
});

const ageingStep = z.strictObject({
  setF: span(fahrenheit()),
  limitsF: span(fahrenheit()).exactOptional(),
  hours: span(hours()).exactOptional(),
  nominalHours: hours().exactOptional(),
});

const ageingCycle = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('natural'), hours: hours() }),
  z.strictObject({
    kind: z.enum(['artificial', 'two_step', 'second_step']),
    steps: z.array(ageingStep).min(1).max(2),
  }),
]);

/** Heat treatment of aluminium. */
export const ALUMINIUM_ROWS = [
  replaceable(
    SOLUTION_TEMPERATURES,
    z.strictObject({
      alloys: z.union([z.literal('any'), alloys]),
      forms: z.union([z.literal('any'), listOf(solutionForm)]),
      rangeF: span(fahrenheit()).exactOptional(),
      setPointF: span(fahrenheit()).exactOptional(),
      meltingRiskAboveF: fahrenheit().exactOptional(),
      cladHighF: fahrenheit().exactOptional(),
      holdWithinF: degreesF().exactOptional(),
      soakMin: span(minutes()).exactOptional(),
    }),
  ),
  replaceable(SOAK_TIMES, z.strictObject({ upToIn: inches().nullable(), salt: soak, air: soak }), {
    rising: 'upToIn',
  }),
  replaceable(
    QUENCH_DELAYS,
    z.strictObject({
      fromIn: inches(),
      maxS: seconds(),
      lateAboveF: fahrenheit().exactOptional(),
      lateAboveByAlloyF: z.partialRecord(alloy, fahrenheit()).exactOptional(),
    }),
    { rising: 'fromIn' },
  ),
  replaceable(
    QUENCH_BATHS,
    z.strictObject({
      rule: z.enum(QUENCH_RULES),
      medium: z.enum(QUENCH_MEDIA),
      startF: z.strictObject({ from: fahrenheit().exactOptional(), to: fahrenheit() }).exactOptional(),
      maxRiseF: degreesF().exactOptional(),
      anyTimeToF: fahrenheit().exactOptional(),
      maxConcentrationPercent: percent().exactOptional(),
    }),
  ),
  replaceable(
    AGEING_CYCLES,
    z.strictObject({
      alloys,
      changes: listOf(z.tuple([temper, temper])),
      forms: listOf(form).exactOptional(),
      cycle: ageingCycle,
    }),
  ),
  replaceable(
    ANNEALS,
    z.strictObject({
      alloys,
      holdF: fahrenheit(),
      hours: span(hours()),
      coolFPerHour: degreesF(),
      coolToF: fahrenheit(),
    }),
  ),
  replaceable(
    MELTING,
    z.strictObject({
      alloy,
      meltsFromF: fahrenheit(),
      homogenisingRaisesF: span(degreesF()).exactOptional(),
    }),
  ),
  replaceable(CLAD_REHEATS_MIL, cladReheats, { rising: 'limitIn' }),
  replaceable(CLAD_TREATMENTS_AMS, cladReheats, { rising: 'limitIn' }),
  replaceable(CLAD_REHEATS_TO, cladReheats, { rising: 'limitIn' }),
];
