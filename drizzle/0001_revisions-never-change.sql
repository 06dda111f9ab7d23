CREATE FUNCTION refuse_change_of_revision() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'a released revision can be neither changed nor removed' USING ERRCODE = 'restrict_violation';
END
$$;
--> statement-breakpoint
CREATE TRIGGER revisions_never_change BEFORE UPDATE OR DELETE ON "revisions"
  FOR EACH ROW EXECUTE FUNCTION refuse_change_of_revision();
--> statement-breakpoint
CREATE TRIGGER revisions_never_emptied BEFORE TRUNCATE ON "revisions"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change_of_revision();
