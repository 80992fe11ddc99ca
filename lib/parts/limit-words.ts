/**
 * A limit with its unit where a reader looks for it: after the figure it belongs to, before what is said of it.
 *
 * @example limitWords({ limit: '10 or less', unit: 's' }) // '10 s or less'
 */
export function limitWords({ limit, unit }: { limit: string; unit: string }): string {
  const [, figure, rest] = /^(.*\d)( or (?:less|more)\b.*)$/.exec(limit) ?? [];
  if (unit !== '' && figure !== undefined && rest !== undefined) return `${figure} ${unit}${rest}`;
  return [limit, unit].filter(Boolean).join(' ');
}
