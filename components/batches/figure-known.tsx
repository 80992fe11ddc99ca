import type { Known } from './measures';

/** A mass or area of a column; muted and "about" where it is computed from the sizes. */
export function FigureKnown({ known, text }: { known: Known | null; text: (value: number) => string }) {
  if (!known) return null;
  if (!known.isComputed) return text(known.value);
  return (
    <span className="font-normal text-quiet" title="computed from the sizes, nothing taken off">
      <span className="font-cond">about</span> {text(known.value)}
    </span>
  );
}
