import { referenceTo, type Table } from '../table';
import type { NdtLevel, NdtPersonnelRow } from '../tables/ndt-personnel';
import type { Verdict } from '../verdict';

export interface InspectorDates {
  readonly isCurrent: boolean;
  readonly recertifyBy: Date;
  readonly nearVisionBy: Date;
}

/**
 * Whether an inspector's certification and near vision test are in date on a day, and until when they are.
 *
 * Worked example: certified on 1 June 2023 and tested on 1 June 2025: in date until the vision test of 1 June 2026.
 */
export function inspectorDates(
  table: Table<NdtPersonnelRow>,
  inspector: { readonly certifiedOn: Date; readonly nearVisionOn: Date },
  on: Date,
): Verdict<InspectorDates, 'rule_not_in_table'> {
  const row = table.rows.find((candidate) => candidate.rule === 'renewal');
  if (row?.rule !== 'renewal') return { ok: false, reason: 'rule_not_in_table' };
  const recertifyBy = yearsAfter(inspector.certifiedOn, row.recertifyYears);
  const nearVisionBy = yearsAfter(inspector.nearVisionOn, row.nearVisionYears);
  const isCurrent = on <= recertifyBy && on <= nearVisionBy;
  return { ok: true, isCurrent, recertifyBy, nearVisionBy, source: row.source, readFrom: referenceTo(table) };
}

/**
 * Hours of training for a method up to a level: level 2 has those of level 1 before it.
 *
 * Worked example: magnetic particle to level 2, 32 h.
 */
export function trainingHours(
  table: Table<NdtPersonnelRow>,
  asked: { readonly method: 'PT' | 'MT' | 'ET' | 'UT' | 'RT'; readonly level: 1 | 2 },
): Verdict<{ readonly hours: number }, 'rule_not_in_table'> {
  const row = table.rows.find(
    (candidate) => candidate.rule === 'training' && candidate.method === asked.method,
  );
  if (row?.rule !== 'training') return { ok: false, reason: 'rule_not_in_table' };
  const hours = asked.level === 1 ? row.hours[0] : row.hours[0] + row.hours[1];
  return { ok: true, hours, source: row.source, readFrom: referenceTo(table) };
}

/**
 * Whether a level may approve test procedures.
 *
 * Worked example: level 3 may, level 2 may not (MIL-STD-410E 5.1.5).
 */
export function mayApproveProcedures(
  table: Table<NdtPersonnelRow>,
  level: NdtLevel,
): Verdict<{ readonly mayApprove: boolean }, 'rule_not_in_table'> {
  const row = table.rows.find((candidate) => candidate.rule === 'approves_procedures');
  if (row?.rule !== 'approves_procedures') return { ok: false, reason: 'rule_not_in_table' };
  return {
    ok: true,
    mayApprove: row.levels.includes(level),
    source: row.source,
    readFrom: referenceTo(table),
  };
}

/** The same day of the year; 29 February becomes 28 February. */
function yearsAfter(date: Date, years: number): Date {
  const [year, month] = [date.getUTCFullYear() + years, date.getUTCMonth()];
  const lastOfMonth = new Date(Date.UTC(year, month + 1, 0)).getUTCDate();
  return new Date(Date.UTC(year, month, Math.min(date.getUTCDate(), lastOfMonth)));
}
