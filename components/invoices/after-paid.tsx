'use client';
import Link from 'next/link';

import { useLazyRead } from '@/components/api/use-api';
import { Section } from '@/components/ui/section';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { getGate } from '@/lib/stock/contract';

/** What the payment lets go on. */
export function AfterPaid({ invoice }: { invoice: InvoiceDetail }) {
  const { data: gate } = useLazyRead(getGate, { batchId: invoice.batchId });
  const accepted = invoice.order.lines.reduce((sum, line) => sum + line.accepted, 0);
  if (invoice.state === 'refused' || accepted === 0) return null;
  const mayPass = (gate?.lines ?? []).reduce((sum, line) => sum + line.mayPass, 0);
  const isPaid = invoice.state === 'paid';
  const pieces = isPaid && gate ? mayPass : accepted;
  // Everything that was paid for has gone on already.
  if (pieces === 0) return null;
  return (
    <Section title={isPaid ? 'Now' : 'After it is paid'}>
      <p className="py-1.5 text-second">
        <strong className="num">{pieces}</strong> {pieces === 1 ? 'piece' : 'pieces'} may go to stock
        {(gate?.assemblies ?? []).map((assembly) => (
          <span key={assembly.name}>
            ; <strong>{assembly.name}</strong> has <strong className="num">{assembly.ready}</strong> of{' '}
            {assembly.needed}
          </span>
        ))}
        .
      </p>
      <Link href={`/batches/${invoice.batchId}/release`} className="font-cond text-word">
        Release to stock
      </Link>
    </Section>
  );
}
