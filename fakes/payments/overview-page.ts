import { escapeHtml, page } from '../page';
import type { PaymentIntent } from './resources';
import type { PaymentsWorld } from './world';

const SHOWN = 100;

/** What has been paid, what is under way, and what was said to whom; with the buttons a person testing by hand needs. */
export function overviewPage(world: PaymentsWorld): string {
  const { state } = world.store;
  const underWay = Object.keys(state.settlements).length;
  const waiting = state.deliveries.filter((delivery) => delivery.state === 'waiting').length;
  const body = `<h1>Payments of this installation</h1>
<p class="quiet">Amounts ending in .13 are declined, in .17 succeed after a while, in .19 fail after a while; bank accounts always take a while. ${underWay} under way, ${waiting} ${waiting === 1 ? 'message' : 'messages'} waiting to be delivered${world.isHoldingWebhooks() ? ' (held back)' : ''}.</p>
<div>
${button('/control/settle', {}, 'Settle all under way now')}
${button('/control/redeliver', {}, 'Deliver what waits now')}
${world.isHoldingWebhooks() ? button('/control/webhooks', { mode: 'deliver' }, 'Deliver again') : button('/control/webhooks', { mode: 'hold' }, 'Hold messages back')}
</div>
<h2>Payments</h2>${intentTable(world)}
<h2>Messages to the shop's server</h2>${deliveryTable(world)}
<h2>Accounts that receive</h2>${accountTable(world)}`;
  return page({ title: 'Payments', heading: 'Payments', wide: true, body });
}

function intentTable({ store: { state } }: PaymentsWorld): string {
  const intents = Object.values(state.paymentIntents).slice(-SHOWN).reverse();
  if (intents.length === 0) return '<p class="empty">Nothing has been paid yet.</p>';
  const rows = intents.map(
    (intent) => `<tr>
<td class="mono keep">${escapeHtml(intent.id)}</td>
<td class="right mono keep">${amountOf(intent)}</td>
<td>${statusOf(intent)}${intent.last_payment_error ? `<br><span class="caption">${escapeHtml(intent.last_payment_error.message)}</span>` : ''}</td>
<td class="narrow-off">${escapeHtml(accountName(state.accounts, intent.transfer_data?.destination))}</td>
<td class="narrow-off caption">${escapeHtml(
      Object.entries(intent.metadata)
        .map(([key, value]) => `${key} ${value}`)
        .join(', '),
    )}</td>
<td class="mono keep">${timeOf(intent.created)}</td>
<td>${intent.status === 'processing' ? settleButtons(intent) : ''}</td></tr>`,
  );
  return `<table><thead><tr><th>Payment</th><th class="right">Amount</th><th>Now</th><th class="narrow-off">To</th><th class="narrow-off">Note</th><th>Made</th><th>End it</th></tr></thead><tbody>${rows.join('')}</tbody></table>`;
}

function deliveryTable({ store: { state } }: PaymentsWorld): string {
  const deliveries = state.deliveries.slice(-SHOWN).reverse();
  if (deliveries.length === 0) return '<p class="empty">Nothing has happened yet.</p>';
  const rows = deliveries.map((delivery) => {
    const event = state.events[delivery.event];
    return `<tr>
<td>${escapeHtml(event?.type ?? '')}</td>
<td class="mono narrow-off">${escapeHtml(delivery.event)}</td>
<td class="${delivery.state === 'delivered' ? 'ok' : 'quiet'}">${delivery.state.replace('_', ' ')}</td>
<td class="mono">${delivery.attempts} × ${escapeHtml(delivery.lastAnswer ?? 'not sent')}</td>
<td class="mono keep">${timeOf(event?.created ?? 0)}</td>
<td>${button('/control/redeliver', { event: delivery.event }, 'Send again')}</td></tr>`;
  });
  return `<table><thead><tr><th>What happened</th><th class="narrow-off">Message</th><th>State</th><th>Answer</th><th>When</th><th>Repeat</th></tr></thead><tbody>${rows.join('')}</tbody></table>`;
}

function accountTable({ store: { state } }: PaymentsWorld): string {
  const accounts = Object.values(state.accounts);
  if (accounts.length === 0) return '<p class="empty">No processor has been connected yet.</p>';
  const rows = accounts.map(
    (
      account,
    ) => `<tr><td>${escapeHtml(accountName(state.accounts, account.id))}</td><td class="mono">${escapeHtml(account.id)}</td>
<td class="${account.payouts_enabled ? 'ok' : 'quiet'}">${account.payouts_enabled ? 'can receive' : 'not finished'}</td></tr>`,
  );
  return `<table><thead><tr><th>Name</th><th>Account</th><th>State</th></tr></thead><tbody>${rows.join('')}</tbody></table>`;
}

function settleButtons({ id }: PaymentIntent): string {
  return (
    button('/control/settle', { payment_intent: id, outcome: 'succeed' }, 'Let it succeed') +
    button('/control/settle', { payment_intent: id, outcome: 'fail' }, 'Let it fail')
  );
}

function button(action: string, fields: Record<string, string>, label: string): string {
  const hidden = Object.entries(fields).map(
    ([name, value]) => `<input type="hidden" name="${name}" value="${escapeHtml(value)}">`,
  );
  return `<form class="inline" method="post" action="${action}">${hidden.join('')}<button class="small">${label}</button></form> `;
}

function statusOf({ status, last_payment_error: error }: PaymentIntent): string {
  if (status === 'succeeded') return '<span class="ok">paid</span>';
  if (error !== null) return '<span class="bad">refused</span>';
  return escapeHtml(status.replaceAll('_', ' '));
}

function amountOf({ amount, currency }: PaymentIntent): string {
  return `${(amount / 100).toFixed(2)} ${currency.toUpperCase()}`;
}

function accountName(accounts: PaymentsWorld['store']['state']['accounts'], id: string | undefined): string {
  if (id === undefined) return '';
  return accounts[id]?.business_profile.name ?? accounts[id]?.email ?? id;
}

function timeOf(createdSeconds: number): string {
  return new Date(createdSeconds * 1000).toISOString().slice(0, 19).replace('T', ' ');
}
