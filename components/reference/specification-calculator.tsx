'use client';
import { DateField, SelectField, TextField } from '@/components/ui/field';
import { Edge } from '@/components/ui/edge';
import { CALL_OUT_WORDS } from '@/lib/reference/call-out-words';
import { callOutFindings } from '@/lib/trade/lineage/call-out-findings';
import type { Coverage } from '@/lib/trade/lineage/lineage-event';
import { recogniseSpecification } from '@/lib/trade/lineage/recognise-specification';
import { BRITISH_MATERIALS } from '@/lib/trade/tables/british-materials';
import { CALL_OUT_NOTES } from '@/lib/trade/tables/call-out-notes';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { optionsOf } from './choice-of';
import { BritishMaterial } from './british-material';
import { OrderChecklist } from './order-checklist';
import { SourceLine } from './source-line';
import { Lineage } from './specification-lineage';
import { SpecificationTables } from './specification-tables';
import { COVERAGE_WORDS, issueReply, standingReply, type Asked } from './specification-words';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  specification: { kind: 'word', first: 'QQ-P-416F Type II Class 2' },
  on: { kind: 'word', first: '' },
  covers: { kind: 'word', first: 'parts' },
  so: { kind: 'word', first: '' },
  stated: { kind: 'word', first: '' },
} as const;

const COVERAGES = Object.keys(COVERAGE_WORDS) as Coverage[];
/** Without a day, all that is recorded counts. */
const LAST_DAY = '9999-12-31';

/** What became of a specification, and what an order to it has to state. */
export function SpecificationCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.specification}
      note="what became of it, and what the order has to state"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Call-out">
        <TextField
          label="Specification, as the drawing calls it"
          className="wider max-sm:col-span-2"
          autoComplete="off"
          mono
          {...bench.choice('specification')}
        />
        <SelectField
          label="It is for"
          empty="anything"
          options={optionsOf(COVERAGE_WORDS)}
          {...bench.choice('covers')}
        />
        <DateField label="Order of" hint="empty: as known today" className="wide" {...bench.choice('on')} />
      </BenchFieldRow>
      <Called bench={bench} />
      <SpecificationTables />
    </CalculatorFrame>
  );
}

function Called({ bench }: { bench: Bench<keyof typeof FIELDS> }) {
  const { typed } = bench;
  const read = recogniseSpecification(typed.specification);
  if (!read)
    return (
      <NoAnswer says="This is not read as a specification. Write it like AMS2770R, MIL-H-6088G or ASTM B633-19." />
    );
  const asked: Asked = {
    number: read.number,
    revision: read.revision,
    on: /^\d{4}-\d{2}-\d{2}$/.test(typed.on) ? typed.on : LAST_DAY,
    covers: COVERAGES.find((one) => one === typed.covers) ?? null,
  };
  const isBritish = BRITISH_MATERIALS.rows.some(({ number }) => number === read.number);
  return (
    <>
      {isBritish ? <BritishMaterial number={read.number} /> : <Standing asked={asked} />}
      <CallOut asked={asked} rest={read.rest} />
      <Lineage asked={asked} onLook={(specification) => bench.set({ specification })} />
      <OrderChecklist called={read} bench={bench} />
    </>
  );
}

function Standing({ asked }: { asked: Asked }) {
  const reply = standingReply(SPECIFICATION_LINEAGE, asked);
  const issue = issueReply(SPECIFICATION_LINEAGE, asked);
  return (
    <>
      {reply ? (
        <Answer {...reply} />
      ) : (
        <NoAnswer
          says={`Nothing is recorded here of how ${asked.number} stands. It may well be current: ask its publisher.`}
        />
      )}
      {issue && <p>{issue}</p>}
    </>
  );
}

/** What the call-out silently means. */
function CallOut({ asked: { number, revision, covers }, rest }: { asked: Asked; rest: string }) {
  const notes = callOutFindings(CALL_OUT_NOTES, {
    number,
    revision,
    typeStated: /\btype\b/i.test(rest),
    forParts: covers === null || covers === 'parts',
  });
  return notes.map(({ note, asksEngineering, source, readFrom }) => (
    <Edge key={note} level={asksEngineering ? 'warn' : 'note'}>
      {CALL_OUT_WORDS[note]}
      {asksEngineering && ' Ask before the work starts.'}
      <SourceLine source={source} readFrom={readFrom} />
    </Edge>
  ));
}
