import { holdingClock, type ColdStay, type HoldingClock } from '@/lib/trade/heat-treat/holding-clock';
import { HOLDING_LIMITS } from '@/lib/trade/tables/holding-limits';

import { Answer, NoAnswer } from './answer';
import { momentWords, onTheWall, readMoment, spanWords, zoneWords } from './bench-moment';
import { choiceOf } from './choice-of';
import { HELD, readZone, type HoldingBench } from './holding-fields';
import { holdingRefusal } from './holding-words';
import { RunningTime } from './running-time';
import { SourceLine } from './source-line';
import { useNow } from './use-now';

const MS_PER_MIN = 60_000;

/** How long it may lie, and once it is quenched, the clock. */
export function Holding({ bench: { typed, read } }: { bench: HoldingBench }) {
  const now = useNow();
  const alloy = choiceOf(HELD, typed.alloy, '2024');
  const [quenchedAt, putInAt, takenOutAt] = [typed.quenched, typed.putIn, typed.takenOut].map(readMoment);
  const temperatureC = read('store');
  if (temperatureC === null) return <NoAnswer says="Enter how cold the store is." />;
  if (!quenchedAt) return <Limits alloy={alloy} temperatureC={temperatureC} />;
  const stays: ColdStay[] = putInAt ? [{ putInAt, temperatureC, ...(takenOutAt && { takenOutAt }) }] : [];
  const clock = holdingClock(HOLDING_LIMITS, { alloy, quenchedAt, stays });
  if (!clock.ok)
    return (
      <>
        <NoAnswer says={holdingRefusal(clock.reason)} />
        {clock.source && <SourceLine source={clock.source} />}
      </>
    );
  const isCold = clock.where === 'in_the_cold';
  const zone = readZone(typed.zone);
  const onWall = now && onTheWall(now, zone ?? -now.getTimezoneOffset());
  const into = onWall && !isCold && onWall >= clock.since ? onWall : null;
  return (
    <>
      {onWall && (
        <RunningTime
          begins={clock.since}
          ends={clock.endsAt}
          now={onWall}
          says={isCold ? 'In the cold' : 'At room temperature'}
        />
      )}
      <Answer
        good={null}
        says={`Until ${momentWords(clock.endsAt)}`}
        rest={`${isCold ? 'in the cold' : 'at room temperature'}; then it is treated again, or aged as it is${
          zone === null ? '' : `; times in ${zoneWords(zone)}`
        }`}
      />
      {into && (
        <IfColdNow
          clock={holdingClock(HOLDING_LIMITS, {
            alloy,
            quenchedAt,
            stays: [...stays, { putInAt: into, temperatureC }],
          })}
        />
      )}
      <Spent clock={clock} now={onWall} />
      <SourceLine source={clock.source} readFrom={clock.readFrom} />
    </>
  );
}

/** Before anything is quenched: what the clock will give. */
function Limits({ alloy, temperatureC }: { alloy: (typeof HELD)[number]; temperatureC: number }) {
  const at = new Date(0);
  const limits = holdingClock(HOLDING_LIMITS, {
    alloy,
    quenchedAt: at,
    stays: [{ putInAt: at, temperatureC }],
  });
  if (!limits.ok) return <NoAnswer says={holdingRefusal(limits.reason)} />;
  return (
    <>
      <Answer
        good={null}
        says={`${spanWords(limits.roomLimitMin)} at room temperature`}
        rest={limits.coldLimitMin !== null && `${spanWords(limits.coldLimitMin)} in this store`}
      />
      <p>Say when the last piece went under, and the clock runs.</p>
      <SourceLine source={limits.source} readFrom={limits.readFrom} />
    </>
  );
}

/** What the cold would give, if it went in at this minute. */
function IfColdNow({ clock }: { clock: ReturnType<typeof holdingClock> }) {
  return (
    <p>
      {clock.ok ? (
        <>
          Into the cold now, it keeps until <strong className="num">{momentWords(clock.endsAt)}</strong>.
        </>
      ) : (
        `Into the cold now: ${holdingRefusal(clock.reason)}`
      )}
    </p>
  );
}

/** What is used up of each time; the one that runs counts on. */
function Spent({ clock, now }: { clock: HoldingClock; now: Date | null }) {
  const { where, since, roomUsedMin, roomLimitMin, coldUsedMin, coldLimitMin } = clock;
  const running = now ? Math.max(0, (now.getTime() - since.getTime()) / MS_PER_MIN) : 0;
  const [room, cold] = where === 'in_the_cold' ? [0, running] : [running, 0];
  return (
    <dl className="grid max-w-[720px] grid-cols-[auto_1fr_auto] items-center gap-x-3 gap-y-2 py-2">
      <Bar says="Room" used={roomUsedMin + room} limit={roomLimitMin} />
      {coldLimitMin !== null && <Bar says="Cold" used={coldUsedMin + cold} limit={coldLimitMin} />}
    </dl>
  );
}

function Bar({ says, used, limit }: { says: string; used: number; limit: number }) {
  return (
    <>
      <dt className="font-cond text-word">{says}</dt>
      <dd className="h-4 border border-ink bg-paper">
        <span
          className="block h-full bg-dispatched"
          style={{ width: `${Math.min(100, (100 * used) / limit)}%` }}
        />
      </dd>
      <dd className="num">
        {spanWords(Math.floor(used))} of {spanWords(limit)}
      </dd>
    </>
  );
}
