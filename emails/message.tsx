import { AnswerFoot, FromTo } from './batch-parts';
import { MailLayout } from './layout';
import type { MailProps } from './mail-props';
import { Actions, Quote, Say } from './parts';

type Props = MailProps<'message'>;

const TITLES: Record<Props['kind'], (author: string) => string> = {
  question: (author) => `${author} asks`,
  answer: (author) => `${author} answers`,
  note: (author) => `${author} writes`,
  trouble: (author) => `${author} reports trouble`,
};

/** What the other side wrote on a batch: a question, an answer, a note, trouble. */
export function MessageMail(props: Props) {
  const { shop, processor, batchNumber, stage, to, kind, author, body, about, answers, url } = props;
  const other = to === 'shop' ? processor : shop;
  return (
    <MailLayout
      preview={`${author}: ${body.slice(0, 100)}`}
      batch={{ number: batchNumber, stage }}
      title={TITLES[kind](author)}
      foot={
        to === 'processor' ? (
          <AnswerFoot shop={shop} hasPage={url !== null} />
        ) : (
          `An answer to this mail goes to ${other} as an ordinary mail. Answered on the page, it stays with the batch.`
        )
      }
    >
      <Say quiet>
        <FromTo {...props} />
        {about && ` About ${about}.`}
      </Say>
      {answers && (
        <>
          <Say quiet>{answers.author} asked:</Say>
          <Quote>{answers.body}</Quote>
        </>
      )}
      <Quote trouble={kind === 'trouble'}>{body}</Quote>
      {url && (
        <Actions
          primary={{
            says: kind === 'question' || kind === 'trouble' ? 'Answer on the page' : `Open ${batchNumber}`,
            url,
          }}
        />
      )}
    </MailLayout>
  );
}

const SUBJECTS: Record<Props['kind'], string> = {
  question: 'a question',
  answer: 'an answer',
  note: 'a note',
  trouble: 'trouble reported',
};

export const messageSubject = ({ batchNumber, kind, to, shop, processor }: Props): string =>
  `${batchNumber}: ${SUBJECTS[kind]} from ${to === 'shop' ? processor : shop}`;
