import Stripe from 'stripe';
import { env } from '@/lib/env';

export interface PaymentConfig {
  secretKey: string;
  /** Of the stand-in. Without it, the payment service's own address. */
  apiBase?: string | undefined;
}

export function makeStripe({ secretKey, apiBase }: PaymentConfig): Stripe {
  return new Stripe(secretKey, {
    ...(apiBase === undefined ? {} : addressOf(apiBase)),
    // A repeat carries the same idempotency key, so it cannot pay twice.
    maxNetworkRetries: 2,
    timeout: 20_000,
    telemetry: false,
  });
}

let shared: Stripe | undefined;

/** The installation's own, made when first needed. */
export function ownStripe(): Stripe {
  shared ??= makeStripe({ secretKey: env.STRIPE_SECRET_KEY, apiBase: env.STRIPE_API_BASE });
  return shared;
}

function addressOf(apiBase: string): { protocol: 'http' | 'https'; host: string; port: number } {
  const { protocol, hostname, port } = new URL(apiBase);
  const isSecure = protocol === 'https:';
  return {
    protocol: isSecure ? 'https' : 'http',
    host: hostname,
    port: Number(port || (isSecure ? 443 : 80)),
  };
}
