import { Button } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import { PROCESS_WORDS } from '@/lib/trade/process';

import type { BenchStep } from './bench-route';
import { optionsOf } from './choice-of';

interface RouteStepsProps {
  route: readonly BenchStep[];
  onChange: (route: readonly BenchStep[]) => void;
}

/** The steps in their order, to be named, moved and taken out. */
export function RouteSteps({ route, onChange }: RouteStepsProps) {
  const change = (at: number, said: Partial<BenchStep>) =>
    onChange(route.map((step, other) => (other === at ? { ...step, ...said } : step)));
  const up = (at: number) => {
    const moved = route[at];
    if (moved) onChange(route.filter((_, other) => other !== at).toSpliced(at - 1, 0, moved));
  };
  return (
    <ol aria-label="Steps of the route" className="pt-2">
      {route.map((step, at) => (
        <li key={at} className="border-b border-rule pt-2 pb-3">
          <div className="flex flex-wrap items-baseline gap-x-4">
            <span className="font-cond text-sub">
              Step <span className="num">{at + 1}</span>
            </span>
            <span className="ml-auto flex gap-x-4">
              {at > 0 && (
                <Button look="word" aria-label={`Move step ${at + 1} up`} onClick={() => up(at)}>
                  Up
                </Button>
              )}
              {at < route.length - 1 && (
                <Button look="word" aria-label={`Move step ${at + 1} down`} onClick={() => up(at + 1)}>
                  Down
                </Button>
              )}
              <Button
                look="word"
                aria-label={`Take step ${at + 1} out`}
                onClick={() => onChange(route.filter((_, other) => other !== at))}
              >
                Take out
              </Button>
            </span>
          </div>
          <div className="grid grid-cols-3 gap-x-3.5 gap-y-3 pt-1.5 max-md:grid-cols-1">
            <SelectField
              label="Process"
              empty="Choose"
              options={optionsOf(PROCESS_WORDS)}
              value={step.process}
              onChange={({ currentTarget }) => change(at, { process: currentTarget.value })}
            />
            <TextField
              label="Specification with its issue"
              mono
              autoComplete="off"
              value={step.specification}
              onChange={({ currentTarget }) => change(at, { specification: currentTarget.value })}
            />
            <TextField
              label="Class, type, grade"
              autoComplete="off"
              value={step.classType}
              onChange={({ currentTarget }) => change(at, { classType: currentTarget.value })}
            />
          </div>
        </li>
      ))}
    </ol>
  );
}
