import { contract } from '@bellgap/common/api';
import { lineInput } from './support/line-project';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { evaluate, sweep, whatIf } = contract;
const CLASSES = ['a', 'b', 'c', 'd', 'e'];

describe('what would be if', () => {
  let test: TestApp;
  let reader: TestClient;

  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: reader } = await test.signedIn({ roles: ['reader'] }));
  });
  afterAll(() => test.stop());

  const stored = async () =>
    Promise.all(['revisions', 'audit_events'].map((table) => test.database.owner(table).count().first()));

  it('shows five cases beside the input and stores nothing', async () => {
    const before = await stored();
    const body = { input: lineInput(), otherCode: 'U120B' };
    const { status, answer } = await reader.call(whatIf, { body });
    expect(status).toBe(200);
    const cases = Object.fromEntries(answer.cases.map((one) => [one.id, one]));
    expect(cases['next-profile']?.changed).toBe('U160BL (standard) to U160BLP (fog)');
    expect(cases['class-dirtier']?.changed).toBe('d to e');
    expect(cases['altitude-plus-200']?.changed).toBe('900 m to 1100 m');
    const other = lineInput({ string: { ...lineInput().string!, insulatorCode: 'U120B' } });
    const { answer: alone } = await reader.call(evaluate, { body: { input: other } });
    expect(cases['other-unit']?.after).toMatchObject({ insulatorCode: 'U120B', units: alone.string?.units });
    expect(await stored()).toEqual(before);
  });

  it('says why a case cannot be had', async () => {
    const { answer } = await reader.call(whatIf, { body: { input: lineInput(), otherCode: 'X1' } });
    expect(answer.cases.find(({ id }) => id === 'other-unit')).toMatchObject({
      available: false,
      why: 'The catalogue has no insulator unit X1.',
      after: null,
    });
    const rod = { ...lineInput().string!, insulatorCode: null };
    const { answer: none } = await reader.call(whatIf, {
      body: { input: lineInput({ string: rod }), otherCode: null },
    });
    expect(none.cases.find(({ id }) => id === 'next-profile')?.why).toBe('No insulator unit is chosen.');
  });

  it('refuses what cannot be read, at its place in the body', async () => {
    const input = lineInput({ string: { ...lineInput().string!, insulatorCode: 'X1' } });
    for (const [endpoint, rest] of [
      [whatIf, { otherCode: null }],
      [sweep, { altitudesM: [0], classes: ['a'] }],
    ] as const) {
      const { status, problem } = await reader.call(endpoint, { body: { input, ...rest } });
      expect(status).toBe(422);
      expect(problem.errors.map(({ path }) => path)).toEqual(['input.string.insulatorCode']);
    }
  });

  it('sweeps 60 altitudes and 5 classes in one request', async () => {
    const altitudesM = Array.from({ length: 60 }, (_, step) => step * 80);
    const { status, answer } = await reader.call(sweep, { body: { input: lineInput(), altitudesM, classes: CLASSES } });
    expect(status).toBe(200);
    expect(answer.cells).toHaveLength(300);
    const at = lineInput({ site: { ...lineInput().site!, altitudeM: 1600 } });
    const { answer: alone } = await reader.call(evaluate, { body: { input: at } });
    expect(answer.cells.find((cell) => cell.altitudeM === 1600 && cell.class === 'd')).toMatchObject({
      units: alone.string?.units,
      governedBy: alone.string?.governedBy,
    });
    expect(answer.cells.find(({ altitudeM }) => altitudeM > 4500)).toMatchObject({ units: null, worst: 'stop' });
  });

  it.each([
    ['61 altitudes', { altitudesM: Array.from({ length: 61 }, (_, step) => step) }, 'altitudesM'],
    ['no altitude', { altitudesM: [] }, 'altitudesM'],
    ['a level beside letters', { classes: ['a', 'light'] }, 'classes[1]'],
    ['no class at all', { classes: ['z'] }, 'classes[0]'],
  ])('refuses %s', async (_, changes, path) => {
    const body = { input: lineInput(), altitudesM: [0], classes: CLASSES, ...changes };
    const { status, problem } = await reader.call(sweep, { body });
    expect(status).toBe(422);
    expect(problem.errors.map((fault) => fault.path)).toContain(path);
  });
});
