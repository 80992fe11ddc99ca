import { and, eq, sql } from 'drizzle-orm';
import { describe, expect, test } from 'vitest';

import { moneyEntries, paymentEvents, payments } from '@/db/schema/money';
import { shops } from '@/db/schema/organisations';
import { approveInvoice, approveInvoiceSecond } from '@/lib/invoices/approve-invoice';
import { creditInvoice } from '@/lib/invoices/credit-invoice';
import { enterInvoice } from '@/lib/invoices/enter-invoice';
import { payInvoice } from '@/lib/invoices/pay-invoice';
import { getInvoice } from '@/lib/invoices/queries';
import { refuseInvoice } from '@/lib/invoices/refuse-invoice';
import { waivePayment } from '@/lib/invoices/waive-payment';
import type { JobTools } from '@/lib/jobs/job';
import {
  createOnboardingLink,
  createPaymentMethodLink,
  refundPayment,
  savePaymentMethod,
} from '@/lib/payments/payments';

import { makeBatch } from '../../factories/batches';
import {
  ALL,
  changeProcessor,
  changeShop,
  entering,
  makeApprovedInvoice,
  makeColleague,
  makeProvedBatch,
  pieceLine,
  takeUp,
} from '../../factories/invoices';
import { lastAudit, stageNow } from '../../factories/standing';
import { makeWorld, type World } from '../../factories/world';
import { openDatabase } from '../open-database';
import { openPaymentService } from './payment-service';

const base = openDatabase();
const service = openPaymentService(base);

/** An approved invoice of one piece, so that its price is the sum that is paid. */
async function setUp(amountMinor = 28_240, method?: string) {
  const world = await makeWorld(base.db, base.owner);
  const ready = await service.makeReady(world, method);
  return {
    world,
    ...ready,
    ...(await makeApprovedInvoice(world, base.owner, { pieces: 1, unitPriceMinor: amountMinor })),
  };
}

const pay = (world: World, { invoiceId, version }: { invoiceId: string; version: number }) =>
  world.as(['office'], (ctx) => payInvoice(ctx, { invoiceId, version }));
const read = (world: World, invoiceId: string) =>
  world.as(['office'], (ctx) => getInvoice(ctx, { invoiceId }));
const until = (world: World, invoiceId: string, state: string) =>
  service.workUntil(async () => expect((await read(world, invoiceId)).state).toBe(state));
const entriesOf = async (invoiceId: string) =>
  (await base.owner.select().from(moneyEntries).where(eq(moneyEntries.invoiceId, invoiceId))).map(
    ({ kind, amountMinor }) => [kind, amountMinor],
  );
const remittances = async (invoiceNumber: string | null) =>
  (
    await base.owner.execute<{ data: { to: string[]; props: Record<string, unknown> } }>(
      sql`select data from pgboss.job where name = 'send-mail' and data->>'template' = 'remittance' and data->'props'->>'invoiceNumber' = ${invoiceNumber}`,
    )
  ).rows;
const eventsOf = (intentId: string | undefined) =>
  base.owner
    .select()
    .from(paymentEvents)
    .where(sql`${paymentEvents.payload}->'data'->'object'->>'id' = ${intentId}`);

describe('an approved invoice', () => {
  test('is paid once: the ledger, the batch, the trail and the remittance all say so, once the webhook has said it', async () => {
    const { world, invoiceId, version, batch, intents, account } = await setUp();
    await service.control('webhooks', { mode: 'hold' });
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    expect(await read(world, invoiceId)).toMatchObject({
      state: 'paying',
      balanceMinor: 28_240,
      payments: [{ attempt: 1, state: 'pending', handedOver: true }],
    });

    await service.control('webhooks', { mode: 'deliver' });
    await until(world, invoiceId, 'paid');
    const paid = await read(world, invoiceId);
    expect(paid).toMatchObject({ balanceMinor: 0, payments: [{ state: 'succeeded', by: 'Test Person' }] });
    expect(await intents()).toMatchObject([
      {
        amount: 28_240,
        status: 'succeeded',
        transfer_data: { destination: account },
        metadata: { invoice_id: invoiceId },
      },
    ]);
    expect(await entriesOf(invoiceId)).toEqual([
      ['invoiced', 28_240],
      ['paid', -28_240],
    ]);
    const [mail] = await remittances(paid.number);
    expect(mail?.data.to).toEqual([`desk-${world.processorId}@processor.test`]);
    expect(mail?.data.props).toMatchObject({
      paidMinor: 28_240,
      lines: [{ says: 'Rib clip', amountMinor: 28_240 }],
      stage: 'settled',
    });
    await world.as(['lead'], async (ctx) => {
      expect(await stageNow(ctx, batch.id)).toBe('settled');
      expect(await lastAudit(ctx, 'invoice.paid')).toMatchObject({ entityId: invoiceId, actorKind: 'job' });
      expect(await lastAudit(ctx, 'invoice.pay')).toMatchObject({
        actorName: 'Test Person',
        after: { approvedAndPaidBySamePerson: true },
      });
    });
    await expect(pay(world, { invoiceId, version })).rejects.toMatchObject({
      code: 'conflict',
      message: 'It is paid. Nothing is left to pay.',
    });
  });

  test('pressed twice at once is paid once', async () => {
    const { world, invoiceId, version, intents } = await setUp();
    const outcomes = await Promise.allSettled([
      pay(world, { invoiceId, version }),
      pay(world, { invoiceId, version }),
    ]);
    expect(outcomes.map((one) => one.status).sort()).toEqual(['fulfilled', 'rejected']);
    expect(outcomes.find((one) => one.status === 'rejected')).toMatchObject({ reason: { code: 'conflict' } });
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
    expect(await intents()).toHaveLength(1);
  });

  test('may not be paid by a lead, by another shop, before approval, or once refused', async () => {
    const { world, invoiceId, version } = await setUp();
    const stranger = await makeWorld(base.db, base.owner);
    await expect(
      world.as(['lead', 'inspector'], (ctx) => payInvoice(ctx, { invoiceId, version })),
    ).rejects.toMatchObject({ code: 'not_allowed' });
    await expect(pay(stranger, { invoiceId, version })).rejects.toMatchObject({ code: 'not_found' });
    await expect(
      world.as(['office'], (ctx) => refuseInvoice(ctx, { invoiceId, version, reason: 'too late' })),
    ).rejects.toMatchObject({ code: 'conflict' });

    const batch = await makeProvedBatch(world, base.owner);
    const other = await takeUp(world, batch.id);
    await expect(pay(world, { ...other, version: 1 })).rejects.toMatchObject({
      code: 'conflict',
      message: 'This invoice is not approved yet.',
    });
    await world.as(['office'], (ctx) =>
      refuseInvoice(ctx, { invoiceId: other.invoiceId, version: 1, reason: 'not ours' }),
    );
    await expect(pay(world, { ...other, version: 2 })).rejects.toMatchObject({ code: 'conflict' });
  });

  test('says what is missing: a way to pay, or where the processor is paid', async () => {
    const { world, invoiceId, version } = await setUp();
    await changeProcessor(base.owner, world, { payoutsReady: false });
    await expect(pay(world, { invoiceId, version })).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('cannot be paid yet') as string,
    });
    await changeShop(base.owner, world, { stripePaymentMethodId: null });
    await expect(pay(world, { invoiceId, version })).rejects.toMatchObject({
      code: 'conflict',
      message: expect.stringContaining('Settings, Payments') as string,
    });
    expect(await read(world, invoiceId)).toMatchObject({
      payable: { methodSaved: false, processorReady: false },
    });
  });

  test('that is more than the limit waits for a second person', async () => {
    const { world, invoiceId, version } = await setUp();
    await changeShop(base.owner, world, { secondApprovalAboveMinor: 25_000 });
    await expect(pay(world, { invoiceId, version })).rejects.toMatchObject({ code: 'conflict' });
    await expect(
      world.as(['admin'], (ctx) => approveInvoiceSecond(ctx, { invoiceId, version })),
    ).rejects.toMatchObject({ code: 'not_allowed' });
    const colleague = await makeColleague(world, base.owner);
    await expect(
      colleague.as(['office'], (ctx) => approveInvoiceSecond(ctx, { invoiceId, version })),
    ).rejects.toMatchObject({ code: 'not_allowed' });
    const second = await colleague.as(['admin'], (ctx) => approveInvoiceSecond(ctx, { invoiceId, version }));
    expect(await read(world, invoiceId)).toMatchObject({
      state: 'to_pay',
      secondApproved: { by: 'Second Person' },
    });
    await pay(world, { invoiceId, version: second.version });
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
  });

  test('is not paid by who approved it where the shop refuses that, but by another', async () => {
    const { world, invoiceId, version } = await setUp();
    await changeShop(base.owner, world, { approvalAndPayment: 'refuse' });
    await expect(pay(world, { invoiceId, version })).rejects.toMatchObject({
      code: 'not_allowed',
      message: expect.stringContaining('another person pays') as string,
    });
    expect((await read(world, invoiceId)).payable.otherHands).toBe(true);
    const colleague = await makeColleague(world, base.owner);
    await colleague.as(['office'], (ctx) => payInvoice(ctx, { invoiceId, version }));
    await world.as(['office'], async (ctx) =>
      expect((await lastAudit(ctx, 'invoice.pay'))?.after).not.toHaveProperty('approvedAndPaidBySamePerson'),
    );
  });
});

describe('a payment that does not go through', () => {
  test('at once: the office sees why, and pays again with another method on the same intent', async () => {
    const { world, invoiceId, version, customer, intents } = await setUp(28_240, 'pm_card_chargeDeclined');
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    expect(await read(world, invoiceId)).toMatchObject({
      state: 'payment_failed',
      balanceMinor: 28_240,
      payments: [{ state: 'failed', failure: 'Your card was declined.' }],
    });
    const paymentMethod = await savePaymentMethod(
      { customer, paymentMethod: 'pm_card_visa' },
      service.opened.stripe,
    );
    await changeShop(base.owner, world, { stripePaymentMethodId: paymentMethod });
    await pay(world, { invoiceId, version });
    // The news of the first attempt is still unread: it must not speak for the second.
    await until(world, invoiceId, 'paying');
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
    expect(await read(world, invoiceId)).toMatchObject({
      payments: [
        { attempt: 2, state: 'succeeded' },
        { attempt: 1, state: 'failed' },
      ],
    });
    expect(await intents()).toHaveLength(1);
    expect(await entriesOf(invoiceId)).toEqual([
      ['invoiced', 28_240],
      ['paid', -28_240],
    ]);
  });

  test('by its amount (…13): declined again, twice, and never more than one intent', async () => {
    const { world, invoiceId, version, intents } = await setUp(28_213);
    for (const attempt of [1, 2]) {
      await pay(world, { invoiceId, version });
      await service.sendPayments();
      await until(world, invoiceId, 'payment_failed');
      expect((await read(world, invoiceId)).payments[0]).toMatchObject({
        attempt,
        state: 'failed',
        failure: 'Your card has insufficient funds.',
      });
    }
    expect(await intents()).toHaveLength(1);
  });

  test('later (…19): it was being paid, then it was not', async () => {
    const { world, invoiceId, version, intents } = await setUp(28_219);
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    await until(world, invoiceId, 'paying');
    const [intent] = await intents();
    await service.control('settle', { payment_intent: intent?.id });
    await until(world, invoiceId, 'payment_failed');
    expect((await read(world, invoiceId)).payments[0]?.failure).toMatch(/has been closed/);
    expect(await remittances((await read(world, invoiceId)).number)).toEqual([]);
  });

  test('because the account cannot receive after all: told as the service says it, and paid when it can', async () => {
    const { world, invoiceId, version, intents, account } = await setUp();
    await changeProcessor(base.owner, world, { stripeAccountId: 'acct_of_nobody' });
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    expect((await read(world, invoiceId)).payments[0]).toMatchObject({
      state: 'failed',
      failure: expect.stringContaining('No such destination') as string,
    });
    await changeProcessor(base.owner, world, { stripeAccountId: account });
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
    expect(await intents()).toHaveLength(1);
  });

  test('and a credit before the second attempt: the old sum can never be paid beside the new one', async () => {
    const { world, invoiceId, version, customer, intents } = await setUp(28_240, 'pm_card_chargeDeclined');
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    const credited = await world.as(['office'], (ctx) =>
      creditInvoice(ctx, { invoiceId, version, amountMinor: 1_240, reference: 'CR-12' }),
    );
    await expect(
      world.as(['office'], (ctx) =>
        creditInvoice(ctx, { invoiceId, version: credited.version, amountMinor: 1, reference: 'cr 12' }),
      ),
    ).rejects.toMatchObject({ code: 'conflict' });
    await expect(
      world.as(['office'], (ctx) =>
        creditInvoice(ctx, { invoiceId, version: credited.version, amountMinor: 27_001, reference: 'CR-13' }),
      ),
    ).rejects.toMatchObject({ code: 'bad_input' });
    await changeShop(base.owner, world, {
      stripePaymentMethodId: await savePaymentMethod(
        { customer, paymentMethod: 'pm_card_visa' },
        service.opened.stripe,
      ),
    });
    await pay(world, { invoiceId, version: credited.version });
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
    expect((await intents()).map(({ amount, status }) => [amount, status])).toEqual([
      [27_000, 'succeeded'],
      [28_240, 'canceled'],
    ]);
    const [mail] = await remittances((await read(world, invoiceId)).number);
    expect(mail?.data.props).toMatchObject({
      paidMinor: 27_000,
      lines: [{ amountMinor: 28_240 }, { says: 'Your credits', amountMinor: -1_240 }],
    });
  });
});

describe('a payment that takes a while', () => {
  test('(…17) is paid when it comes, however often and in whatever order the news comes', async () => {
    const { world, invoiceId, version, intents } = await setUp(28_217);
    await service.control('webhooks', { mode: 'hold' });
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    const [intent] = await intents();
    await service.control('settle', { payment_intent: intent?.id });
    await service.control('redeliver', { order: 'reverse' });
    await until(world, invoiceId, 'paid');
    const heard = await eventsOf(intent?.id);
    expect(heard.map((event) => event.type)).toContain('payment_intent.processing');
    for (const { id } of heard) await service.control('redeliver', { event: id });
    // Worked again although it was worked: as after a crash before the mark was set.
    await base.owner.update(paymentEvents).set({ workedAt: null });
    await base.owner.execute(
      sql`update pgboss.job set state = 'created', completed_on = null, start_after = now() where name = 'work-payment-event' and state = 'completed'`,
    );
    await until(world, invoiceId, 'paid');
    expect(await eventsOf(intent?.id)).toHaveLength(heard.length);
    expect(await entriesOf(invoiceId)).toEqual([
      ['invoiced', 28_217],
      ['paid', -28_217],
    ]);
    expect(await remittances((await read(world, invoiceId)).number)).toHaveLength(1);
  });

  test('of which no news ever comes is looked at by itself', async () => {
    const { world, invoiceId, version } = await setUp();
    await service.control('webhooks', { mode: 'hold' });
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    expect((await read(world, invoiceId)).state).toBe('paying');
    await service.hurry('work-payment-event');
    await until(world, invoiceId, 'paid');
  });

  test.each(['wrong_secret', 'tampered', 'old', 'unsigned'])(
    'is not believed by a message whose signature is %s',
    async (how) => {
      const { world, invoiceId, version, intents } = await setUp();
      await service.control('webhooks', { mode: 'hold' });
      await pay(world, { invoiceId, version });
      await service.sendPayments();
      expect(await service.control('forge', { how })).toMatchObject({ answer: '400' });
      const [intent] = await intents();
      expect(await eventsOf(intent?.id)).toEqual([]);
      await until(world, invoiceId, 'paying');
    },
  );
});

describe('nothing happens twice', () => {
  test('when the answer is lost: the next try finds what was made', async () => {
    const { world, invoiceId, version, intents } = await setUp();
    await service.control('webhooks', { mode: 'hold' });
    await service.control('', { fail: 'lose_answer', times: 3 });
    await pay(world, { invoiceId, version });
    expect((await service.sendPayments())[0]?.error).toMatchObject({ code: 'unavailable' });
    expect(await read(world, invoiceId)).toMatchObject({
      state: 'paying',
      payments: [{ handedOver: false }],
    });
    await service.hurry('pay-invoice');
    expect((await service.sendPayments())[0]?.error).toBeNull();
    await service.control('webhooks', { mode: 'deliver' });
    await until(world, invoiceId, 'paid');
    expect(await intents()).toHaveLength(1);
  });

  test('while the service is away: the payment waits and goes when it is back', async () => {
    const { world, invoiceId, version, intents } = await setUp();
    await service.control('', { fail: 'refuse' });
    await pay(world, { invoiceId, version });
    expect((await service.sendPayments())[0]?.error).toMatchObject({ code: 'unavailable' });
    await service.control('', { fail: 'none' });
    await service.hurry('pay-invoice');
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
    expect(await intents()).toHaveLength(1);
  });

  test.each([
    ['paid', 28_240],
    ['payment_failed', 28_213],
  ])('when the worker dies between making the intent and writing it down (%s)', async (end, amountMinor) => {
    const { world, invoiceId, version, intents } = await setUp(amountMinor);
    await service.control('webhooks', { mode: 'hold' });
    const { paymentId } = await pay(world, { invoiceId, version });
    const { rows } = await base.owner.execute<{ data: unknown }>(
      sql`select data from pgboss.job where name = 'pay-invoice' and data->>'paymentId' = ${paymentId}`,
    );
    let transactions = 0;
    const dying: JobTools = {
      attempt: 1,
      gaveUp: null,
      now: () => new Date(),
      atDoor: () => Promise.reject(new Error('not asked for')),
      inShop: (_, work) => {
        transactions += 1;
        if (transactions > 1) return Promise.reject(new Error('killed'));
        return world.as(ALL, (ctx) =>
          work({ ...ctx, actor: { kind: 'job', name: 'pay-invoice', roles: [] } }),
        );
      },
    };
    await expect(service.opened.payJob.run(dying, rows[0]?.data)).rejects.toThrow('killed');
    expect(await read(world, invoiceId)).toMatchObject({
      state: 'paying',
      payments: [{ handedOver: false }],
    });

    expect((await service.sendPayments())[0]?.error).toBeNull();
    await service.control('webhooks', { mode: 'deliver' });
    await until(world, invoiceId, end);
    expect(await intents()).toHaveLength(1);
    expect((await read(world, invoiceId)).payments).toHaveLength(1);
  });

  test('when the news is faster than the worker: it finds the attempt by what the intent carries', async () => {
    const { world, invoiceId, version, intents } = await setUp();
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    // As if the worker had died before it wrote the intent down.
    await base.owner
      .update(payments)
      .set({ intentId: null })
      .where(and(eq(payments.invoiceId, invoiceId), eq(payments.state, 'pending')));
    await until(world, invoiceId, 'paid');
    expect(await service.sendPayments()).toEqual([]);
    expect(await intents()).toHaveLength(1);
  });
});

describe('money that comes back', () => {
  test('is owed again, by what came back and not more', async () => {
    const { world, invoiceId, version, batch, intents } = await setUp();
    await pay(world, { invoiceId, version });
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
    const [intent] = await intents();
    const refund = (amountMinor: number) =>
      refundPayment(
        {
          intentId: intent?.id ?? '',
          amountMinor,
          idempotencyKey: `refund-${amountMinor}-${invoiceId}`,
          metadata: {},
        },
        service.opened.stripe,
      );
    await refund(240);
    await until(world, invoiceId, 'to_pay');
    await refund(28_000);
    await service.workUntil(async () =>
      expect(await read(world, invoiceId)).toMatchObject({
        balanceMinor: 28_240,
        payments: [{ state: 'refunded' }],
      }),
    );
    expect(await world.as(['lead'], (ctx) => stageNow(ctx, batch.id))).toBe('proved');

    await pay(world, { invoiceId, version });
    await service.sendPayments();
    await until(world, invoiceId, 'paid');
    expect(await intents()).toHaveLength(2);
  });
});

describe('settings that come by webhook', () => {
  test('the method saved last on the service’s page is the shop’s', async () => {
    const { world, customer } = await setUp();
    await changeShop(base.owner, world, { stripePaymentMethodId: null });
    const page = await createPaymentMethodLink(
      {
        customer,
        successUrl: 'http://localhost:5600/settings/payments',
        cancelUrl: 'http://localhost:5600/settings/payments',
      },
      service.opened.stripe,
    );
    await service.visit(page, { method: 'pm_card_visa' });
    await service.workUntil(async () => {
      const [shop] = await base.owner.select().from(shops).where(eq(shops.id, world.shopId));
      expect(shop?.stripePaymentMethodId).toMatch(/^pm_/);
    });
    expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'shop.save_paying_method'))).toMatchObject({
      entityId: world.shopId,
    });
  });

  test('a processor that has said where its money goes can be paid', async () => {
    const { world, invoiceId } = await setUp();
    const { account } = await service.makeReady(world);
    await changeProcessor(base.owner, world, { payoutsReady: false });
    const url = await createOnboardingLink(
      { account, returnUrl: 'http://localhost:5600/back', refreshUrl: 'http://localhost:5600/again' },
      service.opened.stripe,
    );
    await service.visit(url, {
      name: 'Cedar Hollow Plating',
      bank: 'Test Bank',
      account_number: '000123456789',
    });
    await service.workUntil(async () =>
      expect((await read(world, invoiceId)).payable.processorReady).toBe(true),
    );
    expect(await world.as(['admin'], (ctx) => lastAudit(ctx, 'processor.payouts'))).toMatchObject({
      entityId: world.processorId,
      after: { canBePaid: true },
    });
  });
});

describe('a waiver', () => {
  test('lets the pieces pass with a reason, and leaves what is owed', async () => {
    const { world, invoiceId, batch } = await setUp();
    const waive = (as: World, reason = 'agreed with the processor') =>
      as.as(['office'], (ctx) => waivePayment(ctx, { batchId: batch.id, reason }));
    await expect(
      world.as(['inspector'], (ctx) => waivePayment(ctx, { batchId: batch.id, reason: 'because' })),
    ).rejects.toMatchObject({ code: 'not_allowed' });
    await expect(waive(await makeWorld(base.db, base.owner))).rejects.toMatchObject({ code: 'not_found' });
    await waive(world);
    await world.as(['lead'], async (ctx) => {
      expect(await stageNow(ctx, batch.id)).toBe('settled');
      expect(await lastAudit(ctx, 'batch.waive_payment')).toMatchObject({
        entityId: batch.id,
        after: { reason: 'agreed with the processor' },
      });
    });
    expect((await read(world, invoiceId)).balanceMinor).toBe(28_240);
    await expect(waive(world)).rejects.toMatchObject({ code: 'conflict' });
    const building = await world.as(['lead'], (ctx) => makeBatch(ctx, world.processorId));
    await expect(
      world.as(['office'], (ctx) => waivePayment(ctx, { batchId: building.id, reason: 'because' })),
    ).rejects.toMatchObject({ code: 'conflict' });
  });
});

test('an invoice that asks for nothing after its credit or its differences is settled without a payment', async () => {
  const world = await makeWorld(base.db, base.owner);
  const batch = await makeProvedBatch(world, base.owner);
  const { invoiceId, lineId } = await takeUp(world, batch.id);
  await world.as(['office'], (ctx) =>
    enterInvoice(ctx, entering(invoiceId, [pieceLine(lineId, 10, 0)], { totalMinor: 0 })),
  );
  await world.as(['office'], (ctx) => approveInvoice(ctx, { invoiceId, version: 2 }));
  expect(await read(world, invoiceId)).toMatchObject({ state: 'paid', balanceMinor: 0 });
  expect(await world.as(['lead'], (ctx) => stageNow(ctx, batch.id))).toBe('settled');
});
