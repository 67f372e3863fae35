ALTER TABLE "visits" ADD COLUMN "cancel_reason" text;--> statement-breakpoint
CREATE INDEX "visits_job" ON "visits" USING btree ("company_id","job_id");--> statement-breakpoint
ALTER POLICY "read" ON "visit_asks" TO coastdown_app USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_technician()) and visit_id in (select app.my_visit_ids()) or id = (select app.link_subject()) and (select app.is_link()) or contact_id = (select app.contact_id())));--> statement-breakpoint
ALTER POLICY "change" ON "visit_asks" TO coastdown_app USING (company_id = (select app.company_id()) and ((select app.is_office()) or id = (select app.link_subject()) and (select app.is_link()) or contact_id = (select app.contact_id()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office()) or id = (select app.link_subject()) and (select app.is_link()) or contact_id = (select app.contact_id())));--> statement-breakpoint
ALTER POLICY "read" ON "visit_overrides" TO coastdown_app USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_technician()) and visit_id in (select app.my_visit_ids())));--> statement-breakpoint
-- Whom somebody was asked as stays; only the answer is written afterwards.
revoke update on visit_asks from coastdown_app;
grant update (answer, answered_at, channel, permit_number, note, recorded_by) on visit_asks to coastdown_app;
--> statement-breakpoint
-- What the holder of a link that works no longer may know: whom to call, and why.
create function app.ended_visit_link(hash text)
returns table (company_name text, company_phone text, reason text)
language sql stable security definer set search_path = pg_catalog, public as $$
  select c.name, c.phone,
         case when v.canceled_at is not null then 'canceled'
              when a.sequence < v.sequence then 'moved'
              when l.withdrawn_at is not null then 'withdrawn'
              else 'expired' end
    from public.links l
    join public.companies c on c.company_id = l.company_id
    left join public.visit_asks a on a.company_id = l.company_id and a.id = l.subject_id
    left join public.visits v on v.company_id = a.company_id and v.id = a.visit_id
   where l.token_hash = hash and l."grant" = 'visit:answer'
$$;
grant create on schema app to coastdown_gate;
alter function app.ended_visit_link(text) owner to coastdown_gate;
revoke create on schema app from coastdown_gate;
