-- The two roles beside the superuser, and the product's database. Run by the superuser; may run again without harm.
-- psql variables: owner_password, app_password.
\set ON_ERROR_STOP on
\set QUIET on

select 'create role bellgap_owner' where not exists (select from pg_roles where rolname = 'bellgap_owner') \gexec
select 'create role bellgap_app' where not exists (select from pg_roles where rolname = 'bellgap_app') \gexec
alter role bellgap_owner login nosuperuser nocreatedb nocreaterole password :'owner_password';
alter role bellgap_app login nosuperuser nocreatedb nocreaterole password :'app_password';
alter role bellgap_app set idle_in_transaction_session_timeout = '60s';
alter role bellgap_app set statement_timeout = '60s';

select 'create database bellgap owner bellgap_owner' where not exists (select from pg_database where datname = 'bellgap') \gexec
revoke all on database bellgap, postgres, template1 from public;
grant connect on database bellgap to bellgap_app;
