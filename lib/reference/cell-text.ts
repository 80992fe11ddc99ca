import type { Shape } from './row-columns';

/** What divides items of one cell, and the two ends of a range. */
const ITEMS = '; ';
const ENDS = ' to ';

/** A value as it stands in one cell: `860 to 930`, `2014; 2024`, `yes`, `2219 = 900`. */
export function cellText(value: unknown, shapes: readonly Shape[]): string {
  if (value === undefined || value === null) return '';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (Array.isArray(value)) return listText(value, shapes);
  if (typeof value === 'object') {
    const { additionalProperties: each } = shapes.find(isRecord) ?? {};
    return Object.entries(value)
      .map(([key, one]) => `${key} = ${cellText(one, typeof each === 'object' ? [each] : [])}`)
      .join(ITEMS);
  }
  return String(value as string | number);
}

function listText(value: readonly unknown[], shapes: readonly Shape[]): string {
  const ends = shapes.find(({ prefixItems }) => prefixItems?.length === value.length)?.prefixItems;
  if (ends) {
    const [first, ...others] = value.map((one, at) => cellText(one, [ends[at] ?? {}]));
    return others.every((one) => one === first) ? (first ?? '') : [first, ...others].join(ENDS);
  }
  const { items } = shapes.find(isList) ?? {};
  return value.map((one) => cellText(one, items ? [items] : [])).join(ITEMS);
}

type Read = { readonly ok: true; readonly value: unknown } | { readonly ok: false; readonly message: string };

/** The value of a cell that is not empty. What it may be is tried in turn; the message says what would be right. */
export function readCell(text: string, shapes: readonly Shape[]): Read {
  for (const shape of shapes) {
    const value = valueIn(text, shape);
    if (value !== undefined) return { ok: true, value };
  }
  const right = [...new Set(shapes.map(whatIsRight))].join(', or ');
  const { items: each } = shapes.find(isList) ?? {};
  const wrong = each ? itemsOf(text).find((one) => valueIn(one, each) === undefined) : text;
  return { ok: false, message: `${(wrong ?? text).slice(0, 60)} is not what stands here. Enter ${right}.` };
}

function valueIn(text: string, shape: Shape): unknown {
  const {
    const: constant,
    enum: choices = constant === undefined ? undefined : [constant],
    prefixItems,
  } = shape;
  if (shape.type === 'boolean') return yesOrNo(text, choices);
  if (choices) return choices.find((one) => String(one).toLowerCase() === text.toLowerCase());
  if (shape.type === 'number' || shape.type === 'integer') return numberIn(text, shape);
  if (shape.type === 'string') return text;
  if (prefixItems) {
    const parts = text.split(/\s+to\s+/i);
    const whole = parts.length === 1 ? prefixItems.map(() => text) : parts;
    return allOf(
      prefixItems.map((end, at) => valueIn(whole[at] ?? '', end)),
      whole.length === prefixItems.length,
    );
  }
  if (isList(shape) && shape.items) {
    const each = shape.items;
    const found = itemsOf(text).map((one) => valueIn(one, each));
    return allOf(found, found.length <= (shape.maxItems ?? Infinity));
  }
  return isRecord(shape) ? recordIn(text, shape) : undefined;
}

const isList = ({ type, prefixItems }: Shape): boolean => type === 'array' && prefixItems === undefined;
const isRecord = ({ type, properties }: Shape): boolean => type === 'object' && properties === undefined;
const itemsOf = (text: string): string[] =>
  text
    .split(';')
    .map((one) => one.trim())
    .filter(Boolean);
const allOf = (values: readonly unknown[], isRight: boolean): unknown =>
  isRight && !values.includes(undefined) ? values : undefined;

function yesOrNo(text: string, choices: readonly unknown[] = [true, false]): boolean | undefined {
  const said = /^(?:yes|true)$/i.test(text) || (/^(?:no|false)$/i.test(text) ? false : undefined);
  return choices.includes(said) ? said : undefined;
}

function numberIn(
  text: string,
  { type, minimum = -Infinity, maximum = Infinity }: Shape,
): number | undefined {
  if (!/^[-+]?(?:\d+(?:\.\d*)?|\.\d+)$/.test(text)) return undefined;
  const value = Number(text);
  const isWhole = type !== 'integer' || Number.isSafeInteger(value);
  return isWhole && value >= minimum && value <= maximum ? value : undefined;
}

function recordIn(text: string, { additionalProperties: each, propertyNames: names }: Shape): unknown {
  if (typeof each !== 'object') return undefined;
  const pairs = itemsOf(text).map((one) => {
    const [, key = '', rest = ''] = /^(.*?)\s*=\s*(.*)$/.exec(one) ?? [];
    const name = names?.enum ? names.enum.find((known) => known === key) : key;
    const value = valueIn(rest, each);
    return name === undefined || key === '' || value === undefined ? undefined : ([key, value] as const);
  });
  return pairs.some((pair) => pair === undefined)
    ? undefined
    : Object.fromEntries(pairs.filter((pair) => pair !== undefined));
}

/** What may stand in a cell, in words: `a figure from 0 to 12 in`, `one of air, salt`. */
export function whatIsRight(shape: Shape): string {
  const { type, const: constant, enum: choices, minimum = 0, maximum, unit, prefixItems, items } = shape;
  if (type === 'boolean') return constant === true ? 'yes, or nothing' : 'yes or no';
  if (constant !== undefined) return String(constant as string);
  if (choices) return choices.length === 1 ? String(choices[0]) : `one of ${choices.join(', ')}`;
  if (type === 'number' || type === 'integer') {
    const span = maximum === undefined ? `from ${minimum}` : `from ${minimum} to ${maximum}`;
    return `a ${type === 'integer' ? 'whole number' : 'figure'} ${span}${unit ? ` ${unit}` : ''}`;
  }
  if (prefixItems) {
    const [first, second = first] = prefixItems.map(whatIsRight);
    return first === second ? `${first}, or two with “to” between them` : `${first} “to” ${second}`;
  }
  if (isList(shape) && items) return `${whatIsRight(items)}; divided by semicolons where there are more`;
  if (isRecord(shape)) {
    const { propertyNames: names, additionalProperties: each } = shape;
    const right = typeof each === 'object' ? whatIsRight(each) : '';
    return `“name = value” with ${right}; divided by semicolons${names?.enum ? ` (names: ${names.enum.join(', ')})` : ''}`;
  }
  return 'words';
}
