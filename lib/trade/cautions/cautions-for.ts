import type { AlloyFamily } from '../alloys/alloy';
import type { Process } from '../process';
import type { Source } from '../source';
import { referenceTo, type Table, type TableReference } from '../table';

export interface CautionRow {
  /** `any`: with every process. */
  readonly processes: readonly Process[] | 'any';
  /** Only where one of these metals is in the load; left out: always. */
  readonly families?: readonly AlloyFamily[];
  readonly says: string;
  /** Whether it stands on the papers that go with the parts, or only where somebody looks it up. */
  readonly onPapers: boolean;
}

export interface Caution {
  readonly says: string;
  readonly source: Source;
  readonly readFrom: TableReference;
}

/**
 * The customary cautions of a process, in the order of the table. They replace no rule of the place and no training.
 *
 * @param asked `families` are the metals in the load as far as they are known; `papers` leaves out what belongs only
 *   where somebody looks it up.
 * @returns none where the table has none.
 * @example cadmium plating on papers: parts of high-strength steel are held until the bake is proved, and the fumes.
 */
export function cautionsFor(
  table: Table<CautionRow>,
  asked: { process: Process; families: readonly AlloyFamily[]; papers: boolean },
): Caution[] {
  return table.rows
    .filter(({ processes }) => processes === 'any' || processes.includes(asked.process))
    .filter(({ families }) => !families || families.some((family) => asked.families.includes(family)))
    .filter(({ onPapers }) => onPapers || !asked.papers)
    .map(({ says, source }) => ({ says, source, readFrom: referenceTo(table) }));
}
