'use client';

import { areaWords, massWords, type Units } from '@/components/batches/measures';
import { useMe } from '@/components/session/use-me';
import { Section } from '@/components/ui/section';
import type { Part } from '@/lib/parts/contract';
import { inBaseUnit } from '@/lib/parts/measure';

/** Outer sizes, mass and area as they were typed; mass and area computed where nobody typed them. */
export function SizesOfPart({ part }: { part: Part }) {
  const units = useMe()?.units ?? 'inch';
  return <Sizes part={part} units={units} />;
}

export function Sizes({
  part,
  units,
}: {
  part: Pick<Part, 'length' | 'width' | 'height' | 'mass' | 'area' | 'computed'>;
  units: Units;
}) {
  const { computed } = part;
  const rows = [
    ...(['length', 'width', 'height'] as const).map((name) => ({
      says: name,
      value: part[name] && (
        <EnteredMeasure entered={part[name].entered} base={inBaseUnit(part[name].value, 'length')} />
      ),
    })),
    {
      says: 'mass of one',
      value: part.mass ? (
        <EnteredMeasure entered={part.mass.entered} base={inBaseUnit(part.mass.value, 'mass')} />
      ) : (
        computed && <Computed says={massWords(computed.massG, units)} />
      ),
    },
    {
      says: 'area of one',
      value: part.area ? (
        <EnteredMeasure entered={part.area.entered} base={inBaseUnit(part.area.value, 'area')} />
      ) : (
        computed && <Computed says={areaWords(computed.areaMm2, units)} />
      ),
    },
  ].filter(({ value }) => value !== null);
  if (rows.length === 0) return null;
  return (
    <Section title="Size">
      <dl className="grid grid-cols-[7rem_minmax(0,1fr)] gap-x-3 gap-y-1.5 py-1.5">
        {rows.map(({ says, value }) => (
          <div key={says} className="contents">
            <dt className="text-quiet first-letter:uppercase">{says}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
      {computed && !(part.mass && part.area) && (
        <p className="text-source text-faint">
          Computed as {computed.rule}; nothing taken off, so the most it can be. Density {computed.density}.
        </p>
      )}
    </Section>
  );
}

const Computed = ({ says }: { says: string }) => (
  <span className="whitespace-nowrap text-quiet">
    about <span className="num">{says}</span>
  </span>
);

/** As it was typed, and what that is in SI where it is something else. */
export function EnteredMeasure({ entered, base }: { entered: string; base: string }) {
  return (
    <span className="whitespace-nowrap">
      <span className="num">{entered}</span>
      {entered.replace(/\s/g, '') !== base.replace(/\s/g, '') && (
        <span className="num text-source font-normal text-quiet"> {base}</span>
      )}
    </span>
  );
}
