import { readFile } from 'node:fs/promises';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import path from 'node:path';
import { isLoopback } from '../platform/config-values';
import type { LetterStore } from './letter-store';
import { STYLES } from './look';
import { framed, letterPage, listPage, notFoundPage } from './pages';

const FONTS = path.resolve(__dirname, '../../assets/fonts');
const FONT = /^\/fonts\/(IBMPlex(?:Sans|Mono)-(?:Regular|SemiBold)\.woff)$/;
const LETTER = /^\/letters\/([\d]{13}-[0-9a-f]{12})(\/html)?$/;

/** Letters come from whoever reaches the post box, so a page lets nothing in them run or fetch. */
const PAGE_POLICY =
  "default-src 'none'; style-src 'self'; font-src 'self'; img-src data:; frame-src 'self'; form-action 'self'; " +
  "base-uri 'none'; frame-ancestors 'none'";
const LETTER_POLICY =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data:; frame-ancestors 'self'; " +
  'sandbox allow-popups allow-popups-to-escape-sandbox';

interface Answer {
  status?: number;
  type?: string;
  policy?: string;
  body: string | Buffer;
}

export function readingServer(store: LetterStore): Server {
  return createServer((request, response) => {
    answer(store, request)
      .catch((): Answer => ({ status: 500, type: 'text/plain', body: 'The letter could not be read.' }))
      .then((made) => send(response, made), console.error);
  });
}

async function answer(store: LetterStore, request: IncomingMessage): Promise<Answer> {
  // A page elsewhere whose name was pointed at this computer would come with its own name here.
  const host = request.headers.host?.replace(/:\d+$/, '') ?? '';
  if (!isLoopback(host))
    return { status: 421, type: 'text/plain', body: 'This page answers to the loopback address only.' };
  if (request.method !== 'GET' && request.method !== 'HEAD')
    return { status: 405, type: 'text/plain', body: 'Only to be read.' };
  const { pathname, searchParams } = new URL(request.url ?? '/', 'http://localhost');
  if (pathname === '/') {
    const to = searchParams.get('to')?.slice(0, 200) ?? '';
    return { body: listPage(store.list(to), to) };
  }
  if (pathname === '/look.css') return { type: 'text/css', body: STYLES };
  const font = FONT.exec(pathname)?.[1];
  if (font) return { type: 'font/woff', body: await readFile(path.join(FONTS, font)) };
  const [, id, asHtml] = LETTER.exec(pathname) ?? [];
  const found = id ? await store.read(id) : null;
  if (!found) return { status: 404, body: notFoundPage() };
  if (asHtml) return { policy: LETTER_POLICY, body: framed(found.letter.html || '') };
  return { body: letterPage(found.head, found.letter) };
}

function send(
  response: ServerResponse,
  { status = 200, type = 'text/html', policy = PAGE_POLICY, body }: Answer,
): void {
  response.writeHead(status, {
    'Content-Type': type.startsWith('text/') ? `${type}; charset=utf-8` : type,
    'Content-Length': Buffer.byteLength(body),
    'Content-Security-Policy': policy,
    'X-Content-Type-Options': 'nosniff',
    'Referrer-Policy': 'no-referrer',
    'Cache-Control': type === 'font/woff' ? 'max-age=86400' : 'no-store',
  });
  response.end(body);
}
