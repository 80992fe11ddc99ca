import type { AlloyFamily } from '../alloys/alloy';
import type { FinishDefaultRow } from '../tables/finish-defaults';
import type { FinishRow } from '../tables/finish-row';
import type { MagneticParticlePlatingRow } from '../tables/magnetic-particle-plating';
import type { OrderRuleId, OrderRuleRow, Severity } from '../tables/order-rule';
import type { TemperBandRow } from '../tables/steel-tempering';
import type { Process, ProductForm } from '../process';
import type { Source } from '../source';
import type { HardenedPart } from '../steel/applicable-rule';
import type { ReliefTables } from '../steel/relief';
import type { Table } from '../table';

/** A step of a route, as the rules see it. */
export interface RouteStep {
  readonly process: Process;
  readonly specification: string;
  readonly revision?: string | null | undefined;
  readonly classType?: string | null | undefined;
  readonly conditionBefore?: string | null | undefined;
  readonly targetCondition?: string | null | undefined;
}

/** What the rules ask of a part. What is left out is not known, and rules that hang on it say so or stay silent. */
export interface RoutePart extends HardenedPart {
  readonly alloy: string;
  readonly family: AlloyFamily;
  readonly form?: ProductForm | undefined;
  readonly isClad?: boolean | undefined;
  readonly temperedAtC?: number | undefined;
  /** The hottest it gets in service. */
  readonly serviceCMax?: number | undefined;
  /** Ground after hardening. */
  readonly isGroundHard?: boolean | undefined;
  readonly touchesTitanium?: boolean | undefined;
  readonly touchesFuelOrVacuum?: boolean | undefined;
  /** Steel inserts or other metals in it. */
  readonly hasInserts?: boolean | undefined;
  /** Boxed, riveted, spot-welded: what gets in does not wash out. */
  readonly trapsLiquid?: boolean | undefined;
}

export interface RouteTables extends ReliefTables {
  readonly order: Table<OrderRuleRow>;
  readonly classes: readonly Table<FinishRow>[];
  readonly defaults: Table<FinishDefaultRow>;
  readonly magneticParticle: Table<MagneticParticlePlatingRow>;
  readonly temperBands: Table<TemperBandRow>;
}

/** One thing that a rule has against a route. Words belong to the screen. */
export interface RouteFinding {
  readonly rule: OrderRuleId;
  readonly severity: Severity;
  /** Where in the route, from 0, in rising order. */
  readonly steps: readonly number[];
  /** What `repairRoute` would do about it; without it people have to decide. */
  readonly repair?: 'move' | 'insert';
  readonly source: Source;
}

/** What a rule reports; severity and source are read from the table of rules. */
export type Report = Pick<RouteFinding, 'rule' | 'steps' | 'repair'>;
