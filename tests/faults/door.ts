import { createServer, type IncomingMessage } from 'node:http';
import { buffer } from 'node:stream/consumers';

import { serve } from '@/app/_kit/serve';
import { serveRaw } from '@/app/_kit/serve-raw';
import { ALL_ENDPOINTS } from '@/lib/api/all-endpoints';
import type { Endpoint } from '@/lib/api/endpoint';
import { receivePaymentEventEndpoint } from '@/lib/payments/endpoints';

import { whenTold } from './when-told';

/**
 * The application's door in a process of its own that may be killed at any moment: the same handlers as the web
 * server's routes, without the pages around them, so that it is up in a second.
 */
const routes = ALL_ENDPOINTS.map((endpoint) => ({
  method: endpoint.declaration.method.toUpperCase(),
  pattern: new RegExp(`^/api${endpoint.declaration.path.replace(/\{(\w+)\}/g, '(?<$1>[^/]+)')}$`),
  handle: isWebhook(endpoint) ? serveRaw(endpoint, 'stripe-signature') : serve(endpoint),
}));

const server = createServer((incoming, outgoing) => {
  void answer(incoming).then(async (response) => {
    outgoing.writeHead(response.status, Object.fromEntries(response.headers));
    outgoing.end(Buffer.from(await response.arrayBuffer()));
  });
});

function isWebhook(endpoint: Endpoint): boolean {
  return endpoint.declaration.id === receivePaymentEventEndpoint.declaration.id;
}

async function answer(incoming: IncomingMessage): Promise<Response> {
  const url = new URL(incoming.url ?? '/', `http://${incoming.headers.host ?? 'localhost'}`);
  if (url.pathname === '/api/health') return Response.json({ live: true });
  for (const { method, pattern, handle } of routes) {
    const found = pattern.exec(url.pathname);
    if (!found || method !== incoming.method) continue;
    const body = method === 'GET' ? undefined : new Uint8Array(await buffer(incoming));
    const headers = Object.entries(incoming.headers).flatMap(([name, value]): [string, string][] =>
      value === undefined ? [] : [[name, [value].flat().join(', ')]],
    );
    return handle(new Request(url, { method, headers, ...(body === undefined ? {} : { body }) }), {
      params: Promise.resolve({ ...found.groups }),
    });
  }
  return Response.json({ title: 'no such route' }, { status: 404 });
}

whenTold(() => void server.listen(Number(process.argv[2]), '127.0.0.1'));
