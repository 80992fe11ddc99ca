'use client';
import { NumberInput, SelectField, TextField } from '@/components/ui/field';
import { ALLOYS, type Alloy } from '@/lib/trade/alloys/alloy';
import { densityOf } from '@/lib/trade/alloys/density';
import { massAndArea } from '@/lib/trade/mass/mass-and-area';
import { DENSITIES } from '@/lib/trade/tables/densities';
import { inchesFromMm } from '@/lib/trade/units/length';
import { poundsFromKg } from '@/lib/trade/units/mass';

import { Answer, NoAnswer } from './answer';
import type { BenchUnits } from './bench-units';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { FORMS, MEASURES, shapeOf, type MassForm } from './mass-shapes';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  form: { kind: 'word', first: 'sheet' },
  alloy: { kind: 'word', first: '2024' },
  condition: { kind: 'word', first: '' },
  length: { kind: 'length', first: '24' },
  second: { kind: 'length', first: '12' },
  third: { kind: 'length', first: '0.063' },
  pieces: { kind: 'number', first: '10' },
} as const;
const KINDS = Object.keys(FORMS) as MassForm[];
const NAMES = Object.keys(ALLOYS) as Alloy[];
const REFUSALS = {
  alloy_not_in_table: 'The tables have no density of this metal.',
  condition_decides: 'Its density goes by condition: enter it, such as H900 or H1025.',
  size_not_positive: 'Every size must be more than 0.',
  density_not_positive: 'The density must be more than 0.',
  wall_closes_bore: 'Twice the wall is the outside diameter or more. Enter a thinner wall.',
} as const;

/** Mass and wetted surface of plain shapes, for shipping, pricing and baths. */
export function MassCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const [second, third] = MEASURES[choiceOf(KINDS, bench.typed.form, 'sheet')];
  const number = (name: 'length' | 'second' | 'third' | 'pieces') => ({
    ...bench.field(name),
    error: bench.read(name) === null ? 'Enter a number.' : undefined,
  });
  return (
    <CalculatorFrame
      title={SUBJECTS.mass}
      note="plain shapes; holes and cut-outs are not taken off"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Metal and shape">
        <SelectField label="Shape" options={optionsOf(FORMS)} {...bench.choice('form')} />
        <SelectField label="Metal" options={optionsSaying(NAMES)} {...bench.choice('alloy')} />
        <TextField label="Condition" hint="where it decides" {...bench.choice('condition')} />
        <NumberInput label="Length" {...number('length')} />
        <NumberInput label={second} {...number('second')} />
        {third !== null && <NumberInput label={third} {...number('third')} />}
        <NumberInput label="Pieces" {...number('pieces')} />
      </BenchFieldRow>
      <Mass bench={bench} />
      <SourcedTable
        table={DENSITIES}
        heads={['Metal', 'Condition', 'lb/in³']}
        cells={({ alloys, conditions, lbPerIn3 }) => [
          alloys.join(', '),
          conditions?.join(', ') ?? '',
          lbPerIn3,
        ]}
      />
    </CalculatorFrame>
  );
}

function Mass({ bench: { typed, read, units } }: { bench: Bench<keyof typeof FIELDS> }) {
  const pieces = read('pieces');
  const shape = shapeOf(choiceOf(KINDS, typed.form, 'sheet'), [
    read('length'),
    read('second'),
    read('third'),
  ]);
  if (!shape) return <NoAnswer says="Enter every size." />;
  if (pieces === null || !Number.isSafeInteger(pieces) || pieces < 1)
    return <NoAnswer says="Pieces are a whole number from 1." />;
  const condition = typed.condition.trim().toUpperCase();
  const density = densityOf(DENSITIES, {
    alloy: choiceOf(NAMES, typed.alloy, '2024'),
    ...(condition !== '' && { condition }),
  });
  if (!density.ok) return <NoAnswer says={REFUSALS[density.reason]} />;
  const found = massAndArea(shape, density.gPerCm3);
  if (!found.ok) return <NoAnswer says={REFUSALS[found.reason]} />;
  return (
    <>
      <Answer
        good={null}
        says={massWords(found.massKg * pieces, units)}
        rest={
          <>
            {pieces > 1 && `${massWords(found.massKg, units)} each; `}
            wetted surface <strong className="num">{areaWords(found.areaM2 * pieces, units)}</strong>, edges,
            ends and a bore included
          </>
        }
      />
      <SourceLine source={density.source} readFrom={density.readFrom} />
      <SourceLine source={found.source} />
      <p className="text-source text-quiet">
        A nominal density is for weighing and pricing; it does not prove which alloy a part is.
      </p>
    </>
  );
}

const IN_PER_FT = 12;
const MM_PER_M = 1000;

const massWords = (kg: number, units: BenchUnits): string =>
  units === 'metric' ? `${kg.toFixed(3)} kg` : `${poundsFromKg(kg).toFixed(3)} lb`;

const areaWords = (m2: number, units: BenchUnits): string =>
  units === 'metric'
    ? `${m2.toFixed(3)} m²`
    : `${(m2 * (inchesFromMm(MM_PER_M) / IN_PER_FT) ** 2).toFixed(2)} ft²`;
