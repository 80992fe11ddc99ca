import type { ReactNode } from 'react';
import type { CheckLevel } from './marks';

interface EdgeProps {
  level: CheckLevel;
  children: ReactNode;
  className?: string;
}

const EDGES: Record<CheckLevel, string> = {
  stop: 'border-held',
  warn: 'border-dispatched',
  note: 'border-settled',
};

/** A paragraph with a coloured edge: what it says is in its words. */
export function Edge({ level, children, className = '' }: EdgeProps) {
  return <div className={`my-3 border-l-4 py-[3px] pl-3 ${EDGES[level]} ${className}`}>{children}</div>;
}

/** Stands beside the work it is about, never over it. */
export function Caution({ children }: { children: ReactNode }) {
  return (
    <Edge level="warn" className="text-dispatched-ink">
      {children}
    </Edge>
  );
}
