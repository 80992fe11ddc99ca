import { APART_WORDS } from '@/lib/reference/load-words';
import type { CheckedLine } from '@/lib/batches/check';
import { loadsAsSet, type NumberedLoad } from '@/lib/batches/loads-as-set';
import { loadsOfBatch } from '@/lib/batches/loads-of-batch';
import { sourceWords } from '@/lib/batches/source-words';
import { limitWords } from '@/lib/parts/limit-words';
import { linesWords } from '@/lib/parts/lines-words';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { hoursLimit, limitOf, temperatureLimit, type Limit } from '@/lib/requirements/limit';
import { sampleAsOrdered } from '@/lib/requirements/sample-as-ordered';
import type { TableReference } from '@/lib/trade/table';
import type { AgeingHold } from '@/lib/trade/heat-treat/ageing-cycle';

import type { Paper, SampleOfLines, TravellerLoad, TravellerLoads } from './content';

/**
 * The furnace loads as a traveller says them, in words that stay as they were stated. Temperatures stand in the scale
 * of the shop's papers with the other one behind it, because a furnace house reads either.
 */
export function loadsForPaper(
  tables: BatchTables,
  lines: readonly CheckedLine[],
  paper: Paper,
): TravellerLoads | null {
  const loads = loadsAsSet(tables, lines);
  if (loads.length === 0) return null;
  return {
    areSet: lines.some(({ loadNo }) => loadNo !== null),
    loads: loads.map((load) => loadForPaper(load, paper)),
    apart: whyApart(tables, loads),
    sources: [...new Set(loads.flatMap((load) => load.sources.map(sourceWords)))],
  };
}

/** The tables and editions that loads and samples of these lines are read from. */
export function tablesForPaper(tables: BatchTables, lines: readonly CheckedLine[]): TableReference[] {
  const sampled = lines.flatMap(
    ({ pieces, step }) => sampleAsOrdered(tables, step.ordering.sampling_plan, pieces)?.source ?? [],
  );
  const sources = [...loadsAsSet(tables, lines).flatMap((load) => load.sources), ...sampled];
  return sources.flatMap(({ readFrom }) => readFrom ?? []);
}

type Row = TravellerLoad['rows'][number];

function loadForPaper(load: NumberedLoad<CheckedLine>, paper: Paper): TravellerLoad {
  const { number, lines, governing, solution, maxDelayS } = load;
  return {
    number,
    lines: lines.map(({ lineNo }) => lineNo),
    pieces: lines.reduce((sum, { pieces }) => sum + pieces, 0),
    rows: [
      ...(solution
        ? [
            ...row('Solution', temperature(solution.temperatureC, paper)),
            ...row(
              'Soak',
              limitOf({ min: solution.soakMin, max: solution.longestMin ?? undefined }, 'min'),
              soakRest(load),
            ),
            {
              name: 'Governs',
              says: thicknessOf(governing),
              rest: `thickest section, line ${governing.lineNo}`,
            },
            { name: 'Quench', says: load.quench, rest: `heated in ${load.medium}` },
            ...(maxDelayS === null ? [] : row('Quench delay', limitOf({ max: maxDelayS }, 's'))),
          ]
        : []),
      ...ageing(load, paper),
    ],
  };
}

const thicknessOf = ({ part }: CheckedLine): string => part.thickness ?? `${part.thicknessMm ?? '?'} mm`;

function soakRest({ solution }: NumberedLoad<CheckedLine>): string {
  if (!solution || solution.longestMin === null) return '';
  return `window ${solution.longestMin - solution.soakMin} min: clad metal ends it`;
}

function row(name: string, limit: Limit | null, rest = ''): Row[] {
  return limit ? [{ name, says: limitWords(limit), rest }] : [];
}

/** `910 to 930 °F (488 to 498 °C)` */
function temperature([min, max]: readonly [number, number], paper: Paper): Limit | null {
  const [first, second] = paper === 'letter' ? (['inch', 'metric'] as const) : (['metric', 'inch'] as const);
  const [own, other] = [temperatureLimit({ min, max }, first), temperatureLimit({ min, max }, second)];
  return own && other && { limit: `${own.limit} ${own.unit} (${other.limit} ${other.unit})`, unit: '' };
}

/** Where there is a choice of cycles each is a row. */
function ageing({ ageing: cycles }: NumberedLoad<CheckedLine>, paper: Paper): Row[] {
  const ways = [
    ...new Set(cycles.map(({ holds }) => holds.map((hold) => holdWords(hold, paper)).join(', then '))),
  ];
  return ways.map((says, at) => ({ name: at === 0 ? 'Age' : 'or', says, rest: '' }));
}

function holdWords({ setC, limitsC, holdMin, nominalMin }: AgeingHold, paper: Paper): string {
  const at = temperature(limitsC ?? setC, paper);
  const [min, max] = holdMin ?? [nominalMin, nominalMin];
  const time = hoursLimit({ min, max });
  return [at?.limit, time && limitWords(time)].filter(Boolean).join(', ');
}

/** Why loads may not be joined; lines that could share but lie apart are not named. */
function whyApart(tables: BatchTables, loads: readonly NumberedLoad<CheckedLine>[]): string[] {
  const lines = loads.flatMap((load) => load.lines);
  const numberOf = new Map(loads.flatMap((load) => load.lines.map(({ lineNo }) => [lineNo, load.number])));
  const apart = loadsOfBatch(tables, lines)?.apart ?? [];
  return apart.flatMap(({ between: [one, other], reason }) => {
    const numbers = [one, other].map((side) => new Set(side.map(({ lineNo }) => numberOf.get(lineNo))));
    const isApart = ![...(numbers[0] ?? [])].some((number) => numbers[1]?.has(number));
    if (reason === 'fits_but_planned_apart' || !isApart) return [];
    const [from, to] = [one, other].map((side) => linesWords(side.map(({ lineNo }) => lineNo)));
    return [`${from} and ${to}: ${APART_WORDS[reason]}`];
  });
}

/** How many pieces of each line are looked at, where its order states a sampling plan. */
export function samplesForPaper(tables: BatchTables, lines: readonly CheckedLine[]): SampleOfLines[] {
  return lines.flatMap(({ lineNo, pieces, step }) => {
    const sample = sampleAsOrdered(tables, step.ordering.sampling_plan, pieces);
    if (!sample) return [];
    const { inspect, accept, reject, aqlPct, level, severity, source } = sample;
    return [
      {
        lineNo,
        inspect,
        pieces,
        says: `accept ${accept}, reject ${reject}`,
        plan: `AQL ${aqlPct}, level ${level}, ${severity}; ${sourceWords(source)}`,
      },
    ];
  });
}
