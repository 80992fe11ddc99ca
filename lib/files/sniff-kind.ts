import { fileTypeFromBuffer } from 'file-type';

import { kindOfMediaType, type FileKind } from './kinds';

/** What the first bytes show. `text` may be any kind of text; `other` is nothing that we take, with its name where known. */
export type Sniffed = { is: FileKind | 'text' } | { is: 'other'; says: string };

/** How much of a file must be at hand to tell what it is. */
export const SNIFFED_BYTES = 64 * 1024;

/** What a file is by its bytes, whatever its name says. */
export async function sniffKind(head: Buffer): Promise<Sniffed> {
  // Some scanners put their own line before the header; the PDF reader's rule is the first 1024 bytes.
  if (head.subarray(0, 1024).includes('%PDF-')) return { is: 'pdf' };
  // Text before all others: many a format is known by two letters, and a recorder's file may well begin with them.
  if (isText(head)) return { is: looksLikeMail(head) ? 'eml' : 'text' };
  const found = await fileTypeFromBuffer(head);
  const kind = found && kindOfMediaType(found.mime === 'image/heif' ? 'image/heic' : found.mime);
  if (kind) return { is: kind };
  return {
    is: 'other',
    says: found ? `a ${found.ext.toUpperCase()} file` : 'no kind of file that can be read here',
  };
}

/** Whether bytes that look like `sniffed` may bear a name that says `claimed`. */
export function isWhatItSays(claimed: FileKind, sniffed: Sniffed): boolean {
  if (sniffed.is === claimed) return true;
  return (sniffed.is === 'text' || sniffed.is === 'eml') && ['csv', 'tsv', 'txt'].includes(claimed);
}

/** Recorders write in UTF-8, UTF-16 or the code page of their country: any of these, but no bytes that no writing has. */
function isText(head: Buffer): boolean {
  if (head.length === 0) return false;
  const wide = wideTextOf(head);
  if (wide !== null) return !/[\u0000-\u0008\u000e-\u0019\ufffd]/.test(wide);
  return !head.some((byte) => byte < 0x20 && ![0x09, 0x0a, 0x0c, 0x0d, 0x1a].includes(byte));
}

function wideTextOf(head: Buffer): string | null {
  const even = head.subarray(0, head.length - (head.length % 2));
  if (head[0] === 0xff && head[1] === 0xfe) return new TextDecoder('utf-16le').decode(even);
  return head[0] === 0xfe && head[1] === 0xff ? new TextDecoder('utf-16be').decode(even) : null;
}

function looksLikeMail(head: Buffer): boolean {
  const fields =
    head
      .subarray(0, 4096)
      .toString('latin1')
      .split(/\r?\n\r?\n/)[0]
      ?.split(/\r?\n/) ?? [];
  const names = fields
    .filter((line) => /^[!-9;-~]+:/.test(line))
    .map((line) => line.split(':')[0]?.toLowerCase());
  return ['from', 'date'].every((name) => names.includes(name)) && /^[!-9;-~]+:/.test(fields[0] ?? '');
}
