import { z } from 'zod';

/** Currencies with two minor digits; others would need their own rule and are refused. */
export const CURRENCIES = ['USD', 'CAD', 'EUR', 'GBP', 'CHF', 'AUD', 'NZD', 'SEK', 'NOK', 'DKK'] as const;
export const Currency = z.enum(CURRENCIES);
export type Currency = z.infer<typeof Currency>;

/** A sum in minor units (cents), up to ten million in the currency. */
export const Minor = z.int().min(-1_000_000_000).max(1_000_000_000);

/** `28240` → `282.40`, thousands with a comma. */
export function amountText(minor: number): string {
  const sign = minor < 0 ? '−' : '';
  const whole = Math.trunc(Math.abs(minor) / 100);
  const rest = Math.abs(minor) % 100;
  return `${sign}${whole.toLocaleString('en-US')}.${String(rest).padStart(2, '0')}`;
}

/** `282.40`, `1,282.4`, `282` → minor units; null where it is no amount with at most two decimals. */
export function parseAmount(text: string): number | null {
  const match = /^(\d{1,3}(?:,\d{3})+|\d+)(?:\.(\d{1,2}))?$/.exec(text.trim());
  if (!match) return null;
  const [, whole = '', cents = ''] = match;
  return Number(whole.replaceAll(',', '')) * 100 + Number(cents.padEnd(2, '0'));
}
