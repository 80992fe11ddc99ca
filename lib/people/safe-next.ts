/**
 * Where to go after signing in: an address of this product and nothing else, whatever somebody put into `?next=`.
 * Browsers read `//x`, `/\x` and addresses with line breaks as other places.
 */
export function safeNext(given: string | null | undefined): string {
  if (given == null || !given.startsWith('/') || /^\/[/\\]|[\\\p{Cc}]/u.test(given)) return '/';
  const url = new URL(given, 'https://here.invalid');
  if (
    url.origin !== 'https://here.invalid' ||
    /^\/(api|sign-in|sign-in-link|reset|invitation)(\/|$)/.test(url.pathname)
  )
    return '/';
  return url.pathname + url.search + url.hash;
}
