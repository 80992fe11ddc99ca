import { temperOf, type PartMaterial } from '@/lib/parts/material-of';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { WHY_NOT } from '@/lib/reference/why-not';
import type { Process } from '@/lib/trade/process';
import { explainCondition, type Reach } from '@/lib/trade/tempers/explain-condition';
import type { Grounds } from '@/lib/trade/verdict';

import type { Check, CheckedLine } from './check';
import { OVERRIDE, type Finding } from './finding';
import { metalOf } from './metal-of';
import { materialWords } from './material-words';
import { oncePerStep } from './once-per-step';
import { citing } from './source-words';

const CHANGES_CONDITION: readonly Process[] = [
  'solution_heat_treat_and_age',
  'solution_heat_treat',
  'artificial_age',
  'anneal',
];

/** What a heat treater cannot make, only a mill; and what he makes under another name. */
export const canBeMade: Check = {
  met: 'a heat treater can make each condition',
  look({ tables, lines }) {
    const answer = oncePerStep((line) => answerOf(tables, line));
    return lines.flatMap((line) => findingOf(line, answer(line)));
  },
};

type Answer =
  | { is: 'nothing' }
  | { is: 'not_read'; what: string }
  | ({ is: 'answered'; from: string; to: string } & Reach & Grounds);

function answerOf(tables: BatchTables, { part, step }: CheckedLine): Answer {
  if (!CHANGES_CONDITION.includes(step.process)) return { is: 'nothing' };
  const found = metalOf(tables, part);
  if (found.known === 'former_name')
    return { is: 'not_read', what: `${part.alloy} is a former name${todayWords(found.formerly.present)}` };
  if (found.known === 'no') return { is: 'not_read', what: `No table here knows ${part.alloy}` };
  if (found.material.family !== 'wrought_aluminium' || !step.targetCondition) return { is: 'nothing' };
  return changeOf(tables, found.material, {
    from: step.conditionBefore ?? part.madeCondition,
    to: step.targetCondition,
  });
}

const todayWords = (present: readonly string[]): string =>
  present.length === 0 ? '' : `, today perhaps ${present.join(' or ')}, which is an engineering decision`;

function changeOf(
  tables: BatchTables,
  { alloy, form, clad }: PartMaterial,
  typed: { from: string; to: string },
): Answer {
  const from = temperOf(tables.material.tempers, typed.from);
  const to = temperOf(tables.material.tempers, typed.to);
  if (!from || !to || !form)
    return { is: 'not_read', what: `No table here knows condition ${from ? typed.to : typed.from}` };
  const change = { material: { alloy, form, clad }, from, to };
  const verdict = explainCondition(tables.conditions, change);
  if (!verdict.ok) return { is: 'not_read', what: `No table here says how ${from} becomes ${to}` };
  return { is: 'answered', ...verdict, from, to };
}

function findingOf(line: CheckedLine, answer: Answer): Finding[] {
  if (answer.is === 'nothing') return [];
  const subject = line.id;
  if (answer.is === 'not_read')
    return [
      {
        code: 'condition_not_read',
        level: 'note',
        subject,
        sentence: `Line ${line.lineNo}: its condition is not checked.`,
        rest: `${answer.what}; nothing is concluded.`,
        waysOut: [],
      },
    ];
  const { from, to } = answer;
  const cited = citing(answer.source);
  if (answer.reach === 'cannot_be_made')
    return [
      {
        code: 'condition_not_made',
        level: 'stop',
        subject,
        sentence: `Line ${line.lineNo} asks for ${to}, which no heat treater makes of ${from}.`,
        rest: `${WHY_NOT[answer.why]}${answer.gives ? ` Trying gives ${materialWords(wordsOf(line))} in ${answer.gives.condition}, whose allowables differ.` : ''}`,
        ...cited,
        waysOut: [takeOut(line), OVERRIDE],
      },
    ];
  if (answer.reach === 'made_under_other_name')
    return [
      {
        code: 'condition_under_other_name',
        level: 'warn',
        subject,
        sentence: `Line ${line.lineNo} asks for ${to}; made of ${from} it is called ${answer.properName}.`,
        rest: `${to} is the mill's name. The allowables of ${answer.properName} differ: see that the drawing allows it.`,
        ...cited,
        waysOut: [takeOut(line)],
      },
    ];
  return [];
}

const wordsOf = ({ part: { alloy, clad, form } }: CheckedLine) =>
  ({ alloy, clad, form: form || 'sheet' }) as const;

const takeOut = ({ id, lineNo }: CheckedLine) =>
  ({ way: 'take_out_line', says: `Take line ${lineNo} out`, lineId: id }) as const;
