import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { ndtAsOrdered } from '@/lib/trade/ndt/ndt-as-ordered';
import type { NdtDesignationRow } from '@/lib/trade/tables/ndt-designations';

import { proposalInWords, type AskedLine } from './proposal';

const METHODS = { fluorescent_penetrant: 'penetrant', magnetic_particle: 'magnetic_particle' } as const;

const NAMES: Record<NdtDesignationRow['key'], string> = {
  type: 'Penetrant type',
  method: 'Penetrant method',
  level: 'Sensitivity',
  medium: 'Medium',
};
const says = ({ key, value, says: words }: Pick<NdtDesignationRow, 'key' | 'value' | 'says'>): string =>
  key === 'medium' ? words : `${key} ${value}, ${words}`;

/** What papers of a non-destructive test state: what the order chose of types, methods, sensitivity and media. */
export function inspectionProposals(tables: BatchTables, { step }: AskedLine): ToProve[] {
  const method = METHODS[step.process as keyof typeof METHODS];
  if (!method) return [];
  const ordered = ndtAsOrdered(tables.requirements.ndt, { method, classType: step.classType ?? '' });
  if (!ordered.ok) return [];
  return ordered.stated.flatMap((one) => proposalInWords(NAMES[one.key], says(one), ordered.source));
}
