-- drizzle-kit enables row-level security; only FORCE binds the tables' owner too.
alter table audit_entries force row level security;
alter table companies force row level security;
alter table series force row level security;
alter table contacts force row level security;
alter table customer_notes force row level security;
alter table customers force row level security;
alter table jobs force row level security;
alter table links force row level security;
alter table message_secrets force row level security;
alter table messages force row level security;
alter table outbox force row level security;
alter table licenses force row level security;
alter table member_details force row level security;
alter table members force row level security;
alter table contact_sites force row level security;
alter table site_access force row level security;
alter table site_holders force row level security;
alter table sites force row level security;
alter table visit_crew force row level security;
alter table visits force row level security;
--> statement-breakpoint
grant select, insert, update, delete on all tables in schema public to coastdown_app;
revoke update, delete on audit_entries from coastdown_app;
revoke delete on companies, members, customers, sites, jobs, visits, visit_crew, contacts, site_holders, messages, outbox, links, series from coastdown_app;
grant usage on schema identity, ops to coastdown_app;
grant select, insert, update, delete on all tables in schema identity, ops to coastdown_app;
-- So that the health check can compare what is applied with what the application was built with.
grant usage on schema drizzle to coastdown_app;
grant select on drizzle.__drizzle_migrations to coastdown_app;
grant usage on schema public, identity to coastdown_gate;
grant select on companies, members, contacts, site_holders, contact_sites, visits, visit_crew, links, outbox to coastdown_gate;
grant update on outbox to coastdown_gate;
grant select on identity.users, identity.sessions, identity.access_requests to coastdown_gate;
--> statement-breakpoint
-- A technician is in one place at a time. Deferred, so that two visits can be swapped in one command.
alter table visit_crew add constraint visit_crew_one_place exclude using gist
  (company_id with =, member_id with =, tstzrange(starts_at, ends_at) with &&)
  where (released_at is null) deferrable initially deferred;
alter table visit_crew add constraint visit_crew_once exclude using gist
  (company_id with =, visit_id with =, member_id with =) where (released_at is null);
-- Half-open spans of the holders of a site: nobody holds the same thing twice, and one customer at a time is billed.
alter table site_holders add constraint site_holders_once exclude using gist
  (company_id with =, site_id with =, customer_id with =, capacity with =, tstzrange(starts_at, ends_at) with &&);
alter table site_holders add constraint site_holders_one_payer exclude using gist
  (company_id with =, site_id with =, tstzrange(starts_at, ends_at) with &&) where (capacity = 'bill_to');
alter table companies add constraint companies_zone check (zone like '%/%');
--> statement-breakpoint
create function app.set_claims(company uuid, role text, member uuid, contact uuid, customer uuid, link uuid, subject uuid)
returns void language plpgsql as $$
begin
  if nullif(current_setting('app.company_id', true), '') is not null then
    raise exception 'another actor has entered this transaction' using errcode = 'CD401';
  end if;
  perform set_config('app.company_id', company::text, true),
          set_config('app.role', role, true),
          set_config('app.member_id', coalesce(member::text, ''), true),
          set_config('app.contact_id', coalesce(contact::text, ''), true),
          set_config('app.customer_id', coalesce(customer::text, ''), true),
          set_config('app.link_id', coalesce(link::text, ''), true),
          set_config('app.link_subject', coalesce(subject::text, ''), true);
end $$;
--> statement-breakpoint
-- A signed-in person. The cookie names a session; session, version, membership and role are looked up every time.
create function app.enter_session(session_id uuid)
returns table (company_id uuid, user_id uuid, role text, member_id uuid, contact_id uuid, customer_id uuid)
language plpgsql security definer set search_path = pg_catalog, public as $$
begin
  select m.company_id, m.user_id, m.role, m.id, m.contact_id, c.customer_id
    into company_id, user_id, role, member_id, contact_id, customer_id
    from identity.sessions s
    join identity.users u on u.id = s.user_id and u.session_version = s.session_version
    join public.members m on m.company_id = s.company_id and m.user_id = s.user_id and m.ended_at is null
    left join public.contacts c on c.company_id = m.company_id and c.id = m.contact_id
   where s.id = session_id and s.ended_at is null and s.expires_at > now()
     and (m.contact_id is null or c.ended_at is null);
  if not found then
    raise exception 'the session is over' using errcode = 'CD401';
  end if;
  perform app.set_claims(company_id, role, member_id, contact_id, customer_id, null, null);
  return next;
end $$;
--> statement-breakpoint
create function app.enter_link(hash text)
returns table (company_id uuid, link_id uuid, grant_name text, subject_id uuid)
language plpgsql security definer set search_path = pg_catalog, public as $$
begin
  select l.company_id, l.id, l."grant", l.subject_id into company_id, link_id, grant_name, subject_id
    from public.links l
   where l.token_hash = hash and l.expires_at > now() and l.used_at is null and l.withdrawn_at is null;
  if not found then
    raise exception 'the link is over' using errcode = 'CD401';
  end if;
  perform app.set_claims(company_id, 'link',
    case when grant_name in ('invitation:accept', 'password:reset') then subject_id end,
    null, null, link_id, subject_id);
  return next;
end $$;
--> statement-breakpoint
create function app.enter_worker(company uuid) returns void
language plpgsql security definer set search_path = pg_catalog, public as $$
begin
  if not exists (select from public.companies c where c.company_id = company) then
    raise exception 'no such company' using errcode = 'CD401';
  end if;
  perform app.set_claims(company, 'worker', null, null, null, null, null);
end $$;
--> statement-breakpoint
-- Founds a company: possible only for one that is not there yet.
create function app.enter_operator(company uuid) returns void
language plpgsql security definer set search_path = pg_catalog, public as $$
begin
  if exists (select from public.companies c where c.company_id = company) then
    raise exception 'the company exists' using errcode = 'CD401';
  end if;
  perform app.set_claims(company, 'operator', null, null, null, null, null);
end $$;
--> statement-breakpoint
-- Before a company is known: where may this person go?
create function app.memberships_of(person uuid)
returns table (company_id uuid, company_name text, role text)
language sql stable security definer set search_path = pg_catalog, public as $$
  select m.company_id, c.name, m.role from public.members m join public.companies c using (company_id)
   where m.user_id = person and m.ended_at is null order by m.created_at, m.company_id
$$;
--> statement-breakpoint
create function app.member_of_address(address text)
returns table (company_id uuid, member_id uuid, user_id uuid)
language sql stable security definer set search_path = pg_catalog, public as $$
  select m.company_id, m.id, u.id from identity.users u join public.members m on m.user_id = u.id
   where lower(u.email) = lower(address) and m.ended_at is null order by m.created_at, m.company_id limit 1
$$;
--> statement-breakpoint
-- Hands out what is due, to one worker at a time; a lease that runs out is handed out again.
create function app.claim_outbox(most integer, lease interval)
returns table (company_id uuid, id uuid)
language sql volatile security definer set search_path = pg_catalog, public as $$
  update public.outbox o set leased_until = now() + lease, attempts = o.attempts + 1
   where (o.company_id, o.id) in (
     select c.company_id, c.id from public.outbox c
      where c.done_at is null and c.dead_at is null and c.run_after <= now()
        and (c.leased_until is null or c.leased_until < now())
      order by c.run_after, c.id limit most for update skip locked)
  returning o.company_id, o.id
$$;
--> statement-breakpoint
create function app.outbox_state()
returns table (waiting bigint, oldest_seconds double precision, dead bigint)
language sql stable security definer set search_path = pg_catalog, public as $$
  select count(*) filter (where dead_at is null),
         coalesce(extract(epoch from now() - min(run_after) filter (where dead_at is null and run_after <= now())), 0),
         count(*) filter (where dead_at is not null)
    from public.outbox where done_at is null
$$;
--> statement-breakpoint
create function app.wake_worker() returns trigger language plpgsql as $$
begin
  perform pg_notify('outbox', '');
  return null;
end $$;
create trigger wake_worker after insert on outbox for each statement execute function app.wake_worker();
create trigger wake_worker after insert on identity.access_requests for each statement execute function app.wake_worker();
--> statement-breakpoint
-- The sets of rows that a technician (by crew rows, now or ever) and a contact (by site set and dates) may see.
create or replace function app.my_visit_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select visit_id from public.visit_crew
   where company_id = app.company_id() and member_id = app.member_id() and app.is_technician()
  union
  select v.id from public.visits v
   where v.company_id = app.company_id() and app.contact_id() is not null and v.site_id in (select app.my_site_ids())
$$;
--> statement-breakpoint
create or replace function app.my_site_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select v.site_id from public.visit_crew w
    join public.visits v on v.company_id = w.company_id and v.id = w.visit_id
   where w.company_id = app.company_id() and w.member_id = app.member_id() and app.is_technician()
  union
  select h.site_id from public.contacts c
    join public.site_holders h on h.company_id = c.company_id and h.customer_id = c.customer_id
   where c.company_id = app.company_id() and c.id = app.contact_id()
     and h.starts_at <= now() and (h.ends_at is null or h.ends_at > now())
     and (c.all_sites or exists (select from public.contact_sites s
           where s.company_id = c.company_id and s.contact_id = c.id and s.site_id = h.site_id))
$$;
--> statement-breakpoint
create or replace function app.my_job_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select job_id from public.visits where company_id = app.company_id() and id in (select app.my_visit_ids())
$$;
--> statement-breakpoint
create or replace function app.my_customer_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select customer_id from public.site_holders
   where company_id = app.company_id() and app.is_technician() and site_id in (select app.my_site_ids())
     and starts_at <= now() and (ends_at is null or ends_at > now())
$$;
--> statement-breakpoint
create or replace function app.my_site_contact_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select c.id from public.contacts c
   where c.company_id = app.company_id() and app.is_technician() and c.ended_at is null
     and c.customer_id in (select app.my_customer_ids())
     and (c.all_sites or exists (select from public.contact_sites s
           where s.company_id = c.company_id and s.contact_id = c.id and s.site_id in (select app.my_site_ids())))
$$;
--> statement-breakpoint
create or replace function app.my_crew_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select member_id from public.visit_crew
   where company_id = app.company_id() and app.contact_id() is not null and released_at is null
     and visit_id in (select app.my_visit_ids())
$$;
--> statement-breakpoint
revoke execute on function app.set_claims from public;
grant execute on function app.set_claims to coastdown_gate;
grant create on schema app to coastdown_gate;
alter function app.enter_session(uuid) owner to coastdown_gate;
alter function app.enter_link(text) owner to coastdown_gate;
alter function app.enter_worker(uuid) owner to coastdown_gate;
alter function app.enter_operator(uuid) owner to coastdown_gate;
alter function app.memberships_of(uuid) owner to coastdown_gate;
alter function app.member_of_address(text) owner to coastdown_gate;
alter function app.claim_outbox(integer, interval) owner to coastdown_gate;
alter function app.outbox_state() owner to coastdown_gate;
alter function app.my_visit_ids() owner to coastdown_gate;
alter function app.my_site_ids() owner to coastdown_gate;
alter function app.my_job_ids() owner to coastdown_gate;
alter function app.my_customer_ids() owner to coastdown_gate;
alter function app.my_site_contact_ids() owner to coastdown_gate;
alter function app.my_crew_ids() owner to coastdown_gate;
revoke create on schema app from coastdown_gate;
