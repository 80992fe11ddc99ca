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

  return (
    <div ref={box} className="relative overflow-hidden" onKeyDown={walkTags}>
      <Zoom dayPx={dayPx} onChange={setDayPx} />
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

const ZOOMS = [
  { key: '-', sign: '−', says: 'Show more days', by: -1, end: 'All days are shown' },
  { key: '+', sign: '+', says: 'Show fewer days', by: 1, end: 'As near as it goes' },
] as const;

/** Two small presses that are also keys; each shows its one sign. */
function Zoom({ dayPx, onChange }: { dayPx: DayWidth; onChange: (dayPx: DayWidth) => void }) {
  const at = DAY_WIDTHS.indexOf(dayPx);
  return (
    <div className="absolute top-0 left-0 z-10 flex items-center gap-1 font-cond text-caption text-quiet print:hidden">
      <span className="pr-1">Days</span>
      {ZOOMS.map(({ key, sign, says, by, end }) => {
        const next = DAY_WIDTHS[at + by];
        return (
          <Button
            key={key}
            size="small"
            data-key={key}
            aria-keyshortcuts={key}
            aria-label={says}
            onClick={() => {
              if (next !== undefined) onChange(next);
            }}
            notNow={next === undefined ? end : undefined}
            reasonAt="elsewhere"
          >
            <span aria-hidden="true" className="num">
              {sign}
            </span>
          </Button>
        );
      })}
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
