#!/usr/bin/env bash
# Installs the Debian packages named, where their programs are missing: debian.sh postgresql chromium poppler-utils
set -euo pipefail

present() {
  case "$1" in
    postgresql) compgen -G '/usr/lib/postgresql/*/bin/initdb' >/dev/null || command -v initdb >/dev/null ;;
    chromium) command -v chromium >/dev/null || command -v chromium-browser >/dev/null ;;
    poppler-utils) command -v pdftotext >/dev/null ;;
    *) dpkg-query -W -f '${Status}' "$1" 2>/dev/null | grep -q 'install ok installed' ;;
  esac
}

missing=()
for package in "$@"; do present "$package" || missing+=("$package"); done
[ ${#missing[@]} -gt 0 ] || exit 0

# Debian's package would make and start a cluster of its own, which nobody asked for.
setting=/etc/postgresql-common/createcluster.d/bellgap.conf
install="export DEBIAN_FRONTEND=noninteractive; apt-get update -q"
install+=" && apt-get install -q -y --no-install-recommends -o DPkg::Lock::Timeout=300 ${missing[*]}"
if [[ " ${missing[*]} " == *' postgresql '* ]]; then
  install="mkdir -p $(dirname $setting) && echo create_main_cluster = false >$setting; $install; status=\$?; rm -f $setting; exit \$status"
fi

if [ "$(id -u)" = 0 ]; then as_root=(sh -c)
elif command -v sudo >/dev/null && sudo -n true 2>/dev/null; then as_root=(sudo -n sh -c)
else
  by=su; quoted="su -c '$install'"
  command -v sudo >/dev/null && by=sudo && quoted="sudo sh -c '$install'"
  printf 'Missing from Debian: %s. Run this once (%s asks for a password), then try again:\n\n  %s\n\n' "${missing[*]}" "$by" "$quoted" >&2
  exit 1
fi

echo "Installing from Debian: ${missing[*]}"
log=$(mktemp)
"${as_root[@]}" "$install" </dev/null >"$log" 2>&1 || { tail -n 30 "$log" >&2; rm -f "$log"; exit 1; }
rm -f "$log"
