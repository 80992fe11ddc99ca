import type { ReactNode } from 'react';

import { CheckList, CheckRow } from '@/components/ui/check-row';
import { type Verdict, VERDICTS } from '@/components/ui/marks';
import { Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { TitleCells } from '@/components/ui/title-cells';
import { VerdictWord } from '@/components/ui/verdict';
import type { DossierBatch } from '@/lib/dossiers/content';

import { conditionsWords, processWords, reasonWords, receiptWords } from './evidence-words';
import { ReadingsEvidence } from './readings-evidence';
import { When } from './when';

interface BatchEvidenceProps {
  batch: DossierBatch;
  zone: string;
}

/** One outside step: who did it to what order, what was proved and signed, what was held, what passed. */
export function BatchEvidence({ batch, zone }: BatchEvidenceProps) {
  const cells = [
    { caption: 'Processor', value: batch.processor },
    { caption: 'Specification', value: [batch.specification, batch.classType].filter(Boolean).join(', ') },
    { caption: 'Condition', value: conditionsWords(batch) },
    { caption: 'Order', value: <span className="num">{batch.orderNumber}</span> },
    { caption: 'Approval that day', value: batch.approval ?? 'none on record' },
  ].filter((cell) => cell.value !== '');
  return (
    <Section
      title={`${batch.number}, ${processWords(batch.process)}`}
      note={`${batch.pieces} ${batch.pieces === 1 ? 'piece' : 'pieces'}, line ${batch.lineNo}`}
    >
      <div className="py-2">
        <TitleCells cells={cells} />
      </div>
      {batch.overrides.length > 0 && (
        <CheckList label="Blockers that were overridden">
          {batch.overrides.map((one) => (
            <CheckRow
              key={one.check}
              level="warn"
              sentence={`Overridden: ${reasonWords(one.check)}.`}
              rest={one.reason}
              source={one.by}
            />
          ))}
        </CheckList>
      )}
      <Facts batch={batch} zone={zone} />
      <Requirements batch={batch} />
      <ReadingsEvidence batch={batch} zone={zone} />
      {batch.nonconformances.map((one) => (
        <Nonconformance key={one.number} one={one} zone={zone} />
      ))}
      <Signatures batch={batch} zone={zone} />
    </Section>
  );
}

function Facts({ batch, zone }: BatchEvidenceProps) {
  return (
    <dl>
      {batch.dispatchedAt && (
        <Fact name="Dispatched">
          <When at={batch.dispatchedAt} zone={zone} /> {batch.dispatchedBy && `by ${batch.dispatchedBy}`}
        </Fact>
      )}
      {batch.receipts.map((one, at) => (
        <Fact key={at} name="Counted in">
          <strong>{receiptWords(one)}</strong>, <When at={one.at} zone={zone} /> by {one.by}
        </Fact>
      ))}
      {batch.releases.map((one, at) => (
        <Fact key={at} name="Released">
          <strong>
            {one.pieces} to {one.to}
          </strong>
          , <When at={one.at} zone={zone} /> by {one.by}
        </Fact>
      ))}
    </dl>
  );
}

function Fact({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="flex flex-wrap gap-x-4 border-b border-rule py-1.5">
      <dt className="w-28 flex-none text-quiet">{name}</dt>
      <dd className="min-w-0">{children}</dd>
    </div>
  );
}

function Requirements({ batch }: { batch: DossierBatch }) {
  if (batch.requirements.length === 0)
    return <p className="py-2 text-quiet">Nothing was asked to be proved of this line.</p>;
  return (
    <Table
      label={`What had to be proved on ${batch.number}`}
      columns={[
        { says: 'To be proved' },
        { says: 'Limit' },
        { says: 'Stated' },
        { says: 'Verdict' },
        { says: 'Certificate' },
        { says: 'Decided by' },
      ]}
      dense
    >
      {batch.requirements.flatMap((one, at) =>
        one.decisions.length === 0
          ? [
              <Row key={at}>
                <Cell strong>{one.characteristic}</Cell>
                <Cell code head="Limit">
                  {one.limit || 'as ordered'}
                </Cell>
                <Cell head="Stated" />
                <Cell>
                  <VerdictWord verdict="to_decide" says="not decided" />
                </Cell>
                <Cell />
                <Cell />
              </Row>,
            ]
          : one.decisions.map((decision, row) => (
              <Row key={`${at} ${row}`}>
                <Cell strong>
                  {row === 0 ? one.characteristic : <span className="sr-only">{one.characteristic}</span>}
                </Cell>
                <Cell code head="Limit">
                  {row === 0 && (one.limit || 'as ordered')}
                </Cell>
                <Cell code head="Stated">
                  {decision.stated}
                </Cell>
                <Cell>
                  <VerdictWord
                    verdict={asVerdict(decision.verdict)}
                    {...(decision.overrideReason
                      ? { overruled: { to: 'meets', reason: decision.overrideReason } }
                      : {})}
                  />
                </Cell>
                <Cell code head="Certificate">
                  {decision.certificate}
                </Cell>
                <Cell quiet>{decision.by}</Cell>
              </Row>
            )),
      )}
    </Table>
  );
}

const asVerdict = (text: string): Verdict => VERDICTS.find((one) => one === text) ?? 'to_decide';

function Nonconformance({ one, zone }: { one: DossierBatch['nonconformances'][number]; zone: string }) {
  return (
    <div className="border-b border-rule py-2">
      <p>
        <strong className="num text-held-ink">{one.number}</strong>{' '}
        <strong>{one.pieces === 1 ? '1 piece' : `${one.pieces} pieces`}</strong>: {one.what}
      </p>
      {one.dispositions.length === 0 && <p className="text-held-ink">Not decided yet.</p>}
      {one.dispositions.map((d, at) => (
        <p key={at} className="text-second">
          {reasonWords(d.disposition)} {d.pieces}: {d.reason}
          {d.authority && ` Authority: ${d.authority}.`}{' '}
          <span className="text-quiet">
            {d.by}, <When at={d.at} zone={zone} />
          </span>
        </p>
      ))}
    </div>
  );
}

function Signatures({ batch, zone }: BatchEvidenceProps) {
  if (batch.signatures.length === 0)
    return (
      <p className="py-2 font-cond text-word text-dispatched-ink">
        No certificate is signed for this line yet.
      </p>
    );
  return (
    <ul aria-label={`Signatures on ${batch.number}`}>
      {batch.signatures.map((one) => (
        <li key={`${one.seal} ${one.certificate}`} className="border-b border-rule py-2">
          <p>
            <VerdictWord verdict="meets" says={`signed for ${one.pieces}`} /> of certificate{' '}
            <strong className="num">{one.certificate}</strong>: {one.signer}, <When at={one.at} zone={zone} />
          </p>
          <p className="text-second text-quiet">“{one.sentence}”</p>
          <p className="num text-source break-all text-quiet">
            seal {one.seal}
            <br />
            file {one.fileSha256}
          </p>
        </li>
      ))}
    </ul>
  );
}
