CREATE TABLE "known_devices" (
	"account_id" uuid NOT NULL,
	"device" text NOT NULL,
	"used_at" timestamp with time zone NOT NULL,
	CONSTRAINT "known_devices_account_id_device_pk" PRIMARY KEY("account_id","device")
);
--> statement-breakpoint
ALTER TABLE "known_devices" ADD CONSTRAINT "known_devices_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "known_devices_of_account" ON "known_devices" USING btree ("account_id","used_at");