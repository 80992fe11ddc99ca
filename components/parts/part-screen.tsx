'use client';

import Link from 'next/link';
import { useRead } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { FileLink } from '@/components/files/file-link';
import { useClock, useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Day, Moment } from '@/components/ui/day';
import { Edge } from '@/components/ui/edge';
import { PageHead } from '@/components/ui/page-head';
import { MainAndSide, Section } from '@/components/ui/section';
import { Cell, Row, Table } from '@/components/ui/table';
import { TitleCells } from '@/components/ui/title-cells';
import { materialWords } from '@/lib/batches/material-words';
import { inBaseUnit } from '@/lib/parts/measure';
import { getPart, type Part } from '@/lib/parts/contract';
import { LotsOfPart } from './lots-of-part';
import { Conditions } from './parts-screen';
import { RouteOfPart } from './route-of-part';
import { EnteredMeasure, SizesOfPart } from './sizes-of-part';

/** One revision of a part: its route, its lots and where their pieces are. */
export function PartScreen({ partId }: { partId: string }) {
  const { data: part } = useRead(getPart, { partId });
  const mayEdit = useMay('part.edit');
  const mayMake = useMay('lot.create');
  const current = part.revisions.find(({ supersededAt }) => supersededAt === null);
  return (
    <>
      <PageHead
        title={
          <span className="[overflow-wrap:anywhere]">
            <span className="num text-thing">{part.number}</span>{' '}
            <span className="text-section whitespace-nowrap">rev {part.revision}</span>
          </span>
        }
        sub={part.name}
        cells={<TitleCells cells={headCells(part)} />}
        actions={<Actions part={part} mayEdit={mayEdit} mayMake={mayMake} />}
      />
      {part.supersededAt !== null && current && (
        <Edge level="warn">
          <strong>Superseded by rev {current.revision}.</strong> Its lots stay with it.{' '}
          <Link href={`/parts/${current.id}`}>Open rev {current.revision}</Link>
        </Edge>
      )}
      <MainAndSide
        main={
          <>
            <RouteOfPart part={part} />
            <LotsOfPart part={part} />
          </>
        }
        side={
          <>
            <Section title="Drawing">
              {part.drawing ? (
                <FileLink file={part.drawing} className="block py-2" />
              ) : (
                <p className="py-2 text-dispatched-ink">None yet for rev {part.revision}.</p>
              )}
            </Section>
            <SizesOfPart part={part} />
            {part.neededFor.length > 0 && <NeededFor part={part} />}
            {part.note && (
              <Section title="Note">
                <p className="py-2 [overflow-wrap:anywhere] whitespace-pre-line">{part.note}</p>
              </Section>
            )}
            <Revisions part={part} />
          </>
        }
      />
      <div className="pt-6">
        <History entity="part" id={part.id} />
      </div>
    </>
  );
}

function Actions({ part, mayEdit, mayMake }: { part: Part; mayEdit: boolean; mayMake: boolean }) {
  return (
    <>
      {mayEdit && (
        <ButtonLink href={`/parts/${part.id}/edit`} shortcut="E">
          Correct
        </ButtonLink>
      )}
      {mayEdit && part.supersededAt === null && (
        <ButtonLink href={`/parts/${part.id}/revise`}>Revise</ButtonLink>
      )}
      {mayMake && part.supersededAt === null && part.route.length > 0 && (
        <ButtonLink look="primary" href={`/lots/new?part=${part.id}`} shortcut="A">
          Add a lot
        </ButtonLink>
      )}
    </>
  );
}

function headCells(part: Part) {
  return [
    { caption: 'Material', value: materialWords(part) },
    ...(part.thickness
      ? [
          {
            caption: 'Thickness',
            value: (
              <EnteredMeasure
                entered={part.thickness.entered}
                base={inBaseUnit(part.thickness.value, 'length')}
              />
            ),
          },
        ]
      : []),
    { caption: 'Condition', value: <Conditions made={part.madeCondition} end={part.endCondition} /> },
    { caption: 'Pieces', value: part.serialised ? 'each with its serial' : 'not numbered' },
  ];
}

function NeededFor({ part }: { part: Part }) {
  const clock = useClock();
  return (
    <Section title="Needed for" note="in any revision">
      <ul>
        {part.neededFor.map((need) => (
          <li key={need.assemblyId} className="flex items-baseline gap-3 border-b border-rule py-2">
            <Link
              href={`/assemblies/${need.assemblyId}`}
              className="min-w-0 flex-1 font-medium [overflow-wrap:anywhere]"
            >
              {need.assembly}
            </Link>
            {need.neededOn && <Day day={need.neededOn} clock={clock} short />}
            <span className="whitespace-nowrap">
              <span className="num">{need.pieces.toLocaleString('en-US')}</span> pc
            </span>
          </li>
        ))}
      </ul>
    </Section>
  );
}

function Revisions({ part }: { part: Part }) {
  const clock = useClock();
  return (
    <Section title="Revisions">
      <Table
        label="Revisions"
        keep
        columns={[{ says: 'Rev' }, { says: 'Added' }, { says: 'Lots', right: true }]}
      >
        {part.revisions.map((revision) => (
          <Row
            key={revision.id}
            selected={revision.id === part.id}
            state={revision.supersededAt === null ? 'rest' : 'off'}
          >
            <Cell code>
              {revision.id === part.id ? (
                revision.revision
              ) : (
                <Link href={`/parts/${revision.id}`}>{revision.revision}</Link>
              )}
            </Cell>
            <Cell>
              <Moment at={new Date(revision.createdAt)} clock={clock} />
              {revision.supersededAt !== null && <span className="text-quiet">, superseded</span>}
            </Cell>
            <Cell figure>{revision.lots}</Cell>
          </Row>
        ))}
      </Table>
    </Section>
  );
}
