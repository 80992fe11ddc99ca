'use client';
import { usePages } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Segments } from '@/components/ui/segments';
import { INVOICE_VIEWS, listInvoices, type InvoiceView } from '@/lib/invoices/contract';

import { InvoiceRows } from './invoice-rows';

const VIEW_WORDS: Record<InvoiceView, string> = {
  open: 'Open',
  paid: 'Paid',
  refused: 'Refused',
  all: 'All',
};
const NONE: Record<InvoiceView, { says: string; comes: string }> = {
  open: {
    says: 'No invoice asks for anything.',
    comes:
      'A processor sends its invoice from the link in the dispatch mail; one that came on paper or by mail is taken up here.',
  },
  paid: {
    says: 'No invoice is paid yet.',
    comes: 'It stands here when the payment service says that the money has moved.',
  },
  refused: { says: 'No invoice was refused.', comes: 'A refused one stays here with its reason.' },
  all: {
    says: 'No invoice has come yet.',
    comes:
      'A processor sends its invoice from the link in the dispatch mail; one that came on paper or by mail is taken up here.',
  },
};

/** What asks to be entered, cleared, approved or paid; then what is done with. */
export function InvoicesScreen({ show }: { show: InvoiceView }) {
  const mayEnter = useMay('invoice.enter');
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listInvoices, {
    show,
  });
  const rows = data?.pages.flatMap((page) => page.rows) ?? [];
  return (
    <>
      <PageHead
        title="Invoices"
        actions={mayEnter && <ButtonLink href="/invoices/new">Take up an invoice</ButtonLink>}
      />
      <div className="pb-3">
        <Segments
          label="Show"
          items={INVOICE_VIEWS.map((view) => ({
            says: VIEW_WORDS[view],
            current: view === show,
            href: view === 'open' ? '/invoices' : `/invoices?show=${view}`,
          }))}
        />
      </div>
      {isPending && <Loading label="Loading invoices" rows={8} />}
      {error && <Failing says="The invoices could not be read." again={error.message} />}
      {data && rows.length === 0 && <Empty {...NONE[show]} />}
      {rows.length > 0 && <InvoiceRows rows={rows} label={`Invoices, ${VIEW_WORDS[show].toLowerCase()}`} />}
      {hasNextPage && (
        <div className="pt-3">
          <Button
            size="small"
            busy={isFetchingNextPage}
            busyLabel="Reading on"
            onClick={() => fetchNextPage().then(() => undefined)}
          >
            Show more
          </Button>
        </div>
      )}
    </>
  );
}
