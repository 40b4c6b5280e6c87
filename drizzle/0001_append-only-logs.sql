-- Logs and editions are written once. The one change allowed is removal together with the venue or
-- the run they belong to (a cascade), which a trigger sees as pg_trigger_depth() above 1.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
	IF TG_OP = 'DELETE' AND pg_trigger_depth() > 1 THEN
		RETURN OLD;
	END IF;
	RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END $$;
--> statement-breakpoint
CREATE TRIGGER audit_log_append_only BEFORE UPDATE OR DELETE ON audit_log
	FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER run_events_append_only BEFORE UPDATE OR DELETE ON run_events
	FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER editions_never_change BEFORE UPDATE OR DELETE ON editions
	FOR EACH ROW WHEN (pg_trigger_depth() = 0) EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
-- Counters of failed sign-ins and the like; the shape rate-limiter-flexible reads.
CREATE TABLE rate_limits (key varchar(255) PRIMARY KEY, points integer NOT NULL DEFAULT 0, expire bigint);
