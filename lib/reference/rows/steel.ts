import { z } from 'zod';

import { HEATED_WORK } from '@/lib/trade/pyrometry/class-needed';
import { FURNACE_CLASSES } from '@/lib/trade/pyrometry/furnace-class';
import { BAKE_HOURS_BY_STRENGTH } from '@/lib/trade/tables/bake-hours-by-strength';
import { EMBRITTLEMENT_RULES } from '@/lib/trade/tables/embrittlement-rules';
import { FURNACE_CLASSES_NEEDED } from '@/lib/trade/tables/furnace-classes-needed';
import { HARDNESS_STEEL_BRINELL } from '@/lib/trade/tables/hardness-steel-brinell';
import { HARDNESS_STEEL_HRB } from '@/lib/trade/tables/hardness-steel-hrb';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import { HARDNESS_STEEL_OTHER_LIST } from '@/lib/trade/tables/hardness-steel-other-list';
import { PH_STEEL_CONDITIONS } from '@/lib/trade/tables/ph-steel-conditions';
import { STEEL_TEMPERING, TEMPER_BANDS } from '@/lib/trade/tables/steel-tempering';
import { STEEL_WINDOWS } from '@/lib/trade/tables/steel-windows';

import { replaceable } from '../replaceable';
import {
  bare,
  byScale,
  degreesF,
  fahrenheit,
  hours,
  hrc,
  ksi,
  listOf,
  minutes,
  mpa,
  span,
  specifications,
  ticked,
  whole,
  words,
} from '../row-fields';

const revisions = z.union([
  z.literal('any'),
  z.strictObject({ letters: listOf(words(12)) }),
  z.strictObject({ fromYear: whole(1900, 2100).exactOptional(), toYear: whole(1900, 2100).exactOptional() }),
]);

/** Heat treatment of steel, its hardness, and hydrogen in it. */
export const STEEL_ROWS = [
  replaceable(
    STEEL_WINDOWS,
    z.strictObject({
      steel: words(40),
      operation: z.enum(['normalize', 'anneal', 'austenitize', 'solution']),
      rangeF: span(fahrenheit()),
      quench: z.enum(['oil', 'water_or_oil', 'oil_or_water_by_section', 'air_or_oil']).exactOptional(),
      forKsi: span(ksi()).exactOptional(),
      coolBelowF: fahrenheit().exactOptional(),
    }),
  ),
  replaceable(
    STEEL_TEMPERING,
    z.strictObject({
      steel: words(40),
      ksi: span(ksi()),
      temperF: span(fahrenheit()),
      times: z.literal([1, 2]),
      hoursEach: hours().exactOptional(),
    }),
  ),
  replaceable(
    TEMPER_BANDS,
    z.strictObject({
      steel: words(40).exactOptional(),
      bandF: span(fahrenheit()),
      says: z.enum(['never', 'avoid']),
    }),
  ),
  replaceable(
    PH_STEEL_CONDITIONS,
    z.strictObject({
      steels: listOf(words(40)),
      condition: words(20),
      ageF: fahrenheit(),
      toleranceF: degreesF(),
      hours: hours(),
      plusMin: minutes(),
      tensileKsiMin: ksi(),
      hrc: span(hrc()),
    }),
  ),
  replaceable(HARDNESS_STEEL_HRC, byScale),
  replaceable(HARDNESS_STEEL_HRB, byScale),
  replaceable(HARDNESS_STEEL_BRINELL, byScale),
  replaceable(HARDNESS_STEEL_OTHER_LIST, byScale),
  replaceable(
    EMBRITTLEMENT_RULES,
    z.strictObject({
      specifications,
      revisions,
      treatment: z.enum(['embrittlement_relief', 'stress_relief', 'not_to_be_plated', 'special_cleaning']),
      kinds: listOf(
        z.enum(['through_hardened', 'threaded_fastener', 'case_hardened', 'ph_stainless']),
      ).exactOptional(),
      onlyWorked: ticked.exactOptional(),
      from: z
        .strictObject({
          hrc: hrc().exactOptional(),
          ksi: ksi().exactOptional(),
          mpa: mpa().exactOptional(),
          isOver: ticked.exactOptional(),
        })
        .exactOptional(),
      temperature: z.strictObject({ unit: z.enum(['F', 'C']), range: span(bare(0, 1500)) }).exactOptional(),
      hours: z.union([z.literal('by_strength'), span(hours())]).exactOptional(),
      isHoursAgreed: ticked.exactOptional(),
      by: words(60).exactOptional(),
      startWithinHours: hours().exactOptional(),
      startWithinHoursPreferred: hours().exactOptional(),
      orRoomTemperatureHours: hours().exactOptional(),
      classWhenUnnamed: words(20).exactOptional(),
    }),
  ),
  replaceable(
    BAKE_HOURS_BY_STRENGTH,
    z.strictObject({ mpa: span(mpa()), ksi: span(ksi()), hrc: span(hrc()), hours: hours() }),
  ),
  replaceable(
    FURNACE_CLASSES_NEEDED,
    z.strictObject({
      work: z.enum(HEATED_WORK),
      loosest: z.literal(FURNACE_CLASSES),
      tightest: z.literal(FURNACE_CLASSES),
    }),
  ),
];
