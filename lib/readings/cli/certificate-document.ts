import type { z } from 'zod';

import {
  CertificateLine,
  ReadCertificate,
  type SeenCertificate,
  type StatedCertificate,
} from '@/lib/evidence/certificate/certificate';
import { compare } from '@/lib/evidence/certificate/compare/compare';
import { matchOrder } from '@/lib/evidence/certificate/match/match-order';
import { factsAsFiled } from '@/lib/evidence/open/as-filed';
import type { Order } from '@/lib/evidence/order';
import type { OpenedFile } from '@/lib/evidence/page';

/** What `read:certificate` prints; what else was read stands among the facts. */
export const PrintedCertificate = ReadCertificate.pick({
  file: true,
  processor: true,
  certificate_number: true,
  certificate_date: true,
  purchase_order: true,
  batch: true,
  matches_batch: true,
  process: true,
  specification: true,
  specification_revision: true,
  class_type: true,
  lines: true,
  cycles: true,
  quench_delay_s: true,
  plating_end: true,
  bake_start: true,
  bake_end: true,
  readings: true,
  signature_present: true,
  conformance_statement: true,
  facts: true,
  verdicts: true,
  discrepancies: true,
  observations: true,
}).extend({ lines: CertificateLine.omit({ serials: true }).array() });
export type PrintedCertificate = z.output<typeof PrintedCertificate>;

interface Against {
  readonly order: Order | null;
  readonly orders: readonly Order[];
  readonly seen: readonly SeenCertificate[];
  readonly today: string;
}

/**
 * One certificate of a file as it is printed: the one that belongs to the order, or to one of the open orders; else the
 * first. The others count for the pieces of its lines and are named among the observations.
 *
 * @param certificates at least one.
 */
export function certificateDocument(
  opened: OpenedFile,
  certificates: readonly [StatedCertificate, ...StatedCertificate[]],
  { order, orders, seen, today }: Against,
): PrintedCertificate {
  const open = order ? [order] : orders;
  const isOurs = (one: StatedCertificate) =>
    matchOrder(one, open, { isRecognised: opened.recognised }).matched !== null;
  const stated = certificates.find(isOurs) ?? certificates[0];
  const others = certificates.filter((one) => one !== stated);
  const compared = compare({ stated, file: opened, order, orders, others, seen, today });
  const { sha256, kind, recognised, pages } = opened;
  return PrintedCertificate.parse({
    ...stated,
    facts: factsAsFiled(stated.facts, pages),
    ...compared,
    file: { sha256, pages: pages.length, kind, recognised },
    observations: [...othersWords(others), ...compared.observations],
  });
}

function othersWords(others: readonly StatedCertificate[]): string[] {
  if (others.length === 0) return [];
  const names = others.map(
    ({ certificate_number, purchase_order }) =>
      `${certificate_number ?? 'without a number'}${purchase_order === null ? '' : ` for order ${purchase_order}`}`,
  );
  return [
    `The file holds ${others.length === 1 ? 'another certificate' : `${others.length} other certificates`}: ${names.join('; ')}.`,
  ];
}
