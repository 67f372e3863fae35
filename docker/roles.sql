-- The three roles of a cluster, for psql as a superuser. Safe to repeat; sets the passwords anew.
-- coastdown_owner owns the databases, coastdown_app is the application, coastdown_gate owns the functions at the door.
\set ON_ERROR_STOP on
set client_min_messages = warning;
\getenv owner_password COASTDOWN_OWNER_PASSWORD
\getenv app_password COASTDOWN_APP_PASSWORD

select format('create role %I', name) from unnest(array['coastdown_owner', 'coastdown_app', 'coastdown_gate']) as name
where not exists (select from pg_roles where rolname = name) \gexec

alter role coastdown_owner with login createdb nosuperuser nocreaterole nobypassrls password :'owner_password';
alter role coastdown_app with login nosuperuser nocreatedb nocreaterole nobypassrls password :'app_password';
alter role coastdown_gate with nologin nosuperuser nocreatedb nocreaterole nobypassrls;
grant coastdown_gate to coastdown_owner;
