import type { DrawnChannel } from '@/lib/evidence/chart/drawing-of';
import type { LineLook } from '@/lib/evidence/chart/line-look';

import { strokeOf } from './chart-picture';

interface ChartLegendProps {
  channels: readonly DrawnChannel[];
  looks: readonly LineLook[];
  unit: string;
  /** The row under the cursor; without one the legend says when each came into the band. */
  row: number | null;
}

/** Every line by its name, with its reading under the cursor. */
export function ChartLegend({ channels, looks, unit, row }: ChartLegendProps) {
  return (
    <ul className="flex flex-wrap gap-x-6 gap-y-1 pt-2">
      {channels.map(({ name, says, excluded, values }, at) => {
        const look = looks[at];
        return (
          <li key={`${at} ${name}`} className="flex items-center gap-2 font-cond text-string">
            {look && (
              <svg width="34" height="6" aria-hidden="true">
                <path d="M0 3h34" {...strokeOf(look)} />
              </svg>
            )}
            <span className="text-word">{name}</span>
            {row === null ? (
              <span className="text-quiet">{excluded === null ? says : 'not counted'}</span>
            ) : (
              <span className="num">{readingWords(values[row], unit)}</span>
            )}
          </li>
        );
      })}
    </ul>
  );
}

const readingWords = (value: number | undefined, unit: string): string =>
  value === undefined || !Number.isFinite(value) ? 'no reading' : `${value.toFixed(1)} °${unit}`;
