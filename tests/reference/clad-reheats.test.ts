import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { cladReheats, countReheats } from '@/lib/trade/heat-treat/clad-reheats';
import { PROCESSES } from '@/lib/trade/process';
import {
  CLAD_REHEATS_MIL,
  CLAD_REHEATS_TO,
  CLAD_TREATMENTS_AMS,
  type CladReheatRow,
} from '@/lib/trade/tables/clad-reheats';
import type { Table } from '@/lib/trade/table';
import { TEMPERS } from '@/lib/trade/tempers/temper';
import { mmFromInches } from '@/lib/trade/units/length';

import { casesOf, numberOf, publishedRows } from './values';

const TABLES: Record<string, Table<CladReheatRow>> = {
  to: CLAD_REHEATS_TO,
  mil: CLAD_REHEATS_MIL,
  ams: CLAD_TREATMENTS_AMS,
};
const AS_BOUGHT = { boughtAs: 'T3', done: [] } as const;

test('1.6 mm sheet bought as T3 has none of one, and may be treated for the last time', () => {
  expect(cladReheats(CLAD_REHEATS_MIL, { thicknessMm: 1.6, history: AS_BOUGHT })).toMatchObject({
    ok: true,
    counted: 0,
    max: 1,
    next: 'allowed_for_the_last_time',
  });
});

describe('limits', () => {
  test.each(
    casesOf(
      publishedRows('clad-reheats', ['table', 'thickness_in', 'max', 'max_with_approval']),
      (row) => `${row.thickness_in} in: ${row.max}, ${row.max_with_approval || row.max} with approval`,
    ),
  )('%s', (_name, row) => {
    const table = TABLES[row.table];
    if (!table) throw new Error(row.table);
    const thicknessMm = mmFromInches(numberOf(row.thickness_in));
    const max = numberOf(row.max);
    const nextAfter = (treatments: number) => {
      const done = Array.from({ length: treatments }, () => 'solution_heat_treat' as const);
      const standing = cladReheats(table, { thicknessMm, history: { boughtAs: 'T3', done } });
      if (!standing.ok) throw new Error(standing.reason);
      expect(standing.max).toBe(max);
      expect(standing.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
      return standing.next;
    };
    // What counts all treatments has counted the mill's already.
    const left = row.table === 'ams' ? max - 1 : max;
    if (left > 0) expect(nextAfter(left - 1)).toBe('allowed_for_the_last_time');
    if (left > 1) expect(nextAfter(left - 2)).toBe('allowed');
    expect(nextAfter(left)).toBe(row.max_with_approval ? 'needs_engineering_approval' : 'used_up');
    expect(nextAfter(left + 1)).toBe('used_up');
  });

  test('the handbook says 1 to 3 by thickness: every document stays within (FAA-H-8083-30, from memory)', () => {
    for (const table of [CLAD_REHEATS_TO, CLAD_TREATMENTS_AMS])
      for (const { max } of table.rows) expect([1, 2, 3]).toContain(max);
  });

  test('no thickness is refused', () => {
    expect(cladReheats(CLAD_REHEATS_MIL, { thicknessMm: 0, history: AS_BOUGHT })).toEqual({
      ok: false,
      reason: 'thickness_not_positive',
    });
  });
});

describe('what counts', () => {
  test("the trap of counting from the shop's own first treatment: sheet bought as T3 starts at its first re-heat-treatment (T.O. 1-1A-9 Table 3-12 note)", () => {
    expect(countReheats({ boughtAs: 'T3', done: ['solution_heat_treat'] })).toEqual({
      solutionTreatments: 2,
      reheats: 1,
    });
    expect(countReheats({ boughtAs: 'O', done: ['solution_heat_treat'] })).toEqual({
      solutionTreatments: 1,
      reheats: 0,
    });
  });

  test('annealing and ageing do not count (T.O. 1-1A-9 Table 3-12 note)', () => {
    expect(countReheats({ boughtAs: 'T3', done: ['anneal', 'artificial_age'] }).reheats).toBe(0);
  });

  test('the trap of annealing the count away: T3 annealed to O and treated is a re-heat-treatment', () => {
    expect(countReheats({ boughtAs: 'T3', done: ['anneal', 'solution_heat_treat'] }).reheats).toBe(1);
  });

  test('the trap of one limit for all documents: 0.063 in sheet has one left by MIL, two by the T.O.', () => {
    const thicknessMm = mmFromInches(0.063);
    expect(cladReheats(CLAD_REHEATS_MIL, { thicknessMm, history: AS_BOUGHT })).toMatchObject({ max: 1 });
    expect(cladReheats(CLAD_REHEATS_TO, { thicknessMm, history: AS_BOUGHT })).toMatchObject({ max: 2 });
    expect(cladReheats(CLAD_TREATMENTS_AMS, { thicknessMm, history: AS_BOUGHT })).toMatchObject({
      counted: 1,
      max: 2,
      next: 'allowed_for_the_last_time',
    });
  });

  test('annealed thin sheet may have its first treatment, though no re-heat-treatment', () => {
    const history = { boughtAs: 'O', done: [] } as const;
    expect(cladReheats(CLAD_REHEATS_MIL, { thicknessMm: 0.4, history })).toMatchObject({
      next: 'allowed_for_the_last_time',
    });
  });
});

test('a further process never lowers the count, and a thicker sheet never has a lower limit', () => {
  const process = fc.constantFrom(...PROCESSES);
  const mm = fc.double({ min: 0.1, max: 20, noNaN: true });
  fc.assert(
    fc.property(fc.constantFrom(...TEMPERS), fc.array(process), process, (boughtAs, done, next) => {
      const before = countReheats({ boughtAs, done });
      expect(countReheats({ boughtAs, done: [...done, next] }).reheats).toBeGreaterThanOrEqual(
        before.reheats,
      );
    }),
  );
  fc.assert(
    fc.property(mm, mm, fc.constantFrom(...Object.values(TABLES)), (a, b, table) => {
      const thin = cladReheats(table, { thicknessMm: Math.min(a, b), history: AS_BOUGHT });
      const thick = cladReheats(table, { thicknessMm: Math.max(a, b), history: AS_BOUGHT });
      expect(thin.ok && thick.ok && thin.max <= thick.max).toBe(true);
    }),
  );
});
