import type { Role } from '@/lib/auth/roles';
import { daysBetween, dayWords } from '@/lib/day-words';

import type { Tideline, TidelineBatch, WaitingCounts } from './contract';
import { daysLate } from './lateness';

/** One thing a person can do now about a batch. */
export interface Waiting {
  batch: TidelineBatch;
  /** Worst harm first: a lower rank stands higher. */
  rank: number;
  /** `Ask Galena Thermal for a date`, and why. */
  what: string;
  why: string;
  verb: string;
  href: string;
}

const RANK = { held: 1, late: 2, unanswered: 3, toDo: 4 } as const;

type Batches = Pick<Tideline, 'today' | 'latenessBasis' | 'lanes' | 'batches'>;

/** What waits for a person with these roles, worst harm first, then the longest. Pure: the screen and its count read the same list. */
export function whatWaits(tideline: Batches, roles: readonly Role[]): Waiting[] {
  const names = new Map(tideline.lanes.map((lane) => [lane.processorId, lane.name]));
  const has = (...wanted: Role[]) => wanted.some((role) => roles.includes(role));
  return tideline.batches
    .flatMap((batch): Waiting[] => {
      const found = pick(batch, names.get(batch.processorId) ?? '', tideline, has);
      return found ? [{ batch, ...found }] : [];
    })
    .sort(
      (a, b) =>
        a.rank - b.rank || b.batch.pieces - a.batch.pieces || a.batch.number.localeCompare(b.batch.number),
    );
}

type Found = Omit<Waiting, 'batch'>;

/** The most pressing thing about one batch for these roles; one line a batch, so that the list stays a list of things to do. */
function pick(
  batch: TidelineBatch,
  processor: string,
  tideline: Batches,
  has: (...roles: Role[]) => boolean,
): Found | null {
  const page = `/batches/${batch.id}`;
  const { nonconformance, openQuestion } = batch;
  if (batch.stage === 'held' && nonconformance && has('inspector')) {
    const days = batch.heldSince === null ? 0 : daysBetween(batch.heldSince, tideline.today);
    return {
      rank: RANK.held,
      what: `Decide on ${nonconformance.number}`,
      why: `${nonconformance.what}, held ${days} d`,
      verb: 'Open',
      href: `/nonconformances/${nonconformance.id}`,
    };
  }
  const late = daysLate(batch, tideline.today, tideline.latenessBasis);
  if (late > 0 && has('lead'))
    return {
      rank: RANK.late,
      what: `Ask ${processor} for a new date`,
      why: `${late} d late`,
      verb: 'Write',
      href: `${page}#messages`,
    };
  if (openQuestion && has('lead'))
    return {
      rank: RANK.unanswered,
      what: `Answer ${processor}`,
      why: `“${openQuestion.body}”`,
      verb: 'Answer',
      href: `${page}#messages`,
    };
  return pickToDo(batch, processor, tideline, has);
}

function pickToDo(
  batch: TidelineBatch,
  processor: string,
  tideline: Batches,
  has: (...roles: Role[]) => boolean,
): Found | null {
  const page = `/batches/${batch.id}`;
  const clock = { zone: 'UTC', now: new Date(`${tideline.today}T12:00:00Z`) };
  const toDo = (what: string, why: string, verb: string, href: string): Found => ({
    rank: RANK.toDo,
    what,
    why,
    verb,
    href,
  });
  const { stage, invoice } = batch;
  if (stage === 'building' && has('lead') && batch.leavesOn !== null && batch.leavesOn <= tideline.today)
    return toDo(
      'Dispatch',
      batch.leavesOn === tideline.today
        ? 'leaves today'
        : `should have left ${dayWords(batch.leavesOn, clock)}`,
      'Open',
      page,
    );
  if (
    stage === 'dispatched' &&
    !batch.acknowledged &&
    batch.dispatchedOn !== null &&
    batch.dispatchedOn < tideline.today &&
    has('lead')
  )
    return toDo(
      `Ring ${processor}: not acknowledged`,
      `left ${dayWords(batch.dispatchedOn, clock)}`,
      'Open',
      page,
    );
  if (batch.certificatesToProve > 0 && batch.piecesBack > 0 && has('inspector'))
    return toDo(
      `Prove ${batch.certificatesToProve === 1 ? 'a certificate' : `${batch.certificatesToProve} certificates`}`,
      batch.contents,
      'Prove',
      `/certificates/${batch.firstCertificateId ?? ''}`,
    );
  if (stage === 'returned' && batch.certificatesToProve === 0 && has('lead', 'inspector'))
    return toDo(
      `Ask ${processor} for the papers`,
      'pieces are back without a certificate to prove',
      'Write',
      `${page}#messages`,
    );
  if (invoice && !invoice.entered && has('office'))
    return toDo('Enter an invoice', `from ${processor}`, 'Open', `/invoices/${invoice.id}`);
  if (invoice?.entered && !invoice.approved && stage === 'proved' && has('office'))
    return toDo(
      `Clear and approve invoice ${invoice.number ?? ''}`.trim(),
      processor,
      'Open',
      `/invoices/${invoice.id}`,
    );
  if (invoice?.approved && stage === 'proved' && has('office'))
    return toDo(`Pay invoice ${invoice.number ?? ''}`.trim(), processor, 'Pay', `/invoices/${invoice.id}`);
  if (stage === 'settled' && has('inspector', 'lead'))
    return toDo('Release to stock', batch.contents, 'Release', `${page}/release`);
  return null;
}

/** Sections of the head in which something can wait. Nonconformances stand under certificates. */
const SECTION_OF_PAGE: Record<string, keyof WaitingCounts['sections']> = {
  batches: 'batches',
  certificates: 'certificates',
  nonconformances: 'certificates',
  invoices: 'invoices',
};

/** How much waits in all, and in each section that what is to be done leads to. */
export function countWaiting(waiting: readonly Pick<Waiting, 'href'>[]): WaitingCounts {
  const sections = { batches: 0, certificates: 0, invoices: 0 };
  for (const { href } of waiting) {
    const section = SECTION_OF_PAGE[href.split('/')[1] ?? ''];
    if (section !== undefined) sections[section] += 1;
  }
  return { total: waiting.length, sections };
}
