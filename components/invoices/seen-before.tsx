import Link from 'next/link';

import { CheckMark, VerdictMark } from '@/components/ui/marks';
import { Section } from '@/components/ui/section';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { amountText } from '@/lib/money';

import { invoiceName } from './invoice-words';

type Why = InvoiceDetail['seenBefore'][number]['why'];

/** Sums at a lot minimum repeat; the rest is a number. */
const MOST_NAMED = 3;

/** Whether this may be an invoice that was here already, said either way. */
export function SeenBefore({ invoice }: { invoice: InvoiceDetail }) {
  const { number, processor, orderNumber, totalMinor, file } = invoice;
  const checks: { why: Why; met: string; found: string }[] = [
    {
      why: 'same_number',
      met: `Number ${number ?? ''} is new from ${processor}`,
      found: `Number ${number ?? ''} was here before`,
    },
    {
      why: 'same_order',
      met: `No other invoice names ${orderNumber}`,
      found: `${orderNumber} has another invoice`,
    },
    {
      why: 'same_total',
      met: `No other with ${amountText(totalMinor ?? 0)} in 90 days`,
      found: `Another with ${amountText(totalMinor ?? 0)} in 90 days`,
    },
    ...(file
      ? [{ why: 'same_file' as const, met: 'The file is new', found: 'The same file came before' }]
      : []),
  ];
  return (
    <Section title="Seen before?">
      <ul className="flex flex-wrap gap-x-7 gap-y-1.5 pt-2 text-second">
        {checks.map(({ why, met, found }) => (
          <Check
            key={why}
            met={met}
            found={found}
            others={invoice.seenBefore.filter((one) => one.why === why)}
          />
        ))}
      </ul>
    </Section>
  );
}

function Check({ met, found, others }: { met: string; found: string; others: InvoiceDetail['seenBefore'] }) {
  if (others.length === 0) {
    return (
      <li className="flex items-center gap-1.5">
        <VerdictMark verdict="meets" size={13} className="text-proved-ink" />
        {met}
      </li>
    );
  }
  return (
    <li className="flex items-center gap-1.5">
      <CheckMark level="warn" size={15} />
      <span>
        <span className="sr-only">warns: </span>
        <strong>{found}</strong>:{' '}
        {others.slice(0, MOST_NAMED).map((one, at) => (
          <span key={one.id}>
            {at > 0 && ', '}
            <Link href={`/invoices/${one.id}`}>{invoiceName(one)}</Link> for {one.batchNumber}
          </span>
        ))}
        {others.length > MOST_NAMED && ` and ${others.length - MOST_NAMED} more`}
      </span>
    </li>
  );
}
