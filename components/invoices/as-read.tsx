'use client';
import { useFormContext } from 'react-hook-form';

import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { CheckList, CheckRow } from '@/components/ui/check-row';
import { showMessage } from '@/components/ui/message';
import { CURRENCIES } from '@/lib/money';
import { getInvoiceReading, readInvoiceAgain, type InvoiceReading } from '@/lib/invoices/reading-contract';

import { typedAmount } from './amount-field';
import { whatRead, type EnterIn } from './enter-values';

/** What the machine read on the page, to be taken over in one press; what stands against the paper is said first. */
export function AsRead({ invoiceId, read: data }: { invoiceId: string; read: InvoiceReading | undefined }) {
  const form = useFormContext<EnterIn>();
  if (!data || data.state === null) return null;
  if (data.state === 'waiting')
    return (
      <p role="status" className="pb-2 text-second text-quiet">
        Reading the invoice. You can begin by eye.
      </p>
    );
  if (data.state === 'unreadable') return <NotRead invoiceId={invoiceId} fault={data.fault} />;
  const takeOver = () => {
    const before = form.getValues();
    form.reset(valuesAsRead(data, before), { keepDefaultValues: true });
    showMessage({
      says: 'Taken over as read. Compare it with the page.',
      action: { says: 'Take it back', run: () => form.reset(before, { keepDefaultValues: true }) },
    });
  };
  return (
    <div className="pb-3">
      <CheckList label="What stands against it">
        {data.discrepancies.map((one) => (
          <CheckRow key={`${one.code} ${one.message}`} level="warn" sentence={one.message} />
        ))}
      </CheckList>
      <div className="flex flex-wrap items-baseline gap-x-3 pt-2">
        <Button onClick={takeOver}>Take over what was read</Button>
        <span className="text-second text-quiet">
          {[data.number, data.lines.length === 1 ? '1 line' : `${data.lines.length} lines`]
            .filter(Boolean)
            .join(', ')}
          {data.totalMinor !== null && `, ${typedAmount(data.totalMinor)}`}. The machine proposes; you enter.
        </span>
      </div>
    </div>
  );
}

function NotRead({ invoiceId, fault }: { invoiceId: string; fault: string | null }) {
  const again = useWrite(readInvoiceAgain, { refreshes: [getInvoiceReading] });
  return (
    <div className="pb-3">
      <CheckList label="Reading">
        <CheckRow
          level="warn"
          sentence={fault}
          rest="The file is kept as it came; enter it by eye."
          waysOut={
            <Button
              look="word"
              busy={again.isPending}
              onClick={() => again.mutateAsync({ invoiceId }).catch(() => undefined)}
            >
              Have it read again
            </Button>
          }
        />
      </CheckList>
    </div>
  );
}

/** What was read stands in for what was typed; a field that could not be read stays as it is. */
function valuesAsRead(read: InvoiceReading, before: EnterIn): EnterIn {
  const lines = read.lines.map((line) => ({
    what: whatRead(line),
    description: line.description,
    pieces: line.pieces === null ? '' : String(line.pieces),
    unitPriceMinor: typedAmount(line.unitPriceMinor),
    amountMinor: typedAmount(line.amountMinor),
  }));
  const currency = CURRENCIES.find((one) => one === read.currency);
  return {
    number: read.number ?? before.number,
    datedOn: read.datedOn ?? before.datedOn,
    dueOn: read.dueOn ?? before.dueOn,
    currency: currency ?? before.currency,
    totalMinor: read.totalMinor === null ? before.totalMinor : typedAmount(read.totalMinor),
    lines: lines.length > 0 ? lines : before.lines,
  };
}
