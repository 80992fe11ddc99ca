'use client';

import { useMemo } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTables } from '@/components/reference/use-tables';
import { materialOf, type MaterialOf } from '@/lib/parts/material-of';
import type { PartValues, StepValues } from './part-form-values';

/** The material as it is typed now. */
export function useTypedMaterial(): MaterialOf {
  const { control } = useFormContext<PartValues>();
  const tables = useTables();
  const [alloy, form, clad] = useWatch({ control, name: ['alloy', 'form', 'clad'] });
  return useMemo(
    () => materialOf(tables.material, { alloy, form, clad: clad ?? false }),
    [tables, alloy, form, clad],
  );
}

export function useTypedRoute(): readonly StepValues[] {
  const { control } = useFormContext<PartValues>();
  return useWatch({ control, name: 'route' }) ?? [];
}

/** The condition in which the pieces come to a step: what it says, else what the steps before made of them. */
export function conditionBefore(route: readonly StepValues[], at: number, made: string): string {
  const before = route.slice(0, at).findLast(({ targetCondition }) => targetCondition)?.targetCondition;
  return route[at]?.conditionBefore || before || made;
}
