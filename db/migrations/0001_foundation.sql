CREATE SCHEMA "identity";
--> statement-breakpoint
CREATE SCHEMA "ops";
--> statement-breakpoint
CREATE TABLE "audit_entries" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"actor_kind" text NOT NULL,
	"member_id" uuid,
	"link_id" uuid,
	"command" text NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"before" jsonb,
	"after" jsonb,
	"request_id" text,
	CONSTRAINT "audit_entries_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "audit_entries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "companies" (
	"company_id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"phone" text NOT NULL,
	"street" text NOT NULL,
	"city" text NOT NULL,
	"state" text NOT NULL,
	"postal_code" text NOT NULL,
	"zone" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "companies" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "series" (
	"company_id" uuid NOT NULL,
	"name" text NOT NULL,
	"last" integer DEFAULT 0 NOT NULL,
	CONSTRAINT "series_company_id_name_pk" PRIMARY KEY("company_id","name")
);
--> statement-breakpoint
ALTER TABLE "series" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "contacts" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"customer_id" uuid NOT NULL,
	"name" text NOT NULL,
	"title" text,
	"email" text,
	"phone" text,
	"all_sites" boolean DEFAULT false NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "contacts_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "contacts" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "customer_notes" (
	"company_id" uuid NOT NULL,
	"customer_id" uuid NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "customer_notes_company_id_customer_id_pk" PRIMARY KEY("company_id","customer_id")
);
--> statement-breakpoint
ALTER TABLE "customer_notes" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "customers" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"phone" text,
	"billing_street" text,
	"billing_city" text,
	"billing_state" text,
	"billing_postal_code" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "customers_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "customers_name_unique" UNIQUE("company_id","name")
);
--> statement-breakpoint
ALTER TABLE "customers" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "identity"."access_requests" (
	"id" uuid PRIMARY KEY NOT NULL,
	"kind" text NOT NULL,
	"email" text NOT NULL,
	"url" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "identity"."accounts" (
	"user_id" uuid NOT NULL,
	"type" text NOT NULL,
	"provider" text NOT NULL,
	"provider_account_id" text NOT NULL,
	"refresh_token" text,
	"access_token" text,
	"expires_at" integer,
	"token_type" text,
	"scope" text,
	"id_token" text,
	"session_state" text,
	CONSTRAINT "accounts_provider_provider_account_id_pk" PRIMARY KEY("provider","provider_account_id")
);
--> statement-breakpoint
CREATE TABLE "identity"."passwords" (
	"user_id" uuid PRIMARY KEY NOT NULL,
	"hash" text NOT NULL,
	"changed_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "identity"."sessions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"company_id" uuid NOT NULL,
	"session_version" integer NOT NULL,
	"user_agent" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"ended_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "identity"."users" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text,
	"email" text NOT NULL,
	"email_verified" timestamp with time zone,
	"image" text,
	"session_version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "identity"."verification_tokens" (
	"identifier" text NOT NULL,
	"token" text NOT NULL,
	"expires" timestamp with time zone NOT NULL,
	CONSTRAINT "verification_tokens_identifier_token_pk" PRIMARY KEY("identifier","token")
);
--> statement-breakpoint
CREATE TABLE "jobs" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"number" integer NOT NULL,
	"site_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"title" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"created_by" uuid NOT NULL,
	"canceled_at" timestamp with time zone,
	"canceled_by" uuid,
	CONSTRAINT "jobs_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "jobs_number_unique" UNIQUE("company_id","number")
);
--> statement-breakpoint
ALTER TABLE "jobs" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "ops"."rate_limits" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "links" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"grant" text NOT NULL,
	"subject_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"withdrawn_at" timestamp with time zone,
	CONSTRAINT "links_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "links_token_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "links" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "message_secrets" (
	"company_id" uuid NOT NULL,
	"message_id" uuid NOT NULL,
	"url" text NOT NULL,
	CONSTRAINT "message_secrets_company_id_message_id_pk" PRIMARY KEY("company_id","message_id")
);
--> statement-breakpoint
ALTER TABLE "message_secrets" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "messages" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"template" text NOT NULL,
	"to_address" text NOT NULL,
	"props" jsonb NOT NULL,
	"message_id" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp with time zone,
	CONSTRAINT "messages_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "messages_message_id_unique" UNIQUE("message_id")
);
--> statement-breakpoint
ALTER TABLE "messages" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "outbox" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"event" text NOT NULL,
	"payload" jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"run_after" timestamp with time zone DEFAULT now() NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"leased_until" timestamp with time zone,
	"done_at" timestamp with time zone,
	"dead_at" timestamp with time zone,
	"last_error" text,
	CONSTRAINT "outbox_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "outbox" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "licenses" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"number" text NOT NULL,
	"jurisdiction" text NOT NULL,
	"expires_on" date NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "licenses_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "licenses_number_unique" UNIQUE("company_id","jurisdiction","number")
);
--> statement-breakpoint
ALTER TABLE "licenses" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "member_details" (
	"company_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"email" text NOT NULL,
	"phone" text,
	"home_street" text,
	"home_city" text,
	"home_state" text,
	"home_postal_code" text,
	"home_latitude" double precision,
	"home_longitude" double precision,
	CONSTRAINT "member_details_company_id_member_id_pk" PRIMARY KEY("company_id","member_id"),
	CONSTRAINT "member_details_email_unique" UNIQUE("company_id","email")
);
--> statement-breakpoint
ALTER TABLE "member_details" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "members" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"user_id" uuid,
	"role" text NOT NULL,
	"name" text NOT NULL,
	"contact_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	"ended_by" uuid,
	CONSTRAINT "members_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "members_user_unique" UNIQUE("company_id","user_id"),
	CONSTRAINT "members_contact_of_customer" CHECK (("members"."role" = 'customer') = ("members"."contact_id" is not null))
);
--> statement-breakpoint
ALTER TABLE "members" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "contact_sites" (
	"company_id" uuid NOT NULL,
	"contact_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	CONSTRAINT "contact_sites_company_id_contact_id_site_id_pk" PRIMARY KEY("company_id","contact_id","site_id")
);
--> statement-breakpoint
ALTER TABLE "contact_sites" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site_access" (
	"company_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "site_access_company_id_site_id_pk" PRIMARY KEY("company_id","site_id")
);
--> statement-breakpoint
ALTER TABLE "site_access" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site_holders" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"customer_id" uuid NOT NULL,
	"capacity" text NOT NULL,
	"from_date" date NOT NULL,
	"to_date" date,
	"starts_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "site_holders_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "site_holders_dates" CHECK ("site_holders"."to_date" is null or "site_holders"."to_date" >= "site_holders"."from_date")
);
--> statement-breakpoint
ALTER TABLE "site_holders" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "sites" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"street" text NOT NULL,
	"city" text NOT NULL,
	"state" text NOT NULL,
	"postal_code" text NOT NULL,
	"latitude" double precision,
	"longitude" double precision,
	"zone" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "sites_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "sites_address_unique" UNIQUE("company_id","street","city","state","name")
);
--> statement-breakpoint
ALTER TABLE "sites" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "visit_crew" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"lead" boolean DEFAULT false NOT NULL,
	"starts_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"released_at" timestamp with time zone,
	CONSTRAINT "visit_crew_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "visit_crew_ends_after_start" CHECK ("visit_crew"."ends_at" > "visit_crew"."starts_at")
);
--> statement-breakpoint
ALTER TABLE "visit_crew" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "visits" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"starts_local" text NOT NULL,
	"ends_local" text NOT NULL,
	"zone" text NOT NULL,
	"starts_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"canceled_at" timestamp with time zone,
	"canceled_by" uuid,
	CONSTRAINT "visits_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "visits_ends_after_start" CHECK ("visits"."ends_at" > "visits"."starts_at")
);
--> statement-breakpoint
ALTER TABLE "visits" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "audit_entries" ADD CONSTRAINT "audit_entries_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "contacts" ADD CONSTRAINT "contacts_company_id_customer_id_customers_company_id_id_fk" FOREIGN KEY ("company_id","customer_id") REFERENCES "public"."customers"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "customer_notes" ADD CONSTRAINT "customer_notes_company_id_customer_id_customers_company_id_id_fk" FOREIGN KEY ("company_id","customer_id") REFERENCES "public"."customers"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "customers" ADD CONSTRAINT "customers_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "identity"."accounts" ADD CONSTRAINT "accounts_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "identity"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "identity"."passwords" ADD CONSTRAINT "passwords_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "identity"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "identity"."sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "identity"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_company_id_created_by_members_company_id_id_fk" FOREIGN KEY ("company_id","created_by") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "links" ADD CONSTRAINT "links_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "message_secrets" ADD CONSTRAINT "message_secrets_company_id_message_id_messages_company_id_id_fk" FOREIGN KEY ("company_id","message_id") REFERENCES "public"."messages"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "outbox" ADD CONSTRAINT "outbox_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "licenses" ADD CONSTRAINT "licenses_company_id_member_id_members_company_id_id_fk" FOREIGN KEY ("company_id","member_id") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "member_details" ADD CONSTRAINT "member_details_company_id_member_id_members_company_id_id_fk" FOREIGN KEY ("company_id","member_id") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "members" ADD CONSTRAINT "members_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "members" ADD CONSTRAINT "members_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "identity"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "members" ADD CONSTRAINT "members_company_id_contact_id_contacts_company_id_id_fk" FOREIGN KEY ("company_id","contact_id") REFERENCES "public"."contacts"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "contact_sites" ADD CONSTRAINT "contact_sites_company_id_contact_id_contacts_company_id_id_fk" FOREIGN KEY ("company_id","contact_id") REFERENCES "public"."contacts"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "contact_sites" ADD CONSTRAINT "contact_sites_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_access" ADD CONSTRAINT "site_access_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_holders" ADD CONSTRAINT "site_holders_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_holders" ADD CONSTRAINT "site_holders_company_id_customer_id_customers_company_id_id_fk" FOREIGN KEY ("company_id","customer_id") REFERENCES "public"."customers"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sites" ADD CONSTRAINT "sites_company_id_companies_company_id_fk" FOREIGN KEY ("company_id") REFERENCES "public"."companies"("company_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_crew" ADD CONSTRAINT "visit_crew_company_id_visit_id_visits_company_id_id_fk" FOREIGN KEY ("company_id","visit_id") REFERENCES "public"."visits"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_crew" ADD CONSTRAINT "visit_crew_company_id_member_id_members_company_id_id_fk" FOREIGN KEY ("company_id","member_id") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_company_id_job_id_jobs_company_id_id_fk" FOREIGN KEY ("company_id","job_id") REFERENCES "public"."jobs"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_entries_entity" ON "audit_entries" USING btree ("company_id","entity_id");--> statement-breakpoint
CREATE INDEX "audit_entries_at" ON "audit_entries" USING btree ("company_id","at");--> statement-breakpoint
CREATE UNIQUE INDEX "users_email_unique" ON "identity"."users" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "outbox_due" ON "outbox" USING btree ("run_after") WHERE done_at is null and dead_at is null;--> statement-breakpoint
CREATE INDEX "visit_crew_visit" ON "visit_crew" USING btree ("company_id","visit_id");--> statement-breakpoint
CREATE INDEX "visits_starts_at" ON "visits" USING btree ("company_id","starts_at");--> statement-breakpoint
CREATE INDEX "visits_site" ON "visits" USING btree ("company_id","site_id","starts_at");--> statement-breakpoint
CREATE POLICY "read" ON "audit_entries" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_owner())));--> statement-breakpoint
CREATE POLICY "add" ON "audit_entries" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and (true));--> statement-breakpoint
CREATE POLICY "read" ON "companies" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and (true));--> statement-breakpoint
CREATE POLICY "add" ON "companies" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_operator())));--> statement-breakpoint
CREATE POLICY "change" ON "companies" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_owner()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner())));--> statement-breakpoint
CREATE POLICY "gate" ON "companies" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "series" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "add" ON "series" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "series" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "contacts" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or id = (select app.contact_id()) or id in (select app.my_site_contact_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "contacts" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "contacts" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "gate" ON "contacts" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "customer_notes" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "add" ON "customer_notes" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "customer_notes" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "remove" ON "customer_notes" AS PERMISSIVE FOR DELETE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "customers" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or id = (select app.customer_id()) or id in (select app.my_customer_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "customers" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "customers" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "jobs" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or id in (select app.my_job_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "jobs" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "jobs" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "links" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_worker()) or id = (select app.link_id())));--> statement-breakpoint
CREATE POLICY "add" ON "links" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_worker())));--> statement-breakpoint
CREATE POLICY "change" ON "links" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_worker()) or id = (select app.link_id()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_worker()) or id = (select app.link_id())));--> statement-breakpoint
CREATE POLICY "gate" ON "links" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "message_secrets" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_worker())));--> statement-breakpoint
CREATE POLICY "add" ON "message_secrets" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and (true));--> statement-breakpoint
CREATE POLICY "remove" ON "message_secrets" AS PERMISSIVE FOR DELETE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_worker())));--> statement-breakpoint
CREATE POLICY "read" ON "messages" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_worker())));--> statement-breakpoint
CREATE POLICY "add" ON "messages" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and (true));--> statement-breakpoint
CREATE POLICY "change" ON "messages" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_worker()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_worker())));--> statement-breakpoint
CREATE POLICY "read" ON "outbox" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_worker())));--> statement-breakpoint
CREATE POLICY "add" ON "outbox" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and (true));--> statement-breakpoint
CREATE POLICY "change" ON "outbox" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_worker()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_worker())));--> statement-breakpoint
CREATE POLICY "gate" ON "outbox" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "licenses" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or member_id = (select app.member_id())));--> statement-breakpoint
CREATE POLICY "add" ON "licenses" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner())));--> statement-breakpoint
CREATE POLICY "change" ON "licenses" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_owner()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner())));--> statement-breakpoint
CREATE POLICY "read" ON "member_details" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or member_id = (select app.member_id())));--> statement-breakpoint
CREATE POLICY "add" ON "member_details" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_operator())));--> statement-breakpoint
CREATE POLICY "change" ON "member_details" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_owner()) or member_id = (select app.member_id()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner()) or member_id = (select app.member_id())));--> statement-breakpoint
CREATE POLICY "gate" ON "member_details" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "members" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_staff()) or id = (select app.member_id()) or id in (select app.my_crew_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "members" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_operator())));--> statement-breakpoint
CREATE POLICY "change" ON "members" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_link()) and id = (select app.member_id()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_owner()) or (select app.is_link()) and id = (select app.member_id())));--> statement-breakpoint
CREATE POLICY "gate" ON "members" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "contact_sites" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or contact_id = (select app.contact_id())));--> statement-breakpoint
CREATE POLICY "add" ON "contact_sites" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "remove" ON "contact_sites" AS PERMISSIVE FOR DELETE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "gate" ON "contact_sites" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "site_access" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_technician()) and site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "site_access" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "site_access" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "remove" ON "site_access" AS PERMISSIVE FOR DELETE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "site_holders" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or customer_id = (select app.customer_id()) or (select app.is_technician()) and site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "site_holders" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "site_holders" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "gate" ON "site_holders" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "sites" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "sites" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "sites" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "visit_crew" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or visit_id in (select app.my_visit_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "visit_crew" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "visit_crew" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "gate" ON "visit_crew" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "visits" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or id in (select app.my_visit_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "visits" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "visits" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "gate" ON "visits" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);