'use client';
import { useState } from 'react';

import { useLazyRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { listInvoices } from '@/lib/invoices/contract';

import { InvoiceRows } from './invoice-rows';
import { TakeUp } from './take-up';
import { WaivePayment } from './waive-payment';

/** The invoices of one batch, on its page, and what may be done where none is paid. */
export function InvoicesSection({ batchId, dispatched }: { batchId: string; dispatched: boolean }) {
  const mayEnter = useMay('invoice.enter');
  const [open, setOpen] = useState(false);
  const { data, error, isPending } = useLazyRead(listInvoices, { batchId, limit: 200 });
  const rows = data?.rows ?? [];
  return (
    <Section id="invoices" title="Invoices" note={rows.length > 0 ? rows.length : undefined}>
      {isPending && <Loading rows={2} label="Loading invoices" />}
      {error && <Failing says="The invoices could not be read." again={error.message} />}
      {data && rows.length === 0 && (
        <Empty
          says="No invoice yet."
          comes={
            dispatched
              ? 'The processor sends it from its page; one that came on paper is taken up here.'
              : 'It comes after the batch has left.'
          }
        />
      )}
      {rows.length > 0 && <InvoiceRows rows={rows} label="Invoices of this batch" ofOneBatch />}
      {dispatched && mayEnter && !open && (
        <div className="flex flex-wrap gap-x-5 pt-2">
          <Button look="word" onClick={() => setOpen(true)}>
            Take up an invoice
          </Button>
        </div>
      )}
      {open && <TakeUp batchId={batchId} />}
      {dispatched && <WaivePayment batchId={batchId} />}
    </Section>
  );
}
