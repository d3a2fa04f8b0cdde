CREATE TABLE "client_index" (
	"workshop_id" uuid NOT NULL,
	"client_id" uuid NOT NULL,
	"text" text NOT NULL,
	"sort_key" text NOT NULL,
	"removed" boolean NOT NULL,
	CONSTRAINT "client_index_workshop_id_client_id_pk" PRIMARY KEY("workshop_id","client_id")
);
--> statement-breakpoint
CREATE TABLE "clients" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"name" text NOT NULL,
	"phone" text NOT NULL,
	"phone_e164" text,
	"email" text NOT NULL,
	"address" text NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "clients_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "garments" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"order_id" uuid NOT NULL,
	"wearer_id" uuid,
	"kind" text NOT NULL,
	"set_id" uuid,
	"sleeve_id" uuid,
	"fitting_on" date,
	"note" text NOT NULL,
	"position" integer NOT NULL,
	CONSTRAINT "garments_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "journal_marks" (
	"device" uuid PRIMARY KEY NOT NULL,
	"applied" integer NOT NULL,
	"counts" jsonb NOT NULL
);
--> statement-breakpoint
CREATE TABLE "measurement_sets" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"wearer_id" uuid NOT NULL,
	"taken_on" date NOT NULL,
	"taken_by" text NOT NULL,
	"figures" jsonb NOT NULL,
	"note" text NOT NULL,
	"corrects_id" uuid,
	CONSTRAINT "measurement_sets_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "order_sums" (
	"workshop_id" uuid NOT NULL,
	"order_id" uuid NOT NULL,
	"total_minor" bigint NOT NULL,
	"balance_minor" bigint NOT NULL,
	CONSTRAINT "order_sums_workshop_id_order_id_pk" PRIMARY KEY("workshop_id","order_id")
);
--> statement-breakpoint
CREATE TABLE "orders" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"client_id" uuid NOT NULL,
	"occasion" text NOT NULL,
	"agreed_on" date NOT NULL,
	"due_on" date,
	"stage" text NOT NULL,
	"currency" text NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "orders_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "payments" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"order_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"method" text NOT NULL,
	"amount_minor" bigint NOT NULL,
	"paid_on" date NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "payments_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "price_lines" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"order_id" uuid NOT NULL,
	"garment_id" uuid,
	"text" text NOT NULL,
	"quantity" integer NOT NULL,
	"unit_minor" bigint NOT NULL,
	"position" integer NOT NULL,
	CONSTRAINT "price_lines_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "receipts" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"payment_id" uuid NOT NULL,
	"order_id" uuid NOT NULL,
	"number" text NOT NULL,
	"issued_on" date NOT NULL,
	"snapshot" jsonb NOT NULL,
	CONSTRAINT "receipts_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "sleeves" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"wearer_id" uuid,
	"set_id" uuid,
	"name" text NOT NULL,
	"style" text NOT NULL,
	"ask" jsonb NOT NULL,
	"fineness" integer NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "sleeves_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "wearers" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"client_id" uuid NOT NULL,
	"name" text NOT NULL,
	"birth_year" integer,
	"birth_month" integer,
	"age_years" integer,
	"age_on" date,
	"note" text NOT NULL,
	CONSTRAINT "wearers_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE TABLE "workshops" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"name" text NOT NULL,
	"unit" text NOT NULL,
	"fineness" integer NOT NULL,
	"currency" text NOT NULL,
	"country" text NOT NULL,
	"address" text NOT NULL,
	"phone" text NOT NULL,
	"demo" boolean NOT NULL,
	CONSTRAINT "workshops_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE INDEX "client_index_workshop_id_removed_sort_key_index" ON "client_index" USING btree ("workshop_id","removed","sort_key");--> statement-breakpoint
CREATE INDEX "garments_workshop_id_order_id_index" ON "garments" USING btree ("workshop_id","order_id");--> statement-breakpoint
CREATE INDEX "garments_workshop_id_fitting_on_index" ON "garments" USING btree ("workshop_id","fitting_on");--> statement-breakpoint
CREATE INDEX "measurement_sets_workshop_id_wearer_id_index" ON "measurement_sets" USING btree ("workshop_id","wearer_id");--> statement-breakpoint
CREATE INDEX "order_sums_workshop_id_balance_minor_index" ON "order_sums" USING btree ("workshop_id","balance_minor");--> statement-breakpoint
CREATE INDEX "orders_workshop_id_client_id_index" ON "orders" USING btree ("workshop_id","client_id");--> statement-breakpoint
CREATE INDEX "orders_workshop_id_stage_due_on_index" ON "orders" USING btree ("workshop_id","stage","due_on");--> statement-breakpoint
CREATE INDEX "payments_workshop_id_order_id_index" ON "payments" USING btree ("workshop_id","order_id");--> statement-breakpoint
CREATE INDEX "price_lines_workshop_id_order_id_index" ON "price_lines" USING btree ("workshop_id","order_id");--> statement-breakpoint
CREATE INDEX "receipts_workshop_id_order_id_index" ON "receipts" USING btree ("workshop_id","order_id");--> statement-breakpoint
CREATE INDEX "receipts_workshop_id_number_index" ON "receipts" USING btree ("workshop_id","number");--> statement-breakpoint
CREATE INDEX "sleeves_workshop_id_wearer_id_index" ON "sleeves" USING btree ("workshop_id","wearer_id");--> statement-breakpoint
CREATE INDEX "wearers_workshop_id_client_id_index" ON "wearers" USING btree ("workshop_id","client_id");