import { z } from 'zod';

import type { Declaration, Endpoint } from './endpoint';
import { Problem } from './shapes';

/** The OpenAPI 3.1 document of all endpoints. Its schemas are JSON Schema 2020-12, made from the same zod objects that validate. */
export function openApiOf(endpoints: readonly Endpoint[], serverUrl: string): object {
  const paths: Record<string, Record<string, object>> = {};
  for (const { declaration } of endpoints)
    (paths[declaration.path] ??= {})[declaration.method] = operationOf(declaration);
  return {
    openapi: '3.1.0',
    info: {
      title: 'Lotwright',
      version: '1',
      description:
        'Every read and write of the product. Errors are RFC 9457 problems; writes may carry an Idempotency-Key.',
    },
    servers: [{ url: `${serverUrl}/api` }],
    components: {
      securitySchemes: {
        token: { type: 'http', scheme: 'bearer' },
        session: { type: 'apiKey', in: 'cookie', name: 'authjs.session-token' },
      },
      schemas: { Problem: schemaOf(Problem, 'output') },
    },
    security: [{ token: [] }, { session: [] }],
    paths,
  };
}

function operationOf(declaration: Declaration): object {
  const schema = schemaOf(declaration.input, 'input') as {
    properties?: Record<string, object>;
    required?: string[];
  };
  const inPath = [...declaration.path.matchAll(/\{(\w+)\}/g)].map((match) => match[1] ?? '');
  const rest = Object.entries(schema.properties ?? {}).filter(([name]) => !inPath.includes(name));
  const required = schema.required ?? [];
  const isRead = declaration.method === 'get';
  return {
    operationId: declaration.id,
    summary: declaration.summary,
    tags: [declaration.path.split('/')[1] ?? ''],
    'x-permission': declaration.permission,
    ...(declaration.side === 'public' ? { security: [] } : {}),
    parameters: [
      ...inPath.map((name) => ({
        name,
        in: 'path',
        required: true,
        schema: schema.properties?.[name] ?? { type: 'string' },
      })),
      ...(isRead
        ? rest.map(([name, property]) => ({
            name,
            in: 'query',
            required: required.includes(name),
            schema: property,
          }))
        : [
            {
              name: 'Idempotency-Key',
              in: 'header',
              required: false,
              schema: { type: 'string', maxLength: 200 },
            },
          ]),
    ],
    ...(isRead || rest.length === 0
      ? {}
      : {
          requestBody: {
            required: true,
            content: {
              'application/json': {
                schema: {
                  type: 'object',
                  properties: Object.fromEntries(rest),
                  required: required.filter((name) => !inPath.includes(name)),
                },
              },
            },
          },
        }),
    responses: {
      200: {
        description: 'Done',
        content: { 'application/json': { schema: schemaOf(declaration.response, 'output') } },
      },
      default: {
        description: 'Refused',
        content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
      },
    },
  };
}

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): object =>
  z.toJSONSchema(schema, { io, unrepresentable: 'any', target: 'draft-2020-12' });
