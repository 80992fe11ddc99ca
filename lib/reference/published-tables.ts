import { BAKE_HOURS_BY_STRENGTH } from '@/lib/trade/tables/bake-hours-by-strength';
import { AGEING_CYCLES } from '@/lib/trade/tables/ageing-cycles';
import { CALL_OUT_NOTES } from '@/lib/trade/tables/call-out-notes';
import { CONVERSION_CLASSES } from '@/lib/trade/tables/conversion-classes';
import { DENSITIES } from '@/lib/trade/tables/densities';
import { EMBRITTLEMENT_RULES } from '@/lib/trade/tables/embrittlement-rules';
import { EXPOSURE_LIMITS } from '@/lib/trade/tables/exposure-limits';
import { FINISH_DEFAULTS } from '@/lib/trade/tables/finish-defaults';
import { HARDNESS_STEEL_HRC } from '@/lib/trade/tables/hardness-steel-hrc';
import { MAGNETIC_PARTICLE_PLATING } from '@/lib/trade/tables/magnetic-particle-plating';
import { MISSING_ITEMS } from '@/lib/trade/tables/missing-items';
import { OLD_NAMES } from '@/lib/trade/tables/old-names';
import { ORDER_RULES } from '@/lib/trade/tables/order-rules';
import { ORDERING_INFORMATION } from '@/lib/trade/tables/ordering-information';
import { PH_STEEL_CONDITIONS } from '@/lib/trade/tables/ph-steel-conditions';
import { PLATING_CLASSES } from '@/lib/trade/tables/plating-classes';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';
import { TEMPER_BANDS } from '@/lib/trade/tables/steel-tempering';
import { TEMPER_TRANSITIONS } from '@/lib/trade/tables/temper-transitions';
import { TEMPER_DESIGNATIONS } from '@/lib/trade/tables/tempers';
import type { MaterialTables } from '@/lib/parts/material-of';
import type { RouteTables } from '@/lib/trade/route/route';
import type { ConditionRules } from '@/lib/trade/tempers/condition-graph';

import { inForce } from './in-force';

const CONDITIONS: ConditionRules = {
  designations: TEMPER_DESIGNATIONS,
  transitions: TEMPER_TRANSITIONS,
  ageing: AGEING_CYCLES,
};

const ROUTE: RouteTables = {
  order: ORDER_RULES,
  rules: EMBRITTLEMENT_RULES,
  bakeHours: BAKE_HOURS_BY_STRENGTH,
  conversion: HARDNESS_STEEL_HRC,
  exposure: EXPOSURE_LIMITS,
  classes: [PLATING_CLASSES, CONVERSION_CLASSES],
  defaults: FINISH_DEFAULTS,
  magneticParticle: MAGNETIC_PARTICLE_PLATING,
  temperBands: TEMPER_BANDS,
};

const MATERIAL: MaterialTables = { tempers: TEMPER_DESIGNATIONS, oldNames: OLD_NAMES };

const PUBLISHED = {
  material: MATERIAL,
  conditions: CONDITIONS,
  phConditions: PH_STEEL_CONDITIONS,
  route: ROUTE,
  densities: DENSITIES,
  lineage: SPECIFICATION_LINEAGE,
  callOuts: CALL_OUT_NOTES,
  ordering: ORDERING_INFORMATION,
  commonlyMissing: MISSING_ITEMS,
};
export type PartTables = typeof PUBLISHED;

/** The published tables that questions about a part and its route are answered from. */
export const PART_TABLES: PartTables = inForce(PUBLISHED, new Map());
