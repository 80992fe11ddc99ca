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
 * What a chart of a batch must show, from all that the batch and its lines ask for: the longest of the least times, the
 * shortest of the most.
 *
 * @returns in °F; null where no temperature is asked for that a chart could be held against, or lines ask for different ones.
 */
export function askedOfChart(asked: readonly Requirements[]): ChartRequirement | null {
  for (const name of STEPS) {
    const steps = asked.flatMap((one) => (one[name] as Step | undefined) ?? []);
    const settings = steps.filter(({ set_f, tolerance_f }) => set_f !== undefined && tolerance_f);
    const [setting] = settings;
    if (setting?.set_f === undefined || setting.tolerance_f === undefined) continue;
    const { set_f: set, tolerance_f: tolerance } = setting;
    if (settings.some((one) => one.set_f !== set || one.tolerance_f !== tolerance)) return null;
    const least = steps.flatMap(
      ({ soak_min_minutes: minutes, min_hours: hours }) => minutes ?? inMinutes(hours),
    );
    const most = steps.flatMap(({ soak_max_minutes }) => soak_max_minutes ?? []);
    const delays = name === 'solution' ? asked.flatMap(({ quench }) => quench?.max_delay_seconds ?? []) : [];
    return {
      set,
      tolerance,
      unit: 'F',
      ...(least.length > 0 && { soakMinutes: Math.max(...least) }),
      ...(most.length > 0 && { soakMinutesMax: Math.min(...most) }),
      ...(delays.length > 0 && { maxQuenchDelayS: Math.min(...delays) }),
    };
  }
  return null;
}

const inMinutes = (hours: number | undefined): number[] => (hours === undefined ? [] : [hours * 60]);
