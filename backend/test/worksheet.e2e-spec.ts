import { contract, type Evaluation } from '@bellgap/common/api';
import { aWorksheet } from '../../common/src/engine/testing/worksheets';
import { makeLine, SYSTEM_220 } from './support/line-project';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { insulationLevelWorksheet, designBasis, saveDesignBasis } = contract;

describe('the insulation level worksheet', () => {
  let test: TestApp;
  let engineer: TestClient;

  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: engineer } = await test.signedIn({ roles: ['engineer'] }));
  });
  afterAll(() => test.stop());

  /** IEC 60071-2:1996, annex H.1: 245 kV at 1000 m, 395 and 950 kV (from memory, not verified). */
  it('proposes the row that the standard finds in its example, step by step', async () => {
    const { client: reader } = await test.signedIn({ roles: ['reader'] });
    const { status, answer } = await reader.call(insulationLevelWorksheet, { body: aWorksheet() });
    expect(status).toBe(200);
    expect(answer.proposedLevel).toMatchObject({ powerFrequencyKv: 395, lightningKv: 950 });
    expect(answer.levelHoldsToM).toBe(1000);
    expect(answer.trace.length).toBeGreaterThan(10);
  });

  it('answers blanks by what is missing, and refuses what cannot be read', async () => {
    const blank = await engineer.call(insulationLevelWorksheet, { body: { ...aWorksheet(), highestVoltageKv: null } });
    expect(blank.answer).toMatchObject({ proposedLevel: null, rows: [] });
    const wrong = { ...aWorksheet(), earthFaultFactor: 0.5, colour: 'red' };
    const { status, problem } = await engineer.call(insulationLevelWorksheet, { body: wrong });
    expect(status).toBe(422);
    expect(problem.errors.map(({ path }) => path).sort()).toEqual(['colour', 'earthFaultFactor']);
  });

  it('is kept with the revision of the design basis that rests on it', async () => {
    const { number, basis, rules, worksheet } = await makeLine(engineer, 'WORK1');
    expect(worksheet).toBeNull();
    const params = { code: 'WORK1' };
    const body = { number, basis, rules, system: SYSTEM_220, note: 'Level worked out', worksheet: aWorksheet() };
    const { status, answer } = await engineer.call(saveDesignBasis, { params, version: 1, body });
    expect(status).toBe(200);
    expect(answer).toMatchObject({ revision: 2, worksheet: aWorksheet() });
    const { answer: history } = await engineer.call(designBasis, { params });
    expect(history.current?.worksheet).toEqual(aWorksheet());
    expect(history.earlier[0]?.worksheet).toBeNull();
    const again = await engineer.call(saveDesignBasis, { params, version: 2, body });
    expect(again.answer.revision).toBe(2);
    const odd = { ...body, worksheet: { ...aWorksheet(), altitudeM: 'high' } };
    const refused = await engineer.call(saveDesignBasis, { params, version: 2, body: odd });
    expect(refused.problem.errors.map(({ path }) => path)).toEqual(['worksheet.altitudeM']);
  });

  it('carries the altitude of the level on into a specification that inherits the basis', async () => {
    const { number, basis, rules } = await makeLine(engineer, 'WORK2');
    const { answer: found } = await engineer.call(insulationLevelWorksheet, { body: aWorksheet({ altitudeM: 2310 }) });
    const { lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio } = found.proposedLevel!;
    const { levelHoldsToM } = found;
    const insulationLevel = { lightningKv, switchingKv, powerFrequencyKv, switchingPhaseRatio, levelHoldsToM };
    const worksheet = aWorksheet({ altitudeM: 2310 });
    const body = { number, basis, rules, system: { ...SYSTEM_220, insulationLevel }, note: '', worksheet };
    await engineer.call(saveDesignBasis, { params: { code: 'WORK2' }, version: 1, body });

    const { answer: draft } = await engineer.call(contract.createSpecification, {
      params: { code: 'WORK2' },
      body: { number: 'INS-WORK-001', title: 'Strings at 2310 m', kind: 'line' },
    });
    expect(draft.basis?.worksheet).toEqual(worksheet);
    expect(draft.input.system?.insulationLevel).toMatchObject({ lightningKv: 1050, levelHoldsToM: 2310 });
    const at = async (altitudeM: number) => {
      const input = { ...draft.input, site: { altitudeM, pollution: null } } as never;
      const { answer } = await engineer.call(contract.evaluate, { body: { input, trace: false } });
      return (answer as Evaluation).clearances!.rows.find(({ method }) => method === 'iec-table')!;
    };
    expect(await at(2310)).toMatchObject({ h0M: 2310, altitudeFactor: 1, valueMm: 2100 });
    expect((await at(2400)).altitudeFactor).toBeGreaterThan(1);
  });
});
