import { Document, Text, View } from '@react-pdf/renderer';

import { limitWords } from '@/lib/parts/limit-words';
import { linesWords } from '@/lib/parts/lines-words';
import type { TravellerContent } from '@/lib/travellers/content';

import { COND, MONO } from './fonts';
import { INK, type } from './look';
import { OrderStates } from './order-states';
import { Asked, Bulleted, Cells, contentWidth, Hand, Heading, Paper, TagHead } from './paper-parts';
import { counted, paperDay, paperMoment, workAsked } from './paper-words';
import { QrCode } from './qr-code';
import { TravellerLines } from './traveller-lines';
import { TravellerLoads, TravellerSamples } from './traveller-loads';

const STRAW = '#D9B44A';
const CODE_SIZE = 72;

/** The page that goes with the parts and comes back with them. `url` is what its code opens, where a link stands. */
export function TravellerDocument({
  content,
  url,
  hash,
}: {
  content: TravellerContent;
  url: string | null;
  hash: string;
}) {
  const { number, documentVersion, zone, lines, shop } = content;
  const version = documentVersion === 0 ? 'draft' : `version ${documentVersion}`;
  return (
    <Document
      title={`Traveller ${number}, ${version}`}
      author={shop.name}
      creationDate={new Date(content.statedAt)}
      creator="Lotwright"
      producer="Lotwright"
    >
      <Paper
        sheet={content.paper}
        hash={hash}
        stated={`${number} ${version}, ${paperMoment(content.statedAt, zone)} by ${content.statedBy}. Reply to the mail with files attached, or scan the code.`}
      >
        <Head content={content} url={url} version={version} />
        <Parties content={content} />
        {content.changes.length > 0 && <Changes content={content} />}
        <View style={{ marginTop: 8 }}>
          <Heading title={`Work asked: ${workAsked(content)}`} note={content.specification} />
          <TravellerLines lines={lines} />
        </View>
        {content.note && <Text style={{ ...type.text, marginTop: 5 }}>{content.note}</Text>}
        {content.furnaceLoads && <TravellerLoads furnace={content.furnaceLoads} />}
        {content.samples !== undefined && content.samples.length > 0 && (
          <TravellerSamples samples={content.samples} />
        )}
        {content.orderStates !== undefined && content.orderStates.length > 0 && (
          <OrderStates states={content.orderStates} />
        )}
        <View style={{ flexDirection: 'row', marginTop: 8 }}>
          <View style={{ flexGrow: 1, flexBasis: 0, marginRight: 15 }}>
            <MustBeProved content={content} />
          </View>
          <View style={{ flexGrow: 1, flexBasis: 0 }}>
            <Cautions content={content} />
          </View>
        </View>
        <Hands content={content} />
        <Text style={{ ...type.caption, fontSize: 7.8, marginTop: 5 }}>
          The drawing, the order and the governing specification at the revision named come first, then this
          page. It releases nothing by itself.{referencesWords(content)}
        </Text>
      </Paper>
    </Document>
  );
}

function referencesWords({ furnaceLoads }: TravellerContent): string {
  if (!furnaceLoads || furnaceLoads.sources.length === 0) return '';
  return ` Figures of the loads are reference values, and what must be proved goes before them: ${furnaceLoads.sources.join('; ')}.`;
}

function Head({ content, url, version }: { content: TravellerContent; url: string | null; version: string }) {
  const { number, lines, paper } = content;
  const pieces = lines.reduce((sum, line) => sum + line.pieces, 0);
  const loads = new Set(lines.flatMap((line) => line.loadNo ?? [])).size;
  return (
    <View style={{ flexDirection: 'row', justifyContent: 'space-between' }}>
      <TagHead width={contentWidth(paper) - CODE_SIZE - 12} eye={STRAW}>
        <View style={{ flexDirection: 'row', justifyContent: 'space-between' }}>
          <Text style={{ fontFamily: COND, fontSize: 9.2 }}>
            <Text style={{ fontWeight: 600 }}>Traveller</Text>, goes with the parts and comes back with them
          </Text>
          <Text
            style={{ fontFamily: COND, fontSize: 9.2 }}
            render={({ pageNumber, totalPages }) => `${version}, page ${pageNumber} of ${totalPages}`}
          />
        </View>
        <Text style={{ fontFamily: MONO, fontWeight: 600, fontSize: 35, letterSpacing: -1.4, lineHeight: 1 }}>
          {number}
        </Text>
        <Text style={{ fontFamily: COND, fontWeight: 600, fontSize: 11 }}>
          {[
            counted(pieces, 'piece'),
            counted(lines.length, 'line'),
            ...(loads > 0 ? [counted(loads, 'load')] : []),
          ].join(', ')}
        </Text>
      </TagHead>
      <View style={{ width: CODE_SIZE, alignItems: 'center' }}>
        {url === null ? (
          <Text style={{ ...type.caption, marginTop: 30 }}>no code: no link stands</Text>
        ) : (
          <QrCode text={url} size={CODE_SIZE} />
        )}
        <Text
          style={{ fontFamily: MONO, fontSize: 7, marginTop: 3 }}
        >{`${number} ${content.documentVersion === 0 ? 'draft' : `v${content.documentVersion}`}`}</Text>
      </View>
    </View>
  );
}

function Parties({ content }: { content: TravellerContent }) {
  const { shop, processor, zone } = content;
  return (
    <Cells
      cells={[
        { caption: 'To', says: processor.name, rest: processor.address.join(', '), grow: 1.3 },
        {
          caption: 'From',
          says: shop.name,
          rest: [...shop.address, ...(shop.phone ? [shop.phone] : [])].join(', '),
          grow: 1.5,
        },
        {
          caption: 'Order',
          says: content.orderNumber,
          mono: true,
          rest: content.dispatchedAt
            ? `sent ${paperDay(new Date(content.dispatchedAt), zone)}`
            : 'not sent yet',
          grow: 0.95,
        },
        {
          caption: 'Wanted back',
          says: content.wantedBackOn ? paperDay(content.wantedBackOn, zone) : 'no day asked',
          grow: 0.9,
        },
      ]}
    />
  );
}

function Changes({ content: { changes, documentVersion } }: { content: TravellerContent }) {
  return (
    <View style={{ marginTop: 8, borderLeft: `3 solid ${INK}`, paddingLeft: 7 }}>
      <Text
        style={type.strong}
      >{`Takes the place of version ${documentVersion - 1}. What is different:`}</Text>
      {changes.map((change) => (
        <Text key={change} style={type.text}>
          {change}
        </Text>
      ))}
    </View>
  );
}

function MustBeProved({ content: { requirements } }: { content: TravellerContent }) {
  return (
    <View>
      <Heading title="Must be proved, on paper, by line" />
      {requirements.length === 0 && (
        <Text style={{ ...type.quiet, paddingVertical: 3 }}>
          Nothing beside the count and a certificate of conformity.
        </Text>
      )}
      {requirements.map((one, at) => (
        <Asked
          key={at}
          name={one.characteristic}
          says={limitWords(one)}
          rest={[linesWords(one.lines), one.source].filter(Boolean).join('; ')}
        />
      ))}
    </View>
  );
}

function Cautions({ content: { cautions, overrides, zone } }: { content: TravellerContent }) {
  return (
    <View>
      <Heading title="Cautions" />
      {cautions.map((caution) => (
        <Bulleted key={caution} says={caution} />
      ))}
      {overrides.map(({ what, reason, by, at }) => (
        <Bulleted key={what} says={`Let pass: ${what}. ${reason} ${by}, ${paperMoment(at, zone)}.`} />
      ))}
    </View>
  );
}

function Hands({ content: { shop, processor, lines } }: { content: TravellerContent }) {
  const pieces = counted(
    lines.reduce((sum, line) => sum + line.pieces, 0),
    'piece',
  );
  const rows = [
    [
      [`Packed and counted, ${shop.name}`, `${pieces}, name`],
      [`Counted in, ${processor.name}`, 'pieces, name'],
      ['Work done', 'run or load, name'],
      ['Looked over', 'name'],
    ],
    [
      ['Packed to return', 'pieces, name'],
      ['Papers in the box', 'certificate, charts, number'],
      [`Counted back, ${shop.name}`, 'good, damaged, short'],
      ['Inspector', 'stamp'],
    ],
  ] as const;
  return (
    <View wrap={false} style={{ marginTop: 9 }}>
      <Heading title="Hands" note="name, date, time" />
      <View style={{ border: `1 solid ${INK}` }}>
        {rows.map((row, at) => (
          <View
            key={at}
            style={{ flexDirection: 'row', ...(at === 0 ? {} : { borderTop: `1 solid ${INK}` }) }}
          >
            {row.map(([title, under], column) => (
              <Hand key={title} title={title} under={under} first={column === 0} />
            ))}
          </View>
        ))}
      </View>
    </View>
  );
}
