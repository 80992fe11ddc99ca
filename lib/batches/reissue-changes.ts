import { dayWords, type Clock } from '@/lib/day-words';
import { amountText } from '@/lib/money';
import { limitWords } from '@/lib/parts/limit-words';

/** What of a batch that has left may still change. */
export interface StatedTerms extends Clock {
  wantedBackOn: string | null;
  note: string | null;
  lotMinimumMinor: number;
  certificationFeeMinor: number;
  lines: readonly { id: string; lineNo: number; unitPriceMinor: number }[];
  requirements: readonly {
    id: string;
    lineId: string | null;
    characteristic: string;
    limit: string;
    unit: string;
  }[];
}

/**
 * What is different between two versions of the papers, each in one sentence that names what it was.
 *
 * @example wanted back Thu 30 Apr, was Mon 27 Apr
 */
export function reissueChanges(before: StatedTerms, after: StatedTerms): string[] {
  const day = (when: string | null) => (when === null ? 'no day' : dayWords(when, after));
  const changes: string[] = [];
  if (before.wantedBackOn !== after.wantedBackOn)
    changes.push(`wanted back ${day(after.wantedBackOn)}, was ${day(before.wantedBackOn)}`);
  for (const [at, line] of after.lines.entries()) {
    const was = before.lines[at]?.unitPriceMinor;
    if (was !== undefined && was !== line.unitPriceMinor)
      changes.push(`line ${line.lineNo} at ${amountText(line.unitPriceMinor)} each, was ${amountText(was)}`);
  }
  if (before.lotMinimumMinor !== after.lotMinimumMinor)
    changes.push(
      `lot minimum ${amountText(after.lotMinimumMinor)}, was ${amountText(before.lotMinimumMinor)}`,
    );
  if (before.certificationFeeMinor !== after.certificationFeeMinor)
    changes.push(
      `certificates ${amountText(after.certificationFeeMinor)}, was ${amountText(before.certificationFeeMinor)}`,
    );
  for (const [at, one] of after.requirements.entries()) {
    const was = before.requirements[at];
    if (!was || (was.limit === one.limit && was.unit === one.unit)) continue;
    const lineNo = after.lines.find((line) => line.id === one.lineId)?.lineNo;
    changes.push(
      `${one.characteristic}${lineNo === undefined ? '' : ` of line ${lineNo}`}: ${asks(one)}, was ${asks(was)}`,
    );
  }
  if ((before.note ?? '') !== (after.note ?? ''))
    changes.push(after.note ? `note: ${after.note}` : 'the note is taken away');
  return changes;
}

const asks = ({ limit, unit }: { limit: string; unit: string }): string =>
  limitWords({ limit, unit }) || 'no limit';
