CREATE TYPE "public"."document_kind" AS ENUM('traveller', 'purchase_order');--> statement-breakpoint
CREATE TYPE "public"."message_kind" AS ENUM('question', 'answer', 'trouble', 'note');--> statement-breakpoint
CREATE TYPE "public"."requirement_source" AS ENUM('drawing', 'specification', 'shop');--> statement-breakpoint
CREATE TYPE "public"."stage" AS ENUM('building', 'dispatched', 'at_processor', 'returned', 'proved', 'settled', 'stocked', 'held', 'cancelled');--> statement-breakpoint
CREATE TYPE "public"."disposition" AS ENUM('use_as_is', 'reprocess', 'return_to_processor', 'scrap', 'concession');--> statement-breakpoint
CREATE TYPE "public"."nonconformance_kind" AS ENUM('damaged', 'short', 'over', 'requirement', 'papers');--> statement-breakpoint
CREATE TYPE "public"."verdict" AS ENUM('meets', 'does_not_meet', 'not_stated', 'cannot_tell');--> statement-breakpoint
CREATE TYPE "public"."file_purpose" AS ENUM('drawing', 'mill_certificate', 'certificate', 'chart', 'invoice', 'photo', 'concession', 'traveller', 'purchase_order', 'dossier', 'archive');--> statement-breakpoint
CREATE TYPE "public"."file_state" AS ENUM('awaited', 'verified', 'refused');--> statement-breakpoint
CREATE TYPE "public"."place" AS ENUM('making', 'packed', 'transit_out', 'at_processor', 'transit_back', 'quarantine', 'hold', 'stock', 'fitted', 'scrapped', 'lost');--> statement-breakpoint
CREATE TYPE "public"."invoice_line_kind" AS ENUM('pieces', 'lot_minimum', 'certification', 'freight', 'tax', 'other');--> statement-breakpoint
CREATE TYPE "public"."money_entry_kind" AS ENUM('invoiced', 'withheld', 'credited', 'paid', 'refunded');--> statement-breakpoint
CREATE TYPE "public"."payment_state" AS ENUM('pending', 'succeeded', 'failed', 'refunded');--> statement-breakpoint
CREATE TYPE "public"."lateness_basis" AS ENUM('first_promise', 'latest_promise');--> statement-breakpoint
CREATE TYPE "public"."separation" AS ENUM('refuse', 'record');--> statement-breakpoint
CREATE TYPE "public"."process" AS ENUM('solution_heat_treat_and_age', 'solution_heat_treat', 'artificial_age', 'anneal', 'harden_and_temper', 'stress_relief', 'embrittlement_relief', 'cadmium_plate', 'zinc_plate', 'nickel_plate', 'chromium_plate', 'anodize', 'chemical_film', 'passivation', 'phosphate', 'shot_peen', 'fluorescent_penetrant', 'magnetic_particle', 'radiography', 'ultrasonic');--> statement-breakpoint
CREATE TYPE "public"."product_form" AS ENUM('sheet', 'plate', 'bar', 'tube', 'extrusion', 'forging', 'casting');--> statement-breakpoint
CREATE TYPE "public"."link_purpose" AS ENUM('sign_in', 'reset');--> statement-breakpoint
CREATE TYPE "public"."unit_system" AS ENUM('inch', 'metric');--> statement-breakpoint
CREATE TABLE "audit_entries" (
	"shop_id" uuid NOT NULL,
	"seq" bigint DEFAULT 0 NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"actor_kind" text NOT NULL,
	"actor_id" text NOT NULL,
	"actor_name" text NOT NULL,
	"address" text,
	"request_id" text,
	"action" text NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"before" jsonb,
	"after" jsonb,
	"previous_hash" text DEFAULT '' NOT NULL,
	"hash" text DEFAULT '' NOT NULL,
	CONSTRAINT "audit_entries_shop_id_seq_pk" PRIMARY KEY("shop_id","seq")
);
--> statement-breakpoint
ALTER TABLE "audit_entries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "batch_documents" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"kind" "document_kind" NOT NULL,
	"document_version" integer NOT NULL,
	"content" jsonb NOT NULL,
	"changes" text[] DEFAULT '{}' NOT NULL,
	"stated_at" timestamp with time zone NOT NULL,
	"file_id" uuid,
	"sha256" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "batch_documents_version" UNIQUE("batch_id","kind","document_version")
);
--> statement-breakpoint
ALTER TABLE "batch_documents" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "batch_lines" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"line_no" integer NOT NULL,
	"lot_id" uuid NOT NULL,
	"step_id" uuid NOT NULL,
	"pieces" integer NOT NULL,
	"unit_price_minor" bigint DEFAULT 0 NOT NULL,
	"load_no" integer,
	"frozen" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "batch_lines_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "batch_lines_no" UNIQUE("batch_id","line_no"),
	CONSTRAINT "batch_lines_lot" UNIQUE("batch_id","lot_id","step_id"),
	CONSTRAINT "pieces_positive" CHECK ("batch_lines"."pieces" > 0),
	CONSTRAINT "price_not_negative" CHECK ("batch_lines"."unit_price_minor" >= 0)
);
--> statement-breakpoint
ALTER TABLE "batch_lines" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "batch_links" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"processor_id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"withdrawn_at" timestamp with time zone,
	"first_opened_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "batch_links_token" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "batch_links" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "batches" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"number" text NOT NULL,
	"order_number" text NOT NULL,
	"processor_id" uuid NOT NULL,
	"process" "process" NOT NULL,
	"specification" text NOT NULL,
	"specification_revision" text,
	"class_type" text,
	"note" text,
	"leaves_on" date,
	"wanted_back_on" date,
	"currency" text NOT NULL,
	"lot_minimum_minor" bigint DEFAULT 0 NOT NULL,
	"certification_fee_minor" bigint DEFAULT 0 NOT NULL,
	"put_aside_at" timestamp with time zone,
	"dispatched_at" timestamp with time zone,
	"dispatched_by" uuid,
	"cancelled_at" timestamp with time zone,
	"cancel_reason" text,
	"acknowledged_at" timestamp with time zone,
	"acknowledged_pieces" integer,
	"marked_done_at" timestamp with time zone,
	"shipped_at" timestamp with time zone,
	"shipped_note" text,
	"payment_waived_at" timestamp with time zone,
	"payment_waived_reason" text,
	"stage" "stage" DEFAULT 'building' NOT NULL,
	"pieces" integer DEFAULT 0 NOT NULL,
	"pieces_back" integer DEFAULT 0 NOT NULL,
	"first_promised_on" date,
	"promised_on" date,
	"last_back_at" timestamp with time zone,
	"open_nonconformances" integer DEFAULT 0 NOT NULL,
	"stocked_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "batches_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "batches_number" UNIQUE("shop_id","number"),
	CONSTRAINT "batches_order" UNIQUE("shop_id","order_number")
);
--> statement-breakpoint
ALTER TABLE "batches" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "messages" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"line_id" uuid,
	"kind" "message_kind" NOT NULL,
	"side" text NOT NULL,
	"author" text NOT NULL,
	"body" text NOT NULL,
	"answers_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "side_is_known" CHECK ("messages"."side" in ('shop', 'processor'))
);
--> statement-breakpoint
ALTER TABLE "messages" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "overrides" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"check" text NOT NULL,
	"subject" text DEFAULT '' NOT NULL,
	"reason" text NOT NULL,
	"by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "overrides_once" UNIQUE("batch_id","check","subject")
);
--> statement-breakpoint
ALTER TABLE "overrides" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "promises" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"promised_on" date NOT NULL,
	"note" text,
	"made_by" text NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "promises" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "requirements" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"line_id" uuid,
	"seq" integer NOT NULL,
	"characteristic" text NOT NULL,
	"limit" text DEFAULT '' NOT NULL,
	"unit" text DEFAULT '' NOT NULL,
	"source" "requirement_source" DEFAULT 'specification' NOT NULL,
	"source_text" text DEFAULT '' NOT NULL,
	CONSTRAINT "requirements_shop" UNIQUE("shop_id","id")
);
--> statement-breakpoint
ALTER TABLE "requirements" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "certificates" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"file_id" uuid NOT NULL,
	"number" text,
	"dated_on" date,
	"sent_by" text NOT NULL,
	"set_aside_at" timestamp with time zone,
	"set_aside_reason" text,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "certificates_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "certificates_file" UNIQUE("file_id")
);
--> statement-breakpoint
ALTER TABLE "certificates" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "charts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"file_id" uuid NOT NULL,
	"sent_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "charts_file" UNIQUE("file_id")
);
--> statement-breakpoint
ALTER TABLE "charts" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "coverage" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"signature_id" uuid NOT NULL,
	"certificate_id" uuid NOT NULL,
	"line_id" uuid NOT NULL,
	"pieces" integer NOT NULL,
	CONSTRAINT "pieces_positive" CHECK ("coverage"."pieces" > 0)
);
--> statement-breakpoint
ALTER TABLE "coverage" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "decisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"certificate_id" uuid NOT NULL,
	"requirement_id" uuid NOT NULL,
	"stated" text DEFAULT '' NOT NULL,
	"verdict" "verdict" NOT NULL,
	"override_reason" text,
	"note" text,
	"decided_by" text NOT NULL,
	"decided_at" timestamp with time zone NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "decisions_once" UNIQUE("certificate_id","requirement_id")
);
--> statement-breakpoint
ALTER TABLE "decisions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "dispositions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"nonconformance_id" uuid NOT NULL,
	"disposition" "disposition" NOT NULL,
	"pieces" integer NOT NULL,
	"reason" text NOT NULL,
	"authority" text,
	"file_id" uuid,
	"decided_by" text NOT NULL,
	"decided_at" timestamp with time zone NOT NULL,
	CONSTRAINT "pieces_positive" CHECK ("dispositions"."pieces" > 0)
);
--> statement-breakpoint
ALTER TABLE "dispositions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "dossier_links" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"lot_id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"for_whom" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"withdrawn_at" timestamp with time zone,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "dossier_links_token" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "dossier_links" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "dossiers" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"lot_id" uuid NOT NULL,
	"stated_at" timestamp with time zone NOT NULL,
	"document_file_id" uuid,
	"archive_file_id" uuid,
	"requested_by" text NOT NULL,
	"finished_at" timestamp with time zone,
	"failure" text
);
--> statement-breakpoint
ALTER TABLE "dossiers" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "nonconformances" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"number" text NOT NULL,
	"batch_id" uuid NOT NULL,
	"line_id" uuid NOT NULL,
	"lot_id" uuid NOT NULL,
	"kind" "nonconformance_kind" NOT NULL,
	"pieces" integer NOT NULL,
	"requirement_id" uuid,
	"certificate_id" uuid,
	"what" text NOT NULL,
	"opened_by" text NOT NULL,
	"opened_at" timestamp with time zone NOT NULL,
	"closed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "nonconformances_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "nonconformances_number" UNIQUE("shop_id","number"),
	CONSTRAINT "pieces_positive" CHECK ("nonconformances"."pieces" > 0)
);
--> statement-breakpoint
ALTER TABLE "nonconformances" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "receipt_lines" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"receipt_id" uuid NOT NULL,
	"line_id" uuid NOT NULL,
	"good" integer DEFAULT 0 NOT NULL,
	"damaged" integer DEFAULT 0 NOT NULL,
	"short" integer DEFAULT 0 NOT NULL,
	"over" integer DEFAULT 0 NOT NULL,
	"note" text,
	CONSTRAINT "receipt_lines_once" UNIQUE("receipt_id","line_id"),
	CONSTRAINT "counts_not_negative" CHECK ("receipt_lines"."good" >= 0 and "receipt_lines"."damaged" >= 0 and "receipt_lines"."short" >= 0 and "receipt_lines"."over" >= 0)
);
--> statement-breakpoint
ALTER TABLE "receipt_lines" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "receipt_photos" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"receipt_id" uuid NOT NULL,
	"line_id" uuid,
	"file_id" uuid NOT NULL
);
--> statement-breakpoint
ALTER TABLE "receipt_photos" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "receipts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	"received_by" text NOT NULL,
	"note" text,
	CONSTRAINT "receipts_shop" UNIQUE("shop_id","id")
);
--> statement-breakpoint
ALTER TABLE "receipts" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "releases" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"line_id" uuid NOT NULL,
	"lot_id" uuid NOT NULL,
	"pieces" integer NOT NULL,
	"location_id" uuid,
	"released_by" text NOT NULL,
	"released_at" timestamp with time zone NOT NULL,
	CONSTRAINT "pieces_positive" CHECK ("releases"."pieces" > 0)
);
--> statement-breakpoint
ALTER TABLE "releases" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "signatures" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"certificate_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"sentence" text NOT NULL,
	"file_sha256" text NOT NULL,
	"sealed" text NOT NULL,
	"seal" text NOT NULL,
	"signed_by" uuid NOT NULL,
	"signer_name" text NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "signatures_shop" UNIQUE("shop_id","id")
);
--> statement-breakpoint
ALTER TABLE "signatures" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "files" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"batch_id" uuid,
	"processor_id" uuid,
	"purpose" "file_purpose" NOT NULL,
	"name" text NOT NULL,
	"media_type" text NOT NULL,
	"size" bigint NOT NULL,
	"sha256" text,
	"storage_key" text NOT NULL,
	"state" "file_state" DEFAULT 'awaited' NOT NULL,
	"refusal" text,
	"uploaded_by" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"verified_at" timestamp with time zone,
	CONSTRAINT "files_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "files_storage_key" UNIQUE("storage_key")
);
--> statement-breakpoint
ALTER TABLE "files" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "balances" (
	"shop_id" uuid NOT NULL,
	"lot_id" uuid NOT NULL,
	"place" "place" NOT NULL,
	"holder_id" uuid NOT NULL,
	"pieces" integer NOT NULL,
	CONSTRAINT "balances_lot_id_place_holder_id_pk" PRIMARY KEY("lot_id","place","holder_id"),
	CONSTRAINT "never_negative" CHECK ("balances"."pieces" >= 0)
);
--> statement-breakpoint
ALTER TABLE "balances" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "locations" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"name" text NOT NULL,
	"closed_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "locations_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "locations_name" UNIQUE("shop_id","name")
);
--> statement-breakpoint
ALTER TABLE "locations" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "lots" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"number" text NOT NULL,
	"part_id" uuid NOT NULL,
	"heat" text NOT NULL,
	"made_on" timestamp with time zone NOT NULL,
	"serialised" boolean DEFAULT false NOT NULL,
	"mill_certificate_file_id" uuid,
	"note" text,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "lots_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "lots_number" UNIQUE("shop_id","number")
);
--> statement-breakpoint
ALTER TABLE "lots" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "movements" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"lot_id" uuid NOT NULL,
	"pieces" integer NOT NULL,
	"from_place" "place",
	"from_holder_id" uuid,
	"to_place" "place" NOT NULL,
	"to_holder_id" uuid NOT NULL,
	"piece_ids" uuid[],
	"batch_line_id" uuid,
	"reason" text NOT NULL,
	"note" text,
	"moved_by" text NOT NULL,
	"moved_at" timestamp with time zone NOT NULL,
	CONSTRAINT "pieces_positive" CHECK ("movements"."pieces" > 0),
	CONSTRAINT "from_is_whole" CHECK (("movements"."from_place" is null) = ("movements"."from_holder_id" is null)),
	CONSTRAINT "goes_somewhere" CHECK ("movements"."from_place" is null or ("movements"."from_place", "movements"."from_holder_id") <> ("movements"."to_place", "movements"."to_holder_id")),
	CONSTRAINT "names_are_counted" CHECK ("movements"."piece_ids" is null or cardinality("movements"."piece_ids") = "movements"."pieces")
);
--> statement-breakpoint
ALTER TABLE "movements" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "pieces" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"lot_id" uuid NOT NULL,
	"serial" text NOT NULL,
	"place" "place",
	"holder_id" uuid,
	CONSTRAINT "pieces_serial" UNIQUE("lot_id","serial")
);
--> statement-breakpoint
ALTER TABLE "pieces" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "clearances" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"invoice_id" uuid NOT NULL,
	"difference" text NOT NULL,
	"choice" text NOT NULL,
	"amount_minor" bigint NOT NULL,
	"reason" text DEFAULT '' NOT NULL,
	"cleared_by" text NOT NULL,
	"cleared_at" timestamp with time zone NOT NULL,
	CONSTRAINT "clearances_once" UNIQUE("invoice_id","difference"),
	CONSTRAINT "choice_is_known" CHECK ("clearances"."choice" in ('accept', 'withhold'))
);
--> statement-breakpoint
ALTER TABLE "clearances" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "invoice_lines" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"invoice_id" uuid NOT NULL,
	"seq" integer NOT NULL,
	"kind" "invoice_line_kind" NOT NULL,
	"line_id" uuid,
	"description" text NOT NULL,
	"pieces" integer,
	"unit_price_minor" bigint,
	"amount_minor" bigint NOT NULL,
	CONSTRAINT "invoice_lines_seq" UNIQUE("invoice_id","seq")
);
--> statement-breakpoint
ALTER TABLE "invoice_lines" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "invoices" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"processor_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"file_id" uuid,
	"number" text,
	"number_key" text,
	"dated_on" date,
	"due_on" date,
	"currency" text NOT NULL,
	"total_minor" bigint,
	"sent_by" text NOT NULL,
	"entered_at" timestamp with time zone,
	"refused_at" timestamp with time zone,
	"refused_reason" text,
	"approved_at" timestamp with time zone,
	"approved_by" uuid,
	"approved_minor" bigint,
	"second_approved_at" timestamp with time zone,
	"second_approved_by" uuid,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "invoices_shop" UNIQUE("shop_id","id")
);
--> statement-breakpoint
ALTER TABLE "invoices" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "money_entries" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"invoice_id" uuid NOT NULL,
	"kind" "money_entry_kind" NOT NULL,
	"amount_minor" bigint NOT NULL,
	"currency" text NOT NULL,
	"cause" text NOT NULL,
	"entered_by" text NOT NULL,
	"entered_at" timestamp with time zone NOT NULL,
	CONSTRAINT "money_entries_cause" UNIQUE("invoice_id","cause")
);
--> statement-breakpoint
ALTER TABLE "money_entries" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "payment_events" (
	"id" text PRIMARY KEY NOT NULL,
	"type" text NOT NULL,
	"payload" jsonb NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	"worked_at" timestamp with time zone
);
--> statement-breakpoint
ALTER TABLE "payment_events" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "payments" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"invoice_id" uuid NOT NULL,
	"attempt" integer NOT NULL,
	"amount_minor" bigint NOT NULL,
	"currency" text NOT NULL,
	"state" "payment_state" DEFAULT 'pending' NOT NULL,
	"intent_id" text,
	"failure" text,
	"paid_by" uuid NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "payments_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "payments_attempt" UNIQUE("invoice_id","attempt"),
	CONSTRAINT "payments_intent" UNIQUE("intent_id"),
	CONSTRAINT "amount_positive" CHECK ("payments"."amount_minor" > 0)
);
--> statement-breakpoint
ALTER TABLE "payments" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "approvals" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"processor_id" uuid NOT NULL,
	"reference" text NOT NULL,
	"processes" text[] NOT NULL,
	"specifications" text[] DEFAULT '{}' NOT NULL,
	"valid_from" date NOT NULL,
	"valid_to" date NOT NULL,
	"withdrawn_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "approvals" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "counters" (
	"shop_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"next" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "counters_shop_id_kind_pk" PRIMARY KEY("shop_id","kind")
);
--> statement-breakpoint
ALTER TABLE "counters" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "processors" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"phone" text,
	"address" text[] DEFAULT '{}' NOT NULL,
	"zone" text DEFAULT 'UTC' NOT NULL,
	"stripe_account_id" text,
	"payouts_ready" boolean DEFAULT false NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "processors_email" UNIQUE("email")
);
--> statement-breakpoint
ALTER TABLE "processors" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "shop_processors" (
	"shop_id" uuid NOT NULL,
	"processor_id" uuid NOT NULL,
	"contact_name" text,
	"contact_email" text NOT NULL,
	"note" text,
	"active" boolean DEFAULT true NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "shop_processors_shop_id_processor_id_pk" PRIMARY KEY("shop_id","processor_id")
);
--> statement-breakpoint
ALTER TABLE "shop_processors" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "shops" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"address" text[] DEFAULT '{}' NOT NULL,
	"phone" text,
	"zone" text DEFAULT 'UTC' NOT NULL,
	"currency" text DEFAULT 'USD' NOT NULL,
	"order_prefix" text DEFAULT 'PO' NOT NULL,
	"dispatch_and_acceptance" "separation" DEFAULT 'record' NOT NULL,
	"approval_and_payment" "separation" DEFAULT 'record' NOT NULL,
	"second_approval_above_minor" bigint,
	"lateness_basis" "lateness_basis" DEFAULT 'latest_promise' NOT NULL,
	"stripe_customer_id" text,
	"stripe_payment_method_id" text,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "shops" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "assemblies" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"name" text NOT NULL,
	"needed_on" date,
	"note" text,
	"closed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "assemblies_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "assemblies_name" UNIQUE("shop_id","name")
);
--> statement-breakpoint
ALTER TABLE "assemblies" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "assembly_needs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"assembly_id" uuid NOT NULL,
	"part_number" text NOT NULL,
	"pieces" integer NOT NULL,
	CONSTRAINT "assembly_needs_once" UNIQUE("assembly_id","part_number"),
	CONSTRAINT "pieces_positive" CHECK ("assembly_needs"."pieces" > 0)
);
--> statement-breakpoint
ALTER TABLE "assembly_needs" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "parts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"number" text NOT NULL,
	"revision" text NOT NULL,
	"name" text NOT NULL,
	"alloy" text NOT NULL,
	"form" "product_form" NOT NULL,
	"clad" boolean DEFAULT false NOT NULL,
	"thickness_mm" numeric(14,4),
	"thickness_entered" text,
	"made_condition" text NOT NULL,
	"end_condition" text NOT NULL,
	"length_mm" numeric(14,4),
	"length_entered" text,
	"width_mm" numeric(14,4),
	"width_entered" text,
	"height_mm" numeric(14,4),
	"height_entered" text,
	"mass_g" numeric(14,4),
	"mass_entered" text,
	"area_mm2" numeric(14,4),
	"area_entered" text,
	"serialised" boolean DEFAULT false NOT NULL,
	"drawing_file_id" uuid,
	"note" text,
	"superseded_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "parts_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "parts_number_revision" UNIQUE("shop_id","number","revision")
);
--> statement-breakpoint
ALTER TABLE "parts" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "route_steps" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"part_id" uuid NOT NULL,
	"seq" integer NOT NULL,
	"process" "process" NOT NULL,
	"specification" text NOT NULL,
	"specification_revision" text,
	"class_type" text,
	"condition_before" text,
	"target_condition" text,
	"to_prove" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"note" text,
	CONSTRAINT "route_steps_shop" UNIQUE("shop_id","id"),
	CONSTRAINT "route_steps_order" UNIQUE("part_id","seq")
);
--> statement-breakpoint
ALTER TABLE "route_steps" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "api_tokens" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"name" text NOT NULL,
	"token_hash" text NOT NULL,
	"hint" text NOT NULL,
	"scopes" text[] NOT NULL,
	"expires_at" timestamp with time zone,
	"last_used_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "api_tokens_token" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "api_tokens" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner" text NOT NULL,
	"key" text NOT NULL,
	"operation" text NOT NULL,
	"request_hash" text NOT NULL,
	"status" integer,
	"response" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "idempotency_keys_once" UNIQUE("owner","key")
);
--> statement-breakpoint
ALTER TABLE "idempotency_keys" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "invitations" (
	"id" uuid PRIMARY KEY NOT NULL,
	"shop_id" uuid,
	"processor_id" uuid,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"roles" text[] NOT NULL,
	"token_hash" text NOT NULL,
	"invited_by" uuid,
	"expires_at" timestamp with time zone NOT NULL,
	"accepted_at" timestamp with time zone,
	"withdrawn_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "invitations_token" UNIQUE("token_hash"),
	CONSTRAINT "one_organisation" CHECK (("invitations"."shop_id" is null) <> ("invitations"."processor_id" is null))
);
--> statement-breakpoint
ALTER TABLE "invitations" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "mailed_links" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"purpose" "link_purpose" NOT NULL,
	"token_hash" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "mailed_links_token" UNIQUE("token_hash")
);
--> statement-breakpoint
ALTER TABLE "mailed_links" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "memberships" (
	"id" uuid PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"shop_id" uuid,
	"processor_id" uuid,
	"roles" text[] NOT NULL,
	"active" boolean DEFAULT true NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "one_membership_per_shop" UNIQUE("user_id","shop_id"),
	CONSTRAINT "one_membership_per_processor" UNIQUE("user_id","processor_id"),
	CONSTRAINT "one_organisation" CHECK (("memberships"."shop_id" is null) <> ("memberships"."processor_id" is null))
);
--> statement-breakpoint
ALTER TABLE "memberships" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text,
	"session_version" integer DEFAULT 1 NOT NULL,
	"active" boolean DEFAULT true NOT NULL,
	"units" "unit_system" DEFAULT 'inch' NOT NULL,
	"single_keys" boolean DEFAULT true NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "users_email" UNIQUE("email"),
	CONSTRAINT "email_is_lower_case" CHECK ("users"."email" = lower("users"."email"))
);
--> statement-breakpoint
ALTER TABLE "users" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "batch_documents" ADD CONSTRAINT "batch_documents_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_documents" ADD CONSTRAINT "batch_documents_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_lines" ADD CONSTRAINT "batch_lines_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_lines" ADD CONSTRAINT "batch_lines_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_lines" ADD CONSTRAINT "batch_lines_shop_id_step_id_route_steps_shop_id_id_fk" FOREIGN KEY ("shop_id","step_id") REFERENCES "public"."route_steps"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_links" ADD CONSTRAINT "batch_links_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batches" ADD CONSTRAINT "batches_shop_id_processor_id_shop_processors_shop_id_processor_id_fk" FOREIGN KEY ("shop_id","processor_id") REFERENCES "public"."shop_processors"("shop_id","processor_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_shop_id_line_id_batch_lines_shop_id_id_fk" FOREIGN KEY ("shop_id","line_id") REFERENCES "public"."batch_lines"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "overrides" ADD CONSTRAINT "overrides_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "promises" ADD CONSTRAINT "promises_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "requirements" ADD CONSTRAINT "requirements_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "requirements" ADD CONSTRAINT "requirements_shop_id_line_id_batch_lines_shop_id_id_fk" FOREIGN KEY ("shop_id","line_id") REFERENCES "public"."batch_lines"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "charts" ADD CONSTRAINT "charts_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "charts" ADD CONSTRAINT "charts_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "coverage" ADD CONSTRAINT "coverage_shop_id_signature_id_signatures_shop_id_id_fk" FOREIGN KEY ("shop_id","signature_id") REFERENCES "public"."signatures"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "coverage" ADD CONSTRAINT "coverage_shop_id_certificate_id_certificates_shop_id_id_fk" FOREIGN KEY ("shop_id","certificate_id") REFERENCES "public"."certificates"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "coverage" ADD CONSTRAINT "coverage_shop_id_line_id_batch_lines_shop_id_id_fk" FOREIGN KEY ("shop_id","line_id") REFERENCES "public"."batch_lines"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "decisions" ADD CONSTRAINT "decisions_shop_id_certificate_id_certificates_shop_id_id_fk" FOREIGN KEY ("shop_id","certificate_id") REFERENCES "public"."certificates"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "decisions" ADD CONSTRAINT "decisions_shop_id_requirement_id_requirements_shop_id_id_fk" FOREIGN KEY ("shop_id","requirement_id") REFERENCES "public"."requirements"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dispositions" ADD CONSTRAINT "dispositions_shop_id_nonconformance_id_nonconformances_shop_id_id_fk" FOREIGN KEY ("shop_id","nonconformance_id") REFERENCES "public"."nonconformances"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dispositions" ADD CONSTRAINT "dispositions_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossier_links" ADD CONSTRAINT "dossier_links_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossiers" ADD CONSTRAINT "dossiers_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossiers" ADD CONSTRAINT "dossiers_shop_id_document_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","document_file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dossiers" ADD CONSTRAINT "dossiers_shop_id_archive_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","archive_file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "nonconformances" ADD CONSTRAINT "nonconformances_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "nonconformances" ADD CONSTRAINT "nonconformances_shop_id_line_id_batch_lines_shop_id_id_fk" FOREIGN KEY ("shop_id","line_id") REFERENCES "public"."batch_lines"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "nonconformances" ADD CONSTRAINT "nonconformances_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "nonconformances" ADD CONSTRAINT "nonconformances_shop_id_requirement_id_requirements_shop_id_id_fk" FOREIGN KEY ("shop_id","requirement_id") REFERENCES "public"."requirements"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "nonconformances" ADD CONSTRAINT "nonconformances_shop_id_certificate_id_certificates_shop_id_id_fk" FOREIGN KEY ("shop_id","certificate_id") REFERENCES "public"."certificates"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipt_lines" ADD CONSTRAINT "receipt_lines_shop_id_receipt_id_receipts_shop_id_id_fk" FOREIGN KEY ("shop_id","receipt_id") REFERENCES "public"."receipts"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipt_lines" ADD CONSTRAINT "receipt_lines_shop_id_line_id_batch_lines_shop_id_id_fk" FOREIGN KEY ("shop_id","line_id") REFERENCES "public"."batch_lines"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipt_photos" ADD CONSTRAINT "receipt_photos_shop_id_receipt_id_receipts_shop_id_id_fk" FOREIGN KEY ("shop_id","receipt_id") REFERENCES "public"."receipts"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipt_photos" ADD CONSTRAINT "receipt_photos_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipts" ADD CONSTRAINT "receipts_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_shop_id_line_id_batch_lines_shop_id_id_fk" FOREIGN KEY ("shop_id","line_id") REFERENCES "public"."batch_lines"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_shop_id_certificate_id_certificates_shop_id_id_fk" FOREIGN KEY ("shop_id","certificate_id") REFERENCES "public"."certificates"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "balances" ADD CONSTRAINT "balances_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "locations" ADD CONSTRAINT "locations_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "lots" ADD CONSTRAINT "lots_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "lots" ADD CONSTRAINT "lots_shop_id_part_id_parts_shop_id_id_fk" FOREIGN KEY ("shop_id","part_id") REFERENCES "public"."parts"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "lots" ADD CONSTRAINT "lots_shop_id_mill_certificate_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","mill_certificate_file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "movements" ADD CONSTRAINT "movements_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pieces" ADD CONSTRAINT "pieces_shop_id_lot_id_lots_shop_id_id_fk" FOREIGN KEY ("shop_id","lot_id") REFERENCES "public"."lots"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "clearances" ADD CONSTRAINT "clearances_shop_id_invoice_id_invoices_shop_id_id_fk" FOREIGN KEY ("shop_id","invoice_id") REFERENCES "public"."invoices"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invoice_lines" ADD CONSTRAINT "invoice_lines_shop_id_invoice_id_invoices_shop_id_id_fk" FOREIGN KEY ("shop_id","invoice_id") REFERENCES "public"."invoices"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invoice_lines" ADD CONSTRAINT "invoice_lines_shop_id_line_id_batch_lines_shop_id_id_fk" FOREIGN KEY ("shop_id","line_id") REFERENCES "public"."batch_lines"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invoices" ADD CONSTRAINT "invoices_shop_id_batch_id_batches_shop_id_id_fk" FOREIGN KEY ("shop_id","batch_id") REFERENCES "public"."batches"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invoices" ADD CONSTRAINT "invoices_shop_id_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "money_entries" ADD CONSTRAINT "money_entries_shop_id_invoice_id_invoices_shop_id_id_fk" FOREIGN KEY ("shop_id","invoice_id") REFERENCES "public"."invoices"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "payments" ADD CONSTRAINT "payments_shop_id_invoice_id_invoices_shop_id_id_fk" FOREIGN KEY ("shop_id","invoice_id") REFERENCES "public"."invoices"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "approvals" ADD CONSTRAINT "approvals_shop_id_processor_id_shop_processors_shop_id_processor_id_fk" FOREIGN KEY ("shop_id","processor_id") REFERENCES "public"."shop_processors"("shop_id","processor_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "counters" ADD CONSTRAINT "counters_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shop_processors" ADD CONSTRAINT "shop_processors_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shop_processors" ADD CONSTRAINT "shop_processors_processor_id_processors_id_fk" FOREIGN KEY ("processor_id") REFERENCES "public"."processors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assemblies" ADD CONSTRAINT "assemblies_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assembly_needs" ADD CONSTRAINT "assembly_needs_shop_id_assembly_id_assemblies_shop_id_id_fk" FOREIGN KEY ("shop_id","assembly_id") REFERENCES "public"."assemblies"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "parts" ADD CONSTRAINT "parts_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "parts" ADD CONSTRAINT "parts_shop_id_drawing_file_id_files_shop_id_id_fk" FOREIGN KEY ("shop_id","drawing_file_id") REFERENCES "public"."files"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "route_steps" ADD CONSTRAINT "route_steps_shop_id_part_id_parts_shop_id_id_fk" FOREIGN KEY ("shop_id","part_id") REFERENCES "public"."parts"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_tokens" ADD CONSTRAINT "api_tokens_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_tokens" ADD CONSTRAINT "api_tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_processor_id_processors_id_fk" FOREIGN KEY ("processor_id") REFERENCES "public"."processors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_invited_by_users_id_fk" FOREIGN KEY ("invited_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mailed_links" ADD CONSTRAINT "mailed_links_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_processor_id_processors_id_fk" FOREIGN KEY ("processor_id") REFERENCES "public"."processors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_entity" ON "audit_entries" USING btree ("shop_id","entity","entity_id");--> statement-breakpoint
CREATE INDEX "batch_lines_of_lot" ON "batch_lines" USING btree ("shop_id","lot_id");--> statement-breakpoint
CREATE INDEX "batch_links_batch" ON "batch_links" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "batches_number_search" ON "batches" USING btree ("shop_id","number" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "batches_order_search" ON "batches" USING btree ("shop_id","order_number" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "batches_stage" ON "batches" USING btree ("shop_id","stage","id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "batches_newest" ON "batches" USING btree ("shop_id","id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "batches_processor" ON "batches" USING btree ("processor_id","id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "messages_batch" ON "messages" USING btree ("batch_id","id");--> statement-breakpoint
CREATE INDEX "promises_batch" ON "promises" USING btree ("batch_id","made_at");--> statement-breakpoint
CREATE INDEX "requirements_batch" ON "requirements" USING btree ("batch_id","seq");--> statement-breakpoint
CREATE INDEX "certificates_batch" ON "certificates" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "certificates_number_search" ON "certificates" USING btree ("shop_id","number" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "charts_batch" ON "charts" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "coverage_line" ON "coverage" USING btree ("line_id");--> statement-breakpoint
CREATE INDEX "dispositions_nonconformance" ON "dispositions" USING btree ("nonconformance_id");--> statement-breakpoint
CREATE INDEX "dossiers_lot" ON "dossiers" USING btree ("shop_id","lot_id");--> statement-breakpoint
CREATE INDEX "nonconformances_batch" ON "nonconformances" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "receipt_lines_line" ON "receipt_lines" USING btree ("line_id");--> statement-breakpoint
CREATE INDEX "receipt_photos_receipt" ON "receipt_photos" USING btree ("receipt_id");--> statement-breakpoint
CREATE INDEX "receipts_batch" ON "receipts" USING btree ("batch_id","received_at");--> statement-breakpoint
CREATE INDEX "releases_line" ON "releases" USING btree ("line_id");--> statement-breakpoint
CREATE INDEX "signatures_batch" ON "signatures" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "files_batch" ON "files" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "files_hash" ON "files" USING btree ("shop_id","sha256");--> statement-breakpoint
CREATE INDEX "balances_place" ON "balances" USING btree ("shop_id","place","holder_id") WHERE pieces > 0;--> statement-breakpoint
CREATE INDEX "lots_number_search" ON "lots" USING btree ("shop_id","number" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "lots_part" ON "lots" USING btree ("shop_id","part_id");--> statement-breakpoint
CREATE INDEX "movements_lot" ON "movements" USING btree ("shop_id","lot_id","moved_at");--> statement-breakpoint
CREATE INDEX "movements_line" ON "movements" USING btree ("batch_line_id");--> statement-breakpoint
CREATE UNIQUE INDEX "invoices_number_once" ON "invoices" USING btree ("shop_id","processor_id","number_key") WHERE refused_at is null;--> statement-breakpoint
CREATE INDEX "invoices_number_search" ON "invoices" USING btree ("shop_id","number" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "invoices_newest" ON "invoices" USING btree ("shop_id","id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "invoices_batch" ON "invoices" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "approvals_processor" ON "approvals" USING btree ("shop_id","processor_id");--> statement-breakpoint
CREATE INDEX "assembly_needs_part" ON "assembly_needs" USING btree ("shop_id","part_number");--> statement-breakpoint
CREATE INDEX "parts_number_search" ON "parts" USING btree ("shop_id","number" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "memberships_shop" ON "memberships" USING btree ("shop_id");--> statement-breakpoint
CREATE POLICY "own_shop_reads" ON "audit_entries" AS PERMISSIVE FOR SELECT TO "app_shop" USING (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_adds" ON "audit_entries" AS PERMISSIVE FOR INSERT TO "app_shop" WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "batch_documents" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "batch_documents" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "batch_lines" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "batch_lines" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "batch_links" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "door" ON "batch_links" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "batches" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_dispatched" ON "batches" AS PERMISSIVE FOR SELECT TO "app_portal" USING (processor_id = (select current_processor()) and dispatched_at is not null and ((select current_batch()) is null or id = (select current_batch())));--> statement-breakpoint
CREATE POLICY "door" ON "batches" AS PERMISSIVE FOR SELECT TO "app_door" USING ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "messages" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "messages" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "overrides" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "promises" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "promises" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "requirements" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "requirements" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "certificates" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "certificates" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "charts" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "charts" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "coverage" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "decisions" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "dispositions" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "dossier_links" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "door" ON "dossier_links" AS PERMISSIVE FOR SELECT TO "app_door" USING ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "dossiers" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "nonconformances" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "receipt_lines" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "receipt_photos" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "receipts" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "receipts" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "releases" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "signatures" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "files" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_its_files" ON "files" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches) and (processor_id = (select current_processor()) or purpose in ('traveller', 'purchase_order')));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "balances" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "locations" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "lots" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "movements" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "pieces" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "clearances" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "invoice_lines" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "invoices" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_batch" ON "invoices" AS PERMISSIVE FOR SELECT TO "app_portal" USING (batch_id in (select id from batches));--> statement-breakpoint
CREATE POLICY "door" ON "invoices" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "money_entries" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "door" ON "payment_events" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "payments" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "door" ON "payments" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "approvals" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "counters" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "shop_reads_its_processors" ON "processors" AS PERMISSIVE FOR SELECT TO "app_shop" USING (id in (select processor_id from shop_processors));--> statement-breakpoint
CREATE POLICY "portal_reads_itself" ON "processors" AS PERMISSIVE FOR SELECT TO "app_portal" USING (id = (select current_processor()));--> statement-breakpoint
CREATE POLICY "portal_changes_itself" ON "processors" AS PERMISSIVE FOR UPDATE TO "app_portal" USING (id = (select current_processor()) and (select current_batch()) is null);--> statement-breakpoint
CREATE POLICY "door" ON "processors" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "shop_processors" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_own" ON "shop_processors" AS PERMISSIVE FOR SELECT TO "app_portal" USING (processor_id = (select current_processor()));--> statement-breakpoint
CREATE POLICY "door" ON "shop_processors" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "shops" AS PERMISSIVE FOR ALL TO "app_shop" USING (id = (select current_shop())) WITH CHECK (id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "portal_reads_customers" ON "shops" AS PERMISSIVE FOR SELECT TO "app_portal" USING (id in (select shop_id from batches));--> statement-breakpoint
CREATE POLICY "door" ON "shops" AS PERMISSIVE FOR SELECT TO "app_door" USING ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "assemblies" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "assembly_needs" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "parts" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "route_steps" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_tokens_only" ON "api_tokens" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop()) and user_id = (select current_person())) WITH CHECK (shop_id = (select current_shop()) and user_id = (select current_person()));--> statement-breakpoint
CREATE POLICY "door" ON "api_tokens" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_keys_only" ON "idempotency_keys" AS PERMISSIVE FOR ALL TO "app_shop" USING (owner = (select current_key_owner())) WITH CHECK (owner = (select current_key_owner()));--> statement-breakpoint
CREATE POLICY "own_keys_only_portal" ON "idempotency_keys" AS PERMISSIVE FOR ALL TO "app_portal" USING (owner = (select current_key_owner())) WITH CHECK (owner = (select current_key_owner()));--> statement-breakpoint
CREATE POLICY "door" ON "idempotency_keys" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "invitations" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "door" ON "invitations" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "door" ON "mailed_links" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "own_shop_only" ON "memberships" AS PERMISSIVE FOR ALL TO "app_shop" USING (shop_id = (select current_shop())) WITH CHECK (shop_id = (select current_shop()));--> statement-breakpoint
CREATE POLICY "own_processor_only" ON "memberships" AS PERMISSIVE FOR SELECT TO "app_portal" USING (processor_id = (select current_processor()) and (select current_batch()) is null);--> statement-breakpoint
CREATE POLICY "door" ON "memberships" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));--> statement-breakpoint
CREATE POLICY "shop_reads_its_people" ON "users" AS PERMISSIVE FOR SELECT TO "app_shop" USING (id in (select user_id from memberships));--> statement-breakpoint
CREATE POLICY "shop_person_changes_self" ON "users" AS PERMISSIVE FOR UPDATE TO "app_shop" USING (id = (select current_person()));--> statement-breakpoint
CREATE POLICY "portal_reads_its_people" ON "users" AS PERMISSIVE FOR SELECT TO "app_portal" USING (id in (select user_id from memberships));--> statement-breakpoint
CREATE POLICY "portal_person_changes_self" ON "users" AS PERMISSIVE FOR UPDATE TO "app_portal" USING (id = (select current_person()));--> statement-breakpoint
CREATE POLICY "door" ON "users" AS PERMISSIVE FOR ALL TO "app_door" USING ((select at_the_door())) WITH CHECK ((select at_the_door()));