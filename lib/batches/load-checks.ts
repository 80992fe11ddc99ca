import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { SOAK_TIMES } from '@/lib/trade/tables/soak-times';
import { APART_WORDS } from '@/lib/reference/load-words';

import type { Check, CheckedLine, CheckFacts } from './check';
import type { Finding } from './finding';
import { groupedBy } from './grouped-by';
import { loadsOfBatch, type LoadsOfBatch } from './loads-of-batch';
import { citing, sourceWords } from './source-words';

type Loads = LoadsOfBatch<CheckedLine>;

/**
 * How many furnace loads it takes where the lead set none; what is against those that are set by hand; and what the
 * processor has to keep to in each.
 */
export const sharesLoads: Check = {
  met: 'no furnace load to plan',
  look({ tables, lines }) {
    const plan = loadsOfBatch(tables, lines);
    if (!plan) return [];
    const isSet = lines.some(({ loadNo }) => loadNo !== null);
    return [...(isSet ? againstLoads(tables, lines) : howManyLoads(plan)), ...soaksAndQuenches(plan)];
  },
};

function howManyLoads(plan: Loads): Finding[] {
  if (plan.loads.length < 2) return [];
  return [
    {
      code: 'several_loads',
      level: 'note',
      subject: '',
      sentence: `It takes ${plan.loads.length} furnace loads${plan.method === 'exact' ? '' : ' or fewer'}.`,
      rest: whyApart(plan),
      ...sourceOf(plan),
      waysOut: [{ way: 'set_loads', says: 'Set the loads' }],
    },
  ];
}

function againstLoads(tables: CheckFacts['tables'], lines: readonly CheckedLine[]): Finding[] {
  const byLoad = groupedBy(
    lines.filter(({ loadNo }) => loadNo !== null),
    ({ loadNo }) => loadNo,
  );
  return [...byLoad].flatMap(([loadNo, together]) => {
    const plan = loadsOfBatch(tables, together);
    if (!plan || plan.loads.length < 2) return [];
    return [
      {
        code: 'load_not_shared',
        level: 'warn' as const,
        // Of two loads that do not hold, each is a finding of its own.
        subject: `load ${loadNo}`,
        sentence: `Load ${loadNo} cannot be one load.`,
        rest: whyApart(plan),
        ...sourceOf(plan),
        waysOut: [{ way: 'set_loads' as const, says: 'Set the loads' }],
      },
    ];
  });
}

/** The first pair stands for all; the plan beside the lines names each. */
function whyApart({ apart }: Loads): string {
  const [first] = apart;
  if (!first) return '';
  const [one, other] = first.between;
  const more = apart.length > 1 ? ` The plan says so of ${apart.length} pairs.` : '';
  return `${lineWords(one)} and ${lineWords(other)} are kept apart: ${APART_WORDS[first.reason]}.${more}`;
}

const NAMED = 4;

function lineWords(lines: readonly CheckedLine[]): string {
  const numbers = lines.slice(0, NAMED).map(({ lineNo }) => lineNo);
  const more = lines.length > NAMED ? ` and ${lines.length - NAMED} more` : '';
  return `${lines.length === 1 ? 'line' : 'lines'} ${numbers.join(', ')}${more}`;
}

function sourceOf({ apart }: Loads): Pick<Finding, 'source' | 'readFrom'> {
  const { sources = [] } = apart[0] ?? {};
  const [source] = sources;
  // Said is the first; recorded is all that decided it.
  return source ? { ...citing(...sources), source: sourceWords(source) } : {};
}

/** Tables that the note is read from. */
const SOAK_AND_QUENCH: readonly string[] = [SOAK_TIMES.id, QUENCH_DELAYS.id];

/** In the words in which the part says its thickness. */
function soaksAndQuenches({ loads }: Loads): Finding[] {
  return loads.flatMap((load, at): Finding[] => {
    if (!load.solution) return [];
    const { soakMin, longestMin } = load.solution;
    const thickness = load.governing.part.thickness ?? `${load.governingMm} mm`;
    const said = load.sources.filter(({ readFrom }) => SOAK_AND_QUENCH.includes(readFrom?.table ?? ''));
    const rest = [
      longestMin === null ? '' : `At most ${longestMin} min, for the clad.`,
      load.maxDelayS === null ? '' : `Into the quench within ${load.maxDelayS} s.`,
    ];
    return [
      {
        code: 'soak_and_quench',
        level: 'note',
        subject: load.governing.id,
        sentence: `${loads.length > 1 ? `Load ${at + 1} of the plan soaks` : 'It soaks'} ${soakMin} min: ${thickness} governs.`,
        rest: rest.filter(Boolean).join(' '),
        ...citing(...(said.length > 0 ? said : load.sources.slice(0, 1))),
        waysOut: [],
      },
    ];
  });
}
