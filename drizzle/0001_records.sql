CREATE TABLE "activity" (
	"position" bigint PRIMARY KEY DEFAULT 0 NOT NULL,
	"at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"person_id" uuid,
	"actor" text NOT NULL,
	"roles" text[] NOT NULL,
	"event" text NOT NULL,
	"noun" text NOT NULL,
	"object_id" text,
	"set_id" uuid,
	"before" jsonb,
	"after" jsonb,
	"reason" text,
	"request_id" text NOT NULL,
	"previous_hash" text DEFAULT '' NOT NULL,
	"hash" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "bench_channels" (
	"bench_channel_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"bench_id" uuid NOT NULL,
	"number" smallint NOT NULL,
	CONSTRAINT "bench_channels_number" CHECK ("bench_channels"."number" between 1 and 24)
);
--> statement-breakpoint
CREATE TABLE "bench_holds" (
	"bench_hold_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"bench_id" uuid NOT NULL,
	"reason" text NOT NULL,
	"held_by" uuid NOT NULL,
	"held_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"cleared_by" uuid,
	"cleared_at" timestamp with time zone,
	"cleared_reason" text
);
--> statement-breakpoint
CREATE TABLE "bench_instruments" (
	"bench_instrument_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"bench_id" uuid NOT NULL,
	"bench_channel_id" uuid,
	"instrument_id" uuid NOT NULL,
	"since_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"until_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "benches" (
	"bench_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"code" text NOT NULL,
	"location" text DEFAULT '' NOT NULL,
	"collects" text NOT NULL,
	"repeatability" numeric(9, 5) NOT NULL,
	"fluid_id" uuid NOT NULL,
	"drive_volts" numeric(5, 2) NOT NULL,
	"driver_kind" text NOT NULL,
	"period_ms" numeric(8, 3) NOT NULL,
	"retired_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "benches_code_length" CHECK (char_length("benches"."code") <= 20),
	CONSTRAINT "benches_collects_known" CHECK ("benches"."collects" in ('volume', 'mass')),
	CONSTRAINT "benches_repeatability" CHECK ("benches"."repeatability" between 0 and 100),
	CONSTRAINT "benches_drive_volts" CHECK ("benches"."drive_volts" between 1 and 100),
	CONSTRAINT "benches_period" CHECK ("benches"."period_ms" between 0.1 and 10000)
);
--> statement-breakpoint
CREATE TABLE "blobs" (
	"sha256" text PRIMARY KEY NOT NULL,
	"media_type" text NOT NULL,
	"size_bytes" integer NOT NULL,
	"bytes" "bytea" NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "blobs_size" CHECK ("blobs"."size_bytes" between 0 and 26214400)
);
--> statement-breakpoint
CREATE TABLE "calibrations" (
	"calibration_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"instrument_id" uuid NOT NULL,
	"reference" text NOT NULL,
	"valid_from" timestamp with time zone NOT NULL,
	"valid_until" timestamp with time zone NOT NULL,
	"gain" numeric(12, 9) NOT NULL,
	"offset_value" numeric(14, 8) NOT NULL,
	"gain_u" numeric(12, 9) NOT NULL,
	"offset_u" numeric(14, 8) NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"recorded_by" uuid NOT NULL,
	"recorded_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"corrects_id" uuid,
	"correction_reason" text,
	"ended_as" text,
	"ended_at" timestamp with time zone,
	"ended_by" uuid,
	"ended_reason" text,
	CONSTRAINT "calibrations_period" CHECK ("calibrations"."valid_from" < "calibrations"."valid_until"),
	CONSTRAINT "calibrations_end" CHECK (("calibrations"."ended_at" is null) = ("calibrations"."ended_as" is null)),
	CONSTRAINT "calibrations_end_known" CHECK ("calibrations"."ended_as" in ('replaced', 'corrected', 'revoked')),
	CONSTRAINT "calibrations_gain" CHECK ("calibrations"."gain" between 0.5 and 2),
	CONSTRAINT "calibrations_offset" CHECK ("calibrations"."offset_value" between -10000 and 10000),
	CONSTRAINT "calibrations_gain_u" CHECK ("calibrations"."gain_u" between 0 and 0.5),
	CONSTRAINT "calibrations_offset_u" CHECK ("calibrations"."offset_u" between 0 and 10000),
	CONSTRAINT "calibrations_reference_length" CHECK (char_length("calibrations"."reference") <= 80)
);
--> statement-breakpoint
CREATE TABLE "certificates" (
	"certificate_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"number" text NOT NULL,
	"series" text NOT NULL,
	"revision" smallint NOT NULL,
	"set_id" uuid NOT NULL,
	"replaces_id" uuid,
	"replacement_reason" text,
	"as_found_revision_id" uuid NOT NULL,
	"as_left_revision_id" uuid NOT NULL,
	"tolerance_class_revision_id" uuid NOT NULL,
	"content" jsonb NOT NULL,
	"content_sha256" text NOT NULL,
	"pdf_sha256" text NOT NULL,
	"verification_code" text NOT NULL,
	"program_version" text NOT NULL,
	"released_by" uuid NOT NULL,
	"issued_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"state" text DEFAULT 'current' NOT NULL,
	"state_at" timestamp with time zone,
	"state_by" uuid,
	"state_reason" text,
	CONSTRAINT "certificates_state_known" CHECK ("certificates"."state" in ('current', 'superseded', 'revoked')),
	CONSTRAINT "certificates_replacement_reason" CHECK (("certificates"."replaces_id" is null) = ("certificates"."replacement_reason" is null))
);
--> statement-breakpoint
CREATE TABLE "set_reviews" (
	"set_review_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"decision" text NOT NULL,
	"reason" text,
	"as_found_revision_id" uuid NOT NULL,
	"as_left_revision_id" uuid NOT NULL,
	"reviewed_by" uuid NOT NULL,
	"reviewed_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "set_reviews_decision_known" CHECK ("set_reviews"."decision" in ('sent back', 'approved')),
	CONSTRAINT "set_reviews_reason" CHECK ("set_reviews"."decision" = 'approved' or char_length("set_reviews"."reason") > 0)
);
--> statement-breakpoint
CREATE TABLE "cleaning_runs" (
	"cleaning_run_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"bath" text NOT NULL,
	"detergent_batch" text NOT NULL,
	"minutes" numeric(6, 1) NOT NULL,
	"temperature_c" numeric(5, 1) NOT NULL,
	"back_flushed" boolean NOT NULL,
	"parts_renewed" text[] NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"corrects_id" uuid,
	"correction_reason" text,
	"recorded_by" uuid NOT NULL,
	"recorded_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "cleaning_runs_reason" CHECK ("cleaning_runs"."corrects_id" is null or char_length("cleaning_runs"."correction_reason") > 0),
	CONSTRAINT "cleaning_runs_minutes" CHECK ("cleaning_runs"."minutes" between 0.5 and 600),
	CONSTRAINT "cleaning_runs_temperature" CHECK ("cleaning_runs"."temperature_c" between 5 and 95),
	CONSTRAINT "cleaning_runs_parts_known" CHECK ("cleaning_runs"."parts_renewed" <@ array['inlet filter', 'upper seal', 'lower seal', 'pintle cap', 'spacer']::text[]),
	CONSTRAINT "cleaning_runs_bath_length" CHECK (char_length("cleaning_runs"."bath") <= 60),
	CONSTRAINT "cleaning_runs_batch_length" CHECK (char_length("cleaning_runs"."detergent_batch") <= 60),
	CONSTRAINT "cleaning_runs_note_length" CHECK (char_length("cleaning_runs"."note") <= 2000)
);
--> statement-breakpoint
CREATE TABLE "customers" (
	"customer_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"contact_name" text DEFAULT '' NOT NULL,
	"email" text DEFAULT '' NOT NULL,
	"phone" text DEFAULT '' NOT NULL,
	"address" text DEFAULT '' NOT NULL,
	"internal_note" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "customers_name_length" CHECK (char_length("customers"."name") <= 160),
	CONSTRAINT "customers_address_length" CHECK (char_length("customers"."address") <= 600),
	CONSTRAINT "customers_note_length" CHECK (char_length("customers"."internal_note") <= 4000)
);
--> statement-breakpoint
CREATE TABLE "cycle_drafts" (
	"cycle_draft_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"phase" text NOT NULL,
	"corrects_cycle_id" uuid,
	"fields" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"opened_by" uuid NOT NULL,
	"opened_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"saved_by" uuid NOT NULL,
	"saved_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"closed_at" timestamp with time zone,
	"recorded_revision_id" uuid,
	"put_away_reason" text,
	CONSTRAINT "cycle_drafts_phase_known" CHECK ("cycle_drafts"."phase" in ('as found', 'as left'))
);
--> statement-breakpoint
CREATE TABLE "cycle_injectors" (
	"cycle_revision_id" uuid NOT NULL,
	"set_injector_id" uuid NOT NULL,
	"bench_channel_id" uuid NOT NULL,
	"load" smallint NOT NULL,
	"instrument_id" uuid NOT NULL,
	"calibration_id" uuid NOT NULL,
	CONSTRAINT "cycle_injectors_cycle_revision_id_set_injector_id_pk" PRIMARY KEY("cycle_revision_id","set_injector_id"),
	CONSTRAINT "cycle_injectors_load" CHECK ("cycle_injectors"."load" between 1 and 48)
);
--> statement-breakpoint
CREATE TABLE "cycle_instruments" (
	"cycle_revision_id" uuid NOT NULL,
	"instrument_id" uuid NOT NULL,
	"calibration_id" uuid NOT NULL,
	CONSTRAINT "cycle_instruments_cycle_revision_id_instrument_id_pk" PRIMARY KEY("cycle_revision_id","instrument_id")
);
--> statement-breakpoint
CREATE TABLE "cycle_revisions" (
	"cycle_revision_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"cycle_id" uuid NOT NULL,
	"revision" smallint NOT NULL,
	"reason" text,
	"bench_id" uuid NOT NULL,
	"fluid_id" uuid NOT NULL,
	"fluid_temperature_c" numeric(5, 2) NOT NULL,
	"pressure_kpa" numeric(7, 2) NOT NULL,
	"drive_volts" numeric(5, 2) NOT NULL,
	"driver_kind" text NOT NULL,
	"period_ms" numeric(8, 3) NOT NULL,
	"collects" text NOT NULL,
	"repeatability" numeric(9, 5) NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"acknowledged" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"recorded_by" uuid NOT NULL,
	"recorded_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "cycle_revisions_reason" CHECK ("cycle_revisions"."revision" = 1 or char_length("cycle_revisions"."reason") > 0),
	CONSTRAINT "cycle_revisions_fluid_temperature" CHECK ("cycle_revisions"."fluid_temperature_c" between 0 and 60),
	CONSTRAINT "cycle_revisions_pressure" CHECK ("cycle_revisions"."pressure_kpa" between 20 and 2000),
	CONSTRAINT "cycle_revisions_drive_volts" CHECK ("cycle_revisions"."drive_volts" between 1 and 100),
	CONSTRAINT "cycle_revisions_period" CHECK ("cycle_revisions"."period_ms" between 0.1 and 10000),
	CONSTRAINT "cycle_revisions_driver_known" CHECK ("cycle_revisions"."driver_kind" in ('saturated', 'peak and hold')),
	CONSTRAINT "cycle_revisions_collects_known" CHECK ("cycle_revisions"."collects" in ('volume', 'mass')),
	CONSTRAINT "cycle_revisions_note_length" CHECK (char_length("cycle_revisions"."note") <= 2000)
);
--> statement-breakpoint
CREATE TABLE "cycles" (
	"cycle_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"phase" text NOT NULL,
	"number" smallint NOT NULL,
	"recorded_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "cycles_phase_known" CHECK ("cycles"."phase" in ('as found', 'as left'))
);
--> statement-breakpoint
CREATE TABLE "reading_files" (
	"reading_file_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"cycle_draft_id" uuid NOT NULL,
	"sha256" text NOT NULL,
	"name" text NOT NULL,
	"rows" integer NOT NULL,
	"sent_by" uuid NOT NULL,
	"sent_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "reading_files_name_length" CHECK (char_length("reading_files"."name") <= 200)
);
--> statement-breakpoint
CREATE TABLE "fluids" (
	"fluid_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"density_at_15_g_per_ml" numeric(7, 6),
	"expansion_per_k" numeric(9, 8),
	"source" text NOT NULL,
	"retired_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "fluids_name_length" CHECK (char_length("fluids"."name") <= 80),
	CONSTRAINT "fluids_density" CHECK ("fluids"."density_at_15_g_per_ml" between 0.4 and 1.2),
	CONSTRAINT "fluids_expansion" CHECK ("fluids"."expansion_per_k" between 0 and 0.01),
	CONSTRAINT "fluids_density_with_expansion" CHECK (("fluids"."density_at_15_g_per_ml" is null) = ("fluids"."expansion_per_k" is null))
);
--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"actor" text NOT NULL,
	"verb" text NOT NULL,
	"key" text NOT NULL,
	"input_hash" text NOT NULL,
	"result" jsonb,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "idempotency_keys_actor_verb_key_pk" PRIMARY KEY("actor","verb","key")
);
--> statement-breakpoint
CREATE TABLE "injector_rejections" (
	"set_injector_id" uuid PRIMARY KEY NOT NULL,
	"reason" text NOT NULL,
	"rejected_by" uuid NOT NULL,
	"rejected_at" timestamp with time zone DEFAULT record_now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "injectors" (
	"injector_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"injector_model_id" uuid NOT NULL,
	"serial" text,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "injectors_serial_length" CHECK (char_length("injectors"."serial") <= 60)
);
--> statement-breakpoint
CREATE TABLE "set_injectors" (
	"set_injector_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"injector_id" uuid NOT NULL,
	"position" smallint NOT NULL,
	"tag" text NOT NULL,
	"marking" text DEFAULT '' NOT NULL,
	"condition" text NOT NULL,
	"condition_note" text DEFAULT '' NOT NULL,
	"state" text DEFAULT 'in set' NOT NULL,
	"replaces_id" uuid,
	"in_house" boolean DEFAULT true NOT NULL,
	CONSTRAINT "set_injectors_position" CHECK ("set_injectors"."position" between 1 and 48),
	CONSTRAINT "set_injectors_condition_known" CHECK ("set_injectors"."condition" in ('sound', 'dirty', 'corroded', 'damaged connector', 'damaged body', 'seized')),
	CONSTRAINT "set_injectors_state_known" CHECK ("set_injectors"."state" in ('in set', 'rejected', 'replaced')),
	CONSTRAINT "set_injectors_marking_length" CHECK (char_length("set_injectors"."marking") <= 60),
	CONSTRAINT "set_injectors_note_length" CHECK (char_length("set_injectors"."condition_note") <= 500)
);
--> statement-breakpoint
CREATE TABLE "instruments" (
	"instrument_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"code" text NOT NULL,
	"kind" text NOT NULL,
	"maker" text DEFAULT '' NOT NULL,
	"serial" text DEFAULT '' NOT NULL,
	"range_high" numeric(12, 4) NOT NULL,
	"division" numeric(12, 6) NOT NULL,
	"interval_months" integer DEFAULT 12 NOT NULL,
	"retired_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "instruments_code_length" CHECK (char_length("instruments"."code") <= 30),
	CONSTRAINT "instruments_kind_known" CHECK ("instruments"."kind" in ('cylinder', 'balance', 'pressure gauge', 'thermometer', 'ohmmeter', 'pulse timer', 'drive supply')),
	CONSTRAINT "instruments_range_high" CHECK ("instruments"."range_high" between 0.0001 and 99999),
	CONSTRAINT "instruments_division" CHECK ("instruments"."division" between 0.000001 and 1000),
	CONSTRAINT "instruments_interval" CHECK ("instruments"."interval_months" between 1 and 120)
);
--> statement-breakpoint
CREATE TABLE "lab_details" (
	"lab_details_id" integer PRIMARY KEY DEFAULT 1 NOT NULL,
	"name" text NOT NULL,
	"address" text DEFAULT '' NOT NULL,
	"phone" text DEFAULT '' NOT NULL,
	"email" text DEFAULT '' NOT NULL,
	"accreditation" text DEFAULT '' NOT NULL,
	"certificate_wording" text DEFAULT '' NOT NULL,
	"time_zone" text DEFAULT 'UTC' NOT NULL,
	"paper_size" text DEFAULT 'A4' NOT NULL,
	"releaser_is_another" boolean DEFAULT true NOT NULL,
	"reference_density_g_per_ml" numeric(7, 6) NOT NULL,
	"reference_fluid" text NOT NULL,
	"test_plan" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "lab_details_one_row" CHECK ("lab_details"."lab_details_id" = 1),
	CONSTRAINT "lab_details_name_length" CHECK (char_length("lab_details"."name") <= 160),
	CONSTRAINT "lab_details_wording_length" CHECK (char_length("lab_details"."certificate_wording") <= 4000),
	CONSTRAINT "lab_details_reference_density" CHECK ("lab_details"."reference_density_g_per_ml" between 0.4 and 1.2),
	CONSTRAINT "lab_details_paper_known" CHECK ("lab_details"."paper_size" in ('A4', 'Letter'))
);
--> statement-breakpoint
CREATE TABLE "injector_models" (
	"injector_model_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"make" text NOT NULL,
	"part_number" text NOT NULL,
	"impedance_band" text NOT NULL,
	"resistance_low_ohm" numeric(8, 3) NOT NULL,
	"resistance_high_ohm" numeric(8, 3) NOT NULL,
	"rated_flow_ml_per_min" numeric(9, 2) NOT NULL,
	"rated_flow_band_percent" numeric(5, 2) NOT NULL,
	"rated_pressure_kpa" numeric(8, 2) NOT NULL,
	"leakage_limit_mm3_per_min" numeric(8, 2) NOT NULL,
	"leakage_pressure_kpa" numeric(8, 2) NOT NULL,
	"spray_type" text NOT NULL,
	"confirmed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "injector_models_make_length" CHECK (char_length("injector_models"."make") <= 80),
	CONSTRAINT "injector_models_part_number_length" CHECK (char_length("injector_models"."part_number") <= 80),
	CONSTRAINT "injector_models_impedance_known" CHECK ("injector_models"."impedance_band" in ('high impedance', 'low impedance')),
	CONSTRAINT "injector_models_spray_known" CHECK ("injector_models"."spray_type" in ('single stream', 'dual stream', 'cone', 'split cone')),
	CONSTRAINT "injector_models_resistance_low" CHECK ("injector_models"."resistance_low_ohm" between 0.1 and 200),
	CONSTRAINT "injector_models_resistance_high" CHECK ("injector_models"."resistance_high_ohm" between 0.1 and 200),
	CONSTRAINT "injector_models_resistance_order" CHECK ("injector_models"."resistance_low_ohm" <= "injector_models"."resistance_high_ohm"),
	CONSTRAINT "injector_models_rated_flow" CHECK ("injector_models"."rated_flow_ml_per_min" between 10 and 10000),
	CONSTRAINT "injector_models_rated_flow_band" CHECK ("injector_models"."rated_flow_band_percent" between 0.5 and 50),
	CONSTRAINT "injector_models_rated_pressure" CHECK ("injector_models"."rated_pressure_kpa" between 50 and 2000),
	CONSTRAINT "injector_models_leakage_limit" CHECK ("injector_models"."leakage_limit_mm3_per_min" between 0 and 1000),
	CONSTRAINT "injector_models_leakage_pressure" CHECK ("injector_models"."leakage_pressure_kpa" between 50 and 2000)
);
--> statement-breakpoint
CREATE TABLE "number_series" (
	"series" text NOT NULL,
	"year" integer NOT NULL,
	"last" integer NOT NULL,
	CONSTRAINT "number_series_series_year_pk" PRIMARY KEY("series","year")
);
--> statement-breakpoint
CREATE TABLE "customer_people" (
	"customer_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	CONSTRAINT "customer_people_customer_id_person_id_pk" PRIMARY KEY("customer_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "entry_links" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"person_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "people" (
	"person_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"email_canonical" text NOT NULL,
	"password_hash" text,
	"active" boolean DEFAULT true NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "people_name_length" CHECK (char_length("people"."name") <= 120),
	CONSTRAINT "people_email_length" CHECK (char_length("people"."email") <= 254)
);
--> statement-breakpoint
CREATE TABLE "person_roles" (
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	CONSTRAINT "person_roles_person_id_role_pk" PRIMARY KEY("person_id","role"),
	CONSTRAINT "person_roles_known" CHECK ("person_roles"."role" in ('counter', 'technician', 'manager'))
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"session_id" text PRIMARY KEY NOT NULL,
	"person_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"authenticated_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"browser" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "photos" (
	"photo_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"set_injector_id" uuid,
	"kind" text NOT NULL,
	"phase" text,
	"sha256" text NOT NULL,
	"thumbnail_sha256" text NOT NULL,
	"width_px" integer NOT NULL,
	"height_px" integer NOT NULL,
	"received_sha256" text NOT NULL,
	"received_bytes" integer NOT NULL,
	"received_name" text NOT NULL,
	"claimed_taken_at" text,
	"taken_by" uuid NOT NULL,
	"taken_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"hidden_by" uuid,
	"hidden_at" timestamp with time zone,
	"hidden_reason" text,
	CONSTRAINT "photos_kind_known" CHECK ("photos"."kind" in ('intake', 'spray')),
	CONSTRAINT "photos_name_length" CHECK (char_length("photos"."received_name") <= 200)
);
--> statement-breakpoint
CREATE TABLE "injector_checks" (
	"cycle_revision_id" uuid NOT NULL,
	"set_injector_id" uuid NOT NULL,
	"winding_ohm" numeric(8, 3),
	"lead_ohm" numeric(6, 3),
	"winding_temperature_c" numeric(5, 2),
	"insulation_megohm" numeric(9, 2),
	"leakage_mm3_per_min" numeric(8, 2),
	"leakage_pressure_kpa" numeric(7, 2),
	"leakage_seconds" numeric(7, 1),
	"spray_grade" text,
	"note" text DEFAULT '' NOT NULL,
	CONSTRAINT "injector_checks_cycle_revision_id_set_injector_id_pk" PRIMARY KEY("cycle_revision_id","set_injector_id"),
	CONSTRAINT "injector_checks_winding_with_temperature" CHECK (("injector_checks"."winding_ohm" is null) = ("injector_checks"."winding_temperature_c" is null)),
	CONSTRAINT "injector_checks_leakage_with_conditions" CHECK ("injector_checks"."leakage_mm3_per_min" is null or ("injector_checks"."leakage_pressure_kpa" is not null and "injector_checks"."leakage_seconds" is not null)),
	CONSTRAINT "injector_checks_winding" CHECK ("injector_checks"."winding_ohm" between 0.05 and 1000),
	CONSTRAINT "injector_checks_lead" CHECK ("injector_checks"."lead_ohm" between 0 and 20),
	CONSTRAINT "injector_checks_winding_temperature" CHECK ("injector_checks"."winding_temperature_c" between -10 and 120),
	CONSTRAINT "injector_checks_insulation" CHECK ("injector_checks"."insulation_megohm" between 0 and 1000000),
	CONSTRAINT "injector_checks_leakage" CHECK ("injector_checks"."leakage_mm3_per_min" between 0 and 100000),
	CONSTRAINT "injector_checks_leakage_pressure" CHECK ("injector_checks"."leakage_pressure_kpa" between 20 and 2000),
	CONSTRAINT "injector_checks_leakage_seconds" CHECK ("injector_checks"."leakage_seconds" between 1 and 3600),
	CONSTRAINT "injector_checks_spray_known" CHECK ("injector_checks"."spray_grade" in ('good', 'acceptable', 'poor', 'no spray')),
	CONSTRAINT "injector_checks_note_length" CHECK (char_length("injector_checks"."note") <= 500)
);
--> statement-breakpoint
CREATE TABLE "readings" (
	"reading_id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "readings_reading_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"cycle_revision_id" uuid NOT NULL,
	"set_injector_id" uuid NOT NULL,
	"pulse_width_ms" numeric(8, 4),
	"pulse_count" integer,
	"open_seconds" numeric(8, 3),
	"repeat" smallint NOT NULL,
	"amount" numeric(10, 4) NOT NULL,
	CONSTRAINT "readings_pulsed_or_held_open" CHECK (("readings"."pulse_width_ms" is null) = ("readings"."pulse_count" is null) and ("readings"."pulse_width_ms" is null) <> ("readings"."open_seconds" is null)),
	CONSTRAINT "readings_pulse_width" CHECK ("readings"."pulse_width_ms" between 0.05 and 1000),
	CONSTRAINT "readings_pulse_count" CHECK ("readings"."pulse_count" between 1 and 1000000),
	CONSTRAINT "readings_open_seconds" CHECK ("readings"."open_seconds" between 0.1 and 3600),
	CONSTRAINT "readings_repeat" CHECK ("readings"."repeat" between 1 and 20),
	CONSTRAINT "readings_amount" CHECK ("readings"."amount" between 0 and 100000)
);
--> statement-breakpoint
CREATE TABLE "hand_overs" (
	"set_id" uuid PRIMARY KEY NOT NULL,
	"taken_by" text NOT NULL,
	"way" text NOT NULL,
	"consignment" text DEFAULT '' NOT NULL,
	"handed_over_by" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "hand_overs_way_known" CHECK ("hand_overs"."way" in ('collected', 'courier', 'post', 'our delivery')),
	CONSTRAINT "hand_overs_taken_by_length" CHECK (char_length("hand_overs"."taken_by") <= 160)
);
--> statement-breakpoint
CREATE TABLE "set_holds" (
	"set_hold_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"reason" text NOT NULL,
	"held_by" uuid NOT NULL,
	"held_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	"cleared_by" uuid,
	"cleared_at" timestamp with time zone,
	"cleared_reason" text
);
--> statement-breakpoint
CREATE TABLE "set_steps" (
	"set_step_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"set_id" uuid NOT NULL,
	"from_stage" text,
	"to_stage" text NOT NULL,
	"reason" text,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT record_now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sets" (
	"set_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"number" text NOT NULL,
	"customer_id" uuid NOT NULL,
	"injector_model_id" uuid NOT NULL,
	"tolerance_class_id" uuid NOT NULL,
	"work_asked" text[] NOT NULL,
	"customer_request" text DEFAULT '' NOT NULL,
	"internal_note" text DEFAULT '' NOT NULL,
	"promised_on" date NOT NULL,
	"stage" text DEFAULT 'checked in' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"checked_in_by" uuid NOT NULL,
	"checked_in_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "sets_stage_known" CHECK ("sets"."stage" in ('checked in', 'as found', 'cleaning', 'as left', 'in review', 'certified', 'handed over', 'returned uncleaned')),
	CONSTRAINT "sets_work_known" CHECK ("sets"."work_asked" <@ array['clean', 'flow test', 'winding check', 'renew filters and seals', 'match']::text[]),
	CONSTRAINT "sets_request_length" CHECK (char_length("sets"."customer_request") <= 2000),
	CONSTRAINT "sets_note_length" CHECK (char_length("sets"."internal_note") <= 4000)
);
--> statement-breakpoint
CREATE TABLE "stage_moves" (
	"from_stage" text NOT NULL,
	"to_stage" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "throttle_counters" (
	"counter" text PRIMARY KEY NOT NULL,
	"window_started_at" timestamp with time zone NOT NULL,
	"count" integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE "tolerance_class_limits" (
	"tolerance_class_revision_id" uuid NOT NULL,
	"from_pulse_width_ms" numeric(8, 4) NOT NULL,
	"spread_percent" numeric(6, 3) NOT NULL,
	CONSTRAINT "tolerance_class_limits_tolerance_class_revision_id_from_pulse_width_ms_pk" PRIMARY KEY("tolerance_class_revision_id","from_pulse_width_ms"),
	CONSTRAINT "tolerance_class_limits_width" CHECK ("tolerance_class_limits"."from_pulse_width_ms" between 0 and 1000),
	CONSTRAINT "tolerance_class_limits_spread" CHECK ("tolerance_class_limits"."spread_percent" between 0.01 and 100)
);
--> statement-breakpoint
CREATE TABLE "tolerance_class_revisions" (
	"tolerance_class_revision_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"tolerance_class_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"static_spread_percent" numeric(6, 3),
	"dead_time_range_ms" numeric(7, 4),
	"resistance_range_ohm" numeric(7, 3),
	"leakage_limit_mm3_per_min" numeric(8, 2),
	"recorded_by" uuid NOT NULL,
	"recorded_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "tolerance_class_static_spread" CHECK ("tolerance_class_revisions"."static_spread_percent" between 0.01 and 100),
	CONSTRAINT "tolerance_class_dead_time_range" CHECK ("tolerance_class_revisions"."dead_time_range_ms" between 0.0001 and 10),
	CONSTRAINT "tolerance_class_resistance_range" CHECK ("tolerance_class_revisions"."resistance_range_ohm" between 0.001 and 100),
	CONSTRAINT "tolerance_class_leakage" CHECK ("tolerance_class_revisions"."leakage_limit_mm3_per_min" between 0 and 1000)
);
--> statement-breakpoint
CREATE TABLE "tolerance_classes" (
	"tolerance_class_id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"retired_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT record_now() NOT NULL,
	CONSTRAINT "tolerance_classes_name_length" CHECK (char_length("tolerance_classes"."name") <= 80)
);
--> statement-breakpoint
ALTER TABLE "bench_channels" ADD CONSTRAINT "bench_channels_bench_id_benches_bench_id_fk" FOREIGN KEY ("bench_id") REFERENCES "public"."benches"("bench_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_holds" ADD CONSTRAINT "bench_holds_bench_id_benches_bench_id_fk" FOREIGN KEY ("bench_id") REFERENCES "public"."benches"("bench_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_holds" ADD CONSTRAINT "bench_holds_held_by_people_person_id_fk" FOREIGN KEY ("held_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_holds" ADD CONSTRAINT "bench_holds_cleared_by_people_person_id_fk" FOREIGN KEY ("cleared_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_instruments" ADD CONSTRAINT "bench_instruments_bench_id_benches_bench_id_fk" FOREIGN KEY ("bench_id") REFERENCES "public"."benches"("bench_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_instruments" ADD CONSTRAINT "bench_instruments_bench_channel_id_bench_channels_bench_channel_id_fk" FOREIGN KEY ("bench_channel_id") REFERENCES "public"."bench_channels"("bench_channel_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bench_instruments" ADD CONSTRAINT "bench_instruments_instrument_id_instruments_instrument_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("instrument_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "benches" ADD CONSTRAINT "benches_fluid_id_fluids_fluid_id_fk" FOREIGN KEY ("fluid_id") REFERENCES "public"."fluids"("fluid_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_instrument_id_instruments_instrument_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("instrument_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_recorded_by_people_person_id_fk" FOREIGN KEY ("recorded_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_corrects_id_calibrations_calibration_id_fk" FOREIGN KEY ("corrects_id") REFERENCES "public"."calibrations"("calibration_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_ended_by_people_person_id_fk" FOREIGN KEY ("ended_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_replaces_id_certificates_certificate_id_fk" FOREIGN KEY ("replaces_id") REFERENCES "public"."certificates"("certificate_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_as_found_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("as_found_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_as_left_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("as_left_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_tolerance_class_revision_id_tolerance_class_revisions_tolerance_class_revision_id_fk" FOREIGN KEY ("tolerance_class_revision_id") REFERENCES "public"."tolerance_class_revisions"("tolerance_class_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_pdf_sha256_blobs_sha256_fk" FOREIGN KEY ("pdf_sha256") REFERENCES "public"."blobs"("sha256") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_released_by_people_person_id_fk" FOREIGN KEY ("released_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificates" ADD CONSTRAINT "certificates_state_by_people_person_id_fk" FOREIGN KEY ("state_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_reviews" ADD CONSTRAINT "set_reviews_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_reviews" ADD CONSTRAINT "set_reviews_as_found_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("as_found_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_reviews" ADD CONSTRAINT "set_reviews_as_left_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("as_left_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_reviews" ADD CONSTRAINT "set_reviews_reviewed_by_people_person_id_fk" FOREIGN KEY ("reviewed_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cleaning_runs" ADD CONSTRAINT "cleaning_runs_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cleaning_runs" ADD CONSTRAINT "cleaning_runs_corrects_id_cleaning_runs_cleaning_run_id_fk" FOREIGN KEY ("corrects_id") REFERENCES "public"."cleaning_runs"("cleaning_run_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cleaning_runs" ADD CONSTRAINT "cleaning_runs_recorded_by_people_person_id_fk" FOREIGN KEY ("recorded_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_drafts" ADD CONSTRAINT "cycle_drafts_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_drafts" ADD CONSTRAINT "cycle_drafts_corrects_cycle_id_cycles_cycle_id_fk" FOREIGN KEY ("corrects_cycle_id") REFERENCES "public"."cycles"("cycle_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_drafts" ADD CONSTRAINT "cycle_drafts_opened_by_people_person_id_fk" FOREIGN KEY ("opened_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_drafts" ADD CONSTRAINT "cycle_drafts_saved_by_people_person_id_fk" FOREIGN KEY ("saved_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_drafts" ADD CONSTRAINT "cycle_drafts_recorded_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("recorded_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_injectors" ADD CONSTRAINT "cycle_injectors_cycle_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("cycle_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_injectors" ADD CONSTRAINT "cycle_injectors_set_injector_id_set_injectors_set_injector_id_fk" FOREIGN KEY ("set_injector_id") REFERENCES "public"."set_injectors"("set_injector_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_injectors" ADD CONSTRAINT "cycle_injectors_bench_channel_id_bench_channels_bench_channel_id_fk" FOREIGN KEY ("bench_channel_id") REFERENCES "public"."bench_channels"("bench_channel_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_injectors" ADD CONSTRAINT "cycle_injectors_instrument_id_instruments_instrument_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("instrument_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_injectors" ADD CONSTRAINT "cycle_injectors_calibration_id_calibrations_calibration_id_fk" FOREIGN KEY ("calibration_id") REFERENCES "public"."calibrations"("calibration_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_instruments" ADD CONSTRAINT "cycle_instruments_cycle_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("cycle_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_instruments" ADD CONSTRAINT "cycle_instruments_instrument_id_instruments_instrument_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("instrument_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_instruments" ADD CONSTRAINT "cycle_instruments_calibration_id_calibrations_calibration_id_fk" FOREIGN KEY ("calibration_id") REFERENCES "public"."calibrations"("calibration_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_revisions" ADD CONSTRAINT "cycle_revisions_cycle_id_cycles_cycle_id_fk" FOREIGN KEY ("cycle_id") REFERENCES "public"."cycles"("cycle_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_revisions" ADD CONSTRAINT "cycle_revisions_bench_id_benches_bench_id_fk" FOREIGN KEY ("bench_id") REFERENCES "public"."benches"("bench_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_revisions" ADD CONSTRAINT "cycle_revisions_fluid_id_fluids_fluid_id_fk" FOREIGN KEY ("fluid_id") REFERENCES "public"."fluids"("fluid_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycle_revisions" ADD CONSTRAINT "cycle_revisions_recorded_by_people_person_id_fk" FOREIGN KEY ("recorded_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cycles" ADD CONSTRAINT "cycles_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading_files" ADD CONSTRAINT "reading_files_cycle_draft_id_cycle_drafts_cycle_draft_id_fk" FOREIGN KEY ("cycle_draft_id") REFERENCES "public"."cycle_drafts"("cycle_draft_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading_files" ADD CONSTRAINT "reading_files_sha256_blobs_sha256_fk" FOREIGN KEY ("sha256") REFERENCES "public"."blobs"("sha256") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading_files" ADD CONSTRAINT "reading_files_sent_by_people_person_id_fk" FOREIGN KEY ("sent_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "injector_rejections" ADD CONSTRAINT "injector_rejections_set_injector_id_set_injectors_set_injector_id_fk" FOREIGN KEY ("set_injector_id") REFERENCES "public"."set_injectors"("set_injector_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "injector_rejections" ADD CONSTRAINT "injector_rejections_rejected_by_people_person_id_fk" FOREIGN KEY ("rejected_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "injectors" ADD CONSTRAINT "injectors_injector_model_id_injector_models_injector_model_id_fk" FOREIGN KEY ("injector_model_id") REFERENCES "public"."injector_models"("injector_model_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_injectors" ADD CONSTRAINT "set_injectors_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_injectors" ADD CONSTRAINT "set_injectors_injector_id_injectors_injector_id_fk" FOREIGN KEY ("injector_id") REFERENCES "public"."injectors"("injector_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_injectors" ADD CONSTRAINT "set_injectors_replaces_id_set_injectors_set_injector_id_fk" FOREIGN KEY ("replaces_id") REFERENCES "public"."set_injectors"("set_injector_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "customer_people" ADD CONSTRAINT "customer_people_customer_id_customers_customer_id_fk" FOREIGN KEY ("customer_id") REFERENCES "public"."customers"("customer_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "customer_people" ADD CONSTRAINT "customer_people_person_id_people_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "entry_links" ADD CONSTRAINT "entry_links_person_id_people_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "person_roles" ADD CONSTRAINT "person_roles_person_id_people_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_person_id_people_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_set_injector_id_set_injectors_set_injector_id_fk" FOREIGN KEY ("set_injector_id") REFERENCES "public"."set_injectors"("set_injector_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_sha256_blobs_sha256_fk" FOREIGN KEY ("sha256") REFERENCES "public"."blobs"("sha256") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_thumbnail_sha256_blobs_sha256_fk" FOREIGN KEY ("thumbnail_sha256") REFERENCES "public"."blobs"("sha256") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_taken_by_people_person_id_fk" FOREIGN KEY ("taken_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_hidden_by_people_person_id_fk" FOREIGN KEY ("hidden_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "injector_checks" ADD CONSTRAINT "injector_checks_cycle_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("cycle_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "injector_checks" ADD CONSTRAINT "injector_checks_set_injector_id_set_injectors_set_injector_id_fk" FOREIGN KEY ("set_injector_id") REFERENCES "public"."set_injectors"("set_injector_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_cycle_revision_id_cycle_revisions_cycle_revision_id_fk" FOREIGN KEY ("cycle_revision_id") REFERENCES "public"."cycle_revisions"("cycle_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_set_injector_id_set_injectors_set_injector_id_fk" FOREIGN KEY ("set_injector_id") REFERENCES "public"."set_injectors"("set_injector_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "hand_overs" ADD CONSTRAINT "hand_overs_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "hand_overs" ADD CONSTRAINT "hand_overs_handed_over_by_people_person_id_fk" FOREIGN KEY ("handed_over_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_holds" ADD CONSTRAINT "set_holds_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_holds" ADD CONSTRAINT "set_holds_held_by_people_person_id_fk" FOREIGN KEY ("held_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_holds" ADD CONSTRAINT "set_holds_cleared_by_people_person_id_fk" FOREIGN KEY ("cleared_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_steps" ADD CONSTRAINT "set_steps_set_id_sets_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "public"."sets"("set_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "set_steps" ADD CONSTRAINT "set_steps_person_id_people_person_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_customer_id_customers_customer_id_fk" FOREIGN KEY ("customer_id") REFERENCES "public"."customers"("customer_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_injector_model_id_injector_models_injector_model_id_fk" FOREIGN KEY ("injector_model_id") REFERENCES "public"."injector_models"("injector_model_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_tolerance_class_id_tolerance_classes_tolerance_class_id_fk" FOREIGN KEY ("tolerance_class_id") REFERENCES "public"."tolerance_classes"("tolerance_class_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_checked_in_by_people_person_id_fk" FOREIGN KEY ("checked_in_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tolerance_class_limits" ADD CONSTRAINT "tolerance_class_limits_tolerance_class_revision_id_tolerance_class_revisions_tolerance_class_revision_id_fk" FOREIGN KEY ("tolerance_class_revision_id") REFERENCES "public"."tolerance_class_revisions"("tolerance_class_revision_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tolerance_class_revisions" ADD CONSTRAINT "tolerance_class_revisions_tolerance_class_id_tolerance_classes_tolerance_class_id_fk" FOREIGN KEY ("tolerance_class_id") REFERENCES "public"."tolerance_classes"("tolerance_class_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tolerance_class_revisions" ADD CONSTRAINT "tolerance_class_revisions_recorded_by_people_person_id_fk" FOREIGN KEY ("recorded_by") REFERENCES "public"."people"("person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "activity_by_object" ON "activity" USING btree ("noun","object_id","position");--> statement-breakpoint
CREATE INDEX "activity_by_set" ON "activity" USING btree ("set_id","position");--> statement-breakpoint
CREATE INDEX "activity_by_person" ON "activity" USING btree ("person_id","position");--> statement-breakpoint
CREATE INDEX "activity_by_time" ON "activity" USING btree ("at");--> statement-breakpoint
CREATE UNIQUE INDEX "bench_channels_once" ON "bench_channels" USING btree ("bench_id","number");--> statement-breakpoint
CREATE UNIQUE INDEX "bench_holds_one_open" ON "bench_holds" USING btree ("bench_id") WHERE "bench_holds"."cleared_at" is null;--> statement-breakpoint
CREATE INDEX "bench_holds_by_bench" ON "bench_holds" USING btree ("bench_id","held_at");--> statement-breakpoint
CREATE INDEX "bench_instruments_by_bench" ON "bench_instruments" USING btree ("bench_id");--> statement-breakpoint
CREATE UNIQUE INDEX "bench_instruments_one_place" ON "bench_instruments" USING btree ("instrument_id") WHERE "bench_instruments"."until_at" is null;--> statement-breakpoint
CREATE UNIQUE INDEX "bench_instruments_one_per_channel" ON "bench_instruments" USING btree ("bench_channel_id") WHERE "bench_instruments"."until_at" is null and "bench_instruments"."bench_channel_id" is not null;--> statement-breakpoint
CREATE UNIQUE INDEX "benches_one_per_code" ON "benches" USING btree (lower("code"));--> statement-breakpoint
CREATE INDEX "calibrations_by_instrument" ON "calibrations" USING btree ("instrument_id","valid_until");--> statement-breakpoint
CREATE UNIQUE INDEX "certificates_one_per_number" ON "certificates" USING btree ("number");--> statement-breakpoint
CREATE UNIQUE INDEX "certificates_revisions_in_order" ON "certificates" USING btree ("series","revision");--> statement-breakpoint
CREATE UNIQUE INDEX "certificates_one_current_per_set" ON "certificates" USING btree ("set_id") WHERE "certificates"."state" = 'current';--> statement-breakpoint
CREATE UNIQUE INDEX "certificates_one_replacement" ON "certificates" USING btree ("replaces_id");--> statement-breakpoint
CREATE UNIQUE INDEX "certificates_one_per_code" ON "certificates" USING btree ("verification_code");--> statement-breakpoint
CREATE INDEX "certificates_by_set" ON "certificates" USING btree ("set_id","issued_at");--> statement-breakpoint
CREATE INDEX "certificates_by_issue" ON "certificates" USING btree ("issued_at","certificate_id");--> statement-breakpoint
CREATE INDEX "set_reviews_by_set" ON "set_reviews" USING btree ("set_id","reviewed_at");--> statement-breakpoint
CREATE INDEX "cleaning_runs_by_set" ON "cleaning_runs" USING btree ("set_id","recorded_at");--> statement-breakpoint
CREATE UNIQUE INDEX "cleaning_runs_one_correction" ON "cleaning_runs" USING btree ("corrects_id");--> statement-breakpoint
CREATE INDEX "customers_by_name_parts" ON "customers" USING gin (lower("name") gin_trgm_ops);--> statement-breakpoint
CREATE INDEX "customers_by_name" ON "customers" USING btree (lower("name"),"customer_id");--> statement-breakpoint
CREATE UNIQUE INDEX "cycle_drafts_one_open" ON "cycle_drafts" USING btree ("set_id","phase") WHERE "cycle_drafts"."closed_at" is null;--> statement-breakpoint
CREATE UNIQUE INDEX "cycle_injectors_one_per_channel" ON "cycle_injectors" USING btree ("cycle_revision_id","load","bench_channel_id");--> statement-breakpoint
CREATE INDEX "cycle_injectors_by_calibration" ON "cycle_injectors" USING btree ("calibration_id");--> statement-breakpoint
CREATE INDEX "cycle_injectors_by_injector" ON "cycle_injectors" USING btree ("set_injector_id");--> statement-breakpoint
CREATE INDEX "cycle_instruments_by_calibration" ON "cycle_instruments" USING btree ("calibration_id");--> statement-breakpoint
CREATE UNIQUE INDEX "cycle_revisions_in_order" ON "cycle_revisions" USING btree ("cycle_id","revision");--> statement-breakpoint
CREATE INDEX "cycle_revisions_by_bench" ON "cycle_revisions" USING btree ("bench_id","recorded_at");--> statement-breakpoint
CREATE UNIQUE INDEX "cycles_in_order" ON "cycles" USING btree ("set_id","phase","number");--> statement-breakpoint
CREATE INDEX "reading_files_by_draft" ON "reading_files" USING btree ("cycle_draft_id");--> statement-breakpoint
CREATE UNIQUE INDEX "fluids_one_per_name" ON "fluids" USING btree (lower("name"));--> statement-breakpoint
CREATE UNIQUE INDEX "injectors_one_per_serial" ON "injectors" USING btree ("injector_model_id",upper("serial"));--> statement-breakpoint
CREATE INDEX "injectors_by_serial_parts" ON "injectors" USING gin (lower("serial") gin_trgm_ops);--> statement-breakpoint
CREATE UNIQUE INDEX "set_injectors_one_per_tag" ON "set_injectors" USING btree ("tag");--> statement-breakpoint
CREATE UNIQUE INDEX "set_injectors_one_per_position" ON "set_injectors" USING btree ("set_id","position") WHERE "set_injectors"."state" = 'in set';--> statement-breakpoint
CREATE UNIQUE INDEX "set_injectors_one_open_set" ON "set_injectors" USING btree ("injector_id") WHERE "set_injectors"."in_house";--> statement-breakpoint
CREATE UNIQUE INDEX "set_injectors_one_replacement" ON "set_injectors" USING btree ("replaces_id");--> statement-breakpoint
CREATE INDEX "set_injectors_by_injector" ON "set_injectors" USING btree ("injector_id");--> statement-breakpoint
CREATE UNIQUE INDEX "instruments_one_per_code" ON "instruments" USING btree (lower("code"));--> statement-breakpoint
CREATE INDEX "instruments_by_kind" ON "instruments" USING btree ("kind");--> statement-breakpoint
CREATE UNIQUE INDEX "injector_models_one_per_part_number" ON "injector_models" USING btree (lower("make"),lower("part_number"));--> statement-breakpoint
CREATE INDEX "injector_models_by_name_parts" ON "injector_models" USING gin (lower("make" || ' ' || "part_number") gin_trgm_ops);--> statement-breakpoint
CREATE INDEX "customer_people_by_person" ON "customer_people" USING btree ("person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "entry_links_one_open_per_person" ON "entry_links" USING btree ("person_id") WHERE "entry_links"."used_at" is null;--> statement-breakpoint
CREATE UNIQUE INDEX "people_one_account_per_email" ON "people" USING btree ("email_canonical");--> statement-breakpoint
CREATE INDEX "sessions_by_person" ON "sessions" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "sessions_by_expiry" ON "sessions" USING btree ("expires_at");--> statement-breakpoint
CREATE INDEX "photos_by_set" ON "photos" USING btree ("set_id","taken_at");--> statement-breakpoint
CREATE INDEX "photos_by_person" ON "photos" USING btree ("taken_by","taken_at");--> statement-breakpoint
CREATE UNIQUE INDEX "readings_once" ON "readings" USING btree ("cycle_revision_id","set_injector_id",coalesce("pulse_width_ms", 0),"repeat");--> statement-breakpoint
CREATE INDEX "readings_by_injector" ON "readings" USING btree ("set_injector_id");--> statement-breakpoint
CREATE UNIQUE INDEX "set_holds_one_open" ON "set_holds" USING btree ("set_id") WHERE "set_holds"."cleared_at" is null;--> statement-breakpoint
CREATE INDEX "set_holds_by_set" ON "set_holds" USING btree ("set_id","held_at");--> statement-breakpoint
CREATE INDEX "set_steps_by_set" ON "set_steps" USING btree ("set_id","at");--> statement-breakpoint
CREATE UNIQUE INDEX "sets_one_per_number" ON "sets" USING btree ("number");--> statement-breakpoint
CREATE INDEX "sets_by_number_parts" ON "sets" USING gin ("number" gin_trgm_ops);--> statement-breakpoint
CREATE INDEX "sets_by_stage" ON "sets" USING btree ("stage","promised_on");--> statement-breakpoint
CREATE INDEX "sets_by_promise" ON "sets" USING btree ("promised_on","set_id");--> statement-breakpoint
CREATE INDEX "sets_by_customer" ON "sets" USING btree ("customer_id","checked_in_at");--> statement-breakpoint
CREATE INDEX "sets_by_arrival" ON "sets" USING btree ("checked_in_at","set_id");--> statement-breakpoint
CREATE INDEX "sets_by_model" ON "sets" USING btree ("injector_model_id");--> statement-breakpoint
CREATE UNIQUE INDEX "stage_moves_once" ON "stage_moves" USING btree ("from_stage","to_stage");--> statement-breakpoint
CREATE INDEX "throttle_counters_by_age" ON "throttle_counters" USING btree ("window_started_at");--> statement-breakpoint
CREATE UNIQUE INDEX "tolerance_class_revisions_in_order" ON "tolerance_class_revisions" USING btree ("tolerance_class_id","revision");--> statement-breakpoint
CREATE UNIQUE INDEX "tolerance_classes_one_per_name" ON "tolerance_classes" USING btree (lower("name"));