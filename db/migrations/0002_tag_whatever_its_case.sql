ALTER TABLE "components" DROP CONSTRAINT "components_tag";--> statement-breakpoint
CREATE UNIQUE INDEX "components_tag" ON "components" USING btree ("site_id",lower("tag"));