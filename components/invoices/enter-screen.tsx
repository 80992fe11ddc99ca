'use client';
import { PageViewer } from '@/components/certificates/page-viewer';
import { useClock } from '@/components/session/use-me';
import { Moment } from '@/components/ui/day';
import { PageHead } from '@/components/ui/page-head';
import { BatchTag } from '@/components/ui/tag';
import type { InvoiceDetail } from '@/lib/invoices/contract';

import { EnterForm } from './enter-form';

/** The page as it was received, and beside it what it says. */
export function EnterScreen({ invoice }: { invoice: InvoiceDetail }) {
  const clock = useClock();
  const { file } = invoice;
  return (
    <>
      <PageHead
        tag={
          <BatchTag stage={invoice.stage} number={invoice.batchNumber} href={`/batches/${invoice.batchId}`} />
        }
        title={invoice.number === null ? 'Enter the invoice' : `Enter invoice ${invoice.number} again`}
        sub={
          <>
            {invoice.processor}, order <span className="num">{invoice.orderNumber}</span>. The lines stand as
            ordered; change what the paper says otherwise.
          </>
        }
      />
      <div className={`grid grid-cols-1 gap-x-gutter gap-y-6 ${file ? 'lg:grid-cols-2' : 'max-w-3xl'}`}>
        {file && (
          <div className="min-w-0 lg:sticky lg:top-2 lg:flex lg:h-[calc(100dvh-9rem)] [&>*]:flex-1">
            <PageViewer
              file={file}
              title="As received"
              facts={
                <span className="text-quiet">
                  from {invoice.sentBy}, <Moment at={new Date(invoice.createdAt)} clock={clock} />
                </span>
              }
            />
          </div>
        )}
        <div className="min-w-0">
          <EnterForm invoice={invoice} />
        </div>
      </div>
    </>
  );
}
