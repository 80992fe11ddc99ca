import fc from 'fast-check';
import Stripe from 'stripe';
import { describe, expect, test } from 'vitest';
import { parseForm } from '@/fakes/payments/form';
import { signWebhook } from '@/fakes/payments/sign-webhook';
import { behaviourOfAmount } from '@/fakes/payments/test-methods';

describe('the bracketed form of the payment interface', () => {
  test.each([
    ['amount=1', { amount: '1' }],
    [
      'transfer_data[destination]=acct_1&metadata[a b]=c',
      { transfer_data: { destination: 'acct_1' }, metadata: { 'a b': 'c' } },
    ],
    ['expand[0]=a&expand[1]=b.c', { expand: ['a', 'b.c'] }],
    ['expand[]=a&expand[]=b', { expand: ['a', 'b'] }],
    ['a[b][0][c]=1', { a: { b: [{ c: '1' }] } }],
    ['a=1%2B1+2', { a: '1+1 2' }],
    ['', {}],
  ])('%s is read as the client meant it', (encoded, expected) => {
    expect(parseForm(encoded)).toEqual(expected);
  });

  test('cannot reach the prototype of anything', () => {
    parseForm('__proto__[polluted]=yes&a[__proto__][polluted]=yes');
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
  });
});

test.each([
  [41_213, 'decline'],
  [41_217, 'succeed_later'],
  [41_219, 'fail_later'],
  [41_250, undefined],
  [1_300, undefined],
])('an amount of %i behaves as documented', (amount, outcome) => {
  expect(behaviourOfAmount(amount)?.outcome).toBe(outcome);
});

test('whatever is signed is accepted by the real client, and nothing else is', () => {
  const { webhooks } = new Stripe('sk_test_local');
  const at = Math.floor(Date.now() / 1000);
  fc.assert(
    fc.property(fc.string(), fc.string({ minLength: 1 }), (note, secret) => {
      // The client trims what it is given as a secret.
      fc.pre(secret.trim() === secret);
      const body = JSON.stringify({ id: 'evt_1', object: 'event', note });
      const header = signWebhook(body, secret, at);
      expect(webhooks.constructEvent(body, header, secret)).toMatchObject({ note });
      expect(() => webhooks.constructEvent(`${body} `, header, secret)).toThrow();
      expect(() => webhooks.constructEvent(body, header, `${secret}x`)).toThrow();
    }),
  );
});
