import { sql } from 'drizzle-orm';
import { expect, test } from 'vitest';

import { DOOR_GRANTS, PORTAL_GRANTS, SHOP_GRANTS } from '@/db/grants';

import { openDatabase } from '../open-database';

const base = openDatabase();

const names = async (statement: ReturnType<typeof sql>): Promise<string[]> =>
  (await base.owner.execute<{ name: string }>(statement)).rows.map((row) => row.name);

test('every table has row-level security, at least one policy, and stands in the list of grants', async () => {
  const tables = await names(
    sql`select tablename as name from pg_tables where schemaname = 'public' order by 1`,
  );
  expect(tables.length).toBeGreaterThan(45);
  expect(
    await names(
      sql`select relname as name from pg_class where relnamespace = 'public'::regnamespace and relkind in ('r', 'p') and not relrowsecurity`,
    ),
  ).toEqual([]);
  expect(
    await names(
      sql`select tablename as name from pg_tables t where schemaname = 'public' and not exists (select from pg_policies p where p.schemaname = 'public' and p.tablename = t.tablename)`,
    ),
  ).toEqual([]);
  const granted = new Set([
    ...Object.keys(SHOP_GRANTS),
    ...Object.keys(PORTAL_GRANTS),
    ...Object.keys(DOOR_GRANTS),
  ]);
  expect(tables.filter((table) => !granted.has(table))).toEqual([]);
  expect([...granted].filter((table) => !tables.includes(table))).toEqual([]);
});

test('what is granted in the database is what the list says', async () => {
  const { rows } = await base.owner.execute<{ role: string; table: string; verb: string }>(sql`
    select grantee as role, table_name as table, lower(privilege_type) as verb from information_schema.role_table_grants
    where table_schema = 'public' and grantee in ('app_shop', 'app_portal', 'app_door', 'lotwright_app', 'PUBLIC')`);
  const meant = (
    [
      ['app_shop', SHOP_GRANTS],
      ['app_portal', PORTAL_GRANTS],
      ['app_door', DOOR_GRANTS],
    ] as const
  ).flatMap(([role, grants]) =>
    Object.entries(grants).flatMap(([table, what]) =>
      Array.isArray(what) ? what.map((verb) => `${role} ${String(verb)} ${table}`) : [],
    ),
  );
  expect(rows.map(({ role, table, verb }) => `${role} ${verb} ${table}`).sort()).toEqual(meant.sort());
});

test('views look with the eyes of whoever asks', async () => {
  expect(
    await names(
      sql`select relname as name from pg_class where relnamespace = 'public'::regnamespace and relkind in ('v', 'm') and not coalesce('security_invoker=true' = any (reloptions), false)`,
    ),
  ).toEqual([]);
});

test('the application is neither owner nor superuser nor above the policies, and no policy is for everybody', async () => {
  expect(
    await names(
      sql`select rolname as name from pg_roles where rolname in ('lotwright_app', 'app_shop', 'app_portal', 'app_door') and (rolsuper or rolbypassrls or rolcreaterole or rolcreatedb)`,
    ),
  ).toEqual([]);
  expect(
    await names(
      sql`select tablename as name from pg_tables where schemaname = 'public' and tableowner <> 'lotwright_owner'`,
    ),
  ).toEqual([]);
  expect(
    await names(
      sql`select tablename as name from pg_policies where schemaname = 'public' and 'public' = any (roles)`,
    ),
  ).toEqual([]);
});

test('a function that runs as the owner says where it looks for names', async () => {
  expect(
    await names(
      sql`select proname as name from pg_proc where pronamespace = 'public'::regnamespace and prosecdef and not exists (select from unnest(proconfig) setting where setting like 'search_path=%')`,
    ),
  ).toEqual([]);
});

test('a reference from one shop’s table to another’s carries the shop, so that it cannot point over the fence', async () => {
  expect(
    await names(sql`
      select format('%s.%s', c.conrelid::regclass, c.conname) as name from pg_constraint c
      where c.contype = 'f' and c.connamespace = 'public'::regnamespace
        and exists (select from pg_attribute a where a.attrelid = c.conrelid and a.attname = 'shop_id' and a.attnotnull)
        and exists (select from pg_attribute a where a.attrelid = c.confrelid and a.attname = 'shop_id' and a.attnotnull)
        and not exists (select from pg_attribute a where a.attrelid = c.conrelid and a.attnum = any (c.conkey) and a.attname = 'shop_id')
      order by 1`),
  ).toEqual([]);
});

/** How long something took: measured, and nobody sums it up. */
const MEASURED = ['readings.seconds'];

test('every column that names a moment carries its zone, and money is whole', async () => {
  expect(
    await names(
      sql`select format('%s.%s', table_name, column_name) as name from information_schema.columns where table_schema = 'public' and data_type = 'timestamp without time zone'`,
    ),
  ).toEqual([]);
  expect(
    await names(
      sql`select format('%s.%s', table_name, column_name) as name from information_schema.columns where table_schema = 'public' and (data_type in ('real', 'double precision', 'money') or column_name like '%\_minor' and data_type <> 'bigint')`,
    ),
  ).toEqual(MEASURED);
});
