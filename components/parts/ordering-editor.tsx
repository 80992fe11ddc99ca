'use client';

import { useMemo, useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTables } from '@/components/reference/use-tables';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { sourceWords } from '@/lib/batches/source-words';
import { orderingForm } from '@/lib/parts/ordering-form';
import { ORDERING_KIND_WORDS } from '@/lib/reference/ordering-words';
import { ORDER_ITEM_WORDS } from '@/lib/trade/ordering/order-item';
import type { PartValues } from './part-form-values';
import { useTypedRoute } from './use-typed-part';

/** What the specification asks the order to state, as fields; what is missing is named even while they are folded. */
export function OrderingEditor({ at }: { at: number }) {
  const { register, formState, control } = useFormContext<PartValues>();
  const tables = useTables();
  const endCondition = useWatch({ control, name: 'endCondition' });
  const [open, setOpen] = useState(false);
  const step = useTypedRoute()[at];
  const form = useMemo(
    () =>
      step
        ? orderingForm(tables, {
            specification: step.specification,
            specificationRevision: step.specificationRevision ?? '',
            classType: step.classType ?? '',
            conditionBefore: step.conditionBefore ?? '',
            targetCondition: step.targetCondition ?? '',
            ordering: step.ordering ?? {},
            characteristics: (step.toProve ?? []).map(({ characteristic }) => characteristic),
            endCondition,
          })
        : null,
    [tables, step, endCondition],
  );
  if (!form || form.asked.length === 0) return null;
  const missing = form.missing.map(({ item }) => ORDER_ITEM_WORDS[item]);
  return (
    <div
      className="mt-3 border-l-4 border-rule pl-3"
      role="group"
      aria-label={`The order for step ${at + 1}`}
    >
      <p className="font-cond text-word">
        The order states{' '}
        <span className={`font-normal ${missing.length > 0 ? 'text-dispatched-ink' : 'text-quiet'}`}>
          {missing.length > 0
            ? `still missing: ${missing.join('; ')}`
            : 'all that the specification asks for'}
        </span>
      </p>
      {open && (
        <div className="grid grid-cols-2 gap-x-4 gap-y-3 py-2 max-md:grid-cols-1">
          {form.asked.map(({ item, kind, otherwise, source }) => (
            <TextField
              key={item}
              label={<span className="first-letter:uppercase">{ORDER_ITEM_WORDS[item]}</span>}
              autoComplete="off"
              hint={`${ORDERING_KIND_WORDS[kind]}${otherwise ? `; otherwise ${otherwise}` : ''}. ${sourceWords(source)}`}
              error={formState.errors.route?.[at]?.ordering?.[item]?.message}
              {...register(`route.${at}.ordering.${item}`)}
            />
          ))}
        </div>
      )}
      <Button look="word" aria-expanded={open} onClick={() => setOpen(!open)}>
        {open ? 'Fold what the order states' : 'State what is asked'}
      </Button>
    </div>
  );
}
