CREATE TYPE "public"."calibration_kind" AS ENUM('white', 'zero');--> statement-breakpoint
CREATE TYPE "public"."control_kind" AS ENUM('tile', 'chart-white', 'paper');--> statement-breakpoint
CREATE TYPE "public"."control_moment" AS ENUM('start', 'end');--> statement-breakpoint
CREATE TYPE "public"."illuminant" AS ENUM('D65', 'D50', 'C', 'A');--> statement-breakpoint
CREATE TYPE "public"."observer" AS ENUM('10', '2');--> statement-breakpoint
CREATE TYPE "public"."obtained" AS ENUM('bought', 'lent');--> statement-breakpoint
CREATE TYPE "public"."reading_flag" AS ENUM('none', 'flagged', 'left-out');--> statement-breakpoint
CREATE TYPE "public"."specular_mode" AS ENUM('included', 'excluded');--> statement-breakpoint
CREATE TYPE "public"."state" AS ENUM('page', 'ink');--> statement-breakpoint
CREATE TYPE "public"."stated" AS ENUM('yes', 'no', 'not-stated');--> statement-breakpoint
CREATE TYPE "public"."uv_mode" AS ENUM('included', 'cut', 'adjusted');--> statement-breakpoint
CREATE TABLE "calibrations" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "calibrations_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"instrument_id" integer NOT NULL,
	"kind" "calibration_kind" NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"tile_serial" text,
	"y_before_percent" double precision,
	"note" text,
	CONSTRAINT "calibrations_y_before_percent_range" CHECK ("calibrations"."y_before_percent" between 0 and 120),
	CONSTRAINT "calibrations_white_names_its_tile" CHECK (("calibrations"."kind" = 'white') = ("calibrations"."tile_serial" is not null))
);
--> statement-breakpoint
CREATE TABLE "control_readings" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "control_readings_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"control_sample_id" integer NOT NULL,
	"session_id" integer NOT NULL,
	"moment" "control_moment" NOT NULL,
	"ordinal" integer NOT NULL,
	"l_star" double precision NOT NULL,
	"a_star" double precision NOT NULL,
	"b_star" double precision NOT NULL,
	CONSTRAINT "control_readings_order_key" UNIQUE("session_id","control_sample_id","moment","ordinal"),
	CONSTRAINT "control_readings_lab_range" CHECK ("control_readings"."l_star" between 0 and 110 and "control_readings"."a_star" between -60 and 60 and "control_readings"."b_star" between -60 and 60)
);
--> statement-breakpoint
CREATE TABLE "control_samples" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "control_samples_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"kind" "control_kind" NOT NULL,
	"name" text NOT NULL,
	"serial" text NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "control_samples_serial_key" UNIQUE("serial")
);
--> statement-breakpoint
CREATE TABLE "corrections" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "corrections_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"device_id" integer NOT NULL,
	"noted_on" date NOT NULL,
	"figure" text NOT NULL,
	"note" text NOT NULL,
	"wrong_in" integer,
	"right_in" integer
);
--> statement-breakpoint
CREATE TABLE "replies" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "replies_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"correction_id" integer NOT NULL,
	"replied_on" date NOT NULL,
	"from" text NOT NULL,
	"note" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "devices" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "devices_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"slug" text NOT NULL,
	"maker_id" integer NOT NULL,
	"name" text NOT NULL,
	"note" text,
	CONSTRAINT "devices_slug_key" UNIQUE("slug"),
	CONSTRAINT "devices_slug_form" CHECK ("devices"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$')
);
--> statement-breakpoint
CREATE TABLE "edition_entries" (
	"edition" integer NOT NULL,
	"revision_id" integer NOT NULL,
	"slug" text NOT NULL,
	"device" jsonb NOT NULL,
	"set_ids" integer[] NOT NULL,
	CONSTRAINT "edition_entries_pkey" PRIMARY KEY("edition","slug"),
	CONSTRAINT "edition_entries_from_sets" CHECK (cardinality("edition_entries"."set_ids") > 0)
);
--> statement-breakpoint
CREATE TABLE "editions" (
	"number" integer PRIMARY KEY NOT NULL,
	"published_at" timestamp with time zone NOT NULL,
	"method" integer NOT NULL,
	"title" text NOT NULL,
	"note" text NOT NULL,
	"sha256" text NOT NULL,
	"document" jsonb NOT NULL,
	"components" jsonb NOT NULL,
	CONSTRAINT "editions_sha256_key" UNIQUE("sha256"),
	CONSTRAINT "editions_number_from_one" CHECK ("editions"."number" >= 1),
	CONSTRAINT "editions_sha256_form" CHECK ("editions"."sha256" ~ '^[0-9a-f]{64}$')
);
--> statement-breakpoint
CREATE TABLE "front_light_measurements" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "front_light_measurements_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"unit_id" integer NOT NULL,
	"measured_on" date NOT NULL,
	"max_cd_m2" double precision NOT NULL,
	"min_cd_m2" double precision NOT NULL,
	"evenness_percent" double precision NOT NULL,
	"coolest_kelvin" double precision NOT NULL,
	"warmest_kelvin" double precision NOT NULL,
	CONSTRAINT "front_light_cd_m2_range" CHECK ("front_light_measurements"."min_cd_m2" > 0 and "front_light_measurements"."max_cd_m2" between "front_light_measurements"."min_cd_m2" and 2000),
	CONSTRAINT "front_light_evenness_percent_range" CHECK ("front_light_measurements"."evenness_percent" between 0 and 100),
	CONSTRAINT "front_light_kelvin_range" CHECK ("front_light_measurements"."warmest_kelvin" between 1000 and 20000 and "front_light_measurements"."coolest_kelvin" between "front_light_measurements"."warmest_kelvin" and 20000)
);
--> statement-breakpoint
CREATE TABLE "instruments" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "instruments_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"name" text NOT NULL,
	"serial" text NOT NULL,
	"certificate" text NOT NULL,
	"certified_on" date NOT NULL,
	"serviced_on" date,
	"certificate_u_l" double precision NOT NULL,
	"certificate_u_a" double precision NOT NULL,
	"certificate_u_b" double precision NOT NULL,
	"stores_spectra" boolean NOT NULL,
	CONSTRAINT "instruments_serial_key" UNIQUE("serial"),
	CONSTRAINT "instruments_certificate_u_range" CHECK ("instruments"."certificate_u_l" between 0 and 5 and "instruments"."certificate_u_a" between 0 and 5 and "instruments"."certificate_u_b" between 0 and 5)
);
--> statement-breakpoint
CREATE TABLE "makers" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "makers_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"slug" text NOT NULL,
	"name" text NOT NULL,
	CONSTRAINT "makers_slug_key" UNIQUE("slug")
);
--> statement-breakpoint
CREATE TABLE "prices" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "prices_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"device_id" integer NOT NULL,
	"amount_minor" integer NOT NULL,
	"currency" text NOT NULL,
	"seen_on" date NOT NULL,
	"seller" text NOT NULL,
	CONSTRAINT "prices_amount_minor_range" CHECK ("prices"."amount_minor" between 1 and 100000000),
	CONSTRAINT "prices_currency_form" CHECK ("prices"."currency" ~ '^[A-Z]{3}$')
);
--> statement-breakpoint
CREATE TABLE "readings" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "readings_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"set_id" integer NOT NULL,
	"ordinal" integer NOT NULL,
	"l_star" double precision NOT NULL,
	"a_star" double precision NOT NULL,
	"b_star" double precision NOT NULL,
	"instrument_whiteness" double precision,
	"spectrum" real[],
	"flag" "reading_flag" DEFAULT 'none' NOT NULL,
	"flag_reason" text,
	CONSTRAINT "readings_set_id_ordinal_key" UNIQUE("set_id","ordinal"),
	CONSTRAINT "readings_lab_range" CHECK ("readings"."l_star" between 0 and 100 and "readings"."a_star" between -60 and 60 and "readings"."b_star" between -60 and 60),
	CONSTRAINT "readings_instrument_whiteness_range" CHECK ("readings"."instrument_whiteness" between -500 and 500),
	CONSTRAINT "readings_flag_with_reason" CHECK (("readings"."flag" = 'none') = ("readings"."flag_reason" is null)),
	CONSTRAINT "readings_spectrum_form" CHECK ("readings"."spectrum" is null or (cardinality("readings"."spectrum") = 31 and array_position("readings"."spectrum", null) is null and 0 <= all("readings"."spectrum") and 2 >= all("readings"."spectrum")))
);
--> statement-breakpoint
CREATE TABLE "revisions" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "revisions_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"device_id" integer NOT NULL,
	"name" text NOT NULL,
	"since" date,
	"note" text,
	CONSTRAINT "revisions_device_id_name_key" UNIQUE("device_id","name")
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "sessions_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"name" text NOT NULL,
	"instrument_id" integer NOT NULL,
	"operator" text NOT NULL,
	"started_at" timestamp with time zone NOT NULL,
	"ended_at" timestamp with time zone NOT NULL,
	"temperature_celsius" double precision NOT NULL,
	"geometry" text NOT NULL,
	"specular" "specular_mode" NOT NULL,
	"illuminant" "illuminant" NOT NULL,
	"observer" "observer" NOT NULL,
	"aperture_mm" double precision NOT NULL,
	"uv" "uv_mode" NOT NULL,
	"note" text,
	CONSTRAINT "sessions_name_key" UNIQUE("name"),
	CONSTRAINT "sessions_ends_after_start" CHECK ("sessions"."ended_at" > "sessions"."started_at"),
	CONSTRAINT "sessions_temperature_celsius_range" CHECK ("sessions"."temperature_celsius" between 10 and 40),
	CONSTRAINT "sessions_aperture_mm_range" CHECK ("sessions"."aperture_mm" between 1 and 30)
);
--> statement-breakpoint
CREATE TABLE "sets" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "sets_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"session_id" integer NOT NULL,
	"unit_id" integer NOT NULL,
	"position" text NOT NULL,
	"state" "state" NOT NULL,
	"specular" "specular_mode" NOT NULL,
	"light_off" boolean NOT NULL,
	"shown" text NOT NULL,
	"withdrawn_at" timestamp with time zone,
	"withdrawn_reason" text,
	CONSTRAINT "sets_withdrawn_with_reason" CHECK (("sets"."withdrawn_at" is null) = ("sets"."withdrawn_reason" is null))
);
--> statement-breakpoint
CREATE TABLE "specs" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "specs_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"revision_id" integer NOT NULL,
	"field" text NOT NULL,
	"stated" "stated" NOT NULL,
	"value" double precision,
	"list" text[],
	"source" text NOT NULL,
	"stated_on" date NOT NULL,
	CONSTRAINT "specs_field_known" CHECK ("specs"."field" in ('diagonal', 'ppi', 'weight', 'pen', 'colour', 'frontLight', 'water', 'pageButtons', 'onSale', 'lending', 'speech', 'formats')),
	CONSTRAINT "specs_value_where_number" CHECK (("specs"."field" in ('diagonal', 'ppi', 'weight', 'water') and "specs"."stated" = 'yes') = ("specs"."value" is not null)),
	CONSTRAINT "specs_list_where_formats" CHECK (("specs"."field" = 'formats' and "specs"."stated" = 'yes') = ("specs"."list" is not null)),
	CONSTRAINT "specs_value_range" CHECK ("specs"."value" between 0 and 5000)
);
--> statement-breakpoint
CREATE TABLE "units" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "units_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"revision_id" integer NOT NULL,
	"serial" text NOT NULL,
	"batch" text,
	"firmware" text NOT NULL,
	"obtained" "obtained" NOT NULL,
	"obtained_from" text NOT NULL,
	"obtained_on" date NOT NULL,
	"condition" text NOT NULL,
	CONSTRAINT "units_serial_key" UNIQUE("serial")
);
--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_instrument_id_instruments_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "control_readings" ADD CONSTRAINT "control_readings_control_sample_id_control_samples_id_fk" FOREIGN KEY ("control_sample_id") REFERENCES "public"."control_samples"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "control_readings" ADD CONSTRAINT "control_readings_session_id_sessions_id_fk" FOREIGN KEY ("session_id") REFERENCES "public"."sessions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_device_id_devices_id_fk" FOREIGN KEY ("device_id") REFERENCES "public"."devices"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_wrong_in_editions_number_fk" FOREIGN KEY ("wrong_in") REFERENCES "public"."editions"("number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_right_in_editions_number_fk" FOREIGN KEY ("right_in") REFERENCES "public"."editions"("number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "replies" ADD CONSTRAINT "replies_correction_id_corrections_id_fk" FOREIGN KEY ("correction_id") REFERENCES "public"."corrections"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "devices" ADD CONSTRAINT "devices_maker_id_makers_id_fk" FOREIGN KEY ("maker_id") REFERENCES "public"."makers"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition_entries" ADD CONSTRAINT "edition_entries_edition_editions_number_fk" FOREIGN KEY ("edition") REFERENCES "public"."editions"("number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition_entries" ADD CONSTRAINT "edition_entries_revision_id_revisions_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "front_light_measurements" ADD CONSTRAINT "front_light_measurements_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "prices" ADD CONSTRAINT "prices_device_id_devices_id_fk" FOREIGN KEY ("device_id") REFERENCES "public"."devices"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_set_id_sets_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "revisions" ADD CONSTRAINT "revisions_device_id_devices_id_fk" FOREIGN KEY ("device_id") REFERENCES "public"."devices"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_instrument_id_instruments_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_session_id_sessions_id_fk" FOREIGN KEY ("session_id") REFERENCES "public"."sessions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_unit_id_units_id_fk" FOREIGN KEY ("unit_id") REFERENCES "public"."units"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_revision_id_revisions_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "units" ADD CONSTRAINT "units_revision_id_revisions_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revisions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "calibrations_instrument_id_at_idx" ON "calibrations" USING btree ("instrument_id","at" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "control_readings_control_sample_id_idx" ON "control_readings" USING btree ("control_sample_id","session_id");--> statement-breakpoint
CREATE INDEX "corrections_device_id_idx" ON "corrections" USING btree ("device_id","noted_on" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "replies_correction_id_idx" ON "replies" USING btree ("correction_id");--> statement-breakpoint
CREATE INDEX "front_light_measurements_unit_id_idx" ON "front_light_measurements" USING btree ("unit_id","measured_on" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "prices_device_id_seen_on_idx" ON "prices" USING btree ("device_id","seen_on" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "sessions_started_at_idx" ON "sessions" USING btree ("started_at");--> statement-breakpoint
CREATE INDEX "sets_unit_id_idx" ON "sets" USING btree ("unit_id","state");--> statement-breakpoint
CREATE INDEX "sets_session_id_idx" ON "sets" USING btree ("session_id");--> statement-breakpoint
CREATE INDEX "specs_revision_id_field_idx" ON "specs" USING btree ("revision_id","field","stated_on" DESC NULLS LAST);