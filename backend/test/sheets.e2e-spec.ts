import { createHash } from 'node:crypto';
import type { Response } from 'supertest';
import { contract } from '@bellgap/common/api';
import { begin, lineInput, makeLine } from './support/line-project';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { drawSheet, revision, saveRevision, sheetFile } = contract;

// A sheet takes its time where other tests share the machine.
jest.setTimeout(60_000);

describe('sheets of drafts', () => {
  let test: TestApp;
  let engineer: TestClient;
  const at = (number: string) => ({ code: 'L1', number, label: 'A' });
  const save = (number: string, version: number, altitudeM: number) =>
    engineer.call(saveRevision, {
      params: at(number),
      version,
      body: { title: 'Strings', input: lineInput({ site: { ...lineInput().site!, altitudeM } }), overrides: [] },
    });
  const bytesOf = ({ body }: Response) => body as Buffer;

  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: engineer } = await test.signedIn({ name: 'Edda Rowan', roles: ['engineer'] }));
    await makeLine(engineer, 'L1');
  });
  afterAll(() => test.stop());

  it('are drawn on request, kept with what they were drawn from, and served with their name', async () => {
    await begin(engineer, 'L1', 'S-1');
    const saved = await save('S-1', 1, 900);
    const drawn = await engineer.call(drawSheet, { params: at('S-1') });
    expect(drawn.status).toBe(201);
    expect(drawn.answer).toMatchObject({ drawnBy: 'Edda Rowan', current: true });
    expect(drawn.answer.pages).toBeGreaterThan(0);

    const { status, headers, response } = await engineer.call(sheetFile, { params: at('S-1') });
    expect(status).toBe(200);
    expect(headers['content-disposition']).toBe('attachment; filename="S-1_A_draft.pdf"');
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['content-security-policy']).toBe("sandbox; default-src 'none'");
    const bytes = bytesOf(response);
    expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(drawn.answer.sha256);

    const { lastSheet } = (await engineer.call(revision, { params: at('S-1') })).answer;
    expect(lastSheet).toEqual(drawn.answer);
    const [row] = (await test.database.owner('sheets').where({ id: drawn.answer.id })) as Record<string, unknown>[];
    expect(row).toMatchObject({ kind: 'draft', evaluation: saved.answer.evaluation, input: saved.answer.input });
    expect(row!.content_code).toMatch(/^[0-9a-f]{12}$/);
  });

  it('have the same bytes for the same content, and then no new row', async () => {
    await begin(engineer, 'L1', 'S-2');
    await save('S-2', 1, 900);
    const first = await engineer.call(drawSheet, { params: at('S-2') });
    const one = bytesOf((await engineer.call(sheetFile, { params: at('S-2') })).response);
    test.clock.advance({ days: 1 });
    engineer = await test.signIn(await test.people.add({ name: 'Edda Rowan', roles: ['engineer'] }));
    const second = await engineer.call(drawSheet, { params: at('S-2') });
    expect(second.answer).toEqual(first.answer);
    expect(bytesOf((await engineer.call(sheetFile, { params: at('S-2') })).response).equals(one)).toBe(true);
  });

  it('say that the draft has changed since, and only the last one is kept', async () => {
    const { id } = await begin(engineer, 'L1', 'S-3');
    await save('S-3', 1, 900);
    const first = await engineer.call(drawSheet, { params: at('S-3') });
    test.clock.advance({ minutes: 1 });
    const changed = await save('S-3', 2, 1400);
    expect(changed.answer.lastSheet).toMatchObject({ id: first.answer.id, current: false });
    const second = await engineer.call(drawSheet, { params: at('S-3') });
    expect(second.answer.sha256).not.toBe(first.answer.sha256);
    const ids = await test.database.owner('sheets').where({ revision_id: id }).pluck<string[]>('id');
    expect(ids).toEqual([second.answer.id]);
  });

  it('can be drawn by two people at the same moment', async () => {
    const { id } = await begin(engineer, 'L1', 'S-4');
    const drawn = await Promise.all([1, 2, 3].map(() => engineer.call(drawSheet, { params: at('S-4') })));
    expect(drawn.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(await test.database.owner('sheets').where({ revision_id: id }).pluck<string[]>('id')).toHaveLength(1);
  });

  it('are refused in words where a sign of the title cannot be printed', async () => {
    await begin(engineer, 'L1', 'S-9');
    await engineer.call(saveRevision, {
      params: at('S-9'),
      version: 1,
      body: { title: 'Strings 線', input: lineInput(), overrides: [] },
    });
    const { status, answer } = await engineer.call(drawSheet, { params: at('S-9') });
    expect(status).toBe(422);
    expect(answer).toMatchObject({
      code: 'validation',
      detail: 'The sheet\'s fonts have no sign for "線" (U+7DDA) in "Strings 線"',
    });
  });

  it('do not exist before they are drawn, nor for who may not see drafts', async () => {
    await begin(engineer, 'L1', 'S-5');
    expect((await engineer.call(sheetFile, { params: at('S-5') })).status).toBe(404);
    await engineer.call(drawSheet, { params: at('S-5') });
    const { client: reader } = await test.signedIn({ roles: ['reader'] });
    expect((await reader.call(sheetFile, { params: at('S-5') })).status).toBe(404);
    expect((await reader.call(drawSheet, { params: at('S-5') })).status).toBe(404);
  });
});
