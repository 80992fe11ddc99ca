import { z } from 'zod';

import { ORDER_FACTS, ORDER_ITEMS } from '@/lib/trade/ordering/order-item';
import { CALL_OUT_NOTES } from '@/lib/trade/tables/call-out-notes';
import { MISSING_ITEMS } from '@/lib/trade/tables/missing-items';
import type { OrderRuleId } from '@/lib/trade/tables/order-rule';
import { ORDER_RULES } from '@/lib/trade/tables/order-rules';
import { ORDERING_INFORMATION } from '@/lib/trade/tables/ordering-information';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';

import { replaceable } from '../replaceable';
import { listOf, specifications, whole, words } from '../row-fields';

const item = z.enum(ORDER_ITEMS);
const day = z
  .string()
  .regex(
    /^\d{4}(?:-(?:0[1-9]|1[0-2])(?:-(?:0[1-9]|[12]\d|3[01]))?)?$/,
    'Write it as 2006, 2006-05 or 2006-05-01.',
  );

/** What became of specifications, what an order to one has to state, and the order of steps. */
export const SPECIFICATION_ROWS = [
  replaceable(
    SPECIFICATION_LINEAGE,
    z.strictObject({
      number: words(60),
      revision: words(20).exactOptional(),
      event: z.enum([
        'issued',
        'amended',
        'reaffirmed',
        'adopted',
        'listed_active',
        'current',
        'noncurrent',
        'stabilized',
        'revived',
        'renamed',
        'superseded',
        'withdrawn',
        'cancelled',
        'alternative',
        'successor_not_found',
      ]),
      on: day.exactOptional(),
      by: z.enum(['publisher', 'government_index']).exactOptional(),
      successors: z
        .array(
          z.strictObject({
            number: words(60),
            revision: words(20).exactOptional(),
            covers: z
              .enum(['parts', 'raw_material', 'castings', 'general_work', 'industrial_work'])
              .exactOptional(),
            conditions: words().exactOptional(),
          }),
        )
        .min(1)
        .max(6)
        .exactOptional(),
    }),
  ),
  replaceable(
    CALL_OUT_NOTES,
    z.strictObject({
      number: words(60),
      revisions: listOf(words(20)).exactOptional(),
      when: z.enum(['always', 'no_type_stated', 'for_parts']),
      note: z.enum([
        'type_i_hexavalent_applies',
        'nitric_unless_engineering_allows_citric',
        'acceptance_class_4_applies',
        'type_guidance_lost',
        'excludes_parts',
        'raw_material_only',
        'pulls_in_slash_sheet',
        'number_forks_by_product',
        'classes_do_not_map',
        'not_over_200_ksi_unless_specified',
        'no_sensitivity_level_in_first_issue',
      ]),
      asksEngineering: z.boolean(),
    }),
  ),
  replaceable(
    ORDERING_INFORMATION,
    z.strictObject({
      specifications,
      issue: words(40).exactOptional(),
      paragraph: words(60).exactOptional(),
      kind: z.enum(['must_state', 'must_be_agreed', 'should_state', 'state_or_default', 'default']),
      asks: z
        .array(
          z.strictObject({
            item,
            when: z.enum(ORDER_FACTS).exactOptional(),
            otherwise: words().exactOptional(),
          }),
        )
        .min(1)
        .max(16),
    }),
  ),
  replaceable(
    MISSING_ITEMS,
    z.strictObject({ rank: whole(1, 1000), items: listOf(item), saidBy: whole(0, 1000) }),
  ),
  replaceable(
    ORDER_RULES,
    z.strictObject({
      // A rule is code; the table says how hard it is and where it stands.
      rule: z.enum(ORDER_RULES.rows.map(({ rule }) => rule) as [OrderRuleId, ...OrderRuleId[]]),
      severity: z.enum(['blocker', 'warning', 'note']),
    }),
  ),
];
