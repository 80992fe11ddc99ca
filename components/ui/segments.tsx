import Link from 'next/link';
import type { ReactNode } from 'react';

interface SegmentBase {
  says: ReactNode;
  count?: number;
  current: boolean;
}

interface SegmentsProps {
  /** "Show", "Units": what is being chosen. */
  label: string;
  /** Ways to look at the same thing, each with its own address. */
  items: readonly (SegmentBase & { href: string })[];
}

/** Each item draws its own frame over its neighbour's, so that a list that wraps leaves no empty box. */
const BOX = 'inline-flex flex-wrap pt-px pl-px';
const item = (current: boolean) =>
  `inline-flex -mt-px -ml-px min-h-9 touch:min-h-12 items-center gap-2 border border-ink px-3 font-cond text-word no-underline focus-visible:z-10 relative ${
    current ? 'bg-ink text-paper' : 'hover:bg-bench'
  }`;

export function Segments({ label, items }: SegmentsProps) {
  return (
    <nav aria-label={label} className={BOX}>
      {items.map(({ says, count, current, href }) => (
        <Link key={href} href={href} aria-current={current ? 'page' : undefined} className={item(current)}>
          {says}
          {count !== undefined && <span className={`num ${current ? '' : 'text-quiet'}`}>{count}</span>}
        </Link>
      ))}
    </nav>
  );
}

interface SegmentButtonsProps<Value extends string> {
  label: string;
  value: Value;
  options: readonly { value: Value; says: ReactNode; note?: ReactNode }[];
  onChange: (value: Value) => void;
}

/** The same, steered by what is on the screen. */
export function SegmentButtons<Value extends string>({
  label,
  value,
  options,
  onChange,
}: SegmentButtonsProps<Value>) {
  return (
    <div role="group" aria-label={label} className={BOX}>
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          aria-pressed={option.value === value}
          className={item(option.value === value)}
          onClick={() => onChange(option.value)}
        >
          {option.says}
          {option.note && <span className="font-normal">{option.note}</span>}
        </button>
      ))}
    </div>
  );
}
