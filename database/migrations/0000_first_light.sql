CREATE TABLE "case_set" (
	"set_key" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"entry" text NOT NULL,
	"told_apart" text[] NOT NULL,
	"solved" text[] NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "case_set_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "edition" (
	"set_key" text NOT NULL,
	"number" integer NOT NULL,
	"published_at" timestamp with time zone NOT NULL,
	"published_by" uuid,
	"note" text DEFAULT '' NOT NULL,
	"draft_id" uuid,
	CONSTRAINT "edition_set_key_number_pk" PRIMARY KEY("set_key","number"),
	CONSTRAINT "edition_draft_id_unique" UNIQUE("draft_id")
);
--> statement-breakpoint
CREATE TABLE "edition_algorithm" (
	"set_key" text NOT NULL,
	"edition_number" integer NOT NULL,
	"case_key" text NOT NULL,
	"rank" smallint NOT NULL,
	"algorithm" text NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	CONSTRAINT "edition_algorithm_set_key_edition_number_case_key_rank_pk" PRIMARY KEY("set_key","edition_number","case_key","rank"),
	CONSTRAINT "edition_algorithm_once" UNIQUE("set_key","edition_number","algorithm")
);
--> statement-breakpoint
CREATE TABLE "edition_case" (
	"set_key" text NOT NULL,
	"edition_number" integer NOT NULL,
	"case_key" text NOT NULL,
	"name" text NOT NULL,
	"group_name" text NOT NULL,
	CONSTRAINT "edition_case_set_key_edition_number_case_key_pk" PRIMARY KEY("set_key","edition_number","case_key"),
	CONSTRAINT "edition_case_name" UNIQUE("set_key","edition_number","name")
);
--> statement-breakpoint
CREATE TABLE "set_case" (
	"case_key" text PRIMARY KEY NOT NULL,
	"set_key" text NOT NULL,
	"number" integer NOT NULL,
	"canonical" integer NOT NULL,
	"weight" integer NOT NULL,
	"angles" smallint NOT NULL,
	"cluster" smallint NOT NULL,
	"is_skip" boolean NOT NULL,
	CONSTRAINT "set_case_number" UNIQUE("set_key","number"),
	CONSTRAINT "set_case_in_set" UNIQUE("set_key","case_key")
);
--> statement-breakpoint
CREATE TABLE "club" (
	"club_id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "membership" (
	"club_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"account_id" uuid NOT NULL,
	"role" text NOT NULL,
	"nickname" text NOT NULL,
	"epoch" integer DEFAULT 0 NOT NULL,
	"time_zone" text NOT NULL,
	"rollover_hour" smallint DEFAULT 4 NOT NULL,
	"minutes_per_day" smallint DEFAULT 6 NOT NULL,
	"beta" double precision,
	"beta_day" integer,
	"on_boards" boolean DEFAULT false NOT NULL,
	"holding" text DEFAULT 'right' NOT NULL,
	"cross_colours" text DEFAULT 'white' NOT NULL,
	"joined_at" timestamp with time zone NOT NULL,
	"left_at" timestamp with time zone,
	CONSTRAINT "membership_club_id_member_id_pk" PRIMARY KEY("club_id","member_id"),
	CONSTRAINT "membership_account" UNIQUE("club_id","account_id"),
	CONSTRAINT "membership_rollover_hour" CHECK ("membership"."rollover_hour" between 0 and 23),
	CONSTRAINT "membership_minutes" CHECK ("membership"."minutes_per_day" between 1 and 120)
);
--> statement-breakpoint
CREATE TABLE "programme" (
	"club_id" uuid NOT NULL,
	"set_key" text NOT NULL,
	"pinned_edition" integer,
	"limit_ms" integer NOT NULL,
	"asks_auf" boolean DEFAULT true NOT NULL,
	"for_everyone" boolean DEFAULT true NOT NULL,
	"position" smallint DEFAULT 0 NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "programme_club_id_set_key_pk" PRIMARY KEY("club_id","set_key"),
	CONSTRAINT "programme_limit" CHECK ("programme"."limit_ms" between 500 and 60000)
);
--> statement-breakpoint
CREATE TABLE "programme_member" (
	"club_id" uuid NOT NULL,
	"set_key" text NOT NULL,
	"member_id" uuid NOT NULL,
	CONSTRAINT "programme_member_club_id_set_key_member_id_pk" PRIMARY KEY("club_id","set_key","member_id")
);
--> statement-breakpoint
CREATE TABLE "published_team_row" (
	"club_id" uuid NOT NULL,
	"board_id" uuid NOT NULL,
	"day" integer NOT NULL,
	"members" integer NOT NULL,
	"theta" double precision NOT NULL,
	"standard_error" double precision NOT NULL,
	CONSTRAINT "published_team_row_club_id_board_id_day_pk" PRIMARY KEY("club_id","board_id","day")
);
--> statement-breakpoint
CREATE TABLE "shared_board" (
	"board_id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"set_key" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "shared_board_club" (
	"club_id" uuid NOT NULL,
	"board_id" uuid NOT NULL,
	CONSTRAINT "shared_board_club_club_id_board_id_pk" PRIMARY KEY("club_id","board_id")
);
--> statement-breakpoint
-- Generated from database/schema, then completed by hand: the log is partitioned, and everything from
-- "The walls" on is what the generator has no words for.
CREATE TABLE "account" (
	"account_id" uuid PRIMARY KEY NOT NULL,
	"email" text,
	"sign_in_name" text,
	"password_hash" text NOT NULL,
	"is_administrator" boolean DEFAULT false NOT NULL,
	"disabled_at" timestamp with time zone,
	"epoch" integer DEFAULT 0 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "account_email_unique" UNIQUE("email"),
	CONSTRAINT "account_sign_in_name_unique" UNIQUE("sign_in_name"),
	CONSTRAINT "account_has_a_name" CHECK ("account"."email" is not null or "account"."sign_in_name" is not null)
);
--> statement-breakpoint
CREATE TABLE "refresh_token" (
	"token_id" uuid PRIMARY KEY NOT NULL,
	"family_id" uuid NOT NULL,
	"account_id" uuid NOT NULL,
	"club_id" uuid,
	"token_hash" "bytea" NOT NULL,
	"issued_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"family_started_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "refresh_token_token_hash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "intake_draft" (
	"draft_id" uuid PRIMARY KEY NOT NULL,
	"set_key" text NOT NULL,
	"file_name" text NOT NULL,
	"file_hash" text NOT NULL,
	"file" "bytea" NOT NULL,
	"unknown_columns" text[] NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"closed_at" timestamp with time zone,
	"edition_number" integer,
	CONSTRAINT "intake_draft_published" CHECK (("intake_draft"."state" = 'published') = ("intake_draft"."edition_number" is not null))
);
--> statement-breakpoint
CREATE TABLE "intake_line" (
	"draft_id" uuid NOT NULL,
	"line" integer NOT NULL,
	"case_name" text NOT NULL,
	"algorithm" text NOT NULL,
	"group_name" text DEFAULT '' NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"decision" text DEFAULT 'none' NOT NULL,
	"edited_case_name" text,
	"edited_algorithm" text,
	CONSTRAINT "intake_line_draft_id_line_pk" PRIMARY KEY("draft_id","line")
);
--> statement-breakpoint
CREATE TABLE "case_state" (
	"club_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"case_key" text NOT NULL,
	"set_key" text NOT NULL,
	"stability" double precision NOT NULL,
	"difficulty" double precision NOT NULL,
	"first_day" integer NOT NULL,
	"last_day" integer NOT NULL,
	"answers" integer NOT NULL,
	"lapses" integer NOT NULL,
	"last_review_id" uuid NOT NULL,
	CONSTRAINT "case_state_club_id_member_id_case_key_pk" PRIMARY KEY("club_id","member_id","case_key")
);
--> statement-breakpoint
CREATE TABLE "first_answer" (
	"club_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"case_key" text NOT NULL,
	"local_day" integer NOT NULL,
	"set_key" text NOT NULL,
	"review_id" uuid NOT NULL,
	"recall_before" double precision,
	"keys_offered" smallint NOT NULL,
	"held" boolean NOT NULL,
	"on_boards" boolean NOT NULL,
	CONSTRAINT "first_answer_club_id_member_id_case_key_local_day_pk" PRIMARY KEY("club_id","member_id","case_key","local_day")
);
--> statement-breakpoint
CREATE TABLE "mis_tap" (
	"club_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"review_id" uuid NOT NULL,
	"case_key" text NOT NULL,
	"local_day" integer NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	CONSTRAINT "mis_tap_club_id_member_id_review_id_pk" PRIMARY KEY("club_id","member_id","review_id")
);
--> statement-breakpoint
CREATE TABLE "review" (
	"club_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"review_id" uuid NOT NULL,
	"showing_id" uuid NOT NULL,
	"set_key" text NOT NULL,
	"case_key" text NOT NULL,
	"edition_number" integer NOT NULL,
	"state" integer NOT NULL,
	"colouring" smallint NOT NULL,
	"keys_offered" smallint NOT NULL,
	"limit_ms" integer NOT NULL,
	"asks_auf" boolean NOT NULL,
	"algorithm" text,
	"named" text NOT NULL,
	"auf_before" smallint,
	"recognition_ms" integer,
	"naming_ms" integer,
	"outcome" text NOT NULL,
	"case_right" boolean NOT NULL,
	"auf_right" boolean,
	"scored" boolean NOT NULL,
	"unscored_reason" text,
	"on_boards" boolean NOT NULL,
	"lost_by" text,
	"local_day" integer NOT NULL,
	"issued_at" timestamp with time zone NOT NULL,
	"answered_at" timestamp with time zone NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	"body_hash" "bytea" NOT NULL,
	"carried" boolean DEFAULT false NOT NULL,
	CONSTRAINT "review_club_id_member_id_review_id_pk" PRIMARY KEY("club_id","member_id","review_id")
) PARTITION BY RANGE ("review_id");
--> statement-breakpoint
CREATE TABLE "rollup" (
	"club_id" uuid NOT NULL,
	"day" integer NOT NULL,
	"member_id" uuid NOT NULL,
	"set_key" text NOT NULL,
	"group_name" text NOT NULL,
	"edition_number" integer NOT NULL,
	"sum_p" double precision NOT NULL,
	"sum_pe" double precision NOT NULL,
	"sum_pee" double precision NOT NULL,
	"shift" double precision NOT NULL,
	"information" double precision NOT NULL,
	"answers" integer NOT NULL,
	"held" integer NOT NULL,
	"late" integer NOT NULL,
	"missed" integer NOT NULL,
	"left_count" integer NOT NULL,
	"mis_taps" integer NOT NULL,
	"spent_ms" integer NOT NULL,
	CONSTRAINT "rollup_club_id_day_member_id_set_key_group_name_pk" PRIMARY KEY("club_id","day","member_id","set_key","group_name")
);
--> statement-breakpoint
CREATE TABLE "showing" (
	"club_id" uuid NOT NULL,
	"member_id" uuid NOT NULL,
	"showing_id" uuid NOT NULL,
	"set_key" text NOT NULL,
	"case_key" text NOT NULL,
	"edition_number" integer NOT NULL,
	"state" integer NOT NULL,
	"colouring" smallint NOT NULL,
	"cluster" smallint NOT NULL,
	"keys_offered" smallint NOT NULL,
	"limit_ms" integer NOT NULL,
	"asks_auf" boolean NOT NULL,
	"reason" text NOT NULL,
	"local_day" integer NOT NULL,
	"planned_seconds" double precision NOT NULL,
	"position" integer NOT NULL,
	"issued_at" timestamp with time zone NOT NULL,
	"review_id" uuid,
	CONSTRAINT "showing_club_id_member_id_showing_id_pk" PRIMARY KEY("club_id","member_id","showing_id")
);
--> statement-breakpoint
ALTER TABLE "edition" ADD CONSTRAINT "edition_set_key_case_set_set_key_fk" FOREIGN KEY ("set_key") REFERENCES "public"."case_set"("set_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition_algorithm" ADD CONSTRAINT "edition_algorithm_case" FOREIGN KEY ("set_key","edition_number","case_key") REFERENCES "public"."edition_case"("set_key","edition_number","case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition_case" ADD CONSTRAINT "edition_case_edition" FOREIGN KEY ("set_key","edition_number") REFERENCES "public"."edition"("set_key","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition_case" ADD CONSTRAINT "edition_case_case" FOREIGN KEY ("set_key","case_key") REFERENCES "public"."set_case"("set_key","case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_case" ADD CONSTRAINT "set_case_set_key_case_set_set_key_fk" FOREIGN KEY ("set_key") REFERENCES "public"."case_set"("set_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_club_id_club_club_id_fk" FOREIGN KEY ("club_id") REFERENCES "public"."club"("club_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_account_id_account_account_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."account"("account_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "programme" ADD CONSTRAINT "programme_club_id_club_club_id_fk" FOREIGN KEY ("club_id") REFERENCES "public"."club"("club_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "programme" ADD CONSTRAINT "programme_set_key_case_set_set_key_fk" FOREIGN KEY ("set_key") REFERENCES "public"."case_set"("set_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "programme_member" ADD CONSTRAINT "programme_member_programme" FOREIGN KEY ("club_id","set_key") REFERENCES "public"."programme"("club_id","set_key") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "programme_member" ADD CONSTRAINT "programme_member_member" FOREIGN KEY ("club_id","member_id") REFERENCES "public"."membership"("club_id","member_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "published_team_row" ADD CONSTRAINT "published_team_row_club" FOREIGN KEY ("club_id","board_id") REFERENCES "public"."shared_board_club"("club_id","board_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shared_board" ADD CONSTRAINT "shared_board_set_key_case_set_set_key_fk" FOREIGN KEY ("set_key") REFERENCES "public"."case_set"("set_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shared_board_club" ADD CONSTRAINT "shared_board_club_club_id_club_club_id_fk" FOREIGN KEY ("club_id") REFERENCES "public"."club"("club_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shared_board_club" ADD CONSTRAINT "shared_board_club_board_id_shared_board_board_id_fk" FOREIGN KEY ("board_id") REFERENCES "public"."shared_board"("board_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "refresh_token" ADD CONSTRAINT "refresh_token_account_id_account_account_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."account"("account_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "intake_draft" ADD CONSTRAINT "intake_draft_set_key_case_set_set_key_fk" FOREIGN KEY ("set_key") REFERENCES "public"."case_set"("set_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "intake_line" ADD CONSTRAINT "intake_line_draft" FOREIGN KEY ("draft_id") REFERENCES "public"."intake_draft"("draft_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_state" ADD CONSTRAINT "case_state_case_key_set_case_case_key_fk" FOREIGN KEY ("case_key") REFERENCES "public"."set_case"("case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_state" ADD CONSTRAINT "case_state_member" FOREIGN KEY ("club_id","member_id") REFERENCES "public"."membership"("club_id","member_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "first_answer" ADD CONSTRAINT "first_answer_member" FOREIGN KEY ("club_id","member_id") REFERENCES "public"."membership"("club_id","member_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mis_tap" ADD CONSTRAINT "mis_tap_member" FOREIGN KEY ("club_id","member_id") REFERENCES "public"."membership"("club_id","member_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "review" ADD CONSTRAINT "review_member" FOREIGN KEY ("club_id","member_id") REFERENCES "public"."membership"("club_id","member_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rollup" ADD CONSTRAINT "rollup_member" FOREIGN KEY ("club_id","member_id") REFERENCES "public"."membership"("club_id","member_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "showing" ADD CONSTRAINT "showing_case_key_set_case_case_key_fk" FOREIGN KEY ("case_key") REFERENCES "public"."set_case"("case_key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "showing" ADD CONSTRAINT "showing_member" FOREIGN KEY ("club_id","member_id") REFERENCES "public"."membership"("club_id","member_id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "membership_nickname" ON "membership" USING btree ("club_id",lower("nickname"));--> statement-breakpoint
CREATE INDEX "refresh_token_family" ON "refresh_token" USING btree ("family_id");--> statement-breakpoint
CREATE INDEX "refresh_token_account" ON "refresh_token" USING btree ("account_id");--> statement-breakpoint
CREATE INDEX "intake_draft_open" ON "intake_draft" USING btree ("state","created_at");--> statement-breakpoint
CREATE INDEX "case_state_set" ON "case_state" USING btree ("club_id","member_id","set_key");--> statement-breakpoint
CREATE INDEX "first_answer_day" ON "first_answer" USING btree ("club_id","member_id","set_key","local_day");--> statement-breakpoint
CREATE INDEX "mis_tap_case" ON "mis_tap" USING btree ("club_id","member_id","case_key");--> statement-breakpoint
CREATE INDEX "review_case" ON "review" USING btree ("club_id","member_id","case_key","answered_at");--> statement-breakpoint
CREATE INDEX "review_day" ON "review" USING btree ("club_id","member_id","local_day");--> statement-breakpoint
CREATE INDEX "rollup_member_set" ON "rollup" USING btree ("club_id","member_id","set_key","day");--> statement-breakpoint
CREATE INDEX "showing_day" ON "showing" USING btree ("club_id","member_id","local_day","position");--> statement-breakpoint
CREATE TABLE "rate_limit" (
	"key" varchar(255) PRIMARY KEY,
	"points" integer NOT NULL DEFAULT 0,
	"expire" bigint
);
--> statement-breakpoint
-- ---------------------------------------------------------------- Partitions of the log
-- The first UUIDv7 (RFC 9562, section 5.7: 48 bits of Unix milliseconds first) an instant can have.
CREATE FUNCTION uuidv7_floor(at timestamptz) RETURNS uuid LANGUAGE sql IMMUTABLE PARALLEL SAFE AS $$
  SELECT (lpad(to_hex((extract(epoch FROM at) * 1000)::bigint), 12, '0') || '70008000000000000000')::uuid
$$;
--> statement-breakpoint
-- Odd clocks land here rather than nowhere; a job watches that it stays empty.
CREATE TABLE "review_other" PARTITION OF "review" DEFAULT;
--> statement-breakpoint
-- ---------------------------------------------------------------- The walls
CREATE FUNCTION app_club() RETURNS uuid LANGUAGE sql STABLE PARALLEL SAFE AS $$
  SELECT nullif(current_setting('app.club_id', true), '')::uuid
$$;
--> statement-breakpoint
CREATE FUNCTION app_is_administrator() RETURNS boolean LANGUAGE sql STABLE PARALLEL SAFE AS $$
  SELECT current_setting('app.role', true) IS NOT DISTINCT FROM 'administrator'
$$;
--> statement-breakpoint
-- Two policies for every table that carries club_id: the application role sees the club of its session and
-- nothing without one; the owner (migrations, jobs, the functions below) sees all.
CREATE PROCEDURE wall_off(tenant_table regclass) LANGUAGE plpgsql AS $$
BEGIN
  EXECUTE format('ALTER TABLE %s ENABLE ROW LEVEL SECURITY', tenant_table);
  EXECUTE format('ALTER TABLE %s FORCE ROW LEVEL SECURITY', tenant_table);
  EXECUTE format('CREATE POLICY own_club ON %s TO sixteenfold_app USING (club_id = (SELECT app_club())) WITH CHECK (club_id = (SELECT app_club()))', tenant_table);
  EXECUTE format('CREATE POLICY owner_all ON %s TO sixteenfold_owner USING (true) WITH CHECK (true)', tenant_table);
END
$$;
--> statement-breakpoint
CALL wall_off('club');
--> statement-breakpoint
CALL wall_off('membership');
--> statement-breakpoint
CALL wall_off('programme');
--> statement-breakpoint
CALL wall_off('programme_member');
--> statement-breakpoint
CALL wall_off('shared_board_club');
--> statement-breakpoint
CALL wall_off('published_team_row');
--> statement-breakpoint
CALL wall_off('showing');
--> statement-breakpoint
CALL wall_off('review');
--> statement-breakpoint
CALL wall_off('review_other');
--> statement-breakpoint
CALL wall_off('mis_tap');
--> statement-breakpoint
CALL wall_off('case_state');
--> statement-breakpoint
CALL wall_off('first_answer');
--> statement-breakpoint
CALL wall_off('rollup');
--> statement-breakpoint
-- Makes the monthly partitions of the log that cover the span; those that stand are left alone.
CREATE FUNCTION ensure_review_partitions(from_instant timestamptz, to_instant timestamptz) RETURNS integer
LANGUAGE plpgsql AS $$
DECLARE
  month timestamptz := date_trunc('month', from_instant, 'UTC');
  name text;
  made integer := 0;
BEGIN
  PERFORM pg_advisory_xact_lock(hashtext('ensure_review_partitions'));
  WHILE month <= to_instant LOOP
    name := 'review_' || to_char(month AT TIME ZONE 'UTC', 'YYYY_MM');
    IF to_regclass(name) IS NULL THEN
      EXECUTE format('CREATE TABLE %I PARTITION OF review FOR VALUES FROM (%L) TO (%L)',
        name, uuidv7_floor(month), uuidv7_floor(month + interval '1 month'));
      EXECUTE format('CALL wall_off(%L)', name);
      made := made + 1;
    END IF;
    month := month + interval '1 month';
  END LOOP;
  RETURN made;
END
$$;
--> statement-breakpoint
-- The catalogue is read by everyone signed in; only a session opened as administrator writes it.
CREATE PROCEDURE administrators_write(catalogue_table regclass) LANGUAGE plpgsql AS $$
BEGIN
  EXECUTE format('ALTER TABLE %s ENABLE ROW LEVEL SECURITY', catalogue_table);
  EXECUTE format('ALTER TABLE %s FORCE ROW LEVEL SECURITY', catalogue_table);
  EXECUTE format('CREATE POLICY everyone_reads ON %s FOR SELECT TO sixteenfold_app USING (true)', catalogue_table);
  EXECUTE format('CREATE POLICY administrators_insert ON %s FOR INSERT TO sixteenfold_app WITH CHECK ((SELECT app_is_administrator()))', catalogue_table);
  EXECUTE format('CREATE POLICY owner_all ON %s TO sixteenfold_owner USING (true) WITH CHECK (true)', catalogue_table);
END
$$;
--> statement-breakpoint
CALL administrators_write('case_set');
--> statement-breakpoint
CALL administrators_write('set_case');
--> statement-breakpoint
CALL administrators_write('edition');
--> statement-breakpoint
CALL administrators_write('edition_case');
--> statement-breakpoint
CALL administrators_write('edition_algorithm');
--> statement-breakpoint
ALTER TABLE "intake_draft" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "intake_draft" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY administrators_only ON "intake_draft" TO sixteenfold_app USING ((SELECT app_is_administrator())) WITH CHECK ((SELECT app_is_administrator()));
--> statement-breakpoint
CREATE POLICY owner_all ON "intake_draft" TO sixteenfold_owner USING (true) WITH CHECK (true);
--> statement-breakpoint
ALTER TABLE "intake_line" ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE "intake_line" FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY administrators_only ON "intake_line" TO sixteenfold_app USING ((SELECT app_is_administrator())) WITH CHECK ((SELECT app_is_administrator()));
--> statement-breakpoint
CREATE POLICY owner_all ON "intake_line" TO sixteenfold_owner USING (true) WITH CHECK (true);
--> statement-breakpoint
DROP PROCEDURE administrators_write(regclass);
--> statement-breakpoint
-- Editions never change once written, not even by the owner's hand.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END
$$;
--> statement-breakpoint
CREATE TRIGGER edition_is_immutable BEFORE UPDATE OR DELETE ON "edition" FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER edition_case_is_immutable BEFORE UPDATE OR DELETE ON "edition_case" FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER edition_algorithm_is_immutable BEFORE UPDATE OR DELETE ON "edition_algorithm" FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
-- ---------------------------------------------------------------- Grants
GRANT USAGE ON SCHEMA public TO sixteenfold_app;
--> statement-breakpoint
-- Of functions made from here on. (Limited to a schema, this would not take away what everyone has by default.)
ALTER DEFAULT PRIVILEGES REVOKE EXECUTE ON FUNCTIONS FROM PUBLIC;
--> statement-breakpoint
REVOKE ALL ON ALL FUNCTIONS IN SCHEMA public FROM PUBLIC;
--> statement-breakpoint
REVOKE ALL ON ALL PROCEDURES IN SCHEMA public FROM PUBLIC;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION app_club(), app_is_administrator(), uuidv7_floor(timestamptz) TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, INSERT ON "case_set", "set_case", "edition", "edition_case", "edition_algorithm" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ON "intake_draft", "intake_line" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT ON "club", "shared_board", "shared_board_club" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, UPDATE ON "membership" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "programme", "programme_member" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ON "showing", "published_team_row" TO sixteenfold_app;
--> statement-breakpoint
-- The log and its mis-taps: nobody but the owner's erasure takes a row back.
GRANT SELECT, INSERT ON "review", "mis_tap" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "case_state", "first_answer", "rollup" TO sixteenfold_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "rate_limit" TO sixteenfold_app;
--> statement-breakpoint
-- ---------------------------------------------------------------- Functions that look across
-- Each runs as the owner, takes only what it needs and gives back only what its caller may know.
CREATE FUNCTION sign_in_lookup(sign_in text)
RETURNS TABLE (account_id uuid, password_hash text, is_administrator boolean, disabled boolean, epoch integer)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  SELECT a.account_id, a.password_hash, a.is_administrator, a.disabled_at IS NOT NULL, a.epoch
  FROM account a WHERE a.email = lower(sign_in) OR a.sign_in_name = lower(sign_in)
$$;
--> statement-breakpoint
CREATE FUNCTION rehash_password(of_account uuid, old_hash text, new_hash text) RETURNS boolean
LANGUAGE sql SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  UPDATE account SET password_hash = new_hash WHERE account_id = of_account AND password_hash = old_hash RETURNING true
$$;
--> statement-breakpoint
-- The clubs a person is in: asked after the password was checked, or for the person's own session.
CREATE FUNCTION memberships_of(of_account uuid)
RETURNS TABLE (club_id uuid, club_name text, member_id uuid, role text, nickname text, epoch integer)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  SELECT m.club_id, c.name, m.member_id, m.role, m.nickname, m.epoch
  FROM membership m JOIN club c ON c.club_id = m.club_id
  WHERE m.account_id = of_account AND m.left_at IS NULL
  ORDER BY m.joined_at, m.club_id
$$;
--> statement-breakpoint
CREATE FUNCTION start_session(new_token uuid, new_family uuid, of_account uuid, in_club uuid, new_hash bytea, at timestamptz, until timestamptz)
RETURNS void LANGUAGE sql SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  INSERT INTO refresh_token (token_id, family_id, account_id, club_id, token_hash, issued_at, expires_at, family_started_at)
  VALUES (new_token, new_family, of_account, in_club, new_hash, at, until, at)
$$;
--> statement-breakpoint
-- Changes a refresh token for the next of its family. A token used before is taken again for 60 s (the reply
-- was lost on the way); later it means that two hold it, and the whole family ends (RFC 9700, 4.14).
CREATE FUNCTION rotate_session(old_hash bytea, new_token uuid, new_hash bytea, in_club uuid, change_club boolean, at timestamptz, until timestamptz)
RETURNS TABLE (verdict text, account_id uuid, club_id uuid, family_id uuid)
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, public AS $$
DECLARE
  t refresh_token;
  next_club uuid;
BEGIN
  SELECT * INTO t FROM refresh_token r WHERE r.token_hash = old_hash FOR UPDATE;
  IF NOT FOUND THEN
    RETURN QUERY SELECT 'unknown', NULL::uuid, NULL::uuid, NULL::uuid; RETURN;
  END IF;
  IF t.revoked_at IS NOT NULL OR t.expires_at <= at OR t.family_started_at <= at - interval '30 days' THEN
    RETURN QUERY SELECT 'ended', NULL::uuid, NULL::uuid, NULL::uuid; RETURN;
  END IF;
  IF t.used_at IS NOT NULL AND t.used_at < at - interval '60 seconds' THEN
    UPDATE refresh_token r SET revoked_at = at WHERE r.family_id = t.family_id AND r.revoked_at IS NULL;
    RETURN QUERY SELECT 'reused', t.account_id, NULL::uuid, t.family_id; RETURN;
  END IF;
  next_club := CASE WHEN change_club THEN in_club ELSE t.club_id END;
  UPDATE refresh_token r SET used_at = coalesce(r.used_at, at) WHERE r.token_id = t.token_id;
  INSERT INTO refresh_token (token_id, family_id, account_id, club_id, token_hash, issued_at, expires_at, family_started_at)
  VALUES (new_token, t.family_id, t.account_id, next_club, new_hash, at, until, t.family_started_at);
  RETURN QUERY SELECT 'rotated', t.account_id, next_club, t.family_id;
END
$$;
--> statement-breakpoint
CREATE FUNCTION end_session(of_family uuid, at timestamptz) RETURNS void
LANGUAGE sql SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  UPDATE refresh_token SET revoked_at = at WHERE family_id = of_family AND revoked_at IS NULL
$$;
--> statement-breakpoint
-- What a token may claim now: the account is not disabled, the device not signed out, the role and the epoch
-- (account's + membership's) the same. Asked when a token is made.
CREATE FUNCTION session_subject(of_account uuid, in_club uuid)
RETURNS TABLE (role text, epoch integer)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  SELECT m.role, a.epoch + m.epoch FROM account a JOIN membership m ON m.account_id = a.account_id
  WHERE a.account_id = of_account AND a.disabled_at IS NULL AND m.club_id = in_club AND m.left_at IS NULL
  UNION ALL
  SELECT 'administrator', a.epoch FROM account a
  WHERE a.account_id = of_account AND in_club IS NULL AND a.is_administrator AND a.disabled_at IS NULL
$$;
--> statement-breakpoint
-- Opens a transaction's session: checks the token's claims against the tables and sets the variables that
-- row-level security reads, in one round trip. No row: the session is over.
CREATE FUNCTION open_session(of_account uuid, in_club uuid, as_role text, with_epoch integer, of_family uuid)
RETURNS TABLE (member_id uuid, nickname text, club_name text, time_zone text, rollover_hour smallint)
LANGUAGE plpgsql SECURITY DEFINER SET search_path = pg_catalog, public AS $$
BEGIN
  IF of_family IS NOT NULL AND NOT EXISTS (
    SELECT 1 FROM refresh_token r
    WHERE r.family_id = of_family AND r.account_id = of_account AND r.revoked_at IS NULL
  ) THEN
    RETURN;
  END IF;
  IF as_role = 'administrator' THEN
    IF in_club IS NOT NULL OR NOT EXISTS (
      SELECT 1 FROM account a
      WHERE a.account_id = of_account AND a.is_administrator AND a.disabled_at IS NULL AND a.epoch = with_epoch
    ) THEN
      RETURN;
    END IF;
    PERFORM set_config('app.club_id', '', true), set_config('app.member_id', '', true), set_config('app.role', 'administrator', true);
    RETURN QUERY SELECT NULL::uuid, NULL::text, NULL::text, 'UTC'::text, 0::smallint;
    RETURN;
  END IF;
  RETURN QUERY
    SELECT m.member_id, m.nickname, c.name, m.time_zone, m.rollover_hour
    FROM membership m JOIN account a ON a.account_id = m.account_id JOIN club c ON c.club_id = m.club_id
    WHERE m.club_id = in_club AND m.account_id = of_account AND m.left_at IS NULL AND m.role = as_role
      AND a.disabled_at IS NULL AND a.epoch + m.epoch = with_epoch;
  IF FOUND THEN
    PERFORM set_config('app.club_id', in_club::text, true), set_config('app.role', as_role, true);
  END IF;
END
$$;
--> statement-breakpoint
-- Team figures of the clubs on a board, for a session whose club is on it: names of clubs, never of people.
CREATE FUNCTION published_team_rows(of_board uuid)
RETURNS TABLE (club_id uuid, club_name text, day integer, members integer, theta double precision, standard_error double precision)
LANGUAGE sql STABLE SECURITY DEFINER SET search_path = pg_catalog, public AS $$
  SELECT DISTINCT ON (p.club_id) p.club_id, c.name, p.day, p.members, p.theta, p.standard_error
  FROM published_team_row p JOIN club c ON c.club_id = p.club_id
  WHERE p.board_id = of_board
    AND EXISTS (SELECT 1 FROM shared_board_club s WHERE s.board_id = of_board AND s.club_id = app_club())
  ORDER BY p.club_id, p.day DESC
$$;
--> statement-breakpoint
GRANT EXECUTE ON FUNCTION sign_in_lookup(text), rehash_password(uuid, text, text), memberships_of(uuid),
  start_session(uuid, uuid, uuid, uuid, bytea, timestamptz, timestamptz),
  rotate_session(bytea, uuid, bytea, uuid, boolean, timestamptz, timestamptz),
  end_session(uuid, timestamptz), session_subject(uuid, uuid),
  open_session(uuid, uuid, text, integer, uuid), published_team_rows(uuid) TO sixteenfold_app;
