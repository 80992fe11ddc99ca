'use client';
import { DateField, NumberInput, SelectField } from '@/components/ui/field';
import { FURNACE_CLASSES, type FurnaceClass } from '@/lib/trade/pyrometry/furnace-class';
import { INSTRUMENTATION_TYPES } from '@/lib/trade/pyrometry/instrumentation';
import { isFurnaceGoodFor } from '@/lib/trade/pyrometry/is-furnace-good-for';
import { FURNACE_UNIFORMITY } from '@/lib/trade/tables/furnace-classes';
import { PYROMETRY_INTERVALS } from '@/lib/trade/tables/pyrometry-intervals';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { FAULTS, pyrometryRefusal } from './pyrometry-words';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  class: { kind: 'word', first: '2' },
  type: { kind: 'word', first: 'B' },
  extended: { kind: 'word', first: 'no' },
  asked: { kind: 'word', first: '2' },
  from: { kind: 'temperature', first: '920' },
  to: { kind: 'temperature', first: '930' },
  on: { kind: 'word', first: '2026-01-20' },
  surveyed: { kind: 'word', first: '2026-01-05' },
  surveyFrom: { kind: 'temperature', first: '850' },
  surveyTo: { kind: 'temperature', first: '1000' },
  tested: { kind: 'word', first: '2026-01-12' },
  passed: { kind: 'word', first: 'both' },
} as const;
const TABLES = { classes: FURNACE_UNIFORMITY, intervals: PYROMETRY_INTERVALS };
const EXTENDED = { no: 'usual', yes: 'extended' };
const PASSED = { both: 'both', survey: 'survey only', test: 'accuracy test only', none: 'neither' };
const CLASSES = FURNACE_CLASSES.map((one) => ({ value: String(one), says: `class ${one}` }));
type PyrometryBench = Bench<keyof typeof FIELDS>;

/** Whether a furnace is good for a cycle on a day. */
export function PyrometryCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const degrees = (name: 'from' | 'to' | 'surveyFrom' | 'surveyTo') => ({
    ...bench.field(name),
    error: bench.read(name) === null ? 'Enter a number.' : undefined,
  });
  return (
    <CalculatorFrame
      title={SUBJECTS.pyrometry}
      note="is this furnace good for this cycle on this day"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Furnace">
        <SelectField label="Furnace class" options={CLASSES} {...bench.choice('class')} />
        <SelectField
          label="Instruments"
          options={optionsSaying(INSTRUMENTATION_TYPES)}
          {...bench.choice('type')}
        />
        <SelectField label="Intervals" options={optionsOf(EXTENDED)} {...bench.choice('extended')} />
      </BenchFieldRow>
      <BenchFieldRow label="Cycle">
        <SelectField label="Asks for" options={CLASSES} {...bench.choice('asked')} />
        <NumberInput label="Cycle, lowest" {...degrees('from')} />
        <NumberInput label="Cycle, highest" {...degrees('to')} />
        <DateField label="Day of the cycle" className="wide" {...bench.choice('on')} />
      </BenchFieldRow>
      <BenchFieldRow label="Last tests">
        <DateField label="Last survey" className="wide" {...bench.choice('surveyed')} />
        <NumberInput label="Survey, lowest" {...degrees('surveyFrom')} />
        <NumberInput label="Survey, highest" {...degrees('surveyTo')} />
        <DateField label="Last accuracy test" className="wide" {...bench.choice('tested')} />
        <SelectField label="Passed" options={optionsOf(PASSED)} {...bench.choice('passed')} />
      </BenchFieldRow>
      <Furnace bench={bench} />
      <SourcedTable
        table={PYROMETRY_INTERVALS}
        heads={['Classes', 'Types', 'Accuracy test', 'extended', 'Survey', 'extended']}
        cells={(row) => [
          row.classes.join(', '),
          row.types.join(', '),
          row.accuracyTest,
          row.accuracyTestExtended,
          row.survey,
          row.surveyExtended,
        ]}
      />
      <SourcedTable
        table={FURNACE_UNIFORMITY}
        heads={['Class', '± °F', '± °C']}
        cells={(row) => [row.class, row.toleranceF, row.toleranceC]}
      />
    </CalculatorFrame>
  );
}

const classOf = (typed: string): FurnaceClass => FURNACE_CLASSES.find((one) => String(one) === typed) ?? 2;

function Furnace({ bench: { typed, read } }: { bench: PyrometryBench }) {
  const [fromC, toC] = [read('from'), read('to')];
  const [surveyFromC, surveyToC] = [read('surveyFrom'), read('surveyTo')];
  if (fromC === null || toC === null || surveyFromC === null || surveyToC === null)
    return <NoAnswer says="Enter the temperatures of the cycle and of the survey." />;
  const passed = (one: 'survey' | 'test') => typed.passed === 'both' || typed.passed === one;
  const found = isFurnaceGoodFor(TABLES, {
    furnace: {
      class: classOf(typed.class),
      type: choiceOf(INSTRUMENTATION_TYPES, typed.type, 'B'),
      extended: typed.extended === 'yes',
    },
    cycle: { fromC, toC, class: classOf(typed.asked) },
    on: typed.on,
    tests: [
      { kind: 'survey', on: typed.surveyed, passed: passed('survey'), fromC: surveyFromC, toC: surveyToC },
      { kind: 'accuracy_test', on: typed.tested, passed: passed('test'), fromC, toC },
    ],
  });
  if (!found.ok) return <NoAnswer says={pyrometryRefusal(found.reason)} />;
  return (
    <>
      <Answer
        good={found.good}
        says={found.good ? 'Good for this cycle' : 'Not good for this cycle'}
        rest={found.goodUntil === null ? '' : `until ${found.goodUntil}, when the next test is due`}
      />
      <ul>
        {found.findings.map(({ fault, dueOn }) => (
          <li key={fault}>
            {FAULTS[fault]} {dueOn !== undefined && `It was due on ${dueOn}.`}
          </li>
        ))}
      </ul>
      <SourceLine source={found.source} readFrom={found.readFrom} />
    </>
  );
}
