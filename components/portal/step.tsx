import { type ReactNode, useId } from 'react';
import { StepNumber } from '@/components/ui/frame-number';

interface StepProps {
  number: number;
  state?: 'open' | 'done' | 'late';
  title: ReactNode;
  /** At the right: when, by whom. */
  aside?: ReactNode;
  id?: string;
  children?: ReactNode;
}

/** One numbered step of the processor's page. */
export function Step({ number, state = 'open', title, aside, id, children }: StepProps) {
  const headingId = useId();
  return (
    <section id={id} aria-labelledby={headingId} className="border-t-heavy border-ink pt-2.5 pb-4">
      <div className="flex flex-wrap items-center gap-x-2.5 gap-y-1">
        <StepNumber number={number} state={state} />
        <h2 id={headingId} className="text-[1.1875rem]">
          {title}
        </h2>
        {aside && <span className="ml-auto text-second text-quiet">{aside}</span>}
      </div>
      {children && <div className="pt-2.5">{children}</div>}
    </section>
  );
}
