import { join } from 'node:path';
import type { StackSettings } from './settings';

/** One process of the stack: how to start it and how to know that it is up. */
export interface Part {
  readonly name: string;
  readonly args: readonly string[];
  readonly env: Readonly<Record<string, string>>;
  readonly health: string;
  /** All it listens on; each must be free beforehand. */
  readonly ports: readonly number[];
  readonly showOutput: boolean;
  /** Under development: it restarts by itself when the code is mended, so it is no reason to give up. */
  readonly mayBeBroken: boolean;
}

export type WebMode = 'built' | 'dev';

// `node --import tsx`, never `npx tsx`: a signal to npx leaves the real process running.
const typescript = (script: string) => ['--import', 'tsx', script];
const NEXT = join('node_modules', 'next', 'dist', 'bin', 'next');

/** The services of others that nobody named an address for. */
export function standIns({ ports, dataFolder, runsHere }: StackSettings): Part[] {
  const mail: Part = {
    name: 'mail',
    args: typescript('fakes/mail/server.ts'),
    env: {
      FAKE_SMTP_PORT: String(ports.smtp),
      FAKE_MAIL_HTTP_PORT: String(ports.inbox),
      FAKE_MAIL_DIR: join(dataFolder, 'mail'),
    },
    health: `http://127.0.0.1:${ports.inbox}/health`,
    ports: [ports.smtp, ports.inbox],
    showOutput: false,
    mayBeBroken: false,
  };
  const storage: Part = {
    name: 'storage',
    args: typescript('fakes/storage/server.ts'),
    env: { FAKE_STORAGE_PORT: String(ports.storage), FAKE_STORAGE_DIR: join(dataFolder, 'storage') },
    health: `http://127.0.0.1:${ports.storage}/health`,
    ports: [ports.storage],
    showOutput: false,
    mayBeBroken: false,
  };
  const payments: Part = {
    name: 'payments',
    args: typescript('fakes/payments/server.ts'),
    env: {
      FAKE_PAYMENTS_PORT: String(ports.payments),
      FAKE_PAYMENTS_FILE: join(dataFolder, 'payments.json'),
    },
    health: `http://127.0.0.1:${ports.payments}/health`,
    ports: [ports.payments],
    showOutput: false,
    mayBeBroken: false,
  };
  return [
    ...(runsHere.mail ? [mail] : []),
    ...(runsHere.storage ? [storage] : []),
    ...(runsHere.payments ? [payments] : []),
  ];
}

export function workerPart({ ports }: StackSettings, mode: WebMode): Part {
  return {
    name: 'worker',
    args: [
      ...(mode === 'dev' ? ['--watch', '--watch-preserve-output'] : []),
      ...typescript('lib/jobs/worker.ts'),
    ],
    env: { NODE_ENV: mode === 'dev' ? 'development' : 'production' },
    health: `http://127.0.0.1:${ports.worker}/health`,
    ports: [ports.worker],
    showOutput: false,
    mayBeBroken: mode === 'dev',
  };
}

export function webPart({ ports, host }: StackSettings, mode: WebMode): Part {
  return {
    name: 'web',
    args: [NEXT, mode === 'dev' ? 'dev' : 'start', '-p', String(ports.web), '-H', host],
    env: { NODE_ENV: mode === 'dev' ? 'development' : 'production' },
    health: `http://127.0.0.1:${ports.web}/api/health`,
    ports: [ports.web],
    showOutput: mode === 'dev',
    mayBeBroken: mode === 'dev',
  };
}
