import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { PRODUCT_FORMS } from '@/lib/trade/process';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { TEMPER_TRANSITIONS } from '@/lib/trade/tables/temper-transitions';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';
import type { ConditionMaterial } from '@/lib/trade/tempers/condition-graph';
import { designationOf } from '@/lib/trade/tempers/designation';
import { explainCondition } from '@/lib/trade/tempers/explain-condition';
import { reachableConditions } from '@/lib/trade/tempers/reachable-conditions';
import { readTemper } from '@/lib/trade/tempers/read-temper';
import { TEMPERS, type Temper } from '@/lib/trade/tempers/temper';

import { alloyOf, formOf, temperOf } from './trade-words';
import { numberOf, publishedRows, casesOf } from './values';

const RULES = {
  designations: TEMPER_DESIGNATIONS,
  transitions: TEMPER_TRANSITIONS,
  ageing: AGEING_CYCLES,
};
const SHEET_2024: ConditionMaterial = { alloy: '2024', form: 'sheet', clad: false };
const CLAD_2024 = { ...SHEET_2024, clad: true };
const SHEET_7075 = { ...SHEET_2024, alloy: '7075' } as const;

const explain = (material: ConditionMaterial, from: Temper, to: Temper) =>
  explainCondition(RULES, { material, from, to });
const reached = (material: ConditionMaterial, from: Temper) =>
  reachableConditions(RULES, material, from).map(({ condition }) => condition);

describe('designations', () => {
  const published = publishedRows('tempers', [
    'temper',
    'made_by',
    'cold_work',
    'percent_from',
    'percent_to',
    'stretch_percent',
  ]);

  test('T4 is made by the mill by name; made by a user it is T42', () => {
    expect(designationOf(TEMPER_DESIGNATIONS, 'T4')).toMatchObject({
      madeBy: 'mill_by_name',
      madeByUserIs: 'T42',
    });
  });

  test.each(
    casesOf(
      published,
      (row) => `${row.temper} is made by ${row.made_by}, cold work ${row.cold_work || 'none'}`,
    ),
  )('%s', (_name, row) => {
    const read = readTemper(TEMPER_DESIGNATIONS, row.temper);
    if (!read.ok) throw new Error(read.reason);
    const designation = designationOf(TEMPER_DESIGNATIONS, read.stated.temper);
    if (!designation.ok) throw new Error(designation.reason);
    expect(designation.madeBy).toBe(row.made_by);
    expect(designation.coldWork?.kind ?? '').toBe(row.cold_work);
    if (row.percent_from)
      expect(designation.coldWork?.percent).toEqual([numberOf(row.percent_from), numberOf(row.percent_to)]);
    const stretch = Object.entries(designation.coldWork?.percentByForm ?? {});
    expect(stretch.map(([form, [from, to]]) => `${form} ${from}-${to}`).join('|')).toBe(row.stretch_percent);
    expect(designation.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
  });
});

describe('tempers as they are written', () => {
  test('W (1/2 hour) is W, aged 30 min (FAA-H-8083-30)', () => {
    expect(readTemper(TEMPER_DESIGNATIONS, 'W (1/2 hour)')).toMatchObject({
      ok: true,
      stated: { temper: 'W', agedMin: 30 },
    });
  });

  test.each([
    ['T3', 'T3'],
    ['-T6', 'T6'],
    ['t 62', 'T62'],
    ['T36', 'T361'],
    ['T86', 'T861'],
    ['T736', 'T74'],
    ['0', 'O'],
    ['aq', 'AQ'],
    ['W51', 'W51'],
  ])('%s is %s', (written, temper) => {
    expect(readTemper(TEMPER_DESIGNATIONS, written)).toMatchObject({ ok: true, stated: { temper } });
  });

  test.each([
    ['W(1/2 h)', 30],
    ['W 2 h', 120],
    ['W 45 min', 45],
  ])('%s is aged %d min', (written, agedMin) => {
    expect(readTemper(TEMPER_DESIGNATIONS, written)).toMatchObject({ stated: { temper: 'W', agedMin } });
  });

  test.each(['', 'T99', 'T3 2 h', 'W(soon)', 'W 1/0 h', 'T6511'])(
    '%j is no temper of the table',
    (written) => {
      expect(readTemper(TEMPER_DESIGNATIONS, written)).toEqual({ ok: false, reason: 'unknown_temper' });
    },
  );
});

describe('which condition can be made of which', () => {
  const published = publishedRows('temper-transitions', [
    'alloy',
    'clad',
    'form',
    'from',
    'to',
    'can_be_made',
    'proper_name',
    'by',
    'gives',
  ]);
  const REACH: Record<string, string> = {
    yes: 'can_be_made',
    no: 'cannot_be_made',
    relabel: 'made_under_other_name',
  };

  test("2024-O cannot be made T3: the mill's cold work is missing, and it becomes T42", () => {
    expect(explain(SHEET_2024, 'O', 'T3')).toMatchObject({
      ok: true,
      reach: 'cannot_be_made',
      why: 'needs_mill_cold_work',
      gives: { condition: 'T42' },
    });
  });

  test.each(
    casesOf(
      published,
      (row) => `${row.alloy}${row.clad && ' clad'}, ${row.from} to ${row.to}: ${row.can_be_made}`,
    ),
  )('%s', (_name, row) => {
    const material = { alloy: alloyOf(row.alloy), form: formOf(row.form), clad: row.clad === 'yes' };
    const answer = explain(material, temperOf(row.from), temperOf(row.to));
    if (!answer.ok) throw new Error(answer.reason);
    expect(answer.reach).toBe(REACH[row.can_be_made]);
    if (answer.reach === 'can_be_made') expect(answer.path.flatMap(({ by }) => by).join(';')).toBe(row.by);
    if (answer.reach === 'made_under_other_name') expect(answer.properName).toBe(row.proper_name);
    if (answer.reach === 'cannot_be_made' && row.gives) expect(answer.gives?.condition).toBe(row.gives);
    expect(answer.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
  });

  test('2024 sheet in O can become AQ, T42 or T62, and nothing else', () => {
    expect(reached(SHEET_2024, 'O')).toEqual(['AQ', 'T42', 'T62']);
  });

  test('the steps of a longer way stand in their order: 7075-O is quenched, then aged in two steps', () => {
    const answer = explain(SHEET_7075, 'O', 'T76');
    expect(answer).toMatchObject({ ok: true, reach: 'can_be_made' });
    if (answer.ok && answer.reach === 'can_be_made')
      expect(answer.path.map(({ from, to }) => `${from} ${to}`)).toEqual(['O W', 'W T76']);
  });

  test.each(['T6', 'T4'] as const)('the trap of taking %s on the drawing at its word', (to) => {
    for (const alloy of ['2014', '2024', '6061', '6013'] as const)
      expect(explain({ ...SHEET_2024, alloy }, 'O', to)).toMatchObject({
        reach: 'made_under_other_name',
        properName: to === 'T4' ? 'T42' : 'T62',
      });
  });

  test('the trap of letting a heat treater make a mill temper', () => {
    for (const to of ['T3', 'T351', 'T361', 'T451', 'T651'] as const)
      for (const from of ['O', 'T42', 'T62'] as const) {
        expect(explain(SHEET_2024, from, to)).toMatchObject({ reach: 'cannot_be_made' });
        expect(reached(SHEET_2024, from)).not.toContain(to);
      }
  });

  test("the trap of ageing T81 or T861 out of annealed sheet, where ageing the mill's T3 or T361 makes it", () => {
    expect(explain(SHEET_2024, 'O', 'T81')).toMatchObject({
      reach: 'cannot_be_made',
      gives: { condition: 'T62' },
    });
    expect(explain(SHEET_2024, 'O', 'T861')).toMatchObject({ reach: 'cannot_be_made' });
    expect(explain(SHEET_2024, 'T3', 'T81')).toMatchObject({ reach: 'can_be_made' });
    expect(explain(SHEET_2024, 'T361', 'T861')).toMatchObject({ reach: 'can_be_made' });
  });

  test("the trap of believing that solution treatment keeps the mill's cold work", () => {
    expect(explain(SHEET_2024, 'T3', 'T42')).toMatchObject({
      path: [{ cautions: ['strength_drops', 'loses_mill_cold_work'] }],
    });
    expect(explain(SHEET_2024, 'T42', 'T81')).toMatchObject({ reach: 'cannot_be_made' });
  });

  test('the trap of a stable 7xxx: there is no 7075-T4 and no T42, and W states its time', () => {
    for (const alloy of ['7075', '7178', '7050'] as const) {
      const material = { ...SHEET_2024, alloy };
      expect(reached(material, 'O')).not.toContain('T42');
      expect(explain(material, 'W', 'T42')).toMatchObject({ why: 'never_stable_at_room_temperature' });
    }
    expect(explain(SHEET_7075, 'O', 'W')).toMatchObject({
      path: [{ cautions: ['state_the_time', 'forming_window_opens'] }],
    });
  });

  test('solution treatment of clad sheet from a heat-treated temper counts as a re-heat-treatment', () => {
    expect(explain(CLAD_2024, 'T3', 'T42')).toMatchObject({
      path: [{ cautions: ['strength_drops', 'counts_as_reheat', 'loses_mill_cold_work'] }],
    });
    expect(explain(CLAD_2024, 'O', 'T42')).toMatchObject({ path: [{ cautions: [] }] });
  });

  test('2014-T3 becomes T6 by ageing as sheet alone', () => {
    expect(explain({ alloy: '2014', form: 'plate', clad: false }, 'T3', 'T6')).not.toMatchObject({
      reach: 'can_be_made',
    });
  });

  test('an alloy without rows is refused, and so is a change that no table speaks of', () => {
    expect(explain({ ...SHEET_2024, alloy: '4130' }, 'O', 'T42')).toEqual({
      ok: false,
      reason: 'alloy_not_in_table',
    });
    expect(explain(SHEET_7075, 'T73', 'T76')).toEqual({ ok: false, reason: 'not_in_table' });
  });

  test("a shop's own edition decides, and the answer names it", () => {
    const own = { ...TEMPER_TRANSITIONS, id: 'own', edition: 'Own procedure, issue 2' };
    const answer = explainCondition(
      { ...RULES, transitions: own },
      { material: SHEET_2024, from: 'O', to: 'T3' },
    );
    expect(answer).toMatchObject({ readFrom: { table: 'own', edition: 'Own procedure, issue 2' } });
  });
});

describe('laws of the conditions', () => {
  const ALLOYS_IN_TABLE = [
    '2014',
    '2017',
    '2024',
    '2117',
    '2219',
    '6013',
    '6061',
    '7050',
    '7075',
    '7178',
  ] as const;
  const material = fc.record({
    alloy: fc.constantFrom(...ALLOYS_IN_TABLE),
    form: fc.constantFrom(...PRODUCT_FORMS),
    clad: fc.boolean(),
  });
  const temper = fc.constantFrom(...TEMPERS);

  test('no way leads to what a row of the table rules out', () => {
    for (const row of TEMPER_TRANSITIONS.rows)
      for (const alloy of row.alloys)
        for (const form of PRODUCT_FORMS)
          if (row.result.is === 'not_made' && row.from !== 'any' && row.from !== 'any_heat_treated')
            expect(reached({ alloy, form, clad: false }, row.from)).not.toContain(row.to);
  });

  test('what is listed as reachable is explained as reachable, and each way is unbroken', () => {
    fc.assert(
      fc.property(material, temper, (of, from) => {
        for (const { condition, path } of reachableConditions(RULES, of, from)) {
          expect(explain(of, from, condition)).toMatchObject({ reach: 'can_be_made' });
          expect(path.map((step) => step.from)).toEqual([from, ...path.slice(0, -1).map((step) => step.to)]);
        }
      }),
    );
  });

  test('cold work is never gained on the way', () => {
    const coldWorked = (of: Temper) => {
      const designation = designationOf(TEMPER_DESIGNATIONS, of);
      return designation.ok && designation.coldWork !== undefined;
    };
    fc.assert(
      fc.property(material, temper, (of, from) => {
        if (!coldWorked(from)) expect(reached(of, from).filter(coldWorked)).toEqual([]);
      }),
    );
  });
});
