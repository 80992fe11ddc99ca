import type { LoadGroup } from '@/lib/trade/heat-treat/load-needs';
import { planLoads, type KeptApart, type PlannedLoad } from '@/lib/trade/heat-treat/load-plan';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { MELTING } from '@/lib/trade/tables/melting';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { SOAK_TIMES } from '@/lib/trade/tables/soak-times';
import { SOLUTION_TEMPERATURES } from '@/lib/trade/tables/solution-temperatures';

import { Answer, NoAnswer } from './answer';
import { APART_WORDS, unplacedWords } from '@/lib/reference/load-words';
import { SourceLine } from './source-line';
import type { Bench } from './use-bench';

const TABLES = {
  solution: SOLUTION_TEMPERATURES,
  melting: MELTING,
  soak: SOAK_TIMES,
  quenchDelays: QUENCH_DELAYS,
  ageing: AGEING_CYCLES,
};
type Says = Bench<never>['says'];

interface LoadResultProps {
  groups: readonly LoadGroup[];
  uniformityC: number;
  says: Says;
}

/** The loads, what each is run at, and for every pair that is kept apart the reason. */
export function LoadResult({ groups, uniformityC, says }: LoadResultProps) {
  const plan = planLoads(TABLES, groups, uniformityC);
  const count = plan.loads.length;
  const sources = [...new Set(plan.loads.flatMap(({ sources: of }) => of))];
  return (
    <>
      {count > 0 && (
        <Answer
          good={null}
          says={`${count} ${count === 1 ? 'load' : 'loads'}`}
          rest={plan.method === 'exact' ? 'no plan has fewer' : 'a good plan; there may be one with fewer'}
        />
      )}
      <div className="grid gap-3.5 sm:grid-cols-2">
        {plan.loads.map((load, at) => (
          <Load key={load.groups.join()} load={load} number={at + 1} groups={groups} says={says} />
        ))}
      </div>
      {plan.unplaced.map(({ group, reason }) => (
        <NoAnswer key={group} says={`${group} is not planned: ${unplacedWords(reason)}.`} />
      ))}
      {plan.apart.length > 0 && <Apart apart={plan.apart} />}
      {sources.map((source) => (
        <SourceLine key={`${source.document} ${source.confidence} ${source.certainty}`} source={source} />
      ))}
    </>
  );
}

interface LoadProps {
  load: PlannedLoad;
  number: number;
  groups: readonly LoadGroup[];
  says: Says;
}

function Load({ load, number, groups, says }: LoadProps) {
  const { solution, ageing, maxDelayS } = load;
  return (
    <div className="border-l-4 border-ink py-1 pl-3">
      <h3>
        Load {number}: {load.groups.join(', ')}
      </h3>
      <ul className="text-second">
        {groups
          .filter(({ key }) => load.groups.includes(key))
          .map(({ key, alloy, clad, thicknessMm, to }) => (
            <li key={key}>
              {key}: {alloy} {clad ? 'clad' : 'bare'}, {says(thicknessMm, 'length')}, to {to}
            </li>
          ))}
      </ul>
      {solution && (
        <p className="pt-1">
          <strong className="num">{says(solution.temperatureC[0], 'temperature')}</strong> to{' '}
          <strong className="num">{says(solution.temperatureC[1], 'temperature')}</strong>, soak{' '}
          <strong>{solution.soakMin} min</strong>
          {solution.longestMin !== null && (
            <strong className="text-held-ink">, not over {solution.longestMin} min</strong>
          )}
          {maxDelayS !== null && <>, under water within {maxDelayS} s</>}
        </p>
      )}
      {ageing.map(({ holds, source }) => (
        <p key={`${source.document} ${JSON.stringify(holds)}`} className="text-second">
          then age:{' '}
          {holds
            .map(({ setC, holdMin, nominalMin }) =>
              [says(setC[0], 'temperature'), minWords(nominalMin, holdMin)].filter(Boolean).join(', '),
            )
            .join('; then ')}
        </p>
      ))}
    </div>
  );
}

function minWords(nominal: number | undefined, hold: readonly [number, number] | undefined): string {
  if (nominal !== undefined) return `${nominal / 60} h`;
  return hold ? `${[...new Set(hold.map((min) => min / 60))].join(' to ')} h` : '';
}

function Apart({ apart }: { apart: readonly KeptApart[] }) {
  return (
    <>
      <h3 className="pt-5">Kept apart</h3>
      <ul>
        {apart.map(({ between: [one, other], reason }) => (
          <li key={`${one.join()} ${other.join()}`} className="border-t border-rule py-1.5">
            <strong>
              {one.join(', ')} and {other.join(', ')}
            </strong>
            : {APART_WORDS[reason]}
          </li>
        ))}
      </ul>
    </>
  );
}
