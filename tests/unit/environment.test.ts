import { describe, expect, test } from 'vitest';
import { parseEnvironment } from '@/lib/env';

const AUTH_SECRET = 'a-secret-of-at-least-thirty-two-characters';

describe('the environment', () => {
  test('with only the secret set, the local services serve', () => {
    const env = parseEnvironment({ AUTH_SECRET });
    expect(env).toMatchObject({
      DATABASE_URL: 'postgresql://lotwright_app@127.0.0.1:4632/lotwright',
      APP_URL: 'http://localhost:4600',
      SMTP_URL: 'smtp://127.0.0.1:4625',
      S3_ENDPOINT: 'http://127.0.0.1:4690',
      STRIPE_API_BASE: 'http://127.0.0.1:4612',
      PORT: 4600,
    });
    expect(env.DATABASE_REPLICA_URL).toBeUndefined();
  });

  test.each([
    [{}, 'AUTH_SECRET'],
    [{ AUTH_SECRET: 'short' }, 'AUTH_SECRET'],
    [{ AUTH_SECRET, DATABASE_URL: 'mysql://somewhere' }, 'DATABASE_URL'],
    [{ AUTH_SECRET, DATABASE_REPLICA_URL: 'somewhere' }, 'DATABASE_REPLICA_URL'],
    [{ AUTH_SECRET, APP_URL: 'lotwright.example.test' }, 'APP_URL'],
    [{ AUTH_SECRET, SMTP_URL: 'http://mail.example.test' }, 'SMTP_URL'],
    [{ AUTH_SECRET, PORT: 'web' }, 'PORT'],
    [{ AUTH_SECRET, PORT: '70000' }, 'PORT'],
    [{ AUTH_SECRET, TRUSTED_PROXIES: '-1' }, 'TRUSTED_PROXIES'],
    [{ AUTH_SECRET, TRUSTED_PROXIES: 'all' }, 'TRUSTED_PROXIES'],
    [{ AUTH_SECRET, LOG_LEVEL: 'loud' }, 'LOG_LEVEL'],
    [{ AUTH_SECRET, S3_ENDPOINT: 'https://s3.example.test' }, 'S3_SECRET_ACCESS_KEY'],
    [{ AUTH_SECRET, STRIPE_SECRET_KEY: 'sk_live' }, 'STRIPE_WEBHOOK_SECRET'],
    [{ AUTH_SECRET, STRIPE_API_BASE: 'http://127.0.0.1:1' }, 'STRIPE_SECRET_KEY'],
  ])('%o is refused by the name %s', (given, name) => {
    expect(() => parseEnvironment(given)).toThrow(name);
  });

  test('all that is wrong is said at once', () => {
    expect(() => parseEnvironment({ PORT: 'web', LOG_LEVEL: 'loud', AUTH_SECRET })).toThrow(
      /PORT[^]*LOG_LEVEL/,
    );
  });

  test('a name without a value counts as not set', () => {
    expect(parseEnvironment({ AUTH_SECRET, SMTP_URL: '' }).SMTP_URL).toBe('smtp://127.0.0.1:4625');
  });

  test('a payment key without an address means the real payment service', () => {
    const env = parseEnvironment({ AUTH_SECRET, STRIPE_SECRET_KEY: 'sk', STRIPE_WEBHOOK_SECRET: 'whsec' });
    expect(env.STRIPE_API_BASE).toBeUndefined();
  });

  test('a build needs no secret, because it answers nobody', () => {
    expect(parseEnvironment({ NEXT_PHASE: 'phase-production-build' }).AUTH_SECRET).toBe('');
  });

  test('links never get a double slash from an address that ends in one', () => {
    expect(parseEnvironment({ AUTH_SECRET, APP_URL: 'https://a.example.test/' }).APP_URL).toBe(
      'https://a.example.test',
    );
  });
});
