'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import { cladReheats, type ReheatStanding } from '@/lib/trade/heat-treat/clad-reheats';
import { CLAD_REHEATS_MIL, CLAD_REHEATS_TO, CLAD_TREATMENTS_AMS } from '@/lib/trade/tables/clad-reheats';
import { TEMPERS } from '@/lib/trade/tempers/temper';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf, optionsSaying } from './choice-of';
import { SourceLine } from './source-line';
import { SourcedTable } from './sourced-table';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  thickness: { kind: 'length', first: '0.063' },
  bought: { kind: 'word', first: 'T3' },
  done: { kind: 'number', first: '0' },
  document: { kind: 'word', first: 'mil' },
} as const;
const TABLES = { mil: CLAD_REHEATS_MIL, to: CLAD_REHEATS_TO, ams: CLAD_TREATMENTS_AMS };
const DOCUMENTS = { mil: 'MIL-H-6088G (strictest)', to: 'T.O. 1-1A-9', ams: 'AMS 2770' };
const NEXT: Record<ReheatStanding['next'], { good: boolean | null; says: string }> = {
  allowed: { good: true, says: 'May be solution treated' },
  allowed_for_the_last_time: { good: true, says: 'May be solution treated for the last time' },
  needs_engineering_approval: { good: null, says: 'Only with engineering approval' },
  used_up: { good: false, says: 'May not be solution treated again' },
};
/** More than any sheet sees; keeps a slip of the finger from making a long list. */
const MOST_DONE = 20;

/** How often clad sheet may still be solution treated. */
export function CladCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.clad}
      note="each treatment drives copper further through the cladding"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Sheet">
        <NumberInput
          label="Thickness"
          error={bench.read('thickness') === null ? 'Enter a number.' : undefined}
          {...bench.field('thickness')}
        />
        <SelectField label="Bought as" options={optionsSaying(TEMPERS)} {...bench.choice('bought')} />
        <NumberInput label="Treated since" hint="solution treatments" {...bench.field('done')} />
        <SelectField
          label="By"
          className="wide"
          options={optionsOf(DOCUMENTS)}
          {...bench.choice('document')}
        />
      </BenchFieldRow>
      <Clad bench={bench} />
      {Object.values(TABLES).map((table) => (
        <SourcedTable
          key={table.id}
          table={table}
          heads={['Sheet, in', 'At most', 'Counted', 'With approval']}
          cells={({ limitIn, includesLimit, max, counts, maxWithApproval }) => [
            limitIn === null ? 'over' : `${includesLimit ? 'up to' : 'below'} ${limitIn}`,
            max,
            counts === 'reheats' ? 'after the first' : 'all, the mill’s too',
            maxWithApproval ?? '',
          ]}
        />
      ))}
    </CalculatorFrame>
  );
}

function Clad({ bench: { typed, read } }: { bench: Bench<keyof typeof FIELDS> }) {
  const [thicknessMm, done] = [read('thickness'), read('done')];
  if (thicknessMm === null) return <NoAnswer says="Enter a thickness." />;
  if (done === null || !Number.isSafeInteger(done) || done < 0 || done > MOST_DONE)
    return <NoAnswer says={`Enter how often it was solution treated since, 0 to ${MOST_DONE}.`} />;
  const table = TABLES[choiceOf(['mil', 'to', 'ams'] as const, typed.document, 'mil')];
  const found = cladReheats(table, {
    thicknessMm,
    history: {
      boughtAs: choiceOf(TEMPERS, typed.bought, 'T3'),
      done: Array.from({ length: done }, () => 'solution_heat_treat' as const),
    },
  });
  if (!found.ok)
    return (
      <NoAnswer
        says={
          found.reason === 'not_in_table'
            ? 'The table does not have this thickness.'
            : 'Enter a thickness of more than 0.'
        }
      />
    );
  const { good, says } = NEXT[found.next];
  return (
    <>
      <Answer good={good} says={says} rest={`${found.counted} of ${found.max} counted so far`} />
      <div className="flex gap-1.5 py-1.5" aria-hidden>
        {Array.from({ length: Math.max(found.max, found.counted) }, (_, at) => (
          <span
            key={at}
            className={`h-7 w-11 border-heavy border-ink ${at < found.counted ? 'bg-dispatched' : 'bg-paper'}`}
          />
        ))}
      </div>
      <p>
        {found.solutionTreatments} solution treatments in all, the mill’s included; {found.reheats} after the
        first. Annealing and ageing do not count, and annealing does not set the count back.
      </p>
      <SourceLine source={found.source} readFrom={found.readFrom} />
    </>
  );
}
