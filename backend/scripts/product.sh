#!/usr/bin/env bash
# Runs the built product with a database of its own: product.sh start | stop | dev
set -euo pipefail

root=$(cd "$(dirname "${BASH_SOURCE[0]}")/../.." && pwd)
cd "$root"
program=$root/backend/dist/main.js
run=$root/.run
data=$root/.data
log=$run/product.log
cluster=$root/database/scripts/cluster.sh

say() { printf '%s\n' "$*"; }
fail() { printf '%s\n' "$*" >&2; exit 1; }

for folder in "$run" "$data"; do
  [ -e "$folder" ] && [ ! -w "$folder" ] &&
    fail "$folder belongs to $(stat -c %U "$folder"). Run this as that user or as root, or work in a clone of your own."
done
umask 077
mkdir -p "$run"
exec 9>"$run/lock"
flock 9

# Settings of the folder's .env; what stands in the environment already goes before.
read_settings() {
  local name value
  [ -f .env ] || return 0
  while IFS='=' read -r name value; do
    [[ $name =~ ^[A-Z][A-Z0-9_]*$ ]] || continue
    [ -n "${!name+set}" ] || export "$name=$value"
  done <.env
}

read_database() {
  set -a
  . "$data/env"
  [ -f "$data/session-secret" ] || od -An -N32 -tx1 /dev/urandom | tr -d ' \n' >"$data/session-secret"
  SESSION_SECRET=${SESSION_SECRET:-$(cat "$data/session-secret")}
  set +a
}

running_pid() {
  local pid
  pid=$(cat "$run/pid" 2>/dev/null) || return 1
  [ -n "$pid" ] && tr '\0' ' ' <"/proc/$pid/cmdline" 2>/dev/null | grep -qF -- "$program" && printf '%s' "$pid"
}

stop_product() {
  local pid
  pid=$(running_pid) || { rm -f "$run/pid"; return 0; }
  kill "$pid" 2>/dev/null || fail "The product (process $pid) was started by $(stat -c %U "/proc/$pid"); stop it as that user."
  for _ in $(seq 100); do [ -d "/proc/$pid" ] || break; sleep 0.1; done
  [ ! -d "/proc/$pid" ] || kill -9 "$pid"
  rm -f "$run/pid"
}

# What is built and how it is set: a running product of anything else is restarted.
build_mark() {
  {
    find common/dist database/dist backend/dist -name '*.js' -not -name '*.spec.js' -print0 | sort -z | xargs -0 sha256sum
    sha256sum frontend/dist/index.html package-lock.json
    env | grep -E '^(HOST|PUBLIC_URL|DEMO_ACCOUNTS|TRUST_PROXY|DATABASE_POOL_MAX|PASSWORD_COST|REQUEST_LOG|ROLE|SESSION_SECRET)=' | sort
  } | sha256sum | cut -c1-16
}

# free_port FIRST LAST: the first port in the range on which HOST can be listened to; nothing where there is none.
free_port() {
  node -e '
    const [host, first, last] = [process.argv[1], Number(process.argv[2]), Number(process.argv[3])];
    const attempt = (port) => {
      if (port > last) process.exit(1);
      const server = require("node:net").createServer();
      server.once("error", ({ code }) => {
        if (code === "EADDRINUSE" || code === "EACCES") return attempt(port + 1);
        console.error(`HOST ${host} cannot be listened on: ${code}`);
        process.exit(1);
      });
      server.listen(port, host, () => { console.log(port); server.close(); });
    };
    attempt(first);' "$HOST" "$1" "$2"
}

healthy() {
  node -e '
    fetch(process.argv[1] + "/api/health", { signal: AbortSignal.timeout(2000) })
      .then(({ ok }) => process.exit(ok ? 0 : 1), () => process.exit(1));' "$1"
}

loopback() { [[ $HOST == localhost || $HOST == 127.* || $HOST == ::1 ]]; }

address_of() {
  local host=$HOST
  case "$host" in 0.0.0.0 | ::) host=127.0.0.1 ;; *:*) host="[$host]" ;; esac
  printf 'http://%s:%s' "$host" "$1"
}

prepare_database() {
  "$cluster" up "$data" 9>&-
  read_database
  node database/dist/src/cli.js migrate seed-reference
  if [ -f backend/dist/reference/main.js ]; then node backend/dist/reference/main.js; fi
  if loopback; then
    node database/dist/src/cli.js seed-demo
    if [ -f backend/dist/demo/main.js ]; then node backend/dist/demo/main.js; fi
  fi
}

launch() {
  local pid
  [ ! -f "$log" ] || mv "$log" "$log.1"
  env -u MIGRATION_DATABASE_URL PORT="$1" setsid node "$program" </dev/null >"$log" 2>&1 9>&- &
  pid=$!
  printf '%s\n' "$pid" >"$run/pid"
  printf '%s\n' "$1" >"$run/port"
  for _ in $(seq 300); do
    if [ ! -d "/proc/$pid" ]; then
      rm -f "$run/pid"
      tail -n 30 "$log" >&2
      fail "The product ended while starting; its log is $log"
    fi
    if healthy "$(address_of "$1")"; then return 0; fi
    sleep 0.1
  done
  tail -n 30 "$log" >&2
  fail "The product does not answer at $(address_of "$1")/api/health; its log is $log"
}

report() {
  say ''
  say "Bellgap $1 at ${PUBLIC_URL:-$(address_of "$2")}"
  if loopback; then
    say ''
    say 'Accounts of the demonstration:'
    node database/dist/src/cli.js demo-accounts
  else
    say 'It listens beyond loopback, so the accounts of the demonstration are closed.'
  fi
  say ''
  say "Log:      $log"
  say "Database: $(cat "$data/location" 2>/dev/null || printf '%s' "$data/cluster"), port $(cat "$data/port")"
  say 'Stop:     make stop'
}

start() {
  local given=${PORT:-} pid='' mark old=''
  read_settings
  export HOST=${HOST:-127.0.0.1} NODE_ENV=development
  given=${given:-${PORT:-}}
  if [ -n "$given" ] && ! { [[ $given =~ ^[0-9]{1,5}$ ]] && [ "$given" -ge 1 ] && [ "$given" -le 65535 ]; }; then
    fail "PORT=$given is no port: give a whole number from 1 to 65535."
  fi
  mark=$(build_mark)
  if pid=$(running_pid); then old=$(cat "$run/port"); fi
  if [ -n "$given" ] && [ "$given" != "$old" ] && [ -z "$(free_port "$given" "$given")" ]; then
    fail "Port $given on $HOST is taken or not allowed. Give another PORT, or none to have a free one picked."
  fi
  if [ -n "$pid" ]; then
    if [ "$mark" = "$(cat "$run/mark" 2>/dev/null)" ] && [ "${given:-$old}" = "$old" ] && healthy "$(address_of "$old")"; then
      report 'is running' "$old"
      return
    fi
    say 'Restarting: the build or the settings have changed.'
    stop_product
  fi
  prepare_database
  local port
  port=${given:-$([ -n "$old" ] && free_port "$old" "$old" || free_port 3000 3999)} || fail "No port from 3000 to 3999 is free on $HOST."
  launch "$port"
  printf '%s\n' "$mark" >"$run/mark"
  report 'is running' "$port"
}

stop() {
  stop_product
  "$cluster" down "$data" 9>&-
  say 'Stopped.'
}

dev() {
  read_settings
  export HOST=127.0.0.1 NODE_ENV=development
  prepare_database
  local port
  port=$(free_port 3100 3999)
  trap 'kill $(jobs -p) 2>/dev/null || true' EXIT
  node_modules/.bin/tsc -b backend --watch --preserveWatchOutput 9>&- &
  PORT=$port node --watch-path=backend/dist --watch-path=common/dist --watch-path=database/dist "$program" 9>&- &
  flock -u 9
  say "The pages come from the address below, the API behind them from port $port. Accounts: password and names as after make start."
  (cd frontend && BACKEND_URL=http://127.0.0.1:$port exec ../node_modules/.bin/vite) 9>&-
}

case "${1:-}" in
  start | stop | dev) "$1" ;;
  *) fail 'product.sh: start, stop or dev' ;;
esac
