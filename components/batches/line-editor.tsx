'use client';
import { useState } from 'react';

import { amountField, typedAmount } from '@/components/invoices/amount-field';
import { Button } from '@/components/ui/button';
import { NumberInput, SelectField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { addLine, changeLine, removeLine, type Batch, type BatchLine } from '@/lib/batches/contract';

import { useBatchWrite } from './use-batch-write';

const Price = amountField({ name: 'The price' });
const MOST_OFFERED = 6;
/** The first few; more where the plan has set more. */
const loadsFor = (loadNo: number | null) =>
  Array.from({ length: Math.max(MOST_OFFERED, loadNo ?? 0) }, (_, at) => ({
    value: String(at + 1),
    says: `load ${at + 1}`,
  }));

/** Pieces, price and load of one line, under its row. */
export function LineEditor({ batch, line, onDone }: { batch: Batch; line: BatchLine; onDone: () => void }) {
  const [typed, setTyped] = useState({
    pieces: String(line.pieces),
    price: typedAmount(line.unitPriceMinor),
    load: line.loadNo === null ? '' : String(line.loadNo),
  });
  const [wrong, setWrong] = useState<Readonly<Record<string, string>>>({});
  const change = useBatchWrite(changeLine, (error) =>
    setWrong(Object.fromEntries((error.problem.fields ?? []).map(({ field, message }) => [field, message]))),
  );
  const remove = useBatchWrite(removeLine);
  const add = useBatchWrite(addLine);
  const most = line.pieces + line.waiting;
  const seen = { batchId: batch.id, version: batch.version, lineId: line.id };

  const save = async () => {
    const price = Price.safeParse(typed.price.trim() === '' ? '0' : typed.price);
    const pieces = Number(typed.pieces);
    const faults = {
      ...(Number.isInteger(pieces) && pieces > 0 && typed.pieces.trim() !== ''
        ? {}
        : { pieces: `Enter a whole number from 1 to ${most}.` }),
      ...(price.success
        ? {}
        : { unitPriceMinor: price.error.issues[0]?.message ?? 'This is not an amount.' }),
    };
    setWrong(faults);
    if (!price.success || Object.keys(faults).length > 0) return;
    const done = await change.run({
      ...seen,
      pieces,
      unitPriceMinor: price.data,
      loadNo: typed.load === '' ? null : Number(typed.load),
    });
    if (!done) return;
    onDone();
    showMessage({ says: `Line ${line.lineNo} is changed.` });
  };
  const takeOut = async () => {
    const done = await remove.run(seen);
    if (!done) return;
    onDone();
    const { lotId, stepId, pieces, unitPriceMinor } = line;
    // What was worded by hand for this line is gone with it; the route's own words come back.
    showMessage({
      says: `${line.lotNumber} is out of ${batch.number}.`,
      action: {
        says: 'Undo',
        run: () => add.run({ batchId: batch.id, lotId, stepId, pieces, unitPriceMinor }),
      },
    });
  };
  return (
    <form
      aria-label={`Change line ${line.lineNo}`}
      noValidate
      className="flex flex-wrap items-start gap-x-4 gap-y-3 py-2"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      <NumberInput
        className="w-36"
        label="Pieces"
        unit={`of ${most}`}
        inputMode="numeric"
        value={typed.pieces}
        error={wrong['pieces']}
        onChange={(event) => setTyped({ ...typed, pieces: event.currentTarget.value })}
      />
      <NumberInput
        className="w-36"
        label="Price each"
        unit={batch.currency}
        value={typed.price}
        error={wrong['unitPriceMinor']}
        onChange={(event) => setTyped({ ...typed, price: event.currentTarget.value })}
      />
      <SelectField
        className="w-32"
        label="Load"
        empty="no load"
        options={loadsFor(line.loadNo)}
        value={typed.load}
        onChange={(event) => setTyped({ ...typed, load: event.currentTarget.value })}
      />
      <span className="flex flex-wrap items-center gap-3 pt-6">
        <Button type="submit" busy={change.busy} busyLabel="Saving">
          {`Save line ${line.lineNo}`}
        </Button>
        <Button look="word" onClick={takeOut}>
          Take it out
        </Button>
      </span>
    </form>
  );
}
