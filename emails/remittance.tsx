import { momentWords } from '@/lib/day-words';
import { amountText } from '@/lib/money';

import { AnswerFoot, dayIn, FromTo } from './batch-parts';
import { MailLayout } from './layout';
import type { MailProps } from './mail-props';
import { ListTable, Num, Say } from './parts';

type Props = MailProps<'remittance'>;

/** What was paid, for what, and what was not and why. */
export function RemittanceMail(props: Props) {
  const {
    shop,
    batchNumber,
    stage,
    invoiceNumber,
    invoiceDatedOn,
    currency,
    paidMinor,
    paidAt,
    reference,
    zone,
    statedAt,
  } = props;
  return (
    <MailLayout
      preview={`${shop} has paid ${amountText(paidMinor)} ${currency}`}
      batch={{ number: batchNumber, stage }}
      title={`${amountText(paidMinor)} ${currency} paid`}
      foot={<AnswerFoot shop={shop} hasPage={false} />}
    >
      <Say quiet>
        <FromTo {...props} />
      </Say>
      <Say>
        For your invoice{' '}
        <b style={{ fontWeight: 600 }}>
          <Num>{invoiceNumber}</Num>
        </b>
        {invoiceDatedOn !== null && ` of ${dayIn(invoiceDatedOn, props)}`}, paid{' '}
        {momentWords(new Date(paidAt), { zone, now: new Date(statedAt) })}. The transfer carries{' '}
        <Num>{reference}</Num>.
      </Say>
      <ListTable
        columns={[{ says: 'Paid for' }, { says: 'Pieces', figure: true }, { says: currency, figure: true }]}
        rows={props.lines.map((line) => [
          line.says,
          line.pieces === null ? '' : String(line.pieces),
          amountText(line.amountMinor),
        ])}
        sum={['Paid', '', amountText(paidMinor)]}
      />
      <Withheld {...props} />
    </MailLayout>
  );
}

export const remittanceSubject = ({ batchNumber, shop, invoiceNumber, paidMinor, currency }: Props): string =>
  `${shop} paid ${amountText(paidMinor)} ${currency}, invoice ${invoiceNumber}, ${batchNumber}`;

function Withheld({ withheld, currency }: Props) {
  if (withheld.length === 0) return null;
  return (
    <>
      <p style={{ margin: '16px 0 0', fontWeight: 600 }}>Not paid</p>
      <ListTable
        columns={[{ says: 'Why' }, { says: currency, figure: true }]}
        rows={withheld.map((one) => [one.says, amountText(one.amountMinor)])}
      />
    </>
  );
}
