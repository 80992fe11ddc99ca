'use client';
import Link from 'next/link';

import { useRead, useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { Clock } from '@/lib/day-words';
import { listFailedJobs, retryJob, type FailedJob } from '@/lib/jobs/contract';

/** What the shop's background work could not do, and what becomes of it. */
export function JobsScreen({ now }: { now: Date }) {
  const { data } = useRead(listFailedJobs, {});
  const clock = { zone: data.zone, now };
  const givenUp = data.jobs.filter((job) => job.isGivenUp);
  const waiting = data.jobs.filter((job) => !job.isGivenUp);
  return (
    <>
      <PageHead
        title="Work that failed"
        sub="Mails, papers, payments and dossiers are done in the background and tried again by themselves, with longer and longer pauses."
      />
      <div className="flex flex-col gap-7">
        <Section title="Given up" note={String(givenUp.length)}>
          {givenUp.length === 0 ? (
            <Empty
              says="Nothing was given up."
              comes="What fails too often stands here until somebody tries it again."
            />
          ) : (
            <JobTable label="Given up" jobs={givenUp} clock={clock} />
          )}
        </Section>
        <Section title="Waits for its next try" note={String(waiting.length)}>
          {waiting.length === 0 ? (
            <Empty says="Nothing waits to be tried again." />
          ) : (
            <JobTable label="Waits for its next try" jobs={waiting} clock={clock} />
          )}
        </Section>
      </div>
    </>
  );
}

function JobTable({ label, jobs, clock }: { label: string; jobs: readonly FailedJob[]; clock: Clock }) {
  return (
    <Table
      label={label}
      columns={[
        { says: 'What did not happen' },
        { says: 'Tries', right: true },
        { says: 'Last try' },
        { says: 'Next try' },
        { says: 'Action', hidden: true, right: true },
      ]}
    >
      {jobs.map((job) => (
        <JobRow key={job.id} job={job} clock={clock} />
      ))}
    </Table>
  );
}

function JobRow({ job, clock }: { job: FailedJob; clock: Clock }) {
  const write = useWrite(retryJob, { refreshes: [listFailedJobs] });
  const again = () =>
    write.mutate(
      { jobId: job.id },
      {
        onSuccess: () => showMessage({ says: 'It is tried again now.' }),
        onError: (error) => showMessage({ says: error.message, failed: true }),
      },
    );
  return (
    <Row state={job.isGivenUp ? 'asks' : 'rest'}>
      <Cell head="What did not happen">
        <strong>{job.says}</strong> {job.about !== null && <Link href={job.about}>See what it is about</Link>}
        {job.error !== null && (
          <div className="max-w-[42rem] text-source break-words text-faint">{job.error}</div>
        )}
      </Cell>
      <Cell figure head="Tries">
        {job.attempts} of {job.attemptsMeant}
      </Cell>
      <Cell head="Last try">
        {job.lastTriedAt !== null && <Moment at={new Date(job.lastTriedAt)} clock={clock} />}
      </Cell>
      <Cell head="Next try">
        {job.nextAt === null ? (
          <span className="text-quiet">none by itself</span>
        ) : (
          <Moment at={new Date(job.nextAt)} clock={clock} />
        )}
      </Cell>
      <Cell right>
        <Button size="small" busy={write.isPending} busyLabel="Trying" onClick={again}>
          Try again
        </Button>
      </Cell>
    </Row>
  );
}
