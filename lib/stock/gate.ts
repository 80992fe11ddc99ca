/** What the gate sees of one line. All counts are pieces. */
export interface GateFacts {
  /** Still away: on the way out, at the processor, on the way back. */
  away: number;
  inQuarantine: number;
  onHold: number;
  /** In quarantine, and spoken for by a signature or an authority. */
  proved: number;
  /** The route has a further outside step. */
  hasNextStep: boolean;
  /** Every batch these pieces went through is paid, waived, or asks for no money. */
  paid: boolean;
  unpaidBatches: readonly string[];
}

export type Missing = 'nothing_back' | 'not_proved' | 'on_hold' | 'not_paid' | 'still_away';

export interface GateVerdict {
  /** How many pieces may pass now. */
  mayPass: number;
  /** Why the rest may not, or why none may. `still_away` and `on_hold` only concern their own pieces. */
  missing: { reason: Missing; pieces: number; detail: readonly string[] }[];
}

/**
 * The release gate: counted, proved, nothing of these pieces on hold, paid. Pieces that go on to a further outside
 * step pass before they are paid: the money is due for the step, and stock asks again for all of them.
 *
 * @example
 * releaseGate({ away: 0, inQuarantine: 41, onHold: 1, proved: 40, hasNextStep: false, paid: true, unpaidBatches: [] })
 * // { mayPass: 40, missing: [{ reason: 'not_proved', pieces: 1 }, { reason: 'on_hold', pieces: 1 }] }
 */
export function releaseGate(facts: GateFacts): GateVerdict {
  const proved = Math.max(0, Math.min(facts.inQuarantine, facts.proved));
  const needsMoney = !facts.hasNextStep && !facts.paid;
  const missing: GateVerdict['missing'] = [];
  const add = (reason: Missing, pieces: number, detail: readonly string[] = []) =>
    missing.push({ reason, pieces, detail });

  if (facts.away > 0) add('still_away', facts.away);
  if (facts.inQuarantine === 0 && facts.onHold === 0 && facts.away > 0) add('nothing_back', facts.away);
  if (facts.inQuarantine > proved) add('not_proved', facts.inQuarantine - proved);
  if (facts.onHold > 0) add('on_hold', facts.onHold);
  if (needsMoney && facts.inQuarantine > 0) add('not_paid', facts.inQuarantine, facts.unpaidBatches);
  return { mayPass: needsMoney ? 0 : proved, missing };
}
