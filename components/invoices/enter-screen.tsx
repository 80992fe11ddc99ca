'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { FormProvider, useForm, type FieldPath } from 'react-hook-form';

import { PageViewer } from '@/components/certificates/page-viewer';
import { Thread } from '@/components/certificates/thread';
import { useClock } from '@/components/session/use-me';
import { Moment } from '@/components/ui/day';
import { PageHead } from '@/components/ui/page-head';
import { BatchTag } from '@/components/ui/tag';
import type { InvoiceDetail } from '@/lib/invoices/contract';

import { EnterForm } from './enter-form';
import { EnterValues, startingValues, type EnterIn, type EnterOut } from './enter-values';
import { useInvoiceSpots } from './use-invoice-spots';

/** Fields that take words of the page as they stand there. */
const TAKES_WORDS = /number$|description$|pieces$|Minor$/;

/** Without a currency's sign or a unit that stands close to it. */
const IS_FIGURE = /pieces$|Minor$/;

/** The page as it was received, and beside it what it says. */
export function EnterScreen({ invoice }: { invoice: InvoiceDetail }) {
  const clock = useClock();
  const form = useForm<EnterIn, unknown, EnterOut>({
    resolver: zodResolver(EnterValues),
    defaultValues: startingValues(invoice),
  });
  const spots = useInvoiceSpots(invoice.id, form);
  const { selected } = spots;
  const { file } = invoice;
  // Only names of the form's own fields are ever chosen.
  const toField = (field: string) => form.setFocus(field as FieldPath<EnterIn>);
  const putWords = (words: string) => {
    if (selected === null) return;
    const typed = IS_FIGURE.test(selected) ? words.replace(/[^\d.,-]/g, '') : words;
    form.setValue(selected as FieldPath<EnterIn>, typed, { shouldDirty: true, shouldValidate: true });
    toField(selected);
  };
  return (
    <FormProvider {...form}>
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
              read={{
                pages: spots.read?.pages ?? [],
                onDrawn: spots.onDrawn,
                spots: spots.spots,
                selected,
                numberOf: null,
                onRow: toField,
                onWords: selected !== null && TAKES_WORDS.test(selected) ? putWords : null,
              }}
            />
          </div>
        )}
        <div className="min-w-0">
          <EnterForm invoice={invoice} spots={spots} />
        </div>
        {file && <Thread row={selected} drawn={spots.drawn} />}
      </div>
    </FormProvider>
  );
}
