CREATE TABLE "sums" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"stamps" jsonb NOT NULL,
	"removed_at" text,
	"order_id" uuid,
	"kind" text NOT NULL,
	"name" text NOT NULL,
	"inputs" jsonb NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "sums_workshop_id_id_pk" PRIMARY KEY("workshop_id","id")
);
--> statement-breakpoint
CREATE INDEX "sums_workshop_id_order_id_index" ON "sums" USING btree ("workshop_id","order_id");