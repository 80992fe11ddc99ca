'use client';

import { SourceLine } from '@/components/reference/source-line';
import { useTables } from '@/components/reference/use-tables';
import { Edge } from '@/components/ui/edge';
import { conditionsAfter, explainTyped, knownConditions } from '@/lib/parts/condition-choices';
import { conditionWords } from './condition-words';
import { useTypedMaterial } from './use-typed-part';

interface ConditionAdviceProps {
  from: string;
  to: string;
  maker: 'step' | 'route';
}

/** What can be made of the condition before, said while it is typed; it refuses nothing. */
export function ConditionAdvice({ from, to, maker }: ConditionAdviceProps) {
  const tables = useTables();
  const material = useTypedMaterial();
  const explained = explainTyped(tables, material, { from, to });
  const words = explained && conditionWords(explained, maker);
  return (
    <div aria-live="polite">
      {words && explained.found.ok && (
        <Edge level={words.level}>
          {words.says}
          <SourceLine source={explained.found.source} readFrom={explained.found.readFrom} />
        </Edge>
      )}
    </div>
  );
}

/** What is offered in a condition's field; anything else can be typed. */
export function ConditionList({ id, after }: { id: string; after?: string }) {
  const tables = useTables();
  const material = useTypedMaterial();
  const offered =
    after === undefined ? knownConditions(tables, material) : conditionsAfter(tables, material, after);
  return (
    <datalist id={id}>
      {offered.map((condition) => (
        <option key={condition} value={condition} />
      ))}
    </datalist>
  );
}
