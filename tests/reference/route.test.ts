import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { PROCESSES, type Process } from '@/lib/trade/process';
import { checkRoute } from '@/lib/trade/route/check-route';
import { repairRoute } from '@/lib/trade/route/repair-route';
import type { RoutePart, RouteStep, RouteTables } from '@/lib/trade/route/route';
import { BAKE_HOURS_BY_STRENGTH } from '@/lib/trade/tables/bake-hours-by-strength';
import { CONVERSION_CLASSES } from '@/lib/trade/tables/conversion-classes';
import { EMBRITTLEMENT_RULES } from '@/lib/trade/tables/embrittlement-rules';
import { EXPOSURE_LIMITS } from '@/lib/trade/tables/exposure-limits';
import { FINISH_DEFAULTS } from '@/lib/trade/tables/finish-defaults';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import { MAGNETIC_PARTICLE_PLATING } from '@/lib/trade/tables/magnetic-particle-plating';
import type { OrderRuleId } from '@/lib/trade/tables/order-rule';
import { ORDER_RULES } from '@/lib/trade/tables/order-rules';
import { PLATING_CLASSES } from '@/lib/trade/tables/plating-classes';
import { TEMPER_BANDS } from '@/lib/trade/tables/steel-tempering';
import { celsiusFromFahrenheit } from '@/lib/trade/units/temperature';

import { publishedRows, saidBy } from './values';

const TABLES: RouteTables = {
  order: ORDER_RULES,
  rules: EMBRITTLEMENT_RULES,
  bakeHours: BAKE_HOURS_BY_STRENGTH,
  conversion: HARDNESS_STEEL_HRC,
  exposure: EXPOSURE_LIMITS,
  classes: [PLATING_CLASSES, CONVERSION_CLASSES],
  defaults: FINISH_DEFAULTS,
  magneticParticle: MAGNETIC_PARTICLE_PLATING,
  temperBands: TEMPER_BANDS,
};

const SPECIFICATIONS: Partial<Record<Process, Omit<RouteStep, 'process'>>> = {
  cadmium_plate: { specification: 'QQ-P-416', revision: 'F', classType: 'type II class 2' },
  zinc_plate: { specification: 'ASTM B633', revision: '19', classType: 'SC 2 type II' },
  nickel_plate: { specification: 'MIL-C-26074', revision: 'E', classType: 'class 1 grade B' },
  chromium_plate: { specification: 'AMS-QQ-C-320', revision: 'A', classType: 'class 2' },
  phosphate: { specification: 'DOD-P-16232', revision: 'F', classType: 'type Z' },
  fluorescent_penetrant: { specification: 'ASTM E1417', classType: 'type I method A level 2' },
};
const step = (process: Process, more: Partial<RouteStep> = {}): RouteStep => ({
  process,
  specification: '',
  ...SPECIFICATIONS[process],
  ...more,
});
const route = (...processes: readonly Process[]) => processes.map((process) => step(process));

const STEEL: RoutePart = { alloy: '4340', family: 'low_alloy_steel', hrc: 42, isWorkedHard: false };
const SOFT: RoutePart = { ...STEEL, alloy: '4130', hrc: 24 };
const ALUMINIUM: RoutePart = { alloy: '7075', family: 'wrought_aluminium' };
const rulesOf = (steps: readonly RouteStep[], part: RoutePart) =>
  checkRoute(TABLES, steps, part).map(({ rule }) => rule);
const processesOf = (steps: readonly RouteStep[]) => steps.map(({ process }) => process);

test('cadmium on steel of HRC 42 with nothing after it: the bake is missing, a blocker with its source', () => {
  const [first] = checkRoute(TABLES, route('cadmium_plate'), STEEL);
  expect(first).toEqual({
    rule: 'bake_after_plating',
    severity: 'blocker',
    steps: [0],
    repair: 'insert',
    source: {
      document: 'ASTM B850-98',
      confidence: 'read',
      certainty: 'high',
      address: 'http://sonicplatinginc.com/services/baking-process/bake-chart/',
    },
  });
});

test('cadmium, magnetic particle becomes magnetic particle, cadmium, embrittlement relief', () => {
  const found = repairRoute(TABLES, route('cadmium_plate', 'magnetic_particle'), STEEL);
  expect(processesOf(found.route)).toEqual(['magnetic_particle', 'cadmium_plate', 'embrittlement_relief']);
  expect(processesOf(found.inserted)).toEqual(['embrittlement_relief']);
  expect(found.findings.filter(({ repair }) => repair)).toEqual([]);
});

interface Wrong {
  readonly rule: OrderRuleId;
  readonly wrong: readonly RouteStep[];
  readonly right: readonly RouteStep[];
  readonly part: RoutePart;
  readonly rightPart?: RoutePart;
}

const SALT = { classType: 'nitrate salt' };
const CASES: readonly Wrong[] = [
  {
    rule: 'stress_relief_before_plating',
    wrong: route('cadmium_plate', 'embrittlement_relief'),
    right: route('stress_relief', 'cadmium_plate', 'embrittlement_relief'),
    part: { ...STEEL, isWorkedHard: true },
  },
  {
    rule: 'bake_after_plating',
    wrong: route('cadmium_plate'),
    right: route('cadmium_plate', 'embrittlement_relief'),
    part: STEEL,
  },
  {
    rule: 'bake_before_chromate',
    wrong: route('cadmium_plate', 'embrittlement_relief'),
    right: [step('cadmium_plate', { classType: 'type I class 2' }), step('embrittlement_relief')],
    part: STEEL,
  },
  {
    rule: 'straighten_before_age',
    wrong: route('solution_heat_treat', 'artificial_age'),
    right: route('solution_heat_treat_and_age'),
    part: ALUMINIUM,
  },
  {
    rule: 'age_after_straightening',
    wrong: route('solution_heat_treat', 'artificial_age'),
    right: route('artificial_age'),
    part: ALUMINIUM,
  },
  {
    rule: 'heat_before_finish',
    wrong: route('anodize', 'artificial_age'),
    right: route('artificial_age', 'anodize'),
    part: ALUMINIUM,
  },
  {
    rule: 'inspect_after_heat_treatment',
    wrong: route('magnetic_particle', 'harden_and_temper'),
    right: route('harden_and_temper', 'magnetic_particle'),
    part: SOFT,
  },
  {
    rule: 'temper_etch_after_grinding',
    wrong: route('magnetic_particle'),
    right: route('magnetic_particle'),
    part: { ...STEEL, isGroundHard: true },
    rightPart: { ...SOFT, isGroundHard: true },
  },
  {
    rule: 'inspect_before_coating',
    wrong: route('anodize', 'fluorescent_penetrant'),
    right: route('fluorescent_penetrant', 'anodize'),
    part: ALUMINIUM,
  },
  {
    rule: 'magnetic_particle_before_and_after_plating',
    wrong: route('magnetic_particle', 'chromium_plate'),
    right: route('magnetic_particle', 'chromium_plate', 'magnetic_particle'),
    part: SOFT,
  },
  {
    rule: 'demagnetise_before_plating',
    wrong: route('magnetic_particle', 'cadmium_plate'),
    right: route('cadmium_plate', 'magnetic_particle'),
    part: SOFT,
  },
  {
    rule: 'peen_before_plating',
    wrong: route('chromium_plate', 'shot_peen'),
    right: route('shot_peen', 'chromium_plate'),
    part: SOFT,
  },
  {
    rule: 'no_heat_after_peening',
    wrong: route('shot_peen', 'artificial_age'),
    right: route('artificial_age', 'shot_peen'),
    part: ALUMINIUM,
  },
  {
    rule: 'no_hardening_of_peened',
    wrong: [step('shot_peen'), step('nickel_plate', { classType: 'class 2 grade B' })],
    right: [step('shot_peen'), step('nickel_plate', { classType: 'class 1 grade B' })],
    part: SOFT,
  },
  {
    rule: 'bake_limit_of_peened_steel',
    wrong: route('shot_peen', 'cadmium_plate', 'embrittlement_relief'),
    right: route('cadmium_plate', 'embrittlement_relief'),
    part: STEEL,
  },
  {
    rule: 'decontaminate_peened_aluminium',
    wrong: route('shot_peen'),
    right: route('shot_peen'),
    part: ALUMINIUM,
    rightPart: SOFT,
  },
  { rule: 'protect_peened', wrong: route('shot_peen'), right: route('magnetic_particle'), part: SOFT },
  {
    rule: 'no_nitrate_for_magnesium',
    wrong: [step('solution_heat_treat', SALT)],
    right: [step('solution_heat_treat', { classType: 'protective atmosphere' })],
    part: { alloy: 'AZ91', family: 'magnesium' },
  },
  {
    rule: 'nitrate_attacks_alloy',
    wrong: [step('anneal', SALT)],
    right: [step('anneal', { classType: 'air' })],
    part: { alloy: '5056', family: 'wrought_aluminium' },
  },
  {
    rule: 'salt_trapped',
    wrong: [step('solution_heat_treat', SALT)],
    right: route('solution_heat_treat'),
    part: { ...ALUMINIUM, trapsLiquid: true },
  },
  {
    rule: 'dry_before_salt',
    wrong: [step('solution_heat_treat', SALT)],
    right: route('solution_heat_treat'),
    part: ALUMINIUM,
  },
  {
    rule: 'no_cadmium_on_titanium',
    wrong: route('cadmium_plate'),
    right: route('anodize'),
    part: { alloy: 'Ti-6Al-4V', family: 'titanium' },
  },
  {
    rule: 'no_cadmium_in_heat',
    wrong: route('cadmium_plate'),
    right: route('cadmium_plate'),
    part: { ...SOFT, serviceCMax: celsiusFromFahrenheit(451) },
    rightPart: { ...SOFT, serviceCMax: celsiusFromFahrenheit(450) },
  },
  {
    rule: 'no_cadmium_in_fuel',
    wrong: route('cadmium_plate'),
    right: route('cadmium_plate'),
    part: { ...SOFT, touchesFuelOrVacuum: true },
    rightPart: SOFT,
  },
  {
    rule: 'no_anodize_with_inserts',
    wrong: route('anodize'),
    right: route('anodize'),
    part: { ...ALUMINIUM, hasInserts: true },
    rightPart: ALUMINIUM,
  },
  {
    rule: 'no_anodize_that_traps',
    wrong: route('anodize'),
    right: route('anodize'),
    part: { ...ALUMINIUM, trapsLiquid: true },
    rightPart: ALUMINIUM,
  },
  { rule: 'prime_film_soon', wrong: route('chemical_film'), right: route('anodize'), part: ALUMINIUM },
  {
    rule: 'no_oven_on_film',
    wrong: route('chemical_film', 'embrittlement_relief'),
    right: route('chemical_film'),
    part: ALUMINIUM,
  },
  {
    rule: 'count_clad_solution',
    wrong: route('solution_heat_treat'),
    right: route('artificial_age'),
    part: { ...ALUMINIUM, isClad: true },
  },
  {
    rule: 'passivate_after_age',
    wrong: route('passivation', 'artificial_age'),
    right: route('artificial_age', 'passivation'),
    part: { alloy: '17-4PH', family: 'precipitation_hardening_steel' },
  },
  {
    rule: 'passivate_free_machining',
    wrong: route('passivation'),
    right: route('passivation'),
    part: { alloy: '303', family: 'austenitic_stainless' },
    rightPart: { alloy: '304', family: 'austenitic_stainless' },
  },
  {
    rule: 'case_before_plating',
    wrong: route('cadmium_plate'),
    right: route('cadmium_plate'),
    part: { ...SOFT, kind: 'case_hardened' },
    rightPart: SOFT,
  },
  {
    rule: 'bake_below_temper',
    wrong: route('cadmium_plate', 'embrittlement_relief'),
    right: route('cadmium_plate', 'embrittlement_relief'),
    part: { ...STEEL, temperedAtC: celsiusFromFahrenheit(390) },
    rightPart: { ...STEEL, temperedAtC: celsiusFromFahrenheit(450) },
  },
  {
    rule: 'temper_band',
    wrong: route('harden_and_temper'),
    right: route('harden_and_temper'),
    part: { ...STEEL, temperedAtC: celsiusFromFahrenheit(700) },
    rightPart: { ...STEEL, temperedAtC: celsiusFromFahrenheit(900) },
  },
  {
    rule: 'no_bake_on_anodize',
    wrong: route('anodize', 'embrittlement_relief'),
    right: route('anodize'),
    part: ALUMINIUM,
  },
  {
    rule: 'limit_acid',
    wrong: route('cadmium_plate', 'embrittlement_relief'),
    right: route('cadmium_plate'),
    part: STEEL,
    rightPart: SOFT,
  },
  {
    rule: 'impregnate_before_finish',
    wrong: route('anodize'),
    right: route('anodize'),
    part: { alloy: 'A356', family: 'cast_aluminium', form: 'casting' },
    rightPart: ALUMINIUM,
  },
  {
    rule: 'not_to_be_plated',
    wrong: route('cadmium_plate'),
    right: route('cadmium_plate'),
    part: { ...STEEL, hrc: 45 },
    rightPart: STEEL,
  },
  {
    rule: 'special_cleaning',
    wrong: route('cadmium_plate'),
    right: route('cadmium_plate'),
    part: { ...STEEL, hrc: 37, kind: 'threaded_fastener' },
    rightPart: { ...STEEL, hrc: 37 },
  },
  {
    rule: 'fluorescent_before_visible',
    wrong: [step('fluorescent_penetrant', { classType: 'type II method C' }), step('fluorescent_penetrant')],
    right: [step('fluorescent_penetrant'), step('fluorescent_penetrant', { classType: 'type II method C' })],
    part: ALUMINIUM,
  },
  {
    rule: 'age_after_solution',
    wrong: route('artificial_age', 'solution_heat_treat'),
    right: route('solution_heat_treat', 'artificial_age'),
    part: ALUMINIUM,
  },
  {
    rule: 'strength_not_stated',
    wrong: route('cadmium_plate'),
    right: route('cadmium_plate'),
    part: { alloy: '4340', family: 'low_alloy_steel' },
    rightPart: SOFT,
  },
  {
    rule: 'revision_decides_bake',
    wrong: [step('cadmium_plate', { revision: '' })],
    right: route('cadmium_plate'),
    part: STEEL,
  },
  {
    rule: 'no_bake_rule_known',
    wrong: [step('nickel_plate')],
    right: [step('nickel_plate')],
    part: STEEL,
    rightPart: SOFT,
  },
];

const SOURCES = new Map(publishedRows('order-rules', ['rule']).map((row) => [row.rule, row]));
test.each(
  CASES.map((one) => ({
    ...one,
    said: saidBy(SOURCES.get(one.rule) ?? { source: 'tables of this library', confidence: 'read' }),
  })),
)('$said: $rule is found where it is broken and nowhere else', ({ rule, wrong, right, part, rightPart }) => {
  const finding = checkRoute(TABLES, wrong, part).find((one) => one.rule === rule);
  expect(finding?.steps.every((at) => at >= 0 && at < wrong.length)).toBe(true);
  expect([...(finding?.steps ?? [])]).toEqual([...(finding?.steps ?? [])].sort((a, b) => a - b));
  expect(rulesOf(right, rightPart ?? part)).not.toContain(rule);
  const published = SOURCES.get(rule);
  if (!published) return;
  expect(finding?.rule).toBe(published.rule);
  expect(finding?.source).toMatchObject({
    confidence: published.confidence,
    certainty: published.certainty,
  });
});

test('every rule of the table has a route that breaks it', () => {
  expect(CASES.map(({ rule }) => rule).sort()).toEqual(ORDER_RULES.rows.map(({ rule }) => rule).sort());
});

test('the trap of one bake rule: revision E and F, strong and soft steel, another document', () => {
  const bare = route('cadmium_plate');
  expect(rulesOf(bare, STEEL)).toContain('bake_after_plating');
  expect(rulesOf(bare, { ...STEEL, hrc: 39 })).not.toContain('bake_after_plating');
  expect(rulesOf(route('zinc_plate'), { ...STEEL, hrc: 39 })).toContain('bake_after_plating');
  expect(rulesOf([step('cadmium_plate', { revision: null })], STEEL)).not.toContain('bake_after_plating');
  expect(rulesOf(bare, { alloy: '6061', family: 'wrought_aluminium', hrc: 42 })).not.toContain(
    'bake_after_plating',
  );
});

describe('repair', () => {
  const repaired = (steps: readonly RouteStep[], part: RoutePart) =>
    processesOf(repairRoute(TABLES, steps, part).route);
  test.each([
    [
      'inspects before and after thick chromium',
      ['chromium_plate', 'magnetic_particle'],
      SOFT,
      ['magnetic_particle', 'chromium_plate', 'magnetic_particle'],
    ],
    [
      'moves a bake to its plating',
      ['cadmium_plate', 'chemical_film', 'embrittlement_relief'],
      STEEL,
      ['cadmium_plate', 'embrittlement_relief', 'chemical_film'],
    ],
    [
      'bakes after each plating',
      ['nickel_plate', 'cadmium_plate', 'chromium_plate'],
      STEEL,
      ['nickel_plate', 'cadmium_plate', 'embrittlement_relief', 'chromium_plate', 'embrittlement_relief'],
    ],
    [
      'relieves stress first',
      ['shot_peen', 'cadmium_plate', 'harden_and_temper'],
      { ...STEEL, isWorkedHard: true },
      ['harden_and_temper', 'stress_relief', 'shot_peen', 'cadmium_plate', 'embrittlement_relief'],
    ],
    [
      'ages after the solution',
      ['artificial_age', 'solution_heat_treat', 'anodize'],
      ALUMINIUM,
      ['solution_heat_treat', 'artificial_age', 'anodize'],
    ],
    [
      'keeps an inspection of the blank',
      ['fluorescent_penetrant', 'harden_and_temper', 'magnetic_particle', 'shot_peen'],
      SOFT,
      ['harden_and_temper', 'fluorescent_penetrant', 'magnetic_particle', 'shot_peen'],
    ],
  ] as const)('%s', (_name, wrong, part, right) => {
    expect(repaired(route(...wrong), part)).toEqual(right);
  });
  test('a route with nothing to repair comes back as it is', () => {
    const good = route(
      'harden_and_temper',
      'magnetic_particle',
      'shot_peen',
      'cadmium_plate',
      'embrittlement_relief',
    );
    expect(repairRoute(TABLES, good, STEEL).route).toBe(good);
  });
  test('what only people can decide stays as a finding', () => {
    const found = repairRoute(TABLES, route('cadmium_plate', 'magnetic_particle'), { ...STEEL, hrc: 46 });
    expect(found.findings.map(({ rule }) => rule)).toContain('not_to_be_plated');
  });
});

describe('laws', () => {
  const processes = fc.array(fc.constantFrom(...PROCESSES), { maxLength: 9 });
  const steps = processes.map((drawn) =>
    drawn.map((process, at) =>
      step(process, process === 'fluorescent_penetrant' && at % 3 === 1 ? { classType: 'type II' } : {}),
    ),
  );
  const parts = fc.record({
    alloy: fc.constantFrom('4340', '7075', '303', '17-4PH'),
    family: fc.constantFrom(
      'low_alloy_steel',
      'wrought_aluminium',
      'precipitation_hardening_steel',
      'magnesium',
    ),
    hrc: fc.constantFrom(undefined, 24, 33, 42, 50),
    kind: fc.constantFrom(undefined, 'threaded_fastener', 'case_hardened'),
    isWorkedHard: fc.constantFrom(undefined, true, false),
    isGroundHard: fc.boolean(),
    trapsLiquid: fc.boolean(),
  });
  test('a repaired route has no finding left that a repair exists for', () => {
    fc.assert(
      fc.property(steps, parts, (drawn, part) => {
        const { findings } = repairRoute(TABLES, drawn, part);
        expect(findings.filter(({ repair }) => repair)).toEqual([]);
      }),
      { numRuns: 2000 },
    );
  });
  test('a repair loses no step, and repairing twice changes nothing', () => {
    fc.assert(
      fc.property(steps, parts, (drawn, part) => {
        const once = repairRoute(TABLES, drawn, part);
        expect(drawn.every((one) => once.route.includes(one))).toBe(true);
        expect(once.route.length).toBe(drawn.length + once.inserted.length);
        expect(repairRoute(TABLES, once.route, part).route).toBe(once.route);
      }),
      { numRuns: 500 },
    );
  });
});
