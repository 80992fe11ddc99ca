import { z } from 'zod';
import { listOf, mustFind, newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import { expand, metadata, readParams } from './form';
import { invalid } from './payment-fault';
import type { Account } from './resources';

const LINK_LIFE_MS = 5 * 60_000;

const AccountParams = z.strictObject({
  type: z.string().optional(),
  country: z.string().length(2).optional(),
  email: z.string().optional(),
  default_currency: z.string().length(3).optional(),
  business_type: z.string().optional(),
  business_profile: z.object({ name: z.string().optional() }).optional(),
  company: z.object({ name: z.string().optional() }).optional(),
  controller: z.record(z.string(), z.unknown()).optional(),
  capabilities: z.record(z.string(), z.object({ requested: z.string() })).optional(),
  metadata: metadata.optional(),
  expand: expand.optional(),
});

/** A connected account. It can receive nothing until somebody has gone through its onboarding link. */
export function createAccount(call: Call): Account {
  const params = readParams(AccountParams, call.form);
  const id = newPaymentId('acct').replace('acct_1', 'acct_1F');
  const requested = Object.keys(params.capabilities ?? { transfers: true });
  const account: Account = {
    id,
    object: 'account',
    created: seconds(call),
    livemode: false,
    type: params.type ?? 'express',
    country: params.country ?? 'US',
    default_currency: params.default_currency ?? 'usd',
    email: params.email ?? null,
    business_profile: { name: params.business_profile?.name ?? params.company?.name ?? null },
    charges_enabled: false,
    payouts_enabled: false,
    details_submitted: false,
    capabilities: Object.fromEntries(requested.map((name) => [name, 'inactive' as const])),
    requirements: {
      currently_due: ['external_account', 'tos_acceptance.date'],
      past_due: [],
      disabled_reason: 'requirements.past_due',
    },
    external_accounts: {
      object: 'list',
      data: [],
      has_more: false,
      url: `/v1/accounts/${id}/external_accounts`,
    },
    metadata: params.metadata ?? {},
  };
  call.state.accounts[id] = account;
  return account;
}

export function getAccount(call: Call): Account {
  return mustFind(call.state.accounts, call.id, 'account');
}

export function updateAccount(call: Call): Account {
  const params = readParams(AccountParams, call.form);
  const account = getAccount(call);
  account.email = params.email ?? account.email;
  account.business_profile.name = params.business_profile?.name ?? account.business_profile.name;
  account.metadata = { ...account.metadata, ...params.metadata };
  emitEvent(call, 'account.updated', account, account.id);
  return account;
}

export function listAccounts(call: Call) {
  return listOf(call.state.accounts, call.form, '/v1/accounts');
}

const LinkParams = z.strictObject({
  account: z.string(),
  type: z.enum(['account_onboarding', 'account_update']),
  return_url: z.url(),
  refresh_url: z.url(),
  collect: z.string().optional(),
  collection_options: z.record(z.string(), z.string()).optional(),
  expand: expand.optional(),
});

/** Good once and for five minutes; afterwards it sends its visitor to the refresh address, which is to make a new one. */
export function createAccountLink(call: Call) {
  const params = readParams(LinkParams, call.form);
  mustFind(call.state.accounts, params.account, 'account', 'account');
  const token = newPaymentId('acl');
  const expiresAt = call.nowMs + LINK_LIFE_MS;
  call.state.onboardingLinks[token] = {
    account: params.account,
    returnUrl: params.return_url,
    refreshUrl: params.refresh_url,
    expiresAt,
    isUsed: false,
  };
  return {
    object: 'account_link',
    created: seconds(call),
    expires_at: Math.floor(expiresAt / 1000),
    url: `${call.address}/onboarding/${token}`,
  };
}

/** What the hosted page does when its form is sent. */
export function completeOnboarding(
  call: Call,
  accountId: string,
  bank: { name: string; last4: string },
): Account {
  const account = mustFind(call.state.accounts, accountId, 'account');
  account.details_submitted = true;
  account.charges_enabled = true;
  account.payouts_enabled = true;
  account.capabilities = Object.fromEntries(
    Object.keys(account.capabilities).map((name) => [name, 'active' as const]),
  );
  account.requirements = { currently_due: [], past_due: [], disabled_reason: null };
  account.external_accounts.data = [
    { id: newPaymentId('ba'), object: 'bank_account', bank_name: bank.name, last4: bank.last4 },
  ];
  emitEvent(call, 'account.updated', account, account.id);
  return account;
}

/** Whether money may be sent there; refuses as the real service does when onboarding is not finished. */
export function mustReceiveTransfers(call: Call, accountId: string, param: string): void {
  const account = mustFind(call.state.accounts, accountId, 'destination', param);
  if (account.capabilities['transfers'] !== 'active') {
    throw invalid(
      'Your destination account needs to have at least one of the following capabilities enabled: transfers, crypto_transfers, legacy_payments',
      { code: 'insufficient_capabilities_for_transfer', param },
    );
  }
}
