import { z } from 'zod';

import { CONVERSION_CLASSES } from '@/lib/trade/tables/conversion-classes';
import { EXPOSURE_ITEMS, EXPOSURE_LIMITS } from '@/lib/trade/tables/exposure-limits';
import { FINISH_DEFAULTS } from '@/lib/trade/tables/finish-defaults';
import { MAGNETIC_PARTICLE_PLATING } from '@/lib/trade/tables/magnetic-particle-plating';
import { PASSIVATION_BATHS } from '@/lib/trade/tables/passivation-baths';
import { PASSIVATION_TESTS } from '@/lib/trade/tables/passivation-tests';
import { PLATING_CLASSES } from '@/lib/trade/tables/plating-classes';

import { replaceable } from '../replaceable';
import {
  bare,
  celsius,
  degreesF,
  fahrenheit,
  hours,
  inches,
  minutes,
  percent,
  span,
  specifications,
  whole,
  words,
} from '../row-fields';

const designation = z.strictObject({
  ...{ type: words(12).exactOptional(), class: words(12).exactOptional(), grade: words(12).exactOptional() },
  ...{ method: words(12).exactOptional(), level: words(12).exactOptional() },
  ...{ serviceCondition: words(12).exactOptional(), feZn: words(12).exactOptional() },
});

const thick = bare(0, 1000).exactOptional();
const finish = z.strictObject({
  finish: z.enum([
    'cadmium',
    'zinc',
    'nickel',
    'electroless_nickel',
    'chromium',
    'anodize',
    'conversion_coating',
    'phosphate',
    'ion_vapour_aluminium',
  ]),
  specifications,
  // A class that needs nothing more named has an empty one.
  for: designation.default({}),
  says: words().exactOptional(),
  thickness: z
    .strictObject({ unit: z.enum(['in', 'um']), min: thick, max: thick, nominal: thick })
    .exactOptional(),
  saltSprayHours: hours().exactOptional(),
  saltSprayTo: z.literal('white_corrosion').exactOptional(),
  qualificationHours: hours().exactOptional(),
  weight: z
    .strictObject({
      unit: z.enum(['mg/ft2', 'g/m2']),
      min: bare(0, 100_000),
      max: bare(0, 100_000).exactOptional(),
    })
    .exactOptional(),
  mostF: fahrenheit().exactOptional(),
  hardeningF: span(fahrenheit()).exactOptional(),
});

const exposureLimit = z.union([
  z.literal('below_its_ageing'),
  z.strictObject({ mostF: fahrenheit(), mostC: celsius() }),
  z.strictObject({ belowTemperF: degreesF(), belowTemperC: bare(0, 200).meta({ unit: '°C' }) }),
]);

/** Coatings by class and type, and what a finished part may be exposed to. */
export const FINISH_ROWS = [
  replaceable(PLATING_CLASSES, finish),
  replaceable(CONVERSION_CLASSES, finish),
  replaceable(
    FINISH_DEFAULTS,
    z.discriminatedUnion('rule', [
      z.strictObject({ specifications, rule: z.literal('when_unstated'), means: designation }),
      z.strictObject({
        specifications,
        rule: z.literal('passivation_acid'),
        acid: z.literal('nitric'),
        method: z.literal('1'),
        testClass: z.literal('4'),
      }),
    ]),
  ),
  replaceable(
    EXPOSURE_LIMITS,
    z.strictObject({
      item: z.enum(EXPOSURE_ITEMS),
      limit: exposureLimit,
      because: z.enum([
        'film_dehydrates',
        'cadmium_embrittles_hot_steel',
        'coating_fails',
        'film_crazes',
        'peening_is_relieved',
        'would_over_temper',
        'begins_to_age',
        'would_over_age',
      ]),
    }),
  ),
  replaceable(
    MAGNETIC_PARTICLE_PLATING,
    z.strictObject({ fromIn: inches(1), inspect: z.enum(['before_and_after', 'before', 'before_or_after']) }),
    { rising: 'fromIn' },
  ),
  replaceable(
    PASSIVATION_BATHS,
    z.strictObject({
      ...{ acid: z.enum(['nitric', 'citric']), number: whole(1, 20), percent: span(percent()) },
      ...{ dichromatePercent: percent().exactOptional(), rangeF: span(fahrenheit()) },
      ...{ leastMin: minutes(), saltSprayHours: hours() },
    }),
  ),
  replaceable(PASSIVATION_TESTS, z.strictObject({ practice: z.enum(['A', 'B', 'C', 'D']), says: words() })),
];
