CREATE TABLE "tracings" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"job_id" text NOT NULL,
	"file_name" text NOT NULL,
	"bytes" integer NOT NULL,
	"sha256" text NOT NULL,
	"uploaded_by" text NOT NULL,
	"uploaded_at" timestamp (3) with time zone NOT NULL,
	"removed" boolean DEFAULT false NOT NULL
);
--> statement-breakpoint
ALTER TABLE "frames" ADD COLUMN "tracing_id" text;--> statement-breakpoint
ALTER TABLE "tracings" ADD CONSTRAINT "tracings_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tracings" ADD CONSTRAINT "tracings_job_id_jobs_id_fk" FOREIGN KEY ("job_id") REFERENCES "public"."jobs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "tracings_job" ON "tracings" USING btree ("job_id");--> statement-breakpoint
CREATE INDEX "tracings_shop" ON "tracings" USING btree ("shop_id");--> statement-breakpoint
ALTER TABLE "frames" ADD CONSTRAINT "frames_tracing_id_tracings_id_fk" FOREIGN KEY ("tracing_id") REFERENCES "public"."tracings"("id") ON DELETE no action ON UPDATE no action;