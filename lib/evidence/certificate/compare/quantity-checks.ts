import { z } from 'zod';

import type { OrderLine } from '../../order';
import { CertificateLine, type StatedCertificate } from '../certificate';
import { plainKey } from '../match/alike';
import { namesOrder } from '../match/same-order-number';
import type { Check, Compared } from './compared';
import { cannotTell, meets, notStated, observed, wrong, type Outcome } from './outcome';
import { piecesOf, type LinePair } from './pair-lines';

/** Each line's pieces are all accounted for, on this certificate or together with others of the order. */
export const accountsForAllPieces: Check = (compared) => {
  const contradicted = contradictedLines(compared.stated);
  return compared.pairs.pairs
    .filter(({ stated }) => stated.length > 0)
    .filter(({ stated }) => !stated.some(({ line }) => contradicted.has(line)))
    .flatMap((pair) => quantityOutcome(pair, compared));
};

function quantityOutcome({ ordered, stated }: LinePair, compared: Compared): Outcome[] {
  const lines = stated.map(({ line }) => line);
  const here = sumOf(lines);
  const asked = { requirement: `quantity ${ordered.qty}`, line: ordered.line, ordered: String(ordered.qty) };
  if (here === null) return [notStated(asked, 'The certificate does not say how many pieces were accepted.')];
  if (lines.some(({ qty_accepted }) => qty_accepted === null))
    return [cannotTell(asked, 'Not every line of the certificate says how many pieces were accepted.')];
  const elsewhere = sumOf(linesElsewhere(ordered, compared)) ?? { accepted: 0, rejected: 0 };
  return judge(ordered, here, elsewhere);
}

interface Pieces {
  readonly accepted: number;
  readonly rejected: number;
}

function judge(ordered: OrderLine, here: Pieces, elsewhere: Pieces): Outcome[] {
  const accepted = here.accepted + elsewhere.accepted;
  const rejected = here.rejected + elsewhere.rejected;
  const total = accepted + rejected;
  const inOthers = elsewhere.accepted + elsewhere.rejected;
  const asked = {
    requirement: `quantity ${ordered.qty}`,
    line: ordered.line,
    ordered: String(ordered.qty),
    stated: sayPieces(here),
  };
  const all =
    inOthers > 0 ? `${sayPieces(here)} here and ${inOthers} on another certificate` : sayPieces(here);
  if (total === ordered.qty) {
    const outcome = meets(asked, `All ${ordered.qty} pieces are accounted for: ${all}.`);
    if (rejected === 0) return [outcome];
    const words = `Line ${ordered.line}, ${ordered.part_number}: ${rejected} of ${ordered.qty} pieces were rejected; with the ${accepted} accepted all are accounted for.`;
    return [outcome, observed(words)];
  }
  if (total > ordered.qty && accepted <= ordered.qty)
    return [
      wrong(
        'quantity_arithmetic',
        asked,
        `${accepted} accepted and ${rejected} rejected make ${total}, but ${ordered.qty} pieces of ${ordered.part_number} were sent.`,
      ),
    ];
  if (total > ordered.qty)
    return [
      wrong(
        'quantity_mismatch',
        asked,
        `${total - ordered.qty} more than were sent: ${ordered.qty} pieces of ${ordered.part_number}, the certificate accounts for ${all}.`,
      ),
    ];
  return [
    wrong(
      'quantity_mismatch',
      asked,
      `Short, balance open: ${ordered.qty} pieces of ${ordered.part_number} were sent, the certificate accounts for ${all}; ${ordered.qty - total} are missing.`,
      'check',
    ),
  ];
}

const sayPieces = ({ accepted, rejected }: Pieces): string =>
  rejected === 0 ? `${accepted} accepted` : `${accepted} accepted, ${rejected} rejected`;

function sumOf(lines: readonly CertificateLine[]): Pieces | null {
  const counted = lines.filter(({ qty_accepted }) => qty_accepted !== null);
  if (counted.length === 0) return null;
  return {
    accepted: counted.reduce((sum, { qty_accepted }) => sum + (qty_accepted ?? 0), 0),
    rejected: counted.reduce((sum, { qty_rejected }) => sum + (qty_rejected ?? 0), 0),
  };
}

const SeenLines = z.looseObject({ lines: z.array(CertificateLine) });

/** Pieces of a line on other certificates of the order: in the same file, or received earlier with their lines. */
function linesElsewhere(ordered: OrderLine, { others, seen, order, stated }: Compared): CertificateLine[] {
  const earlier = seen.flatMap((one) => {
    const withLines = SeenLines.safeParse(one);
    const isOfOrder = !!one.purchase_order && namesOrder(one.purchase_order, order.po);
    const isThis = !!one.certificate_number && one.certificate_number === stated.certificate_number;
    return withLines.success && isOfOrder && !isThis ? withLines.data.lines : [];
  });
  return [...others.flatMap(({ lines }) => lines), ...earlier].filter(
    ({ part_number, lot }) =>
      part_number !== null &&
      plainKey(part_number) === plainKey(ordered.part_number) &&
      // Two lines of one part are told apart by their lots.
      (lot === null || !ordered.lot || plainKey(lot) === plainKey(ordered.lot)),
  );
}

/** Facts that say how many pieces a line, or the whole certificate, is about. */
const LINE_TOTAL = /^lines\[(\d+)\]\.qty_(?:total|received|processed|inspected|sent)$/;
const WHOLE_TOTAL = /^qty_(?:total|received|processed|inspected|accepted_total)$/;

/** Numbers of the certificate itself that do not add up, whatever was ordered. */
export function addsUp(stated: StatedCertificate): Outcome[] {
  const lines = [...contradictedLines(stated)].map(([line, total]) =>
    wrong(
      'quantity_arithmetic',
      { requirement: null, ordered: null, stated: `${total} stated` },
      `${line.part_number ?? 'A line'}: ${line.qty_accepted ?? 0} accepted and ${line.qty_rejected ?? 0} rejected make ${piecesOf(line) ?? 0}, the certificate itself says ${total}.`,
    ),
  );
  return lines.length > 0 ? lines : wholeOutcome(stated);
}

function contradictedLines({ lines, facts }: StatedCertificate): Map<CertificateLine, number> {
  const found = new Map<CertificateLine, number>();
  for (const { field, value } of facts) {
    const line = lines[Number(LINE_TOTAL.exec(field)?.[1] ?? -1)];
    const pieces = line ? piecesOf(line) : null;
    if (!line || pieces === null || typeof value !== 'number' || value === pieces) continue;
    // Fewer without rejects is a part of what was ordered, and the balance is open.
    if (pieces > value || (line.qty_rejected ?? 0) > 0) found.set(line, value);
  }
  return found;
}

function wholeOutcome({ lines, facts }: StatedCertificate): Outcome[] {
  const total = facts.find(({ field, value }) => WHOLE_TOTAL.test(field) && typeof value === 'number');
  const pieces = lines.map(piecesOf);
  if (!total || pieces.length === 0 || pieces.includes(null)) return [];
  const accepted = lines.reduce((sum, { qty_accepted }) => sum + (qty_accepted ?? 0), 0);
  const all = pieces.reduce<number>((sum, one) => sum + (one ?? 0), 0);
  if (total.value === accepted || total.value === all) return [];
  return [
    wrong(
      'quantity_arithmetic',
      { requirement: null, stated: `${String(total.value)} in all` },
      `The lines add up to ${all} pieces, the certificate says ${String(total.value)} in all.`,
    ),
  ];
}
