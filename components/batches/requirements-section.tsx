'use client';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { getBatch, getBatchLines, type Requirement } from '@/lib/batches/contract';

import { RequirementEditor } from './requirement-editor';

const COLUMNS = [{ says: 'What' }, { says: 'Limit' }, { says: 'From' }];

/** What must be proved on paper: for all lines, then what each line asks beside it. */
export function RequirementsSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data } = useRead(getBatchLines, { batchId });
  const mayBuild = useMay('batch.build') && batch.dispatchedAt === null && batch.cancelledAt === null;
  const [openId, setOpen] = useState<string | null>(null);
  const groups = [
    { id: 'all', lineId: null, says: 'All lines', requirements: data.requirements.filter((one) => one.lineId === null) },
    ...data.lines.map((line) => ({ id: line.id, lineId: line.id, says: `Line ${line.lineNo}, ${line.partNumber} ${line.partRevision}`, requirements: data.requirements.filter((one) => one.lineId === line.id) })),
  ];
  return (
    <Section id="requirements" title="Must be proved, on paper" note={batch.dispatchedAt ? 'frozen at dispatch' : 'from the route of each part; type over what differs'}>
      {groups
        .filter((group) => mayBuild || group.requirements.length > 0)
        .map((group) => (
          <div key={group.id} className="border-b border-rule py-2">
            <div className="flex flex-wrap items-baseline gap-x-3">
              <h3>{group.says}</h3>
              {group.requirements.length === 0 && openId !== group.id && <span className="text-second text-quiet">{group.lineId === null ? 'nothing in common' : 'nothing of its own'}</span>}
              {mayBuild && openId !== group.id && (
                <Button look="word" className="ml-auto" aria-label={`Change what must be proved: ${group.says}`} onClick={() => setOpen(group.id)}>
                  {group.requirements.length === 0 ? 'Say what' : 'Change'}
                </Button>
              )}
            </div>
            {openId === group.id ? (
              <RequirementEditor key={batch.version} batch={batch} lineId={group.lineId} says={group.says} requirements={group.requirements} onDone={() => setOpen(null)} />
            ) : (
              group.requirements.length > 0 && <Asked says={group.says} requirements={group.requirements} />
            )}
          </div>
        ))}
    </Section>
  );
}

function Asked({ says, requirements }: { says: string; requirements: readonly Requirement[] }) {
  return (
    <Table label={`Must be proved: ${says}`} columns={COLUMNS.map((column) => ({ ...column, hidden: true }))} dense>
      {requirements.map((one) => (
        <Row key={one.id}>
          <Cell className="w-2/5">{one.characteristic}</Cell>
          <Cell code strong className="w-2/5">
            {[one.limit, one.unit].filter(Boolean).join(' ')}
          </Cell>
          <Cell quiet>{one.sourceText || one.source}</Cell>
        </Row>
      ))}
    </Table>
  );
}
