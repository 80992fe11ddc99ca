'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import { dimensionChange, type Coating } from '@/lib/trade/finishes/dimension-change';
import { finishedLimits, preFinishLimits } from '@/lib/trade/finishes/finish-limits';
import type { Source } from '@/lib/trade/source';
import {
  BUILD_UP_SURFACES,
  COATING_GROWTH,
  type BuildUpSurface,
  type BuildUpTreatment,
} from '@/lib/trade/tables/build-up';

import { Answer, NoAnswer } from './answer';
import { BuildUpDrawing } from './build-up-drawing';
import { buildUpRefusal, SURFACES, TREATMENTS } from './build-up-words';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf } from './choice-of';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  treatment: { kind: 'word', first: 'plating' },
  surface: { kind: 'word', first: 'external_thread_pitch_diameter' },
  thin: { kind: 'fine', first: '0.0003' },
  thick: { kind: 'fine', first: '0.0005' },
  share: { kind: 'number', first: '' },
  limits: { kind: 'word', first: 'finished' },
  least: { kind: 'fine', first: '0.2854' },
  most: { kind: 'fine', first: '0.2894' },
} as const;
const TABLES = { surfaces: BUILD_UP_SURFACES, growth: COATING_GROWTH };
const DIRECTIONS = { finished: 'limits when finished', before: 'limits before the finish' };
const YOUR_PROCESSOR: Source = {
  document: 'The share entered here, as your processor states it',
  confidence: 'computed',
  certainty: 'medium',
};
type BuildUpBench = Bench<keyof typeof FIELDS>;

/** What a finish puts on a dimension, and what the dimension is made to before it. */
export function BuildUpCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const number = (name: 'thin' | 'thick' | 'least' | 'most') => ({
    ...bench.field(name),
    error: bench.read(name) === null ? 'Enter a number.' : undefined,
  });
  return (
    <CalculatorFrame
      title={SUBJECTS.finish}
      note="dimensions before and after"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Finish">
        <SelectField
          label="Finish"
          className="wide"
          options={optionsOf(TREATMENTS)}
          {...bench.choice('treatment')}
        />
        <NumberInput label="On a face, least" {...number('thin')} />
        <NumberInput label="On a face, most" {...number('thick')} />
        <NumberInput
          label="Grows outward, %"
          hint="if your processor says so"
          {...bench.field('share')}
          error={
            bench.typed.share.trim() !== '' && bench.read('share') === null ? 'Enter a number.' : undefined
          }
        />
      </BenchFieldRow>
      <BenchFieldRow label="Dimension">
        <SelectField
          label="Dimension"
          className="wide"
          options={optionsOf(SURFACES)}
          {...bench.choice('surface')}
        />
        <SelectField
          label="Given are"
          className="wide"
          options={optionsOf(DIRECTIONS)}
          {...bench.choice('limits')}
        />
        <NumberInput label="Least" {...number('least')} />
        <NumberInput label="Most" {...number('most')} />
      </BenchFieldRow>
      <BuildUp bench={bench} />
      <SourcedTable
        table={COATING_GROWTH}
        heads={['Finish', 'Grows outward']}
        cells={(row) => [
          TREATMENTS[row.treatment],
          'growthInMax' in row ? `${row.growthInMax} in at most` : `${row.outwardShare.join(' of ')} parts`,
        ]}
      />
      <SourcedTable
        table={BUILD_UP_SURFACES}
        heads={['Dimension', 'Times the growth']}
        cells={({ surface, timesGrowth }) => [SURFACES[surface], timesGrowth]}
      />
    </CalculatorFrame>
  );
}

function coatingOf({ typed, read }: BuildUpBench): Coating | null {
  const [min, max, share] = [read('thin'), read('thick'), read('share')];
  if (min === null || max === null) return null;
  return {
    treatment: choiceOf(Object.keys(TREATMENTS) as BuildUpTreatment[], typed.treatment, 'plating'),
    surface: choiceOf(Object.keys(SURFACES) as BuildUpSurface[], typed.surface, 'flat'),
    thicknessMm: { min, max },
    ...(share !== null && { outwardShare: { share: share / 100, source: YOUR_PROCESSOR } }),
  };
}

function BuildUp({ bench }: { bench: BuildUpBench }) {
  const coating = coatingOf(bench);
  const [min, max] = [bench.read('least'), bench.read('most')];
  if (!coating || min === null || max === null) return <NoAnswer says="Enter thickness and limits." />;
  const change = dimensionChange(TABLES, coating);
  if (!change.ok) return <NoAnswer says={buildUpRefusal(change.reason)} />;
  const isFinished = bench.typed.limits !== 'before';
  const found = (isFinished ? preFinishLimits : finishedLimits)(TABLES, coating, { min, max });
  const span = ({ min: low, max: high }: { min: number; max: number }) =>
    low === high ? bench.says(low, 'fine') : `${bench.says(low, 'fine')} to ${bench.says(high, 'fine')}`;
  const worked = found.ok ? span(found.limitsMm) : 'no room';
  return (
    <>
      {found.ok ? (
        <Answer
          good={null}
          says={
            <span className="num">
              {isFinished ? 'Make it ' : 'It becomes '}
              {worked}
            </span>
          }
          rest={
            <>
              {SURFACES[coating.surface]} changes by <strong className="num">{span(change.changeMm)}</strong>;
              a face grows <strong className="num">{span(change.growthMm)}</strong>
            </>
          }
        />
      ) : (
        <NoAnswer says={buildUpRefusal(found.reason)} />
      )}
      <BuildUpDrawing
        surface={coating.surface}
        outward={coating.thicknessMm.max === 0 ? 0 : change.growthMm.max / coating.thicknessMm.max}
        before={isFinished ? worked : span({ min, max })}
        after={isFinished ? span({ min, max }) : worked}
      />
      {change.bySource.map(({ growthMm, source }) => (
        <SourceLine key={`${source.document} ${growthMm.max}`} source={source} readFrom={change.readFrom} />
      ))}
      <p className="text-source text-quiet">
        Edges, corners and recesses build up otherwise than faces. Threads are gauged after the finish.
      </p>
    </>
  );
}
