'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import { msPerMFromIacs } from '@/lib/trade/acceptance/conductivity';
import { judgeCondition } from '@/lib/trade/acceptance/judge-condition';
import { HARDNESS_SCALES } from '@/lib/trade/hardness/hardness-table';
import { ACCEPTANCE } from '@/lib/trade/tables/acceptance';
import { MEASURING_RULES } from '@/lib/trade/tables/measuring-rules';

import { acceptanceRefusal, bandWords, JUDGED, measuringWords, PAIRS } from './acceptance-words';
import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { PairPlot } from './pair-plot';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  alloy: { kind: 'word', first: '7075' },
  condition: { kind: 'word', first: 'T6' },
  surface: { kind: 'word', first: 'bare' },
  scale: { kind: 'word', first: 'HRB' },
  hardness: { kind: 'number', first: '88' },
  iacs: { kind: 'number', first: '33' },
} as const;
const SURFACES = { bare: 'bare', clad: 'clad' };
const JUDGED_ALLOYS = [...new Set(ACCEPTANCE.rows.map(({ alloy }) => alloy))];
const SCALES = HARDNESS_SCALES.filter((scale) =>
  ACCEPTANCE.rows.some(({ hardness }) => hardness?.some((band) => band.scale === scale)),
);

/** Whether hardness and conductivity together show the condition of bare aluminium. */
export function AcceptanceCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const conditions = [
    ...new Set(
      ACCEPTANCE.rows.filter(({ alloy }) => alloy === bench.typed.alloy).flatMap((row) => row.conditions),
    ),
  ];
  return (
    <CalculatorFrame
      title={SUBJECTS.acceptance}
      note="bare aluminium; both readings decide together"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Part and readings">
        <SelectField label="Alloy" options={optionsSaying(JUDGED_ALLOYS)} {...bench.choice('alloy')} />
        <SelectField
          label="Condition"
          options={optionsSaying([...new Set([bench.typed.condition, ...conditions])].sort())}
          {...bench.choice('condition')}
        />
        <SelectField label="Surface" options={optionsOf(SURFACES)} {...bench.choice('surface')} />
        <NumberInput label="Hardness" {...bench.field('hardness')} />
        <SelectField label="Scale" options={optionsSaying(SCALES)} {...bench.choice('scale')} />
        <NumberInput label="Conductivity" {...bench.field('iacs')} unit="% IACS" />
      </BenchFieldRow>
      <Pair bench={bench} />
      <h3 className="pt-5">When measuring</h3>
      <ul className="text-second">
        {MEASURING_RULES.rows.map((row) => (
          <li key={row.rule} className="border-t border-rule py-1.5">
            {measuringWords(row)}
            <SourceLine source={row.source} />
          </li>
        ))}
      </ul>
      <SourcedTable
        table={ACCEPTANCE}
        heads={['Alloy', 'Condition', '% IACS', 'Hardness', 'What it is']}
        cells={({ alloy, conditions: of, iacs, hardness, kind }) => [
          alloy,
          of.join(', '),
          iacs?.join(' to ') ?? '',
          hardness?.map(bandWords).join('; ') ?? '',
          kind === 'acceptance' ? 'acceptance' : 'worked example, no limit for parts',
        ]}
      />
    </CalculatorFrame>
  );
}

function Pair({ bench: { typed, read } }: { bench: Bench<keyof typeof FIELDS> }) {
  const scale = choiceOf(SCALES, typed.scale, 'HRB');
  const [value, percentIacs] = [read('hardness'), read('iacs')];
  const found = judgeCondition(
    ACCEPTANCE,
    { alloy: typed.alloy, condition: typed.condition, isClad: typed.surface === 'clad' },
    {
      ...(value !== null && { hardness: { scale, value } }),
      ...(percentIacs !== null && { percentIacs }),
    },
  );
  if (!found.ok) return <NoAnswer says={acceptanceRefusal(found.reason)} />;
  const { band } = found;
  const { good, says } = PAIRS[found.pair];
  return (
    <>
      <Answer
        good={good}
        says={`${says} ${typed.alloy}-${typed.condition}`}
        rest={`hardness ${JUDGED[found.hardness]}, conductivity ${JUDGED[found.conductivity]}`}
      />
      <p>
        Asked: {band.hardness.map(bandWords).join(' or ') || 'no hardness'};{' '}
        {band.iacs
          ? `${band.iacs.join(' to ')} % IACS (${band.iacs.map((end) => msPerMFromIacs(end).toFixed(1)).join(' to ')} MS/m)`
          : 'no conductivity'}
        {band.kind === 'worked_example' && '; from a worked example, no limit for parts'}.
      </p>
      {found.sourcesDisagree && (
        <NoAnswer says="Another published band judges these readings otherwise. People decide, with the specification in hand." />
      )}
      <PairPlot
        alloy={typed.alloy}
        condition={typed.condition}
        scale={scale}
        reading={value !== null && percentIacs !== null ? { hardness: value, iacs: percentIacs } : null}
      />
      {[band, ...found.alsoPublished].map(({ source, iacs, hardness }) => (
        <SourceLine
          key={`${source.document} ${iacs?.join()} ${hardness.map(bandWords).join()}`}
          source={source}
        />
      ))}
      <p className="text-source text-quiet">
        A pair that meets does not prove tensile properties; the papers of the heat treatment do.
      </p>
    </>
  );
}
