'use client';
import { CheckedRouteView } from '@/components/parts/checked-route';
import { Button } from '@/components/ui/button';
import { NumberInput, SelectField, TextField } from '@/components/ui/field';
import { routePartOf } from '@/lib/parts/route-part-of';
import { checkTypedSteps } from '@/lib/parts/typed-route';
import { PART_TABLES } from '@/lib/reference/published-tables';
import { ALLOYS, familyOf, type Alloy } from '@/lib/trade/alloys/alloy';
import { PRODUCT_FORMS } from '@/lib/trade/process';
import type { RoutePart } from '@/lib/trade/route/route';

import { Answer, NoAnswer } from './answer';
import { NO_STEP, readBenchRoute, writeBenchRoute, type BenchStep } from './bench-route';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { RouteSteps } from './route-steps';
import { RouteTables } from './route-tables';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIRST: readonly BenchStep[] = [
  { process: 'cadmium_plate', specification: 'QQ-P-416F', classType: 'Type II Class 2' },
  { process: 'magnetic_particle', specification: 'ASTM E1444', classType: '' },
];
const FIELDS = {
  alloy: { kind: 'word', first: '4340' },
  form: { kind: 'word', first: 'bar' },
  surface: { kind: 'word', first: 'bare' },
  end: { kind: 'word', first: 'HRC 40 to 42' },
  service: { kind: 'temperature', first: '' },
  inserts: { kind: 'word', first: '' },
  traps: { kind: 'word', first: '' },
  titanium: { kind: 'word', first: '' },
  ground: { kind: 'word', first: '' },
  route: { kind: 'word', first: writeBenchRoute(FIRST) },
} as const;
type RouteBench = Bench<keyof typeof FIELDS>;

const SURFACES = { bare: 'bare', clad: 'clad' };
const SAID = { yes: 'yes', no: 'no' };
/** Not what others are covered with. */
const METALS = (Object.keys(ALLOYS) as Alloy[]).filter((alloy) => familyOf(alloy) !== 'plating');

/** Outside steps in an order, what the rules of the trade have against it, and the order they propose. */
export function RouteCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.route}
      note="what comes before what, for one part"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Part">
        <SelectField label="Material" options={optionsSaying(METALS)} {...bench.choice('alloy')} />
        <SelectField label="Form" options={optionsSaying(PRODUCT_FORMS)} {...bench.choice('form')} />
        <SelectField label="Surface" options={optionsOf(SURFACES)} {...bench.choice('surface')} />
        <TextField
          label="It ends in"
          hint="T42, H1025, HRC 40 to 42, 160 to 180 ksi"
          className="wide"
          autoComplete="off"
          mono
          {...bench.choice('end')}
        />
      </BenchFieldRow>
      <BenchFieldRow label="Its shape and its use">
        <NumberInput
          label="Hottest in service"
          hint="if known"
          error={isUnread(bench) ? 'Enter a number.' : undefined}
          {...bench.field('service')}
        />
        {(['inserts', 'traps', 'titanium', 'ground'] as const).map((name) => (
          <SelectField
            key={name}
            label={ASKED[name]}
            empty="not said"
            options={optionsOf(SAID)}
            {...bench.choice(name)}
          />
        ))}
      </BenchFieldRow>
      <Route bench={bench} />
      <RouteTables />
    </CalculatorFrame>
  );
}

const ASKED = {
  inserts: 'Steel inserts',
  traps: 'Traps liquid',
  titanium: 'Next to titanium',
  ground: 'Ground when hard',
} as const;

const isUnread = ({ typed, read }: RouteBench): boolean =>
  typed.service.trim() !== '' && read('service') === null;

function partOf({ typed, read }: RouteBench): RoutePart {
  const alloy = choiceOf(METALS, typed.alloy, '4340');
  const material = {
    alloy,
    family: familyOf(alloy),
    form: choiceOf(PRODUCT_FORMS, typed.form, 'bar'),
    clad: typed.surface === 'clad',
    saidTemper: undefined,
  };
  const said = (name: keyof typeof ASKED) => (typed[name] in SAID ? typed[name] === 'yes' : undefined);
  return {
    ...routePartOf(PART_TABLES.phConditions, material, typed.end),
    serviceCMax: read('service') ?? undefined,
    hasInserts: said('inserts'),
    trapsLiquid: said('traps'),
    touchesTitanium: said('titanium'),
    isGroundHard: said('ground'),
  };
}

function Route({ bench }: { bench: RouteBench }) {
  const route = readBenchRoute(bench.typed.route);
  const set = (steps: readonly BenchStep[]) => bench.set({ route: writeBenchRoute(steps) });
  const checked = checkTypedSteps(PART_TABLES.route, partOf(bench), route);
  const blockers = checked.findings.filter(({ severity }) => severity === 'blocker').length;
  return (
    <>
      <RouteSteps route={route} onChange={set} />
      <Button size="small" className="mt-2" onClick={() => set([...route, NO_STEP])}>
        Add a step
      </Button>
      {route.every(({ process }) => process === '') ? (
        <NoAnswer says="Choose a process for a step." />
      ) : (
        <Answer
          good={blockers === 0}
          says={
            blockers === 0
              ? 'No rule here stops this route'
              : `${blockers} ${blockers === 1 ? 'rule stops' : 'rules stop'} this route`
          }
          rest={checked.findings.length === 0 ? 'the drawing and the specifications may still' : undefined}
        />
      )}
      <CheckedRouteView
        checked={checked}
        route={route}
        newStep={(process): BenchStep => ({ ...NO_STEP, process })}
        onTake={set}
      />
    </>
  );
}
