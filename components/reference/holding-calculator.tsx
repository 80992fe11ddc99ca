'use client';
import { NumberInput, SelectField, TextField } from '@/components/ui/field';
import { holdingClock, type ColdStay, type HoldingClock } from '@/lib/trade/heat-treat/holding-clock';
import { HOLDING_LIMITS, REWORK_WINDOWS } from '@/lib/trade/tables/holding-limits';

import { Answer, NoAnswer } from './answer';
import { momentWords, readMoment, spanWords } from './bench-moment';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsSaying } from './choice-of';
import { holdingRefusal } from './holding-words';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  alloy: { kind: 'word', first: '2024' },
  quenched: { kind: 'word', first: '2026-01-05T09:00' },
  putIn: { kind: 'word', first: '' },
  takenOut: { kind: 'word', first: '' },
  store: { kind: 'temperature', first: '0' },
} as const;
const HELD = HOLDING_LIMITS.rows.flatMap(({ alloys }) => alloys);

/** Until when quenched metal keeps soft, at room temperature and in the cold. */
export function HoldingCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.holding}
      note="aluminium that is quenched and not yet aged"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Metal and times">
        <SelectField label="Alloy" options={optionsSaying(HELD)} {...bench.choice('alloy')} />
        <TextField label="Quenched" type="datetime-local" className="wide" {...bench.choice('quenched')} />
        <TextField label="Into the cold" type="datetime-local" className="wide" {...bench.choice('putIn')} />
        <TextField
          label="Out of the cold"
          type="datetime-local"
          className="wide"
          {...bench.choice('takenOut')}
        />
        <NumberInput
          label="Store at"
          error={bench.read('store') === null ? 'Enter a number.' : undefined}
          {...bench.field('store')}
        />
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

function Holding({ bench: { typed, read } }: { bench: Bench<keyof typeof FIELDS> }) {
  const quenchedAt = readMoment(typed.quenched);
  const [putInAt, takenOutAt] = [readMoment(typed.putIn), readMoment(typed.takenOut)];
  const temperatureC = read('store');
  if (!quenchedAt) return <NoAnswer says="Enter when it was quenched." />;
  if (putInAt && temperatureC === null) return <NoAnswer says="Enter how cold the store is." />;
  const stays: ColdStay[] =
    putInAt && temperatureC !== null ? [{ putInAt, temperatureC, ...(takenOutAt && { takenOutAt }) }] : [];
  const clock = holdingClock(HOLDING_LIMITS, {
    alloy: choiceOf(HELD, typed.alloy, '2024'),
    quenchedAt,
    stays,
  });
  if (!clock.ok)
    return (
      <>
        <NoAnswer says={holdingRefusal(clock.reason)} />
        {clock.source && <SourceLine source={clock.source} />}
      </>
    );
  const place = clock.where === 'in_the_cold' ? 'in the cold' : 'at room temperature';
  return (
    <>
      <Answer
        good={null}
        says={`Until ${momentWords(clock.endsAt)}`}
        rest={`${place}; then it is treated again, or aged as it is`}
      />
      <Spent clock={clock} />
      <SourceLine source={clock.source} readFrom={clock.readFrom} />
    </>
  );
}

function Spent({ clock }: { clock: HoldingClock }) {
  return (
    <dl className="grid max-w-[720px] grid-cols-[auto_1fr_auto] items-center gap-x-3 gap-y-2 py-2">
      <Bar says="Room" used={clock.roomUsedMin} limit={clock.roomLimitMin} />
      {clock.coldLimitMin !== null && <Bar says="Cold" used={clock.coldUsedMin} limit={clock.coldLimitMin} />}
    </dl>
  );
}

function Bar({ says, used, limit }: { says: string; used: number; limit: number }) {
  return (
    <>
      <dt className="font-cond text-word">{says}</dt>
      <dd className="h-4 border border-ink bg-paper">
        <span
          className="block h-full bg-dispatched"
          style={{ width: `${Math.min(100, (100 * used) / limit)}%` }}
        />
      </dd>
      <dd className="num">
        {spanWords(used)} of {spanWords(limit)}
      </dd>
    </>
  );
}
