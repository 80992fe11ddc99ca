import type { Declaration, InputOf, OutputOf } from './endpoint';
import { Problem } from './shapes';

/** A refusal as the server told it. `problem.title` is the sentence for the person. */
export class ApiError extends Error {
  constructor(readonly problem: Problem) {
    super(problem.title);
    this.name = 'ApiError';
  }
}

const OFFLINE: Problem = {
  type: 'about:blank',
  title: 'No answer from Lotwright. What you typed is kept here; try again when the network is back.',
  status: 0,
  code: 'no_network',
  requestId: '',
};

/** Path and query of a call, or path and body: parameters in braces are taken out of the input. */
export function requestOf(
  declaration: Declaration,
  input: Record<string, unknown>,
): { url: string; body: string | undefined } {
  const rest = { ...input };
  const path = declaration.path.replace(/\{(\w+)\}/g, (_, name: string) => {
    const value = String(rest[name]);
    delete rest[name];
    return encodeURIComponent(value);
  });
  if (declaration.method !== 'get') return { url: `/api${path}`, body: JSON.stringify(rest) };
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(rest)) {
    if (value === undefined || value === null) continue;
    for (const one of Array.isArray(value) ? value : [value]) query.append(name, String(one));
  }
  const text = query.toString();
  return { url: `/api${path}${text ? `?${text}` : ''}`, body: undefined };
}

/**
 * One typed call to the application. A write carries a key, so that the same call repeated after a lost answer does
 * not happen twice.
 *
 * @throws ApiError with the server's own sentence, or `no_network`.
 */
export async function call<D extends Declaration>(
  declaration: D,
  input: InputOf<D>,
  options: { key?: string; signal?: AbortSignal } = {},
): Promise<OutputOf<D>> {
  const { url, body } = requestOf(declaration, input as Record<string, unknown>);
  let response: Response;
  try {
    response = await fetch(url, {
      method: declaration.method.toUpperCase(),
      headers: {
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...(options.key === undefined ? {} : { 'idempotency-key': options.key }),
      },
      ...(body === undefined ? {} : { body }),
      ...(options.signal ? { signal: options.signal } : {}),
    });
  } catch (error) {
    if (options.signal?.aborted) throw error;
    throw new ApiError(OFFLINE);
  }
  if (!response.ok) throw new ApiError(await problemOf(response));
  return (await response.json()) as OutputOf<D>;
}

async function problemOf(response: Response): Promise<Problem> {
  const parsed = Problem.safeParse(await response.json().catch(() => null));
  return parsed.success
    ? parsed.data
    : {
        ...OFFLINE,
        status: response.status,
        title: 'Lotwright could not answer this. Try again in a moment.',
        code: 'unavailable',
      };
}
