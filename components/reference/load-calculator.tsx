'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import type { Alloy } from '@/lib/trade/alloys/alloy';
import { furnaceClass, FURNACE_CLASSES } from '@/lib/trade/pyrometry/furnace-class';
import { FURNACE_UNIFORMITY } from '@/lib/trade/tables/furnace-classes';
import { QUENCH_MEDIA } from '@/lib/trade/tables/quench-media';
import { SOLUTION_TEMPERATURES } from '@/lib/trade/tables/solution-temperatures';

import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { NoAnswer } from './answer';
import { groupsOf, LINES, WANTED, type LineName, type TypedLine } from './load-lines';
import { LoadResult } from './load-result';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type BenchFields, type Given } from './use-bench';

type Part = 'alloy' | 'thick' | 'clad' | 'to';
type LineField = `${LineName}_${Part}`;
const fieldOf = (line: LineName, part: Part): LineField => `${line}_${part}`;
const FIRST: Partial<Record<LineName, readonly [alloy: string, thick: string, clad: string, to: string]>> = {
  a: ['2024', '0.032', 'clad', 'T42'],
  b: ['2024', '0.125', 'bare', 'T42'],
  c: ['7075', '0.063', 'bare', 'T62'],
  d: ['6061', '0.063', 'bare', 'T62'],
};
const lineFields = (line: LineName) => {
  const [alloy = '', thick = '', clad = 'bare', to = 'T42'] = FIRST[line] ?? [];
  return {
    [`${line}_alloy`]: { kind: 'word', first: alloy },
    [`${line}_thick`]: { kind: 'length', first: thick },
    [`${line}_clad`]: { kind: 'word', first: clad },
    [`${line}_to`]: { kind: 'word', first: to },
  } as const;
};
const FIELDS = {
  medium: { kind: 'word', first: 'air' },
  quench: { kind: 'word', first: 'cold water' },
  class: { kind: 'word', first: '2' },
  ...(Object.fromEntries(LINES.flatMap((line) => Object.entries(lineFields(line)))) as Record<
    LineField,
    BenchFields[string]
  >),
} as const;
const MEDIA = { air: 'air furnace', salt: 'salt bath' };
const SURFACES = { bare: 'bare', clad: 'clad' };
const TREATED: readonly Alloy[] = [
  ...new Set(SOLUTION_TEMPERATURES.rows.flatMap(({ alloys }) => (alloys === 'any' ? [] : alloys))),
];
type LoadBench = Bench<keyof typeof FIELDS>;

/** Which lines of sheet may lie in the furnace together, in how few loads, and why the others may not. */
export function LoadCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.load}
      note="aluminium sheet to be solution treated"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Furnace">
        <SelectField label="Heated in" options={optionsOf(MEDIA)} {...bench.choice('medium')} />
        <SelectField label="Quench" options={optionsSaying(QUENCH_MEDIA)} {...bench.choice('quench')} />
        <SelectField
          label="Furnace class"
          options={FURNACE_CLASSES.map((one) => ({ value: String(one), says: `class ${one}` }))}
          {...bench.choice('class')}
        />
      </BenchFieldRow>
      {LINES.map((line) => (
        <LineFields key={line} line={line} bench={bench} />
      ))}
      <Loads bench={bench} />
      <SourcedTable
        table={SOLUTION_TEMPERATURES}
        heads={['Alloys', '°F']}
        cells={({ alloys, rangeF }) => [
          alloys === 'any' ? 'any' : alloys.join(', '),
          rangeF?.join(' to ') ?? '',
        ]}
      />
    </CalculatorFrame>
  );
}

function LineFields({ line, bench }: { line: LineName; bench: LoadBench }) {
  const isUsed = bench.typed[fieldOf(line, 'alloy')] !== '';
  const isUnread = isUsed && bench.read(fieldOf(line, 'thick')) === null;
  return (
    <BenchFieldRow label={`Line ${line.toUpperCase()}`}>
      <SelectField
        label={`${line.toUpperCase()}: alloy`}
        empty="nothing"
        options={optionsSaying(TREATED)}
        {...bench.choice(fieldOf(line, 'alloy'))}
      />
      {isUsed && (
        <>
          <NumberInput
            label="Thickness"
            error={isUnread ? 'Enter a number.' : undefined}
            {...bench.field(fieldOf(line, 'thick'))}
          />
          <SelectField
            label="Surface"
            options={optionsOf(SURFACES)}
            {...bench.choice(fieldOf(line, 'clad'))}
          />
          <SelectField
            label="Wanted"
            options={optionsSaying(WANTED)}
            {...bench.choice(fieldOf(line, 'to'))}
          />
        </>
      )}
    </BenchFieldRow>
  );
}

function linesOf({ typed, read }: LoadBench): TypedLine[] {
  return LINES.flatMap((name) => {
    const alloy = TREATED.find((one) => one === typed[fieldOf(name, 'alloy')]);
    if (!alloy) return [];
    const clad = typed[fieldOf(name, 'clad')] === 'clad';
    const to = choiceOf(WANTED, typed[fieldOf(name, 'to')], 'T42');
    return [{ name, alloy, thicknessMm: read(fieldOf(name, 'thick')), clad, to }];
  });
}

function Loads({ bench }: { bench: LoadBench }) {
  const lines = linesOf(bench);
  const furnace = FURNACE_CLASSES.find((one) => String(one) === bench.typed.class) ?? 2;
  const uniformity = furnaceClass(FURNACE_UNIFORMITY, furnace);
  const groups = groupsOf(lines, {
    form: 'sheet',
    medium: choiceOf(['air', 'salt'] as const, bench.typed.medium, 'air'),
    quench: choiceOf(QUENCH_MEDIA, bench.typed.quench, 'cold water'),
  });
  if (groups.length === 0) return <NoAnswer says="Choose an alloy and enter its thickness." />;
  if (!uniformity.ok) return <NoAnswer says="The tables do not have this furnace class." />;
  return <LoadResult groups={groups} uniformityC={uniformity.toleranceC} says={bench.says} />;
}
