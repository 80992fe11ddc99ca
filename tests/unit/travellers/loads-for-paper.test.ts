import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';

import { TravellerSheet } from '@/components/batches/traveller-sheet';
import { BATCH_TABLES } from '@/lib/reference/batch-tables';
import { loadsForPaper, samplesForPaper } from '@/lib/travellers/loads-for-paper';

import { lineOf, type PartChange } from '../batches/facts-of-batch';
import { sampleTraveller } from '../pdf/sample-content';

const STEP = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  classType: null,
  conditionBefore: 'O',
  targetCondition: 'T42',
} as const;
const sheet = (thicknessMm: number, more: PartChange = {}): PartChange => ({
  alloy: '2024',
  madeCondition: 'O',
  endCondition: 'T42',
  thicknessMm,
  thickness: `${thicknessMm} mm`,
  ...more,
});
const line = (no: number, part: PartChange, loadNo: number | null = null) =>
  lineOf(no, part, [STEP], { loadNo });
const rowsOf = (furnace: ReturnType<typeof loadsForPaper>, at = 0) =>
  Object.fromEntries(
    furnace?.loads[at]?.rows.map(({ name, says, rest }) => [name, `${says} ${rest}`.trim()]) ?? [],
  );

describe('the loads of a traveller', () => {
  const clad = line(1, sheet(0.8, { clad: true }), 1);
  const thick = line(2, sheet(6.3), 2);

  test('each says what it is run at, by its own thickest section, with both scales', () => {
    const furnace = loadsForPaper(BATCH_TABLES, [clad, thick], 'letter');
    expect(furnace?.areSet).toBe(true);
    expect(rowsOf(furnace, 0)['Solution']).toBe('910 to 930 °F (488 to 498 °C)');
    expect(rowsOf(furnace, 0)['Soak']).toMatch(/^\d+ to \d+ min window \d+ min: clad metal ends it$/);
    expect(rowsOf(furnace, 1)['Soak']).toMatch(/^\d+ min or more$/);
    expect(rowsOf(furnace, 1)['Governs']).toBe('6.3 mm thickest section, line 2');
    expect(rowsOf(furnace, 1)['Quench']).toBe('cold water heated in air');
    expect(furnace?.sources.join()).toMatch(/trust/);
    expect(rowsOf(loadsForPaper(BATCH_TABLES, [clad], 'a4'))['Solution']).toBe(
      '488 to 498 °C (910 to 930 °F)',
    );
  });

  test('they may not be joined, and it says why', () =>
    expect(loadsForPaper(BATCH_TABLES, [clad, thick], 'letter')?.apart).toEqual([
      'line 1 and line 2: clad sheet would soak longer than it may beside the thicker section',
    ]));

  test('what could share but was set apart is not forbidden to be joined', () => {
    const furnace = loadsForPaper(BATCH_TABLES, [line(1, sheet(6.3), 1), line(2, sheet(6.3), 2)], 'letter');
    expect(furnace?.loads.map(({ number, lines }) => [number, lines])).toEqual([
      [1, [1]],
      [2, [2]],
    ]);
    expect(furnace?.apart).toEqual([]);
  });

  test('where the lead set none, they are the planned ones', () => {
    const furnace = loadsForPaper(
      BATCH_TABLES,
      [line(1, sheet(0.8, { clad: true })), line(2, sheet(6.3))],
      'letter',
    );
    expect(furnace?.areSet).toBe(false);
    expect(furnace?.loads.map(({ number }) => number)).toEqual([1, 2]);
  });

  test('plating has none', () =>
    expect(loadsForPaper(BATCH_TABLES, [lineOf(1, {}, [{}])], 'letter')).toBeNull());
});

test('a sample is told where the order states its plan, and only there', () => {
  const lines = [
    lineOf(1, {}, [{ ordering: { sampling_plan: 'AQL 1.0, level II' } }], { pieces: 60 }),
    lineOf(2, {}, [{ ordering: { sampling_plan: 'by the specification' } }], { pieces: 60 }),
  ];
  expect(samplesForPaper(BATCH_TABLES, lines)).toMatchObject([
    { lineNo: 1, inspect: 13, pieces: 60, says: 'accept 0, reject 1' },
  ]);
});

test.each([true, false])('the sheet on the screen shows loads and samples (small: %s)', (small) => {
  const furnaceLoads = loadsForPaper(
    BATCH_TABLES,
    [line(1, sheet(0.8, { clad: true }), 1), line(2, sheet(6.3), 2)],
    'letter',
  );
  const samples = [{ lineNo: 1, inspect: 13, pieces: 60, says: 'accept 0, reject 1', plan: 'AQL 1' }];
  const { link: _, ...says } = sampleTraveller({ furnaceLoads, samples });
  const seen = renderToStaticMarkup(createElement(TravellerSheet, { says, small })).replace(/<[^>]*>/g, ' ');
  expect(seen).toMatch(/Load 1, line 1/);
  expect(seen).toContain('Governs: 6.3 mm, thickest section, line 2');
  expect(seen).toMatch(/may not be joined/);
  expect(seen).toContain('line 1: 13 of 60, accept 0, reject 1');
});
