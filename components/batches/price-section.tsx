'use client';
import { useRead } from '@/components/api/use-api';
import { Amount } from '@/components/ui/amount';
import { Section } from '@/components/ui/section';
import { SteelRule } from '@/components/ui/steel-rule';
import { Cell, Row, Table } from '@/components/ui/table';
import { getBatch, getBatchLines, type BatchLine } from '@/lib/batches/contract';
import { expectedPrice } from '@/lib/batches/expected-price';
import { amountText } from '@/lib/money';

const COLUMNS = [
  { says: 'For', hidden: true },
  { says: 'Amount', right: true, hidden: true },
];

/** What the order asks for, against the lot minimum: room under it costs nothing more. */
export function PriceSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data } = useRead(getBatchLines, { batchId });
  const price = expectedPrice({ ...batch, lines: data.lines });
  const minimum = batch.lotMinimumMinor;
  return (
    <Section
      title={batch.dispatchedAt ? 'Price of the order' : 'Price so far'}
      note={`${batch.currency}, as typed in`}
    >
      {price.totalMinor === 0 ? (
        <p className="border-b border-rule py-3 text-quiet">No price is stated yet.</p>
      ) : (
        <>
          <div className="py-2">
            <PriceRule work={price.workMinor} minimum={minimum} />
          </div>
          <Table label="Price" columns={COLUMNS} keep>
            {byPrice(data.lines).map(({ each, pieces }) => (
              <Row key={each}>
                <Cell>{`${pieces.toLocaleString('en-US')} pc at ${amountText(each)}`}</Cell>
                <Cell figure>
                  <Amount minor={each * pieces} />
                </Cell>
              </Row>
            ))}
            {price.toMinimumMinor > 0 && (
              <Row>
                <Cell>{`to the lot minimum of ${amountText(minimum)}`}</Cell>
                <Cell figure>
                  <Amount minor={price.toMinimumMinor} />
                </Cell>
              </Row>
            )}
            {price.certificationFeeMinor > 0 && (
              <Row>
                <Cell>certificates</Cell>
                <Cell figure>
                  <Amount minor={price.certificationFeeMinor} />
                </Cell>
              </Row>
            )}
            <Row state="sum">
              <Cell>{`Expected invoice, ${batch.currency}`}</Cell>
              <Cell figure>
                <Amount minor={price.totalMinor} />
              </Cell>
            </Row>
          </Table>
        </>
      )}
    </Section>
  );
}

function PriceRule({ work, minimum }: { work: number; minimum: number }) {
  const longest = Math.max(work, minimum) / 100;
  const number = roundStep(longest / 5);
  const to = Math.max(number, Math.ceil((longest * 1.1) / number) * number);
  const room = minimum - work;
  const says =
    minimum > 0
      ? `pieces ${amountText(work)}, lot minimum ${amountText(minimum)}${room > 0 ? `, room ${amountText(room)}` : ''}`
      : `pieces ${amountText(work)}`;
  return (
    <>
      <SteelRule
        width={410}
        to={to}
        tick={number / 5}
        number={number}
        value={work / 100}
        room
        says={says}
        {...(minimum > 0 ? { limit: { at: minimum / 100, says: `minimum ${amountText(minimum)}` } } : {})}
      />
      {room > 0 && minimum > 0 && (
        <p className="font-cond text-word text-dispatched-ink">{`room ${amountText(room)}`}</p>
      )}
    </>
  );
}

/** 1, 2 or 5 times a power of ten: what a rule is divided by. */
function roundStep(wanted: number): number {
  const power = 10 ** Math.floor(Math.log10(Math.max(wanted, 1)));
  return [1, 2, 5, 10].map((one) => one * power).find((step) => step >= wanted) ?? 10 * power;
}

/** Pieces at the same price are one row. */
function byPrice(lines: readonly BatchLine[]): { each: number; pieces: number }[] {
  const sums = new Map<number, number>();
  for (const line of lines)
    if (line.unitPriceMinor > 0)
      sums.set(line.unitPriceMinor, (sums.get(line.unitPriceMinor) ?? 0) + line.pieces);
  return [...sums].map(([each, pieces]) => ({ each, pieces }));
}
