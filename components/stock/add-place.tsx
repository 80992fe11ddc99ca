'use client';
import { useState } from 'react';

import { useWrite } from '@/components/api/use-api';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import type { ApiError } from '@/lib/api/client';
import type { Declaration } from '@/lib/api/endpoint';
import { addLocation, listLocations } from '@/lib/stock/contract';

interface AddPlaceProps {
  /** Reads that show places, beside the list of them. */
  refreshes?: readonly Declaration[];
  onAdded?: (place: { id: string; name: string }) => void;
  look?: 'word' | 'outlined';
}

/** A place in the stores is named where one needs it. Not a form of its own: it stands inside others. */
export function AddPlace({ refreshes = [], onAdded, look = 'word' }: AddPlaceProps) {
  const [open, setOpen] = useState(false);
  const [name, setName] = useState('');
  const [refusal, setRefusal] = useState<string>();
  const write = useWrite(addLocation, { refreshes: [listLocations, ...refreshes] });

  const add = async () => {
    const done = await write.mutateAsync({ name }).catch((error: unknown) => {
      const { problem } = error as ApiError;
      setRefusal(problem.fields?.[0]?.message ?? problem.title);
    });
    if (!done) return;
    setOpen(false);
    setName('');
    setRefusal(undefined);
    onAdded?.({ id: done.id, name: name.trim() });
  };

  if (!open) {
    return (
      <Button look={look} onClick={() => setOpen(true)}>
        Add a place
      </Button>
    );
  }
  return (
    <div className="flex flex-wrap items-end gap-2">
      <TextField
        label="Name of the place"
        hint="As it stands on the shelf, rack or bin"
        value={name}
        maxLength={60}
        autoFocus
        autoComplete="off"
        error={refusal}
        onChange={(event) => {
          setName(event.currentTarget.value);
          setRefusal(undefined);
        }}
        onKeyDown={(event) => {
          if (event.key === 'Enter') {
            event.preventDefault();
            void add();
          }
          if (event.key === 'Escape') setOpen(false);
        }}
      />
      <div className="flex gap-2">
        <Button busy={write.isPending} busyLabel="Adding" onClick={add}>
          Add {name.trim() || 'it'}
        </Button>
        <Button look="word" onClick={() => setOpen(false)}>
          Leave it
        </Button>
      </div>
    </div>
  );
}
