'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { CheckList, CheckRow } from '@/components/ui/check-row';
import { sourceWords } from '@/lib/batches/source-words';
import type { CheckedRoute, RepairedStep } from '@/lib/parts/typed-route';
import { PROCESS_WORDS, PROCESSES, type Process } from '@/lib/trade/process';
import { ruleWords, stepsWords } from './route-words';

const LEVELS = { blocker: 'stop', warning: 'warn', note: 'note' } as const;

interface CheckedRouteViewProps<Step> {
  checked: CheckedRoute;
  /** As it is typed; an empty process is none chosen yet. */
  route: readonly Step[];
  newStep: (process: Process) => Step;
  onTake: (route: Step[]) => void;
}

/** What the rules of the trade have against a route, and the route they propose, taken or put back in one press. */
export function CheckedRouteView<Step extends { process: string }>({
  checked: { findings, repaired },
  route,
  newStep,
  onTake,
}: CheckedRouteViewProps<Step>) {
  const [before, setBefore] = useState<Step[] | null>(null);
  const stepOf = (step: RepairedStep): Step | undefined =>
    step.is === 'new' ? newStep(step.process) : route[step.at];
  const wordsOf = (step: RepairedStep): string => {
    const process = PROCESSES.find((one) => one === stepOf(step)?.process);
    const words = process ? PROCESS_WORDS[process] : 'step without a process';
    return step.is === 'new' ? `${words} (new)` : words;
  };
  const take = (steps: readonly RepairedStep[]) => {
    setBefore([...route]);
    onTake(steps.flatMap((step) => stepOf(step) ?? []));
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
              rest={ruleWords(finding.rule)}
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
