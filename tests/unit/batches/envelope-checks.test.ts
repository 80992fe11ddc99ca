import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';

import { EquipmentTable } from '@/components/processors/equipment-section';
import type { CheckedEquipment } from '@/lib/batches/check';
import { checkBatch } from '@/lib/batches/checks';
import { canOverride } from '@/lib/batches/finding';
import { readTemperature } from '@/lib/equipment/read-temperature';

import { factsOf, lineOf, type PartChange } from './facts-of-batch';

const IN = 25.4;
const FURNACE: CheckedEquipment = {
  id: 'f-3',
  kind: 'furnace',
  name: 'F-3',
  lengthMm: 48 * IN,
  widthMm: 24 * IN,
  heightMm: 24 * IN,
  sizeWords: '48 in × 24 in × 24 in',
  limitG: 270_000,
  limitWords: '270 kg',
  temperatureCMin: 150,
  temperatureCMax: 565,
  temperatureWords: '150 °C to 565 °C',
  furnaceClass: 2,
};
const TANK: CheckedEquipment = { ...FURNACE, id: 'q-3', kind: 'tank', name: 'Q-3', limitG: null };

const SOLUTION = {
  process: 'solution_heat_treat_and_age',
  specification: 'AMS 2770',
  conditionBefore: 'O',
  targetCondition: 'T42',
} as const;
const sheet = (lengthIn: number, widthIn: number, more: PartChange = {}): PartChange => ({
  ...{ alloy: '2024', madeCondition: 'O', endCondition: 'T42', thicknessMm: 1.6, thickness: '1.6 mm' },
  ...{ lengthMm: lengthIn * IN, widthMm: widthIn * IN, heightMm: 2 * IN },
  ...more,
});

const found = (parts: readonly PartChange[], equipment: readonly CheckedEquipment[], pieces = 1) =>
  checkBatch(
    factsOf(
      parts.map((part, at) => lineOf(at + 1, part, [SOLUTION], { pieces })),
      { processor: { equipment } },
    ),
  ).findings.filter(({ code }) => /part_(?:fits|lies|size)|load_over|furnace_/.test(code));
const codes = (...of: Parameters<typeof found>) => found(...of).map(({ level, code }) => [level, code]);

describe('room for a part', () => {
  test.each([
    ['lies straight', 40, 20, []],
    ['lies diagonally', 50, 4, [['note', 'part_lies_diagonally']]],
    ['is stood on its side to lie straight', 20, 30, []],
    ['fits nowhere', 70, 4, [['stop', 'part_fits_nowhere']]],
  ])('a part that %s', (_, length, width, expected) =>
    expect(codes([sheet(length, width)], [FURNACE])).toEqual(expected),
  );

  test('a refusal names both sizes and the reason, and an admin may let it pass', () => {
    const [stop] = found([sheet(70, 4, { sizeWords: '70 in × 4 in × 2 in' })], [FURNACE]);
    expect(stop?.sentence).toBe('Line 1 fits no furnace of Ostrow.');
    expect(stop?.rest).toContain('It is 70 in × 4 in × 2 in; F-3 takes 48 in × 24 in × 24 in');
    expect(stop?.rest).toMatch(/too large in plan, also diagonally/);
    expect(stop && canOverride(stop)).toBe(true);
  });

  test('one that is large enough among several is enough; each kind that it needs counts', () => {
    const large = { ...FURNACE, id: 'f-9', name: 'F-9', lengthMm: 120 * IN };
    expect(codes([sheet(70, 4)], [FURNACE, large])).toEqual([]);
    expect(codes([sheet(70, 4)], [large, TANK])).toEqual([['stop', 'part_fits_nowhere']]);
  });

  test('a part without a size is only noted; a flat one is as high as it is thick', () => {
    expect(codes([sheet(40, 20, { lengthMm: null })], [FURNACE])).toEqual([['note', 'part_size_not_stated']]);
    expect(codes([sheet(40, 20, { heightMm: null })], [FURNACE])).toEqual([]);
  });

  test('nothing is said where nobody entered equipment, or none of the kind', () => {
    expect(codes([sheet(700, 400)], [])).toEqual([]);
    expect(codes([sheet(700, 400)], [{ ...FURNACE, kind: 'oven' }])).toEqual([]);
  });
});

describe('a load', () => {
  test('over what every hearth carries is warned of, in the unit of the hearth', () => {
    expect(codes([sheet(40, 20, { massG: 1000 })], [FURNACE], 271)).toEqual([['warn', 'load_over_hearth']]);
    expect(codes([sheet(40, 20, { massG: 1000 })], [FURNACE], 270)).toEqual([]);
    const entered = { ...FURNACE, limitWords: '595 lb' };
    const [said] = found([sheet(40, 20, { massG: 1000 })], [entered], 271);
    expect(said?.rest).toContain('597 lb; F-3 carries 595 lb.');
    const unknown = { ...FURNACE, id: 'f-4', limitG: null };
    expect(codes([sheet(40, 20, { massG: 1000 })], [FURNACE, unknown], 271)).toEqual([]);
  });

  test('that no furnace gets hot enough for, and a furnace too uneven for aluminium, are warned of', () => {
    expect(codes([sheet(40, 20)], [{ ...FURNACE, temperatureCMax: 400 }])).toEqual([
      ['warn', 'no_furnace_for_temperature'],
    ]);
    expect(codes([sheet(40, 20)], [{ ...FURNACE, furnaceClass: 5 }])).toEqual([
      ['warn', 'furnace_class_too_loose'],
    ]);
    const unknown = { temperatureCMin: null, temperatureCMax: null, furnaceClass: null };
    expect(codes([sheet(40, 20)], [{ ...FURNACE, ...unknown }])).toEqual([]);
  });
});

test.each([
  ['1000 °F', 537.7778],
  ['540 C', 540],
  ['32°F', 0],
])('%s is %f °C', (typed, celsius) =>
  expect(readTemperature(typed, 'It')).toMatchObject({ ok: true, celsius }),
);

test.each(['1000', 'hot', '9000 °F', ''])('%s is no temperature', (typed) =>
  expect(readTemperature(typed, 'It').ok).toBe(false),
);

test('the list shows what was typed', () => {
  const typed = (entered: string) => ({ entered, value: 1 });
  const seen = renderToStaticMarkup(
    createElement(EquipmentTable, {
      actions: null,
      equipment: [
        {
          ...{ id: 'f-3', kind: 'furnace', name: 'F-3', furnaceClass: 2, version: 1, limit: typed('600 lb') },
          ...{ length: typed('120 in'), width: typed('44 in'), height: typed('40 in') },
          ...{ temperatureMin: null, temperatureMax: typed('1050 °F') },
        },
      ],
    }),
  ).replace(/<[^>]*>/g, ' ');
  expect(seen).toContain('120 in × 44 in × 40 in');
  expect(seen).toContain('up to 1050 °F');
});
