import pino from 'pino';
import { env } from '@/lib/env';

/** One line of JSON per event. Callers add `requestId` or `job` with `log.child(…)`, so that a story can be followed. */
export const log = pino({
  level: env.LOG_LEVEL,
  base: null,
  timestamp: pino.stdTimeFunctions.isoTime,
  formatters: { level: (label) => ({ level: label }) },
  serializers: { error: describeError },
  // Whatever is logged by accident, these never reach a file.
  redact: {
    paths: [
      'password',
      'token',
      'secret',
      'authorization',
      'cookie',
      '*.password',
      '*.token',
      '*.secret',
      '*.authorization',
      '*.cookie',
      'headers["set-cookie"]',
    ],
    censor: '[removed]',
  },
});

/** Chosen fields only: errors of clients carry the whole client with them, settings included. */
function describeError(error: unknown): unknown {
  if (!(error instanceof Error)) return error;
  const { name, message, stack, cause } = error;
  const code = 'code' in error ? { code: error.code } : {};
  const deeper = cause === undefined ? {} : { cause: describeError(cause) };
  return { name, message, ...code, ...deeper, stack };
}
