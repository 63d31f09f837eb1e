ALTER TABLE "pulls" DROP CONSTRAINT "pulls_size_id_sizes_id_fk";--> statement-breakpoint
ALTER TABLE "sizes" ADD CONSTRAINT "sizes_id_design" UNIQUE("id","design_id");--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_size_of_design" FOREIGN KEY ("size_id","design_id") REFERENCES "public"."sizes"("id","design_id") ON DELETE no action ON UPDATE no action;
