import type { CalledDocument } from '../finishes/called-revision';
import type { HardnessTable } from '../hardness/hardness-table';
import { referenceTo, type Table } from '../table';
import type { EmbrittlementRow } from '../tables/embrittlement-row';
import type { Verdict } from '../verdict';
import { applicableRule, type HardenedPart, type RuleReason } from './applicable-rule';

/**
 * Whether a part is too strong to be plated to the called document, or needs special cleaning before it.
 *
 * A document has several thresholds at once: QQ-P-416F bars plating over 200 ksi, asks for special cleaning of
 * fasteners from 160 ksi, and for a bake from HRC 40.
 * Worked example: QQ-P-416 revision F, 210 ksi (1448 MPa): not to be plated unless the order says so.
 */
export function platingLimit(
  tables: { readonly rules: Table<EmbrittlementRow>; readonly conversion: HardnessTable },
  limit: 'not_to_be_plated' | 'special_cleaning',
  called: CalledDocument,
  part: HardenedPart,
): Verdict<{ readonly applies: boolean; readonly isByConversion: boolean }, RuleReason> {
  const found = applicableRule(tables, limit, called, part);
  if (!found.ok) return found;
  return {
    ok: true,
    applies: found.isRequired,
    isByConversion: found.isByConversion,
    source: found.rule.source,
    readFrom: referenceTo(tables.rules),
  };
}
