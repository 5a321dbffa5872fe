-- What the schema language cannot say.

-- The audit trail only grows.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'events are append-only';
END $$;
--> statement-breakpoint
CREATE TRIGGER events_append_only BEFORE UPDATE OR DELETE ON events
  FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
-- One bolt in force in a hole.
CREATE UNIQUE INDEX bolts_one_in_force ON bolts (placement_id)
  WHERE removed_on IS NULL AND struck_at IS NULL;
--> statement-breakpoint
ALTER TABLE bolts ADD CONSTRAINT bolts_replaces_fk FOREIGN KEY (replaces_bolt_id) REFERENCES bolts (id);
--> statement-breakpoint
ALTER TABLE closures ADD CONSTRAINT closures_anchor_fk FOREIGN KEY (anchor_id) REFERENCES anchors (id);
--> statement-breakpoint
ALTER TABLE photos ADD CONSTRAINT photos_job_fk FOREIGN KEY (job_id) REFERENCES rebolt_jobs (id);
--> statement-breakpoint
ALTER TABLE spans ADD CONSTRAINT spans_two_anchors CHECK (anchor_a_id <> anchor_b_id);
--> statement-breakpoint
ALTER TABLE watches ADD CONSTRAINT watches_one_subject CHECK ((anchor_id IS NULL) <> (site_id IS NULL));
--> statement-breakpoint
ALTER TABLE users ADD CONSTRAINT users_email_lower CHECK (email = lower(email));
