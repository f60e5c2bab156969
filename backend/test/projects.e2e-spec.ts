import { contract } from '@bellgap/common/api';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { createProject, designBasis, project, projects, saveDesignBasis, towerFamilies, updateProject } = contract;

const LINE = {
  code: 'KL221',
  title: 'Saltgrave - Ondara',
  kind: 'line',
  siteTimeZone: 'Etc/GMT-4',
  paper: 'A4',
  description: '',
};

const BASIS = {
  number: 'DB-KL221',
  basis: 'iec',
  system: {
    nominalVoltageKv: 220,
    highestVoltageKv: 245,
    frequencyHz: 50,
    neutralEarthing: 'effective',
    earthFault: 'cleared',
    insulationLevel: { lightningKv: 1050, switchingKv: null, powerFrequencyKv: 460, switchingPhaseRatio: null },
  },
  rules: { unitsOutForLiveWork: 2, maximumStringKinds: 6 },
  note: 'First issue',
};

describe('projects', () => {
  let test: TestApp;
  let engineer: TestClient;
  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: engineer } = await test.signedIn({ name: 'Tamsin Orvelle', roles: ['engineer'] }));
    await engineer.call(createProject, { body: LINE });
    await engineer.call(createProject, { body: { ...LINE, code: 'OND220', title: 'Ondara yard', kind: 'yard' } });
  });
  afterAll(() => test.stop());

  it('are begun by an engineer, once for each code', async () => {
    const { status, answer, headers } = await engineer.call(createProject, { body: { ...LINE, code: 'NEW-1' } });
    expect(status).toBe(201);
    expect(headers.etag).toBe('"1"');
    expect(answer).toMatchObject({
      code: 'NEW-1',
      lockVersion: 1,
      updatedBy: 'Tamsin Orvelle',
      specificationCount: 0,
      basisRevision: null,
      mayEdit: true,
    });
    const twice = await engineer.call(createProject, { body: { ...LINE, code: 'NEW-1' } });
    expect(twice.status).toBe(409);
    expect(twice.problem.errors[0]!.path).toBe('code');
  });

  it.each([
    ['code', 'kl 221'],
    ['code', 'X'.repeat(21)],
    ['title', ''],
    ['title', ' spaced '],
    ['title', 'turned \u202e round'],
    ['kind', 'cable'],
    ['siteTimeZone', 'Mars/Olympus'],
    ['paper', 'A3'],
  ])('are refused with %s "%s"', async (path, value) => {
    const { status, problem } = await engineer.call(createProject, { body: { ...LINE, code: 'BAD', [path]: value } });
    expect(status).toBe(422);
    expect(problem.errors.map((error) => error.path)).toContain(path);
  });

  it('are changed from the version that was read; the second of two gets both to see', async () => {
    const { code, ...content } = LINE;
    const params = { code };
    const { lockVersion } = (await engineer.call(project, { params })).answer;
    const first = { ...content, title: 'Saltgrave - Ondara, new' };
    const saved = await engineer.call(updateProject, { params, version: lockVersion, body: first });
    expect(saved.headers.etag).toBe(`"${lockVersion + 1}"`);
    const second = await engineer.call(updateProject, { params, version: lockVersion, body: content });
    expect(second.status).toBe(409);
    expect(second.problem).toMatchObject({
      code: 'newer-version',
      current: { title: first.title, lockVersion: lockVersion + 1 },
      changedBy: 'Tamsin Orvelle',
      changedAt: saved.answer.updatedAt,
    });
    const without = await engineer.call(updateProject, { params, body: content });
    expect(without.status).toBe(428);
    const weak = await engineer.call(updateProject, { params, body: content, headers: { 'If-Match': 'W/"1"' } });
    expect(weak.status).toBe(428);
  });

  it('keep their version when nothing changes', async () => {
    const params = { code: 'OND220' };
    const { lockVersion, title, kind, siteTimeZone, paper, description } = (await engineer.call(project, { params }))
      .answer;
    const body = { title, kind, siteTimeZone, paper, description };
    const { answer } = await engineer.call(updateProject, { params, version: lockVersion, body });
    expect(answer.lockVersion).toBe(lockVersion);
  });

  it('are known to those whose roles reach them, and to nobody else', async () => {
    const { client } = await test.signedIn({ roles: ['engineer'], projects: ['KL221'] });
    const list = (await client.call(projects)).answer.items;
    expect(list.map(({ code, mayEdit }) => ({ code, mayEdit }))).toEqual([{ code: 'KL221', mayEdit: true }]);
    expect((await client.call(project, { params: { code: 'OND220' } })).status).toBe(404);
    expect((await client.call(towerFamilies, { params: { code: 'OND220' } })).status).toBe(404);
    expect((await client.call(designBasis, { params: { code: 'OND220' } })).status).toBe(404);
    const { code, ...content } = { ...LINE, code: 'OND220' };
    expect((await client.call(updateProject, { params: { code }, version: 1, body: content })).status).toBe(404);
    expect((await client.call(createProject, { body: { ...LINE, code: 'MINE' } })).status).toBe(403);
    const nobody = await test.signedIn({ roles: [] });
    expect((await nobody.client.call(projects)).answer.items).toEqual([]);
  });

  it('are searched and filtered', async () => {
    const yards = await engineer.call(projects, { query: { kind: 'yard' } });
    expect(yards.answer.items.map(({ code }) => code)).toEqual(['OND220']);
    const found = await engineer.call(projects, { query: { search: 'saltgrave', sort: '-updatedAt' } });
    expect(found.answer.items.map(({ code }) => code)).toContain('KL221');
  });

  describe('and their design basis', () => {
    const params = { code: 'OND220' };
    const save = (version: number, change: object = {}) =>
      engineer.call(saveDesignBasis, { params, version, body: { ...BASIS, ...change } });

    it('begins at version 0 and makes a new revision with each save', async () => {
      const none = await engineer.call(designBasis, { params });
      expect(none.headers.etag).toBe('"0"');
      expect(none.answer).toEqual({ current: null, earlier: [] });

      const first = await save(0, { system: { ...BASIS.system, highestVoltageKv: 220, insulationLevel: null } });
      expect(first.status).toBe(200);
      expect(first.headers.etag).toBe('"1"');
      const second = await save(1, { note: '245 kV' });
      expect(second.answer).toMatchObject({ revision: 2, createdBy: 'Tamsin Orvelle', note: '245 kV' });
      expect((await save(2, { note: '245 kV' })).answer.revision).toBe(2);

      const history = (await engineer.call(designBasis, { params })).answer;
      expect(history.current).toEqual(second.answer);
      expect(history.earlier).toEqual([first.answer]);
      const shown = (await engineer.call(project, { params })).answer;
      expect(shown).toMatchObject({
        nominalVoltageKv: 220,
        highestVoltageKv: 245,
        basisNumber: 'DB-KL221',
        basisRevision: 2,
      });
    });

    it('is saved from the newest revision only', async () => {
      const stale = await save(1, { note: 'from an old page' });
      expect(stale.status).toBe(409);
      expect(stale.problem).toMatchObject({
        code: 'newer-version',
        current: { revision: 2, note: '245 kV' },
        changedBy: 'Tamsin Orvelle',
      });
      const [one, two] = await Promise.all([save(2, { note: 'one' }), save(2, { note: 'two' })]);
      expect([one.status, two.status].sort()).toEqual([200, 409]);
    });

    it.each([
      [
        'a level that is no row',
        { insulationLevel: { lightningKv: 999, switchingKv: null } },
        'system.insulationLevel',
      ],
      ['Um below Un', { highestVoltageKv: 200 }, 'system.highestVoltageKv'],
      ['an earthed neutral with a fault that stays', { earthFault: 'sustained' }, 'system.earthFault'],
      ['a voltage of zero', { nominalVoltageKv: 0 }, 'system.nominalVoltageKv'],
      ['60 Hz twice', { frequencyHz: 120 }, 'system.frequencyHz'],
    ])('is refused with %s', async (_, change, path) => {
      const { status, problem } = await save(3, { system: { ...BASIS.system, ...change } });
      expect(status).toBe(422);
      expect(problem.errors.map((error) => error.path)).toContain(path);
    });

    it('is shown to those who see drafts, and leaves no trace for the others', async () => {
      for (const role of ['reader', 'procurement'] as const) {
        const { client } = await test.signedIn({ roles: [role] });
        expect((await client.call(designBasis, { params })).status).toBe(403);
        const shown = (await client.call(project, { params })).answer;
        expect(shown).toMatchObject({ basisNumber: null, basisRevision: null, highestVoltageKv: null, mayEdit: false });
      }
      const { client } = await test.signedIn({ roles: ['checker'] });
      expect((await client.call(designBasis, { params })).status).toBe(200);
      expect((await client.call(saveDesignBasis, { params, version: 3, body: BASIS })).status).toBe(403);
    });

    it('is not shown to an engineer of another line who only reads this one', async () => {
      const { client, person } = await test.signedIn({ roles: ['engineer'], projects: ['KL221'] });
      await test.database.owner('role_grants').insert({ user_id: person.id, role: 'reader', valid_from: '2020-01-01' });
      const again = await test.signIn(person);
      expect((await again.call(designBasis, { params })).status).toBe(404);
      expect((await again.call(designBasis, { params: { code: 'KL221' } })).status).toBe(200);
      expect((await again.call(saveDesignBasis, { params, version: 3, body: BASIS })).status).toBe(403);
      client.cookie = null;
    });

    it('leaves each change in the trail with its fields', async () => {
      const rows = await test.database.owner('audit_events').where({ action: 'design-basis.revised' }).orderBy('id');
      expect((rows[1] as { changes: Record<string, unknown> }).changes).toMatchObject({
        'system.highestVoltageKv': { from: 220, to: 245 },
        note: { from: 'First issue', to: '245 kV' },
      });
    });
  });
});
