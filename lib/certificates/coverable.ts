import type { FieldError } from '@/lib/errors';

/** One line of the batch, as a signature sees it. */
export interface CoverableLine {
  lineId: string;
  lineNo: number;
  partNumber: string;
  inQuarantine: number;
  /** Pieces in quarantine that a signature or an authority already speaks for. */
  proved: number;
}

export interface AskedCoverage {
  lineId: string;
  pieces: number;
}

/** Pieces that came back good and that nothing speaks for yet. */
export const coverableOf = ({
  inQuarantine,
  proved,
}: Pick<CoverableLine, 'inQuarantine' | 'proved'>): number => Math.max(0, inQuarantine - Math.max(0, proved));

/** A certificate proves pieces that are here. Nobody signs for what is still away, on hold, or signed for before. */
export function faultsOfCoverage(
  asked: readonly AskedCoverage[],
  lines: readonly CoverableLine[],
): FieldError[] {
  const seen = new Set<string>();
  return asked.flatMap(({ lineId, pieces }, at) => {
    const line = lines.find((one) => one.lineId === lineId);
    if (!line) return [{ field: `coverage.${at}.lineId`, message: 'This line is not of this batch.' }];
    const name = `Line ${line.lineNo}, ${line.partNumber}`;
    if (seen.has(lineId))
      return [{ field: `coverage.${at}.lineId`, message: `${name} is named twice. Name it once.` }];
    seen.add(lineId);
    const most = coverableOf(line);
    if (pieces <= most) return [];
    const message =
      most === 0
        ? `${name}: no piece in quarantine is without proof, so none can be covered.`
        : `${name}: ${most} came back good and uncovered. Enter ${most} or less.`;
    return [{ field: `coverage.${at}.pieces`, message }];
  });
}
