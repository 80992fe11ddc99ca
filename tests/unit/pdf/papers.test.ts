import { expect, onTestFinished, test, vi } from 'vitest';

import { renderPaper } from '@/lib/pdf/render-paper';
import { qrPath } from '@/lib/pdf/qr-path';
import { contentHash } from '@/lib/travellers/content-hash';

import { readPdf } from './read-pdf';
import { sampleOrder, sampleTraveller } from './sample-content';

// A PDF takes a tenth of a second, or many on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const tokenOf = () => 'a-token-of-this-test';

test('a traveller says who, what, how many, what must be proved and what comes first', async () => {
  const [page = '', ...more] = await readPdf(await renderPaper(sampleTraveller(), tokenOf));
  expect(more).toHaveLength(0);
  for (const said of [
    'B-0419',
    '60 pieces, 5 lines, 2 loads',
    'Ostrow Heat Treating',
    'TS-1187',
    'Thu 30 Apr 2026',
    'Work asked: solution, quench and age to T42',
    'AMS 2770R',
    'FL-4411-03 C',
    'O to T42',
    'Rack on edge',
    '28.5 to 34.0 % IACS',
    'lines 4, 5; AMS 2658',
    'version 1, page 1 of 1',
    'The drawing, the order and the governing specification at the revision named come first',
    'Fri 17 Apr 2026 07:12 by Ines Halloran',
  ])
    expect(page).toContain(said);
  expect(page).not.toContain('2.45');
});

test('the foot carries the hash of everything the traveller says', async () => {
  const content = sampleTraveller();
  const hash = contentHash(content);
  const [page = ''] = await readPdf(await renderPaper(content, tokenOf));
  expect(page).toContain(`sha-256 ${hash.slice(0, 4)} ${hash.slice(4, 8)}`);
  const shuffled = Object.fromEntries(Object.entries(content).reverse());
  expect(contentHash(shuffled)).toBe(hash);
  expect(contentHash({ ...content, note: 'another' })).not.toBe(hash);
});

test('made again on another day it is the same to the byte; stated at another time it is not', async () => {
  // Only the clock is another's: what waits for its turn still does.
  vi.useFakeTimers({ toFake: ['Date'], now: new Date('2026-04-17T14:12:00Z') });
  onTestFinished(() => void vi.useRealTimers());
  const first = await renderPaper(sampleTraveller(), tokenOf);
  vi.setSystemTime(new Date('2026-04-18T08:00:00Z'));
  expect((await renderPaper(sampleTraveller(), tokenOf)).equals(first)).toBe(true);
  expect(
    (await renderPaper(sampleTraveller({ statedAt: '2026-04-17T14:13:00.000Z' }), tokenOf)).equals(first),
  ).toBe(false);
  const order = await renderPaper(sampleOrder(), tokenOf);
  expect((await renderPaper(sampleOrder(), tokenOf)).equals(order)).toBe(true);
});

test('many lines run on, and each page names its columns, its number and the paper', async () => {
  const pages = await readPdf(await renderPaper(sampleTraveller({}, 60), tokenOf));
  expect(pages.length).toBeGreaterThan(1);
  for (const page of pages.slice(0, 2)) expect(page).toContain('Material, heat');
  for (const [at, page] of pages.entries()) expect(page).toContain(`Page ${at + 1} of ${pages.length}.`);
});

test('what an admin let pass, and what changed, is printed', async () => {
  const [page = ''] = await readPdf(
    await renderPaper(
      sampleTraveller({
        documentVersion: 2,
        paper: 'a4',
        changes: ['wanted back Thu 30 Apr, was Mon 27 Apr'],
        overrides: [
          {
            what: 'sent although no approval for this step stands today',
            reason: 'The renewed approval is in the post.',
            by: 'Marek Dole',
            at: '2026-04-17T14:00:00.000Z',
          },
        ],
      }),
      tokenOf,
    ),
  );
  expect(page).toContain('Takes the place of version 1.');
  expect(page).toContain('wanted back Thu 30 Apr, was Mon 27 Apr');
  expect(page).toContain('The renewed approval is in the post. Marek Dole');
});

test('each load says what governs its soak, and samples their size', async () => {
  const rows = [
    { name: 'Soak', says: '30 to 35 min', rest: 'window 5 min: clad metal ends it' },
    { name: 'Governs', says: '0.032 in', rest: 'thickest section, line 1' },
  ];
  const load = (number: number) => ({ number, lines: [number], pieces: 14, rows });
  const content = sampleTraveller({
    furnaceLoads: {
      areSet: true,
      loads: [load(1), load(2), load(3)],
      apart: ['line 1 and line 2: they are quenched differently'],
      sources: ['MIL-H-6088G (from memory, medium trust)'],
    },
    samples: [{ lineNo: 4, inspect: 13, pieces: 60, says: 'accept 0, reject 1', plan: 'AQL 1, level II' }],
  });
  const paper = (await readPdf(await renderPaper(content, tokenOf))).join(' ');
  for (const said of [
    'Load 3',
    'line 2: 14 pieces',
    '30 to 35 min',
    'thickest section, line 1',
    'The loads may not be joined: line 1 and line 2: they are quenched differently.',
    '13 of 60, accept 0, reject 1',
    'goes before them: MIL-H-6088G (from memory, medium trust).',
  ])
    expect(paper).toContain(said);
});

test('the order states prices, the minimum and what the invoice should say', async () => {
  const [page = ''] = await readPdf(await renderPaper(sampleOrder(), tokenOf));
  // 60 pieces at 2.45 are 147.00; to the minimum 33.00; certificates 25.00.
  for (const said of [
    'Purchase order',
    'TS-1187',
    '147.00',
    'to the lot minimum of 180.00',
    '33.00',
    '25.00',
    '205.00',
    'Expected invoice, USD',
  ])
    expect(page).toContain(said);
});

test('letters beyond western Europe are drawn', async () => {
  const [page = ''] = await readPdf(
    await renderPaper(
      sampleTraveller({ shop: { name: 'Żółta Łódź', address: ['Großstraße 1'], phone: null } }),
      tokenOf,
    ),
  );
  // Letters of the second font file come as pieces of their own.
  expect(page.replaceAll(' ', '')).toContain('ŻółtaŁódź');
});

test('the code is square and dark where it must be', () => {
  const { width, path } = qrPath('https://lotwright.test/b/a-token-of-this-test');
  expect(width).toBeGreaterThanOrEqual(21);
  expect(path.startsWith('M0 0h7v1h-7z')).toBe(true);
});
