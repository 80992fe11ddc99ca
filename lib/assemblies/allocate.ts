/** What an assembly needs of one part, and what is fitted to it already. */
export interface Need {
  assemblyId: string;
  partNumber: string;
  pieces: number;
  fitted: number;
}

/**
 * Shares the pieces in stock among the assemblies that need them, in the order given (earliest need first), so that no
 * piece is counted for two assemblies.
 *
 * @param stock pieces in stock by part number.
 * @returns for each need, in order, how many pieces are ready: fitted, or in stock and counted for it.
 */
export function allocate(needs: readonly Need[], stock: ReadonlyMap<string, number>): number[] {
  const left = new Map(stock);
  return needs.map((need) => {
    const fitted = Math.min(need.fitted, need.pieces);
    const taken = Math.min(need.pieces - fitted, left.get(need.partNumber) ?? 0);
    left.set(need.partNumber, (left.get(need.partNumber) ?? 0) - taken);
    return fitted + taken;
  });
}
