import { Document, Text, View } from '@react-pdf/renderer';

import type { TravellerContent } from '@/lib/travellers/content';

import { COND, MONO } from './fonts';
import { INK, LINE, QUIET, RULE, type } from './look';
import { Asked, Bulleted, Cells, contentWidth, Hand, Heading, Paper, TagHead } from './paper-parts';
import {
  conditionWords,
  counted,
  limitWords,
  linesWords,
  paperDay,
  paperMoment,
  workAsked,
} from './paper-words';
import { QrCode } from './qr-code';

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
          <Lines lines={lines} />
        </View>
        {content.note && <Text style={{ ...type.text, marginTop: 5 }}>{content.note}</Text>}
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
          page. It releases nothing by itself.
        </Text>
      </Paper>
    </Document>
  );
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

const WIDTH = {
  no: 15,
  lot: 40,
  part: 72,
  material: 106,
  thick: 56,
  condition: 54,
  load: 24,
  pieces: 34,
  counted: 44,
};

function Lines({ lines }: { lines: TravellerContent['lines'] }) {
  const withLoads = lines.some((line) => line.loadNo !== null);
  const total = lines.reduce((sum, line) => sum + line.pieces, 0);
  return (
    <View>
      <View fixed style={{ flexDirection: 'row', borderBottom: `1 solid ${INK}`, paddingBottom: 2 }}>
        <Text style={{ ...type.caption, width: WIDTH.no }} />
        <Text style={{ ...type.caption, width: WIDTH.lot }}>Lot</Text>
        <Text style={{ ...type.caption, width: WIDTH.part }}>Part and revision</Text>
        <Text style={{ ...type.caption, flexGrow: 1, flexBasis: 0 }} />
        <Text style={{ ...type.caption, width: WIDTH.material }}>Material, heat</Text>
        <Text style={{ ...type.caption, width: WIDTH.thick, textAlign: 'right', paddingRight: 8 }}>
          Thickness
        </Text>
        <Text style={{ ...type.caption, width: WIDTH.condition }}>From, to</Text>
        {withLoads && <Text style={{ ...type.caption, width: WIDTH.load, textAlign: 'right' }}>Load</Text>}
        <Text style={{ ...type.caption, width: WIDTH.pieces, textAlign: 'right' }}>Pieces</Text>
        <Text style={{ ...type.caption, width: WIDTH.counted, textAlign: 'right' }}>Counted</Text>
      </View>
      {lines.map((line) => (
        <View
          key={line.lineNo}
          wrap={false}
          style={{ borderBottom: `0.75 solid ${RULE}`, paddingVertical: 3 }}
        >
          <View style={{ flexDirection: 'row', alignItems: 'center' }}>
            <Text style={{ ...type.figure, width: WIDTH.no, color: QUIET }}>{line.lineNo}</Text>
            <Text style={{ ...type.strongFigure, width: WIDTH.lot }}>{line.lotNumber}</Text>
            <Text
              style={{ ...type.strongFigure, width: WIDTH.part }}
            >{`${line.partNumber} ${line.partRevision}`}</Text>
            <Text style={{ ...type.text, flexGrow: 1, flexBasis: 0, paddingRight: 5 }}>{line.partName}</Text>
            <Text style={{ ...type.text, width: WIDTH.material, paddingRight: 4 }}>
              {line.material} <Text style={{ fontFamily: MONO, fontSize: 8, color: QUIET }}>{line.heat}</Text>
            </Text>
            <Text style={{ ...type.figure, width: WIDTH.thick, textAlign: 'right', paddingRight: 8 }}>
              {line.thickness ?? ''}
            </Text>
            <Text style={{ ...type.figure, width: WIDTH.condition }}>{conditionWords(line)}</Text>
            {withLoads && (
              <View style={{ width: WIDTH.load, alignItems: 'flex-end' }}>
                <LoadFrame no={line.loadNo} />
              </View>
            )}
            <Text style={{ ...type.strongFigure, fontSize: 10, width: WIDTH.pieces, textAlign: 'right' }}>
              {line.pieces}
            </Text>
            <CountBox />
          </View>
          {(line.stepNote !== null || line.serials.length > 0) && (
            <Text style={{ ...type.caption, fontSize: 7.8, marginLeft: WIDTH.no, color: QUIET }}>
              {[line.stepNote, line.serials.length > 0 ? `serials ${line.serials.join(', ')}` : null]
                .filter(Boolean)
                .join('. ')}
            </Text>
          )}
        </View>
      ))}
      <View
        wrap={false}
        style={{
          flexDirection: 'row',
          alignItems: 'center',
          borderTop: `1.3 solid ${INK}`,
          paddingVertical: 3,
          marginTop: -0.75,
        }}
      >
        <Text style={{ ...type.strong, marginLeft: WIDTH.no, flexGrow: 1 }}>All pieces</Text>
        <Text style={{ ...type.strongFigure, fontSize: 10, width: WIDTH.pieces, textAlign: 'right' }}>
          {total}
        </Text>
        <CountBox />
      </View>
    </View>
  );
}

/** Single, double, triple frames outlive a bad copier. */
function LoadFrame({ no }: { no: number | null }) {
  if (no === null) return null;
  const number = (
    <Text style={{ ...type.strongFigure, fontSize: 7.6, paddingHorizontal: 3, lineHeight: 1.15 }}>{no}</Text>
  );
  return Array.from({ length: Math.min(no, 3) }).reduce<React.JSX.Element>(
    (inner, _, at) => (
      <View style={{ border: `0.8 solid ${INK}`, padding: at === 0 ? 0 : 0.9 }}>{inner}</View>
    ),
    number,
  );
}

function CountBox() {
  return (
    <View style={{ width: WIDTH.counted, alignItems: 'flex-end' }}>
      <View style={{ width: 34, height: 13, border: `0.8 solid ${LINE}` }} />
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
