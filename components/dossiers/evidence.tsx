import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { DossierEvidence } from '@/lib/dossiers/contract';

import { BatchEvidence } from './batch-evidence';
import { movementSpot, reasonWords, spotText } from './evidence-words';
import { Originals } from './originals';
import { When } from './when';

interface EvidenceProps {
  evidence: DossierEvidence;
  /** Where a file is fetched from: before the file's id. People outside have a door of their own. */
  filesAt: string;
  /** What stands after the id. */
  filesEnd: string;
}

/** The whole chain of a lot, as the document says it: where every piece is, each outside step with its proof, each movement, each original. */
export function Evidence({ evidence, filesAt, filesEnd }: EvidenceProps) {
  const { shop, lot, whereabouts } = evidence;
  return (
    <div className="flex min-w-0 flex-col gap-6">
      <Section title="Where every piece is" note={`${lot.made.toLocaleString('en-US')} made`}>
        <Table
          label="Where every piece is"
          columns={[{ says: 'Place' }, { says: 'Pieces', right: true }]}
          keep
          dense
        >
          {whereabouts.map((one) => (
            <Row key={`${one.place} ${one.holder}`}>
              <Cell>{spotText(one.place, one.holder)}</Cell>
              <Cell figure>{one.pieces}</Cell>
            </Row>
          ))}
          <Row state="sum">
            <Cell>Made</Cell>
            <Cell figure>{whereabouts.reduce((sum, one) => sum + one.pieces, 0)}</Cell>
          </Row>
        </Table>
        {lot.serials.length > 0 && (
          <p className="py-2">
            <span className="font-cond text-caption text-faint">Serials </span>
            <span className="num [overflow-wrap:anywhere]">{lot.serials.join('  ')}</span>
          </p>
        )}
      </Section>
      {evidence.batches.length === 0 && (
        <Section title="Outside steps">
          <p className="py-3 text-quiet">
            It has not gone out yet: there is nothing that a processor had to prove.
          </p>
        </Section>
      )}
      {evidence.batches.map((batch) => (
        <BatchEvidence key={`${batch.id} ${batch.lineNo}`} batch={batch} zone={shop.zone} />
      ))}
      <Section
        title="Every movement"
        note={`${evidence.movements.length} ${evidence.movements.length === 1 ? 'entry' : 'entries'}`}
      >
        <Table
          label="Every movement"
          columns={[
            { says: 'When' },
            { says: 'Pieces', right: true },
            { says: 'Why' },
            { says: 'From' },
            { says: 'To' },
            { says: 'By' },
          ]}
          dense
        >
          {evidence.movements.map((one, at) => (
            <Row key={at}>
              <Cell head="When">
                <When at={one.at} zone={shop.zone} />
              </Cell>
              <Cell figure head="Pieces">
                {one.pieces}
              </Cell>
              <Cell>{reasonWords(one.reason)}</Cell>
              <Cell head="From">{one.from && movementSpot(one.from)}</Cell>
              <Cell head="To">{movementSpot(one.to)}</Cell>
              <Cell quiet>{one.by}</Cell>
            </Row>
          ))}
        </Table>
      </Section>
      <Originals evidence={evidence} filesAt={filesAt} filesEnd={filesEnd} />
    </div>
  );
}
