ALTER TABLE "invitations" ADD COLUMN "grant_expires_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "digest_preferences" ADD COLUMN "is_told_of_comments" boolean DEFAULT true NOT NULL;--> statement-breakpoint
ALTER TABLE "outbox" ADD COLUMN "basis" jsonb;