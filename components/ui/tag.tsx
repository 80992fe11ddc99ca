import Link from 'next/link';
import type { Stage } from '@/lib/batches/stage';
import { StageMark } from './marks';
import { STAGE_TONES, STAGE_WORDS } from './stages';

export type TagSize = 'head' | 'phone' | 'list' | 'tideline' | 'row';

export interface BatchTagProps {
  stage: Stage;
  number: string;
  href?: string | undefined;
  /** What is in it ("41 chine angles"); cut with an ellipsis when room is short. */
  text?: string | undefined;
  size?: TagSize | undefined;
  /** When room is short the text goes first, then the word, then the number; a reader still hears all three. */
  show?: 'all' | 'word' | 'number' | 'mark' | undefined;
  /** What a reader hears after the rest: "holds up Left float 17". */
  sentence?: string | undefined;
  daysLate?: number | undefined;
  fading?: boolean | undefined;
  /** As wide as the room it stands in, as on the tideline and a phone. */
  wide?: boolean | undefined;
}

const SIZES: Record<TagSize, string> = {
  head: 'lw-tag-head',
  phone: 'lw-tag-phone',
  list: '',
  tideline: 'lw-tag-tideline',
  row: 'lw-tag-row',
};
const MARKS: Record<TagSize, number> = { head: 22, phone: 15, list: 13, tideline: 13, row: 12 };

/** A batch, wherever it appears. */
export function BatchTag({ href, wide = false, ...tag }: BatchTagProps) {
  if (!href) return <Tag {...tag} wide={wide} />;
  return (
    <Link href={href} className={`lw-tag-link ${wide ? 'w-full' : ''}`}>
      <Tag {...tag} wide={wide} />
    </Link>
  );
}

function Tag({
  stage,
  number,
  text,
  size = 'list',
  show = 'all',
  wide,
  fading,
  ...heard
}: Omit<BatchTagProps, 'href'>) {
  const shown = { mark: 0, number: 1, word: 2, all: 3 }[show];
  const classes = [
    'lw-tag',
    SIZES[size],
    STAGE_TONES[stage],
    wide ? 'w-full' : '',
    fading ? 'lw-tag-fading' : '',
  ];
  return (
    <span className={classes.filter(Boolean).join(' ')}>
      <StageMark stage={stage} size={MARKS[size]} className="lw-tag-mark" />
      <span className={shown >= 1 ? 'lw-tag-number' : 'sr-only'}>{number}</span>
      <span className="sr-only">, </span>
      <span className={shown >= 2 ? 'lw-tag-word' : 'sr-only'}>{STAGE_WORDS[stage]}</span>
      {text && (
        <>
          <span className="sr-only">, </span>
          <span className={shown >= 3 ? 'lw-tag-text' : 'sr-only'}>{text}</span>
        </>
      )}
      <span className="sr-only">{remainder(heard)}</span>
    </span>
  );
}

function remainder({ daysLate, sentence }: Pick<BatchTagProps, 'daysLate' | 'sentence'>): string {
  const late = daysLate ? `, ${daysLate} ${daysLate === 1 ? 'day' : 'days'} late` : '';
  return `${late}${sentence ? `, ${sentence}` : ''}`;
}
