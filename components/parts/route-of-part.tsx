import Link from 'next/link';
import { Empty } from '@/components/ui/empty';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { Part, RouteStep } from '@/lib/parts/contract';
import { PROCESS_WORDS } from '@/lib/trade/process';

const PROOF_COLUMNS = [{ says: 'To be proved' }, { says: 'Limit' }, { says: 'From' }];

/** The outside steps in order, each with what its papers must show. */
export function RouteOfPart({ part }: { part: Part }) {
  return (
    <Section
      title="Outside steps"
      note={part.route.length > 0 ? 'in the order the pieces take them' : undefined}
    >
      {part.route.length === 0 && (
        <Empty
          says="No step yet."
          comes="A part needs at least one outside step before lots of it can be made."
          action={<Link href={`/parts/${part.id}/edit`}>Add the first step</Link>}
        />
      )}
      <ol>
        {part.route.map((step) => (
          <Step key={step.id} step={step} />
        ))}
      </ol>
    </Section>
  );
}

function Step({ step }: { step: RouteStep }) {
  return (
    <li className="grid grid-cols-[1.75rem_minmax(0,1fr)] border-b border-rule py-2.5">
      <span className="num text-quiet">{step.seq}</span>
      <div className="min-w-0">
        <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
          <strong className="font-cond text-sub first-letter:uppercase">{PROCESS_WORDS[step.process]}</strong>
          <span className="num [overflow-wrap:anywhere]">
            {step.specification} {step.specificationRevision}
          </span>
          {step.classType && <span>{step.classType}</span>}
          {(step.conditionBefore ?? step.targetCondition) && (
            <span>
              <span className="num">{step.conditionBefore}</span>
              {step.targetCondition && (
                <>
                  <span className="text-source text-quiet"> to </span>
                  <span className="num">{step.targetCondition}</span>
                </>
              )}
            </span>
          )}
          {step.waiting > 0 && (
            <span className="ml-auto whitespace-nowrap max-md:ml-0">
              <span className="num">{step.waiting.toLocaleString('en-US')}</span> waiting
            </span>
          )}
        </div>
        {step.note && <p className="[overflow-wrap:anywhere] text-quiet">{step.note}</p>}
        {step.toProve.length > 0 && (
          <Table label={`To be proved at step ${step.seq}`} columns={PROOF_COLUMNS} dense className="mt-1">
            {step.toProve.map((proof, at) => (
              <Row key={at}>
                <Cell strong>{proof.characteristic}</Cell>
                <Cell head="Limit">
                  <span className="num">
                    {proof.limit} {proof.unit}
                  </span>
                </Cell>
                <Cell head="From" quiet>
                  {proof.source}
                  {proof.sourceText && `, ${proof.sourceText}`}
                </Cell>
              </Row>
            ))}
          </Table>
        )}
      </div>
    </li>
  );
}
