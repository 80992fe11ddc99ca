import { readMaterial } from '@/lib/trade/alloys/read-material';
import { cautionsFor } from '@/lib/trade/cautions/cautions-for';
import type { Process } from '@/lib/trade/process';
import { CAUTIONS } from '@/lib/trade/tables/cautions';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';

/**
 * What stands on a traveller: the customary cautions of the process and of the metals in the batch. A material that is
 * not recognised adds none.
 */
export function cautionsOf(process: Process, materials: readonly string[]): string[] {
  const families = materials.flatMap((written) => {
    const material = readMaterial(TEMPER_DESIGNATIONS, written);
    return material.ok ? [material.family] : [];
  });
  return cautionsFor(CAUTIONS, { process, families, papers: true }).map(({ says }) => says);
}
