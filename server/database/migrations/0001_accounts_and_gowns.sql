CREATE TABLE "accounts" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"password_hash" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "accounts_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "gown_revisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"gown_id" uuid NOT NULL,
	"name" text NOT NULL,
	"automatic" boolean NOT NULL,
	"version" integer NOT NULL,
	"parent_id" uuid,
	"created_at" timestamp with time zone NOT NULL,
	"typed" jsonb NOT NULL,
	"unread" jsonb NOT NULL,
	"card" jsonb NOT NULL,
	"style" jsonb NOT NULL,
	"rules" jsonb NOT NULL,
	"engine" text,
	"draft_number" text,
	"drawn_from" jsonb,
	"pieces" jsonb,
	"fresh" boolean NOT NULL,
	"picture" jsonb
);
--> statement-breakpoint
CREATE TABLE "gowns" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"version" integer NOT NULL,
	"archived_at" timestamp with time zone,
	"created_at" timestamp with time zone NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	"saved_device" text NOT NULL,
	"saved_session" text NOT NULL,
	"title" text NOT NULL,
	"typed" jsonb NOT NULL,
	"unread" jsonb NOT NULL,
	"card" jsonb NOT NULL,
	"style" jsonb NOT NULL,
	"rules" jsonb NOT NULL,
	"engine" text,
	"draft_number" text,
	"drawn_from" jsonb,
	"pieces" jsonb,
	"fresh" boolean NOT NULL,
	"picture" jsonb,
	"parent_id" uuid
);
--> statement-breakpoint
CREATE TABLE "measure_cards" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"version" integer NOT NULL,
	"archived_at" timestamp with time zone,
	"created_at" timestamp with time zone NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	"saved_device" text NOT NULL,
	"saved_session" text NOT NULL,
	"name" text NOT NULL,
	"typed" jsonb NOT NULL,
	"card" jsonb NOT NULL
);
--> statement-breakpoint
CREATE TABLE "saves" (
	"account_id" uuid NOT NULL,
	"save_id" uuid NOT NULL,
	"record" uuid NOT NULL,
	"version" integer NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	CONSTRAINT "saves_account_id_save_id_pk" PRIMARY KEY("account_id","save_id")
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"device" text NOT NULL,
	"started_at" timestamp with time zone DEFAULT now() NOT NULL,
	"last_used_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sign_in_attempts" (
	"key" text PRIMARY KEY NOT NULL,
	"count" integer NOT NULL,
	"since" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "gown_revisions" ADD CONSTRAINT "gown_revisions_gown_id_gowns_id_fk" FOREIGN KEY ("gown_id") REFERENCES "public"."gowns"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gowns" ADD CONSTRAINT "gowns_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measure_cards" ADD CONSTRAINT "measure_cards_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "saves" ADD CONSTRAINT "saves_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "gown_revisions_of_gown" ON "gown_revisions" USING btree ("gown_id","created_at");--> statement-breakpoint
CREATE INDEX "gowns_of_account" ON "gowns" USING btree ("account_id","saved_at");--> statement-breakpoint
CREATE INDEX "measure_cards_of_account" ON "measure_cards" USING btree ("account_id","saved_at");--> statement-breakpoint
CREATE INDEX "saves_of_record" ON "saves" USING btree ("record");--> statement-breakpoint
CREATE INDEX "sessions_of_account" ON "sessions" USING btree ("account_id");