-- Isolation of plants and least rights, in the database itself.
--
-- The application works as cogmark_app, which owns nothing. It sees rows of the plant named by the
-- transaction-local setting app.plant and no others; without the setting it sees none. FORCE makes this hold
-- for the owner too, so the demo seed and later data migrations name a plant like everyone else. The one
-- exception is that the owner may read `plants`: an operator must be able to tell whether the database is empty.

DO $$
BEGIN
	IF NOT EXISTS (SELECT FROM pg_roles WHERE rolname = 'cogmark_app') THEN
		CREATE ROLE cogmark_app NOLOGIN;
	END IF;
	-- So that work done over the owner's connection can step down to the application's rights.
	IF NOT pg_has_role(current_user, 'cogmark_app', 'MEMBER') THEN
		EXECUTE format('GRANT cogmark_app TO %I', current_user);
	END IF;
EXCEPTION WHEN insufficient_privilege THEN
	IF NOT EXISTS (SELECT FROM pg_roles WHERE rolname = 'cogmark_app') THEN
		RAISE EXCEPTION 'The role cogmark_app is missing and this role may not create it. Ask for: CREATE ROLE cogmark_app NOLOGIN;';
	END IF;
END
$$;
--> statement-breakpoint
GRANT USAGE ON SCHEMA public TO cogmark_app;
--> statement-breakpoint
GRANT SELECT ON installation, users, plants, memberships, machines, gear_positions, plant_rules TO cogmark_app;
--> statement-breakpoint
GRANT SELECT, INSERT, DELETE, UPDATE (expires_at, plant_id) ON sessions TO cogmark_app;
--> statement-breakpoint
GRANT SELECT, UPDATE (head, audit_head, tablet_head) ON plant_counters TO cogmark_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE (name, last_heard_at, last_heard_from, blocked_at) ON tablets TO cogmark_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE (highest_drawn) ON tablet_authors TO cogmark_app;
--> statement-breakpoint
-- Records, their log and the audit trail are only ever added to.
GRANT SELECT, INSERT ON materials, material_revisions, changes, checks, quarantine, audit TO cogmark_app;
--> statement-breakpoint
DO $$
DECLARE
	t text;
BEGIN
	FOREACH t IN ARRAY ARRAY[
		'plant_counters', 'memberships', 'tablets', 'tablet_authors', 'machines', 'gear_positions', 'materials',
		'material_revisions', 'plant_rules', 'checks', 'quarantine', 'changes', 'audit'
	] LOOP
		EXECUTE format('ALTER TABLE %I ENABLE ROW LEVEL SECURITY', t);
		EXECUTE format('ALTER TABLE %I FORCE ROW LEVEL SECURITY', t);
		-- After a transaction the setting is an empty string, hence nullif.
		EXECUTE format(
			'CREATE POLICY of_plant ON %I USING (plant_id = nullif(current_setting(''app.plant'', true), '''')::uuid)'
			' WITH CHECK (plant_id = nullif(current_setting(''app.plant'', true), '''')::uuid)', t
		);
	END LOOP;
END
$$;
--> statement-breakpoint
ALTER TABLE plants ENABLE ROW LEVEL SECURITY;
--> statement-breakpoint
ALTER TABLE plants FORCE ROW LEVEL SECURITY;
--> statement-breakpoint
CREATE POLICY of_plant ON plants
	USING (id = nullif(current_setting('app.plant', true), '')::uuid)
	WITH CHECK (id = nullif(current_setting('app.plant', true), '')::uuid);
--> statement-breakpoint
-- A person who signed in sees in which plants they work, before a plant is chosen.
CREATE POLICY of_person ON memberships FOR SELECT
	USING (user_id = nullif(current_setting('app.user', true), '')::uuid);
--> statement-breakpoint
CREATE POLICY of_member ON plants FOR SELECT
	USING (EXISTS (
		SELECT FROM memberships m
		WHERE m.plant_id = plants.id
			AND m.user_id = nullif(current_setting('app.user', true), '')::uuid
			AND m.disabled_at IS NULL
	));
--> statement-breakpoint
CREATE POLICY of_owner ON plants FOR SELECT TO CURRENT_USER USING (true);
--> statement-breakpoint
INSERT INTO installation DEFAULT VALUES;
