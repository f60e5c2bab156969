import { connect, type Socket } from 'node:net';
import type { Side, Stretch } from './rates';

/** A request as it goes over the wire, made before the clock runs. */
export function requestBytes(method: string, path: string, headers: Record<string, string>, body: string): Buffer {
  const lines = Object.entries({ host: '127.0.0.1', 'content-length': String(Buffer.byteLength(body)), ...headers });
  const head = [`${method} ${path} HTTP/1.1`, ...lines.map(([name, value]) => `${name}: ${value}`)].join('\r\n');
  return Buffer.from(`${head}\r\n\r\n${body}`);
}

const HEAD_END = '\r\n\r\n';

/** Length of the first answer in `bytes`, or null while it is not all there. */
function answerLength(bytes: Buffer): number | null {
  const headLength = bytes.indexOf(HEAD_END);
  if (headLength < 0) return null;
  const head = bytes.toString('latin1', 0, headLength);
  if (!head.startsWith('HTTP/1.1 2')) throw new Error(`The answer is no success: ${bytes.toString('utf8', 0, 600)}`);
  const length = /\r\ncontent-length: *(\d+)/i.exec(head)?.[1];
  if (length === undefined) throw new Error(`The answer does not say its length:\n${head}`);
  const whole = headLength + HEAD_END.length + Number(length);
  return bytes.length < whole ? null : whole;
}

/** Sends request after request on one connection, each when the one before has its answer. */
function converse(socket: Socket, nextRequest: () => Buffer, until: number): Promise<number> {
  return new Promise((resolve, reject) => {
    let runs = 0;
    let received = Buffer.alloc(0);
    const settle = (act: () => void): void => {
      socket.destroy();
      act();
    };
    socket.on('error', reject);
    socket.on('close', () => reject(new Error('The server closed the connection')));
    socket.on('data', (chunk) => {
      received = received.length === 0 ? chunk : Buffer.concat([received, chunk]);
      try {
        const length = answerLength(received);
        if (length === null) return;
        received = received.subarray(length);
      } catch (error) {
        settle(() => reject(error as Error));
        return;
      }
      runs += 1;
      if (performance.now() < until) socket.write(nextRequest());
      else settle(() => resolve(runs));
    });
    socket.write(nextRequest());
  });
}

/** Answers per second over kept-open connections, with a client so light that the server is what is measured. */
export function overHttp(port: number, requests: readonly Buffer[], connections: number): Side {
  let sent = 0;
  const nextRequest = (): Buffer => requests[sent++ % requests.length] ?? Buffer.alloc(0);
  return async (ms): Promise<Stretch> => {
    const sockets = await Promise.all(Array.from({ length: connections }, () => connected(port)));
    const start = performance.now();
    const runs = await Promise.all(sockets.map((socket) => converse(socket, nextRequest, start + ms)));
    return { runs: runs.reduce((sum, one) => sum + one, 0), ms: performance.now() - start };
  };
}

function connected(port: number): Promise<Socket> {
  return new Promise((resolve, reject) => {
    const socket = connect({ port, host: '127.0.0.1', noDelay: true }, () => {
      socket.off('error', reject);
      resolve(socket);
    });
    socket.once('error', reject);
  });
}
