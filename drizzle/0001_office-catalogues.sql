CREATE TABLE "catalogues" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"file_name" text NOT NULL,
	"rows_json" text NOT NULL,
	"row_count" integer NOT NULL,
	"hash" text NOT NULL,
	"problems_json" text NOT NULL,
	"uploaded_at" timestamp with time zone NOT NULL,
	"uploaded_by" text NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "catalogues_pk" PRIMARY KEY("id"),
	CONSTRAINT "catalogues_not_empty" CHECK ("catalogues"."row_count" > 0)
);
--> statement-breakpoint
ALTER TABLE "revisions" ADD COLUMN "catalogue_id" uuid;--> statement-breakpoint
ALTER TABLE "catalogues" ADD CONSTRAINT "catalogues_office_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "catalogues_in_force_unique" ON "catalogues" USING btree ("office_id") WHERE "catalogues"."ended_at" is null;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_catalogue_fk" FOREIGN KEY ("catalogue_id") REFERENCES "public"."catalogues"("id") ON DELETE no action ON UPDATE no action;