import { Numbers } from '@/components/plots/numbers';
import { Button } from '@/components/ui/button';
import { sourceWords } from '@/lib/batches/source-words';
import type { Successor } from '@/lib/trade/lineage/lineage-event';
import { lineageOf, type SourcedEvent } from '@/lib/trade/lineage/lineage-of';
import { standingOn } from '@/lib/trade/lineage/standing-on';
import { alternativesTo, successorsOf } from '@/lib/trade/lineage/successors-of';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';

import { SourceLine } from './source-line';
import {
  AUTHORITY_WORDS,
  COVERAGE_WORDS,
  dateWords,
  EVENT_WORDS,
  type Asked,
  whenWords,
} from './specification-words';

/** What followed a specification, who sees it otherwise, and all that is recorded of it. */
export function Lineage({ asked, onLook }: { asked: Asked; onLook: (number: string) => void }) {
  const { number, on, covers } = asked;
  const next = successorsOf(SPECIFICATION_LINEAGE, number, covers);
  const instead = alternativesTo(SPECIFICATION_LINEAGE, number);
  const known = lineageOf(SPECIFICATION_LINEAGE, number);
  const listed = standingOn(SPECIFICATION_LINEAGE, number, { on, by: 'government_index' });
  return (
    <>
      {listed.ok && (
        <p>
          By {AUTHORITY_WORDS.government_index} it {EVENT_WORDS[listed.standing]} {whenWords(listed.since)}.
        </p>
      )}
      {next.ok && (
        <>
          <h3 className="pt-4">What followed</h3>
          <ol aria-label={`What followed ${number}`}>
            {next.successors.map((one) => (
              <li key={one.number} className="border-b border-rule py-2">
                <strong>{issueWords(one)}</strong>
                {one.last && ', which stands now as far as is recorded'}
                <span className="block text-second">
                  {one.after} {EVENT_WORDS[one.event]}
                  {one.on !== null && ` ${whenWords(one.on)}`}
                  {one.by !== 'publisher' && `, by ${AUTHORITY_WORDS[one.by]}`}
                  {forWords(one)}
                </span>
                <Button look="word" onClick={() => onLook(one.number)}>
                  Look at {one.number}
                </Button>
                <SourceLine source={one.source} />
              </li>
            ))}
          </ol>
          {next.forks && (
            <p className="pt-2 text-dispatched-ink">
              It became several: the drawing or the contract says which one is meant.
            </p>
          )}
        </>
      )}
      {instead.ok && (
        <>
          <h3 className="pt-4">Used instead</h3>
          <p>
            {instead.alternatives.map((one) => `${issueWords(one)}${forWords(one)}`).join('; ')}. This gives
            no leave to substitute.
          </p>
          <SourceLine source={instead.source} readFrom={instead.readFrom} />
        </>
      )}
      {known.ok && (
        <Numbers
          label={`All that is recorded of ${number}`}
          heads={['When', 'Issue', 'What', 'Says', 'In its place', 'Where from, and how sure']}
          rows={known.events.map(cellsOf)}
        />
      )}
    </>
  );
}

const cellsOf = ({ on, revision, event, by, successors = [], source }: SourcedEvent) => [
  on === undefined ? 'no date' : dateWords(on),
  revision ?? '',
  EVENT_WORDS[event],
  AUTHORITY_WORDS[by ?? 'publisher'],
  successors.map(issueWords).join(', '),
  <span key="source" className="block min-w-64 font-sans text-source text-quiet">
    {sourceWords(source)}
  </span>,
];

const issueWords = ({ number, revision }: Successor): string =>
  revision === undefined ? number : `${number} ${revision}`;

const forWords = ({ covers, conditions }: Successor): string =>
  [
    ...(covers === undefined ? [] : [`, for ${COVERAGE_WORDS[covers]}`]),
    ...(conditions === undefined ? [] : [`, for ${conditions}`]),
  ].join('');
