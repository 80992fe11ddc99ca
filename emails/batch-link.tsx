import { AnswerFoot, dayIn, FromTo } from './batch-parts';
import { MailLayout } from './layout';
import type { MailProps } from './mail-props';
import { Actions, Say } from './parts';

export function BatchLinkMail(props: MailProps<'batch-link'>) {
  const { shop, batchNumber, stage, pieces, asked, specification, wantedBackOn, url } = props;
  return (
    <MailLayout
      preview={`A new link to ${batchNumber}`}
      batch={{ number: batchNumber, stage }}
      title="A new link to this batch"
      foot={<AnswerFoot shop={shop} hasPage />}
    >
      <Say quiet>
        <FromTo {...props} />
      </Say>
      <Say>
        {pieces.toLocaleString('en-US')} pieces: {asked}, {specification}.
        {wantedBackOn !== null && ` Back by ${dayIn(wantedBackOn, props)}.`}
      </Say>
      <Actions primary={{ says: `Open ${batchNumber}`, url }} />
      <p style={{ margin: '14px 0 0', fontSize: 14, lineHeight: '20px' }}>
        No password is needed; the link is yours and ends when the batch is settled.
      </p>
    </MailLayout>
  );
}

export const batchLinkSubject = ({ batchNumber, shop }: MailProps<'batch-link'>): string =>
  `${batchNumber} from ${shop}: a new link`;
