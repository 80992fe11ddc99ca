'use client';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { getBatch, getBatchLines, type BatchLine, type Requirement } from '@/lib/batches/contract';
import { limitWords } from '@/lib/parts/limit-words';

import { ProposedRequirements } from './proposed-requirements';
import { RequirementEditor } from './requirement-editor';

const COLUMNS = [{ says: 'What' }, { says: 'Limit' }, { says: 'From' }];

/** What must be proved on paper: for all lines, then what lines ask of their own; lines that ask the same stand together. */
export function RequirementsSection({ batchId }: { batchId: string }) {
  const { data: batch } = useRead(getBatch, { batchId });
  const { data } = useRead(getBatchLines, { batchId });
  const mayBuild = useMay('batch.build') && batch.dispatchedAt === null && batch.cancelledAt === null;
  const [openId, setOpen] = useState<string | null>(null);
  const [isProposing, setProposing] = useState(false);
  const groups = groupsOf(data.lines, data.requirements).filter(
    (group) => mayBuild || group.requirements.length > 0,
  );
  return (
    <Section
      id="requirements"
      title="Must be proved, on paper"
      note={batch.dispatchedAt ? 'frozen at dispatch' : 'from the route of each part; type over what differs'}
      action={
        mayBuild &&
        data.lines.length > 0 && (
          <Button look="word" aria-expanded={isProposing} onClick={() => setProposing(!isProposing)}>
            Propose from the tables
          </Button>
        )
      }
    >
      {mayBuild && isProposing && <ProposedRequirements batch={batch} onDone={() => setProposing(false)} />}
      {groups.length === 0 && <Empty says="No proof was asked." />}
      {groups.map((group) => {
        const opened = group.changes.find((change) => change.id === openId);
        return (
          <div key={group.says} className="pt-1 pb-3">
            <div className="flex flex-wrap items-baseline gap-x-4 border-b border-ink py-1">
              <h3>{group.says}</h3>
              {group.requirements.length === 0 && !opened && (
                <span className="text-second text-quiet">
                  {group.isAll ? 'nothing in common' : 'nothing of its own'}
                </span>
              )}
              {mayBuild && !opened && <ChangeButtons group={group} open={setOpen} />}
            </div>
            {opened ? (
              <RequirementEditor
                key={`${opened.id} ${batch.version}`}
                batch={batch}
                lineId={opened.lineId}
                says={opened.says}
                requirements={group.requirements}
                onDone={() => setOpen(null)}
              />
            ) : (
              group.requirements.length > 0 && <Asked says={group.says} requirements={group.requirements} />
            )}
          </div>
        );
      })}
    </Section>
  );
}

interface Group {
  says: string;
  isAll: boolean;
  requirements: readonly Requirement[];
  /** What can be opened: the whole batch, or each of the lines that ask this. */
  changes: readonly { id: string; lineId: string | null; says: string }[];
}

function groupsOf(lines: readonly BatchLine[], requirements: readonly Requirement[]): Group[] {
  const all: Group = {
    says: 'All lines',
    isAll: true,
    requirements: requirements.filter((one) => one.lineId === null),
    changes: [{ id: 'all', lineId: null, says: 'All lines' }],
  };
  const same = new Map<string, { lines: BatchLine[]; requirements: readonly Requirement[] }>();
  for (const line of lines) {
    const own = requirements.filter((one) => one.lineId === line.id);
    const key = JSON.stringify(
      own.map(({ characteristic, limit, unit, source, sourceText }) => [
        characteristic,
        limit,
        unit,
        source,
        sourceText,
      ]),
    );
    const known = same.get(key);
    if (known) known.lines.push(line);
    else same.set(key, { lines: [line], requirements: own });
  }
  return [
    all,
    ...[...same.values()].map((group) => ({
      says: `${group.lines.length === 1 ? 'Line' : 'Lines'} ${group.lines.map((line) => line.lineNo).join(', ')}`,
      isAll: false,
      requirements: group.requirements,
      changes: group.lines.map((line) => ({ id: line.id, lineId: line.id, says: `Line ${line.lineNo}` })),
    })),
  ];
}

function ChangeButtons({ group, open }: { group: Group; open: (id: string) => void }) {
  const verb = group.requirements.length === 0 ? 'Say what' : 'Change';
  return (
    <span className="ml-auto flex flex-wrap gap-x-4">
      {group.changes.map((change) => (
        <Button
          key={change.id}
          look="word"
          aria-label={`${verb}: ${change.says}`}
          onClick={() => open(change.id)}
        >
          {group.changes.length === 1 ? verb : `${verb} ${change.says.toLowerCase()}`}
        </Button>
      ))}
    </span>
  );
}

function Asked({ says, requirements }: { says: string; requirements: readonly Requirement[] }) {
  return (
    <Table
      label={`Must be proved: ${says}`}
      columns={COLUMNS.map((column) => ({ ...column, hidden: true }))}
      dense
    >
      {requirements.map((one) => (
        <Row key={one.id}>
          <Cell className="w-2/5">{one.characteristic}</Cell>
          <Cell code strong className="w-2/5 [overflow-wrap:anywhere] whitespace-normal!">
            {limitWords(one)}
          </Cell>
          <Cell quiet>{one.sourceText || one.source}</Cell>
        </Row>
      ))}
    </Table>
  );
}
