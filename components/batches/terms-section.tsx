'use client';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { amountField, typedAmount } from '@/components/invoices/amount-field';
import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { DateField, NumberInput, SelectField, TextArea } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { Section } from '@/components/ui/section';
import { getBatch, updateBatch, type Batch } from '@/lib/batches/contract';
import { listStepProcessors } from '@/lib/batches/waiting-contract';
import { dayWords } from '@/lib/day-words';

import { useBatchWrite } from './use-batch-write';

/** To whom, when, and what beside the lines goes into the price; kept with one press. */
export function TermsSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const mayBuild = useMay('batch.build');
  return (
    <Section id="terms" title="Days and terms">
      {mayBuild ? (
        <TermsForm key={batch.version} batch={batch} />
      ) : (
        <p className="py-3 text-quiet">{batch.note ?? 'No note.'}</p>
      )}
    </Section>
  );
}

const typedOf = (batch: Batch) => ({
  processorId: batch.processorId,
  leavesOn: batch.leavesOn ?? '',
  wantedBackOn: batch.wantedBackOn ?? '',
  minimum: typedAmount(batch.lotMinimumMinor),
  fee: typedAmount(batch.certificationFeeMinor),
  note: batch.note ?? '',
});

const Minimum = amountField({ name: 'The lot minimum' });
const Fee = amountField({ name: 'The fee for certificates' });
const orNothing = (typed: string) => (typed.trim() === '' ? '0' : typed);

function TermsForm({ batch }: { batch: Batch }) {
  const clock = useClock();
  const { data: known } = useRead(listStepProcessors, {
    process: batch.process,
    specification: batch.step.specification,
  });
  const [typed, setTyped] = useState(typedOf(batch));
  const [wrong, setWrong] = useState<Readonly<Record<string, string>>>({});
  const { run, busy } = useBatchWrite(updateBatch, (error) =>
    setWrong(Object.fromEntries((error.problem.fields ?? []).map(({ field, message }) => [field, message]))),
  );
  const isSame = JSON.stringify(typed) === JSON.stringify(typedOf(batch));
  const set = (part: Partial<typeof typed>) => setTyped((was) => ({ ...was, ...part }));
  const inWords = (day: string) => (day === '' ? undefined : dayWords(day, clock));
  const processors = known.processors.map((one) => ({
    value: one.processorId,
    says: one.approved ? one.name : `${one.name}: ${one.says}`,
  }));
  // A processor one no longer works with is not in the list, but the batch still names it.
  const options = processors.some((one) => one.value === batch.processorId)
    ? processors
    : [{ value: batch.processorId, says: batch.processor }, ...processors];

  const save = async () => {
    const [minimum, fee] = [Minimum.safeParse(orNothing(typed.minimum)), Fee.safeParse(orNothing(typed.fee))];
    setWrong({
      ...(minimum.success ? {} : { lotMinimumMinor: minimum.error.issues[0]?.message ?? '' }),
      ...(fee.success ? {} : { certificationFeeMinor: fee.error.issues[0]?.message ?? '' }),
    });
    if (!minimum.success || !fee.success) return;
    const done = await run({
      batchId: batch.id,
      version: batch.version,
      processorId: typed.processorId,
      leavesOn: typed.leavesOn || null,
      wantedBackOn: typed.wantedBackOn || null,
      note: typed.note.trim() || null,
      lotMinimumMinor: minimum.data,
      certificationFeeMinor: fee.data,
    });
    if (done) showMessage({ says: 'Days and terms are kept.' });
  };
  return (
    <form
      aria-label="Days and terms"
      noValidate
      className="grid grid-cols-2 gap-x-4 gap-y-3 py-2 md:grid-cols-4"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      <SelectField
        className="col-span-2"
        label="Processor"
        options={options}
        value={typed.processorId}
        error={wrong['processorId']}
        onChange={(event) => set({ processorId: event.currentTarget.value })}
      />
      <DateField
        label="Leaves"
        value={typed.leavesOn}
        hint={inWords(typed.leavesOn)}
        error={wrong['leavesOn']}
        onChange={(event) => set({ leavesOn: event.currentTarget.value })}
      />
      <DateField
        label="Wanted back"
        value={typed.wantedBackOn}
        hint={inWords(typed.wantedBackOn)}
        error={wrong['wantedBackOn']}
        onChange={(event) => set({ wantedBackOn: event.currentTarget.value })}
      />
      <NumberInput
        label="Lot minimum"
        unit={batch.currency}
        value={typed.minimum}
        error={wrong['lotMinimumMinor']}
        onChange={(event) => set({ minimum: event.currentTarget.value })}
      />
      <NumberInput
        label="For certificates"
        unit={batch.currency}
        value={typed.fee}
        error={wrong['certificationFeeMinor']}
        onChange={(event) => set({ fee: event.currentTarget.value })}
      />
      <TextArea
        className="col-span-2"
        label="Note on traveller and order"
        rows={2}
        value={typed.note}
        error={wrong['note']}
        onChange={(event) => set({ note: event.currentTarget.value })}
      />
      <div className="col-span-full">
        <Button type="submit" busy={busy} busyLabel="Keeping" notNow={isSame && 'Nothing is changed yet.'}>
          Keep days and terms
        </Button>
      </div>
    </form>
  );
}
