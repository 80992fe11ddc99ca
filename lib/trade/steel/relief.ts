import { exposureLimit } from '../finishes/exposure-limit';
import { calledRevision, type CalledDocument } from '../finishes/called-revision';
import type { HardnessTable } from '../hardness/hardness-table';
import { referenceTo, type Table } from '../table';
import type { BakeHoursRow } from '../tables/bake-hours-by-strength';
import type { EmbrittlementRow } from '../tables/embrittlement-row';
import type { ExposureLimitRow } from '../tables/exposure-limits';
import { celsiusFromFahrenheit } from '../units/temperature';
import type { Verdict } from '../verdict';
import { applicableRule, type HardenedPart, type RuleReason } from './applicable-rule';
import { bakeHoursByStrength } from './bake-hours-by-strength';

export interface ReliefTables {
  readonly rules: Table<EmbrittlementRow>;
  readonly bakeHours: Table<BakeHoursRow>;
  readonly conversion: HardnessTable;
  readonly exposure: Table<ExposureLimitRow>;
}

export interface Relief {
  /** Both or neither: some documents leave the temperature to another one. */
  readonly temperatureCMin?: number;
  readonly temperatureCMax?: number;
  /** To order. Where a document prints a range this is its longest, because a short bake is unsafe. */
  readonly hours?: number;
  readonly hoursPrinted?: readonly [number, number];
  /** The length is settled with the purchaser; it is not in the document. */
  readonly isHoursAgreed: boolean;
  /** The bake starts within this many hours after plating; `latestStart` gives the moment. */
  readonly startWithinHours?: number;
  readonly startWithinHoursPreferred?: number;
  readonly orRoomTemperatureHours?: number;
  readonly classWhenUnnamed?: string;
  /** Where the cycle stands, if not in the called document. */
  readonly by?: string;
}

export type ReliefReason =
  | RuleReason
  | 'weaker_than_table'
  | 'stronger_than_table'
  /** The least bake temperature is too near the temperature that the part was tempered at. */
  | 'bake_too_near_tempering';

export type ReliefVerdict = Verdict<
  | { readonly isRequired: false; readonly isByConversion: boolean }
  | ({ readonly isRequired: true; readonly isByConversion: boolean } & Relief),
  ReliefReason
>;

/**
 * Whether a part must be relieved of hydrogen after plating, or of stress before it, by the document that the order
 * calls at the revision that it calls; and if so, how.
 *
 * Strength in MPa or HRC, the highest that the part may have. With the temperature that the part was tempered at, in
 * °C, the bake is kept at least 50 °F below it.
 * Worked example: QQ-P-416 revision F, HRC 42: 375 ± 25 °F, 176.7 to 204.4 °C, for 23 h, started within 4 h. Revision E
 * says 3 h. Without a revision there is no answer.
 */
export function relief(
  tables: ReliefTables,
  treatment: 'embrittlement_relief' | 'stress_relief',
  called: CalledDocument,
  part: HardenedPart & { readonly temperedAtC?: number | undefined },
): ReliefVerdict {
  const applicable = applicableRule(tables, treatment, called, part);
  if (!applicable.ok) return applicable;
  const { rule, isRequired, isByConversion } = applicable;
  const grounds = { source: rule.source, readFrom: referenceTo(tables.rules) };
  if (!isRequired) return { ok: true, isRequired, isByConversion, ...grounds };

  const temperature = temperatureOf(tables, rule, part.temperedAtC);
  if (temperature === 'bake_too_near_tempering')
    return { ok: false, reason: temperature, source: rule.source };
  const hours = hoursOf(tables, rule, part);
  if (hours && 'reason' in hours) return { ok: false, reason: hours.reason, source: rule.source };
  return {
    ok: true,
    isRequired,
    isByConversion,
    ...temperature,
    ...(hours && { hoursPrinted: hours }),
    ...(hours && !rule.isHoursAgreed && { hours: hours[1] }),
    isHoursAgreed: rule.isHoursAgreed ?? false,
    ...carriedOver(rule),
    ...grounds,
  };
}

const carriedOver = ({
  startWithinHours,
  startWithinHoursPreferred,
  orRoomTemperatureHours,
  classWhenUnnamed,
  by,
}: EmbrittlementRow): Partial<Relief> => ({
  ...(startWithinHours !== undefined && { startWithinHours }),
  ...(startWithinHoursPreferred !== undefined && { startWithinHoursPreferred }),
  ...(orRoomTemperatureHours !== undefined && { orRoomTemperatureHours }),
  ...(classWhenUnnamed !== undefined && { classWhenUnnamed }),
  ...(by !== undefined && { by }),
});

function hoursOf(
  { bakeHours }: ReliefTables,
  { hours }: EmbrittlementRow,
  part: HardenedPart,
): readonly [number, number] | undefined | { readonly reason: ReliefReason } {
  if (hours !== 'by_strength') return hours;
  const found = bakeHoursByStrength(bakeHours, part);
  return found.ok ? [found.hours, found.hours] : { reason: found.reason };
}

type TemperatureRange = Pick<Relief, 'temperatureCMin' | 'temperatureCMax'>;

function temperatureOf(
  { rules, exposure }: ReliefTables,
  rule: EmbrittlementRow,
  temperedAtC: number | undefined,
): TemperatureRange | 'bake_too_near_tempering' {
  const elsewhere = rules.rows.find(
    (row) =>
      rule.by !== undefined &&
      row.treatment === rule.treatment &&
      !row.kinds &&
      row.specifications.some((one) => calledRevision(one, { specification: rule.by ?? '' }) !== null),
  );
  const printed = rule.temperature ?? elsewhere?.temperature;
  if (!printed) return {};
  const [low, high] = printed.range.map((value) =>
    printed.unit === 'F' ? celsiusFromFahrenheit(value) : value,
  );
  if (low === undefined || high === undefined) return {};
  if (temperedAtC === undefined) return { temperatureCMin: low, temperatureCMax: high };
  const limit = exposureLimit(exposure, { item: 'hardened_steel_bake', temperedAtC });
  const most = limit.ok ? Math.min(high, limit.temperatureCMax) : high;
  return most < low - TEMPERATURE_TOLERANCE_C
    ? 'bake_too_near_tempering'
    : { temperatureCMin: low, temperatureCMax: Math.max(low, most) };
}

/** Printed steps are 5 °C or wider; converting leaves far less than this. */
const TEMPERATURE_TOLERANCE_C = 1e-6;
