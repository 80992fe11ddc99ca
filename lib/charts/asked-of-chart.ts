import type { ChartRequirement } from '@/lib/evidence/chart/requirement';
import type { Requirements } from '@/lib/evidence/order';

/** Steps in a furnace that a recorder draws, as an order may ask for them; the first that is asked is the chart's. */
const STEPS = ['solution', 'austenitize', 'temper', 'stress_relief', 'age', 'bake'] as const;

interface Step {
  set_f?: number;
  tolerance_f?: number;
  soak_min_minutes?: number;
  soak_max_minutes?: number;
  min_hours?: number;
}

/**
 * What a chart of a batch must show, from what the batch asks for.
 *
 * @returns in °F; null where no temperature is asked for that a chart could be held against.
 */
export function askedOfChart(asked: Requirements): ChartRequirement | null {
  for (const name of STEPS) {
    const step = asked[name] as Step | undefined;
    if (step?.set_f === undefined || !step.tolerance_f) continue;
    const least = step.soak_min_minutes ?? (step.min_hours === undefined ? undefined : step.min_hours * 60);
    const delay = name === 'solution' ? asked.quench?.max_delay_seconds : undefined;
    return {
      set: step.set_f,
      tolerance: step.tolerance_f,
      unit: 'F',
      ...(least !== undefined && { soakMinutes: least }),
      ...(step.soak_max_minutes !== undefined && { soakMinutesMax: step.soak_max_minutes }),
      ...(delay !== undefined && { maxQuenchDelayS: delay }),
    };
  }
  return null;
}
