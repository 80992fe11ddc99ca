'use client';
import Link from 'next/link';
import { useState } from 'react';

import { useLazyRead, useWrite } from '@/components/api/use-api';
import { useClock, useMay } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { Failing } from '@/components/ui/failing';
import { Loading } from '@/components/ui/loading';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import { BatchTag } from '@/components/ui/tag';
import { getChart, judgeChart, type ChartDetail } from '@/lib/charts/contract';
import type { ChartCorrections } from '@/lib/evidence/chart/corrections';
import type { ChartRequirement } from '@/lib/evidence/chart/requirement';

import { AskedForm } from './asked-form';
import { FurnaceChart } from './furnace-chart';
import { UnderstoodForm } from './understood-form';
import { useDrawing } from './use-drawing';
import { WhatItSays } from './what-it-says';

const LOOK_AGAIN_MS = 1500;

/** A furnace chart beside what it must show; how it was understood can be put right and shows at once. */
export function ChartScreen({ chartId }: { chartId: string }) {
  const { data, error } = useLazyRead(
    getChart,
    { chartId },
    { refreshEveryMs: LOOK_AGAIN_MS, refreshWhile: ({ state }) => state === 'waiting' },
  );
  if (error) return <Failing says="The chart could not be read." again={error.message} />;
  if (!data) return <Loading label="Loading the chart" rows={8} />;
  return <Chart key={JSON.stringify(data.kept?.requirement ?? data.asked)} data={data} />;
}

function Chart({ data }: { data: ChartDetail }) {
  const clock = useClock();
  const { file, batch, chart, kept } = data;
  const [requirement, setRequirement] = useState<ChartRequirement | null>(kept?.requirement ?? data.asked);
  const [corrections, setCorrections] = useState<ChartCorrections>(kept?.corrections ?? {});
  const { drawn, isLoading, error } = useDrawing(file.id, { requirement, corrections });
  return (
    <>
      <PageHead
        tag={<BatchTag stage={batch.stage} number={batch.number} href={`/batches/${batch.id}`} />}
        title={`Chart ${file.name}`}
        sub={
          <>
            {batch.processor}, sent by {chart.sentBy}, <Moment at={new Date(chart.createdAt)} clock={clock} />
            {data.others.map((other, at) => (
              <span key={other.id}>
                {at === 0 ? '. Of the same batch: ' : ', '}
                <Link href={`/charts/${other.id}`}>{other.fileName}</Link>
              </span>
            ))}
          </>
        }
        actions={
          <a href={`/api/files/${file.id}/content`} className="lw-word-button">
            Save the file
          </a>
        }
      />
      <div className="grid grid-cols-1 gap-9 xl:grid-cols-[minmax(0,944fr)_minmax(0,412fr)]">
        <div className="min-w-0">
          {isLoading && <Loading label="Loading the chart" rows={8} />}
          {error && <Failing says="The file could not be fetched." again={error.message} />}
          {requirement === null && (
            <p className="py-3">
              The batch asks for no temperature, or for several. Say what the chart is to be held against.
            </p>
          )}
          {drawn && 'fault' in drawn && (
            <Failing says={drawn.fault} stands="Say below how it is to be understood, or read it by eye." />
          )}
          {requirement && drawn && 'drawing' in drawn && data.fault && (
            <Failing
              says={data.fault}
              stands="Below is what this browser reads in it; keep it to have it read anew."
            />
          )}
          {drawn && 'drawing' in drawn && <FurnaceChart drawing={drawn.drawing} />}
        </div>
        <div className="flex min-w-0 flex-col gap-6">
          {drawn && 'judged' in drawn && requirement && (
            <Section title="What the chart says" note={VERDICT_NOTES[drawn.judged.verdict]}>
              <WhatItSays judged={drawn.judged} requirement={requirement} />
            </Section>
          )}
          <Section title="Held against" note={data.asked ? 'as ordered, unless you change it' : undefined}>
            <AskedForm requirement={requirement} onChange={setRequirement} />
          </Section>
          {drawn && 'judged' in drawn && (
            <Section title="How it was understood" note={`${drawn.judged.understood.rows} rows`}>
              <UnderstoodForm
                understood={drawn.judged.understood}
                corrections={corrections}
                onChange={setCorrections}
              />
            </Section>
          )}
          {requirement && <Keep data={data} requirement={requirement} corrections={corrections} />}
        </div>
      </div>
    </>
  );
}

const VERDICT_NOTES = {
  pass: 'it proposes: meets',
  fail: 'it proposes: does not meet',
  review: 'a person must look',
};

interface KeepProps {
  data: ChartDetail;
  requirement: ChartRequirement;
  corrections: ChartCorrections;
}

function Keep({ data, requirement, corrections }: KeepProps) {
  const mayJudge = useMay('certificate.prove');
  const write = useWrite(judgeChart, { refreshes: [getChart] });
  const isKept =
    data.kept !== null &&
    JSON.stringify([data.kept.requirement, data.kept.corrections]) ===
      JSON.stringify([requirement, corrections]);
  if (!mayJudge) return null;
  const keep = async () => {
    const done = await write
      .mutateAsync({ chartId: data.chart.id, requirement, corrections })
      .catch((error: Error) => void showMessage({ says: error.message, failed: true }));
    if (done) showMessage({ says: 'Kept. The chart is read anew by the worker.' });
  };
  return (
    <div>
      <Button look="primary" busy={write.isPending} notNow={isKept && 'Kept as it stands.'} onClick={keep}>
        Keep this reading
      </Button>
    </div>
  );
}
