import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { calledRevision, coversRevision } from '@/lib/trade/finishes/called-revision';
import type { HardenedPart } from '@/lib/trade/steel/applicable-rule';
import { bakeHoursByStrength } from '@/lib/trade/steel/bake-hours-by-strength';
import { platingLimit } from '@/lib/trade/steel/plating-limit';
import { relief } from '@/lib/trade/steel/relief';
import { BAKE_HOURS_BY_STRENGTH } from '@/lib/trade/tables/bake-hours-by-strength';
import type { HardenedPartKind } from '@/lib/trade/tables/embrittlement-row';
import { EMBRITTLEMENT_RULES } from '@/lib/trade/tables/embrittlement-rules';
import { EXPOSURE_LIMITS } from '@/lib/trade/tables/exposure-limits';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import { mpaFromKsi } from '@/lib/trade/units/stress';
import { celsiusFromFahrenheit, fahrenheitFromCelsius } from '@/lib/trade/units/temperature';

import { named, numberOf, publishedRows } from './values';

const TABLES = {
  rules: EMBRITTLEMENT_RULES,
  bakeHours: BAKE_HOURS_BY_STRENGTH,
  conversion: HARDNESS_STEEL_HRC,
  exposure: EXPOSURE_LIMITS,
};
const CADMIUM_F = { specification: 'QQ-P-416', revision: 'F' };
const bake = (
  called: { specification: string; revision?: string },
  part: HardenedPart & { temperedAtC?: number },
) => relief(TABLES, 'embrittlement_relief', called, part);

test('QQ-P-416 revision F, HRC 42: 176.7 to 204.4 °C for 23 h, started within 4 h', () => {
  const found = bake(CADMIUM_F, { hrc: 42 });
  expect(found).toMatchObject({
    ok: true,
    isRequired: true,
    isByConversion: false,
    hours: 23,
    startWithinHours: 4,
    source: { document: 'QQ-P-416F (1 Oct 1991) 3.2', confidence: 'memory' },
    readFrom: { table: 'embrittlement-rules' },
  });
  expect(found.ok && found.isRequired && found.temperatureCMin).toBeCloseTo(176.67, 2);
  expect(found.ok && found.isRequired && found.temperatureCMax).toBeCloseTo(204.44, 2);
});

describe('published rules, at their threshold and just beside it', () => {
  const rows = publishedRows('embrittlement-rules', [
    'specification',
    'revision',
    'treatment',
    'kind',
    'worked',
    'unit',
    'threshold',
    'is_over',
    'low',
    'high',
    'degrees',
    'hours_low',
    'hours_high',
    'start_h',
  ]);
  const partAt = (row: (typeof rows)[number], off: number): HardenedPart => ({
    ...(row.kind !== '' && { kind: row.kind as HardenedPartKind }),
    ...(row.worked === 'yes' && { isWorkedHard: true }),
    ...(row.unit === 'hrc' && { hrc: numberOf(row.threshold) + off }),
    ...(row.unit === 'mpa' && { tensileMpa: numberOf(row.threshold) + off }),
    ...(row.unit === 'ksi' && { tensileMpa: mpaFromKsi(numberOf(row.threshold) + off) }),
  });
  const cases = named(rows);

  test.each(cases)('$said: $specification $revision $treatment $kind from $unit $threshold', (row) => {
    const called = { specification: row.specification, revision: row.revision };
    const ask = (off: number) => {
      const part = partAt(row, off);
      if (row.treatment === 'embrittlement_relief' || row.treatment === 'stress_relief') {
        const found = relief(TABLES, row.treatment, called, part);
        return { found, applies: found.ok ? found.isRequired : found.reason };
      }
      const found = platingLimit(TABLES, row.treatment as 'not_to_be_plated', called, part);
      return { found, applies: found.ok ? found.applies : found.reason };
    };
    const { found, applies } = ask(row.is_over === 'yes' ? 0.1 : 0);
    expect(applies).toBe(true);
    if (row.unit !== 'none') expect(ask(row.is_over === 'yes' ? 0 : -0.1).applies).toBe(false);
    expect(found.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
    if (!found.ok || !('isRequired' in found) || !found.isRequired) return;
    const printed = (c: number | undefined) => (row.degrees === 'F' ? fahrenheitFromCelsius(c ?? NaN) : c);
    expect(printed(found.temperatureCMin)).toBeCloseTo(numberOf(row.low), 6);
    expect(printed(found.temperatureCMax)).toBeCloseTo(numberOf(row.high), 6);
    expect(found.hoursPrinted).toEqual(
      row.hours_low === '' ? undefined : [numberOf(row.hours_low), numberOf(row.hours_high)],
    );
    expect(found.startWithinHours).toBe(row.start_h === '' ? undefined : numberOf(row.start_h));
  });

  test('ASTM B633-19, introduction: below 1200 MPa no bake, from there by the hours of B850', () => {
    const called = { specification: 'ASTM B633', revision: '19' };
    expect(bake(called, { tensileMpa: 1199 })).toMatchObject({ ok: true, isRequired: false });
    expect(bake(called, { tensileMpa: 1200 })).toMatchObject({
      isRequired: true,
      hours: 10,
      by: 'ASTM B850',
      startWithinHours: 4,
    });
    const strong = bake(called, { tensileMpa: 1350 });
    expect(strong).toMatchObject({ isRequired: true, hours: 14, temperatureCMin: 190, temperatureCMax: 220 });
    expect(bake({ specification: 'ASTM B633', revision: '98' }, { tensileMpa: 1350 })).toMatchObject({
      reason: 'revision_not_in_table',
    });
  });
  test('ASTM B850-98: 1000 MPa and above, 190 to 220 °C, start from memory', () => {
    const called = { specification: 'ASTM B850', revision: '98' };
    expect(bake(called, { tensileMpa: 999 })).toMatchObject({ ok: true, isRequired: false });
    expect(bake(called, { tensileMpa: 1000 })).toMatchObject({
      isRequired: true,
      hours: 8,
      temperatureCMin: 190,
      temperatureCMax: 220,
      startWithinHours: 4,
      startWithinHoursPreferred: 1,
    });
  });
  test('ISO 9587:2007: the longest class holds when the purchaser names none', () => {
    const found = relief(TABLES, 'stress_relief', { specification: 'ISO 9587:2007' }, { tensileMpa: 1100 });
    expect(found).toMatchObject({ isRequired: true, classWhenUnnamed: 'SR-1' });
  });
  test('DOD-P-16232, from memory: or 120 h at room temperature', () => {
    expect(bake({ specification: 'DOD-P-16232F' }, { hrc: 45 })).toMatchObject({
      orRoomTemperatureHours: 120,
    });
  });
  test('ASTM F1941: the hours are settled with the purchaser', () => {
    const found = bake({ specification: 'ASTM F1941-10' }, { hrc: 42 });
    expect(found).toMatchObject({ isRequired: true, isHoursAgreed: true, hoursPrinted: [2, 24] });
    expect(found).not.toHaveProperty('hours');
  });
  test('AMS 2759/9D: where its paragraphs differ the longer bake is ordered', () => {
    expect(bake({ specification: 'AMS 2759/9', revision: 'D' }, { hrc: 41 })).toMatchObject({
      hours: 24,
      hoursPrinted: [23, 24],
    });
  });
});

describe('hours by strength', () => {
  const rows = publishedRows('bake-hours-by-strength', [
    'mpa_low',
    'mpa_high',
    'ksi_low',
    'ksi_high',
    'hrc_low',
    'hrc_high',
    'hours_min',
  ]);
  test.each(rows)('$source: $mpa_low to $mpa_high MPa needs $hours_min h', (row) => {
    const hours = numberOf(row.hours_min);
    for (const tensileMpa of [numberOf(row.mpa_low), numberOf(row.mpa_high)])
      expect(bakeHoursByStrength(BAKE_HOURS_BY_STRENGTH, { tensileMpa })).toMatchObject({ ok: true, hours });
    const middle = (numberOf(row.hrc_low) + numberOf(row.hrc_high)) / 2;
    expect(bakeHoursByStrength(BAKE_HOURS_BY_STRENGTH, { hrc: middle })).toMatchObject({ ok: true, hours });
    expect(bakeHoursByStrength(BAKE_HOURS_BY_STRENGTH, { hrc: numberOf(row.hrc_low) })).toMatchObject({
      ok: true,
      hours,
    });
    // Printed in ksi beside it, rounded: never more than a ksi away from the rows in MPa.
    expect(Math.abs(mpaFromKsi(numberOf(row.ksi_low)) - numberOf(row.mpa_low))).toBeLessThan(7);
    expect(Math.abs(mpaFromKsi(numberOf(row.ksi_high)) - numberOf(row.mpa_high))).toBeLessThan(7);
  });
  test('between two rows the stronger one counts', () => {
    expect(bakeHoursByStrength(BAKE_HOURS_BY_STRENGTH, { tensileMpa: 1100.5 })).toMatchObject({ hours: 10 });
  });
  test.each([
    [{ tensileMpa: 999 }, 'weaker_than_table'],
    [{ tensileMpa: 1801 }, 'stronger_than_table'],
    [{ hrc: 30.9 }, 'weaker_than_table'],
    [{ hrc: 51.5 }, 'stronger_than_table'],
    [{}, 'strength_not_stated'],
    [{ hrc: NaN }, 'strength_not_stated'],
  ])('%o is refused: %s', (strength, reason) => {
    expect(bakeHoursByStrength(BAKE_HOURS_BY_STRENGTH, strength)).toMatchObject({ ok: false, reason });
  });
  test('law: stronger never bakes shorter', () => {
    const mpa = fc.double({ min: 1000, max: 1800, noNaN: true });
    fc.assert(
      fc.property(mpa, mpa, (a, b) => {
        const weak = bakeHoursByStrength(BAKE_HOURS_BY_STRENGTH, { tensileMpa: Math.min(a, b) });
        const strong = bakeHoursByStrength(BAKE_HOURS_BY_STRENGTH, { tensileMpa: Math.max(a, b) });
        expect(weak.ok && strong.ok && weak.hours <= strong.hours).toBe(true);
      }),
    );
  });
});

describe('the trap of one embrittlement threshold for everything', () => {
  test('one part, HRC 38 and 1180 MPa, is baked by one document and not by another', () => {
    const part = { hrc: 38, tensileMpa: 1180 };
    expect(bake(CADMIUM_F, part)).toMatchObject({ isRequired: false });
    expect(bake({ specification: 'ASTM B850' }, part)).toMatchObject({ isRequired: true, hours: 10 });
    expect(bake({ specification: 'AMS 2759/9D' }, { ...part, kind: 'threaded_fastener' })).toMatchObject({
      isRequired: true,
      hours: 24,
    });
    expect(bake({ specification: 'AMS 2759/9D' }, part)).toMatchObject({ isRequired: false });
  });
  test('the same specification went from 3 h to 23 h: without its revision there is no answer', () => {
    expect(bake({ specification: 'QQ-P-416', revision: 'E' }, { hrc: 42 })).toMatchObject({ hours: 3 });
    expect(bake({ specification: 'QQ-P-416', revision: 'F' }, { hrc: 42 })).toMatchObject({ hours: 23 });
    expect(bake({ specification: 'QQ-P-416' }, { hrc: 42 })).toMatchObject({
      ok: false,
      reason: 'revision_not_stated',
    });
    expect(bake({ specification: 'QQ-P-416', revision: 'D' }, { hrc: 42 })).toMatchObject({
      reason: 'revision_not_in_table',
    });
  });
  test('one document has three thresholds', () => {
    const fastener = { kind: 'threaded_fastener', tensileMpa: mpaFromKsi(165), hrc: 37 } as const;
    expect(platingLimit(TABLES, 'special_cleaning', CADMIUM_F, fastener)).toMatchObject({ applies: true });
    expect(bake(CADMIUM_F, fastener)).toMatchObject({ isRequired: false });
    expect(platingLimit(TABLES, 'not_to_be_plated', CADMIUM_F, fastener)).toMatchObject({ applies: false });
    expect(platingLimit(TABLES, 'special_cleaning', CADMIUM_F, { hrc: 37 })).toMatchObject({
      ok: true,
      applies: false,
    });
  });
  test('the bake stays 50 °F below the tempering temperature', () => {
    const found = bake(CADMIUM_F, { hrc: 50, temperedAtC: celsiusFromFahrenheit(425) });
    expect(found.ok && found.isRequired && fahrenheitFromCelsius(found.temperatureCMax ?? NaN)).toBeCloseTo(
      375,
      9,
    );
    expect(found.ok && found.isRequired && fahrenheitFromCelsius(found.temperatureCMin ?? NaN)).toBeCloseTo(
      350,
      9,
    );
    const exactly = bake(CADMIUM_F, { hrc: 50, temperedAtC: celsiusFromFahrenheit(400) });
    expect(exactly).toMatchObject({ ok: true, isRequired: true });
    expect(bake(CADMIUM_F, { hrc: 50, temperedAtC: celsiusFromFahrenheit(399) })).toMatchObject({
      ok: false,
      reason: 'bake_too_near_tempering',
    });
  });
});

describe('what is not known is not assumed', () => {
  test('a tensile strength is compared with an HRC threshold by conversion, and says so', () => {
    expect(bake(CADMIUM_F, { tensileMpa: mpaFromKsi(182) })).toMatchObject({
      isRequired: true,
      isByConversion: true,
    });
    expect(bake(CADMIUM_F, { tensileMpa: mpaFromKsi(176) })).toMatchObject({
      isRequired: false,
      isByConversion: true,
    });
    expect(bake(CADMIUM_F, { tensileMpa: mpaFromKsi(60) })).toMatchObject({
      isRequired: false,
      isByConversion: true,
    });
    expect(bake({ specification: 'MIL-STD-870B' }, { hrc: 40 })).toMatchObject({
      isRequired: true,
      isByConversion: true,
    });
    expect(bake({ specification: 'MIL-STD-870B' }, { hrc: 39 })).toMatchObject({
      isRequired: false,
      isByConversion: true,
    });
    expect(bake({ specification: 'MIL-STD-870B' }, { hrc: 62 })).toMatchObject({ isRequired: true });
    expect(bake({ specification: 'ASTM B850' }, { hrc: 32 })).toMatchObject({
      isRequired: true,
      isByConversion: true,
      hours: 8,
    });
  });
  test.each([
    [CADMIUM_F, {}, 'strength_not_stated'],
    [{ specification: 'MIL-C-8837' }, { hrc: 45 }, 'specification_not_in_table'],
    [{ specification: 'ASTM B850' }, { tensileMpa: 1900 }, 'stronger_than_table'],
  ])('%o with %o is refused: %s', (called, part, reason) => {
    expect(bake(called, part)).toMatchObject({ ok: false, reason });
  });
  test('whether a strong part was worked after hardening has to be said', () => {
    const part = { hrc: 42 };
    expect(relief(TABLES, 'stress_relief', CADMIUM_F, part)).toMatchObject({ reason: 'working_not_stated' });
    expect(relief(TABLES, 'stress_relief', CADMIUM_F, { ...part, isWorkedHard: false })).toMatchObject({
      isRequired: false,
    });
    expect(relief(TABLES, 'stress_relief', CADMIUM_F, { hrc: 30 })).toMatchObject({ isRequired: false });
  });
});

describe('which document at which revision an order calls', () => {
  test.each([
    ['QQ-P-416', 'QQ-P-416F', '', 'F'],
    ['QQ-P-416', 'qq-p-416 rev f', undefined, 'F'],
    ['QQ-P-416', 'QQ-P-416', 'Rev. F Amdt 1', 'F'],
    ['QQ-P-416', 'QQ P 416', '', ''],
    ['QQ-P-416', 'AMS-QQ-P-416', 'F', null],
    ['AMS 2759/9', 'AMS2759/9D', '', 'D'],
    ['AMS 2759', 'AMS 2759/9', 'D', null],
    ['AMS 2759/1', 'AMS 2759/11', 'B', null],
    ['ASTM B633', 'ASTM B633-19', '', '19'],
    ['ASTM B633', 'ASTM B633', '2019', '2019'],
    ['ISO 9587', 'ISO 9587:2007', '', '2007'],
    ['ASTM B63', 'ASTM B633', '', null],
  ])('%s from "%s" and "%s" is %s', (document, specification, revision, called) => {
    expect(calledRevision(document, { specification, revision })).toBe(called);
  });
  test('years of two digits are of the last century from 50', () => {
    expect(coversRevision({ fromYear: 2007 }, '07')).toBe(true);
    expect(coversRevision({ fromYear: 2007 }, '98')).toBe(false);
    expect(coversRevision({ fromYear: 2007 }, '2019')).toBe(true);
    expect(coversRevision({ fromYear: 2007 }, '')).toBe(false);
  });
});
