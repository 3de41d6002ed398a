ALTER TABLE "change" DROP CONSTRAINT "change_season";
--> statement-breakpoint
ALTER TABLE "season" ADD COLUMN "first_day" date;--> statement-breakpoint
ALTER TABLE "season" ADD COLUMN "last_day" date;--> statement-breakpoint
ALTER TABLE "season" ADD CONSTRAINT "season_days" CHECK ("season"."last_day" >= "season"."first_day");