'use client';
import { SelectField } from '@/components/ui/field';
import { ALLOYS, type Alloy } from '@/lib/trade/alloys/alloy';
import { PRODUCT_FORMS } from '@/lib/trade/process';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { TEMPER_TRANSITIONS } from '@/lib/trade/tables/temper-transitions';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';
import { explainCondition } from '@/lib/trade/tempers/explain-condition';
import { reachableConditions, type ReachableCondition } from '@/lib/trade/tempers/reachable-conditions';
import { TEMPERS } from '@/lib/trade/tempers/temper';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { ConditionDrawing } from './condition-drawing';
import { SourceLine } from './source-line';
import { SUBJECTS } from './subjects';
import { TemperTables } from './temper-tables';
import { cautionWords, operationWords, temperReply } from './temper-words';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  alloy: { kind: 'word', first: '2024' },
  form: { kind: 'word', first: 'sheet' },
  surface: { kind: 'word', first: 'bare' },
  from: { kind: 'word', first: 'O' },
  to: { kind: 'word', first: 'T3' },
} as const;
const SURFACES = { bare: 'bare', clad: 'clad' };
const RULES = {
  designations: TEMPER_DESIGNATIONS,
  transitions: TEMPER_TRANSITIONS,
  ageing: AGEING_CYCLES,
};
const KNOWN = new Set<string>(TEMPER_TRANSITIONS.rows.flatMap(({ alloys }) => alloys));
const TREATED = (Object.keys(ALLOYS) as Alloy[]).filter((alloy) => KNOWN.has(alloy));

/** Whether a heat treater can make one condition of another, how, and why not. */
export function TemperCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.temper}
      note="aluminium, made by a heat treater and not by the mill"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Metal and conditions">
        <SelectField label="Alloy" options={optionsSaying(TREATED)} {...bench.choice('alloy')} />
        <SelectField label="Form" options={optionsSaying(PRODUCT_FORMS)} {...bench.choice('form')} />
        <SelectField label="Surface" options={optionsOf(SURFACES)} {...bench.choice('surface')} />
        <SelectField label="It is now" options={optionsSaying(TEMPERS)} {...bench.choice('from')} />
        <SelectField label="Wanted" options={optionsSaying(TEMPERS)} {...bench.choice('to')} />
      </BenchFieldRow>
      <Tempers bench={bench} />
      <TemperTables />
    </CalculatorFrame>
  );
}

function Tempers({ bench: { typed } }: { bench: Bench<keyof typeof FIELDS> }) {
  const material = {
    alloy: choiceOf(TREATED, typed.alloy, '2024'),
    form: choiceOf(PRODUCT_FORMS, typed.form, 'sheet'),
    clad: typed.surface === 'clad',
  };
  const from = choiceOf(TEMPERS, typed.from, 'O');
  const to = choiceOf(TEMPERS, typed.to, 'T3');
  const found = explainCondition(RULES, { material, from, to });
  const reply = temperReply(found, { from, to });
  const path = 'refusal' in reply ? [] : reply.path;
  const reachable = reachableConditions(RULES, material, from);
  return (
    <>
      {'refusal' in reply ? (
        <NoAnswer says={reply.refusal} />
      ) : (
        <Answer good={reply.good} says={reply.says} rest={reply.rest} />
      )}
      {path.length > 0 && (
        <ol className="list-decimal pl-5">
          {path.map((step) => (
            <li key={step.to}>
              {operationWords(step)}: <strong>{step.from}</strong> becomes <strong>{step.to}</strong>
            </li>
          ))}
        </ol>
      )}
      <ul className="pt-1 text-second text-dispatched-ink">
        {cautionWords(path).map((says) => (
          <li key={says}>{says}</li>
        ))}
      </ul>
      {found.source && <SourceLine source={found.source} readFrom={found.ok ? found.readFrom : undefined} />}
      <h3 className="pt-5 pb-1.5">
        What can be made of {material.alloy}-{from}
      </h3>
      {reachable.length === 0 ? (
        <p className="text-second">The tables know no way out of {from} for this metal.</p>
      ) : (
        <>
          <ConditionDrawing from={from} reachable={reachable} path={path} />
          <Ways reachable={reachable} />
        </>
      )}
    </>
  );
}

function Ways({ reachable }: { reachable: readonly ReachableCondition[] }) {
  return (
    <ul className="pt-2 text-second">
      {reachable.map(({ condition, path }) => (
        <li key={condition}>
          <strong>{condition}</strong>: {path.map(operationWords).join(', then ')}
        </li>
      ))}
    </ul>
  );
}
