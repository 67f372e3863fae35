-- Who is asking, as every policy sees it. The settings live as long as one transaction; `app.enter_*` writes them.
create extension if not exists btree_gist;
--> statement-breakpoint
create schema app;
--> statement-breakpoint
grant usage on schema app to coastdown_app, coastdown_gate;
--> statement-breakpoint
-- An unset actor is an error, never an empty list. (After one transaction a custom setting is '', not NULL.)
create function app.company_id() returns uuid language plpgsql stable as $$
declare value text := nullif(current_setting('app.company_id', true), '');
begin
  if value is null then
    raise exception 'no actor has entered this transaction' using errcode = 'CD401';
  end if;
  return value::uuid;
end $$;
--> statement-breakpoint
create function app.role() returns text language sql stable as
  $$ select coalesce(nullif(current_setting('app.role', true), ''), 'none') $$;
--> statement-breakpoint
create function app.claim(name text) returns uuid language sql stable as
  $$ select nullif(current_setting('app.' || name, true), '')::uuid $$;
--> statement-breakpoint
create function app.member_id() returns uuid language sql stable as $$ select app.claim('member_id') $$;
--> statement-breakpoint
create function app.contact_id() returns uuid language sql stable as $$ select app.claim('contact_id') $$;
--> statement-breakpoint
create function app.customer_id() returns uuid language sql stable as $$ select app.claim('customer_id') $$;
--> statement-breakpoint
create function app.link_id() returns uuid language sql stable as $$ select app.claim('link_id') $$;
--> statement-breakpoint
create function app.link_subject() returns uuid language sql stable as $$ select app.claim('link_subject') $$;
--> statement-breakpoint
create function app.is_owner() returns boolean language sql stable as
  $$ select app.role() in ('owner', 'operator') $$;
--> statement-breakpoint
create function app.is_office() returns boolean language sql stable as
  $$ select app.role() in ('owner', 'dispatcher', 'bookkeeper', 'worker', 'operator') $$;
--> statement-breakpoint
create function app.is_staff() returns boolean language sql stable as
  $$ select app.is_office() or app.role() = 'technician' $$;
--> statement-breakpoint
create function app.is_technician() returns boolean language sql stable as $$ select app.role() = 'technician' $$;
--> statement-breakpoint
create function app.is_worker() returns boolean language sql stable as $$ select app.role() = 'worker' $$;
--> statement-breakpoint
create function app.is_operator() returns boolean language sql stable as $$ select app.role() = 'operator' $$;
--> statement-breakpoint
create function app.is_link() returns boolean language sql stable as $$ select app.role() = 'link' $$;
--> statement-breakpoint
-- The sets that policies ask for are filled in once the tables are there.
create function app.my_site_ids() returns setof uuid language sql stable as $$ select null::uuid where false $$;
--> statement-breakpoint
create function app.my_visit_ids() returns setof uuid language sql stable as $$ select null::uuid where false $$;
--> statement-breakpoint
create function app.my_job_ids() returns setof uuid language sql stable as $$ select null::uuid where false $$;
--> statement-breakpoint
create function app.my_customer_ids() returns setof uuid language sql stable as $$ select null::uuid where false $$;
--> statement-breakpoint
create function app.my_site_contact_ids() returns setof uuid language sql stable as $$ select null::uuid where false $$;
--> statement-breakpoint
create function app.my_crew_ids() returns setof uuid language sql stable as $$ select null::uuid where false $$;
