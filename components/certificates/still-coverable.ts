/** By line; null where what is typed is no number that can be covered. */
export type PiecesEntered = Readonly<Record<string, number | null>>;

/** What was entered and can be covered still: meanwhile pieces may have been held, or signed for elsewhere. */
export function stillCoverable(
  entered: PiecesEntered,
  lines: readonly { id: string; coverable: number }[],
): PiecesEntered {
  return Object.fromEntries(
    lines.flatMap(({ id, coverable }) => {
      const count = entered[id];
      return count != null && count <= coverable ? [[id, count]] : [];
    }),
  );
}
