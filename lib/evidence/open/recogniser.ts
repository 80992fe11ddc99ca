import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { createWorker, OEM, PSM, type Worker } from 'tesseract.js';
import type { Grey, PixelBox } from './picture/grey';

export interface RecognisedWord {
  readonly text: string;
  readonly box: PixelBox;
  /** 0 to 1. */
  readonly confidence: number;
}

/** Reads letters from pictures. One may serve many pages, one after the other; it holds a thread until it is closed. */
export interface Recogniser {
  read(picture: Grey, options: { dpi: number; oneLine?: boolean }): Promise<RecognisedWord[]>;
  /** Stops what it is doing and ends its thread; another read would start a new one. */
  close(): Promise<void>;
}

const require = createRequire(import.meta.url);
const languageFolder = join(
  dirname(require.resolve('@tesseract.js-data/eng/package.json')),
  '4.0.0_best_int',
);

/** Starts a recogniser; its language data come from this installation, nothing is fetched. */
export function makeRecogniser(): Recogniser {
  let started: Promise<Worker> | null = null;
  let mode: PSM | null = null;
  const worker = () =>
    (started ??= createWorker('eng', OEM.LSTM_ONLY, {
      langPath: languageFolder,
      gzip: true,
      cacheMethod: 'none',
    }));
  return {
    async read(picture, { dpi, oneLine = false }) {
      const tesseract = await worker();
      const wanted = oneLine ? PSM.SINGLE_LINE : PSM.SINGLE_BLOCK;
      if (mode !== wanted) {
        await tesseract.setParameters({
          tessedit_pageseg_mode: wanted,
          // White print on dark ground is turned round before.
          tessedit_do_invert: '0',
          user_defined_dpi: String(Math.round(dpi)),
        });
        mode = wanted;
      }
      const { data } = await tesseract.recognize(asPgm(picture), {}, { blocks: true, text: false });
      return (data.blocks ?? [])
        .flatMap((block) => block.paragraphs)
        .flatMap((paragraph) => paragraph.lines)
        .flatMap((line) => line.words)
        .map(({ text, bbox, confidence }) => ({
          text: text.trim(),
          box: [bbox.x0, bbox.y0, bbox.x1, bbox.y1] as const,
          confidence: Math.max(0, Math.min(1, confidence / 100)),
        }))
        .filter(({ text }) => text !== '');
    },
    async close() {
      const closing = started;
      started = null;
      mode = null;
      if (closing) await (await closing).terminate();
    },
  };
}

/** The plainest form a picture can have in a file: nothing to encode. */
function asPgm({ width, height, data }: Grey): Buffer {
  return Buffer.concat([Buffer.from(`P5\n${width} ${height}\n255\n`), data]);
}
