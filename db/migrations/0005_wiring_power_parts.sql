CREATE TABLE "block_children" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"block_id" uuid NOT NULL,
	"child_id" uuid NOT NULL,
	"count" integer NOT NULL,
	CONSTRAINT "block_children_once" UNIQUE("block_id","child_id")
);
--> statement-breakpoint
CREATE TABLE "blocks" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"name" text NOT NULL,
	"summary" text DEFAULT '' NOT NULL,
	"gates" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"changed_at" timestamp with time zone DEFAULT now() NOT NULL,
	"archived_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "blocks_name" UNIQUE("project_id","name")
);
--> statement-breakpoint
CREATE TABLE "board_blocks" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"board_id" uuid NOT NULL,
	"block_id" uuid NOT NULL,
	"count" integer NOT NULL,
	CONSTRAINT "board_blocks_once" UNIQUE("board_id","block_id")
);
--> statement-breakpoint
CREATE TABLE "bom_lines" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"board_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"part_number" text NOT NULL,
	"description" text DEFAULT '' NOT NULL,
	"count" integer NOT NULL,
	"designators" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "delay_paths" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"board_id" uuid,
	"name" text NOT NULL,
	"path" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"archived_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "delay_paths_name" UNIQUE("project_id","name")
);
--> statement-breakpoint
CREATE TABLE "parts" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"number" text NOT NULL,
	"description" text DEFAULT '' NOT NULL,
	"logic" jsonb,
	"stock" integer DEFAULT 0 NOT NULL,
	"price_cents" integer,
	"note" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"archived_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "parts_number" UNIQUE("project_id","number")
);
--> statement-breakpoint
CREATE TABLE "board_plans" (
	"board_id" uuid PRIMARY KEY NOT NULL,
	"packing" text DEFAULT 'pooled' NOT NULL,
	"family" text DEFAULT 'HC' NOT NULL,
	"clock_hz" real DEFAULT 1000000 NOT NULL,
	"activity" real DEFAULT 0.25 NOT NULL,
	"load_pf" real DEFAULT 50 NOT NULL,
	"units_planned" integer,
	"spares_tied" boolean DEFAULT false NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "plan_conditions" (
	"project_id" uuid PRIMARY KEY NOT NULL,
	"ambient_c" real DEFAULT 40 NOT NULL,
	"logic_volts" real DEFAULT 5 NOT NULL,
	"logic_rail" text DEFAULT '+5V' NOT NULL,
	"pin_capacitance_pf" real DEFAULT 5 NOT NULL,
	"spares_percent" real DEFAULT 10 NOT NULL,
	"currency" text DEFAULT 'EUR' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "power_lines" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"board_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"item" jsonb NOT NULL
);
--> statement-breakpoint
CREATE TABLE "rails" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"name" text NOT NULL,
	"volts" real NOT NULL,
	"tolerance_percent" real DEFAULT 5 NOT NULL,
	"capacity_a" real,
	"source_board_id" uuid,
	"copper" jsonb,
	"position" integer NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "rails_name" UNIQUE("project_id","name")
);
--> statement-breakpoint
CREATE TABLE "connectors" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"board_id" uuid NOT NULL,
	"reference" text NOT NULL,
	"type" text NOT NULL,
	"grid" jsonb,
	"position" integer NOT NULL,
	"slot_id" uuid,
	"takes" text DEFAULT 'J1' NOT NULL,
	"cabled_to" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "connectors_reference" UNIQUE("board_id","reference"),
	CONSTRAINT "connectors_position" UNIQUE("board_id","position")
);
--> statement-breakpoint
CREATE TABLE "families" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"name" text NOT NULL,
	"figures" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "families_name" UNIQUE("project_id","name")
);
--> statement-breakpoint
CREATE TABLE "pins" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"connector_id" uuid NOT NULL,
	"pin" text NOT NULL,
	"signal" text DEFAULT '' NOT NULL,
	"role" text NOT NULL,
	"family" text DEFAULT '' NOT NULL,
	"loads" integer DEFAULT 0 NOT NULL,
	"enable_group" text DEFAULT '' NOT NULL,
	"pull_up_ohm" real,
	"note" text DEFAULT '' NOT NULL,
	CONSTRAINT "pins_pin" UNIQUE("connector_id","pin")
);
--> statement-breakpoint
CREATE TABLE "rule_findings" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"key" text NOT NULL,
	"rule" text NOT NULL,
	"weight" text NOT NULL,
	"boards" jsonb NOT NULL,
	"finding" jsonb NOT NULL,
	"facts" text NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"reason" text DEFAULT '' NOT NULL,
	"accepted_facts" text,
	"accepted_by" uuid,
	"accepted_at" timestamp with time zone,
	"found_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "signals" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"name" text NOT NULL,
	"class" text DEFAULT 'data' NOT NULL,
	"aliases" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"frequency_hz" real,
	"note" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "signals_name" UNIQUE("project_id","name")
);
--> statement-breakpoint
ALTER TABLE "block_children" ADD CONSTRAINT "block_children_block_id_blocks_id_fk" FOREIGN KEY ("block_id") REFERENCES "public"."blocks"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "block_children" ADD CONSTRAINT "block_children_child_id_blocks_id_fk" FOREIGN KEY ("child_id") REFERENCES "public"."blocks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "blocks" ADD CONSTRAINT "blocks_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_blocks" ADD CONSTRAINT "board_blocks_board_id_boards_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."boards"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_blocks" ADD CONSTRAINT "board_blocks_block_id_blocks_id_fk" FOREIGN KEY ("block_id") REFERENCES "public"."blocks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bom_lines" ADD CONSTRAINT "bom_lines_board_id_boards_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."boards"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delay_paths" ADD CONSTRAINT "delay_paths_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delay_paths" ADD CONSTRAINT "delay_paths_board_id_boards_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."boards"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "parts" ADD CONSTRAINT "parts_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_plans" ADD CONSTRAINT "board_plans_board_id_boards_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."boards"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "plan_conditions" ADD CONSTRAINT "plan_conditions_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "power_lines" ADD CONSTRAINT "power_lines_board_id_boards_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."boards"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rails" ADD CONSTRAINT "rails_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rails" ADD CONSTRAINT "rails_source_board_id_boards_id_fk" FOREIGN KEY ("source_board_id") REFERENCES "public"."boards"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "connectors" ADD CONSTRAINT "connectors_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "connectors" ADD CONSTRAINT "connectors_board_id_boards_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."boards"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "connectors" ADD CONSTRAINT "connectors_slot_id_slots_id_fk" FOREIGN KEY ("slot_id") REFERENCES "public"."slots"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "connectors" ADD CONSTRAINT "connectors_cabled_to_connectors_id_fk" FOREIGN KEY ("cabled_to") REFERENCES "public"."connectors"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "families" ADD CONSTRAINT "families_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pins" ADD CONSTRAINT "pins_connector_id_connectors_id_fk" FOREIGN KEY ("connector_id") REFERENCES "public"."connectors"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rule_findings" ADD CONSTRAINT "rule_findings_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rule_findings" ADD CONSTRAINT "rule_findings_accepted_by_users_id_fk" FOREIGN KEY ("accepted_by") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signals" ADD CONSTRAINT "signals_project_id_projects_id_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "block_children_child" ON "block_children" USING btree ("child_id");--> statement-breakpoint
CREATE INDEX "board_blocks_block" ON "board_blocks" USING btree ("block_id");--> statement-breakpoint
CREATE INDEX "bom_lines_board" ON "bom_lines" USING btree ("board_id","position");--> statement-breakpoint
CREATE INDEX "power_lines_board" ON "power_lines" USING btree ("board_id","position");--> statement-breakpoint
CREATE INDEX "connectors_project" ON "connectors" USING btree ("project_id");--> statement-breakpoint
CREATE INDEX "connectors_slot" ON "connectors" USING btree ("slot_id");--> statement-breakpoint
CREATE UNIQUE INDEX "rule_findings_key" ON "rule_findings" USING btree ("project_id","key");--> statement-breakpoint
INSERT INTO "connectors" ("project_id", "board_id", "reference", "type", "position")
  SELECT "project_id", "id", "connector_reference", "connector_type", 1 FROM "boards" WHERE "connector_type" IS NOT NULL;--> statement-breakpoint
ALTER TABLE "boards" DROP COLUMN "connector_type";--> statement-breakpoint
ALTER TABLE "boards" DROP COLUMN "connector_reference";