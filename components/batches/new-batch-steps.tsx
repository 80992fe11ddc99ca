'use client';
import Link from 'next/link';

import { useRead } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Day } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { Cell, Row, Table } from '@/components/ui/table';
import { specificationWords } from '@/lib/batches/step-asked';
import { listWaitingSteps, type WaitingStep } from '@/lib/batches/waiting-contract';
import { calendarDay } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';

const COLUMNS = [
  { says: 'Step' },
  { says: 'Specification' },
  { says: 'Lots', right: true },
  { says: 'Pieces', right: true },
  { says: 'Oldest lot of' },
];

/** What pieces wait for: a batch is of one step, so it begins with choosing one. */
export function NewBatchSteps() {
  const { data } = useRead(listWaitingSteps, {});
  const clock = useClock();
  return (
    <>
      <PageHead
        title="Start a batch"
        sub="Choose the step that pieces wait for. One batch goes to one processor for one step."
      />
      {data.steps.length === 0 && (
        <Empty
          says="No piece waits for an outside step."
          comes="Lots come here when they are made, or when the step before is done."
          action={<Link href="/lots">Lots</Link>}
        />
      )}
      {data.steps.length > 0 && (
        <Table label="Steps that pieces wait for" columns={COLUMNS}>
          {data.steps.map((step) => (
            <Row key={newBatchHref(step)}>
              <Cell>
                <Link href={newBatchHref(step)} className="text-tag font-cond font-semibold">
                  {PROCESS_WORDS[step.process]}
                </Link>
              </Cell>
              <Cell head="Specification">{specificationWords(step)}</Cell>
              <Cell figure head="Lots">
                {step.lots.toLocaleString('en-US')}
              </Cell>
              <Cell figure strong head="Pieces">
                {step.pieces.toLocaleString('en-US')}
              </Cell>
              <Cell head="Oldest lot of">
                <Day day={calendarDay(new Date(step.since), clock.zone)} clock={clock} />
              </Cell>
            </Row>
          ))}
        </Table>
      )}
    </>
  );
}

/** The address of the builder for one step. */
export function newBatchHref({
  process,
  specification,
  specificationRevision,
  classType,
}: Pick<WaitingStep, 'process' | 'specification' | 'specificationRevision' | 'classType'>): string {
  const query = new URLSearchParams({ process, specification });
  if (specificationRevision !== null) query.set('specificationRevision', specificationRevision);
  if (classType !== null) query.set('classType', classType);
  return `/batches/new?${query.toString()}`;
}
