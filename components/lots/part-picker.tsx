'use client';

import { useId, useState, type KeyboardEvent } from 'react';
import { useLazyRead } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { Field, fieldAttributes } from '@/components/ui/field';
import { materialWords } from '@/lib/batches/material-words';
import { listParts, type PartRow } from '@/lib/parts/contract';

export type PickedPart = Pick<
  PartRow,
  'id' | 'number' | 'revision' | 'name' | 'serialised' | 'alloy' | 'form' | 'clad'
>;

interface PartPickerProps {
  picked: PickedPart | null;
  onPick: (part: PickedPart | null) => void;
  error?: string | undefined;
}

const SHOWN = 8;

/** Finds a part by number or name as one types; the arrow keys and Enter choose. */
export function PartPicker({ picked, onPick, error }: PartPickerProps) {
  const id = useId();
  const [text, setText] = useState('');
  const [at, setAt] = useState(0);
  const { data } = useLazyRead(
    listParts,
    { text: text.trim(), limit: SHOWN },
    { enabled: text.trim() !== '' && picked === null },
  );
  const found = text.trim() === '' ? [] : (data?.rows ?? []);
  const isOpen = found.length > 0;
  const pick = (part: PickedPart) => {
    setText('');
    setAt(0);
    onPick(part);
  };
  const press = (event: KeyboardEvent) => {
    const moves: Record<string, number> = { ArrowDown: 1, ArrowUp: -1 };
    const move = moves[event.key];
    if (move !== undefined && isOpen) {
      event.preventDefault();
      setAt((at + move + found.length) % found.length);
    }
    const chosen = found[at];
    if (event.key === 'Enter' && chosen) {
      event.preventDefault();
      pick(chosen);
    }
    if (event.key === 'Escape') setText('');
  };

  if (picked) {
    return (
      <div className="flex flex-wrap items-baseline gap-x-4">
        <span className="font-cond text-word">Part</span>
        <span className="min-w-0 [overflow-wrap:anywhere]">
          <span className="num font-semibold">{picked.number}</span> rev {picked.revision} {picked.name}{' '}
          <span className="text-quiet">{materialWords(picked)}</span>
        </span>
        <Button look="word" aria-label="Choose another part" onClick={() => onPick(null)}>
          Change
        </Button>
        {error && <span className="w-full text-held-ink">{error}</span>}
      </div>
    );
  }
  const isNothing = text.trim() !== '' && data?.rows.length === 0;
  const hint = isNothing
    ? 'No part is like that. Look at the number again, or add the part first.'
    : 'its number or a word of its name';
  return (
    <div className="relative">
      <Field id={id} label="Part" hint={hint} error={error}>
        <input
          {...fieldAttributes(id, { error, hint })}
          role="combobox"
          aria-expanded={isOpen}
          aria-controls={`${id}-found`}
          aria-activedescendant={isOpen ? `${id}-${at}` : undefined}
          aria-autocomplete="list"
          autoComplete="off"
          value={text}
          onChange={(event) => {
            setText(event.currentTarget.value);
            setAt(0);
          }}
          onKeyDown={press}
          className="lw-input lw-input-number"
        />
      </Field>
      <ul
        id={`${id}-found`}
        role="listbox"
        aria-label="Parts found"
        className={
          isOpen
            ? 'absolute inset-x-0 top-14 z-20 max-h-80 overflow-auto border border-ink bg-paper touch:top-18'
            : 'hidden'
        }
      >
        {found.map((part, row) => (
          <li
            key={part.id}
            id={`${id}-${row}`}
            role="option"
            aria-selected={row === at}
            onPointerDown={(event) => event.preventDefault()}
            onClick={() => pick(part)}
            className={`cursor-pointer border-b border-rule px-2.5 py-1.5 touch:py-3 ${row === at ? 'bg-bench' : ''}`}
          >
            <span className="num font-semibold">{part.number}</span> rev {part.revision} {part.name}
          </li>
        ))}
      </ul>
    </div>
  );
}
