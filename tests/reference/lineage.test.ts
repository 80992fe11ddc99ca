import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { britishMaterial } from '@/lib/trade/lineage/british-material';
import { callOutFindings } from '@/lib/trade/lineage/call-out-findings';
import { issueInForce } from '@/lib/trade/lineage/issue-in-force';
import { lineageOf } from '@/lib/trade/lineage/lineage-of';
import { recogniseSpecification } from '@/lib/trade/lineage/recognise-specification';
import { standingOn } from '@/lib/trade/lineage/standing-on';
import { alternativesTo, successorsOf } from '@/lib/trade/lineage/successors-of';
import { BRITISH_MATERIALS } from '@/lib/trade/tables/british-materials';
import { CALL_OUT_NOTES } from '@/lib/trade/tables/call-out-notes';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';

import { publishedRows, saidBy } from './values';

const listed = (text: string) => text.split('; ').filter((one) => one !== '');
const numberIn = (text: string) => recogniseSpecification(text)?.number ?? text;

/** A number with all that it led to, and what is named as alternative on the way. */
function reached(number: string): string[] {
  const chain = successorsOf(SPECIFICATION_LINEAGE, number, null);
  const along = [number, ...(chain.ok ? chain.successors.map((one) => one.number) : [])];
  const beside = along.flatMap((one) => {
    const found = alternativesTo(SPECIFICATION_LINEAGE, one);
    return found.ok ? found.alternatives.map((alternative) => alternative.number) : [];
  });
  return [...along, ...beside];
}

describe('successors and dates', () => {
  const rows = publishedRows('lineage-succession', ['asked', 'dates', 'successors']);
  test.each(rows.map((row) => [row.asked, saidBy(row), row] as const))('%s (%s)', (_asked, _said, row) => {
    const numbers = listed(row.asked).map(numberIn);
    const events = numbers.flatMap((number) => {
      const found = lineageOf(SPECIFICATION_LINEAGE, number);
      if (!found.ok) throw new Error(`${number} is ${found.reason}`);
      return found.events;
    });
    const led = numbers.flatMap(reached);
    for (const successor of listed(row.successors)) {
      const reference = recogniseSpecification(successor);
      expect(led).toContain(numberIn(successor));
      // Where the successor is named with its issue, that issue is recorded.
      if (reference?.revision && reference.number !== 'ANSI/ASQ Z1.4') {
        const named = [...events, ...SPECIFICATION_LINEAGE.rows].flatMap(({ successors = [] }) => successors);
        expect(
          named.some((one) => one.number === reference.number && one.revision === reference.revision),
        ).toBe(true);
      }
    }
    // A date may be told of the old name although it is the new one's.
    const dates = SPECIFICATION_LINEAGE.rows.flatMap(({ number, on }) =>
      led.includes(number) && on ? [on] : [],
    );
    for (const date of row.dates.split(' ').filter((one) => one !== ''))
      expect(dates.some((on) => on.startsWith(date))).toBe(true);
  });

  test('MIL-H-6088 for parts: AMS-H-6088 (1997-07), then AMS2770 (2000-07)', () => {
    const found = successorsOf(SPECIFICATION_LINEAGE, 'MIL-H-6088', 'parts');
    expect(found.ok && found.successors.map(({ number, on, after }) => [number, on, after])).toEqual([
      ['AMS-H-6088', '1997-07', 'MIL-H-6088'],
      ['AMS2770', '2000-07', 'AMS-H-6088'],
    ]);
  });

  test('the trap of old to new: one number forks by product, and the number alone does not choose', () => {
    const any = successorsOf(SPECIFICATION_LINEAGE, 'AMS-H-6088', null);
    expect(any).toMatchObject({ ok: true, forks: true });
    expect(any.ok && any.successors.map(({ number, covers }) => [number, covers])).toEqual([
      ['AMS2770', 'parts'],
      ['AMS2771', 'castings'],
      ['AMS2772', 'raw_material'],
    ]);
    const castings = successorsOf(SPECIFICATION_LINEAGE, 'AMS-H-6088', 'castings');
    expect(castings).toMatchObject({ forks: false, successors: [{ number: 'AMS2771' }] });
  });

  test('an alternative is no successor', () => {
    expect(successorsOf(SPECIFICATION_LINEAGE, 'AMS-QQ-A-250/5', null)).toMatchObject({
      ok: false,
      reason: 'none_known',
    });
    const found = alternativesTo(SPECIFICATION_LINEAGE, 'AMS-QQ-A-250/5');
    expect(found.ok && found.alternatives).toContainEqual({ number: 'AMS4462', conditions: 'T3, T351' });
    expect(alternativesTo(SPECIFICATION_LINEAGE, 'AMS2770')).toMatchObject({ reason: 'none_known' });
  });

  test('what is not recorded is not known, which is no standing', () => {
    expect(lineageOf(SPECIFICATION_LINEAGE, 'AMS9999')).toEqual({ ok: false, reason: 'not_known' });
    expect(successorsOf(SPECIFICATION_LINEAGE, 'AMS9999', null)).toEqual({ ok: false, reason: 'not_known' });
    expect(standingOn(SPECIFICATION_LINEAGE, 'AMS9999', { on: '2026-01-01', by: 'publisher' })).toEqual({
      ok: false,
      reason: 'not_known',
    });
    expect(issueInForce(SPECIFICATION_LINEAGE, { number: 'AMS9999', revision: null }, '2026-01-01')).toEqual({
      ok: false,
      reason: 'not_known',
    });
  });

  test('following successors ends, and nobody follows himself', () => {
    fc.assert(
      fc.property(fc.constantFrom(...SPECIFICATION_LINEAGE.rows.map(({ number }) => number)), (number) => {
        const found = successorsOf(SPECIFICATION_LINEAGE, number, null);
        if (!found.ok) return found.reason === 'none_known';
        const numbers = found.successors.map((one) => one.number);
        return (
          !numbers.includes(number) &&
          new Set(numbers).size === numbers.length &&
          found.successors.some(({ last }) => last)
        );
      }),
    );
  });

  test('every number in the table is written the one way in which it is recognised', () => {
    for (const { number, successors = [] } of SPECIFICATION_LINEAGE.rows)
      for (const one of [number, ...successors.map((successor) => successor.number)].filter(
        (name) => name !== 'MMPDS-01',
      ))
        expect(recogniseSpecification(one)).toMatchObject({ number: one, revision: null, rest: '' });
  });
});

describe('standing on a day', () => {
  const standing = (number: string, on: string, by: 'publisher' | 'government_index' = 'publisher') => {
    const found = standingOn(SPECIFICATION_LINEAGE, number, { on, by });
    return found.ok ? found.standing : found.reason;
  };

  test('the trap of one flag: cancelled, then revived and stabilized', () => {
    expect(standing('AMS-C-26074', '2005-01-01')).toBe('issued');
    expect(standing('AMS-C-26074', '2006-01-01')).toBe('noncurrent');
    expect(standing('AMS-C-26074', '2012-01-01')).toBe('cancelled');
    expect(standing('AMS-C-26074', '2014-01-01')).toBe('stabilized');
    expect(standing('AMS-QQ-A-250/10', '2013-01-01')).toBe('cancelled');
    expect(standing('AMS-QQ-A-250/10', '2014-01-01')).toBe('stabilized');
  });

  test('the trap of one authority: cancelled by its publisher, still listed by the government index', () => {
    expect(standing('AMS-H-6088', '2008-01-01')).toBe('cancelled');
    expect(standing('AMS-H-6088', '2008-01-01', 'government_index')).toBe('listed_active');
  });

  test('a date known only to the month may be before or after a day in it', () => {
    const found = standingOn(SPECIFICATION_LINEAGE, 'AMS-H-6088', { on: '2000-07-15', by: 'publisher' });
    expect(found).toMatchObject({ ok: true, standing: 'issued', perhaps: ['cancelled'] });
    expect(standing('AMS-H-6088', '1990-01-01')).toBe('nothing_by_then');
  });

  test('the trap of comparing prefix and letter as one: MIL-A-8625 became MIL-PRF-8625 and the letter stayed F', () => {
    const found = successorsOf(SPECIFICATION_LINEAGE, 'MIL-A-8625', null);
    expect(found.ok && found.successors[0]).toMatchObject({
      number: 'MIL-PRF-8625',
      revision: 'F',
      event: 'renamed',
      on: '2020-11-23',
    });
    const chem = successorsOf(SPECIFICATION_LINEAGE, 'MIL-C-5541', null);
    expect(chem.ok && chem.successors[0]).toMatchObject({
      number: 'MIL-DTL-5541',
      revision: 'F',
      event: 'superseded',
    });
  });
});

describe('the issue in force', () => {
  const inForce = (number: string, revision: string | null, on: string) =>
    issueInForce(SPECIFICATION_LINEAGE, { number, revision }, on);

  test('AMS2750 without a letter on an order of 2021-03-01: F; with "Rev E": E', () => {
    expect(inForce('AMS2750', null, '2021-03-01')).toMatchObject({
      ok: true,
      revision: 'F',
      basis: 'in_force_on_date',
    });
    expect(inForce('AMS2750', 'E', '2021-03-01')).toMatchObject({
      ok: true,
      revision: 'E',
      basis: 'named_on_order',
    });
  });

  const rows = publishedRows('lineage-pyrometry-issues', ['revision', 'date']);
  test.each(rows.map((row, index) => [row.revision, saidBy(row), row, rows[index + 1]] as const))(
    'AMS2750 issue %s applies until the next is out (%s)',
    (_revision, _said, row, next) => {
      const year = Number(row.date.slice(0, 4));
      // Known to the year only, it is certain when the year is over.
      const on = row.date.length === 4 ? `${year + 1}-01-01` : `${year}-12-31`;
      expect(inForce('AMS2750', null, on)).toMatchObject({
        revision: row.revision,
      });
      if (next)
        expect(inForce('AMS2750', null, `${next.date.slice(0, 4)}-01-01`)).toMatchObject({
          revision: row.revision,
        });
    },
  );

  test('an issue of that same month is perhaps already out', () => {
    expect(inForce('AMS2750', null, '2022-06-15')).toMatchObject({ revision: 'F', perhaps: ['G'] });
    expect(inForce('AMS2750', null, '1980-01-01')).toMatchObject({ ok: false, reason: 'not_issued_by_then' });
  });

  test('the trap of a cancelled document: its last issue applies, unless a successor is named', () => {
    expect(inForce('MIL-S-13165', null, '2010-01-01')).toMatchObject({
      revision: 'C',
      basis: 'last_issue_of_ended_document',
    });
    expect(inForce('MIL-S-13165', null, '1970-01-01')).toMatchObject({
      revision: 'B',
      basis: 'in_force_on_date',
    });
    expect(inForce('AMS-C-26074', null, '2012-01-01')).toMatchObject({
      basis: 'last_issue_of_ended_document',
    });
    expect(inForce('AMS-C-26074', null, '2014-01-01')).toMatchObject({ basis: 'in_force_on_date' });
  });

  test('a later order never gets an earlier issue', () => {
    const day = fc
      .date({ min: new Date('1985-01-01'), max: new Date('2030-01-01'), noInvalidDate: true })
      .map((date) => date.toISOString().slice(0, 10));
    const rank = (revision: string) => 'ABCDEFGH'.indexOf(revision);
    fc.assert(
      fc.property(day, day, (one, other) => {
        const [early, late] = [one, other].toSorted().map((on) => inForce('AMS2750', null, on ?? ''));
        return !early?.ok || (late?.ok === true && rank(early.revision) <= rank(late.revision));
      }),
    );
  });
});

describe('what a call-out silently means', () => {
  const notes = (text: string, said: { typeStated: boolean; forParts: boolean }) => {
    const reference = recogniseSpecification(text);
    if (!reference) throw new Error(text);
    return callOutFindings(CALL_OUT_NOTES, { ...reference, ...said });
  };
  const noType = { typeStated: false, forParts: true };

  test('the trap of no type on MIL-DTL-5541: Type I, hexavalent, applies', () => {
    expect(notes('MIL-DTL-5541F', noType).map(({ note }) => note)).toEqual(['type_i_hexavalent_applies']);
    expect(notes('MIL-DTL-5541F', { ...noType, typeStated: true })).toEqual([]);
  });

  test('the trap of QQ-P-35 on a drawing: nitric unless engineering allows citric, and class 4 applies', () => {
    const found = notes('QQ-P-35C', { ...noType, typeStated: true }).map(({ note }) => note);
    expect(found).toEqual(['nitric_unless_engineering_allows_citric', 'acceptance_class_4_applies']);
    expect(notes('AMS-QQ-P-35', noType).map(({ note }) => note)).toContain('type_guidance_lost');
  });

  test('the trap of MIL-H-6088G on a part: it excludes parts, F did not, and engineering must answer', () => {
    expect(notes('MIL-H-6088G', noType)).toMatchObject([{ note: 'excludes_parts', asksEngineering: true }]);
    expect(notes('MIL-H-6088G', { ...noType, forParts: false })).toEqual([]);
    expect(notes('MIL-H-6088F', noType)).toEqual([]);
    expect(notes('MIL-H-6088', noType)).toMatchObject([{ note: 'excludes_parts' }]);
    expect(notes('AMS-H-6875B', noType)).toMatchObject([
      { note: 'raw_material_only', asksEngineering: true },
    ]);
  });

  test('each note says where it comes from and which table it was read from', () => {
    for (const row of CALL_OUT_NOTES.rows) {
      const found = callOutFindings(CALL_OUT_NOTES, { number: row.number, revision: null, ...noType });
      expect(found).toContainEqual({
        note: row.note,
        asksEngineering: row.asksEngineering,
        source: row.source,
        readFrom: { table: 'call-out-notes', edition: CALL_OUT_NOTES.edition },
      });
    }
  });
});

describe('British numbers', () => {
  const rows = publishedRows('lineage-british', ['asked', 'clad', 'related', 'nearest']);
  test.each(rows.map((row) => [row.asked, saidBy(row), row] as const))('%s (%s)', (_asked, _said, row) => {
    const found = britishMaterial(BRITISH_MATERIALS, numberIn(row.asked));
    if (row.clad === '?') return expect(found).toMatchObject({ ok: false, reason: 'not_resolved' });
    if (!found.ok) throw new Error(found.reason);
    expect(found.needsEngineeringApproval).toBe(true);
    if (row.clad !== '-') expect(found.clad).toBe(row.clad === 'yes');
    for (const one of listed(row.related)) expect(found.supersededBy).toContain(`BS ${one}`);
    for (const one of listed(row.nearest)) expect(found.nearest).toContain(one.split('-')[0]);
    return undefined;
  });

  test('the trap of a controlled equivalence: BS L72 is near clad 2014A, and only engineering may say so', () => {
    expect(britishMaterial(BRITISH_MATERIALS, 'BS L72')).toMatchObject({
      ok: true,
      clad: true,
      supersededBy: ['BS L163', 'BS L164'],
      nearest: 'clad 2014A-T3 or T4',
      needsEngineeringApproval: true,
    });
    expect(britishMaterial(BRITISH_MATERIALS, 'BS L1')).toEqual({ ok: false, reason: 'not_known' });
  });
});
