import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { etchBeforePenetrant } from '@/lib/trade/ndt/etch-before-penetrant';
import { inspectorDates, mayApproveProcedures, trainingHours } from '@/lib/trade/ndt/inspector-qualification';
import { magneticParticleAroundPlating } from '@/lib/trade/ndt/magnetic-particle-around-plating';
import { ndtAsOrdered } from '@/lib/trade/ndt/ndt-as-ordered';
import { ndtFigure } from '@/lib/trade/ndt/ndt-figure';
import { ETCH_BEFORE_PENETRANT } from '@/lib/trade/tables/etch-before-penetrant';
import { MAGNETIC_PARTICLE_PLATING } from '@/lib/trade/tables/magnetic-particle-plating';
import { NDT_DESIGNATIONS } from '@/lib/trade/tables/ndt-designations';
import { NDT_FIGURES, type NdtItem, type NdtMethod } from '@/lib/trade/tables/ndt-figures';
import { NDT_LEVELS, NDT_PERSONNEL } from '@/lib/trade/tables/ndt-personnel';
import { mmFromInches } from '@/lib/trade/units/length';
import { mpaFromKsi } from '@/lib/trade/units/stress';
import { celsiusFromFahrenheit } from '@/lib/trade/units/temperature';

import { named, numberOf, publishedRows } from './values';

test('drying before penetrant is at most 160 °F, 71.1 °C', () => {
  const found = ndtFigure(NDT_FIGURES, { method: 'penetrant', item: 'drying_temperature' });
  expect(found).toMatchObject({ ok: true, unit: '°C', source: { confidence: 'memory' } });
  expect(found.ok && found.max).toBeCloseTo(71.11, 2);
});

describe('published figures', () => {
  const INTO_SI: Readonly<Record<string, (printed: number) => number>> = {
    F: celsiusFromFahrenheit,
    h: (hours) => hours * 60,
    gauss: (gauss) => gauss * 0.1,
    in: mmFromInches,
    ksi: mpaFromKsi,
  };
  const rows = publishedRows('ndt-figures', ['method', 'item', 'unit', 'min', 'max']);
  test.each(named(rows))('$said: $method $item $min to $max $unit', (row) => {
    const found = ndtFigure(NDT_FIGURES, { method: row.method as NdtMethod, item: row.item as NdtItem });
    const si = (printed: string) => (INTO_SI[row.unit] ?? ((value: number) => value))(numberOf(printed));
    expect(found.source).toMatchObject({ confidence: row.confidence, certainty: row.certainty });
    if (!found.ok) throw new Error(found.reason);
    if (row.min === '') expect(found.min).toBeUndefined();
    else expect(found.min).toBeCloseTo(si(row.min), 9);
    if (row.max === '') expect(found.max).toBeUndefined();
    else expect(found.max).toBeCloseTo(si(row.max), 9);
  });
  test('a figure of another method is refused', () => {
    expect(ndtFigure(NDT_FIGURES, { method: 'penetrant', item: 'residual_field' })).toMatchObject({
      reason: 'figure_not_in_table',
    });
  });
});

describe('what an order states', () => {
  const penetrant = (classType: string) => ndtAsOrdered(NDT_DESIGNATIONS, { method: 'penetrant', classType });
  test.each([
    ['type I', 'type', 'I', 'fluorescent'],
    ['type II', 'type', 'II', 'visible'],
    ['method A', 'method', 'A', 'water washable'],
    ['method B', 'method', 'B', 'post-emulsifiable, lipophilic'],
    ['method C', 'method', 'C', 'solvent removable'],
    ['method D', 'method', 'D', 'post-emulsifiable, hydrophilic'],
    ['sensitivity 1/2', 'level', '1/2', 'very low'],
    ['level 1', 'level', '1', 'low'],
    ['level 2', 'level', '2', 'medium'],
    ['sensitivity level 3', 'level', '3', 'high'],
    ['level 4', 'level', '4', 'ultra-high'],
  ])('ASTM E1417, from memory: "%s" is %s %s, %s', (classType, key, value, says) => {
    expect(penetrant(classType)).toMatchObject({ ok: true, stated: [{ key, value, says }] });
  });
  test('type I, level 3 leaves the method open', () => {
    expect(penetrant('type I, level 3')).toMatchObject({ notStated: ['method'] });
    expect(penetrant('type I, method A, level 2')).toMatchObject({ notStated: [] });
    expect(penetrant('type II method C')).toMatchObject({ notStated: [] });
    expect(penetrant('')).toMatchObject({ stated: [], notStated: ['type', 'method', 'level'] });
  });
  test.each([
    ['wet fluorescent', 'wet fluorescent', []],
    ['Wet visible', 'wet visible', []],
    ['dry', 'dry powder', []],
  ])('ASTM E1444, from memory: magnetic particle "%s"', (classType, says, notStated) => {
    expect(ndtAsOrdered(NDT_DESIGNATIONS, { method: 'magnetic_particle', classType })).toMatchObject({
      stated: [{ says }],
      notStated,
    });
  });
  test('magnetic particle with no medium leaves it open', () => {
    expect(ndtAsOrdered(NDT_DESIGNATIONS, { method: 'magnetic_particle', classType: '' })).toMatchObject({
      notStated: ['medium'],
    });
  });
});

describe('the trap of magnetic particle on one side of plating only', () => {
  test.each([
    [0.0002, 'before_or_after'],
    [0.0007, 'before_or_after'],
    [0.0008, 'before_and_after'],
    [0.002, 'before_and_after'],
    [0.005, 'before_and_after'],
    [0.0051, 'before'],
    [0.01, 'before'],
  ])('ASTM E1444 as restated: plating of %d in is inspected %s', (inches, inspect) => {
    expect(magneticParticleAroundPlating(MAGNETIC_PARTICLE_PLATING, mmFromInches(inches))).toMatchObject({
      ok: true,
      inspect,
    });
  });
  test('no thickness, no answer', () => {
    for (const thicknessMm of [0, -1, NaN])
      expect(magneticParticleAroundPlating(MAGNETIC_PARTICLE_PLATING, thicknessMm)).toMatchObject({
        reason: 'thickness_not_positive',
      });
  });
  test('law: every plated thickness up to 0.0050 in is inspected after, or may be', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.00001, max: 0.005, noNaN: true }), (inches) => {
        const found = magneticParticleAroundPlating(MAGNETIC_PARTICLE_PLATING, mmFromInches(inches));
        expect(found.ok && found.inspect).not.toBe('before');
      }),
    );
  });
});

describe('inspectors', () => {
  const day = (text: string) => new Date(`${text}T00:00:00Z`);
  const dates = (certifiedOn: string, nearVisionOn: string, on: string) =>
    inspectorDates(
      NDT_PERSONNEL,
      { certifiedOn: day(certifiedOn), nearVisionOn: day(nearVisionOn) },
      day(on),
    );
  test('NAS 410, from memory: certified for 5 years, near vision for one', () => {
    expect(dates('2023-06-01', '2025-06-01', '2026-06-01')).toMatchObject({
      isCurrent: true,
      recertifyBy: day('2028-06-01'),
      nearVisionBy: day('2026-06-01'),
    });
    expect(dates('2023-06-01', '2025-06-01', '2026-06-02')).toMatchObject({ isCurrent: false });
    expect(dates('2020-06-01', '2025-06-01', '2025-06-02')).toMatchObject({ isCurrent: false });
    expect(dates('2024-02-29', '2024-02-29', '2025-02-28')).toMatchObject({
      nearVisionBy: day('2025-02-28'),
      isCurrent: true,
    });
  });
  test.each([
    ['PT', 16, 32],
    ['MT', 16, 32],
    ['ET', 40, 80],
    ['UT', 40, 80],
    ['RT', 40, 80],
  ] as const)('NAS 410, from memory: %s takes %i h to level 1 and %i h to level 2', (method, one, two) => {
    expect(trainingHours(NDT_PERSONNEL, { method, level: 1 })).toMatchObject({ hours: one });
    expect(trainingHours(NDT_PERSONNEL, { method, level: 2 })).toMatchObject({ hours: two });
  });
  test('MIL-STD-410E 5.1.5: of all levels only level 3 approves procedures', () => {
    const may = NDT_LEVELS.filter((level) => {
      const found = mayApproveProcedures(NDT_PERSONNEL, level);
      return found.ok && found.mayApprove;
    });
    expect(may).toEqual(['3']);
  });
});

test.each([
  [{ surface: 'machined' }, 'ask'],
  [{ surface: 'ground', isRequired: true }, 'etch_then_neutralise'],
  [{ surface: 'smeared', isRequired: false }, 'no_etch'],
  [{ surface: 'as_forged' }, 'no_etch'],
] as const)('ASTM E1417, from memory: etch before penetrant of %o: %s', (part, etch) => {
  expect(etchBeforePenetrant(ETCH_BEFORE_PENETRANT, part)).toMatchObject({ ok: true, etch });
});
