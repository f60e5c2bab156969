import { contract } from '@bellgap/common/api';
import { lineInput, SYSTEM_220 } from './support/line-project';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { evaluate, evaluateBatch } = contract;

describe('evaluations', () => {
  let test: TestApp;
  let reader: TestClient;

  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: reader } = await test.signedIn({ roles: ['reader'] }));
  });
  afterAll(() => test.stop());

  it('answers whoever is signed in, with the trace unless it is not wanted', async () => {
    const full = await reader.call(evaluate, { body: { input: lineInput() } });
    expect(full.status).toBe(200);
    expect(full.answer.trace.length).toBeGreaterThan(0);
    const short = await reader.call(evaluate, { body: { input: lineInput(), trace: false } });
    expect(short.answer).toEqual({ ...full.answer, trace: [] });
    expect((await test.stranger().call(evaluate, { body: { input: lineInput() } })).status).toBe(401);
  });

  it('uses the company settings in force', async () => {
    const input = lineInput({ string: { ...lineInput().string!, arrangement: 'tension' } });
    const { answer } = await reader.call(evaluate, { body: { input } });
    const { settings } = (await test.database
      .owner('company_settings')
      .orderBy('version', 'desc')
      .first('settings')) as {
      settings: { tensionExtraUnits: number };
    };
    expect(answer.string?.extraUnits).toBe(settings.tensionExtraUnits);
  });

  it('stores nothing', async () => {
    const count = async () => (await test.database.owner('revisions').count().first()) as { count: number };
    const before = await count();
    await reader.call(evaluate, { body: { input: lineInput() } });
    expect(await count()).toEqual(before);
  });

  it.each([
    ['altitude 6000 m', lineInput({ site: { ...lineInput().site!, altitudeM: 6000 } }), 'site.altitudeM'],
    [
      'Um 2000 kV',
      lineInput({ system: { ...SYSTEM_220, highestVoltageKv: 2000, insulationLevel: null } }),
      'system.highestVoltageKv',
    ],
  ])('says stop and gives no figure outside the method: %s', async (_, input, field) => {
    const { status, answer } = await reader.call(evaluate, { body: { input } });
    expect(status).toBe(200);
    expect(answer.cautions).toContainEqual(expect.objectContaining({ severity: 'stop', field }));
    expect(answer.string?.units ?? null).toBeNull();
    expect(answer.clearances?.phaseToEarthMm ?? null).toBeNull();
  });

  it('names every fault at once, at its place in the body', async () => {
    const input = { ...lineInput(), colour: 'red', site: { altitudeM: 'high', pollution: { class: 'f', depth: 1 } } };
    const { status, problem } = await reader.call(evaluate, { body: { input, extra: 1 } });
    expect(status).toBe(422);
    expect(problem.errors.map(({ path }) => path).sort()).toEqual([
      'extra',
      'input.colour',
      'input.site.altitudeM',
      'input.site.pollution.class',
      'input.site.pollution.depth',
    ]);
  });

  it('answers an input without any figure with blanks', async () => {
    const input = { kind: 'line', basis: null, system: null, site: null };
    const { status, answer } = await reader.call(evaluate, { body: { input } });
    expect(status).toBe(200);
    expect(answer.string).toBeNull();
    expect(answer.notAssessed.length).toBeGreaterThan(0);
  });

  it('evaluates many in order and names the one that cannot be read', async () => {
    const at = (altitudeM: number) => lineInput({ site: { ...lineInput().site!, altitudeM } });
    const { answer } = await reader.call(evaluateBatch, { body: { inputs: [at(500), at(2500)], trace: false } });
    const alone = await reader.call(evaluate, { body: { input: at(2500), trace: false } });
    expect(answer).toHaveLength(2);
    expect(answer[1]).toEqual(alone.answer);
    const unknown = lineInput({ string: { ...lineInput().string!, insulatorCode: 'X1' } });
    const { problem } = await reader.call(evaluateBatch, { body: { inputs: [at(500), unknown] } });
    expect(problem.errors.map(({ path }) => path)).toEqual(['inputs[1].string.insulatorCode']);
  });

  it('takes 500 in one batch and refuses 501', async () => {
    const inputs = Array.from({ length: 501 }, () => lineInput());
    const whole = await reader.call(evaluateBatch, { body: { inputs: inputs.slice(1), trace: false } });
    expect(whole.answer).toHaveLength(500);
    expect((await reader.call(evaluateBatch, { body: { inputs, trace: false } })).status).toBe(422);
  });
});
