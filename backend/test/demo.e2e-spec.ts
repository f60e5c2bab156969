import { contract } from '@bellgap/common/api';
import { DEMO_PASSWORD, seedDemo } from '@bellgap/database';
import { readAuthor } from '../src/demo/people';
import { StoryClock } from '../src/demo/story-clock';
import { tellStory } from '../src/demo/tell-story';
import { AppModule } from '../src/app.module';
import { loadConfig } from '../src/platform/config';
import { DesignBasesService } from '../src/projects/design-bases.service';
import { SheetsService } from '../src/sheets/sheets.service';
import { SpecificationsService } from '../src/specifications/specifications.service';
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
      return await tellStory({
        clock,
        bases: app.get(DesignBasesService),
        specifications: app.get(SpecificationsService),
        sheets: app.get(SheetsService),
        author: (author) => readAuthor(author, test.database.owner),
      });
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

  it('stand as drafts of both lines with their figures, none of them in the future', async () => {
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

  it('show an override with its reason, and a sheet that was drawn', async () => {
    const get = async (number: string) =>
      (await orvelle.call(contract.revision, { params: { code: 'KL221', number, label: 'latest' } })).answer;
    expect((await get('INS-221-004')).overrides).toHaveLength(1);
    expect((await get('INS-221-001')).lastSheet).toMatchObject({ current: true, drawnBy: 'Tamsin Orvelle' });
  });
});
