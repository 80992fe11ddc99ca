import type { CalendarDay, Clock } from '@/lib/day-words';

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
  };
  today: CalendarDay;
  processor: { id: string; name: string; active: boolean; approvals: readonly Approval[] };
  lines: readonly CheckedLine[];
}

export interface CheckedLine {
  id: string;
  lineNo: number;
  lotNumber: string;
  partNumber: string;
  partRevision: string;
  partSuperseded: boolean;
  step: StepAsked;
  unitPriceMinor: number;
  requirements: number;
}

/** One question to a batch before it leaves: what is wrong, or in a few words what is right. */
export interface Check {
  met: string;
  look(facts: CheckFacts): readonly Finding[];
}
