import { expect, test } from 'vitest';

import { safeNext } from '@/lib/people/safe-next';

test.each([
  '/',
  '/batches',
  '/batches?stage=held&after=1',
  '/batches/0198#history',
  '/b/some-token',
  '/settings/account',
])('%s is a place of ours', (next) => {
  expect(safeNext(next)).toBe(next);
});

test.each([
  null,
  undefined,
  '',
  'batches',
  'https://elsewhere.test/',
  '//elsewhere.test/',
  '/\\elsewhere.test',
  '/\t/elsewhere.test',
  '/%0d\n/elsewhere.test',
  '\\\\elsewhere.test',
  'javascript:alert(1)',
  '/x\\..\\y',
])('%j goes to the first page instead', (next) => {
  expect(safeNext(next)).toBe('/');
});

test.each(['/sign-in', '/sign-in/link', '/api/batches', '/reset/abc', '/sign-in-link/abc', '/x/../sign-in'])(
  '%s would go round in a circle, or is no page',
  (next) => {
    expect(safeNext(next)).toBe('/');
  },
);
