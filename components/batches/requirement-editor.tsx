'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useFieldArray, useForm } from 'react-hook-form';
import { z } from 'zod';

import { showOnForm } from '@/components/api/show-on-form';
import { Button } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { setRequirements, type Batch, type Requirement } from '@/lib/batches/contract';
import { REQUIREMENT_SOURCES, ToProve } from '@/lib/parts/to-prove';

import { useBatchWrite } from './use-batch-write';

const Values = z.object({ requirements: z.array(ToProve).max(60) });
type Values = z.input<typeof Values>;

const EMPTY = { characteristic: '', limit: '', unit: '', source: 'specification', sourceText: '' } as const;
const SOURCES = REQUIREMENT_SOURCES.map((source) => ({ value: source, says: source }));

interface RequirementEditorProps {
  batch: Batch;
  /** Null: for all lines. */
  lineId: string | null;
  says: string;
  requirements: readonly Requirement[];
  onDone: () => void;
}

/** The list of one group, typed over in place. */
export function RequirementEditor({ batch, lineId, says, requirements, onDone }: RequirementEditorProps) {
  const kept = requirements.map(({ characteristic, limit, unit, source, sourceText, readFrom }) => ({
    characteristic,
    limit,
    unit,
    source,
    sourceText,
    readFrom,
  }));
  const form = useForm<Values, unknown, z.output<typeof Values>>({
    resolver: zodResolver(Values),
    defaultValues: { requirements: kept.length > 0 ? kept : [EMPTY] },
  });
  const rows = useFieldArray({ control: form.control, name: 'requirements' });
  const { run, busy } = useBatchWrite(setRequirements, showOnForm(form));
  const { register, formState } = form;

  const save = form.handleSubmit(async (values) => {
    const done = await run({
      batchId: batch.id,
      version: batch.version,
      lineId,
      requirements: values.requirements,
    });
    if (!done) return;
    onDone();
    showMessage({ says: `${says}: what must be proved is kept.` });
  });
  return (
    <form
      aria-label={`What must be proved: ${says}`}
      noValidate
      onSubmit={(event) => void save(event)}
      className="py-2"
    >
      {rows.fields.map((row, at) => {
        const faults = formState.errors.requirements?.[at];
        return (
          <fieldset
            key={row.id}
            className="flex flex-wrap items-start gap-x-3 gap-y-2 border-t border-rule py-2"
          >
            <legend className="sr-only">{`Requirement ${at + 1}`}</legend>
            <TextField
              className="min-w-40 flex-[2]"
              label="What"
              placeholder="Hardness"
              error={faults?.characteristic?.message}
              {...register(`requirements.${at}.characteristic`)}
            />
            <TextField
              className="min-w-32 flex-[2]"
              label="Limit"
              mono
              placeholder="63 to 83"
              error={faults?.limit?.message}
              {...register(`requirements.${at}.limit`)}
            />
            <TextField
              className="w-24"
              label="Unit"
              mono
              placeholder="HRB"
              error={faults?.unit?.message}
              {...register(`requirements.${at}.unit`)}
            />
            <SelectField
              className="w-36"
              label="From"
              options={SOURCES}
              error={faults?.source?.message}
              {...register(`requirements.${at}.source`)}
            />
            <TextField
              className="min-w-32 flex-1"
              label="Clause or note"
              error={faults?.sourceText?.message}
              {...register(`requirements.${at}.sourceText`)}
            />
            <span className="pt-[30px]">
              <Button look="word" aria-label={`Remove requirement ${at + 1}`} onClick={() => rows.remove(at)}>
                Remove
              </Button>
            </span>
          </fieldset>
        );
      })}
      {formState.errors.root && (
        <p className="py-1 font-semibold text-held-ink">{formState.errors.root.message}</p>
      )}
      <div className="flex flex-wrap items-center gap-3 pt-1">
        <Button type="submit" busy={busy} busyLabel="Saving">
          Keep these
        </Button>
        <Button look="word" onClick={() => rows.append(EMPTY)}>
          Add one
        </Button>
        <Button look="word" onClick={onDone}>
          Leave as it was
        </Button>
      </div>
    </form>
  );
}
