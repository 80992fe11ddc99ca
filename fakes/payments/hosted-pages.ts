import type { IncomingMessage, ServerResponse } from 'node:http';
import { answerHtml, answerWith, redirectTo } from '../answer';
import { escapeHtml, page } from '../page';
import { readBody } from '../read-body';
import { completeOnboarding } from './accounts';
import type { Call } from './call';
import { completeCheckout } from './setup-intents';
import { TEST_METHODS } from './test-methods';
import type { PaymentsWorld } from './world';

/** The page behind an onboarding link: a processor says where its money is to go. */
export async function serveOnboarding(
  world: PaymentsWorld,
  token: string,
  { request, response }: Exchange,
): Promise<void> {
  const link = world.store.state.onboardingLinks[token];
  if (link === undefined) return answerGone(response);
  if (link.isUsed || link.expiresAt < world.now()) return redirectTo(response, link.refreshUrl);
  if (request.method !== 'POST')
    return answerHtml(
      response,
      onboardingPage(world.store.state.accounts[link.account]?.business_profile.name ?? ''),
    );

  const form = new URLSearchParams(await readBody(request));
  const number = (form.get('account_number') ?? '').replace(/\D/g, '');
  if (number.length < 4)
    return answerHtml(
      response,
      onboardingPage(form.get('name') ?? '', 'An account number has at least four digits.'),
    );
  link.isUsed = true;
  completeOnboarding(callFor(world), link.account, {
    name: form.get('bank') || 'Test Bank',
    last4: number.slice(-4),
  });
  world.changed();
  redirectTo(response, link.returnUrl);
}

/** The page behind a setup session: the office says how the shop pays. */
export async function serveCheckout(
  world: PaymentsWorld,
  sessionId: string,
  { request, response }: Exchange,
): Promise<void> {
  const session = world.store.state.sessions[sessionId];
  if (session === undefined || session.status !== 'open') return answerGone(response);
  if (request.method !== 'POST') return answerHtml(response, checkoutPage(session.cancel_url));

  const method = new URLSearchParams(await readBody(request)).get('method') ?? '';
  if (!(method in TEST_METHODS)) return answerHtml(response, checkoutPage(session.cancel_url));
  completeCheckout(callFor(world), session, method);
  world.changed();
  redirectTo(response, session.success_url.replace('{CHECKOUT_SESSION_ID}', session.id));
}

interface Exchange {
  request: IncomingMessage;
  response: ServerResponse;
}

function callFor(world: PaymentsWorld): Call {
  return world.call({ id: '', form: {}, requestId: null, idempotencyKey: null, apiVersion: null });
}

function onboardingPage(name: string, problem = ''): string {
  return page({
    title: 'Receive payments',
    heading: 'Payments',
    body: `<h1>Where your money goes</h1>
<p class="quiet">This page stands in for the payment service's own. Any numbers will do; none are kept but the last four digits.</p>
${problem ? `<p class="bad" role="alert">${escapeHtml(problem)}</p>` : ''}
<form class="stack" method="post">
<label>Name of the business<input name="name" required value="${escapeHtml(name)}"></label>
<label>Bank<input name="bank" required value="Test Bank"></label>
<label>Account number<input name="account_number" required inputmode="numeric" value="000123456789"></label>
<div><button class="primary">Receive payments here</button></div>
</form>`,
  });
}

function checkoutPage(cancelUrl: string | null): string {
  const options = Object.entries(TEST_METHODS).map(
    ([id, { label }]) => `<option value="${id}">${escapeHtml(label)}</option>`,
  );
  return page({
    title: 'Save a payment method',
    heading: 'Payments',
    body: `<h1>How you pay</h1>
<p class="quiet">This page stands in for the payment service's own. Choose a method by what it is to do.</p>
<form class="stack" method="post">
<label>Method<select name="method">${options.join('')}</select></label>
<div><button class="primary">Save this method</button></div>
</form>${cancelUrl === null ? '' : `<p><a href="${escapeHtml(cancelUrl)}">Go back without saving</a></p>`}`,
  });
}

function answerGone(response: ServerResponse): void {
  const html = page({
    title: 'Link used',
    heading: 'Payments',
    body: '<h1>This link has been used or has expired</h1><p>Go back to where you came from and ask for a new one.</p>',
  });
  answerWith(response, { status: 410, type: 'text/html; charset=utf-8', body: html });
}
