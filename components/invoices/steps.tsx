'use client';
import type { ReactNode } from 'react';

import { useClock } from '@/components/session/use-me';
import { StepNumber } from '@/components/ui/frame-number';
import { Section } from '@/components/ui/section';
import { momentWords } from '@/lib/day-words';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { amountText } from '@/lib/money';

import { payableNow } from './compare-rows';
import { InvoiceActions } from './invoice-actions';

interface Step {
  key: string;
  says: string;
  who: string;
  state: 'done' | 'here' | 'later';
}

/** What is left to do, in its order, and the one thing that can be done now. */
export function Steps({ invoice }: { invoice: InvoiceDetail }) {
  const clock = useClock();
  if (invoice.state === 'refused') return <InvoiceActions invoice={invoice} />;
  return (
    <Section title="Then">
      <ol>
        {stepsOf(invoice, (at) => momentWords(new Date(at), clock)).map((step, at) => (
          <StepLine key={step.key} number={at + 1} step={step}>
            {step.says}
          </StepLine>
        ))}
      </ol>
      <InvoiceActions invoice={invoice} />
    </Section>
  );
}

function StepLine({ number, step, children }: { number: number; step: Step; children: ReactNode }) {
  return (
    <li className="grid grid-cols-[26px_1fr_auto] items-center gap-x-2.5 border-b border-rule py-2">
      <StepNumber number={number} state={step.state === 'done' ? 'done' : 'open'} />
      <div>
        <strong>{children}</strong>
        <div className="text-second text-quiet">{step.who}</div>
      </div>
      {step.state === 'here' && <strong className="font-cond text-held-ink">here</strong>}
    </li>
  );
}

function stepsOf(invoice: InvoiceDetail, at: (moment: string) => string): Step[] {
  const { state, approved, secondApproved, secondApprovalAboveMinor: above, differences, payments } = invoice;
  const sum = payableNow(invoice);
  const open = differences.filter((one) => one.clearance === null).length;
  const here = (...states: InvoiceDetail['state'][]): Step['state'] =>
    states.includes(state) ? 'here' : 'later';
  const paid = payments.find((payment) => payment.state === 'succeeded');
  const clear: Step = {
    key: 'clear',
    says: clearWords(differences.length, open),
    who: 'office',
    state: open === 0 ? 'done' : here('to_clear'),
  };
  const first: Step = {
    key: 'approve',
    says: `Approve ${amountText(sum)}`,
    who: approved ? `${approved.by}, ${at(approved.at)}` : 'office',
    state: approved ? 'done' : here('to_approve'),
  };
  const second: Step = {
    key: 'second',
    says: 'Approve a second time',
    who: secondApproved
      ? `${secondApproved.by}, ${at(secondApproved.at)}`
      : `an admin, another person: over ${amountText(above ?? 0)} two people`,
    state: secondApproved ? 'done' : here('second_approval'),
  };
  const pay: Step = {
    key: 'pay',
    says: 'Pay and send the remittance',
    who: paid?.endedAt ? `${paid.by}, ${at(paid.endedAt)}` : 'from the saved method, once and only once',
    state: state === 'paid' ? 'done' : here('to_pay', 'paying', 'payment_failed'),
  };
  return [clear, first, ...(above !== null && sum > above ? [second] : []), pay];
}

function clearWords(all: number, open: number): string {
  if (all === 0) return 'No difference to clear';
  return open === 0
    ? `${all} ${all === 1 ? 'difference' : 'differences'} cleared`
    : `Clear ${open} ${open === 1 ? 'difference' : 'differences'}`;
}
