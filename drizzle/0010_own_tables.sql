CREATE TABLE "reference_tables" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"table_id" text NOT NULL,
	"title" text NOT NULL,
	"edition" text NOT NULL,
	"clause" text NOT NULL,
	"rows" jsonb NOT NULL,
	"entered_by" uuid NOT NULL,
	"entered_by_name" text NOT NULL,
	"superseded_at" timestamp with time zone,
	"withdrawn_at" timestamp with time zone,
	"withdrawn_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "reference_tables_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "rows_are_there" CHECK (jsonb_typeof("reference_tables"."rows") = 'array' and jsonb_array_length("reference_tables"."rows") > 0),
	CONSTRAINT "withdrawn_by_somebody" CHECK (("reference_tables"."withdrawn_at" is null) = ("reference_tables"."withdrawn_by" is null))
);
--> statement-breakpoint
ALTER TABLE "reference_tables" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "overrides" ADD COLUMN "read_from" jsonb;--> statement-breakpoint
ALTER TABLE "requirements" ADD COLUMN "read_from" jsonb;--> statement-breakpoint
CREATE UNIQUE INDEX "reference_tables_in_force" ON "reference_tables" USING btree ("shop_id","table_id") WHERE superseded_at is null and withdrawn_at is null;--> statement-breakpoint
CREATE INDEX "reference_tables_history" ON "reference_tables" USING btree ("shop_id","table_id","created_at");--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "reference_tables" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));