'use client';

import { usePathname, useRouter, useSearchParams } from 'next/navigation';
import { useEffect, useRef, useTransition } from 'react';
import { TextField } from '@/components/ui/field';

interface FindFieldProps {
  label: string;
  /** What the address says now. */
  text: string;
  hint?: string;
}

const PAUSE_MS = 250;

/** Finds as one types; what is looked for stands in the address, so that it can be sent to somebody. */
export function FindField({ label, text, hint }: FindFieldProps) {
  const router = useRouter();
  const path = usePathname();
  const search = useSearchParams();
  const [isPending, start] = useTransition();
  const pause = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(pause.current), []);

  const find = (typed: string) => {
    clearTimeout(pause.current);
    pause.current = setTimeout(() => {
      const next = new URLSearchParams(search);
      if (typed.trim() === '') next.delete('text');
      else next.set('text', typed.trim());
      start(() => router.replace(next.size > 0 ? `${path}?${next.toString()}` : path, { scroll: false }));
    }, PAUSE_MS);
  };

  return (
    <form
      role="search"
      aria-busy={isPending}
      onSubmit={(event) => event.preventDefault()}
      className="w-72 max-md:w-full"
    >
      <TextField
        label={label}
        name="text"
        type="search"
        autoComplete="off"
        mono
        defaultValue={text}
        hint={hint}
        onChange={(event) => find(event.currentTarget.value)}
      />
    </form>
  );
}
