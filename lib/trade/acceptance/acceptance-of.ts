import type { Source } from '../source';
import { referenceTo, type Table } from '../table';
import type { AcceptanceRow, HardnessBand } from '../tables/acceptance';
import type { Verdict } from '../verdict';
import { msPerMFromIacs } from './conductivity';

export interface AcceptanceBand {
  readonly iacs?: readonly [number, number];
  readonly msPerM?: readonly [number, number];
  readonly hardness: readonly HardnessBand[];
  readonly kind: AcceptanceRow['kind'];
  readonly source: Source;
}

export interface Acceptance {
  /** The one to use: acceptance before example, a whole pair before half a one, then read before recalled. */
  readonly band: AcceptanceBand;
  /** What else is published for it. Where it differs, people decide with the specification in hand. */
  readonly alsoPublished: readonly AcceptanceBand[];
}

export type AcceptanceReason = 'clad_needs_correlation' | 'alloy_not_in_table' | 'condition_not_in_table';

/**
 * Hardness and conductivity by which the condition of a bare aluminium alloy is judged, as a pair.
 *
 * The bands are for bare metal: cladding has a conductivity of its own, and clad parts need a correlation proven for
 * their cladding and thickness.
 * Worked example: 2024-T42 bare shows HRB 63 to 83 and 28.5 to 34.0 % IACS, 16.5 to 19.7 MS/m.
 */
export function acceptanceOf(
  table: Table<AcceptanceRow>,
  asked: { readonly alloy: string; readonly condition: string; readonly isClad: boolean },
): Verdict<Acceptance, AcceptanceReason> {
  if (asked.isClad) return { ok: false, reason: 'clad_needs_correlation' };
  const ofAlloy = table.rows.filter(({ alloy }) => alloy === asked.alloy);
  if (ofAlloy.length === 0) return { ok: false, reason: 'alloy_not_in_table' };
  const condition = asked.condition.trim().toUpperCase();
  const [band, ...alsoPublished] = ofAlloy
    .filter(({ conditions }) => conditions.includes(condition))
    .sort((a, b) => rank(a) - rank(b))
    .map(bandOf);
  if (!band) return { ok: false, reason: 'condition_not_in_table' };
  return { ok: true, band, alsoPublished, source: band.source, readFrom: referenceTo(table) };
}

const rank = ({ kind, iacs, hardness, source }: Table<AcceptanceRow>['rows'][number]): number =>
  (kind === 'acceptance' ? 0 : 4) + (iacs && hardness ? 0 : 2) + (source.confidence === 'memory' ? 1 : 0);

const bandOf = ({ iacs, hardness, kind, source }: Table<AcceptanceRow>['rows'][number]): AcceptanceBand => ({
  ...(iacs && { iacs, msPerM: [msPerMFromIacs(iacs[0]), msPerMFromIacs(iacs[1])] as const }),
  hardness: hardness ?? [],
  kind,
  source,
});
