'use client';

import { useMemo } from 'react';
import { useFormContext } from 'react-hook-form';
import { SourceLine } from '@/components/reference/source-line';
import { useTables } from '@/components/reference/use-tables';
import { useClock } from '@/components/session/use-me';
import { Button } from '@/components/ui/button';
import { Edge } from '@/components/ui/edge';
import { calledSpecification } from '@/lib/parts/called-specification';
import type { CallOutNote } from '@/lib/trade/lineage/call-out-findings';
import type { PartValues } from './part-form-values';
import { useTypedRoute } from './use-typed-part';

const NOTE_WORDS: Record<CallOutNote, string> = {
  type_i_hexavalent_applies: 'No type is stated: Type I, hexavalent, applies.',
  nitric_unless_engineering_allows_citric: 'Nitric acid applies unless engineering allows citric.',
  acceptance_class_4_applies: 'Acceptance class 4 applies.',
  type_guidance_lost: 'No type is stated, and the document no longer says which applies.',
  excludes_parts: 'This issue is for raw material and excludes parts.',
  raw_material_only: 'This issue is for raw material only.',
  pulls_in_slash_sheet: 'It calls the slash sheet of the alloy with it: name it.',
  number_forks_by_product: 'It became several documents, by product.',
  classes_do_not_map: 'Its classes have no equal in the document that followed.',
  not_over_200_ksi_unless_specified: 'Steel over 200 ksi is not plated by it unless the order says so.',
  no_sensitivity_level_in_first_issue: 'Its first issue knows no sensitivity levels.',
};

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
          {NOTE_WORDS[note.note]}
          {note.asksEngineering && ' Ask engineering before the work starts.'}
          <SourceLine source={note.source} readFrom={note.readFrom} />
        </Edge>
      ))}
    </div>
  );
}
