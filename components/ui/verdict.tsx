import { type Verdict, VerdictMark } from './marks';

const WORDS: Record<Verdict, string> = {
  meets: 'meets',
  does_not_meet: 'does not meet',
  not_stated: 'not stated',
  cannot_tell: 'cannot tell',
  to_decide: 'to decide',
};
const TONES: Record<Verdict, string> = {
  meets: 'text-proved-ink',
  does_not_meet: 'text-held-ink',
  not_stated: 'text-dispatched-ink',
  cannot_tell: 'text-returned-ink',
  to_decide: 'text-faint',
};

interface VerdictProps {
  verdict: Verdict;
  /** Other words for the same mark: "agrees" on an invoice line. */
  says?: string;
  /** The verdict was overruled: it stays readable, struck, with the reason beneath. */
  overruled?: { to: Verdict; reason: string };
}

export function VerdictWord({ verdict, says, overruled }: VerdictProps) {
  if (overruled) {
    return (
      <span className="inline-block">
        <del className="opacity-80">
          <Word verdict={verdict} {...(says ? { says } : {})} />
        </del>{' '}
        <Word verdict={overruled.to} />
        <span className="block text-source text-quiet">{overruled.reason}</span>
      </span>
    );
  }
  return <Word verdict={verdict} {...(says ? { says } : {})} />;
}

function Word({ verdict, says }: Pick<VerdictProps, 'verdict' | 'says'>) {
  return (
    <span
      className={`inline-flex items-center gap-1.5 font-cond text-word whitespace-nowrap ${TONES[verdict]}`}
    >
      <VerdictMark verdict={verdict} />
      {says ?? WORDS[verdict]}
    </span>
  );
}
