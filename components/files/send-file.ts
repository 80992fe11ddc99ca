import { ApiError, call } from '@/lib/api/client';
import { completeUpload, requestUpload, type FileView, type SignedUpload } from '@/lib/files/contract';
import { claimedKind } from '@/lib/files/kinds';
import type { FilePurpose } from '@/lib/files/purpose';

export interface Destination {
  purpose: FilePurpose;
  batchId?: string;
}

export interface Watch {
  onSent: (bytes: number) => void;
  /** All bytes are away; the server reads them back. */
  onChecking: () => void;
  signal: AbortSignal;
}

/** Why a file did not get through, in the person's words; `sameAs` names the file it repeats. */
export class NotSent extends Error {
  constructor(
    message: string,
    readonly mayTryAgain: boolean,
    readonly sameAs: string | null = null,
  ) {
    super(message);
    this.name = 'NotSent';
  }
}

const TRIES = 4;

/**
 * Announces a file, sends it straight to storage and has it read back. A cut connection is taken up again by itself a
 * few times, because phones in plating shops lose the network.
 *
 * @throws NotSent with the sentence to show; an abort by `signal` is thrown as it is.
 */
export async function sendFile(file: File, to: Destination, watch: Watch): Promise<FileView> {
  const claimed = claimedKind({
    purpose: to.purpose,
    name: file.name,
    mediaType: file.type,
    size: file.size,
  });
  if ('refusal' in claimed) throw new NotSent(claimed.refusal, false);
  try {
    const sha256 = await hashOf(file);
    return await withPatience(watch.signal, async () => {
      const { file: announced, upload } = await call(
        requestUpload,
        { ...to, name: file.name, mediaType: file.type, size: file.size, sha256 },
        { signal: watch.signal },
      );
      if (upload === null) return announced;
      await put(file, upload, watch);
      watch.onChecking();
      return call(completeUpload, { fileId: announced.id }, { signal: watch.signal });
    });
  } catch (error) {
    if (watch.signal.aborted) throw error;
    throw asNotSent(error, file);
  }
}

async function hashOf(file: File): Promise<string> {
  const bytes = await file.arrayBuffer().catch(() => {
    throw new NotSent(
      `${file.name} cannot be read on this device. Save it here first, then choose it again.`,
      true,
    );
  });
  const hash = await crypto.subtle.digest('SHA-256', bytes);
  return [...new Uint8Array(hash)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}

/** `fetch` does not tell how much has left, so this is the old request. */
function put(file: File, upload: SignedUpload, { onSent, signal }: Watch): Promise<void> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open(upload.method, upload.url);
    for (const [name, value] of Object.entries(upload.headers)) request.setRequestHeader(name, value);
    request.upload.onprogress = ({ loaded }) => onSent(loaded);
    request.onload = () => (request.status < 300 ? resolve() : reject(new CutOff()));
    request.onerror = () => reject(new CutOff());
    request.onabort = () => reject(new DOMException('Stopped', 'AbortError'));
    signal.addEventListener('abort', () => request.abort(), { once: true });
    request.send(file);
  });
}

class CutOff extends Error {}

async function withPatience<T>(signal: AbortSignal, work: () => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await work();
    } catch (error) {
      if (signal.aborted || attempt === TRIES || !passes(error)) throw error;
      await new Promise((resolve) => setTimeout(resolve, 500 * 2 ** attempt));
    }
  }
}

const passes = (error: unknown): boolean =>
  error instanceof CutOff || (error instanceof ApiError && [0, 503].includes(error.problem.status));

function asNotSent(error: unknown, file: File): NotSent {
  if (error instanceof NotSent) return error;
  if (error instanceof CutOff)
    return new NotSent(
      `${file.name} did not get through: the connection to the file store was cut. Try again.`,
      true,
    );
  if (!(error instanceof ApiError)) throw error;
  const { code, title, extra } = error.problem;
  const sameAs = typeof extra?.['fileId'] === 'string' ? extra['fileId'] : null;
  return new NotSent(
    title,
    !['bad_input', 'too_large', 'not_allowed'].includes(code) && sameAs === null,
    sameAs,
  );
}
