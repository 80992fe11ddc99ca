'use client';
import { useState } from 'react';

import { useRead } from '@/components/api/use-api';
import { useMay } from '@/components/session/use-me';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { Pieces } from '@/components/ui/pieces';
import { Section } from '@/components/ui/section';
import { BatchTag } from '@/components/ui/tag';
import { TitleCells } from '@/components/ui/title-cells';
import { getGate } from '@/lib/stock/contract';

import { ReleaseDone, type Released } from './release-done';
import { ReleaseForm } from './release-gate-form';

/** The gate: line by line what may pass and what is still missing; then how many, and where to. */
export function ReleaseScreen({ batchId }: { batchId: string }) {
  const { data } = useRead(getGate, { batchId });
  const mayRelease = useMay('stock.release');
  const [released, setReleased] = useState<readonly Released[]>([]);
  const { lines } = data;
  const sum = (of: (line: (typeof lines)[number]) => number) =>
    lines.reduce((all, line) => all + of(line), 0);
  const mayPass = sum((line) => line.mayPass);
  const cells = [
    { caption: 'From', value: data.processor },
    {
      caption: 'May pass now',
      value: <Pieces count={mayPass} of={sum((line) => line.pieces) - sum((line) => line.released)} />,
    },
    {
      caption: 'Released before',
      value: <Pieces count={sum((line) => line.released)} of={sum((line) => line.pieces)} />,
    },
    ...data.assemblies
      .slice(0, 2)
      .map((one) => ({ caption: one.name, value: <Pieces count={one.ready} of={one.needed} /> })),
  ];
  return (
    <>
      <h1 className="sr-only">Release {data.number}</h1>
      <PageHead
        tag={<BatchTag stage={data.stage} number={data.number} size="head" href={`/batches/${batchId}`} />}
        cells={<TitleCells cells={cells} />}
        actions={
          sum((line) => line.released) > 0 && (
            <ButtonLink href={`/batches/${batchId}/labels`}>Labels</ButtonLink>
          )
        }
      />
      {released.length > 0 && <ReleaseDone batchId={batchId} released={released} />}
      <Section title="The gate" note="counted in, proved, nothing on hold, paid">
        {!data.dispatched && (
          <Empty
            says={`${data.number} has not left yet.`}
            comes="Nothing of it can be released before it is back."
            action={
              <ButtonLink look="word" href={`/batches/${batchId}`}>
                To the batch
              </ButtonLink>
            }
          />
        )}
        {data.dispatched && (
          <ReleaseForm
            key={sum((line) => line.released)}
            gate={data}
            mayRelease={mayRelease}
            onReleased={(one) => setReleased((before) => [...before, one])}
          />
        )}
      </Section>
    </>
  );
}
