import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { createElement, type ReactElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';

import { useTables } from '@/components/reference/use-tables';
import { TableScreen } from '@/components/settings/table-screen';
import { TablesScreen } from '@/components/settings/tables-screen';
import { queryKeyOf } from '@/lib/api/query-key';
import { getReferenceTable, getTablesInForce, listReferenceTables } from '@/lib/reference/contract';
import { REPLACEABLE, TABLES_BY_SUBJECT } from '@/lib/reference/replaceable-tables';
import { cellsOfRow } from '@/lib/reference/rows-in-cells';
import { getMe } from '@/lib/session/contract';

const OWN = {
  id: '0195b3a0-0000-7000-8000-000000000001',
  ...{ title: 'Own procedure HT-12', edition: 'issue 3', clause: 'Table 2', rows: 2 },
  ...{ enteredByName: 'Liv Marsh', enteredAt: '2026-04-16T09:00:00Z', supersededAt: null, withdrawnAt: null },
};
const EARLIER = { ...OWN, id: `${OWN.id.slice(0, -1)}2`, edition: 'issue 2', supersededAt: OWN.enteredAt };

/** What a page shows with these answers in its cache. */
function shown(
  screen: ReactElement,
  roles: readonly string[],
  answers: readonly (readonly [object, object])[],
) {
  const client = new QueryClient();
  client.setQueryData(queryKeyOf(getMe, {}), { roles, organisation: { zone: 'UTC' } });
  for (const [key, data] of answers) client.setQueryData(key as readonly unknown[], data);
  const markup = renderToStaticMarkup(createElement(QueryClientProvider, { client }, screen));
  return markup.replace(/<[^>]*>/g, ' ').replace(/\s+/g, ' ');
}

const asked = { tableId: 'quench-delays' };
function quenchDelays(inForce: typeof OWN | null) {
  const { published, columns } = REPLACEABLE.get('quench-delays') ?? {};
  return {
    ...asked,
    ...{ title: published?.title, published: published?.edition, shown: inForce, inForce, isInForce: true },
    columns: (columns ?? []).map(({ head }) => ({ head, says: 'a figure' })),
    cells: (published?.rows ?? []).map((row) => cellsOfRow(columns ?? [], row)),
    sources: (published?.rows ?? []).map(() => 'MIL-H-6088G (partly from memory, high trust)'),
    history: inForce ? [inForce, EARLIER] : [],
  };
}
const tableShown = (inForce: typeof OWN | null, roles: readonly string[]) =>
  shown(createElement(TableScreen, asked), roles, [
    [queryKeyOf(getReferenceTable, asked), quenchDelays(inForce)],
  ]);

test('the list names every table with the edition in force, and marks the own ones', () => {
  const subjects = TABLES_BY_SUBJECT.map(({ subject, tables }) => ({
    subject,
    tables: tables.map(({ published: { id, title, edition, rows } }) => ({
      ...{ tableId: id, title, published: edition, rows: rows.length },
      own: id === 'quench-delays' ? OWN : null,
    })),
  }));
  const text = shown(
    createElement(TablesScreen),
    ['lead'],
    [[queryKeyOf(listReferenceTables, {}), { subjects }]],
  );
  for (const { published } of REPLACEABLE.values()) expect(text).toContain(published.title);
  expect(text).toContain('1 is your own.');
  expect(text).toContain('own Own procedure HT-12, issue 3, Table 2');
});

test('a table shows its rows, its editions, and to a lead the way to an own one', () => {
  const text = tableShown(null, ['lead']);
  expect(text).toContain('0.091 15 775 2219 = 900');
  expect(text).toContain('the published one is in force');
  expect(text).toContain('Enter your own edition');
  expect(text).not.toContain('Withdraw your edition');
  const own = tableShown(OWN, ['admin']);
  expect(own).toContain('Your own: Own procedure HT-12, issue 3, Table 2.');
  expect(own).toMatch(/issue 2, Table 2 .*followed by another/);
  expect(own).toContain('Withdraw your edition');
});

test('who may not change it is offered nothing but the file', () => {
  const text = tableShown(OWN, ['inspector']);
  expect(text).toContain('Save as CSV');
  expect(text).not.toMatch(/Enter your own|Withdraw your/);
});

test('the part editor reads the shop’s edition in place of the published table', () => {
  const Densities = () => createElement('p', null, JSON.stringify(useTables().densities));
  const own = [{ ...OWN, tableId: 'densities', rows: [{ alloys: ['2024'], lbPerIn3: 0.5 }] }];
  const read = (entries: readonly object[]) =>
    shown(createElement(Densities), ['lead'], [[queryKeyOf(getTablesInForce, {}), { own: entries }]]);
  expect(read([])).toContain('Nominal densities');
  expect(read([])).not.toContain('Own procedure');
  expect(read(own)).toMatch(/issue 3.*lbPerIn3&quot;:0.5/);
});
