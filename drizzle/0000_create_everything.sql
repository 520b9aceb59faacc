CREATE TABLE "comment_reads" (
	"journal_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"read_up_to" timestamp with time zone NOT NULL,
	CONSTRAINT "comment_reads_journal_id_user_id_pk" PRIMARY KEY("journal_id","user_id")
);
--> statement-breakpoint
CREATE TABLE "comments" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"subject" text NOT NULL,
	"subject_key" text NOT NULL,
	"kind" text NOT NULL,
	"body" text NOT NULL,
	"in_reply_to" uuid,
	"author_id" uuid NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "comments_journal_id_id_pk" PRIMARY KEY("journal_id","id")
);
--> statement-breakpoint
CREATE TABLE "day_flags" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"code" text NOT NULL,
	"first_day" integer NOT NULL,
	"last_day" integer NOT NULL,
	"strength" smallint NOT NULL,
	"note" text NOT NULL,
	"is_graph_seen" boolean NOT NULL,
	"set_by" uuid NOT NULL,
	"set_at" timestamp with time zone NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "day_flags_journal_id_id_pk" PRIMARY KEY("journal_id","id")
);
--> statement-breakpoint
CREATE TABLE "entries" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"kind" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"data" jsonb NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"updated_at" timestamp with time zone NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "entries_journal_id_id_pk" PRIMARY KEY("journal_id","id")
);
--> statement-breakpoint
CREATE TABLE "daily_rollups" (
	"journal_id" uuid NOT NULL,
	"day_number" integer NOT NULL,
	"part" text NOT NULL,
	"readings" integer NOT NULL,
	"sum_mg_dl" double precision NOT NULL,
	"sum_squares" double precision NOT NULL,
	"band_counts" integer[] NOT NULL,
	"histogram" integer[] NOT NULL,
	"minutes_in_part" integer NOT NULL,
	"interval_minutes" integer NOT NULL,
	CONSTRAINT "daily_rollups_journal_id_part_day_number_pk" PRIMARY KEY("journal_id","part","day_number")
);
--> statement-breakpoint
CREATE TABLE "glucose_readings" (
	"journal_id" uuid NOT NULL,
	"source" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"glucose_mg_dl" double precision NOT NULL,
	"source_value" real NOT NULL,
	"source_unit" text NOT NULL,
	"bound" text,
	"band" smallint NOT NULL,
	"import_id" uuid NOT NULL,
	CONSTRAINT "glucose_readings_journal_id_source_at_pk" PRIMARY KEY("journal_id","source","at")
) PARTITION BY HASH ("journal_id");
--> statement-breakpoint
CREATE TABLE "glucose_readings_0" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 0);
--> statement-breakpoint
CREATE TABLE "glucose_readings_1" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 1);
--> statement-breakpoint
CREATE TABLE "glucose_readings_2" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 2);
--> statement-breakpoint
CREATE TABLE "glucose_readings_3" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 3);
--> statement-breakpoint
CREATE TABLE "glucose_readings_4" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 4);
--> statement-breakpoint
CREATE TABLE "glucose_readings_5" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 5);
--> statement-breakpoint
CREATE TABLE "glucose_readings_6" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 6);
--> statement-breakpoint
CREATE TABLE "glucose_readings_7" PARTITION OF "glucose_readings" FOR VALUES WITH (MODULUS 8, REMAINDER 7);
--> statement-breakpoint
CREATE TABLE "import_chunks" (
	"journal_id" uuid NOT NULL,
	"import_id" uuid NOT NULL,
	"seq" integer NOT NULL,
	"bytes" "bytea" NOT NULL,
	CONSTRAINT "import_chunks_journal_id_import_id_seq_pk" PRIMARY KEY("journal_id","import_id","seq")
);
--> statement-breakpoint
CREATE TABLE "import_refusals" (
	"journal_id" uuid NOT NULL,
	"import_id" uuid NOT NULL,
	"line" integer NOT NULL,
	"reason" text NOT NULL,
	"text" text NOT NULL,
	CONSTRAINT "import_refusals_journal_id_import_id_line_pk" PRIMARY KEY("journal_id","import_id","line")
);
--> statement-breakpoint
CREATE TABLE "imports" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"status" text NOT NULL,
	"file_name" text NOT NULL,
	"file_hash" text NOT NULL,
	"byte_count" integer NOT NULL,
	"source" text NOT NULL,
	"mapping" jsonb,
	"unit" text,
	"unit_evidence" text DEFAULT '' NOT NULL,
	"time_zone" text,
	"row_count" integer DEFAULT 0 NOT NULL,
	"accepted_count" integer DEFAULT 0 NOT NULL,
	"duplicate_count" integer DEFAULT 0 NOT NULL,
	"refused_count" integer DEFAULT 0 NOT NULL,
	"first_at" timestamp with time zone,
	"last_at" timestamp with time zone,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"heartbeat_at" timestamp with time zone,
	"finished_at" timestamp with time zone,
	"stop_reason" text DEFAULT '' NOT NULL,
	CONSTRAINT "imports_journal_id_id_pk" PRIMARY KEY("journal_id","id")
);
--> statement-breakpoint
CREATE TABLE "insulin_deliveries" (
	"journal_id" uuid NOT NULL,
	"source" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"kind" text NOT NULL,
	"milli_units" integer NOT NULL,
	"duration_minutes" integer NOT NULL,
	CONSTRAINT "insulin_deliveries_journal_id_source_kind_at_pk" PRIMARY KEY("journal_id","source","kind","at")
);
--> statement-breakpoint
CREATE TABLE "access_log" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"user_id" uuid NOT NULL,
	"role" text NOT NULL,
	"what" text NOT NULL,
	CONSTRAINT "access_log_journal_id_id_pk" PRIMARY KEY("journal_id","id")
);
--> statement-breakpoint
CREATE TABLE "fallback_cards" (
	"journal_id" uuid PRIMARY KEY NOT NULL,
	"previous_setup" text NOT NULL,
	"long_acting_milli_units" integer,
	"rapid_milli_units" integer,
	"emergency_number" text NOT NULL,
	"contacts" jsonb NOT NULL,
	"updated_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "invitations" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"role" text NOT NULL,
	"scopes" jsonb NOT NULL,
	"token_hash" text NOT NULL,
	"invited_by" uuid NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"accepted_at" timestamp with time zone,
	"accepted_by" uuid,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "invitations_journal_id_id_pk" PRIMARY KEY("journal_id","id"),
	CONSTRAINT "invitations_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "journal_events" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"actor_id" uuid,
	"actor_kind" text NOT NULL,
	"action" text NOT NULL,
	"subject" text NOT NULL,
	"details" jsonb NOT NULL,
	"request_id" text NOT NULL,
	CONSTRAINT "journal_events_journal_id_id_pk" PRIMARY KEY("journal_id","id")
);
--> statement-breakpoint
CREATE TABLE "journal_grants" (
	"journal_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"role" text NOT NULL,
	"scopes" jsonb NOT NULL,
	"granted_at" timestamp with time zone NOT NULL,
	"granted_by" uuid NOT NULL,
	"expires_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "journal_grants_journal_id_user_id_pk" PRIMARY KEY("journal_id","user_id")
);
--> statement-breakpoint
CREATE TABLE "journals" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"owner_id" uuid NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"glucose_unit" text NOT NULL,
	"planned_start_on" date,
	"started_on" date,
	"therapy" text NOT NULL,
	"setup" jsonb NOT NULL,
	"gate_reasons" jsonb,
	"created_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "wizard_drafts" (
	"journal_id" uuid PRIMARY KEY NOT NULL,
	"answers" jsonb NOT NULL,
	"row_version" integer DEFAULT 1 NOT NULL,
	"updated_at" timestamp with time zone NOT NULL,
	"updated_by" uuid NOT NULL
);
--> statement-breakpoint
CREATE TABLE "digest_preferences" (
	"user_id" uuid PRIMARY KEY NOT NULL,
	"level" text NOT NULL,
	"weekday" smallint NOT NULL,
	"minute_of_day" smallint NOT NULL,
	"updated_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "digests" (
	"user_id" uuid NOT NULL,
	"iso_week" text NOT NULL,
	"outbox_id" uuid NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "digests_user_id_iso_week_pk" PRIMARY KEY("user_id","iso_week")
);
--> statement-breakpoint
CREATE TABLE "outbox" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"kind" text NOT NULL,
	"journal_id" uuid,
	"recipient_id" uuid,
	"to_address" text NOT NULL,
	"subject" text NOT NULL,
	"html" text NOT NULL,
	"text" text NOT NULL,
	"headers" jsonb NOT NULL,
	"dedupe_key" text NOT NULL,
	"state" text NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"next_attempt_at" timestamp with time zone NOT NULL,
	"lease_until" timestamp with time zone,
	"provider_id" text,
	"last_error" text DEFAULT '' NOT NULL,
	"request_id" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"sent_at" timestamp with time zone,
	CONSTRAINT "outbox_dedupeKey_unique" UNIQUE("dedupe_key")
);
--> statement-breakpoint
CREATE TABLE "api_tokens" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"user_id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"label" text NOT NULL,
	"scope" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"last_used_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "api_tokens_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"user_id" uuid NOT NULL,
	"key" text NOT NULL,
	"route" text NOT NULL,
	"fingerprint" text NOT NULL,
	"status" integer,
	"body" jsonb,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "idempotency_keys_user_id_route_key_pk" PRIMARY KEY("user_id","route","key")
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "credentials" (
	"user_id" uuid PRIMARY KEY NOT NULL,
	"profession" text NOT NULL,
	"licence_number" text NOT NULL,
	"jurisdiction" text NOT NULL,
	"expires_on" date NOT NULL,
	"submitted_at" timestamp with time zone NOT NULL,
	"verified_at" timestamp with time zone,
	"verified_by" uuid
);
--> statement-breakpoint
CREATE TABLE "email_tokens" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"purpose" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"user_agent" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"display_name" text NOT NULL,
	"password_hash" text NOT NULL,
	"email_verified_at" timestamp with time zone,
	"time_zone" text DEFAULT 'UTC' NOT NULL,
	"glucose_unit" text DEFAULT 'mg/dL' NOT NULL,
	"is_administrator" boolean DEFAULT false NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"closed_at" timestamp with time zone,
	CONSTRAINT "users_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "settings_versions" (
	"journal_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"revision" integer NOT NULL,
	"parent_number" integer,
	"kind" text NOT NULL,
	"profile" jsonb NOT NULL,
	"content_hash" text NOT NULL,
	"reason_code" text NOT NULL,
	"reason_text" text NOT NULL,
	"expectation" jsonb,
	"evidence_days" jsonb NOT NULL,
	"look_again_on" date,
	"revert_rule" text NOT NULL,
	"guardrails" jsonb NOT NULL,
	"arithmetic" jsonb,
	"author_id" uuid NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "settings_versions_journal_id_number_revision_pk" PRIMARY KEY("journal_id","number","revision")
);
--> statement-breakpoint
CREATE TABLE "version_reviews" (
	"journal_id" uuid NOT NULL,
	"id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"number" integer NOT NULL,
	"revision" integer NOT NULL,
	"decision" text NOT NULL,
	"reviewer_id" uuid NOT NULL,
	"content_hash" text NOT NULL,
	"sign_off_text" text NOT NULL,
	"reason_code" text NOT NULL,
	"remarks" text NOT NULL,
	"review_on" date,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "version_reviews_journal_id_id_pk" PRIMARY KEY("journal_id","id")
);
--> statement-breakpoint
CREATE TABLE "version_states" (
	"journal_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"revision" integer NOT NULL,
	"state" text NOT NULL,
	"state_since" timestamp with time zone NOT NULL,
	"approved_hash" text,
	"review_on" date,
	"effective_from" timestamp with time zone,
	"effective_until" timestamp with time zone,
	CONSTRAINT "version_states_journal_id_number_pk" PRIMARY KEY("journal_id","number")
);
--> statement-breakpoint
ALTER TABLE "comment_reads" ADD CONSTRAINT "comment_reads_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment_reads" ADD CONSTRAINT "comment_reads_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comments" ADD CONSTRAINT "comments_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "day_flags" ADD CONSTRAINT "day_flags_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "day_flags" ADD CONSTRAINT "day_flags_set_by_users_id_fk" FOREIGN KEY ("set_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "entries" ADD CONSTRAINT "entries_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "entries" ADD CONSTRAINT "entries_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "daily_rollups" ADD CONSTRAINT "daily_rollups_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "import_chunks" ADD CONSTRAINT "import_chunks_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "import_refusals" ADD CONSTRAINT "import_refusals_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "imports" ADD CONSTRAINT "imports_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "insulin_deliveries" ADD CONSTRAINT "insulin_deliveries_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "access_log" ADD CONSTRAINT "access_log_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fallback_cards" ADD CONSTRAINT "fallback_cards_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_invited_by_users_id_fk" FOREIGN KEY ("invited_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_accepted_by_users_id_fk" FOREIGN KEY ("accepted_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journal_events" ADD CONSTRAINT "journal_events_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journal_grants" ADD CONSTRAINT "journal_grants_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journal_grants" ADD CONSTRAINT "journal_grants_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journal_grants" ADD CONSTRAINT "journal_grants_granted_by_users_id_fk" FOREIGN KEY ("granted_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "journals" ADD CONSTRAINT "journals_owner_id_users_id_fk" FOREIGN KEY ("owner_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wizard_drafts" ADD CONSTRAINT "wizard_drafts_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wizard_drafts" ADD CONSTRAINT "wizard_drafts_updated_by_users_id_fk" FOREIGN KEY ("updated_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "digest_preferences" ADD CONSTRAINT "digest_preferences_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "digests" ADD CONSTRAINT "digests_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_tokens" ADD CONSTRAINT "api_tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotency_keys" ADD CONSTRAINT "idempotency_keys_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "credentials" ADD CONSTRAINT "credentials_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "credentials" ADD CONSTRAINT "credentials_verified_by_users_id_fk" FOREIGN KEY ("verified_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "email_tokens" ADD CONSTRAINT "email_tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "settings_versions" ADD CONSTRAINT "settings_versions_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "settings_versions" ADD CONSTRAINT "settings_versions_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "version_reviews" ADD CONSTRAINT "version_reviews_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "version_reviews" ADD CONSTRAINT "version_reviews_reviewer_id_users_id_fk" FOREIGN KEY ("reviewer_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "version_states" ADD CONSTRAINT "version_states_journal_id_journals_id_fk" FOREIGN KEY ("journal_id") REFERENCES "public"."journals"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "comments_subject" ON "comments" USING btree ("journal_id","subject","subject_key");--> statement-breakpoint
CREATE INDEX "comments_at" ON "comments" USING btree ("journal_id","created_at");--> statement-breakpoint
CREATE INDEX "day_flags_days" ON "day_flags" USING btree ("journal_id","first_day");--> statement-breakpoint
CREATE INDEX "entries_at" ON "entries" USING btree ("journal_id","at");--> statement-breakpoint
CREATE INDEX "glucose_readings_at" ON "glucose_readings" USING btree ("journal_id","at");--> statement-breakpoint
CREATE INDEX "glucose_readings_import" ON "glucose_readings" USING btree ("journal_id","import_id");--> statement-breakpoint
CREATE INDEX "access_log_at" ON "access_log" USING btree ("journal_id","at");--> statement-breakpoint
CREATE INDEX "journal_events_at" ON "journal_events" USING btree ("journal_id","at");--> statement-breakpoint
CREATE INDEX "journal_grants_user" ON "journal_grants" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "outbox_due" ON "outbox" USING btree ("state","next_attempt_at");--> statement-breakpoint
CREATE INDEX "api_tokens_user" ON "api_tokens" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "email_tokens_user" ON "email_tokens" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "sessions_user" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "version_reviews_version" ON "version_reviews" USING btree ("journal_id","number");--> statement-breakpoint
CREATE INDEX "version_states_state" ON "version_states" USING btree ("state");