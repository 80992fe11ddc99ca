import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { InvoicesScreen } from '@/components/invoices/invoices-screen';
import { INVOICE_VIEWS, type InvoiceView } from '@/lib/invoices/contract';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Invoices' };

export default async function InvoicesPage({ searchParams }: { searchParams: Promise<{ show?: string }> }) {
  const { show } = await searchParams;
  return (
    <Prefetched queries={[ask(getMeEndpoint, {})]}>
      <InvoicesScreen show={isView(show) ? show : 'open'} />
    </Prefetched>
  );
}

const isView = (given: string | undefined): given is InvoiceView => INVOICE_VIEWS.some((view) => view === given);
