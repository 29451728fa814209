CREATE TABLE "check_settings" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "check_settings_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"unit_id" uuid NOT NULL,
	"rule" text NOT NULL,
	"setting" text NOT NULL,
	"reason" text NOT NULL,
	"settled_by" uuid NOT NULL,
	"settled_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "check_settings" ADD CONSTRAINT "check_settings_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "check_settings" ADD CONSTRAINT "check_settings_settled_by_people_id_fk" FOREIGN KEY ("settled_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "check_settings_of_unit" ON "check_settings" USING btree ("unit_id","rule","id");--> statement-breakpoint
CREATE TRIGGER check_settings_stay BEFORE UPDATE OR DELETE ON check_settings
  FOR EACH ROW EXECUTE FUNCTION refuse_change();--> statement-breakpoint
CREATE TRIGGER check_settings_not_emptied BEFORE TRUNCATE ON check_settings
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();--> statement-breakpoint
DO $$
BEGIN
  IF EXISTS (SELECT FROM pg_roles WHERE rolname = 'buckram_app') THEN
    GRANT SELECT, INSERT ON check_settings TO buckram_app;
  END IF;
END;
$$;
