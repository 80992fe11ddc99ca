import { inRem } from './marks';

interface ProgressProps {
  /** "Reading the certificate", "Sending 26-04177.pdf" */
  says: string;
  value: number;
  of: number;
  /** "page 2 of 3", "1.2 of 1.8 MB" */
  where: string;
}

const WIDTH = 140;
const TICKS = 10;

/** A rule that fills. */
export function Progress({ says, value, of, where }: ProgressProps) {
  const part = of > 0 ? Math.min(Math.max(value / of, 0), 1) : 0;
  return (
    <div className="flex flex-wrap items-center gap-3.5 py-1">
      <strong>{says}</strong>
      <svg
        width={inRem(WIDTH)}
        height={inRem(14)}
        viewBox={`0 0 ${WIDTH} 14`}
        role="progressbar"
        aria-label={says}
        aria-valuemin={0}
        aria-valuemax={of}
        aria-valuenow={value}
        aria-valuetext={where}
        className="flex-none"
      >
        <rect x="1" y="2" width={part * (WIDTH - 2)} height="7" fill="var(--ink)" />
        <path d={`M1 9H${WIDTH - 1}`} stroke="var(--line)" />
        {Array.from({ length: TICKS + 1 }, (_, tick) => (
          <path
            key={tick}
            d={`M${1 + (tick / TICKS) * (WIDTH - 2)} 9v${tick % 5 === 0 ? 5 : 3}`}
            stroke="var(--line)"
          />
        ))}
      </svg>
      <span className="text-quiet">{where}</span>
    </div>
  );
}
