'use client';
import { useState } from 'react';

import { useRead, useWrite } from '@/components/api/use-api';
import { History } from '@/components/audit/history';
import { useClock, useMay } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Day, Until } from '@/components/ui/day';
import { Dialog } from '@/components/ui/dialog';
import { Empty } from '@/components/ui/empty';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Pieces } from '@/components/ui/pieces';
import { Section } from '@/components/ui/section';
import { SteelRule } from '@/components/ui/steel-rule';
import { Cell, Row, Table } from '@/components/ui/table';
import { TitleCells } from '@/components/ui/title-cells';
import type { OutputOf } from '@/lib/api/endpoint';
import { closeAssembly, getAssembly, listAssemblies } from '@/lib/assemblies/contract';

import { NeedLine } from './need-line';
import { readyOf } from './rest-words';

type Assembly = OutputOf<typeof getAssembly>;

const COLUMNS = [
  { says: 'Part' },
  { says: 'Needed', right: true },
  { says: 'Fitted', right: true },
  { says: 'In stock', right: true },
  { says: 'Ready' },
  { says: 'Where the rest is' },
  { says: 'What can be done', hidden: true },
];

/** One assembly, part by part: fitted, in stock, and where the rest is until when. */
export function AssemblyScreen({ assemblyId }: { assemblyId: string }) {
  const { data } = useRead(getAssembly, { assemblyId });
  const mayEdit = useMay('assembly.edit');
  const clock = useClock();
  const [needed, ready] = [
    data.needs.reduce((sum, need) => sum + need.pieces, 0),
    data.needs.reduce((sum, need) => sum + readyOf(need), 0),
  ];
  const fitted = data.needs.reduce((sum, need) => sum + need.fitted, 0);
  const tick = Math.max(1, Math.ceil(needed / 20));
  const cells = [
    ...(data.neededOn
      ? [
          {
            caption: 'Needed',
            value: (
              <>
                <Day day={data.neededOn} clock={clock} />{' '}
                {!data.closed && ready < needed && <Until day={data.neededOn} clock={clock} />}
              </>
            ),
          },
        ]
      : []),
    { caption: 'Ready', value: <Pieces count={ready} of={needed} /> },
    { caption: 'Fitted', value: <Pieces count={fitted} of={needed} /> },
    ...(data.closed ? [{ caption: 'State', value: 'closed' }] : []),
  ];
  return (
    <>
      <PageHead
        title={data.name}
        sub={data.note ?? undefined}
        cells={<TitleCells cells={cells} />}
        actions={
          mayEdit &&
          !data.closed && (
            <>
              <CloseAssembly assembly={data} ready={ready} needed={needed} />
              <ButtonLink href={`/assemblies/${assemblyId}/edit`} shortcut="E">
                Change it
              </ButtonLink>
            </>
          )
        }
      />
      {needed > 0 && (
        <div className="pb-4">
          <SteelRule
            to={needed}
            tick={tick}
            number={tick * 5}
            value={ready}
            width={620}
            tone="stocked"
            says={`${ready} of ${needed} pieces ready`}
          />
        </div>
      )}
      <div className="flex flex-col gap-6">
        <Section
          title="What it needs"
          note={
            data.needs.length > 0
              ? `${data.needs.length} ${data.needs.length === 1 ? 'part' : 'parts'}`
              : undefined
          }
        >
          {data.needs.length === 0 && (
            <Empty
              says="No parts are entered yet."
              comes="Enter the part numbers and how many of each."
              action={
                mayEdit &&
                !data.closed && (
                  <ButtonLink look="word" href={`/assemblies/${assemblyId}/edit`}>
                    Enter them
                  </ButtonLink>
                )
              }
            />
          )}
          {data.needs.length > 0 && (
            <Table label={`What ${data.name} needs`} columns={COLUMNS}>
              {data.needs.map((need) => (
                <NeedLine key={need.partNumber} need={need} assembly={data} span={COLUMNS.length} />
              ))}
              <Row state="sum">
                <Cell>All parts</Cell>
                <Cell figure head="Needed">
                  {needed}
                </Cell>
                <Cell figure head="Fitted">
                  {fitted}
                </Cell>
                <Cell figure head="In stock">
                  {data.needs.reduce((sum, need) => sum + need.inStock, 0)}
                </Cell>
                <Cell>
                  {ready} of {needed}
                </Cell>
                <Cell />
                <Cell />
              </Row>
            </Table>
          )}
        </Section>
        <History entity="assembly" id={assemblyId} />
      </div>
    </>
  );
}

function CloseAssembly({ assembly, ready, needed }: { assembly: Assembly; ready: number; needed: number }) {
  const [open, setOpen] = useState(false);
  const [refusal, setRefusal] = useState<string>();
  const write = useWrite(closeAssembly, { refreshes: [getAssembly, listAssemblies] });
  const fitted = assembly.needs.reduce((sum, need) => sum + need.fitted, 0);
  const close = () =>
    write.mutateAsync({ assemblyId: assembly.id, version: assembly.version }).then(
      () => {
        setOpen(false);
        showMessage({ says: `${assembly.name} is closed.` });
      },
      (error: unknown) => setRefusal(error instanceof Error ? error.message : 'It was not closed.'),
    );
  return (
    <>
      <Button onClick={() => setOpen(true)}>Close it</Button>
      <Dialog
        open={open}
        onClose={() => setOpen(false)}
        busy={write.isPending}
        title={`Close ${assembly.name}`}
        lead={
          fitted >= needed
            ? 'All it needs is fitted. It waits for nothing more, and what is fitted stays fitted.'
            : `${fitted} of ${needed} are fitted. It waits for nothing more, and the ${Math.max(0, ready - fitted)} that lie in stock for it are free for others.`
        }
        onSubmit={close}
        actions={
          <>
            <Button look="primary" type="submit" busy={write.isPending} busyLabel="Closing">
              Close {assembly.name}
            </Button>
            <Button onClick={() => setOpen(false)}>Leave it open</Button>
          </>
        }
      >
        {refusal && (
          <p role="alert" className="font-medium text-held-ink">
            {refusal}
          </p>
        )}
      </Dialog>
    </>
  );
}
