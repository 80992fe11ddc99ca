import { temperOf } from '@/lib/parts/material-of';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { calledRevision } from '@/lib/trade/finishes/called-revision';
import { cladReheats, type ReheatStanding } from '@/lib/trade/heat-treat/clad-reheats';
import type { Grounds } from '@/lib/trade/verdict';

import type { Check, CheckedLine } from './check';
import { OVERRIDE, type Finding } from './finding';
import { metalOf } from './metal-of';
import { citing } from './source-words';

/** Every solution treatment drives the core's copper further through the cladding. */
export const hasReheatsLeft: Check = {
  met: 'clad metal may be solution treated once more',
  look: ({ tables, lines }) =>
    lines.flatMap((line) => {
      const standing = standingOf(tables, line);
      return standing ? findingOf(line, standing) : [];
    }),
};

type Standing = (ReheatStanding & Grounds) | 'thickness_not_stated';

function standingOf(tables: BatchTables, { part, step, solutionTreated }: CheckedLine): Standing | null {
  if (step.process !== 'solution_heat_treat' && step.process !== 'solution_heat_treat_and_age') return null;
  if (!part.clad && !/cla/i.test(part.alloy)) return null;
  const found = metalOf(tables, part);
  const boughtAs = temperOf(tables.material.tempers, part.madeCondition);
  if (found.known !== 'yes' || !found.material.clad || !boughtAs) return null;
  if (part.thicknessMm === null) return 'thickness_not_stated';
  const { byDocument, strictest } = tables.clad;
  const ordered = byDocument.find(({ documents }) =>
    documents.some(
      (one) =>
        calledRevision(one, { specification: step.specification, revision: step.specificationRevision }) !==
        null,
    ),
  );
  const lot = { thicknessMm: part.thicknessMm, history: { boughtAs, done: solutionTreated } };
  const verdict = cladReheats(ordered?.table ?? strictest, lot);
  return verdict.ok ? verdict : null;
}

function findingOf(line: CheckedLine, standing: Standing): Finding[] {
  const takeOut = {
    way: 'take_out_line',
    says: `Take line ${line.lineNo} out`,
    lineId: line.id,
  } as const;
  const of = `Line ${line.lineNo}, lot ${line.lotNumber},`;
  if (standing === 'thickness_not_stated')
    return [
      {
        code: 'clad_not_counted',
        level: 'note',
        subject: line.id,
        sentence: `${of} is clad and says no thickness.`,
        rest: 'How often it may be solution treated depends on it; nothing is concluded.',
        waysOut: [],
      },
    ];
  if (standing.next === 'allowed') return [];
  const cited = citing(standing.source);
  const counted = countedWords(standing);
  if (standing.next === 'allowed_for_the_last_time')
    return [
      {
        code: 'clad_last_reheat',
        level: 'warn',
        subject: line.id,
        sentence: `${of} is on its last solution treatment.`,
        rest: `Clad, ${counted}. If this one fails, it cannot be done again.`,
        ...cited,
        waysOut: [takeOut],
      },
    ];
  const approval = standing.next === 'needs_engineering_approval';
  return [
    {
      code: 'clad_reheats_used_up',
      level: 'stop',
      subject: line.id,
      sentence: approval
        ? `${of} needs engineering approval to be solution treated again.`
        : `${of} may not be solution treated again.`,
      rest: `Clad, ${counted}. Once more and too much copper is through the cladding.`,
      ...cited,
      waysOut: [takeOut, OVERRIDE],
    },
  ];
}

function countedWords({ solutionTreatments, reheats, max, counted }: ReheatStanding): string {
  if (solutionTreatments === 0) return 'not treated so far';
  const times = solutionTreatments === 1 ? 'once' : `${solutionTreatments} times`;
  const limit = counted === reheats ? `${max} after the first` : `${max} in all`;
  return `treated ${times} so far, the mill's included, of ${limit}`;
}
