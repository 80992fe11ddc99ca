'use client';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';

import { usePages, useRead } from '@/components/api/use-api';
import { ShowMore } from '@/components/lots/show-more';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { RadioGroup } from '@/components/ui/choice';
import { Empty } from '@/components/ui/empty';
import { DateField, FieldError } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide, Section } from '@/components/ui/section';
import { createBatch } from '@/lib/batches/contract';
import { specificationWords } from '@/lib/batches/step-asked';
import { listStepProcessors, listWaitingLots, type WaitingLot } from '@/lib/batches/waiting-contract';
import { dayWords } from '@/lib/day-words';
import { PROCESS_WORDS, type Process } from '@/lib/trade/process';

import { LotChoice } from './lot-choice';
import { useBatchWrite } from './use-batch-write';

export interface AskedStep {
  process: Process;
  specification: string;
  specificationRevision?: string;
  classType?: string;
}

/** Which lots, how many pieces of each, to whom and when. Everything can still be changed on the batch's page. */
export function NewBatchForm({ step }: { step: AskedStep }) {
  const router = useRouter();
  const clock = useClock();
  const { data: known } = useRead(listStepProcessors, {
    process: step.process,
    specification: step.specification,
  });
  const lots = usePages(listWaitingLots, { ...step });
  const rows = lots.data?.pages.flatMap((page) => page.rows) ?? [];
  const [typed, setTyped] = useState<Readonly<Record<string, string>>>({});
  const [processorId, setProcessor] = useState(
    known.processors.find((one) => one.approved)?.processorId ?? '',
  );
  const [days, setDays] = useState({ leavesOn: '', wantedBackOn: '' });
  const [wrong, setWrong] = useState<Readonly<Record<string, string>>>({});
  const chosen = rows.flatMap((row) => {
    const text = typed[row.lotId] ?? String(row.pieces);
    return text.trim() === '' || text.trim() === '0' ? [] : [{ row, text }];
  });
  const write = useBatchWrite(createBatch, (error) =>
    setWrong(
      Object.fromEntries(
        (error.problem.fields ?? []).map(({ field, message }) => [atLot(field, chosen), message]),
      ),
    ),
  );

  const start = async () => {
    setWrong({});
    const made = await write.run({
      processorId,
      lines: chosen.map(({ row, text }) => ({ lotId: row.lotId, stepId: row.stepId, pieces: Number(text) })),
      leavesOn: days.leavesOn || null,
      wantedBackOn: days.wantedBackOn || null,
    });
    if (made) router.push(`/batches/${made.id}`);
  };
  const pieces = chosen.reduce(
    (sum, { text }) => sum + (Number.isInteger(Number(text)) ? Number(text) : 0),
    0,
  );
  const notYet = notYetWords(chosen.length, processorId);
  return (
    <form
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        if (!notYet) void start();
      }}
    >
      <PageHead
        title={`Start a batch: ${PROCESS_WORDS[step.process]}`}
        sub={
          <>
            {specificationWords({
              ...step,
              specificationRevision: step.specificationRevision ?? null,
              classType: step.classType ?? null,
            })}
            . <Link href="/batches/new">Another step</Link>
          </>
        }
        actions={
          <Button look="primary" type="submit" busy={write.busy} busyLabel="Starting" notNow={notYet}>
            {`Start it with ${pieces.toLocaleString('en-US')} pc`}
          </Button>
        }
      />
      <MainAndSide
        main={
          <Section title="Lots that wait" note={`oldest first, ${chosen.length} of ${rows.length} chosen`}>
            {lots.data && rows.length === 0 && (
              <Empty
                says="No lot waits for this step any more."
                action={<Link href="/batches/new">Another step</Link>}
              />
            )}
            {rows.length > 0 && (
              <LotChoice
                rows={rows}
                typed={typed}
                wrong={wrong}
                onType={(lotId, text) => setTyped((was) => ({ ...was, [lotId]: text }))}
              />
            )}
            {wrong['lines'] && <FieldError id="lines-error" says={wrong['lines']} />}
            <ShowMore hasMore={lots.hasNextPage} busy={lots.isFetchingNextPage} more={lots.fetchNextPage} />
          </Section>
        }
        side={
          <>
            <Section title="To whom">
              <div className="py-2">
                {known.processors.length === 0 && (
                  <Empty
                    says="No processor is entered yet."
                    action={<Link href="/processors">Processors</Link>}
                  />
                )}
                {known.processors.length > 0 && (
                  <RadioGroup
                    label="Processor"
                    hint="Those approved for this step first. An unapproved one stops the dispatch."
                    name="processor"
                    options={known.processors.map((one) => ({
                      value: one.processorId,
                      says: <span className={one.approved ? 'font-semibold' : 'text-quiet'}>{one.name}</span>,
                      note: one.says,
                    }))}
                    chosen={[processorId]}
                    error={wrong['processorId']}
                    onChange={(event) => setProcessor(event.currentTarget.value)}
                  />
                )}
              </div>
            </Section>
            <Section title="When">
              <div className="grid grid-cols-2 gap-4 py-2">
                <DateField
                  label="Leaves"
                  value={days.leavesOn}
                  hint={inWords(days.leavesOn)}
                  error={wrong['leavesOn']}
                  onChange={(event) => setDays({ ...days, leavesOn: event.currentTarget.value })}
                />
                <DateField
                  label="Wanted back"
                  value={days.wantedBackOn}
                  hint={inWords(days.wantedBackOn)}
                  error={wrong['wantedBackOn']}
                  onChange={(event) => setDays({ ...days, wantedBackOn: event.currentTarget.value })}
                />
              </div>
              <p className="text-second text-quiet">
                Prices, note and what must be proved come next, on the batch&rsquo;s page.
              </p>
            </Section>
          </>
        }
      />
    </form>
  );

  function inWords(day: string): string | undefined {
    return day === '' ? undefined : dayWords(day, clock);
  }
}

function notYetWords(lines: number, processorId: string): string | false {
  if (lines === 0) return 'Choose a lot first.';
  return processorId === '' && 'Choose a processor first.';
}

/** `lines.2.pieces` is about the third chosen lot: its message stands at that lot. */
function atLot(field: string, chosen: readonly { row: WaitingLot }[]): string {
  const [, at] = /^lines\.(\d+)\./.exec(field) ?? [];
  return at === undefined ? field : (chosen[Number(at)]?.row.lotId ?? 'lines');
}
