import type { PaymentMethod } from './resources';
import type { Behaviour } from './store';

interface TestMethod {
  label: string;
  method: Pick<PaymentMethod, 'type' | 'card' | 'us_bank_account'>;
  behaviour: Behaviour;
}

const card = (brand: string, last4: string): TestMethod['method'] => ({
  type: 'card',
  card: { brand, last4, exp_month: 12, exp_year: 2034, funding: 'credit' },
});
const bank = (last4: string): TestMethod['method'] => ({
  type: 'us_bank_account',
  us_bank_account: {
    bank_name: 'Test Bank',
    last4,
    account_holder_type: 'company',
    account_type: 'checking',
  },
});
const declined = (code: string, declineCode: string): Behaviour => ({
  outcome: 'decline',
  code,
  declineCode,
});

/**
 * Methods that behave as told, under the names the real service's test mode gives them.
 *
 * Attaching one to a customer makes a new method with its own id. A bank account never settles at once: it is
 * `processing` first and succeeds or fails later, as in life.
 */
export const TEST_METHODS: Readonly<Record<string, TestMethod>> = {
  pm_usBankAccount_success: {
    label: 'Bank account, pays after a while',
    method: bank('6789'),
    behaviour: { outcome: 'succeed_later' },
  },
  pm_card_visa: {
    label: 'Card, pays at once',
    method: card('visa', '4242'),
    behaviour: { outcome: 'succeed' },
  },
  pm_usBankAccount_accountClosed: {
    label: 'Bank account that turns out to be closed',
    method: bank('1116'),
    behaviour: { outcome: 'fail_later', code: 'payment_method_customer_decline' },
  },
  pm_card_chargeDeclined: {
    label: 'Card that is declined',
    method: card('visa', '0002'),
    behaviour: declined('card_declined', 'generic_decline'),
  },
  pm_card_chargeDeclinedInsufficientFunds: {
    label: 'Card without enough money',
    method: card('visa', '9995'),
    behaviour: declined('card_declined', 'insufficient_funds'),
  },
  pm_card_chargeDeclinedExpiredCard: {
    label: 'Card that has expired',
    method: card('visa', '0069'),
    behaviour: declined('expired_card', 'expired_card'),
  },
  pm_card_authenticationRequired: {
    label: 'Card whose bank wants to ask its owner',
    method: card('visa', '3155'),
    behaviour: declined('authentication_required', 'authentication_required'),
  },
};

const METHOD_OF_NUMBER: Readonly<Record<string, string>> = {
  '4242424242424242': 'pm_card_visa',
  '4000000000000002': 'pm_card_chargeDeclined',
  '4000000000009995': 'pm_card_chargeDeclinedInsufficientFunds',
  '4000000000000069': 'pm_card_chargeDeclinedExpiredCard',
  '4000002500003155': 'pm_card_authenticationRequired',
  '000123456789': 'pm_usBankAccount_success',
  '000111111116': 'pm_usBankAccount_accountClosed',
};

/** By card or account number, for forms that ask for one. */
export function testMethodOfNumber(number: string): string | null {
  return METHOD_OF_NUMBER[number.replace(/\D/g, '')] ?? null;
}

/**
 * Amounts that behave as told whatever the method, so that a demo needs no special card:
 *
 *   …13 is declined (insufficient funds)      …17 is `processing`, succeeds after a while
 *   …19 is `processing`, fails after a while
 *
 * "A while" is FAKE_SETTLE_MS, or until POST /control/settle.
 */
export function behaviourOfAmount(amountMinor: number): Behaviour | null {
  switch (amountMinor % 100) {
    case 13:
      return declined('card_declined', 'insufficient_funds');
    case 17:
      return { outcome: 'succeed_later' };
    case 19:
      return { outcome: 'fail_later', code: 'payment_method_customer_decline' };
    default:
      return null;
  }
}
