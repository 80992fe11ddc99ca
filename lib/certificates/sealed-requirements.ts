/** A signature, by the lines it covers. */
export interface SignedLines {
  lineIds: readonly string[];
}

/**
 * Whether a signature on the certificate already sealed the decision about a requirement: what is of the whole batch
 * with the first signature, what is of one line with the first that covers the line.
 */
export function isSealed(requirement: { lineId: string | null }, signed: readonly SignedLines[]): boolean {
  if (requirement.lineId === null) return signed.length > 0;
  const { lineId } = requirement;
  return signed.some((signature) => signature.lineIds.includes(lineId));
}
