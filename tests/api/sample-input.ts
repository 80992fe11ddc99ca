import { randomUUID } from 'node:crypto';
import { z } from 'zod';

import type { Declaration } from '@/lib/api/endpoint';

interface Schema {
  type?: string;
  format?: string;
  properties?: Record<string, Schema>;
  required?: string[];
  items?: Schema;
  enum?: unknown[];
  const?: unknown;
  anyOf?: Schema[];
  oneOf?: Schema[];
  allOf?: Schema[];
  minimum?: number;
  minLength?: number;
  minItems?: number;
  pattern?: string;
}

/**
 * Something that goes in, made from the endpoint's own schema: enough to come past validation, so that a walk over all
 * endpoints reaches what each of them does.
 *
 * @param known values by the name of their field: ids of things that exist.
 */
export function sampleInput(
  declaration: Declaration,
  known: Readonly<Record<string, unknown>>,
): Record<string, unknown> {
  const schema = z.toJSONSchema(declaration.input, {
    io: 'input',
    unrepresentable: 'any',
    target: 'draft-2020-12',
  }) as Schema;
  const sample = sampleOf(schema, '', known) as Record<string, unknown>;
  const inPath = [...declaration.path.matchAll(/\{(\w+)\}/g)].map((match) => match[1] ?? '');
  return {
    ...sample,
    ...Object.fromEntries(inPath.map((name) => [name, known[name] ?? sample[name] ?? randomUUID()])),
  };
}

function sampleOf(schema: Schema, name: string, known: Readonly<Record<string, unknown>>): unknown {
  if (name in known) return known[name];
  if (schema.const !== undefined) return schema.const;
  if (schema.enum) return schema.enum[0];
  const [choice] = schema.anyOf ?? schema.oneOf ?? schema.allOf ?? [];
  if (choice) return sampleOf(choice, name, known);
  switch (schema.type) {
    case 'object':
      return Object.fromEntries(
        (schema.required ?? []).map((field) => [
          field,
          sampleOf(schema.properties?.[field] ?? {}, field, known),
        ]),
      );
    case 'array':
      return Array.from({ length: schema.minItems ?? 0 }, () =>
        sampleOf(schema.items ?? {}, name.replace(/s$/, ''), known),
      );
    case 'integer':
    case 'number':
      return Math.max(schema.minimum ?? 1, 1);
    case 'boolean':
      return true;
    case 'null':
      return null;
    default:
      return textOf(schema, name);
  }
}

function textOf({ format, minLength, pattern }: Schema, name: string): string {
  if (format === 'uuid') return randomUUID();
  if (format === 'email' || /email/i.test(name)) return `walk-${randomUUID()}@walk.test`;
  if (format === 'date' || /On$|^(from|to|validFrom|validTo)$/.test(name)) return '2026-06-20';
  if (format === 'date-time') return '2026-06-20T12:00:00Z';
  if (format === 'uri') return 'https://walk.test/';
  if (/^token$/.test(name)) return 'a-token-that-nobody-ever-made';
  if (/sha256/i.test(name) || pattern?.includes('64')) return 'a'.repeat(64);
  if (/zone/.test(name)) return 'UTC';
  if (/mediaType/.test(name)) return 'application/pdf';
  return 'walked'.padEnd(minLength ?? 0, 'x');
}
