const LEGAL_FORM =
  /^(?:inc|incorporated|llc|ltd|limited|gmbh|ag|sa|sarl|bv|plc|corp|corporation|co|company|the|and|of|de)$/;

const tokens = (name: string): string[] =>
  name
    .toLowerCase()
    .normalize('NFKD')
    .replace(/[^a-z0-9\s&-]/g, '')
    .split(/[\s&-]+/)
    .filter((word) => word !== '' && !LEGAL_FORM.test(word));

/**
 * Whether two names mean one company: the words of the shorter stand in the longer, legal forms apart, or both are
 * written together the same.
 *
 * @example areSameCompany('Example Thermal', 'EXAMPLE THERMAL, INC.') is true
 */
export function areSameCompany(one: string, other: string): boolean {
  const [a, b] = [tokens(one), tokens(other)];
  if (a.length === 0 || b.length === 0) return false;
  const [short, long] = a.length <= b.length ? [a, b] : [b, a];
  return short.every((word) => long.includes(word)) || a.join('') === b.join('');
}
