import { fork } from 'node:child_process';
import path from 'node:path';
import autocannon from 'autocannon';
import { DEMO_PASSWORD } from '@bellgap/database';
import { freePort, startProduct } from '../test/support/product-process';
import type { Figure } from './harness';
import { sampleInput } from './sample';

const SECONDS = 6;
const CONNECTIONS = 10;
const ENGINEER = 't.orvelle@kigc.example';

async function cookieOf(url: string): Promise<string> {
  const answer = await fetch(`${url}/api/v1/sessions`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: ENGINEER, password: DEMO_PASSWORD }),
  });
  return (answer.headers.getSetCookie()[0] ?? '').split(';')[0] ?? '';
}

/** Answers per second of the evaluation route; every request differs from the one before. */
async function requestsPerSecond(url: string, cookie: string): Promise<number> {
  const requests = Array.from({ length: 400 }, (_, step) => ({
    method: 'POST' as const,
    path: '/api/v1/evaluations',
    headers: { 'content-type': 'application/json', 'x-bellgap-passive': '1', cookie },
    body: JSON.stringify({ input: sampleInput(step * 7), trace: false }),
  }));
  const cannon = (duration: number) => autocannon({ url, connections: CONNECTIONS, duration, requests });
  await cannon(2);
  const result = await cannon(SECONDS);
  if (result.non2xx > 0 || result.errors > 0) throw new Error(`${result.non2xx} answers were no success`);
  return result.requests.average;
}

async function besideExpress(answer: string): Promise<number> {
  const port = await freePort();
  const child = fork(path.join(__dirname, 'bare-express.cjs'), {
    env: { ...process.env, NODE_ENV: 'production', PORT: String(port), ANSWER: answer },
    execArgv: [],
  });
  await new Promise((resolve) => child.once('message', resolve));
  try {
    return await requestsPerSecond(`http://127.0.0.1:${port}`, '');
  } finally {
    child.kill('SIGTERM');
  }
}

/** Evaluations through HTTP, session read and validation included. */
export const httpFigures: Figure[] = [
  {
    name: 'evaluations-over-http',
    unit: '/s',
    aim: { ratioAtLeast: 1 / 3 },
    measure: async () => {
      const product = await startProduct();
      try {
        const cookie = await cookieOf(product.url);
        const sample = await fetch(`${product.url}/api/v1/evaluations`, {
          method: 'POST',
          headers: { 'content-type': 'application/json', cookie },
          body: JSON.stringify({ input: sampleInput(), trace: false }),
        });
        const answer = await sample.text();
        const value = await requestsPerSecond(product.url, cookie);
        return { value, beside: await besideExpress(answer) };
      } finally {
        await product.stop();
      }
    },
  },
];
