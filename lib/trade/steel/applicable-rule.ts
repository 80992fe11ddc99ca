import { calledRevision, coversRevision, type CalledDocument } from '../finishes/called-revision';
import type { HardnessTable } from '../hardness/hardness-table';
import type { Source } from '../source';
import type { Table } from '../table';
import type { EmbrittlementRow, HardenedPartKind } from '../tables/embrittlement-row';
import type { Strength } from './bake-hours-by-strength';
import { reachesThreshold } from './reaches-threshold';

/** What the rules need to know of a hardened part. Strength is the highest that it may have. */
export interface HardenedPart extends Strength {
  /** Without it, hardened through. */
  readonly kind?: HardenedPartKind | undefined;
  /** Machined, ground, cold formed or straightened after hardening. */
  readonly isWorkedHard?: boolean | undefined;
}

export type RuleReason =
  | 'specification_not_in_table'
  | 'revision_not_stated'
  | 'revision_not_in_table'
  | 'strength_not_stated'
  | 'working_not_stated';

type Rule = Table<EmbrittlementRow>['rows'][number];

export type Applicable =
  | { readonly ok: true; readonly rule: Rule; readonly isRequired: boolean; readonly isByConversion: boolean }
  | { readonly ok: false; readonly reason: RuleReason; readonly source?: Source };

/**
 * The rule of the called document, at the called revision, for one treatment of one part, and whether the part falls
 * under it. A revision that is not said is not guessed, where the document's revisions differ.
 */
export function applicableRule(
  { rules, conversion }: { readonly rules: Table<EmbrittlementRow>; readonly conversion: HardnessTable },
  treatment: EmbrittlementRow['treatment'],
  called: CalledDocument,
  part: HardenedPart,
): Applicable {
  const known = rules.rows.flatMap((rule) => {
    if (rule.treatment !== treatment) return [];
    const revision = rule.specifications
      .map((one) => calledRevision(one, called))
      .find((one) => one !== null);
    return revision === undefined || revision === null ? [] : [{ rule, revision }];
  });
  const [first] = known;
  if (!first) return { ok: false, reason: 'specification_not_in_table' };
  const covering = known.filter(({ rule, revision }) => coversRevision(rule.revisions, revision));
  if (covering.length === 0) {
    const reason = first.revision === '' ? 'revision_not_stated' : 'revision_not_in_table';
    return { ok: false, reason, source: first.rule.source };
  }

  const verdicts = covering
    .filter(({ rule }) => !rule.kinds || rule.kinds.includes(part.kind ?? 'through_hardened'))
    .map(({ rule }) => judge(rule, part, conversion));
  const required = verdicts.find((verdict) => verdict.ok && verdict.isRequired);
  const unknown = verdicts.find((verdict) => !verdict.ok);
  const [any] = verdicts;
  // No rule is for this kind of part: the document has nothing to ask of it.
  return (
    required ?? unknown ?? any ?? { ok: true, rule: first.rule, isRequired: false, isByConversion: false }
  );
}

function judge(rule: Rule, part: HardenedPart, conversion: HardnessTable): Applicable {
  const reached = rule.from
    ? reachesThreshold(rule.from, part, conversion)
    : { isReached: true, isByConversion: false };
  if (!reached) return { ok: false, reason: 'strength_not_stated', source: rule.source };
  if (!reached.isReached)
    return { ok: true, rule, isRequired: false, isByConversion: reached.isByConversion };
  if (rule.onlyWorked && part.isWorkedHard === undefined)
    return { ok: false, reason: 'working_not_stated', source: rule.source };
  const isRequired = !rule.onlyWorked || part.isWorkedHard === true;
  return { ok: true, rule, isRequired, isByConversion: reached.isByConversion };
}
