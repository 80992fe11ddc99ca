/**
 * The things the payment service keeps, in the field names of its wire format and only as far as they are spoken here.
 * Amounts are minor units, times are seconds since 1970, as on the wire.
 */
export type Metadata = Record<string, string>;

interface Resource {
  id: string;
  created: number;
  livemode: false;
  metadata: Metadata;
}

export interface Account extends Resource {
  object: 'account';
  type: string;
  country: string;
  default_currency: string;
  email: string | null;
  business_profile: { name: string | null };
  charges_enabled: boolean;
  payouts_enabled: boolean;
  details_submitted: boolean;
  capabilities: Record<string, 'active' | 'inactive' | 'pending'>;
  requirements: { currently_due: string[]; past_due: string[]; disabled_reason: string | null };
  external_accounts: {
    object: 'list';
    data: { id: string; object: 'bank_account'; bank_name: string; last4: string }[];
    has_more: false;
    url: string;
  };
}

export interface Customer extends Resource {
  object: 'customer';
  name: string | null;
  email: string | null;
  description: string | null;
  invoice_settings: { default_payment_method: string | null };
}

export interface PaymentMethod extends Resource {
  object: 'payment_method';
  type: 'card' | 'us_bank_account';
  customer: string | null;
  billing_details: { name: string | null; email: string | null };
  card?: { brand: string; last4: string; exp_month: number; exp_year: number; funding: string };
  us_bank_account?: { bank_name: string; last4: string; account_holder_type: string; account_type: string };
}

export interface SetupIntent extends Resource {
  object: 'setup_intent';
  status: 'requires_payment_method' | 'requires_confirmation' | 'succeeded' | 'canceled';
  customer: string | null;
  payment_method: string | null;
  usage: string;
  client_secret: string;
}

export interface CheckoutSession extends Resource {
  object: 'checkout.session';
  mode: 'setup';
  status: 'open' | 'complete' | 'expired';
  customer: string | null;
  client_reference_id: string | null;
  setup_intent: string;
  success_url: string;
  cancel_url: string | null;
  expires_at: number;
  url: string | null;
}

export interface PaymentError {
  type: 'card_error' | 'invalid_request_error';
  code: string;
  decline_code?: string;
  message: string;
}

export interface PaymentIntent extends Resource {
  object: 'payment_intent';
  amount: number;
  amount_received: number;
  currency: string;
  status: 'requires_payment_method' | 'requires_confirmation' | 'processing' | 'succeeded' | 'canceled';
  customer: string | null;
  payment_method: string | null;
  payment_method_types: string[];
  description: string | null;
  latest_charge: string | null;
  last_payment_error: PaymentError | null;
  transfer_data: { destination: string; amount?: number } | null;
  transfer_group: string | null;
  application_fee_amount: number | null;
  canceled_at: number | null;
  cancellation_reason: string | null;
  client_secret: string;
}

export interface Charge extends Resource {
  object: 'charge';
  amount: number;
  amount_refunded: number;
  currency: string;
  status: 'succeeded' | 'pending' | 'failed';
  paid: boolean;
  captured: boolean;
  refunded: boolean;
  customer: string | null;
  payment_intent: string;
  payment_method: string;
  failure_code: string | null;
  failure_message: string | null;
  transfer: string | null;
  transfer_data: { destination: string; amount?: number } | null;
}

export interface Transfer extends Resource {
  object: 'transfer';
  amount: number;
  amount_reversed: number;
  reversed: boolean;
  currency: string;
  destination: string;
  source_transaction: string | null;
  transfer_group: string | null;
  description: string | null;
}

export interface Refund extends Resource {
  object: 'refund';
  amount: number;
  currency: string;
  status: 'succeeded';
  charge: string;
  payment_intent: string;
  reason: string | null;
  transfer_reversal: string | null;
}

export interface PaymentEvent {
  id: string;
  object: 'event';
  api_version: string;
  created: number;
  livemode: false;
  type: string;
  data: { object: object };
  account?: string;
  pending_webhooks: number;
  request: { id: string | null; idempotency_key: string | null };
}
