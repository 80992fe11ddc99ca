import { NextResponse, type NextRequest } from 'next/server';

import { env } from '@/lib/env';

/**
 * Sets the security headers with a fresh nonce. Not the permission check: that is in `serve` and in the database.
 * Storage is reached directly by uploads, so its origin may be connected to; nothing from it is ever shown as a page.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.randomUUID()).toString('base64');
  const policy = request.nextUrl.pathname.startsWith('/api/') ? policyOfAnswer(request) : policyOfPage(nonce);
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('x-path', request.nextUrl.pathname + request.nextUrl.search);
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  response.headers.set('x-content-type-options', 'nosniff');
  response.headers.set('referrer-policy', 'same-origin');
  response.headers.set('permissions-policy', 'camera=(self), microphone=(), geolocation=()');
  response.headers.set('cross-origin-opener-policy', 'same-origin');
  response.headers.set('strict-transport-security', 'max-age=31536000');
  return response;
}

function policyOfPage(nonce: string): string {
  const dev = env.NODE_ENV === 'development';
  return [
    `default-src 'self'`,
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${dev ? ` 'unsafe-eval'` : ''}`,
    dev ? `style-src 'self' 'unsafe-inline'` : `style-src 'self' 'nonce-${nonce}'`,
    `style-src-attr 'unsafe-inline'`,
    `img-src 'self' data: blob:`,
    `font-src 'self'`,
    `connect-src 'self' ${new URL(env.S3_ENDPOINT).origin}${dev ? ' ws:' : ''}`,
    `worker-src 'self' blob:`,
    `object-src 'none'`,
    `base-uri 'none'`,
    `form-action 'self'`,
    `frame-ancestors 'none'`,
  ].join('; ');
}

/**
 * Answers of the API are no pages: whatever lies in a file, it may load nothing and run nothing in our name. A PDF that
 * is shown in place is not sandboxed, because browsers refuse to show it then; it still runs nothing.
 */
function policyOfAnswer(request: NextRequest): string {
  const sandbox = request.nextUrl.searchParams.get('inline') === '1' ? '' : 'sandbox; ';
  return `${sandbox}default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'`;
}

export const config = { matcher: ['/((?!_next/static|_next/image|fonts/|icon|favicon).*)'] };
