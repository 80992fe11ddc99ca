'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import { quenchDelay } from '@/lib/trade/heat-treat/quench-delay';
import { requiredSoak } from '@/lib/trade/heat-treat/required-soak';
import { solutionRange } from '@/lib/trade/heat-treat/solution-range';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { SOAK_TIMES } from '@/lib/trade/tables/soak-times';
import { SOLUTION_TEMPERATURES } from '@/lib/trade/tables/solution-temperatures';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { DelaySteps, SoakSteps } from './soak-steps';
import { SourceLine } from './source-line';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  thickness: { kind: 'length', first: '0.063' },
  alloy: { kind: 'word', first: '2024' },
  medium: { kind: 'word', first: 'air' },
  clad: { kind: 'word', first: 'yes' },
} as const;
const ALLOYS = ['2014', '2017', '2024', '2117', '2219', '6013', '6061', '7050', '7075', '7178'] as const;
type SoakedAlloy = (typeof ALLOYS)[number];
const MEDIA = [
  { value: 'air', says: 'air furnace' },
  { value: 'salt', says: 'salt bath' },
];
const CLAD = [
  { value: 'yes', says: 'clad' },
  { value: 'no', says: 'bare' },
];

/** Soak, longest soak of clad metal, and quench delay of wrought aluminium, by thickness. */
export function SoakCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const unread = bench.read('thickness') === null;
  return (
    <CalculatorFrame
      title={SUBJECTS.soak}
      note="solution heat treatment of wrought aluminium"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Section">
        <NumberInput
          label="Thickness"
          error={unread ? 'Enter a number.' : undefined}
          {...bench.field('thickness')}
        />
        <SelectField
          label="Alloy"
          options={ALLOYS.map((alloy) => ({ value: alloy, says: alloy }))}
          {...bench.choice('alloy')}
        />
        <SelectField label="Heated in" options={MEDIA} {...bench.choice('medium')} />
        <SelectField label="Surface" options={CLAD} {...bench.choice('clad')} />
      </BenchFieldRow>
      <Soak bench={bench} />
    </CalculatorFrame>
  );
}

function Soak({ bench }: { bench: Bench<keyof typeof FIELDS> }) {
  const thicknessMm = bench.read('thickness');
  const { typed } = bench;
  const medium = typed.medium === 'salt' ? 'salt' : 'air';
  const alloy: SoakedAlloy = ALLOYS.find((one) => one === typed.alloy) ?? '2024';
  const clad = typed.clad === 'yes';
  if (thicknessMm === null || thicknessMm <= 0) return <NoAnswer says="Enter a thickness of more than 0." />;
  const soak = requiredSoak(SOAK_TIMES, { thicknessMm, medium, clad });
  const delay = quenchDelay(QUENCH_DELAYS, { alloy, thinnestMm: thicknessMm });
  const range = solutionRange(SOLUTION_TEMPERATURES, { alloy, form: 'sheet' });
  return (
    <>
      {soak.ok ? (
        <Answer
          good={null}
          says={`${soak.soakMin} min or more`}
          rest={
            <>
              {soak.longestMin !== null && (
                <strong className="text-held-ink">clad: not over {soak.longestMin} min, </strong>
              )}
              counted from the coldest metal reaching the lowest temperature
              {range.ok && range.rangeC && (
                <>
                  ; {alloy} is treated from{' '}
                  <strong className="num">{bench.says(range.rangeC[0], 'temperature')}</strong> to{' '}
                  <strong className="num">{bench.says(range.rangeC[1], 'temperature')}</strong>
                </>
              )}
            </>
          }
        />
      ) : (
        <NoAnswer says="Thicker than the table goes. Your copy of the specification says how long it soaks." />
      )}
      <SoakSteps bench={bench} thicknessMm={thicknessMm} medium={medium} soak={soak} />
      {soak.ok && <SourceLine source={soak.source} readFrom={soak.readFrom} />}
      <h3 className="pt-5">Quench delay</h3>
      {delay.ok && (
        <Answer
          good={null}
          says={`${delay.maxDelayS} s at most`}
          rest={
            <>
              from the furnace door beginning to open (or the first part leaving the salt) to the last part
              under
              {delay.lateAboveC !== null && (
                <>
                  ; longer only while every part is still above{' '}
                  <strong className="num">{bench.says(delay.lateAboveC, 'temperature')}</strong>
                </>
              )}
            </>
          }
        />
      )}
      <DelaySteps bench={bench} thicknessMm={thicknessMm} maxDelayS={delay.ok ? delay.maxDelayS : null} />
      {delay.ok && <SourceLine source={delay.source} readFrom={delay.readFrom} />}
      {range.ok && <SourceLine source={range.source} readFrom={range.readFrom} />}
    </>
  );
}
