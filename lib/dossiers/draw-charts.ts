import { buffer } from 'node:stream/consumers';
import type { Readable } from 'node:stream';

import { drawingOf } from '@/lib/evidence/chart/drawing-of';
import { seenIn } from '@/lib/evidence/chart/judge';
import { chartPaths } from '@/lib/evidence/chart/paths';
import { recordingOf } from '@/lib/evidence/chart/recording';
import { UnreadableFile } from '@/lib/evidence/page';
import type { ChartPicture } from '@/lib/pdf/chart-picture';

import type { DossierChart, DossierContent, DossierFile } from './content';
import { unchanged } from './make-archive';

/** In units of the picture; its letters are three quarters of them on the sheet. */
const SIZE = { width: 720, height: 400 };

/**
 * The pictures of a dossier's charts by the chart's id, each drawn from its original as it was judged. A chart whose file
 * is not among the originals, or that today's reader cannot read, has none.
 *
 * @throws ChangedOriginal where an original no longer has the hash it was kept under.
 */
export async function drawCharts(
  content: Pick<DossierContent, 'batches' | 'files'>,
  open: (file: DossierFile) => Promise<Readable>,
): Promise<ReadonlyMap<string, ChartPicture>> {
  const pictures = new Map<string, ChartPicture>();
  for (const chart of content.batches.flatMap((batch) => batch.charts)) {
    const file = content.files.find(({ id }) => id === chart.fileId);
    if (!file || pictures.has(chart.id)) continue;
    const picture = drawn(chart, unchanged(file, await buffer(await open(file))));
    if (picture) pictures.set(chart.id, picture);
  }
  return pictures;
}

function drawn({ requirement, corrections }: DossierChart, original: Uint8Array): ChartPicture | null {
  try {
    const drawing = drawingOf(seenIn(recordingOf(original, requirement, corrections), requirement));
    return { paths: chartPaths(drawing, SIZE), events: drawing.events };
  } catch (error) {
    if (error instanceof UnreadableFile) return null;
    throw error;
  }
}
