CREATE TABLE "attempts" (
	"key" varchar(255) PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "account" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" text NOT NULL,
	"provider_id" text NOT NULL,
	"user_id" uuid NOT NULL,
	"access_token" text,
	"refresh_token" text,
	"id_token" text,
	"access_token_expires_at" timestamp (3) with time zone,
	"refresh_token_expires_at" timestamp (3) with time zone,
	"scope" text,
	"password" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "rate_limit" (
	"id" uuid PRIMARY KEY NOT NULL,
	"key" text NOT NULL,
	"count" integer NOT NULL,
	"last_request" bigint NOT NULL,
	CONSTRAINT "rate_limit_key_unique" UNIQUE("key")
);
--> statement-breakpoint
CREATE TABLE "session" (
	"id" uuid PRIMARY KEY NOT NULL,
	"token" text NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"ip_address" text,
	"user_agent" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "session_token_unique" UNIQUE("token")
);
--> statement-breakpoint
CREATE TABLE "user" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"email_verified" boolean DEFAULT false NOT NULL,
	"image" text,
	"language" text DEFAULT 'en' NOT NULL,
	"locked_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "user_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "verification" (
	"id" uuid PRIMARY KEY NOT NULL,
	"identifier" text NOT NULL,
	"value" text NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "lesson_progress" (
	"user_id" uuid NOT NULL,
	"lesson_slug" text NOT NULL,
	"position" real DEFAULT 0 NOT NULL,
	"started_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"read_at" timestamp (3) with time zone,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "lesson_progress_user_id_lesson_slug_pk" PRIMARY KEY("user_id","lesson_slug"),
	CONSTRAINT "lesson_progress_position" CHECK ("lesson_progress"."position" between 0 and 1)
);
--> statement-breakpoint
CREATE TABLE "ability" (
	"user_id" uuid PRIMARY KEY NOT NULL,
	"mean" double precision NOT NULL,
	"variance" double precision NOT NULL,
	"sequence" integer DEFAULT 0 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "answer" (
	"user_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"problem_id" uuid NOT NULL,
	"family" text NOT NULL,
	"version" integer NOT NULL,
	"tier" smallint NOT NULL,
	"part" text NOT NULL,
	"topic" text NOT NULL,
	"context" text NOT NULL,
	"response" jsonb,
	"read" text NOT NULL,
	"value" text,
	"verdict" text NOT NULL,
	"slip" text,
	"attempt" smallint NOT NULL,
	"is_first" boolean NOT NULL,
	"hints" smallint NOT NULL,
	"choices" smallint NOT NULL,
	"seconds" integer NOT NULL,
	"key" uuid NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "answer_user_id_problem_id_part_attempt_pk" PRIMARY KEY("user_id","problem_id","part","attempt"),
	CONSTRAINT "answer_once" UNIQUE("user_id","key")
);
--> statement-breakpoint
CREATE TABLE "day_count" (
	"user_id" uuid NOT NULL,
	"day" date NOT NULL,
	"answered" integer NOT NULL,
	"right" integer NOT NULL,
	"seconds" integer NOT NULL,
	CONSTRAINT "day_count_user_id_day_pk" PRIMARY KEY("user_id","day")
);
--> statement-breakpoint
CREATE TABLE "drill" (
	"user_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"topics" text[] NOT NULL,
	"tier" text NOT NULL,
	"length" smallint NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "drill_user_id_id_pk" PRIMARY KEY("user_id","id"),
	CONSTRAINT "drill_length" CHECK ("drill"."length" between 1 and 100)
);
--> statement-breakpoint
CREATE TABLE "problem" (
	"user_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"family" text NOT NULL,
	"version" integer NOT NULL,
	"seed" text NOT NULL,
	"tier" smallint NOT NULL,
	"context" text NOT NULL,
	"drill_id" uuid,
	"position" smallint,
	"lesson" text,
	"checkpoint" text,
	"hints" smallint DEFAULT 0 NOT NULL,
	"shown_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"closed_at" timestamp (3) with time zone,
	CONSTRAINT "problem_user_id_id_pk" PRIMARY KEY("user_id","id")
);
--> statement-breakpoint
CREATE TABLE "slip_count" (
	"user_id" uuid NOT NULL,
	"topic" text NOT NULL,
	"family" text NOT NULL,
	"slip" text NOT NULL,
	"times" integer NOT NULL,
	"last_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "slip_count_user_id_family_slip_topic_pk" PRIMARY KEY("user_id","family","slip","topic")
);
--> statement-breakpoint
CREATE TABLE "topic_level" (
	"user_id" uuid NOT NULL,
	"topic" text NOT NULL,
	"mean" double precision NOT NULL,
	"variance" double precision NOT NULL,
	"answers" integer NOT NULL,
	"right" integer NOT NULL,
	"days" integer NOT NULL,
	"last_day" date NOT NULL,
	"last_at" timestamp (3) with time zone NOT NULL,
	"reached_at" timestamp (3) with time zone,
	CONSTRAINT "topic_level_user_id_topic_pk" PRIMARY KEY("user_id","topic")
);
--> statement-breakpoint
CREATE TABLE "user_role" (
	"user_id" uuid NOT NULL,
	"role" text NOT NULL,
	"granted_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "user_role_user_id_role_pk" PRIMARY KEY("user_id","role"),
	CONSTRAINT "user_role_known" CHECK ("user_role"."role" in ('trainee', 'instructor', 'manager', 'staff'))
);
--> statement-breakpoint
CREATE TABLE "seeded" (
	"part" text PRIMARY KEY NOT NULL,
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "account" ADD CONSTRAINT "account_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "session" ADD CONSTRAINT "session_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "user_role" ADD CONSTRAINT "user_role_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "account_user" ON "account" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "session_user" ON "session" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "verification_identifier" ON "verification" USING btree ("identifier");--> statement-breakpoint
CREATE INDEX "drill_recent" ON "drill" USING btree ("user_id","created_at" DESC NULLS LAST);--> statement-breakpoint
CREATE UNIQUE INDEX "problem_place" ON "problem" USING btree ("user_id","drill_id","position") WHERE "problem"."drill_id" is not null;--> statement-breakpoint
CREATE INDEX "problem_checkpoint" ON "problem" USING btree ("user_id","lesson","checkpoint","shown_at") WHERE "problem"."lesson" is not null;