'use client';

import { RadioGroup } from '@/components/ui/choice';

export type Units = 'inch' | 'metric';

const OPTIONS = [
  { value: 'inch', says: 'inch and °F' },
  { value: 'metric', says: 'mm and °C' },
] as const;

/** How this person reads lengths and temperatures. */
export function UnitsChoice({ units, onChoose }: { units: Units; onChoose: (units: Units) => void }) {
  return (
    <RadioGroup
      label="Units"
      options={OPTIONS}
      chosen={[units]}
      onChange={(event) => onChoose(event.currentTarget.value === 'metric' ? 'metric' : 'inch')}
    />
  );
}
