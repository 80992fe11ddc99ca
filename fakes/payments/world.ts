import type { Call } from './call';
import type { PaymentsStore } from './store';
import type { Webhooks } from './webhooks';

/**
 * How the service can be made to fail: `refuse` answers 503; `drop` cuts the connection before anything happened;
 * `lose_answer` does what was asked and then cuts it, the case in which a caller cannot know whether it has paid.
 */
export const PAYMENT_FAILURES = ['none', 'refuse', 'drop', 'lose_answer'] as const;
export type PaymentFailure = (typeof PAYMENT_FAILURES)[number];

export interface PaymentsWorld {
  store: PaymentsStore;
  webhooks: Webhooks;
  now(): number;
  address(): string;
  call(
    request: Pick<Call, 'id' | 'form' | 'requestId' | 'idempotencyKey'> & { apiVersion: string | null },
  ): Call;
  /** Writes the state and lets the webhooks go. */
  changed(): void;
  failure(): PaymentFailure;
  setFailure(failure: PaymentFailure, times: number): void;
  losesAnswer(): boolean;
  isHoldingWebhooks(): boolean;
  holdWebhooks(isHolding: boolean): void;
}
