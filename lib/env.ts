import { z } from 'zod';

/**
 * Everything the outside world may set, parsed once.
 *
 * The defaults are the stand-ins that `npm start` runs on this machine. A service of one's own is named whole:
 * a real storage with the stand-in's well-known key, or a real payment key with its public webhook secret,
 * would be an open door, so half an answer is refused.
 */
const LOCAL = {
  storageEndpoint: 'http://127.0.0.1:4690',
  storageKey: 'S3RVER',
  paymentsBase: 'http://127.0.0.1:4612',
  paymentsKey: 'sk_test_local',
  paymentsWebhookSecret: 'whsec_local',
} as const;

const databaseUrl = z.url({ protocol: /^postgres(ql)?$/, error: 'must be a postgresql:// address' });
const httpUrl = z.url({ protocol: /^https?$/, error: 'must be an http:// or https:// address' });
const port = z.coerce.number().int().min(1).max(65535);

const Environment = z
  .object({
    NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
    NEXT_PHASE: z.string().optional(),

    DATABASE_URL: databaseUrl.default('postgresql://lotwright_app@127.0.0.1:4632/lotwright'),
    DATABASE_OWNER_URL: databaseUrl.default('postgresql://lotwright_owner@127.0.0.1:4632/lotwright'),
    DATABASE_REPLICA_URL: databaseUrl.optional(),

    APP_URL: httpUrl.default('http://localhost:4600').transform(withoutTrailingSlash),
    AUTH_SECRET: z.string().min(32, 'must have at least 32 characters').optional(),
    PORT: port.default(4600),
    WORKER_PORT: port.default(4640),
    TRUSTED_PROXIES: z.coerce.number().int().min(0).max(10).default(0),

    SMTP_URL: z
      .url({ protocol: /^smtps?$/, error: 'must be an smtp:// or smtps:// address' })
      .default('smtp://127.0.0.1:4625'),
    MAIL_FROM: z.string().min(3).default('Lotwright <no-reply@lotwright.test>'),

    S3_ENDPOINT: httpUrl.optional(),
    S3_REGION: z.string().min(1).default('us-east-1'),
    S3_BUCKET: z.string().min(3).default('lotwright'),
    S3_ACCESS_KEY_ID: z.string().min(1).optional(),
    S3_SECRET_ACCESS_KEY: z.string().min(1).optional(),

    STRIPE_API_BASE: httpUrl.optional(),
    STRIPE_SECRET_KEY: z.string().min(1).optional(),
    STRIPE_WEBHOOK_SECRET: z.string().min(1).optional(),

    LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
  })
  .superRefine((given, issues) => {
    const demand = (name: keyof typeof given, because: string) => {
      if (given[name] === undefined) issues.addIssue({ code: 'custom', path: [name], message: because });
    };
    // `next build` loads the routes to describe them, but answers nobody.
    if (given.NEXT_PHASE !== 'phase-production-build') {
      demand('AUTH_SECRET', 'is required: 32 or more random characters (`npm start` makes a local one)');
    }
    if (given.S3_ENDPOINT !== undefined) {
      demand('S3_ACCESS_KEY_ID', 'is required when S3_ENDPOINT is set');
      demand('S3_SECRET_ACCESS_KEY', 'is required when S3_ENDPOINT is set');
    }
    if (given.STRIPE_SECRET_KEY !== undefined) {
      demand('STRIPE_WEBHOOK_SECRET', 'is required when STRIPE_SECRET_KEY is set');
    }
    if (given.STRIPE_API_BASE !== undefined) {
      demand('STRIPE_SECRET_KEY', 'is required when STRIPE_API_BASE is set');
    }
  })
  .transform((given) => ({
    ...given,
    AUTH_SECRET: given.AUTH_SECRET ?? '',
    S3_ENDPOINT: given.S3_ENDPOINT ?? LOCAL.storageEndpoint,
    S3_ACCESS_KEY_ID: given.S3_ACCESS_KEY_ID ?? LOCAL.storageKey,
    S3_SECRET_ACCESS_KEY: given.S3_SECRET_ACCESS_KEY ?? LOCAL.storageKey,
    // A key without an address means the payment service itself, at its own address.
    STRIPE_API_BASE:
      given.STRIPE_API_BASE ?? (given.STRIPE_SECRET_KEY === undefined ? LOCAL.paymentsBase : undefined),
    STRIPE_SECRET_KEY: given.STRIPE_SECRET_KEY ?? LOCAL.paymentsKey,
    STRIPE_WEBHOOK_SECRET: given.STRIPE_WEBHOOK_SECRET ?? LOCAL.paymentsWebhookSecret,
  }));

type Env = z.output<typeof Environment>;

/** Separate from `env` so that a test can show which settings are refused, and in which words. */
export function parseEnvironment(given: Readonly<Record<string, string | undefined>>): Env {
  // `NAME=` in a file means "not set", not "the empty text".
  const named = Object.fromEntries(Object.entries(given).filter(([, value]) => value !== ''));
  const parsed = Environment.safeParse(named);
  if (parsed.success) return parsed.data;

  const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')} ${issue.message}`);
  throw new Error(`The environment is not usable:\n${lines.join('\n')}\nSee .env.example.`);
}

function withoutTrailingSlash(url: string): string {
  return url.replace(/\/+$/, '');
}

export const env: Env = parseEnvironment(process.env);
