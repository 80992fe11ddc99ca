'use client';
import { useState } from 'react';

import { useClock, useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { VerdictMark } from '@/components/ui/marks';
import { momentWords } from '@/lib/day-words';
import {
  clearDifference,
  undoClearance,
  type InvoiceDetail,
  type InvoiceDifference,
} from '@/lib/invoices/contract';
import { amountText } from '@/lib/money';

import { useInvoiceWrite } from './use-invoice-write';

interface DifferenceProps {
  invoice: InvoiceDetail;
  difference: InvoiceDifference;
  /** Pieces of the line that are accepted, where it is a line of pieces. */
  accepted: number | null;
}

/** What differs, and what can be done about it, in place. */
export function Difference({ invoice, difference, accepted }: DifferenceProps) {
  const { clearance, overMinor, sentence } = difference;
  return (
    <div className="py-0.5">
      <p className="flex gap-2">
        {overMinor > 0 && (
          <strong className={`num ${clearance ? '' : 'text-held-ink'}`}>{amountText(overMinor)}</strong>
        )}
        <span className={clearance ? '' : 'font-semibold text-held-ink'}>{sentence}</span>
      </p>
      {clearance ? (
        <Cleared invoice={invoice} difference={difference} clearance={clearance} />
      ) : (
        <WaysOut invoice={invoice} difference={difference} accepted={accepted} />
      )}
    </div>
  );
}

function Cleared({
  invoice,
  difference,
  clearance,
}: Omit<DifferenceProps, 'accepted'> & { clearance: NonNullable<InvoiceDifference['clearance']> }) {
  const clock = useClock();
  const mayEnter = useMay('invoice.enter');
  const { run } = useInvoiceWrite(undoClearance);
  const chose = clearance.choice === 'accept' ? `accepted it: ${clearance.reason}` : leftOutWords(difference);
  return (
    <p className="text-second text-quiet">
      <VerdictMark verdict="meets" size={12} className="mr-1 inline align-[-1px]" />
      {clearance.by} {chose}, {momentWords(new Date(clearance.at), clock)}.{' '}
      {mayEnter && invoice.approved === null && (
        <Button
          look="word"
          aria-label={`Undo: ${difference.sentence}`}
          onClick={() => run({ invoiceId: invoice.id, version: invoice.version, difference: difference.key })}
        >
          Undo
        </Button>
      )}
    </p>
  );
}

const leftOutWords = ({ overMinor }: InvoiceDifference): string =>
  overMinor > 0 ? `left ${amountText(overMinor)} out` : 'took the total as it stands';

function WaysOut({ invoice, difference, accepted }: DifferenceProps) {
  const mayEnter = useMay('invoice.enter');
  const [accepting, setAccepting] = useState(false);
  const { run } = useInvoiceWrite(clearDifference);
  if (!mayEnter) return <p className="text-second text-quiet">The office clears it.</p>;
  if (difference.code === 'currency_mismatch') {
    return (
      <div className="pt-1.5">
        <ButtonLink size="small" href={`/invoices/${invoice.id}?enter=1`}>
          Enter it again
        </ButtonLink>
      </div>
    );
  }
  const clear = (choice: 'accept' | 'withhold', reason = '') =>
    run({ invoiceId: invoice.id, version: invoice.version, difference: difference.key, choice, reason });
  if (accepting)
    return (
      <Accepting
        difference={difference}
        onAccept={(reason) => clear('accept', reason)}
        onLeave={() => setAccepting(false)}
      />
    );
  return (
    <div className="flex flex-wrap gap-2 pt-1.5">
      <Button size="small" onClick={() => clear('withhold')}>
        {withholdWords(difference, accepted)}
      </Button>
      <Button size="small" onClick={() => setAccepting(true)}>
        Accept once, with a reason
      </Button>
    </div>
  );
}

function withholdWords({ code, overMinor }: InvoiceDifference, accepted: number | null): string {
  if (overMinor === 0) return 'Take the total as it stands';
  if (code === 'quantity_above_accepted' && accepted !== null)
    return `Pay ${accepted}, leave ${amountText(overMinor)} out`;
  if (code === 'unit_price_mismatch') return `Pay the order’s price, ${amountText(overMinor)} less`;
  return `Leave ${amountText(overMinor)} out`;
}

function Accepting({
  difference,
  onAccept,
  onLeave,
}: {
  difference: InvoiceDifference;
  onAccept: (reason: string) => Promise<unknown>;
  onLeave: () => void;
}) {
  const [reason, setReason] = useState('');
  const [error, setError] = useState<string>();
  const accept = async () => {
    if (reason.trim().length < 5) return setError('Give the reason in a few words.');
    setError(undefined);
    await onAccept(reason);
  };
  return (
    <form
      noValidate
      className="flex max-w-md flex-col gap-2 pt-1.5"
      onSubmit={(event) => {
        event.preventDefault();
        void accept();
      }}
    >
      <TextField
        label={`Reason for paying ${amountText(difference.overMinor)}`}
        autoFocus
        maxLength={500}
        value={reason}
        error={error}
        onChange={(event) => setReason(event.currentTarget.value)}
      />
      <div className="flex gap-2">
        <Button size="small" type="submit">
          Accept {amountText(difference.overMinor)}
        </Button>
        <Button size="small" onClick={onLeave}>
          Leave it open
        </Button>
      </div>
    </form>
  );
}
