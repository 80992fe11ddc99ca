'use client';
import type { UseFormReturn } from 'react-hook-form';

import { CheckboxGroup } from '@/components/ui/choice';
import { PieceCounter } from '@/components/ui/piece-counter';

import type { SpotFormIn, SpotFormOut } from './spot-form';

interface SpotPiecesProps {
  form: UseFormReturn<SpotFormIn, unknown, SpotFormOut>;
  label: string;
  max: number;
  named: readonly { id: string; serial: string }[];
}

/** How many, or which by name. */
export function SpotPieces({ form, label, max, named }: SpotPiecesProps) {
  const error = form.formState.errors.pieces?.message;
  if (named.length > 0)
    return (
      <CheckboxGroup
        label={label}
        error={error}
        options={named.map((piece) => ({
          value: piece.id,
          says: <span className="num">{piece.serial}</span>,
        }))}
        {...form.register('names')}
      />
    );
  return (
    <PieceCounter
      {...form.register('pieces')}
      label={label}
      className="w-44"
      min={1}
      max={max}
      error={error}
    />
  );
}

/** What was refused and belongs to no field. */
export function Refusal({ says }: { says: string | undefined }) {
  return <div role="alert">{says && <p className="pt-2 text-row font-medium text-held-ink">{says}</p>}</div>;
}
