'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProvider, useForm, useWatch } from 'react-hook-form';

import { showOnForm } from '@/components/api/show-on-form';
import { useRead, useWrite } from '@/components/api/use-api';
import { FileUpload } from '@/components/files/file-upload';
import { useClock, useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { TextArea } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Pieces } from '@/components/ui/pieces';
import { BatchTag } from '@/components/ui/tag';
import { TitleCells } from '@/components/ui/title-cells';
import { PROCESS_WORDS } from '@/lib/trade/process';
import { countIn, getReceiving, listReceipts } from '@/lib/receipts/contract';

import { CountForm, countOf, emptyCount, sumsOf, type CountFormIn, type CountFormOut } from './count-form';
import { LineCounters } from './line-counters';

/** Counts one batch in, at the bench or at the door. */
export function CountScreen({ batchId }: { batchId: string }) {
  const clock = useClock();
  const { data } = useRead(getReceiving, { batchId });
  const mayCount = useMay('receipt.count');
  const { batch, lines } = data;
  const away = lines.reduce((sum, line) => sum + line.away, 0);
  const cells = [
    { caption: 'From', value: batch.processor },
    { caption: 'Order', value: <span className="num">{batch.orderNumber}</span> },
    { caption: 'Process', value: PROCESS_WORDS[batch.process] },
    { caption: 'Back so far', value: <Pieces count={batch.piecesBack} of={batch.pieces} /> },
    ...(batch.shippedAt
      ? [{ caption: 'Said to be on its way', value: <Moment at={new Date(batch.shippedAt)} clock={clock} /> }]
      : []),
  ];
  return (
    <>
      <h1 className="sr-only">Count in {batch.number}</h1>
      <PageHead
        tag={<BatchTag stage={batch.stage} number={batch.number} size="head" href={`/batches/${batch.id}`} />}
        cells={<TitleCells cells={cells} />}
      />
      {batch.shippedNote && <p className="pb-2">The processor says: {batch.shippedNote}</p>}
      {batch.dispatchedAt === null && (
        <Empty
          says={`${batch.number} has not left yet.`}
          comes="Nothing of it can come back."
          action={
            <ButtonLink look="word" href={`/batches/${batch.id}`}>
              To the batch
            </ButtonLink>
          }
        />
      )}
      {batch.dispatchedAt !== null && away === 0 && (
        <Empty
          says="All of it is back."
          comes="Nothing is left to count; what is found over can still be noted."
          action={
            <ButtonLink look="word" href={`/batches/${batch.id}`}>
              To the batch
            </ButtonLink>
          }
        />
      )}
      {batch.dispatchedAt !== null && mayCount && <Counting key={data.receipts} batchId={batchId} />}
      {!mayCount && <p className="text-quiet">Leads and inspectors count in.</p>}
    </>
  );
}

function Counting({ batchId }: { batchId: string }) {
  const router = useRouter();
  const { batch, lines } = useRead(getReceiving, { batchId }).data;
  const [photos, setPhotos] = useState<readonly string[]>([]);
  const [sending, setSending] = useState(false);
  const form = useForm<CountFormIn, unknown, CountFormOut>({
    resolver: zodResolver(CountForm),
    defaultValues: emptyCount(lines),
  });
  const write = useWrite(countIn, { refreshes: [getReceiving, listReceipts] });
  const sums = sumsOf(useWatch({ control: form.control, name: 'lines' }));
  const submit = form.handleSubmit(async (values) => {
    const done = await write
      .mutateAsync(countOf(values, { batchId, lines, photos }), { onError: showOnForm(form) })
      .catch(() => null);
    if (!done) return;
    const counted = sums.good + sums.damaged;
    const held =
      done.nonconformances.length > 0
        ? ` ${done.nonconformances.map((one) => one.number).join(', ')} opened.`
        : '';
    showMessage({ says: `${counted} counted in.${held}` });
    router.push(`/batches/${batch.id}`);
  });
  const { errors, isSubmitting } = form.formState;
  const isEmpty = Object.values(sums).every((sum) => sum === 0);
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={submit} aria-label={`Count of ${batch.number}`}>
        {lines.map((line, at) => (
          <LineCounters key={line.id} line={line} at={at} />
        ))}
        <div className="grid grid-cols-1 gap-x-gutter gap-y-4 border-t-heavy border-ink pt-4 md:grid-cols-2">
          <FileUpload
            purpose="photo"
            batchId={batchId}
            label="Photos"
            hint="Of the packing, of damage, of a label"
            multiple
            camera
            onArrived={(file) => setPhotos((now) => [...now, file.id])}
            onRemoved={(file) => setPhotos((now) => now.filter((id) => id !== file.id))}
            onUnderWay={setSending}
          />
          <TextArea label="Note" rows={2} maxLength={500} {...form.register('note')} />
        </div>
        <div className="sticky bottom-0 z-10 mt-4 flex flex-wrap items-center gap-x-6 gap-y-2 border-t-heavy border-ink bg-paper py-3 max-md:bottom-[60px]">
          <Button
            look="primary"
            size="big"
            type="submit"
            busy={isSubmitting}
            busyLabel="Counting in"
            notNow={(isEmpty && 'Count what is here first.') || (sending && 'A photo is still on its way.')}
            className="max-md:w-full"
          >
            {isEmpty ? 'Count in' : `Count in ${sums.good + sums.damaged}`}
          </Button>
          <p className={isEmpty ? 'sr-only' : 'text-second'} aria-live="polite">
            <strong className="num">{sums.good}</strong> good,{' '}
            <strong className={`num ${sums.damaged > 0 ? 'text-held-ink' : ''}`}>{sums.damaged}</strong>{' '}
            damaged, <strong className={`num ${sums.short > 0 ? 'text-held-ink' : ''}`}>{sums.short}</strong>{' '}
            short, <strong className="num">{sums.over}</strong> over
          </p>
          {errors.root && (
            <p role="alert" className="font-medium text-held-ink">
              {errors.root.message}
            </p>
          )}
        </div>
      </form>
    </FormProvider>
  );
}
