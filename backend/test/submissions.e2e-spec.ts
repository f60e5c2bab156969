import { contract, type Revision } from '@bellgap/common/api';
import { WorkflowStory, submittableInput, type Actor } from './support/workflow-story';
import { TestApp } from './support/test-app';

const { revision, submitRevision, recallRevision, refuseRevision } = contract;

jest.setTimeout(60_000);

describe('the way into the check and back', () => {
  let test: TestApp;
  let story: WorkflowStory;

  beforeAll(async () => {
    test = await TestApp.start();
    story = await WorkflowStory.begin(test, 'SUB1');
  });
  afterAll(() => test.stop());

  const submission = { checkCategory: 2, dueOn: null, note: '' };

  it('freezes what is handed in, with its code', async () => {
    const draft = await story.draft();
    const submitted = await story.submit(draft, { note: 'Please look at the altitude' });
    expect(submitted).toMatchObject({
      state: 'in_check',
      label: 'A',
      submitted: { name: 'Edda Rowan', dueOn: null, checkCategory: 2, note: 'Please look at the altitude' },
      mayEdit: false,
      contentCode: expect.stringMatching(/^[0-9a-f]{12}$/),
    });
    const body = { title: draft.title, input: submittableInput(), overrides: [] };
    const params = story.at(submitted);
    const saved = await story.engineer.client.call(contract.saveRevision, {
      params,
      version: submitted.lockVersion,
      body,
    });
    expect(saved.status).toBe(409);
  });

  it('passes a check', async () => {
    const checked = await story.checked();
    expect(checked).toMatchObject({ state: 'checked', checked: { name: 'Corin Vashti' }, label: 'A' });
  });

  it('goes back under the next letter, and the old letter still leads to it', async () => {
    const submitted = await story.submitted();
    const returned = await story.returned(submitted);
    expect(returned).toMatchObject({
      state: 'draft',
      label: 'B',
      labels: ['A', 'B'],
      submitted: null,
      contentCode: null,
      checked: null,
      returned: { note: 'Altitude: which structure is it?' },
    });
    expect((await story.get({ ...returned, label: 'B' })).id).toBe(submitted.id);
  });

  it('is taken back by who submitted it, with a reason that says so', async () => {
    const submitted = await story.submitted();
    const call = (by = story.engineer) =>
      by.client.call(recallRevision, {
        params: story.at(submitted),
        version: submitted.lockVersion,
        body: { reason: 'Wrong unit' },
      });
    const other = await test.signedIn({ roles: ['engineer'] });
    expect((await call(other)).status).toBe(403);
    const { status, answer } = await call();
    expect(status).toBe(201);
    expect(answer).toMatchObject({
      state: 'draft',
      label: 'B',
      returned: { note: 'Taken back by Edda Rowan: Wrong unit' },
    });
    expect((await call()).status).toBe(409);
  });

  it('goes back from approval, and the check is void', async () => {
    const checked = await story.checked();
    const { status, answer } = await story.approver.client.call(refuseRevision, {
      params: story.at(checked),
      version: checked.lockVersion,
      body: { reason: 'Wait for the survey' },
    });
    expect(status).toBe(201);
    expect(answer).toMatchObject({ state: 'draft', label: 'B', checked: null, contentCode: null });
  });

  it('gives no letter twice: A, B, C', async () => {
    const first = await story.submitted();
    const second = await story.submit(await story.returned(first));
    expect(second.label).toBe('B');
    const third = await story.returned(second);
    expect(third.labels).toEqual(['A', 'B', 'C']);
    for (const label of ['A', 'B', 'C']) expect((await story.get({ ...third, label })).id).toBe(first.id);
  });

  it('asks for the version it was made from, and shows what stands', async () => {
    const draft = await story.draft();
    const params = story.at(draft);
    const call = (version?: number) =>
      story.engineer.client.call(submitRevision, { params, ...(version ? { version } : {}), body: submission });
    expect((await call()).status).toBe(428);
    const { status, problem } = await call(draft.lockVersion - 1);
    expect(status).toBe(409);
    expect(problem).toMatchObject({ code: 'newer-version', current: { lockVersion: draft.lockVersion } });
  });

  describe('is barred', () => {
    it('by inputs that are open, each at its field', async () => {
      const draft = await story.draft({ site: { altitudeM: null, pollution: null }, clearance: null });
      const { status, problem } = await story.engineer.client.call(submitRevision, {
        params: story.at(draft),
        version: draft.lockVersion,
        body: submission,
      });
      expect(status).toBe(422);
      expect(problem.errors).toEqual(
        expect.arrayContaining([
          {
            path: 'input.site.altitudeM',
            message: 'Altitude: is needed before the specification can be checked',
          },
          expect.objectContaining({ path: 'input.site.pollution.class' }),
          expect.objectContaining({ path: 'input.clearance.method' }),
        ]),
      );
    });

    it('by a stop', async () => {
      const pollution = { class: 'd', type: 'A', basis: 'measured', recheckBy: null } as const;
      const draft = await story.draft({ site: { altitudeM: 9000, pollution } });
      const stops = draft.evaluation!.cautions.filter(({ severity }) => severity === 'stop');
      expect(stops.length).toBeGreaterThan(0);
      const { status, problem } = await story.engineer.client.call(submitRevision, {
        params: story.at(draft),
        version: draft.lockVersion,
        body: submission,
      });
      expect(status).toBe(422);
      expect(problem.errors).toContainEqual({ path: `input.${stops[0]!.field}`, message: stops[0]!.text });
    });

    it('by an override without a reason', async () => {
      const draft = await story.draft();
      const input = submittableInput({ system: { ...draft.input.system!, faultCurrentKa: 25 } });
      const overrides = [{ path: 'system.faultCurrentKa', reason: '' }];
      const saved = await story.engineer.client.call(contract.saveRevision, {
        params: story.at(draft),
        version: draft.lockVersion,
        body: { title: draft.title, input, overrides },
      });
      const { status, problem } = await story.engineer.client.call(submitRevision, {
        params: story.at(draft),
        version: saved.answer.lockVersion,
        body: submission,
      });
      expect(status).toBe(422);
      expect(problem.errors).toEqual([
        {
          path: 'overrides.system.faultCurrentKa',
          message: 'Fault current: departs from the design basis; a reason is needed',
        },
      ]);
    });

    it('by a day in the past', async () => {
      const draft = await story.draft();
      const { status, problem } = await story.engineer.client.call(submitRevision, {
        params: story.at(draft),
        version: draft.lockVersion,
        body: { ...submission, dueOn: '2020-01-01' },
      });
      expect(status).toBe(422);
      expect(problem.errors).toEqual([{ path: 'dueOn', message: 'Wanted by: lies in the past' }]);
    });

    it('by figures that would come out otherwise now', async () => {
      const draft = await story.draft();
      await test.database.owner.raw(
        `update revisions set evaluation = jsonb_set(evaluation, '{string,units}', '99') where id = ?`,
        [draft.id],
      );
      const { status, problem } = await story.engineer.client.call(submitRevision, {
        params: story.at(draft),
        version: draft.lockVersion,
        body: submission,
      });
      expect(status).toBe(409);
      expect(problem.detail).toMatch(/units: 99, now \d+.*Open the draft and save it again/);
    });
  });

  it('is made once where two make it at once, and never of what was saved meanwhile', async () => {
    const other = await test.signedIn({ roles: ['engineer'] });
    const send = (draft: Revision, by: Actor) =>
      by.client.call(submitRevision, { params: story.at(draft), version: draft.lockVersion, body: submission });
    const draft = await story.draft();
    const both = await Promise.all([send(draft, story.engineer), send(draft, other)]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    const next = await story.draft();
    const { site } = submittableInput();
    const [sent, saved] = await Promise.all([
      send(next, story.engineer),
      other.client.call(contract.saveRevision, {
        params: story.at(next),
        version: next.lockVersion,
        body: { title: next.title, input: submittableInput({ site: { ...site!, altitudeM: 990 } }), overrides: [] },
      }),
    ]);
    expect([sent.status, saved.status].sort()).toEqual(sent.status === 201 ? [201, 409] : [200, 409]);
  });

  it('sends letters to who may check and has not written in it, and back to the author', async () => {
    await test.database.owner('graphile_worker._private_jobs').delete();
    const elsewhere = await test.signedIn({ roles: ['checker'], projects: ['SUB1'] });
    const submitted = await story.submitted();
    const letters = async () =>
      (
        (await test.database.owner('graphile_worker._private_jobs').orderBy('id').select('payload')) as {
          payload: { kind: string; toUserId: string };
        }[]
      ).map(({ payload }) => [payload.kind, payload.toUserId]);
    const asked = await letters();
    expect(asked).toContainEqual(['waits-for-check', story.checker.person.id]);
    expect(asked).toContainEqual(['waits-for-check', elsewhere.person.id]);
    expect(asked.every(([, to]) => to !== story.engineer.person.id)).toBe(true);
    const returned = await story.returned(submitted);
    expect((await letters()).at(-1)).toEqual(['returned', story.engineer.person.id]);
    await story.pass(await story.submit(returned));
    const told = (await letters()).filter(([kind]) => kind === 'waits-for-approval').map(([, to]) => to);
    expect(told).toContain(story.approver.person.id);
    expect(told).not.toContain(story.checker.person.id);
  });

  it('hides a draft and what is in check from who sees issued sheets only', async () => {
    const submitted = await story.submitted();
    for (const role of ['reader', 'procurement'] as const) {
      const { client } = await test.signedIn({ roles: [role] });
      expect((await client.call(revision, { params: story.at(submitted) })).status).toBe(404);
    }
  });
});
