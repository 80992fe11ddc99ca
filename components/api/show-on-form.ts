import type { FieldValues, Path, UseFormReturn } from 'react-hook-form';

import type { ApiError } from '@/lib/api/client';

/** Puts a refusal where it belongs: beside each field it names, the rest above the form. The first wrong field takes focus. */
export function showOnForm<Values extends FieldValues>(
  form: Pick<UseFormReturn<Values>, 'setError'>,
): (error: ApiError) => void {
  return (error) => {
    const fields = error.problem.fields ?? [];
    fields.forEach(({ field, message }, at) =>
      form.setError(field as Path<Values>, { type: 'server', message }, { shouldFocus: at === 0 }),
    );
    if (fields.length === 0) form.setError('root', { type: 'server', message: error.problem.title });
  };
}
