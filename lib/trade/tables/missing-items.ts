import type { MissingItemRow } from '../ordering/missing-items';
import type { Source } from '../source';
import type { Table } from '../table';

const ADVICE: Source = {
  document: 'Published advice of heat treaters, platers and inspection houses',
  confidence: 'read',
  certainty: 'high',
};

/** What orders leave out, the commonest first, by how many of the sources say so. */
export const MISSING_ITEMS: Table<MissingItemRow> = {
  id: 'missing-items',
  title: 'What orders leave out',
  edition: 'Collected from published advice, 2026',
  rows: [
    { rank: 1, items: ['specification_and_revision', 'type', 'class', 'grade'], saidBy: 4, source: ADVICE },
    { rank: 2, items: ['next_step'], saidBy: 4, source: ADVICE },
    { rank: 3, items: ['alloy', 'condition_before'], saidBy: 3, source: ADVICE },
    { rank: 4, items: ['quantity'], saidBy: 3, source: ADVICE },
    { rank: 5, items: ['due_date', 'shipping'], saidBy: 3, source: ADVICE },
    { rank: 6, items: ['hardness_or_strength', 'colour'], saidBy: 2, source: ADVICE },
    { rank: 7, items: ['areas', 'coverage'], saidBy: 2, source: ADVICE },
    { rank: 8, items: ['test_location', 'sampling_plan'], saidBy: 2, source: ADVICE },
    { rank: 9, items: ['acceptance_criteria'], saidBy: 2, source: ADVICE },
    { rank: 10, items: ['steel_strength', 'stress_relief', 'embrittlement_bake'], saidBy: 2, source: ADVICE },
    { rank: 11, items: ['print'], saidBy: 1, source: ADVICE },
    { rank: 12, items: ['contact'], saidBy: 1, source: ADVICE },
    { rank: 13, items: ['terms'], saidBy: 1, source: ADVICE },
    { rank: 14, items: ['appearance'], saidBy: 1, source: ADVICE },
  ],
};
