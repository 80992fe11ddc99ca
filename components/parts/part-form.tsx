'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useState, type ReactNode } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import { showOnForm } from '@/components/api/show-on-form';
import { Button, ButtonLink } from '@/components/ui/button';
import { Failing } from '@/components/ui/failing';
import { MainAndSide } from '@/components/ui/section';
import type { ApiError } from '@/lib/api/client';
import { PartInput } from '@/lib/parts/contract';
import { DrawingField } from './drawing-field';
import { IdentityFields, NoteField, SizeFields } from './part-fields';
import type { PartValues } from './part-form-values';
import { RouteEditor } from './route-editor';

interface PartFormProps {
  values: PartValues;
  /** Why number and revision cannot be changed here. */
  frozen?: { number?: string | undefined; revision?: string | undefined; serialised?: string | undefined };
  /** Steps that lots have waited for: they can be changed, not taken out. */
  usedSteps?: readonly string[];
  drawingName?: string | undefined;
  save: (input: PartInput, options: { onError: (error: ApiError) => void }) => Promise<unknown>;
  /** Verb and object: "Add the part". */
  action: string;
  busyLabel: string;
  cancelHref: string;
  /** Said above the fields. */
  children?: ReactNode;
}

/** A part as a form: added, corrected or revised, always the same fields in the same places. */
export function PartForm({
  values,
  frozen = {},
  usedSteps = [],
  drawingName,
  save,
  action,
  busyLabel,
  cancelHref,
  children,
}: PartFormProps) {
  const form = useForm<PartValues, unknown, PartInput>({
    resolver: zodResolver(PartInput),
    defaultValues: values,
  });
  const { errors, isSubmitting } = form.formState;
  const [sending, setSending] = useState(false);
  const submit = form.handleSubmit((input) =>
    save(input, { onError: showOnForm(form) }).then(
      () => undefined,
      () => undefined,
    ),
  );

  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={submit}>
        {children}
        {errors.root?.message && <Failing says={errors.root.message} stands="What you typed is kept here." />}
        <MainAndSide
          main={
            <>
              <IdentityFields frozen={frozen} />
              <RouteEditor usedSteps={usedSteps} />
            </>
          }
          side={
            <>
              <SizeFields />
              <DrawingField name={drawingName} onUnderWay={setSending} />
              <NoteField />
            </>
          }
        />
        <div className="mt-6 flex flex-wrap items-center gap-2.5 border-t-heavy border-ink pt-4">
          <Button
            type="submit"
            look="primary"
            busy={isSubmitting}
            busyLabel={busyLabel}
            notNow={sending && 'The drawing is still on its way.'}
          >
            {action}
          </Button>
          <ButtonLink href={cancelHref}>Leave without keeping</ButtonLink>
          {Object.keys(errors).length > 0 && (
            <span role="status" className="text-held-ink">
              Not kept yet: the fields in red say why.
            </span>
          )}
        </div>
      </form>
    </FormProvider>
  );
}
