'use client';

import { useMemo } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTables } from '@/components/reference/use-tables';
import { checkTypedRoute } from '@/lib/parts/typed-route';
import { CheckedRouteView } from './checked-route';
import { EMPTY_STEP, type PartValues, type StepValues } from './part-form-values';
import { useTypedMaterial, useTypedRoute } from './use-typed-part';

/** What the rules of the trade have against the route as it stands, and the route they propose. */
export function RouteFindings({ onTake }: { onTake: (route: StepValues[]) => void }) {
  const { control } = useFormContext<PartValues>();
  const tables = useTables();
  const material = useTypedMaterial();
  const route = useTypedRoute();
  const endCondition = useWatch({ control, name: 'endCondition' });
  const checked = useMemo(
    () => checkTypedRoute(tables, material, endCondition, route),
    [tables, material, endCondition, route],
  );
  return (
    <CheckedRouteView
      checked={checked}
      route={route}
      newStep={(process) => ({ ...EMPTY_STEP, process })}
      onTake={onTake}
    />
  );
}
