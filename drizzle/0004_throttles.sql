CREATE TABLE "throttles" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
ALTER TABLE "throttles" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE POLICY "door" ON "throttles" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
-- Jobs of a shop that failed, or failed once and wait for their next try. The queue belongs to nobody's tenant and its
-- payloads name people, so the shop's role reads it through this door only, and only what carries its own shop.
create function failed_jobs() returns table (id uuid, name text, data jsonb, state text, attempts integer, attempts_meant integer,
    queued_at timestamptz, last_tried_at timestamptz, next_at timestamptz, error text)
  language plpgsql stable security definer set search_path = pg_catalog, public as $$
begin
  return query
    select j.id, j.name, j.data, j.state::text, j.retry_count + (j.state = 'failed')::integer, j.retry_limit + 1,
        j.created_on, coalesce(j.completed_on, j.started_on), case when j.state = 'retry' then j.start_after end,
        coalesce(j.output ->> 'message', j.output #>> '{value,message}', j.output #>> '{}')
      from pgboss.job j
     where j.state in ('failed', 'retry') and j.data ->> 'shopId' = current_shop()::text
     order by j.created_on desc
     limit 200;
end $$;
--> statement-breakpoint
-- One more try, now. Says whether there was such a job in this shop.
create function retry_failed_job(wanted uuid) returns boolean
  language plpgsql security definer set search_path = pg_catalog, public as $$
begin
  update pgboss.job j
     set retry_limit = j.retry_limit + (j.state = 'failed')::integer, state = 'retry', start_after = now(), completed_on = null,
         keep_until = greatest(j.keep_until, now() + interval '14 days')
   where j.id = wanted and j.state in ('failed', 'retry') and j.data ->> 'shopId' = current_shop()::text;
  return found;
end $$;
--> statement-breakpoint
revoke execute on function failed_jobs(), retry_failed_job(uuid) from public;
--> statement-breakpoint
grant execute on function failed_jobs(), retry_failed_job(uuid) to app_shop;
