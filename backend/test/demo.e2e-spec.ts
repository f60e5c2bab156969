import { contract } from '@bellgap/common/api';
import { DEMO_PASSWORD, seedDemo } from '@bellgap/database';
import { storytellersOf } from '../src/demo/acts';
import { StoryClock } from '../src/demo/story-clock';
import { tellStory } from '../src/demo/tell-story';
import { AppModule } from '../src/app.module';
import { loadConfig } from '../src/platform/config';
import { NestFactory } from '@nestjs/core';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

// A sheet takes its time where other tests share the machine.
jest.setTimeout(60_000);

describe('the documents of the demonstration', () => {
  let test: TestApp;
  let orvelle: TestClient;
  let made: string[];

  const tell = async () => {
    const clock = new StoryClock();
    const config = loadConfig({ NODE_ENV: 'test', DATABASE_URL: test.database.url, ROLE: 'web' });
    const app = await NestFactory.createApplicationContext(AppModule.with({ config, clock }), { logger: ['error'] });
    try {
      return await tellStory(storytellersOf(app, clock));
    } finally {
      await app.close();
    }
  };

  beforeAll(async () => {
    test = await TestApp.start();
    await seedDemo(test.database.owner);
    made = await tell();
    orvelle = await test.signIn({ email: 't.orvelle@kigc.example', password: DEMO_PASSWORD });
  });
  afterAll(() => test.stop());

  it('are made once', async () => {
    expect(made).toContain('INS-221-003');
    expect(made).toHaveLength(9);
    expect(await tell()).toEqual([]);
  });

  it('stand in the lists of both lines with their figures, none of them in the future', async () => {
    const list = async (code: string) =>
      (await orvelle.call(contract.specifications, { params: { code } })).answer.items;
    const items = [...(await list('KL221')), ...(await list('KL132'))];
    expect(items.map(({ number }) => number)).toEqual([
      'INS-221-001',
      'INS-221-002',
      'INS-221-003',
      'INS-221-004',
      'INS-221-005',
      'INS-132-001',
      'INS-132-002',
      'INS-132-003',
    ]);
    for (const { savedAt } of items) expect(Date.parse(savedAt)).toBeLessThanOrEqual(Date.now());
    const by = new Map(items.map((item) => [item.number, item]));
    expect(by.get('INS-221-003')).toMatchObject({ units: 17, governedBy: 'pollution', insulatorCode: 'G160-S' });
    expect(by.get('INS-221-005')).toMatchObject({
      units: null,
      draftedBy: 'Tamsin Orvelle',
      savedBy: 'Jorin Bakkarash',
    });
    expect(by.get('INS-132-002')).toMatchObject({ newerBasisRevision: 2 });
    expect(items.filter(({ newerBasisRevision }) => newerBasisRevision !== null)).toHaveLength(1);
    expect(items.filter(({ worstCaution }) => worstCaution === 'stop')).toEqual([]);
  });

  const who = (email: string) => test.signIn({ email, password: DEMO_PASSWORD });
  const at = (number: string, label = 'latest') => ({
    code: number.startsWith('INS-221') ? 'KL221' : 'KL132',
    number,
    label,
  });

  it('show an override with its reason, and a sheet that was drawn', async () => {
    const get = async (number: string) => (await orvelle.call(contract.revision, { params: at(number) })).answer;
    expect((await get('INS-221-004')).overrides).toHaveLength(1);
    expect((await get('INS-221-003')).lastSheet).toMatchObject({ current: true, drawnBy: 'Tamsin Orvelle' });
  });

  it.each([
    ['INS-221-001', 'issued', ['B', '1']],
    ['INS-221-002', 'issued', ['A', '0']],
    ['INS-221-003', 'in_check', ['A']],
    ['INS-221-004', 'draft', ['A', 'B']],
    ['INS-221-005', 'draft', ['A']],
    ['INS-132-001', 'draft', ['A']],
    ['INS-132-002', 'in_check', ['A']],
    ['INS-132-003', 'checked', ['A']],
  ])('have come by their own way: %s is %s', async (number, state, labels) => {
    const { answer } = await orvelle.call(contract.revision, { params: at(number) });
    expect(answer).toMatchObject({ state, labels });
  });

  it('rest on bases that three people have brought to issue', async () => {
    const standing = async (code: string) => {
      const { current, earlier } = (await orvelle.call(contract.designBasis, { params: { code } })).answer;
      return [current!, ...earlier].map(({ revision, state, moves }) => [revision, state, moves.map(({ by }) => by)]);
    };
    const three = ['Tamsin Orvelle', 'Ruben Castellary', 'Amara Holvenstein'];
    expect(await standing('KL221')).toEqual([
      [2, 'issued', three],
      [1, 'draft', []],
    ]);
    expect(await standing('KL132')).toEqual([
      [2, 'issued', three],
      [1, 'superseded', three],
    ]);
  });

  it('stand in the register, and the print of the former issue is told from the one in force', async () => {
    const brant = await who('l.brant@kigc.example');
    const { items } = (await brant.call(contract.sheets, { query: { sort: 'number' } })).answer;
    expect(items.map(({ number, label, standing }) => `${number} ${label} ${standing}`).sort()).toEqual([
      'INS-221-001 0 superseded',
      'INS-221-001 1 current',
      'INS-221-002 0 current',
    ]);
    const former = items.find(({ standing }) => standing === 'superseded')!;
    const sheet = (await brant.call(contract.issuedSheet, { params: { id: former.id } })).answer;
    const params = { verificationCode: sheet.verificationCode };
    const { answer } = await test.stranger().call(contract.verification, { params });
    expect(answer).toMatchObject({ standing: 'superseded', number: 'INS-221-001', revision: '0', supersededBy: '1' });
    expect((await brant.call(contract.revision, { params: at('INS-132-003') })).status).toBe(404);
  });

  it('wait for those who can go on with them', async () => {
    const waiting = async (email: string) =>
      (await (await who(email)).call(contract.desk)).answer.waiting.map(({ why, row }) => `${row.number} ${why}`);
    expect(await waiting('r.castellary@kigc.example')).toEqual(['INS-221-003 check']);
    expect(await waiting('y.sandermo@brackwater.example')).toEqual(['INS-221-003 check', 'INS-132-002 check']);
    expect(await waiting('a.holvenstein@kigc.example')).toEqual(['INS-132-003 approve']);
    expect(await waiting('j.bakkarash@kigc.example')).toEqual(['INS-221-004 answer']);
    expect(await waiting('w.tollarsson@kigc.example')).toEqual([]);
  });

  it('bar who changed a field, with its name and the day, and let the approver issue what is checked', async () => {
    const castellary = await who('r.castellary@kigc.example');
    const { why } = (await castellary.call(contract.check, { params: at('INS-132-002') })).answer;
    expect(why).toMatch(/^You changed .* on \d{4}-\d\d-\d\d; nobody checks or approves his own work\.$/);
    const holvenstein = await who('a.holvenstein@kigc.example');
    const { answer } = await holvenstein.call(contract.approval, { params: at('INS-132-003') });
    expect(answer).toMatchObject({ mayIssue: true, barred: [], nextLabel: '0' });
    expect(answer.acceptances.length).toBeGreaterThan(0);
  });
});
