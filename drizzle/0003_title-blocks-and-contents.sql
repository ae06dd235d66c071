CREATE TABLE "file_sets" (
	"revision_id" uuid NOT NULL,
	"set" text NOT NULL,
	"units" text NOT NULL,
	"with_redlines" boolean NOT NULL,
	"with_verification" boolean NOT NULL,
	"title_block_id" uuid,
	"no_pages" text,
	"no_pdf" text,
	"made_at" timestamp with time zone NOT NULL,
	CONSTRAINT "file_sets_pk" PRIMARY KEY("revision_id","set")
);
--> statement-breakpoint
CREATE TABLE "office_logos" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"file_name" text NOT NULL,
	"type" text NOT NULL,
	"width" integer NOT NULL,
	"height" integer NOT NULL,
	"sha256" text NOT NULL,
	"content" "bytea" NOT NULL,
	"uploaded_at" timestamp with time zone NOT NULL,
	CONSTRAINT "office_logos_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
CREATE TABLE "review_copies" (
	"revision_id" uuid NOT NULL,
	"asked_at" timestamp with time zone NOT NULL,
	"asked_by" text NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"problem" text,
	"name" text,
	"redlines" integer,
	"size" integer,
	"sha256" text,
	"content" "bytea",
	CONSTRAINT "review_copies_pk" PRIMARY KEY("revision_id")
);
--> statement-breakpoint
CREATE TABLE "title_blocks" (
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"office_id" uuid NOT NULL,
	"name" text NOT NULL,
	"lines" text[] NOT NULL,
	"prepared" text NOT NULL,
	"checked" text NOT NULL,
	"approved" text NOT NULL,
	"paper" text NOT NULL,
	"logo_id" uuid,
	"set_at" timestamp with time zone NOT NULL,
	"set_by" text NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "title_blocks_pk" PRIMARY KEY("id")
);
--> statement-breakpoint
ALTER TABLE "makings" ADD COLUMN "units" text;--> statement-breakpoint
ALTER TABLE "makings" ADD COLUMN "with_redlines" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "makings" ADD COLUMN "with_verification" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "makings" ADD COLUMN "title_block_id" uuid;--> statement-breakpoint
ALTER TABLE "redlines" ADD COLUMN "office_only" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "redlines" ADD COLUMN "published_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "file_sets" ADD CONSTRAINT "file_sets_revision_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "file_sets" ADD CONSTRAINT "file_sets_title_block_fk" FOREIGN KEY ("title_block_id") REFERENCES "public"."title_blocks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "office_logos" ADD CONSTRAINT "office_logos_office_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "review_copies" ADD CONSTRAINT "review_copies_revision_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "title_blocks" ADD CONSTRAINT "title_blocks_office_fk" FOREIGN KEY ("office_id") REFERENCES "public"."offices"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "title_blocks" ADD CONSTRAINT "title_blocks_logo_fk" FOREIGN KEY ("logo_id") REFERENCES "public"."office_logos"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "title_blocks_in_force_unique" ON "title_blocks" USING btree ("office_id") WHERE "title_blocks"."ended_at" is null;--> statement-breakpoint
ALTER TABLE "makings" ADD CONSTRAINT "makings_title_block_fk" FOREIGN KEY ("title_block_id") REFERENCES "public"."title_blocks"("id") ON DELETE no action ON UPDATE no action;