import type { RuleReason } from '@/lib/trade/steel/applicable-rule';
import type { ReliefReason, ReliefVerdict } from '@/lib/trade/steel/relief';
import type { HardenedPartKind } from '@/lib/trade/tables/embrittlement-row';

import { benchText, type BenchUnits, unitWord } from './bench-units';

export const PART_KINDS: Record<HardenedPartKind, string> = {
  through_hardened: 'hardened through',
  threaded_fastener: 'threaded fastener',
  case_hardened: 'case hardened',
  ph_stainless: 'PH stainless',
};

const REFUSALS: Record<RuleReason | ReliefReason, string> = {
  specification_not_in_table: 'The tables have no rule of this specification. Read it in your copy.',
  revision_not_stated: 'Its revisions differ, and none is named. Name the revision that the order calls.',
  revision_not_in_table: 'The tables do not have this revision. Read it in your copy.',
  strength_not_stated:
    'Its rule goes by strength. Enter the highest hardness or tensile strength the part may have.',
  working_not_stated: 'Its rule asks whether the part was machined, ground or straightened hard. Say so.',
  weaker_than_table: 'The part is weaker than the bake table begins. The table gives no hours.',
  stronger_than_table: 'The part is stronger than the bake table goes. Settle the bake with the purchaser.',
  bake_too_near_tempering:
    'The bake would come too near the temperature that the part was tempered at. Settle it with the purchaser before plating.',
};

export const reliefRefusal = (reason: RuleReason | ReliefReason): string => REFUSALS[reason];

export interface ReliefReply {
  readonly good: boolean | null;
  readonly says: string;
  readonly rest: readonly string[];
}

/** What a relief treatment is, in words; lengths in hours, the temperature in the units chosen. */
export function reliefReply(
  found: Extract<ReliefVerdict, { ok: true }>,
  name: 'Bake' | 'Stress relief',
  units: BenchUnits,
): ReliefReply {
  const converted = found.isByConversion ? ['judged over a hardness conversion, which is approximate'] : [];
  if (!found.isRequired) return { good: null, says: `${name}: not asked for by this rule`, rest: converted };
  const { temperatureCMin: low, temperatureCMax: high, hours, hoursPrinted } = found;
  const temperature =
    low === undefined || high === undefined
      ? 'temperature not in the tables'
      : `${benchText(low, 'temperature', units)} to ${benchText(high, 'temperature', units)} ${unitWord('temperature', units) ?? ''}`;
  const range =
    hoursPrinted && hoursPrinted[0] !== hoursPrinted[1]
      ? [`printed ${hoursPrinted[0]} to ${hoursPrinted[1]} h; the longest is safe`]
      : [];
  const rest = [
    ...(hours === undefined ? ['how long is not in the tables'] : []),
    ...(found.isHoursAgreed ? ['how long is agreed with the purchaser'] : []),
    ...range,
    ...(found.startWithinHours === undefined ? [] : [`started within ${found.startWithinHours} h`]),
    ...(found.startWithinHoursPreferred === undefined
      ? []
      : [`better within ${found.startWithinHoursPreferred} h`]),
    ...(found.orRoomTemperatureHours === undefined
      ? []
      : [`or ${found.orRoomTemperatureHours} h at room temperature`]),
    ...(found.classWhenUnnamed === undefined
      ? []
      : [`${found.classWhenUnnamed} where the order names no class`]),
    ...(found.by === undefined ? [] : [`the cycle stands in ${found.by}`]),
    ...converted,
  ];
  const length = hours === undefined ? '' : `${hours} h at `;
  return { good: null, says: `${name}: ${length}${temperature}`, rest };
}
