CREATE TABLE "addenda" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"signed_version_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"canonical" text NOT NULL,
	"sha256" text NOT NULL,
	"verification_code" text NOT NULL,
	"signer_id" uuid NOT NULL,
	"signed_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "addenda" ADD CONSTRAINT "addenda_signed_version_id_signed_versions_id_fk" FOREIGN KEY ("signed_version_id") REFERENCES "public"."signed_versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "addenda" ADD CONSTRAINT "addenda_signer_id_people_id_fk" FOREIGN KEY ("signer_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "addenda_of_version" ON "addenda" USING btree ("signed_version_id","number");--> statement-breakpoint
CREATE TRIGGER addenda_stay BEFORE UPDATE OR DELETE ON addenda
  FOR EACH ROW EXECUTE FUNCTION refuse_change();--> statement-breakpoint
CREATE TRIGGER addenda_not_emptied BEFORE TRUNCATE ON addenda
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();--> statement-breakpoint
DO $$
BEGIN
  IF EXISTS (SELECT FROM pg_roles WHERE rolname = 'buckram_app') THEN
    GRANT SELECT, INSERT ON addenda TO buckram_app;
  END IF;
END;
$$;
