'use client';
import { useQueryClient } from '@tanstack/react-query';
import Link from 'next/link';
import { useEffect, useRef } from 'react';

import { useLazyRead, useRead } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { useClock, useMay } from '@/components/session/use-me';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide } from '@/components/ui/section';
import { BatchTag } from '@/components/ui/tag';
import { listAudit } from '@/lib/audit/contract';
import { dayWords, momentWords } from '@/lib/day-words';
import { getInvoice, listInvoices, type InvoiceDetail } from '@/lib/invoices/contract';
import { getGate } from '@/lib/stock/contract';

import { AfterPaid } from './after-paid';
import { CompareTable } from './compare-table';
import { EnterScreen } from './enter-screen';
import { MayBePaid } from './may-be-paid';
import { MoneyRule } from './money-rule';
import { SeenBefore } from './seen-before';
import { Steps } from './steps';

const EVERY_MS = 2_000;

/** One invoice: entered beside its page, then held against order and accepted pieces until it is paid. */
export function InvoiceScreen({ invoiceId, entering }: { invoiceId: string; entering: boolean }) {
  const { data: invoice } = useRead(getInvoice, { invoiceId });
  const mayEnter = useMay('invoice.enter');
  useFollowed(invoice);
  if (
    mayEnter &&
    invoice.approved === null &&
    invoice.state !== 'refused' &&
    (entering || invoice.state === 'to_enter')
  )
    return <EnterScreen key={invoice.version} invoice={invoice} />;
  return (
    <>
      <InvoiceHead invoice={invoice} mayEnter={mayEnter} />
      {invoice.totalMinor === null ? (
        <>
          <Empty
            says="Nothing is entered yet."
            comes={
              invoice.state === 'refused'
                ? 'It was refused as it came.'
                : 'The office enters what it says; then it is held against the order.'
            }
          />
          <Steps invoice={invoice} />
        </>
      ) : (
        <>
          <MainAndSide
            wide
            main={
              <>
                <div>
                  <MoneyRule invoice={invoice} />
                  <CompareTable invoice={invoice} />
                </div>
                <SeenBefore invoice={invoice} />
              </>
            }
            side={
              <>
                <MayBePaid invoice={invoice} />
                <Steps invoice={invoice} />
                <AfterPaid invoice={invoice} />
              </>
            }
          />
          <div className="pt-6">
            <History entity="invoice" id={invoice.id} title="What was done" />
          </div>
        </>
      )}
    </>
  );
}

/** While it is being paid it is asked for again and again; when that ends, so is what hangs on it. */
function useFollowed({ id, state }: InvoiceDetail): void {
  const cache = useQueryClient();
  const before = useRef(state);
  useLazyRead(getInvoice, { invoiceId: id }, { enabled: state === 'paying', refreshEveryMs: EVERY_MS });
  useEffect(() => {
    if (before.current === 'paying' && state !== 'paying')
      for (const read of [getGate, listAudit, listInvoices])
        void cache.invalidateQueries({ queryKey: [read.id] });
    before.current = state;
  }, [cache, state]);
}

function InvoiceHead({ invoice, mayEnter }: { invoice: InvoiceDetail; mayEnter: boolean }) {
  const { file, number, approved, state } = invoice;
  return (
    <PageHead
      tag={
        <BatchTag stage={invoice.stage} number={invoice.batchNumber} href={`/batches/${invoice.batchId}`} />
      }
      title={number === null ? 'Invoice' : `Invoice ${number}`}
      sub={<HeadWords invoice={invoice} />}
      actions={
        <>
          {mayEnter && approved === null && state !== 'refused' && (
            <Link href={`/invoices/${invoice.id}?enter=1`}>Enter it again</Link>
          )}
          {file && (
            <a href={`/api/files/${file.id}/content?inline=1`} target="_blank" rel="noreferrer">
              The page as received
            </a>
          )}
        </>
      }
    />
  );
}

function HeadWords({ invoice }: { invoice: InvoiceDetail }) {
  const clock = useClock();
  const { order, papers, datedOn, sentBy, createdAt } = invoice;
  const accepted = order.lines.reduce((sum, line) => sum + line.accepted, 0);
  const ordered = order.lines.reduce((sum, line) => sum + line.ordered, 0);
  return (
    <>
      {invoice.processor}
      {datedOn && `, dated ${dayWords(datedOn, clock)}`}. From {sentBy},{' '}
      {momentWords(new Date(createdAt), clock)}. Order <span className="num">{invoice.orderNumber}</span>.{' '}
      {papers.length > 0 && (papers.length === 1 ? 'Certificate ' : 'Certificates ')}
      {papers.map((paper, at) => (
        <span key={paper.id}>
          {at > 0 && ', '}
          <Link href={`/certificates/${paper.id}`} className="num">
            {paper.number ?? 'without number'}
          </Link>
        </span>
      ))}
      {papers.length > 0 && ', '}
      {accepted} of {ordered} pieces accepted.
    </>
  );
}
