import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';

import { ReadInvoice } from '@/lib/evidence/invoice/invoice';
import { Order } from '@/lib/evidence/order';
import { PrintedCertificate } from '@/lib/readings/cli/certificate-document';

import { bytesOf, callOf, jsonOf, numberOf } from '@/lib/readings/cli/input';

import { heatTreat, plating } from '../compare/agreeing-certificate';
import { american } from '../invoice/invoice-layouts';

let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'readings-'));
});
afterAll(() => rm(folder, { recursive: true }));

async function put(name: string, content: string | Uint8Array): Promise<string> {
  const path = join(folder, name);
  await writeFile(path, content);
  return path;
}

/** Runs a command as `npm run` does: what it prints, parsed, and its exit. Anything but one JSON document fails. */
const run = (command: 'certificate' | 'chart' | 'invoice', ...args: string[]) =>
  new Promise<{ exit: number; printed: unknown }>((resolve, reject) => {
    const file = join(import.meta.dirname, `../../../../lib/readings/cli/read-${command}.ts`);
    execFile(process.execPath, ['--import', 'tsx', file, ...args], (error, stdout) => {
      try {
        resolve({ exit: typeof error?.code === 'number' ? error.code : 0, printed: JSON.parse(stdout) });
      } catch {
        reject(new Error(`No JSON: ${stdout}`));
      }
    });
  });

const CHART = `Time;TC1;TC2
2026-03-05 09:00:00;900;899
2026-03-05 09:10:00;915;914
2026-03-05 09:30:00;921;919
2026-03-05 09:50:00;921;919
2026-03-05 09:50:05;400;410
`;
const REQUIREMENT = ['--set', '920', '--tolerance', '10', '--unit', 'F'];

const CERTIFICATE = `Example Thermal
CERTIFICATE OF CONFORMANCE
Certificate No.: C-881
Date: 2026-03-12
Purchase Order: PO-5001

Part Number    Rev    Qty Accepted    Qty Rejected    Lot
10-200         A      12              0               L1
10-311         C      8               0               L7

Specification: AMS 2770 Rev P
`;

test('a chart is judged', async () => {
  const file = await put('chart.csv', CHART);
  const { exit, printed } = await run('chart', file, ...REQUIREMENT, '--soak-minutes', '35');
  expect(exit).toBe(0);
  expect(printed).toMatchObject({ verdict: 'pass', soak_start: '2026-03-05T09:10:00' });
  expect(Object.keys(Object(printed))).toEqual([
    ...['understood', 'soak_start', 'soak_end', 'soak_minutes', 'max_temperature'],
    ...['max_overshoot_above_upper_limit', 'minutes_above_upper_limit', 'quench_delay_s'],
    ...['verdict', 'flags', 'why'],
  ]);
});

test('a soak too short is an answer, not an error', async () => {
  const file = await put('chart.csv', CHART);
  const { exit, printed } = await run('chart', file, ...REQUIREMENT, '--soak-minutes', '60');
  expect(exit).toBe(0);
  expect(printed).toMatchObject({ verdict: 'fail' });
});

test('an invoice is read and compared', async () => {
  const file = await put('invoice.pdf', await american());
  const price = { currency: 'USD', unit_price: 2.4, lot_minimum: 100, certification_fee: 10 };
  const order = await put('order.json', JSON.stringify({ ...heatTreat(), price }));
  const seen = await put('seen.json', JSON.stringify([{ invoice_number: '123', purchase_order: '5001' }]));
  const { exit, printed } = await run('invoice', file, '--order', order, '--seen', seen);
  expect(exit).toBe(0);
  expect(ReadInvoice.parse(printed)).toEqual(printed);
  expect(printed).toMatchObject({
    total: 118,
    discrepancies: [
      { code: 'duplicate_invoice' },
      { code: 'unit_price_mismatch' },
      { code: 'unit_price_mismatch' },
    ],
  });
});

test('a certificate is read, matched to one of the open orders and compared', async () => {
  const file = await put('certificate.txt', CERTIFICATE);
  const orders = await put('orders.json', JSON.stringify({ orders: [plating(), heatTreat()] }));
  const { exit, printed } = await run('certificate', file, '--orders', orders);
  expect(exit).toBe(0);
  const read = PrintedCertificate.parse(printed);
  expect(read).toEqual(printed);
  expect(read).toMatchObject({ certificate_number: 'C-881', matches_batch: 'B-0001' });
  expect(read.discrepancies.map(({ code }) => code)).toContain('old_spec_revision');
});

test.each<[string, () => Promise<Parameters<typeof run>>, string]>([
  ['options that are missing', async () => ['chart', await put('chart.csv', CHART), '--set', '920'], 'usage'],
  ['an empty file', async () => ['certificate', await put('empty.pdf', '')], 'empty'],
  [
    'a page of the web named .pdf',
    async () => ['certificate', await put('web.pdf', '<html><body>no</body></html>')],
    'not_what_its_name_says',
  ],
])('%s: exit 2, and why', async (_, call, code) => {
  const [command, ...args] = await call();
  const { exit, printed } = await run(command, ...args);
  expect(exit).toBe(2);
  expect(printed).toEqual({ error: { code, message: expect.stringMatching(/\w{3}/) } });
});

test.each([
  ['no file', []],
  ['two files', ['a.pdf', 'b.pdf']],
  ['an option that nobody knows', ['a.pdf', '--colour', 'red']],
  ['an option without its value', ['a.pdf', '--order']],
])('a call with %s is told how it is used', (_, args) => {
  expect(() => callOf(args, ['order'], 'Usage: read FILE')).toThrow(/Usage: read FILE/);
});

test('options may stand before and behind the file', () => {
  const call = { file: 'a.pdf', options: { order: 'o.json' } };
  expect(callOf(['--order', 'o.json', 'a.pdf'], ['order', 'seen'], '')).toEqual(call);
  expect(callOf(['a.pdf', '--order=o.json'], ['order', 'seen'], '')).toEqual(call);
});

test.each([
  ['is no JSON', '{'],
  ['lacks its lines', '{"batch": "B-1", "po": "1", "processor": {"name": "X"}, "process": "anodize"}'],
  ['is a list', '[]'],
])('an order that %s is refused with the place', async (_, content) => {
  const file = await put('order.json', content);
  await expect(jsonOf(file, Order)).rejects.toMatchObject({
    code: 'input_not_valid',
    message: expect.stringContaining(file),
  });
});

test('a file that is not there is said so', async () => {
  await expect(bytesOf(join(folder, 'none.pdf'))).rejects.toMatchObject({ code: 'file_not_found' });
});

test.each(['', ' ', 'abc', '1,5'])('"%s" is no number', (written) => {
  expect(() => numberOf('set', written)).toThrow(/--set/);
});
