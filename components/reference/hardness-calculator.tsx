'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import { Caution } from '@/components/ui/edge';
import { convertHardness } from '@/lib/trade/hardness/convert-hardness';
import { HARDNESS_SCALES, type HardnessScale, type HardnessTable } from '@/lib/trade/hardness/hardness-table';
import { tensileFromHardness } from '@/lib/trade/hardness/tensile-from-hardness';
import { writeConverted } from '@/lib/trade/hardness/write-converted';
import { HARDNESS_ALUMINIUM } from '@/lib/trade/tables/hardness-aluminium';
import { HARDNESS_STEEL_BRINELL } from '@/lib/trade/tables/hardness-steel-brinell';
import { HARDNESS_STEEL_HRB } from '@/lib/trade/tables/hardness-steel-hrb';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import { HARDNESS_STEEL_OTHER_LIST } from '@/lib/trade/tables/hardness-steel-other-list';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf } from './choice-of';
import { HardnessCurve } from './hardness-curve';
import { MATERIALS, SCALES, tellingRefusal } from './hardness-words';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  material: { kind: 'word', first: 'non_austenitic_steel' },
  value: { kind: 'number', first: '40' },
  from: { kind: 'word', first: 'HRC' },
  to: { kind: 'word', first: 'HBW' },
} as const;
const TABLES: readonly HardnessTable[] = [
  HARDNESS_STEEL_HRC,
  HARDNESS_STEEL_HRB,
  HARDNESS_STEEL_BRINELL,
  HARDNESS_STEEL_OTHER_LIST,
  HARDNESS_ALUMINIUM,
];
const KINDS = Object.keys(MATERIALS) as (keyof typeof MATERIALS)[];

/** A hardness in another scale, by each published list, drawn along its curve. */
export function HardnessCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const tables = TABLES.filter(({ material }) => material === bench.typed.material);
  return (
    <CalculatorFrame
      title={SUBJECTS.hardness}
      note="approximate, always"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Hardness">
        <SelectField
          label="Metal"
          className="wide"
          options={optionsOf(MATERIALS)}
          {...bench.choice('material')}
        />
        <NumberInput
          label="Hardness"
          error={bench.read('value') === null ? 'Enter a number.' : undefined}
          {...bench.field('value')}
        />
        <SelectField label="Measured in" options={optionsOf(SCALES)} {...bench.choice('from')} />
        <SelectField label="Wanted in" options={optionsOf(SCALES)} {...bench.choice('to')} />
      </BenchFieldRow>
      <Hardness bench={bench} tables={tables} />
      <Caution>
        A converted hardness is approximate. It never proves a limit that the drawing gives in another scale:
        measure in the scale that the drawing names.
      </Caution>
      {tables.map((table) => (
        <SourcedTable
          key={table.id}
          table={table}
          heads={[...scalesOf(table), 'ksi']}
          cells={(row) => [...scalesOf(table).map((scale) => row[scale] ?? ''), row.tensileKsi ?? '']}
        />
      ))}
    </CalculatorFrame>
  );
}

const scalesOf = ({ rows }: HardnessTable): HardnessScale[] =>
  HARDNESS_SCALES.filter((scale) => rows.some((row) => row[scale] !== undefined));

interface HardnessProps {
  bench: Bench<keyof typeof FIELDS>;
  tables: readonly HardnessTable[];
}

function Hardness({ bench: { typed, read, says }, tables }: HardnessProps) {
  const value = read('value');
  const material = choiceOf(KINDS, typed.material, 'other');
  const from = choiceOf(HARDNESS_SCALES, typed.from, 'HRC');
  const to = choiceOf(HARDNESS_SCALES, typed.to, 'HBW');
  if (value === null) return <NoAnswer says="Enter a hardness." />;
  const asked = (tables.length > 0 ? tables : TABLES).map((table) => ({
    table,
    found: convertHardness(table, { material, from, value, to }),
  }));
  const reasons = asked.flatMap(({ found }) => (found.ok ? [] : [found.reason]));
  const answers = asked.flatMap(({ table, found }) => (found.ok ? [{ table, found }] : []));
  const [first] = answers;
  return (
    <>
      {answers.map(({ table, found }) => (
        <div key={table.id}>
          <Answer
            good={null}
            says={`about ${writeConverted({ value, scale: from }, { value: found.value, scale: to })}`}
            rest={
              <>
                {found.isBetweenRows ? 'on the line between two printed rows' : 'as printed'}
                {found.isInBrackets && '; in brackets in the table: outside what the scale’s standard allows'}
              </>
            }
          />
          <SourceLine source={found.source} readFrom={found.readFrom} />
        </div>
      ))}
      {!first && <NoAnswer says={tellingRefusal(reasons)} />}
      {first && (
        <HardnessCurve table={first.table} from={from} to={to} value={value} found={first.found.value} />
      )}
      <Tensile tables={tables} from={from} value={value} says={says} />
    </>
  );
}

interface TensileProps {
  tables: readonly HardnessTable[];
  from: HardnessScale;
  value: number;
  says: Bench<never>['says'];
}

function Tensile({ tables, from, value, says }: TensileProps) {
  const answers = tables.flatMap((table) => {
    const found = tensileFromHardness(table, { material: table.material, from, value });
    return found.ok ? [{ table, found }] : [];
  });
  if (answers.length === 0) return null;
  return (
    <>
      <h3 className="pt-5">Tensile strength that goes with it</h3>
      {answers.map(({ table, found }) => (
        <div key={table.id}>
          <Answer good={null} says={`about ${says(found.tensileMpa, 'stress')}`} />
          <SourceLine source={found.source} readFrom={found.readFrom} />
        </div>
      ))}
    </>
  );
}
