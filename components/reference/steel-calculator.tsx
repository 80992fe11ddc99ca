'use client';
import { NumberInput, SelectField } from '@/components/ui/field';
import { phConditionsFor } from '@/lib/trade/steel/ph-condition';
import { steelWindow } from '@/lib/trade/steel/steel-window';
import { temperAfterQuench } from '@/lib/trade/steel/temper-after-quench';
import { temperWindow } from '@/lib/trade/steel/temper-window';
import { PH_STEEL_CONDITIONS } from '@/lib/trade/tables/ph-steel-conditions';
import { STEEL_TEMPERING, TEMPER_BANDS } from '@/lib/trade/tables/steel-tempering';
import { STEEL_WINDOWS, type SteelOperation } from '@/lib/trade/tables/steel-windows';
import { TEMPER_AFTER_QUENCH } from '@/lib/trade/tables/temper-after-quench';

import { Answer, NoAnswer } from './answer';
import { spanWords } from './bench-moment';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsSaying } from './choice-of';
import { SourceLine } from './source-line';
import { SteelTables } from './steel-tables';
import { OPERATIONS, QUENCHES, steelRefusal } from './steel-words';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  steel: { kind: 'word', first: '4130' },
  least: { kind: 'stress', first: '150' },
  most: { kind: 'stress', first: '180' },
  thickness: { kind: 'length', first: '0.5' },
} as const;
const STEELS = [
  ...new Set([
    ...STEEL_WINDOWS.rows.map(({ steel }) => steel),
    ...PH_STEEL_CONDITIONS.rows.flatMap(({ steels }) => steels),
  ]),
];
const NAMES = Object.keys(OPERATIONS) as SteelOperation[];
type SteelBench = Bench<keyof typeof FIELDS>;

/** Furnace windows of a steel for a range of tensile strength. */
export function SteelCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  const number = (name: 'least' | 'most' | 'thickness') => ({
    ...bench.field(name),
    error: bench.read(name) === null ? 'Enter a number.' : undefined,
  });
  return (
    <CalculatorFrame
      title={SUBJECTS.steel}
      note="harden and temper, or age, for a tensile strength"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Steel and strength">
        <SelectField label="Steel" options={optionsSaying(STEELS)} {...bench.choice('steel')} />
        <NumberInput label="Tensile, least" {...number('least')} />
        <NumberInput label="Tensile, most" {...number('most')} />
        <NumberInput label="Thickness" {...number('thickness')} />
      </BenchFieldRow>
      <Steel bench={bench} />
      <SteelTables />
    </CalculatorFrame>
  );
}

function Steel({ bench }: { bench: SteelBench }) {
  const steel = choiceOf(STEELS, bench.typed.steel, '4130');
  const [least, most] = [bench.read('least'), bench.read('most')];
  if (least === null || most === null) return <NoAnswer says="Enter the range of tensile strength." />;
  const isAged = PH_STEEL_CONDITIONS.rows.some(({ steels }) => steels.includes(steel));
  return (
    <>
      {isAged ? (
        <Conditions steel={steel} least={least} bench={bench} />
      ) : (
        <Tempering steel={steel} least={least} most={most} bench={bench} />
      )}
      <h3 className="pt-5">Furnace ranges</h3>
      {NAMES.map((operation) => (
        <Window key={operation} steel={steel} operation={operation} most={most} bench={bench} />
      ))}
    </>
  );
}

interface StrengthProps {
  steel: string;
  least: number;
  bench: SteelBench;
}

function Tempering({ steel, least, most, bench }: StrengthProps & { most: number }) {
  const found = temperWindow(
    { tempering: STEEL_TEMPERING, bands: TEMPER_BANDS },
    { steel, tensileMpaMin: least, tensileMpaMax: most },
  );
  if (!found.ok) return <NoAnswer says={steelRefusal(found.reason)} />;
  const [low, high] = [found.temperatureCMin, found.temperatureCMax];
  const twice = `${found.times} times${found.hoursEach === undefined ? '' : `, ${found.hoursEach} h each`}`;
  return (
    <>
      <Answer
        good={null}
        says={`Temper at ${bench.says(low, 'temperature')} to ${bench.says(high, 'temperature')}`}
        rest={[
          ...(found.times > 1 ? [twice] : []),
          ...(found.isBetweenRows ? ['read between printed strengths'] : []),
          'where to begin: the hardness of the tempered part decides',
        ].join('; ')}
      />
      {found.embrittlement && (
        <NoAnswer
          says={
            found.embrittlement === 'never'
              ? 'Part of this window must never be used: tempering there costs toughness.'
              : 'Part of this window is better avoided: tempering there costs toughness.'
          }
        />
      )}
      <SourceLine source={found.source} readFrom={found.readFrom} />
      <AfterQuench bench={bench} />
    </>
  );
}

function AfterQuench({ bench }: { bench: SteelBench }) {
  const thicknessMm = bench.read('thickness');
  const found = thicknessMm === null ? null : temperAfterQuench(TEMPER_AFTER_QUENCH, thicknessMm);
  if (!found?.ok) return <NoAnswer says="Enter a thickness of more than 0 for the time to tempering." />;
  return (
    <>
      <p className="pt-2">
        Into the tempering furnace within <strong>{found.startWithinHours} h</strong> of the quench, better{' '}
        {found.startWithinHoursPreferred} h; held <strong>{spanWords(found.soakMin)}</strong> at least.
      </p>
      <SourceLine source={found.source} readFrom={found.readFrom} />
    </>
  );
}

function Conditions({ steel, least, bench }: StrengthProps) {
  const found = phConditionsFor(PH_STEEL_CONDITIONS, { steel, tensileMpaMin: least });
  if (!found.ok) return <NoAnswer says={`No condition of ${steel} in the tables is as strong as that.`} />;
  const [first] = found.conditions;
  return (
    <>
      <Answer
        good={null}
        says={first?.condition ?? ''}
        rest="the weakest that is strong enough is the toughest"
      />
      <ul>
        {found.conditions.map((one) => (
          <li key={one.condition}>
            <strong>{one.condition}</strong>: {bench.says(one.temperatureC, 'temperature')},{' '}
            {spanWords(one.soakMin)} to {spanWords(one.soakMinMax)}; {bench.says(one.tensileMpaMin, 'stress')}{' '}
            at least, HRC {one.hrcMin} to {one.hrcMax}
          </li>
        ))}
      </ul>
      <SourceLine source={found.source} readFrom={found.readFrom} />
    </>
  );
}

interface WindowProps {
  steel: string;
  operation: SteelOperation;
  most: number;
  bench: SteelBench;
}

function Window({ steel, operation, most, bench }: WindowProps) {
  const found = steelWindow(STEEL_WINDOWS, { steel, operation, tensileMpaMax: most });
  if (!found.ok)
    return found.reason === 'sources_have_no_overlap' ? <NoAnswer says={steelRefusal(found.reason)} /> : null;
  return (
    <div className="border-t border-rule py-1.5">
      <strong>{OPERATIONS[operation]}</strong>{' '}
      <span className="num">
        {bench.says(found.temperatureCMin, 'temperature')} to{' '}
        {bench.says(found.temperatureCMax, 'temperature')}
      </span>
      {found.quench && `, ${QUENCHES[found.quench]}`}
      {found.coolBelowC !== undefined &&
        `, cool below ${bench.says(found.coolBelowC, 'temperature')} before ageing`}
      {found.bySource.map(({ source }) => (
        <SourceLine key={source.document} source={source} />
      ))}
    </div>
  );
}
