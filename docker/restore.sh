#!/usr/bin/env bash
# Reads a backup from standard input into a database that is missing or empty, whole or not at all:
#   docker compose -f docker/compose.yaml exec -T postgres /coastdown/restore.sh < coastdown.dump
# Elsewhere say where with PGHOST, PGUSER (a superuser), PGPASSWORD and the like, and give the roles' passwords in
# COASTDOWN_OWNER_PASSWORD and COASTDOWN_APP_PASSWORD.
set -euo pipefail
export PGUSER="${PGUSER:-postgres}" PGDATABASE="${PGDATABASE:-coastdown}"
here="$(dirname "${BASH_SOURCE[0]}")"
ask() { psql -XAtq -v ON_ERROR_STOP=1 "$@"; }

ask -d postgres -f "$here/roles.sql"
if [ -z "$(ask -d postgres -v name="$PGDATABASE" <<< "select 1 from pg_database where datname = :'name'")" ]; then
  createdb --maintenance-db=postgres --owner=coastdown_owner "$PGDATABASE"
fi
if [ "$(ask -c "select count(*) from pg_tables where schemaname not in ('pg_catalog', 'information_schema')")" != 0 ]; then
  echo "The database $PGDATABASE is not empty. Restore into a new one: PGDATABASE=name" >&2
  exit 1
fi
pg_restore --exit-on-error --single-transaction --dbname="$PGDATABASE"
# The planner needs statistics, which a backup does not carry.
vacuumdb --quiet --analyze-only "$PGDATABASE"
