import { Document, Text, View } from '@react-pdf/renderer';

import { expectedPrice } from '@/lib/batches/expected-price';
import { amountText } from '@/lib/money';
import { limitWords } from '@/lib/parts/limit-words';
import { linesWords } from '@/lib/parts/lines-words';
import type { OrderContent } from '@/lib/travellers/content';

import { COND, MONO } from './fonts';
import { INK, QUIET, RULE, type } from './look';
import { OrderStates } from './order-states';
import { Asked, Cells, Heading, Paper } from './paper-parts';
import { conditionWords, paperDay, paperMoment, workAsked } from './paper-words';

/** The purchase order of a batch: what is asked, and what is paid for it. */
export function OrderDocument({ content, hash }: { content: OrderContent; hash: string }) {
  const { orderNumber, documentVersion, zone, shop, processor } = content;
  return (
    <Document
      title={`Order ${orderNumber}, version ${documentVersion}`}
      author={shop.name}
      creationDate={new Date(content.statedAt)}
      creator="Lotwright"
      producer="Lotwright"
    >
      <Paper
        sheet={content.paper}
        hash={hash}
        stated={`${orderNumber} version ${documentVersion}, ${paperMoment(content.statedAt, zone)} by ${content.statedBy}.`}
      >
        <View
          style={{
            flexDirection: 'row',
            justifyContent: 'space-between',
            alignItems: 'flex-end',
            borderBottom: `1.3 solid ${INK}`,
            paddingBottom: 6,
          }}
        >
          <View>
            <Text style={{ fontFamily: COND, fontWeight: 600, fontSize: 12 }}>Purchase order</Text>
            <Text
              style={{
                fontFamily: MONO,
                fontWeight: 600,
                fontSize: 24,
                letterSpacing: -0.8,
                lineHeight: 1.1,
              }}
            >
              {orderNumber}
            </Text>
          </View>
          <View style={{ alignItems: 'flex-end' }}>
            <Text style={type.strong}>{shop.name}</Text>
            <Text style={type.text}>{[...shop.address, ...(shop.phone ? [shop.phone] : [])].join(', ')}</Text>
            <Text
              style={type.quiet}
            >{`version ${documentVersion} of ${paperDay(new Date(content.statedAt), zone)}`}</Text>
          </View>
        </View>
        <Cells
          cells={[
            { caption: 'To', says: processor.name, rest: processor.address.join(', '), grow: 1.6 },
            {
              caption: 'Batch and traveller',
              says: content.number,
              mono: true,
              rest: `${content.number} v${documentVersion}`,
            },
            {
              caption: 'Wanted back',
              says: content.wantedBackOn ? paperDay(content.wantedBackOn, zone) : 'no day asked',
            },
            { caption: 'Currency', says: content.currency, mono: true, grow: 0.6 },
          ]}
        />
        {content.changes.length > 0 && (
          <View style={{ marginTop: 8, borderLeft: `3 solid ${INK}`, paddingLeft: 7 }}>
            <Text
              style={type.strong}
            >{`Takes the place of version ${documentVersion - 1}. What is different:`}</Text>
            {content.changes.map((change) => (
              <Text key={change} style={type.text}>
                {change}
              </Text>
            ))}
          </View>
        )}
        <View style={{ marginTop: 10 }}>
          <Heading title={`Work asked: ${workAsked(content)}`} note={content.specification} />
          <OrderLines content={content} />
          <Sums content={content} />
        </View>
        {content.note && <Text style={{ ...type.text, marginTop: 6 }}>{content.note}</Text>}
        {content.orderStates !== undefined && content.orderStates.length > 0 && (
          <OrderStates states={content.orderStates} />
        )}
        {content.requirements.length > 0 && (
          <View style={{ marginTop: 12 }}>
            <Heading title="Must be proved, on paper, by line" />
            {content.requirements.map((one, at) => (
              <Asked
                key={at}
                width={180}
                name={one.characteristic}
                says={limitWords(one)}
                rest={[linesWords(one.lines), one.source].filter(Boolean).join('; ')}
              />
            ))}
          </View>
        )}
        <Text style={{ ...type.caption, fontSize: 7.8, marginTop: 8 }}>
          Only accepted pieces are paid for. Name this order and the batch on certificate and invoice. The
          drawing and the governing specification at the revision named come first.
        </Text>
      </Paper>
    </Document>
  );
}

const WIDTH = { no: 16, lot: 52, part: 100, condition: 70, pieces: 44, price: 58, amount: 66 };

function OrderLines({ content: { lines } }: { content: OrderContent }) {
  const right = { textAlign: 'right' } as const;
  return (
    <View>
      <View fixed style={{ flexDirection: 'row', borderBottom: `1 solid ${INK}`, paddingBottom: 2 }}>
        <Text style={{ ...type.caption, width: WIDTH.no }} />
        <Text style={{ ...type.caption, width: WIDTH.part }}>Part and revision</Text>
        <Text style={{ ...type.caption, flexGrow: 1, flexBasis: 0 }} />
        <Text style={{ ...type.caption, width: WIDTH.lot }}>Lot</Text>
        <Text style={{ ...type.caption, width: WIDTH.condition }}>From, to</Text>
        <Text style={{ ...type.caption, width: WIDTH.pieces, ...right }}>Pieces</Text>
        <Text style={{ ...type.caption, width: WIDTH.price, ...right }}>Each</Text>
        <Text style={{ ...type.caption, width: WIDTH.amount, ...right }}>Amount</Text>
      </View>
      {lines.map((line) => (
        <View
          key={line.lineNo}
          wrap={false}
          style={{
            flexDirection: 'row',
            alignItems: 'center',
            borderBottom: `0.75 solid ${RULE}`,
            paddingVertical: 3.4,
          }}
        >
          <Text style={{ ...type.figure, width: WIDTH.no, color: QUIET }}>{line.lineNo}</Text>
          <Text
            style={{ ...type.strongFigure, width: WIDTH.part }}
          >{`${line.partNumber} ${line.partRevision}`}</Text>
          <Text style={{ ...type.text, flexGrow: 1, flexBasis: 0 }}>{line.partName}</Text>
          <Text style={{ ...type.figure, width: WIDTH.lot }}>{line.lotNumber}</Text>
          <Text style={{ ...type.figure, width: WIDTH.condition }}>{conditionWords(line)}</Text>
          <Text style={{ ...type.strongFigure, width: WIDTH.pieces, ...right }}>{line.pieces}</Text>
          <Text style={{ ...type.figure, width: WIDTH.price, ...right }}>
            {amountText(line.unitPriceMinor)}
          </Text>
          <Text style={{ ...type.figure, width: WIDTH.amount, ...right }}>
            {amountText(line.unitPriceMinor * line.pieces)}
          </Text>
        </View>
      ))}
    </View>
  );
}

function Sums({ content }: { content: OrderContent }) {
  const price = expectedPrice(content);
  const rows = [
    ['pieces at their prices', price.workMinor],
    ...(price.toMinimumMinor > 0
      ? [[`to the lot minimum of ${amountText(content.lotMinimumMinor)}`, price.toMinimumMinor] as const]
      : []),
    ...(price.certificationFeeMinor > 0 ? [['certificates', price.certificationFeeMinor] as const] : []),
  ] as const;
  return (
    <View wrap={false} style={{ alignSelf: 'flex-end', width: 260, marginTop: 4 }}>
      {rows.map(([says, amount]) => (
        <View
          key={says}
          style={{
            flexDirection: 'row',
            justifyContent: 'space-between',
            borderBottom: `0.75 solid ${RULE}`,
            paddingVertical: 2.6,
          }}
        >
          <Text style={type.text}>{says}</Text>
          <Text style={type.figure}>{amountText(amount)}</Text>
        </View>
      ))}
      <View
        style={{
          flexDirection: 'row',
          justifyContent: 'space-between',
          borderTop: `1.3 solid ${INK}`,
          paddingTop: 3,
        }}
      >
        <Text style={{ ...type.label, fontSize: 10.5 }}>{`Expected invoice, ${content.currency}`}</Text>
        <Text style={{ ...type.strongFigure, fontSize: 11 }}>{amountText(price.totalMinor)}</Text>
      </View>
    </View>
  );
}
