'use client';
import { useState } from 'react';

import { SegmentButtons } from '@/components/ui/segments';
import { NumberInput } from '@/components/ui/field';
import { ChartRequirement } from '@/lib/evidence/chart/requirement';

interface AskedFormProps {
  requirement: ChartRequirement | null;
  onChange: (requirement: ChartRequirement) => void;
}

const FIELDS = [
  { name: 'set', says: 'Set temperature', isDegrees: true },
  { name: 'tolerance', says: 'Plus and minus', isDegrees: true },
  { name: 'soakMinutes', says: 'Soak, at least', unit: 'min' },
  { name: 'soakMinutesMax', says: 'Soak, at most', unit: 'min' },
  { name: 'maxQuenchDelayS', says: 'Quench delay, at most', unit: 's' },
] as const;

/** What the chart must show; it is judged anew while one types, as soon as the figures make sense together. */
export function AskedForm({ requirement, onChange }: AskedFormProps) {
  const [typed, setTyped] = useState<Record<string, string>>(() =>
    Object.fromEntries(FIELDS.map(({ name }) => [name, String(requirement?.[name] ?? '')])),
  );
  const [unit, setUnit] = useState(requirement?.unit ?? 'F');
  const change = (next: Record<string, string>, nextUnit: 'F' | 'C') => {
    setTyped(next);
    setUnit(nextUnit);
    const figures = Object.entries(next).flatMap(([name, text]) =>
      text.trim() === '' ? [] : [[name, Number(text)] as const],
    );
    const parsed = ChartRequirement.safeParse({ ...Object.fromEntries(figures), unit: nextUnit });
    if (parsed.success) onChange(parsed.data);
  };
  return (
    <div className="grid grid-cols-2 gap-3 py-2">
      {FIELDS.map((field) => (
        <NumberInput
          key={field.name}
          label={field.says}
          unit={'unit' in field ? field.unit : `°${unit}`}
          value={typed[field.name] ?? ''}
          error={isNumber(typed[field.name]) ? undefined : 'Enter a number.'}
          onChange={(event) => change({ ...typed, [field.name]: event.currentTarget.value }, unit)}
        />
      ))}
      <SegmentButtons
        label="Degrees"
        value={unit}
        options={[
          { value: 'F', says: '°F' },
          { value: 'C', says: '°C' },
        ]}
        onChange={(value) => change(typed, value === 'C' ? 'C' : 'F')}
      />
    </div>
  );
}

const isNumber = (text: string | undefined): boolean => Number.isFinite(Number(text ?? ''));
