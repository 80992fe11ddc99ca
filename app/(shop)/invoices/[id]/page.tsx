import type { Metadata } from 'next';

import { ask, Prefetched } from '@/app/_kit/prefetch';
import { InvoiceScreen } from '@/components/invoices/invoice-screen';
import { getInvoiceEndpoint } from '@/lib/invoices/endpoints';
import { getMeEndpoint } from '@/lib/session/endpoints';

export const metadata: Metadata = { title: 'Invoice' };

interface InvoicePageProps {
  params: Promise<{ id: string }>;
  searchParams: Promise<{ enter?: string }>;
}

export default async function InvoicePage({ params, searchParams }: InvoicePageProps) {
  const [{ id }, { enter }] = await Promise.all([params, searchParams]);
  return (
    <Prefetched queries={[ask(getMeEndpoint, {}), ask(getInvoiceEndpoint, { invoiceId: id })]}>
      <InvoiceScreen invoiceId={id} entering={enter === '1'} />
    </Prefetched>
  );
}
