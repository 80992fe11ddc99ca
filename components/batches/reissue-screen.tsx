'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { typedAmount } from '@/components/invoices/amount-field';
import { useClock } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { DateField, NumberInput, TextArea } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide, Section } from '@/components/ui/section';
import { BatchTag } from '@/components/ui/tag';
import {
  getBatch,
  getBatchLines,
  type Batch,
  type BatchLine,
  type Requirement,
} from '@/lib/batches/contract';
import { reissueBatch } from '@/lib/batches/paper-contract';
import { reissueChanges, type StatedTerms } from '@/lib/batches/reissue-changes';
import { dayWords, type Clock } from '@/lib/day-words';

import { amountFault, LimitFields, PriceFields, readAmount, type ReissueTyped } from './reissue-fields';
import { useBatchWrite } from './use-batch-write';

/** What may still change of a batch that has left, beside the sentences that will say what is different. */
export function ReissueScreen({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data } = useRead(getBatchLines, { batchId });
  if (batch.dispatchedAt === null || batch.cancelledAt !== null) {
    return (
      <Empty
        says={`${batch.number} has no papers to issue anew.`}
        comes="A batch that is here is changed where it is built."
        action={
          <ButtonLink look="word" href={`/batches/${batchId}`}>
            Back to the batch
          </ButtonLink>
        }
      />
    );
  }
  return (
    <ReissueForm key={batch.version} batch={batch} lines={data.lines} requirements={data.requirements} />
  );
}

function ReissueForm({
  batch,
  lines,
  requirements,
}: {
  batch: Batch;
  lines: readonly BatchLine[];
  requirements: readonly Requirement[];
}) {
  const router = useRouter();
  const clock = useClock();
  const [typed, setTyped] = useState<ReissueTyped>({
    wantedBackOn: batch.wantedBackOn ?? '',
    note: batch.note ?? '',
    minimum: typedAmount(batch.lotMinimumMinor),
    fee: typedAmount(batch.certificationFeeMinor),
    prices: {},
    limits: {},
  });
  const { run, busy } = useBatchWrite(reissueBatch);
  const set = (part: Partial<ReissueTyped>) => setTyped((was) => ({ ...was, ...part }));
  const before: StatedTerms = {
    ...clock,
    wantedBackOn: batch.wantedBackOn,
    note: batch.note,
    lotMinimumMinor: batch.lotMinimumMinor,
    certificationFeeMinor: batch.certificationFeeMinor,
    lines,
    requirements,
  };
  const after = termsTyped(before, typed, clock);
  const changes = after === null ? [] : reissueChanges(before, after);

  const send = async () => {
    if (after === null) return;
    const done = await run({
      batchId: batch.id,
      version: batch.version,
      wantedBackOn: after.wantedBackOn,
      note: after.note,
      lotMinimumMinor: after.lotMinimumMinor,
      certificationFeeMinor: after.certificationFeeMinor,
      prices: after.lines.map(({ id, unitPriceMinor }) => ({ lineId: id, unitPriceMinor })),
      requirements: after.requirements
        .filter((one) => typed.limits[one.id] !== undefined)
        .map(({ id, limit, unit }) => ({ requirementId: id, limit, unit })),
    });
    if (!done) return;
    showMessage({
      says: `${batch.number} is re-issued as version ${done.documentVersion}. The mail goes as soon as the papers are made.`,
    });
    router.push(`/batches/${batch.id}`);
  };
  return (
    <form
      aria-label={`Re-issue ${batch.number}`}
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        if (changes.length > 0) void send();
      }}
    >
      <PageHead
        tag={<BatchTag href={`/batches/${batch.id}`} size="head" stage={batch.stage} number={batch.number} />}
        title="Re-issue"
        sub="New versions of traveller and order. The old ones stay; the processor is told what is different."
      />
      <MainAndSide
        main={
          <>
            <Section title="Day and terms">
              <div className="grid grid-cols-2 gap-x-4 gap-y-3 py-2 md:grid-cols-4">
                <DateField
                  label="Wanted back"
                  value={typed.wantedBackOn}
                  hint={typed.wantedBackOn === '' ? undefined : dayWords(typed.wantedBackOn, clock)}
                  onChange={(event) => set({ wantedBackOn: event.currentTarget.value })}
                />
                <NumberInput
                  label="Lot minimum"
                  unit={batch.currency}
                  value={typed.minimum}
                  error={amountFault(typed.minimum)}
                  onChange={(event) => set({ minimum: event.currentTarget.value })}
                />
                <NumberInput
                  label="For certificates"
                  unit={batch.currency}
                  value={typed.fee}
                  error={amountFault(typed.fee)}
                  onChange={(event) => set({ fee: event.currentTarget.value })}
                />
                <TextArea
                  className="col-span-full"
                  label="Note on traveller and order"
                  rows={2}
                  value={typed.note}
                  onChange={(event) => set({ note: event.currentTarget.value })}
                />
              </div>
            </Section>
            <PriceFields lines={lines} currency={batch.currency} typed={typed} set={set} />
            {requirements.length > 0 && (
              <LimitFields lines={lines} requirements={requirements} typed={typed} set={set} />
            )}
          </>
        }
        side={
          <Section title="What is different" note={changes.length > 0 ? 'prints on both papers' : undefined}>
            {changes.length === 0 && (
              <Empty says={after === null ? 'An amount cannot be read.' : 'Nothing yet.'} />
            )}
            <ul aria-label="What is different">
              {changes.map((change) => (
                <li key={change} className="border-b border-rule py-[7px]">
                  {change}
                </li>
              ))}
            </ul>
            <div className="flex flex-wrap gap-3 pt-4">
              <Button
                look="primary"
                type="submit"
                busy={busy}
                busyLabel="Re-issuing"
                notNow={
                  changes.length === 0 &&
                  (after === null ? 'Write the amount in red anew.' : 'Change something first.')
                }
              >
                Re-issue and tell the processor
              </Button>
              <ButtonLink href={`/batches/${batch.id}`}>Leave it</ButtonLink>
            </div>
          </Section>
        }
      />
    </form>
  );
}

/** The terms as typed; null while an amount cannot be read. */
function termsTyped(before: StatedTerms, typed: ReissueTyped, clock: Clock): StatedTerms | null {
  const amounts = [typed.minimum, typed.fee, ...Object.values(typed.prices)];
  if (amounts.some((text) => amountFault(text) !== undefined)) return null;
  return {
    ...clock,
    wantedBackOn: typed.wantedBackOn || null,
    note: typed.note.trim() || null,
    lotMinimumMinor: readAmount(typed.minimum),
    certificationFeeMinor: readAmount(typed.fee),
    lines: before.lines.map((line) => ({
      ...line,
      unitPriceMinor:
        typed.prices[line.id] === undefined ? line.unitPriceMinor : readAmount(typed.prices[line.id] ?? ''),
    })),
    requirements: before.requirements.map((one) => ({ ...one, ...typed.limits[one.id] })),
  };
}
