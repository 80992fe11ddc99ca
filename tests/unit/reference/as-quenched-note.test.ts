import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';

import { AsQuenchedNote } from '@/components/reference/as-quenched-note';
import { queryKeyOf } from '@/lib/api/query-key';
import { getTablesInForce } from '@/lib/reference/contract';

/** As a shop without editions of its own is told. */
function note(alloy: string, condition: string | null): string {
  const client = new QueryClient();
  client.setQueryData(queryKeyOf(getTablesInForce, {}), { own: [] });
  const element = createElement(AsQuenchedNote, { alloy, condition });
  return renderToStaticMarkup(createElement(QueryClientProvider, { client }, element));
}

test.each(['AQ', 'W'])(
  '2024 that comes back in %s keeps soft 15 min, and the clock knows the alloy',
  (condition) => {
    expect(note('2024', condition)).toContain('2024 keeps soft 15 min at room temperature');
    expect(note('2024', condition)).toContain('/reference/holding?alloy=2024');
  },
);

test('of an alloy that no table has only the state is said', () => {
  expect(note('6013', 'AQ')).toContain('No table here says how long');
  expect(note('6013', 'AQ')).not.toContain('/reference/holding');
});

test.each(['T42', 'W51', null])('of what is aged, stretched or not said (%s) nothing is said', (condition) =>
  expect(note('2024', condition)).toBe(''),
);
