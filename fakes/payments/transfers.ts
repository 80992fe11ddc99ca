import { z } from 'zod';
import { mustReceiveTransfers } from './accounts';
import { listOf, mustFind, newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import { expand, metadata, readParams, wholeNumber } from './form';
import type { Transfer } from './resources';

const CreateParams = z.strictObject({
  amount: wholeNumber,
  currency: z.string().length(3),
  destination: z.string(),
  source_transaction: z.string().optional(),
  transfer_group: z.string().optional(),
  description: z.string().optional(),
  metadata: metadata.optional(),
  expand: expand.optional(),
});

export function createTransfer(call: Call): Transfer {
  const params = readParams(CreateParams, call.form);
  mustReceiveTransfers(call, params.destination, 'destination');
  const transfer: Transfer = {
    id: newPaymentId('tr'),
    object: 'transfer',
    created: seconds(call),
    livemode: false,
    amount: params.amount,
    amount_reversed: 0,
    reversed: false,
    currency: params.currency.toLowerCase(),
    destination: params.destination,
    source_transaction: params.source_transaction ?? null,
    transfer_group: params.transfer_group ?? null,
    description: params.description ?? null,
    metadata: params.metadata ?? {},
  };
  call.state.transfers[transfer.id] = transfer;
  emitEvent(call, 'transfer.created', transfer);
  return transfer;
}

export function getTransfer(call: Call): Transfer {
  return mustFind(call.state.transfers, call.id, 'transfer');
}

export function listTransfers(call: Call) {
  const { destination } = call.form;
  const own = Object.entries(call.state.transfers).filter(
    ([, transfer]) => destination === undefined || transfer.destination === destination,
  );
  return listOf(Object.fromEntries(own), call.form, '/v1/transfers');
}
