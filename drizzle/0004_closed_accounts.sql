-- The record stays append-only, with two exceptions that a transaction must name beforehand: a
-- brewery that ends takes its record along, and a closed account's name leaves an acceptance.
CREATE OR REPLACE FUNCTION refuse_change_of_record() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' AND OLD.brewery_id::text = current_setting('barmkin.ending_brewery', true) THEN
    RETURN OLD;
  END IF;
  IF TG_OP = 'UPDATE' AND current_setting('barmkin.redacting', true) = 'on'
    AND (to_jsonb(NEW) - 'before' - 'after') = (to_jsonb(OLD) - 'before' - 'after') THEN
    RETURN NEW;
  END IF;
  RAISE EXCEPTION 'the change record is append-only' USING ERRCODE = 'restrict_violation';
END $$;
