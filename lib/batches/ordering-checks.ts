import { orderingForm } from '@/lib/parts/ordering-form';
import { linesWords } from '@/lib/parts/lines-words';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { ORDER_ITEM_WORDS } from '@/lib/trade/ordering/order-item';
import type { ChecklistItem, OrderingKind } from '@/lib/trade/ordering/ordering-checklist';

import type { Check, CheckedLine, CheckFacts } from './check';
import type { Finding } from './finding';
import { oncePerStep } from './once-per-step';
import { citing } from './source-words';

/** The processor may not begin without them; the rest it does by the specification's own defaults. */
const FIRM: readonly OrderingKind[] = ['must_state', 'must_be_agreed'];

/** What the specification wants the order to state, and no step, part or requirement does. */
export const statesWhatIsAsked: Check = {
  met: 'the order states what its specification asks for',
  look({ tables, batch, lines }) {
    const answer = oncePerStep((line) => missingOf(tables, batch, line), allThatStates);
    const same = new Map<string, { missing: readonly ChecklistItem[]; lines: CheckedLine[] }>();
    for (const line of lines) {
      const missing = answer(line);
      if (missing.length === 0) continue;
      const key = missing.map(({ item }) => item).join();
      const known = same.get(key) ?? { missing, lines: [] };
      known.lines.push(line);
      same.set(key, known);
    }
    return [...same.values()].flatMap((one) => findingOf(batch, one));
  },
};

/** Lines that state the same are looked at once, whatever parts they are of. */
const allThatStates = ({ step, part, characteristics }: CheckedLine): string =>
  JSON.stringify([
    ...[step.specification, step.specificationRevision, step.classType],
    ...[step.conditionBefore, step.targetCondition, part.endCondition],
    step.ordering,
    characteristics,
  ]);

function missingOf(
  tables: BatchTables,
  { characteristics }: CheckFacts['batch'],
  line: CheckedLine,
): ChecklistItem[] {
  const { step, part } = line;
  const form = orderingForm(tables, {
    specification: step.specification,
    specificationRevision: step.specificationRevision ?? '',
    classType: step.classType ?? '',
    conditionBefore: step.conditionBefore ?? '',
    targetCondition: step.targetCondition ?? '',
    ordering: step.ordering,
    characteristics: [...characteristics, ...line.characteristics],
    endCondition: part.endCondition,
  });
  return (form?.missing ?? []).filter(({ kind }) => FIRM.includes(kind));
}

function findingOf(
  { specification }: CheckFacts['batch'],
  { missing, lines }: { missing: readonly ChecklistItem[]; lines: readonly CheckedLine[] },
): Finding[] {
  const [line] = lines;
  const [first] = missing;
  if (!line || !first) return [];
  const which = linesWords(lines.map(({ lineNo }) => lineNo));
  const cited = citing(first.source);
  const paragraph = first.paragraph === null ? '' : `, ${first.paragraph}`;
  return [
    {
      code: 'order_leaves_out',
      level: 'warn',
      subject: line.id,
      sentence: `The order for ${which} leaves out ${missing.length === 1 ? 'one thing' : `${missing.length} things`} that ${specification} wants stated.`,
      rest: `${sentence(missing.map(({ item }) => ORDER_ITEM_WORDS[item]).join('; '))}. The processor has to ask, or decide for you.`,
      ...cited,
      source: `${cited.source}${paragraph}`,
      waysOut: [{ way: 'state_order', says: `State it for ${line.partNumber}`, partId: line.part.id }],
    },
  ];
}

const sentence = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}`;
