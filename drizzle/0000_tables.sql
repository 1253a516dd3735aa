CREATE TABLE "audit" (
	"plant_id" uuid NOT NULL,
	"number" bigint NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	"actor_id" uuid NOT NULL,
	"action" text NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"detail" jsonb NOT NULL,
	"previous_hash" text NOT NULL,
	"hash" text NOT NULL,
	CONSTRAINT "audit_pk" PRIMARY KEY("plant_id","number")
);
--> statement-breakpoint
CREATE TABLE "checks" (
	"plant_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"seq" bigint NOT NULL,
	"hash" text NOT NULL,
	"envelope" text NOT NULL,
	"author_id" uuid NOT NULL,
	"tablet_id" uuid NOT NULL,
	"tablet_seq" bigint NOT NULL,
	"performed_at" timestamp (3) with time zone NOT NULL,
	"clock_offset_ms" bigint,
	"received_at" timestamp (3) with time zone NOT NULL,
	"sent_by" uuid NOT NULL,
	"machine_id" uuid NOT NULL,
	"position_id" uuid NOT NULL,
	"material_id" uuid,
	"material_revision" integer,
	"rules_revision" integer NOT NULL,
	"amends" uuid,
	"body" jsonb NOT NULL,
	"tablet_outcome" jsonb NOT NULL,
	"server_outcome" jsonb NOT NULL,
	"tablet_core" text NOT NULL,
	"server_core" text NOT NULL,
	"agrees" boolean NOT NULL,
	"verdict" text NOT NULL,
	CONSTRAINT "checks_pk" PRIMARY KEY("plant_id","id"),
	CONSTRAINT "checks_number" UNIQUE("plant_id","tablet_id","author_id","tablet_seq"),
	CONSTRAINT "checks_seq" UNIQUE("plant_id","seq")
);
--> statement-breakpoint
CREATE TABLE "quarantine" (
	"plant_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"bytes" text NOT NULL,
	"bytes_hash" text NOT NULL,
	"code" text NOT NULL,
	"text" text NOT NULL,
	"tablet_id" uuid NOT NULL,
	"author_id" uuid,
	"tablet_seq" bigint,
	"sent_by" uuid NOT NULL,
	"received_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "quarantine_pk" PRIMARY KEY("plant_id","id"),
	CONSTRAINT "quarantine_once" UNIQUE("plant_id","bytes_hash","code")
);
--> statement-breakpoint
CREATE TABLE "gear_positions" (
	"plant_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"machine_id" uuid NOT NULL,
	"name" text NOT NULL,
	"ordinal" integer NOT NULL,
	"mate_teeth" integer,
	"gear" jsonb,
	"drive" jsonb,
	CONSTRAINT "gear_positions_pk" PRIMARY KEY("plant_id","id"),
	CONSTRAINT "gear_positions_of_machine" UNIQUE("plant_id","machine_id","id"),
	CONSTRAINT "gear_positions_ordinal" UNIQUE("plant_id","machine_id","ordinal")
);
--> statement-breakpoint
CREATE TABLE "machines" (
	"plant_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"tag" text NOT NULL,
	"name" text NOT NULL,
	"area" text NOT NULL,
	"origin" text NOT NULL,
	CONSTRAINT "machines_pk" PRIMARY KEY("plant_id","id"),
	CONSTRAINT "machines_tag" UNIQUE("plant_id","tag"),
	CONSTRAINT "machines_origin" CHECK ("machines"."origin" in ('inch', 'metric'))
);
--> statement-breakpoint
CREATE TABLE "material_revisions" (
	"plant_id" uuid NOT NULL,
	"material_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"statement" jsonb NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "material_revisions_pk" PRIMARY KEY("plant_id","material_id","revision")
);
--> statement-breakpoint
CREATE TABLE "materials" (
	"plant_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	CONSTRAINT "materials_pk" PRIMARY KEY("plant_id","id")
);
--> statement-breakpoint
CREATE TABLE "plant_rules" (
	"plant_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"rules" jsonb NOT NULL,
	"created_by" uuid NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "plant_rules_pk" PRIMARY KEY("plant_id","revision")
);
--> statement-breakpoint
CREATE TABLE "memberships" (
	"plant_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"role" text NOT NULL,
	"scope_version" integer DEFAULT 1 NOT NULL,
	"disabled_at" timestamp (3) with time zone,
	CONSTRAINT "memberships_pk" PRIMARY KEY("plant_id","user_id"),
	CONSTRAINT "memberships_role" CHECK ("memberships"."role" in ('millwright', 'planner', 'supervisor'))
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"plant_id" uuid
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"locale" text DEFAULT 'en' NOT NULL,
	"password_hash" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "users_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "changes" (
	"plant_id" uuid NOT NULL,
	"seq" bigint NOT NULL,
	"entity" text NOT NULL,
	"entity_id" uuid NOT NULL,
	"tombstone" boolean DEFAULT false NOT NULL,
	CONSTRAINT "changes_pk" PRIMARY KEY("plant_id","seq")
);
--> statement-breakpoint
CREATE TABLE "installation" (
	"id" smallint PRIMARY KEY DEFAULT 1 NOT NULL,
	"epoch" uuid DEFAULT gen_random_uuid() NOT NULL,
	"demo" boolean DEFAULT false NOT NULL,
	CONSTRAINT "installation_single" CHECK ("installation"."id" = 1)
);
--> statement-breakpoint
CREATE TABLE "plant_counters" (
	"plant_id" uuid PRIMARY KEY NOT NULL,
	"head" bigint DEFAULT 0 NOT NULL,
	"audit_head" bigint DEFAULT 0 NOT NULL,
	"tablet_head" bigint DEFAULT 0 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "plants" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"note" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "plants_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "tablet_authors" (
	"plant_id" uuid NOT NULL,
	"tablet_id" uuid NOT NULL,
	"author_id" uuid NOT NULL,
	"highest_drawn" bigint NOT NULL,
	CONSTRAINT "tablet_authors_pk" PRIMARY KEY("plant_id","tablet_id","author_id")
);
--> statement-breakpoint
CREATE TABLE "tablets" (
	"plant_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"number" integer NOT NULL,
	"name" text NOT NULL,
	"first_heard_at" timestamp (3) with time zone NOT NULL,
	"last_heard_at" timestamp (3) with time zone NOT NULL,
	"last_heard_from" uuid NOT NULL,
	"blocked_at" timestamp (3) with time zone,
	CONSTRAINT "tablets_pk" PRIMARY KEY("plant_id","id"),
	CONSTRAINT "tablets_number" UNIQUE("plant_id","number")
);
--> statement-breakpoint
ALTER TABLE "audit" ADD CONSTRAINT "audit_actor_fk" FOREIGN KEY ("plant_id","actor_id") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_change_fk" FOREIGN KEY ("plant_id","seq") REFERENCES "public"."changes"("plant_id","seq") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_author_fk" FOREIGN KEY ("plant_id","author_id") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_sent_by_fk" FOREIGN KEY ("plant_id","sent_by") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_tablet_fk" FOREIGN KEY ("plant_id","tablet_id") REFERENCES "public"."tablets"("plant_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_position_fk" FOREIGN KEY ("plant_id","machine_id","position_id") REFERENCES "public"."gear_positions"("plant_id","machine_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_material_fk" FOREIGN KEY ("plant_id","material_id","material_revision") REFERENCES "public"."material_revisions"("plant_id","material_id","revision") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_rules_fk" FOREIGN KEY ("plant_id","rules_revision") REFERENCES "public"."plant_rules"("plant_id","revision") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checks" ADD CONSTRAINT "checks_amends_fk" FOREIGN KEY ("plant_id","amends") REFERENCES "public"."checks"("plant_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "quarantine" ADD CONSTRAINT "quarantine_tablet_fk" FOREIGN KEY ("plant_id","tablet_id") REFERENCES "public"."tablets"("plant_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "quarantine" ADD CONSTRAINT "quarantine_sent_by_fk" FOREIGN KEY ("plant_id","sent_by") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gear_positions" ADD CONSTRAINT "gear_positions_machine_fk" FOREIGN KEY ("plant_id","machine_id") REFERENCES "public"."machines"("plant_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "machines" ADD CONSTRAINT "machines_plant_id_plants_id_fk" FOREIGN KEY ("plant_id") REFERENCES "public"."plants"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "material_revisions" ADD CONSTRAINT "material_revisions_material_fk" FOREIGN KEY ("plant_id","material_id") REFERENCES "public"."materials"("plant_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "material_revisions" ADD CONSTRAINT "material_revisions_created_by_fk" FOREIGN KEY ("plant_id","created_by") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "materials" ADD CONSTRAINT "materials_plant_id_plants_id_fk" FOREIGN KEY ("plant_id") REFERENCES "public"."plants"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "plant_rules" ADD CONSTRAINT "plant_rules_plant_id_plants_id_fk" FOREIGN KEY ("plant_id") REFERENCES "public"."plants"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "plant_rules" ADD CONSTRAINT "plant_rules_created_by_fk" FOREIGN KEY ("plant_id","created_by") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_plant_id_plants_id_fk" FOREIGN KEY ("plant_id") REFERENCES "public"."plants"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_membership_fk" FOREIGN KEY ("plant_id","user_id") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "changes" ADD CONSTRAINT "changes_plant_id_plants_id_fk" FOREIGN KEY ("plant_id") REFERENCES "public"."plants"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "plant_counters" ADD CONSTRAINT "plant_counters_plant_id_plants_id_fk" FOREIGN KEY ("plant_id") REFERENCES "public"."plants"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tablet_authors" ADD CONSTRAINT "tablet_authors_tablet_fk" FOREIGN KEY ("plant_id","tablet_id") REFERENCES "public"."tablets"("plant_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tablet_authors" ADD CONSTRAINT "tablet_authors_author_fk" FOREIGN KEY ("plant_id","author_id") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tablets" ADD CONSTRAINT "tablets_plant_id_plants_id_fk" FOREIGN KEY ("plant_id") REFERENCES "public"."plants"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tablets" ADD CONSTRAINT "tablets_last_heard_from_fk" FOREIGN KEY ("plant_id","last_heard_from") REFERENCES "public"."memberships"("plant_id","user_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "checks_position_idx" ON "checks" USING btree ("plant_id","position_id","seq");--> statement-breakpoint
CREATE INDEX "checks_verdict_idx" ON "checks" USING btree ("plant_id","verdict","seq");--> statement-breakpoint
CREATE INDEX "memberships_user_idx" ON "memberships" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "sessions_user_idx" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "changes_entity_idx" ON "changes" USING btree ("plant_id","entity","entity_id","seq");