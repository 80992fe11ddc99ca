import { Numbers } from '@/components/plots/numbers';
import { Plot, stepsOf } from '@/components/plots/plot';
import { ticksOf, type Axis } from '@/components/plots/scale';
import type { requiredSoak } from '@/lib/trade/heat-treat/required-soak';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { SOAK_TIMES, type FurnaceMedium } from '@/lib/trade/tables/soak-times';
import { inchesFromMm, mmFromInches } from '@/lib/trade/units/length';

import type { Bench } from './use-bench';

const THINNEST_IN = 0.01;
/** Beyond it the steps would squeeze what a shop sends together. */
const DRAWN_TO_IN = 1;
const MARKS_IN = [0.01, 0.016, 0.032, 0.063, 0.125, 0.25, 0.5, 1];

type Units = Pick<Bench<never>, 'units'>;

/** Thickness along the foot, equal ratios in equal steps, in the units chosen. */
function thicknessAxis({ units }: Units): Axis {
  const inUnit = (inches: number) => (units === 'metric' ? mmFromInches(inches) : inches);
  const unit = units === 'metric' ? 'mm' : 'in';
  return {
    from: inUnit(THINNEST_IN),
    to: inUnit(DRAWN_TO_IN),
    by: 'ratio',
    ticks: MARKS_IN.map((inches) => ({
      at: inUnit(inches),
      says: units === 'metric' ? String(Number(mmFromInches(inches).toFixed(2))) : String(inches),
    })),
    says: `thickness, ${unit}, by ratio`,
  };
}

const drawn = (thicknessMm: number, { units }: Units): number | null => {
  const inches = inchesFromMm(thicknessMm);
  if (inches < THINNEST_IN || inches > DRAWN_TO_IN) return null;
  return units === 'metric' ? thicknessMm : inches;
};

interface SoakStepsProps {
  bench: Units;
  thicknessMm: number;
  medium: FurnaceMedium;
  soak: ReturnType<typeof requiredSoak>;
}

/** At least, and for clad at most, with the other medium beside it: a table that jumps, drawn as steps. */
export function SoakSteps({ bench, thicknessMm, medium, soak }: SoakStepsProps) {
  const inUnit = (inches: number) => (bench.units === 'metric' ? mmFromInches(inches) : inches);
  const rows = SOAK_TIMES.rows.filter(({ upToIn }) => upToIn !== null && upToIn <= DRAWN_TO_IN);
  const steps = (value: (row: (typeof rows)[number]) => number) =>
    stepsOf(
      rows.map((row, at) => ({
        from: inUnit(rows[at - 1]?.upToIn ?? THINNEST_IN),
        to: inUnit(row.upToIn ?? DRAWN_TO_IN),
        value: value(row),
      })),
    );
  const other = medium === 'air' ? 'salt' : 'air';
  const at = drawn(thicknessMm, bench);
  const values = soak.ok ? [soak.soakMin, ...(soak.longestMin === null ? [] : [soak.longestMin])] : [];
  return (
    <>
      <Plot
        says="Soak time by thickness"
        height={300}
        x={thicknessAxis(bench)}
        y={{ from: 0, to: 105, ticks: ticksOf(0, 100, 5), says: 'min' }}
        series={[
          {
            says: `${medium}, at least`,
            points: steps((row) => row[medium].minMin),
            look: 'main',
            nameAt: { x: inUnit(DRAWN_TO_IN), y: 78, anchor: 'end' },
          },
          {
            says: 'clad, at most',
            points: steps((row) => row[medium].maxCladMin ?? row[medium].minMin),
            look: 'limit',
            nameAt: { x: inUnit(0.24), y: 92, anchor: 'end' },
          },
          {
            says: `${other}, at least`,
            points: steps((row) => row[other].minMin),
            look: 'third',
            nameAt: { x: inUnit(DRAWN_TO_IN), y: other === 'salt' ? 51 : 96, anchor: 'end' },
          },
        ]}
        between={[0, 1]}
        mark={at === null ? undefined : { x: at, values }}
      />
      <Numbers
        label="The table"
        heads={['Up to, in', 'Salt, min', 'clad at most', 'Air, min', 'clad at most']}
        rows={SOAK_TIMES.rows.map(({ upToIn, salt, air }) => [
          upToIn ?? 'over',
          salt.minMin,
          salt.maxCladMin ?? '',
          air.minMin,
          air.maxCladMin ?? '',
        ])}
      />
    </>
  );
}

/** Seconds from the door opening to the last piece under water. */
export function DelaySteps({
  bench,
  thicknessMm,
  maxDelayS,
}: {
  bench: Units;
  thicknessMm: number;
  maxDelayS: number | null;
}) {
  const inUnit = (inches: number) => (bench.units === 'metric' ? mmFromInches(inches) : inches);
  const { rows } = QUENCH_DELAYS;
  const steps = stepsOf(
    rows.map((row, at) => ({
      from: inUnit(Math.max(THINNEST_IN, row.fromIn)),
      to: inUnit(rows[at + 1]?.fromIn ?? DRAWN_TO_IN),
      value: row.maxS,
    })),
  );
  const at = drawn(thicknessMm, bench);
  return (
    <>
      <Plot
        says="Longest quench delay by thickness"
        height={190}
        x={thicknessAxis(bench)}
        y={{ from: 0, to: 17, ticks: ticksOf(0, 15, 3), says: 's' }}
        series={[{ says: 'seconds at most', points: steps, look: 'main' }]}
        mark={at === null || maxDelayS === null ? undefined : { x: at, values: [maxDelayS] }}
      />
      <Numbers
        label="The table"
        heads={['From, in', 'Seconds at most']}
        rows={rows.map(({ fromIn, maxS }) => [fromIn, maxS])}
      />
    </>
  );
}
