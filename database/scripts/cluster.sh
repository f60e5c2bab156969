#!/usr/bin/env bash
# One PostgreSQL cluster on loopback, of the project's own.
#
#   cluster.sh up FOLDER [--fast]   make it where missing, start it where down, write FOLDER/env
#   cluster.sh down FOLDER          stop it
#   cluster.sh remove FOLDER        stop it and delete its data
#
# FOLDER holds port, passwords and env, readable only by whoever runs this. The data stand in FOLDER/cluster, or, where
# the server's user cannot enter FOLDER (root's home, say), in a folder outside that is named on the screen.
# --fast gives up durability for speed: for tests only. As root the server runs as postgres, else as oneself.
set -euo pipefail

here=$(cd "$(dirname "${BASH_SOURCE[0]}")" && pwd)
action=${1:?up, down or remove}
folder=${2:?folder}
fast=${3:-}

say() { printf '%s\n' "$*" >&2; }
fail() { say "$*"; exit 1; }
random_hex() { od -An -N"$1" -tx1 /dev/urandom | tr -d ' \n'; }
free_port() { node -e 'const s=require("node:net").createServer();s.listen(0,"127.0.0.1",()=>{console.log(s.address().port);s.close()})'; }

umask 077
[ "$action" = up ] && [ ! -d "$folder" ] && mkdir -p "$folder"
[ -d "$folder" ] || exit 0
folder=$(cd "$folder" && pwd)

data=$folder/cluster
[ -f "$folder/location" ] && data=$(cat "$folder/location")

server_user=$(id -un)
if [ -d "$data" ]; then server_user=$(stat -c %U "$data"); elif [ "$(id -u)" = 0 ]; then server_user=postgres; fi
if [ "$(id -u)" != 0 ] && [ "$server_user" != "$(id -un)" ]; then
  fail "The database in $data belongs to $server_user. Run this as that user or as root, or work in a clone of your own."
fi

as_server() {
  if [ "$(id -un)" = "$server_user" ]; then env -C / LC_ALL=C.UTF-8 "$@"
  else setpriv --reuid="$server_user" --regid="$(id -gn "$server_user")" --init-groups env -C / HOME=/tmp LC_ALL=C.UTF-8 "$@"; fi
}

programs() {
  local version=
  [ -f "$data/PG_VERSION" ] && version=$(cat "$data/PG_VERSION")
  bin=$(printf '%s\n' /usr/lib/postgresql/${version:-*}/bin | sort -V | tail -n 1)
  if [ ! -x "$bin/initdb" ]; then
    command -v initdb >/dev/null || fail "PostgreSQL ${version:-} is not installed."
    bin=$(dirname "$(command -v initdb)")
  fi
}

running() { as_server "$bin/pg_ctl" -D "$data" status >/dev/null 2>&1 && "$bin/pg_isready" -q -h 127.0.0.1 -p "$(cat "$folder/port")"; }

make_cluster() {
  if [ "$server_user" != "$(id -un)" ]; then
    chmod 711 "$folder"
    if ! as_server test -x "$folder"; then
      mkdir -p -m 755 /var/lib/bellgap
      data=$(mktemp -d "/var/lib/bellgap/$(basename "$(dirname "$folder")")-XXXXXX")
      printf '%s\n' "$data" >"$folder/location"
      say "The user $server_user cannot enter $folder, so the data of the database stand in $data"
    fi
  fi
  mkdir -p "$data"
  random_hex 16 >"$folder/superuser-password"
  random_hex 16 >"$folder/owner-password"
  random_hex 16 >"$folder/app-password"
  local password_file
  password_file=$(mktemp)
  cat "$folder/superuser-password" >"$password_file"
  [ "$(id -u)" = 0 ] && chown "$server_user" "$data" "$password_file"
  as_server "$bin/initdb" -D "$data" -U postgres --auth=scram-sha-256 --pwfile="$password_file" -E UTF8 --locale=C.UTF-8 \
    ${fast:+--no-sync} >"$folder/initdb.log" 2>&1 || { cat "$folder/initdb.log" >&2; rm -rf "$password_file" "$data"; exit 1; }
  rm -f "$password_file" "$folder/initdb.log"
  {
    printf '%s\n' "listen_addresses = '127.0.0.1'" "unix_socket_directories = ''" "timezone = 'UTC'" "log_timezone = 'UTC'"
    [ -z "$fast" ] || printf '%s\n' 'fsync = off' 'synchronous_commit = off' 'full_page_writes = off' 'wal_level = minimal' \
      'max_wal_senders = 0' 'autovacuum = off' 'max_connections = 200'
  } | as_server tee -a "$data/postgresql.conf" >/dev/null
}

# The port is picked once and kept; another is taken only where somebody else has it by now.
start_server() {
  local try
  [ -f "$folder/port" ] || free_port >"$folder/port"
  for try in 1 2 3; do
    as_server "$bin/pg_ctl" -D "$data" -l "$data/server.log" -w -t 60 -o "-p $(cat "$folder/port")" start >/dev/null 2>&1 && return 0
    as_server tail -n 20 "$data/server.log" | grep -q 'could not bind' || break
    free_port >"$folder/port"
  done
  as_server tail -n 20 "$data/server.log" >&2
  fail "PostgreSQL did not start; its log is $data/server.log"
}

prepare_roles() {
  { printf "\\set owner_password '%s'\n\\set app_password '%s'\n" "$(cat "$folder/owner-password")" "$(cat "$folder/app-password")"
    cat "$here/roles.sql"; } |
    PGPASSWORD=$(cat "$folder/superuser-password") PGOPTIONS='-c client_min_messages=warning' \
      "$bin/psql" -X -q -h 127.0.0.1 -p "$(cat "$folder/port")" -U postgres -d postgres >/dev/null
}

write_env() {
  local at
  at=127.0.0.1:$(cat "$folder/port")
  {
    printf 'DATABASE_URL=postgres://bellgap_app:%s@%s/bellgap\n' "$(cat "$folder/app-password")" "$at"
    printf 'MIGRATION_DATABASE_URL=postgres://bellgap_owner:%s@%s/bellgap\n' "$(cat "$folder/owner-password")" "$at"
    [ -z "$fast" ] || printf 'SUPERUSER_DATABASE_URL=postgres://postgres:%s@%s/postgres\n' "$(cat "$folder/superuser-password")" "$at"
  } >"$folder/env"
}

stop_server() {
  [ -f "$data/PG_VERSION" ] || return 0
  programs
  as_server "$bin/pg_ctl" -D "$data" status >/dev/null 2>&1 || return 0
  as_server "$bin/pg_ctl" -D "$data" -m fast -w stop >/dev/null 2>&1 ||
    as_server "$bin/pg_ctl" -D "$data" -m immediate -w stop >/dev/null
}

case "$action" in
  up)
    programs
    [ -f "$data/PG_VERSION" ] || make_cluster
    running || start_server
    prepare_roles
    write_env
    ;;
  down) stop_server ;;
  remove)
    stop_server
    rm -rf "$data" "$folder"
    ;;
  *) fail "cluster.sh: up, down or remove" ;;
esac
