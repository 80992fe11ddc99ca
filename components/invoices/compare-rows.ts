import type { InvoiceDetail, InvoiceDifference } from '@/lib/invoices/contract';

import { LINE_KIND_WORDS } from './invoice-words';

interface Side {
  pieces: number | null;
  eachMinor: number | null;
  minor: number;
}

/** One line of the comparison: what was ordered, what was accepted of it, what is asked for it, and what differs. */
export interface CompareRow {
  key: string;
  seq: number | null;
  says: string;
  note: string | null;
  ordered: Side | null;
  accepted: Omit<Side, 'eachMinor'> | null;
  invoiced: Side | null;
  differences: InvoiceDifference[];
}

type OrderLine = InvoiceDetail['order']['lines'][number];
type InvoiceLine = InvoiceDetail['lines'][number];

/** The lines of the invoice as they stand on it, then what was ordered and is not asked for, then what concerns the whole. */
export function compareRows(invoice: Pick<InvoiceDetail, 'lines' | 'order' | 'differences'>): CompareRow[] {
  const { lines, order, differences } = invoice;
  const asked = lines.map((line) => rowOf(line, invoice));
  const silent = order.lines
    .filter((one) => !lines.some((line) => line.lineId === one.lineId))
    .map((one) => ({
      ...bare(one.lineId, partWords(one)),
      ordered: orderedOf(one),
      accepted: acceptedOf(one),
    }));
  const fees = (['lot_minimum', 'certification'] as const).flatMap((kind) => {
    const minor = orderedCharge(kind, order);
    return minor > 0 && !lines.some((line) => line.kind === kind)
      ? [{ ...bare(kind, LINE_KIND_WORDS[kind]), ordered: { pieces: null, eachMinor: null, minor } }]
      : [];
  });
  const whole = differences.filter((one) => one.seq === null);
  return [
    ...asked,
    ...silent,
    ...fees,
    ...(whole.length > 0 ? [{ ...bare('whole', 'The whole invoice'), differences: whole }] : []),
  ];
}

const bare = (key: string, says: string): CompareRow => ({
  key,
  seq: null,
  says,
  note: null,
  ordered: null,
  accepted: null,
  invoiced: null,
  differences: [],
});

function rowOf(
  line: InvoiceLine,
  { order, differences }: Pick<InvoiceDetail, 'order' | 'differences'>,
): CompareRow {
  const own = differences.filter((one) => one.seq === line.seq);
  const ordered = line.kind === 'pieces' ? order.lines.find((one) => one.lineId === line.lineId) : undefined;
  const invoiced = { pieces: line.pieces, eachMinor: line.unitPriceMinor, minor: line.amountMinor };
  const row = {
    ...bare(`line ${line.seq}`, ordered ? partWords(ordered) : line.description),
    seq: line.seq,
    invoiced,
    differences: own,
  };
  if (ordered)
    return {
      ...row,
      note: partWords(ordered).includes(line.description) ? null : line.description,
      ordered: orderedOf(ordered),
      accepted: acceptedOf(ordered),
    };
  const over = own
    .filter((one) => one.clearance?.choice !== 'accept')
    .reduce((sum, one) => sum + one.overMinor, 0);
  const may = line.amountMinor - over;
  const charge = orderedCharge(line.kind, order);
  return {
    ...row,
    ordered: charge > 0 ? { pieces: null, eachMinor: null, minor: charge } : null,
    accepted: may > 0 ? { pieces: null, minor: may } : null,
  };
}

const partWords = (line: OrderLine): string => `${line.partNumber} ${line.partRevision}, ${line.partName}`;
const orderedOf = (line: OrderLine): Side => ({
  pieces: line.ordered,
  eachMinor: line.unitPriceMinor,
  minor: line.ordered * line.unitPriceMinor,
});
const acceptedOf = (line: OrderLine) => ({
  pieces: line.accepted,
  minor: line.accepted * line.unitPriceMinor,
});

function orderedCharge(kind: InvoiceLine['kind'], order: InvoiceDetail['order']): number {
  if (kind === 'certification') return order.certificationFeeMinor;
  if (kind !== 'lot_minimum') return 0;
  return Math.max(
    0,
    order.lotMinimumMinor - order.lines.reduce((sum, line) => sum + line.ordered * line.unitPriceMinor, 0),
  );
}

/** What would be paid if every difference that is still open were left out; what was approved, once it is. */
export function payableNow({
  approved,
  toPayMinor,
  totalMinor,
  differences,
}: Pick<InvoiceDetail, 'approved' | 'toPayMinor' | 'totalMinor' | 'differences'>): number {
  if (approved !== null) return toPayMinor ?? 0;
  const off = differences
    .filter((one) => one.clearance?.choice !== 'accept')
    .reduce((sum, one) => sum + one.overMinor, 0);
  return Math.max(0, (totalMinor ?? 0) - off);
}

/** What the accepted pieces cost by the order's prices. */
export const acceptedMinor = (order: InvoiceDetail['order']): number =>
  order.lines.reduce((sum, line) => sum + line.accepted * line.unitPriceMinor, 0);
