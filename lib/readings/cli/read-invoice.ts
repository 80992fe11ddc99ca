import { printResult } from './command';

import { z } from 'zod';

import { compareInvoice } from '@/lib/evidence/invoice/compare-invoice';
import { AcceptedPieces, ReadInvoice, SeenInvoice } from '@/lib/evidence/invoice/invoice';
import { readInvoice } from '@/lib/evidence/invoice/read-invoice';
import { openFile } from '@/lib/evidence/open/open-file';
import { Order } from '@/lib/evidence/order';

import { bytesOf, callOf, jsonOf } from './input';

const USAGE = 'Usage: read:invoice FILE [--order ORDER.json] [--accepted ACCEPTED.json] [--seen SEEN.json]';

await printResult(async (args) => {
  const { file, options } = callOf(args, ['order', 'accepted', 'seen', 'password'], USAGE);
  const order = await jsonOf(options.order, Order);
  const accepted = await jsonOf(options.accepted, z.array(AcceptedPieces));
  const seen = await jsonOf(options.seen, z.array(SeenInvoice));
  const { bytes, name } = await bytesOf(file);
  const { password } = options;
  const opened = await openFile(bytes, { name, ...(password !== undefined && { password }) });
  const stated = readInvoice(opened);
  const discrepancies = compareInvoice({
    stated,
    order: order ?? null,
    accepted: accepted ?? null,
    seen: seen ?? [],
  });
  return ReadInvoice.parse({ ...stated, discrepancies });
});
