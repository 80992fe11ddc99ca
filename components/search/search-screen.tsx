'use client';
import Link from 'next/link';

import { useLazyRead, usePages } from '@/components/api/use-api';
import { FindField } from '@/components/lots/find-field';
import { ShowMore } from '@/components/lots/show-more';
import { Empty } from '@/components/ui/empty';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { HIT_KINDS, listNumbers, searchNumbers, type Hit, type HitKind } from '@/lib/search/contract';

import { KINDS_WORDS, searchPage } from './kind-words';

export interface SearchFilter {
  text?: string;
  kind?: HitKind;
}

/** Everything whose number begins as typed: the first of each kind, or one kind to its end. */
export function SearchScreen({ filter: { text = '', kind } }: { filter: SearchFilter }) {
  return (
    <>
      <PageHead title={kind ? `${KINDS_WORDS[kind]} by number` : 'Search by number'} />
      <div className="pb-5">
        <FindField label="The number, or how it begins" text={text} />
      </div>
      {text === '' && (
        <Empty
          says="Nothing is looked for yet."
          comes="Type a number as it is printed, or its digits, or how it begins."
        />
      )}
      {text !== '' && kind === undefined && <EveryKind text={text} />}
      {text !== '' && kind !== undefined && <OneKind text={text} kind={kind} />}
    </>
  );
}

function EveryKind({ text }: { text: string }) {
  const { data, error, isPending } = useLazyRead(searchNumbers, { text });
  if (isPending) return <Loading label="Searching" />;
  if (error) return <Failing says="The search did not answer." again={error.message} />;
  const kinds = HIT_KINDS.filter((kind) => data.hits.some((hit) => hit.kind === kind));
  if (kinds.length === 0) return <Nothing text={text} />;
  return (
    <div className="flex flex-col gap-6">
      {kinds.map((kind) => (
        <Section
          key={kind}
          title={KINDS_WORDS[kind]}
          action={
            data.more.includes(kind) && (
              <Link href={searchPage(text, kind)} className="lw-word-button">
                All {KINDS_WORDS[kind].toLowerCase()}
              </Link>
            )
          }
        >
          <Hits label={KINDS_WORDS[kind]} hits={data.hits.filter((hit) => hit.kind === kind)} />
        </Section>
      ))}
    </div>
  );
}

function OneKind({ text, kind }: { text: string; kind: HitKind }) {
  const { data, error, isPending, hasNextPage, fetchNextPage, isFetchingNextPage } = usePages(listNumbers, {
    kind,
    text,
  });
  if (isPending) return <Loading label="Searching" rows={8} />;
  if (error) return <Failing says="The search did not answer." again={error.message} />;
  const hits = data.pages.flatMap((page) => page.rows);
  if (hits.length === 0) return <Nothing text={text} />;
  return (
    <>
      <Hits label={KINDS_WORDS[kind]} hits={hits} />
      <ShowMore hasMore={hasNextPage} busy={isFetchingNextPage} more={fetchNextPage} />
      <p className="pt-3">
        <Link href={searchPage(text)} className="lw-word-button">
          Every kind that begins so
        </Link>
      </p>
    </>
  );
}

const Nothing = ({ text }: { text: string }) => (
  <Empty says={`Nothing has a number that begins with ${text}.`} comes="Look at the number again." />
);

const COLUMNS = [
  { says: 'Number', hidden: true, className: 'w-44' },
  { says: 'What it is', hidden: true },
];

function Hits({ label, hits }: { label: string; hits: readonly Hit[] }) {
  return (
    <Table label={label} columns={COLUMNS}>
      {hits.map((hit) => (
        <Row key={hit.href}>
          <Cell code>
            <Link href={hit.href} className="num font-semibold [overflow-wrap:anywhere]">
              {hit.number}
            </Link>
          </Cell>
          <Cell className="[overflow-wrap:anywhere]">{hit.says}</Cell>
        </Row>
      ))}
    </Table>
  );
}
