import { describe, expect, test } from 'vitest';

import { checkBatch } from '@/lib/batches/checks';
import { canOverride } from '@/lib/batches/finding';
import { solutionTreatedBefore } from '@/lib/batches/solution-treated-before';

import { factsOf, lineOf, type PartChange } from './facts-of-batch';

const SOLUTION = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  specificationRevision: 'R',
  classType: 'natural age',
} as const;
const CADMIUM = {
  process: 'cadmium_plate',
  specification: 'QQ-P-416',
  specificationRevision: 'F',
  classType: 'type II class 2',
} as const;
const SHEET: PartChange = { alloy: '2024', madeCondition: 'O', endCondition: 'T42' };
const HARD: PartChange = {
  alloy: '4340',
  form: 'bar',
  madeCondition: 'annealed',
  endCondition: 'HRC 40 to 44',
};

const found = (lines: Parameters<typeof factsOf>[0], given: Parameters<typeof factsOf>[1] = {}) =>
  checkBatch(factsOf(lines, given)).findings;
const said = (findings: ReturnType<typeof found>, code: string) =>
  findings.filter((finding) => finding.code === code);
const asked = (from: string, to: string, part: PartChange = SHEET) => [
  lineOf(1, part, [{ ...SOLUTION, conditionBefore: from, targetCondition: to }]),
];

describe('conditions', () => {
  test('T3 of O is a mill’s: it stops the batch, says why and what comes of trying, and an admin may let it pass', () => {
    const [stop] = said(found(asked('O', 'T3')), 'condition_not_made');
    expect(stop).toMatchObject({ level: 'stop', subject: 'line-1' });
    expect(stop?.rest).toMatch(/mill/);
    expect(stop?.rest).toMatch(/T42/);
    expect(stop?.source).toMatch(/trust/);
    expect(stop && canOverride(stop)).toBe(true);
  });

  test.each([
    ['T4', 'T42'],
    ['T6', 'T62'],
  ])('%s asked from O is called %s, with other allowables', (to, proper) => {
    const [warning] = said(found(asked('O', to)), 'condition_under_other_name');
    expect(warning?.level).toBe('warn');
    expect(warning?.sentence).toContain(proper);
    expect(warning?.rest).toMatch(/allowables/);
  });

  test('T42 of O is made: nothing is said of it', () => {
    expect(found(asked('O', 'T42')).filter(({ code }) => code.startsWith('condition'))).toEqual([]);
  });

  test.each([
    ['an alloy that no table knows', asked('O', 'T42', { ...SHEET, alloy: 'Unobtainium 9' })],
    ['a former name of an alloy', asked('O', 'T42', { ...SHEET, alloy: '24S' })],
    ['a condition that no table knows', asked('as it came', 'T42')],
  ])('%s is only noted', (_, lines) => {
    const about = found(lines).filter(({ code }) => code.startsWith('condition'));
    expect(about.map(({ level, code }) => [level, code])).toEqual([['note', 'condition_not_read']]);
  });
});

describe('re-heat-treatments of clad sheet', () => {
  const lot = (madeCondition: string, more: Parameters<typeof lineOf>[3] = {}, part: PartChange = {}) =>
    found([
      lineOf(
        1,
        { ...SHEET, clad: true, thicknessMm: 1.016, madeCondition, ...part },
        [{ ...SOLUTION, conditionBefore: madeCondition, targetCondition: 'T42' }],
        more,
      ),
    ]).filter(({ code }) => code.startsWith('clad'));

  test('bought annealed and never treated, it has room', () => {
    expect(lot('O')).toEqual([]);
  });

  test('bought heat treated, it is on its last one', () => {
    expect(lot('T3')).toMatchObject([{ code: 'clad_last_reheat', level: 'warn' }]);
  });

  test('an earlier batch counts: bought heat treated and treated once, it is used up', () => {
    const [stop] = lot('T3', { solutionTreated: ['solution_heat_treat'] });
    expect(stop).toMatchObject({ code: 'clad_reheats_used_up', level: 'stop' });
    expect(stop && canOverride(stop)).toBe(true);
  });

  test('bare sheet is not counted; clad sheet of no stated thickness is only noted', () => {
    expect(lot('T3', {}, { clad: false })).toEqual([]);
    expect(lot('T3', {}, { thicknessMm: null })).toMatchObject([{ code: 'clad_not_counted', level: 'note' }]);
  });

  test('batches with other pieces of the lot are no earlier treatment; pieces that leave again are', () => {
    const sent = [{ stepId: 'a', process: 'solution_heat_treat', pieces: 40 }] as const;
    expect(solutionTreatedBefore(sent, { stepId: 'a', pieces: 60, made: 100 })).toEqual([]);
    expect(solutionTreatedBefore(sent, { stepId: 'a', pieces: 61, made: 100 })).toHaveLength(1);
    expect(solutionTreatedBefore([...sent, ...sent], { stepId: 'b', pieces: 1, made: 100 })).toHaveLength(1);
    expect(solutionTreatedBefore([...sent, ...sent], { stepId: 'b', pieces: 1, made: 79 })).toHaveLength(2);
  });
});

describe('order of steps', () => {
  const codesOf = (findings: ReturnType<typeof found>) =>
    findings.filter(({ code }) => code.startsWith('route')).map(({ level, code }) => [level, code]);

  test('hard steel plated with no bake on the route is stopped', () => {
    const findings = found([lineOf(1, HARD, [CADMIUM])]);
    expect(codesOf(findings)).toContainEqual(['stop', 'route_bake_after_plating']);
    expect(said(findings, 'route_bake_after_plating')[0]?.source).toContain('ASTM B850');
  });

  test('a bake that is asked for with the plating is a bake', () => {
    const line = lineOf(1, HARD, [CADMIUM], { characteristics: ['Thickness', 'Bake start'] });
    expect(codesOf(found([line]))).not.toContainEqual(['stop', 'route_bake_after_plating']);
    const forAll = { batch: { requirements: 1, characteristics: ['Bake'] } };
    expect(codesOf(found([lineOf(1, HARD, [CADMIUM])], forAll))).not.toContainEqual([
      'stop',
      'route_bake_after_plating',
    ]);
  });

  test('soft steel needs none', () => {
    expect(codesOf(found([lineOf(1, { ...HARD, endCondition: 'HRC 20 to 24' }, [CADMIUM])]))).toEqual([]);
  });

  test('what concerns other steps of the route is no matter of this batch', () => {
    const anodizeThenTreat = [{}, { ...SOLUTION, conditionBefore: 'O', targetCondition: 'T42' }];
    expect(codesOf(found([lineOf(1, SHEET, anodizeThenTreat)]))).toContainEqual([
      'stop',
      'route_heat_before_finish',
    ]);
    const film = {
      process: 'chemical_film',
      specification: 'MIL-DTL-5541',
      classType: 'type II class 1A',
    } as const;
    expect(codesOf(found([lineOf(1, SHEET, [...anodizeThenTreat, film])]))).not.toContainEqual([
      'stop',
      'route_heat_before_finish',
    ]);
  });

  test('a warning about many lines is one warning that names them', () => {
    const unknown = { ...HARD, endCondition: 'N' };
    const findings = found([lineOf(1, unknown, [CADMIUM]), lineOf(2, unknown, [CADMIUM])]);
    const warnings = said(findings, 'route_strength_not_stated');
    expect(warnings).toHaveLength(1);
    expect(warnings[0]?.sentence).toContain('1, 2');
  });
});

describe('the specification', () => {
  test('a superseded one is warned about with its date and its successor', () => {
    const step = { ...SOLUTION, specification: 'MIL-H-6088', specificationRevision: 'G' };
    const [warning] = said(found([lineOf(1, SHEET, [step])]), 'specification_superseded');
    expect(warning).toMatchObject({ level: 'warn' });
    expect(warning?.sentence).toMatch(/1997|2000/);
    expect(warning?.rest).toContain('AMS2770');
  });

  test('a current one is not', () => {
    expect(said(found(asked('O', 'T42')), 'specification_superseded')).toEqual([]);
  });

  test('chemical film without a type means hexavalent chromium, and is told', () => {
    const film = {
      process: 'chemical_film',
      specification: 'MIL-DTL-5541',
      specificationRevision: 'F',
      classType: 'class 1A',
    } as const;
    expect(said(found([lineOf(1, SHEET, [film])]), 'call_out_type_i_hexavalent_applies')).toHaveLength(1);
  });
});

describe('furnace loads', () => {
  const T62 = { ...SOLUTION, classType: 'artificial age', conditionBefore: 'O', targetCondition: 'T62' };
  const T42 = { ...SOLUTION, conditionBefore: 'O', targetCondition: 'T42' };
  const mixed = (loads: readonly (number | null)[] = [null, null]) => [
    lineOf(1, SHEET, [T42], { loadNo: loads[0] ?? null }),
    lineOf(2, { ...SHEET, alloy: '7075', endCondition: 'T62' }, [T62], { loadNo: loads[1] ?? null }),
  ];

  test('2024 and 7075 take two loads, and it is said why', () => {
    const [note] = said(found(mixed()), 'several_loads');
    expect(note).toMatchObject({ level: 'note', sentence: 'It takes 2 furnace loads.' });
    expect(note?.rest).toMatch(/line 1 and line 2 are kept apart: /);
  });

  test('set by hand into one load they are warned about, into two they are not', () => {
    expect(said(found(mixed([1, 1])), 'load_not_shared')).toMatchObject([{ level: 'warn' }]);
    expect(said(found(mixed([1, 2])), 'load_not_shared')).toEqual([]);
  });

  test('the thickest section governs the soak and is named as the part says it', () => {
    const thick = { ...SHEET, thicknessMm: 3.175, thickness: '0.125 in' };
    const notes = said(found([lineOf(1, SHEET, [T42]), lineOf(2, thick, [T42])]), 'soak_and_quench');
    expect(notes).toMatchObject([{ subject: 'line-2' }]);
    expect(notes[0]?.sentence).toContain('0.125 in governs');
    expect(notes[0]?.rest).toMatch(/within \d+ s/);
  });

  test('a process without a furnace load is planned in none', () => {
    expect(found([lineOf(1, SHEET, [{}])]).filter(({ code }) => /load|soak/.test(code))).toEqual([]);
  });
});
