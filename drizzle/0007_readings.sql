CREATE TYPE "public"."reading_kind" AS ENUM('certificate', 'chart', 'invoice');--> statement-breakpoint
CREATE TYPE "public"."reading_state" AS ENUM('waiting', 'read', 'unreadable');--> statement-breakpoint
CREATE TABLE "intake" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"file_id" uuid NOT NULL,
	"added_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"batch_id" uuid,
	"set_aside_reason" text,
	"settled_by" text,
	"settled_at" timestamp with time zone,
	CONSTRAINT "intake_file" UNIQUE("file_id")
);
--> statement-breakpoint
ALTER TABLE "intake" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "reading_corrections" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"reading_id" uuid NOT NULL,
	"field" text NOT NULL,
	"read" text,
	"corrected" text NOT NULL,
	"corrected_by" text NOT NULL,
	"corrected_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "reading_corrections" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "readings" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"file_id" uuid NOT NULL,
	"kind" "reading_kind" NOT NULL,
	"state" "reading_state" DEFAULT 'waiting' NOT NULL,
	"fault_code" text,
	"fault" text,
	"content" jsonb,
	"pages" jsonb,
	"reader" integer,
	"seconds" real,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"read_at" timestamp with time zone,
	CONSTRAINT "readings_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "readings_file" UNIQUE("file_id")
);
--> statement-breakpoint
ALTER TABLE "readings" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "signatures" ADD COLUMN "review_seconds" integer;--> statement-breakpoint
ALTER TABLE "intake" ADD CONSTRAINT "intake_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "intake" ADD CONSTRAINT "intake_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading_corrections" ADD CONSTRAINT "reading_corrections_shop_id_reading_id_readings_shop_id_id_fk" FOREIGN KEY ("shop_id","reading_id") REFERENCES "public"."readings"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "intake_open" ON "intake" USING btree ("shop_id","settled_at");--> statement-breakpoint
CREATE INDEX "reading_corrections_reading" ON "reading_corrections" USING btree ("reading_id");--> statement-breakpoint
CREATE INDEX "readings_state" ON "readings" USING btree ("shop_id","state");--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "intake" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "reading_corrections" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "readings" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));