CREATE TABLE "posts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"short_name" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "posts_short_name_unique" UNIQUE("short_name")
);
--> statement-breakpoint
CREATE TABLE "staff" (
	"id" uuid PRIMARY KEY NOT NULL,
	"post_id" uuid NOT NULL,
	"name" text NOT NULL,
	"login" text NOT NULL,
	"password_hash" text NOT NULL,
	"role" text NOT NULL,
	"active" boolean DEFAULT true NOT NULL,
	"session_version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "staff_login_unique" UNIQUE("login")
);
--> statement-breakpoint
CREATE TABLE "certificates" (
	"id" uuid PRIMARY KEY NOT NULL,
	"tester_id" uuid NOT NULL,
	"number" text NOT NULL,
	"laboratory" text NOT NULL,
	"accreditation" text NOT NULL,
	"issued_on" date NOT NULL,
	"due_on" date NOT NULL,
	"traceability" text NOT NULL,
	"temperature_c" double precision,
	"points" jsonb NOT NULL,
	"created_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "tester_proofs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"tester_id" uuid NOT NULL,
	"method" text NOT NULL,
	"load_nm" double precision NOT NULL,
	"reading_nm" double precision NOT NULL,
	"limit_percent" double precision NOT NULL,
	"result" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"by_staff_id" uuid NOT NULL,
	"note" text,
	CONSTRAINT "tester_proofs_load" CHECK ("tester_proofs"."load_nm" > 0)
);
--> statement-breakpoint
CREATE TABLE "testers" (
	"id" uuid PRIMARY KEY NOT NULL,
	"post_id" uuid NOT NULL,
	"name" text NOT NULL,
	"maker" text NOT NULL,
	"model" text NOT NULL,
	"serial" text NOT NULL,
	"min_nm" double precision NOT NULL,
	"max_nm" double precision NOT NULL,
	"resolution_nm" double precision NOT NULL,
	"yearly_drift_percent" double precision NOT NULL,
	"temperature_coefficient_percent_per_k" double precision,
	"correction_applied" boolean DEFAULT false NOT NULL,
	"connection" jsonb NOT NULL,
	"locked_reason" text,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "testers_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "benches" (
	"id" uuid PRIMARY KEY NOT NULL,
	"meet_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"state" text DEFAULT 'open' NOT NULL,
	"paused_reason" text,
	"tester_id" uuid,
	"operator_id" uuid
);
--> statement-breakpoint
CREATE TABLE "meets" (
	"id" uuid PRIMARY KEY NOT NULL,
	"post_id" uuid NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"place" text NOT NULL,
	"starts_on" date NOT NULL,
	"ends_on" date NOT NULL,
	"time_zone" text NOT NULL,
	"day_start_hour" integer DEFAULT 4 NOT NULL,
	"latitude_deg" double precision,
	"height_m" double precision,
	"join_open" boolean DEFAULT true NOT NULL,
	"plan_settings" jsonb NOT NULL,
	"tags_issued" integer DEFAULT 0 NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	CONSTRAINT "meets_slug_unique" UNIQUE("slug")
);
--> statement-breakpoint
CREATE TABLE "tags" (
	"id" uuid PRIMARY KEY NOT NULL,
	"meet_id" uuid NOT NULL,
	"code" text NOT NULL,
	"tool_id" uuid NOT NULL,
	"visitor_id" uuid NOT NULL,
	"state" text NOT NULL,
	"place" text NOT NULL,
	"peg" integer,
	"bench_id" uuid,
	"held_until" timestamp with time zone,
	"unfit_reason" text,
	"position" double precision NOT NULL,
	"consent" text NOT NULL,
	"working_points" jsonb,
	"ticket_hash" text NOT NULL,
	"link_version" integer DEFAULT 1 NOT NULL,
	"joined_at" timestamp with time zone NOT NULL,
	"called_at" timestamp with time zone,
	CONSTRAINT "tags_ticket_hash_unique" UNIQUE("ticket_hash")
);
--> statement-breakpoint
CREATE TABLE "tools" (
	"id" uuid PRIMARY KEY NOT NULL,
	"tool_class" text NOT NULL,
	"class_unsure" boolean DEFAULT false NOT NULL,
	"range_min" double precision NOT NULL,
	"range_max" double precision NOT NULL,
	"unit" text NOT NULL,
	"division" double precision,
	"nominal" double precision,
	"claim" jsonb,
	"measures_ccw" boolean DEFAULT false NOT NULL,
	"drive" text,
	"maker" text,
	"serial" text,
	"created_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "visitors" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text,
	"email" text,
	"mobile" text,
	"created_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "check_notes" (
	"id" uuid PRIMARY KEY NOT NULL,
	"check_id" uuid NOT NULL,
	"text" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"by_staff_id" uuid NOT NULL
);
--> statement-breakpoint
CREATE TABLE "checks" (
	"id" uuid PRIMARY KEY NOT NULL,
	"meet_id" uuid NOT NULL,
	"tag_id" uuid NOT NULL,
	"bench_id" uuid NOT NULL,
	"tester_id" uuid NOT NULL,
	"certificate_id" uuid,
	"proof_id" uuid,
	"operator_id" uuid NOT NULL,
	"state" text NOT NULL,
	"plan" jsonb NOT NULL,
	"plan_version" integer NOT NULL,
	"as_found" jsonb NOT NULL,
	"paused_at" timestamp with time zone,
	"stopped_early" boolean DEFAULT false NOT NULL,
	"stop_reason" text,
	"abandon_reason" text,
	"started_at" timestamp with time zone NOT NULL,
	"ended_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "pull_decisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"pull_id" uuid NOT NULL,
	"check_id" uuid NOT NULL,
	"decision" text NOT NULL,
	"tool_value" double precision,
	"fault" text,
	"note" text,
	"at" timestamp with time zone NOT NULL,
	"by_staff_id" uuid
);
--> statement-breakpoint
CREATE TABLE "pulls" (
	"id" uuid PRIMARY KEY NOT NULL,
	"check_id" uuid NOT NULL,
	"sequence" integer NOT NULL,
	"step_index" integer NOT NULL,
	"outcome" text NOT NULL,
	"raw_nm" double precision,
	"correction_nm" double precision NOT NULL,
	"source" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"by_staff_id" uuid
);
--> statement-breakpoint
CREATE TABLE "records" (
	"id" uuid PRIMARY KEY NOT NULL,
	"post_id" uuid NOT NULL,
	"year" integer NOT NULL,
	"sequence" integer NOT NULL,
	"number" text NOT NULL,
	"check_id" uuid NOT NULL,
	"tag_id" uuid NOT NULL,
	"meet_id" uuid NOT NULL,
	"verdict" text NOT NULL,
	"canonical" text NOT NULL,
	"sha256" text NOT NULL,
	"link_hash" text NOT NULL,
	"link_version" integer DEFAULT 1 NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "records_number_unique" UNIQUE("number"),
	CONSTRAINT "records_check_id_unique" UNIQUE("check_id"),
	CONSTRAINT "records_link_hash_unique" UNIQUE("link_hash")
);
--> statement-breakpoint
CREATE TABLE "command_runs" (
	"actor" text NOT NULL,
	"command" text NOT NULL,
	"id" uuid NOT NULL,
	"input_hash" text NOT NULL,
	"result" jsonb,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "command_runs_actor_command_id_pk" PRIMARY KEY("actor","command","id")
);
--> statement-breakpoint
CREATE TABLE "ledger" (
	"sequence" bigserial PRIMARY KEY NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"actor" text NOT NULL,
	"command" text NOT NULL,
	"meet_id" uuid,
	"subject_id" uuid,
	"detail" jsonb NOT NULL
);
--> statement-breakpoint
ALTER TABLE "staff" ADD CONSTRAINT "staff_post_id_posts_id_fk" FOREIGN KEY ("post_id") REFERENCES "public"."posts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_tester_id_testers_id_fk" FOREIGN KEY ("tester_id") REFERENCES "public"."testers"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tester_proofs" ADD CONSTRAINT "tester_proofs_tester_id_testers_id_fk" FOREIGN KEY ("tester_id") REFERENCES "public"."testers"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tester_proofs" ADD CONSTRAINT "tester_proofs_by_staff_id_staff_id_fk" FOREIGN KEY ("by_staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "testers" ADD CONSTRAINT "testers_post_id_posts_id_fk" FOREIGN KEY ("post_id") REFERENCES "public"."posts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "benches" ADD CONSTRAINT "benches_meet_id_meets_id_fk" FOREIGN KEY ("meet_id") REFERENCES "public"."meets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "benches" ADD CONSTRAINT "benches_tester_id_testers_id_fk" FOREIGN KEY ("tester_id") REFERENCES "public"."testers"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "benches" ADD CONSTRAINT "benches_operator_id_staff_id_fk" FOREIGN KEY ("operator_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "meets" ADD CONSTRAINT "meets_post_id_posts_id_fk" FOREIGN KEY ("post_id") REFERENCES "public"."posts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tags" ADD CONSTRAINT "tags_meet_id_meets_id_fk" FOREIGN KEY ("meet_id") REFERENCES "public"."meets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tags" ADD CONSTRAINT "tags_tool_id_tools_id_fk" FOREIGN KEY ("tool_id") REFERENCES "public"."tools"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tags" ADD CONSTRAINT "tags_visitor_id_visitors_id_fk" FOREIGN KEY ("visitor_id") REFERENCES "public"."visitors"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tags" ADD CONSTRAINT "tags_bench_id_benches_id_fk" FOREIGN KEY ("bench_id") REFERENCES "public"."benches"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "check_notes" ADD CONSTRAINT "check_notes_check_id_checks_id_fk" FOREIGN KEY ("check_id") REFERENCES "public"."checks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "check_notes" ADD CONSTRAINT "check_notes_by_staff_id_staff_id_fk" FOREIGN KEY ("by_staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_meet_id_meets_id_fk" FOREIGN KEY ("meet_id") REFERENCES "public"."meets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_tag_id_tags_id_fk" FOREIGN KEY ("tag_id") REFERENCES "public"."tags"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_bench_id_benches_id_fk" FOREIGN KEY ("bench_id") REFERENCES "public"."benches"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_tester_id_testers_id_fk" FOREIGN KEY ("tester_id") REFERENCES "public"."testers"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_certificate_id_certificates_id_fk" FOREIGN KEY ("certificate_id") REFERENCES "public"."certificates"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_proof_id_tester_proofs_id_fk" FOREIGN KEY ("proof_id") REFERENCES "public"."tester_proofs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_operator_id_staff_id_fk" FOREIGN KEY ("operator_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pull_decisions" ADD CONSTRAINT "pull_decisions_pull_id_pulls_id_fk" FOREIGN KEY ("pull_id") REFERENCES "public"."pulls"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pull_decisions" ADD CONSTRAINT "pull_decisions_check_id_checks_id_fk" FOREIGN KEY ("check_id") REFERENCES "public"."checks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pull_decisions" ADD CONSTRAINT "pull_decisions_by_staff_id_staff_id_fk" FOREIGN KEY ("by_staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_check_id_checks_id_fk" FOREIGN KEY ("check_id") REFERENCES "public"."checks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pulls" ADD CONSTRAINT "pulls_by_staff_id_staff_id_fk" FOREIGN KEY ("by_staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "records" ADD CONSTRAINT "records_post_id_posts_id_fk" FOREIGN KEY ("post_id") REFERENCES "public"."posts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "records" ADD CONSTRAINT "records_check_id_checks_id_fk" FOREIGN KEY ("check_id") REFERENCES "public"."checks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "records" ADD CONSTRAINT "records_tag_id_tags_id_fk" FOREIGN KEY ("tag_id") REFERENCES "public"."tags"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "records" ADD CONSTRAINT "records_meet_id_meets_id_fk" FOREIGN KEY ("meet_id") REFERENCES "public"."meets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "certificates_tester" ON "certificates" USING btree ("tester_id","issued_on");--> statement-breakpoint
CREATE INDEX "tester_proofs_tester" ON "tester_proofs" USING btree ("tester_id","at");--> statement-breakpoint
CREATE UNIQUE INDEX "benches_meet_number" ON "benches" USING btree ("meet_id","number");--> statement-breakpoint
CREATE UNIQUE INDEX "benches_tester" ON "benches" USING btree ("tester_id") WHERE "benches"."tester_id" is not null;--> statement-breakpoint
CREATE UNIQUE INDEX "tags_meet_code" ON "tags" USING btree ("meet_id","code");--> statement-breakpoint
CREATE INDEX "tags_meet_state" ON "tags" USING btree ("meet_id","state");--> statement-breakpoint
CREATE INDEX "tags_bench" ON "tags" USING btree ("bench_id");--> statement-breakpoint
CREATE INDEX "tags_visitor" ON "tags" USING btree ("visitor_id");--> statement-breakpoint
CREATE INDEX "check_notes_check" ON "check_notes" USING btree ("check_id");--> statement-breakpoint
CREATE INDEX "checks_bench_state" ON "checks" USING btree ("bench_id","state");--> statement-breakpoint
CREATE INDEX "checks_tag" ON "checks" USING btree ("tag_id");--> statement-breakpoint
CREATE UNIQUE INDEX "pull_decisions_once" ON "pull_decisions" USING btree ("pull_id","decision");--> statement-breakpoint
CREATE INDEX "pull_decisions_check" ON "pull_decisions" USING btree ("check_id");--> statement-breakpoint
CREATE UNIQUE INDEX "pulls_check_sequence" ON "pulls" USING btree ("check_id","sequence");--> statement-breakpoint
CREATE UNIQUE INDEX "records_post_year_sequence" ON "records" USING btree ("post_id","year","sequence");--> statement-breakpoint
CREATE INDEX "records_meet_signed" ON "records" USING btree ("meet_id","signed_at");--> statement-breakpoint
CREATE INDEX "records_tag" ON "records" USING btree ("tag_id");--> statement-breakpoint
CREATE INDEX "ledger_meet" ON "ledger" USING btree ("meet_id","sequence");--> statement-breakpoint
CREATE INDEX "ledger_subject" ON "ledger" USING btree ("subject_id","sequence");