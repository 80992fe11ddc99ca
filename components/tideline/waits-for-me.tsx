import Link from 'next/link';

import { Kbd } from '@/components/ui/kbd';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import type { Waiting } from '@/lib/tideline/what-waits';

/** One line a batch, worst harm first, with the one thing to do about it. */
export function WaitsForMe({ waiting }: { waiting: readonly Waiting[] }) {
  return (
    <Section
      id="for-me"
      title="What waits for me"
      note={waiting.length > 0 ? `${waiting.length}, worst harm first` : undefined}
      action={
        waiting.length > 0 ? (
          <span className="max-md:hidden">
            <Kbd keys="J K" says="move" /> <Kbd keys="Enter" says="open" />
          </span>
        ) : undefined
      }
    >
      {waiting.length === 0 ? (
        <p className="py-3 text-quiet">
          Nothing waits for you. Late batches, questions from processors and papers to prove will stand here,
          worst first.
        </p>
      ) : (
        <Table
          label="What waits for me"
          columns={[
            { says: 'Batch', hidden: true },
            { says: 'What', hidden: true },
            { says: 'For', hidden: true },
            { says: 'Do', right: true, hidden: true },
          ]}
        >
          {waiting.map(({ batch, what, why, verb, href }) => (
            <Row key={batch.id}>
              <Cell>
                <BatchTag stage={batch.stage} number={batch.number} size="row" show="number" />
              </Cell>
              <Cell>
                <strong>{what}</strong> <span className="text-quiet">{why}</span>
              </Cell>
              <Cell quiet>{batch.assembly?.name}</Cell>
              <Cell right>
                <Link href={href} className="lw-word-button">
                  {verb}
                  <span className="sr-only"> {batch.number}</span>
                </Link>
              </Cell>
            </Row>
          ))}
        </Table>
      )}
    </Section>
  );
}
