import type { Stage } from '@/lib/batches/stage';
import { StageMark } from './marks';
import { STAGE_TONES, STAGE_WORDS } from './stages';

/** Mark and word, where the thing beside it already has a name. */
export function StageWord({ stage, says }: { stage: Stage; says?: string }) {
  return (
    <span
      className={`inline-flex items-center gap-1.5 font-cond text-word whitespace-nowrap text-(--ti) ${STAGE_TONES[stage]}`}
    >
      <StageMark stage={stage} />
      {says ?? STAGE_WORDS[stage]}
    </span>
  );
}
