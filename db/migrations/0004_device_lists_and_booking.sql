-- Filled in at the end, once the tables are there; the policies name them.
create function app.my_system_ids() returns setof uuid language sql stable as $$ select null::uuid where false $$;
create function app.my_site_ids_today() returns setof uuid language sql stable as $$ select null::uuid where false $$;
create function app.link_site_id() returns uuid language sql stable as $$ select null::uuid $$;
--> statement-breakpoint
CREATE TABLE "agreement_items" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"agreement_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"system_id" uuid,
	"test_kind" text NOT NULL,
	"functions" text[] NOT NULL,
	"frequency" text NOT NULL,
	"rule" text NOT NULL,
	"anchor" text NOT NULL,
	"anchor_on" date NOT NULL,
	"visit_minutes" integer NOT NULL,
	"crew_size" integer NOT NULL,
	"price_cents" integer NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "agreement_items_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "agreement_items_figures" CHECK ("agreement_items"."visit_minutes" > 0 and "agreement_items"."crew_size" between 1 and 20 and "agreement_items"."price_cents" >= 0)
);
--> statement-breakpoint
ALTER TABLE "agreement_items" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "agreements" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"number" integer NOT NULL,
	"customer_id" uuid NOT NULL,
	"name" text NOT NULL,
	"starts_on" date NOT NULL,
	"ends_on" date,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "agreements_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "agreements_number_unique" UNIQUE("company_id","number"),
	CONSTRAINT "agreements_dates" CHECK ("agreements"."ends_on" >= "agreements"."starts_on")
);
--> statement-breakpoint
ALTER TABLE "agreements" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "job_terms" (
	"company_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"purchase_order" text,
	"limit_cents" integer,
	"none_needed" boolean DEFAULT false NOT NULL,
	CONSTRAINT "job_terms_company_id_job_id_pk" PRIMARY KEY("company_id","job_id"),
	CONSTRAINT "job_terms_limit" CHECK ("job_terms"."limit_cents" > 0)
);
--> statement-breakpoint
ALTER TABLE "job_terms" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "job_waits" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"waits_for" text NOT NULL,
	"person" text NOT NULL,
	"until_date" date,
	"note" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	"ended_by" uuid,
	CONSTRAINT "job_waits_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "job_waits" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "proofs" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"point_id" uuid,
	"group_id" uuid,
	"equipment_id" uuid,
	"proven_on" date NOT NULL,
	"outcome" text NOT NULL,
	"method" text,
	"visit_id" uuid,
	"recorded_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "proofs_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "proofs_once" UNIQUE NULLS NOT DISTINCT("company_id","system_id","point_id","group_id","equipment_id","proven_on","visit_id"),
	CONSTRAINT "proofs_of_something" CHECK (num_nonnulls("proofs"."point_id", "proofs"."group_id", "proofs"."equipment_id") > 0)
);
--> statement-breakpoint
ALTER TABLE "proofs" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site_documents" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"title" text NOT NULL,
	"dated" date,
	"kept_where" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "site_documents_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "site_documents" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site_keys" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"label" text NOT NULL,
	"kept_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "site_keys_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "site_keys" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "site_secrets" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"label" text NOT NULL,
	"sealed" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "site_secrets_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "site_secrets" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "station_accounts" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"station" text NOT NULL,
	"phone" text NOT NULL,
	"account_number" text NOT NULL,
	"note" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "station_accounts_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "station_accounts" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "column_matches" (
	"company_id" uuid NOT NULL,
	"list" text NOT NULL,
	"heading" text NOT NULL,
	"column" text NOT NULL,
	CONSTRAINT "column_matches_company_id_list_heading_pk" PRIMARY KEY("company_id","list","heading")
);
--> statement-breakpoint
ALTER TABLE "column_matches" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "equipment" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"output_id" uuid NOT NULL,
	"tag" text NOT NULL,
	"kind" text NOT NULL,
	"action" text NOT NULL,
	"location" text,
	"serves" text,
	"restart" text DEFAULT 'unknown' NOT NULL,
	"longest_off_minutes" integer,
	"minutes_between_starts" integer,
	"removed_on" date,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "equipment_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "equipment_tag_unique" UNIQUE("company_id","system_id","tag"),
	CONSTRAINT "equipment_of_system" UNIQUE("company_id","system_id","id"),
	CONSTRAINT "equipment_minutes" CHECK ("equipment"."longest_off_minutes" > 0 and "equipment"."minutes_between_starts" >= 0)
);
--> statement-breakpoint
ALTER TABLE "equipment" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "matrix_cells" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"zone_id" uuid,
	"point_id" uuid,
	"group_id" uuid NOT NULL,
	"signal" text NOT NULL,
	"source" text NOT NULL,
	"delay_seconds" integer DEFAULT 0 NOT NULL,
	"added_in" integer NOT NULL,
	"removed_in" integer,
	CONSTRAINT "matrix_cells_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "matrix_cells_one_input" CHECK (num_nonnulls("matrix_cells"."zone_id", "matrix_cells"."point_id") = 1),
	CONSTRAINT "matrix_cells_versions" CHECK ("matrix_cells"."removed_in" > "matrix_cells"."added_in"),
	CONSTRAINT "matrix_cells_delay" CHECK ("matrix_cells"."delay_seconds" >= 0)
);
--> statement-breakpoint
ALTER TABLE "matrix_cells" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "matrix_versions" (
	"company_id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"note" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"created_by" uuid NOT NULL,
	CONSTRAINT "matrix_versions_company_id_system_id_number_pk" PRIMARY KEY("company_id","system_id","number")
);
--> statement-breakpoint
ALTER TABLE "matrix_versions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "output_groups" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"key" text NOT NULL,
	"name" text NOT NULL,
	"function" text NOT NULL,
	CONSTRAINT "output_groups_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "output_groups_key_unique" UNIQUE("company_id","system_id","key"),
	CONSTRAINT "output_groups_of_system" UNIQUE("company_id","system_id","id")
);
--> statement-breakpoint
ALTER TABLE "output_groups" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "outputs" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"group_id" uuid NOT NULL,
	"address" text NOT NULL,
	"kind" text NOT NULL,
	"label" text NOT NULL,
	"location" text,
	"removed_on" date,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "outputs_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "outputs_address_unique" UNIQUE("company_id","system_id","address"),
	CONSTRAINT "outputs_of_system" UNIQUE("company_id","system_id","id")
);
--> statement-breakpoint
ALTER TABLE "outputs" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "points" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"zone_id" uuid,
	"address" text NOT NULL,
	"kind" text NOT NULL,
	"label" text NOT NULL,
	"location" text,
	"signal" text DEFAULT 'alarm' NOT NULL,
	"walk_order" integer,
	"removed_on" date,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "points_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "points_address_unique" UNIQUE("company_id","system_id","address"),
	CONSTRAINT "points_of_system" UNIQUE("company_id","system_id","id")
);
--> statement-breakpoint
ALTER TABLE "points" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "systems" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"key" text NOT NULL,
	"name" text NOT NULL,
	"maker" text,
	"model" text,
	"location" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "systems_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "systems_key_unique" UNIQUE("company_id","site_id","key")
);
--> statement-breakpoint
ALTER TABLE "systems" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "zones" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"system_id" uuid NOT NULL,
	"key" text NOT NULL,
	"name" text NOT NULL,
	CONSTRAINT "zones_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "zones_key_unique" UNIQUE("company_id","system_id","key"),
	CONSTRAINT "zones_of_system" UNIQUE("company_id","system_id","id")
);
--> statement-breakpoint
ALTER TABLE "zones" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "live_blocks" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"functions" text[] NOT NULL,
	"starts_local" text NOT NULL,
	"ends_local" text NOT NULL,
	"starts_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"attendees" text[] DEFAULT '{}' NOT NULL,
	CONSTRAINT "live_blocks_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "live_blocks_ends_after_start" CHECK ("live_blocks"."ends_at" > "live_blocks"."starts_at"),
	CONSTRAINT "live_blocks_functions" CHECK (cardinality("live_blocks"."functions") > 0)
);
--> statement-breakpoint
ALTER TABLE "live_blocks" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "visit_asks" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"sequence" integer NOT NULL,
	"contact_id" uuid,
	"name" text NOT NULL,
	"email" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"answer" text,
	"answered_at" timestamp with time zone,
	"channel" text,
	"permit_number" text,
	"note" text,
	"recorded_by" uuid,
	CONSTRAINT "visit_asks_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "visit_asks_once" UNIQUE("company_id","visit_id","sequence","contact_id"),
	CONSTRAINT "visit_asks_answer" CHECK (num_nonnulls("visit_asks"."answer", "visit_asks"."answered_at", "visit_asks"."channel") in (0, 3))
);
--> statement-breakpoint
ALTER TABLE "visit_asks" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "visit_overrides" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"reason" text NOT NULL,
	"words" text NOT NULL,
	"note" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"created_by" uuid NOT NULL,
	CONSTRAINT "visit_overrides_company_id_id_pk" PRIMARY KEY("company_id","id")
);
--> statement-breakpoint
ALTER TABLE "visit_overrides" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "attendances" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"functions" text[] NOT NULL,
	"party" text NOT NULL,
	"contact_id" uuid,
	"phone" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "attendances_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "attendances_functions" CHECK (cardinality("attendances"."functions") > 0)
);
--> statement-breakpoint
ALTER TABLE "attendances" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "no_test_dates" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"functions" text[] NOT NULL,
	"from_date" date NOT NULL,
	"to_date" date NOT NULL,
	"reason" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "no_test_dates_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "no_test_dates_functions" CHECK (cardinality("no_test_dates"."functions") > 0),
	CONSTRAINT "no_test_dates_order" CHECK ("no_test_dates"."to_date" >= "no_test_dates"."from_date")
);
--> statement-breakpoint
ALTER TABLE "no_test_dates" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "test_windows" (
	"company_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"functions" text[] NOT NULL,
	"weekdays" integer[] NOT NULL,
	"on_date" date,
	"starts_local" text NOT NULL,
	"ends_local" text NOT NULL,
	"from_date" date,
	"to_date" date,
	"notice_hours" integer DEFAULT 0 NOT NULL,
	"note" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "test_windows_company_id_id_pk" PRIMARY KEY("company_id","id"),
	CONSTRAINT "test_windows_functions" CHECK (cardinality("test_windows"."functions") > 0),
	CONSTRAINT "test_windows_days" CHECK ((cardinality("test_windows"."weekdays") > 0) = ("test_windows"."on_date" is null)),
	CONSTRAINT "test_windows_weekdays" CHECK ("test_windows"."weekdays" <@ array[1,2,3,4,5,6,7]),
	CONSTRAINT "test_windows_clock" CHECK ("test_windows"."starts_local" ~ '^\d\d:\d\d$' and "test_windows"."ends_local" ~ '^\d\d:\d\d$'),
	CONSTRAINT "test_windows_notice" CHECK ("test_windows"."notice_hours" >= 0),
	CONSTRAINT "test_windows_dates" CHECK ("test_windows"."to_date" >= "test_windows"."from_date")
);
--> statement-breakpoint
ALTER TABLE "test_windows" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "jobs" ALTER COLUMN "created_by" DROP NOT NULL;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "system_id" uuid;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "details" text;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "urgent" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "caller_name" text;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "caller_phone" text;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "functions" text[] DEFAULT '{}' NOT NULL;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "visit_minutes" integer DEFAULT 120 NOT NULL;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "crew_size" integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "agreement_item_id" uuid;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "earliest_on" date;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "target_on" date;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "latest_on" date;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "done_on" date;--> statement-breakpoint
ALTER TABLE "sites" ADD COLUMN "key" text;--> statement-breakpoint
ALTER TABLE "sites" ADD COLUMN "authority_name" text;--> statement-breakpoint
ALTER TABLE "sites" ADD COLUMN "authority_phone" text;--> statement-breakpoint
ALTER TABLE "visits" ADD COLUMN "sequence" integer DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE "agreement_items" ADD CONSTRAINT "agreement_items_company_id_agreement_id_agreements_company_id_id_fk" FOREIGN KEY ("company_id","agreement_id") REFERENCES "public"."agreements"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "agreement_items" ADD CONSTRAINT "agreement_items_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "agreement_items" ADD CONSTRAINT "agreement_items_company_id_system_id_systems_company_id_id_fk" FOREIGN KEY ("company_id","system_id") REFERENCES "public"."systems"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "agreements" ADD CONSTRAINT "agreements_company_id_customer_id_customers_company_id_id_fk" FOREIGN KEY ("company_id","customer_id") REFERENCES "public"."customers"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job_terms" ADD CONSTRAINT "job_terms_company_id_job_id_jobs_company_id_id_fk" FOREIGN KEY ("company_id","job_id") REFERENCES "public"."jobs"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job_waits" ADD CONSTRAINT "job_waits_company_id_job_id_jobs_company_id_id_fk" FOREIGN KEY ("company_id","job_id") REFERENCES "public"."jobs"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job_waits" ADD CONSTRAINT "job_waits_company_id_ended_by_members_company_id_id_fk" FOREIGN KEY ("company_id","ended_by") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proofs" ADD CONSTRAINT "proofs_company_id_system_id_point_id_points_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","point_id") REFERENCES "public"."points"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proofs" ADD CONSTRAINT "proofs_company_id_system_id_group_id_output_groups_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","group_id") REFERENCES "public"."output_groups"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proofs" ADD CONSTRAINT "proofs_company_id_system_id_equipment_id_equipment_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","equipment_id") REFERENCES "public"."equipment"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proofs" ADD CONSTRAINT "proofs_company_id_visit_id_visits_company_id_id_fk" FOREIGN KEY ("company_id","visit_id") REFERENCES "public"."visits"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_documents" ADD CONSTRAINT "site_documents_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_keys" ADD CONSTRAINT "site_keys_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_secrets" ADD CONSTRAINT "site_secrets_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "station_accounts" ADD CONSTRAINT "station_accounts_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "equipment" ADD CONSTRAINT "equipment_company_id_system_id_output_id_outputs_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","output_id") REFERENCES "public"."outputs"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matrix_cells" ADD CONSTRAINT "matrix_cells_company_id_system_id_added_in_matrix_versions_company_id_system_id_number_fk" FOREIGN KEY ("company_id","system_id","added_in") REFERENCES "public"."matrix_versions"("company_id","system_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matrix_cells" ADD CONSTRAINT "matrix_cells_company_id_system_id_removed_in_matrix_versions_company_id_system_id_number_fk" FOREIGN KEY ("company_id","system_id","removed_in") REFERENCES "public"."matrix_versions"("company_id","system_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matrix_cells" ADD CONSTRAINT "matrix_cells_company_id_system_id_zone_id_zones_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","zone_id") REFERENCES "public"."zones"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matrix_cells" ADD CONSTRAINT "matrix_cells_company_id_system_id_point_id_points_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","point_id") REFERENCES "public"."points"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matrix_cells" ADD CONSTRAINT "matrix_cells_company_id_system_id_group_id_output_groups_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","group_id") REFERENCES "public"."output_groups"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matrix_versions" ADD CONSTRAINT "matrix_versions_company_id_system_id_systems_company_id_id_fk" FOREIGN KEY ("company_id","system_id") REFERENCES "public"."systems"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matrix_versions" ADD CONSTRAINT "matrix_versions_company_id_created_by_members_company_id_id_fk" FOREIGN KEY ("company_id","created_by") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "output_groups" ADD CONSTRAINT "output_groups_company_id_system_id_systems_company_id_id_fk" FOREIGN KEY ("company_id","system_id") REFERENCES "public"."systems"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "outputs" ADD CONSTRAINT "outputs_company_id_system_id_group_id_output_groups_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","group_id") REFERENCES "public"."output_groups"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "points" ADD CONSTRAINT "points_company_id_system_id_systems_company_id_id_fk" FOREIGN KEY ("company_id","system_id") REFERENCES "public"."systems"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "points" ADD CONSTRAINT "points_company_id_system_id_zone_id_zones_company_id_system_id_id_fk" FOREIGN KEY ("company_id","system_id","zone_id") REFERENCES "public"."zones"("company_id","system_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "systems" ADD CONSTRAINT "systems_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "zones" ADD CONSTRAINT "zones_company_id_system_id_systems_company_id_id_fk" FOREIGN KEY ("company_id","system_id") REFERENCES "public"."systems"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "live_blocks" ADD CONSTRAINT "live_blocks_company_id_visit_id_visits_company_id_id_fk" FOREIGN KEY ("company_id","visit_id") REFERENCES "public"."visits"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_asks" ADD CONSTRAINT "visit_asks_company_id_visit_id_visits_company_id_id_fk" FOREIGN KEY ("company_id","visit_id") REFERENCES "public"."visits"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_asks" ADD CONSTRAINT "visit_asks_company_id_contact_id_contacts_company_id_id_fk" FOREIGN KEY ("company_id","contact_id") REFERENCES "public"."contacts"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_asks" ADD CONSTRAINT "visit_asks_company_id_recorded_by_members_company_id_id_fk" FOREIGN KEY ("company_id","recorded_by") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_overrides" ADD CONSTRAINT "visit_overrides_company_id_visit_id_visits_company_id_id_fk" FOREIGN KEY ("company_id","visit_id") REFERENCES "public"."visits"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_overrides" ADD CONSTRAINT "visit_overrides_company_id_created_by_members_company_id_id_fk" FOREIGN KEY ("company_id","created_by") REFERENCES "public"."members"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "attendances" ADD CONSTRAINT "attendances_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "attendances" ADD CONSTRAINT "attendances_company_id_contact_id_contacts_company_id_id_fk" FOREIGN KEY ("company_id","contact_id") REFERENCES "public"."contacts"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "no_test_dates" ADD CONSTRAINT "no_test_dates_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "test_windows" ADD CONSTRAINT "test_windows_company_id_site_id_sites_company_id_id_fk" FOREIGN KEY ("company_id","site_id") REFERENCES "public"."sites"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "agreement_items_site" ON "agreement_items" USING btree ("company_id","site_id");--> statement-breakpoint
CREATE UNIQUE INDEX "job_waits_once" ON "job_waits" USING btree ("company_id","job_id","waits_for") WHERE ended_at is null;--> statement-breakpoint
CREATE INDEX "matrix_cells_system" ON "matrix_cells" USING btree ("company_id","system_id");--> statement-breakpoint
CREATE INDEX "live_blocks_visit" ON "live_blocks" USING btree ("company_id","visit_id");--> statement-breakpoint
CREATE INDEX "visit_asks_visit" ON "visit_asks" USING btree ("company_id","visit_id");--> statement-breakpoint
CREATE INDEX "attendances_site" ON "attendances" USING btree ("company_id","site_id");--> statement-breakpoint
CREATE INDEX "no_test_dates_site" ON "no_test_dates" USING btree ("company_id","site_id");--> statement-breakpoint
CREATE INDEX "test_windows_site" ON "test_windows" USING btree ("company_id","site_id");--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_company_id_system_id_systems_company_id_id_fk" FOREIGN KEY ("company_id","system_id") REFERENCES "public"."systems"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_company_id_agreement_item_id_agreement_items_company_id_id_fk" FOREIGN KEY ("company_id","agreement_item_id") REFERENCES "public"."agreement_items"("company_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "jobs_occurrence_once" ON "jobs" USING btree ("company_id","agreement_item_id","target_on") WHERE agreement_item_id is not null and canceled_at is null;--> statement-breakpoint
CREATE INDEX "jobs_site" ON "jobs" USING btree ("company_id","site_id");--> statement-breakpoint
ALTER TABLE "sites" ADD CONSTRAINT "sites_key_unique" UNIQUE("company_id","key");--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_occurrence" CHECK (("jobs"."agreement_item_id" is null) = ("jobs"."target_on" is null));--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_due_order" CHECK ("jobs"."earliest_on" <= "jobs"."target_on" and "jobs"."target_on" <= "jobs"."latest_on");--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_figures" CHECK ("jobs"."visit_minutes" > 0 and "jobs"."crew_size" between 1 and 20);--> statement-breakpoint
CREATE POLICY "read" ON "agreement_items" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "add" ON "agreement_items" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "agreement_items" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "agreements" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "add" ON "agreements" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "agreements" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "job_terms" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "add" ON "job_terms" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "job_terms" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "job_waits" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or job_id in (select app.my_job_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "job_waits" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "job_waits" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "proofs" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "proofs" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "site_documents" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "site_documents" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "site_documents" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "site_keys" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_technician()) and site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "site_keys" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "site_keys" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "site_secrets" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.role()) in ('owner', 'dispatcher') or site_id in (select app.my_site_ids_today())));--> statement-breakpoint
CREATE POLICY "add" ON "site_secrets" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.role()) in ('owner', 'dispatcher')));--> statement-breakpoint
CREATE POLICY "change" ON "site_secrets" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.role()) in ('owner', 'dispatcher'))) WITH CHECK (company_id = (select app.company_id()) and ((select app.role()) in ('owner', 'dispatcher')));--> statement-breakpoint
CREATE POLICY "read" ON "station_accounts" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or (select app.is_technician()) and site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "station_accounts" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "station_accounts" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "column_matches" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "add" ON "column_matches" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "column_matches" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "equipment" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "equipment" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "equipment" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "matrix_cells" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "matrix_cells" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "matrix_cells" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "matrix_versions" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "matrix_versions" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "output_groups" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "output_groups" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "output_groups" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "outputs" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "outputs" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "outputs" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "points" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "points" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "points" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "systems" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "systems" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "systems" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "gate" ON "systems" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "zones" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or system_id in (select app.my_system_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "zones" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "zones" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "live_blocks" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or visit_id in (select app.my_visit_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "live_blocks" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "live_blocks" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "remove" ON "live_blocks" AS PERMISSIVE FOR DELETE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "visit_asks" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or visit_id in (select app.my_visit_ids()) or id = (select app.link_subject()) and (select app.is_link())));--> statement-breakpoint
CREATE POLICY "add" ON "visit_asks" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "visit_asks" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or id = (select app.link_subject()) and (select app.is_link()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office()) or id = (select app.link_subject()) and (select app.is_link())));--> statement-breakpoint
CREATE POLICY "gate" ON "visit_asks" AS PERMISSIVE FOR ALL TO "coastdown_gate" USING (true) WITH CHECK (true);--> statement-breakpoint
CREATE POLICY "read" ON "visit_overrides" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or visit_id in (select app.my_visit_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "visit_overrides" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "attendances" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "attendances" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "attendances" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "no_test_dates" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "no_test_dates" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "no_test_dates" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "read" ON "test_windows" AS PERMISSIVE FOR SELECT TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()) or site_id in (select app.my_site_ids())));--> statement-breakpoint
CREATE POLICY "add" ON "test_windows" AS PERMISSIVE FOR INSERT TO "coastdown_app" WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
CREATE POLICY "change" ON "test_windows" AS PERMISSIVE FOR UPDATE TO "coastdown_app" USING (company_id = (select app.company_id()) and ((select app.is_office()))) WITH CHECK (company_id = (select app.company_id()) and ((select app.is_office())));--> statement-breakpoint
ALTER POLICY "read" ON "sites" TO coastdown_app USING (company_id = (select app.company_id()) and ((select app.is_office()) or id in (select app.my_site_ids()) or id = (select app.link_site_id())));
--> statement-breakpoint
alter table systems force row level security;
alter table zones force row level security;
alter table points force row level security;
alter table output_groups force row level security;
alter table outputs force row level security;
alter table equipment force row level security;
alter table matrix_versions force row level security;
alter table matrix_cells force row level security;
alter table proofs force row level security;
alter table column_matches force row level security;
alter table test_windows force row level security;
alter table no_test_dates force row level security;
alter table attendances force row level security;
alter table agreements force row level security;
alter table agreement_items force row level security;
alter table job_terms force row level security;
alter table job_waits force row level security;
alter table station_accounts force row level security;
alter table site_keys force row level security;
alter table site_documents force row level security;
alter table site_secrets force row level security;
alter table live_blocks force row level security;
alter table visit_overrides force row level security;
alter table visit_asks force row level security;
--> statement-breakpoint
grant select, insert, update, delete on systems, zones, points, output_groups, outputs, equipment, matrix_versions, matrix_cells, proofs, column_matches, test_windows, no_test_dates, attendances, agreements, agreement_items, job_terms, job_waits, station_accounts, site_keys, site_documents, site_secrets, live_blocks, visit_overrides, visit_asks to coastdown_app;
revoke delete on systems, zones, points, output_groups, outputs, equipment, matrix_versions, matrix_cells, proofs, column_matches, test_windows, no_test_dates, attendances, agreements, agreement_items, job_terms, job_waits, station_accounts, site_keys, site_documents, site_secrets, visit_overrides, visit_asks from coastdown_app;
-- What was said stays said: a version and a proof never change, a cell only ends.
revoke update on matrix_versions, proofs, visit_overrides, matrix_cells from coastdown_app;
grant update (removed_in) on matrix_cells to coastdown_app;
grant select on systems, visit_asks to coastdown_gate;
create unique index matrix_cells_once on matrix_cells (company_id, system_id, zone_id, point_id, group_id, signal)
  nulls not distinct where (removed_in is null);
--> statement-breakpoint
-- A link that asks about a visit shows that visit, its site, its job and who comes; nothing else.
create or replace function app.my_visit_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select visit_id from public.visit_crew
   where company_id = app.company_id() and member_id = app.member_id() and app.is_technician()
  union
  select v.id from public.visits v
   where v.company_id = app.company_id() and app.contact_id() is not null and v.site_id in (select app.my_site_ids())
  union
  select a.visit_id from public.visit_asks a
   where a.company_id = app.company_id() and app.is_link() and a.id = app.link_subject()
$$;
create or replace function app.link_site_id() returns uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select v.site_id from public.visit_asks a join public.visits v on v.company_id = a.company_id and v.id = a.visit_id
   where a.company_id = app.company_id() and app.is_link() and a.id = app.link_subject()
$$;
create or replace function app.my_crew_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select member_id from public.visit_crew
   where company_id = app.company_id() and (app.contact_id() is not null or app.is_link()) and released_at is null
     and visit_id in (select app.my_visit_ids())
$$;
create or replace function app.my_system_ids() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select id from public.systems where company_id = app.company_id() and site_id in (select app.my_site_ids())
$$;
-- From twelve hours before a visit to twelve hours after: who gets up at four looks the code up at ten the evening before.
create or replace function app.my_site_ids_today() returns setof uuid
language sql stable security definer set search_path = pg_catalog, public as $$
  select v.site_id from public.visit_crew w
    join public.visits v on v.company_id = w.company_id and v.id = w.visit_id
   where w.company_id = app.company_id() and w.member_id = app.member_id() and app.is_technician()
     and w.released_at is null
     and now() between v.starts_at - interval '12 hours' and v.ends_at + interval '12 hours'
$$;
grant create on schema app to coastdown_gate;
alter function app.link_site_id() owner to coastdown_gate;
alter function app.my_system_ids() owner to coastdown_gate;
alter function app.my_site_ids_today() owner to coastdown_gate;
revoke create on schema app from coastdown_gate;
