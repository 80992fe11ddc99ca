import { z } from 'zod';

import { HARDNESS_SCALES } from '@/lib/trade/hardness/hardness-table';
import { ACCEPTANCE } from '@/lib/trade/tables/acceptance';
import { DENSITIES } from '@/lib/trade/tables/densities';
import { HARDNESS_ALUMINIUM } from '@/lib/trade/tables/hardness-aluminium';
import { OLD_NAMES } from '@/lib/trade/tables/old-names';
import { TEMPER_TRANSITIONS } from '@/lib/trade/tables/temper-transitions';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';

import { replaceable } from '../replaceable';
import {
  alloys,
  bare,
  byScale,
  form,
  iacs,
  listOf,
  percent,
  span,
  temper,
  ticked,
  whole,
  words,
} from '../row-fields';

const operation = z.enum([
  'solution_heat_treat',
  're_solution_heat_treat',
  'quench',
  'natural_age',
  'artificial_age',
  'two_step_age',
  'second_step_age',
  'anneal',
]);
const transitionCaution = z.enum([
  'forming_window_opens',
  'state_the_time',
  'time_to_age_is_limited',
  'prove_conductivity',
  'user_tempers_only_afterwards',
  'cold_work_is_the_mills',
  'strength_drops',
]);
const whyNot = z.enum([
  'needs_mill_cold_work',
  'needs_mill_stretch',
  'ageing_gives_another_temper',
  'ageing_cannot_be_undone',
  'needs_re_solution',
  'never_stable_at_room_temperature',
  'not_hardened_by_ageing',
]);

/** Materials, their names, the conditions they come in and what shows a condition. */
export const CONDITION_ROWS = [
  replaceable(
    TEMPER_TRANSITIONS,
    z.strictObject({
      alloys,
      from: z.union([z.enum(['any', 'any_heat_treated']), temper]),
      to: temper,
      forms: listOf(form).exactOptional(),
      result: z.discriminatedUnion('is', [
        z.strictObject({
          is: z.literal('made'),
          // Driving a rivet is none of these.
          by: z.array(operation).max(10).default([]),
          cautions: listOf(transitionCaution).exactOptional(),
        }),
        z.strictObject({ is: z.literal('made_under_other_name'), properName: temper }),
        z.strictObject({ is: z.literal('not_made'), why: whyNot, gives: temper.exactOptional() }),
      ]),
    }),
  ),
  replaceable(
    TEMPER_DESIGNATIONS,
    z.strictObject({
      temper,
      alsoWritten: listOf(words(20)).exactOptional(),
      madeBy: z.enum(['mill', 'mill_by_name', 'mill_then_age', 'user', 'either']),
      coldWork: z
        .strictObject({
          kind: z.enum(['mill', 'reduction', 'stretch']),
          percent: span(percent()).exactOptional(),
          percentByForm: z.record(z.string(), span(percent())).exactOptional(),
        })
        .exactOptional(),
      madeByUserIs: temper.exactOptional(),
      withoutColdWork: temper.exactOptional(),
      statesTime: ticked.exactOptional(),
    }),
  ),
  replaceable(
    OLD_NAMES,
    z.discriminatedUnion('kind', [
      z.strictObject({
        kind: z.literal('name'),
        old: words(40),
        present: z.array(words(40)).max(20),
        note: z
          .enum(['commercially_pure', 'not_exactly_the_same', 'rivet_alloy', 'trade_name', 'time_is_stated'])
          .exactOptional(),
      }),
      z.strictObject({
        kind: z.literal('series'),
        from: whole(0, 9999),
        to: whole(0, 9999),
        element: words(60),
      }),
      z.strictObject({
        kind: z.literal('prefix'),
        letters: words(8),
        means: z.enum(['development', 'experimental', 'modified']),
      }),
      z.strictObject({ kind: z.literal('mark'), written: words(40), means: z.literal('clad') }),
    ]),
  ),
  replaceable(
    DENSITIES,
    z.strictObject({
      alloys,
      conditions: listOf(words(20)).exactOptional(),
      lbPerIn3: bare(0.01, 1).meta({ unit: 'lb/in³' }),
    }),
  ),
  replaceable(
    ACCEPTANCE,
    z.strictObject({
      alloy: words(40),
      conditions: listOf(words(20)),
      iacs: span(iacs()).exactOptional(),
      hardness: z
        .array(
          z.strictObject({
            scale: z.enum(HARDNESS_SCALES),
            min: bare(0, 1000).exactOptional(),
            max: bare(0, 1000).exactOptional(),
            isAbout: ticked.exactOptional(),
          }),
        )
        .min(1)
        .max(4)
        .exactOptional(),
      kind: z.enum(['acceptance', 'worked_example']),
    }),
  ),
  replaceable(HARDNESS_ALUMINIUM, byScale),
];
