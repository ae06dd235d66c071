CREATE TABLE "audit_events" (
	"id" bigint GENERATED ALWAYS AS IDENTITY (sequence name "audit_events_id_sequence" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"office_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"who" text NOT NULL,
	"action" text NOT NULL,
	"project" text,
	"detail" text NOT NULL,
	CONSTRAINT "audit_events_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
CREATE TABLE "dispositions" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"revision_id" uuid NOT NULL,
	"reviewer_id" uuid NOT NULL,
	"outcome" text NOT NULL,
	"reason" text NOT NULL,
	"content_hash" text NOT NULL,
	"set_at" timestamp with time zone NOT NULL,
	CONSTRAINT "dispositions_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
CREATE TABLE "mails" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"project_id" uuid,
	"event" text NOT NULL,
	"to_name" text NOT NULL,
	"to_email" text NOT NULL,
	"subject" text NOT NULL,
	"text" text NOT NULL,
	"html" text NOT NULL,
	"state" text NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"problem" text,
	"created_at" timestamp with time zone NOT NULL,
	"sent_at" timestamp with time zone,
	CONSTRAINT "mails_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
CREATE TABLE "makings" (
	"revision_id" uuid NOT NULL,
	"set" text NOT NULL,
	"stage" integer DEFAULT 0 NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"problem" text,
	"asked_by" uuid NOT NULL,
	"asked_at" timestamp with time zone NOT NULL,
	"override_reason" text,
	CONSTRAINT "makings_pk" PRIMARY KEY("revision_id","set")
);
--> statement-breakpoint
CREATE TABLE "members" (
	"project_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"roles" text[] NOT NULL,
	"required_reviewer" boolean DEFAULT false NOT NULL,
	CONSTRAINT "members_pk" PRIMARY KEY("project_id","user_id"),
	CONSTRAINT "members_roles_known" CHECK ("members"."roles" <@ array['consultant', 'reviewer', 'contractor'])
);
--> statement-breakpoint
CREATE TABLE "offices" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "offices_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
CREATE TABLE "projects" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"number" text NOT NULL,
	"title" text NOT NULL,
	"client" text DEFAULT '' NOT NULL,
	"last_redline" integer DEFAULT 0 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "projects_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
CREATE TABLE "redline_messages" (
	"redline_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"author_id" uuid NOT NULL,
	"text" text NOT NULL,
	"did" text NOT NULL,
	"written_at" timestamp with time zone NOT NULL,
	CONSTRAINT "redline_messages_pk" PRIMARY KEY("redline_id","position")
);
--> statement-breakpoint
CREATE TABLE "redlines" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"revision_id" uuid NOT NULL,
	"anchor" jsonb NOT NULL,
	"quoted" text NOT NULL,
	"proposed_value" text,
	"must_answer" boolean NOT NULL,
	"author_id" uuid NOT NULL,
	"state" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"closed_by" uuid,
	CONSTRAINT "redlines_pk" PRIMARY KEY("id"),
	CONSTRAINT "redlines_number_unique" UNIQUE("project_id","number")
);
--> statement-breakpoint
CREATE TABLE "revision_files" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"revision_id" uuid NOT NULL,
	"set" text NOT NULL,
	"kind" text NOT NULL,
	"name" text NOT NULL,
	"size" integer NOT NULL,
	"sha256" text NOT NULL,
	"content" "bytea" NOT NULL,
	"made_at" timestamp with time zone NOT NULL,
	CONSTRAINT "revision_files_pk" PRIMARY KEY("id"),
	CONSTRAINT "revision_files_kind_unique" UNIQUE("revision_id","set","kind"),
	CONSTRAINT "revision_files_name_unique" UNIQUE("revision_id","name")
);
--> statement-breakpoint
CREATE TABLE "revisions" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"sequence" integer NOT NULL,
	"label" text NOT NULL,
	"spec_text" text NOT NULL,
	"result_json" text NOT NULL,
	"engine" text NOT NULL,
	"content_hash" text NOT NULL,
	"note" text NOT NULL,
	"issued_at" timestamp with time zone NOT NULL,
	"issued_by" uuid NOT NULL,
	"construction_at" timestamp with time zone,
	"construction_by" uuid,
	"override_reason" text,
	"superseded_at" timestamp with time zone,
	"withdrawn_at" timestamp with time zone,
	"withdrawn_by" uuid,
	"withdraw_reason" text,
	CONSTRAINT "revisions_pk" PRIMARY KEY("id"),
	CONSTRAINT "revisions_sequence_unique" UNIQUE("project_id","sequence"),
	CONSTRAINT "revisions_label_unique" UNIQUE("project_id","label"),
	CONSTRAINT "revisions_construction_whole" CHECK (("revisions"."construction_at" is null) = ("revisions"."construction_by" is null)),
	CONSTRAINT "revisions_withdrawal_whole" CHECK (("revisions"."withdrawn_at" is null) = ("revisions"."withdraw_reason" is null))
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text NOT NULL,
	"user_id" uuid NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"last_seen_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "sessions_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
CREATE TABLE "specs" (
	"project_id" uuid NOT NULL,
	"text" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	"saved_by" uuid NOT NULL,
	CONSTRAINT "specs_pk" PRIMARY KEY("project_id")
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"initials" text NOT NULL,
	"password_hash" text NOT NULL,
	"administrator" boolean DEFAULT false NOT NULL,
	"may_create_projects" boolean DEFAULT false NOT NULL,
	"active" boolean DEFAULT true NOT NULL,
	"last_sign_in_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "users_pk" PRIMARY KEY("id"),
	CONSTRAINT "users_email_unique" UNIQUE("email")
);
--> statement-breakpoint
ALTER TABLE "audit_events" ADD CONSTRAINT "audit_events_office_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dispositions" ADD CONSTRAINT "dispositions_revision_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "dispositions" ADD CONSTRAINT "dispositions_reviewer_fk" FOREIGN KEY ("reviewer_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mails" ADD CONSTRAINT "mails_office_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mails" ADD CONSTRAINT "mails_project_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "makings" ADD CONSTRAINT "makings_revision_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "makings" ADD CONSTRAINT "makings_asked_by_fk" FOREIGN KEY ("asked_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "members" ADD CONSTRAINT "members_project_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "members" ADD CONSTRAINT "members_user_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "projects" ADD CONSTRAINT "projects_office_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "redline_messages" ADD CONSTRAINT "redline_messages_redline_fk" FOREIGN KEY ("redline_id") REFERENCES "public"."redlines"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "redline_messages" ADD CONSTRAINT "redline_messages_author_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "redlines" ADD CONSTRAINT "redlines_project_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "redlines" ADD CONSTRAINT "redlines_revision_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "redlines" ADD CONSTRAINT "redlines_author_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "redlines" ADD CONSTRAINT "redlines_closed_by_fk" FOREIGN KEY ("closed_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revision_files" ADD CONSTRAINT "revision_files_revision_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_project_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_issued_by_fk" FOREIGN KEY ("issued_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_construction_by_fk" FOREIGN KEY ("construction_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_withdrawn_by_fk" FOREIGN KEY ("withdrawn_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_project_fk" FOREIGN KEY ("project_id") REFERENCES "public"."projects"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_saved_by_fk" FOREIGN KEY ("saved_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "users" ADD CONSTRAINT "users_office_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_events_office_index" ON "audit_events" USING btree ("office_id","id");--> statement-breakpoint
CREATE INDEX "dispositions_revision_index" ON "dispositions" USING btree ("revision_id");--> statement-breakpoint
CREATE INDEX "mails_office_index" ON "mails" USING btree ("office_id","created_at");--> statement-breakpoint
CREATE UNIQUE INDEX "projects_number_unique" ON "projects" USING btree ("office_id",lower("number"));--> statement-breakpoint
CREATE INDEX "sessions_user_index" ON "sessions" USING btree ("user_id");