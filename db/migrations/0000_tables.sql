CREATE TABLE "assessments" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"flaw_id" uuid NOT NULL,
	"finding_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"state" text NOT NULL,
	"inspected_on" date NOT NULL,
	"input" jsonb NOT NULL,
	"outcome" jsonb NOT NULL,
	"engine_version" text NOT NULL,
	"rule_version_id" uuid NOT NULL,
	"proposal" jsonb,
	"chosen_due_on" date,
	"chosen_reason" text DEFAULT '' NOT NULL,
	"conclusion" text DEFAULT '' NOT NULL,
	"content_hash" text NOT NULL,
	"author_id" uuid NOT NULL,
	"editor_ids" jsonb NOT NULL,
	"submitted_at" timestamp with time zone,
	"reviewer_id" uuid,
	"return_reason" text DEFAULT '' NOT NULL,
	"approved_at" timestamp with time zone,
	"supersedes_id" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "assessments_revision" UNIQUE("flaw_id","revision"),
	CONSTRAINT "assessments_state_word" CHECK ("assessments"."state" in ('draft', 'submitted', 'returned', 'approved', 'superseded'))
);
--> statement-breakpoint
CREATE TABLE "signatures" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"content_hash" text NOT NULL,
	"person_id" uuid NOT NULL,
	"person_name" text NOT NULL,
	"role" text NOT NULL,
	"competence" text DEFAULT '' NOT NULL,
	"meaning" text NOT NULL,
	"comment" text DEFAULT '' NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "signatures_meaning" CHECK ("signatures"."meaning" in ('authored', 'returned', 'reviewed and approved', 'acknowledged'))
);
--> statement-breakpoint
CREATE TABLE "components" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"tag" text NOT NULL,
	"description" text NOT NULL,
	"kind" text NOT NULL,
	"inside_diameter_mm" double precision NOT NULL,
	"wall_mm" double precision NOT NULL,
	"required_wall_mm" double precision,
	"design_pressure_mpa" double precision NOT NULL,
	"design_temperature_c" double precision NOT NULL,
	"operating_pressure_mpa" double precision NOT NULL,
	"operating_temperature_c" double precision NOT NULL,
	"minimum_metal_temperature_c" double precision,
	"material_id" uuid NOT NULL,
	"heat_treatment" text NOT NULL,
	"mechanism" text NOT NULL,
	"fluid" text DEFAULT '' NOT NULL,
	"commissioned_on" date,
	"drawing_no" text DEFAULT '' NOT NULL,
	"state" text DEFAULT 'in service' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "components_tag" UNIQUE("site_id","tag"),
	CONSTRAINT "components_kind" CHECK ("components"."kind" in ('vessel shell', 'head', 'sphere', 'pipe', 'exchanger shell')),
	CONSTRAINT "components_state" CHECK ("components"."state" in ('in service', 'out of service', 'retired')),
	CONSTRAINT "components_heat_treatment" CHECK ("components"."heat_treatment" in ('as-welded', 'post-weld heat treated', 'unknown')),
	CONSTRAINT "components_mechanism" CHECK ("components"."mechanism" in ('fatigue', 'corrosion fatigue', 'thermal fatigue', 'stress corrosion cracking', 'fabrication, not growing', 'hydrogen attack', 'creep', 'unknown')),
	CONSTRAINT "components_diameter" CHECK ("components"."inside_diameter_mm" >= 5 and "components"."inside_diameter_mm" <= 100000),
	CONSTRAINT "components_wall" CHECK ("components"."wall_mm" >= 0.5 and "components"."wall_mm" <= 500),
	CONSTRAINT "components_required_wall" CHECK ("components"."required_wall_mm" >= 0 and "components"."required_wall_mm" <= 500),
	CONSTRAINT "components_design_pressure" CHECK ("components"."design_pressure_mpa" >= -0.2 and "components"."design_pressure_mpa" <= 200),
	CONSTRAINT "components_design_temperature" CHECK ("components"."design_temperature_c" >= -273 and "components"."design_temperature_c" <= 1000),
	CONSTRAINT "components_operating_pressure" CHECK ("components"."operating_pressure_mpa" >= -0.2 and "components"."operating_pressure_mpa" <= 200),
	CONSTRAINT "components_operating_temperature" CHECK ("components"."operating_temperature_c" >= -273 and "components"."operating_temperature_c" <= 1000),
	CONSTRAINT "components_minimum_temperature" CHECK ("components"."minimum_metal_temperature_c" >= -273 and "components"."minimum_metal_temperature_c" <= 1000)
);
--> statement-breakpoint
CREATE TABLE "load_cases" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"component_id" uuid NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"pressure_mpa" double precision NOT NULL,
	"temperature_c" double precision NOT NULL,
	"hoop_membrane_mpa" double precision NOT NULL,
	"hoop_bending_mpa" double precision NOT NULL,
	"axial_membrane_mpa" double precision NOT NULL,
	"axial_bending_mpa" double precision NOT NULL,
	"origins" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "load_cases_name" UNIQUE("component_id","name"),
	CONSTRAINT "load_cases_kind" CHECK ("load_cases"."kind" in ('design', 'operating', 'start-up', 'hydrotest', 'upset')),
	CONSTRAINT "load_cases_pressure" CHECK ("load_cases"."pressure_mpa" >= -0.2 and "load_cases"."pressure_mpa" <= 200),
	CONSTRAINT "load_cases_temperature" CHECK ("load_cases"."temperature_c" >= -273 and "load_cases"."temperature_c" <= 1000),
	CONSTRAINT "load_cases_hoop_membrane" CHECK ("load_cases"."hoop_membrane_mpa" >= -2000 and "load_cases"."hoop_membrane_mpa" <= 2000),
	CONSTRAINT "load_cases_hoop_bending" CHECK ("load_cases"."hoop_bending_mpa" >= -2000 and "load_cases"."hoop_bending_mpa" <= 2000),
	CONSTRAINT "load_cases_axial_membrane" CHECK ("load_cases"."axial_membrane_mpa" >= -2000 and "load_cases"."axial_membrane_mpa" <= 2000),
	CONSTRAINT "load_cases_axial_bending" CHECK ("load_cases"."axial_bending_mpa" >= -2000 and "load_cases"."axial_bending_mpa" <= 2000)
);
--> statement-breakpoint
CREATE TABLE "locations" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"component_id" uuid NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"description" text DEFAULT '' NOT NULL,
	"datum" text NOT NULL,
	"clock_zero" text DEFAULT '' NOT NULL,
	"viewing_direction" text DEFAULT '' NOT NULL,
	"circumference_on" text DEFAULT 'outside' NOT NULL,
	"length_mm" double precision,
	"heat_treatment" text,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "locations_name" UNIQUE("component_id","name"),
	CONSTRAINT "locations_kind" CHECK ("locations"."kind" in ('longitudinal weld', 'circumferential weld', 'nozzle weld', 'attachment weld', 'plain zone')),
	CONSTRAINT "locations_circumference_on" CHECK ("locations"."circumference_on" in ('inside', 'outside')),
	CONSTRAINT "locations_length" CHECK ("locations"."length_mm" >= 0 and "locations"."length_mm" <= 1000000)
);
--> statement-breakpoint
CREATE TABLE "operating_cycles" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"component_id" uuid NOT NULL,
	"load_case_id" uuid NOT NULL,
	"name" text NOT NULL,
	"range_fraction" double precision NOT NULL,
	"count_per_year" double precision NOT NULL,
	"source" text DEFAULT '' NOT NULL,
	"period_from" date,
	"period_to" date,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "operating_cycles_name" UNIQUE("component_id","name"),
	CONSTRAINT "operating_cycles_range" CHECK ("operating_cycles"."range_fraction" >= 0 and "operating_cycles"."range_fraction" <= 3),
	CONSTRAINT "operating_cycles_count" CHECK ("operating_cycles"."count_per_year" >= 0 and "operating_cycles"."count_per_year" <= 100000000)
);
--> statement-breakpoint
CREATE TABLE "findings" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"inspection_id" uuid NOT NULL,
	"import_id" uuid,
	"row_no" integer,
	"indication_no" text NOT NULL,
	"location_id" uuid NOT NULL,
	"flaw_id" uuid NOT NULL,
	"inspected_on" date NOT NULL,
	"indication_type" text NOT NULL,
	"kind" text NOT NULL,
	"face" text NOT NULL,
	"orientation" text NOT NULL,
	"height_mm" double precision NOT NULL,
	"height_qualifier" text DEFAULT '=' NOT NULL,
	"length_mm" double precision NOT NULL,
	"length_qualifier" text DEFAULT '=' NOT NULL,
	"ligament_mm" double precision,
	"depth_to_top_mm" double precision,
	"axial_mm" double precision,
	"circumferential_mm" double precision,
	"wall_mm" double precision,
	"amplitude_db" double precision,
	"height_error_mm" double precision NOT NULL,
	"length_error_mm" double precision NOT NULL,
	"remarks" text DEFAULT '' NOT NULL,
	"original" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "findings_indication" UNIQUE("inspection_id","location_id","indication_no"),
	CONSTRAINT "findings_type" CHECK ("findings"."indication_type" in ('crack', 'lack of fusion', 'lack of penetration', 'slag', 'porosity', 'lamination', 'point', 'geometry', 'unknown')),
	CONSTRAINT "findings_kind" CHECK ("findings"."kind" in ('surface', 'embedded')),
	CONSTRAINT "findings_face" CHECK ("findings"."face" in ('inside', 'outside')),
	CONSTRAINT "findings_orientation" CHECK ("findings"."orientation" in ('axial', 'circumferential')),
	CONSTRAINT "findings_height_qualifier" CHECK ("findings"."height_qualifier" in ('=', '<', '>', '~')),
	CONSTRAINT "findings_length_qualifier" CHECK ("findings"."length_qualifier" in ('=', '<', '>', '~')),
	CONSTRAINT "findings_height" CHECK ("findings"."height_mm" >= 0.01 and "findings"."height_mm" <= 500),
	CONSTRAINT "findings_length" CHECK ("findings"."length_mm" >= 0.01 and "findings"."length_mm" <= 200000),
	CONSTRAINT "findings_ligament" CHECK ("findings"."ligament_mm" >= 0 and "findings"."ligament_mm" <= 500),
	CONSTRAINT "findings_depth" CHECK ("findings"."depth_to_top_mm" >= 0 and "findings"."depth_to_top_mm" <= 500),
	CONSTRAINT "findings_axial" CHECK ("findings"."axial_mm" >= -100000 and "findings"."axial_mm" <= 1000000),
	CONSTRAINT "findings_circumferential" CHECK ("findings"."circumferential_mm" >= -1000000 and "findings"."circumferential_mm" <= 1000000),
	CONSTRAINT "findings_wall" CHECK ("findings"."wall_mm" >= 0.5 and "findings"."wall_mm" <= 500),
	CONSTRAINT "findings_amplitude" CHECK ("findings"."amplitude_db" >= -60 and "findings"."amplitude_db" <= 60),
	CONSTRAINT "findings_height_error" CHECK ("findings"."height_error_mm" >= 0.05 and "findings"."height_error_mm" <= 20),
	CONSTRAINT "findings_length_error" CHECK ("findings"."length_error_mm" >= 0.1 and "findings"."length_error_mm" <= 100)
);
--> statement-breakpoint
CREATE TABLE "flaws" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"component_id" uuid NOT NULL,
	"location_id" uuid NOT NULL,
	"number" text NOT NULL,
	"kind" text NOT NULL,
	"face" text NOT NULL,
	"orientation" text NOT NULL,
	"origin" text DEFAULT 'unknown' NOT NULL,
	"mechanism" text NOT NULL,
	"state" text DEFAULT 'new' NOT NULL,
	"axial_mm" double precision,
	"circumferential_mm" double precision,
	"note" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "flaws_number" UNIQUE("site_id","number"),
	CONSTRAINT "flaws_kind" CHECK ("flaws"."kind" in ('surface', 'embedded')),
	CONSTRAINT "flaws_face" CHECK ("flaws"."face" in ('inside', 'outside')),
	CONSTRAINT "flaws_orientation" CHECK ("flaws"."orientation" in ('axial', 'circumferential')),
	CONSTRAINT "flaws_mechanism" CHECK ("flaws"."mechanism" in ('fatigue', 'corrosion fatigue', 'thermal fatigue', 'stress corrosion cracking', 'fabrication, not growing', 'hydrogen attack', 'creep', 'unknown')),
	CONSTRAINT "flaws_state" CHECK ("flaws"."state" in ('new', 'under assessment', 'accepted with conditions', 'not acceptable', 'referred', 'removed', 'closed')),
	CONSTRAINT "flaws_axial" CHECK ("flaws"."axial_mm" >= -100000 and "flaws"."axial_mm" <= 1000000),
	CONSTRAINT "flaws_circumferential" CHECK ("flaws"."circumferential_mm" >= -1000000 and "flaws"."circumferential_mm" <= 1000000)
);
--> statement-breakpoint
CREATE TABLE "history" (
	"seq" bigserial PRIMARY KEY NOT NULL,
	"site_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"event_on" date,
	"actor_id" uuid,
	"actor_name" text NOT NULL,
	"actor_role" text NOT NULL,
	"action" text NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"component_id" uuid,
	"flaw_id" uuid,
	"summary" text NOT NULL,
	"before" jsonb,
	"after" jsonb,
	"reason" text DEFAULT '' NOT NULL,
	"request_id" text DEFAULT '' NOT NULL,
	"previous_hash" text NOT NULL,
	"hash" text NOT NULL,
	CONSTRAINT "history_entity_word" CHECK ("history"."entity" in ('site', 'site rules', 'unit', 'material', 'growth law', 'component', 'location', 'load case', 'operating cycle', 'inspection', 'document', 'import', 'finding', 'flaw', 'assessment', 're-inspection', 'shutdown window', 'reminder', 'person', 'session'))
);
--> statement-breakpoint
CREATE TABLE "documents" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"sha256" text NOT NULL,
	"file_name" text NOT NULL,
	"media_type" text NOT NULL,
	"byte_length" integer NOT NULL,
	"bytes" "bytea" NOT NULL,
	"uploaded_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "imports" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"inspection_id" uuid NOT NULL,
	"document_id" uuid NOT NULL,
	"sha256" text NOT NULL,
	"state" text NOT NULL,
	"reading" jsonb NOT NULL,
	"mapping" jsonb NOT NULL,
	"corrections" jsonb NOT NULL,
	"decisions" jsonb NOT NULL,
	"created_by" uuid NOT NULL,
	"committed_by" uuid,
	"committed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "imports_state" CHECK ("imports"."state" in ('preview', 'committed', 'discarded'))
);
--> statement-breakpoint
CREATE TABLE "inspections" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"component_id" uuid NOT NULL,
	"report_no" text NOT NULL,
	"revision" integer DEFAULT 0 NOT NULL,
	"state" text NOT NULL,
	"technique" text NOT NULL,
	"procedure_no" text DEFAULT '' NOT NULL,
	"planned_on" date,
	"inspected_on" date,
	"inspector_name" text DEFAULT '' NOT NULL,
	"inspector_id" uuid,
	"certificate_no" text DEFAULT '' NOT NULL,
	"certificate_valid_until" date,
	"height_error_mm" double precision,
	"length_error_mm" double precision,
	"sizing_error_source" text DEFAULT '' NOT NULL,
	"scan_surface" text DEFAULT 'outside' NOT NULL,
	"coverage_percent" double precision,
	"limitations" text DEFAULT '' NOT NULL,
	"result" text,
	"reinspection_id" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "inspections_report" UNIQUE("site_id","report_no","revision","component_id"),
	CONSTRAINT "inspections_state" CHECK ("inspections"."state" in ('planned', 'in progress', 'submitted', 'accepted', 'rejected', 'void')),
	CONSTRAINT "inspections_technique" CHECK ("inspections"."technique" in ('UT', 'PAUT', 'TOFD', 'PAUT+TOFD', 'TFM', 'MT', 'PT', 'ET', 'RT', 'VT', 'other')),
	CONSTRAINT "inspections_scan_surface" CHECK ("inspections"."scan_surface" in ('inside', 'outside')),
	CONSTRAINT "inspections_height_error" CHECK ("inspections"."height_error_mm" >= 0.05 and "inspections"."height_error_mm" <= 20),
	CONSTRAINT "inspections_length_error" CHECK ("inspections"."length_error_mm" >= 0.1 and "inspections"."length_error_mm" <= 100),
	CONSTRAINT "inspections_coverage" CHECK ("inspections"."coverage_percent" >= 0 and "inspections"."coverage_percent" <= 100)
);
--> statement-breakpoint
CREATE TABLE "growth_laws" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"key" text NOT NULL,
	"title" text NOT NULL,
	"environment" text NOT NULL,
	"stages" jsonb NOT NULL,
	"threshold_mpa_sqrt_mm" double precision NOT NULL,
	"source" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "growth_laws_key" UNIQUE("site_id","key"),
	CONSTRAINT "growth_laws_threshold" CHECK ("growth_laws"."threshold_mpa_sqrt_mm" >= 0 and "growth_laws"."threshold_mpa_sqrt_mm" <= 1000)
);
--> statement-breakpoint
CREATE TABLE "materials" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"name" text NOT NULL,
	"specification" text DEFAULT '' NOT NULL,
	"heat_no" text DEFAULT '' NOT NULL,
	"yield_mpa" double precision NOT NULL,
	"tensile_mpa" double precision NOT NULL,
	"youngs_modulus_mpa" double precision NOT NULL,
	"poissons_ratio" double precision NOT NULL,
	"toughness_mpa_sqrt_m" double precision NOT NULL,
	"toughness_temperature_c" double precision NOT NULL,
	"yield_plateau" boolean DEFAULT false NOT NULL,
	"origins" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "materials_name" UNIQUE("site_id","name"),
	CONSTRAINT "materials_yield" CHECK ("materials"."yield_mpa" >= 50 and "materials"."yield_mpa" <= 1500),
	CONSTRAINT "materials_tensile" CHECK ("materials"."tensile_mpa" >= 100 and "materials"."tensile_mpa" <= 2000),
	CONSTRAINT "materials_modulus" CHECK ("materials"."youngs_modulus_mpa" >= 50000 and "materials"."youngs_modulus_mpa" <= 250000),
	CONSTRAINT "materials_poisson" CHECK ("materials"."poissons_ratio" >= 0.1 and "materials"."poissons_ratio" <= 0.49),
	CONSTRAINT "materials_toughness" CHECK ("materials"."toughness_mpa_sqrt_m" >= 5 and "materials"."toughness_mpa_sqrt_m" <= 600),
	CONSTRAINT "materials_toughness_temperature" CHECK ("materials"."toughness_temperature_c" >= -273 and "materials"."toughness_temperature_c" <= 900)
);
--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"key" text NOT NULL,
	"person_id" uuid NOT NULL,
	"route" text NOT NULL,
	"request_hash" text NOT NULL,
	"status" integer NOT NULL,
	"answer" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "idempotency_keys_person_id_key_pk" PRIMARY KEY("person_id","key")
);
--> statement-breakpoint
CREATE TABLE "one_time_tokens" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"purpose" text NOT NULL,
	"person_id" uuid,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "people" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"role" text NOT NULL,
	"organisation" text DEFAULT '' NOT NULL,
	"competence" text DEFAULT '' NOT NULL,
	"certificate_no" text DEFAULT '' NOT NULL,
	"certificate_valid_until" date,
	"access_until" date,
	"password_hash" text,
	"active" boolean DEFAULT true NOT NULL,
	"failed_sign_ins" integer DEFAULT 0 NOT NULL,
	"locked_until" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "people_email_unique" UNIQUE("email"),
	CONSTRAINT "people_role" CHECK ("people"."role" in ('inspector', 'engineer', 'planner', 'operations', 'auditor', 'administrator'))
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"absolute_expires_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"last_seen_at" timestamp with time zone DEFAULT now() NOT NULL,
	"proved_at" timestamp with time zone DEFAULT now() NOT NULL,
	"user_agent" text DEFAULT '' NOT NULL,
	"address" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "throttles" (
	"key" text PRIMARY KEY NOT NULL,
	"failures" integer NOT NULL,
	"window_started_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "outgoing_mails" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid,
	"message_id" text NOT NULL,
	"kind" text NOT NULL,
	"recipient" text NOT NULL,
	"subject" text NOT NULL,
	"text" text NOT NULL,
	"html" text NOT NULL,
	"state" text DEFAULT 'queued' NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"next_attempt_at" timestamp with time zone DEFAULT now() NOT NULL,
	"leased_until" timestamp with time zone,
	"last_error" text DEFAULT '' NOT NULL,
	"sent_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "outgoing_mails_message_id_unique" UNIQUE("message_id"),
	CONSTRAINT "outgoing_mails_state" CHECK ("outgoing_mails"."state" in ('queued', 'sent', 'not delivered'))
);
--> statement-breakpoint
CREATE TABLE "received_mails" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"message_id" text NOT NULL,
	"sender" text NOT NULL,
	"recipients" text NOT NULL,
	"subject" text NOT NULL,
	"text" text NOT NULL,
	"received_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "reinspections" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"component_id" uuid NOT NULL,
	"flaw_id" uuid,
	"assessment_id" uuid,
	"task" text NOT NULL,
	"technique" text NOT NULL,
	"due_on" date NOT NULL,
	"limit_on" date,
	"basis" text NOT NULL,
	"candidates" jsonb NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"on_stream" boolean DEFAULT false NOT NULL,
	"window_id" uuid,
	"planned_on" date,
	"planned_by" uuid,
	"plan_note" text DEFAULT '' NOT NULL,
	"done_inspection_id" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "reinspections_state" CHECK ("reinspections"."state" in ('open', 'planned', 'in execution', 'awaiting report', 'done', 'cancelled')),
	CONSTRAINT "reinspections_technique" CHECK ("reinspections"."technique" in ('UT', 'PAUT', 'TOFD', 'PAUT+TOFD', 'TFM', 'MT', 'PT', 'ET', 'RT', 'VT', 'other'))
);
--> statement-breakpoint
CREATE TABLE "reminders" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"reinspection_id" uuid NOT NULL,
	"due_on" date NOT NULL,
	"lead_days" integer NOT NULL,
	"recipient_id" uuid NOT NULL,
	"recipient_email" text NOT NULL,
	"state" text NOT NULL,
	"mail_id" uuid,
	"sent_at" timestamp with time zone,
	"acknowledged_at" timestamp with time zone,
	"acknowledged_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "reminders_once" UNIQUE("reinspection_id","due_on","lead_days","recipient_id"),
	CONSTRAINT "reminders_state" CHECK ("reminders"."state" in ('queued', 'sent', 'not delivered', 'cancelled'))
);
--> statement-breakpoint
CREATE TABLE "shutdown_window_units" (
	"window_id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	CONSTRAINT "shutdown_window_units_window_id_unit_id_pk" PRIMARY KEY("window_id","unit_id")
);
--> statement-breakpoint
CREATE TABLE "shutdown_windows" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"code" text NOT NULL,
	"name" text DEFAULT '' NOT NULL,
	"kind" text NOT NULL,
	"starts_on" date NOT NULL,
	"ends_on" date NOT NULL,
	"scope_freeze_on" date,
	"state" text DEFAULT 'planned' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "shutdown_windows_code" UNIQUE("site_id","code"),
	CONSTRAINT "shutdown_windows_kind" CHECK ("shutdown_windows"."kind" in ('turnaround', 'short shutdown', 'on-stream campaign')),
	CONSTRAINT "shutdown_windows_state" CHECK ("shutdown_windows"."state" in ('planned', 'confirmed', 'cancelled'))
);
--> statement-breakpoint
CREATE TABLE "site_rule_versions" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"effective_on" date NOT NULL,
	"rules" jsonb NOT NULL,
	"reason" text NOT NULL,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "site_rule_versions_number" UNIQUE("site_id","number")
);
--> statement-breakpoint
CREATE TABLE "sites" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"code" text NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"demo" boolean DEFAULT false NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "sites_code_unique" UNIQUE("code")
);
--> statement-breakpoint
CREATE TABLE "units" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"site_id" uuid NOT NULL,
	"code" text NOT NULL,
	"name" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "units_code" UNIQUE("site_id","code")
);
--> statement-breakpoint
ALTER TABLE "assessments" ADD CONSTRAINT "assessments_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assessments" ADD CONSTRAINT "assessments_flaw_id_flaws_id_fk" FOREIGN KEY ("flaw_id") REFERENCES "public"."flaws"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assessments" ADD CONSTRAINT "assessments_finding_id_findings_id_fk" FOREIGN KEY ("finding_id") REFERENCES "public"."findings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assessments" ADD CONSTRAINT "assessments_rule_version_id_site_rule_versions_id_fk" FOREIGN KEY ("rule_version_id") REFERENCES "public"."site_rule_versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assessments" ADD CONSTRAINT "assessments_author_id_people_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assessments" ADD CONSTRAINT "assessments_reviewer_id_people_id_fk" FOREIGN KEY ("reviewer_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "components" ADD CONSTRAINT "components_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "components" ADD CONSTRAINT "components_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "components" ADD CONSTRAINT "components_material_id_materials_id_fk" FOREIGN KEY ("material_id") REFERENCES "public"."materials"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "load_cases" ADD CONSTRAINT "load_cases_component_id_components_id_fk" FOREIGN KEY ("component_id") REFERENCES "public"."components"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "locations" ADD CONSTRAINT "locations_component_id_components_id_fk" FOREIGN KEY ("component_id") REFERENCES "public"."components"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "operating_cycles" ADD CONSTRAINT "operating_cycles_component_id_components_id_fk" FOREIGN KEY ("component_id") REFERENCES "public"."components"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "operating_cycles" ADD CONSTRAINT "operating_cycles_load_case_id_load_cases_id_fk" FOREIGN KEY ("load_case_id") REFERENCES "public"."load_cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_inspection_id_inspections_id_fk" FOREIGN KEY ("inspection_id") REFERENCES "public"."inspections"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_import_id_imports_id_fk" FOREIGN KEY ("import_id") REFERENCES "public"."imports"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_location_id_locations_id_fk" FOREIGN KEY ("location_id") REFERENCES "public"."locations"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_flaw_id_flaws_id_fk" FOREIGN KEY ("flaw_id") REFERENCES "public"."flaws"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flaws" ADD CONSTRAINT "flaws_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flaws" ADD CONSTRAINT "flaws_component_id_components_id_fk" FOREIGN KEY ("component_id") REFERENCES "public"."components"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flaws" ADD CONSTRAINT "flaws_location_id_locations_id_fk" FOREIGN KEY ("location_id") REFERENCES "public"."locations"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "documents" ADD CONSTRAINT "documents_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "documents" ADD CONSTRAINT "documents_uploaded_by_people_id_fk" FOREIGN KEY ("uploaded_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_inspection_id_inspections_id_fk" FOREIGN KEY ("inspection_id") REFERENCES "public"."inspections"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_document_id_documents_id_fk" FOREIGN KEY ("document_id") REFERENCES "public"."documents"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_committed_by_people_id_fk" FOREIGN KEY ("committed_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "inspections" ADD CONSTRAINT "inspections_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "inspections" ADD CONSTRAINT "inspections_component_id_components_id_fk" FOREIGN KEY ("component_id") REFERENCES "public"."components"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "inspections" ADD CONSTRAINT "inspections_inspector_id_people_id_fk" FOREIGN KEY ("inspector_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "growth_laws" ADD CONSTRAINT "growth_laws_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "materials" ADD CONSTRAINT "materials_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotency_keys" ADD CONSTRAINT "idempotency_keys_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "one_time_tokens" ADD CONSTRAINT "one_time_tokens_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_people_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "outgoing_mails" ADD CONSTRAINT "outgoing_mails_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reinspections" ADD CONSTRAINT "reinspections_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reinspections" ADD CONSTRAINT "reinspections_component_id_components_id_fk" FOREIGN KEY ("component_id") REFERENCES "public"."components"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reinspections" ADD CONSTRAINT "reinspections_flaw_id_flaws_id_fk" FOREIGN KEY ("flaw_id") REFERENCES "public"."flaws"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reinspections" ADD CONSTRAINT "reinspections_assessment_id_assessments_id_fk" FOREIGN KEY ("assessment_id") REFERENCES "public"."assessments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reinspections" ADD CONSTRAINT "reinspections_window_id_shutdown_windows_id_fk" FOREIGN KEY ("window_id") REFERENCES "public"."shutdown_windows"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reinspections" ADD CONSTRAINT "reinspections_planned_by_people_id_fk" FOREIGN KEY ("planned_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reinspections" ADD CONSTRAINT "reinspections_done_inspection_id_inspections_id_fk" FOREIGN KEY ("done_inspection_id") REFERENCES "public"."inspections"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reminders" ADD CONSTRAINT "reminders_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reminders" ADD CONSTRAINT "reminders_reinspection_id_reinspections_id_fk" FOREIGN KEY ("reinspection_id") REFERENCES "public"."reinspections"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reminders" ADD CONSTRAINT "reminders_recipient_id_people_id_fk" FOREIGN KEY ("recipient_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reminders" ADD CONSTRAINT "reminders_acknowledged_by_people_id_fk" FOREIGN KEY ("acknowledged_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shutdown_window_units" ADD CONSTRAINT "shutdown_window_units_window_id_shutdown_windows_id_fk" FOREIGN KEY ("window_id") REFERENCES "public"."shutdown_windows"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shutdown_window_units" ADD CONSTRAINT "shutdown_window_units_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shutdown_windows" ADD CONSTRAINT "shutdown_windows_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_rule_versions" ADD CONSTRAINT "site_rule_versions_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "units" ADD CONSTRAINT "units_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "assessments_state" ON "assessments" USING btree ("site_id","state");--> statement-breakpoint
CREATE INDEX "signatures_entity" ON "signatures" USING btree ("entity","entity_id");--> statement-breakpoint
CREATE INDEX "components_unit" ON "components" USING btree ("unit_id");--> statement-breakpoint
CREATE INDEX "findings_flaw" ON "findings" USING btree ("flaw_id","inspected_on");--> statement-breakpoint
CREATE INDEX "findings_inspection" ON "findings" USING btree ("inspection_id");--> statement-breakpoint
CREATE INDEX "flaws_component" ON "flaws" USING btree ("component_id");--> statement-breakpoint
CREATE INDEX "history_component" ON "history" USING btree ("component_id","seq");--> statement-breakpoint
CREATE INDEX "history_site" ON "history" USING btree ("site_id","seq");--> statement-breakpoint
CREATE INDEX "history_entity" ON "history" USING btree ("entity","entity_id");--> statement-breakpoint
CREATE INDEX "documents_entity" ON "documents" USING btree ("entity","entity_id");--> statement-breakpoint
CREATE INDEX "imports_inspection" ON "imports" USING btree ("inspection_id");--> statement-breakpoint
CREATE UNIQUE INDEX "imports_file_once" ON "imports" USING btree ("site_id","sha256") WHERE "imports"."state" = 'committed';--> statement-breakpoint
CREATE INDEX "inspections_component" ON "inspections" USING btree ("component_id","inspected_on");--> statement-breakpoint
CREATE INDEX "people_site" ON "people" USING btree ("site_id");--> statement-breakpoint
CREATE INDEX "sessions_user" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "outgoing_mails_queue" ON "outgoing_mails" USING btree ("next_attempt_at") WHERE "outgoing_mails"."state" = 'queued';--> statement-breakpoint
CREATE INDEX "received_mails_recent" ON "received_mails" USING btree ("received_at");--> statement-breakpoint
CREATE INDEX "reinspections_due" ON "reinspections" USING btree ("site_id","due_on") WHERE "reinspections"."state" not in ('done', 'cancelled');--> statement-breakpoint
CREATE UNIQUE INDEX "reinspections_one_open_per_flaw" ON "reinspections" USING btree ("flaw_id") WHERE "reinspections"."state" not in ('done', 'cancelled');--> statement-breakpoint
CREATE INDEX "reinspections_component" ON "reinspections" USING btree ("component_id");--> statement-breakpoint
CREATE INDEX "reminders_recent" ON "reminders" USING btree ("site_id","created_at");