import type { PDFPageProxy } from 'pdfjs-dist/legacy/build/pdf.mjs';
import type { Box, HiddenText, Mark, Page, Word } from '../../page';
import type { Drawn, DrawnRun } from './drawn';
import type { FontMetrics } from './graphics-state';
import { isReadable } from './letters';
import { gatherLines } from './lines';
import { findMarks } from './marks';
import type { Matrix } from './matrix';
import { replay } from './replay';
import { partUnseen } from './unseen';
import { layWords } from './words';

/** Whether layers that can be switched are on; pdf.js's own answer. */
export interface Layers {
  isVisible(group: unknown): boolean;
}

/** A page as its file describes it, before anyone has looked at its picture. */
export interface DescribedPage {
  readonly page: Page;
  /** What is drawn on the upright page. */
  readonly drawn: Drawn;
  /** The same on the page as it lies in the file, turned by nothing. */
  describeUnturned(): { readonly drawn: Drawn; readonly box: Box };
  /** 0 to 1: the share of characters whose font says which letter they are. */
  readonly readable: number;
}

/** Reads the words, marks and hidden text of one page from its operators. Nothing on it is run or painted. */
export async function readPage(proxy: PDFPageProxy, layers: Layers): Promise<DescribedPage> {
  const operators = await proxy.getOperatorList();
  const play = (rotation: number) => {
    const viewport = proxy.getViewport({ scale: 1, rotation });
    const page: Box = [0, 0, viewport.width, viewport.height];
    const drawn = replay(operators, {
      matrix: viewport.transform as unknown as Matrix,
      page,
      fontNamed: (name) => fontIn(proxy, name),
      layerIsOn: (properties) => layers.isVisible(properties),
    });
    return { rotation, page, drawn };
  };

  const asFiled = play(proxy.rotate);
  const turn = turnToUpright(asFiled.drawn.runs);
  const upright = turn === 0 ? asFiled : play((proxy.rotate + turn) % 360);
  const { seen, unseen } = partUnseen(upright.drawn, upright.page);
  const { words, rules } = wordsOf(seen);
  return {
    drawn: upright.drawn,
    describeUnturned: () => {
      const { drawn, page: box } = upright.rotation === 0 ? upright : play(0);
      return { drawn, box };
    },
    readable: shareReadable(upright.drawn.runs),
    page: {
      number: proxy.pageNumber,
      width: upright.page[2],
      height: upright.page[3],
      turned: quarterOf(upright.rotation),
      origin: 'text_layer',
      words,
      marks: [...findMarks(upright.drawn, upright.page), ...rules],
      hidden: hiddenOf(unseen),
    },
  };
}

function fontIn(proxy: PDFPageProxy, name: string): FontMetrics | null {
  if (!proxy.commonObjs.has(name)) return null;
  return proxy.commonObjs.get(name) as FontMetrics;
}

const quarterOf = (degrees: number): Page['turned'] => {
  const quarter = ((Math.round(degrees / 90) % 4) + 4) % 4;
  return ([0, 90, 180, 270] as const)[quarter] ?? 0;
};

/** Degrees clockwise that make most of the text stand upright. */
function turnToUpright(runs: readonly DrawnRun[]): Page['turned'] {
  const counts = [0, 0, 0, 0];
  for (const { along, glyphs } of runs) {
    const quarter = ((Math.round(Math.atan2(along[1], along[0]) / (Math.PI / 2)) % 4) + 4) % 4;
    counts[quarter] = (counts[quarter] ?? 0) + glyphs.length;
  }
  const most = counts.indexOf(Math.max(...counts));
  return quarterOf(360 - most * 90);
}

function shareReadable(runs: readonly DrawnRun[]): number {
  let [all, readable] = [0, 0];
  for (const { glyphs } of runs) {
    for (const { text } of glyphs) {
      all++;
      if (isReadable(text)) readable++;
    }
  }
  return all === 0 ? 1 : readable / all;
}

function wordsOf(runs: readonly DrawnRun[]): { words: Word[]; rules: Mark[] } {
  const laid = gatherLines(runs).map(layWords);
  return {
    words: laid.flatMap((line) => line.words.map(({ text, box }) => ({ text, box, confidence: 1 }))),
    rules: laid.flatMap((line) => line.leaders.map((box): Mark => ({ kind: 'rule', box }))),
  };
}

function hiddenOf(runs: readonly DrawnRun[]): HiddenText[] {
  const byReason = new Map<HiddenText['why'], DrawnRun[]>();
  for (const run of runs) {
    if (run.why) byReason.set(run.why, [...(byReason.get(run.why) ?? []), run]);
  }
  return [...byReason].flatMap(([why, group]) =>
    wordsOf(group).words.map(({ text, box }) => ({ text, box, why })),
  );
}
