import { degrees, rgb } from 'pdf-lib';
import { describe, expect, test } from 'vitest';
import { openFile } from '@/lib/evidence/open/open-file';
import { makePdf, openDrawn, texts } from './make-pdf';

describe('words of a text PDF', () => {
  test('stand in boxes in points from the upper left corner', async () => {
    const page = await openDrawn((p, font) =>
      p.drawText('Purchase Order', { x: 72, y: 700, size: 10, font }),
    );
    expect(page).toMatchObject({ width: 612, height: 792, turned: 0, origin: 'text_layer' });
    const [purchase, order] = page.words;
    expect(purchase?.text).toBe('Purchase');
    expect(purchase?.box[0]).toBeCloseTo(72, 1);
    expect(purchase?.box[3]).toBeCloseTo(92, 0);
    expect(purchase?.box[1]).toBeCloseTo(84.7, 0);
    expect(order?.text).toBe('Order');
    expect(order?.box[0]).toBeGreaterThan(purchase?.box[2] ?? Infinity);
  });

  test('are put together from runs that split them, and kept apart where only a distance parts them', async () => {
    const page = await openDrawn((p, font) => {
      p.drawText('AMS 27', { x: 72, y: 700, size: 10, font });
      p.drawText('70R', { x: 72 + font.widthOfTextAtSize('AMS 27', 10), y: 700, size: 10, font });
      p.drawText('12', { x: 200, y: 700, size: 10, font });
      p.drawText('13', { x: 216, y: 700, size: 10, font });
    });
    expect(texts(page)).toEqual(['AMS', '2770R', '12', '13']);
  });

  test('are one where a heading is spaced out, and five where five figures stand in a row', async () => {
    const page = await openDrawn((p, font) => {
      [...'SPACED OUT'].forEach((letter, i) =>
        p.drawText(letter, { x: 72 + i * 14, y: 700, size: 12, font }),
      );
      p.drawText('1 2 3 4 5', { x: 72, y: 650, size: 10, font });
    });
    expect(texts(page)).toEqual(['SPACED', 'OUT', '1', '2', '3', '4', '5']);
  });

  test('are taken once where they are drawn twice to look bold', async () => {
    const page = await openDrawn((p, font) => {
      p.drawText('CERTIFICATE', { x: 72, y: 700, size: 12, font });
      p.drawText('CERTIFICATE', { x: 72.4, y: 700, size: 12, font });
    });
    expect(texts(page)).toEqual(['CERTIFICATE']);
  });

  test('lose the line that was typed to write on', async () => {
    const page = await openDrawn((p, font) =>
      p.drawText('Name ________ Date ......... x', { x: 72, y: 700, size: 10, font }),
    );
    expect(texts(page)).toEqual(['Name', 'Date', 'x']);
    expect(page.marks.filter(({ kind }) => kind === 'rule')).toHaveLength(2);
  });

  test.each([90, 180, 270] as const)('stand upright when the page lies at %i degrees', async (angle) => {
    const bytes = await makePdf((p, font) => {
      p.setRotation(degrees(angle));
      for (let i = 0; i < 5; i++) {
        const [x, y] = angle === 180 ? [400, 400 + i * 20] : [300 + i * 20 * (angle === 90 ? 1 : -1), 200];
        p.drawText(`Line ${i} of text`, { x, y, size: 10, font, rotate: degrees(angle) });
      }
    });
    const { pages } = await openFile(bytes, { name: 'a.pdf' });
    expect(pages[0]?.turned).toBe(angle);
    expect(pages[0]?.width).toBe(angle === 180 ? 612 : 792);
    const [line, zero] = pages[0]?.words ?? [];
    expect([line?.text, zero?.text]).toEqual(['Line', '0']);
    expect(zero?.box[1]).toBeCloseTo(line?.box[1] ?? 0, 0);
    expect(zero?.box[0]).toBeGreaterThan(line?.box[2] ?? Infinity);
  });
});

describe('text that nobody can see', () => {
  test('is reported with its reason and kept out of the words', async () => {
    const page = await openDrawn((p, font) => {
      p.drawText('seen', { x: 72, y: 720, size: 10, font });
      p.drawText('white', { x: 72, y: 700, size: 10, font, color: rgb(1, 1, 1) });
      p.drawText('tiny', { x: 72, y: 690, size: 1, font });
      p.drawText('outside', { x: -200, y: 690, size: 10, font });
      p.drawText('clear', { x: 72, y: 660, size: 10, font, opacity: 0 });
      p.drawText('before patched after', { x: 72, y: 640, size: 10, font });
      p.drawRectangle({ x: 105, y: 634, width: 42, height: 16, color: rgb(1, 1, 1) });
    });
    expect(texts(page)).toEqual(['seen', 'before', 'after']);
    expect(Object.fromEntries(page.hidden.map(({ text, why }) => [text, why]))).toEqual({
      white: 'colour',
      tiny: 'size',
      outside: 'outside',
      clear: 'invisible',
      patched: 'covered',
    });
  });

  test('is not the white heading of a dark table, nor red print on a green band of the same brightness', async () => {
    const page = await openDrawn((p, font) => {
      p.drawRectangle({ x: 70, y: 690, width: 200, height: 20, color: rgb(0, 0, 0.4) });
      p.drawText('Quantity', { x: 80, y: 696, size: 10, font, color: rgb(1, 1, 1) });
      p.drawRectangle({ x: 70, y: 640, width: 200, height: 20, color: rgb(0, 0.5, 0) });
      p.drawText('Rejected', { x: 80, y: 646, size: 10, font, color: rgb(0.9, 0, 0) });
    });
    expect(texts(page)).toEqual(['Quantity', 'Rejected']);
    expect(page.hidden).toEqual([]);
  });
});

describe('marks', () => {
  const scribble = 'M0 0 C 20 -40 30 30 50 -10 S 80 20 110 -5 S 130 10 160 -20';

  test('a signature is a stroke; forms, circles and rounded boxes are not', async () => {
    const page = await openDrawn((p) => {
      p.drawSvgPath(scribble, { x: 100, y: 200, borderColor: rgb(0, 0, 0.5), borderWidth: 1 });
      p.drawLine({ start: { x: 72, y: 180 }, end: { x: 300, y: 180 } });
      p.drawRectangle({ x: 72, y: 300, width: 200, height: 60, borderWidth: 1, borderColor: rgb(0, 0, 0) });
      p.drawEllipse({ x: 400, y: 200, xScale: 30, yScale: 15, borderWidth: 1, borderColor: rgb(1, 0, 0) });
      p.drawSvgPath(
        'M10 0 H90 C96 0 100 4 100 10 V30 C100 36 96 40 90 40 H10 C4 40 0 36 0 30 V10 C0 4 4 0 10 0 Z',
        {
          x: 300,
          y: 400,
          borderColor: rgb(0, 0, 0),
        },
      );
    });
    const strokes = page.marks.filter(({ kind }) => kind === 'stroke');
    expect(strokes).toHaveLength(1);
    expect(strokes[0]?.box[0]).toBeCloseTo(100, 0);
    expect(strokes[0]?.box[2]).toBeCloseTo(260, 0);
    expect(page.marks.filter(({ kind }) => kind === 'rule').length).toBeGreaterThanOrEqual(5);
  });

  test("a recorder's trace is none", async () => {
    const points = Array.from(
      { length: 60 },
      (_, i) => `${i ? 'L' : 'M'}${i * 3} ${-20 * Math.sin(i / 5) - (i % 2)}`,
    );
    const page = await openDrawn((p) =>
      p.drawSvgPath(points.join(' '), { x: 100, y: 300, borderColor: rgb(0, 0, 0) }),
    );
    expect(page.marks.filter(({ kind }) => kind === 'stroke')).toEqual([]);
  });
});
