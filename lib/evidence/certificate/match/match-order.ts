import type { StatedCertificate } from '../certificate';
import type { Order } from '../../order';
import { LIKENESSES, likeness, plainKey, type Likeness } from './alike';
import { areSameCompany } from './same-company';
import { namesOrder } from './same-order-number';

export interface Candidate {
  readonly order: Order;
  /** 0 and up; only good for ranking candidates of one certificate. */
  readonly score: number;
  /** In words, what speaks for it and against it. */
  readonly reasons: readonly string[];
}

export interface OrderMatch {
  /** The likeliest first; orders that nothing speaks for are left out. */
  readonly candidates: readonly Candidate[];
  /** The one that it clearly belongs to. */
  readonly matched: Order | null;
  readonly matches_batch: string | null;
}

/** The parts themselves say more than a number that somebody typed; of two orders for the same parts the number decides. */
const POINTS = {
  order: 45,
  batch: 40,
  allParts: 60,
  processor: 8,
  lot: 6,
  process: 3,
  early: -10,
} as const;

const PART_SHARE: Record<Likeness, number> = { same: 1, lookalike: 0.9, transposed: 0.75, near: 0.4 };

/** Below it only weak signs speak for an order: the processor's name, one similar number. */
const ENOUGH = 30;
/** How far the best has to be before the next. */
const CLEARLY = 12;

/**
 * Which of the open orders a certificate belongs to, by order number, batch, part numbers (also with lookalike,
 * transposed or missing characters), processor and dates.
 *
 * @returns candidates with reasons; `matched` is null where nothing is strong enough or two are as likely.
 */
export function matchOrder(
  stated: StatedCertificate,
  orders: readonly Order[],
  { isRecognised = false }: { isRecognised?: boolean } = {},
): OrderMatch {
  const candidates = orders
    .map((order) => candidateOf(stated, order, isRecognised))
    .filter(({ score }) => score > 0)
    .toSorted((a, b) => b.score - a.score);
  const [best, next] = candidates;
  const isClear = best !== undefined && best.score >= ENOUGH && best.score - (next?.score ?? 0) >= CLEARLY;
  const matched = isClear ? best.order : null;
  return { candidates, matched, matches_batch: matched?.batch ?? null };
}

interface Sign {
  readonly points: number;
  readonly reason: string;
}

function candidateOf(stated: StatedCertificate, order: Order, isRecognised: boolean): Candidate {
  const signs = [
    orderSign(stated, order, isRecognised),
    batchSign(stated, order),
    partsSign(stated, order),
    lotSign(stated, order),
    processorSign(stated, order),
    dateSign(stated, order),
    stated.process !== null && stated.process === order.process
      ? { points: POINTS.process, reason: 'The process is the one ordered.' }
      : null,
  ].filter((sign): sign is Sign => sign !== null);
  // A right processor and process are on every certificate of his; alone they point nowhere.
  const score = signs.reduce((sum, { points }) => sum + points, 0);
  return { order, score: Math.max(0, score), reasons: signs.map(({ reason }) => reason) };
}

function orderSign(stated: StatedCertificate, { po }: Order, isRecognised: boolean): Sign | null {
  if (stated.purchase_order === null) return null;
  if (namesOrder(stated.purchase_order, po, isRecognised))
    return { points: POINTS.order, reason: `It names order ${po}.` };
  const how = likeness(stated.purchase_order, po);
  if (how === null) return null;
  return {
    points: Math.round(POINTS.order * PART_SHARE[how] * 0.5),
    reason: `Its order number ${stated.purchase_order} is written like ${po}.`,
  };
}

function batchSign(stated: StatedCertificate, { batch }: Order): Sign | null {
  if (stated.batch === null || plainKey(stated.batch) !== plainKey(batch)) return null;
  return { points: POINTS.batch, reason: `It names batch ${batch}.` };
}

function partsSign(stated: StatedCertificate, { lines }: Order): Sign | null {
  const written = stated.lines.flatMap(({ part_number }) => part_number ?? []);
  if (written.length === 0) return null;
  const hits = written.flatMap((number) => bestLikeness(number, lines) ?? []);
  if (hits.length === 0) return null;
  const share = hits.reduce((sum, { how }) => sum + PART_SHARE[how], 0) / written.length;
  const similar = hits
    .filter(({ how }) => how !== 'same')
    .map(({ written, ordered }) => `${written} like ${ordered}`);
  return {
    points: Math.round(POINTS.allParts * share),
    reason: `${hits.length} of its ${written.length} part numbers ${hits.length === 1 ? 'is' : 'are'} on the order${similar.length > 0 ? ` (${similar.join(', ')})` : ''}.`,
  };
}

function bestLikeness(written: string, lines: Order['lines']) {
  const found = lines.flatMap(({ part_number: ordered }) => {
    const how = likeness(written, ordered);
    return how === null ? [] : [{ written, ordered, how }];
  });
  return found.toSorted((a, b) => LIKENESSES.indexOf(a.how) - LIKENESSES.indexOf(b.how))[0] ?? null;
}

function lotSign(stated: StatedCertificate, { lines }: Order): Sign | null {
  const lots = new Set(lines.flatMap(({ lot }) => (lot ? plainKey(lot) : [])));
  const named = stated.lines.find(({ lot }) => lot !== null && lots.has(plainKey(lot)));
  return named ? { points: POINTS.lot, reason: `Lot ${named.lot} is on the order.` } : null;
}

function processorSign(stated: StatedCertificate, { processor }: Order): Sign | null {
  if (stated.processor === null || !areSameCompany(stated.processor, processor.name)) return null;
  return { points: POINTS.processor, reason: `It comes from ${processor.name}.` };
}

function dateSign(stated: StatedCertificate, { dispatched }: Order): Sign | null {
  if (stated.certificate_date === null || !dispatched || stated.certificate_date >= dispatched) return null;
  return { points: POINTS.early, reason: `It is dated before this batch left on ${dispatched}.` };
}
