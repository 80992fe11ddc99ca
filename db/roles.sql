-- The roles of Lotwright. Safe to run again. On a server of your own, run it once as a superuser (or a role that may
-- create roles), give the two logins a password, and create the database with lotwright_owner as its owner.
--
-- lotwright_owner owns the tables and runs migrations.
-- lotwright_app   is what the web server and the worker log in as: not the owner, so row-level security binds it.
-- app_shop, app_portal, app_door are worn inside a transaction; each has policies and grants of its own.
do $$
begin
  if not exists (select from pg_roles where rolname = 'lotwright_owner') then
    create role lotwright_owner login nosuperuser nocreatedb nocreaterole nobypassrls;
  end if;
  if not exists (select from pg_roles where rolname = 'lotwright_app') then
    create role lotwright_app login inherit nosuperuser nocreatedb nocreaterole nobypassrls;
  end if;
  if not exists (select from pg_roles where rolname = 'app_shop') then
    create role app_shop nologin nosuperuser nobypassrls;
  end if;
  if not exists (select from pg_roles where rolname = 'app_portal') then
    create role app_portal nologin nosuperuser nobypassrls;
  end if;
  if not exists (select from pg_roles where rolname = 'app_door') then
    create role app_door nologin nosuperuser nobypassrls;
  end if;
end
$$;

-- Inherited, so that a query outside a tenant is answered with no rows instead of an error.
grant app_shop, app_portal, app_door to lotwright_app;

-- Row-level security hides a table's statistics from the planner (most comparisons are not leakproof), so it thinks
-- short queries long and would compile them for a second or more before a run of milliseconds.
alter role lotwright_app set jit = off;
