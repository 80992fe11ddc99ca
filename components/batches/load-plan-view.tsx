import { LoadNumber } from '@/components/ui/frame-number';
import type { LoadPlan, PlannedLoad } from '@/lib/batches/load-contract';
import { linesWords } from '@/lib/parts/lines-words';

import { FigureKnown } from './figure-known';
import { massText, massUnit, temperatureText, temperatureUnit, type Units } from './measures';
import { SoakBars, soakScale, type SoakScale } from './soak-bars';

/** The loads of a plan with what each is run at, then why lines are kept apart, then what is not planned. */
export function LoadPlanView({ plan, units }: { plan: LoadPlan; units: Units }) {
  const scale = soakScale(plan.loads);
  const sources = [...new Set(plan.loads.flatMap((load) => load.sources))];
  return (
    <>
      <ol>
        {plan.loads.map((load) => (
          <li
            key={load.number}
            className="grid grid-cols-[minmax(0,17rem)_minmax(0,1fr)_minmax(0,15rem)] items-end gap-x-5 gap-y-1 border-b border-rule py-2.5 max-lg:grid-cols-1"
          >
            <LinesOfLoad load={load} />
            <SoakOfLoad load={load} scale={scale} />
            <RunAt load={load} units={units} />
          </li>
        ))}
      </ol>
      {plan.apart.length > 0 && (
        <ul aria-label="Why they are kept apart" className="py-1">
          {plan.apart.map(({ between: [one, other], says, source }) => (
            <li key={`${one.join()} ${other.join()}`} className="py-1">
              <strong>{`${begins(linesWords(one))} and ${linesWords(other)} are kept apart:`}</strong> {says}.
              {source && <span className="block text-source text-faint">{source}</span>}
            </li>
          ))}
        </ul>
      )}
      {plan.unplaced.length > 0 && (
        <ul aria-label="Not planned" className="py-1">
          {plan.unplaced.map(({ lineId, lineNo, says }) => (
            <li key={lineId}>
              <strong>Line {lineNo}</strong> is in no load of the plan: {says}.
            </li>
          ))}
        </ul>
      )}
      {sources.length > 0 && (
        <p className="pt-1 text-source text-faint">
          Reference values: {sources.join('; ')}. Drawing, order and the revision invoked come first.
        </p>
      )}
    </>
  );
}

const begins = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

function LinesOfLoad({ load }: { load: PlannedLoad }) {
  return (
    <ul className="font-cond">
      {load.lines.map(({ lineId, lineNo, partName, thickness, clad }) => (
        <li key={lineId} className="flex h-6 items-center gap-2.5">
          <span className="num w-5 flex-none text-quiet">{lineNo}</span>
          <span className="min-w-0 flex-1 truncate">{partName}</span>
          <span
            className={`num whitespace-nowrap ${lineId === load.governing.lineId ? 'font-semibold' : ''}`}
          >
            {thickness} {clad && 'clad'}
          </span>
        </li>
      ))}
    </ul>
  );
}

function SoakOfLoad({ load, scale }: { load: PlannedLoad; scale: SoakScale }) {
  if (!load.solution) return <p className="text-quiet max-lg:hidden">aged only, no soak</p>;
  return (
    <div className="max-lg:pl-7">
      <SoakBars load={load} scale={scale} />
    </div>
  );
}

function RunAt({ load, units }: { load: PlannedLoad; units: Units }) {
  const { number, solution, governing, lines, pieces, mass } = load;
  return (
    <div className="lg:border-l lg:border-rule lg:pl-4">
      <p className="flex items-center gap-2">
        <span className="sr-only">Load</span>
        <LoadNumber number={number} />
        <strong className="text-sub">{solution ? soakWords(solution) : 'age only'}</strong>
      </p>
      {solution && (
        <p className="text-second">
          <span className="num">{governing.thickness}</span>
          <span className="text-quiet">
            {lines.length > 1 ? ` governs, line ${governing.lineNo}` : ' governs'}
          </span>
        </p>
      )}
      {solution && <Solution solution={solution} units={units} />}
      <Ageing load={load} units={units} />
      <p className="text-second text-quiet">
        {`${lines.length} ${lines.length === 1 ? 'line' : 'lines'}, ${pieces.toLocaleString('en-US')} pc`}
        {mass && (
          <>
            {', '}
            <FigureKnown
              known={{ value: mass.massG, isComputed: mass.isComputed }}
              text={(grams) => massText(grams, units)}
            />{' '}
            {massUnit(units)}
          </>
        )}
      </p>
    </div>
  );
}

function Solution({ solution, units }: { solution: NonNullable<PlannedLoad['solution']>; units: Units }) {
  const { temperatureC, soakMin, longestMin, medium, quench, maxDelayS } = solution;
  return (
    <>
      <p className="text-second">
        <span className="num">{spanText(temperatureC, units)}</span> {temperatureUnit(units)}{' '}
        <span className="text-quiet">in {medium}</span>
      </p>
      <p className="text-second">
        <span className="text-quiet">{quench}</span>
        {maxDelayS !== null && (
          <>
            {' '}
            within <span className="num font-semibold">{maxDelayS} s</span>
          </>
        )}
      </p>
      {longestMin !== null && (
        <p className="text-second text-dispatched-ink">
          {longestMin === soakMin
            ? 'the clad may have no minute more'
            : `window ${longestMin - soakMin} min wide: the clad ends it`}
        </p>
      )}
    </>
  );
}

/** `soak 30 to 35 min`, `soak 40 min exactly`, `soak 55 min or more` */
function soakWords({ soakMin, longestMin }: { soakMin: number; longestMin: number | null }): string {
  if (longestMin === null) return `soak ${soakMin} min or more`;
  return longestMin === soakMin ? `soak ${soakMin} min exactly` : `soak ${soakMin} to ${longestMin} min`;
}

function spanText([low, high]: readonly [number, number], units: Units): string {
  const [from, to] = [temperatureText(low, units), temperatureText(high, units)];
  return from === to ? from : `${from} to ${to}`;
}

function Ageing({ load: { ageing }, units }: { load: PlannedLoad; units: Units }) {
  const ways = [
    ...new Set(
      ageing.map(({ holds }) =>
        holds
          .map(({ setC, holdMin }) =>
            [`${spanText(setC, units)} ${temperatureUnit(units)}`, holdMin && hoursWords(holdMin)]
              .filter(Boolean)
              .join(' for '),
          )
          .join(', then '),
      ),
    ),
  ];
  if (ways.length === 0) return null;
  return (
    <p className="text-second">
      <span className="text-quiet">age</span> {ways.join(', or ')}
    </p>
  );
}

function hoursWords([from, to]: readonly [number, number]): string {
  const hours = [...new Set([from, to].map((minutes) => Number((minutes / 60).toFixed(2))))];
  return `${hours.join(' to ')} h`;
}
