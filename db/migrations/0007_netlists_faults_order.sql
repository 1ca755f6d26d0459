CREATE TABLE "faults" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"unit_id" uuid NOT NULL,
	"check_id" uuid,
	"attempt_id" uuid,
	"probe_plan_id" uuid,
	"title" text NOT NULL,
	"symptom" text DEFAULT '' NOT NULL,
	"suspected" text DEFAULT '' NOT NULL,
	"tried" text DEFAULT '' NOT NULL,
	"cause" text DEFAULT '' NOT NULL,
	"mend" text DEFAULT '' NOT NULL,
	"lesson" text DEFAULT '' NOT NULL,
	"next_revision" text DEFAULT '' NOT NULL,
	"hours" real,
	"signals" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"pins" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_by" uuid,
	"closed_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "faults_number" UNIQUE("project_id","number")
);
--> statement-breakpoint
CREATE TABLE "punch_items" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"revision_id" uuid NOT NULL,
	"source" text NOT NULL,
	"source_id" uuid NOT NULL,
	"unit_id" uuid,
	"text" text NOT NULL,
	"dealt_with" text DEFAULT '' NOT NULL,
	"dealt_by" uuid,
	"dealt_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "punch_items_once" UNIQUE("revision_id","source","source_id")
);
--> statement-breakpoint
CREATE TABLE "rework_doubts" (
	"rework_id" uuid NOT NULL,
	"check_id" uuid NOT NULL,
	"origin" text NOT NULL,
	"reason" text NOT NULL,
	"after_arrival" integer NOT NULL,
	CONSTRAINT "rework_doubts_rework_id_check_id_pk" PRIMARY KEY("rework_id","check_id")
);
--> statement-breakpoint
CREATE TABLE "rework_touches" (
	"rework_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"name" text NOT NULL,
	CONSTRAINT "rework_touches_rework_id_kind_name_pk" PRIMARY KEY("rework_id","kind","name")
);
--> statement-breakpoint
CREATE TABLE "reworks" (
	"id" uuid PRIMARY KEY NOT NULL,
	"arrival" bigserial NOT NULL,
	"project_id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"kind" text NOT NULL,
	"what" text NOT NULL,
	"why" text DEFAULT '' NOT NULL,
	"wire" jsonb,
	"fault_id" uuid,
	"carried_from" uuid,
	"user_id" uuid,
	"performed_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "reworks_arrival_unique" UNIQUE("arrival"),
	CONSTRAINT "reworks_number" UNIQUE("unit_id","number")
);
--> statement-breakpoint
CREATE TABLE "netlists" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"revision_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"source" text NOT NULL,
	"file_name" text DEFAULT '' NOT NULL,
	"sha256" text NOT NULL,
	"content" jsonb NOT NULL,
	"nets" integer NOT NULL,
	"points" integer NOT NULL,
	"passed_over" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "netlists_number" UNIQUE("revision_id","number")
);
--> statement-breakpoint
CREATE TABLE "probe_plans" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"unit_id" uuid NOT NULL,
	"netlist_id" uuid NOT NULL,
	"options" jsonb NOT NULL,
	"probes" jsonb NOT NULL,
	"count" integer NOT NULL,
	"check_id" uuid,
	"attempt_id" uuid,
	"created_by" uuid,
	"closed_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "probe_results" (
	"id" uuid PRIMARY KEY NOT NULL,
	"plan_id" uuid NOT NULL,
	"probe" integer NOT NULL,
	"beeps" boolean,
	"ohm" double precision,
	"typed" text DEFAULT '' NOT NULL,
	"user_id" uuid,
	"performed_at" timestamp with time zone NOT NULL,
	"recorded_at" timestamp with time zone DEFAULT now() NOT NULL,
	"voided_at" timestamp with time zone,
	"voided_by" uuid
);
--> statement-breakpoint
CREATE TABLE "bench_sessions" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"started_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	"note" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "board_orders" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"board_id" uuid NOT NULL,
	"other_id" uuid NOT NULL,
	"rule" text NOT NULL,
	"reason" text DEFAULT '' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "board_orders_once" UNIQUE("board_id","other_id","rule")
);
--> statement-breakpoint
ALTER TABLE "faults" ADD CONSTRAINT "faults_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "faults" ADD CONSTRAINT "faults_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "faults" ADD CONSTRAINT "faults_check_id_checks_id_fk" FOREIGN KEY ("check_id") REFERENCES "public"."checks"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "faults" ADD CONSTRAINT "faults_attempt_id_attempts_id_fk" FOREIGN KEY ("attempt_id") REFERENCES "public"."attempts"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "faults" ADD CONSTRAINT "faults_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "punch_items" ADD CONSTRAINT "punch_items_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "punch_items" ADD CONSTRAINT "punch_items_revision_id_revisions_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "punch_items" ADD CONSTRAINT "punch_items_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "punch_items" ADD CONSTRAINT "punch_items_dealt_by_users_id_fk" FOREIGN KEY ("dealt_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rework_doubts" ADD CONSTRAINT "rework_doubts_rework_id_reworks_id_fk" FOREIGN KEY ("rework_id") REFERENCES "public"."reworks"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rework_doubts" ADD CONSTRAINT "rework_doubts_check_id_checks_id_fk" FOREIGN KEY ("check_id") REFERENCES "public"."checks"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rework_touches" ADD CONSTRAINT "rework_touches_rework_id_reworks_id_fk" FOREIGN KEY ("rework_id") REFERENCES "public"."reworks"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reworks" ADD CONSTRAINT "reworks_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reworks" ADD CONSTRAINT "reworks_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reworks" ADD CONSTRAINT "reworks_fault_id_faults_id_fk" FOREIGN KEY ("fault_id") REFERENCES "public"."faults"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reworks" ADD CONSTRAINT "reworks_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "netlists" ADD CONSTRAINT "netlists_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "netlists" ADD CONSTRAINT "netlists_revision_id_revisions_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "netlists" ADD CONSTRAINT "netlists_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_plans" ADD CONSTRAINT "probe_plans_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_plans" ADD CONSTRAINT "probe_plans_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_plans" ADD CONSTRAINT "probe_plans_netlist_id_netlists_id_fk" FOREIGN KEY ("netlist_id") REFERENCES "public"."netlists"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_plans" ADD CONSTRAINT "probe_plans_attempt_id_attempts_id_fk" FOREIGN KEY ("attempt_id") REFERENCES "public"."attempts"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_plans" ADD CONSTRAINT "probe_plans_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_results" ADD CONSTRAINT "probe_results_plan_id_probe_plans_id_fk" FOREIGN KEY ("plan_id") REFERENCES "public"."probe_plans"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_results" ADD CONSTRAINT "probe_results_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "probe_results" ADD CONSTRAINT "probe_results_voided_by_users_id_fk" FOREIGN KEY ("voided_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_sessions" ADD CONSTRAINT "bench_sessions_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_sessions" ADD CONSTRAINT "bench_sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_orders" ADD CONSTRAINT "board_orders_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_orders" ADD CONSTRAINT "board_orders_board_id_boards_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."boards"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_orders" ADD CONSTRAINT "board_orders_other_id_boards_id_fk" FOREIGN KEY ("other_id") REFERENCES "public"."boards"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_orders" ADD CONSTRAINT "board_orders_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "faults_unit" ON "faults" USING btree ("unit_id");--> statement-breakpoint
CREATE INDEX "rework_doubts_check" ON "rework_doubts" USING btree ("check_id");--> statement-breakpoint
CREATE INDEX "reworks_project" ON "reworks" USING btree ("project_id");--> statement-breakpoint
CREATE INDEX "netlists_project" ON "netlists" USING btree ("project_id");--> statement-breakpoint
CREATE INDEX "probe_plans_unit" ON "probe_plans" USING btree ("unit_id","created_at");--> statement-breakpoint
CREATE INDEX "probe_results_plan" ON "probe_results" USING btree ("plan_id","probe");--> statement-breakpoint
CREATE INDEX "bench_sessions_project" ON "bench_sessions" USING btree ("project_id","started_at");--> statement-breakpoint
-- A rework and what it put in doubt are history like an attempt.
CREATE TRIGGER reworks_are_final BEFORE UPDATE OR DELETE ON reworks FOR EACH ROW EXECUTE FUNCTION keep_history();
--> statement-breakpoint
CREATE TRIGGER rework_touches_are_final BEFORE UPDATE OR DELETE ON rework_touches FOR EACH ROW EXECUTE FUNCTION keep_history();
--> statement-breakpoint
CREATE TRIGGER rework_doubts_are_final BEFORE UPDATE OR DELETE ON rework_doubts FOR EACH ROW EXECUTE FUNCTION keep_history();
