CREATE TABLE "people" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "gown_revisions" ADD COLUMN "card_id" uuid;--> statement-breakpoint
ALTER TABLE "gowns" ADD COLUMN "person_id" uuid;--> statement-breakpoint
ALTER TABLE "gowns" ADD COLUMN "card_id" uuid;--> statement-breakpoint
ALTER TABLE "measure_cards" ADD COLUMN "person_id" uuid;--> statement-breakpoint
ALTER TABLE "measure_cards" ADD COLUMN "taken_on" date;--> statement-breakpoint
ALTER TABLE "measure_cards" ADD COLUMN "started_from" uuid;--> statement-breakpoint
-- Cards kept before: each goes to the person named on it, and bears the day it was taken or put here.
INSERT INTO "people" ("id", "account_id", "name", "created_at")
SELECT gen_random_uuid(), "account_id", "whose", min("created_at")
FROM (
	SELECT "account_id", "created_at", coalesce(nullif(trim("card" ->> 'name'), ''), 'Not named yet') AS "whose" FROM "measure_cards"
) AS "cards"
GROUP BY "account_id", "whose";--> statement-breakpoint
UPDATE "measure_cards" SET
	"person_id" = (
		SELECT "people"."id" FROM "people"
		WHERE "people"."account_id" = "measure_cards"."account_id"
			AND "people"."name" = coalesce(nullif(trim("measure_cards"."card" ->> 'name'), ''), 'Not named yet')
	),
	"taken_on" = coalesce(("card" ->> 'date')::date, ("created_at" AT TIME ZONE 'UTC')::date);--> statement-breakpoint
ALTER TABLE "measure_cards" ALTER COLUMN "person_id" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "measure_cards" ALTER COLUMN "taken_on" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "people_of_account" ON "people" USING btree ("account_id","name");--> statement-breakpoint
ALTER TABLE "gown_revisions" ADD CONSTRAINT "gown_revisions_card_id_measure_cards_id_fk" FOREIGN KEY ("card_id") REFERENCES "public"."measure_cards"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gowns" ADD CONSTRAINT "gowns_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gowns" ADD CONSTRAINT "gowns_card_id_measure_cards_id_fk" FOREIGN KEY ("card_id") REFERENCES "public"."measure_cards"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measure_cards" ADD CONSTRAINT "measure_cards_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "gown_revisions_of_card" ON "gown_revisions" USING btree ("card_id");--> statement-breakpoint
CREATE INDEX "gowns_of_person" ON "gowns" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "gowns_of_card" ON "gowns" USING btree ("card_id");--> statement-breakpoint
CREATE INDEX "measure_cards_of_person" ON "measure_cards" USING btree ("person_id","taken_on");