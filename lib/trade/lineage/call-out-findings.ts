import type { Source } from '../source';
import { referenceTo, type Table, type TableReference } from '../table';

/** When a note on a call-out holds. */
export type CallOutCondition = 'always' | 'no_type_stated' | 'for_parts';

export type CallOutNote =
  | 'type_i_hexavalent_applies'
  | 'nitric_unless_engineering_allows_citric'
  | 'acceptance_class_4_applies'
  | 'type_guidance_lost'
  | 'excludes_parts'
  | 'raw_material_only'
  | 'pulls_in_slash_sheet'
  | 'number_forks_by_product'
  | 'classes_do_not_map'
  | 'not_over_200_ksi_unless_specified'
  | 'no_sensitivity_level_in_first_issue';

export interface CallOutRow {
  readonly number: string;
  /** Issues that it holds for; left out for all. */
  readonly revisions?: readonly string[];
  readonly when: CallOutCondition;
  readonly note: CallOutNote;
  /** Whether an engineering answer is needed before the work starts. */
  readonly asksEngineering: boolean;
}

export interface CallOut {
  readonly number: string;
  readonly revision: string | null;
  readonly typeStated: boolean;
  readonly forParts: boolean;
}

export interface CallOutFinding {
  readonly note: CallOutNote;
  readonly asksEngineering: boolean;
  readonly source: Source;
  readonly readFrom: TableReference;
}

/**
 * What a call-out on a drawing or order silently means, or cannot mean. Without an issue every issue's notes are
 * given, since any of them may be meant.
 *
 * @returns all notes that hold, none where nothing is recorded.
 * @example MIL-DTL-5541 with no type: Type I, hexavalent, applies. MIL-H-6088G on a part's drawing: excludes parts.
 */
export function callOutFindings(table: Table<CallOutRow>, callOut: CallOut): CallOutFinding[] {
  const holds: Record<CallOutCondition, boolean> = {
    always: true,
    no_type_stated: !callOut.typeStated,
    for_parts: callOut.forParts,
  };
  return table.rows
    .filter(({ number, when }) => number === callOut.number && holds[when])
    .filter(
      ({ revisions }) => !revisions || callOut.revision === null || revisions.includes(callOut.revision),
    )
    .map(({ note, asksEngineering, source }) => ({
      note,
      asksEngineering,
      source,
      readFrom: referenceTo(table),
    }));
}
