import type { IncomingMessage } from 'node:http';

const LIMIT_BYTES = 1_000_000;

/** The whole body as text. The stand-ins only take small forms and small JSON this way. */
export async function readBody(request: IncomingMessage): Promise<string> {
  const chunks: Buffer[] = [];
  let bytes = 0;
  for await (const chunk of request as AsyncIterable<Buffer>) {
    bytes += chunk.length;
    if (bytes > LIMIT_BYTES) throw new Error('The body is larger than a stand-in takes.');
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString('utf8');
}
