import { contract } from '@bellgap/common/api';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { companySettings, saveCompanySettings } = contract;

describe('company settings', () => {
  let test: TestApp;
  let administrator: TestClient;
  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: administrator } = await test.signedIn({ name: 'Wen Tollarsson', roles: ['administrator'] }));
  });
  afterAll(() => test.stop());

  it('come with the product as version 1 and are added to, never changed', async () => {
    const first = await administrator.call(companySettings);
    expect(first.headers.etag).toBe('"1"');
    expect(first.answer).toMatchObject({ version: 1, setBy: null });
    const settings = { ...first.answer.settings, altitudeStepM: 50 };
    const body = { settings, reason: 'Finer steps' };
    const saved = await administrator.call(saveCompanySettings, { version: 1, body });
    expect(saved.status).toBe(200);
    expect(saved.headers.etag).toBe('"2"');
    expect(saved.answer).toMatchObject({ version: 2, settings, setBy: 'Wen Tollarsson', reason: 'Finer steps' });
    expect((await administrator.call(companySettings)).answer).toEqual(saved.answer);
    expect(await test.database.owner('company_settings').orderBy('version').pluck('version')).toEqual([1, 2]);
    const [event] = await test.database.owner('audit_events').where({ entity: 'company-settings' });
    expect(event).toMatchObject({ changes: { altitudeStepM: { from: 100, to: 50 } }, reason: 'Finer steps' });
  });

  it('are set from the version in force only', async () => {
    const { settings } = (await administrator.call(companySettings)).answer;
    const body = { settings, reason: 'Late' };
    const stale = await administrator.call(saveCompanySettings, { version: 1, body });
    expect(stale.status).toBe(409);
    expect(stale.problem).toMatchObject({ current: { version: 2 }, changedBy: 'Wen Tollarsson' });
    expect((await administrator.call(saveCompanySettings, { body })).status).toBe(428);
    const both = await Promise.all([1, 2].map(() => administrator.call(saveCompanySettings, { version: 2, body })));
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  it('are refused with the full path of what is wrong', async () => {
    const { settings } = (await administrator.call(companySettings)).answer;
    const level = { highestVoltageKv: 245, powerFrequencyKv: null, switchingKv: null, switchingPhaseRatio: null };
    const wrong = {
      ...settings,
      tensionExtraUnits: -1,
      insulationLevels: [{ ...level, lightningKv: '900', reason: 'x', odd: 1 }],
    };
    const { status, problem } = await administrator.call(saveCompanySettings, {
      version: 3,
      body: { settings: wrong, reason: '' },
    });
    expect(status).toBe(422);
    expect(problem.errors.map(({ path }) => path).sort()).toEqual([
      'reason',
      'settings.insulationLevels[0].lightningKv',
      'settings.insulationLevels[0].odd',
      'settings.tensionExtraUnits',
    ]);
  });
});
