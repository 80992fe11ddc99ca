'use client';
import { NumberInput } from '@/components/ui/field';
import { fitsInPlan } from '@/lib/trade/envelope/fits-in-plan';
import { widestBlank } from '@/lib/trade/envelope/widest-blank';

import { Answer, NoAnswer } from './answer';
import { BenchFieldRow, CalculatorFrame } from './calculator-frame';
import { FitDrawing } from './fit-drawing';
import { FitRoom } from './fit-room';
import { SourceLine } from './source-line';
import { SUBJECTS } from './subjects';
import { useBench, type Bench, type Given } from './use-bench';

const FIELDS = {
  long: { kind: 'length', first: '147' },
  wide: { kind: 'length', first: '6' },
  room: { kind: 'length', first: '144' },
  across: { kind: 'length', first: '48' },
  free: { kind: 'length', first: '0.5' },
} as const;
const WORDS = {
  long: 'Blank, long',
  wide: 'Blank, wide',
  room: 'Tank, long',
  across: 'Tank, wide',
  free: 'Keep free',
};
type Name = keyof typeof FIELDS;
const NAMES = Object.keys(FIELDS) as Name[];

/** Does a flat blank lie in a furnace or tank, straight or at an angle, and how narrow must it be if not. */
export function FitCalculator({ given }: { given: Given }) {
  const bench = useBench(FIELDS, given);
  return (
    <CalculatorFrame
      title={SUBJECTS.fit}
      note="flat blank, seen from above"
      units={bench.units}
      onUnits={bench.setUnits}
    >
      <BenchFieldRow label="Sizes">
        {NAMES.map((name) => (
          <NumberInput
            key={name}
            label={WORDS[name]}
            error={bench.read(name) === null ? 'Enter a number.' : undefined}
            {...bench.field(name)}
          />
        ))}
      </BenchFieldRow>
      <Fit bench={bench} />
    </CalculatorFrame>
  );
}

function Fit({ bench }: { bench: Bench<Name> }) {
  const [long, wide, room, across, free] = NAMES.map(bench.read);
  if (long == null || wide == null || room == null || across == null || free == null)
    return <NoAnswer says="Enter all five sizes." />;
  const blank = { lengthMm: long, widthMm: wide };
  const inside = { lengthMm: room - 2 * free, widthMm: across - 2 * free };
  const fit = fitsInPlan(blank, inside);
  if (!fit.ok || free < 0)
    return <NoAnswer says="Every size must be more than 0, and the tank larger than what is kept free." />;
  const has = Math.min(inside.lengthMm, inside.widthMm);
  return (
    <>
      <Answer
        good={fit.fits}
        says={fitWords(fit.lies)}
        rest={
          <>
            needs <strong className="num">{bench.says(fit.neededWidthMm, 'length')}</strong> of{' '}
            <strong className="num">{bench.says(has, 'length')}</strong> across
            <Narrower blank={blank} inside={inside} fits={fit.fits} bench={bench} />
          </>
        }
      />
      <FitDrawing
        blank={blank}
        tank={{ lengthMm: room, widthMm: across }}
        freeMm={free}
        lies={fit.lies}
        says={bench.says}
      />
      <FitRoom blank={blank} inside={inside} bench={bench} />
      <SourceLine source={fit.source} />
      <p className="text-source text-quiet">
        Racks, hooks and the swing of a crane are not in this number. Measure the tank where the part goes.
      </p>
    </>
  );
}

const fitWords = (lies: 'straight' | 'diagonally' | null): string => {
  if (lies === null) return 'Does not fit';
  return lies === 'straight' ? 'Fits, laid straight' : 'Fits, laid at an angle';
};

interface NarrowerProps {
  blank: { lengthMm: number; widthMm: number };
  inside: { lengthMm: number; widthMm: number };
  fits: boolean;
  bench: Bench<Name>;
}

function Narrower({ blank, inside, fits, bench }: NarrowerProps) {
  const widest = widestBlank(Math.max(blank.lengthMm, blank.widthMm), inside);
  if (!widest.ok) return '; not even a wire of this length lies in it';
  return (
    <>
      ; {fits ? 'it would fit up to ' : 'it fits while it is at most '}
      <strong className="num">{bench.says(widest.widthMm, 'length')}</strong> wide
    </>
  );
}
