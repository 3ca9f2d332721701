ALTER TABLE "readings" DROP CONSTRAINT "readings_flag_with_reason";--> statement-breakpoint
ALTER TABLE "specs" DROP CONSTRAINT "specs_value_range";--> statement-breakpoint
DROP INDEX "sets_session_id_idx";--> statement-breakpoint
DROP INDEX "specs_revision_id_field_idx";--> statement-breakpoint
CREATE INDEX "edition_entries_set_ids_idx" ON "edition_entries" USING gin ("set_ids");--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_place_key" UNIQUE("session_id","unit_id","position","state","specular");--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_statement_key" UNIQUE("revision_id","field","stated_on");--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_put_right_later" CHECK ("corrections"."right_in" > "corrections"."wrong_in");--> statement-breakpoint
ALTER TABLE "corrections" ADD CONSTRAINT "corrections_note_said" CHECK (btrim("corrections"."note") <> '');--> statement-breakpoint
ALTER TABLE "replies" ADD CONSTRAINT "replies_note_said" CHECK (btrim("replies"."note") <> '');--> statement-breakpoint
ALTER TABLE "edition_entries" ADD CONSTRAINT "edition_entries_slug_of_device" CHECK ("edition_entries"."device" ->> 'slug' is not distinct from "edition_entries"."slug");--> statement-breakpoint
ALTER TABLE "editions" ADD CONSTRAINT "editions_document_agrees" CHECK ((("editions"."document" ->> 'number')::int, ("editions"."document" ->> 'method')::int, "editions"."document" ->> 'sha256', ("editions"."document" ->> 'publishedAt')::timestamptz) is not distinct from ("editions"."number", "editions"."method", "editions"."sha256", "editions"."published_at"));--> statement-breakpoint
ALTER TABLE "makers" ADD CONSTRAINT "makers_slug_form" CHECK ("makers"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$');--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_flag_reason_said" CHECK (btrim("readings"."flag_reason") <> '');--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_flag_with_reason" CHECK ("readings"."flag" = 'none' or "readings"."flag_reason" is not null);--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_withdrawn_reason_said" CHECK (btrim("sets"."withdrawn_reason") <> '');--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_position_said" CHECK (btrim("sets"."position") <> '');--> statement-breakpoint
ALTER TABLE "sets" ADD CONSTRAINT "sets_shown_said" CHECK (btrim("sets"."shown") <> '');--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_diagonal_range" CHECK ("specs"."field" <> 'diagonal' or "specs"."value" between 1 and 50);--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_ppi_range" CHECK ("specs"."field" <> 'ppi' or "specs"."value" between 10 and 2000);--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_weight_range" CHECK ("specs"."field" <> 'weight' or "specs"."value" between 10 and 5000);--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_water_digit" CHECK ("specs"."field" <> 'water' or "specs"."value" in (0, 1, 2, 3, 4, 5, 6, 7, 8, 9));--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_list_filled" CHECK ("specs"."list" is null or (cardinality("specs"."list") > 0 and array_position("specs"."list", null) is null));--> statement-breakpoint
ALTER TABLE "specs" ADD CONSTRAINT "specs_source_said" CHECK (btrim("specs"."source") <> '');--> statement-breakpoint
CREATE OR REPLACE FUNCTION keep_reading() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF (NEW.id, NEW.set_id, NEW.ordinal, NEW.l_star, NEW.a_star, NEW.b_star, NEW.instrument_whiteness, NEW.spectrum)
     IS DISTINCT FROM
     (OLD.id, OLD.set_id, OLD.ordinal, OLD.l_star, OLD.a_star, OLD.b_star, OLD.instrument_whiteness, OLD.spectrum) THEN
    RAISE EXCEPTION 'UPDATE of readings is refused: measured values stay as read; set a flag with its reason instead'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'readings_immutable';
  END IF;
  IF (NEW.flag, NEW.flag_reason) IS NOT DISTINCT FROM (OLD.flag, OLD.flag_reason) THEN
    RETURN NEW;
  END IF;
  IF EXISTS (SELECT FROM edition_entries WHERE set_ids @> ARRAY[NEW.set_id]) THEN
    RAISE EXCEPTION 'UPDATE of readings is refused: a released edition rests on this set; withdraw the set instead'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'readings_released';
  END IF;
  IF NEW.flag <> OLD.flag AND (NEW.flag_reason IS NULL OR NEW.flag_reason IS NOT DISTINCT FROM OLD.flag_reason) THEN
    RAISE EXCEPTION 'UPDATE of readings is refused: a flag is set, and cleared, with a reason of its own'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'readings_flag_change_with_reason';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE FUNCTION keep_session() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (SELECT FROM sets JOIN edition_entries ON set_ids @> ARRAY[sets.id] WHERE session_id = OLD.id) THEN
    OLD.note := NEW.note;
    IF NEW IS DISTINCT FROM OLD THEN
      RAISE EXCEPTION 'UPDATE of sessions is refused: a released edition rests on it; only its note may change'
        USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'sessions_released';
    END IF;
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE FUNCTION keep_unit() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF (NEW.id, NEW.revision_id, NEW.serial) IS DISTINCT FROM (OLD.id, OLD.revision_id, OLD.serial)
     AND EXISTS (SELECT FROM sets JOIN edition_entries ON set_ids @> ARRAY[sets.id] WHERE unit_id = OLD.id) THEN
    RAISE EXCEPTION 'UPDATE of units is refused: a released edition rests on it; it stays of its revision'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'units_released';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE OR REPLACE FUNCTION next_edition_number() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NEW.number <> (SELECT coalesce(max(number), 0) + 1 FROM editions) THEN
    RAISE EXCEPTION 'INSERT of edition % is refused: numbers have no gaps', NEW.number
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'editions_number_without_gaps';
  END IF;
  IF EXISTS (SELECT FROM editions WHERE published_at >= NEW.published_at) THEN
    RAISE EXCEPTION 'INSERT of edition % is refused: one was released later than that', NEW.number
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'editions_released_in_order';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE OR REPLACE FUNCTION entry_as_printed() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NOT EXISTS (
    SELECT FROM editions, jsonb_array_elements(document -> 'devices') AS printed
    WHERE number = NEW.edition AND printed = NEW.device
  ) THEN
    RAISE EXCEPTION 'INSERT of edition_entries is refused: edition % does not print this of %', NEW.edition, NEW.slug
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'edition_entries_as_printed';
  END IF;
  IF EXISTS (
    SELECT unnest(NEW.set_ids)
    EXCEPT
    SELECT sets.id FROM sets JOIN units ON units.id = unit_id WHERE units.revision_id = NEW.revision_id
  ) THEN
    RAISE EXCEPTION 'INSERT of edition_entries is refused: % is said to rest on sets that are not its own', NEW.slug
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'edition_entries_own_sets';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE FUNCTION edition_whole() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  -- Each entry equals a device of the document and their slugs differ: as many are all of them.
  IF (SELECT count(*) FROM edition_entries WHERE edition = NEW.number)
     IS DISTINCT FROM jsonb_array_length(NEW.document -> 'devices') THEN
    RAISE EXCEPTION 'INSERT of edition % is refused: its entries are not the devices it prints', NEW.number
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'editions_whole';
  END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER sessions_keep BEFORE UPDATE ON sessions FOR EACH ROW EXECUTE FUNCTION keep_session();
--> statement-breakpoint
CREATE TRIGGER units_keep BEFORE UPDATE ON units FOR EACH ROW EXECUTE FUNCTION keep_unit();
--> statement-breakpoint
-- Looked at when the transaction ends, since the entries follow their edition.
CREATE CONSTRAINT TRIGGER editions_whole AFTER INSERT ON editions DEFERRABLE INITIALLY DEFERRED
  FOR EACH ROW EXECUTE FUNCTION edition_whole();
--> statement-breakpoint
CREATE FUNCTION released_set_is_full() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (SELECT FROM edition_entries WHERE set_ids @> ARRAY[NEW.set_id]) THEN
    RAISE EXCEPTION 'INSERT of readings is refused: a released edition rests on this set; begin a new one'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'readings_released';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE FUNCTION released_session_is_full() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (
    SELECT FROM sets JOIN edition_entries ON set_ids @> ARRAY[sets.id] WHERE sets.session_id = NEW.session_id
  ) THEN
    RAISE EXCEPTION 'INSERT of control_readings is refused: a released edition rests on this session'
      USING ERRCODE = 'integrity_constraint_violation', CONSTRAINT = 'control_readings_released';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER readings_full BEFORE INSERT ON readings FOR EACH ROW EXECUTE FUNCTION released_set_is_full();
--> statement-breakpoint
CREATE TRIGGER control_readings_full BEFORE INSERT ON control_readings FOR EACH ROW EXECUTE FUNCTION released_session_is_full();
