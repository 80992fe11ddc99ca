import type { CalendarDay, Clock } from '@/lib/day-words';
import type { EquipmentKind } from '@/lib/equipment/equipment-kind';
import type { PartSizes } from '@/lib/parts/computed-mass';
import type { TypedMaterial } from '@/lib/parts/material-of';
import type { OrderingAnswers } from '@/lib/parts/ordering-answers';
import type { BatchTables } from '@/lib/reference/batch-tables';
import type { Box } from '@/lib/trade/envelope/fits-equipment';
import type { Process } from '@/lib/trade/process';

import type { Approval } from './approval';
import type { Finding } from './finding';
import type { StepAsked } from './step-asked';

export interface CheckFacts extends Clock {
  batch: StepAsked & {
    number: string;
    wantedBackOn: CalendarDay | null;
    leavesOn: CalendarDay | null;
    putAsideAt: Date | null;
    lotMinimumMinor: number;
    certificationFeeMinor: number;
    /** Requirements that hold for all lines. */
    requirements: number;
    /** What they name: `Bake`, `Hardness`. */
    characteristics: readonly string[];
  };
  today: CalendarDay;
  processor: {
    id: string;
    name: string;
    active: boolean;
    approvals: readonly Approval[];
    /** What is in use there and known to the shop. */
    equipment: readonly CheckedEquipment[];
  };
  lines: readonly CheckedLine[];
  tables: BatchTables;
}

/** A furnace, oven or tank with the room inside. */
export interface CheckedEquipment extends Box {
  id: string;
  kind: EquipmentKind;
  name: string;
  /** As typed: `120 in × 44 in × 40 in`. */
  sizeWords: string;
  limitG: number | null;
  limitWords: string | null;
  temperatureCMin: number | null;
  temperatureCMax: number | null;
  /** As typed: `300 °F to 1000 °F`. */
  temperatureWords: string;
  furnaceClass: number | null;
}

/** A step of the part's route, with the conditions that it changes. */
export interface CheckedStep extends StepAsked {
  id: string;
  conditionBefore: string | null;
  targetCondition: string | null;
  /** What the order states for it beside these. */
  ordering: OrderingAnswers;
}

/** What the rules of the trade ask of a part; measures in mm and g, null where the part does not say. */
export interface CheckedPart extends TypedMaterial, PartSizes {
  id: string;
  madeCondition: string;
  endCondition: string;
  massG: number | null;
  areaMm2: number | null;
  /** As typed: `61.5 in × 8 in × 1.25 in`; null where it says none. */
  sizeWords: string | null;
  /** As typed: `0.040 in`. */
  thickness: string | null;
  /** Its outside steps in order. */
  route: readonly CheckedStep[];
}

export interface CheckedLine {
  id: string;
  lineNo: number;
  lotNumber: string;
  partNumber: string;
  partRevision: string;
  partName: string;
  partSuperseded: boolean;
  part: CheckedPart;
  stepId: string;
  step: CheckedStep;
  pieces: number;
  loadNo: number | null;
  /** Solution treatments that pieces of the lot may have had outside before. */
  solutionTreated: readonly Process[];
  unitPriceMinor: number;
  requirements: number;
  /** What its requirements name. */
  characteristics: readonly string[];
}

/** One question to a batch before it leaves: what is wrong, or in a few words what is right. */
export interface Check {
  met: string;
  look(facts: CheckFacts): readonly Finding[];
}
