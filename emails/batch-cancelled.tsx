import { AnswerFoot, callWords, FromTo } from './batch-parts';
import { MailLayout } from './layout';
import type { MailProps } from './mail-props';
import { Quote, Say } from './parts';

export function BatchCancelledMail(props: MailProps<'batch-cancelled'>) {
  const { shop, batchNumber, orderNumber, pieces, reason } = props;
  return (
    <MailLayout
      preview={`${shop} has cancelled ${batchNumber}`}
      batch={{ number: batchNumber, stage: 'cancelled' }}
      title="Do not work on this batch"
      foot={<AnswerFoot shop={shop} hasPage={false} />}
    >
      <Say quiet>
        <FromTo {...props} />
      </Say>
      <Say>
        {shop} has cancelled the batch and order {orderNumber}. Its {pieces.toLocaleString('en-US')} pieces go
        back to the shop as they are.
      </Say>
      <Quote>{reason}</Quote>
      <Say>If work on it has begun, stop and {callWords(props)}. The links of this batch have ended.</Say>
    </MailLayout>
  );
}

export const batchCancelledSubject = ({ batchNumber, shop }: MailProps<'batch-cancelled'>): string =>
  `${batchNumber} from ${shop} is cancelled`;
