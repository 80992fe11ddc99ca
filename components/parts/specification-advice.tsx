'use client';

import { useMemo } from 'react';
import { useFormContext } from 'react-hook-form';
import { SourceLine } from '@/components/reference/source-line';
import { useTables } from '@/components/reference/use-tables';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import { calledSpecification } from '@/lib/parts/called-specification';
import { CALL_OUT_WORDS } from '@/lib/reference/call-out-words';
import type { PartValues } from './part-form-values';
import { useTypedRoute } from './use-typed-part';

/** What became of the specification that a step names, and what the call-out silently means. */
export function SpecificationAdvice({ at }: { at: number }) {
  const { setValue } = useFormContext<PartValues>();
  const tables = useTables();
  const { now } = useClock();
  const step = useTypedRoute()[at];
  const on = now.toISOString().slice(0, 10);
  const { specification = '', specificationRevision: revision = '', classType = '' } = step ?? {};
  const called = useMemo(
    () => calledSpecification(tables, { specification, revision, classType }, on),
    [tables, specification, revision, classType, on],
  );
  return (
    <div aria-live="polite">
      {called && called.successors.length > 0 && (
        <Edge level="warn">
          {called.number} is followed by{' '}
          {called.successors
            .map(
              (one) =>
                `${one.number}${one.on ? ` (${one.on})` : ''}${one.conditions ? `, for ${one.conditions}` : ''}`,
            )
            .join(' or ')}
          . The drawing says which one applies.
          <span className="flex flex-wrap gap-x-4 pt-1">
            {called.successors.map((one) => (
              <Button
                key={one.number}
                look="word"
                onClick={() => {
                  setValue(`route.${at}.specification`, one.number, { shouldDirty: true });
                  setValue(`route.${at}.specificationRevision`, one.revision ?? '', { shouldDirty: true });
                }}
              >
                Name {one.number}
              </Button>
            ))}
          </span>
          {called.successors[0] && <SourceLine source={called.successors[0].source} />}
        </Edge>
      )}
      {called?.notes.map((note) => (
        <Edge key={note.note} level={note.asksEngineering ? 'warn' : 'note'}>
          {CALL_OUT_WORDS[note.note]}
          {note.asksEngineering && ' Ask before the work starts.'}
          <SourceLine source={note.source} readFrom={note.readFrom} />
        </Edge>
      ))}
    </div>
  );
}
