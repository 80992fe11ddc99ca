import { UnreadableFile } from '../../page';

/** A PDF ends with this sign; programs add no more than a little rubbish after it. */
const END = '%%EOF';
const RUBBISH_AFTER = 2048;

/**
 * Refuses a PDF that was cut off, or that is an archive or a web page from its end on.
 *
 * pdf.js would mend the first and show what is left; a certificate that lacks its end must not pass for whole.
 */
export function refuseBrokenPdf(bytes: Uint8Array): void {
  const file = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const end = file.lastIndexOf(END);
  const after = end < 0 ? '' : file.subarray(end + END.length).toString('latin1');
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
