import { contract } from '@bellgap/common/api';
import { begin, lineInput, makeLine } from './support/line-project';
import { TestApp } from './support/test-app';
import type { TestClient } from './support/test-client';

const { revision, revisionNotes, writeRevisionNote, removeRevisionNote, whatIf } = contract;
const AT = { code: 'NOTE1', number: 'N-1', label: 'A' };

describe('notes on a revision', () => {
  let test: TestApp;
  let engineer: TestClient;
  let checker: TestClient;
  let approver: TestClient;

  beforeAll(async () => {
    test = await TestApp.start();
    ({ client: engineer } = await test.signedIn({ name: 'Ode Varnholt', roles: ['engineer'] }));
    ({ client: checker } = await test.signedIn({ roles: ['checker'] }));
    ({ client: approver } = await test.signedIn({ roles: ['approver'] }));
    await makeLine(engineer, AT.code);
    await begin(engineer, AT.code, AT.number);
  });
  afterAll(() => test.stop());

  const notes = async (client: TestClient) => (await client.call(revisionNotes, { params: AT })).answer;

  it('keep a case with its numbers, and leave the revision as it is', async () => {
    const before = (await engineer.call(revision, { params: AT })).answer;
    const { answer: asked } = await engineer.call(whatIf, { body: { input: lineInput(), otherCode: null } });
    const kept = asked.cases.find(({ id }) => id === 'class-dirtier')!;
    const body = {
      title: `${kept.title}: ${kept.changed}`,
      figures: { before: kept.before, after: kept.after },
      text: 'Asked by the client',
    };
    const { status, answer } = await engineer.call(writeRevisionNote, { params: AT, body });
    expect(status).toBe(201);
    expect(answer).toMatchObject({ ...body, writtenBy: 'Ode Varnholt', own: true });
    expect(await notes(engineer)).toEqual([answer]);
    expect(await notes(approver)).toEqual([{ ...answer, own: false }]);
    expect((await checker.call(revisionNotes, { params: AT })).status).toBe(403);
    expect((await engineer.call(revision, { params: AT })).answer).toEqual(before);
    const [event] = await test.database.owner('audit_events').where({ entity: 'revision-note' });
    expect(event).toMatchObject({ action: 'revision-note.written', entity_id: answer.id });
  });

  it('may be words alone, and are taken away by who wrote them only', async () => {
    const body = { title: 'To be asked', figures: null, text: '' };
    const { answer } = await checker.call(writeRevisionNote, { params: AT, body });
    expect((await notes(engineer)).map(({ title }) => title)).toContain('To be asked');
    const params = { ...AT, noteId: answer.id };
    expect((await engineer.call(removeRevisionNote, { params })).status).toBe(403);
    expect((await checker.call(removeRevisionNote, { params })).status).toBe(204);
    expect((await checker.call(removeRevisionNote, { params })).status).toBe(404);
    expect((await notes(engineer)).map(({ title }) => title)).not.toContain('To be asked');
    expect(await test.database.owner('audit_events').where({ action: 'revision-note.removed' })).toHaveLength(1);
  });

  it('do not exist for who may not see drafts', async () => {
    const { client: reader } = await test.signedIn({ roles: ['reader'] });
    expect((await reader.call(revisionNotes, { params: AT })).status).toBe(404);
    const body = { title: 'Mine', figures: null, text: '' };
    expect((await reader.call(writeRevisionNote, { params: AT, body })).status).toBe(403);
    const { client: elsewhere } = await test.signedIn({ roles: ['engineer'], projects: [] });
    expect((await elsewhere.call(writeRevisionNote, { params: AT, body })).status).toBe(403);
  });

  it.each([
    ['no title', { title: '' }, 'title'],
    ['half a case', { figures: { before: null } }, 'figures.before'],
  ])('refuse %s', async (_, changes, path) => {
    const body = { title: 'A note', figures: null, text: '', ...changes };
    const { status, problem } = await engineer.call(writeRevisionNote, { params: AT, body });
    expect(status).toBe(422);
    expect(problem.errors.map((fault) => fault.path)).toContain(path);
  });
});
