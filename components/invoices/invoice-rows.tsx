'use client';
import Link from 'next/link';

import { useClock } from '@/components/session/use-me';
import { Day } from '@/components/ui/day';
import { Cell, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { daysUntil } from '@/lib/day-words';
import type { InvoiceRow } from '@/lib/invoices/contract';
import { amountText } from '@/lib/money';

import { INVOICE_STATE_WORDS, invoiceName, STATES_IN_RED } from './invoice-words';

interface InvoiceRowsProps {
  rows: readonly InvoiceRow[];
  label: string;
  /** On the batch's own page its tag would say the same in every row. */
  ofOneBatch?: boolean;
}

/** Invoices, each with what is to be done with it next. */
export function InvoiceRows({ rows, label, ofOneBatch = false }: InvoiceRowsProps) {
  const columns = [
    { says: 'Invoice' },
    ...(ofOneBatch ? [] : [{ says: 'Batch' }, { says: 'From' }]),
    { says: 'Order', className: 'md:max-lg:hidden' },
    { says: 'Dated' },
    { says: 'Due' },
    { says: 'Invoiced', right: true },
    { says: 'Left to pay', right: true },
    { says: 'Next' },
  ];
  return (
    <Table label={label} columns={columns}>
      {rows.map((row) => (
        <InvoiceLine key={row.id} row={row} ofOneBatch={ofOneBatch} />
      ))}
    </Table>
  );
}

function InvoiceLine({ row, ofOneBatch }: { row: InvoiceRow; ofOneBatch: boolean }) {
  const clock = useClock();
  const isOpen = row.state !== 'paid' && row.state !== 'refused';
  const isLate = isOpen && row.dueOn !== null && daysUntil(row.dueOn, clock) < 0;
  return (
    <Row state={row.state === 'refused' ? 'off' : 'rest'}>
      <Cell className="max-w-80 min-w-24 [overflow-wrap:anywhere]">
        <Link href={`/invoices/${row.id}`} className="num font-semibold">
          {invoiceName(row)}
        </Link>
      </Cell>
      {!ofOneBatch && (
        <Cell>
          <BatchTag stage={row.stage} number={row.batchNumber} href={`/batches/${row.batchId}`} size="row" />
        </Cell>
      )}
      {!ofOneBatch && <Cell head="From">{row.processor}</Cell>}
      <Cell code head="Order" className="whitespace-nowrap md:max-lg:hidden">
        {row.orderNumber}
      </Cell>
      <Cell head="Dated" className="whitespace-nowrap">
        {row.datedOn && <Day day={row.datedOn} clock={clock} short />}
      </Cell>
      <Cell head="Due" className={`whitespace-nowrap ${isLate ? 'text-held-ink' : ''}`}>
        {row.dueOn && <Day day={row.dueOn} clock={clock} short />}
        {isLate && ', past'}
      </Cell>
      <Cell figure head="Invoiced">
        {row.totalMinor === null ? '' : `${amountText(row.totalMinor)} ${row.currency}`}
      </Cell>
      <Cell figure head="Left to pay">
        {row.balanceMinor > 0 ? amountText(row.balanceMinor) : ''}
      </Cell>
      <Cell
        strong={isOpen}
        quiet={!isOpen}
        className={STATES_IN_RED.includes(row.state) ? 'text-held-ink' : ''}
      >
        {INVOICE_STATE_WORDS[row.state]}
      </Cell>
    </Row>
  );
}
