-- An attempt is never updated or deleted, whatever the program above does. Two exceptions: a person or an instrument
-- that is deleted leaves the attempt behind without its name, and a purge (boardwake.purge = on, set by the one use
-- case that purges) removes the whole history of what is purged.
CREATE FUNCTION keep_history() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF current_setting('boardwake.purge', true) = 'on' THEN
    IF TG_OP = 'DELETE' THEN RETURN OLD; ELSE RETURN NEW; END IF;
  END IF;
  IF TG_OP = 'DELETE' THEN
    RAISE EXCEPTION '% rows are never deleted', TG_TABLE_NAME;
  END IF;
  IF to_jsonb(NEW) - '{user_id,instrument_id,actor_id}'::text[] IS DISTINCT FROM to_jsonb(OLD) - '{user_id,instrument_id,actor_id}'::text[] THEN
    RAISE EXCEPTION '% rows are never changed', TG_TABLE_NAME;
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER attempts_are_final BEFORE UPDATE OR DELETE ON attempts FOR EACH ROW EXECUTE FUNCTION keep_history();
--> statement-breakpoint
CREATE TRIGGER readings_are_final BEFORE UPDATE OR DELETE ON readings FOR EACH ROW EXECUTE FUNCTION keep_history();
--> statement-breakpoint
CREATE TRIGGER attempt_voids_are_final BEFORE UPDATE OR DELETE ON attempt_voids FOR EACH ROW EXECUTE FUNCTION keep_history();
--> statement-breakpoint
CREATE TRIGGER reopenings_are_final BEFORE UPDATE OR DELETE ON reopenings FOR EACH ROW EXECUTE FUNCTION keep_history();
--> statement-breakpoint
CREATE TRIGGER hold_lifts_are_final BEFORE UPDATE OR DELETE ON hold_lifts FOR EACH ROW EXECUTE FUNCTION keep_history();
--> statement-breakpoint
CREATE TRIGGER events_are_final BEFORE UPDATE OR DELETE ON events FOR EACH ROW EXECUTE FUNCTION keep_history();
