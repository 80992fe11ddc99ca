import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
// By path: the test runner reads this file before it knows the alias.
import { CannotStart } from '../../db/cannot-start';

export type StackKind = 'local' | 'test';
type Given = Readonly<Record<string, string | undefined>>;

export interface StackSettings {
  readonly kind: StackKind;
  readonly ports: ReturnType<typeof portsFrom>;
  readonly host: string;
  readonly dataFolder: string;
  readonly clusterFolder: string;
  /** Where Next builds to: tests must not build over a running server. */
  readonly distDir: string;
  /** Which services run here, because nobody named an address for them. */
  readonly runsHere: { database: boolean; mail: boolean; storage: boolean; payments: boolean };
  /** What every process of this stack gets, on top of what it inherits. */
  readonly env: Readonly<Record<string, string>>;
}

const TEST_OFFSET = 1300;
const TEST_SECRET = 'the-tests-need-no-secret-worth-keeping';
/** Given to the tests as "not set", whatever the machine's own settings say: tests never touch a real service. */
const SERVICE_NAMES = [
  ...['DATABASE_URL', 'DATABASE_OWNER_URL', 'DATABASE_REPLICA_URL', 'APP_URL', 'PORT', 'WORKER_PORT', 'HOST'],
  ...['SMTP_URL', 'MAIL_FROM', 'AUTH_SECRET', 'AUTH_URL', 'PORT_OFFSET'],
  ...['S3_ENDPOINT', 'S3_REGION', 'S3_BUCKET', 'S3_ACCESS_KEY_ID', 'S3_SECRET_ACCESS_KEY'],
  ...['STRIPE_API_BASE', 'STRIPE_SECRET_KEY', 'STRIPE_WEBHOOK_SECRET'],
];

export function stackSettings(kind: StackKind, environment: Given, root: string): StackSettings {
  const given = kind === 'test' ? withoutServices(environment) : environment;
  const isSet = (name: string) => (given[name] ?? '') !== '';
  if (isSet('DATABASE_URL') !== isSet('DATABASE_OWNER_URL')) {
    throw new CannotStart('Set DATABASE_URL and DATABASE_OWNER_URL together, or neither.');
  }

  const ports = portsFrom(kind, given);
  const dataFolder = join(root, '.data', kind === 'test' ? 'test' : '');
  const runsHere = {
    database: !isSet('DATABASE_URL'),
    mail: !isSet('SMTP_URL'),
    storage: !isSet('S3_ENDPOINT'),
    payments: !isSet('STRIPE_API_BASE') && !isSet('STRIPE_SECRET_KEY'),
  };
  return {
    kind,
    ports,
    host: given['HOST'] ?? '127.0.0.1',
    dataFolder,
    clusterFolder: join(root, '.data', kind === 'test' ? 'test-pg' : 'pg'),
    distDir: kind === 'test' ? '.next-test' : '.next',
    runsHere,
    env: {
      ...(kind === 'test' ? Object.fromEntries(SERVICE_NAMES.map((name) => [name, ''])) : {}),
      ...localServices(runsHere, ports),
      APP_URL: given['APP_URL'] ?? `http://localhost:${ports.web}`,
      AUTH_SECRET: kind === 'test' ? TEST_SECRET : (given['AUTH_SECRET'] ?? keptSecret(dataFolder)),
      PORT: String(ports.web),
      WORKER_PORT: String(ports.worker),
      NEXT_DIST_DIR: kind === 'test' ? '.next-test' : '.next',
      NEXT_TELEMETRY_DISABLED: '1',
      // Its only warning says that versions after ours will want another Node; ours are pinned.
      AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
      LOG_LEVEL: given['LOG_LEVEL'] ?? 'info',
    },
  };
}

function portsFrom(kind: StackKind, given: Given) {
  const offset = kind === 'test' ? TEST_OFFSET : numberFrom(given, 'PORT_OFFSET', 0);
  return {
    web: numberFrom(given, 'PORT', 4600 + offset),
    worker: numberFrom(given, 'WORKER_PORT', 4640 + offset),
    database: 4632 + offset,
    smtp: 4625 + offset,
    inbox: 4680 + offset,
    storage: 4690 + offset,
    payments: 4612 + offset,
  };
}

function numberFrom(given: Given, name: string, otherwise: number): number {
  const text = given[name] ?? '';
  if (text === '') return otherwise;
  const value = Number(text);
  if (!Number.isInteger(value) || value < 0 || value > 65_535) {
    throw new CannotStart(`${name} must be a whole number up to 65535; it is "${text}".`);
  }
  return value;
}

function localServices(
  runsHere: StackSettings['runsHere'],
  ports: StackSettings['ports'],
): Record<string, string> {
  return {
    ...(runsHere.database && {
      DATABASE_URL: databaseUrl(ports.database, 'lotwright_app'),
      DATABASE_OWNER_URL: databaseUrl(ports.database, 'lotwright_owner'),
    }),
    ...(runsHere.mail && { SMTP_URL: `smtp://127.0.0.1:${ports.smtp}` }),
    ...(runsHere.storage && {
      S3_ENDPOINT: `http://127.0.0.1:${ports.storage}`,
      S3_ACCESS_KEY_ID: 'S3RVER',
      S3_SECRET_ACCESS_KEY: 'S3RVER',
    }),
    ...(runsHere.payments && {
      STRIPE_API_BASE: `http://127.0.0.1:${ports.payments}`,
      STRIPE_SECRET_KEY: 'sk_test_local',
      STRIPE_WEBHOOK_SECRET: 'whsec_local',
    }),
  };
}

const databaseUrl = (port: number, role: string) => `postgresql://${role}@127.0.0.1:${port}/lotwright`;

function withoutServices(environment: Given): Given {
  return Object.fromEntries(Object.entries(environment).filter(([name]) => !SERVICE_NAMES.includes(name)));
}

/** Made once and kept, so that a restart signs nobody out. */
function keptSecret(dataFolder: string): string {
  const file = join(dataFolder, 'auth-secret');
  if (existsSync(file)) {
    const kept = readFileSync(file, 'utf8').trim();
    if (kept.length >= 32) return kept;
  }
  const secret = randomBytes(32).toString('base64url');
  mkdirSync(dataFolder, { recursive: true });
  writeFileSync(file, secret, { mode: 0o600 });
  return secret;
}
