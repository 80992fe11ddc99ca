import { ORDERING_KIND_WORDS } from '@/lib/reference/ordering-words';
import { ORDER_ITEM_WORDS } from '@/lib/trade/ordering/order-item';
import { BRITISH_MATERIALS } from '@/lib/trade/tables/british-materials';
import { MISSING_ITEMS } from '@/lib/trade/tables/missing-items';
import { ORDERING_INFORMATION } from '@/lib/trade/tables/ordering-information';
import { SPECIFICATION_LINEAGE } from '@/lib/trade/tables/specification-lineage';

import { SourcedTable } from './sourced-table';
import { dateWords, EVENT_WORDS } from './specification-words';

/** The tables that specifications are looked up in. */
export function SpecificationTables() {
  return (
    <div className="pt-4">
      <SourcedTable
        table={SPECIFICATION_LINEAGE}
        heads={['Number', 'Issue', 'What', 'When', 'In its place']}
        cells={({ number, revision = '', event, on, successors = [] }) => [
          number,
          revision,
          EVENT_WORDS[event],
          on === undefined ? 'no date' : dateWords(on),
          successors.map((one) => one.number).join(', '),
        ]}
      />
      <SourcedTable
        table={ORDERING_INFORMATION}
        heads={['Specifications', 'Issue', 'How', 'What the order states']}
        cells={({ specifications, issue = '', kind, asks }) => [
          specifications.join(', '),
          issue,
          ORDERING_KIND_WORDS[kind],
          asks.map(({ item }) => ORDER_ITEM_WORDS[item]).join('; '),
        ]}
      />
      <SourcedTable
        table={MISSING_ITEMS}
        heads={['Rank', 'What orders leave out', 'Said by']}
        cells={({ rank, items, saidBy }) => [
          rank,
          items.map((item) => ORDER_ITEM_WORDS[item]).join('; '),
          saidBy,
        ]}
      />
      <SourcedTable
        table={BRITISH_MATERIALS}
        heads={['Number', 'Material', 'Condition', 'Superseded by', 'Nearest of today']}
        cells={({ number, material, condition, supersededBy, nearest }) => [
          number,
          material ?? 'not found out',
          condition ?? '',
          supersededBy.join(', '),
          nearest ?? '',
        ]}
      />
    </div>
  );
}
