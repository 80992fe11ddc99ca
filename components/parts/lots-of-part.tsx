'use client';

import Link from 'next/link';
import { PlacesBar } from '@/components/lots/places-bar';
import { useClock } from '@/components/session/use-me';
import { Day } from '@/components/ui/day';
import { Empty } from '@/components/ui/empty';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { Part } from '@/lib/parts/contract';

const COLUMNS = [
  { says: 'Lot' },
  { says: 'Heat' },
  { says: 'Made' },
  { says: 'Pieces', right: true },
  { says: 'Where they are' },
];

/** Where the part is used: its lots, and the place of their pieces. */
export function LotsOfPart({ part }: { part: Part }) {
  const clock = useClock();
  return (
    <Section
      title={`Lots of rev ${part.revision}`}
      note={part.lotCount > 0 ? `${part.lotCount.toLocaleString('en-US')}, newest first` : undefined}
      action={
        part.lotCount > part.lots.length && (
          <Link href={`/lots?partId=${part.id}`} className="lw-word-button">
            Show all {part.lotCount.toLocaleString('en-US')}
          </Link>
        )
      }
    >
      {part.lots.length === 0 ? (
        <Empty says="No lot of this revision yet." comes="A lot is pieces made together from one heat." />
      ) : (
        <Table label={`Lots of rev ${part.revision}`} columns={COLUMNS}>
          {part.lots.map((lot) => (
            <Row key={lot.id}>
              <Cell>
                <Link href={`/lots/${lot.id}`} className="num font-semibold">
                  {lot.number}
                </Link>
              </Cell>
              <Cell code head="Heat" className="[overflow-wrap:anywhere]">
                {lot.heat}
              </Cell>
              <Cell head="Made">
                <Day day={lot.madeOn.slice(0, 10)} clock={clock} short />
              </Cell>
              <Cell figure head="Pieces">
                {lot.made.toLocaleString('en-US')}
              </Cell>
              <Cell>
                <PlacesBar made={lot.made} places={lot.places} />
              </Cell>
            </Row>
          ))}
        </Table>
      )}
    </Section>
  );
}
