ALTER TABLE "findings" DROP CONSTRAINT "findings_kind";--> statement-breakpoint
ALTER TABLE "flaws" DROP CONSTRAINT "flaws_kind";--> statement-breakpoint
ALTER TABLE "locations" ADD COLUMN "hole_radius_mm" double precision;--> statement-breakpoint
ALTER TABLE "locations" ADD CONSTRAINT "locations_hole_radius" CHECK ("locations"."hole_radius_mm" >= 1 and "locations"."hole_radius_mm" <= 10000);--> statement-breakpoint
ALTER TABLE "findings" ADD CONSTRAINT "findings_kind" CHECK ("findings"."kind" in ('surface', 'extended surface', 'embedded', 'through-wall', 'corner', 'edge'));--> statement-breakpoint
ALTER TABLE "flaws" ADD CONSTRAINT "flaws_kind" CHECK ("flaws"."kind" in ('surface', 'extended surface', 'embedded', 'through-wall', 'corner', 'edge'));