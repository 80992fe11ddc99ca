import { Cell, Row } from '@/components/ui/table';
import { VerdictWord } from '@/components/ui/verdict';
import type { InvoiceDetail } from '@/lib/invoices/contract';
import { amountText } from '@/lib/money';

import { compareRows, payableNow, type CompareRow } from './compare-rows';
import { Difference } from './difference-cell';

// Only while it is a table: on a phone each row is a block.
const EDGE = 'border-l border-l-rule pl-3 max-sm:border-l-0';
const GROUP = 'border-b-0 pb-0 font-cond text-sub text-ink';

/** Ordered, accepted and invoiced, line by line, with each difference and its way out. */
export function CompareTable({ invoice }: { invoice: InvoiceDetail }) {
  const { currency, differences, totalMinor, order } = invoice;
  const rows = compareRows(invoice);
  const payable = payableNow(invoice);
  const over = (totalMinor ?? 0) - payable;
  return (
    <div className="lw-table-box border-t-heavy border-ink">
      <table role="table" aria-label="Invoice against order and accepted pieces" className="lw-table">
        <Head currency={currency} />
        <tbody role="rowgroup">
          {rows.map((row) => (
            <CompareLine key={row.key} row={row} invoice={invoice} />
          ))}
          <Row state="sum">
            <Cell figure />
            <Cell className="font-cond">Sum</Cell>
            <Cell className={EDGE} />
            <Cell />
            <Cell figure head="Ordered">
              {amountText(order.expectedMinor)}
            </Cell>
            <Cell className={EDGE} />
            <Cell figure head="Accepted">
              {amountText(rows.reduce((sum, row) => sum + (row.accepted?.minor ?? 0), 0))}
            </Cell>
            <Cell className={EDGE} />
            <Cell />
            <Cell figure head="Invoiced">
              {amountText(totalMinor ?? 0)}
            </Cell>
            <Cell className={EDGE}>
              <OverWords
                over={over}
                all={differences.length}
                open={differences.filter((one) => one.clearance === null).length}
              />
            </Cell>
          </Row>
        </tbody>
      </table>
    </div>
  );
}

function OverWords({ over, all, open }: { over: number; all: number; open: number }) {
  if (all === 0) return <>No difference</>;
  const cleared = `${all - open} of ${all} cleared`;
  if (over <= 0) return <>{cleared}</>;
  return open === 0 ? (
    <>
      <span className="num">{amountText(over)}</span> left out, {cleared}
    </>
  ) : (
    <>
      <span className="text-held-ink">
        <span className="num">{amountText(over)}</span> over what may be paid
      </span>
      , {cleared}
    </>
  );
}

function Head({ currency }: { currency: string }) {
  return (
    <thead role="rowgroup">
      <tr role="row">
        <th colSpan={2} className={GROUP} />
        <th scope="colgroup" colSpan={3} className={`${GROUP} ${EDGE}`}>
          Ordered
        </th>
        <th scope="colgroup" colSpan={2} className={`${GROUP} ${EDGE}`}>
          Accepted
        </th>
        <th scope="colgroup" colSpan={3} className={`${GROUP} ${EDGE}`}>
          Invoiced
        </th>
        <th scope="col" className={`${GROUP} ${EDGE}`}>
          Difference and its way out
        </th>
      </tr>
      <tr role="row">
        <th scope="col">
          <span className="sr-only">Number</span>
        </th>
        <th scope="col">Line</th>
        <th scope="col" className={`lw-figure ${EDGE}`}>
          Pieces
        </th>
        <th scope="col" className="lw-figure">
          Each
        </th>
        <th scope="col" className="lw-figure">
          {currency}
        </th>
        <th scope="col" className={`lw-figure ${EDGE}`}>
          Pieces
        </th>
        <th scope="col" className="lw-figure">
          {currency}
        </th>
        <th scope="col" className={`lw-figure ${EDGE}`}>
          Pieces
        </th>
        <th scope="col" className="lw-figure">
          Each
        </th>
        <th scope="col" className="lw-figure">
          {currency}
        </th>
        <th className={EDGE} />
      </tr>
    </thead>
  );
}

function CompareLine({ row, invoice }: { row: CompareRow; invoice: InvoiceDetail }) {
  const { ordered, accepted, invoiced, differences } = row;
  const asks = differences.some((one) => one.clearance === null);
  const has = (code: string) =>
    differences.some((one) => one.code === code) ? 'font-semibold text-held-ink' : '';
  return (
    <Row state={asks ? 'asks' : 'rest'} className="[&>td]:align-top">
      <Cell figure className="text-faint">
        {row.seq ?? ''}
      </Cell>
      <Cell className="font-cond text-word">
        {row.says}
        {row.note && <span className="block text-source font-normal text-quiet">{row.note}</span>}
      </Cell>
      <Cell figure head="Ordered" className={EDGE}>
        {ordered?.pieces ?? ''}
      </Cell>
      <Cell figure head="at">
        {money(ordered?.eachMinor)}
      </Cell>
      <Cell figure head={sumHead('Ordered', ordered)}>
        {money(ordered?.minor)}
      </Cell>
      <Cell figure head="Accepted" className={`${EDGE} ${has('quantity_above_accepted')}`}>
        {accepted?.pieces ?? ''}
      </Cell>
      <Cell figure head={sumHead('Accepted', accepted)}>
        {money(accepted?.minor)}
      </Cell>
      <Cell figure head="Invoiced" className={EDGE}>
        {invoiced?.pieces ?? ''}
      </Cell>
      <Cell figure head="at" className={has('unit_price_mismatch')}>
        {money(invoiced?.eachMinor)}
      </Cell>
      <Cell figure strong head={sumHead('Invoiced', invoiced)}>
        {money(invoiced?.minor)}
      </Cell>
      <Cell className={`${EDGE} max-sm:basis-full`}>
        <Says row={row} invoice={invoice} />
      </Cell>
    </Row>
  );
}

/** Said before a sum where the row is a block: what it is, unless the pieces before it said so. */
const sumHead = (what: string, side: { pieces: number | null } | null): string =>
  side?.pieces == null ? what : 'makes';

const money = (minor: number | null | undefined): string =>
  minor === null || minor === undefined ? '' : amountText(minor);

function Says({ row, invoice }: { row: CompareRow; invoice: InvoiceDetail }) {
  if (row.differences.length === 0)
    return row.invoiced ? (
      <VerdictWord verdict="meets" says="agrees" />
    ) : (
      <span className="text-quiet">not invoiced</span>
    );
  return (
    <>
      {row.differences.map((difference) => (
        <Difference
          key={difference.key}
          invoice={invoice}
          difference={difference}
          accepted={row.accepted?.pieces ?? null}
        />
      ))}
    </>
  );
}
