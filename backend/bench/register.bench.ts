import { NestFactory } from '@nestjs/core';
import { Client } from 'pg';
import { API_PREFIX, contract, type AnswerOf } from '@bellgap/common/api';
import { DEMO_PASSWORD, createKnex } from '@bellgap/database';
import { AppModule } from '../src/app.module';
import { perform, storytellersOf, type Storytellers } from '../src/demo/acts';
import { LINE_CLEARANCE, site, string } from '../src/demo/inputs';
import { StoryClock } from '../src/demo/story-clock';
import { loadConfig } from '../src/platform/config';
import { RegisterListQuery } from '../src/register/register.list-query';
import type { Figure } from './harness';
import { overHttp, requestBytes } from './load';
import { product } from './product';
import { inTurn, sideBySide, type Side } from './rates';

const SHEETS = 100_000;
const PAGE_ROWS = 50;
const ISSUES = 12;
const APPROVER = 'a.holvenstein@kigc.example';

let filled: Promise<void> | null = null;

/** Issued sheets of many years, one specification each, straight into the tables; their files are left out. */
function register(): Promise<void> {
  filled ??= fill();
  return filled;
}

async function fill(): Promise<void> {
  const { owner } = (await product()).database;
  const [author, checker, approver] = await owner('users').orderBy('email').limit(3).pluck<string[]>('id');
  const [project] = await owner('projects').where({ code: 'KL221' }).pluck<string[]>('id');
  await owner.raw(
    `insert into specifications (project_id, number, title, kind, created_by)
     select ?, 'R-' || lpad(n::text, 6, '0'), 'Strings of section ' || n, 'line', ? from generate_series(1, ?) as n`,
    [project!, author!, SHEETS],
  );
  await owner.raw(
    `insert into revisions (specification_id, title, label, state, input, context, evaluation, method_edition,
       drafted_by, saved_by, submitted_by, submitted_at, checked_by, checked_at, approved_by, issued_at, content_code)
     select s.id, s.title, '0', 'issued', '{}', '{}', '{}', '1', :author, :author, :author, now(), :checker, now(),
       :approver, now(), '000000000000'
     from specifications as s where s.number like 'R-%'`,
    { author, checker, approver },
  );
  await owner.raw(
    `insert into sheets (revision_id, kind, drawn_at, drawn_by, input, context, evaluation, method_edition, content_code,
       file_sha256, pages, specification_id, project_id, number, title, label, specification_kind, units, insulator_code,
       governed_by, highest_voltage_kv, altitude_m, severity, worst_margin_percent, acceptances_count, concessions_count,
       verification_code, standing)
     select r.id, 'issued', now() - n * interval '1 hour', r.approved_by, '{}', '{}', '{}', '1', '000000000000',
       repeat('0', 64), 6, s.id, s.project_id, s.number, s.title, '0', 'line', case when n % 11 = 0 then null else 8 + n % 25 end,
       'U160BL', 'pollution', 245, n % 3900, 'd', n % 40, n % 3, 0,
       upper(translate(lpad(to_hex(n), 16, '0'), '01', 'XY')), 'current'
     from (select *, row_number() over (order by number) as n from specifications where number like 'R-%') as s
     join revisions as r on r.specification_id = s.id`,
  );
  await owner.raw('analyze specifications; analyze revisions; analyze sheets');
}

async function signIn(url: string, email: string): Promise<string> {
  const answer = await fetch(`${url}${API_PREFIX}/sessions`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email, password: DEMO_PASSWORD }),
  });
  const cookie = answer.headers.getSetCookie()[0]?.split(';')[0];
  if (!answer.ok || !cookie) throw new Error(`Nobody could be signed in: ${answer.status}`);
  return cookie;
}

/** Cursors of the register as the product writes them, from some depth on, each another one. */
async function cursorsFrom(row: number): Promise<string[]> {
  const { owner } = (await product()).database;
  const rows = await owner('sheets as s')
    .where('s.kind', 'issued')
    .orderBy([
      { column: 's.drawn_at', order: 'desc' },
      { column: 's.id', order: 'desc' },
    ])
    .offset(row)
    .limit(200)
    .select<{ id: string; value: string }[]>('s.id', owner.raw('s.drawn_at::text as value'));
  return rows.map((cursor) =>
    Buffer.from(JSON.stringify({ sort: '-issuedAt', back: false, ...cursor })).toString('base64url'),
  );
}

async function pagesOverHttp(cursors: readonly string[]): Promise<Side> {
  const { url } = await product();
  const headers = { cookie: await signIn(url, APPROVER) };
  const pathOf = (cursor: string) => `${API_PREFIX}/sheets?limit=${PAGE_ROWS}&sort=-issuedAt&cursor=${cursor}`;
  const sample = await fetch(url + pathOf(cursors[0] ?? ''), { headers });
  const { items } = (await sample.json()) as AnswerOf<typeof contract.sheets>;
  if (items.length !== PAGE_ROWS) throw new Error(`A page has ${items.length} rows`);
  const requests = cursors.map((cursor) => requestBytes('GET', pathOf(cursor), headers, ''));
  return overHttp(Number(new URL(url).port), requests, 1);
}

const pageAsked = (cursor: string) => ({ limit: String(PAGE_ROWS), sort: '-issuedAt', cursor }) as const;

/** The page's own queries, as the product sends them, one for each cursor. */
async function pageQueries(cursors: readonly string[]): Promise<{ text: string; values: unknown[] }[]> {
  const knex = createKnex({ url: (await product()).database.url, poolMax: 1 });
  const said: { text: string; values: unknown[] }[] = [];
  knex.on('query', ({ sql, bindings }: { sql: string; bindings: unknown[] }) =>
    said.push({ text: sql, values: bindings }),
  );
  const lists = new RegisterListQuery(knex);
  for (const cursor of cursors) await lists.page('all', pageAsked(cursor));
  await knex.destroy();
  return said;
}

/** Specifications that wait for their approval, made through the services. */
async function toApproval(count: number): Promise<string[]> {
  const { database } = await product();
  const config = loadConfig({ NODE_ENV: 'test', ROLE: 'web', DATABASE_URL: database.url, REQUEST_LOG: 'no' });
  const clock = new StoryClock();
  const app = await NestFactory.createApplicationContext(AppModule.with({ config, clock }), { logger: ['error'] });
  const tellers: Storytellers = storytellersOf(app, clock);
  const numbers = Array.from({ length: count }, (_, i) => `ISSUE-${i}`);
  const at = '2026-03-16T00:00:00Z';
  for (const number of numbers) {
    const document = { projectCode: 'KL221', number, acts: [] };
    const input = {
      site: site(500, 'd', 'measured'),
      string: string('G160-F', 'suspension'),
      clearance: LINE_CLEARANCE,
    };
    await perform(document, { kind: 'create', by: 'orvelle', at, title: 'Issued by the benchmark' }, tellers);
    await perform(document, { kind: 'save', by: 'orvelle', at, input }, tellers);
    await perform(document, { kind: 'submit', by: 'orvelle', at, dueOn: '2026-03-20', note: '' }, tellers);
    const differenceReason = 'Dirtier than the rule is meant for';
    await perform(
      document,
      { kind: 'check', by: 'castellary', at, verdict: 'pass', note: '', differenceReason },
      tellers,
    );
  }
  await app.close();
  return numbers;
}

/** From the click to the answer: the password, every bar, the drawing of the sheet, its letters and its trail. */
async function msOfIssue(url: string, cookie: string, number: string): Promise<number> {
  const path = `${url}${API_PREFIX}/projects/KL221/specifications/${number}/revisions/latest`;
  const headers = { cookie, 'content-type': 'application/json' };
  const { lockVersion } = (await (await fetch(path, { headers })).json()) as AnswerOf<typeof contract.revision>;
  const seen = (await (await fetch(`${path}/approval`, { headers })).json()) as AnswerOf<typeof contract.approval>;
  const body = {
    acceptances: seen.acceptances.map((one) => ({ ...one, reason: 'Seen' })),
    concessions: [],
    laterChangesReason: null,
    password: DEMO_PASSWORD,
  };
  const start = performance.now();
  const answer = await fetch(`${path}/issue`, {
    method: 'POST',
    headers: { ...headers, 'if-match': `"${lockVersion}"` },
    body: JSON.stringify(body),
  });
  const text = await answer.text();
  const ms = performance.now() - start;
  if (answer.status !== 201) throw new Error(`It was not issued: ${answer.status} ${text}`);
  return ms;
}

/** The register with a hundred thousand sheets, and what it takes to issue one more. */
export const registerFigures: readonly Figure[] = [
  {
    name: 'register-page-query',
    unit: 'pages/s',
    aim: { ratioAtLeast: 0.5 },
    measure: async () => {
      await register();
      const cursors = await cursorsFrom(SHEETS / 2);
      const queries = await pageQueries(cursors);
      const { url } = (await product()).database;
      const knex = createKnex({ url, poolMax: 1 });
      const lists = new RegisterListQuery(knex);
      const client = new Client({ connectionString: url });
      await client.connect();
      try {
        return await sideBySide(
          inTurn((step) => lists.page('all', pageAsked(cursors[step % cursors.length]!))),
          inTurn((step) => client.query(queries[step % queries.length]!)),
          { warmUpRuns: 3000 },
        );
      } finally {
        await Promise.all([client.end(), knex.destroy()]);
      }
    },
  },
  {
    name: 'register-page-over-http',
    unit: 'pages/s',
    aim: null,
    measure: async () => {
      await register();
      const cursors = await cursorsFrom(SHEETS / 2);
      const { url } = (await product()).database;
      const knex = createKnex({ url, poolMax: 1 });
      const lists = new RegisterListQuery(knex);
      try {
        return await sideBySide(
          await pagesOverHttp(cursors),
          inTurn((step) => lists.page('all', pageAsked(cursors[step % cursors.length]!))),
          { warmUpRuns: 3000 },
        );
      } finally {
        await knex.destroy();
      }
    },
  },
  {
    name: 'register-page-far-down',
    unit: 'pages/s',
    aim: { ratioAtLeast: 0.8 },
    measure: async () => {
      await register();
      const far = await pagesOverHttp(await cursorsFrom(SHEETS - 1000));
      return sideBySide(far, await pagesOverHttp(await cursorsFrom(0)), { warmUpRuns: 3000 });
    },
  },
  {
    name: 'issue-of-a-sheet',
    unit: 'ms',
    aim: { valueAtMost: 1000 },
    measure: async () => {
      await register();
      const { url } = await product();
      const cookie = await signIn(url, APPROVER);
      const times: number[] = [];
      for (const number of await toApproval(ISSUES)) times.push(await msOfIssue(url, cookie, number));
      const [median = NaN] = times
        .slice(2)
        .sort((one, other) => one - other)
        .slice(Math.floor((ISSUES - 2) / 2));
      return { value: median, beside: null };
    },
  },
];
