import { NestFactory } from '@nestjs/core';
import { Client } from 'pg';
import { API_PREFIX, contract, type AnswerOf } from '@bellgap/common/api';
import { DEMO_PASSWORD, createKnex } from '@bellgap/database';
import { PERSON_OF } from '../../frontend/e2e/support/routes';
import { AppModule } from '../src/app.module';
import { AuditService } from '../src/audit/audit.service';
import { readAuthor } from '../src/demo/people';
import { loadConfig } from '../src/platform/config';
import { SpecificationsService } from '../src/specifications/specifications.service';
import { KNEX, type Database } from '../src/platform/knex';
import { TrailRepository } from '../src/trail/trail.repository';
import type { Figure } from './harness';
import { overHttp, requestBytes } from './load';
import { product } from './product';
import { inTurn, sideBySide, type Side } from './rates';
import { sampleInput } from './sample';

const ROWS = 1_000_000;
const WRITERS = 50;
const PAGE_ROWS = 50;

let filled: Promise<void> | null = null;

/** Rows as saves of drafts leave them, of some hundred people's work over two years; sealed by the product itself. */
function million(): Promise<void> {
  filled ??= fill();
  return filled;
}

async function fill(): Promise<void> {
  const { database } = await product();
  await database.owner.raw(
    `insert into audit_events (at, actor_id, action, entity, entity_id, project_id, changes)
     select now() - interval '2 years' + n * interval '1 minute', u.id, 'revision.saved', 'revision',
       r.id::text, s.project_id,
       jsonb_build_object(
         'input.site.altitudeM', jsonb_build_object('from', n % 1500, 'to', (n + 1) % 1500),
         'units', jsonb_build_object('from', n % 20, 'to', (n + 1) % 20))
     from generate_series(1, ?) as n
     join (select id, row_number() over (order by id) - 1 as i, count(*) over () as many from users) as u on u.i = n % u.many
     join (select id, specification_id, row_number() over (order by id) - 1 as i, count(*) over () as many from revisions)
       as r on r.i = n % r.many
     join specifications as s on s.id = r.specification_id`,
    [ROWS],
  );
  await database.owner.raw('analyze audit_events');
  for (;;) {
    const [{ left }] = (
      await database.owner.raw<{ rows: [{ left: number }] }>(
        'select (select count(*) from audit_events) - (select count(*) from audit_seals) as left',
      )
    ).rows;
    if (left <= 0) break;
    await new Promise((resolve) => setTimeout(resolve, 1000));
  }
  await database.owner.raw('analyze audit_seals');
}

async function signIn(url: string): Promise<string> {
  const answer = await fetch(`${url}${API_PREFIX}/sessions`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: PERSON_OF.administrator, password: DEMO_PASSWORD }),
  });
  const cookie = answer.headers.getSetCookie()[0]?.split(';')[0];
  if (!answer.ok || !cookie) throw new Error(`Nobody could be signed in: ${answer.status}`);
  return cookie;
}

const cursorPast = (id: number): string => Buffer.from(`onward:${id}`).toString('base64url');

/** Pages that begin past rows around one depth, each another one. */
async function pagesOverHttp(fromRow: number): Promise<Side> {
  const { url } = await product();
  const headers = { cookie: await signIn(url) };
  const requests = Array.from({ length: 200 }, (_, i) =>
    requestBytes('GET', `${API_PREFIX}/trail?limit=${PAGE_ROWS}&cursor=${cursorPast(fromRow - 7 * i)}`, headers, ''),
  );
  const sample = await fetch(`${url}${API_PREFIX}/trail?limit=${PAGE_ROWS}&cursor=${cursorPast(fromRow)}`, { headers });
  const { items } = (await sample.json()) as AnswerOf<typeof contract.trail>;
  if (items.length !== PAGE_ROWS) throw new Error(`A page has ${items.length} rows`);
  return overHttp(Number(new URL(url).port), requests, 1);
}

/** The text of the page's own query, with its numbers filled in. */
async function pageSql(pastId: number): Promise<string> {
  const knex = createKnex({ url: (await product()).database.url, poolMax: 1 });
  const said: string[] = [];
  knex.on('query', ({ sql, bindings }: { sql: string; bindings: unknown[] }) =>
    said.push(bindings.reduce<string>((text, value, i) => text.replace(`$${i + 1}`, String(value)), sql)),
  );
  await new TrailRepository(knex).rows('everything', {}, { pastId, descending: true }, PAGE_ROWS + 1);
  await knex.destroy();
  return said.at(-1) ?? '';
}

/**
 * Whole saves of drafts, evaluation included, each writer his own; with the trail, or with its writer silenced. The
 * cluster of this run gives up durability, which makes the trail weigh more than it does where every commit waits.
 */
async function savesBy(writers: number, audited: boolean): Promise<{ side: Side; stop: () => Promise<void> }> {
  const { database } = await product();
  const config = loadConfig({
    NODE_ENV: 'test',
    ROLE: 'web',
    DATABASE_URL: database.url,
    DATABASE_POOL_MAX: String(writers),
    REQUEST_LOG: 'no',
  });
  const app = await NestFactory.createApplicationContext(AppModule.with({ config }), { logger: ['error'] });
  if (!audited) app.get(AuditService).record = () => Promise.resolve();
  const specifications = app.get(SpecificationsService);
  const person = await readAuthor('orvelle', app.get<Database>(KNEX));
  const drafts = await Promise.all(
    Array.from({ length: writers }, async (_, writer) => {
      const number = `W-${audited ? 'WITH' : 'WITHOUT'}-${writer}`;
      const { lockVersion, input, label } = await specifications.create(person, 'KL221', {
        number,
        title: 'Written by the benchmark',
        kind: 'line',
      });
      return { address: { projectCode: 'KL221', number, label }, lockVersion, input, step: writer };
    }),
  );
  const save = async (draft: (typeof drafts)[number]): Promise<void> => {
    draft.step += 1;
    const { site, string, clearance } = sampleInput(draft.step);
    const saved = await specifications.save(person, draft.address, draft.lockVersion, {
      title: 'Written by the benchmark',
      input: { ...draft.input, site, string, clearance },
      overrides: [],
    });
    draft.lockVersion = saved.lockVersion;
  };
  const side: Side = async (ms) => {
    const stretches = await Promise.all(drafts.map((draft) => inTurn(() => save(draft))(ms)));
    return {
      runs: stretches.reduce((sum, { runs }) => sum + runs, 0),
      ms: Math.max(...stretches.map((stretch) => stretch.ms)),
    };
  };
  return { side, stop: () => app.close() };
}

/** The trail with a million rows, sealed while it is written to. */
export const trailFigures: readonly Figure[] = [
  {
    name: 'trail-page-over-http',
    unit: 'pages/s',
    aim: { ratioAtLeast: 0.5 },
    measure: async () => {
      await million();
      const sql = await pageSql(ROWS / 2);
      const client = new Client({ connectionString: (await product()).database.url });
      await client.connect();
      try {
        return await sideBySide(
          await pagesOverHttp(ROWS / 2),
          inTurn((step) => client.query(sql.replaceAll(String(ROWS / 2), String(ROWS / 2 - 7 * (step % 200))))),
          { warmUpRuns: 3000 },
        );
      } finally {
        await client.end();
      }
    },
  },
  {
    name: 'trail-page-far-down',
    unit: 'pages/s',
    aim: { ratioAtLeast: 0.8 },
    measure: async () => {
      await million();
      return sideBySide(await pagesOverHttp(5_000), await pagesOverHttp(ROWS - 5_000), { warmUpRuns: 3000 });
    },
  },
  {
    name: 'writers-with-trail',
    unit: 'saves/s',
    aim: { ratioAtLeast: 0.8 },
    measure: async () => {
      await million();
      const mine = await savesBy(WRITERS, true);
      const other = await savesBy(WRITERS, false);
      try {
        return await sideBySide(mine.side, other.side);
      } finally {
        await Promise.all([mine.stop(), other.stop()]);
      }
    },
  },
];
