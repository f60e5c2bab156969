import { spawn, type ChildProcess } from 'node:child_process';
import { createServer } from 'node:net';
import path from 'node:path';
import { createTestDatabase, seedDemo, type TestDatabase } from '@bellgap/database';

/** Enough for a machine that does much else. */
const START_WITHIN_MS = 60_000;
const ROOT = path.join(__dirname, '../../..');

export interface ProductOptions {
  /** Without demonstration there are the reference rows only. */
  demo?: boolean;
  env?: NodeJS.ProcessEnv;
}

/** The product as it is shipped, from its build, in a process of its own over a database of its own. */
export interface ProductProcess {
  url: string;
  database: TestDatabase;
  /** Ends the process at once, as a power cut would. */
  kill(): Promise<void>;
  /** Asks it to end, as whoever runs it would. */
  end(): Promise<void>;
  /** Starts it again over the same database. */
  start(): Promise<void>;
  stop(): Promise<void>;
}

/** Asks the system for a port that is free now. */
export async function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });
}

function run(script: string, env: NodeJS.ProcessEnv): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [path.join(ROOT, script)], { env, stdio: ['ignore', 'pipe', 'pipe'] });
    const said: string[] = [];
    child.stdout.on('data', (chunk: Buffer) => said.push(chunk.toString()));
    child.stderr.on('data', (chunk: Buffer) => said.push(chunk.toString()));
    child.once('exit', (code) =>
      code === 0 ? resolve() : reject(new Error(`${script} ended with ${code}:\n${said.join('')}`)),
    );
  });
}

async function untilHealthy(url: string, child: ChildProcess, said: string[]): Promise<void> {
  const last = Date.now() + START_WITHIN_MS;
  while (Date.now() < last) {
    if (child.exitCode !== null) break;
    const answer = await fetch(`${url}/api/health`).catch(() => null);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  child.kill('SIGKILL');
  throw new Error(`The product did not answer at ${url}:\n${said.join('')}`);
}

async function launch(url: string, env: NodeJS.ProcessEnv): Promise<ChildProcess> {
  const child = spawn(process.execPath, [path.join(ROOT, 'backend/dist/main.js')], {
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const said: string[] = [];
  for (const stream of [child.stdout, child.stderr]) stream?.on('data', (chunk: Buffer) => said.push(chunk.toString()));
  await untilHealthy(url, child, said);
  return child;
}

async function end(child: ChildProcess, signal: 'SIGTERM' | 'SIGKILL'): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const ended = new Promise((resolve) => child.once('exit', resolve));
  child.kill(signal);
  await ended;
}

/** Needs the builds of backend and frontend, and the test cluster that the global set-up of jest starts. */
export async function startProduct({ demo = true, env: more = {} }: ProductOptions = {}): Promise<ProductProcess> {
  const database = await createTestDatabase();
  if (demo) await seedDemo(database.owner);
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const env: NodeJS.ProcessEnv = {
    ...process.env,
    NODE_ENV: 'development',
    HOST: '127.0.0.1',
    PORT: String(port),
    DATABASE_URL: database.url,
    SESSION_SECRET: 'a secret of this test run only, long enough to pass',
    PUBLIC_URL: url,
    ...more,
  };
  if (demo) await run('backend/dist/demo/main.js', env);
  let child = await launch(url, env);
  return {
    url,
    database,
    kill: () => end(child, 'SIGKILL'),
    end: () => end(child, 'SIGTERM'),
    start: async () => {
      child = await launch(url, env);
    },
    stop: async () => {
      await end(child, 'SIGTERM');
      await database.close();
    },
  };
}
