-- Where a policy asks only for the role, PostgreSQL may answer from that alone and never look at the company: so the
-- role too is an error while no actor has entered, and never a quiet "none".
create or replace function app.role() returns text language plpgsql stable as $$
begin
  perform app.company_id();
  return current_setting('app.role', true);
end $$;
