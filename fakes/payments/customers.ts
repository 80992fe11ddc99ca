import { z } from 'zod';
import { listOf, mustFind, newPaymentId, seconds } from './call';
import type { Call } from './call';
import { emitEvent } from './emit-event';
import { expand, metadata, readParams } from './form';
import { methodForCustomer } from './payment-methods';
import type { Customer } from './resources';

const CustomerParams = z.strictObject({
  name: z.string().optional(),
  email: z.string().optional(),
  description: z.string().optional(),
  metadata: metadata.optional(),
  payment_method: z.string().optional(),
  invoice_settings: z.strictObject({ default_payment_method: z.string().optional() }).optional(),
  expand: expand.optional(),
});

export function createCustomer(call: Call): Customer {
  const params = readParams(CustomerParams, call.form);
  const customer: Customer = {
    id: newPaymentId('cus'),
    object: 'customer',
    created: seconds(call),
    livemode: false,
    name: params.name ?? null,
    email: params.email ?? null,
    description: params.description ?? null,
    metadata: params.metadata ?? {},
    invoice_settings: { default_payment_method: null },
  };
  call.state.customers[customer.id] = customer;
  if (params.payment_method !== undefined) methodForCustomer(call, params.payment_method, customer.id);
  emitEvent(call, 'customer.created', customer);
  return customer;
}

export function getCustomer(call: Call): Customer {
  return mustFind(call.state.customers, call.id, 'customer');
}

export function updateCustomer(call: Call): Customer {
  const params = readParams(CustomerParams, call.form);
  const customer = getCustomer(call);
  const method = params.invoice_settings?.default_payment_method;
  if (method !== undefined)
    mustFind(call.state.paymentMethods, method, 'payment_method', 'invoice_settings[default_payment_method]');

  customer.name = params.name ?? customer.name;
  customer.email = params.email ?? customer.email;
  customer.description = params.description ?? customer.description;
  customer.metadata = { ...customer.metadata, ...params.metadata };
  if (method !== undefined) customer.invoice_settings.default_payment_method = method;
  emitEvent(call, 'customer.updated', customer);
  return customer;
}

export function listCustomers(call: Call) {
  return listOf(call.state.customers, call.form, '/v1/customers');
}
