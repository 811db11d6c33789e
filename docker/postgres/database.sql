-- Prepares the database it is run against, as the cluster's superuser; running it again changes nothing but the passwords.
-- Used by the local cluster (scripts/postgres) and by the postgres image in compose.yaml.
-- Passwords come from the environment, so that no process list shows them.
\set ON_ERROR_STOP on
\getenv owner_password OWNER_PASSWORD
\getenv app_password APP_PASSWORD
\getenv jobs_password JOBS_PASSWORD

-- Three roles: the owner migrates; the app gets table by table what a migration grants; the job queue keeps to its own schema.
select format('create role %I login', name)
from (values ('lydite_owner'), ('lydite_app'), ('lydite_jobs')) as role (name)
where not exists (select from pg_roles where rolname = name) \gexec
alter role lydite_owner password :'owner_password';
alter role lydite_app password :'app_password';
alter role lydite_jobs password :'jobs_password';

select format('alter database %I owner to lydite_owner', current_database()) \gexec
select format('revoke all on database %I from public', current_database()) \gexec
select format('grant connect on database %I to lydite_app, lydite_jobs', current_database()) \gexec
-- The job queue runs "create schema if not exists" at each start, which PostgreSQL refuses without this right.
select format('grant create on database %I to lydite_jobs', current_database()) \gexec

alter schema public owner to lydite_owner;
revoke all on schema public from public;
grant usage on schema public to lydite_app;

create schema if not exists pgboss authorization lydite_jobs;
-- A business transaction may put a job into the queue, so that both commit or neither does; operators read and retry jobs.
grant usage on schema pgboss to lydite_app, lydite_owner;
alter default privileges for role lydite_jobs in schema pgboss grant select, insert, update on tables to lydite_app;
alter default privileges for role lydite_jobs in schema pgboss grant select on tables to lydite_owner;
