'use client';

import Link from 'next/link';
import { useRead } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { useClock, useMay } from '@/components/session/use-me';
import { Conditions } from '@/components/parts/parts-screen';
import { ButtonLink } from '@/components/ui/button';
import { Day, Moment } from '@/components/ui/day';
import { AsQuenchedNote } from '@/components/reference/as-quenched-note';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide, Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { TitleCells } from '@/components/ui/title-cells';
import { materialWords } from '@/lib/batches/material-words';
import { getLot, type Lot } from '@/lib/lots/contract';
import { PROCESS_WORDS } from '@/lib/trade/process';
import { Ledger } from './ledger';
import { LotFacts } from './lot-facts';
import { MillCertificate } from './mill-certificate';
import { NamedPieces } from './named-pieces';
import { WherePiecesAre } from './where-pieces-are';

/** One lot: where every piece is, how it got there, and what came with it. */
export function LotScreen({ lotId }: { lotId: string }) {
  const { data: lot } = useRead(getLot, { lotId });
  const mayEdit = useMay('lot.create');
  const mayRead = useMay('dossier.read');
  return (
    <>
      <PageHead
        title={<span className="num text-thing">{lot.number}</span>}
        cells={<TitleCells cells={headCells(lot)} />}
        actions={mayRead && <ButtonLink href={`/lots/${lot.id}/dossier`}>Dossier</ButtonLink>}
      />
      <MainAndSide
        main={
          <>
            <WherePiecesAre lot={lot} />
            {lot.named.length > 0 && <NamedPieces lot={lot} />}
            <BatchesOfLot lot={lot} />
            <Ledger lotId={lot.id} made={lot.made} />
          </>
        }
        side={
          <>
            <MillCertificate lot={lot} mayEdit={mayEdit} />
            <LotFacts lot={lot} mayEdit={mayEdit} />
            <RouteOfLot lot={lot} />
          </>
        }
      />
      <div className="pt-6">
        <History entity="lot" id={lot.id} />
      </div>
    </>
  );
}

function headCells(lot: Lot) {
  const { part } = lot;
  return [
    {
      caption: 'Part',
      value: (
        <span className="[overflow-wrap:anywhere]">
          <Link href={`/parts/${part.id}`} className="num font-semibold">
            {part.number}
          </Link>{' '}
          rev {part.revision} {part.name}
          {part.supersededAt !== null && <span className="font-normal text-quiet">, superseded</span>}
        </span>
      ),
    },
    { caption: 'Material', value: [materialWords(part), part.thickness].filter(Boolean).join(', ') },
    { caption: 'Condition', value: <Conditions made={part.madeCondition} end={part.endCondition} /> },
    { caption: 'Heat', value: <span className="num [overflow-wrap:anywhere]">{lot.heat}</span> },
  ];
}

const BATCH_COLUMNS = [
  { says: 'Batch' },
  { says: 'For' },
  { says: 'To' },
  { says: 'Pieces', right: true },
  { says: 'Dispatched' },
  { says: 'Promised' },
];

function BatchesOfLot({ lot }: { lot: Lot }) {
  const clock = useClock();
  return (
    <Section title="Batches it went on" note={lot.batches.length > 0 ? 'newest first' : undefined}>
      {lot.batches.length === 0 ? (
        <Empty
          says="It has not gone out yet."
          comes="Its pieces can ride along on any batch for the step they wait for."
          action={<Link href="/batches">To the batches</Link>}
        />
      ) : (
        <Table label="Batches" columns={BATCH_COLUMNS}>
          {lot.batches.map((batch) => (
            <Row key={batch.id}>
              <Cell>
                <BatchTag
                  stage={batch.stage}
                  number={batch.number}
                  href={`/batches/${batch.id}`}
                  size="row"
                />
              </Cell>
              <Cell head="For">{PROCESS_WORDS[batch.process]}</Cell>
              <Cell head="To">{batch.processor}</Cell>
              <Cell figure head="Pieces">
                {batch.pieces.toLocaleString('en-US')}
              </Cell>
              <Cell head="Dispatched">
                {batch.dispatchedAt && <Moment at={new Date(batch.dispatchedAt)} clock={clock} />}
              </Cell>
              <Cell head="Promised">
                {batch.promisedOn && <Day day={batch.promisedOn} clock={clock} short />}
              </Cell>
            </Row>
          ))}
        </Table>
      )}
    </Section>
  );
}

function RouteOfLot({ lot }: { lot: Lot }) {
  return (
    <Section title="Its way outside" note={lot.route.length === 1 ? '1 step' : `${lot.route.length} steps`}>
      <ol>
        {lot.route.map((step) => {
          const waiting = lot.whereabouts
            .filter(({ place, holder }) => place === 'making' && holder?.id === step.id)
            .reduce((sum, { pieces }) => sum + pieces, 0);
          return (
            <li key={step.id} className="flex items-baseline gap-3 border-b border-rule py-2">
              <span className="num w-4 text-quiet">{step.seq}</span>
              <span className="min-w-0 flex-1">
                <strong>{PROCESS_WORDS[step.process]}</strong>{' '}
                {step.targetCondition && <span className="num">to {step.targetCondition}</span>}
                <span className="block text-second [overflow-wrap:anywhere] text-quiet">
                  {step.specification} {step.specificationRevision}
                </span>
                <AsQuenchedNote alloy={lot.part.alloy} condition={step.targetCondition} />
              </span>
              {waiting > 0 && (
                <span className="whitespace-nowrap">
                  <span className="num">{waiting.toLocaleString('en-US')}</span> waiting
                </span>
              )}
            </li>
          );
        })}
      </ol>
    </Section>
  );
}
