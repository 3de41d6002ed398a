CREATE TABLE "brewery" (
	"id" uuid PRIMARY KEY NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"currency" text NOT NULL,
	"units" jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "brewery_slug" UNIQUE("slug")
);
--> statement-breakpoint
CREATE TABLE "house_rules" (
	"brewery_id" uuid PRIMARY KEY NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"changes" jsonb DEFAULT '{}'::jsonb NOT NULL
);
--> statement-breakpoint
CREATE TABLE "join_link" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"role" text NOT NULL,
	"token_hash" text NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"used_by" uuid,
	CONSTRAINT "join_link_token" UNIQUE("token_hash"),
	CONSTRAINT "join_link_role" CHECK ("join_link"."role" in ('head-brewer', 'brewer', 'taster'))
);
--> statement-breakpoint
CREATE TABLE "membership" (
	"brewery_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	"joined_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "membership_key" PRIMARY KEY("brewery_id","person_id"),
	CONSTRAINT "membership_role" CHECK ("membership"."role" in ('head-brewer', 'brewer', 'taster'))
);
--> statement-breakpoint
CREATE TABLE "cake" (
	"batch_id" uuid PRIMARY KEY NOT NULL,
	"state" text NOT NULL,
	"measured" jsonb,
	CONSTRAINT "cake_state" CHECK ("cake"."state" in ('growing', 'bare', 'poured', 'jarred', 'dumped'))
);
--> statement-breakpoint
CREATE TABLE "jar" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"cake_batch_id" uuid,
	"filled_on" date,
	"volume_l" double precision,
	"mass_kg" double precision,
	"generation" integer,
	"label" text DEFAULT '' NOT NULL,
	"notes" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "batch" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"season_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"style" text DEFAULT '' NOT NULL,
	"volume_l" double precision,
	"og" double precision,
	"fg" double precision,
	"srm" double precision,
	"ibu" double precision,
	"ferment_c" double precision,
	"days_under_beer" integer,
	"brew_on" date,
	"wanted_on" date,
	"dry_hops" jsonb,
	"additions" jsonb,
	"allergens" jsonb,
	"cultures" jsonb,
	"trub" text DEFAULT 'some' NOT NULL,
	"vessel_id" uuid,
	"yeast_id" uuid,
	"notes" text DEFAULT '' NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"chain_id" uuid,
	"shelf_id" uuid GENERATED ALWAYS AS (coalesce(chain_id, season_id)) STORED,
	"place" integer,
	"stage" text DEFAULT 'pencilled' NOT NULL,
	"read_volume_l" double precision,
	"read_og" double precision,
	"read_fg" double precision,
	"racked_on" date,
	"scrap_reason" text DEFAULT '' NOT NULL,
	"taken_on" date,
	"keep_l" double precision,
	"keep_whole" boolean DEFAULT false NOT NULL,
	"left_above_l" double precision,
	"cake_c" double precision,
	"starter" boolean DEFAULT false NOT NULL,
	"link_typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"acceptance" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "batch_place" UNIQUE("shelf_id","place"),
	CONSTRAINT "batch_stage" CHECK ("batch"."stage" in ('pencilled', 'fermenting', 'racked', 'scrapped')),
	CONSTRAINT "batch_scrapped_stands_nowhere" CHECK (("batch"."stage" = 'scrapped') = ("batch"."place" is null)),
	CONSTRAINT "batch_scrapped_off_chain" CHECK ("batch"."stage" <> 'scrapped' or "batch"."chain_id" is null)
);
--> statement-breakpoint
CREATE TABLE "chain" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"season_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"yeast_id" uuid NOT NULL,
	"vessel_id" uuid,
	"line_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"start_kind" text NOT NULL,
	"start_batch_id" uuid,
	"start_generation" integer,
	"start_price" integer,
	CONSTRAINT "chain_position" UNIQUE("season_id","position"),
	CONSTRAINT "chain_in_season" UNIQUE("season_id","id"),
	CONSTRAINT "chain_start" CHECK (("chain"."start_kind" = 'pack' and "chain"."start_batch_id" is null and "chain"."start_generation" is null)
        or ("chain"."start_kind" = 'cake' and "chain"."start_batch_id" is not null and "chain"."start_generation" is null)
        or ("chain"."start_kind" = 'outside' and "chain"."start_batch_id" is null and "chain"."start_generation" is not null))
);
--> statement-breakpoint
CREATE TABLE "change" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"season_id" uuid NOT NULL,
	"seq" bigint GENERATED ALWAYS AS IDENTITY (sequence name "change_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"kind" text NOT NULL,
	"what" text NOT NULL,
	"before" jsonb NOT NULL,
	"after" jsonb NOT NULL,
	"touches" uuid[] NOT NULL,
	"of_change" uuid,
	CONSTRAINT "change_seq" UNIQUE("seq"),
	CONSTRAINT "change_kind" CHECK ("change"."kind" in ('move', 'edit', 'undo', 'redo')),
	CONSTRAINT "change_of_what" CHECK (("change"."kind" in ('undo', 'redo')) = ("change"."of_change" is not null))
);
--> statement-breakpoint
CREATE TABLE "try_count" (
	"key" varchar(255) PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "person" (
	"id" uuid PRIMARY KEY NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"password_hash" text NOT NULL,
	"units" jsonb NOT NULL,
	"theme" text DEFAULT 'system' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "session" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "blocked_day" (
	"season_id" uuid NOT NULL,
	"day" date NOT NULL,
	CONSTRAINT "blocked_day_key" PRIMARY KEY("season_id","day")
);
--> statement-breakpoint
CREATE TABLE "season" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"revision" integer DEFAULT 0 NOT NULL,
	"brew_weekdays" integer[] DEFAULT '{6,7}' NOT NULL,
	"brews_per_day" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "season_in_brewery" UNIQUE("brewery_id","id")
);
--> statement-breakpoint
CREATE TABLE "vessel" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"shape" text NOT NULL,
	"capacity_l" double precision NOT NULL,
	"blow_off" boolean NOT NULL,
	"min_c" double precision,
	"max_c" double precision,
	"cleaned_on" date,
	"notes" text DEFAULT '' NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	CONSTRAINT "vessel_in_brewery" UNIQUE("brewery_id","id"),
	CONSTRAINT "vessel_shape" CHECK ("vessel"."shape" in ('bucket', 'carboy', 'conical', 'keg'))
);
--> statement-breakpoint
CREATE TABLE "yeast" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"character" boolean NOT NULL,
	"ferment_min_c" double precision,
	"ferment_max_c" double precision,
	"pour_min_c" double precision,
	"pour_max_c" double precision,
	"never_above_c" double precision,
	"generation_limit" integer,
	"attenuation" double precision,
	"pack_price" integer,
	"notes" text DEFAULT '' NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	CONSTRAINT "yeast_in_brewery" UNIQUE("brewery_id","id"),
	CONSTRAINT "yeast_kind" CHECK ("yeast"."kind" in ('ale', 'lager'))
);
--> statement-breakpoint
CREATE TABLE "yeast_line" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"yeast_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "yeast_line_in_brewery" UNIQUE("brewery_id","id")
);
--> statement-breakpoint
ALTER TABLE "house_rules" ADD CONSTRAINT "house_rules_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "join_link" ADD CONSTRAINT "join_link_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "join_link" ADD CONSTRAINT "join_link_created_by_person_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "join_link" ADD CONSTRAINT "join_link_used_by_person_id_fk" FOREIGN KEY ("used_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cake" ADD CONSTRAINT "cake_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jar" ADD CONSTRAINT "jar_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jar" ADD CONSTRAINT "jar_cake_batch_id_cake_batch_id_fk" FOREIGN KEY ("cake_batch_id") REFERENCES "public"."cake"("batch_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch" ADD CONSTRAINT "batch_season" FOREIGN KEY ("brewery_id","season_id") REFERENCES "public"."season"("brewery_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch" ADD CONSTRAINT "batch_chain" FOREIGN KEY ("season_id","chain_id") REFERENCES "public"."chain"("season_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch" ADD CONSTRAINT "batch_vessel" FOREIGN KEY ("brewery_id","vessel_id") REFERENCES "public"."vessel"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch" ADD CONSTRAINT "batch_yeast" FOREIGN KEY ("brewery_id","yeast_id") REFERENCES "public"."yeast"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain" ADD CONSTRAINT "chain_start_batch_id_batch_id_fk" FOREIGN KEY ("start_batch_id") REFERENCES "public"."batch"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain" ADD CONSTRAINT "chain_season" FOREIGN KEY ("brewery_id","season_id") REFERENCES "public"."season"("brewery_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain" ADD CONSTRAINT "chain_yeast" FOREIGN KEY ("brewery_id","yeast_id") REFERENCES "public"."yeast"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain" ADD CONSTRAINT "chain_vessel" FOREIGN KEY ("brewery_id","vessel_id") REFERENCES "public"."vessel"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain" ADD CONSTRAINT "chain_line" FOREIGN KEY ("brewery_id","line_id") REFERENCES "public"."yeast_line"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "change" ADD CONSTRAINT "change_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "change" ADD CONSTRAINT "change_of_change_change_id_fk" FOREIGN KEY ("of_change") REFERENCES "public"."change"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "change" ADD CONSTRAINT "change_season" FOREIGN KEY ("brewery_id","season_id") REFERENCES "public"."season"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "session" ADD CONSTRAINT "session_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "blocked_day" ADD CONSTRAINT "blocked_day_season_id_season_id_fk" FOREIGN KEY ("season_id") REFERENCES "public"."season"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "season" ADD CONSTRAINT "season_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "vessel" ADD CONSTRAINT "vessel_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "yeast" ADD CONSTRAINT "yeast_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "yeast_line" ADD CONSTRAINT "yeast_line_yeast" FOREIGN KEY ("brewery_id","yeast_id") REFERENCES "public"."yeast"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "join_link_brewery" ON "join_link" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "membership_person" ON "membership" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "jar_brewery" ON "jar" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "jar_cake" ON "jar" USING btree ("cake_batch_id");--> statement-breakpoint
CREATE INDEX "batch_brewery_season" ON "batch" USING btree ("brewery_id","season_id");--> statement-breakpoint
CREATE INDEX "batch_season_chain_place" ON "batch" USING btree ("season_id","chain_id","place");--> statement-breakpoint
CREATE INDEX "batch_vessel_index" ON "batch" USING btree ("vessel_id");--> statement-breakpoint
CREATE INDEX "batch_yeast_index" ON "batch" USING btree ("yeast_id");--> statement-breakpoint
CREATE INDEX "chain_brewery_season" ON "chain" USING btree ("brewery_id","season_id");--> statement-breakpoint
CREATE INDEX "chain_start_batch" ON "chain" USING btree ("start_batch_id");--> statement-breakpoint
CREATE INDEX "chain_yeast_index" ON "chain" USING btree ("yeast_id");--> statement-breakpoint
CREATE INDEX "chain_vessel_index" ON "chain" USING btree ("vessel_id");--> statement-breakpoint
CREATE INDEX "change_season_person" ON "change" USING btree ("season_id","person_id","seq");--> statement-breakpoint
CREATE INDEX "change_of" ON "change" USING btree ("of_change","seq");--> statement-breakpoint
CREATE INDEX "try_count_expire" ON "try_count" USING btree ("expire");--> statement-breakpoint
CREATE UNIQUE INDEX "person_email" ON "person" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "session_person" ON "session" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "session_expiry" ON "session" USING btree ("expires_at");--> statement-breakpoint
CREATE INDEX "season_brewery" ON "season" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "vessel_brewery" ON "vessel" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "yeast_brewery" ON "yeast" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "yeast_line_yeast_index" ON "yeast_line" USING btree ("yeast_id");--> statement-breakpoint
-- From here on by hand: what the schema files cannot say.
-- A move renumbers its shelves in one transaction, so places are compared when it ends.
ALTER TABLE "batch" DROP CONSTRAINT "batch_place";--> statement-breakpoint
ALTER TABLE "batch" ADD CONSTRAINT "batch_place" UNIQUE("shelf_id","place") DEFERRABLE INITIALLY DEFERRED;--> statement-breakpoint
ALTER TABLE "chain" DROP CONSTRAINT "chain_position";--> statement-breakpoint
ALTER TABLE "chain" ADD CONSTRAINT "chain_position" UNIQUE("season_id","position") DEFERRABLE INITIALLY DEFERRED;--> statement-breakpoint
-- The change record only grows. The one redaction, a closed account's name, is the person row's.
CREATE FUNCTION refuse_change_of_record() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'the change record is append-only' USING ERRCODE = 'restrict_violation';
END $$;--> statement-breakpoint
CREATE TRIGGER change_is_append_only BEFORE UPDATE OR DELETE ON "change"
  FOR EACH ROW EXECUTE FUNCTION refuse_change_of_record();--> statement-breakpoint
CREATE TRIGGER change_is_never_emptied BEFORE TRUNCATE ON "change"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change_of_record();
