import type { ClassNeededRow } from '../pyrometry/class-needed';
import type { Source } from '../source';
import type { Table } from '../table';

const ALUMINIUM: Source = { document: 'AMS 2770', confidence: 'memory', certainty: 'medium' };
const STEEL: Source = { document: 'AMS 2759', confidence: 'memory', certainty: 'medium' };

export const FURNACE_CLASSES_NEEDED: Table<ClassNeededRow> = {
  id: 'furnace-classes-needed',
  title: 'Furnace class by kind of work',
  edition: 'AMS 2770 and AMS 2759, from memory',
  rows: [
    { work: 'aluminium_solution', loosest: 2, tightest: 2, source: ALUMINIUM },
    { work: 'aluminium_age', loosest: 2, tightest: 2, source: ALUMINIUM },
    { work: 'steel_austenitize', loosest: 5, tightest: 5, source: STEEL },
    { work: 'steel_temper', loosest: 3, tightest: 2, source: STEEL },
    { work: 'ph_steel_age', loosest: 2, tightest: 2, source: STEEL },
  ],
};
