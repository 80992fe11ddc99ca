import type { Check, CheckFacts } from './check';
import { hasReheatsLeft } from './clad-checks';
import { canBeMade } from './condition-checks';
import { isHotEnough } from './furnace-checks';
import { fitsIn } from './envelope-checks';
import { CHECK_LEVELS, type Finding } from './finding';
import { hasLines, isCurrent, isOneStep, isProvable } from './line-checks';
import { statesWhatIsAsked } from './ordering-checks';
import { hasDay, hasPrice, isTakenUp } from './order-checks';
import { sharesLoads } from './load-checks';
import { isApproved, isApprovedUntilBack, worksForUs } from './processor-checks';
import { standsInOrder } from './route-checks';
import { isInForce, meansWhatItSays } from './specification-checks';

/** The order they are shown in within their level. */
const CHECKS: readonly Check[] = [
  hasLines,
  worksForUs,
  isApproved,
  isOneStep,
  canBeMade,
  hasReheatsLeft,
  standsInOrder,
  sharesLoads,
  fitsIn,
  isHotEnough,
  isApprovedUntilBack,
  isInForce,
  meansWhatItSays,
  statesWhatIsAsked,
  isProvable,
  isCurrent,
  hasDay,
  hasPrice,
  isTakenUp,
];

export interface Checked {
  /** What stops it first, then what warns, then notes. */
  findings: readonly Finding[];
  /** What was looked at and is right, in words. */
  met: readonly string[];
}

/** Looks at a batch before it leaves. */
export function checkBatch(facts: CheckFacts): Checked {
  const looked = CHECKS.map((check) => ({ check, findings: check.look(facts) }));
  const findings = looked.flatMap((one) => one.findings);
  return {
    findings: CHECK_LEVELS.flatMap((level) => findings.filter((finding) => finding.level === level)),
    met: looked.filter((one) => one.findings.length === 0).map((one) => one.check.met),
  };
}
