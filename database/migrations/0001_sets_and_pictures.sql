-- Generated from database/schema, then completed by hand: the key of set_case, the club a set belongs to, and
-- everything from "The walls" on.
CREATE TABLE "case_alias" (
	"club_id" uuid NOT NULL,
	"case_key" text NOT NULL,
	"set_key" text NOT NULL,
	"alias" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "case_alias_club_id_case_key_pk" PRIMARY KEY("club_id","case_key"),
	CONSTRAINT "case_alias_length" CHECK (char_length("case_alias"."alias") between 1 and 24)
);
--> statement-breakpoint
ALTER TABLE "case_set" DROP CONSTRAINT "case_set_name_unique";--> statement-breakpoint
ALTER TABLE "edition_case" DROP CONSTRAINT "edition_case_case";--> statement-breakpoint
ALTER TABLE "set_case" DROP CONSTRAINT "set_case_in_set";--> statement-breakpoint
ALTER TABLE "case_state" DROP CONSTRAINT "case_state_case_key_set_case_case_key_fk";
--> statement-breakpoint
ALTER TABLE "showing" DROP CONSTRAINT "showing_case_key_set_case_case_key_fk";
--> statement-breakpoint
DROP INDEX "case_state_set";--> statement-breakpoint
DROP INDEX "first_answer_day";--> statement-breakpoint
ALTER TABLE "set_case" DROP CONSTRAINT "set_case_pkey";--> statement-breakpoint
ALTER TABLE "set_case" ADD CONSTRAINT "set_case_set_key_case_key_pk" PRIMARY KEY("set_key","case_key");--> statement-breakpoint
ALTER TABLE "edition_case" ADD CONSTRAINT "edition_case_case" FOREIGN KEY ("set_key","case_key") REFERENCES "public"."set_case"("set_key","case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_set" ADD COLUMN "parent_key" text;--> statement-breakpoint
ALTER TABLE "case_set" ADD COLUMN "club_id" uuid;--> statement-breakpoint
ALTER TABLE "case_set" ADD COLUMN "mix" jsonb DEFAULT '[]'::jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "case_set" ADD COLUMN "created_by" uuid;--> statement-breakpoint
ALTER TABLE "case_set" ADD COLUMN "retired_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "account" ADD COLUMN "palette" text DEFAULT 'standard' NOT NULL;--> statement-breakpoint
ALTER TABLE "account" ADD COLUMN "letters" boolean DEFAULT false NOT NULL;--> statement-breakpoint
ALTER TABLE "account" ADD COLUMN "own_shades" jsonb;--> statement-breakpoint
ALTER TABLE "case_alias" ADD CONSTRAINT "case_alias_club_id_club_club_id_fk" FOREIGN KEY ("club_id") REFERENCES "public"."club"("club_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_alias" ADD CONSTRAINT "case_alias_case" FOREIGN KEY ("set_key","case_key") REFERENCES "public"."set_case"("set_key","case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "case_alias_once" ON "case_alias" USING btree ("club_id","set_key",lower("alias"));--> statement-breakpoint
ALTER TABLE "case_set" ADD CONSTRAINT "case_set_parent_key_case_set_set_key_fk" FOREIGN KEY ("parent_key") REFERENCES "public"."case_set"("set_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_state" ADD CONSTRAINT "case_state_case" FOREIGN KEY ("set_key","case_key") REFERENCES "public"."set_case"("set_key","case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "showing" ADD CONSTRAINT "showing_case" FOREIGN KEY ("set_key","case_key") REFERENCES "public"."set_case"("set_key","case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "case_set_name" ON "case_set" USING btree (coalesce("club_id", '00000000-0000-0000-0000-000000000000'::uuid),lower("name")) WHERE "case_set"."retired_at" is null;--> statement-breakpoint
CREATE INDEX "case_set_parent" ON "case_set" USING btree ("parent_key");--> statement-breakpoint
CREATE INDEX "first_answer_day" ON "first_answer" USING btree ("club_id","member_id","local_day");--> statement-breakpoint
ALTER TABLE "case_set" ADD CONSTRAINT "case_set_name_length" CHECK (char_length("case_set"."name") between 1 and 40);--> statement-breakpoint
ALTER TABLE "account" ADD CONSTRAINT "account_own_shades" CHECK ("account"."palette" <> 'own' or "account"."own_shades" is not null);
--> statement-breakpoint
ALTER TABLE "case_set" ADD CONSTRAINT "case_set_club" FOREIGN KEY ("club_id") REFERENCES "public"."club"("club_id") ON DELETE no action ON UPDATE no action;
--> statement-breakpoint
-- ---------------------------------------------------------------- The walls
CALL wall_off('case_alias');
--> statement-breakpoint
CREATE FUNCTION app_is_captain() RETURNS boolean LANGUAGE sql STABLE PARALLEL SAFE AS $$
  SELECT current_setting('app.role', true) IS NOT DISTINCT FROM 'captain'
$$;
--> statement-breakpoint
-- The installation's sets are everyone's to read, a club's own only its own; an administrator sees all of them,
-- because algorithms come through Intake. A captain defines sets for their own club, an administrator for everyone.
DROP POLICY everyone_reads ON "case_set";
--> statement-breakpoint
DROP POLICY administrators_insert ON "case_set";
--> statement-breakpoint
CREATE POLICY installation_and_own_club ON "case_set" FOR SELECT TO sixteenfold_app
  USING (club_id IS NULL OR club_id = (SELECT app_club()) OR (SELECT app_is_administrator()));
--> statement-breakpoint
CREATE POLICY define ON "case_set" FOR INSERT TO sixteenfold_app
  WITH CHECK (CASE WHEN club_id IS NULL THEN (SELECT app_is_administrator())
              ELSE club_id = (SELECT app_club()) AND (SELECT app_is_captain()) END);
--> statement-breakpoint
CREATE POLICY retire ON "case_set" FOR UPDATE TO sixteenfold_app
  USING ((SELECT app_is_administrator()) OR (club_id = (SELECT app_club()) AND (SELECT app_is_captain())));
--> statement-breakpoint
-- What hangs on a set is seen with it. The list of visible sets is made once a query, not once a row.
DROP POLICY everyone_reads ON "set_case";
--> statement-breakpoint
DROP POLICY administrators_insert ON "set_case";
--> statement-breakpoint
CREATE POLICY with_its_set ON "set_case" FOR SELECT TO sixteenfold_app
  USING (set_key IN (SELECT s.set_key FROM case_set s));
--> statement-breakpoint
CREATE POLICY define ON "set_case" FOR INSERT TO sixteenfold_app
  WITH CHECK (set_key IN (
    SELECT s.set_key FROM case_set s
    WHERE CASE WHEN s.club_id IS NULL THEN app_is_administrator() ELSE s.club_id = app_club() AND app_is_captain() END));
--> statement-breakpoint
DROP POLICY everyone_reads ON "edition";
--> statement-breakpoint
CREATE POLICY with_its_set ON "edition" FOR SELECT TO sixteenfold_app
  USING (set_key IN (SELECT s.set_key FROM case_set s));
--> statement-breakpoint
DROP POLICY everyone_reads ON "edition_case";
--> statement-breakpoint
CREATE POLICY with_its_set ON "edition_case" FOR SELECT TO sixteenfold_app
  USING (set_key IN (SELECT s.set_key FROM case_set s));
--> statement-breakpoint
DROP POLICY everyone_reads ON "edition_algorithm";
--> statement-breakpoint
CREATE POLICY with_its_set ON "edition_algorithm" FOR SELECT TO sixteenfold_app
  USING (set_key IN (SELECT s.set_key FROM case_set s));
--> statement-breakpoint
-- A set's definition and cases never change; retiring is all that may be done to it.
GRANT UPDATE ("retired_at") ON "case_set" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "case_alias" TO sixteenfold_app;
--> statement-breakpoint
REVOKE ALL ON FUNCTION app_is_captain() FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION app_is_captain() TO sixteenfold_app;
--> statement-breakpoint
-- ---------------------------------------------------------------- Functions that look across
CREATE FUNCTION pictures_of(of_account uuid)
RETURNS TABLE (palette text, letters boolean, own_shades jsonb)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  SELECT a.palette, a.letters, a.own_shades FROM account a WHERE a.account_id = of_account
$$;
--> statement-breakpoint
-- Shades of one's own stay when another palette is chosen without them.
CREATE FUNCTION change_pictures(of_account uuid, new_palette text, new_letters boolean, new_shades jsonb)
RETURNS TABLE (palette text, letters boolean, own_shades jsonb)
LANGUAGE sql SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  UPDATE account a SET palette = new_palette, letters = new_letters, own_shades = coalesce(new_shades, a.own_shades)
  WHERE a.account_id = of_account AND a.disabled_at IS NULL
  RETURNING a.palette, a.letters, a.own_shades
$$;
--> statement-breakpoint
-- How many clubs train a set, without saying which: a set that somebody trains is not retired.
CREATE FUNCTION clubs_training(of_set text) RETURNS integer
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  SELECT count(*)::integer FROM programme p WHERE p.set_key = of_set
$$;
--> statement-breakpoint
REVOKE ALL ON FUNCTION pictures_of(uuid), change_pictures(uuid, text, boolean, jsonb), clubs_training(text) FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION pictures_of(uuid), change_pictures(uuid, text, boolean, jsonb), clubs_training(text) TO sixteenfold_app;
