import { contract, type CatalogueUnit } from '@bellgap/common/api';
import { ANSI_C29_2_UNITS, IEC_60305_UNITS } from '@bellgap/common/engine';
import { seedDemo } from '@bellgap/database';
import { CatalogueService } from '../src/catalogue/catalogue.service';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { conductors, insulationLevels, insulator, insulators } = contract;

describe('catalogue', () => {
  let test: TestApp;
  let reader: TestClient;

  beforeAll(async () => {
    test = await TestApp.start();
    await seedDemo(test.database.owner);
    ({ client: reader } = await test.signedIn({ roles: ['reader'] }));
  });
  afterAll(() => test.stop());

  const codes = (units: CatalogueUnit[]) => units.map(({ code }) => code);
  const list = async (query: Record<string, string>) => (await reader.call(insulators, { query })).answer;

  it('holds every class of the standards with its source, once however often the product starts', async () => {
    await test.app.get(CatalogueService).addStandardUnits();
    const iec = await list({ family: 'iec-60305', limit: '200' });
    expect(codes(iec.items).sort()).toEqual(IEC_60305_UNITS.rows.map(({ designation }) => designation).sort());
    const ansi = await list({ family: 'ansi-c29.2', limit: '200' });
    expect(codes(ansi.items).sort()).toEqual(ANSI_C29_2_UNITS.rows.map(({ ansiClass }) => ansiClass).sort());
    for (const { version, source } of [...iec.items, ...ansi.items]) {
      expect(version).toBe(1);
      expect(source.document).toMatch(/IEC 60305|C29\.2/);
    }
  });

  it('gives the dimensions of the sheds where they are known, and the strength in bending of a post', async () => {
    const { answer: rod } = await reader.call(insulator, { params: { code: 'C120-220' } });
    expect(rod?.sheds).toEqual({
      spacingMm: 92,
      overhangMm: 62,
      secondOverhangMm: 44,
      clearanceMm: 47,
      pathMm: 171,
      pathClearanceMm: 47,
      underRibs: false,
    });
    const { answer: disc } = await reader.call(insulator, { params: { code: 'U120B' } });
    expect(disc).toMatchObject({ sheds: null, cantileverStrengthKn: null });
    const { answer: post } = await reader.call(insulator, { params: { code: 'CP10-66' } });
    expect(post).toMatchObject({ kind: 'line-post', cantileverStrengthKn: 10 });
  });

  it('gives a unit in its newest version', async () => {
    const { answer: first } = await reader.call(insulator, { params: { code: 'G160-S' } });
    expect(first).toMatchObject({ version: 1, creepageMm: 370, source: { status: 'practice' } });
    const row = (await test.database.owner('insulators').where({ code: 'G160-S' }).first()) as Record<string, unknown>;
    const { id: _, ...columns } = row;
    await test.database.owner('insulators').insert({ ...columns, version: 2, creepage_mm: 372 });
    const { answer: second } = await reader.call(insulator, { params: { code: 'G160-S' } });
    expect(second).toMatchObject({ version: 2, creepageMm: 372 });
    expect((await list({ search: 'G160-S' })).items).toMatchObject([{ version: 2 }]);
    expect((await reader.call(insulator, { params: { code: 'X-1' } })).status).toBe(404);
  });

  it('filters and searches', async () => {
    expect(codes((await list({ family: 'company', kind: 'composite-rod' })).items)).toEqual([
      'C120-132',
      'C120-220',
      'C160-220',
    ]);
    expect(codes((await list({ material: 'porcelain', profile: 'fog' })).items)).toEqual(['P120-F', 'P210-F']);
    expect(codes((await list({ search: 'stock from 1987' })).items)).toEqual(['P120-S']);
    expect((await list({ search: '100%_' })).items).toEqual([]);
    expect((await reader.call(insulators, { query: { family: 'mine' } })).status).toBe(422);
  });

  it.each(['code', '-creepageMm', 'diameterMm', '-diameterMm', 'failingLoadKn'])(
    'pages forwards and back sorted by %s without losing or repeating a unit',
    async (sort) => {
      const whole = codes((await list({ sort, limit: '200' })).items);
      const forwards: string[][] = [];
      let page = await list({ sort, limit: '7' });
      forwards.push(codes(page.items));
      while (page.next) {
        page = await list({ sort, limit: '7', cursor: page.next });
        forwards.push(codes(page.items));
      }
      expect(forwards.flat()).toEqual(whole);
      const back = [codes(page.items)];
      while (page.previous) {
        page = await list({ sort, limit: '7', cursor: page.previous });
        back.unshift(codes(page.items));
      }
      expect(back.flat()).toEqual(whole);
    },
  );

  it('lists conductors', async () => {
    const { answer } = await reader.call(conductors);
    expect(answer).toContainEqual(expect.objectContaining({ code: 'KC-400', diameterMm: 27.6, weightNPerM: 14.9 }));
  });

  it('lists the insulation levels by basis', async () => {
    const { answer } = await reader.call(insulationLevels, { query: { basis: 'iec' } });
    // RD 223/2008 ITC-LAT 07 Table 12
    expect(answer).toContainEqual(
      expect.objectContaining({ highestVoltageKv: 245, lightningKv: 1050, powerFrequencyKv: 460, switchingKv: null }),
    );
    const { answer: both } = await reader.call(insulationLevels);
    const { answer: american } = await reader.call(insulationLevels, { query: { basis: 'north-american' } });
    expect(both).toHaveLength(answer.length + american.length);
  });
});
