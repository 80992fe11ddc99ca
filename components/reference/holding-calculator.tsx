'use client';
import { Button } from '@/components/ui/button';
import { NumberInput, SelectField, TextField } from '@/components/ui/field';
import { HOLDING_LIMITS, REWORK_WINDOWS } from '@/lib/trade/tables/holding-limits';

import { fieldMoment, onTheWall } from './bench-moment';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { optionsSaying } from './choice-of';
import { Holding } from './holding-answer';
import { HELD, type HoldingBench, type HoldingField, HOLDING_FIELDS } from './holding-fields';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Given } from './use-bench';

/** Until when quenched metal keeps soft, at room temperature and in the cold, by a clock that runs. */
export function HoldingCalculator({ given }: { given: Given }) {
  const bench = useBench(HOLDING_FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.holding}
      note="aluminium that is quenched and not yet aged"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Metal and store">
        <SelectField label="Alloy" options={optionsSaying(HELD)} {...bench.choice('alloy')} />
        <NumberInput
          label="Cold store at"
          error={bench.read('store') === null ? 'Enter a number.' : undefined}
          {...bench.field('store')}
        />
      </BenchFieldRow>
      <BenchFieldRow label="Times">
        <MomentField bench={bench} name="quenched" label="Quenched" says="Quenched now" />
        <MomentField bench={bench} name="putIn" label="Into the cold" says="Into the cold now" />
        <MomentField bench={bench} name="takenOut" label="Out of the cold" says="Out of it now" />
      </BenchFieldRow>
      <Holding bench={bench} />
      <SourcedTable
        table={HOLDING_LIMITS}
        heads={['Alloys', 'Room, min', 'In the cold, at or below °F: days']}
        cells={({ alloys, roomMin, cold }) => [
          alloys.join(', '),
          roomMin,
          cold.map(({ atF, days }) => `${atF}: ${days}`).join('; '),
        ]}
      />
      <SourcedTable
        table={REWORK_WINDOWS}
        heads={['Alloys', 'Work', 'Within, min']}
        cells={({ alloys, work, withinMin }) => [
          alloys === 'any' ? 'any' : alloys.join(', '),
          work,
          [...new Set(withinMin)].join(' to '),
        ]}
      />
    </CalculatorFrame>
  );
}

interface MomentFieldProps {
  bench: HoldingBench;
  name: HoldingField;
  label: string;
  says: string;
}

/** A time that is typed, or taken as it happens; with it the zone of who says it, so that the clock is right elsewhere. */
function MomentField({ bench, name, label, says }: MomentFieldProps) {
  const say = (moment: string) => bench.set({ [name]: moment, zone: String(zoneHere()) });
  return (
    <div className="wide max-sm:col-span-2">
      <TextField
        label={label}
        type="datetime-local"
        value={bench.typed[name]}
        onChange={({ currentTarget }) => say(currentTarget.value)}
      />
      <Button look="word" onClick={() => say(fieldMoment(onTheWall(new Date(), zoneHere())))}>
        {says}
      </Button>
    </div>
  );
}

/** Minutes east of UTC, where the device is. */
const zoneHere = (): number => -new Date().getTimezoneOffset();
