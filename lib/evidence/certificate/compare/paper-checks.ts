import { z } from 'zod';

import type { OpenedFile } from '../../page';
import { Day, type Order } from '../../order';
import type { SeenCertificate, StatedCertificate } from '../certificate';
import { plainKey } from '../match/alike';
import { areSameCompany } from '../match/same-company';
import { namesOrder } from '../match/same-order-number';
import { cannotTell, meets, notStated, observed, wrong, type Outcome } from './outcome';

/** A certificate by itself: what is asked of every one, whatever was ordered. */
export interface Alone {
  readonly stated: StatedCertificate;
  readonly file: Pick<OpenedFile, 'sha256' | 'pages'>;
  readonly order: Order | null;
  readonly seen: readonly SeenCertificate[];
  readonly today: string;
}

/** It is signed, and states that the work conforms. */
export function isSigned({ stated }: Alone): Outcome[] {
  const signature = { requirement: 'signature' };
  const statement = { requirement: 'statement of conformance' };
  return [
    stated.signature_present
      ? meets({ ...signature, stated: stated.signed_by }, 'It is signed.')
      : wrong('signature_missing', signature, 'Nobody signed the certificate.'),
    stated.conformance_statement
      ? meets(statement, 'It states that the work conforms.')
      : wrong('statement_missing', statement, 'The certificate does not state that the work conforms.'),
  ];
}

/** The days when the work was done, the first first. */
function daysOfWork({ cycles, plating_end, bake_start, bake_end }: StatedCertificate): string[] {
  const times = cycles.flatMap(({ soak_start, soak_end }) => [soak_start, soak_end]);
  return [...times, plating_end, bake_start, bake_end]
    .flatMap((time) => (time === null ? [] : [time.slice(0, 10)]))
    .toSorted();
}

/** How sure the order of day and month must be for a date to be held against a certificate. */
const SURE_OF_ORDER = 0.9;

/**
 * The day with day and month exchanged, where the date is written in figures, nothing in the document shows their order, and
 * only that other day is possible.
 */
function otherDay(
  { certificate_date: date, facts }: StatedCertificate,
  { from, to }: { readonly from: string | null; readonly to: string },
): string | null {
  const fact = facts.find(({ field }) => field === 'certificate_date');
  const isPossible = (day: string): boolean => day <= to && (from === null || day >= from);
  if (date === null || !fact || fact.confidence >= SURE_OF_ORDER || isPossible(date)) return null;
  if (!/^\W*\d{1,2}\W+\d{1,2}\W+(?:\d{2}|\d{4})\W*$/.test(fact.raw)) return null;
  const [year = '', month = '', day = ''] = date.split('-');
  const other = `${year}-${day}-${month}`;
  return Number(day) <= 12 && isPossible(other) ? other : null;
}

/** It was written after the parts left and the work was done, and not after today. One wrong date is told once. */
export function isDatedRight({ stated, order, today }: Alone): Outcome[] {
  const { certificate_date: date } = stated;
  const dispatched = order?.dispatched ?? null;
  const asked = {
    requirement: `dated ${dispatched === null ? '' : `from ${dispatched} `}to ${today}`,
    ordered: dispatched === null ? null : `dispatched ${dispatched}`,
    stated: date,
  };
  const [first] = daysOfWork(stated);
  const last = daysOfWork(stated).at(-1);
  const other = otherDay(stated, { from: dispatched, to: today });
  if (other !== null)
    return [
      cannotTell(
        asked,
        `The date may be ${other} as well, which is possible: nothing shows whether day or month comes first.`,
      ),
    ];
  if (date !== null && date > today)
    return [wrong('dated_in_future', asked, `The certificate is dated ${date}; today is ${today}.`)];
  if (date !== null && dispatched !== null && date < dispatched)
    return [
      wrong(
        'dated_before_dispatch',
        asked,
        `The certificate is dated ${date}; the parts left on ${dispatched}.`,
      ),
    ];
  if (first !== undefined && dispatched !== null && first < dispatched)
    return [
      wrong(
        'dated_before_dispatch',
        { ...asked, stated: first },
        `The certificate states work on ${first}; the parts left on ${dispatched}.`,
      ),
    ];
  if (last !== undefined && last > today)
    return [
      wrong(
        'dated_in_future',
        { ...asked, stated: last },
        `The certificate states work on ${last}; today is ${today}.`,
      ),
    ];
  if (date !== null && last !== undefined && last > date)
    return [
      wrong(
        'dated_before_work',
        asked,
        `The certificate is dated ${date} and states work on ${last}.`,
        'check',
      ),
    ];
  return [date === null ? notStated({ ...asked, stated: null }) : meets(asked, 'The date is possible.')];
}

/** Neither its number nor its file was used for another order before. */
export function isNew({ stated, file, order, seen }: Alone): Outcome[] {
  const po = order?.po ?? stated.purchase_order;
  const again = seen.filter((one) => isSameFile(one, file.sha256, stated) || isSameNumber(one, stated));
  const [elsewhere] = again.filter(
    ({ purchase_order }) => po === null || !purchase_order || !namesOrder(purchase_order, po),
  );
  const [here] = again;
  if (elsewhere)
    return [
      wrong(
        'certificate_reused',
        {
          requirement: null,
          ordered: po,
          stated: elsewhere.purchase_order ?? elsewhere.certificate_number ?? null,
        },
        isSameFile(elsewhere, file.sha256, stated)
          ? `The same file was received before${forOrder(elsewhere)}.`
          : `Certificate ${stated.certificate_number ?? ''} was received before${forOrder(elsewhere)}.`,
      ),
    ];
  return here ? [observed(`This certificate was received before${forOrder(here)}.`)] : [];
}

const forOrder = ({ purchase_order }: SeenCertificate): string =>
  purchase_order ? ` for order ${purchase_order}` : '';

/** One file may hold several certificates: another number in it is another certificate. */
const isSameFile = (
  one: SeenCertificate,
  sha256: string,
  { certificate_number }: StatedCertificate,
): boolean =>
  !!one.sha256 &&
  one.sha256.toLowerCase() === sha256.toLowerCase() &&
  (!one.certificate_number ||
    certificate_number === null ||
    plainKey(one.certificate_number) === plainKey(certificate_number));

/** Two processors may both have a certificate 1001. */
const isSameNumber = (one: SeenCertificate, { certificate_number, processor }: StatedCertificate): boolean =>
  !!one.certificate_number &&
  certificate_number !== null &&
  plainKey(one.certificate_number) === plainKey(certificate_number) &&
  (!one.processor || processor === null || areSameCompany(one.processor, processor));

const Approval = z.looseObject({
  processes: z.array(z.string()).nullish(),
  valid_from: Day.nullish(),
  valid_to: Day.nullish(),
});
const Approvals = z.looseObject({ approvals: z.array(Approval).optional(), approval: Approval.optional() });

/** Where the order says for how long the processor is approved: the work was done within that time. */
export function wasApproved({ stated, order }: Alone): Outcome[] {
  const given = Approvals.safeParse(order?.processor);
  const approvals = given.success
    ? [...(given.data.approvals ?? []), ...(given.data.approval ? [given.data.approval] : [])]
    : [];
  const day = daysOfWork(stated)[0] ?? stated.certificate_date;
  const asked = { requirement: 'approval valid on the day of the work', stated: day };
  if (approvals.length === 0 || order === null) return [];
  if (day === null) return [notStated(asked, 'The certificate does not say when the work was done.')];
  const ofProcess = approvals.filter(({ processes }) => !processes || processes.includes(order.process));
  const isValid = ofProcess.some(
    ({ valid_from, valid_to }) => (!valid_from || valid_from <= day) && (!valid_to || valid_to >= day),
  );
  if (isValid) return [meets(asked, `The processor was approved on ${day}.`)];
  const times = ofProcess.map(({ valid_from, valid_to }) => `${valid_from ?? '…'} to ${valid_to ?? '…'}`);
  return [
    wrong(
      'approval_not_valid',
      { ...asked, ordered: times.join(', ') || null },
      `The work was done on ${day}; the processor's approval ${times.length === 0 ? 'does not cover it' : `holds ${times.join(', ')}`}.`,
    ),
  ];
}

/** Letters and digits that say anything. */
const SAYS = /[\p{L}\p{N}]{2}/u;
const SHOWN = 80;

/** Nothing on its pages is kept from the eye. The layer of letters behind a scan is no deceit: the picture decides. */
export function hidesNothing({ file: { pages } }: Alone): Outcome[] {
  const hidden = pages.flatMap(({ number, origin, hidden }) =>
    hidden
      .filter(({ text, why }) => SAYS.test(text) && !(origin === 'recognised' && why === 'invisible'))
      .map(({ text }) => ({ page: number, text })),
  );
  const [first] = hidden;
  if (!first) return [];
  const text = hidden
    .map(({ text }) => text)
    .join(' ')
    .replace(/\s+/g, ' ')
    .trim();
  const shown = text.length > SHOWN ? `${text.slice(0, SHOWN)}…` : text;
  return [
    wrong(
      'hidden_text',
      { requirement: null, stated: shown },
      `Page ${first.page} has text that a person cannot see: "${shown}". It decides nothing.`,
      'check',
    ),
  ];
}
