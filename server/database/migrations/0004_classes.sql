CREATE TABLE "classes" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"gown_id" uuid NOT NULL,
	"digest" text NOT NULL,
	"title" text NOT NULL,
	"unit" text NOT NULL,
	"inputs" jsonb NOT NULL,
	"step" text NOT NULL,
	"opened_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	CONSTRAINT "classes_digest_unique" UNIQUE("digest")
);
--> statement-breakpoint
ALTER TABLE "classes" ADD CONSTRAINT "classes_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "classes" ADD CONSTRAINT "classes_gown_id_gowns_id_fk" FOREIGN KEY ("gown_id") REFERENCES "public"."gowns"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "classes_of_account" ON "classes" USING btree ("account_id","opened_at");