import type { CertificateLine, StatedCertificate } from '@/lib/evidence/certificate/certificate';
import { likeness, plainKey } from '@/lib/evidence/certificate/match/alike';
import type { Order, OrderLine } from '@/lib/evidence/order';

/** Rows of a certificate, counted from 0, that are of an order: its part is on it, and no other lot is named. */
export const rowsOn = ({ lines }: StatedCertificate, order: Order): number[] =>
  lines.flatMap((row, at) => (order.lines.some((ordered) => isOf(row, ordered)) ? [at] : []));

const isOf = (row: CertificateLine, ordered: OrderLine): boolean =>
  row.part_number !== null &&
  [ordered.part_number, ordered.part_number + (ordered.rev ?? '')].some((number) =>
    ['same', 'lookalike'].includes(likeness(row.part_number ?? '', number) ?? ''),
  ) &&
  (row.lot === null || !ordered.lot || plainKey(row.lot).includes(plainKey(ordered.lot)));
