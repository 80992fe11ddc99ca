import { dayWords } from '@/lib/day-words';
import { CALL_OUT_WORDS } from '@/lib/reference/call-out-words';
import { readDesignation } from '@/lib/trade/finishes/read-designation';
import { callOutFindings } from '@/lib/trade/lineage/call-out-findings';
import { recogniseSpecification } from '@/lib/trade/lineage/recognise-specification';
import type { LineageEventKind } from '@/lib/trade/lineage/lineage-event';
import { standingOn } from '@/lib/trade/lineage/standing-on';
import { successorsOf } from '@/lib/trade/lineage/successors-of';

import type { Check, CheckFacts } from './check';
import type { Finding } from './finding';
import { citing } from './source-words';

/** The specification as the library writes it; null where it does not recognise one. */
function calledOn({ batch }: CheckFacts): { number: string; revision: string | null } | null {
  const found = recogniseSpecification(batch.specification);
  return found && { number: found.number, revision: batch.specificationRevision ?? found.revision };
}

const ENDED: Partial<Record<LineageEventKind, string>> = {
  superseded: 'was superseded',
  withdrawn: 'was withdrawn',
  cancelled: 'was cancelled',
  renamed: 'was renamed',
};

export const isInForce: Check = {
  met: 'no later document is known in place of the specification',
  look(facts) {
    const called = calledOn(facts);
    if (!called) return [];
    const { lineage } = facts.tables;
    const standing = standingOn(lineage, called.number, { on: facts.today, by: 'publisher' });
    const ended = standing.ok ? ENDED[standing.standing] : undefined;
    if (!standing.ok || !ended) return [];
    const next = successorsOf(lineage, called.number, 'parts');
    // Then a later issue of the same document took over, and the order names its issue.
    if (!next.ok && standing.revision !== null && standing.revision !== called.revision) return [];
    const last = next.ok ? next.successors.filter((one) => one.last) : [];
    const names = [...new Set(last.map(({ number }) => number))].join(' or ');
    return [
      {
        code: 'specification_superseded',
        level: 'warn',
        subject: '',
        sentence: `${called.number} ${ended} ${whenWords(standing.since, facts)}.`,
        rest: names
          ? `In its place stands ${names}. The drawing or contract decides which one is ordered.`
          : 'What stands in its place is not recorded here. The drawing or contract decides what is ordered.',
        ...citing(standing.source),
        waysOut: [],
      },
    ];
  },
};

/** A date that may be known only to its year or month. */
const whenWords = (since: string, facts: CheckFacts): string =>
  since.length === 10 ? dayWords(since, facts) : `in ${since}`;

export const meansWhatItSays: Check = {
  met: 'the call-out leaves no doubt that is recorded',
  look(facts) {
    const called = calledOn(facts);
    if (!called) return [];
    const typeStated = readDesignation(facts.batch.classType ?? '').type !== undefined;
    return callOutFindings(facts.tables.callOuts, { ...called, typeStated, forParts: true }).map(
      ({ note, asksEngineering, source }): Finding => ({
        code: `call_out_${note}`,
        level: asksEngineering ? 'warn' : 'note',
        subject: '',
        sentence: `About ${called.number}:`,
        rest: CALL_OUT_WORDS[note],
        ...citing(source),
        waysOut: [],
      }),
    );
  },
};
