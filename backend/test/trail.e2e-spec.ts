import { contract, type QueryOf, type TrailEvent } from '@bellgap/common/api';
import { createKnex } from '@bellgap/database';
import type { Knex } from 'knex';
import { SystemClock } from '../src/platform/clock';
import { LastSealLettersService } from '../src/trail/last-seal-letters.service';
import { LastSealService } from '../src/trail/last-seal.service';
import { SealingService } from '../src/trail/sealing.service';
import { SealsRepository } from '../src/trail/seals.repository';
import { TrailVeils } from '../src/trail/trail-veils';
import { begin, lineInput, makeLine } from './support/line-project';
import { TestApp } from './support/test-app';
import { TestClock } from './support/test-clock';
import type { TestClient } from './support/test-client';

type Query = QueryOf<typeof contract.trail>;

describe('the trail', () => {
  let test: TestApp;
  let engineer: TestClient;
  let administrator: TestClient;
  let engineerName: string;
  beforeAll(async () => {
    test = await TestApp.start();
    const made = await test.signedIn({ name: 'Ines Marlow', roles: ['engineer'] });
    engineer = made.client;
    engineerName = made.person.name;
    administrator = (await test.signedIn({ roles: ['administrator'] })).client;
    await makeLine(engineer, 'TR1');
    await makeLine(engineer, 'TR2');
    await begin(engineer, 'TR2', 'INS-2');
    const revision = await begin(engineer, 'TR1', 'INS-1');
    const save = async (version: number, altitudeM: number) => {
      const input = lineInput({ site: { ...lineInput().site!, altitudeM } });
      const { status } = await engineer.call(contract.saveRevision, {
        params: { code: 'TR1', number: 'INS-1', label: 'A' },
        version,
        body: { title: '=1+1 strings', input, overrides: [] },
      });
      expect(status).toBe(200);
    };
    await save(revision.lockVersion, 900);
    await save(revision.lockVersion + 1, -12);
  });
  afterAll(() => test.stop());

  const seal = () => test.app.get(SealingService).seal();
  const read = async (client: TestClient, query: Query = {}): Promise<TrailEvent[]> => {
    const { status, answer } = await client.call(contract.trail, { query: query as Record<string, string> });
    expect(status).toBe(200);
    return answer.items;
  };

  describe('read', () => {
    it('says who did what, when, with the old and the new value', async () => {
      const [event] = await read(engineer, { action: 'revision.saved' });
      expect(event).toMatchObject({
        actor: { name: engineerName },
        action: 'revision.saved',
        entity: 'revision',
        projectCode: 'TR1',
        specification: { number: 'INS-1', label: 'A' },
      });
      expect(event!.at).toMatch(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/);
      expect(event!.changes).toContainEqual({ path: 'input.site.altitudeM', from: 900, to: -12, hidden: false });
    });

    it('shows all changes of one field of a specification, and no other field', async () => {
      const params = { code: 'TR1', number: 'INS-1' };
      const { answer } = await engineer.call(contract.specificationTrail, {
        params,
        query: { path: 'site.altitudeM', sort: 'at' },
      });
      expect(answer.items.map(({ changes }) => changes)).toEqual([
        [{ path: 'input.site.altitudeM', from: null, to: 900, hidden: false }],
        [{ path: 'input.site.altitudeM', from: 900, to: -12, hidden: false }],
      ]);
      const below = await engineer.call(contract.specificationTrail, { params, query: { path: 'site' } });
      expect(below.answer.items).toHaveLength(2);
    });

    it('keeps a specification apart from others, with what belongs to it', async () => {
      const ask = (number: string) => engineer.call(contract.specificationTrail, { params: { code: 'TR1', number } });
      const note = { title: 'A thought', figures: null, text: 'Words' };
      await engineer.call(contract.writeRevisionNote, {
        params: { code: 'TR1', number: 'INS-1', label: 'A' },
        body: note,
      });
      const { answer } = await ask('INS-1');
      expect(answer.items.map(({ action }) => action)).toEqual([
        'revision-note.written',
        'revision.saved',
        'revision.saved',
        'specification.created',
      ]);
      expect((await ask('INS-2')).status).toBe(404);
      const query = { project: 'TR1', specification: 'INS-1' };
      expect((await read(engineer, query)).map(({ id }) => id)).toEqual(answer.items.map(({ id }) => id));
      expect((await engineer.call(contract.trailFile, { query })).response.text).toContain('Wrote a note');
      expect((await engineer.call(contract.trail, { query: { specification: 'INS-1' } })).status).toBe(422);
    });

    it.each<[string, Query, number]>([
      ['project', { project: 'TR2', action: 'specification.created' }, 1],
      ['part of a name', { person: 'marlow', action: 'project.created' }, 2],
      ['a name that nobody has', { person: 'nobody' }, 0],
      ['kind of record', { entity: 'design-basis' }, 2],
      ['a project that is none', { project: 'TR9' }, 0],
      ['days long ago', { to: '2020-12-31' }, 0],
      ['days to come', { from: '2999-01-01', zone: 'Etc/GMT-4' }, 0],
    ])('is narrowed by %s', async (_, query, count) => {
      expect(await read(engineer, query)).toHaveLength(count);
    });

    it('pages by the row, onward and back, and stays where it is while rows are added', async () => {
      const all = await read(engineer, { limit: '200' });
      const first = await engineer.call(contract.trail, { query: { limit: '3' } });
      expect(first.answer.previous).toBeNull();
      await begin(engineer, 'TR2', 'INS-LATER');
      const second = await engineer.call(contract.trail, { query: { limit: '3', cursor: first.answer.next! } });
      expect(second.answer.items.map(({ id }) => id)).toEqual(all.slice(3, 6).map(({ id }) => id));
      const back = await engineer.call(contract.trail, { query: { limit: '3', cursor: second.answer.previous! } });
      expect(back.answer.items).toEqual(first.answer.items);
      expect(back.answer.previous).not.toBeNull();
    });

    it('refuses what cannot be read', async () => {
      const faulty: Record<string, string>[] = [
        { from: '31.3.2026' },
        { zone: 'Nowhere/Far' },
        { cursor: 'x' },
        { limit: '0' },
      ];
      for (const query of faulty) {
        const { status } = await engineer.call(contract.trail, { query });
        expect([query, status]).toEqual([query, 422]);
      }
    });

    it('tells nobody of what he may not know of', async () => {
      const { client: limited } = await test.signedIn({ roles: ['checker'], projects: ['TR2'] });
      const seen = await read(limited, { limit: '200' });
      expect(new Set(seen.map(({ projectCode }) => projectCode))).toEqual(new Set(['TR2']));
      const hidden = { params: { code: 'TR1', number: 'INS-1' } };
      expect((await limited.call(contract.specificationTrail, hidden)).status).toBe(404);

      const people = (events: TrailEvent[]) => events.filter(({ entity }) => ['user', 'session'].includes(entity));
      expect(people(await read(engineer, { limit: '200' }))).toEqual([]);
      expect(people(await read(administrator, { limit: '200' })).length).toBeGreaterThan(0);

      for (const role of ['reader', 'procurement'] as const) {
        const { client } = await test.signedIn({ roles: [role] });
        for (const endpoint of [contract.trail, contract.trailFile])
          expect((await client.call(endpoint)).status).toBe(403);
        expect((await client.call(contract.specificationTrail, hidden)).status).toBe(403);
      }
    });

    it('keeps back what a veil hides, and only that', async () => {
      const checker = await test.signedIn({ roles: ['checker'] });
      test.app
        .get(TrailVeils)
        .add((person) =>
          Promise.resolve(
            ({ entity }, path) => person.id === checker.person.id && entity === 'revision' && path === 'units',
          ),
        );
      const units = async (client: TestClient) =>
        (await read(client, { action: 'revision.saved', path: 'units' })).flatMap(({ changes }) => changes);
      expect((await units(engineer)).length).toBeGreaterThan(0);
      expect((await units(engineer)).every(({ hidden }) => !hidden)).toBe(true);
      for (const change of await units(checker.client)) {
        expect(change).toEqual({ path: 'units', from: null, to: null, hidden: true });
      }
      const { response } = await checker.client.call(contract.trailFile, {
        query: { path: 'units', action: 'revision.saved' },
      });
      expect(response.text.split('\r\n')[1]).toContain('not shown yet,not shown yet');
    });
  });

  it('leaves as a file that a spreadsheet reads rightly', async () => {
    const { response, headers } = await engineer.call(contract.trailFile, {
      query: { project: 'TR1', action: 'revision.saved', sort: 'at' },
    });
    expect(headers['content-disposition']).toBe('attachment; filename="trail.csv"');
    expect(response.text.startsWith('\uFEFF"When')).toBe(true);
    const lines = response.text.slice(1).trimEnd().split('\r\n');
    expect(lines[0]).toMatch(/^"When \(RFC 3339, UTC\)",Who,What,/);
    const altitude = lines.filter((line) => line.includes(',input.site.altitudeM,'));
    expect(altitude).toHaveLength(2);
    expect(altitude[1]).toMatch(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z,Ines Marlow,Saved a draft,/);
    expect(altitude[1]).toContain(',Altitude,900,-12,');
    expect(lines.find((line) => line.includes(',title,'))).toContain(",'=1+1 strings,");
  });

  describe('sealed', () => {
    const verify = async (knownSeal: { number: number; hash: string } | null = null) => {
      const { status, answer } = await administrator.call(contract.verifyTrail, { body: { knownSeal } });
      expect(status).toBe(200);
      return answer;
    };

    /** As somebody would who owns the machine: no trigger, no constraint between tables. */
    const behindTheBack = async (act: (superuser: Knex) => Promise<unknown>) => {
      const url = new URL(process.env.TEST_SUPERUSER_DATABASE_URL!);
      url.pathname = new URL(test.database.url).pathname;
      const superuser = createKnex({ url: url.href, poolMax: 1 });
      try {
        await superuser.raw('set session_replication_role = replica');
        await act(superuser);
      } finally {
        await superuser.destroy();
      }
    };
    const eventOf = async (action: string): Promise<{ id: number; number: number }> =>
      (await test.database
        .owner('audit_events as e')
        .join('audit_seals as s', 's.event_id', 'e.id')
        .where({ 'e.action': action })
        .first('e.id', 's.number')) as { id: number; number: number };

    it('in one unbroken chain, each row once', async () => {
      await seal();
      const events = (await test.database.owner('audit_events').orderBy('id').pluck('id')) as number[];
      const seals = (await test.database.owner('audit_seals').orderBy('number')) as {
        number: number;
        event_id: number;
      }[];
      expect(seals.map(({ event_id }) => event_id).sort((a, b) => a - b)).toEqual(events);
      expect(seals.map(({ number }) => number)).toEqual(events.map((_, i) => i + 1));
      expect(await seal()).toBe(0);
      const { checkedCount, ...found } = await verify();
      expect(checkedCount).toBeGreaterThanOrEqual(events.length);
      const nothing = { count: 0, named: [] };
      expect(found).toMatchObject({
        sound: true,
        broken: nothing,
        missing: nothing,
        unsealed: nothing,
        knownSeal: null,
      });
      expect((await read(engineer))[0]!.seal).not.toBeNull();
    });

    it('a row that is committed after later ones were sealed', async () => {
      const late = await test.database.knex.transaction();
      const [row] = await late('audit_events').insert({ action: 'test.late', entity: 'test', entity_id: '1' }, ['id']);
      const { id } = row as { id: number };
      await test.database.knex('audit_events').insert({ action: 'test.early', entity: 'test', entity_id: '2' });
      await seal();
      const sealsOf = () => test.database.owner('audit_seals').where({ event_id: id });
      expect(await sealsOf()).toEqual([]);
      await late.commit();
      expect(await seal()).toBe(1);
      expect(await sealsOf()).toHaveLength(1);
      expect((await verify()).sound).toBe(true);
    });

    it('a row far behind the newest one, at the next look through the whole', async () => {
      const clock = new TestClock();
      const sealing = new SealingService(clock, test.app.get(SealsRepository));
      await test.database.owner.raw('alter table audit_events alter column id restart with 200001');
      await test.database.knex('audit_events').insert({ action: 'test.far', entity: 'test', entity_id: '1' });
      await sealing.seal();
      await test.database.owner.raw(
        `insert into audit_events (id, action, entity, entity_id) overriding system value
         values (99999, 'test.behind', 'test', '1')`,
      );
      expect(await sealing.seal()).toBe(0);
      clock.advance({ minutes: 61 });
      expect(await sealing.seal()).toBe(1);
      expect((await verify()).sound).toBe(true);
    });

    it('by two processes at once, in one chain', async () => {
      const other = createKnex({ url: test.database.url, poolMax: 2 });
      const writer = createKnex({ url: test.database.url, poolMax: 4 });
      try {
        const one = new SealingService(new SystemClock(), new SealsRepository(other));
        let writing = true;
        const write = async () => {
          for (let i = 0; i < 150; i += 1) {
            await writer('audit_events').insert({ action: 'test.many', entity: 'test', entity_id: String(i) });
          }
        };
        const sealing = async (service: { seal: () => Promise<number> }) => {
          let sealed = 0;
          while (writing) sealed += await service.seal();
          return sealed;
        };
        const sealers = [sealing(one), sealing(test.app.get(SealingService))];
        await Promise.all([write(), write(), write()]);
        writing = false;
        await Promise.all(sealers);
        await seal();
        const { sound, checkedCount } = await verify();
        expect(sound).toBe(true);
        const [{ count }] = (await test.database.owner('audit_events').count({ count: '*' })) as [{ count: number }];
        expect(checkedCount).toBe(count);
      } finally {
        await Promise.all([other.destroy(), writer.destroy()]);
      }
    });

    it('and its end can be printed and compared', async () => {
      await seal();
      const last = (await test.app.get(LastSealService).lastSeal())!;
      expect(last).toEqual({
        number: expect.any(Number),
        hash: expect.stringMatching(/^[0-9a-f]{12}$/),
        at: expect.any(String),
      });
      const { number, hash } = last;
      expect((await verify({ number, hash })).knownSeal).toBe('agrees');
      const differing = await verify({ number, hash: '0'.repeat(12) });
      expect(differing).toMatchObject({ knownSeal: 'differs', sound: false });
      expect(await verify({ number: number + 5000, hash })).toMatchObject({ knownSeal: 'gone', sound: false });
    });

    it('names a row in which one letter was changed behind its back', async () => {
      const event = await eventOf('design-basis.revised');
      await behindTheBack((superuser) =>
        superuser.raw(
          `update audit_events set changes = replace(changes::text, 'effective', 'effectivf')::jsonb where id = ?`,
          [event.id],
        ),
      );
      const { sound, broken } = await verify();
      expect(sound).toBe(false);
      expect(broken).toEqual({ count: 1, named: [{ number: event.number, eventId: event.id }] });
    });

    it('names a microsecond and a reason that were changed', async () => {
      const { id, number } = await eventOf('specification.created');
      await behindTheBack((superuser) =>
        superuser('audit_events')
          .where({ id })
          .update({ at: superuser.raw(`at + interval '1 microsecond'`) }),
      );
      expect((await verify()).broken.named).toContainEqual({ number, eventId: id });
    });

    it('names a row that was removed, a seal that was removed, and a row that was put in unsealed', async () => {
      const event = await eventOf('project.created');
      const sealed = await eventOf('test.many');
      await behindTheBack(async (superuser) => {
        await superuser('audit_events').where({ id: event.id }).delete();
        await superuser('audit_seals').where({ number: sealed.number }).delete();
        await superuser('audit_events').where({ id: sealed.id }).update({ at: '2026-01-01T00:00:00Z' });
      });
      const { sound, missing, unsealed } = await verify();
      expect(sound).toBe(false);
      expect(missing.count).toBe(2);
      expect(missing.named).toEqual(
        expect.arrayContaining([
          { number: event.number, eventId: event.id },
          { number: sealed.number, eventId: null },
        ]),
      );
      expect(unsealed).toEqual({ count: 1, named: [{ number: null, eventId: sealed.id }] });
    });

    it('and its end is mailed to the administrators each day', async () => {
      await test.app.get(LastSealLettersService).send();
      const jobs = await test.database.owner('graphile_worker._private_jobs').select<{ payload: object }[]>('payload');
      const last = (await test.app.get(LastSealService).lastSeal())!;
      expect(jobs.map(({ payload }) => payload)).toContainEqual(
        expect.objectContaining({
          kind: 'last-seal',
          data: { number: last.number, hash: last.hash, sealedAt: last.at },
        }),
      );
    });

    it('is verified by administrators of the whole company only', async () => {
      expect((await engineer.call(contract.verifyTrail, { body: {} })).status).toBe(403);
      const { client } = await test.signedIn({ roles: ['administrator'], projects: ['TR1'] });
      expect((await client.call(contract.verifyTrail, { body: {} })).status).toBe(403);
    });
  });
});
