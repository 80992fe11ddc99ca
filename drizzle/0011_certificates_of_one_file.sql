ALTER TABLE "files" DROP CONSTRAINT "files_storage_key";--> statement-breakpoint
ALTER TABLE "certificates" ADD COLUMN "place" integer;--> statement-breakpoint
ALTER TABLE "files" ADD COLUMN "copy_of" uuid;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_shop_id_copy_of_files_shop_id_id_fk" FOREIGN KEY ("shop_id","copy_of") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "files_storage_key" ON "files" USING btree ("storage_key") WHERE copy_of is null;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "place_from_0" CHECK ("certificates"."place" >= 0);