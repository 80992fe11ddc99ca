'use client';
import { useState } from 'react';

import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { HowWell } from '@/components/ui/how-well';
import { Cell, Row, Table } from '@/components/ui/table';
import { fieldWords } from '@/lib/readings/field-words';
import { correctReading, getCertificateReading, type CertificateReading } from '@/lib/readings/contract';
import { qualityOf } from '@/lib/readings/quality';

import type { Proving } from './use-proving';

const COLUMNS = [
  { says: 'What' },
  { says: 'As read' },
  { says: 'How well', className: 'w-14' },
  { says: 'Page', right: true, className: 'w-12' },
  { says: 'Correct it', hidden: true },
];

/** Everything the machine read, folded: each with how well, and a way to read it differently. */
export function ReadFacts({ proving }: { proving: Proving }) {
  const { data } = proving.reading;
  if (!data) return null;
  return (
    <details className="pt-2 text-second">
      <summary className="font-cond text-word">
        All {data.facts.length} things read <span className="lw-word-button">Show</span>
      </summary>
      <Table label="What the machine read" columns={COLUMNS} dense>
        {[...data.facts, ...notFound(data)].map((fact, at) => (
          <FactRow key={at} fact={fact} proving={proving} corrections={data.corrections} />
        ))}
      </Table>
    </details>
  );
}

/** What is on every good certificate: where the machine missed it, a person says what stands there. */
const ON_EVERY = [
  'certificate_number',
  'certificate_date',
  'purchase_order',
  'signature_present',
  'conformance_statement',
];

const notFound = ({ facts }: CertificateReading): FactRowProps['fact'][] =>
  ON_EVERY.filter((field) => !facts.some((fact) => fact.field === field)).map((field) => ({
    field,
    value: null,
    raw: 'not found',
    page: null,
    confidence: null,
  }));

interface FactRowProps {
  fact: Pick<CertificateReading['facts'][number], 'field' | 'value' | 'raw'> & {
    page: number | null;
    confidence: number | null;
  };
  proving: Proving;
  corrections: CertificateReading['corrections'];
}

function FactRow({ fact, proving, corrections }: FactRowProps) {
  const [isOpen, setOpen] = useState(false);
  const correction = corrections.findLast(({ field }) => field === fact.field);
  return (
    <Row>
      <Cell>{fieldWords(fact.field)}</Cell>
      <Cell code className="text-[0.78rem] [overflow-wrap:anywhere]">
        {correction ? (
          <>
            <del>{fact.raw}</del> <strong>{correction.corrected}</strong>{' '}
            <span className="font-sans text-quiet">{correction.correctedBy}</span>
          </>
        ) : (
          fact.raw
        )}
      </Cell>
      <Cell>{fact.confidence !== null && <HowWell quality={qualityOf(fact.confidence)} />}</Cell>
      <Cell right>{fact.page}</Cell>
      <Cell right>
        {proving.canEdit &&
          (isOpen ? (
            <CorrectForm fact={fact} proving={proving} onDone={() => setOpen(false)} />
          ) : (
            <Button
              look="word"
              onClick={() => setOpen(true)}
              aria-label={`Read ${fieldWords(fact.field)} differently`}
            >
              Read it differently
            </Button>
          ))}
      </Cell>
    </Row>
  );
}

function CorrectForm({ fact, proving, onDone }: Omit<FactRowProps, 'corrections'> & { onDone: () => void }) {
  const write = useWrite(correctReading, { refreshes: [getCertificateReading] });
  const [corrected, setCorrected] = useState(fact.value === null ? '' : String(fact.value));
  const keep = () =>
    write
      .mutateAsync({ certificateId: proving.data.certificate.id, field: fact.field, corrected })
      .then(onDone, () => undefined);
  return (
    <form
      className="flex flex-wrap items-end justify-end gap-2"
      onSubmit={(event) => {
        event.preventDefault();
        void keep();
      }}
    >
      <TextField
        label={fieldWords(fact.field)}
        mono
        autoFocus
        value={corrected}
        maxLength={400}
        error={write.error?.problem.title}
        onChange={(event) => setCorrected(event.currentTarget.value)}
      />
      <Button type="submit" size="small" busy={write.isPending}>
        Keep
      </Button>
      <Button size="small" onClick={onDone}>
        Back
      </Button>
    </form>
  );
}
