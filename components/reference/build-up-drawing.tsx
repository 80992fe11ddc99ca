import type { BuildUpSurface } from '@/lib/trade/tables/build-up';

interface BuildUpDrawingProps {
  surface: BuildUpSurface;
  /** How much of the coating lies outside the former surface, 0 to 1. */
  outward: number;
  before: string;
  after: string;
}

const LAYER = 22;
const FOOT = 170;

/** The metal before, the coating on it and partly in it. Coatings are thin: not to scale, the share that grows is. */
export function BuildUpDrawing({ surface, outward, before, after }: BuildUpDrawingProps) {
  const out = Math.round(Math.min(1, outward) * LAYER);
  const shape = SHAPES[shapeOf(surface)];
  return (
    <div className="overflow-x-auto">
      <svg
        viewBox="0 0 720 236"
        role="img"
        aria-label={`Sketch, not to scale: before the finish ${before}, after it ${after}`}
        className="h-auto w-full max-w-[720px] max-sm:min-w-[520px]"
      >
        <g transform="translate(20 10)">
          <path d={shape(0)} fill="var(--deep)" stroke="var(--ink)" strokeWidth="1.8" fillRule="evenodd" />
          <Under says="before" limits={before} />
        </g>
        <g transform="translate(390 10)">
          <path
            d={shape(out)}
            fill="var(--dispatched-wash)"
            stroke="var(--ink)"
            strokeWidth="1.8"
            fillRule="evenodd"
          />
          <path d={shape(out - LAYER)} fill="var(--deep)" stroke="var(--quiet)" fillRule="evenodd" />
          <path
            d={shape(0)}
            fill="none"
            stroke="var(--dispatched-ink)"
            strokeDasharray="5 3"
            strokeWidth="1.4"
          />
          <Under says="after; dashed: the surface before" limits={after} />
        </g>
      </svg>
    </div>
  );
}

function Under({ says, limits }: { says: string; limits: string }) {
  return (
    <>
      <text x="0" y={FOOT + 26} fill="var(--quiet)" className="font-cond text-source">
        {says}
      </text>
      <text x="0" y={FOOT + 48} fill="var(--ink)" className="font-mono text-row font-semibold">
        {limits}
      </text>
    </>
  );
}

type Shape = 'face' | 'shaft' | 'bore' | 'thread';

function shapeOf(surface: BuildUpSurface): Shape {
  if (surface === 'flat') return 'face';
  if (surface === 'outside_diameter') return 'shaft';
  return surface === 'bore' ? 'bore' : 'thread';
}

const circle = (x: number, y: number, r: number): string =>
  `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0Z`;

/** Outlines with the surface moved outward by so many units; 2 across the flank of 60° is 1 normal to it. */
const SHAPES: Record<Shape, (moved: number) => string> = {
  face: (moved) => `M0 ${80 - moved}H300V${FOOT}H0Z`,
  shaft: (moved) => circle(150, 85, 58 + moved),
  bore: (moved) => `M20 0H280V${FOOT}H20Z${circle(150, 85, 58 - moved)}`,
  thread: (moved) => {
    const top = 46 - 2 * moved;
    const teeth = [0, 1, 2].map((tooth) => {
      const left = tooth * 100;
      return `L${left + 12} ${top + 76}L${left + 50} ${top + 10}L${left + 88} ${top + 76}`;
    });
    return `M0 ${FOOT}V${top + 76}${teeth.join('')}L300 ${top + 76}V${FOOT}Z`;
  },
};
