import { execFileSync } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { TEMPLATE } from './test-database';

const ROOT = path.join(__dirname, '../../..');
const CLUSTER_SCRIPT = path.join(ROOT, 'database/scripts/cluster.sh');
const PREFIX = 'bellgap-test-';

/** A cluster of this run's own in a temporary folder, so that runs beside each other do not meet. */
export default function startTestCluster(): void {
  removeLeftovers();
  execFileSync(
    process.execPath,
    [path.join(ROOT, 'node_modules/typescript/bin/tsc'), '-b', path.join(ROOT, 'database')],
    {
      stdio: ['ignore', 'inherit', 'inherit'],
    },
  );
  const folder = mkdtempSync(path.join(tmpdir(), PREFIX));
  writeFileSync(path.join(folder, 'pid'), String(process.pid));
  process.env.TEST_CLUSTER_FOLDER = folder;
  process.on('exit', () => removeCluster(folder));
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.once(signal, () => process.exit(1));

  execFileSync('bash', [CLUSTER_SCRIPT, 'up', folder, '--fast'], { stdio: ['ignore', 'inherit', 'inherit'] });
  for (const line of readFileSync(path.join(folder, 'env'), 'utf8').split('\n')) {
    const [name, value] = line.split(/=(.*)/s);
    if (name && value) process.env[`TEST_${name}`] = value;
  }
  makeTemplate();
}

function makeTemplate(): void {
  const superuser = process.env.TEST_SUPERUSER_DATABASE_URL as string;
  const url = new URL(process.env.TEST_MIGRATION_DATABASE_URL as string);
  url.pathname = `/${TEMPLATE}`;
  execFileSync('psql', ['-X', '-q', superuser, '-c', `create database ${TEMPLATE} owner bellgap_owner`]);
  execFileSync(process.execPath, [path.join(ROOT, 'database/dist/src/cli.js'), 'migrate', 'seed-reference'], {
    env: { ...process.env, MIGRATION_DATABASE_URL: url.href },
    stdio: ['ignore', 'ignore', 'inherit'],
  });
}

export function removeCluster(folder: string): void {
  if (existsSync(folder)) execFileSync('bash', [CLUSTER_SCRIPT, 'remove', folder], { stdio: 'ignore' });
}

/** Clusters of runs that were killed. */
function removeLeftovers(): void {
  for (const name of readdirSync(tmpdir())) {
    if (!name.startsWith(PREFIX)) continue;
    const folder = path.join(tmpdir(), name);
    try {
      process.kill(Number(readFileSync(path.join(folder, 'pid'), 'utf8')), 0);
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code === 'ESRCH') removeCluster(folder);
    }
  }
}
