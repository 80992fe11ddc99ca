'use client';
import { useClock } from '@/components/session/use-me';
import { Section } from '@/components/ui/section';
import { dayWords } from '@/lib/day-words';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { amountText } from '@/lib/money';

import { payableNow } from './compare-rows';

interface Step {
  says: string;
  minor: number;
  open?: boolean;
}

/** From what is asked to what is paid, each step with its reason. */
export function MayBePaid({ invoice }: { invoice: InvoiceDetail }) {
  const clock = useClock();
  const { approved, balanceMinor, currency, dueOn, state } = invoice;
  const left = approved === null ? payableNow(invoice) : Math.max(0, balanceMinor);
  return (
    <Section title="What may be paid">
      <table className="w-full text-row">
        <tbody>
          {stepsOf(invoice).map((step, at) => (
            <tr key={at} className={step.open ? 'text-held-ink' : ''}>
              <td className="border-b border-rule py-[5px]">
                {step.says} {step.open && <span className="text-source">(to clear)</span>}
              </td>
              <td className="num border-b border-rule py-[5px] text-right whitespace-nowrap">
                {step.minor < 0 ? `− ${amountText(-step.minor)}` : amountText(step.minor)}
              </td>
            </tr>
          ))}
          <tr>
            <th
              scope="row"
              className="border-t-heavy border-ink py-1.5 text-left font-cond text-[1.1875rem] font-bold"
            >
              {state === 'paid' ? 'Left to pay' : 'To pay'}, {currency}
            </th>
            <td className="border-t-heavy border-ink py-1.5 text-right font-mono text-[1.4375rem] font-semibold whitespace-nowrap">
              {amountText(left)}
            </td>
          </tr>
        </tbody>
      </table>
      {dueOn && state !== 'paid' && state !== 'refused' && (
        <p className="pt-0.5 text-second text-quiet">due {dayWords(dueOn, clock)}</p>
      )}
    </Section>
  );
}

function stepsOf(invoice: InvoiceDetail): Step[] {
  const off = invoice.differences
    .filter((one) => one.overMinor > 0 && one.clearance?.choice !== 'accept')
    .map((one) => ({
      says: `${lower(one.sentence)}${one.seq === null ? '' : `, line ${one.seq}`}`,
      minor: -one.overMinor,
      open: one.clearance === null,
    }));
  const moved = invoice.entries
    .filter((entry) => entry.kind !== 'invoiced' && entry.kind !== 'withheld')
    .map((entry) => ({ says: MOVED[entry.kind], minor: entry.amountMinor }));
  return [{ says: 'Invoiced', minor: invoice.totalMinor ?? 0 }, ...off, ...moved];
}

const MOVED = {
  invoiced: 'Invoiced',
  withheld: 'Left out',
  credited: 'Credited',
  paid: 'Paid',
  refunded: 'Came back',
};

const lower = (sentence: string): string =>
  sentence.slice(0, 1).toLowerCase() + sentence.slice(1).replace(/\.$/, '');
