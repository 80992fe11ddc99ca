'use client';
import Link from 'next/link';

import { useRead } from '@/components/api/use-api';
import { FileLink } from '@/components/files/file-link';
import { useClock, useMay } from '@/components/session/use-me';
import { Moment } from '@/components/ui/day';
import { Edge } from '@/components/ui/edge';
import { PageHead } from '@/components/ui/page-head';
import { Pieces } from '@/components/ui/pieces';
import { MainAndSide, Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { BatchTag } from '@/components/ui/tag';
import { TitleCells } from '@/components/ui/title-cells';
import {
  getNonconformance,
  type DispositionRow,
  type NonconformanceDetail,
} from '@/lib/nonconformances/contract';
import { KIND_WORDS } from '@/lib/nonconformances/kind';
import { limitWords } from '@/lib/parts/limit-words';

import { doneWords } from './disposition-words';
import { DispositionForm } from './disposition-form';

export function NonconformanceScreen({ nonconformanceId }: { nonconformanceId: string }) {
  const clock = useClock();
  const mayDecide = useMay('nonconformance.disposition');
  const { data } = useRead(getNonconformance, { nonconformanceId });
  const left = data.pieces - data.decided;
  const cells = [
    {
      caption: 'Batch',
      value: <BatchTag stage={data.stage} number={data.batchNumber} href={`/batches/${data.batchId}`} />,
    },
    { caption: 'Processor', value: data.processor },
    { caption: 'Kind', value: KIND_WORDS[data.kind] },
    { caption: 'Pieces', value: <Pieces count={data.pieces} /> },
    {
      caption: 'Raised',
      value: (
        <>
          {data.openedBy}, <Moment at={new Date(data.openedAt)} clock={clock} />
        </>
      ),
    },
  ];
  return (
    <>
      <PageHead
        title={<span className="num text-thing">{data.number}</span>}
        cells={<TitleCells cells={cells} />}
      />
      <MainAndSide
        main={
          <>
            <What data={data} />
            {data.closedAt === null ? (
              <Section
                title={`Decide about ${left === data.pieces ? '' : 'the other '}${left}`}
                note={
                  data.kind === 'short' ? undefined : (
                    <>
                      <Pieces count={data.onHold} /> on hold
                    </>
                  )
                }
              >
                {mayDecide ? (
                  <DispositionForm key={data.version} nonconformance={data} />
                ) : (
                  <p className="py-2 text-quiet">Inspectors decide about it.</p>
                )}
              </Section>
            ) : (
              <Edge level="note">
                <strong>Closed:</strong> nothing is left to decide,{' '}
                <Moment at={new Date(data.closedAt)} clock={clock} />.
              </Edge>
            )}
          </>
        }
        side={<Decided data={data} />}
      />
    </>
  );
}

function What({ data }: { data: NonconformanceDetail }) {
  return (
    <Section title="What is wrong">
      <p className="max-w-prose py-2">
        <strong>{data.what}</strong>
      </p>
      <p className="text-second">
        Line <span className="num">{data.lineNo}</span>, {data.partNumber} rev {data.partRevision},{' '}
        {data.partName}; lot <span className="num">{data.lotNumber}</span>; <Pieces count={data.linePieces} />{' '}
        ordered on {data.orderNumber}.
      </p>
      {data.requirement && (
        <p className="text-second">
          {data.requirement.characteristic}: ordered{' '}
          <span className="num">{limitWords(data.requirement)}</span>
          {data.requirement.stated && (
            <>
              , stated <span className="num">{data.requirement.stated}</span>
            </>
          )}
          .
        </p>
      )}
      {data.certificate && (
        <p className="text-second">
          Found on{' '}
          <Link href={`/certificates/${data.certificate.id}`}>
            {data.certificate.number === null ? (
              'a certificate without number yet'
            ) : (
              <>
                certificate <span className="num">{data.certificate.number}</span>
              </>
            )}
          </Link>
          .
        </p>
      )}
      {data.coveredPieces > 0 && (
        <p className="text-second">
          <Pieces count={data.coveredPieces} /> of them were covered by a signed certificate. The hold took
          that proof away: they are proved again, or accepted by an authority.
        </p>
      )}
      {data.reprocessedBefore > 0 && (
        <p className="text-second text-dispatched-ink">
          Pieces of this lot went through this step again{' '}
          {data.reprocessedBefore === 1 ? 'once' : `${data.reprocessedBefore} times`} already. Look at the
          limit of the specification before you reprocess.
        </p>
      )}
    </Section>
  );
}

const COLUMNS = [{ says: 'Pieces', right: true }, { says: 'Decided' }, { says: 'Why, and by whom' }];

function Decided({ data }: { data: NonconformanceDetail }) {
  return (
    <Section title="Decided so far" note={<Pieces count={data.decided} of={data.pieces} />}>
      {data.dispositions.length === 0 ? (
        <p className="py-2 text-quiet">Nothing yet.</p>
      ) : (
        <Table label="What was decided" columns={COLUMNS} keep>
          {data.dispositions.map((row) => (
            <DecidedRow key={row.id} row={row} kind={data.kind} />
          ))}
        </Table>
      )}
    </Section>
  );
}

function DecidedRow({ row, kind }: { row: DispositionRow; kind: NonconformanceDetail['kind'] }) {
  const clock = useClock();
  return (
    <Row>
      <Cell figure>{row.pieces}</Cell>
      <Cell strong>{doneWords(kind, row.disposition)}</Cell>
      <Cell>
        {row.reason}
        {row.authority && <span className="block text-second">Allowed by {row.authority}</span>}
        {row.file && (
          <span className="block">
            <FileLink file={row.file} />
          </span>
        )}
        <span className="block text-source text-quiet">
          {row.decidedBy}, <Moment at={new Date(row.decidedAt)} clock={clock} />
        </span>
      </Cell>
    </Row>
  );
}
