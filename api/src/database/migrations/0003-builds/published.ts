/**
 * A published edition never changes. Children look at their edition under a shared lock, so that publishing and a late
 * change to a stage cannot pass each other.
 */
export const PUBLISHED_RULES = [
  `CREATE FUNCTION edition_is_published(wanted uuid) RETURNS boolean LANGUAGE sql VOLATILE AS $$
     SELECT published_at IS NOT NULL FROM plan_edition WHERE id = wanted FOR SHARE
   $$`,
  `CREATE FUNCTION published_edition_is_fixed() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     IF OLD.published_at IS NOT NULL THEN
       RAISE EXCEPTION 'A published edition never changes.'
         USING ERRCODE = 'check_violation', CONSTRAINT = 'plan_edition_published_is_fixed';
     END IF;
     RETURN CASE WHEN TG_OP = 'DELETE' THEN OLD ELSE NEW END;
   END $$`,
  `CREATE TRIGGER plan_edition_published_is_fixed BEFORE UPDATE OR DELETE ON plan_edition
   FOR EACH ROW EXECUTE FUNCTION published_edition_is_fixed()`,
  `CREATE FUNCTION published_stage_is_fixed() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     IF (TG_OP <> 'INSERT' AND edition_is_published(OLD.edition_id))
       OR (TG_OP <> 'DELETE' AND edition_is_published(NEW.edition_id)) THEN
       RAISE EXCEPTION 'A published edition never changes.'
         USING ERRCODE = 'check_violation', CONSTRAINT = 'stage_published_is_fixed';
     END IF;
     RETURN CASE WHEN TG_OP = 'DELETE' THEN OLD ELSE NEW END;
   END $$`,
  `CREATE TRIGGER stage_published_is_fixed BEFORE INSERT OR UPDATE OR DELETE ON stage
   FOR EACH ROW EXECUTE FUNCTION published_stage_is_fixed()`,
  `CREATE FUNCTION published_part_is_fixed() RETURNS trigger LANGUAGE plpgsql AS $$
   BEGIN
     IF (TG_OP <> 'INSERT' AND edition_is_published((SELECT edition_id FROM stage WHERE id = OLD.stage_id)))
       OR (TG_OP <> 'DELETE' AND edition_is_published((SELECT edition_id FROM stage WHERE id = NEW.stage_id))) THEN
       RAISE EXCEPTION 'A published edition never changes.'
         USING ERRCODE = 'check_violation', CONSTRAINT = TG_TABLE_NAME || '_published_is_fixed';
     END IF;
     RETURN CASE WHEN TG_OP = 'DELETE' THEN OLD ELSE NEW END;
   END $$`,
  `CREATE TRIGGER level_point_published_is_fixed BEFORE INSERT OR UPDATE OR DELETE ON level_point
   FOR EACH ROW EXECUTE FUNCTION published_part_is_fixed()`,
  `CREATE TRIGGER plan_check_published_is_fixed BEFORE INSERT OR UPDATE OR DELETE ON plan_check
   FOR EACH ROW EXECUTE FUNCTION published_part_is_fixed()`,
];

export const DROP_PUBLISHED_RULES = [
  `DROP TRIGGER plan_check_published_is_fixed ON plan_check`,
  `DROP TRIGGER level_point_published_is_fixed ON level_point`,
  `DROP FUNCTION published_part_is_fixed()`,
  `DROP TRIGGER stage_published_is_fixed ON stage`,
  `DROP FUNCTION published_stage_is_fixed()`,
  `DROP TRIGGER plan_edition_published_is_fixed ON plan_edition`,
  `DROP FUNCTION published_edition_is_fixed()`,
  `DROP FUNCTION edition_is_published(uuid)`,
];
