import { dayIn, callWords, AnswerFoot, FromTo } from './batch-parts';
import { MailLayout } from './layout';
import type { MailProps } from './mail-props';
import { Actions, Caution, ListTable, Say } from './parts';

type Props = MailProps<'dispatch'> & { changes?: readonly string[] };

/** A batch is on the way, or its papers were issued again; the second also says what changed. */
export function DispatchMail(props: Props) {
  const { shop, batchNumber, pieces, changes, url, note, cautions } = props;
  const title = changes ? `${batchNumber} has changed` : `${countOf(pieces)} on the way to you`;
  return (
    <MailLayout
      preview={`${shop}: ${props.asked}, ${countWords(pieces)}`}
      batch={{ number: batchNumber, stage: 'dispatched' }}
      title={title}
      foot={<Foot {...props} />}
    >
      <Say quiet>
        <FromTo {...props} />
      </Say>
      {changes && <Changes changes={changes} version={props.version} />}
      <Say>
        <b style={{ fontWeight: 600 }}>Asked:</b> {props.asked}, {props.specification}.
        {props.wantedBackOn !== null && (
          <>
            {' '}
            Back by <b style={{ fontWeight: 600 }}>{dayIn(props.wantedBackOn, props)}</b>.
          </>
        )}
      </Say>
      {note && <Say>{note}</Say>}
      <Lines {...props} />
      {url && (
        <Actions
          primary={{ says: changes ? 'Look at what changed' : 'Say you have them, promise a day', url }}
          second={{ says: 'Ask', url: `${url}?at=ask` }}
        />
      )}
      <p style={{ margin: '14px 0 0', fontSize: 14, lineHeight: '20px' }}>
        {url
          ? 'No password is needed; the link is yours and ends when the batch is settled. Traveller and purchase order are on its page too.'
          : 'Sign in to see the batch and its papers.'}
      </p>
      <Caution>
        {cautions.map((caution) => `${caution.replace(/\.?$/, '.')} `)}
        If anything differs from the order, stop and {callWords(props)}.
      </Caution>
    </MailLayout>
  );
}

export const dispatchSubject = ({ batchNumber, shop, pieces }: MailProps<'dispatch'>): string =>
  `${batchNumber} from ${shop}: ${countOf(pieces)} on the way`;
export const reissuedSubject = ({ batchNumber, shop, version }: MailProps<'dispatch-reissued'>): string =>
  `${batchNumber} from ${shop}: changed, version ${version}`;

function Changes({ changes, version }: { changes: readonly string[]; version: number }) {
  return (
    <>
      <Say>
        <b style={{ fontWeight: 600 }}>Version {version} takes the place of the one before.</b> Different from
        it:
      </Say>
      <ul style={{ margin: '0 0 10px', paddingLeft: 18 }}>
        {changes.map((change) => (
          <li key={change}>{change}</li>
        ))}
      </ul>
    </>
  );
}

function Lines({ lines, pieces }: Props) {
  const inLoads = lines.some((line) => line.loadNo !== null);
  const load = (value: string) => (inLoads ? [value] : []);
  return (
    <ListTable
      columns={[
        { says: 'Line' },
        { says: 'Part', code: true },
        { says: 'What it is' },
        ...(inLoads ? [{ says: 'Load', figure: true }] : []),
        { says: 'Pieces', figure: true },
      ]}
      rows={lines.map((line) => [
        String(line.lineNo),
        line.part,
        line.description,
        ...load(line.loadNo === null ? '' : String(line.loadNo)),
        String(line.pieces),
      ])}
      sum={['', 'Pieces', '', ...load(''), String(pieces)]}
    />
  );
}

function Foot({ shop, url, attached }: Props) {
  return (
    <>
      {attached.length > 0 && `Attached: ${attached.join(', ')}. `}
      The drawing, the order and the governing specification come first.{' '}
      <AnswerFoot shop={shop} hasPage={url !== null} />
    </>
  );
}

const countWords = (pieces: number): string =>
  `${pieces.toLocaleString('en-US')} ${pieces === 1 ? 'part' : 'parts'}`;
const countOf = (pieces: number): string => `${countWords(pieces)} ${pieces === 1 ? 'is' : 'are'}`;
