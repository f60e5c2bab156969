// Installs the packages of the lock file, unless exactly those stand in node_modules already.
import { spawnSync } from 'node:child_process';
import { accessSync, constants, mkdirSync, readFileSync } from 'node:fs';
import { homedir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

const root = path.join(path.dirname(fileURLToPath(import.meta.url)), '..');

function packagesOf(file) {
  try {
    return JSON.parse(readFileSync(path.join(root, file), 'utf8')).packages;
  } catch {
    return null;
  }
}

/** npm leaves a list of what it installed; packages for other systems are optional and not in it. */
function installed() {
  const wanted = packagesOf('package-lock.json');
  const present = packagesOf('node_modules/.package-lock.json');
  if (!wanted || !present) return false;
  const sameTree = Object.entries(wanted).every(([place, { version, optional, link }]) => {
    if (!place.includes('node_modules/')) return true;
    const found = present[place];
    return found ? found.version === version || link : Boolean(optional);
  });
  return sameTree && manifestsAgree(wanted);
}

/** A dependency written into a package.json but not into the lock file must reach npm, which says so. */
function manifestsAgree(wanted) {
  return Object.entries(wanted)
    .filter(([place]) => !place.includes('node_modules/'))
    .every(([place, locked]) => {
      const manifest = JSON.parse(readFileSync(path.join(root, place, 'package.json'), 'utf8'));
      return ['dependencies', 'devDependencies'].every(
        (kind) => JSON.stringify(sorted(manifest[kind])) === JSON.stringify(sorted(locked[kind])),
      );
    });
}

function sorted(dependencies = {}) {
  return Object.entries(dependencies).sort(([a], [b]) => (a < b ? -1 : 1));
}

/** An account without a home of its own keeps npm's cache here. */
function cacheSetting() {
  try {
    accessSync(homedir(), constants.W_OK);
    return [];
  } catch {
    mkdirSync(path.join(root, '.run'), { recursive: true });
    return ['--cache', path.join(root, '.run/npm-cache')];
  }
}

if (!installed()) {
  console.log('Installing packages');
  const { status } = spawnSync(
    'npm',
    ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error', '--no-update-notifier', ...cacheSetting()],
    {
      cwd: root,
      stdio: ['ignore', 'inherit', 'inherit'],
    },
  );
  process.exit(status ?? 1);
}
