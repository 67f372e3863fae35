CREATE TABLE "completions" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"item_id" uuid NOT NULL,
	"target_on" date NOT NULL,
	"done_on" date NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "completions_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "completions_once" UNIQUE("company_id","item_id","target_on")
);
--> statement-breakpoint
ALTER TABLE "completions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "due_sweeps" (
	"company_id" uuid PRIMARY KEY NOT NULL,
	"last_at" timestamp with time zone NOT NULL,
	"next_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "due_sweeps" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "agreement_items" ADD COLUMN "tolerance_days" integer;--> statement-breakpoint
ALTER TABLE "agreements" ADD COLUMN "purchase_order_needed" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "agreements" ADD COLUMN "purchase_order" text;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "cancel_reason" text;--> statement-breakpoint
ALTER TABLE "completions" ADD CONSTRAINT "completions_company_id_item_id_agreement_items_company_id_id_fk" FOREIGN KEY ("company_id","item_id") REFERENCES "public"."agreement_items"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "due_sweeps" ADD CONSTRAINT "due_sweeps_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "jobs_open" ON "jobs" USING btree ("company_id","number") WHERE canceled_at is null and done_on is null;--> statement-breakpoint
ALTER TABLE "agreement_items" ADD CONSTRAINT "agreement_items_tolerance" CHECK (("agreement_items"."rule" = 'by_agreement') = ("agreement_items"."tolerance_days" is not null));--> statement-breakpoint
ALTER TABLE "agreement_items" ADD CONSTRAINT "agreement_items_tolerance_days" CHECK ("agreement_items"."tolerance_days" between 0 and 366);--> statement-breakpoint
CREATE POLICY "read" ON "completions" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "add" ON "completions" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "completions" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "due_sweeps" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_worker())));--> statement-breakpoint
CREATE POLICY "add" ON "due_sweeps" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_worker())));--> statement-breakpoint
CREATE POLICY "change" ON "due_sweeps" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_worker()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_worker())));--> statement-breakpoint
CREATE POLICY "gate" ON "due_sweeps" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
ALTER POLICY "read" ON "audit_entries" TO coastdown_app USING (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_office()) and entity in ('agreement', 'job', 'visit')));
--> statement-breakpoint
alter table completions force row level security;
alter table due_sweeps force row level security;
--> statement-breakpoint
grant select, insert, update on completions, due_sweeps to coastdown_app;
grant select on due_sweeps to coastdown_gate;
--> statement-breakpoint
-- Which companies the worker must sweep at a moment; their own zone decides when that is, so the worker writes it down.
create function app.companies_to_sweep(at timestamptz) returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select c.company_id from public.companies c left join public.due_sweeps s using (company_id)
   where s.next_at is null or s.next_at <= at order by s.next_at nulls first, c.company_id
$$;
grant create on schema app to coastdown_gate;
alter function app.companies_to_sweep(timestamptz) owner to coastdown_gate;
revoke create on schema app from coastdown_gate;
