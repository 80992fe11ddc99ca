'use client';
import Link from 'next/link';
import { useState } from 'react';

import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/day';
import { useClock } from '@/components/session/use-me';

import { certificateName, shortHash } from './certificate-words';
import { PageViewer } from './page-viewer';
import { ProvePanel } from './prove-panel';
import { Thread } from './thread';
import { useProving, type Proving } from './use-proving';
import { spotsOf } from './use-reading';

/** The page left, what it must prove right. */
export function ProveScreen({ certificateId }: { certificateId: string }) {
  const proving = useProving(certificateId);
  return (
    <div className="-mx-6 -mb-9 grid grid-cols-1 max-md:-mx-4 lg:h-[calc(100dvh-3rem)] lg:min-h-[36rem] lg:grid-cols-[minmax(0,676fr)_minmax(0,764fr)] print:h-auto">
      <div className="min-w-0 border-ink max-lg:border-b-heavy lg:flex lg:min-h-0 lg:border-r-heavy [&>*]:flex-1">
        <Viewed proving={proving} />
      </div>
      <ProvePanel proving={proving} />
      <Thread row={proving.selected} drawn={proving.reading.drawn} />
    </div>
  );
}

function Viewed({ proving }: { proving: Proving }) {
  const { data, reading, selected } = proving;
  const clock = useClock();
  const [chartId, setChartId] = useState<string | null>(null);
  const chart = data.charts.find((one) => one.id === chartId);
  const { certificate, file } = data;
  const title = chart
    ? `Chart ${chart.fileName}`
    : `Certificate ${certificateName({ ...certificate, fileName: file.name })}`;
  const shown = chart ? { id: chart.fileId, name: chart.fileName, mediaType: chart.mediaType } : file;
  const facts = (
    <>
      <span className="text-quiet">
        from {certificate.sentBy}, <Moment at={new Date(certificate.createdAt)} clock={clock} />
      </span>
      {!chart && file.sha256 && (
        <span className="num ml-auto text-quiet" title={file.sha256}>
          sha-256 {shortHash(file.sha256)}
        </span>
      )}
    </>
  );
  const choice = data.charts.length > 0 && (
    <span className="flex flex-wrap gap-x-3">
      {chart && (
        <Button look="word" onClick={() => setChartId(null)}>
          Certificate
        </Button>
      )}
      {data.charts
        .filter((one) => one.id !== chartId)
        .map((one) =>
          // A recorder's table is drawn on a page of its own; a chart on paper is looked at here.
          isTable(one) ? (
            <Link key={one.id} href={`/charts/${one.id}`} className="lw-word-button">
              Chart {one.fileName}
            </Link>
          ) : (
            <Button key={one.id} look="word" onClick={() => setChartId(one.id)}>
              Chart {one.fileName}
            </Button>
          ),
        )}
    </span>
  );
  const read = {
    pages: reading.data?.pages ?? [],
    onDrawn: reading.onDrawn,
    spots: spotsOf(reading.data, { ...data, selected }),
    selected,
    numberOf: (row: string) => proving.rows.indexOf(row) + 1,
    onRow: proving.toRow,
    onWords: proving.canEdit && selected !== null ? reading.choose : null,
  };
  return (
    <PageViewer
      key={shown.id}
      file={shown}
      title={title}
      facts={facts}
      choice={choice}
      {...(!chart && { read })}
    />
  );
}

const isTable = ({ mediaType }: { mediaType: string }): boolean => mediaType.startsWith('text/');
