import { BatchTag } from '@/components/ui/tag';
import { dayWords, shortDayWords, timeWords } from '@/lib/day-words';
import type { Tideline, TidelineBatch } from '@/lib/tideline/contract';
import { daysBetween } from '@/lib/tideline/lateness';
import { phoneGroups } from '@/lib/tideline/phone-groups';

const LONGEST_STEM_DAYS = 20;

/** The vertical form: held and late above the line of today, with a rung a day down to it; below, when the rest comes back. */
export function PhoneTideline({ tideline }: { tideline: Tideline }) {
  const { above, below } = phoneGroups(tideline);
  const names = new Map(tideline.lanes.map((lane) => [lane.processorId, lane.name]));
  const clock = { zone: tideline.zone, now: new Date(tideline.now) };
  return (
    <div className="-mx-4">
      {above.length > 0 && (
        <ol aria-label="Held and late" className="bg-bench px-4 pt-3">
          {above.map(({ batch, late }) => (
            <PhoneRow
              key={batch.id}
              batch={batch}
              processor={names.get(batch.processorId) ?? ''}
              late={late}
              first={late > 0 ? `${late} d late` : heldWords(batch, tideline)}
              second={
                batch.stage === 'held'
                  ? (batch.nonconformance?.number ?? '')
                  : shortDayWords(batch.promisedOn ?? tideline.today, clock)
              }
            />
          ))}
        </ol>
      )}
      <p className="border-t-2 border-ink">
        <span className="inline-block bg-ink px-4 font-cond text-sub font-semibold text-paper">
          {dayWords(tideline.today, clock)}{' '}
          <span className="num" suppressHydrationWarning>
            {timeWords(clock.now, tideline.zone)}
          </span>
        </span>
      </p>
      {below.map((group) => (
        <section key={group.name} aria-label={group.name} className="px-4 pt-3">
          <h2 className="flex items-center gap-3 text-sub font-semibold text-quiet after:h-px after:flex-1 after:bg-rule">
            {group.name}
          </h2>
          <ol>
            {group.batches.map((batch) => (
              <PhoneRow
                key={batch.id}
                batch={batch}
                processor={names.get(batch.processorId) ?? ''}
                late={0}
                {...whenWords(batch, tideline)}
              />
            ))}
          </ol>
        </section>
      ))}
    </div>
  );
}

const heldWords = (batch: TidelineBatch, { today }: Tideline): string =>
  batch.heldSince === null ? 'held' : `held ${daysBetween(batch.heldSince, today)} d`;

function whenWords(batch: TidelineBatch, tideline: Tideline): { first: string; second: string } {
  const clock = { zone: tideline.zone, now: new Date(tideline.now) };
  const short = (day: string | null) => (day === null ? '' : shortDayWords(day, clock));
  if (batch.stage === 'building') return { first: 'leaves', second: short(batch.leavesOn) };
  if (!['dispatched', 'at_processor'].includes(batch.stage))
    return { first: 'back', second: short(batch.lastBackOn) };
  if (batch.promisedOn === null) return { first: 'sent', second: short(batch.dispatchedOn) };
  const days = daysBetween(tideline.today, batch.promisedOn);
  return { first: days === 0 ? 'today' : `in ${days} d`, second: short(batch.promisedOn) };
}

interface PhoneRowProps {
  batch: TidelineBatch;
  processor: string;
  late: number;
  first: string;
  second: string;
}

function PhoneRow({ batch, processor, late, first, second }: PhoneRowProps) {
  return (
    <li className="relative grid grid-cols-[84px_minmax(0,1fr)] gap-x-2 pb-3">
      <div>
        <p className={`font-cond text-sub font-semibold ${late > 0 ? 'text-held-ink' : ''}`}>{first}</p>
        <p className="num text-quiet">{second}</p>
      </div>
      {late > 0 && <Stem days={late} />}
      <div className="min-w-0">
        <BatchTag
          stage={batch.stage}
          number={batch.number}
          href={`/batches/${batch.id}`}
          size="phone"
          text={batch.contents}
          daysLate={late || undefined}
          wide
        />
        <p className="truncate text-body text-quiet">
          {processor}
          {batch.assembly && (
            <>
              , for <strong className="font-cond text-ink">{batch.assembly.name}</strong>
            </>
          )}
        </p>
      </div>
    </li>
  );
}

/** One rung a day beside the tag; over twenty days the stem is broken. */
function Stem({ days }: { days: number }) {
  const rungs = Math.min(days, LONGEST_STEM_DAYS);
  const path = Array.from({ length: rungs }, (_, at) => `M0 ${2 + (at * 44) / Math.max(rungs, 1)}h6`).join(
    '',
  );
  return (
    <svg aria-hidden="true" width="8" height="48" className="absolute top-1 left-[74px]">
      <path d={`M0.5 2V46${path}`} fill="none" stroke="var(--held-ink)" />
      {days > LONGEST_STEM_DAYS && <path d="M-3 26l8 -4M-3 30l8 -4" stroke="var(--bench)" strokeWidth="3" />}
    </svg>
  );
}
