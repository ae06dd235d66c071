CREATE TABLE "assumption_changes" (
	"id" bigint GENERATED ALWAYS AS IDENTITY (sequence name "assumption_changes_id_sequence" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"project_id" uuid NOT NULL,
	"assumption" text NOT NULL,
	"value" text,
	"reason" text NOT NULL,
	"changed_at" timestamp with time zone NOT NULL,
	"changed_by" uuid NOT NULL,
	CONSTRAINT "assumption_changes_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
ALTER TABLE "assumption_changes" ADD CONSTRAINT "assumption_changes_project_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "assumption_changes" ADD CONSTRAINT "assumption_changes_changed_by_fk" FOREIGN KEY ("changed_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "assumption_changes_project_index" ON "assumption_changes" USING btree ("project_id","id");