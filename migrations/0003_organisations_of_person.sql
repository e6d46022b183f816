-- Whether an owner may make a password link for a person depends on the person belonging to no other account, which row
-- security hides from the application. The function tells the number and nothing else.
CREATE FUNCTION organisations_of_person(person uuid) RETURNS integer LANGUAGE sql STABLE SECURITY DEFINER SET search_path = public, pg_temp AS $$ SELECT count(*)::integer FROM membership WHERE membership.person_id = person AND membership.removed_at IS NULL $$;
--> statement-breakpoint
REVOKE ALL ON FUNCTION organisations_of_person(uuid) FROM PUBLIC;
