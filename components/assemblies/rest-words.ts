import type { AssemblyNeedRow, Wait } from '@/lib/assemblies/contract';
import { type Clock, dayWords, daysUntil } from '@/lib/day-words';
import { PROCESS_WORDS } from '@/lib/trade/process';

export interface RestWords {
  says: string;
  tone?: 'late' | 'held';
}

/** Where the pieces on one batch are: `3 at Galena Thermal until Thu 16 Apr`, `12 back from Galena Thermal, to prove`. */
export function waitWords(
  wait: Pick<Wait, 'stage' | 'processor' | 'promisedOn' | 'packed' | 'away' | 'back' | 'held'>,
  clock: Clock,
): RestWords[] {
  const { stage, processor, promisedOn, packed, away, back, held } = wait;
  const words: RestWords[] = [];
  if (packed > 0) words.push({ says: `${packed} packed for ${processor}` });
  if (away > 0)
    words.push(
      awayWords(`${away} ${stage === 'dispatched' ? 'on the way to' : 'at'} ${processor}`, promisedOn, clock),
    );
  if (back > 0) words.push({ says: `${back} back from ${processor}, ${BACK[stage] ?? 'counted in'}` });
  if (held > 0) words.push({ says: `${held} on hold`, tone: 'held' });
  return words;
}

const BACK: Partial<Record<Wait['stage'], string>> = {
  returned: 'to prove',
  proved: 'proved, to be paid',
  settled: 'to release',
};

function awayWords(start: string, promisedOn: string | null, clock: Clock): RestWords {
  if (promisedOn === null) return { says: `${start}, no date yet` };
  const days = daysUntil(promisedOn, clock);
  if (days < 0)
    return { says: `${start}, promised ${dayWords(promisedOn, clock)}, ${-days} d late`, tone: 'late' };
  return { says: `${start} until ${days === 0 ? 'today' : dayWords(promisedOn, clock)}` };
}

type Need = Pick<AssemblyNeedRow, 'pieces' | 'fitted' | 'inStock' | 'batches' | 'waiting'>;

export const readyOf = ({ fitted, inStock, pieces }: Pick<Need, 'fitted' | 'inStock' | 'pieces'>): number =>
  Math.min(pieces, fitted + inStock);

/** What is in the yard and on no batch: `6 wait for anodize`. */
export const yardWords = ({ waiting }: Pick<Need, 'waiting'>): RestWords[] =>
  waiting.map(({ process, pieces }) => ({
    says: `${pieces} ${pieces === 1 ? 'waits' : 'wait'} for ${PROCESS_WORDS[process]}`,
  }));

/** Pieces that are nowhere yet. Others may need what is under way too, so it is the least there is to make. */
export function stillToMake(need: Need): number {
  const underWay =
    need.batches.reduce((sum, wait) => sum + wait.pieces, 0) +
    need.waiting.reduce((sum, one) => sum + one.pieces, 0);
  return Math.max(0, need.pieces - readyOf(need) - underWay);
}
