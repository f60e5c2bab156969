import { contract, type Revision } from '@bellgap/common/api';
import { TestApp } from './support/test-app';
import { WorkflowStory, submittableInput, wholeCheck, type Actor } from './support/workflow-story';

const { check, decideCheck, enterOwnFigures, saveCheck } = contract;

jest.setTimeout(60_000);

describe('the check', () => {
  let test: TestApp;
  let story: WorkflowStory;

  beforeAll(async () => {
    test = await TestApp.start();
    story = await WorkflowStory.begin(test, 'CHK1');
  });
  afterAll(() => test.stop());

  const figures = (changes: object = {}) => ({
    units: 15,
    unitsCard: 'discs-by-15-kv',
    clearanceMm: null,
    clearanceCard: null,
    note: 'Count by the rule of 15 kV; no clearance by heart',
    ...changes,
  });
  const enter = (revision: Revision, changes: object = {}, by: Actor = story.checker) =>
    by.client.call(enterOwnFigures, { params: story.at(revision), body: figures(changes) });

  it('names the rules without their estimates before the own figures are there', async () => {
    const submitted = await story.submitted();
    const { status, answer } = await story.checker.client.call(check, { params: story.at(submitted) });
    expect(status).toBe(200);
    expect(answer).toMatchObject({ mayCheck: true, why: null, mine: null, decided: [] });
    expect(answer.cards.map(({ id }) => id)).toEqual(
      expect.arrayContaining(['discs-by-15-kv', 'lightning-clearance-by-500-kv-per-m']),
    );
    expect(answer.cards.every(({ unit }) => unit === 'units' || unit === 'mm')).toBe(true);
    expect(JSON.stringify(answer)).not.toMatch(/estimate|"given"|verdict/);
    expect((await story.engineer.client.call(check, { params: story.at(submitted) })).answer).toMatchObject({
      mayCheck: false,
      why: 'Only checkers of this project check.',
    });
  });

  it('takes the own figures once, by a rule that says something here', async () => {
    const submitted = await story.submitted();
    const refused = async (changes: object, path: string) => {
      const { status, problem } = await enter(submitted, changes);
      expect([status, problem.errors.map((fault) => fault.path)]).toEqual([422, [path]]);
    };
    await refused({ unitsCard: 'no-such-rule' }, 'unitsCard');
    await refused({ unitsCard: 'specific-creepage-1986' }, 'unitsCard');
    await refused({ unitsCard: null }, 'unitsCard');
    await refused({ clearanceMm: 2000, clearanceCard: 'discs-by-15-kv' }, 'clearanceCard');
    await refused({ units: null, unitsCard: null, note: '' }, 'note');
    const { status, answer } = await enter(submitted);
    expect(status).toBe(201);
    const authors = (await story.get(submitted)).evaluation!.string!.units!;
    expect(answer.mine).toMatchObject({
      label: 'A',
      checkCategory: 2,
      checker: 'Corin Vashti',
      contentCode: submitted.contentCode,
      ownFigures: figures(),
      verdict: null,
    });
    expect(answer.mine!.differences[0]).toMatchObject({
      figure: 'units',
      own: 15,
      authors,
      difference: 15 - authors,
      band: 1,
      card: 'discs-by-15-kv',
      outside: Math.abs(15 - authors) > 1,
    });
    expect(answer.mine!.differences[1]).toMatchObject({ figure: 'clearance', own: null, outside: false });
    expect((await enter(submitted, { units: authors })).status).toBe(409);
  });

  it('takes none by a rule that says nothing here', async () => {
    const draft = await story.draft();
    const system = { ...submittableInput().system!, nominalVoltageKv: 225 };
    const saved = await story.engineer.client.call(contract.saveRevision, {
      params: story.at(draft),
      version: draft.lockVersion,
      body: {
        title: draft.title,
        input: submittableInput({ system }),
        overrides: [{ path: 'system.nominalVoltageKv', reason: 'As the older end of the line' }],
      },
    });
    expect(saved.status).toBe(200);
    const { status, problem } = await enter(await story.submit(saved.answer), { unitsCard: 'usual-count' });
    expect(status).toBe(422);
    expect(problem.errors).toEqual([
      {
        path: 'unitsCard',
        message: 'Rule for the count: says nothing here. No usual count is held for this voltage.',
      },
    ]);
  });

  it('is saved as far as it has come, from the version it was made from', async () => {
    const submitted = await story.submitted();
    const params = story.at(submitted);
    const body = { ...wholeCheck(submitted.input), checklist: [], independent: false };
    const save = (version: number, given: object = body, by = story.checker) =>
      by.client.call(saveCheck, { params, version, body: given });
    const before = await save(1);
    expect(before.status).toBe(403);
    expect(before.problem.detail).toMatch(/^Enter your own count first/);
    await enter(submitted);
    const saved = await save(1);
    expect(saved.headers.etag).toBe('"2"');
    expect(saved.answer.mine!.ticks).toEqual(body.ticks);
    expect((await save(2)).headers.etag).toBe('"2"');
    const stale = await save(1, { ...body, independent: true });
    expect(stale.status).toBe(409);
    expect(stale.problem).toMatchObject({ code: 'newer-version', current: { lockVersion: 2 } });
    const strange = { ...body, ticks: [{ path: 'site.colour', seenIn: '', agreed: true }] };
    expect((await save(2, strange)).problem.errors.map(({ path }) => path)).toEqual(['ticks[0].path']);
    const twice = { ...body, ticks: [body.ticks[0]!, body.ticks[0]!] };
    expect((await save(2, twice)).problem.errors.map(({ path }) => path)).toEqual(['ticks[1].path']);
  });

  describe('passes only', () => {
    async function refusal(changes: Partial<ReturnType<typeof wholeCheck>>, own: object = {}) {
      const submitted = await story.submitted();
      const begun = (await enter(submitted, { units: submitted.evaluation!.string!.units, ...own })).answer;
      const { answer } = await story.checker.client.call(saveCheck, {
        params: story.at(submitted),
        version: begun.mine!.lockVersion,
        body: { ...wholeCheck(submitted.input), ...changes },
      });
      const { status, problem } = await story.decide(submitted, answer);
      expect(status).toBe(422);
      expect((await story.get(submitted)).state).toBe('in_check');
      return problem.errors;
    }

    it('with every input looked at and agreed', async () => {
      const { ticks } = wholeCheck(submittableInput());
      expect(await refusal({ ticks: ticks.slice(1) })).toEqual([
        { path: 'ticks', message: 'Inputs: not looked at yet: Kind' },
      ]);
      const altitude = ticks.findIndex(({ path }) => path === 'site.altitudeM');
      const disagreed = ticks.map((tick, i) => (i === altitude ? { ...tick, agreed: false } : tick));
      expect(await refusal({ ticks: disagreed })).toEqual([
        { path: `ticks[${altitude}].agreed`, message: 'Altitude: you do not agree; return the revision' },
      ]);
    });

    it('with every point answered, and a note to each no', async () => {
      const { checklist } = wholeCheck(submittableInput());
      expect((await refusal({ checklist: checklist.slice(2) })).map(({ path }) => path)).toEqual(['checklist']);
      const withNo = [{ ...checklist[0]!, answer: 'no' as const }, ...checklist.slice(1)];
      expect((await refusal({ checklist: withNo })).map(({ path }) => path)).toEqual(['checklist[0].note']);
    });

    it('with independence declared', async () => {
      expect((await refusal({ independent: false })).map(({ path }) => path)).toEqual(['independent']);
    });

    it('with a reason where the figures differ beyond the band', async () => {
      expect((await refusal({}, { units: 40 })).map(({ path }) => path)).toEqual(['differenceReason']);
    });

    it('with the own password, and with a note where it passes with notes', async () => {
      const submitted = await story.submitted();
      const whole = await story.fillCheck(submitted, await story.enterOwnFigures(submitted));
      const decide = (body: object) =>
        story.checker.client.call(decideCheck, {
          params: story.at(submitted),
          version: whole.mine!.lockVersion,
          body: { verdict: 'pass', note: '', password: story.checker.person.password, ...body },
        });
      const wrong = await decide({ password: 'another one altogether' });
      expect([wrong.status, wrong.problem.errors]).toEqual([
        422,
        [{ path: 'password', message: 'Password: is not right' }],
      ]);
      const bare = await decide({ verdict: 'pass-with-notes' });
      expect(bare.problem.errors.map(({ path }) => path)).toEqual(['note']);
      const { status, answer } = await decide({ verdict: 'pass-with-notes', note: 'Mind the coupling' });
      expect(status).toBe(201);
      expect(answer.decided[0]).toMatchObject({ verdict: 'pass-with-notes', verdictNote: 'Mind the coupling' });
      expect(answer.decided[0]!.decidedOn).toMatch(/^\d{4}-\d{2}-\d{2}$/);
      expect((await decide({})).status).toBe(409);
    });
  });

  it('is independent for each of two checkers: neither sees the other before his own figures', async () => {
    const second = await test.signedIn({ name: 'Yorin Sandquist', roles: ['checker'] });
    const submitted = await story.submitted();
    const params = story.at(submitted);
    await story.returned(submitted, 'Sixteen, not nineteen');
    const again = await story.submit(await story.get(submitted));
    const seen = async (by: Actor) => (await by.client.call(check, { params })).answer;
    expect((await seen(second)).decided).toEqual([]);
    expect((await second.client.call(contract.revision, { params })).answer.returned!.note).not.toMatch(/Sixteen/);
    expect((await seen(story.checker)).decided).toHaveLength(1);
    const first = await story.fillCheck(again, await story.enterOwnFigures(again));
    const other = await story.fillCheck(again, await story.enterOwnFigures(again, { by: second }), { by: second });
    expect((await seen(second)).decided).toHaveLength(1);
    expect((await seen(second)).mine!.checker).toBe('Yorin Sandquist');
    const verdicts = await Promise.all([
      story.decide(again, first),
      story.decide(again, other, { by: second, verdict: 'return', note: 'Not yet' }),
    ]);
    expect(verdicts.map(({ status }) => status).sort()).toEqual([201, 409]);
  });

  it('goes by the category that was asked for', async () => {
    const person = await test.people.add({ roles: ['checker'] });
    await test.database.owner('role_grants').where({ user_id: person.id }).update({ check_category: 2 });
    const held = { person, client: await test.signIn(person) };
    const draft = await story.draft();
    const submitted = await story.submit(draft, { checkCategory: 3 });
    const { status, problem } = await enter(submitted, {}, held);
    expect(status).toBe(403);
    expect(problem.detail).toBe('Check category 3 is asked for; your grant does not cover it.');
    expect((await enter(submitted)).status).toBe(201);
  });

  describe('of own work', () => {
    const both = () => test.signedIn({ name: 'Rufus Castell', roles: ['engineer', 'checker', 'approver'] });

    it('is refused with the field and the day of the last change, also after it was changed back', async () => {
      const dual = await both();
      const draft = await story.draft();
      const { site } = submittableInput();
      const changed = await story.save(draft, submittableInput({ site: { ...site!, altitudeM: 950 } }), dual);
      const back = await story.save(changed, submittableInput(), dual);
      const submitted = await story.submit(back);
      const { status, problem } = await enter(submitted, {}, dual);
      const today = new Intl.DateTimeFormat('en-CA', { timeZone: 'Etc/GMT-4' }).format(test.clock.now());
      const why = `You changed Altitude on ${today}; nobody checks or approves his own work.`;
      expect([status, problem.detail]).toEqual([403, why]);
      const seen = (await dual.client.call(contract.revision, { params: story.at(submitted) })).answer;
      expect(seen.moves.find(({ name }) => name === 'pass')).toMatchObject({ allowed: false, why });
      const checked = await story.pass(submitted);
      const refused = await dual.client.call(contract.refuseRevision, {
        params: story.at(checked),
        version: checked.lockVersion,
        body: { reason: 'No' },
      });
      expect([refused.status, refused.problem.detail]).toEqual([403, why]);
    });

    it('is refused by the database, whoever writes', async () => {
      const dual = await both();
      const draft = await story.draft();
      const changed = await story.save(draft, submittableInput({ mechanical: null, midSpan: null }));
      const { site } = submittableInput();
      const byDual = await story.save(changed, submittableInput({ site: { ...site!, altitudeM: 910 } }), dual);
      const submitted = await story.submit(byDual);
      const write = (by: string) =>
        test.database
          .owner('revisions')
          .where({ id: submitted.id })
          .update({ state: 'checked', checked_by: by, checked_at: new Date() });
      await expect(write(dual.person.id)).rejects.toMatchObject({ constraint: 'revisions_own_work' });
      await expect(write(story.engineer.person.id)).rejects.toMatchObject({ code: '23514' });
    });
  });
});
