import { endpoint, endpointInSteps } from '@/lib/api/endpoint';

import * as contract from './contract';
import { askMethodWords, getPayingMethod, linkPayingMethod, makeMethodPage } from './paying-method';
import { getPayoutAccount, linkPayoutAccount, makeAccountPage } from './payout-account';
import { receivePaymentEvent } from './receive-payment-event';

export const receivePaymentEventEndpoint = endpoint(contract.receivePaymentEvent, receivePaymentEvent);
export const getPayingMethodEndpoint = endpointInSteps(contract.getPayingMethod, {
  outside: askMethodWords,
  run: getPayingMethod,
});
export const linkPayingMethodEndpoint = endpointInSteps(contract.linkPayingMethod, {
  outside: makeMethodPage,
  run: linkPayingMethod,
});
export const getPayoutAccountEndpoint = endpoint(contract.getPayoutAccount, getPayoutAccount);
export const linkPayoutAccountEndpoint = endpointInSteps(contract.linkPayoutAccount, {
  outside: makeAccountPage,
  run: linkPayoutAccount,
});
