#!/usr/bin/env bash
# Runs the built product with a database of its own: product.sh start | stop | dev
set -euo pipefail

root=$(cd "$(dirname "${BASH_SOURCE[0]}")/../.." && pwd)
cd "$root"
program=$root/backend/dist/main.js
run=$root/.run
data=$root/.data
log=$run/product.log
mailbox=$root/backend/dist/mailbox/main.js
mailbox_log=$run/mailbox.log
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

# process_of FILE PROGRAM: the number in the file, where that process runs the program.
process_of() {
  local pid
  pid=$(cat "$1" 2>/dev/null) || return 1
  [ -n "$pid" ] && tr '\0' ' ' <"/proc/$pid/cmdline" 2>/dev/null | grep -qF -- "$2" && printf '%s' "$pid"
}

stop_process() {
  local pid
  pid=$(process_of "$1" "$2") || { rm -f "$1"; return 0; }
  kill "$pid" 2>/dev/null || fail "Process $pid was started by $(stat -c %U "/proc/$pid"); stop it as that user."
  for _ in $(seq 100); do [ -d "/proc/$pid" ] || break; sleep 0.1; done
  [ ! -d "/proc/$pid" ] || kill -9 "$pid"
  rm -f "$1"
}

running_pid() { process_of "$run/pid" "$program"; }
stop_product() { stop_process "$run/pid" "$program"; }
stop_mailbox() { stop_process "$run/mailbox-pid" "$mailbox"; }

# What is built and how it is set: a running product of anything else is restarted.
build_mark() {
  {
    find common/dist database/dist backend/dist -name '*.js' -not -name '*.spec.js' -print0 | sort -z | xargs -0 sha256sum
    sha256sum frontend/dist/index.html package-lock.json
    env | grep -E '^(HOST|PUBLIC_URL|DEMO_ACCOUNTS|TRUST_PROXY|DATABASE_POOL_MAX|PASSWORD_COST|REQUEST_LOG|ROLE|SESSION_SECRET|SMTP_URL|MAIL_FROM)=' | sort
  } | sha256sum | cut -c1-16
}

# free_port FIRST LAST [HOST]: the first port in the range that can be listened on; nothing where there is none.
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
    attempt(first);' "${3:-$HOST}" "$1" "$2"
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

# kept_port FILE FIRST LAST: the port of the last time where it is free, else the first of the range.
kept_port() {
  local port
  port=$(cat "$1" 2>/dev/null) && port=$(free_port "$port" "$port" 127.0.0.1 2>/dev/null) && [ -n "$port" ] ||
    port=$(free_port "$2" "$3" 127.0.0.1) || fail "No port from $2 to $3 is free on 127.0.0.1."
  printf '%s\n' "$port" >"$1"
}

# Where no mail server is given and nobody else can reach the product, letters go to a post box on this computer.
start_mailbox() {
  local pid mark
  if [ -n "${SMTP_URL:-}" ] || ! loopback; then stop_mailbox; return; fi
  mark=$(cat backend/dist/mailbox/*.js | sha256sum)
  if pid=$(process_of "$run/mailbox-pid" "$mailbox") && [ "$mark" != "$(cat "$run/mailbox-mark" 2>/dev/null)" ]; then
    stop_mailbox
    pid=
  fi
  if [ -z "$pid" ]; then
    kept_port "$run/mailbox-smtp-port" 2525 2599
    kept_port "$run/mailbox-port" 8025 8099
    mkdir -p "$data/mail"
    setsid node "$mailbox" --folder "$data/mail" --smtp-port "$(cat "$run/mailbox-smtp-port")" --port "$(cat "$run/mailbox-port")" \
      </dev/null >"$mailbox_log" 2>&1 9>&- &
    printf '%s\n' $! >"$run/mailbox-pid"
    printf '%s\n' "$mark" >"$run/mailbox-mark"
  fi
  export SMTP_URL=smtp://127.0.0.1:$(cat "$run/mailbox-smtp-port")
}

mailbox_address() {
  process_of "$run/mailbox-pid" "$mailbox" >/dev/null && printf 'http://127.0.0.1:%s' "$(cat "$run/mailbox-port")"
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
  if mailbox_address >/dev/null; then say "Letters:  $(mailbox_address)"; fi
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
  [ "${ROLE:-both}" != worker ] || fail 'ROLE=worker serves no pages: make start needs ROLE=both or ROLE=web.'
  [ -d "$data" ] || mkdir -p "$data"
  start_mailbox
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
  stop_mailbox
  "$cluster" down "$data" 9>&-
  say 'Stopped.'
}

dev() {
  read_settings
  export HOST=127.0.0.1 NODE_ENV=development
  prepare_database
  start_mailbox
  local port
  port=$(free_port 3100 3999)
  trap 'kill $(jobs -p) 2>/dev/null || true; stop_mailbox' EXIT
  node_modules/.bin/tsc -b backend --watch --preserveWatchOutput 9>&- &
  PORT=$port node --watch-path=backend/dist --watch-path=common/dist --watch-path=database/dist "$program" 9>&- &
  flock -u 9
  say "The pages come from the address below, the API behind them from port $port. Accounts: password and names as after make start."
  if mailbox_address >/dev/null; then say "Letters are read at $(mailbox_address)"; fi
  (cd frontend && BACKEND_URL=http://127.0.0.1:$port exec ../node_modules/.bin/vite) 9>&-
}

case "${1:-}" in
  start | stop | dev) "$1" ;;
  *) fail 'product.sh: start, stop or dev' ;;
esac
