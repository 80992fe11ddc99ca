'use client';
import { NumberInput, SelectField, TextField } from '@/components/ui/field';
import { platingLimit } from '@/lib/trade/steel/plating-limit';
import { relief } from '@/lib/trade/steel/relief';
import { BAKE_HOURS_BY_STRENGTH } from '@/lib/trade/tables/bake-hours-by-strength';
import { EMBRITTLEMENT_RULES } from '@/lib/trade/tables/embrittlement-rules';
import { EXPOSURE_LIMITS } from '@/lib/trade/tables/exposure-limits';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import type { HardenedPartKind } from '@/lib/trade/tables/embrittlement-row';

import { Answer, NoAnswer } from './answer';
import { BakeStart } from './bake-start';
import { BakeTables } from './bake-tables';
import { PART_KINDS, reliefRefusal, reliefReply } from './bake-words';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { choiceOf, optionsOf } from './choice-of';
import { SourceLine } from './source-line';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  specification: { kind: 'word', first: 'QQ-P-416' },
  revision: { kind: 'word', first: 'F' },
  kind: { kind: 'word', first: 'through_hardened' },
  hrc: { kind: 'number', first: '42' },
  tensile: { kind: 'stress', first: '' },
  worked: { kind: 'word', first: '' },
  tempered: { kind: 'temperature', first: '' },
  ended: { kind: 'word', first: '' },
} as const;
const TABLES = {
  rules: EMBRITTLEMENT_RULES,
  bakeHours: BAKE_HOURS_BY_STRENGTH,
  conversion: HARDNESS_STEEL_HRC,
  exposure: EXPOSURE_LIMITS,
};
const KINDS = Object.keys(PART_KINDS) as HardenedPartKind[];
const WORKED = { yes: 'yes', no: 'no' };
type BakeBench = Bench<keyof typeof FIELDS>;

/** Relief of hydrogen after plating, by the specification and revision that the order calls. */
export function BakeCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.bake}
      note="hardened steel, by the specification and revision that the order calls"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Order">
        <TextField
          label="Plating specification"
          className="wide"
          autoComplete="off"
          {...bench.choice('specification')}
        />
        <TextField label="Revision or year" autoComplete="off" {...bench.choice('revision')} />
        <TextField label="Plating ended" type="datetime-local" className="wide" {...bench.choice('ended')} />
      </BenchFieldRow>
      <BenchFieldRow label="Part">
        <SelectField
          label="Part"
          className="wide"
          options={optionsOf(PART_KINDS)}
          {...bench.choice('kind')}
        />
        <NumberInput
          label="Hardest, HRC"
          hint="highest allowed"
          {...bench.field('hrc')}
          error={unread(bench, 'hrc')}
        />
        <NumberInput
          label="or strongest"
          hint="leave out if unknown"
          {...bench.field('tensile')}
          error={unread(bench, 'tensile')}
        />
        <NumberInput
          label="Tempered at"
          hint="if known"
          {...bench.field('tempered')}
          error={unread(bench, 'tempered')}
        />
        <SelectField
          label="Worked when hard"
          empty="not said"
          options={optionsOf(WORKED)}
          {...bench.choice('worked')}
        />
      </BenchFieldRow>
      <Bakes bench={bench} />
      <BakeTables />
    </CalculatorFrame>
  );
}

const unread = (bench: BakeBench, name: 'hrc' | 'tensile' | 'tempered'): string | undefined =>
  bench.typed[name].trim() !== '' && bench.read(name) === null ? 'Enter a number.' : undefined;

function Bakes({ bench }: { bench: BakeBench }) {
  const { typed, read, units } = bench;
  const called = { specification: typed.specification, revision: typed.revision };
  const part = {
    kind: choiceOf(KINDS, typed.kind, 'through_hardened'),
    hrc: read('hrc') ?? undefined,
    tensileMpa: read('tensile') ?? undefined,
    temperedAtC: read('tempered') ?? undefined,
    isWorkedHard: typed.worked === '' ? undefined : typed.worked === 'yes',
  };
  const bake = relief(TABLES, 'embrittlement_relief', called, part);
  const stress = relief(TABLES, 'stress_relief', called, part);
  const reply = bake.ok ? reliefReply(bake, 'Bake', units) : null;
  return (
    <>
      {reply ? (
        <Answer good={reply.good} says={reply.says} rest={reply.rest.join('; ')} />
      ) : (
        !bake.ok && <NoAnswer says={reliefRefusal(bake.reason)} />
      )}
      {bake.ok && bake.isRequired && <BakeStart relief={bake} endedAt={typed.ended} />}
      {bake.source && <SourceLine source={bake.source} readFrom={bake.ok ? bake.readFrom : undefined} />}
      <PlatingLimits called={called} part={part} />
      <h3 className="pt-5">Before plating</h3>
      {stress.ok ? (
        <StressRelief reply={reliefReply(stress, 'Stress relief', units)} />
      ) : (
        <NoAnswer says={`Stress relief: ${reliefRefusal(stress.reason)}`} />
      )}
      {stress.source && (
        <SourceLine source={stress.source} readFrom={stress.ok ? stress.readFrom : undefined} />
      )}
    </>
  );
}

const StressRelief = ({ reply }: { reply: ReturnType<typeof reliefReply> }) => (
  <Answer good={reply.good} says={reply.says} rest={reply.rest.join('; ')} />
);

const LIMITS = {
  not_to_be_plated: 'Too strong to be plated to this specification unless the order allows it.',
  special_cleaning: 'Strong enough to need special cleaning before plating.',
} as const;

function PlatingLimits({
  called,
  part,
}: {
  called: Parameters<typeof platingLimit>[2];
  part: Parameters<typeof platingLimit>[3];
}) {
  return (['not_to_be_plated', 'special_cleaning'] as const).map((limit) => {
    const found = platingLimit(TABLES, limit, called, part);
    return (
      found.ok &&
      found.applies && (
        <div key={limit}>
          <p className="mt-2.5 border-l-4 border-held py-[3px] pl-3 text-held-ink">{LIMITS[limit]}</p>
          <SourceLine source={found.source} readFrom={found.readFrom} />
        </div>
      )
    );
  });
}
