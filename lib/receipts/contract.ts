import { z } from 'zod';

import { declare } from '@/lib/api/endpoint';
import { Id, Moment } from '@/lib/api/shapes';
import { STAGES } from '@/lib/batches/stage';
import { PROCESSES } from '@/lib/trade/process';

const Count = z
  .int('Enter a whole number of pieces.')
  .min(0, 'Enter 0 or more.')
  .max(1_000_000, 'Enter 1,000,000 or less.');
const Note = z.string().trim().max(500, 'Write 500 characters or less.');

export const ReceivingLine = z.object({
  id: Id,
  lineNo: z.int(),
  lotNumber: z.string(),
  partNumber: z.string(),
  partRevision: z.string(),
  partName: z.string(),
  alloy: z.string(),
  /** The condition that the step makes. */
  targetCondition: z.string().nullable(),
  serialised: z.boolean(),
  pieces: z.int(),
  away: z.int(),
  shortOpen: z.int(),
  /** Serial numbers that are still away, where the lot is serialised. */
  awayPieces: z.array(z.object({ id: Id, serial: z.string() })),
});
export type ReceivingLine = z.output<typeof ReceivingLine>;

export const findForReceiving = declare({
  id: 'findForReceiving',
  method: 'get',
  path: '/receipts/find',
  summary: 'The batch that a scanned code or a typed number means',
  side: 'shop',
  permission: 'receipt.read',
  input: z.object({ text: z.string().trim().min(1, 'Scan a code or type a number.').max(300) }),
  response: z.object({ batchId: Id, number: z.string(), stage: z.enum(STAGES) }),
});

export const getReceiving = declare({
  id: 'getReceiving',
  method: 'get',
  path: '/receipts/batches/{batchId}',
  summary: 'What of a batch is still away, line by line, for counting it in',
  side: 'shop',
  permission: 'receipt.read',
  input: z.object({ batchId: Id }),
  response: z.object({
    batch: z.object({
      id: Id,
      number: z.string(),
      orderNumber: z.string(),
      stage: z.enum(STAGES),
      processor: z.string(),
      process: z.enum(PROCESSES),
      pieces: z.int(),
      piecesBack: z.int(),
      dispatchedAt: Moment.nullable(),
      shippedAt: Moment.nullable(),
      shippedNote: z.string().nullable(),
    }),
    lines: z.array(ReceivingLine),
    receipts: z.int(),
  }),
});

export const CountIn = z.object({
  batchId: Id,
  note: Note.default(''),
  lines: z
    .array(
      z.object({
        lineId: Id,
        good: Count.default(0),
        damaged: Count.default(0),
        short: Count.default(0),
        over: Count.default(0),
        note: Note.default(''),
        goodPieceIds: z.array(Id).max(10_000).default([]),
        damagedPieceIds: z.array(Id).max(10_000).default([]),
      }),
    )
    .min(1, 'Count at least one line.')
    .max(500),
  photos: z
    .array(z.object({ fileId: Id, lineId: Id.nullable().default(null) }))
    .max(40, 'Add 40 photos or less.')
    .default([]),
});

export const countIn = declare({
  id: 'countIn',
  method: 'post',
  path: '/receipts',
  summary: 'Count what came back, line by line: good, damaged, short, over',
  side: 'shop',
  permission: 'receipt.count',
  input: CountIn,
  response: z.object({
    receiptId: Id,
    good: z.int(),
    damaged: z.int(),
    nonconformances: z.array(z.object({ id: Id, number: z.string() })),
  }),
});

export const ReceiptRow = z.object({
  id: Id,
  receivedAt: Moment,
  receivedBy: z.string(),
  note: z.string().nullable(),
  lines: z.array(
    z.object({
      lineNo: z.int(),
      partNumber: z.string(),
      good: z.int(),
      damaged: z.int(),
      short: z.int(),
      over: z.int(),
      note: z.string().nullable(),
    }),
  ),
  photos: z.array(z.object({ fileId: Id, name: z.string(), lineNo: z.int().nullable() })),
});
export type ReceiptRow = z.output<typeof ReceiptRow>;

export const listReceipts = declare({
  id: 'listReceipts',
  method: 'get',
  path: '/receipts',
  summary: 'Receipts of a batch, latest first',
  side: 'shop',
  permission: 'receipt.read',
  input: z.object({ batchId: Id }),
  response: z.object({ receipts: z.array(ReceiptRow), away: z.int(), dispatched: z.boolean() }),
});
