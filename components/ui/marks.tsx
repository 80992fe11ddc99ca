import type { ReactNode } from 'react';
import type { Stage } from '@/lib/batches/stage';

const PAPER = 'var(--mkp,var(--paper))';

const STAGE_SHAPES: Record<Stage, ReactNode> = {
  building: (
    <rect
      x="1.8"
      y="1.8"
      width="10.4"
      height="10.4"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.6"
      strokeDasharray="3 1.6"
    />
  ),
  dispatched: <path d="M2.6 1 13 7 2.6 13Z" fill="currentColor" />,
  at_processor: <path d="M7 .4 13.6 7 7 13.6.4 7Z" fill="currentColor" />,
  returned: <path d="M11.4 1 1 7 11.4 13Z" fill="currentColor" />,
  proved: (
    <>
      <circle cx="7" cy="7" r="6.5" fill="currentColor" />
      <path d="M3.6 7.2 6 9.7 10.4 4.6" fill="none" stroke={PAPER} strokeWidth="1.8" />
    </>
  ),
  settled: <path d="M1 2.6h12v3.2H1zM1 8.2h12v3.2H1z" fill="currentColor" />,
  stocked: <rect x="1.2" y="1.2" width="11.6" height="11.6" fill="currentColor" />,
  held: (
    <>
      <path d="M4.2.4h5.6l3.8 3.8v5.6l-3.8 3.8H4.2L.4 9.8V4.2Z" fill="currentColor" />
      <path d="M3.4 7h7.2" stroke={PAPER} strokeWidth="2.2" />
    </>
  ),
  cancelled: (
    <>
      <rect x="2.4" y="2.4" width="9.2" height="9.2" fill="none" stroke="currentColor" strokeWidth="1.4" />
      <path d="M.2 13.8 13.8.2" stroke="currentColor" strokeWidth="1.6" />
    </>
  ),
};

/** Drawn in pixels, set in rem: marks grow with the text they stand beside. */
export const inRem = (px: number) => `${px / 16}rem`;

interface MarkProps {
  size?: number;
  className?: string;
}

/** Drawn on 14 units, in the ink of what stands around it. */
export function StageMark({ stage, size = 13, className = '' }: MarkProps & { stage: Stage }) {
  return (
    <svg
      width={inRem(size)}
      height={inRem(size)}
      viewBox="0 0 14 14"
      aria-hidden="true"
      className={`flex-none ${className}`}
    >
      {STAGE_SHAPES[stage]}
    </svg>
  );
}

export const VERDICTS = ['meets', 'does_not_meet', 'not_stated', 'cannot_tell', 'to_decide'] as const;
export type Verdict = (typeof VERDICTS)[number];

const VERDICT_SHAPES: Record<Verdict, ReactNode> = {
  meets: <path d="M2 8.4 6.2 12.8 14.2 3.4" fill="none" stroke="currentColor" strokeWidth="2.4" />,
  does_not_meet: (
    <>
      <rect x=".8" y=".8" width="14.4" height="14.4" fill="currentColor" />
      <path d="m4.4 4.4 7.2 7.2m0-7.2-7.2 7.2" stroke={PAPER} strokeWidth="2.2" />
    </>
  ),
  not_stated: (
    <>
      <circle cx="8" cy="8" r="6.6" fill="none" stroke="currentColor" strokeWidth="1.7" />
      <path d="M4.8 8h6.4" stroke="currentColor" strokeWidth="2" />
    </>
  ),
  cannot_tell: (
    <>
      <path d="M8 .8 15.2 8 8 15.2.8 8Z" fill="none" stroke="currentColor" strokeWidth="1.6" />
      <path
        d="M6.2 6.4c0-1.1.8-1.8 1.9-1.8s1.8.7 1.8 1.6c0 1.3-1.8 1.4-1.8 2.8"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.5"
      />
      <circle cx="8.1" cy="11" r=".95" fill="currentColor" />
    </>
  ),
  to_decide: (
    <circle
      cx="8"
      cy="8"
      r="6.4"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
      strokeDasharray="2 2.4"
    />
  ),
};

export function VerdictMark({ verdict, size = 15, className = '' }: MarkProps & { verdict: Verdict }) {
  return (
    <svg
      width={inRem(size)}
      height={inRem(size)}
      viewBox="0 0 16 16"
      aria-hidden="true"
      className={`flex-none ${className}`}
    >
      {VERDICT_SHAPES[verdict]}
    </svg>
  );
}

export type CheckLevel = 'stop' | 'warn' | 'note';

export function CheckMark({ level, size = 18, className = '' }: MarkProps & { level: CheckLevel }) {
  const tone = { stop: 'text-held-ink', warn: 'text-dispatched-ink', note: 'text-settled-ink' }[level];
  return (
    <svg
      width={inRem(size)}
      height={inRem(size)}
      viewBox={level === 'stop' ? '0 0 14 14' : '0 0 18 18'}
      aria-hidden="true"
      className={`flex-none ${tone} ${className}`}
    >
      {level === 'stop' && STAGE_SHAPES.held}
      {level === 'warn' && (
        <>
          <path
            d="M9 1.4 17.2 16.4H.8Z"
            fill="var(--dispatched)"
            stroke="var(--dispatched-ink)"
            strokeWidth="1.4"
          />
          <path d="M9 6.2v5M9 12.6v1.8" stroke="#1E2326" strokeWidth="1.8" />
        </>
      )}
      {level === 'note' && <path d="M2 3.5h14M2 8h14M2 12.5h9" stroke="currentColor" strokeWidth="1.8" />}
    </svg>
  );
}

/** The sign of the product: a tag with its eye. */
export function BrandMark({ height = 22, className = '' }: { height?: number; className?: string }) {
  return (
    <svg
      width={inRem((height * 34) / 22)}
      height={inRem(height)}
      viewBox="0 0 34 22"
      aria-hidden="true"
      className={`flex-none ${className}`}
    >
      <path
        fillRule="evenodd"
        d="M7 0H34V22H7L0 15V7ZM8.6 7.6a3.4 3.4 0 1 0 0 6.8a3.4 3.4 0 1 0 0-6.8Z"
        fill="currentColor"
      />
      <path d="M25 0v22" stroke="var(--paper)" strokeWidth="2" />
    </svg>
  );
}
