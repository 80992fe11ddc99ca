import { expect, test } from 'vitest';

import { jsonBodyOf, textOf } from '@/app/_kit/request-body';

const LIMIT = 1_000_000;
const CHUNK = 64_000;

/** A request whose body comes in chunks without end, and how many bytes of it were taken. */
function endless(headers: Record<string, string> = {}) {
  const seen = { bytes: 0, cancelled: false };
  const body = new ReadableStream<Uint8Array>(
    {
      pull(controller) {
        seen.bytes += CHUNK;
        controller.enqueue(new Uint8Array(CHUNK).fill(120));
      },
      cancel() {
        seen.cancelled = true;
      },
    },
    { highWaterMark: 0 },
  );
  const request = new Request('http://localhost/', {
    method: 'POST',
    headers,
    body,
    duplex: 'half',
  } as RequestInit);
  return { request, seen };
}

const posted = (body: string) => new Request('http://localhost/', { method: 'POST', body });

test('a body that says it is too large is refused before a byte of it is read', async () => {
  const { request, seen } = endless({ 'content-length': String(LIMIT + 1) });
  await expect(textOf(request)).rejects.toMatchObject({ code: 'too_large' });
  expect(seen.bytes).toBe(0);
});

test.each([[{}], [{ 'content-length': '10' }]])(
  'one that goes on beyond the limit is cut off there, whatever it said: %o',
  async (headers: Record<string, string>) => {
    const { request, seen } = endless(headers);
    await expect(textOf(request)).rejects.toMatchObject({ code: 'too_large' });
    expect(seen.cancelled).toBe(true);
    expect(seen.bytes).toBeLessThanOrEqual(LIMIT + CHUNK);
  },
);

test('bytes are counted, not letters, and the limit itself is allowed', async () => {
  expect(await textOf(posted('x'.repeat(LIMIT)))).toHaveLength(LIMIT);
  await expect(textOf(posted('µ'.repeat(LIMIT / 2 + 1)))).rejects.toMatchObject({ code: 'too_large' });
});

test('a letter of several bytes that is cut between two chunks stays whole', async () => {
  const bytes = new TextEncoder().encode('{"note":"30 µm"}');
  const body = new ReadableStream<Uint8Array>({
    start(controller) {
      for (const byte of bytes) controller.enqueue(new Uint8Array([byte]));
      controller.close();
    },
  });
  const request = new Request('http://localhost/', { method: 'POST', body, duplex: 'half' } as RequestInit);
  expect(await jsonBodyOf(request)).toEqual({ note: '30 µm' });
});

test('nothing at all is an empty input', async () => {
  expect(await jsonBodyOf(new Request('http://localhost/', { method: 'POST' }))).toEqual({});
});
