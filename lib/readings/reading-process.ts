import { constants, setPriority } from 'node:os';

import { statedIn } from '@/lib/evidence/certificate/read/read-certificate';
import { drawingOf } from '@/lib/evidence/chart/drawing-of';
import { seenIn } from '@/lib/evidence/chart/judge';
import { chartPaths } from '@/lib/evidence/chart/paths';
import { readChart } from '@/lib/evidence/chart/read-chart';
import { recordingOf } from '@/lib/evidence/chart/recording';
import { readInvoice } from '@/lib/evidence/invoice/read-invoice';
import { makeRecogniser } from '@/lib/evidence/open/recogniser';
import { boxAsFiled, factsAsFiled } from '@/lib/evidence/open/as-filed';
import { openFile } from '@/lib/evidence/open/open-file';
import type { Fact } from '@/lib/evidence/fact';
import { UnreadableFile, type OpenedFile, type Page } from '@/lib/evidence/page';

import type { ChartPicture } from '@/lib/pdf/chart-picture';
import type { KeptChart } from '@/lib/charts/kept-chart';
import type { KeptCertificates, KeptInvoice, KeptPage, ReadFile } from './kept-reading';
import type { ChartAsk } from './read-document-queue';
import type { ReadingAnswer, ReadingRequest } from './reading-request';

/**
 * A process of its own for reading files: whatever a file does to it, the worker lives on and starts another. It stands
 * behind everything else that wants the machine, so that pages are answered while scans are read.
 */
setPriority(constants.priority.PRIORITY_LOW);

// One for all files: starting it takes longer than reading a page.
const recogniser = makeRecogniser();

process.on('message', (request: ReadingRequest) => {
  void answer(request).then((reply) => process.send?.(reply));
});
process.on('disconnect', () => process.exit(0));

async function answer(request: ReadingRequest): Promise<ReadingAnswer> {
  const { id } = request;
  try {
    return { id, ...(await read(request)) };
  } catch (error) {
    if (error instanceof UnreadableFile) return { id, fault: { code: error.code, message: error.message } };
    return { id, error: error instanceof Error ? (error.stack ?? error.message) : String(error) };
  }
}

interface ReadContent {
  content: KeptCertificates | KeptInvoice | KeptChart | ChartPicture;
  pages: KeptPage[];
}

async function read({ kind, name, bytes, ask }: ReadingRequest): Promise<ReadContent> {
  if (kind === 'chart' || kind === 'chart_picture') {
    if (!ask) throw new Error('a chart is held against something');
    if (kind === 'chart_picture') return { content: pictureOf(bytes, ask), pages: [] };
    return { content: { ...ask, judged: readChart(bytes, ask.requirement, ask.corrections) }, pages: [] };
  }
  const opened = await openFile(bytes, { name, recogniser });
  const pages = opened.pages.map(keptPage);
  const file = readFile(opened);
  const shown = <Stated extends { facts: Fact[] }>(stated: Stated): Stated => ({
    ...stated,
    facts: factsAsFiled(stated.facts, opened.pages),
  });
  return kind === 'invoice'
    ? { content: { file, invoice: shown(readInvoice(opened)) }, pages }
    : { content: { file, certificates: statedIn(opened).map(shown) }, pages };
}

/** In units of the picture; its letters are three quarters of them on the sheet. */
const PICTURE = { width: 720, height: 400 };

function pictureOf(bytes: Uint8Array, { requirement, corrections }: ChartAsk): ChartPicture {
  const drawing = drawingOf(seenIn(recordingOf(bytes, requirement, corrections), requirement));
  return { paths: chartPaths(drawing, PICTURE), events: drawing.events };
}

const readFile = ({ sha256, kind, recognised, pages }: OpenedFile): ReadFile => ({
  sha256,
  kind,
  recognised,
  pages: pages.length,
  // The layer of letters behind a scan is no deceit: the picture was read.
  hidden: pages.flatMap(({ hidden, origin }) =>
    hidden.flatMap(({ text, why }) => (origin === 'recognised' && why === 'invisible' ? [] : [text])),
  ),
});

const tenth = (points: number) => Math.round(points * 10) / 10;

function keptPage(page: Page): KeptPage {
  const { number, turned, words, asFiled } = page;
  const { width, height } = asFiled ?? page;
  return {
    number,
    width,
    height,
    turned,
    words: words.map(({ text, box }) => {
      const [left, top, right, bottom] = boxAsFiled(page, box);
      return [text, tenth(left), tenth(top), tenth(right), tenth(bottom)];
    }),
  };
}
