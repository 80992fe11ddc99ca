import { WHY_NOT } from '@/lib/reference/why-not';
import type { ConditionStep } from '@/lib/trade/tempers/condition-graph';
import type { explainCondition } from '@/lib/trade/tempers/explain-condition';
import type { Operation } from '@/lib/trade/tables/temper-transitions';

const OPERATIONS: Record<Operation, string> = {
  solution_heat_treat: 'solution heat treat',
  re_solution_heat_treat: 'solution heat treat again',
  quench: 'quench',
  natural_age: 'age at room temperature',
  artificial_age: 'age in an oven',
  two_step_age: 'age in two steps',
  second_step_age: 'age, second step',
  anneal: 'anneal',
};

const CAUTIONS: Record<ConditionStep['cautions'][number], string> = {
  forming_window_opens: 'After the quench it is soft for a short time: form it then.',
  state_the_time: 'W says little without the time since the quench: state it.',
  time_to_age_is_limited: 'The time between quench and ageing is limited.',
  prove_conductivity: 'Ask for conductivity as proof, not hardness alone.',
  user_tempers_only_afterwards: 'Afterwards it can only have the tempers of a user, such as T42 or T62.',
  cold_work_is_the_mills: 'The cold work in it is the mill’s.',
  strength_drops: 'It loses strength.',
  counts_as_reheat: 'Clad: this counts as a re-heat-treatment.',
  loses_mill_cold_work: 'The mill’s cold work is lost, and with it the mill’s allowables.',
};

export const operationWords = ({ by }: Pick<ConditionStep, 'by'>): string =>
  by.map((operation) => OPERATIONS[operation]).join(', ');

/** Each caution of a way once. */
export const cautionWords = (path: readonly ConditionStep[]): string[] => [
  ...new Set(path.flatMap(({ cautions }) => cautions.map((caution) => CAUTIONS[caution]))),
];

export type TemperReply =
  | {
      readonly good: boolean | null;
      readonly says: string;
      readonly rest: string;
      /** The way that is shown: to the temper, to its proper name, or to what comes of trying. */
      readonly path: readonly ConditionStep[];
    }
  | { readonly refusal: string };

/** What the library found about a change of condition, in words. */
export function temperReply(
  found: ReturnType<typeof explainCondition>,
  { from, to }: { from: string; to: string },
): TemperReply {
  if (!found.ok)
    return {
      refusal:
        found.reason === 'alloy_not_in_table'
          ? 'The tables say nothing about the conditions of this alloy. Ask your heat treater.'
          : `The tables neither lead from ${from} to ${to} nor say why not. Nothing can be concluded: ask your heat treater.`,
    };
  switch (found.reach) {
    case 'already_there':
      return { good: true, says: `It is ${to} already`, rest: '', path: [] };
    case 'can_be_made':
      return { good: true, says: `${from} to ${to} can be made`, rest: '', path: found.path };
    case 'made_under_other_name':
      return {
        good: null,
        says: `Call it ${found.properName}, not ${to}`,
        rest: `The name ${to} is the mill’s. What a heat treater makes of it is ${found.properName}, with other allowables.`,
        path: found.path,
      };
    case 'cannot_be_made': {
      const gives = found.gives ? ` Trying gives ${found.gives.condition}.` : '';
      return {
        good: false,
        says: `${to} can not be made of ${from}`,
        rest: `${WHY_NOT[found.why]}${gives}`,
        path: found.gives?.path ?? [],
      };
    }
  }
}
