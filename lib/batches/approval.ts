import type { CalendarDay } from '@/lib/day-words';
import type { Process } from '@/lib/trade/process';

/** What an approval says, as far as a batch asks. Scope by equipment and class comes later. */
export interface Approval {
  reference: string;
  processes: readonly string[];
  /** Specifications it is limited to; none named: every specification of its processes. */
  specifications: readonly string[];
  validFrom: CalendarDay;
  validTo: CalendarDay;
  withdrawnAt: Date | null;
}

export type ApprovalStanding =
  | { state: 'approved'; approval: Approval }
  | { state: 'withdrawn' | 'expired' | 'not_yet'; approval: Approval }
  | { state: 'none' };

interface Asked {
  process: Process;
  specification: string;
  on: CalendarDay;
}

/** Whether a processor is approved for a process to a specification on a day; if not, by which approval it comes nearest. */
export function approvalStanding(approvals: readonly Approval[], asked: Asked): ApprovalStanding {
  const latestFirst = approvals
    .filter((approval) => covers(approval, asked))
    .sort((a, b) => b.validTo.localeCompare(a.validTo));
  const standing = latestFirst.find(
    (approval) =>
      approval.withdrawnAt === null && approval.validFrom <= asked.on && asked.on <= approval.validTo,
  );
  if (standing) return { state: 'approved', approval: standing };
  const [nearest] = latestFirst;
  if (!nearest) return { state: 'none' };
  if (nearest.withdrawnAt !== null) return { state: 'withdrawn', approval: nearest };
  return { state: nearest.validTo < asked.on ? 'expired' : 'not_yet', approval: nearest };
}

/** Whether its scope takes in a process to a specification, on whatever day. */
export function covers(
  approval: Pick<Approval, 'processes' | 'specifications'>,
  { process, specification }: Omit<Asked, 'on'>,
): boolean {
  if (!approval.processes.includes(process)) return false;
  return (
    approval.specifications.length === 0 ||
    approval.specifications.some((one) => plain(one) === plain(specification))
  );
}

/** `AMS 2770` and `ams2770` are the same paper. */
const plain = (specification: string): string => specification.replace(/[\s-]+/g, '').toLowerCase();
