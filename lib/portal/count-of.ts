import type { PortalLine } from './contract';

/** What a person has counted so far: the total, and (where it is not all) each line. */
export interface Counting {
  total: string;
  /** Pieces of each line, as typed. */
  lines: Readonly<Record<string, string>>;
  /** Numbers of the named pieces that are there, by line. */
  serials: Readonly<Record<string, readonly string[]>>;
}

export interface Counted {
  total: number;
  /** Left out where all are there. */
  counts?: { lineId: string; pieces: number; serials?: string[] }[];
}

/** The count as the server takes it, or the sentence that says what is not right with it yet. */
export function countOf(
  counting: Counting,
  lines: readonly PortalLine[],
  expected: number,
): Counted | { notYet: string } {
  const total = wholeNumber(counting.total);
  if (total === null) return { notYet: 'Enter a whole number of pieces.' };
  if (total > expected)
    return {
      notYet: `The traveller says ${expected}. Enter ${expected} or less; if you have more, write to the shop.`,
    };
  if (total === 0) return { notYet: 'None of them has come? Report trouble below.' };
  if (total === expected) return { total };

  const counts = lines
    .filter((line) => line.onTheWay > 0)
    .map((line) => {
      const serials = line.serials.length > 0 ? [...(counting.serials[line.id] ?? line.serials)] : undefined;
      return {
        lineId: line.id,
        pieces:
          serials?.length ??
          (lines.length === 1 ? total : wholeNumber(counting.lines[line.id] ?? String(line.onTheWay))),
        ...(serials ? { serials } : {}),
        line,
      };
    });
  const wrong = counts.find(({ pieces, line }) => pieces === null || pieces > line.onTheWay);
  if (wrong) return { notYet: `Line ${wrong.line.lineNo}: enter ${wrong.line.onTheWay} or less.` };
  const sum = counts.reduce((all, one) => all + (one.pieces ?? 0), 0);
  if (sum !== total)
    return {
      notYet: `The lines add up to ${sum}, you counted ${total}. Change the line where ${sum > total ? 'some are missing' : 'there are more'}.`,
    };
  return {
    total,
    counts: counts.map(({ line: _, pieces, ...count }) => ({ ...count, pieces: pieces ?? 0 })),
  };
}

function wholeNumber(typed: string): number | null {
  const text = typed.trim();
  return /^\d{1,7}$/.test(text) ? Number(text) : null;
}
