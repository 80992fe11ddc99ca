-- What a transaction was opened for. `withTenant` sets these, for the transaction only; unset reads as null, which
-- matches no row. They are called inside `(select …)` in the policies, so that they run once a statement.
create function current_shop() returns uuid language sql stable parallel safe
  as $$ select nullif(current_setting('app.shop_id', true), '')::uuid $$;
--> statement-breakpoint
create function current_processor() returns uuid language sql stable parallel safe
  as $$ select nullif(current_setting('app.processor_id', true), '')::uuid $$;
--> statement-breakpoint
create function current_batch() returns uuid language sql stable parallel safe
  as $$ select nullif(current_setting('app.batch_id', true), '')::uuid $$;
--> statement-breakpoint
create function current_person() returns uuid language sql stable parallel safe
  as $$ select nullif(current_setting('app.person_id', true), '')::uuid $$;
--> statement-breakpoint
create function current_key_owner() returns text language sql stable parallel safe
  as $$ select nullif(current_setting('app.key_owner', true), '') $$;
--> statement-breakpoint
create function at_the_door() returns boolean language sql stable parallel safe
  as $$ select coalesce(current_setting('app.door', true), '') = 'open' $$;
