'use client';
import { useEffect, useMemo, useState } from 'react';

import { Button } from '@/components/ui/button';
import { dayWords, timeWords } from '@/lib/day-words';
import type { Tideline } from '@/lib/tideline/contract';
import { layOut } from '@/lib/tideline/lay-out';
import { DAY_WIDTHS, scaleFor, type DayWidth } from '@/lib/tideline/scale';

import { walkTags } from './walk-tags';
import { Lane } from './lane';
import { DayTicks, Ground } from './ground';
import { useWidth } from './use-width';

const LABEL_PX = 204;
const FIRST_WIDTH_PX = 1188;
const MOVES_EVERY_MS = 15 * 60_000;

/** Lanes of tags over the days. The lanes are lists of links; ticks, ground and strings are drawings hidden from readers. */
export function TidelinePlot({ tideline }: { tideline: Tideline }) {
  const [box, boxPx] = useWidth<HTMLDivElement>(FIRST_WIDTH_PX + LABEL_PX);
  const [dayPx, setDayPx] = useState<DayWidth>(18);
  const now = useQuarterHour(tideline.now);
  const scale = useMemo(
    () =>
      scaleFor({
        widthPx: Math.max(boxPx - LABEL_PX, 400),
        dayPx,
        today: tideline.today,
        dayShare: shareOfDay(now, tideline.zone),
      }),
    [boxPx, dayPx, now, tideline.today, tideline.zone],
  );
  const lanes = useMemo(() => layOut(tideline, scale), [tideline, scale]);
  const height = lanes.reduce((sum, lane) => sum + lane.height, 0);
  const zoom = (by: number) =>
    setDayPx(DAY_WIDTHS[Math.min(Math.max(DAY_WIDTHS.indexOf(dayPx) + by, 0), DAY_WIDTHS.length - 1)] ?? 18);

  return (
    <div ref={box} className="relative overflow-hidden" onKeyDown={walkTags}>
      <div className="absolute top-0 left-0 z-10 flex gap-1 print:hidden">
        <Button
          size="small"
          shortcut="-"
          onClick={() => zoom(-1)}
          aria-label="Show more days"
          notNow={dayPx === DAY_WIDTHS[0] ? 'All days are shown' : undefined}
          reasonAt="elsewhere"
        >
          −
        </Button>
        <Button
          size="small"
          shortcut="+"
          onClick={() => zoom(1)}
          aria-label="Show fewer days"
          notNow={dayPx === DAY_WIDTHS.at(-1) ? 'As near as it goes' : undefined}
          reasonAt="elsewhere"
        >
          +
        </Button>
      </div>
      <div className="relative" style={{ marginLeft: LABEL_PX, height: 48 }}>
        <DayTicks scale={scale} />
        <p
          className="text-tag absolute top-0 z-10 bg-ink px-2 font-cond leading-[21px] font-semibold whitespace-nowrap text-paper"
          style={{ left: scale.todayX - 1 }}
          suppressHydrationWarning
        >
          {dayWords(tideline.today, { zone: tideline.zone, now })}{' '}
          <span className="num" suppressHydrationWarning>
            {timeWords(now, tideline.zone)}
          </span>
        </p>
      </div>
      <div className="relative border-y-heavy border-ink" style={{ height: height + 3 }}>
        <div className="absolute inset-y-0 right-0" style={{ left: LABEL_PX }}>
          <Ground scale={scale} height={height} />
        </div>
        <ol className="relative" aria-label="Processors">
          {lanes.map((lane) => (
            <Lane key={lane.processorId} lane={lane} tideline={tideline} scale={scale} labelPx={LABEL_PX} />
          ))}
        </ol>
      </div>
    </div>
  );
}

/**
 * The line moves every quarter of an hour. It starts at the server's time, so that both draw the same first
 * picture; where browser and server know different rules of a zone, the clock on it is the browser's.
 */
function useQuarterHour(serverNow: string): Date {
  const [now, setNow] = useState(() => new Date(serverNow));
  useEffect(() => {
    const timer = setInterval(() => setNow(new Date()), MOVES_EVERY_MS);
    return () => clearInterval(timer);
  }, []);
  return now;
}

function shareOfDay(at: Date, zone: string): number {
  const [hours = 0, minutes = 0] = timeWords(at, zone).split(':').map(Number);
  return (hours * 60 + minutes) / 1440;
}
