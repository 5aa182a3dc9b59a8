ALTER TABLE "gown_revisions" ADD COLUMN "garment" text DEFAULT 'gown' NOT NULL;--> statement-breakpoint
ALTER TABLE "gowns" ADD COLUMN "garment" text DEFAULT 'gown' NOT NULL;