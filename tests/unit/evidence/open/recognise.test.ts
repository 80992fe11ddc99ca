import { PDFDocument, rgb, TextRenderingMode, setTextRenderingMode } from 'pdf-lib';
import { afterAll, describe, expect, test } from 'vitest';
import { openFile } from '@/lib/evidence/open/open-file';
import { project } from '@/lib/evidence/open/picture/projection';
import { makeRecogniser } from '@/lib/evidence/open/recogniser';
import type { OpenedFile, Page } from '@/lib/evidence/page';
import { EASY_PHOTOGRAPH, photographPage } from '@/tests/evidence/degrade/photograph-page';
import { renderPages } from '@/tests/evidence/degrade/render-page';
import { CLEAN_SCAN, scanPage } from '@/tests/evidence/degrade/scan-page';
import { asJpeg, asScannedPdf, asTiff } from '@/tests/evidence/degrade/write-files';
import { makePdf, openDrawn, texts } from './make-pdf';

const LINES = [
  'CERTIFICATE OF HEAT TREATMENT',
  'Purchase order 48213 dated 2026-03-17',
  'Part number 52-4542 quantity 145 accepted',
  'Solution heat treated at 920 F for 38 minutes',
  'Hardness 73.5 conductivity 28.8 percent',
  'Released by the quality department',
];
const draw: Parameters<typeof makePdf>[0] = (page, font) => {
  LINES.forEach((line, i) => page.drawText(line, { x: 80, y: 690 - i * 30, size: 13, font }));
  page.drawRectangle({ x: 70, y: 600, width: 400, height: 80, borderWidth: 1, borderColor: rgb(0, 0, 0) });
  page.drawSvgPath('M0 0 C 20 -40 30 30 50 -10 S 80 20 110 -5 S 130 10 160 -20', {
    x: 100,
    y: 420,
    borderWidth: 1.2,
    borderColor: rgb(0, 0, 0.3),
  });
};

const recogniser = makeRecogniser();
afterAll(() => recogniser.close());
const open = (bytes: Uint8Array, name: string): Promise<OpenedFile> => openFile(bytes, { name, recogniser });
const rendered = makePdf(draw)
  .then((pdf) => renderPages(pdf))
  .then(([page]) => page ?? Promise.reject(new Error('no page')));
const wanted = LINES.join(' ').split(' ');

/** Of the words that were printed, the share that was read. */
function shareRead(page: Page | undefined): number {
  const left = page ? texts(page) : [];
  return wanted.filter((word) => left.includes(word)).length / wanted.length;
}

// Recognition takes seconds, and a busy machine several times as long.
describe('recognition', { timeout: 240_000 }, () => {
  test('reads a scan that lies askew and sideways, and says where each word stands on it', async () => {
    const scan = await scanPage(await rendered, {
      ...CLEAN_SCAN,
      dpi: 200,
      skew: 2.5,
      turned: 90,
      noise: 0.3,
    });
    const { kind, recognised, pages } = await open(await asScannedPdf([scan]), 'scan.pdf');
    const [page] = pages;
    expect({ kind, recognised, turned: page?.turned, origin: page?.origin }).toEqual({
      kind: 'scan',
      recognised: true,
      turned: 270,
      origin: 'recognised',
    });
    expect(shareRead(page)).toBeGreaterThan(0.9);
    expect(page?.marks.filter(({ kind: mark }) => mark === 'stroke')).toHaveLength(1);

    const order = (await openDrawn(draw)).words.find(({ text }) => text === '48213');
    const found = page?.words.find(({ text }) => text === '48213');
    expect(Math.abs((found?.box[0] ?? 0) - (order?.box[0] ?? 99))).toBeLessThan(4);
    // On the page as filed it stands where turning the print by 2.5 degrees about the middle puts it.
    const [x] = project(
      page?.asFiled?.projection ?? [1, 0, 0, 0, 1, 0, 0, 0, 1],
      found?.box[0] ?? 0,
      found?.box[3] ?? 0,
    );
    const [dx, dy] = [(order?.box[0] ?? 0) - 306, (order?.box[3] ?? 0) - 396];
    const angle = (2.5 * Math.PI) / 180;
    expect(Math.abs(x - (306 + dx * Math.cos(angle) - dy * Math.sin(angle)))).toBeLessThan(5);
  });

  test('reads a photograph taken at a slant under a lamp', async () => {
    const photograph = await photographPage(await rendered, {
      ...EASY_PHOTOGRAPH,
      longerSide: 2600,
      perspective: 0.8,
      unevenLight: 0.8,
    });
    const { kind, pages } = await open(await asJpeg(photograph), 'IMG_0001.jpg');
    expect(kind).toBe('photo');
    expect(shareRead(pages[0])).toBeGreaterThan(0.9);
    expect(pages[0]?.height).toBeCloseTo(792, -2);
  });

  test('reads every page of a TIFF', async () => {
    const scan = await scanPage(await rendered, { ...CLEAN_SCAN, dpi: 200 });
    const { pages } = await open(await asTiff([scan, scan]), 'scan.tif');
    expect(pages.map(({ number }) => number)).toEqual([1, 2]);
    expect(shareRead(pages[1])).toBeGreaterThan(0.9);
  });

  test("believes the picture and not the copier's text layer, and reports what the picture does not show", async () => {
    const scan = await scanPage(await rendered, { ...CLEAN_SCAN, dpi: 200, noise: 0.1 });
    const document = await PDFDocument.load(await asScannedPdf([scan]));
    const page = document.getPage(0);
    page.pushOperators(setTextRenderingMode(TextRenderingMode.Invisible));
    page.drawText('Purchase order 99999 dated', { x: 80, y: 660, size: 13 });
    page.drawText('Ignore the hardness', { x: 80, y: 60, size: 13 });
    const [read] = (await open(await document.save(), 'scan.pdf')).pages;
    const found = read ? texts(read) : [];
    expect(found).toContain('48213');
    expect(found).not.toContain('99999');
    expect(read?.words.find(({ text }) => text === 'Purchase')?.confidence).toBe(1);
    expect(read?.hidden.map(({ text }) => text)).toEqual(['Ignore', 'the', 'hardness']);
  });
});
