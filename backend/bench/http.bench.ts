import { fork } from 'node:child_process';
import path from 'node:path';
import { API_PREFIX, PASSIVE_HEADER } from '@bellgap/common/api';
import { DEMO_PASSWORD } from '@bellgap/database';
import { PERSON_OF } from '../../frontend/e2e/support/routes';
import { freePort } from '../test/support/product-process';
import type { Figure } from './harness';
import { overHttp, requestBytes } from './load';
import { product } from './product';
import { sideBySide } from './rates';
import { sampleInput } from './sample';

const CONNECTIONS = 10;
const ROUTE = `${API_PREFIX}/evaluations`;

async function signIn(url: string): Promise<string> {
  const answer = await fetch(`${url}${API_PREFIX}/sessions`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: PERSON_OF.engineer, password: DEMO_PASSWORD }),
  });
  const cookie = answer.headers.getSetCookie()[0]?.split(';')[0];
  if (!answer.ok || !cookie) throw new Error(`Nobody could be signed in: ${answer.status}`);
  return cookie;
}

async function startBareExpress(answer: string): Promise<{ port: number; stop: () => void }> {
  const port = await freePort();
  const child = fork(path.join(__dirname, 'bare-express.cjs'), {
    env: { ...process.env, NODE_ENV: 'production', PORT: String(port), ANSWER: answer },
    execArgv: [],
  });
  await new Promise((resolve, reject) => {
    child.once('message', resolve);
    child.once('exit', (code) => reject(new Error(`bare-express.cjs ended with ${code}`)));
  });
  return { port, stop: () => child.kill('SIGKILL') };
}

/** Evaluations through HTTP, session read and validation included; every request differs from the one before. */
export const httpFigures: readonly Figure[] = [
  {
    name: 'evaluations-over-http',
    unit: '/s',
    aim: { ratioAtLeast: 1 / 3 },
    measure: async () => {
      const { url } = await product();
      const headers = { 'content-type': 'application/json', [PASSIVE_HEADER]: '1', cookie: await signIn(url) };
      const bodies = Array.from({ length: 400 }, (_, i) => JSON.stringify({ input: sampleInput(7 * i), trace: false }));
      const requests = bodies.map((body) => requestBytes('POST', ROUTE, headers, body));
      const sample = await fetch(url + ROUTE, { method: 'POST', headers, body: bodies[0] ?? '' });
      if (!sample.ok) throw new Error(`The evaluation was refused: ${await sample.text()}`);
      const bare = await startBareExpress(await sample.text());
      try {
        return await sideBySide(
          overHttp(Number(new URL(url).port), requests, CONNECTIONS),
          overHttp(bare.port, requests, CONNECTIONS),
          { warmUpRuns: 10_000 },
        );
      } finally {
        bare.stop();
      }
    },
  },
];
