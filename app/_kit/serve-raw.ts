import type { Endpoint } from '@/lib/api/endpoint';

import { serve } from './serve';

/**
 * For callers whose proof is a signature over the bytes they sent: hands the endpoint the body as it came and the
 * signature beside it, then everything is as in `serve`. Nobody else is served this way.
 */
export function serveRaw(endpoint: Endpoint, signatureHeader: string): ReturnType<typeof serve> {
  const answer = serve(endpoint);
  return async (request, route) => {
    const headers = new Headers(request.headers);
    // The length was that of the raw body.
    headers.delete('content-length');
    const body = JSON.stringify({ body: await request.text(), signature: headers.get(signatureHeader) });
    return answer(new Request(request.url, { method: request.method, headers, body }), route);
  };
}
