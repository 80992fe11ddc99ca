import { expect, test } from 'vitest';

import { certificateDocument, PrintedCertificate } from '@/lib/readings/cli/certificate-document';

import { agreeing, FILE, heatTreat, penetrant, plating, TODAY } from '../compare/agreeing-certificate';

const [HEAT, PLATE, NDT] = [heatTreat(), plating(), penetrant()];
const against = { order: null, orders: [], seen: [], today: TODAY };

test('what is printed has the keys of the contract and no others', () => {
  const document = certificateDocument(FILE, [agreeing(HEAT)], { ...against, order: HEAT });
  expect(Object.keys(document)).toEqual([
    ...['file', 'processor', 'certificate_number', 'certificate_date', 'purchase_order', 'batch'],
    ...['matches_batch', 'process', 'specification', 'specification_revision', 'class_type', 'lines'],
    ...['cycles', 'quench_delay_s', 'plating_end', 'bake_start', 'bake_end', 'readings'],
    ...['signature_present', 'conformance_statement', 'facts', 'verdicts', 'discrepancies', 'observations'],
  ]);
  expect(document.file).toEqual({ sha256: FILE.sha256, pages: 0, kind: 'digital', recognised: false });
  expect(Object.keys(document.lines[0] ?? {})).toEqual([
    ...['part_number', 'rev', 'qty_accepted', 'qty_rejected', 'material', 'lot'],
  ]);
  expect(PrintedCertificate.parse(document)).toEqual(document);
});

test('of several certificates in a file the one of the order is printed, and the others are told', () => {
  const document = certificateDocument(FILE, [agreeing(PLATE), agreeing(HEAT)], { ...against, order: HEAT });
  expect(document.purchase_order).toBe('PO-5001');
  expect(document.discrepancies).toEqual([]);
  expect(document.observations).toEqual(['The file holds another certificate: C-881 for order PO-5002.']);
});

test('of several certificates the first that belongs to an open order is printed', () => {
  const certificates = [agreeing(NDT), agreeing(PLATE)] as const;
  const document = certificateDocument(FILE, certificates, { ...against, orders: [HEAT, PLATE] });
  expect(document.matches_batch).toBe('B-0002');
});

test('without an order the first is printed', () => {
  const document = certificateDocument(FILE, [agreeing(PLATE), agreeing(HEAT)], against);
  expect(document.purchase_order).toBe('PO-5002');
  expect(document.matches_batch).toBeNull();
});

test('a line split over two certificates of one file is complete', () => {
  const whole = agreeing(PLATE);
  const part = (certificate_number: string, qty_accepted: number) => ({
    ...whole,
    certificate_number,
    lines: whole.lines.map((line) => ({ ...line, qty_accepted })),
  });
  const document = certificateDocument(FILE, [part('C-1', 25), part('C-2', 15)], {
    ...against,
    order: PLATE,
  });
  expect(document.discrepancies).toEqual([]);
  expect(document.verdicts.find(({ requirement }) => requirement === 'quantity 40')?.why).toBe(
    'All 40 pieces are accounted for: 25 accepted here and 15 on another certificate.',
  );
});
