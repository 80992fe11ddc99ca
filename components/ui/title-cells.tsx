import type { ReactNode } from 'react';

export interface TitleCell {
  caption: string;
  value: ReactNode;
}

/** Captioned cells divided by hairlines, as in the title block of a drawing. */
export function TitleCells({ cells }: { cells: readonly TitleCell[] }) {
  return (
    <dl className="flex min-w-0 flex-wrap gap-y-2">
      {cells.map(({ caption, value }) => (
        <div key={caption} className="min-w-0 border-l border-rule pr-4.5 pl-3.5">
          <dt className="font-cond text-caption text-faint">{caption}</dt>
          <dd className="text-body font-medium has-[.lw-tag]:pt-1">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
