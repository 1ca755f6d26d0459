ALTER TABLE "digest_deliveries" ADD COLUMN "since" timestamp with time zone NOT NULL;--> statement-breakpoint
ALTER TABLE "digest_deliveries" ADD COLUMN "until" timestamp with time zone NOT NULL;--> statement-breakpoint
ALTER TABLE "digest_deliveries" ADD COLUMN "next_try_at" timestamp with time zone DEFAULT now() NOT NULL;--> statement-breakpoint
CREATE INDEX "digest_deliveries_waiting" ON "digest_deliveries" USING btree ("next_try_at") WHERE state = 'claimed';--> statement-breakpoint
ALTER TABLE "digest_deliveries" DROP COLUMN "batch_id";
