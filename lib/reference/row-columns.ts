import { z } from 'zod';

/** Of a row's schema what its columns in a file follow from: JSON schema, with the unit of a figure beside it. */
export interface Shape {
  readonly type?: string | readonly string[];
  readonly const?: unknown;
  readonly enum?: readonly unknown[];
  readonly anyOf?: readonly Shape[];
  readonly oneOf?: readonly Shape[];
  readonly properties?: Readonly<Record<string, Shape>>;
  readonly required?: readonly string[];
  readonly prefixItems?: readonly Shape[];
  readonly items?: Shape | false;
  readonly maxItems?: number;
  readonly additionalProperties?: Shape | boolean;
  readonly propertyNames?: Shape;
  readonly minimum?: number;
  readonly maximum?: number;
  /** As printed: `in`, `°F`, `ksi`. */
  readonly unit?: string;
}

/** One column of a table in a spreadsheet: where its cells stand in a row, and what may stand in them. */
export interface Column {
  readonly head: string;
  readonly path: readonly (string | number)[];
  /** Any of these may stand in a cell. */
  readonly shapes: readonly Shape[];
  /** What an empty cell means. */
  readonly empty: 'left_out' | 'null' | 'no_items';
}

/** The columns of a table whose rows are of this schema, in the order of its fields. */
export function columnsOf(row: z.ZodType): Column[] {
  return columnsAt([z.toJSONSchema(row) as Shape], [], false);
}

function columnsAt(shapes: readonly Shape[], path: Column['path'], isRequired: boolean): Column[] {
  const all = shapes.flatMap(alternatives);
  const objects = all.filter(({ properties }) => properties !== undefined);
  const lists = all.filter((shape) => isListOfObjects(shape));
  const cells = all.filter((shape) => !objects.includes(shape) && !lists.includes(shape) && !isNull(shape));
  return [
    ...(cells.length > 0
      ? [{ head: headOf(path, cells), path, shapes: cells, empty: emptyOf(all, isRequired) }]
      : []),
    ...namesOf(objects).flatMap((name) =>
      columnsAt(
        objects.flatMap(({ properties }) => properties?.[name] ?? []),
        [...path, name],
        // Where rows are of several kinds, what is empty does not belong to this kind.
        objects.length === 1 && (objects[0]?.required ?? []).includes(name),
      ),
    ),
    ...lists.flatMap(({ items, maxItems = 1 }) =>
      Array.from({ length: maxItems }, (_, at) =>
        columnsAt(items ? [items] : [], [...path, at], false),
      ).flat(),
    ),
  ];
}

function alternatives(shape: Shape): Shape[] {
  const { type } = shape;
  if (shape.anyOf ?? shape.oneOf) return (shape.anyOf ?? shape.oneOf ?? []).flatMap(alternatives);
  if (typeof type === 'object') return type.map((one) => ({ ...shape, type: one }));
  return [shape];
}

const isNull = ({ type }: Shape): boolean => type === 'null';
const isListOfObjects = ({ items }: Shape): boolean =>
  typeof items === 'object' && alternatives(items).some(({ properties }) => properties !== undefined);

const namesOf = (objects: readonly Shape[]): string[] => [
  ...new Set(objects.flatMap(({ properties }) => Object.keys(properties ?? {}))),
];

function emptyOf(all: readonly Shape[], isRequired: boolean): Column['empty'] {
  if (!isRequired) return 'left_out';
  if (all.some(isNull)) return 'null';
  return all.every(({ type, prefixItems }) => type === 'array' && !prefixItems) ? 'no_items' : 'left_out';
}

/** The last word of a field's name where it is its unit. */
const UNIT_WORDS: Readonly<Record<string, string>> = {
  ...{ '°F': 'f', '°C': 'c', in: 'in', min: 'min', s: 's' },
  ...{ ksi: 'ksi', MPa: 'mpa', HRC: 'hrc', '%': 'percent', '% IACS': 'iacs' },
};

/** `lateAboveF` in °F is `late above (°F)`; the second step's `setF` is `steps 2 set (°F)`. */
function headOf(path: Column['path'], shapes: readonly Shape[]): string {
  const words = path.flatMap((part) =>
    typeof part === 'number'
      ? [String(part + 1)]
      : part.split(/(?<=[a-z])(?=[A-Z0-9])|(?<=[A-Z])(?=[A-Z][a-z])/).map((word) => word.toLowerCase()),
  );
  const [unit] = shapes.flatMap(unitOf);
  if (unit === undefined) return words.join(' ');
  const named = words.at(-1) === UNIT_WORDS[unit] && words.length > 1 ? words.slice(0, -1) : words;
  return `${named.join(' ')} (${unit})`;
}

function unitOf({ unit, prefixItems, items, additionalProperties }: Shape): string[] {
  if (unit !== undefined) return [unit];
  const inside = [prefixItems?.[0], items, additionalProperties].find((one) => typeof one === 'object');
  return inside ? unitOf(inside) : [];
}
