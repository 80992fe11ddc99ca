import { fittingAngles, neededAt, radians, type Sides } from './fit-angles';

interface FitDrawingProps {
  blank: Sides;
  tank: Sides;
  freeMm: number;
  lies: 'straight' | 'diagonally' | null;
  says: (value: number, kind: 'length') => string;
}

const WIDTH = 720;
const MARGIN = 44;

/** The blank in the tank, to scale and dimensioned; where it does not fit, laid straight and sticking out. */
export function FitDrawing({ blank, tank, freeMm, lies, says }: FitDrawingProps) {
  const [a, b] = [Math.max(tank.lengthMm, tank.widthMm), Math.min(tank.lengthMm, tank.widthMm)];
  const [p, q] = [Math.max(blank.lengthMm, blank.widthMm), Math.min(blank.lengthMm, blank.widthMm)];
  const inside = { lengthMm: a - 2 * freeMm, widthMm: b - 2 * freeMm };
  const angles = lies === 'diagonally' ? fittingAngles(blank, inside) : null;
  const degrees = angles ? (angles.from + angles.to) / 2 : 0;
  const needed = neededAt(blank, radians(degrees));
  // Rounded, because server and browser differ in the last digit of a cosine and must draw the same.
  const scale = round((WIDTH - 2 * MARGIN) / Math.max(a, needed.along), 1e6);
  const height = round(Math.max(b, needed.across) * scale + 2 * MARGIN, 10);
  const [left, top] = [(WIDTH - a * scale) / 2, (height - b * scale) / 2];
  const fits = lies !== null;
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${Math.round(height)}`}
      role="img"
      aria-label={`Drawing to scale: the blank ${fits ? 'in' : 'over'} the tank`}
      className="h-auto w-full max-w-[720px]"
    >
      <rect
        x={left}
        y={top}
        width={a * scale}
        height={b * scale}
        fill="var(--bench)"
        stroke="var(--ink)"
        strokeWidth="2.2"
      />
      <rect
        x={left + freeMm * scale}
        y={top + freeMm * scale}
        width={Math.max(0, inside.lengthMm * scale)}
        height={Math.max(0, inside.widthMm * scale)}
        fill="none"
        stroke="var(--stocked-ink)"
        strokeDasharray="4 3"
      />
      <g transform={`translate(${WIDTH / 2} ${height / 2}) rotate(${-round(degrees, 100)})`}>
        <rect
          x={(-p * scale) / 2}
          y={(-q * scale) / 2}
          width={p * scale}
          height={q * scale}
          fill={fits ? 'var(--paper)' : 'var(--held-wash)'}
          stroke={fits ? 'var(--ink)' : 'var(--held-ink)'}
          strokeWidth="1.6"
          strokeDasharray={fits ? undefined : '5 3'}
        />
        <text textAnchor="middle" y="4" fill="var(--ink)" className="font-cond text-source font-semibold">
          blank {says(p, 'length')} × {says(q, 'length')}
        </text>
      </g>
      <Dimension from={left} to={left + a * scale} y={Math.max(16, top - 18)} says={says(a, 'length')} />
      <text
        x={left + a * scale + 8}
        y={top + (b * scale) / 2}
        fill="var(--ink)"
        className="font-mono text-axis"
        transform={`rotate(90 ${left + a * scale + 8} ${top + (b * scale) / 2})`}
        textAnchor="middle"
      >
        {says(b, 'length')}
      </text>
      {angles && (
        <text x={left + 12} y={top + 22} fill="var(--ink)" className="font-cond text-source">
          at {degrees.toFixed(1)}°, fits from {angles.from.toFixed(1)}° to {angles.to.toFixed(1)}°
        </text>
      )}
    </svg>
  );
}

function Dimension({ from, to, y, says }: { from: number; to: number; y: number; says: string }) {
  return (
    <g stroke="var(--ink)" fill="var(--ink)">
      <path d={`M${from} ${y - 5}v10M${to} ${y - 5}v10M${from} ${y}H${to}`} fill="none" />
      <text x={(from + to) / 2} y={y - 5} textAnchor="middle" stroke="none" className="font-mono text-axis">
        {says}
      </text>
    </g>
  );
}

const round = (value: number, parts: number): number => Math.round(value * parts) / parts;
