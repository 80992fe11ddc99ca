import { AppError } from '@/lib/errors';

const LARGEST_BODY = 1_000_000;

const tooLarge = () => new AppError('too_large', 'This is more than one request may carry.');

/**
 * The text of a request, never more than a million bytes of it: a length that is said too large is refused before
 * anything is read, and what says none, or lies, is cut off where it passes the limit.
 */
export async function textOf(request: Request): Promise<string> {
  if (Number(request.headers.get('content-length') ?? 0) > LARGEST_BODY) throw tooLarge();
  if (request.body === null) return '';
  const reader = request.body.getReader();
  const decoder = new TextDecoder();
  let [text, bytes] = ['', 0];
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return text + decoder.decode();
    bytes += value.byteLength;
    if (bytes > LARGEST_BODY) {
      await reader.cancel();
      throw tooLarge();
    }
    text += decoder.decode(value, { stream: true });
  }
}

/** The one JSON object that a request carries; an empty body is an empty one. */
export async function jsonBodyOf(request: Request): Promise<Record<string, unknown>> {
  const text = await textOf(request);
  if (text === '') return {};
  try {
    const body: unknown = JSON.parse(text);
    if (body !== null && typeof body === 'object' && !Array.isArray(body))
      return body as Record<string, unknown>;
  } catch {
    // Told below, in the same words as any body of the wrong shape.
  }
  throw new AppError('bad_input', 'The body must be one JSON object.');
}
