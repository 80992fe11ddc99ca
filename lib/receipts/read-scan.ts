/** What a scanner, or a person in its place, gave: a batch's or order's number, a batch's id, or the code of a traveller. */
export type Scan =
  { kind: 'number'; number: string } | { kind: 'id'; id: string } | { kind: 'token'; token: string };

const UUID = /[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}/i;

/** `419` and `b-419` mean `B-0419`, because nobody types noughts with gloves on. */
export function readScan(text: string): Scan {
  const trimmed = text.trim();
  const token = /\/b\/([\w-]{16,})/.exec(trimmed)?.[1];
  if (token !== undefined) return { kind: 'token', token };
  const id = UUID.exec(trimmed)?.[0];
  if (id !== undefined) return { kind: 'id', id: id.toLowerCase() };
  const last = trimmed.split(/[?#]/)[0]?.split('/').filter(Boolean).at(-1) ?? '';
  const short = /^(?:b-?)?(\d{1,4})$/i.exec(last)?.[1];
  return { kind: 'number', number: short === undefined ? last.toUpperCase() : `B-${short.padStart(4, '0')}` };
}
