CREATE TABLE "cake_check" (
	"batch_id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"tasted" text NOT NULL,
	"faults" text[] DEFAULT '{}' NOT NULL,
	"volume_l" double precision,
	"mass_kg" double precision,
	"full_kg" double precision,
	"tare_kg" double precision,
	"layers" text,
	"colour" text,
	"smells" text[] DEFAULT '{}' NOT NULL,
	"count" jsonb,
	"judged" text NOT NULL,
	"notes" text DEFAULT '' NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"signed_by" uuid NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "cake_check_tasted" CHECK ("cake_check"."tasted" in ('clean', 'off')),
	CONSTRAINT "cake_check_judged" CHECK ("cake_check"."judged" in ('fit', 'with-care', 'unfit'))
);
--> statement-breakpoint
CREATE TABLE "surplus" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"what" text NOT NULL,
	"cake_batch_id" uuid NOT NULL,
	"yeast_id" uuid NOT NULL,
	"generation" integer NOT NULL,
	"day" date NOT NULL,
	"volume_l" double precision,
	"mass_kg" double precision,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"notes" text DEFAULT '' NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "surplus_what" CHECK ("surplus"."what" in ('jar', 'dumped'))
);
--> statement-breakpoint
CREATE TABLE "pour_clearance" (
	"id" uuid PRIMARY KEY NOT NULL,
	"run_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"kind" text NOT NULL,
	"reading_id" uuid,
	"asked_by" uuid NOT NULL,
	"asked_at" timestamp with time zone NOT NULL,
	"findings" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"answer" text,
	"answered_by" uuid,
	"answered_at" timestamp with time zone,
	"reason" text DEFAULT '' NOT NULL,
	"expires_at" timestamp with time zone,
	CONSTRAINT "pour_clearance_kind" CHECK ("pour_clearance"."kind" in ('reading', 'override')),
	CONSTRAINT "pour_clearance_answer" CHECK ("pour_clearance"."answer" in ('granted', 'refused')),
	CONSTRAINT "pour_clearance_answered" CHECK (("pour_clearance"."answer" is null) = ("pour_clearance"."answered_at" is null)),
	CONSTRAINT "pour_clearance_expires" CHECK ("pour_clearance"."answer" is distinct from 'granted' or "pour_clearance"."expires_at" is not null)
);
--> statement-breakpoint
CREATE TABLE "pour_event" (
	"id" uuid PRIMARY KEY NOT NULL,
	"run_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"batch_id" uuid NOT NULL,
	"cake_batch_id" uuid,
	"device_at" timestamp with time zone NOT NULL,
	"clock_offset_ms" integer NOT NULL,
	"arrived_at" timestamp with time zone NOT NULL,
	"person_id" uuid NOT NULL,
	"reading_id" uuid,
	"clearance_id" uuid,
	"volume_l" double precision,
	"og" double precision,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"judged" jsonb NOT NULL,
	"cleared" boolean NOT NULL,
	"signed_by" uuid,
	"signed_at" timestamp with time zone,
	"reason" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "pour_event_signed" CHECK (("pour_event"."signed_by" is null) = ("pour_event"."signed_at" is null)),
	CONSTRAINT "pour_event_cleared" CHECK (not "pour_event"."cleared" or "pour_event"."clearance_id" is not null)
);
--> statement-breakpoint
CREATE TABLE "pour_reading" (
	"id" uuid PRIMARY KEY NOT NULL,
	"run_id" uuid NOT NULL,
	"temperature_c" double precision NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"device_at" timestamp with time zone NOT NULL,
	"clock_offset_ms" integer NOT NULL,
	"arrived_at" timestamp with time zone NOT NULL,
	"person_id" uuid NOT NULL,
	"withdrawn_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "pour_run" (
	"id" uuid PRIMARY KEY NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"brewery_id" uuid NOT NULL,
	"season_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"cake_batch_id" uuid,
	"opened_by" uuid NOT NULL,
	"opened_at" timestamp with time zone NOT NULL,
	"closed_at" timestamp with time zone,
	"state" text DEFAULT 'open' NOT NULL,
	"step" text NOT NULL,
	"steps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	CONSTRAINT "pour_run_state" CHECK ("pour_run"."state" in ('open', 'poured', 'left')),
	CONSTRAINT "pour_run_closed" CHECK (("pour_run"."state" = 'open') = ("pour_run"."closed_at" is null))
);
--> statement-breakpoint
CREATE TABLE "batch_event" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"edited_at" timestamp with time zone,
	"kind" text NOT NULL,
	"planned_on" date,
	"done_at" timestamp with time zone,
	"done_by" uuid,
	"text" text DEFAULT '' NOT NULL,
	CONSTRAINT "batch_event_kind" CHECK ("batch_event"."kind" in ('dry-hop', 'addition', 'yeast-taken', 'other')),
	CONSTRAINT "batch_event_day" CHECK ("batch_event"."planned_on" is not null or "batch_event"."done_at" is not null)
);
--> statement-breakpoint
CREATE TABLE "batch_note" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"edited_at" timestamp with time zone,
	"text" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "instrument" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"correction" double precision DEFAULT 0 NOT NULL,
	"calibrated_c" double precision,
	"notes" text DEFAULT '' NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"retired_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "instrument_in_brewery" UNIQUE("brewery_id","id"),
	CONSTRAINT "instrument_kind" CHECK ("instrument"."kind" in ('hydrometer', 'refractometer', 'thermometer', 'ph-meter'))
);
--> statement-breakpoint
CREATE TABLE "reading" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"batch_id" uuid NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"edited_at" timestamp with time zone,
	"kind" text NOT NULL,
	"taken_at" timestamp with time zone NOT NULL,
	"shown" double precision NOT NULL,
	"value" double precision NOT NULL,
	"method" text,
	"sample_c" double precision,
	"instrument_id" uuid,
	"notes" text DEFAULT '' NOT NULL,
	"typed" jsonb DEFAULT '{}'::jsonb NOT NULL,
	CONSTRAINT "reading_kind" CHECK ("reading"."kind" in ('gravity', 'temperature', 'ph')),
	CONSTRAINT "reading_method" CHECK (("reading"."method" is not null) = ("reading"."kind" = 'gravity'))
);
--> statement-breakpoint
ALTER TABLE "batch" ADD COLUMN "followed" jsonb;--> statement-breakpoint
ALTER TABLE "cake_check" ADD CONSTRAINT "cake_check_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cake_check" ADD CONSTRAINT "cake_check_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cake_check" ADD CONSTRAINT "cake_check_signed_by_person_id_fk" FOREIGN KEY ("signed_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surplus" ADD CONSTRAINT "surplus_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surplus" ADD CONSTRAINT "surplus_cake_batch_id_batch_id_fk" FOREIGN KEY ("cake_batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surplus" ADD CONSTRAINT "surplus_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surplus" ADD CONSTRAINT "surplus_yeast" FOREIGN KEY ("brewery_id","yeast_id") REFERENCES "public"."yeast"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_clearance" ADD CONSTRAINT "pour_clearance_run_id_pour_run_id_fk" FOREIGN KEY ("run_id") REFERENCES "public"."pour_run"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_clearance" ADD CONSTRAINT "pour_clearance_reading_id_pour_reading_id_fk" FOREIGN KEY ("reading_id") REFERENCES "public"."pour_reading"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_clearance" ADD CONSTRAINT "pour_clearance_asked_by_person_id_fk" FOREIGN KEY ("asked_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_clearance" ADD CONSTRAINT "pour_clearance_answered_by_person_id_fk" FOREIGN KEY ("answered_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_event" ADD CONSTRAINT "pour_event_run_id_pour_run_id_fk" FOREIGN KEY ("run_id") REFERENCES "public"."pour_run"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_event" ADD CONSTRAINT "pour_event_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_event" ADD CONSTRAINT "pour_event_cake_batch_id_batch_id_fk" FOREIGN KEY ("cake_batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_event" ADD CONSTRAINT "pour_event_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_event" ADD CONSTRAINT "pour_event_reading_id_pour_reading_id_fk" FOREIGN KEY ("reading_id") REFERENCES "public"."pour_reading"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_event" ADD CONSTRAINT "pour_event_clearance_id_pour_clearance_id_fk" FOREIGN KEY ("clearance_id") REFERENCES "public"."pour_clearance"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_event" ADD CONSTRAINT "pour_event_signed_by_person_id_fk" FOREIGN KEY ("signed_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_reading" ADD CONSTRAINT "pour_reading_run_id_pour_run_id_fk" FOREIGN KEY ("run_id") REFERENCES "public"."pour_run"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_reading" ADD CONSTRAINT "pour_reading_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_run" ADD CONSTRAINT "pour_run_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_run" ADD CONSTRAINT "pour_run_cake_batch_id_batch_id_fk" FOREIGN KEY ("cake_batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_run" ADD CONSTRAINT "pour_run_opened_by_person_id_fk" FOREIGN KEY ("opened_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pour_run" ADD CONSTRAINT "pour_run_season" FOREIGN KEY ("brewery_id","season_id") REFERENCES "public"."season"("brewery_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_event" ADD CONSTRAINT "batch_event_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_event" ADD CONSTRAINT "batch_event_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_event" ADD CONSTRAINT "batch_event_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_event" ADD CONSTRAINT "batch_event_done_by_person_id_fk" FOREIGN KEY ("done_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_note" ADD CONSTRAINT "batch_note_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_note" ADD CONSTRAINT "batch_note_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "batch_note" ADD CONSTRAINT "batch_note_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "instrument" ADD CONSTRAINT "instrument_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading" ADD CONSTRAINT "reading_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading" ADD CONSTRAINT "reading_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading" ADD CONSTRAINT "reading_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading" ADD CONSTRAINT "reading_instrument" FOREIGN KEY ("brewery_id","instrument_id") REFERENCES "public"."instrument"("brewery_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "cake_check_brewery" ON "cake_check" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "surplus_brewery" ON "surplus" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "surplus_cake" ON "surplus" USING btree ("cake_batch_id");--> statement-breakpoint
CREATE INDEX "surplus_yeast_index" ON "surplus" USING btree ("yeast_id");--> statement-breakpoint
CREATE INDEX "pour_clearance_run" ON "pour_clearance" USING btree ("run_id","asked_at");--> statement-breakpoint
CREATE INDEX "pour_clearance_reading" ON "pour_clearance" USING btree ("reading_id");--> statement-breakpoint
CREATE UNIQUE INDEX "pour_event_run" ON "pour_event" USING btree ("run_id");--> statement-breakpoint
CREATE INDEX "pour_event_batch" ON "pour_event" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "pour_event_cake" ON "pour_event" USING btree ("cake_batch_id");--> statement-breakpoint
CREATE INDEX "pour_event_clearance" ON "pour_event" USING btree ("clearance_id");--> statement-breakpoint
CREATE INDEX "pour_event_reading" ON "pour_event" USING btree ("reading_id");--> statement-breakpoint
CREATE INDEX "pour_reading_run" ON "pour_reading" USING btree ("run_id","device_at");--> statement-breakpoint
CREATE UNIQUE INDEX "pour_run_open" ON "pour_run" USING btree ("batch_id") WHERE "pour_run"."state" = 'open';--> statement-breakpoint
CREATE INDEX "pour_run_season_index" ON "pour_run" USING btree ("brewery_id","season_id","state");--> statement-breakpoint
CREATE INDEX "pour_run_batch" ON "pour_run" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "pour_run_cake" ON "pour_run" USING btree ("cake_batch_id");--> statement-breakpoint
CREATE INDEX "batch_event_batch" ON "batch_event" USING btree ("batch_id");--> statement-breakpoint
CREATE INDEX "batch_event_brewery" ON "batch_event" USING btree ("brewery_id","planned_on");--> statement-breakpoint
CREATE INDEX "batch_note_batch" ON "batch_note" USING btree ("batch_id","created_at");--> statement-breakpoint
CREATE INDEX "batch_note_brewery" ON "batch_note" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "instrument_brewery" ON "instrument" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "reading_batch" ON "reading" USING btree ("batch_id","taken_at");--> statement-breakpoint
CREATE INDEX "reading_brewery" ON "reading" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "reading_instrument_index" ON "reading" USING btree ("instrument_id");