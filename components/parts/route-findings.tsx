'use client';

import { useMemo, useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTables } from '@/components/reference/use-tables';
import { Button } from '@/components/ui/button';
import { CheckList, CheckRow } from '@/components/ui/check-row';
import { sourceWords } from '@/lib/batches/source-words';
import { checkTypedRoute, type RepairedStep } from '@/lib/parts/typed-route';
import { PROCESS_WORDS } from '@/lib/trade/process';
import { EMPTY_STEP, type PartValues, type StepValues } from './part-form-values';
import { findingWords, stepsWords } from './route-words';
import { useTypedMaterial, useTypedRoute } from './use-typed-part';

const LEVELS = { blocker: 'stop', warning: 'warn', note: 'note' } as const;

/** What the rules of the trade have against the route as it stands, and the route they propose. */
export function RouteFindings({ onTake }: { onTake: (route: StepValues[]) => void }) {
  const { control } = useFormContext<PartValues>();
  const tables = useTables();
  const material = useTypedMaterial();
  const route = useTypedRoute();
  const endCondition = useWatch({ control, name: 'endCondition' });
  const { findings, repaired } = useMemo(
    () => checkTypedRoute(tables, material, endCondition, route),
    [tables, material, endCondition, route],
  );
  const [before, setBefore] = useState<StepValues[] | null>(null);
  const wordsOf = (step: RepairedStep): string => {
    const process = step.is === 'new' ? step.process : route[step.at]?.process;
    const words = process ? PROCESS_WORDS[process] : 'step without a process';
    return step.is === 'new' ? `${words} (new)` : words;
  };
  const take = (steps: readonly RepairedStep[]) => {
    setBefore([...route]);
    onTake(
      steps.map((step) =>
        step.is === 'new' ? { ...EMPTY_STEP, process: step.process } : (route[step.at] ?? EMPTY_STEP),
      ),
    );
  };
  return (
    <div aria-live="polite">
      {findings.length > 0 && (
        <CheckList label="About the route">
          {findings.map((finding) => (
            <CheckRow
              key={`${finding.rule} ${finding.steps.join(' ')}`}
              level={LEVELS[finding.severity]}
              sentence={`${stepsWords(finding)}:`}
              rest={findingWords(finding)}
              source={sourceWords(finding.source)}
            />
          ))}
        </CheckList>
      )}
      {repaired && (
        <div className="py-2">
          <p>The rules would have it so: {repaired.map(wordsOf).join(', ')}.</p>
          <Button size="small" className="mt-1.5" onClick={() => take(repaired)}>
            Take the repaired route
          </Button>
        </div>
      )}
      {before && !repaired && (
        <p className="flex flex-wrap items-baseline gap-x-4 py-2">
          The repaired route is taken. New steps still need their specification.
          <Button
            look="word"
            onClick={() => {
              onTake(before);
              setBefore(null);
            }}
          >
            Put the route back
          </Button>
        </p>
      )}
    </div>
  );
}
