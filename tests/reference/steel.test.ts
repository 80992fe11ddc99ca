import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { latestStart } from '@/lib/trade/steel/latest-start';
import { phCondition, phConditionsFor } from '@/lib/trade/steel/ph-condition';
import { steelWindow } from '@/lib/trade/steel/steel-window';
import { temperAfterQuench } from '@/lib/trade/steel/temper-after-quench';
import { temperaturesOfColour, temperColoursAt } from '@/lib/trade/steel/temper-colours';
import { temperWindow } from '@/lib/trade/steel/temper-window';
import { PH_STEEL_CONDITIONS } from '@/lib/trade/tables/ph-steel-conditions';
import { STEEL_TEMPERING, TEMPER_BANDS } from '@/lib/trade/tables/steel-tempering';
import { STEEL_WINDOWS, type SteelOperation } from '@/lib/trade/tables/steel-windows';
import { TEMPER_AFTER_QUENCH } from '@/lib/trade/tables/temper-after-quench';
import { TEMPER_COLOURS } from '@/lib/trade/tables/temper-colours';
import { mmFromInches } from '@/lib/trade/units/length';
import { ksiFromMpa, mpaFromKsi } from '@/lib/trade/units/stress';
import {
  celsiusFromFahrenheit,
  fahrenheitDifferenceFromCelsius,
  fahrenheitFromCelsius,
} from '@/lib/trade/units/temperature';

import { named, numberOf, publishedRows } from './values';

const TEMPERING = { tempering: STEEL_TEMPERING, bands: TEMPER_BANDS };
const temperOf = (steel: string, lowKsi: number, highKsi: number) =>
  temperWindow(TEMPERING, { steel, tensileMpaMin: mpaFromKsi(lowKsi), tensileMpaMax: mpaFromKsi(highKsi) });

describe('furnace ranges of steels', () => {
  test('4130 is austenitized at 829.4 to 885.0 °C', () => {
    const found = steelWindow(STEEL_WINDOWS, { steel: '4130', operation: 'austenitize' });
    expect(found).toMatchObject({
      ok: true,
      quench: 'oil_or_water_by_section',
      readFrom: { table: 'steel-windows' },
    });
    expect(found.ok && found.temperatureCMin).toBeCloseTo(829.444, 3);
    expect(found.ok && found.temperatureCMax).toBeCloseTo(885, 9);
  });
  const rows = publishedRows('steel-windows', ['steel', 'operation', 'low_F', 'high_F', 'for_ksi']);
  test.each(named(rows))('$said: $steel $operation $low_F to $high_F °F', (row) => {
    const found = steelWindow(STEEL_WINDOWS, {
      steel: row.steel,
      operation: row.operation as SteelOperation,
      ...(row.for_ksi !== '' && { tensileMpaMax: mpaFromKsi(numberOf(row.for_ksi)) }),
    });
    const ranges = found.ok
      ? found.bySource.map((one) =>
          [one.temperatureCMin, one.temperatureCMax].map((c) => Math.round(fahrenheitFromCelsius(c))),
        )
      : [];
    expect(ranges).toContainEqual([numberOf(row.low_F), numberOf(row.high_F)]);
  });
  test('where two documents differ on normalizing 4340 the overlap satisfies both', () => {
    const found = steelWindow(STEEL_WINDOWS, { steel: '4340', operation: 'normalize' });
    expect(found.ok && found.bySource.length).toBe(2);
    expect(found.ok && fahrenheitFromCelsius(found.temperatureCMin)).toBeCloseTo(1600, 9);
    expect(found.ok && fahrenheitFromCelsius(found.temperatureCMax)).toBeCloseTo(1625, 9);
  });
  test('documents without an overlap are not averaged', () => {
    const [first] = STEEL_WINDOWS.rows;
    if (!first) throw new Error('The table has rows');
    const apart = { ...STEEL_WINDOWS, rows: [first, { ...first, rangeF: [1710, 1750] as const }] };
    const found = steelWindow(apart, { steel: '4130', operation: 'normalize' });
    expect(found).toMatchObject({ ok: false, reason: 'sources_have_no_overlap' });
  });
  test('AMS 5643 type data page: 17-4PH cools below 90 °F before it is aged', () => {
    const found = steelWindow(STEEL_WINDOWS, { steel: '17-4PH', operation: 'solution' });
    expect(found.ok && found.coolBelowC).toBeCloseTo(celsiusFromFahrenheit(90), 9);
  });
  test.each([
    [{ steel: '52100', operation: 'anneal' }, 'steel_not_in_table'],
    [{ steel: '4130', operation: 'solution' }, 'operation_not_in_table'],
  ] as const)('%o is refused: %s', (asked, reason) => {
    expect(steelWindow(STEEL_WINDOWS, asked)).toMatchObject({ ok: false, reason });
  });
});

describe('tempering for a tensile range', () => {
  test('4130 to 150 to 180 ksi is tempered at 700 to 900 °F, and that touches the band of low toughness', () => {
    const found = temperOf('4130', 150, 180);
    expect(found).toMatchObject({ ok: true, times: 1, isBetweenRows: false, embrittlement: 'avoid' });
    expect(found.ok && found.temperatureCMin).toBeCloseTo(371.11, 2);
    expect(found.ok && found.temperatureCMax).toBeCloseTo(482.22, 2);
  });
  const rows = publishedRows('steel-tempering', [
    'steel',
    'low_ksi',
    'high_ksi',
    'low_F',
    'high_F',
    'times',
    'hours_each',
  ]);
  test.each(named(rows))(
    '$said: $steel $low_ksi to $high_ksi ksi at $low_F to $high_F °F, $times times',
    (row) => {
      const found = temperOf(row.steel, numberOf(row.low_ksi), numberOf(row.high_ksi));
      expect(found).toMatchObject({ ok: true, times: numberOf(row.times), isBetweenRows: false });
      expect(found.ok && fahrenheitFromCelsius(found.temperatureCMin)).toBeCloseTo(numberOf(row.low_F), 6);
      expect(found.ok && fahrenheitFromCelsius(found.temperatureCMax)).toBeCloseTo(numberOf(row.high_F), 6);
      if (row.hours_each !== '') expect(found).toMatchObject({ hoursEach: numberOf(row.hours_each) });
    },
  );
  test('AMS 2759/2, from memory: 300M is never tempered between 600 and 800 °F, and 575 °F stays outside', () => {
    expect(temperOf('300M', 280, 280)).not.toHaveProperty('embrittlement');
    const hotter = {
      ...STEEL_TEMPERING,
      rows: STEEL_TEMPERING.rows.map((row) => ({ ...row, temperF: [575, 650] as const })),
    };
    const found = temperWindow(
      { tempering: hotter, bands: TEMPER_BANDS },
      { steel: '300M', tensileMpaMin: mpaFromKsi(280), tensileMpaMax: mpaFromKsi(280) },
    );
    expect(found).toMatchObject({ ok: true, embrittlement: 'never' });
  });
  test.each([
    ['4130', 110, 150, 'weaker_than_table'],
    ['4130', 180, 210, 'stronger_than_table'],
    ['4340', 220, 240, 'strength_between_tables'],
    ['4130', 180, 150, 'range_upside_down'],
    ['4130', NaN, 150, 'range_upside_down'],
    ['52100', 150, 180, 'steel_not_in_table'],
  ] as const)('%s to %d to %d ksi is refused: %s', (steel, low, high, reason) => {
    expect(temperOf(steel, low, high)).toMatchObject({ ok: false, reason });
  });
  test('law: stronger is never tempered hotter', () => {
    const ksi = fc.double({ min: 125, max: 200, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom('4130', '4140', '4340'), ksi, ksi, (steel, a, b) => {
        const weak = temperOf(steel, Math.min(a, b), Math.min(a, b));
        const strong = temperOf(steel, Math.max(a, b), Math.max(a, b));
        expect(weak.ok && strong.ok && strong.temperatureCMax <= weak.temperatureCMax + 1e-9).toBe(true);
      }),
    );
  });
});

describe('tempering after the quench', () => {
  test('a furnace page restating AMS 2759 practice: 2 in holds 3 h and starts within 4 h, better 2 h', () => {
    expect(temperAfterQuench(TEMPER_AFTER_QUENCH, 50.8)).toMatchObject({
      ok: true,
      startWithinHoursPreferred: 2,
      startWithinHours: 4,
      soakMin: 180,
    });
  });
  test.each([
    [0.25, 120],
    [1, 120],
    [1.5, 150],
  ])('%d in holds %d min', (inches, soakMin) => {
    const found = temperAfterQuench(TEMPER_AFTER_QUENCH, mmFromInches(inches));
    expect(found.ok && found.soakMin).toBeCloseTo(soakMin, 9);
  });
  test('no thickness, no answer', () => {
    expect(temperAfterQuench(TEMPER_AFTER_QUENCH, 0)).toMatchObject({ reason: 'thickness_not_positive' });
    expect(temperAfterQuench(TEMPER_AFTER_QUENCH, NaN)).toMatchObject({ reason: 'thickness_not_positive' });
  });
  test('quenched at 14:10, it starts by 18:10', () => {
    expect(latestStart(new Date('2026-03-02T14:10:00Z'), 4)).toEqual(new Date('2026-03-02T18:10:00Z'));
  });
});

describe('precipitation-hardening steels', () => {
  const rows = publishedRows('ph-steel-conditions', [
    'condition',
    'age_F',
    'hours',
    'tolerance_F',
    'plus_min',
    'uts_min_ksi',
    'hrc_low',
    'hrc_high',
  ]);
  test.each(named(rows))(
    '$said: $condition at $age_F °F for $hours h gives $uts_min_ksi ksi, HRC $hrc_low to $hrc_high',
    (row) => {
      for (const steel of ['17-4PH', '15-5PH']) {
        const found = phCondition(PH_STEEL_CONDITIONS, { steel, condition: row.condition });
        expect(found).toMatchObject({
          ok: true,
          soakMin: numberOf(row.hours) * 60,
          soakMinMax: numberOf(row.hours) * 60 + numberOf(row.plus_min),
          hrcMin: numberOf(row.hrc_low),
          hrcMax: numberOf(row.hrc_high),
        });
        if (!found.ok) continue;
        expect(fahrenheitFromCelsius(found.temperatureC)).toBeCloseTo(numberOf(row.age_F), 9);
        expect(fahrenheitDifferenceFromCelsius(found.toleranceC)).toBeCloseTo(numberOf(row.tolerance_F), 9);
        expect(ksiFromMpa(found.tensileMpaMin)).toBeCloseTo(numberOf(row.uts_min_ksi), 9);
      }
    },
  );
  test('150 ksi of 17-4PH: H1025, H925, H900, the weakest first', () => {
    const found = phConditionsFor(PH_STEEL_CONDITIONS, { steel: '17-4PH', tensileMpaMin: mpaFromKsi(150) });
    expect(found.ok && found.conditions.map(({ condition }) => condition)).toEqual(['H1025', 'H925', 'H900']);
    const exactly = phConditionsFor(PH_STEEL_CONDITIONS, { steel: '15-5PH', tensileMpaMin: mpaFromKsi(190) });
    expect(exactly.ok && exactly.conditions.map(({ condition }) => condition)).toEqual(['H900']);
  });
  test('what is not in the table is refused', () => {
    expect(phCondition(PH_STEEL_CONDITIONS, { steel: '4130', condition: 'H900' })).toMatchObject({
      reason: 'steel_not_in_table',
    });
    expect(phCondition(PH_STEEL_CONDITIONS, { steel: '17-4PH', condition: 'H1000' })).toMatchObject({
      reason: 'condition_not_in_table',
    });
    expect(
      phConditionsFor(PH_STEEL_CONDITIONS, { steel: '17-4PH', tensileMpaMin: mpaFromKsi(191) }),
    ).toMatchObject({ reason: 'stronger_than_table' });
    expect(phConditionsFor(PH_STEEL_CONDITIONS, { steel: '4130', tensileMpaMin: 900 })).toMatchObject({
      reason: 'steel_not_in_table',
    });
  });
});

describe('oxide colours', () => {
  const rows = publishedRows('temper-colours', ['colour', 'deg_F', 'deg_C', 'list']);
  test.each(named(rows))('$said: $colour at $deg_F °F', (row) => {
    const found = temperColoursAt(TEMPER_COLOURS, celsiusFromFahrenheit(numberOf(row.deg_F)));
    const seen = found.ok ? found.byList.find(({ list }) => list === row.list) : undefined;
    expect(seen).toMatchObject({ colour: row.colour });
    expect(Math.round(seen?.temperatureC ?? NaN)).toBe(numberOf(row.deg_C));
    const back = temperaturesOfColour(TEMPER_COLOURS, row.colour);
    expect(
      back.ok && back.byList.map(({ temperatureC }) => Math.round(fahrenheitFromCelsius(temperatureC))),
    ).toContain(numberOf(row.deg_F));
  });
  test('the trap of one colour list: dark straw is 480, 465 or 440 °F', () => {
    const found = temperaturesOfColour(TEMPER_COLOURS, 'Dark straw');
    expect(
      found.ok && found.byList.map(({ temperatureC }) => Math.round(fahrenheitFromCelsius(temperatureC))),
    ).toEqual([480, 465, 440]);
  });
  test.each([
    [300, 'colder_than_colours'],
    [700, 'hotter_than_colours'],
    [NaN, 'temperature_not_a_number'],
  ])('%d °F has no colour: %s', (f, reason) => {
    expect(temperColoursAt(TEMPER_COLOURS, celsiusFromFahrenheit(f))).toMatchObject({ ok: false, reason });
  });
  test('a colour nobody lists is refused', () => {
    expect(temperaturesOfColour(TEMPER_COLOURS, 'green')).toMatchObject({ reason: 'colour_not_in_table' });
  });
});
