import Link from 'next/link';
import { useTables } from '@/components/reference/use-tables';
import { Empty } from '@/components/ui/empty';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import type { Part, RouteStep } from '@/lib/parts/contract';
import { orderingForm } from '@/lib/parts/ordering-form';
import { statedItems } from '@/lib/parts/ordering-answers';
import type { PartTables } from '@/lib/reference/published-tables';
import { ORDER_ITEM_WORDS } from '@/lib/trade/ordering/order-item';
import { PROCESS_WORDS } from '@/lib/trade/process';

const PROOF_COLUMNS = [{ says: 'To be proved' }, { says: 'Limit' }, { says: 'From' }];

/** The outside steps in order, each with what its papers must show. */
export function RouteOfPart({ part }: { part: Part }) {
  const tables = useTables();
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
          <Step key={step.id} step={step} endCondition={part.endCondition} tables={tables} />
        ))}
      </ol>
    </Section>
  );
}

interface StepProps {
  step: RouteStep;
  endCondition: string;
  /** Those in force in the shop. */
  tables: PartTables;
}

function Step({ step, endCondition, tables }: StepProps) {
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
        <OrderOfStep step={step} endCondition={endCondition} tables={tables} />
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

/** What the order states for the step beside its fields, and what its specification still wants stated. */
export function OrderOfStep({ step, endCondition, tables }: StepProps) {
  const stated = statedItems(step.ordering);
  const form = orderingForm(tables, {
    specification: step.specification,
    specificationRevision: step.specificationRevision ?? '',
    classType: step.classType ?? '',
    conditionBefore: step.conditionBefore ?? '',
    targetCondition: step.targetCondition ?? '',
    ordering: step.ordering,
    characteristics: step.toProve.map(({ characteristic }) => characteristic),
    endCondition,
  });
  const missing = (form?.missing ?? []).map(({ item }) => ORDER_ITEM_WORDS[item]);
  if (stated.length === 0 && missing.length === 0) return null;
  return (
    <div className="py-1">
      {stated.length > 0 && (
        <dl
          aria-label={`What the order states for step ${step.seq}`}
          className="grid grid-cols-[11rem_minmax(0,1fr)] gap-x-3 gap-y-0.5 text-second max-md:grid-cols-1"
        >
          {stated.map(({ id, item, says }) => (
            <div key={id} className="contents">
              <dt className="text-quiet first-letter:uppercase">{item}</dt>
              <dd className="[overflow-wrap:anywhere]">{says}</dd>
            </div>
          ))}
        </dl>
      )}
      {missing.length > 0 && (
        <p className="text-second text-dispatched-ink">The order does not state: {missing.join('; ')}.</p>
      )}
    </div>
  );
}
