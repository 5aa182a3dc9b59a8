CREATE TABLE "sample_gowns" (
	"id" text PRIMARY KEY NOT NULL,
	"position" integer NOT NULL,
	"title" text NOT NULL,
	"note" text NOT NULL,
	"card" jsonb NOT NULL,
	"style" jsonb NOT NULL,
	"rules" jsonb NOT NULL,
	CONSTRAINT "sample_gowns_position_unique" UNIQUE("position")
);
