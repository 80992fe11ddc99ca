import { z } from 'zod';

import type { Declaration } from './endpoint';

export interface ReadableField {
  name: string;
  /** `string`, `integer`, `one of lead, office`, `list of string`. */
  kind: string;
  required: boolean;
  /** Limits and form, in short. */
  limits: string;
}

export interface ReadableOperation {
  id: string;
  method: string;
  path: string;
  summary: string;
  side: string;
  permission: string;
  tag: string;
  input: ReadableField[];
  output: ReadableField[];
}

/** An operation as a person reads it, from the same schemas that validate. */
export function readableOperation(declaration: Declaration): ReadableOperation {
  const { id, method, path, summary, side, permission } = declaration;
  return {
    id,
    method: method.toUpperCase(),
    path: `/api${path}`,
    summary,
    side,
    permission,
    tag: path.split('/')[1] ?? '',
    input: fieldsOf(schemaOf(declaration.input, 'input')),
    output: fieldsOf(schemaOf(declaration.response, 'output')),
  };
}

interface Schema {
  type?: string;
  format?: string;
  description?: string;
  properties?: Record<string, Schema>;
  required?: string[];
  items?: Schema;
  enum?: unknown[];
  const?: unknown;
  anyOf?: Schema[];
  oneOf?: Schema[];
  minimum?: number;
  maximum?: number;
  minLength?: number;
  maxLength?: number;
  minItems?: number;
  maxItems?: number;
  default?: unknown;
}

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): Schema =>
  z.toJSONSchema(schema, { io, unrepresentable: 'any', target: 'draft-2020-12' }) as Schema;

const DEEPEST = 3;

/** Flat, with dots: a table is easier to look something up in than a tree. */
function fieldsOf(schema: Schema, prefix = '', depth = 0): ReadableField[] {
  const { properties = {}, required = [] } = schema;
  return Object.entries(properties).flatMap(([name, property]) => {
    const inner = property.type === 'array' ? (property.items ?? {}) : property;
    const own: ReadableField = {
      name: prefix + name,
      kind: kindOf(property),
      required: required.includes(name),
      limits: limitsOf(property),
    };
    if (depth >= DEEPEST || !inner.properties) return [own];
    return [own, ...fieldsOf(inner, `${prefix}${name}${property.type === 'array' ? '[]' : ''}.`, depth + 1)];
  });
}

function kindOf(schema: Schema): string {
  if (schema.enum) return `one of ${schema.enum.map(String).join(', ')}`;
  if (schema.const !== undefined) return String(schema.const);
  const choices = schema.anyOf ?? schema.oneOf;
  if (choices) return [...new Set(choices.map(kindOf))].join(' or ');
  if (schema.type === 'array') return `list of ${kindOf(schema.items ?? {})}`;
  if (schema.format !== undefined) return schema.format;
  return schema.type ?? schema.description ?? 'anything';
}

function limitsOf(schema: Schema): string {
  const says: string[] = [];
  const range = (least: number | undefined, most: number | undefined, what: string) => {
    const isLimit = (limit: number | undefined) =>
      limit !== undefined && Math.abs(limit) < Number.MAX_SAFE_INTEGER;
    if (isLimit(least)) says.push(`at least ${least}${what}`);
    if (isLimit(most)) says.push(`at most ${most}${what}`);
  };
  range(schema.minimum, schema.maximum, '');
  range(schema.minLength, schema.maxLength, ' characters');
  range(schema.minItems, schema.maxItems, ' entries');
  if (schema.default !== undefined) says.push(`left out: ${JSON.stringify(schema.default)}`);
  return says.join(', ');
}
