'use client';
import { NumberInput } from '@/components/ui/field';
import { temperColoursAt } from '@/lib/trade/steel/temper-colours';
import { TEMPER_COLOURS, type TemperColourRow } from '@/lib/trade/tables/temper-colours';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { ColourStrip } from './colour-strip';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = { temperature: { kind: 'temperature', first: '460' } } as const;
const LISTS: Record<TemperColourRow['list'], string> = {
  dooley: 'Dooley',
  tool_steel_list: 'a tool steel list',
  gauge_plate: 'a gauge plate maker',
  steel_maker: 'a steel maker',
};
const REFUSALS = {
  colder_than_colours: 'Colder than the first colour shows.',
  hotter_than_colours: 'Hotter than the lists go.',
  temperature_not_a_number: 'Enter a temperature.',
} as const;

/** Which colour polished steel takes in air, by each published list. */
export function ColourCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.colours}
      note="polished carbon steel in air, about an hour; longer darkens sooner, stainless runs hotter"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Temperature">
        <NumberInput
          label="Temperature"
          error={bench.read('temperature') === null ? 'Enter a number.' : undefined}
          {...bench.field('temperature')}
        />
      </BenchFieldRow>
      <Colours bench={bench} />
      <SourcedTable
        table={TEMPER_COLOURS}
        heads={['List', 'Colour', '°F']}
        cells={({ list, colour, temperatureF }) => [LISTS[list], colour, temperatureF]}
      />
    </CalculatorFrame>
  );
}

function Colours({ bench }: { bench: Bench<keyof typeof FIELDS> }) {
  const atC = bench.read('temperature');
  const found = temperColoursAt(TEMPER_COLOURS, atC ?? NaN);
  const first = found.ok ? found.byList[0] : undefined;
  return (
    <>
      {found.ok ? (
        <Answer
          good={null}
          says={first?.colour ?? ''}
          rest={found.byList.map(({ list, colour }) => `${colour} by ${LISTS[list]}`).join('; ')}
        />
      ) : (
        <NoAnswer says={REFUSALS[found.reason]} />
      )}
      <ColourStrip
        rows={TEMPER_COLOURS.rows.filter(({ list }) => list === 'dooley')}
        units={bench.units}
        atC={atC}
      />
      {found.ok && <SourceLine source={found.source} readFrom={found.readFrom} />}
      <p className="text-source text-quiet">
        The strip shows the colours of Dooley’s list, painted to give an impression. A screen or a printer is
        no standard to compare steel with.
      </p>
    </>
  );
}
