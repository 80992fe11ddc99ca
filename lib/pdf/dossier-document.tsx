import { Document, Text, View } from '@react-pdf/renderer';
import type { ReactNode } from 'react';

import type { DossierBatch, DossierContent } from '@/lib/dossiers/content';
import { PROCESS_WORDS, type Process } from '@/lib/trade/process';

import type { ChartPicture } from './chart-picture';
import { DossierCharts, DossierCorrections } from './dossier-readings';
import { COND, MONO } from './fonts';
import { INK, RULE, type } from './look';
import { Asked, Cells, contentWidth, Heading, Paper } from './paper-parts';
import { counted, paperMoment } from './paper-words';

interface DossierDocumentProps {
  content: DossierContent;
  /** Of its charts, by the chart's id. */
  pictures: ReadonlyMap<string, ChartPicture>;
  statedAt: Date;
  hash: string;
  sheet: 'letter' | 'a4';
}

/** All the evidence of a lot: what it is, where every piece is, each outside step with its proof, each movement, each original. */
export function DossierDocument({ content, pictures, statedAt, hash, sheet }: DossierDocumentProps) {
  const { shop, lot, part } = content;
  const moment = (at: string) => paperMoment(at, shop.zone);
  return (
    <Document
      title={`Dossier of lot ${lot.number}`}
      author={shop.name}
      creationDate={statedAt}
      creator="Lotwright"
      producer="Lotwright"
    >
      <Paper
        sheet={sheet}
        hash={hash}
        stated={`Dossier of ${lot.number}, stated ${moment(statedAt.toISOString())}.`}
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
            <Text style={{ fontFamily: COND, fontWeight: 600, fontSize: 12 }}>Dossier of lot</Text>
            <Text
              style={{
                fontFamily: MONO,
                fontWeight: 600,
                fontSize: 24,
                letterSpacing: -0.8,
                lineHeight: 1.1,
              }}
            >
              {lot.number}
            </Text>
          </View>
          <View style={{ alignItems: 'flex-end' }}>
            <Text style={type.strong}>{shop.name}</Text>
            <Text style={type.quiet}>{shop.address.join(', ')}</Text>
          </View>
        </View>
        <Cells
          cells={[
            {
              caption: 'Part',
              says: `${part.number} rev ${part.revision}`,
              rest: part.name,
              mono: true,
              grow: 2,
            },
            { caption: 'Material', says: part.material, ...(part.thickness ? { rest: part.thickness } : {}) },
            { caption: 'Heat', says: lot.heat, mono: true },
            { caption: 'Condition', says: `${part.madeCondition} to ${part.endCondition}` },
            { caption: 'Made', says: counted(lot.made, 'piece'), rest: moment(lot.madeOn) },
          ]}
        />
        {lot.serials.length > 0 && <Asked name="Serials" says={lot.serials.join('  ')} />}
        <Heading
          title="Where every piece is"
          note={counted(
            content.whereabouts.reduce((sum, one) => sum + one.pieces, 0),
            'piece',
          )}
        />
        {content.whereabouts.map((one) => (
          <Asked
            key={`${one.place} ${one.holder}`}
            name={one.place.replaceAll('_', ' ')}
            says={`${one.pieces} pc`}
            rest={one.holder}
          />
        ))}
        {content.batches.map((batch) => (
          <BatchEvidence
            key={`${batch.id} ${batch.lineNo}`}
            batch={batch}
            moment={moment}
            charts={<DossierCharts charts={batch.charts} pictures={pictures} width={contentWidth(sheet)} />}
          />
        ))}
        <Movements content={content} moment={moment} />
        <Originals content={content} />
      </Paper>
    </Document>
  );
}

type Moment = (at: string) => string;

interface BatchEvidenceProps {
  batch: DossierBatch;
  moment: Moment;
  charts: ReactNode;
}

function BatchEvidence({ batch, moment, charts }: BatchEvidenceProps) {
  return (
    <View style={{ marginTop: 8 }}>
      <Heading
        title={`${PROCESS_WORDS[batch.process as Process]}: batch ${batch.number}, order ${batch.orderNumber}, line ${batch.lineNo}`}
        note={counted(batch.pieces, 'piece')}
      />
      <Asked
        name="Processor"
        says={batch.processor}
        rest={[
          batch.processorAddress.join(', '),
          batch.approval ? `approval ${batch.approval}` : 'no approval on record for that day',
        ]
          .filter(Boolean)
          .join('; ')}
      />
      <Asked
        name="Specification"
        says={batch.specification}
        rest={[batch.classType, conditions(batch)].filter(Boolean).join('; ')}
      />
      {batch.dispatchedAt && (
        <Asked name="Dispatched" says={moment(batch.dispatchedAt)} rest={batch.dispatchedBy ?? ''} />
      )}
      {batch.overrides.map((one) => (
        <Asked
          key={one.check}
          name="Blocker overridden"
          says={one.check.replaceAll('_', ' ')}
          rest={`${one.reason} ${one.by}`}
        />
      ))}
      {batch.receipts.map((one) => (
        <Asked
          key={one.at}
          name="Counted in"
          says={receiptWords(one)}
          rest={`${moment(one.at)}, ${one.by}`}
        />
      ))}
      {batch.requirements.map((one, at) => (
        <Asked
          key={at}
          name={one.characteristic}
          says={one.limit || 'as ordered'}
          rest={one.decisions
            .map(
              (d) =>
                `certificate ${d.certificate}: ${d.stated || 'nothing stated'}, ${d.verdict.replaceAll('_', ' ')}${d.overrideReason ? `, overridden: ${d.overrideReason}` : ''} (${d.by})`,
            )
            .join('; ')}
        />
      ))}
      <DossierCorrections corrections={batch.corrections} moment={moment} />
      {charts}
      {batch.nonconformances.map((one) => (
        <Asked
          key={one.number}
          name={one.number}
          says={`${counted(one.pieces, 'piece')}: ${one.what}`}
          rest={
            one.dispositions
              .map(
                (d) =>
                  `${d.disposition.replaceAll('_', ' ')} ${d.pieces} pc: ${d.reason}${d.authority ? `, authority ${d.authority}` : ''} (${d.by}, ${moment(d.at)})`,
              )
              .join('; ') || 'not decided yet'
          }
        />
      ))}
      {batch.signatures.map((one) => (
        <View key={one.seal} wrap={false} style={{ borderBottom: `0.75 solid ${RULE}`, paddingVertical: 3 }}>
          <Text style={type.strong}>
            Signed for {one.pieces} of certificate {one.certificate}: {one.signer}, {moment(one.at)}
          </Text>
          <Text style={type.quiet}>{one.sentence}</Text>
          <Text style={{ ...type.figure, fontSize: 6.6 }}>seal {one.seal}</Text>
          <Text style={{ ...type.figure, fontSize: 6.6 }}>file {one.fileSha256}</Text>
        </View>
      ))}
      {batch.releases.map((one) => (
        <Asked
          key={one.at}
          name="Released"
          says={`${one.pieces} pc to ${one.to}`}
          rest={`${moment(one.at)}, ${one.by}`}
        />
      ))}
    </View>
  );
}

const conditions = (batch: DossierBatch): string =>
  [batch.conditionBefore, batch.targetCondition].filter(Boolean).join(' to ');

function receiptWords(one: DossierBatch['receipts'][number]): string {
  const parts = [
    `${one.good} good`,
    one.damaged > 0 && `${one.damaged} damaged`,
    one.short > 0 && `${one.short} short`,
    one.over > 0 && `${one.over} over`,
  ];
  return parts.filter(Boolean).join(', ');
}

function Movements({ content, moment }: { content: DossierContent; moment: Moment }) {
  return (
    <View style={{ marginTop: 8 }}>
      <Heading title="Every movement" note={counted(content.movements.length, 'entry', 'entries')} />
      {content.movements.map((one, at) => (
        <Asked
          key={at}
          name={moment(one.at)}
          width={96}
          says={`${one.pieces} pc ${one.reason.replaceAll('_', ' ')}`}
          rest={`${one.from ? `from ${one.from.replaceAll('_', ' ')} ` : ''}to ${one.to.replaceAll('_', ' ')}; ${one.by}`}
        />
      ))}
    </View>
  );
}

function Originals({ content }: { content: DossierContent }) {
  const { auditHead } = content;
  return (
    <View style={{ marginTop: 8 }}>
      <Heading title="Originals, kept as received" note={counted(content.files.length, 'file')} />
      {content.files.map((file) => (
        <View key={file.id} wrap={false} style={{ borderBottom: `0.75 solid ${RULE}`, paddingVertical: 2.4 }}>
          <Text style={type.text}>
            {file.name}, {file.purpose.replaceAll('_', ' ')}
            {file.batchNumber ? ` of ${file.batchNumber}` : ''}, {file.size.toLocaleString('en-US')} bytes
          </Text>
          <Text style={{ ...type.figure, fontSize: 6.6 }}>{file.sha256}</Text>
        </View>
      ))}
      {auditHead && (
        <Text style={{ ...type.caption, marginTop: 6 }}>
          The audit trail of the shop stood at entry {auditHead.seq}, hash {auditHead.hash}, when this was
          read. The drawing, the order and the governing specification at its invoked revision come first;
          this dossier records, it releases nothing by itself.
        </Text>
      )}
    </View>
  );
}
