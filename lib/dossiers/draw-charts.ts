import { buffer } from 'node:stream/consumers';
import type { Readable } from 'node:stream';

import type { ChartPicture } from '@/lib/pdf/chart-picture';
import { ReadingChild } from '@/lib/readings/reading-child';

import type { DossierContent, DossierFile } from './content';
import { unchanged } from './make-archive';

/**
 * The pictures of a dossier's charts by the chart's id, each drawn from its original as it was judged. A chart whose file
 * is not among the originals, or that today's reader cannot read, has none. A record of weeks takes seconds to draw, so it is
 * done in a process of its own, as reading is, and the worker goes on with its other jobs.
 *
 * @throws ChangedOriginal where an original no longer has the hash it was kept under.
 */
export async function drawCharts(
  content: Pick<DossierContent, 'batches' | 'files'>,
  open: (file: DossierFile) => Promise<Readable>,
): Promise<ReadonlyMap<string, ChartPicture>> {
  const pictures = new Map<string, ChartPicture>();
  const child = new ReadingChild();
  try {
    for (const chart of content.batches.flatMap((batch) => batch.charts)) {
      const file = content.files.find(({ id }) => id === chart.fileId);
      if (!file || pictures.has(chart.id)) continue;
      const { requirement, corrections } = chart;
      const drawn = await child.read({
        kind: 'chart_picture',
        name: file.name,
        bytes: unchanged(file, await buffer(await open(file))),
        ask: { requirement, corrections },
      });
      // The process is of this very edition: it hands back what it is asked for.
      if ('content' in drawn) pictures.set(chart.id, drawn.content as ChartPicture);
    }
  } finally {
    child.close();
  }
  return pictures;
}
