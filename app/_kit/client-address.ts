import { env } from '@/lib/env';

/**
 * The address a request came from, or null where nobody said it.
 *
 * `x-forwarded-for` is written from left to right, each hop adding whom it spoke to, and the last entry is our own (see
 * `notePeers`). Whatever stands left of the trusted proxies was sent by the client and may be invented.
 *
 * @param trustedProxies how many proxies stand before this server, 0 for none
 */
export function clientAddress(
  headers: Pick<Headers, 'get'>,
  trustedProxies = env.TRUSTED_PROXIES,
): string | null {
  const hops = (headers.get('x-forwarded-for') ?? '')
    .split(',')
    .map((hop) => hop.trim())
    .filter(Boolean);
  return hops.at(-1 - trustedProxies) ?? hops[0] ?? null;
}
