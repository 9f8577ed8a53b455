-- The runtime role reads and adds. It changes only what is named here, and takes nothing away from a record.
-- Tables of later migrations get the first two rights by default; whatever else they need is granted beside them.
GRANT USAGE ON SCHEMA public TO evenrail_app;
--> statement-breakpoint
GRANT SELECT, INSERT ON ALL TABLES IN SCHEMA public TO evenrail_app;
--> statement-breakpoint
ALTER DEFAULT PRIVILEGES IN SCHEMA public GRANT SELECT, INSERT ON TABLES TO evenrail_app;
--> statement-breakpoint
REVOKE INSERT ON stage_moves, activity_head, record_clock, lab_details FROM evenrail_app;
--> statement-breakpoint
GRANT UPDATE ON people, customers, injector_models, tolerance_classes, lab_details, fluids, instruments, benches,
  sessions, entry_links, throttle_counters, number_series, idempotency_keys TO evenrail_app;
--> statement-breakpoint
GRANT DELETE ON person_roles, customer_people, sessions, entry_links, throttle_counters, idempotency_keys TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (injector_model_id, tolerance_class_id, work_asked, customer_request, internal_note, promised_on, stage, version)
  ON sets TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (injector_id, marking, condition, condition_note, state, in_house) ON set_injectors TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (cleared_by, cleared_at, cleared_reason) ON set_holds, bench_holds TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (hidden_by, hidden_at, hidden_reason) ON photos TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (until_at) ON bench_instruments TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (ended_as, ended_at, ended_by, ended_reason) ON calibrations TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (fields, version, saved_by, saved_at, closed_at, recorded_revision_id, put_away_reason)
  ON cycle_drafts TO evenrail_app;
--> statement-breakpoint
GRANT UPDATE (state, state_at, state_by, state_reason) ON certificates TO evenrail_app;
