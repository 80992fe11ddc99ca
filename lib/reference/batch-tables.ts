import type { Table } from '@/lib/trade/table';
import type { LoadTables } from '@/lib/trade/heat-treat/load-needs';
import type { ClassNeededRow } from '@/lib/trade/pyrometry/class-needed';
import type { CodeLetterRow } from '@/lib/trade/sampling/code-letter';
import type { SingleSamplingRow } from '@/lib/trade/sampling/single-sampling-plan';
import { ACCEPTANCE, type AcceptanceRow } from '@/lib/trade/tables/acceptance';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { ANNEALS, type AnnealRow } from '@/lib/trade/tables/anneals';
import {
  CLAD_REHEATS_MIL,
  CLAD_REHEATS_TO,
  CLAD_TREATMENTS_AMS,
  type CladReheatRow,
} from '@/lib/trade/tables/clad-reheats';
import { FURNACE_CLASSES_NEEDED } from '@/lib/trade/tables/furnace-classes-needed';
import { MELTING } from '@/lib/trade/tables/melting';
import { NDT_DESIGNATIONS, type NdtDesignationRow } from '@/lib/trade/tables/ndt-designations';
import { QUENCH_DELAYS } from '@/lib/trade/tables/quench-delays';
import { PASSIVATION_BATHS, type PassivationBathRow } from '@/lib/trade/tables/passivation-baths';
import { PASSIVATION_TESTS, type PassivationTestRow } from '@/lib/trade/tables/passivation-tests';
import { QUENCH_BATHS, type QuenchBathRow } from '@/lib/trade/tables/quench-media';
import { CODE_LETTERS } from '@/lib/trade/tables/sampling-code-letters';
import { SINGLE_SAMPLING_NORMAL } from '@/lib/trade/tables/single-sampling-normal';
import { SINGLE_SAMPLING_REDUCED } from '@/lib/trade/tables/single-sampling-reduced';
import { SINGLE_SAMPLING_TIGHTENED } from '@/lib/trade/tables/single-sampling-tightened';
import { SOAK_TIMES } from '@/lib/trade/tables/soak-times';
import { SOLUTION_TEMPERATURES } from '@/lib/trade/tables/solution-temperatures';
import { STEEL_TEMPERING, type SteelTemperingRow } from '@/lib/trade/tables/steel-tempering';
import { STEEL_WINDOWS, type SteelWindowRow } from '@/lib/trade/tables/steel-windows';

import { inForce } from './in-force';
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

/** What limits are proposed from beside the tables of parts and loads. */
export interface RequirementTables {
  readonly quenchBaths: Table<QuenchBathRow>;
  readonly acceptance: Table<AcceptanceRow>;
  readonly anneals: Table<AnnealRow>;
  readonly steelWindows: Table<SteelWindowRow>;
  readonly steelTempering: Table<SteelTemperingRow>;
  readonly ndt: Table<NdtDesignationRow>;
  readonly passivationBaths: Table<PassivationBathRow>;
  readonly passivationTests: Table<PassivationTestRow>;
  readonly furnaceClasses: Table<ClassNeededRow>;
  readonly codeLetters: Table<CodeLetterRow>;
  readonly sampling: Readonly<Record<'normal' | 'tightened' | 'reduced', Table<SingleSamplingRow>>>;
}

const REQUIREMENTS: RequirementTables = {
  quenchBaths: QUENCH_BATHS,
  acceptance: ACCEPTANCE,
  anneals: ANNEALS,
  steelWindows: STEEL_WINDOWS,
  steelTempering: STEEL_TEMPERING,
  ndt: NDT_DESIGNATIONS,
  passivationBaths: PASSIVATION_BATHS,
  passivationTests: PASSIVATION_TESTS,
  furnaceClasses: FURNACE_CLASSES_NEEDED,
  codeLetters: CODE_LETTERS,
  sampling: {
    normal: SINGLE_SAMPLING_NORMAL,
    tightened: SINGLE_SAMPLING_TIGHTENED,
    reduced: SINGLE_SAMPLING_REDUCED,
  },
};

/** What a batch is checked against: the tables of its parts, of furnace loads, of clad metal and of limits. */
export interface BatchTables extends PartTables {
  readonly loads: LoadTables;
  readonly clad: CladTables;
  readonly requirements: RequirementTables;
}

/** The published ones. */
export const BATCH_TABLES: BatchTables = {
  ...PART_TABLES,
  ...inForce({ loads: LOADS, clad: CLAD, requirements: REQUIREMENTS }, new Map()),
};
