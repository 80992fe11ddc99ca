import { referenceTo } from '../table';
import type { WhyNot } from '../tables/temper-transitions';
import type { Grounds, Verdict } from '../verdict';
import {
  isSameState,
  pathsFrom,
  startsFrom,
  type ConditionMaterial,
  type ConditionRules,
  type ConditionStep,
} from './condition-graph';
import type { Temper } from './temper';

export type Reach =
  | { readonly reach: 'already_there' }
  | { readonly reach: 'can_be_made'; readonly path: readonly ConditionStep[] }
  /** The drawing's name is the mill's; what a heat treater makes of it has another, and other allowables. */
  | {
      readonly reach: 'made_under_other_name';
      readonly properName: Temper;
      readonly path: readonly ConditionStep[];
    }
  | {
      readonly reach: 'cannot_be_made';
      readonly why: WhyNot;
      /** What comes of trying, and how. */
      readonly gives?: { readonly condition: Temper; readonly path: readonly ConditionStep[] };
    };

type Answer = { readonly ok: true } & Reach & Grounds;

interface Question {
  readonly rules: ConditionRules;
  readonly material: ConditionMaterial;
  readonly from: Temper;
  readonly to: Temper;
  readonly paths: ReadonlyMap<Temper, readonly ConditionStep[]>;
}

/**
 * Whether a heat treater can bring a material from one condition into another, by what operations; if not, why not.
 *
 * A condition that needs cold work between quench and ageing cannot be made outside a mill: 2024-O becomes T42 or T62,
 * never T3. But T81 is made of the mill's T3 by ageing alone. Cold work, once there, is lost by solution treatment.
 *
 * @returns refused as `not_in_table` where the tables neither lead there nor say why not; nothing is concluded from it.
 * @example explainCondition(RULES, {material: 2024 sheet, from: 'O', to: 'T3'}) is cannot_be_made,
 *   needs_mill_cold_work, gives T42
 */
export function explainCondition(
  rules: ConditionRules,
  change: Pick<Question, 'material' | 'from' | 'to'>,
): Verdict<Reach, 'alloy_not_in_table' | 'not_in_table'> {
  const { material, from, to } = change;
  const known = rules.transitions.rows.find(({ alloys }) => alloys.includes(material.alloy));
  if (!known) return { ok: false, reason: 'alloy_not_in_table' };
  if (isSameState(from, to)) return { ok: true, reach: 'already_there', source: known.source };
  const question = { rules, ...change, paths: pathsFrom(rules, material, from) };
  return (
    ruledOut(question) ??
    made(question) ??
    namedOtherwise(question) ??
    lacksColdWork(question) ?? { ok: false, reason: 'not_in_table' }
  );
}

/** A row that says no goes before everything else. */
function ruledOut(question: Question): Answer | undefined {
  const { rules, material, from, to } = question;
  for (const row of rules.transitions.rows)
    if (row.result.is === 'not_made' && isSameState(row.to, to) && startsFrom(row, material, from)) {
      const gives = row.result.gives ?? designationOf(question)?.withoutColdWork;
      const grounds = { source: row.source, readFrom: referenceTo(rules.transitions) };
      return {
        ok: true,
        reach: 'cannot_be_made',
        why: row.result.why,
        ...resulting(question, gives),
        ...grounds,
      };
    }
  return undefined;
}

function made(question: Question): Answer | undefined {
  const path = pathTo(question, question.to);
  const last = path?.at(-1);
  if (!path || !last) return undefined;
  return { ok: true, reach: 'can_be_made', path, source: last.source, readFrom: last.readFrom };
}

function namedOtherwise(question: Question): Answer | undefined {
  const { rules, material, from, to } = question;
  for (const row of rules.transitions.rows)
    if (row.result.is === 'made_under_other_name' && row.to === to && startsFrom(row, material, from))
      return underName(question, row.result.properName, {
        source: row.source,
        readFrom: referenceTo(rules.transitions),
      });
  const designation = designationOf(question);
  if (!designation?.madeByUserIs) return undefined;
  return underName(question, designation.madeByUserIs, {
    source: designation.source,
    readFrom: referenceTo(rules.designations),
  });
}

function underName(question: Question, properName: Temper, grounds: Grounds): Answer | undefined {
  const path = pathTo(question, properName);
  return path && { ok: true, reach: 'made_under_other_name', properName, path, ...grounds };
}

function lacksColdWork(question: Question): Answer | undefined {
  const designation = designationOf(question);
  if (!designation?.coldWork) return undefined;
  return {
    ok: true,
    reach: 'cannot_be_made',
    why: designation.coldWork.kind === 'stretch' ? 'needs_mill_stretch' : 'needs_mill_cold_work',
    ...resulting(question, designation.withoutColdWork),
    source: designation.source,
    readFrom: referenceTo(question.rules.designations),
  };
}

const designationOf = ({ rules, to }: Question) =>
  rules.designations.rows.find(({ temper }) => temper === to);

function resulting(question: Question, condition: Temper | undefined) {
  const path = condition && pathTo(question, condition);
  return path ? { gives: { condition, path } } : {};
}

const pathTo = ({ paths }: Question, condition: Temper) =>
  [...paths].find(([reached, path]) => path.length > 0 && isSameState(reached, condition))?.[1];
