import Link from 'next/link';

import { daysBetween, shortDayWords } from '@/lib/day-words';
import { PROCESS_WORDS, type Process } from '@/lib/trade/process';
import type { Tideline, TidelineLane } from '@/lib/tideline/contract';
import type { PlacedLane } from '@/lib/tideline/lay-out';
import type { Scale } from '@/lib/tideline/scale';

import { LaneStrings } from './lane-strings';
import { SlipLink } from './slip-link';
import { TagLink } from './tag-link';

const ENDS_SOON_DAYS = 30;

interface LaneProps {
  lane: PlacedLane;
  tideline: Tideline;
  scale: Scale;
  labelPx: number;
}

/** One processor's lane: its label, and its batches from the day out to the day promised. */
export function Lane({ lane, tideline, scale, labelPx }: LaneProps) {
  const processor = tideline.lanes.find((one) => one.processorId === lane.processorId);
  if (!processor) return null;
  return (
    <li className="relative border-b border-rule last:border-0" style={{ height: lane.height }}>
      <div className="absolute inset-y-0 left-0 overflow-hidden py-1.5 pr-3" style={{ width: labelPx }}>
        <LaneLabel processor={processor} tideline={tideline} room={lane.height} />
      </div>
      <div className="absolute inset-y-0 right-0" style={{ left: labelPx }}>
        <LaneStrings tags={lane.tags} width={scale.widthPx} height={lane.height} scale={scale} />
        <ol aria-label={`Batches at ${processor.name}`}>
          {lane.tags.map((tag) => (
            <TagLink key={tag.batch.id} tag={tag} scale={scale} zone={tideline.zone} today={tideline.today} />
          ))}
          {lane.slips.map((slip) => (
            <SlipLink key={slip.batch.id} slip={slip} />
          ))}
        </ol>
        {lane.moreLate > 0 && (
          <Link href="/?view=list" className="lw-word-button absolute right-0 bottom-1">
            +{lane.moreLate} more late
          </Link>
        )}
      </div>
    </li>
  );
}

interface LaneLabelProps {
  processor: TidelineLane;
  tideline: Tideline;
  /** Pixels from top to bottom: a low lane says less. */
  room: number;
}

function LaneLabel({ processor, tideline, room }: LaneLabelProps) {
  const here = tideline.batches.filter((batch) => batch.processorId === processor.processorId);
  const out = here.filter((batch) => ['dispatched', 'at_processor'].includes(batch.stage)).length;
  const back = here.filter((batch) => ['returned', 'proved', 'settled'].includes(batch.stage)).length;
  const held = here.filter((batch) => batch.stage === 'held').length;
  const pieces = here.reduce((sum, batch) => sum + batch.pieces, 0);
  const counts = [
    out > 0 && `${out} out`,
    back > 0 && `${back} back`,
    held > 0 && `${held} held`,
    `${pieces} pc`,
  ]
    .filter(Boolean)
    .join(', ');
  const clock = { zone: tideline.zone, now: new Date(tideline.now) };
  const endsSoon =
    processor.approvedTo !== null && daysBetween(tideline.today, processor.approvedTo) <= ENDS_SOON_DAYS;
  return (
    <>
      <h2 className="truncate text-sub font-semibold">
        <Link href={`/processors/${processor.processorId}`} className="no-underline hover:underline">
          {processor.name}
        </Link>
      </h2>
      {room >= 92 && (
        <p className="truncate font-cond text-caption text-quiet">{processWords(processor.processes)}</p>
      )}
      <p className="font-cond text-caption text-quiet">{counts}</p>
      {processor.approvedTo !== null && (room >= 62 || endsSoon) && (
        <p
          className={`font-cond ${endsSoon ? 'text-tag font-semibold text-dispatched-ink' : 'text-caption text-quiet'}`}
        >
          {processor.approvedTo < tideline.today ? 'approval ended' : 'approved to'}{' '}
          {shortDayWords(processor.approvedTo, clock)}
        </p>
      )}
    </>
  );
}

const processWords = (processes: readonly string[]): string =>
  processes.map((name) => PROCESS_WORDS[name as Process] ?? name).join(', ');
