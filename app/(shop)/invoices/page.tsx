import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { InvoicesScreen } from '@/components/invoices/invoices-screen';
import { INVOICE_VIEWS, type InvoiceView } from '@/lib/invoices/contract';
import { listInvoicesEndpoint } from '@/lib/invoices/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Invoices' };

export default async function InvoicesPage({ searchParams }: { searchParams: Promise<{ show?: string }> }) {
  const given = (await searchParams).show;
  const show = isView(given) ? given : 'open';
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(listInvoicesEndpoint, { show })]}>
      <InvoicesScreen show={show} />
    </Prefetched>
  );
}

const isView = (given: string | undefined): given is InvoiceView =>
  INVOICE_VIEWS.some((view) => view === given);
