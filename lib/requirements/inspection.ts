import type { ToProve } from '@/lib/parts/to-prove';
import type { BatchTables } from '@/lib/reference/batch-tables';
import { ndtAsOrdered } from '@/lib/trade/ndt/ndt-as-ordered';
import { COMMON_PRACTICE } from '@/lib/trade/source';
import type { NdtDesignationRow } from '@/lib/trade/tables/ndt-designations';

import { proposalInWords, type AskedLine } from './proposal';
import { question } from './question';

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

/** What the papers of a method that looks inside the metal have to show, whatever document is called. */
const INSIDE = {
  radiography: ['Views and technique', 'Acceptance level', 'Inspector qualification'],
  ultrasonic: ['Scans and reference standard', 'Acceptance level', 'Inspector qualification'],
} as const;

/**
 * Radiography and ultrasonic inspection. No table here has their levels: each is proposed as the question that the
 * drawing answers. What the step states of acceptance and personnel is proposed as it stands.
 */
export function insideProposals(process: keyof typeof INSIDE, { ordering }: AskedLine): ToProve[] {
  const stated: Partial<Record<string, string>> = {
    'Acceptance level': ordering.acceptance_criteria?.trim(),
    'Inspector qualification': ordering.personnel_standard?.trim(),
  };
  return INSIDE[process].flatMap((name) =>
    stated[name] ? proposalInWords(name, stated[name], COMMON_PRACTICE) : question(name, COMMON_PRACTICE),
  );
}
