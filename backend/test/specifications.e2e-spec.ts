import { contract, type SpecificationInput } from '@bellgap/common/api';
import { begin, lineInput, makeLine, reviseBasis, SYSTEM_220 } from './support/line-project';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { createSpecification, revision, saveRevision, specifications, takeBasis } = contract;

describe('specifications', () => {
  let test: TestApp;
  let engineer: TestClient;
  const at = (number: string, label = 'latest') => ({ code: 'L1', number, label });
  const draft = (input: SpecificationInput, overrides: { path: string; reason: string }[] = []) => ({
    title: 'Suspension strings',
    input,
    overrides,
  });

  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: engineer } = await test.signedIn({ name: 'Edda Rowan', roles: ['engineer'] }));
    await makeLine(engineer, 'L1');
  });
  afterAll(() => test.stop());

  describe('beginning one', () => {
    it('takes the values of the design basis and leaves the rest to be chosen', async () => {
      const begun = await begin(engineer, 'L1', 'S-1');
      expect(begun).toMatchObject({
        label: 'A',
        state: 'draft',
        number: 'S-1',
        lockVersion: 1,
        overrides: [],
        basis: { number: 'DB-L1', revision: 1 },
        newerBasisRevision: null,
        drafted: { name: 'Edda Rowan' },
        mayEdit: true,
        lastSheet: null,
        input: { kind: 'line', basis: 'iec', system: SYSTEM_220, site: null },
      });
      expect(begun.input.string).toBeUndefined();
      expect(begun.evaluation!.string).toBeNull();
    });

    it('refuses a number that is taken, and says so at the field', async () => {
      await begin(engineer, 'L1', 'S-2');
      const body = { number: 'S-2', title: 'Again', kind: 'line' };
      const { status, problem } = await engineer.call(createSpecification, { params: { code: 'L1' }, body });
      expect(status).toBe(409);
      expect(problem.errors).toMatchObject([{ path: 'number' }]);
    });

    it('refuses a project without a design basis in words', async () => {
      const project = { code: 'L0', title: 'Bare', kind: 'line', siteTimeZone: 'UTC', paper: 'A4', description: '' };
      await engineer.call(contract.createProject, { body: project });
      const body = { number: 'S-1', title: 'First', kind: 'line' };
      const { status, problem } = await engineer.call(createSpecification, { params: { code: 'L0' }, body });
      expect(status).toBe(422);
      expect(problem.errors).toEqual([
        { path: 'projectCode', message: 'L0 has no design basis yet; enter its voltages and level first' },
      ]);
    });
  });

  describe('saving', () => {
    it('stores input and answer together and gives them back after a reload', async () => {
      await begin(engineer, 'L1', 'S-10');
      const saved = await engineer.call(saveRevision, { params: at('S-10'), version: 1, body: draft(lineInput()) });
      expect(saved.status).toBe(200);
      expect(saved.headers.etag).toBe('"2"');
      expect(saved.answer).toMatchObject({ lockVersion: 2, title: 'Suspension strings', savedBy: 'Edda Rowan' });
      expect(saved.answer.evaluation!.string?.units).toBeGreaterThan(0);
      expect(saved.answer.evaluation!.trace.length).toBeGreaterThan(0);
      expect(saved.answer.context.insulator).toMatchObject({ code: 'U160BL', version: 1 });

      const { answer, headers } = await engineer.call(revision, { params: at('S-10', 'A') });
      expect(answer).toEqual(saved.answer);
      expect(headers.etag).toBe('"2"');
    });

    it('keeps every blank of a draft', async () => {
      await begin(engineer, 'L1', 'S-11');
      const input: SpecificationInput = { ...lineInput(), site: { altitudeM: null, pollution: null }, string: null };
      const { answer } = await engineer.call(saveRevision, { params: at('S-11'), version: 1, body: draft(input) });
      expect(answer.input.site).toEqual({ altitudeM: null, pollution: null });
      expect(answer.evaluation!.string).toBeNull();
    });

    it('makes no new version where nothing has changed', async () => {
      await begin(engineer, 'L1', 'S-12');
      const save = (version: number) =>
        engineer.call(saveRevision, { params: at('S-12'), version, body: draft(lineInput()) });
      expect((await save(1)).answer.lockVersion).toBe(2);
      expect((await save(2)).answer.lockVersion).toBe(2);
    });

    it('writes who changed what, from which value to which', async () => {
      const { id } = await begin(engineer, 'L1', 'S-13');
      const save = (version: number, altitudeM: number) =>
        engineer.call(saveRevision, {
          params: at('S-13'),
          version,
          body: draft(lineInput({ site: { altitudeM, pollution: null } })),
        });
      await save(1, 900);
      await save(2, 1200);
      const events = (await test.database
        .owner('audit_events')
        .where({ entity: 'revision', entity_id: id })
        .orderBy('id')
        .select('action', 'changes')) as { action: string; changes: Record<string, unknown> }[];
      expect(events.map(({ action }) => action)).toEqual(['specification.created', 'revision.saved', 'revision.saved']);
      expect(events[2]!.changes).toMatchObject({ 'input.site.altitudeM': { from: 900, to: 1200 } });
      expect(Object.keys(events[2]!.changes).filter((path) => path.startsWith('input.'))).toHaveLength(1);
    });

    it('asks for the version it was made from', async () => {
      await begin(engineer, 'L1', 'S-14');
      const { status } = await engineer.call(saveRevision, { params: at('S-14'), body: draft(lineInput()) });
      expect(status).toBe(428);
    });

    it('shows the second of two people what stands now, and stores nothing of his', async () => {
      const { client: other } = await test.signedIn({ name: 'Jonas Vell', roles: ['engineer'] });
      await begin(engineer, 'L1', 'S-15');
      await other.call(saveRevision, { params: at('S-15'), version: 1, body: draft(lineInput()) });
      const late = await engineer.call(saveRevision, {
        params: at('S-15'),
        version: 1,
        body: draft(lineInput({ site: { altitudeM: 1500, pollution: null } })),
      });
      expect(late.status).toBe(409);
      expect(late.problem).toMatchObject({
        code: 'newer-version',
        changedBy: 'Jonas Vell',
        current: { lockVersion: 2, input: { site: { altitudeM: 900 } } },
      });
      expect((await engineer.call(revision, { params: at('S-15') })).answer.input.site?.altitudeM).toBe(900);
    });
  });

  describe('the design basis', () => {
    it('refuses a departure that is not marked, in words', async () => {
      await begin(engineer, 'L1', 'S-20');
      const input = lineInput({ system: { ...SYSTEM_220, faultCurrentKa: 25 } });
      const { status, problem } = await engineer.call(saveRevision, {
        params: at('S-20'),
        version: 1,
        body: draft(input),
      });
      expect(status).toBe(422);
      expect(problem.errors).toEqual([
        {
          path: 'input.system.faultCurrentKa',
          message:
            'Fault current: 25 kA differs from 31.5 kA of the design basis DB-L1 revision 1; override it with a reason, or take the basis',
        },
      ]);
    });

    it('keeps an override with its reason, and warns of one without', async () => {
      await begin(engineer, 'L1', 'S-21');
      const input = lineInput({ system: { ...SYSTEM_220, faultCurrentKa: 25 } });
      const save = (version: number, reason: string) =>
        engineer.call(saveRevision, {
          params: at('S-21'),
          version,
          body: draft(input, [{ path: 'system.faultCurrentKa', reason }]),
        });
      const codes = ({ cautions }: { cautions: { code: string }[] }) => cautions.map(({ code }) => code);
      const bare = await save(1, '');
      expect(bare.status).toBe(200);
      expect(codes(bare.answer.evaluation!)).toContain('override-without-reason');
      const reasoned = await save(2, 'Mid-line fault level after the network study');
      expect(codes(reasoned.answer.evaluation!)).not.toContain('override-without-reason');
      expect(reasoned.answer.overrides).toEqual([
        { path: 'system.faultCurrentKa', reason: 'Mid-line fault level after the network study' },
      ]);
    });

    it('flags a newer revision, and takes it over save what is overridden', async () => {
      await makeLine(engineer, 'L2');
      await begin(engineer, 'L2', 'S-1');
      const params = { code: 'L2', number: 'S-1', label: 'latest' };
      const overrides = [{ path: 'system.faultDurationS', reason: 'Slow protection at the far end' }];
      const input = lineInput({ system: { ...SYSTEM_220, faultDurationS: 3 } });
      await engineer.call(saveRevision, { params, version: 1, body: draft(input, overrides) });
      await reviseBasis(engineer, 'L2', 1, { ...SYSTEM_220, faultCurrentKa: 40, faultDurationS: 2 });

      const flagged = await engineer.call(revision, { params });
      expect(flagged.answer).toMatchObject({ basis: { revision: 1 }, newerBasisRevision: 2 });
      const taken = await engineer.call(takeBasis, { params, version: 2 });
      expect(taken.answer).toMatchObject({
        lockVersion: 3,
        basis: { revision: 2 },
        newerBasisRevision: null,
        input: { system: { faultCurrentKa: 40, faultDurationS: 3 }, site: { altitudeM: 900 } },
        overrides,
      });
    });
  });

  describe('what cannot be read is refused at its field, and nothing is stored', () => {
    const string = lineInput().string!;
    const bad: [what: string, input: unknown, path: string][] = [
      ['Um below Un', lineInput({ system: { ...SYSTEM_220, highestVoltageKv: 200 } }), 'input.system.highestVoltageKv'],
      [
        'a voltage of 0',
        lineInput({ system: { ...SYSTEM_220, nominalVoltageKv: 0 } }),
        'input.system.nominalVoltageKv',
      ],
      ['text in a number', { ...lineInput(), site: { altitudeM: '900' } }, 'input.site.altitudeM'],
      ['a class that is none', { ...lineInput(), site: { pollution: { class: 'f' } } }, 'input.site.pollution.class'],
      ['an unknown field', { ...lineInput(), colour: 'red' }, 'input.colour'],
      [
        'effective with sustained',
        lineInput({ system: { ...SYSTEM_220, earthFault: 'sustained' } }),
        'input.system.earthFault',
      ],
      ['horns without a gap', lineInput({ string: { ...string, arcingDevices: 'horns' } }), 'input.string.arcGapMm'],
      ['a unit that is none', lineInput({ string: { ...string, insulatorCode: 'X1' } }), 'input.string.insulatorCode'],
      ['another kind', lineInput({ kind: 'bay' }), 'input.kind'],
    ];
    beforeAll(() => begin(engineer, 'L1', 'S-30'));

    it.each(bad)('%s', async (_, input, path) => {
      const overrides = [
        { path: 'system.nominalVoltageKv', reason: 'test' },
        { path: 'system.highestVoltageKv', reason: 'test' },
        { path: 'system.earthFault', reason: 'test' },
      ];
      const { status, problem } = await engineer.call(saveRevision, {
        params: at('S-30'),
        version: 1,
        body: { title: 'Bad', input, overrides },
      });
      expect(status).toBe(422);
      expect(problem.errors.map((error) => error.path)).toContain(path);
      expect((await engineer.call(revision, { params: at('S-30') })).answer.lockVersion).toBe(1);
    });

    it('a level that is no row', async () => {
      const insulationLevel = { ...SYSTEM_220.insulationLevel!, powerFrequencyKv: 395 };
      const { status, problem } = await engineer.call(saveRevision, {
        params: at('S-30'),
        version: 1,
        body: draft(lineInput({ system: { ...SYSTEM_220, insulationLevel } }), [
          { path: 'system.insulationLevel', reason: 'test' },
        ]),
      });
      expect(status).toBe(422);
      expect(problem.errors[0]!.path).toMatch(/^input\.system\.insulationLevel/);
    });

    it('a body of 10 MB', async () => {
      const { status } = await engineer.call(saveRevision, {
        params: at('S-30'),
        version: 1,
        body: { ...draft(lineInput()), title: 'x'.repeat(10_000_000) },
      });
      expect(status).toBe(413);
    });

    it('but keeps a draft that lies outside the method, without figures and with a stop', async () => {
      await begin(engineer, 'L1', 'S-31');
      const { status, answer } = await engineer.call(saveRevision, {
        params: at('S-31'),
        version: 1,
        body: draft(lineInput({ site: { ...lineInput().site!, altitudeM: 6000 } })),
      });
      expect(status).toBe(200);
      expect(answer.evaluation!.cautions).toContainEqual(
        expect.objectContaining({ severity: 'stop', field: 'site.altitudeM' }),
      );
      expect(answer.evaluation!.string?.units ?? null).toBeNull();
    });
  });

  describe('lists', () => {
    beforeAll(async () => {
      await makeLine(engineer, 'L3');
      for (const [i, number] of ['T-1', 'T-2', 'T-3', 'T-4', 'T-5'].entries()) {
        await begin(engineer, 'L3', number);
        if (i === 4) continue;
        const site = { ...lineInput().site!, altitudeM: 100 * (4 - i) };
        await engineer.call(saveRevision, {
          params: { code: 'L3', number, label: 'A' },
          version: 1,
          body: { title: `Zone ${number}`, input: lineInput({ site }), overrides: [] },
        });
      }
    });
    const numbers = (items: { number: string }[]) => items.map(({ number }) => number);
    const list = (query: Record<string, string>, client = engineer) =>
      client.call(specifications, { params: { code: 'L3' }, query });

    it('read plain columns', async () => {
      const { answer } = await list({ search: 'T-1' });
      expect(answer.items).toMatchObject([
        {
          number: 'T-1',
          title: 'Zone T-1',
          label: 'A',
          state: 'draft',
          insulatorCode: 'U160BL',
          governedBy: 'pollution',
          highestVoltageKv: 245,
          altitudeM: 400,
          pollutionSeverity: 'd',
          savedBy: 'Edda Rowan',
          newerBasisRevision: null,
        },
      ]);
      expect(answer.items[0]!.units).toBeGreaterThan(0);
    });

    it('page both ways in the order asked for, blanks last', async () => {
      const first = (await list({ sort: 'altitudeM', limit: '2' })).answer;
      expect(numbers(first.items)).toEqual(['T-4', 'T-3']);
      expect(first.previous).toBeNull();
      const second = (await list({ sort: 'altitudeM', limit: '2', cursor: first.next! })).answer;
      expect(numbers(second.items)).toEqual(['T-2', 'T-1']);
      const third = (await list({ sort: 'altitudeM', limit: '2', cursor: second.next! })).answer;
      expect(numbers(third.items)).toEqual(['T-5']);
      expect(third.next).toBeNull();
      const back = (await list({ sort: 'altitudeM', limit: '2', cursor: third.previous! })).answer;
      expect(numbers(back.items)).toEqual(['T-2', 'T-1']);
    });

    it('search in number and title, and filter by state', async () => {
      expect(numbers((await list({ search: 'zone t-3' })).answer.items)).toEqual(['T-3']);
      expect((await list({ state: 'issued' })).answer.items).toEqual([]);
      expect((await list({ sort: 'input' })).status).toBe(422);
    });
  });

  describe('who may see a draft', () => {
    beforeAll(() => begin(engineer, 'L1', 'S-40'));

    it.each(['reader', 'procurement'] as const)('not a %s: no such thing, and an empty list', async (role) => {
      const { client } = await test.signedIn({ roles: [role] });
      expect((await client.call(revision, { params: at('S-40') })).status).toBe(404);
      const { answer } = await client.call(specifications, { params: { code: 'L1' } });
      expect(answer).toEqual({ items: [], next: null, previous: null });
      expect((await client.call(contract.desk)).answer).toEqual({
        waiting: [],
        returned: [],
        drafts: [],
        outdated: [],
        issued: [],
        endingConcessions: [],
      });
    });

    it('a checker may read and not write', async () => {
      const { client } = await test.signedIn({ roles: ['checker'] });
      const { answer } = await client.call(revision, { params: at('S-40') });
      expect(answer.mayEdit).toBe(false);
      const save = await client.call(saveRevision, { params: at('S-40'), version: 1, body: draft(lineInput()) });
      expect(save.status).toBe(403);
    });

    it('nobody whose role is limited to another project', async () => {
      await makeLine(engineer, 'L9');
      const { client } = await test.signedIn({ roles: ['engineer'], projects: ['L9'] });
      expect((await client.call(revision, { params: at('S-40') })).status).toBe(404);
      expect((await client.call(specifications, { params: { code: 'L1' } })).status).toBe(404);
    });
  });

  it('shows on the desk what one began or saved, and what stands on an older basis', async () => {
    const { client } = await test.signedIn({ name: 'Ivo Tarn', roles: ['engineer'] });
    await makeLine(client, 'L4');
    await begin(client, 'L4', 'D-1');
    await begin(engineer, 'L4', 'D-2');
    await reviseBasis(client, 'L4', 1, { ...SYSTEM_220, faultCurrentKa: 40 });
    const { answer } = await client.call(contract.desk);
    expect(answer.drafts.map(({ number }) => number)).toEqual(['D-1']);
    expect(answer.outdated.map(({ number }) => number)).toEqual(expect.arrayContaining(['D-1', 'D-2']));
    expect(answer.drafts[0]).toMatchObject({ projectCode: 'L4', newerBasisRevision: 2 });
  });
});
