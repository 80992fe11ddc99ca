'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import { INSPECTION_LEVELS } from '@/lib/trade/sampling/code-letter';
import { sampleDecision, sampleForLot, type LotSample } from '@/lib/trade/sampling/sample-for-lot';
import { AQLS, type SamplingCell } from '@/lib/trade/sampling/single-sampling-plan';
import { zeroAcceptanceInstead } from '@/lib/trade/sampling/zero-acceptance-sample';
import { CODE_LETTERS } from '@/lib/trade/tables/sampling-code-letters';
import { SINGLE_SAMPLING_NORMAL } from '@/lib/trade/tables/single-sampling-normal';
import { SINGLE_SAMPLING_REDUCED } from '@/lib/trade/tables/single-sampling-reduced';
import { SINGLE_SAMPLING_TIGHTENED } from '@/lib/trade/tables/single-sampling-tightened';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { SampleCurve } from './sample-curve';
import { DECISIONS, percentWords, sampleRefusal } from './sample-words';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  lot: { kind: 'number', first: '60' },
  level: { kind: 'word', first: 'II' },
  aql: { kind: 'word', first: '1' },
  inspection: { kind: 'word', first: 'normal' },
  found: { kind: 'number', first: '' },
} as const;
const PLANS = {
  normal: SINGLE_SAMPLING_NORMAL,
  tightened: SINGLE_SAMPLING_TIGHTENED,
  reduced: SINGLE_SAMPLING_REDUCED,
};
const INSPECTIONS = { normal: 'normal', tightened: 'tightened', reduced: 'reduced' };
type Inspection = keyof typeof PLANS;
const KINDS = Object.keys(PLANS) as Inspection[];

/** How many pieces of a lot to look at, and what such a sample lets through. */
export function SampleCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const plans = PLANS[choiceOf(KINDS, bench.typed.inspection, 'normal')];
  return (
    <CalculatorFrame
      title={SUBJECTS.samples}
      note="single sampling by attributes"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Lot">
        <NumberInput
          label="Pieces in the lot"
          error={bench.read('lot') === null ? 'Enter a number.' : undefined}
          {...bench.field('lot')}
        />
        <SelectField label="Level" options={optionsSaying(INSPECTION_LEVELS)} {...bench.choice('level')} />
        <SelectField
          label="AQL"
          options={AQLS.map((aql) => ({ value: String(aql), says: `${aql} %` }))}
          {...bench.choice('aql')}
        />
        <SelectField label="Inspection" options={optionsOf(INSPECTIONS)} {...bench.choice('inspection')} />
        <NumberInput label="Found bad" hint="to decide" {...bench.field('found')} />
      </BenchFieldRow>
      <Sample bench={bench} />
      <SourcedTable
        table={CODE_LETTERS}
        heads={['Lot', ...INSPECTION_LEVELS]}
        cells={({ lotFrom, lotTo, letters }) => [
          lotTo === null ? `${lotFrom} and over` : `${lotFrom} to ${lotTo}`,
          ...INSPECTION_LEVELS.map((level) => letters[level]),
        ]}
      />
      <SourcedTable
        table={plans}
        heads={['Letter', 'Sample', ...AQLS.map(String)]}
        cells={({ letter, sampleSize, cells }) => [
          letter,
          sampleSize,
          ...AQLS.map((aql) => cellWords(cells[aql])),
        ]}
      />
    </CalculatorFrame>
  );
}

const cellWords = (cell: SamplingCell | undefined): string => {
  if (cell === undefined) return '';
  if (cell === 'down') return '↓';
  return cell === 'up' ? '↑' : cell.join('/');
};

function Sample({ bench }: { bench: Bench<keyof typeof FIELDS> }) {
  const { typed, read } = bench;
  const lotSize = read('lot');
  if (lotSize === null) return <NoAnswer says="Enter how many pieces the lot has." />;
  const plan = sampleForLot(
    { letters: CODE_LETTERS, plans: PLANS[choiceOf(KINDS, typed.inspection, 'normal')] },
    { lotSize, level: choiceOf(INSPECTION_LEVELS, typed.level, 'II'), aqlPct: Number(typed.aql) },
  );
  if (!plan.ok) return <NoAnswer says={sampleRefusal(plan.reason)} />;
  return (
    <>
      <Answer
        good={null}
        says={plan.wholeLot ? `Look at all ${plan.inspect}` : `Look at ${plan.inspect} of ${lotSize}`}
        rest={
          <>
            letter {plan.letter}
            {plan.arrow && ', to which an arrow led'}; passes with <strong>{plan.accept}</strong> bad, fails
            with <strong>{plan.reject}</strong>
          </>
        }
      />
      <Decision found={read('found')} plan={plan} />
      <SourceLine source={plan.source} readFrom={plan.readFrom} />
      <h3 className="pt-5 pb-1.5">What this sample lets through</h3>
      <SampleCurve plan={{ sampleSize: plan.inspect, accept: plan.accept }} lotSize={lotSize} />
      <Zero plan={plan} lotSize={lotSize} />
    </>
  );
}

function Decision({ found, plan }: { found: number | null; plan: LotSample }) {
  if (found === null) return null;
  if (!Number.isSafeInteger(found) || found < 0 || found > plan.inspect)
    return <NoAnswer says={`Bad pieces are a whole number from 0 to ${plan.inspect}.`} />;
  const decision = sampleDecision(plan, found);
  return (
    <Answer good={decision !== 'rejected'} says={DECISIONS[decision]} rest={`${found} bad in the sample`} />
  );
}

function Zero({ plan, lotSize }: { plan: LotSample; lotSize: number }) {
  const zero = zeroAcceptanceInstead(plan, lotSize);
  return (
    <>
      <h3 className="pt-5">With no bad piece allowed</h3>
      {zero.ok ? (
        <>
          <Answer
            good={null}
            says={`Look at ${zero.sampleSize}, accept 0`}
            rest={`guards as well: a lot with ${zero.nonconforming} bad passes in ${percentWords(100 * zero.passes)} of cases`}
          />
          <SourceLine source={zero.source} />
        </>
      ) : (
        <NoAnswer says={sampleRefusal(zero.reason)} />
      )}
    </>
  );
}
