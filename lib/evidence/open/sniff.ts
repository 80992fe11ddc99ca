import { UnreadableFile } from '../page';

export type FileKind = 'pdf' | 'picture' | 'mail' | 'html' | 'text';

const starts = (bytes: Uint8Array, ...signature: number[]) => signature.every((byte, i) => bytes[i] === byte);
const latin = (bytes: Uint8Array, from: number, to: number) =>
  Buffer.from(bytes.subarray(from, to)).toString('latin1');

/** Programs allow rubbish before a PDF's header; more than this is another file. */
const HEADER_WITHIN = 1024;
const extensionOf = (name: string) => /\.([a-z0-9]{1,5})\s*$/i.exec(name)?.[1]?.toLowerCase() ?? '';
const PICTURE_NAMES = new Set(['jpg', 'jpeg', 'png', 'tif', 'tiff', 'webp', 'heic', 'bmp', 'gif']);

/**
 * Tells from its bytes what a file is. The name is believed only where the bytes do not speak against it.
 *
 * @throws UnreadableFile `empty`, `not_what_its_name_says`, `kind_not_supported`
 */
export function sniff(bytes: Uint8Array, name: string): FileKind {
  if (bytes.length === 0 || bytes.every((byte) => byte === 0)) {
    throw new UnreadableFile('empty', 'This file is empty.');
  }
  const kind = kindOfBytes(bytes, extensionOf(name));
  const named = extensionOf(name);
  const wrong =
    (named === 'pdf' && kind !== 'pdf') ||
    (PICTURE_NAMES.has(named) && kind !== 'picture') ||
    (named === 'eml' && kind === 'pdf');
  if (wrong) {
    throw new UnreadableFile(
      'not_what_its_name_says',
      `This file is named .${named}, but it is ${wordsFor(kind, bytes)}. It was not opened.`,
    );
  }
  if (kind === 'unknown') {
    throw new UnreadableFile(
      'kind_not_supported',
      `This kind of file cannot be read here (it is ${wordsFor(kind, bytes)}). PDF, TIFF, JPEG, PNG, mail and plain text can.`,
    );
  }
  return kind;
}

function kindOfBytes(bytes: Uint8Array, named: string): FileKind | 'unknown' {
  if (isPicture(bytes)) return 'picture';
  if (starts(bytes, 0x50, 0x4b) || starts(bytes, 0x4d, 0x5a) || starts(bytes, 0x7f, 0x45, 0x4c, 0x46))
    return 'unknown';
  if (latin(bytes, 0, HEADER_WITHIN).includes('%PDF-')) return isWrapped(bytes) ? 'unknown' : 'pdf';
  if (!looksLikeText(bytes)) return 'unknown';
  const head = latin(bytes, 0, 4096);
  if (/^\s*(<!doctype html|<html|<head|<body|<script)/i.test(head)) return 'html';
  if (named === 'eml' || isMail(head)) return 'mail';
  return 'text';
}

/** A PDF that is a web page or an archive as well is made to be taken for one thing and opened as another. */
function isWrapped(bytes: Uint8Array): boolean {
  const before = latin(bytes, 0, HEADER_WITHIN).split('%PDF-')[0] ?? '';
  return /<(!doctype|html|script|body)/i.test(before) || before.startsWith('GIF8');
}

function isPicture(bytes: Uint8Array): boolean {
  return (
    starts(bytes, 0xff, 0xd8, 0xff) ||
    starts(bytes, 0x89, 0x50, 0x4e, 0x47) ||
    starts(bytes, 0x49, 0x49, 0x2a, 0x00) ||
    starts(bytes, 0x4d, 0x4d, 0x00, 0x2a) ||
    (latin(bytes, 0, 4) === 'RIFF' && latin(bytes, 8, 12) === 'WEBP')
  );
}

function looksLikeText(bytes: Uint8Array): boolean {
  const sample = bytes.subarray(0, 8192);
  if (starts(sample, 0xff, 0xfe) || starts(sample, 0xfe, 0xff)) return true;
  let odd = 0;
  for (const byte of sample) {
    if (byte === 0) return false;
    if (byte < 32 && byte !== 9 && byte !== 10 && byte !== 13 && byte !== 12) odd++;
  }
  return odd <= sample.length * 0.02;
}

const isMail = (head: string) =>
  /^(from|to|subject|date|received|return-path|message-id|mime-version|content-type|delivered-to|x-[\w-]+):/i.test(
    head,
  ) && (head.match(/^(from|to|subject|date|message-id|mime-version|content-type):/gim)?.length ?? 0) >= 2;

function wordsFor(kind: FileKind | 'unknown', bytes: Uint8Array): string {
  switch (kind) {
    case 'pdf':
      return 'a PDF';
    case 'picture':
      return 'a picture';
    case 'mail':
      return 'a mail';
    case 'html':
      return 'a web page';
    case 'text':
      return 'plain text';
    case 'unknown':
      if (starts(bytes, 0x50, 0x4b)) return 'a ZIP archive or an office document';
      if (latin(bytes, 0, HEADER_WITHIN).includes('%PDF-')) return 'two kinds of file in one';
      return 'of an unknown kind';
  }
}
