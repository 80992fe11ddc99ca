import { amountText } from '@/lib/money';

import { AnswerFoot, dayIn, FromTo } from './batch-parts';
import { MailLayout } from './layout';
import type { MailProps } from './mail-props';
import { Actions, Num, Quote, Say } from './parts';

type Props = MailProps<'invoice-refused'>;

/** Which invoice is refused and why, and where a corrected one goes. */
export function InvoiceRefusedMail(props: Props) {
  const { shop, batchNumber, stage, invoiceNumber, invoiceDatedOn, currency, totalMinor, reason, url } =
    props;
  return (
    <MailLayout
      preview={`${shop} does not pay this invoice: ${reason.slice(0, 100)}`}
      batch={{ number: batchNumber, stage }}
      title={`Invoice ${invoiceNumber ?? 'without a number'} refused`}
      foot={<AnswerFoot shop={shop} hasPage={url !== null} />}
    >
      <Say quiet>
        <FromTo {...props} />
      </Say>
      <Say>
        {shop} does not pay {invoiceNumber === null ? 'this invoice' : 'your invoice '}
        {invoiceNumber !== null && (
          <b style={{ fontWeight: 600 }}>
            <Num>{invoiceNumber}</Num>
          </b>
        )}
        {invoiceDatedOn !== null && ` of ${dayIn(invoiceDatedOn, props)}`}
        {totalMinor !== null && `, ${amountText(totalMinor)} ${currency}`}. The reason:
      </Say>
      <Quote>{reason}</Quote>
      <Say>
        {invoiceNumber === null
          ? 'Send a corrected one.'
          : 'Send a corrected one; it may carry the same number.'}
      </Say>
      {url !== null && <Actions primary={{ says: 'Send a corrected invoice', url }} />}
    </MailLayout>
  );
}

export const invoiceRefusedSubject = ({ batchNumber, shop, invoiceNumber }: Props): string =>
  `${shop} refused ${invoiceNumber === null ? 'an invoice' : `invoice ${invoiceNumber}`}, ${batchNumber}`;
