CREATE TYPE "public"."equipment_kind" AS ENUM('furnace', 'oven', 'tank');--> statement-breakpoint
CREATE TABLE "equipment" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"processor_id" uuid NOT NULL,
	"kind" "equipment_kind" NOT NULL,
	"name" text NOT NULL,
	"length_mm" numeric(14,4) NOT NULL,
	"length_entered" text NOT NULL,
	"width_mm" numeric(14,4) NOT NULL,
	"width_entered" text NOT NULL,
	"height_mm" numeric(14,4) NOT NULL,
	"height_entered" text NOT NULL,
	"limit_g" numeric(14,4),
	"limit_entered" text,
	"temperature_c_min" numeric(14,4),
	"temperature_min_entered" text,
	"temperature_c_max" numeric(14,4),
	"temperature_max_entered" text,
	"furnace_class" integer,
	"retired_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "equipment_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "size_positive" CHECK ("equipment"."length_mm" > 0 and "equipment"."width_mm" > 0 and "equipment"."height_mm" > 0),
	CONSTRAINT "limit_positive" CHECK ("equipment"."limit_g" > 0),
	CONSTRAINT "temperatures_in_order" CHECK ("equipment"."temperature_c_min" <= "equipment"."temperature_c_max"),
	CONSTRAINT "class_known" CHECK ("equipment"."furnace_class" between 1 and 6)
);
--> statement-breakpoint
ALTER TABLE "equipment" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "equipment" ADD CONSTRAINT "equipment_shop_id_processor_id_shop_processors_shop_id_processor_id_fk" FOREIGN KEY ("shop_id","processor_id") REFERENCES "public"."shop_processors"("shop_id","processor_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "equipment_name" ON "equipment" USING btree ("shop_id","processor_id","name") WHERE retired_at is null;--> statement-breakpoint
CREATE INDEX "equipment_processor" ON "equipment" USING btree ("shop_id","processor_id");--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "equipment" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));