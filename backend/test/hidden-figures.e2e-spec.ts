import { contract, type TrailEvent, type EndpointDefinition, type Revision } from '@bellgap/common/api';
import { TestApp } from './support/test-app';
import { WorkflowStory, submittableInput, type Actor } from './support/workflow-story';

jest.setTimeout(60_000);

const COUNT_FIRST = 'Enter your own count first: until then the figures of the author stay hidden.';

describe('the figures of the author, before the checker has entered his own', () => {
  let test: TestApp;
  let story: WorkflowStory;
  let submitted: Revision;
  let units: number;

  beforeAll(async () => {
    test = await TestApp.start();
    story = await WorkflowStory.begin(test, 'HID1');
    const draft = await story.draft();
    const params = story.at(draft);
    await story.engineer.client.call(contract.drawSheet, { params });
    const figures = { units: 19, insulatorCode: 'U160BL', governedBy: 'pollution' };
    const note = { title: 'One class dirtier', figures: null, text: `${JSON.stringify(figures)}` };
    await story.engineer.client.call(contract.writeRevisionNote, { params, body: note });
    submitted = await story.submit(draft);
    units = submitted.evaluation!.string!.units!;
  });
  afterAll(() => test.stop());

  const call = (by: Actor, endpoint: EndpointDefinition) => by.client.call(endpoint, { params: story.at(submitted) });

  it('stand in no answer about the revision', async () => {
    const { answer } = await story.checker.client.call(contract.revision, { params: story.at(submitted) });
    expect(answer).toMatchObject({ figuresHidden: true, evaluation: null, lastSheet: null });
    expect(answer.input).toEqual(submitted.input);
    const seen = (await story.approver.client.call(contract.revision, { params: story.at(submitted) })).answer;
    expect(seen).toMatchObject({ figuresHidden: false, evaluation: { string: { units } } });
  });

  it.each([
    ['the sheet', 'drawSheet'],
    ['its file', 'sheetFile'],
    ['notes with kept cases', 'revisionNotes'],
    ['remarks', 'remarks'],
  ] as const)('are kept from him: %s', async (_, name) => {
    const endpoint: EndpointDefinition = contract[name];
    const { status, problem } = await call(story.checker, endpoint);
    expect([status, problem.detail]).toEqual([403, COUNT_FIRST]);
    expect((await call(story.engineer, endpoint)).status).toBeLessThan(300);
  });

  it('are left out of what an approver is shown', async () => {
    const none = { acceptances: [], fails: [], cautions: [], assumed: [], disputed: [], notAssessed: [] };
    expect((await call(story.checker, contract.approval)).answer).toMatchObject(none);
    const { answer } = await story.approver.client.call(contract.approval, { params: story.at(submitted) });
    expect(answer.cautions.length + answer.notAssessed.length).toBeGreaterThan(0);
  });

  it('come by no route at all', async () => {
    const { string } = submitted.evaluation!;
    // Round figures stand in printed tables too.
    const marks = [string!.creepageRequiredMm, ...string!.criteria.map(({ marginPercent }) => marginPercent)]
      .filter((figure) => figure !== null && !Number.isInteger(figure))
      .map((figure) => new RegExp(`(?<![\\d.])${String(figure)}(?![\\d.])`));
    const readings = Object.entries<EndpointDefinition>(contract).filter(([, { method }]) => method === 'GET');
    expect(readings.length).toBeGreaterThan(25);
    const told = new Set<string>();
    for (const [name, endpoint] of readings) {
      const read = async (by: Actor) => {
        const { response } = await by.client.call(endpoint, {
          params: { ...story.at(submitted), id: submitted.id, key: 'x', verificationCode: 'x', revision: '1' },
          ...(name === 'specificationTrail' || name === 'trail' ? { query: { limit: '200' } } : {}),
        });
        return response.text ?? '';
      };
      const seen = await read(story.checker);
      for (const mark of marks) expect([name, mark.test(seen)]).toEqual([name, false]);
      const open = await read(story.engineer);
      if (marks.some((mark) => mark.test(open))) told.add(name);
    }
    // The marks do find the figures where they are shown.
    expect([...told]).toEqual(expect.arrayContaining(['revision', 'specifications']));
  });

  it('stand neither in a list nor in its order', async () => {
    const { site } = submittableInput();
    for (const altitudeM of [3000, 200, 1800]) await story.draft({ site: { ...site!, altitudeM } });
    const list = async (by: Actor, sort: string) =>
      (await by.client.call(contract.specifications, { params: { code: story.code }, query: { sort } })).answer.items;
    for (const sort of ['units', '-units', 'worstMarginPercent', '-worstMarginPercent']) {
      const items = await list(story.checker, sort);
      expect(items).toHaveLength(4);
      expect(items.every((row) => row.figuresHidden)).toBe(true);
      for (const { units: count, governedBy, worstMarginPercent, worstCaution } of items) {
        expect([count, governedBy, worstMarginPercent, worstCaution]).toEqual([null, null, null, null]);
      }
      const ids = items.map(({ id }) => id);
      expect(ids).toEqual([...ids].sort());
    }
    const counts = (await list(story.engineer, 'units')).map((row) => row.units!);
    expect(counts).toEqual([...counts].sort((one, other) => one - other));
    expect(new Set(counts).size).toBeGreaterThan(1);
  });

  it('do not come with the answer to a stale save', async () => {
    const dual = await test.signedIn({ name: 'Rufus Castell', roles: ['engineer', 'checker'] });
    const draft = await story.draft();
    const { status, problem } = await dual.client.call(contract.saveRevision, {
      params: story.at(draft),
      version: draft.lockVersion - 1,
      body: { title: draft.title, input: submittableInput(), overrides: [] },
    });
    expect([status, problem.code]).toEqual([409, 'newer-version']);
    expect(problem.current).toMatchObject({ figuresHidden: true, evaluation: null });
    expect(await dual.client.call(contract.revision, { params: story.at(draft) })).toMatchObject({
      answer: { editBarsSigning: true },
    });
  });

  it('are veiled in the trail', async () => {
    const params = { code: story.code, number: submitted.number };
    const read = async (by: Actor): Promise<TrailEvent[]> =>
      (await by.client.call(contract.specificationTrail, { params })).answer.items;
    const veiled = await read(story.checker);
    const saved = veiled.find(({ action }) => action === 'revision.saved')!;
    const change = (path: string) => saved.changes.find((one) => one.path === path);
    expect(change('units')).toEqual({ path: 'units', from: null, to: null, hidden: true });
    expect(change('input.site.altitudeM')).toMatchObject({ to: 900, hidden: false });
    expect(veiled.find(({ action }) => action === 'revision-note.written')!.changes.every((one) => one.hidden)).toBe(
      true,
    );
    const open = (await read(story.approver)).find(({ action }) => action === 'revision.saved')!;
    expect(open.changes.find(({ path }) => path === 'units')).toMatchObject({ to: units, hidden: false });
  });

  it('are shown everywhere once he has, and to nobody else by it', async () => {
    const second = await test.signedIn({ roles: ['checker'] });
    await story.enterOwnFigures(submitted);
    expect((await call(story.checker, contract.revision)).answer).toMatchObject({ figuresHidden: false });
    expect((await call(story.checker, contract.sheetFile)).status).toBe(200);
    expect((await call(story.checker, contract.remarks)).status).toBe(200);
    expect((await call(second, contract.revision)).answer).toMatchObject({ figuresHidden: true });
    const { items } = (
      await story.checker.client.call(contract.specifications, {
        params: { code: story.code },
        query: { sort: 'units' },
      })
    ).answer;
    expect(items[0]).toMatchObject({ number: submitted.number, units });
    expect(items.slice(1).every((row) => row.units === null)).toBe(true);
  });

  it('are hidden again of what he has not counted: the draft after a return, and what is submitted next', async () => {
    const { mine } = (await story.checker.client.call(contract.check, { params: story.at(submitted) })).answer;
    const decided = await story.checker.client.call(contract.decideCheck, {
      params: story.at(submitted),
      version: mine!.lockVersion,
      body: { verdict: 'return', note: 'Not yet', password: story.checker.person.password },
    });
    expect(decided.status).toBe(201);
    expect(decided.answer.decided).toHaveLength(1);
    expect((await call(story.checker, contract.revision)).answer).toMatchObject({ label: 'B', figuresHidden: true });
    await story.submit(await story.get(submitted));
    expect((await call(story.checker, contract.revision)).answer).toMatchObject({
      state: 'in_check',
      figuresHidden: true,
    });
  });
});
