ALTER TABLE "attachments" ADD COLUMN "fault_id" uuid;--> statement-breakpoint
ALTER TABLE "attachments" ADD COLUMN "rework_id" uuid;--> statement-breakpoint
ALTER TABLE "attachments" ADD COLUMN "rework_side" text;--> statement-breakpoint
ALTER TABLE "attachments" ADD CONSTRAINT "attachments_fault_id_faults_id_fk" FOREIGN KEY ("fault_id") REFERENCES "public"."faults"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "attachments" ADD CONSTRAINT "attachments_rework_id_reworks_id_fk" FOREIGN KEY ("rework_id") REFERENCES "public"."reworks"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "attachments_fault" ON "attachments" USING btree ("fault_id");--> statement-breakpoint
CREATE INDEX "attachments_rework" ON "attachments" USING btree ("rework_id");