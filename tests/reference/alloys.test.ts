import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { ALLOYS } from '@/lib/trade/alloys/alloy';
import { densityOf } from '@/lib/trade/alloys/density';
import { presentName } from '@/lib/trade/alloys/present-name';
import { readMaterial } from '@/lib/trade/alloys/read-material';
import { DENSITIES } from '@/lib/trade/tables/densities';
import { OLD_NAMES } from '@/lib/trade/tables/old-names';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';

import { alloyOf } from './trade-words';
import { numberOf, publishedRows, casesOf } from './values';

describe('densities', () => {
  const published = publishedRows('densities', ['alloy', 'condition', 'lb_per_in3', 'g_per_cm3']);

  test('2024 is 2.768 g/cm³, from 0.100 lb/in³', () => {
    const density = densityOf(DENSITIES, { alloy: '2024' });
    expect(density).toMatchObject({ ok: true, readFrom: { table: 'densities' } });
    expect(density.ok && density.gPerCm3).toBeCloseTo(2.768, 3);
  });

  test.each(casesOf(published, (row) => `${row.alloy} ${row.condition} is ${row.g_per_cm3} g/cm³`))(
    '%s',
    (_name, { alloy, condition, g_per_cm3, confidence, certainty }) => {
      const density = densityOf(DENSITIES, { alloy: alloyOf(alloy), ...(condition && { condition }) });
      if (!density.ok) throw new Error(density.reason);
      // Printed to three places, the last one rounded; two zeros at the end are not printed.
      expect(Math.abs(density.gPerCm3 - numberOf(g_per_cm3))).toBeLessThanOrEqual(0.000_51);
      expect(density.source).toMatchObject({ confidence, certainty });
    },
  );

  test('the condition decides for 17-4PH, and none is guessed', () => {
    expect(densityOf(DENSITIES, { alloy: '17-4PH' })).toMatchObject({ reason: 'condition_decides' });
    expect(densityOf(DENSITIES, { alloy: '17-4PH', condition: 'H925' })).toMatchObject({
      reason: 'condition_decides',
    });
  });

  test("an alloy that the shop's own table leaves out is refused", () => {
    const own = { ...DENSITIES, edition: 'Own list', rows: [] };
    expect(densityOf(own, { alloy: '2024' })).toEqual({ ok: false, reason: 'alloy_not_in_table' });
  });

  test.each(Object.keys(ALLOYS))('%s has a density', (alloy) => {
    const material = { alloy: alloyOf(alloy), condition: 'H900' };
    expect(densityOf(DENSITIES, material)).toMatchObject({ ok: true });
  });
});

describe('former names', () => {
  const published = publishedRows('old-names', ['written', 'present', 'chief_element', 'prefix', 'clad']);

  test('24S-T is 2024-T3 or 2024-T42: ask who treated it', () => {
    expect(presentName(OLD_NAMES, '24S-T')).toMatchObject({ ok: true, present: ['2024-T3', '2024-T42'] });
  });

  test.each(
    casesOf(published, (row) => `${row.written} is ${row.present || row.chief_element || row.prefix}`),
  )('%s', (_name, { written, present, chief_element, prefix, clad, confidence }) => {
    const name = presentName(OLD_NAMES, written);
    if (!name.ok) throw new Error(name.reason);
    if (present) expect(name.present.join('|')).toBe(present);
    if (chief_element) expect(name.chiefElement).toBe(chief_element);
    if (prefix) expect(name.prefix).toBe(prefix);
    expect(name.clad).toBe(clad === 'yes');
    if (present && !chief_element) expect(name.source.confidence).toBe(confidence);
  });

  test('the trap of taking a present name for a licence to use it: the caution stands on every answer', () => {
    for (const { written } of published)
      expect(presentName(OLD_NAMES, written)).toMatchObject({
        caution: 'equivalence_is_an_engineering_decision',
      });
  });

  test('the dash may be missing, letters may be small', () => {
    expect(presentName(OLD_NAMES, '24st')).toMatchObject({ present: ['2024-T3', '2024-T42'] });
  });

  test('a temper that the table has not is refused rather than dropped', () => {
    expect(presentName(OLD_NAMES, '61S-T')).toMatchObject({ ok: false, reason: 'temper_not_in_table' });
  });

  test.each(['2024', '', 'S', '100S', '4130'])('%j is no former name', (written) => {
    expect(presentName(OLD_NAMES, written)).toMatchObject({ ok: false, reason: 'not_a_former_name' });
  });
});

describe('material as it is written', () => {
  test('Alclad 2024-T3', () => {
    expect(readMaterial(TEMPER_DESIGNATIONS, 'Alclad 2024-T3')).toEqual({
      ok: true,
      alloy: '2024',
      family: 'wrought_aluminium',
      saysClad: true,
      temper: { temper: 'T3' },
    });
  });

  test.each([
    ['2024', '2024', false],
    ['2024 Alclad', '2024', true],
    ['AA 6061-T6', '6061', false],
    ['aluminium 7075 clad', '7075', true],
    ['Ti 6Al-4V', 'Ti-6Al-4V', false],
    ['17-4 PH', '17-4PH', false],
    ['AISI 4130', '4130', false],
    ['aluminium bronze', 'aluminium bronze', false],
    ['az31b-h24', 'AZ31B', false],
  ])('%s is %s', (written, alloy, saysClad) => {
    expect(readMaterial(TEMPER_DESIGNATIONS, written)).toMatchObject({ ok: true, alloy, saysClad });
  });

  test.each(['24S', '20245', 'steel', '', 'clad'])('%j names no alloy of the list', (written) => {
    expect(readMaterial(TEMPER_DESIGNATIONS, written)).toEqual({ ok: false, reason: 'unknown_alloy' });
  });

  test('nothing that a person can type makes it throw', () => {
    fc.assert(
      fc.property(fc.string(), (written) => {
        expect(readMaterial(TEMPER_DESIGNATIONS, written)).toHaveProperty('ok');
        expect(presentName(OLD_NAMES, written)).toHaveProperty('ok');
      }),
    );
  });
});
