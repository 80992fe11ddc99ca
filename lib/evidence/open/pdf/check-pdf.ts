import { constants, inflateSync } from 'node:zlib';
import { UnreadableFile } from '../../page';
import type { Limits } from '../limits';

/** A PDF ends with this sign; programs add no more than a little rubbish after it. */
const END = '%%EOF';
const RUBBISH_AFTER = 2048;
/** A stream's description stands right before it. */
const DESCRIPTION_WITHIN = 2048;
/** Packed streams grow a thousandfold at most, so that smaller ones cannot hurt. */
const HARMLESS_BYTES = 64 * 1024;
const MOST_UNPACKED = 256 * 1024 * 1024;

/**
 * Refuses a PDF before it is opened that was cut off, is an archive or a web page as well, or unpacks to more than a
 * machine can bear.
 *
 * pdf.js would mend the first and show what is left; a certificate that lacks its end must not pass for whole.
 *
 * @throws UnreadableFile `damaged`, `not_what_its_name_says`, `too_large`
 */
export function refuseHarmfulPdf(bytes: Uint8Array, limits: Limits): void {
  const file = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  refuseWrongEnd(file);
  let budget = MOST_UNPACKED * 2;
  for (let at = file.indexOf('stream'); at >= 0; at = file.indexOf('stream', at + 6)) {
    if (file.toString('latin1', at - 3, at) === 'end') continue;
    const description = descriptionBefore(file, at);
    refuseManyPixels(description, limits);
    budget -= unpackedSize(file, at, description);
    if (budget < 0) throw tooLarge();
  }
}

function refuseWrongEnd(file: Buffer): void {
  const end = file.lastIndexOf(END);
  const after = end < 0 ? '' : file.toString('latin1', end + END.length);
  if (/PK\x05\x06/.test(after) || /<(!doctype|html|script)/i.test(after)) {
    throw new UnreadableFile(
      'not_what_its_name_says',
      'This file is a PDF and something else in one. It was not opened. Please ask for a plain PDF.',
    );
  }
  if (end < 0 || (after.length > RUBBISH_AFTER && / obj\b/.test(after))) {
    throw new UnreadableFile('damaged', 'This PDF breaks off before its end. Please ask for it again.');
  }
}

function descriptionBefore(file: Buffer, at: number): string {
  const before = file.toString('latin1', Math.max(0, at - DESCRIPTION_WITHIN), at);
  return before.slice(before.lastIndexOf(' obj') + 1);
}

function refuseManyPixels(description: string, limits: Limits): void {
  const width = Number(/\/Width\s+(\d+)/.exec(description)?.[1] ?? 0);
  const height = Number(/\/Height\s+(\d+)/.exec(description)?.[1] ?? 0);
  if (width * height > limits.pixels) throw tooLarge();
}

/** What a stream that is packed unpacks to, in bytes; 0 for what cannot be told or is harmless. */
function unpackedSize(file: Buffer, at: number, description: string): number {
  const times = description.match(/\/(FlateDecode|Fl)\b/g)?.length ?? 0;
  if (times === 0) return 0;
  let start = at + 'stream'.length;
  while (file[start] === 0x0d || file[start] === 0x0a) start++;
  const end = file.indexOf('endstream', start);
  let packed = file.subarray(start, end < 0 ? file.length : end);
  if (times === 1 && packed.length < HARMLESS_BYTES) return 0;
  for (let i = 0; i < times; i++) {
    const unpacked = unpack(packed);
    if (!unpacked) return 0;
    packed = unpacked;
  }
  return packed.length;
}

function unpack(packed: Buffer): Buffer | null {
  try {
    return inflateSync(packed, { maxOutputLength: MOST_UNPACKED, finishFlush: constants.Z_SYNC_FLUSH });
  } catch (cause) {
    if (cause instanceof RangeError) throw tooLarge();
    // Encrypted or broken: pdf.js will say so.
    return null;
  }
}

const tooLarge = () =>
  new UnreadableFile(
    'too_large',
    'This PDF unpacks to far more than its size and was not opened. Please ask for a plain scan.',
  );
