import { ruleWords } from '@/components/parts/route-words';
import { ORDER_RULES } from '@/lib/trade/tables/order-rules';

import { SourcedTable } from './sourced-table';

const SEVERITY_WORDS = { blocker: 'stops', warning: 'warns', note: 'notes' } as const;

/** The rules that a route is checked by. */
export function RouteTables() {
  return (
    <div className="pt-4">
      <SourcedTable
        table={ORDER_RULES}
        heads={['It', 'Rule']}
        cells={({ rule, severity }) => [
          SEVERITY_WORDS[severity],
          <span key="rule" className="block min-w-64 font-sans">
            {ruleWords(rule)}
          </span>,
        ]}
      />
    </div>
  );
}
