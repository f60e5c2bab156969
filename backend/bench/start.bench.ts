import { execFileSync } from 'node:child_process';
import { chmodSync, existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Figure } from './harness';

const ROOT = path.join(__dirname, '../..');
/** What a checkout makes for itself while it runs; the copy makes its own. */
const LEFT_OUT = new Set(['.git', '.data', '.run', '.env', 'shots', 'coverage']);

/** A copy of this checkout as it is installed and built, so that a product running here is left alone. */
function copyTo(folder: string): void {
  for (const name of readdirSync(ROOT)) {
    if (LEFT_OUT.has(name)) continue;
    if (name === 'node_modules') linkPackages(ROOT, folder);
    else execFileSync('cp', ['-a', path.join(ROOT, name), folder]);
  }
}

/** Packages are many and nobody writes into them: links are enough where the file system allows them. */
function linkPackages(from: string, to: string): void {
  mkdirSync(to, { recursive: true });
  const packages = path.join(from, 'node_modules');
  if (!existsSync(packages)) return;
  try {
    execFileSync('cp', ['-al', packages, to], { stdio: 'ignore' });
  } catch {
    execFileSync('cp', ['-a', packages, to]);
  }
}

function make(folder: string, target: string): number {
  const env: NodeJS.ProcessEnv = { ...process.env, MAKEFLAGS: '', MAKELEVEL: '' };
  for (const name of ['HOST', 'PORT', 'PUBLIC_URL', 'NODE_ENV', 'DATABASE_URL', 'MIGRATION_DATABASE_URL', 'ONLY'])
    delete env[name];
  const start = performance.now();
  execFileSync('make', ['-C', folder, target], { env, stdio: ['ignore', 'ignore', 'inherit'] });
  return (performance.now() - start) / 1000;
}

/**
 * A second `make start`, of a checkout that was started and stopped before: nothing is left to install or to build, but
 * the database and the product come up anew. Where they are running already it has even less to do.
 */
export const startFigures: readonly Figure[] = [
  {
    name: 'second-start',
    unit: 's',
    aim: { valueAtMost: 10 },
    measure: () => {
      const folder = mkdtempSync(path.join(tmpdir(), 'bellgap-start-'));
      // The database's user must be able to pass through.
      chmodSync(folder, 0o755);
      try {
        copyTo(folder);
        make(folder, 'start');
        make(folder, 'stop');
        const value = make(folder, 'start');
        return Promise.resolve({ value, beside: null });
      } finally {
        if (existsSync(path.join(folder, 'Makefile'))) removeCopy(folder);
      }
    },
  },
];

function removeCopy(folder: string): void {
  execFileSync('make', ['-C', folder, 'stop'], { stdio: 'ignore' });
  execFileSync('bash', [path.join(folder, 'database/scripts/cluster.sh'), 'remove', path.join(folder, '.data')], {
    stdio: 'ignore',
  });
  rmSync(folder, { recursive: true, force: true });
}
