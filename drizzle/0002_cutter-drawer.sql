CREATE TABLE "cutters" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"name" text NOT NULL,
	"unit" text NOT NULL,
	"cutter" json NOT NULL,
	"remarks" text NOT NULL,
	"changed_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "edge_presets" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"name" text NOT NULL,
	"preset" json NOT NULL,
	"changed_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "cutters" ADD CONSTRAINT "cutters_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edge_presets" ADD CONSTRAINT "edge_presets_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "cutters_shop_name" ON "cutters" USING btree ("shop_id",lower("name"));--> statement-breakpoint
CREATE UNIQUE INDEX "edge_presets_shop_name" ON "edge_presets" USING btree ("shop_id",lower("name"));