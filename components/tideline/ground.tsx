import { shortDayWords } from '@/lib/day-words';
import { daysOf, type Scale } from '@/lib/tideline/scale';

/** Past on bench, weekends deeper, the line of today with four thin waves behind it. */
export function Ground({ scale, height }: { scale: Scale; height: number }) {
  const { widthPx, dayPx, todayX } = scale;
  return (
    <svg aria-hidden="true" width={widthPx} height={height} className="block">
      <rect width={Math.max(0, todayX)} height={height} fill="var(--bench)" />
      {daysOf(scale)
        .filter((day) => day.isWeekend)
        .map((day) => (
          <rect key={day.day} x={day.x} width={dayPx} height={height} fill="var(--deep)" opacity="0.75" />
        ))}
      {[6, 12, 19, 27].map((back, at) => (
        <path
          key={back}
          d={wave(todayX - back, height)}
          fill="none"
          stroke="var(--line)"
          strokeWidth="0.8"
          opacity={0.55 - at * 0.12}
        />
      ))}
      <path d={`M${todayX} 0V${height}`} stroke="var(--ink)" strokeWidth="2" />
    </svg>
  );
}

/** A slow wave down the page, 90 px long. */
function wave(x: number, height: number): string {
  const halves = Math.ceil(height / 45);
  const bends = Array.from({ length: halves }, (_, at) => `q${at % 2 === 0 ? 5 : -5} 22.5 0 45`).join('');
  return `M${x} 0${bends}`;
}

/** Ticks by day, Mondays named; where days are narrow only every second Monday. */
export function DayTicks({ scale }: { scale: Scale }) {
  const mondays = daysOf(scale).filter((day) => day.isMonday);
  const named = scale.dayPx < 12 ? mondays.filter((_, at) => at % 2 === 0) : mondays;
  const clock = { zone: 'UTC', now: new Date(`${scale.today}T12:00:00Z`) };
  return (
    <svg aria-hidden="true" width={scale.widthPx} height="48" className="block">
      <rect width={Math.max(0, scale.todayX)} height="48" fill="var(--bench)" />
      {daysOf(scale).map((day) => (
        <path key={day.day} d={`M${day.x + 0.5} 48v${day.isMonday ? -9 : -4}`} stroke="var(--line)" />
      ))}
      {named.map((day) => (
        <text key={day.day} x={day.x + 3} y="35" fontSize="12.5" className="fill-quiet font-mono">
          {shortDayWords(day.day, clock)}
        </text>
      ))}
    </svg>
  );
}
