import type { FieldError } from '@/lib/errors';

/** One line as it was counted. */
export interface LineCount {
  lineId: string;
  good: number;
  damaged: number;
  short: number;
  over: number;
  goodPieceIds: readonly string[];
  damagedPieceIds: readonly string[];
}

/** One line as the ledger has it. */
export interface CountedAgainst {
  lineId: string;
  lineNo: number;
  partNumber: string;
  serialised: boolean;
  away: number;
  shortOpen: number;
}

/**
 * What is wrong with a count, each with its field and in words that name the line and the numbers. Nothing that is not
 * away can come back: what is more than that is over, and is not the shop's.
 */
export function faultsOfCount(counts: readonly LineCount[], lines: readonly CountedAgainst[]): FieldError[] {
  const seen = new Set<string>();
  return counts.flatMap((count, at) => {
    const line = lines.find((one) => one.lineId === count.lineId);
    if (!line) return [{ field: `lines.${at}.lineId`, message: 'This line is not of this batch.' }];
    if (seen.has(count.lineId))
      return [
        { field: `lines.${at}.lineId`, message: `Line ${line.lineNo} is counted twice here. Count it once.` },
      ];
    seen.add(count.lineId);
    return faultOf(count, line, at);
  });
}

function faultOf(count: LineCount, line: CountedAgainst, at: number): FieldError[] {
  const name = `Line ${line.lineNo}, ${line.partNumber}`;
  const back = count.good + count.damaged;
  const fault = (field: keyof LineCount, message: string): FieldError[] => [
    { field: `lines.${at}.${field}`, message: `${name}: ${message}` },
  ];

  if (back > line.away)
    return fault(
      count.good > line.away || count.damaged === 0 ? 'good' : 'damaged',
      `${line.away} away, ${back} counted as good and damaged. Enter ${line.away} or less, and ${back - line.away} as over.`,
    );
  if (count.over > 0 && back < line.away)
    return fault(
      'over',
      `${back} of the ${line.away} away are counted, so ${count.over} cannot be over. Count them as good or damaged first.`,
    );
  const missing = line.away - back - line.shortOpen;
  if (count.short > Math.max(0, missing))
    return fault(
      'short',
      shortWords(count.short, { away: line.away, back, shortOpen: line.shortOpen, missing }),
    );
  return line.serialised ? serialFaults(count, fault) : [];
}

function shortWords(
  short: number,
  { away, back, shortOpen, missing }: { away: number; back: number; shortOpen: number; missing: number },
): string {
  const already = shortOpen > 0 ? `, ${shortOpen} reported short before` : '';
  return `${away} away, ${back} counted${already}: ${short} cannot be short. Enter ${Math.max(0, missing)} or less.`;
}

function serialFaults(
  count: LineCount,
  fault: (field: keyof LineCount, message: string) => FieldError[],
): FieldError[] {
  if (count.goodPieceIds.length !== count.good)
    return fault(
      'good',
      `${count.good} counted as good, ${count.goodPieceIds.length} serial numbers ticked. Tick one for each piece.`,
    );
  if (count.damagedPieceIds.length !== count.damaged)
    return fault(
      'damaged',
      `${count.damaged} counted as damaged, ${count.damagedPieceIds.length} serial numbers ticked. Tick one for each piece.`,
    );
  const all = [...count.goodPieceIds, ...count.damagedPieceIds];
  return new Set(all).size === all.length
    ? []
    : fault('damaged', 'a serial number is ticked as good and as damaged. Tick it once.');
}
