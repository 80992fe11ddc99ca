import { createHash } from 'node:crypto';
import { UnreadableFile, type OpenedFile, type Page } from '../page';
import { layOutText } from './lay-out-text';
import { USUAL_LIMITS, within, type Limits } from './limits';
import { openMail } from './mail/open-mail';
import { textOfHtml } from './mail/text-of-html';
import { decodeText } from './decode-text';
import { openPdf } from './pdf/open-pdf';
import { openPicture } from './open-picture';
import { makeRecogniser, type Recogniser } from './recogniser';
import { sniff } from './sniff';

/** Pages and where they come from, before they are numbered and hashed. */
export interface Opened {
  readonly kind: OpenedFile['kind'];
  readonly pages: readonly Page[];
}

export interface OpenOptions {
  /** As the sender named it; decides nothing that the bytes do not agree with. */
  readonly name: string;
  readonly password?: string;
  readonly limits?: Limits;
  /** Given where many files are opened, so that it is started once; else one is started and closed when needed. */
  readonly recogniser?: Recogniser;
}

/**
 * Opens any file a processor sends: pages of words with boxes in points, upright.
 *
 * @throws UnreadableFile in words for the inspector, whatever is wrong with the file; nothing else.
 */
export async function openFile(bytes: Uint8Array, options: OpenOptions): Promise<OpenedFile> {
  const limits = options.limits ?? USUAL_LIMITS;
  if (bytes.length > limits.bytes) {
    const megabytes = Math.floor(limits.bytes / 1024 / 1024);
    throw new UnreadableFile('too_large', `This file is larger than ${megabytes} MB and was not opened.`);
  }
  const recogniser = options.recogniser ?? makeRecogniser();
  try {
    const work = openBytes(bytes, options, { limits, recogniser });
    const { kind, pages } = await within(limits.millisecondsPerFile, limits.signal, work);
    return {
      sha256: createHash('sha256').update(bytes).digest('hex'),
      kind,
      recognised: pages.some((page) => page.origin === 'recognised'),
      pages: pages.map((page, i) => ({ ...page, number: i + 1 })),
    };
  } catch (cause) {
    // Whatever the recogniser is still busy with must not hold up the next file.
    if (cause instanceof UnreadableFile && cause.code === 'took_too_long') await recogniser.close();
    if (cause instanceof UnreadableFile) throw cause;
    throw new UnreadableFile('damaged', 'This file is damaged and cannot be read. Please ask for it again.');
  } finally {
    if (!options.recogniser) await recogniser.close();
  }
}

interface Tools {
  readonly limits: Limits;
  readonly recogniser: Recogniser;
}

async function openBytes(bytes: Uint8Array, options: OpenOptions, tools: Tools): Promise<Opened> {
  const kind = sniff(bytes, options.name);
  switch (kind) {
    case 'pdf':
      return openPdf(bytes, { password: options.password, ...tools });
    case 'picture':
      return openPicture(bytes, tools);
    case 'mail':
      return openMail(bytes, (attachment, name) => openBytes(attachment, { ...options, name }, tools));
    case 'html':
      return { kind: 'digital', pages: layOutText(textOfHtml(decodeText(bytes))) };
    case 'text':
      return { kind: 'digital', pages: layOutText(decodeText(bytes)) };
  }
}
