import { mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import type {
  Account,
  Charge,
  CheckoutSession,
  Customer,
  PaymentEvent,
  PaymentIntent,
  PaymentMethod,
  Refund,
  SetupIntent,
  Transfer,
} from './resources';

/** What a saved method does when it is charged; the public object does not show it, as a real card does not either. */
export interface Behaviour {
  outcome: 'succeed' | 'decline' | 'succeed_later' | 'fail_later';
  code?: string;
  declineCode?: string;
}

export interface OnboardingLink {
  account: string;
  returnUrl: string;
  refreshUrl: string;
  expiresAt: number;
  isUsed: boolean;
}

/** The answer to a request with an idempotency key, given again word for word when the request comes again. */
export interface SavedAnswer {
  fingerprint: string;
  status: number;
  body: unknown;
  at: number;
}

export interface Delivery {
  event: string;
  attempts: number;
  nextAtMs: number;
  state: 'waiting' | 'delivered' | 'given_up';
  lastAnswer: string | null;
}

export interface PaymentsState {
  accounts: Record<string, Account>;
  customers: Record<string, Customer>;
  paymentMethods: Record<string, PaymentMethod>;
  setupIntents: Record<string, SetupIntent>;
  sessions: Record<string, CheckoutSession>;
  paymentIntents: Record<string, PaymentIntent>;
  charges: Record<string, Charge>;
  transfers: Record<string, Transfer>;
  refunds: Record<string, Refund>;
  events: Record<string, PaymentEvent>;
  onboardingLinks: Record<string, OnboardingLink>;
  behaviours: Record<string, Behaviour>;
  /** Payments under way, and how and when each will end. */
  settlements: Record<string, { outcome: 'succeed' | 'fail'; atMs: number }>;
  answers: Record<string, SavedAnswer>;
  deliveries: Delivery[];
}

export interface PaymentsStore {
  state: PaymentsState;
  /** Whole or not at all, before the caller gets its answer: what was answered must still be true after a SIGKILL. */
  save(): void;
  reset(): void;
}

export function openPaymentsStore(file: string): PaymentsStore {
  mkdirSync(path.dirname(path.resolve(file)), { recursive: true });
  const store: PaymentsStore = {
    state: { ...emptyState(), ...readState(file) },
    save: () => {
      writeFileSync(`${file}.partial`, JSON.stringify(store.state));
      renameSync(`${file}.partial`, file);
    },
    reset: () => {
      store.state = emptyState();
      store.save();
    },
  };
  return store;
}

function readState(file: string): Partial<PaymentsState> {
  try {
    return JSON.parse(readFileSync(file, 'utf8')) as Partial<PaymentsState>;
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return {};
    throw new Error(
      `${file} is not readable as payments state: ${error instanceof Error ? error.message : String(error)}`,
    );
  }
}

function emptyState(): PaymentsState {
  return {
    accounts: {},
    customers: {},
    paymentMethods: {},
    setupIntents: {},
    sessions: {},
    paymentIntents: {},
    charges: {},
    transfers: {},
    refunds: {},
    events: {},
    onboardingLinks: {},
    behaviours: {},
    settlements: {},
    answers: {},
    deliveries: [],
  };
}
