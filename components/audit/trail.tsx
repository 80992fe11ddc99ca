'use client';
import Link from 'next/link';

import { usePages } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { Cell, Row, Table } from '@/components/ui/table';
import type { InputOf } from '@/lib/api/endpoint';
import { actionWords } from '@/lib/audit/action-words';
import { listAudit, type AuditEntry } from '@/lib/audit/contract';
import { changesBetween, jobWords, kindWords, pageOfThing } from '@/lib/audit/words';

interface TrailProps {
  asked: InputOf<typeof listAudit>;
  zone: string;
  /** The thing is the page's own: its column would say the same in every row. */
  ofOneThing?: boolean;
}

/** Who did what, when and from where; newest first, further back on demand. */
export function Trail({ asked, zone, ofOneThing = false }: TrailProps) {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(
    listAudit,
    asked,
  );
  if (isPending) return <Loading label="Loading the history" />;
  if (error) return <Failing says="The history could not be read." again={error.message} />;
  const rows = data.pages.flatMap((page) => page.rows);
  if (rows.length === 0)
    return (
      <Empty
        says="Nothing is recorded here."
        comes="Each change stands here with who, when and from where."
      />
    );
  const columns = [
    { says: 'When' },
    { says: 'Who' },
    ...(ofOneThing ? [] : [{ says: 'Thing' }]),
    { says: 'What' },
    { says: 'Change' },
    { says: 'No.', right: true },
  ];
  return (
    <>
      <Table label="History" columns={columns} dense>
        {rows.map((entry) => (
          <TrailRow key={entry.seq} entry={entry} zone={zone} ofOneThing={ofOneThing} />
        ))}
      </Table>
      {hasNextPage && (
        <div className="pt-3">
          <Button
            size="small"
            busy={isFetchingNextPage}
            busyLabel="Reading further back"
            onClick={() => fetchNextPage().then(() => undefined)}
          >
            Further back
          </Button>
        </div>
      )}
    </>
  );
}

function TrailRow({ entry, zone, ofOneThing }: { entry: AuditEntry; zone: string; ofOneThing: boolean }) {
  return (
    <Row>
      <Cell>
        <Moment at={new Date(entry.at)} clock={{ zone, now: new Date() }} />
      </Cell>
      <Cell>
        {entry.actorKind === 'job' ? 'Lotwright' : entry.actorName}
        <span className="text-quiet">{actorNote(entry)}</span>
      </Cell>
      {!ofOneThing && (
        <Cell head="Thing">
          <Thing entry={entry} />
        </Cell>
      )}
      <Cell strong>{actionWords(entry.action)}</Cell>
      <Cell>
        <Changes entry={entry} />
      </Cell>
      <Cell head="No." figure>
        <span title={`sealed with ${entry.hash}`}>{entry.seq}</span>
      </Cell>
    </Row>
  );
}

function actorNote({ actorKind, actorName, address }: AuditEntry): string {
  const by: Record<string, string> = {
    token: ', with a token',
    link: ', by the mailed link',
    job: `, ${jobWords(actorName)}`,
  };
  return `${by[actorKind] ?? ''}${address === null ? '' : `, from ${address}`}`;
}

function Thing({ entry }: { entry: AuditEntry }) {
  const page = pageOfThing(entry.entity, entry.entityId);
  const called = entry.called ?? entry.entityId.slice(-8);
  return (
    <>
      <span className="text-quiet">{kindWords(entry.entity)} </span>
      {page === null ? <span>{called}</span> : <Link href={page}>{called}</Link>}
    </>
  );
}

const SHOWN_AT_ONCE = 3;
const LETTERS_AT_ONCE = 240;

function Changes({ entry }: { entry: AuditEntry }) {
  const changes = changesBetween(entry.before, entry.after);
  const lines = changes.map(({ field, before, after }) => (
    <li key={field} className="[overflow-wrap:anywhere]">
      <span className="text-quiet">{field}</span> {before !== null && <s className="text-quiet">{before}</s>}{' '}
      {after ?? 'none'}
    </li>
  ));
  const letters = changes.reduce(
    (sum, { before, after }) => sum + (before?.length ?? 0) + (after?.length ?? 0),
    0,
  );
  if (lines.length <= SHOWN_AT_ONCE && letters <= LETTERS_AT_ONCE)
    return <ul className="max-w-[36rem]">{lines}</ul>;
  return (
    <details className="max-w-[36rem]">
      <summary className="cursor-pointer">{changes.map((change) => change.field).join(', ')}</summary>
      <ul>{lines}</ul>
    </details>
  );
}
