import { BatchTag } from '@/components/ui/tag';
import { daysBetween, dayWords, shortDayWords, timeWords } from '@/lib/day-words';
import type { Tideline, TidelineBatch } from '@/lib/tideline/contract';
import { phoneGroups } from '@/lib/tideline/phone-groups';

const LONGEST_STEM_DAYS = 20;
/** Rows are of one height, so that a stem knows how far it is to the line. */
const ROW_REM = 4.25;
/** More than these would run into the words at the left. */
const MOST_STEMS = 3;

/** The vertical form: held and late above the line of today, with a rung a day down to it; below, when the rest comes back. */
export function PhoneTideline({ tideline }: { tideline: Tideline }) {
  const { above, below } = phoneGroups(tideline);
  const names = new Map(tideline.lanes.map((lane) => [lane.processorId, lane.name]));
  const clock = { zone: tideline.zone, now: new Date(tideline.now) };
  return (
    <div className="-mx-4">
      {above.length > 0 && (
        <ol aria-label="Held and late" className="bg-bench px-4 pt-3">
          {above.map(({ batch, late }, at) => (
            <PhoneRow
              key={batch.id}
              batch={batch}
              processor={names.get(batch.processorId) ?? ''}
              late={late}
              stem={stemOf(above, at)}
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
          <h2 className="flex items-center gap-3 pb-1.5 text-sub font-semibold text-quiet after:h-px after:flex-1 after:bg-rule">
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
  stem?: { at: number; rows: number } | null;
}

function PhoneRow({ batch, processor, late, first, second, stem }: PhoneRowProps) {
  return (
    <li
      className="relative grid grid-cols-[5.25rem_minmax(0,1fr)] gap-x-2"
      style={{ height: `${ROW_REM}rem` }}
    >
      <div>
        <p className={`font-cond text-sub font-semibold ${late > 0 ? 'text-held-ink' : ''}`}>{first}</p>
        <p className="num text-quiet">{second}</p>
      </div>
      {stem && <Stem days={late} {...stem} />}
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

/** Which stem of the late ones it is, and how many rows it goes down. */
function stemOf(above: readonly { late: number }[], row: number): { at: number; rows: number } | null {
  const at = above.slice(0, row).filter(({ late }) => late > 0).length;
  return (above[row]?.late ?? 0) > 0 && at < MOST_STEMS ? { at, rows: above.length - row } : null;
}

/** From the tag down to the line of today, one rung a day; over twenty days it is broken. */
function Stem({ days, at, rows }: { days: number; at: number; rows: number }) {
  const rungs = Math.min(days, LONGEST_STEM_DAYS);
  return (
    <span
      aria-hidden="true"
      className="absolute top-1 w-1.5 border-l border-held-ink"
      style={{
        left: `${4.75 - at * 0.5}rem`,
        height: `${rows * ROW_REM - 0.25}rem`,
        backgroundImage: `repeating-linear-gradient(var(--held-ink) 0 1px, transparent 1px calc(100% / ${rungs}))`,
      }}
    >
      {days > LONGEST_STEM_DAYS && (
        <span className="absolute top-1/2 -left-1 h-1.5 w-3 -rotate-12 border-y border-held-ink bg-bench" />
      )}
    </span>
  );
}
