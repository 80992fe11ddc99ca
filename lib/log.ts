import pino from 'pino';
import { env } from '@/lib/env';

/** One line of JSON per event. Callers add `requestId` or `job` with `log.child(…)`, so that a story can be followed. */
export const log = pino({
  level: env.LOG_LEVEL,
  base: null,
  timestamp: pino.stdTimeFunctions.isoTime,
  formatters: { level: (label) => ({ level: label }) },
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
