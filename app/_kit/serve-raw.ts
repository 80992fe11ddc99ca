import type { Endpoint } from '@/lib/api/endpoint';

import { textOf } from './request-body';
import { serve } from './serve';

/**
 * For callers whose proof is a signature over the bytes they sent: hands the endpoint the body as it came and the
 * signature beside it, then everything is as in `serve`. Nobody else is served this way.
 */
export function serveRaw(endpoint: Endpoint, signatureHeader: string): ReturnType<typeof serve> {
  return serve(endpoint, async (request) => ({
    body: await textOf(request),
    signature: request.headers.get(signatureHeader),
  }));
}
