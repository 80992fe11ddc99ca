import { placeOf, ticksOf } from '@/components/plots/scale';
import type { TemperColourRow } from '@/lib/trade/tables/temper-colours';

import { inUnits, type BenchUnits } from './bench-units';
import { celsiusFromFahrenheit } from '@/lib/trade/units/temperature';

const WIDTH = 720;
const FROM_F = 380;
const TO_F = 660;
/** Paint for the strip, by temperature in °F: an impression of the colour, not a standard to compare with. */
const PAINT: readonly (readonly [atF: number, colour: string])[] = [
  [380, '#e9e3cd'],
  [430, '#e6d08a'],
  [460, '#d9b44a'],
  [500, '#a8702f'],
  [520, '#8b4f45'],
  [540, '#6a4580'],
  [575, '#2f5f95'],
  [610, '#7d9fc0'],
  [640, '#7d8a90'],
  [660, '#6f7c82'],
];

interface ColourStripProps {
  rows: readonly TemperColourRow[];
  units: BenchUnits;
  atC: number | null;
}

/** The colours of one list along the temperature, as a strip. */
export function ColourStrip({ rows, units, atC }: ColourStripProps) {
  const shown = (atF: number) => Math.round(inUnits(celsiusFromFahrenheit(atF), 'temperature', units));
  const axis = {
    from: shown(FROM_F),
    to: shown(TO_F),
    ticks: ticksOf(shown(FROM_F), shown(TO_F), 8),
    says: '',
  };
  const across = placeOf(axis, [2, WIDTH - 2]);
  const asked = atC === null ? null : inUnits(atC, 'temperature', units);
  const isDrawn = asked !== null && asked >= axis.from && asked <= axis.to;
  return (
    <div className="overflow-x-auto">
      <svg
        viewBox={`0 0 ${WIDTH} 128`}
        role="img"
        aria-label="Oxide colours along the temperature; the table has the numbers"
        className="h-auto w-full max-w-[720px] max-sm:min-w-[640px]"
      >
        <defs>
          <linearGradient id="oxide">
            {PAINT.map(([atF, colour]) => (
              <stop key={atF} offset={(atF - FROM_F) / (TO_F - FROM_F)} stopColor={colour} />
            ))}
          </linearGradient>
        </defs>
        <rect x="2" y="8" width={WIDTH - 4} height="38" fill="url(#oxide)" />
        <path d={`M2 46H${WIDTH - 2}`} stroke="var(--ink)" strokeWidth="1.5" />
        {rows.map(({ colour, temperatureF }, at) => (
          <g key={colour}>
            <path
              d={`M${across(shown(temperatureF)).toFixed(1)} 46V${54 + 16 * (at % 4)}`}
              stroke="var(--ink)"
            />
            <text
              x={across(shown(temperatureF)).toFixed(1)}
              y={66 + 16 * (at % 4)}
              textAnchor="middle"
              fill="var(--ink)"
              className="font-cond text-source"
            >
              {colour} {shown(temperatureF)}
            </text>
          </g>
        ))}
        {isDrawn && <path d={`M${across(asked).toFixed(1)} 2V50`} stroke="var(--paper)" strokeWidth="5" />}
        {isDrawn && <path d={`M${across(asked).toFixed(1)} 2V50`} stroke="var(--ink)" strokeWidth="2" />}
      </svg>
    </div>
  );
}
