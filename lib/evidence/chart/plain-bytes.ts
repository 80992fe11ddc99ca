import { UnreadableFile } from '../page';

/** Bytes of which each below 128 is that letter of ASCII, so that they can be scanned without decoding. */
export interface PlainBytes {
  readonly bytes: Uint8Array;
  readonly encoding: 'utf-8' | 'utf-16le' | 'utf-16be' | 'windows-1252';
  /** The text between two places. */
  readonly textOf: (from: number, to: number) => string;
}

const TOO_LARGE = 400_000_000;

const SIGNATURES: readonly (readonly [says: string, bytes: readonly number[]])[] = [
  ['a PDF', [0x25, 0x50, 0x44, 0x46]],
  ['a ZIP or a spreadsheet workbook', [0x50, 0x4b, 0x03, 0x04]],
  ['an old spreadsheet workbook', [0xd0, 0xcf, 0x11, 0xe0]],
  ['a picture', [0x89, 0x50, 0x4e, 0x47]],
  ['a picture', [0xff, 0xd8, 0xff]],
  ['a picture', [0x47, 0x49, 0x46, 0x38]],
  ['a compressed file', [0x1f, 0x8b]],
];

/**
 * The text of a recorder export, whatever its encoding.
 *
 * @throws UnreadableFile where it is empty, too large or no text.
 */
export function plainBytes(file: Uint8Array): PlainBytes {
  if (file.length === 0) throw new UnreadableFile('empty', 'The file is empty.');
  if (file.length > TOO_LARGE) throw new UnreadableFile('too_large', 'The file is larger than 400 MB.');
  const other = SIGNATURES.find(([, bytes]) => bytes.every((byte, at) => file[at] === byte));
  if (other) {
    throw new UnreadableFile('not_what_its_name_says', `This is ${other[0]}, not the text of a recorder.`);
  }
  const wide = wideEncoding(file);
  if (wide) {
    const bytes = new TextEncoder().encode(new TextDecoder(wide).decode(file));
    return { bytes, encoding: wide, textOf: decoderOf(bytes, 'utf-8') };
  }
  const bytes = file[0] === 0xef && file[1] === 0xbb && file[2] === 0xbf ? file.subarray(3) : file;
  if (holdsZero(bytes)) throw new UnreadableFile('not_what_its_name_says', 'This is no text of a recorder.');
  const encoding = isUtf8(bytes) ? 'utf-8' : 'windows-1252';
  return { bytes, encoding, textOf: decoderOf(bytes, encoding) };
}

const decoderOf = (bytes: Uint8Array, encoding: string) => {
  const decoder = new TextDecoder(encoding);
  return (from: number, to: number) => decoder.decode(bytes.subarray(from, to));
};

/** Two bytes a letter: by its mark, or because every other byte of plain text is zero. */
function wideEncoding(file: Uint8Array): 'utf-16le' | 'utf-16be' | null {
  if (file[0] === 0xff && file[1] === 0xfe) return 'utf-16le';
  if (file[0] === 0xfe && file[1] === 0xff) return 'utf-16be';
  let [even, odd] = [0, 0];
  const upTo = Math.min(file.length, 2000);
  for (let at = 0; at < upTo; at++) {
    if (file[at] !== 0) continue;
    if (at % 2 === 0) even++;
    else odd++;
  }
  if (odd > upTo * 0.35 && even === 0) return 'utf-16le';
  if (even > upTo * 0.35 && odd === 0) return 'utf-16be';
  return null;
}

const holdsZero = (bytes: Uint8Array): boolean => bytes.subarray(0, 65_536).includes(0);

/** Only the head is looked at: what is not ASCII in a recorder's export are its degree signs and names. */
function isUtf8(bytes: Uint8Array): boolean {
  const head = bytes.subarray(0, 65_536);
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(head, { stream: true });
    return true;
  } catch {
    return false;
  }
}
