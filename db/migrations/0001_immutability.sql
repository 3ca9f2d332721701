-- What was measured and what was released never changes. These rules hold for every client, the owner included,
-- as long as nobody drops the triggers.

CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% of % is refused: %', TG_OP, TG_TABLE_NAME, TG_ARGV[0]
    USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = TG_TABLE_NAME || '_immutable';
END $$;
--> statement-breakpoint
CREATE FUNCTION keep_reading() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF (NEW.id, NEW.set_id, NEW.ordinal, NEW.l_star, NEW.a_star, NEW.b_star, NEW.instrument_whiteness, NEW.spectrum)
     IS DISTINCT FROM
     (OLD.id, OLD.set_id, OLD.ordinal, OLD.l_star, OLD.a_star, OLD.b_star, OLD.instrument_whiteness, OLD.spectrum) THEN
    RAISE EXCEPTION 'UPDATE of readings is refused: measured values stay as read; set a flag with its reason instead'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'readings_immutable';
  END IF;
  IF EXISTS (SELECT FROM edition_entries WHERE set_ids @> ARRAY[NEW.set_id])
     AND (NEW.flag, NEW.flag_reason) IS DISTINCT FROM (OLD.flag, OLD.flag_reason) THEN
    RAISE EXCEPTION 'UPDATE of readings is refused: a released edition rests on this set; withdraw the set instead'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'readings_released';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE FUNCTION keep_set() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF (NEW.id, NEW.session_id, NEW.unit_id, NEW.position, NEW.state, NEW.specular, NEW.light_off, NEW.shown)
     IS DISTINCT FROM
     (OLD.id, OLD.session_id, OLD.unit_id, OLD.position, OLD.state, OLD.specular, OLD.light_off, OLD.shown) THEN
    RAISE EXCEPTION 'UPDATE of sets is refused: how it was measured stays; withdraw the set with a reason instead'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'sets_immutable';
  END IF;
  IF OLD.withdrawn_at IS NOT NULL THEN
    RAISE EXCEPTION 'UPDATE of sets is refused: a withdrawn set stays withdrawn'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'sets_withdrawn_for_good';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE FUNCTION next_edition_number() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NEW.number <> (SELECT coalesce(max(number), 0) + 1 FROM editions) THEN
    RAISE EXCEPTION 'INSERT of edition % is refused: numbers have no gaps', NEW.number
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'editions_number_without_gaps';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE FUNCTION entry_as_printed() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  -- The document names every device of the edition, and an entry's key is its slug: once all are in, no more fit.
  IF NOT EXISTS (SELECT FROM editions WHERE number = NEW.edition AND document -> 'devices' @> jsonb_build_array(NEW.device)) THEN
    RAISE EXCEPTION 'INSERT of edition_entries is refused: edition % does not print this of %', NEW.edition, NEW.slug
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'edition_entries_as_printed';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER readings_keep BEFORE UPDATE ON readings FOR EACH ROW EXECUTE FUNCTION keep_reading();
--> statement-breakpoint
CREATE TRIGGER readings_stay BEFORE DELETE OR TRUNCATE ON readings FOR EACH STATEMENT EXECUTE FUNCTION refuse_change('readings are never removed');
--> statement-breakpoint
CREATE TRIGGER control_readings_stay BEFORE UPDATE OR DELETE OR TRUNCATE ON control_readings FOR EACH STATEMENT EXECUTE FUNCTION refuse_change('readings of controls stay as read');
--> statement-breakpoint
CREATE TRIGGER sets_keep BEFORE UPDATE ON sets FOR EACH ROW EXECUTE FUNCTION keep_set();
--> statement-breakpoint
CREATE TRIGGER sets_stay BEFORE DELETE OR TRUNCATE ON sets FOR EACH STATEMENT EXECUTE FUNCTION refuse_change('sets are never removed');
--> statement-breakpoint
CREATE TRIGGER editions_number BEFORE INSERT ON editions FOR EACH ROW EXECUTE FUNCTION next_edition_number();
--> statement-breakpoint
CREATE TRIGGER editions_stay BEFORE UPDATE OR DELETE OR TRUNCATE ON editions FOR EACH STATEMENT EXECUTE FUNCTION refuse_change('a released edition never changes; release a new one');
--> statement-breakpoint
CREATE TRIGGER edition_entries_printed BEFORE INSERT ON edition_entries FOR EACH ROW EXECUTE FUNCTION entry_as_printed();
--> statement-breakpoint
CREATE TRIGGER edition_entries_stay BEFORE UPDATE OR DELETE OR TRUNCATE ON edition_entries FOR EACH STATEMENT EXECUTE FUNCTION refuse_change('a released edition never changes; release a new one');
