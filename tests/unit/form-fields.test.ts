import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import {
  checkbox,
  formValues,
  list,
  numberField,
  optionalNumberField,
  piecesField,
} from '@/components/ui/form-fields';

const fault = (schema: z.ZodType, value: unknown) => schema.safeParse(value).error?.issues[0]?.message;

describe('a number from a form', () => {
  const thickness = numberField({ name: 'Thickness' });
  test.each([
    ['0.063', 0.063],
    [' .063 ', 0.063],
    ['1,200', 1200],
    ['1,200.5', 1200.5],
    ['−3', -3],
    [41, 41],
    ['0', 0],
  ])('%o is read as %d', (typed, read) => expect(thickness.parse(typed)).toBe(read));

  test('nothing typed is missing, never 0', () =>
    expect(fault(thickness, '')).toBe('Thickness is missing. Enter a number.'));
  test.each(['0,063', 'abc', '1e3', '12 in', '1,2,3'])('%o is refused rather than guessed', (typed) =>
    expect(fault(thickness, typed)).toBe('Thickness is not a number. Write it like 0.063.'),
  );

  test('left empty where it may be, it is null', () => {
    expect(optionalNumberField({ name: 'Mass' }).parse('')).toBeNull();
    expect(optionalNumberField({ name: 'Mass' }).parse(undefined)).toBeNull();
    expect(optionalNumberField({ name: 'Mass' }).parse('0')).toBe(0);
  });

  test('pieces are whole and not negative', () => {
    expect(fault(piecesField(), '1.5')).toBe('Pieces are whole. Enter a number without a fraction.');
    expect(fault(piecesField('Good'), '-1')).toBe('Good cannot be below 0.');
  });
});

test.each([
  ['on', true],
  ['true', true],
  [true, true],
  ['false', false],
  ['', false],
  [undefined, false],
])('a tick sent as %o means %o', (sent, meant) => expect(checkbox.parse(sent)).toBe(meant));

test('a key that is there twice keeps both values', () => {
  const form = new FormData();
  form.append('covers', '1');
  form.append('covers', '2');
  form.append('note', 'rack on edge');
  expect(formValues(form)).toEqual({ covers: ['1', '2'], note: 'rack on edge' });
});

test.each([
  [undefined, []],
  [false, []],
  ['1', ['1']],
  [
    ['1', '2'],
    ['1', '2'],
  ],
])('%o is the list %o', (given, expected) => expect(list(z.string()).parse(given)).toEqual(expected));
