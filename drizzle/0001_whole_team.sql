CREATE TABLE "presence" (
	"stream_id" uuid PRIMARY KEY NOT NULL,
	"season_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"seen_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "chain_guest" (
	"id" uuid PRIMARY KEY NOT NULL,
	"brewery_id" uuid NOT NULL,
	"chain_id" uuid NOT NULL,
	"role" text NOT NULL,
	"token_hash" text NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"person_id" uuid,
	"guest_brewery_id" uuid,
	"joined_at" timestamp with time zone,
	"withdrawn_at" timestamp with time zone,
	CONSTRAINT "chain_guest_token" UNIQUE("token_hash"),
	CONSTRAINT "chain_guest_role" CHECK ("chain_guest"."role" in ('brewer', 'taster')),
	CONSTRAINT "chain_guest_joined" CHECK (("chain_guest"."person_id" is null) = ("chain_guest"."joined_at" is null))
);
--> statement-breakpoint
CREATE TABLE "share_link" (
	"id" uuid PRIMARY KEY NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"brewery_id" uuid NOT NULL,
	"chain_id" uuid NOT NULL,
	"name" text NOT NULL,
	"token_hash" text NOT NULL,
	"show_prices" boolean DEFAULT false NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"withdrawn_at" timestamp with time zone,
	"visits" integer DEFAULT 0 NOT NULL,
	"last_visit_at" timestamp with time zone,
	CONSTRAINT "share_link_token" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "comment" (
	"id" uuid PRIMARY KEY NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"seq" bigint GENERATED ALWAYS AS IDENTITY (sequence name "comment_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"brewery_id" uuid NOT NULL,
	"chain_id" uuid NOT NULL,
	"about" text NOT NULL,
	"batch_id" uuid,
	"verdict" jsonb,
	"person_id" uuid NOT NULL,
	"text" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"edited_at" timestamp with time zone,
	"deleted_at" timestamp with time zone,
	CONSTRAINT "comment_about" CHECK ("comment"."about" in ('chain', 'link', 'batch')),
	CONSTRAINT "comment_about_what" CHECK (("comment"."about" = 'chain') = ("comment"."batch_id" is null))
);
--> statement-breakpoint
CREATE TABLE "comment_seen" (
	"person_id" uuid NOT NULL,
	"chain_id" uuid NOT NULL,
	"seq" bigint NOT NULL,
	CONSTRAINT "comment_seen_key" PRIMARY KEY("person_id","chain_id")
);
--> statement-breakpoint
ALTER TABLE "brewery" ADD COLUMN "current_season_id" uuid;--> statement-breakpoint
ALTER TABLE "membership" ADD COLUMN "version" integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE "chain" ADD COLUMN "start_allergens" jsonb;--> statement-breakpoint
ALTER TABLE "chain" ADD COLUMN "start_cultures" jsonb;--> statement-breakpoint
ALTER TABLE "person" ADD COLUMN "closed_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "session" ADD COLUMN "device" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "session" ADD COLUMN "seen_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "season" ADD COLUMN "archived_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "presence" ADD CONSTRAINT "presence_season_id_season_id_fk" FOREIGN KEY ("season_id") REFERENCES "public"."season"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "presence" ADD CONSTRAINT "presence_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain_guest" ADD CONSTRAINT "chain_guest_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain_guest" ADD CONSTRAINT "chain_guest_chain_id_chain_id_fk" FOREIGN KEY ("chain_id") REFERENCES "public"."chain"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain_guest" ADD CONSTRAINT "chain_guest_created_by_person_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain_guest" ADD CONSTRAINT "chain_guest_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "chain_guest" ADD CONSTRAINT "chain_guest_guest_brewery_id_brewery_id_fk" FOREIGN KEY ("guest_brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_chain_id_chain_id_fk" FOREIGN KEY ("chain_id") REFERENCES "public"."chain"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "share_link" ADD CONSTRAINT "share_link_created_by_person_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment" ADD CONSTRAINT "comment_brewery_id_brewery_id_fk" FOREIGN KEY ("brewery_id") REFERENCES "public"."brewery"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment" ADD CONSTRAINT "comment_chain_id_chain_id_fk" FOREIGN KEY ("chain_id") REFERENCES "public"."chain"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment" ADD CONSTRAINT "comment_batch_id_batch_id_fk" FOREIGN KEY ("batch_id") REFERENCES "public"."batch"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment" ADD CONSTRAINT "comment_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment_seen" ADD CONSTRAINT "comment_seen_person_id_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."person"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "comment_seen" ADD CONSTRAINT "comment_seen_chain_id_chain_id_fk" FOREIGN KEY ("chain_id") REFERENCES "public"."chain"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "presence_season" ON "presence" USING btree ("season_id","seen_at");--> statement-breakpoint
CREATE INDEX "presence_person" ON "presence" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "chain_guest_brewery" ON "chain_guest" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "chain_guest_chain" ON "chain_guest" USING btree ("chain_id");--> statement-breakpoint
CREATE INDEX "chain_guest_person" ON "chain_guest" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "chain_guest_board" ON "chain_guest" USING btree ("guest_brewery_id");--> statement-breakpoint
CREATE INDEX "share_link_brewery" ON "share_link" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "share_link_chain" ON "share_link" USING btree ("chain_id");--> statement-breakpoint
CREATE INDEX "comment_chain" ON "comment" USING btree ("chain_id","seq");--> statement-breakpoint
CREATE INDEX "comment_brewery" ON "comment" USING btree ("brewery_id");--> statement-breakpoint
CREATE INDEX "comment_batch" ON "comment" USING btree ("batch_id");