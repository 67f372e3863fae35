#!/usr/bin/env bash
# Writes the whole database to standard output, in pg_restore's own format:
#   docker compose -f docker/compose.yaml exec -T postgres /coastdown/backup.sh > coastdown.dump
# Elsewhere say where the database is with PGHOST, PGUSER, PGPASSWORD and the like. The user must be a superuser or
# one with BYPASSRLS that may read every table: anyone else is refused, since row-level security would hide rows.
set -euo pipefail
export PGUSER="${PGUSER:-postgres}" PGDATABASE="${PGDATABASE:-coastdown}"
exec pg_dump --format=custom --lock-wait-timeout=60s
