import { dayWords, type CalendarDay } from '@/lib/day-words';

import type { MailProps } from './mail-props';
import { Num } from './parts';

type OfBatch = Pick<
  MailProps<'batch-cancelled'>,
  'shop' | 'processor' | 'orderNumber' | 'contact' | 'zone' | 'statedAt'
>;

/** A calendar day as the mail's reader says it. */
export const dayIn = (day: CalendarDay, { zone, statedAt }: Pick<OfBatch, 'zone' | 'statedAt'>): string =>
  dayWords(day, { zone, now: new Date(statedAt) });

/** `From Tern Slip to Ostrow. Order TS-1187.` */
export function FromTo({ shop, processor, orderNumber }: OfBatch) {
  return (
    <>
      From {shop} to {processor}. Order{' '}
      <b style={{ fontWeight: 600 }}>
        <Num>{orderNumber}</Num>
      </b>
      .
    </>
  );
}

/** `call Ines Halloran, 555 0117` */
export function callWords({ contact, shop }: OfBatch): string {
  if (contact === null) return `ask ${shop}`;
  return contact.phone === null ? `ask ${contact.name}` : `call ${contact.name}, ${contact.phone}`;
}

/** Whose answer an answer to this mail reaches. Papers are taken on the page, not out of mails. */
export function AnswerFoot({ shop, hasPage }: { shop: string; hasPage: boolean }) {
  return (
    <>
      An answer to this mail goes to {shop} as an ordinary mail.
      {hasPage &&
        ' Certificates, charts and invoices are taken on the page of the batch, where they are filed with it.'}
    </>
  );
}
