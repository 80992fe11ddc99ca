import type { Table } from '@/lib/trade/table';
import type { LoadTables } from '@/lib/trade/heat-treat/load-needs';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import {
  CLAD_REHEATS_MIL,
  CLAD_REHEATS_TO,
  CLAD_TREATMENTS_AMS,
  type CladReheatRow,
} from '@/lib/trade/tables/clad-reheats';
import { MELTING } from '@/lib/trade/tables/melting';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { SOAK_TIMES } from '@/lib/trade/tables/soak-times';
import { SOLUTION_TEMPERATURES } from '@/lib/trade/tables/solution-temperatures';

import { PART_TABLES, type PartTables } from './published-tables';

/** How often clad metal may be treated, by whose document is ordered; `strictest` where none of them is. */
export interface CladTables {
  readonly byDocument: readonly { documents: readonly string[]; table: Table<CladReheatRow> }[];
  readonly strictest: Table<CladReheatRow>;
}

const LOADS: LoadTables = {
  solution: SOLUTION_TEMPERATURES,
  melting: MELTING,
  soak: SOAK_TIMES,
  quenchDelays: QUENCH_DELAYS,
  ageing: AGEING_CYCLES,
};

const CLAD: CladTables = {
  byDocument: [
    { documents: ['AMS2770'], table: CLAD_TREATMENTS_AMS },
    { documents: ['MIL-H-6088', 'AMS-H-6088'], table: CLAD_REHEATS_MIL },
    { documents: ['T.O. 1-1A-9'], table: CLAD_REHEATS_TO },
  ],
  strictest: CLAD_REHEATS_MIL,
};

/** What a batch is checked against: the tables of its parts, of furnace loads and of clad metal. */
export interface BatchTables extends PartTables {
  readonly loads: LoadTables;
  readonly clad: CladTables;
}

export const BATCH_TABLES: BatchTables = { ...PART_TABLES, loads: LOADS, clad: CLAD };
