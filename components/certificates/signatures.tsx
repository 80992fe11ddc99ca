'use client';
import { useClock } from '@/components/session/use-me';
import { Moment } from '@/components/ui/day';
import { VerdictMark } from '@/components/ui/marks';
import { Section } from '@/components/ui/section';

import { hashStart } from './certificate-words';
import type { Proving } from './use-proving';

/** Who signed for what, and that what was sealed is still what was signed. */
export function Signatures({ proving: { data } }: { proving: Proving }) {
  const clock = useClock();
  if (data.signatures.length === 0) return null;
  return (
    <Section title="Signed" className="pt-6">
      {data.signatures.map((signature) => (
        <div key={signature.id} className="border-b border-rule py-2">
          <p>
            <strong>{signature.signerName}</strong> for{' '}
            {signature.coverage.map((line, at) => (
              <span key={line.lineNo}>
                {at > 0 && ', '}
                <span className="num font-semibold">{line.pieces}</span> on line {line.lineNo}
              </span>
            ))}
            , <Moment at={new Date(signature.signedAt)} clock={clock} />
            {signature.reviewSeconds !== null && (
              <span className="text-quiet">
                , after {Math.max(1, Math.round(signature.reviewSeconds / 60))} min
              </span>
            )}
          </p>
          <p className="text-second text-quiet">“{signature.sentence}”</p>
          <p
            className={`flex items-center gap-1.5 text-second ${signature.intact ? 'text-proved-ink' : 'text-held-ink'}`}
          >
            <VerdictMark verdict={signature.intact ? 'meets' : 'does_not_meet'} size={13} />
            {signature.intact ? 'The seal holds:' : 'What is kept is not what was sealed:'}{' '}
            <span className="num [overflow-wrap:anywhere]">{hashStart(signature.seal)}</span>
          </p>
        </div>
      ))}
    </Section>
  );
}
