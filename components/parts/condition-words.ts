import { operationWords } from '@/components/reference/temper-words';
import { WHY_NOT } from '@/lib/reference/why-not';
import type { CheckLevel } from '@/components/ui/marks';
import type { explainTyped } from '@/lib/parts/condition-choices';

type Explained = NonNullable<ReturnType<typeof explainTyped>>;

/** What can be made of a condition, in words; null where there is nothing to say. */
export function conditionWords(
  { from, to, found }: Explained,
  maker: 'step' | 'route',
): { level: CheckLevel; says: string } | null {
  if (!found.ok) return null;
  const who = maker === 'step' ? 'this step' : 'a heat treater';
  switch (found.reach) {
    case 'already_there':
      return null;
    case 'can_be_made': {
      const [first, ...rest] = found.path.map(operationWords);
      return { level: 'note', says: `From ${from} ${who} makes ${to}: ${[first, ...rest].join(', then ')}.` };
    }
    case 'made_under_other_name':
      return {
        level: 'warn',
        says: `${to} is the mill’s name. From ${from} ${who} makes ${found.properName}, with other allowables.`,
      };
    case 'cannot_be_made': {
      const isTheMills = found.why === 'needs_mill_cold_work' || found.why === 'needs_mill_stretch';
      const refused = isTheMills ? `Only a mill makes ${to}.` : `${to} cannot be made of ${from}.`;
      const gives = found.gives ? ` From ${from} ${who} makes ${found.gives.condition}.` : '';
      return { level: 'stop', says: `${refused} ${WHY_NOT[found.why]}${gives}` };
    }
  }
}
