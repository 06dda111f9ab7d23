CREATE TABLE "draft_versions" (
	"frame_id" text NOT NULL,
	"version" integer NOT NULL,
	"particulars" json NOT NULL,
	CONSTRAINT "draft_versions_frame_id_version_pk" PRIMARY KEY("frame_id","version")
);
--> statement-breakpoint
CREATE TABLE "frames" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"job_id" text NOT NULL,
	"particulars" json NOT NULL,
	"version" integer NOT NULL,
	"changed_at" timestamp (3) with time zone NOT NULL,
	"changed_by" text NOT NULL,
	"removed" boolean DEFAULT false NOT NULL,
	"letter" text DEFAULT '' NOT NULL,
	"draft_changed" boolean NOT NULL,
	"width" double precision NOT NULL,
	"height" double precision NOT NULL,
	"openings" integer NOT NULL,
	"stops" integer NOT NULL,
	"cautions" integer NOT NULL,
	"notes" integer NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	"ordinal" integer GENERATED ALWAYS AS IDENTITY (sequence name "frames_ordinal_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1)
);
--> statement-breakpoint
CREATE TABLE "jobs" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	"changed_at" timestamp (3) with time zone NOT NULL,
	"removed" boolean DEFAULT false NOT NULL
);
--> statement-breakpoint
CREATE TABLE "profiles" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"name" text NOT NULL,
	"profile" json NOT NULL,
	"changed_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "revisions" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"frame_id" text NOT NULL,
	"letter" text NOT NULL,
	"ordinal" integer NOT NULL,
	"note" text NOT NULL,
	"author" text NOT NULL,
	"author_id" text NOT NULL,
	"released_at" timestamp (3) with time zone NOT NULL,
	"job_name" text NOT NULL,
	"shop_name" text NOT NULL,
	"acknowledged" json NOT NULL,
	"file" "bytea" NOT NULL,
	"sha256" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id_hash" text PRIMARY KEY NOT NULL,
	"user_id" text,
	"data" json NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "shops" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"unit" text NOT NULL,
	"paper" text NOT NULL,
	"default_profile_id" text NOT NULL,
	"demo" boolean DEFAULT false NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" text PRIMARY KEY NOT NULL,
	"shop_id" text NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"password_hash" text,
	"role" text NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "draft_versions" ADD CONSTRAINT "draft_versions_frame_id_frames_id_fk" FOREIGN KEY ("frame_id") REFERENCES "public"."frames"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "frames" ADD CONSTRAINT "frames_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "frames" ADD CONSTRAINT "frames_job_id_jobs_id_fk" FOREIGN KEY ("job_id") REFERENCES "public"."jobs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "profiles" ADD CONSTRAINT "profiles_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_frame_id_frames_id_fk" FOREIGN KEY ("frame_id") REFERENCES "public"."frames"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_author_id_users_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "users" ADD CONSTRAINT "users_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "frames_job" ON "frames" USING btree ("job_id");--> statement-breakpoint
CREATE INDEX "frames_shop" ON "frames" USING btree ("shop_id");--> statement-breakpoint
CREATE INDEX "jobs_shop" ON "jobs" USING btree ("shop_id");--> statement-breakpoint
CREATE UNIQUE INDEX "profiles_shop_name" ON "profiles" USING btree ("shop_id",lower("name"));--> statement-breakpoint
CREATE UNIQUE INDEX "revisions_frame_letter" ON "revisions" USING btree ("frame_id","letter");--> statement-breakpoint
CREATE UNIQUE INDEX "revisions_frame_ordinal" ON "revisions" USING btree ("frame_id","ordinal");--> statement-breakpoint
CREATE INDEX "sessions_user" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "sessions_expiry" ON "sessions" USING btree ("expires_at");--> statement-breakpoint
CREATE UNIQUE INDEX "users_email" ON "users" USING btree ("email");--> statement-breakpoint
CREATE INDEX "users_shop" ON "users" USING btree ("shop_id");