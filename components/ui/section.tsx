import { type ReactNode, useId } from 'react';

interface SectionProps {
  title: ReactNode;
  /** Beside the title, quiet: a count, the order, where it comes from. */
  note?: ReactNode;
  /** At the end of the rule: one action, or a figure. */
  action?: ReactNode;
  children?: ReactNode;
  className?: string;
  id?: string;
}

/** Opened by a heavy rule. */
export function Section({ title, note, action, children, className = '', id }: SectionProps) {
  const headingId = useId();
  return (
    <section id={id} aria-labelledby={headingId} className={className}>
      <div className="flex flex-wrap items-baseline gap-x-2.5 gap-y-1 border-t-heavy border-ink pt-[7px] pb-1.5">
        <h2 id={headingId}>{title}</h2>
        {note && <span className="text-second text-quiet">{note}</span>}
        {action && <span className="ml-auto">{action}</span>}
      </div>
      {children}
    </section>
  );
}

interface MainAndSideProps {
  main: ReactNode;
  side: ReactNode;
  /** Under the main part on a wide screen; on a narrow one it comes last, after the side. */
  foot?: ReactNode;
  wide?: boolean;
}

/** Main and side, as on every page that has both; under 1100 px the side goes below. */
export function MainAndSide({ main, side, foot, wide = false }: MainAndSideProps) {
  const columns = wide
    ? 'xl:grid-cols-[minmax(0,1016fr)_minmax(0,340fr)]'
    : 'xl:grid-cols-[minmax(0,944fr)_minmax(0,412fr)]';
  return (
    <div
      className={`grid grid-cols-1 gap-x-9 ${foot ? 'gap-y-6 xl:grid-rows-[auto_1fr]' : 'gap-y-9'} ${columns}`}
    >
      <div className="flex min-w-0 flex-col gap-6">{main}</div>
      <div className={`flex min-w-0 flex-col gap-6 ${foot ? 'xl:row-span-2' : ''}`}>{side}</div>
      {foot && <div className="flex min-w-0 flex-col gap-6">{foot}</div>}
    </div>
  );
}
