-- The queue counts tries after the first, also while the next one waits.
create or replace function failed_jobs() returns table (id uuid, name text, data jsonb, state text, attempts integer, attempts_meant integer,
    queued_at timestamptz, last_tried_at timestamptz, next_at timestamptz, error text)
  language plpgsql stable security definer set search_path = pg_catalog, public as $$
begin
  return query
    select j.id, j.name, j.data, j.state::text, j.retry_count + 1, j.retry_limit + 1,
        j.created_on, coalesce(j.completed_on, j.started_on), case when j.state = 'retry' then j.start_after end,
        coalesce(j.output ->> 'message', j.output #>> '{value,message}', j.output #>> '{}')
      from pgboss.job j
     where j.state in ('failed', 'retry') and j.data ->> 'shopId' = current_shop()::text
     order by j.created_on desc
     limit 200;
end $$;
