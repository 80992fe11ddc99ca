import type { Alloy } from '../alloys/alloy';
import type { ProductForm } from '../process';
import type { Certainty, Source } from '../source';
import type { Table } from '../table';
import type { Temper } from '../tempers/temper';

export type Operation =
  | 'solution_heat_treat'
  | 're_solution_heat_treat'
  | 'quench'
  | 'natural_age'
  | 'artificial_age'
  | 'two_step_age'
  | 'second_step_age'
  | 'anneal';

export type TransitionCaution =
  | 'forming_window_opens'
  | 'state_the_time'
  | 'time_to_age_is_limited'
  | 'prove_conductivity'
  | 'user_tempers_only_afterwards'
  | 'cold_work_is_the_mills'
  | 'strength_drops';

export type WhyNot =
  | 'needs_mill_cold_work'
  | 'needs_mill_stretch'
  | 'ageing_gives_another_temper'
  | 'ageing_cannot_be_undone'
  | 'needs_re_solution'
  | 'never_stable_at_room_temperature'
  | 'not_hardened_by_ageing';

export interface TransitionRow {
  readonly alloys: readonly Alloy[];
  readonly from: Temper | 'any' | 'any_heat_treated';
  readonly to: Temper;
  readonly forms?: readonly ProductForm[];
  readonly result:
    | {
        readonly is: 'made';
        readonly by: readonly Operation[];
        readonly cautions?: readonly TransitionCaution[];
      }
    | { readonly is: 'made_under_other_name'; readonly properName: Temper }
    | { readonly is: 'not_made'; readonly why: WhyNot; readonly gives?: Temper };
}

const PRACTICE = 'AMS 2770 / MIL-H-6088G practice and ANSI H35.1 rules';
const TO = 'T.O. 1-1A-9 para 3-54';
const TO_ADDRESS = 'https://aviationandaccessories.tpub.com/TM-43-0106/css/TM-43-0106_166.htm';
const source: Source = { document: PRACTICE, confidence: 'memory', certainty: 'high' };
const TO_READ: Source = { document: TO, confidence: 'read', certainty: 'high', address: TO_ADDRESS };
const TO_PARTLY: Source = { ...TO_READ, confidence: 'read+memory' };
const memory = (document: string, certainty: Certainty): Source => ({
  document,
  confidence: 'memory',
  certainty,
});
const ASSOCIATION = memory('Aluminum Association typical heat treatments table', 'medium');
const PRODUCER: Source = {
  document: 'aluminium producer heat-treat data page (alloys 6013/6061)',
  confidence: 'read',
  certainty: 'high',
  address: 'https://it.scribd.com/document/396525084/Tratamientos-termicos-aluminio',
};

type Made = Extract<TransitionRow['result'], { is: 'made' }>;
const made = (by: readonly Operation[], ...cautions: TransitionCaution[]): Made => ({
  is: 'made',
  by,
  ...(cautions.length > 0 && { cautions }),
});
const named = (properName: Temper) => ({ is: 'made_under_other_name' as const, properName });
const never = (why: WhyNot, gives?: Temper) => ({ is: 'not_made' as const, why, ...(gives && { gives }) });

const QUENCH = ['solution_heat_treat', 'quench'] as const;
const NATURAL = [...QUENCH, 'natural_age'] as const;
const ARTIFICIAL = [...QUENCH, 'artificial_age'] as const;
const AGAIN = ['re_solution_heat_treat', 'quench'] as const;
const AGAIN_NATURAL = [...AGAIN, 'natural_age'] as const;
const AGAIN_ARTIFICIAL = [...AGAIN, 'artificial_age'] as const;
const AGE = ['artificial_age'] as const;

const COPPER = ['2014', '2024'] as const;
const SILICIDE = ['6013', '6061'] as const;
const ZINC = ['7075', '7178'] as const;

/** Which condition can be made of which by a heat treater, and by what; and which cannot, and why. */
export const TEMPER_TRANSITIONS: Table<TransitionRow> = {
  id: 'temper-transitions',
  title: 'Conditions that can be made from a condition',
  edition: PRACTICE,
  rows: [
    { alloys: COPPER, from: 'O', to: 'AQ', result: made(QUENCH, 'forming_window_opens'), source },
    { alloys: COPPER, from: 'O', to: 'T42', result: made(NATURAL), source },
    { alloys: COPPER, from: 'O', to: 'T62', result: made(ARTIFICIAL), source },
    { alloys: COPPER, from: 'O', to: 'T3', result: never('needs_mill_cold_work', 'T42'), source },
    { alloys: COPPER, from: 'O', to: 'T4', result: named('T42'), source },
    { alloys: COPPER, from: 'O', to: 'T81', result: never('needs_mill_cold_work', 'T62'), source },
    { alloys: COPPER, from: 'O', to: 'T861', result: never('needs_mill_cold_work', 'T62'), source },
    { alloys: COPPER, from: 'F', to: 'T42', result: made(NATURAL), source },
    { alloys: COPPER, from: 'F', to: 'T62', result: made(ARTIFICIAL), source },
    { alloys: COPPER, from: 'AQ', to: 'T42', result: made(['natural_age']), source },
    { alloys: COPPER, from: 'AQ', to: 'T62', result: made(AGE), source },
    { alloys: COPPER, from: 'T42', to: 'T62', result: made(AGE), source },
    { alloys: COPPER, from: 'T42', to: 'T81', result: never('needs_mill_cold_work'), source },
    { alloys: COPPER, from: 'T4', to: 'T6', result: made(AGE), source },
    { alloys: COPPER, from: 'any_heat_treated', to: 'T42', result: made(AGAIN_NATURAL), source },
    {
      alloys: COPPER,
      from: 'any_heat_treated',
      to: 'O',
      result: made(['anneal'], 'user_tempers_only_afterwards'),
      source,
    },
    { alloys: ['2024'], from: 'T3', to: 'T81', result: made(AGE, 'cold_work_is_the_mills'), source: TO_READ },
    {
      alloys: ['2024'],
      from: 'T361',
      to: 'T861',
      result: made(AGE, 'cold_work_is_the_mills'),
      source: TO_PARTLY,
    },
    { alloys: ['2024'], from: 'T351', to: 'T851', result: made(AGE, 'cold_work_is_the_mills'), source },
    { alloys: ['2024'], from: 'T3', to: 'T42', result: made(AGAIN_NATURAL, 'strength_drops'), source },
    { alloys: ['2024'], from: 'T3', to: 'T62', result: made(AGAIN_ARTIFICIAL), source: TO_READ },
    { alloys: ['2024'], from: 'T3', to: 'T6', result: never('ageing_gives_another_temper', 'T81'), source },
    { alloys: ['2024'], from: 'T3', to: 'T361', result: never('needs_mill_cold_work'), source },
    { alloys: ['2024'], from: 'T81', to: 'T3', result: never('ageing_cannot_be_undone', 'T42'), source },
    { alloys: ['2014'], from: 'T3', to: 'T6', forms: ['sheet'], result: made(AGE), source: ASSOCIATION },
    { alloys: ['2014'], from: 'T451', to: 'T651', result: made(AGE, 'cold_work_is_the_mills'), source },
    { alloys: ['2014'], from: 'O', to: 'T6', result: named('T62'), source },
    { alloys: ['2017'], from: 'O', to: 'T42', result: made(NATURAL), source },
    { alloys: ['2017'], from: 'O', to: 'T4', result: named('T42'), source },
    { alloys: ['2017'], from: 'any', to: 'T42', result: made(AGAIN_NATURAL), source },
    { alloys: ['2017'], from: 'T4', to: 'T6', result: never('not_hardened_by_ageing'), source },
    { alloys: ['2117'], from: 'O', to: 'T42', result: made(NATURAL), source },
    { alloys: ['2117'], from: 'T4', to: 'driven rivet', result: made([]), source },
    { alloys: ['2219'], from: 'O', to: 'T42', result: made(NATURAL), source },
    { alloys: ['2219'], from: 'O', to: 'T62', result: made(ARTIFICIAL), source },
    { alloys: ['2219'], from: 'T31', to: 'T81', result: made(AGE, 'cold_work_is_the_mills'), source },
    { alloys: ['2219'], from: 'T37', to: 'T87', result: made(AGE, 'cold_work_is_the_mills'), source },
    { alloys: ['2219'], from: 'T351', to: 'T851', result: made(AGE, 'cold_work_is_the_mills'), source },
    { alloys: ['2219'], from: 'O', to: 'T81', result: never('needs_mill_cold_work'), source },
    { alloys: ['2219'], from: 'O', to: 'T87', result: never('needs_mill_cold_work'), source },
    { alloys: ['2219'], from: 'T42', to: 'T62', result: made(AGE), source },
    { alloys: SILICIDE, from: 'O', to: 'T42', result: made(NATURAL), source },
    { alloys: SILICIDE, from: 'O', to: 'T62', result: made(ARTIFICIAL), source },
    { alloys: SILICIDE, from: 'T4', to: 'T6', result: made(AGE), source },
    { alloys: SILICIDE, from: 'T42', to: 'T62', result: made(AGE), source },
    { alloys: SILICIDE, from: 'T451', to: 'T651', result: made(AGE, 'cold_work_is_the_mills'), source },
    { alloys: SILICIDE, from: 'T6', to: 'T4', result: never('needs_re_solution', 'T42'), source },
    { alloys: SILICIDE, from: 'T6', to: 'T62', result: made(AGAIN_ARTIFICIAL), source },
    { alloys: SILICIDE, from: 'O', to: 'T651', result: never('needs_mill_stretch'), source },
    { alloys: SILICIDE, from: 'any', to: 'O', result: made(['anneal']), source: PRODUCER },
    {
      alloys: ZINC,
      from: 'O',
      to: 'W',
      result: made(QUENCH, 'state_the_time', 'forming_window_opens'),
      source,
    },
    { alloys: ZINC, from: 'O', to: 'T62', result: made(ARTIFICIAL), source },
    { alloys: ZINC, from: 'O', to: 'T6', result: named('T62'), source },
    { alloys: ZINC, from: 'W', to: 'T62', result: made(AGE, 'time_to_age_is_limited'), source },
    { alloys: ZINC, from: 'T6', to: 'T76', result: made(['second_step_age']), source },
    { alloys: ZINC, from: 'T651', to: 'T7651', result: made(['second_step_age']), source },
    { alloys: ZINC, from: 'T6', to: 'T62', result: made(AGAIN_ARTIFICIAL), source },
    { alloys: ZINC, from: 'T73', to: 'T6', result: never('ageing_cannot_be_undone'), source },
    { alloys: ZINC, from: 'O', to: 'T651', result: never('needs_mill_stretch'), source },
    { alloys: ZINC, from: 'W', to: 'T4', result: never('never_stable_at_room_temperature'), source },
    { alloys: ZINC, from: 'W', to: 'T42', result: never('never_stable_at_room_temperature'), source },
    {
      alloys: ['7075'],
      from: 'O',
      to: 'T73',
      result: made([...QUENCH, 'two_step_age'], 'prove_conductivity'),
      source,
    },
    {
      alloys: ['7075'],
      from: 'T6',
      to: 'T73',
      result: made(['second_step_age'], 'prove_conductivity'),
      source,
    },
    {
      alloys: ['7075'],
      from: 'T651',
      to: 'T7351',
      result: made(['second_step_age'], 'prove_conductivity'),
      source,
    },
    { alloys: ['7050'], from: 'O', to: 'T74', result: made([...QUENCH, 'two_step_age']), source },
    {
      alloys: ['7050'],
      from: 'W51',
      to: 'T7451',
      result: made(['two_step_age'], 'cold_work_is_the_mills'),
      source,
    },
    { alloys: ['7050'], from: 'T7651', to: 'T7451', result: made(['second_step_age']), source },
    { alloys: ['7050'], from: 'T7451', to: 'T7651', result: never('ageing_cannot_be_undone'), source },
    { alloys: ['7050'], from: 'O', to: 'T7451', result: never('needs_mill_stretch', 'T74'), source },
    { alloys: ['7050'], from: 'W', to: 'T42', result: never('never_stable_at_room_temperature'), source },
  ],
};
