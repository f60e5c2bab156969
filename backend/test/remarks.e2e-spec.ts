import { contract } from '@bellgap/common/api';
import { PresencesService } from '../src/workflow/presences.service';
import { TestApp } from './support/test-app';
import { WorkflowStory, type Actor, type At } from './support/workflow-story';

const { answerRemark, closeRemark, raiseRemark, remarks } = contract;

jest.setTimeout(60_000);

describe('remarks', () => {
  let test: TestApp;
  let story: WorkflowStory;

  beforeAll(async () => {
    test = await TestApp.start();
    story = await WorkflowStory.begin(test, 'REM1');
  });
  afterAll(() => test.stop());

  const raise = (by: Actor, params: At, path: string | null = 'site.altitudeM') =>
    by.client.call(raiseRemark, { params, body: { path, text: 'Is this in metres?' } });
  const answer = (by: Actor, params: At, remarkId: string) =>
    by.client.call(answerRemark, { params: { ...params, remarkId }, body: { text: 'It is now' } });
  const close = (by: Actor, params: At, remarkId: string) =>
    by.client.call(closeRemark, { params: { ...params, remarkId } });
  const openOf = async (params: At) => (await story.get(params)).openRemarks;

  async function inCheck(): Promise<At> {
    const submitted = await story.submitted();
    await story.enterOwnFigures(submitted);
    return story.at(submitted);
  }

  it('are raised by the checker, answered by the author, closed by who raised them', async () => {
    const params = await inCheck();
    const raised = await raise(story.checker, params);
    expect(raised.status).toBe(201);
    expect(raised.answer).toMatchObject({ open: 1, mayRaise: true });
    const [remark] = raised.answer.items;
    expect(remark).toMatchObject({
      label: 'A',
      path: 'site.altitudeM',
      raisedBy: 'Corin Vashti',
      closedAt: null,
      mayClose: true,
      mayAnswer: true,
    });
    const id = remark!.id;
    expect(await openOf(params)).toBe(1);
    const seen = (await story.engineer.client.call(remarks, { params })).answer;
    expect(seen).toMatchObject({ mayRaise: false, items: [{ mayClose: false, mayAnswer: true }] });
    expect((await close(story.engineer, params, id)).status).toBe(403);
    expect((await answer(story.approver, params, id)).status).toBe(403);
    const answered = await answer(story.engineer, params, id);
    expect(answered.answer.items[0]!.answers).toMatchObject([{ text: 'It is now', by: 'Edda Rowan' }]);
    expect((await answer(story.checker, params, id)).status).toBe(201);
    const closed = await close(story.checker, params, id);
    expect(closed.answer).toMatchObject({ open: 0, items: [{ mayClose: false, mayAnswer: false }] });
    expect((await close(story.checker, params, id)).status).toBe(409);
    expect((await answer(story.engineer, params, id)).status).toBe(409);
    const actions = await test.database
      .owner('audit_events')
      .where({ entity: 'review-remark', entity_id: id })
      .orderBy('id')
      .pluck<string[]>('action');
    expect(actions).toEqual(['remark.raised', 'remark.answered', 'remark.answered', 'remark.closed']);
  });

  it('name a field, a line of the calculation, or the whole', async () => {
    const params = await inCheck();
    const [line] = (await story.get(params)).evaluation!.trace;
    for (const path of [null, 'string.insulatorCode', `trace:${line!.id}`]) {
      expect((await raise(story.checker, params, path)).status).toBe(201);
    }
    for (const path of ['site.colour', 'trace:no-such-line']) {
      const { status, problem } = await raise(story.checker, params, path);
      expect([status, problem.errors.map((fault) => fault.path)]).toEqual([422, ['path']]);
    }
  });

  it('may be raised by an approver, but not by an author, nor before the own count, nor on a draft', async () => {
    const dual = await test.signedIn({ name: 'Rufus Castell', roles: ['engineer', 'checker'] });
    const draft = await story.draft({}, dual);
    expect((await raise(story.approver, story.at(draft))).status).toBe(409);
    const params = story.at(await story.submit(draft));
    expect((await raise(story.approver, params)).status).toBe(201);
    expect((await raise(dual, params)).problem.detail).toMatch(/^You changed /);
    const early = await raise(story.checker, params);
    expect([early.status, early.problem.detail]).toEqual([
      403,
      'Enter your own count first: until then the figures of the author stay hidden.',
    ]);
  });

  it('go with the revision through a return, and do not bar the pass', async () => {
    const params = await inCheck();
    const { items } = (await raise(story.checker, params)).answer;
    const submitted = await story.get(params);
    const check = (await story.checker.client.call(contract.check, { params })).answer;
    await story.decide(submitted, check, { verdict: 'return', note: 'See the remark' });
    expect((await answer(story.engineer, params, items[0]!.id)).status).toBe(201);
    const again = await story.pass(await story.submit(await story.get(params)));
    expect(again).toMatchObject({ state: 'checked', label: 'B', openRemarks: 1 });
    expect((await close(story.checker, params, items[0]!.id)).status).toBe(201);
    expect(await openOf(params)).toBe(0);
  });

  it('are found at their revision only', async () => {
    const one = await inCheck();
    const other = await inCheck();
    const { items } = (await raise(story.checker, one)).answer;
    expect((await close(story.checker, other, items[0]!.id)).status).toBe(404);
    expect((await close(story.checker, one, 'no-id')).status).toBe(404);
  });
});

describe('who has a revision open', () => {
  let test: TestApp;
  let story: WorkflowStory;

  beforeAll(async () => {
    test = await TestApp.start();
    story = await WorkflowStory.begin(test, 'PRE1');
  });
  afterAll(() => test.stop());

  it('is told to the others for a minute', async () => {
    const draft = await story.draft();
    const seen = async (by: Actor, editing: boolean) =>
      (await by.client.call(contract.presence, { params: story.at(draft), body: { editing } })).answer.others;
    expect(await seen(story.engineer, true)).toEqual([]);
    expect(await seen(story.approver, false)).toMatchObject([{ name: 'Edda Rowan', editing: true }]);
    expect(await seen(story.engineer, false)).toMatchObject([{ name: 'Anneke Thorold', editing: false }]);
    test.clock.advance({ seconds: 61 });
    expect(await seen(story.approver, false)).toEqual([]);
    const { status } = await story.approver.client.call(contract.presence, {
      params: { ...story.at(draft), number: 'NONE' },
      body: { editing: false },
    });
    expect(status).toBe(404);
    expect((await story.get(draft)).lockVersion).toBe(draft.lockVersion);
    test.clock.advance({ minutes: 3 });
    await test.app.get(PresencesService).tidy();
    expect(await test.database.owner('presences')).toEqual([]);
  });
});
