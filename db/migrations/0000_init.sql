CREATE TABLE "builds" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"summary" text DEFAULT '' NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "builds_workshop_id_id_pk" PRIMARY KEY("workshop_id","id"),
	CONSTRAINT "builds_name_length" CHECK (length("builds"."name") between 1 and 120),
	CONSTRAINT "builds_summary_length" CHECK (length("builds"."summary") <= 2000)
);
--> statement-breakpoint
ALTER TABLE "builds" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "comments" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"study_id" uuid NOT NULL,
	"revision_number" integer,
	"pin" text NOT NULL,
	"hardpoint_path" text,
	"text" text NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"resolved_by" uuid,
	"resolved_at" timestamp with time zone,
	CONSTRAINT "comments_workshop_id_id_pk" PRIMARY KEY("workshop_id","id"),
	CONSTRAINT "comments_text_length" CHECK (length("comments"."text") between 1 and 4000),
	CONSTRAINT "comments_pin" CHECK ("comments"."pin" in ('study', 'hardpoint')),
	CONSTRAINT "comments_pin_path" CHECK (("comments"."pin" = 'hardpoint') = ("comments"."hardpoint_path" is not null)),
	CONSTRAINT "comments_resolved" CHECK (("comments"."resolved_by" is null) = ("comments"."resolved_at" is null))
);
--> statement-breakpoint
ALTER TABLE "comments" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "draft_edits" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"study_id" uuid NOT NULL,
	"version" integer NOT NULL,
	"base_version" integer NOT NULL,
	"request_hash" text NOT NULL,
	"edits" jsonb NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "draft_edits_workshop_id_id_pk" PRIMARY KEY("workshop_id","id"),
	CONSTRAINT "draft_edits_version" UNIQUE("workshop_id","study_id","version"),
	CONSTRAINT "draft_edits_base" CHECK ("draft_edits"."base_version" >= 1 and "draft_edits"."base_version" < "draft_edits"."version"),
	CONSTRAINT "draft_edits_list" CHECK (jsonb_typeof("draft_edits"."edits") = 'array')
);
--> statement-breakpoint
ALTER TABLE "draft_edits" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "memberships" (
	"workshop_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "memberships_workshop_id_person_id_pk" PRIMARY KEY("workshop_id","person_id"),
	CONSTRAINT "memberships_role" CHECK ("memberships"."role" in ('owner', 'engineer', 'fabricator', 'reviewer'))
);
--> statement-breakpoint
ALTER TABLE "memberships" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "outbox" (
	"id" uuid PRIMARY KEY NOT NULL,
	"message_id" text NOT NULL,
	"to_address" text NOT NULL,
	"to_name" text NOT NULL,
	"subject" text NOT NULL,
	"body_text" text NOT NULL,
	"body_html" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"next_attempt_at" timestamp with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp with time zone,
	"given_up_at" timestamp with time zone,
	"last_error" text,
	CONSTRAINT "outbox_message_id_unique" UNIQUE("message_id"),
	CONSTRAINT "outbox_ended_once" CHECK ("outbox"."sent_at" is null or "outbox"."given_up_at" is null),
	CONSTRAINT "outbox_subject_line" CHECK ("outbox"."subject" !~ '[\r\n]')
);
--> statement-breakpoint
CREATE TABLE "people" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text NOT NULL,
	"units" text DEFAULT 'mm' NOT NULL,
	"dialect" text DEFAULT 'uk' NOT NULL,
	"theme" text DEFAULT 'system' NOT NULL,
	"cautions_acknowledged_at" timestamp with time zone NOT NULL,
	"cautions_edition" integer NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "people_email_is_small" CHECK ("people"."email" = lower("people"."email")),
	CONSTRAINT "people_email_length" CHECK (length("people"."email") between 3 and 254),
	CONSTRAINT "people_name_length" CHECK (length("people"."name") between 1 and 120),
	CONSTRAINT "people_units" CHECK ("people"."units" in ('mm', 'inch')),
	CONSTRAINT "people_dialect" CHECK ("people"."dialect" in ('uk', 'us')),
	CONSTRAINT "people_theme" CHECK ("people"."theme" in ('light', 'dark', 'system'))
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" varchar(255) PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "revisions" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"study_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"version" integer NOT NULL,
	"study" jsonb NOT NULL,
	"study_format" text NOT NULL,
	"hash" text NOT NULL,
	"note" text NOT NULL,
	"status" text DEFAULT 'saved' NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "revisions_workshop_id_id_pk" PRIMARY KEY("workshop_id","id"),
	CONSTRAINT "revisions_number" UNIQUE("workshop_id","study_id","number"),
	CONSTRAINT "revisions_number_counts" CHECK ("revisions"."number" >= 1),
	CONSTRAINT "revisions_hash_form" CHECK ("revisions"."hash" ~ '^[0-9a-f]{64}$'),
	CONSTRAINT "revisions_note_length" CHECK (length("revisions"."note") <= 2000),
	CONSTRAINT "revisions_study_format" CHECK ("revisions"."study" ->> 'format' is not distinct from "revisions"."study_format"),
	CONSTRAINT "revisions_status" CHECK ("revisions"."status" in ('saved', 'inReview', 'changesAsked', 'approved', 'released', 'superseded'))
);
--> statement-breakpoint
ALTER TABLE "revisions" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "sessions" (
	"sid" varchar PRIMARY KEY NOT NULL,
	"sess" json NOT NULL,
	"expire" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sheets" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"study_id" uuid NOT NULL,
	"revision_number" integer NOT NULL,
	"kind" text NOT NULL,
	"units" text NOT NULL,
	"status" text DEFAULT 'queued' NOT NULL,
	"failure" text,
	"storage_key" text,
	"file_name" text,
	"byte_size" integer,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"finished_at" timestamp with time zone,
	CONSTRAINT "sheets_workshop_id_id_pk" PRIMARY KEY("workshop_id","id"),
	CONSTRAINT "sheets_kind" CHECK ("sheets"."kind" in ('hardpointTable')),
	CONSTRAINT "sheets_units" CHECK ("sheets"."units" in ('mm', 'inch')),
	CONSTRAINT "sheets_status" CHECK ("sheets"."status" in ('queued', 'made', 'failed')),
	CONSTRAINT "sheets_made" CHECK (("sheets"."status" = 'made') = ("sheets"."storage_key" is not null and "sheets"."file_name" is not null and "sheets"."byte_size" is not null)),
	CONSTRAINT "sheets_failed" CHECK (("sheets"."status" = 'failed') = ("sheets"."failure" is not null)),
	CONSTRAINT "sheets_finished" CHECK (("sheets"."status" = 'queued') = ("sheets"."finished_at" is null))
);
--> statement-breakpoint
ALTER TABLE "sheets" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "studies" (
	"workshop_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"build_id" uuid NOT NULL,
	"name" text NOT NULL,
	"draft" jsonb NOT NULL,
	"draft_format" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_by" uuid NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "studies_workshop_id_id_pk" PRIMARY KEY("workshop_id","id"),
	CONSTRAINT "studies_name_length" CHECK (length("studies"."name") between 1 and 120),
	CONSTRAINT "studies_version" CHECK ("studies"."version" >= 1),
	CONSTRAINT "studies_draft_format" CHECK ("studies"."draft" ->> 'format' is not distinct from "studies"."draft_format")
);
--> statement-breakpoint
ALTER TABLE "studies" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "workshops" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "workshops_name_length" CHECK (length("workshops"."name") between 1 and 120)
);
--> statement-breakpoint
ALTER TABLE "workshops" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "builds" ADD CONSTRAINT "builds_workshop_id_workshops_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "builds" ADD CONSTRAINT "builds_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_resolved_by_people_id_fk" FOREIGN KEY ("resolved_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_study" FOREIGN KEY ("workshop_id","study_id") REFERENCES "public"."studies"("workshop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_revision" FOREIGN KEY ("workshop_id","study_id","revision_number") REFERENCES "public"."revisions"("workshop_id","study_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "draft_edits" ADD CONSTRAINT "draft_edits_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "draft_edits" ADD CONSTRAINT "draft_edits_study" FOREIGN KEY ("workshop_id","study_id") REFERENCES "public"."studies"("workshop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_workshop_id_workshops_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_study" FOREIGN KEY ("workshop_id","study_id") REFERENCES "public"."studies"("workshop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sheets" ADD CONSTRAINT "sheets_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sheets" ADD CONSTRAINT "sheets_revision" FOREIGN KEY ("workshop_id","study_id","revision_number") REFERENCES "public"."revisions"("workshop_id","study_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "studies" ADD CONSTRAINT "studies_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "studies" ADD CONSTRAINT "studies_updated_by_people_id_fk" FOREIGN KEY ("updated_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "studies" ADD CONSTRAINT "studies_build" FOREIGN KEY ("workshop_id","build_id") REFERENCES "public"."builds"("workshop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "builds_newest" ON "builds" USING btree ("workshop_id","created_at");--> statement-breakpoint
CREATE INDEX "comments_of_study" ON "comments" USING btree ("workshop_id","study_id","created_at");--> statement-breakpoint
CREATE INDEX "memberships_person" ON "memberships" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "outbox_due" ON "outbox" USING btree ("next_attempt_at") WHERE sent_at is null and given_up_at is null;--> statement-breakpoint
CREATE UNIQUE INDEX "people_email" ON "people" USING btree ("email");--> statement-breakpoint
CREATE INDEX "rate_limits_expire" ON "rate_limits" USING btree ("expire");--> statement-breakpoint
CREATE INDEX "sessions_expire" ON "sessions" USING btree ("expire");--> statement-breakpoint
CREATE INDEX "sheets_of_study" ON "sheets" USING btree ("workshop_id","study_id","created_at");--> statement-breakpoint
CREATE INDEX "studies_of_build" ON "studies" USING btree ("workshop_id","build_id","created_at");--> statement-breakpoint
CREATE POLICY "only_its_workshop" ON "builds" AS PERMISSIVE FOR ALL TO "linkwright_app" USING (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid) WITH CHECK (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "only_its_workshop" ON "comments" AS PERMISSIVE FOR ALL TO "linkwright_app" USING (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid) WITH CHECK (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "only_its_workshop" ON "draft_edits" AS PERMISSIVE FOR ALL TO "linkwright_app" USING (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid) WITH CHECK (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_the_workshop_or_ones_own" ON "memberships" AS PERMISSIVE FOR SELECT TO "linkwright_app" USING (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid or person_id = nullif(current_setting('linkwright.person_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "made_in_the_workshop" ON "memberships" AS PERMISSIVE FOR INSERT TO "linkwright_app" WITH CHECK (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "only_its_workshop" ON "revisions" AS PERMISSIVE FOR ALL TO "linkwright_app" USING (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid) WITH CHECK (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "only_its_workshop" ON "sheets" AS PERMISSIVE FOR ALL TO "linkwright_app" USING (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid) WITH CHECK (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "only_its_workshop" ON "studies" AS PERMISSIVE FOR ALL TO "linkwright_app" USING (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid) WITH CHECK (workshop_id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "itself_or_ones_own" ON "workshops" AS PERMISSIVE FOR SELECT TO "linkwright_app" USING (id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid or id in (select memberships.workshop_id from memberships where memberships.person_id = nullif(current_setting('linkwright.person_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "made_as_itself" ON "workshops" AS PERMISSIVE FOR INSERT TO "linkwright_app" WITH CHECK (id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "changed_as_itself" ON "workshops" AS PERMISSIVE FOR UPDATE TO "linkwright_app" USING (id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid) WITH CHECK (id = nullif(current_setting('linkwright.workshop_id', true), '')::uuid);