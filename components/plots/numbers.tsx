import type { ReactNode } from 'react';

import { WideRows } from './wide-rows';

interface NumbersProps {
  label: string;
  heads: readonly string[];
  rows: readonly (readonly ReactNode[])[];
}

/** The numbers of a plot or table of the trade, folded on the screen and open on paper. */
export function Numbers({ label, heads, rows }: NumbersProps) {
  return (
    <details className="pt-2 print:open:block">
      <summary className="cursor-pointer font-cond text-word underline">{label}</summary>
      <WideRows heads={heads} rows={rows} />
    </details>
  );
}
