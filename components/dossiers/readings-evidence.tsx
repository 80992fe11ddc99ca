import { Cell, Row, Table } from '@/components/ui/table';
import { againstWords, chartWords } from '@/lib/dossiers/chart-words';
import type { DossierBatch } from '@/lib/dossiers/content';
import { fieldWords } from '@/lib/readings/field-words';

import { When } from './when';

/** What the machine read on the papers of a batch, where a person corrected it, and what its charts show. */
export function ReadingsEvidence({ batch, zone }: { batch: DossierBatch; zone: string }) {
  return (
    <>
      {batch.corrections.length > 0 && (
        <Table
          label={`Read by machine on ${batch.number}, corrected by a person`}
          columns={[
            { says: 'Read by machine' },
            { says: 'As read' },
            { says: 'As corrected' },
            { says: 'Certificate' },
            { says: 'Corrected by' },
          ]}
          dense
        >
          {batch.corrections.map((one, at) => (
            <Row key={at}>
              <Cell strong>{fieldWords(one.field)}</Cell>
              <Cell code head="As read">
                {one.read ?? 'nothing'}
              </Cell>
              <Cell code head="As corrected">
                {one.corrected || 'not stated'}
              </Cell>
              <Cell code head="Certificate">
                {one.certificate}
              </Cell>
              <Cell quiet>
                {one.by}, <When at={one.at} zone={zone} />
              </Cell>
            </Row>
          ))}
        </Table>
      )}
      {batch.charts.map((chart) => (
        <div key={chart.id} className="border-b border-rule py-2">
          <p>
            <strong>{chartWords(chart)}</strong>
          </p>
          <p className="text-second text-quiet">
            {againstWords(chart)} {chart.why}
          </p>
        </div>
      ))}
    </>
  );
}
