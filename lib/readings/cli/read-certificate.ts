import { printResult } from './command';

import { z } from 'zod';

import { SeenCertificate } from '@/lib/evidence/certificate/certificate';
import { statedIn } from '@/lib/evidence/certificate/read/read-certificate';
import { openFile } from '@/lib/evidence/open/open-file';
import { Order, Orders } from '@/lib/evidence/order';
import { UnreadableFile } from '@/lib/evidence/page';

import { certificateDocument } from './certificate-document';
import { bytesOf, callOf, jsonOf } from './input';
import { today } from './today';

const USAGE =
  'Usage: read:certificate FILE [--order ORDER.json] [--orders ORDERS.json] [--seen SEEN.json] [--password P]';

await printResult(async (args) => {
  const { file, options } = callOf(args, ['order', 'orders', 'seen', 'password'], USAGE);
  const order = await jsonOf(options.order, Order);
  const orders = await jsonOf(options.orders, Orders);
  const seen = await jsonOf(options.seen, z.array(SeenCertificate));
  const { bytes, name } = await bytesOf(file);
  const { password } = options;
  const opened = await openFile(bytes, { name, ...(password !== undefined && { password }) });
  const [first, ...further] = statedIn(opened);
  if (!first) throw new UnreadableFile('empty', 'Nothing on these pages can be read.');
  return certificateDocument(opened, [first, ...further], {
    order: order ?? null,
    orders: orders?.orders ?? [],
    seen: seen ?? [],
    today: today(),
  });
});
