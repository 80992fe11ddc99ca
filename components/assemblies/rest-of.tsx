import Link from 'next/link';

import { StageMark } from '@/components/ui/marks';
import { STAGE_TONES, STAGE_WORDS } from '@/components/ui/stages';
import type { Wait } from '@/lib/assemblies/contract';
import type { Clock } from '@/lib/day-words';

import { waitWords, type RestWords } from './rest-words';

const TONES = { late: 'text-held-ink', held: 'text-held-ink' } as const;

/** A batch by its mark and number, where there is no room for its tag. */
export function BatchMark({ wait }: { wait: Pick<Wait, 'id' | 'number' | 'stage'> }) {
  return (
    <Link
      href={`/batches/${wait.id}`}
      className={`inline-flex items-center gap-1 whitespace-nowrap text-(--ti) no-underline hover:underline ${STAGE_TONES[wait.stage]}`}
      aria-label={`${wait.number}, ${STAGE_WORDS[wait.stage]}`}
    >
      <StageMark stage={wait.stage} size={12} />
      <span className="num font-semibold">{wait.number.replace(/^B-/, '')}</span>
    </Link>
  );
}

/** One batch and, in words, where its pieces are. */
export function RestOnBatch({ wait, clock }: { wait: Wait; clock: Clock }) {
  return (
    <span className="block">
      <BatchMark wait={wait} /> <Words words={waitWords(wait, clock)} />
    </span>
  );
}

export function Words({ words }: { words: readonly RestWords[] }) {
  return (
    <span className="font-cond">
      {words.map(({ says, tone }, at) => (
        <span key={says} className={tone ? TONES[tone] : ''}>
          {at > 0 && ', '}
          {says}
        </span>
      ))}
    </span>
  );
}
