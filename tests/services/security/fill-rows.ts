import { randomUUID } from 'node:crypto';
import type pg from 'pg';

interface Column {
  name: string;
  type: string;
  kind: string;
  isArray: boolean;
  nullable: boolean;
  labels: string[] | null;
}

export interface TableFacts {
  name: string;
  columns: Column[];
  key: string[];
}

/** Every table of the product, from the catalogue, so that one added tomorrow is looked at too. */
export async function tablesOf(client: pg.Client): Promise<TableFacts[]> {
  const { rows } = await client.query<{
    table: string;
    name: string;
    type: string;
    kind: string;
    is_array: boolean;
    nullable: boolean;
    labels: string[] | null;
  }>(`
    select c.relname as table, a.attname as name, coalesce(e.typname, t.typname) as type, coalesce(e.typtype, t.typtype)::text as kind,
      t.typcategory = 'A' as is_array, not a.attnotnull as nullable,
      (select array_agg(enumlabel::text order by enumsortorder) from pg_enum where enumtypid = coalesce(e.oid, t.oid)) as labels
    from pg_class c join pg_namespace n on n.oid = c.relnamespace and n.nspname = 'public'
      join pg_attribute a on a.attrelid = c.oid and a.attnum > 0 and not a.attisdropped
      join pg_type t on t.oid = a.atttypid left join pg_type e on e.oid = t.typelem and t.typcategory = 'A'
    where c.relkind = 'r' order by c.relname, a.attnum`);
  const keys = await client.query<{ table: string; name: string }>(`
    select c.relname as table, a.attname as name from pg_index i join pg_class c on c.oid = i.indrelid join pg_namespace n on n.oid = c.relnamespace and n.nspname = 'public'
      join pg_attribute a on a.attrelid = c.oid and a.attnum = any (i.indkey) where i.indisprimary order by c.relname, a.attnum`);
  const tables = new Map<string, TableFacts>();
  for (const { table, is_array: isArray, ...column } of rows) {
    const facts = tables.get(table) ?? {
      name: table,
      columns: [],
      key: keys.rows.filter((key) => key.table === table).map((key) => key.name),
    };
    facts.columns.push({ ...column, isArray });
    tables.set(table, facts);
  }
  return [...tables.values()];
}

/** A row need not make sense to be fenced in: in this test's own database only the fences are looked at. */
export async function dropChecks(client: pg.Client): Promise<void> {
  const { rows } = await client.query<{ statement: string }>(`
    select format('alter table %s drop constraint %I', conrelid::regclass, conname) as statement
    from pg_constraint where contype = 'c' and connamespace = 'public'::regnamespace and conrelid <> 0`);
  for (const { statement } of rows) await client.query(statement);
}

/** A row of any table with plausible values, the given ones first. Made with foreign keys and triggers put aside. */
export async function fillRow(
  client: pg.Client,
  table: TableFacts,
  given: Record<string, unknown>,
): Promise<Record<string, unknown>> {
  const row = Object.fromEntries(
    table.columns.map((column) => [
      column.name,
      column.name in given ? given[column.name] : valueFor(column),
    ]),
  );
  const names = table.columns.map((column) => `"${column.name}"`).join(', ');
  await client.query('begin');
  try {
    await client.query(`set local session_replication_role = replica`);
    await client.query(
      `insert into "${table.name}" (${names}) select ${names} from jsonb_populate_record(null::"${table.name}", $1)`,
      [JSON.stringify(row)],
    );
    await client.query('commit');
    return row;
  } catch (error) {
    await client.query('rollback');
    throw new Error(`no row for ${table.name}: ${error instanceof Error ? error.message : String(error)}`, {
      cause: error,
    });
  }
}

function valueFor({ name, type, kind, isArray, nullable, labels }: Column): unknown {
  if (isArray) return [];
  if (nullable) return null;
  if (kind === 'e') return labels?.[0];
  switch (type) {
    case 'uuid':
      return randomUUID();
    case 'int4':
    case 'int8':
    case 'numeric':
      return 1;
    case 'bool':
      return false;
    case 'date':
      return '2026-06-17';
    case 'timestamptz':
      return '2026-06-17T12:00:00Z';
    case 'jsonb':
      return {};
    default:
      return `${name}-${randomUUID()}`;
  }
}
