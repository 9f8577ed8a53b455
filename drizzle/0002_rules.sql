-- Rules that hold whatever the application does. Each refusal names a constraint, as a CHECK would.

CREATE FUNCTION refuse(rule text, why text) RETURNS void LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '%', why USING ERRCODE = 'check_violation', CONSTRAINT = rule;
END $$;
--> statement-breakpoint

-- One instrument, one calibration in force at a time.
ALTER TABLE calibrations ADD CONSTRAINT calibrations_no_overlap
  EXCLUDE USING gist (instrument_id WITH =, tstzrange(valid_from, valid_until) WITH &&) WHERE (ended_at IS NULL);
--> statement-breakpoint

-- The activity record: a gap-free counter and a hash chain, both under the lock on one row.
CREATE TABLE activity_head (
  only_row boolean PRIMARY KEY DEFAULT true CHECK (only_row),
  position bigint NOT NULL,
  hash text NOT NULL
);
--> statement-breakpoint
INSERT INTO activity_head (position, hash) VALUES (0, repeat('0', 64));
--> statement-breakpoint
CREATE FUNCTION activity_digest(entry activity) RETURNS text LANGUAGE sql STABLE SET timezone = 'UTC' AS $$
  SELECT encode(sha256(convert_to((to_jsonb(entry) - 'hash')::text, 'UTF8')), 'hex')
$$;
--> statement-breakpoint
CREATE FUNCTION chain_activity() RETURNS trigger LANGUAGE plpgsql SECURITY DEFINER SET search_path = public, pg_temp AS $$
BEGIN
  UPDATE activity_head SET position = position + 1 RETURNING position, hash INTO NEW.position, NEW.previous_hash;
  NEW.at := record_now();
  NEW.hash := activity_digest(NEW);
  UPDATE activity_head SET hash = NEW.hash;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER activity_chained BEFORE INSERT ON activity FOR EACH ROW EXECUTE FUNCTION chain_activity();
--> statement-breakpoint

-- What every lab starts from, before its manager says who it is. Density of n-heptane at 20 °C: Span and Wagner 2003.
INSERT INTO fluids (name, source) VALUES ('n-heptane', 'Span and Wagner 2003');
--> statement-breakpoint
INSERT INTO lab_details (name, reference_fluid, reference_density_g_per_ml, test_plan) VALUES ('Our laboratory', 'n-heptane at 20 °C', 0.683815,
  '{"widths": [{"pulseWidthMs": 1.5, "pulseCount": 3000}, {"pulseWidthMs": 2, "pulseCount": 2000}, {"pulseWidthMs": 3, "pulseCount": 1000},
    {"pulseWidthMs": 4, "pulseCount": 1000}, {"pulseWidthMs": 6, "pulseCount": 1000}, {"pulseWidthMs": 8, "pulseCount": 1000},
    {"pulseWidthMs": 10, "pulseCount": 1000}], "heldOpenSeconds": 10}');
--> statement-breakpoint

-- The course of a set.
INSERT INTO stage_moves (from_stage, to_stage) VALUES
  ('checked in', 'as found'),
  ('as found', 'cleaning'),
  ('cleaning', 'as left'),
  ('as left', 'cleaning'),
  ('as left', 'in review'),
  ('in review', 'as left'),
  ('in review', 'certified'),
  ('certified', 'handed over'),
  ('checked in', 'returned uncleaned'),
  ('as found', 'returned uncleaned'),
  ('cleaning', 'returned uncleaned'),
  ('as left', 'returned uncleaned'),
  ('in review', 'returned uncleaned'),
  ('returned uncleaned', 'handed over');
--> statement-breakpoint
CREATE FUNCTION check_set_stage() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'INSERT' THEN
    IF NEW.stage <> 'checked in' THEN
      PERFORM refuse('sets_stage_order', 'A set begins as checked in.');
    END IF;
    RETURN NEW;
  END IF;
  IF NEW.stage = OLD.stage THEN
    RETURN NEW;
  END IF;
  IF NOT EXISTS (SELECT FROM stage_moves WHERE from_stage = OLD.stage AND to_stage = NEW.stage) THEN
    PERFORM refuse('sets_stage_order', format('A set cannot go from %s to %s.', OLD.stage, NEW.stage));
  END IF;
  IF EXISTS (SELECT FROM set_holds WHERE set_id = NEW.set_id AND cleared_at IS NULL) THEN
    PERFORM refuse('sets_stage_not_while_held', 'A set on hold keeps its stage.');
  END IF;
  IF NEW.stage IN ('as found', 'as left')
     AND NOT EXISTS (SELECT FROM cycles WHERE set_id = NEW.set_id AND phase = NEW.stage) THEN
    PERFORM refuse('sets_stage_needs_cycle', format('No cycle is recorded %s.', NEW.stage));
  END IF;
  IF NEW.stage = 'cleaning' AND NOT EXISTS (SELECT FROM cleaning_runs WHERE set_id = NEW.set_id) THEN
    PERFORM refuse('sets_stage_needs_cleaning_run', 'No cleaning run is recorded.');
  END IF;
  -- A certificate may be revoked after release; the set is then not handed over as certified.
  IF (NEW.stage = 'certified' OR OLD.stage = 'certified')
     AND NOT EXISTS (SELECT FROM certificates WHERE set_id = NEW.set_id AND state = 'current') THEN
    PERFORM refuse('sets_stage_needs_certificate', 'No certificate is current.');
  END IF;
  IF NEW.stage = 'handed over' AND NOT EXISTS (SELECT FROM hand_overs WHERE set_id = NEW.set_id) THEN
    PERFORM refuse('sets_stage_needs_hand_over', 'No hand-over is recorded.');
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER sets_stage_checked BEFORE INSERT OR UPDATE OF stage ON sets FOR EACH ROW EXECUTE FUNCTION check_set_stage();
--> statement-breakpoint

-- A cycle is recorded in its turn, on a bench that is neither held nor retired; from release on it is frozen.
CREATE FUNCTION check_cycle() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE stage_now text;
BEGIN
  SELECT stage INTO stage_now FROM sets WHERE set_id = NEW.set_id;
  IF NOT (NEW.phase = 'as found' AND stage_now IN ('checked in', 'as found')
          OR NEW.phase = 'as left' AND stage_now IN ('cleaning', 'as left')) THEN
    PERFORM refuse('cycles_in_turn', format('A set that is %s takes no cycle %s.', stage_now, NEW.phase));
  END IF;
  IF EXISTS (SELECT FROM set_holds WHERE set_id = NEW.set_id AND cleared_at IS NULL) THEN
    PERFORM refuse('cycles_not_while_held', 'A set on hold takes no cycle.');
  END IF;
  NEW.recorded_at := record_now();
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER cycles_checked BEFORE INSERT ON cycles FOR EACH ROW EXECUTE FUNCTION check_cycle();
--> statement-breakpoint
CREATE FUNCTION check_cycle_revision() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE stage_now text; held boolean; retired timestamptz;
BEGIN
  SELECT s.stage INTO stage_now FROM cycles c JOIN sets s USING (set_id) WHERE c.cycle_id = NEW.cycle_id;
  IF stage_now IN ('certified', 'handed over', 'returned uncleaned') THEN
    PERFORM refuse('cycle_revisions_frozen', format('A set that is %s takes no correction.', stage_now));
  END IF;
  NEW.recorded_at := record_now();
  IF NEW.revision = 1 THEN
    SELECT retired_at INTO retired FROM benches WHERE bench_id = NEW.bench_id;
    held := EXISTS (SELECT FROM bench_holds WHERE bench_id = NEW.bench_id AND cleared_at IS NULL);
    IF held OR retired IS NOT NULL THEN
      PERFORM refuse('cycle_revisions_bench_in_service', 'The bench is on hold or retired.');
    END IF;
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER cycle_revisions_checked BEFORE INSERT ON cycle_revisions FOR EACH ROW EXECUTE FUNCTION check_cycle_revision();
--> statement-breakpoint

-- A cycle rests on calibrations that were in force when it was recorded.
CREATE FUNCTION check_cycle_calibration() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE measured_at timestamptz;
BEGIN
  SELECT c.recorded_at INTO measured_at
    FROM cycle_revisions r JOIN cycles c USING (cycle_id) WHERE r.cycle_revision_id = NEW.cycle_revision_id;
  IF NOT EXISTS (
    SELECT FROM calibrations
     WHERE calibration_id = NEW.calibration_id AND instrument_id = NEW.instrument_id
       AND tstzrange(valid_from, valid_until) @> measured_at
       AND (ended_at IS NULL OR ended_at > measured_at)
  ) THEN
    PERFORM refuse('cycles_calibration_in_force', 'The calibration was not in force when the cycle was recorded.');
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER cycle_injectors_checked BEFORE INSERT ON cycle_injectors FOR EACH ROW EXECUTE FUNCTION check_cycle_calibration();
--> statement-breakpoint
CREATE TRIGGER cycle_instruments_checked BEFORE INSERT ON cycle_instruments FOR EACH ROW EXECUTE FUNCTION check_cycle_calibration();
--> statement-breakpoint

-- What a certificate needs on the day it is issued, and what may change on it afterwards.
CREATE FUNCTION check_certificate() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE stage_now text;
BEGIN
  SELECT stage INTO stage_now FROM sets WHERE set_id = NEW.set_id;
  IF NOT (NEW.replaces_id IS NULL AND stage_now = 'in review'
          OR NEW.replaces_id IS NOT NULL AND stage_now IN ('certified', 'handed over')) THEN
    PERFORM refuse('certificates_in_turn', format('A set that is %s takes no such certificate.', stage_now));
  END IF;
  IF (SELECT releaser_is_another FROM lab_details) AND EXISTS (
    SELECT FROM cycle_revisions r JOIN cycles c USING (cycle_id)
     WHERE c.set_id = NEW.set_id AND r.recorded_by = NEW.released_by
    UNION ALL
    SELECT FROM cleaning_runs WHERE set_id = NEW.set_id AND recorded_by = NEW.released_by
  ) THEN
    PERFORM refuse('certificates_releaser_is_another', 'Who released it recorded part of it.');
  END IF;
  IF EXISTS (
    SELECT FROM cycle_revisions r JOIN cycle_revisions later USING (cycle_id)
     WHERE r.cycle_revision_id IN (NEW.as_found_revision_id, NEW.as_left_revision_id) AND later.revision > r.revision
  ) THEN
    PERFORM refuse('certificates_rest_on_latest', 'A later revision of a cycle exists.');
  END IF;
  IF EXISTS (
    SELECT FROM (
      SELECT calibration_id FROM cycle_injectors
       WHERE cycle_revision_id IN (NEW.as_found_revision_id, NEW.as_left_revision_id)
      UNION SELECT calibration_id FROM cycle_instruments
       WHERE cycle_revision_id IN (NEW.as_found_revision_id, NEW.as_left_revision_id)
    ) used JOIN calibrations USING (calibration_id) WHERE ended_as IN ('corrected', 'revoked')
  ) THEN
    PERFORM refuse('certificates_calibration_unrevoked', 'A calibration that it rests on is no longer in force.');
  END IF;
  NEW.issued_at := record_now();
  NEW.state := 'current';
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER certificates_checked BEFORE INSERT ON certificates FOR EACH ROW EXECUTE FUNCTION check_certificate();
--> statement-breakpoint
CREATE FUNCTION check_certificate_state() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF OLD.state <> 'current' OR NEW.state = 'current' OR NEW.state_by IS NULL OR coalesce(NEW.state_reason, '') = '' THEN
    PERFORM refuse('certificates_state_once', 'A certificate leaves the current state once, with who and why.');
  END IF;
  NEW.state_at := record_now();
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER certificates_state_checked BEFORE UPDATE ON certificates FOR EACH ROW EXECUTE FUNCTION check_certificate_state();
--> statement-breakpoint

-- The lab is never without a manager who can sign in.
CREATE FUNCTION check_manager_remains() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  PERFORM pg_advisory_xact_lock(hashtext('evenrail managers'));
  IF NOT EXISTS (SELECT FROM people JOIN person_roles USING (person_id) WHERE active AND role = 'manager') THEN
    PERFORM refuse('people_manager_remains', 'At least one active lab manager must remain.');
  END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER people_manager_remains AFTER UPDATE OF active ON people
  FOR EACH ROW WHEN (OLD.active AND NOT NEW.active) EXECUTE FUNCTION check_manager_remains();
--> statement-breakpoint
CREATE CONSTRAINT TRIGGER person_roles_manager_remains AFTER DELETE ON person_roles DEFERRABLE INITIALLY DEFERRED
  FOR EACH ROW WHEN (OLD.role = 'manager') EXECUTE FUNCTION check_manager_remains();
