import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { afterAll, beforeAll, expect, test } from 'vitest';

import { clientAddress } from '@/app/_kit/client-address';
import { notePeers } from '@/app/_kit/note-peers';

const asked = (hops?: string) => new Headers(hops === undefined ? {} : { 'x-forwarded-for': hops });

test.each([
  ['no proxy: whom the socket speaks to', '203.0.113.9', 0, '203.0.113.9'],
  ['no proxy: what the client wrote before it counts for nothing', '10.1.1.1, 203.0.113.9', 0, '203.0.113.9'],
  ['one proxy', '203.0.113.9, 10.0.0.2', 1, '203.0.113.9'],
  ['one proxy and an invented entry', '1.2.3.4, 203.0.113.9, 10.0.0.2', 1, '203.0.113.9'],
  ['two proxies', '1.2.3.4, 203.0.113.9, 10.0.0.3, 10.0.0.2', 2, '203.0.113.9'],
  ['fewer entries than proxies: the farthest that is known', '10.0.0.2', 2, '10.0.0.2'],
  ['empty entries are no hops', ' , 203.0.113.9,, 10.0.0.2 ', 1, '203.0.113.9'],
])('%s', (_, hops, proxies, address) => {
  expect(clientAddress(asked(hops), proxies)).toBe(address);
});

test('where nobody said it, there is none', () => {
  expect(clientAddress(asked(), 0)).toBeNull();
  expect(clientAddress(asked(''), 1)).toBeNull();
});

test('unless the setting says otherwise, no proxy is trusted', () => {
  expect(clientAddress(asked('1.2.3.4, 203.0.113.9'))).toBe('203.0.113.9');
});

/** Answers with the header as a handler sees it. */
const server = createServer((request, response) => {
  response.end(String(request.headers['x-forwarded-for']));
});
beforeAll(async () => {
  notePeers();
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
});
afterAll(() => server.close());

test.each([
  [{}, '127.0.0.1'],
  [{ 'x-forwarded-for': '1.2.3.4' }, '1.2.3.4, 127.0.0.1'],
])('the socket has the last word: %o', async (headers: Record<string, string>, seen) => {
  const { port } = server.address() as AddressInfo;
  const answer = await fetch(`http://127.0.0.1:${String(port)}/`, { headers });
  expect(await answer.text()).toBe(seen);
});
