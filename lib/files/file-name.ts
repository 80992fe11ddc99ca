const LONGEST = 160;
/** Controls, marks that turn the direction of writing (`gpj.exe` shown as `exe.jpg`), and what separates folders. */
const UNSAFE = /[\u0000-\u001f\u007f-\u009f\u200b-\u200f\u202a-\u202e\u2028\u2029\u2060-\u206f\ufeff]/g;

/** A sent name without folders, controls and direction marks; cut in the middle, so that its ending stays. */
export function safeFileName(sent: string): string {
  const last = sent.normalize('NFC').split(/[/\\]/).at(-1) ?? '';
  const clean = last
    .replace(UNSAFE, '')
    .replace(/\s+/g, ' ')
    .replace(/^[\s.]+|[\s.]+$/g, '');
  if (clean === '') return 'file';
  if (clean.length <= LONGEST) return clean;
  const ending = /\.[^.]{1,8}$/.exec(clean)?.[0] ?? '';
  return `${[...clean.slice(0, LONGEST - ending.length - 1)].join('').trimEnd()}…${ending}`;
}

/** The header that names a download, for readers of RFC 6266 old and new. */
export function contentDisposition(how: 'inline' | 'attachment', name: string): string {
  const safe = safeFileName(name);
  const plain = safe.replace(/[^\x20-\x7e]/g, '_').replace(/["\\%]/g, '_');
  const encoded = encodeURIComponent(safe.toWellFormed()).replace(
    /['()*!]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `${how}; filename="${plain}"; filename*=UTF-8''${encoded}`;
}
