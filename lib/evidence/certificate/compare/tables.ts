import type { HardnessTable } from '@/lib/trade/hardness/hardness-table';
import type { LineageEvent } from '@/lib/trade/lineage/lineage-event';
import type { Table } from '@/lib/trade/table';
import { ACCEPTANCE, type AcceptanceRow } from '@/lib/trade/tables/acceptance';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { HARDNESS_ALUMINIUM } from '@/lib/trade/tables/hardness-aluminium';
import { HARDNESS_STEEL_BRINELL } from '@/lib/trade/tables/hardness-steel-brinell';
import { HARDNESS_STEEL_HRB } from '@/lib/trade/tables/hardness-steel-hrb';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import { HARDNESS_STEEL_OTHER_LIST } from '@/lib/trade/tables/hardness-steel-other-list';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';
import { TEMPER_TRANSITIONS } from '@/lib/trade/tables/temper-transitions';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';
import type { ConditionRules } from '@/lib/trade/tempers/condition-graph';

/** What certificates are compared by; a shop's own edition of any of them may stand in. */
export interface ComparisonTables {
  readonly lineage: Table<LineageEvent>;
  readonly conditions: ConditionRules;
  readonly acceptance: Table<AcceptanceRow>;
  readonly hardness: readonly HardnessTable[];
}

export const PUBLISHED: ComparisonTables = {
  lineage: SPECIFICATION_LINEAGE,
  conditions: { designations: TEMPER_DESIGNATIONS, transitions: TEMPER_TRANSITIONS, ageing: AGEING_CYCLES },
  acceptance: ACCEPTANCE,
  hardness: [
    HARDNESS_STEEL_HRC,
    HARDNESS_STEEL_HRB,
    HARDNESS_STEEL_BRINELL,
    HARDNESS_STEEL_OTHER_LIST,
    HARDNESS_ALUMINIUM,
  ],
};
