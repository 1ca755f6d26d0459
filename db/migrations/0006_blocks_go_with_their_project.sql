ALTER TABLE "block_children" DROP CONSTRAINT "block_children_child_id_blocks_id_fk";
--> statement-breakpoint
ALTER TABLE "board_blocks" DROP CONSTRAINT "board_blocks_block_id_blocks_id_fk";
--> statement-breakpoint
ALTER TABLE "block_children" ADD CONSTRAINT "block_children_child_id_blocks_id_fk" FOREIGN KEY ("child_id") REFERENCES "public"."blocks"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "board_blocks" ADD CONSTRAINT "board_blocks_block_id_blocks_id_fk" FOREIGN KEY ("block_id") REFERENCES "public"."blocks"("id") ON DELETE cascade ON UPDATE no action;