/// <reference types="vite/client" />
import { expect, test } from 'vitest';

import { ALL_ENDPOINTS } from '@/lib/api/all-endpoints';
import type { Endpoint } from '@/lib/api/endpoint';
import { PERMISSIONS } from '@/lib/auth/permissions';

import { filesBelow, textOf } from './sources';

/** Every endpoint by the name that a route imports. */
const byName = new Map(
  Object.values(import.meta.glob<Record<string, Endpoint>>('/lib/**/*endpoints.ts', { eager: true })).flatMap(
    (module) => Object.entries(module),
  ),
);

/** Routes that are not a read or write of ours: the sign-in library's own, and what a machine asks of a machine. */
const NOT_ENDPOINTS: readonly string[] = [
  'app/api/auth/[...nextauth]/route.ts',
  'app/api/health/route.ts',
  'app/api/ready/route.ts',
  'app/api/openapi.json/route.ts',
  'app/api/dev/bare/route.ts',
];

const routeFiles = filesBelow('app/api', /route\.ts$/);
const served = routeFiles.filter((file) => !NOT_ENDPOINTS.includes(file)).flatMap(routesOf);

interface Route {
  file: string;
  method: string;
  path: string;
  endpoint: string;
}

function routesOf(file: string): Route[] {
  const path = file
    .replace(/^app\/api/, '')
    .replace(/\/route\.ts$/, '')
    .replaceAll('[', '{')
    .replaceAll(']', '}');
  return [
    ...textOf(file).matchAll(
      /export const (GET|POST|PUT|PATCH|DELETE)(?:: \w+)? = serve(?:Raw)?\((\w+)[,)]/g,
    ),
  ].map((match) => ({ file, method: (match[1] ?? '').toLowerCase(), path, endpoint: match[2] ?? '' }));
}

test('every endpoint has its route, and every route is one endpoint', () => {
  const declared = ALL_ENDPOINTS.map(({ declaration }) => `${declaration.method} ${declaration.path}`).sort();
  expect(served.map(({ method, path }) => `${method} ${path}`).sort()).toEqual(declared);
});

test('a route serves the endpoint that declares its path', () => {
  const wrong = served.filter(({ method, path, endpoint }) => {
    const declared = byName.get(endpoint)?.declaration;
    return declared?.method !== method || declared.path !== path;
  });
  expect(wrong).toEqual([]);
});

test('a route file does nothing but serve', () => {
  const more = routeFiles
    .filter((file) => !NOT_ENDPOINTS.includes(file))
    .filter((file) => {
      const rest = textOf(file)
        .replaceAll(/import [^;]+;/g, '')
        .replaceAll(
          /export const (GET|POST|PUT|PATCH|DELETE)(: \w+)? = serve(Raw)?\(\w+(, '[\w-]+')?\);?/g,
          '',
        )
        .replaceAll(/\/\*\*[\s\S]*?\*\/|\/\/.*/g, '')
        .replaceAll(/export const (dynamic|runtime|maxDuration) = [^;]+;/g, '');
      return rest.trim() !== '';
    });
  expect(more).toEqual([]);
});

test('operations have names, summaries and permissions of their own', () => {
  const ids = ALL_ENDPOINTS.map(({ declaration }) => declaration.id);
  expect(new Set(ids).size).toBe(ids.length);
  const poor = ALL_ENDPOINTS.filter(
    ({ declaration }) => declaration.summary.length < 10 || !(declaration.permission in PERMISSIONS),
  ).map(({ declaration }) => declaration.id);
  expect(poor).toEqual([]);
});

test('every parameter of a path is part of what goes in', () => {
  const missing = ALL_ENDPOINTS.flatMap(({ declaration }) =>
    [...declaration.path.matchAll(/\{(\w+)\}/g)]
      .map((match) => match[1] ?? '')
      .filter((name) => !(name in declaration.input.shape))
      .map((name) => `${declaration.id}: ${name}`),
  );
  expect(missing).toEqual([]);
});

test('what is named for everyone is only what somebody without an account needs', () => {
  const open = ALL_ENDPOINTS.filter(
    ({ declaration }) => PERMISSIONS[declaration.permission] === 'everyone',
  ).map(({ declaration }) => declaration.side);
  expect(new Set(open)).toEqual(new Set(['public']));
});

test('lists page by key: nothing asks for an offset', () => {
  const offsets = filesBelow('lib').filter((file) => /\.offset\(|\boffset \$\{/.test(textOf(file)));
  expect(offsets).toEqual([]);
});
