'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProvider, useFieldArray, useForm, useWatch } from 'react-hook-form';

import { useWrite } from '@/components/api/use-api';
import { useClock } from '@/components/session/use-me';
import { Button, ButtonLink } from '@/components/ui/button';
import { Failing } from '@/components/ui/failing';
import { DateField, TextArea, TextField } from '@/components/ui/field';
import { showMessage } from '@/components/ui/message';
import { PageHead } from '@/components/ui/page-head';
import { Section } from '@/components/ui/section';
import type { ApiError } from '@/lib/api/client';
import { call } from '@/lib/api/client';
import type { OutputOf } from '@/lib/api/endpoint';
import { createAssembly, getAssembly, listAssemblies, updateAssembly } from '@/lib/assemblies/contract';
import { dayWords } from '@/lib/day-words';

import {
  AssemblyFields,
  atFormRow,
  fieldsOf,
  NEW_ASSEMBLY,
  sentOf,
  type AssemblyFieldsIn,
  type AssemblyFieldsOut,
} from './assembly-fields';
import { NeedRow } from './need-row';

type Assembly = OutputOf<typeof getAssembly>;

/** A new assembly, or (given one) a change of it. What was typed stays, whatever is refused. */
export function AssemblyForm({ assembly }: { assembly?: Assembly }) {
  const router = useRouter();
  const clock = useClock();
  const [seen, setSeen] = useState(assembly);
  /** What somebody else saved while this was being typed. */
  const [theirs, setTheirs] = useState<Assembly | null>(null);
  const form = useForm<AssemblyFieldsIn, unknown, AssemblyFieldsOut>({
    resolver: zodResolver(AssemblyFields),
    defaultValues: assembly ? fieldsOf(assembly) : NEW_ASSEMBLY,
  });
  const rows = useFieldArray({ control: form.control, name: 'needs' });
  const create = useWrite(createAssembly, { refreshes: [listAssemblies] });
  const update = useWrite(updateAssembly, { refreshes: [listAssemblies, getAssembly] });
  const needed = useWatch({ control: form.control, name: 'neededOn' });
  const needs = useWatch({ control: form.control, name: 'needs' });
  const { errors } = form.formState;

  const save = form.handleSubmit(async (typed) => {
    try {
      const id = seen ? await change(seen, typed) : (await create.mutateAsync(sentOf(typed))).id;
      showMessage({ says: `${typed.name} is saved.` });
      router.push(`/assemblies/${id}`);
    } catch (error) {
      await refuse(error as ApiError, typed);
    }
  });
  const change = async (of: Assembly, typed: AssemblyFieldsOut) => {
    await update.mutateAsync({ assemblyId: of.id, version: of.version, ...sentOf(typed) });
    return of.id;
  };
  const refuse = async ({ problem }: ApiError, typed: AssemblyFieldsOut) => {
    const { fields = [] } = problem;
    fields.forEach(({ field, message }, at) =>
      form.setError(
        atFormRow(field, typed) as 'name',
        { type: 'server', message },
        { shouldFocus: at === 0 },
      ),
    );
    if (fields.length > 0) return;
    const now =
      seen && problem.code === 'conflict'
        ? await call(getAssembly, { assemblyId: seen.id }).catch(() => null)
        : null;
    if (now && now.version !== seen?.version) setTheirs(now);
    else form.setError('root', { type: 'server', message: problem.title });
  };

  const title = assembly ? `Change ${assembly.name}` : 'Add an assembly';
  const fittedOf = (partNumber: string) =>
    seen?.needs.find((need) => need.partNumber === partNumber)?.fitted ?? 0;
  return (
    <FormProvider {...form}>
      <PageHead title={title} />
      <form noValidate onSubmit={save} aria-label={title} className="max-w-3xl">
        {theirs && (
          <TheirChange
            theirs={theirs}
            onTakeTheirs={() => {
              form.reset(fieldsOf(theirs));
              setSeen(theirs);
              setTheirs(null);
            }}
            onKeepMine={() => {
              setSeen(theirs);
              setTheirs(null);
            }}
          />
        )}
        <div className="grid grid-cols-1 gap-x-4 gap-y-3 pb-5 sm:grid-cols-2">
          <TextField
            label="Name"
            autoComplete="off"
            hint="As the yard calls it: Left float 17"
            error={errors.name?.message}
            {...form.register('name')}
          />
          <DateField
            label="Needed on"
            hint={/^\d{4}-\d{2}-\d{2}$/.test(needed) ? dayWords(needed, clock) : 'May stay empty'}
            error={errors.neededOn?.message}
            {...form.register('neededOn')}
          />
          <TextArea
            label="Note"
            rows={2}
            className="sm:col-span-2"
            error={errors.note?.message}
            {...form.register('note')}
          />
        </div>
        <Section title="What it needs" note="part numbers in any revision; the drawing says which fits">
          {(errors.needs?.root?.message ?? errors.needs?.message) ? (
            <p role="alert" className="py-2 font-medium text-held-ink">
              {errors.needs?.root?.message ?? errors.needs?.message}
            </p>
          ) : null}
          <ul aria-label="Parts it needs">
            {rows.fields.map((row, at) => (
              <NeedRow
                key={row.id}
                at={at}
                fitted={fittedOf(needs[at]?.partNumber.trim() ?? '')}
                isLast={at === rows.fields.length - 1}
                onRemove={() => rows.remove(at)}
                onTyped={() => rows.append({ partNumber: '', pieces: '' }, { shouldFocus: false })}
              />
            ))}
          </ul>
        </Section>
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2 pt-5">
          <Button
            look="primary"
            size="big"
            type="submit"
            busy={create.isPending || update.isPending}
            busyLabel="Saving"
            notNow={theirs !== null && 'Choose above which of the two is right.'}
          >
            {assembly ? 'Save the changes' : 'Add the assembly'}
          </Button>
          <ButtonLink size="big" href={assembly ? `/assemblies/${assembly.id}` : '/assemblies'}>
            Leave it
          </ButtonLink>
          {errors.root && (
            <p role="alert" className="font-medium text-held-ink">
              {errors.root.message}
            </p>
          )}
        </div>
      </form>
    </FormProvider>
  );
}

interface TheirChangeProps {
  theirs: Assembly;
  onTakeTheirs: () => void;
  onKeepMine: () => void;
}

/** Somebody saved first: what it is now, and the choice. What was typed still stands below. */
function TheirChange({ theirs, onTakeTheirs, onKeepMine }: TheirChangeProps) {
  const clock = useClock();
  const needs = theirs.needs.map((need) => `${need.pieces} of ${need.partNumber}`).join(', ');
  return (
    <Failing
      says="Not saved: the assembly was changed meanwhile."
      stands={`It is now ${theirs.name}, ${theirs.neededOn === null ? 'without a day' : `needed ${dayWords(theirs.neededOn, clock)}`}, with ${needs || 'no parts'}. What you typed still stands below.`}
      actions={
        <>
          <Button look="word" onClick={onKeepMine}>
            Keep mine, then save again
          </Button>
          <Button look="word" onClick={onTakeTheirs}>
            Take what is saved
          </Button>
        </>
      }
    />
  );
}
