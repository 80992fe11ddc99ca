import type pg from 'pg';

export const LOTS = 100_000;
export const BATCHES = 20_000;
const LINES_OF_A_BATCH = LOTS / BATCHES;
const OPEN_BATCHES = 60;

export interface Filled {
  shopId: string;
  userId: string;
  batchId: string;
}

/** An id that says what it is and keeps the order of its number: kind and number in the places of a version 7 id. */
const ids = (kind: number, n: string) =>
  `(lpad(to_hex(1700000000000 + ${n}), 12, '0') || '7' || lpad(to_hex(${kind}), 3, '0') || '8000' || lpad(to_hex(${n}), 12, '0'))::uuid`;

/**
 * One shop of many years: 100,000 lots that went out in 20,000 batches of five lines. All but sixty batches are in
 * stock; the sixty are at their processors. Written as the owner, through the ledger's trigger like everything else.
 */
export async function fill(client: pg.Client): Promise<Filled> {
  const shop = ids(1, '1');
  const run = (statement: string) => client.query(statement);
  await run(`insert into shops (id, name, zone, currency) values (${shop}, 'Bench', 'UTC', 'USD')`);
  await run(
    `insert into processors (id, name, email) select ${ids(2, 'n')}, 'Processor ' || n, 'p' || n || '@bench.test' from generate_series(1, 4) n`,
  );
  await run(
    `insert into shop_processors (shop_id, processor_id, contact_email) select ${shop}, ${ids(2, 'n')}, 'p' || n || '@bench.test' from generate_series(1, 4) n`,
  );
  await run(
    `insert into approvals (id, shop_id, processor_id, reference, processes, valid_from, valid_to) select ${ids(3, 'n')}, ${shop}, ${ids(2, 'n')}, 'A-' || n, '{solution_heat_treat_and_age}', current_date - 900, current_date + 300 from generate_series(1, 4) n`,
  );
  await run(`insert into users (id, email, name) values (${ids(4, '1')}, 'bench@bench.test', 'Bench Lead')`);
  await run(
    `insert into memberships (id, user_id, shop_id, roles) values (${ids(5, '1')}, ${ids(4, '1')}, ${shop}, '{lead,inspector,office,admin}')`,
  );
  await run(
    `insert into parts (id, shop_id, number, revision, name, alloy, form, made_condition, end_condition) select ${ids(6, 'n')}, ${shop}, 'BN-' || lpad(n::text, 5, '0'), 'A', 'Bracket ' || n, '2024', 'sheet', 'O', 'T42' from generate_series(1, 2000) n`,
  );
  await run(
    `insert into route_steps (id, shop_id, part_id, seq, process, specification, specification_revision, target_condition) select ${ids(7, 'n')}, ${shop}, ${ids(6, 'n')}, 1, 'solution_heat_treat_and_age', 'AMS 2770', 'R', 'T42' from generate_series(1, 2000) n`,
  );
  await run(`insert into locations (id, shop_id, name) values (${ids(8, '1')}, ${shop}, 'Rack A')`);
  await run(
    `insert into lots (id, shop_id, number, part_id, heat, made_on) select ${ids(9, 'n')}, ${shop}, 'L-' || lpad(n::text, 6, '0'), ${ids(6, '(n % 2000) + 1')}, 'H' || n % 997, now() - (n || ' minutes')::interval from generate_series(1, ${LOTS}) n`,
  );
  await run(`insert into movements (id, shop_id, lot_id, pieces, to_place, to_holder_id, reason, moved_by, moved_at)
    select ${ids(10, 'n')}, ${shop}, ${ids(9, 'n')}, 10, 'making', ${ids(7, '(n % 2000) + 1')}, 'made', 'bench', now() from generate_series(1, ${LOTS}) n`);
  await fillBatches(run, shop);
  await run('analyze');
  const { rows } = await client.query<Filled>(
    `select ${shop} as "shopId", ${ids(4, '1')} as "userId", ${ids(11, String(BATCHES - 5))} as "batchId"`,
  );
  if (!rows[0]) throw new Error('nothing was filled');
  return rows[0];
}

async function fillBatches(run: (statement: string) => Promise<unknown>, shop: string): Promise<void> {
  const closed = BATCHES - OPEN_BATCHES;
  // Seven batches a working day, the last one twenty days ago: years of history, of which a week is fresh.
  const sentAt = `(now() - interval '20 days' - (${BATCHES} - n) * interval '4 hours')`;
  await run(`insert into batches (id, shop_id, number, order_number, processor_id, process, specification, specification_revision, currency, leaves_on, wanted_back_on, dispatched_at, acknowledged_at, stage, pieces, pieces_back, promised_on, first_promised_on, last_back_at, stocked_at, payment_waived_at)
    select ${ids(11, 'n')}, ${shop}, 'B-' || lpad(n::text, 5, '0'), 'BN-' || lpad(n::text, 5, '0'), ${ids(2, '(n % 4) + 1')}, 'solution_heat_treat_and_age', 'AMS 2770', 'R', 'USD', current_date - 20, current_date + 5, ${sentAt}, ${sentAt} + interval '1 day',
      (case when n <= ${closed} then 'stocked' else 'at_processor' end)::stage, ${LINES_OF_A_BATCH * 10}, case when n <= ${closed} then ${LINES_OF_A_BATCH * 10} else 0 end, current_date + (n % 17 - 5)::int, current_date + (n % 17 - 5)::int,
      case when n <= ${closed} then ${sentAt} + interval '11 days' end, case when n <= ${closed} then ${sentAt} + interval '12 days' end, case when n <= ${closed} then ${sentAt} + interval '20 days' end
    from generate_series(1, ${BATCHES}) n`);
  await run(
    `insert into promises (id, shop_id, batch_id, promised_on, made_by, made_at) select ${ids(13, 'n')}, ${shop}, ${ids(11, 'n')}, current_date + (n % 17 - 5)::int, 'desk', now() - '19 days'::interval from generate_series(1, ${BATCHES}) n`,
  );
  await run(`insert into batch_lines (id, shop_id, batch_id, line_no, lot_id, step_id, pieces, unit_price_minor)
    select ${ids(12, 'n')}, ${shop}, ${ids(11, `(n - 1) / ${LINES_OF_A_BATCH} + 1`)}, (n - 1) % ${LINES_OF_A_BATCH} + 1, ${ids(9, 'n')}, ${ids(7, '(n % 2000) + 1')}, 10, 500 from generate_series(1, ${LOTS}) n`);
  await run(`insert into movements (id, shop_id, lot_id, pieces, from_place, from_holder_id, to_place, to_holder_id, batch_line_id, reason, moved_by, moved_at)
    select ${ids(14, 'n')}, ${shop}, ${ids(9, 'n')}, 10, 'making', ${ids(7, '(n % 2000) + 1')},
      (case when (n - 1) / ${LINES_OF_A_BATCH} + 1 <= ${closed} then 'stock' else 'at_processor' end)::place, case when (n - 1) / ${LINES_OF_A_BATCH} + 1 <= ${closed} then ${ids(8, '1')} else ${ids(12, 'n')} end,
      ${ids(12, 'n')}, 'released', 'bench', now() from generate_series(1, ${LOTS}) n`);
}
