import {
  BASIS_MOVE_NAMES,
  REVISION_STATES,
  basisMoveSigns,
  basisTransition,
  TRANSITIONS,
  contract,
  type BasisMove,
  type RevisionState,
  type Role,
  type StandingBasis,
} from '@bellgap/common/api';
import { SYSTEM_220, begin, lineInput, makeLine, reviseBasis } from './support/line-project';
import { TestApp } from './support/test-app';
import { WorkflowStory, type Actor } from './support/workflow-story';

jest.setTimeout(120_000);

const { approval, desk, designBasis, moveBasis, project, revision, saveRevision, takeBasis } = contract;

/** Everybody who could try: one of each role, who wrote the basis, and one who wrote it and holds every role. */
const PEOPLE = {
  author: ['engineer'],
  'another engineer': ['engineer'],
  checker: ['checker'],
  approver: ['approver'],
  procurement: ['procurement'],
  reader: ['reader'],
  administrator: ['administrator'],
  'author with every role': ['engineer', 'checker', 'approver', 'administrator'],
} as const satisfies Record<string, readonly Role[]>;
type Who = keyof typeof PEOPLE;

/** The way to each state from a draft. */
const WAYS: Record<RevisionState, BasisMove[]> = {
  draft: [],
  in_check: ['submit'],
  checked: ['submit', 'check'],
  issued: ['submit', 'check', 'issue'],
  superseded: ['submit', 'check', 'issue'],
  withdrawn: ['submit', 'check', 'issue', 'withdraw'],
};

describe('the way of a design basis', () => {
  let test: TestApp;
  const people = new Map<Who, Actor>();
  let count = 0;

  beforeAll(async () => {
    test = await TestApp.start();
    for (const [who, roles] of Object.entries(PEOPLE) as [Who, readonly Role[]][]) {
      people.set(who, await test.signedIn({ name: who, roles }));
    }
  });
  afterAll(() => test.stop());

  const actor = (who: Who) => people.get(who)!;
  const MAKERS: Record<BasisMove, Who> = {
    submit: 'another engineer',
    check: 'checker',
    return: 'checker',
    issue: 'approver',
    withdraw: 'approver',
  };

  const send = (
    code: string,
    move: BasisMove,
    by: Actor,
    { at = 1, password = by.person.password as string | null } = {},
  ) =>
    by.client.call(moveBasis, {
      params: { code, revision: String(at) },
      body: { move, note: `${move} it`, password: basisMoveSigns(move) ? password : null },
    });

  async function make(code: string, moves: readonly BasisMove[], at = 1): Promise<void> {
    for (const move of moves) {
      const { status, problem } = await send(code, move, actor(MAKERS[move]), { at });
      if (status !== 201) throw new Error(`${move} of ${code} ${at}: ${problem.detail}`);
    }
  }

  async function line(by: Who = 'author'): Promise<string> {
    count += 1;
    const code = `BAS${count}`;
    await makeLine(actor(by).client, code);
    return code;
  }

  const revise = (code: string, version: number, faultCurrentKa: number) =>
    reviseBasis(actor('author').client, code, version, { ...SYSTEM_220, faultCurrentKa });

  async function standing(code: string, at = 1, by: Who = 'administrator'): Promise<StandingBasis> {
    const { current, earlier } = (await actor(by).client.call(designBasis, { params: { code } })).answer;
    return [current!, ...earlier].find((basis) => basis.revision === at)!;
  }

  describe('every move, from every state, by everybody', () => {
    const codes = new Map<RevisionState, string>();
    beforeAll(async () => {
      for (const state of REVISION_STATES) {
        const code = await line('author with every role');
        await make(code, WAYS[state]);
        if (state === 'superseded') {
          await revise(code, 1, 40);
          await make(code, WAYS.issued, 2);
        }
        codes.set(state, code);
        expect((await standing(code)).state).toBe(state);
      }
    });

    function mayMake(move: BasisMove, state: RevisionState, who: Who): boolean {
      const name = basisTransition(move, state);
      const role = name && TRANSITIONS[name].role;
      if (!role || !(PEOPLE[who] as readonly Role[]).includes(role)) return false;
      return move === 'submit' || move === 'withdraw' || who !== 'author with every role';
    }

    const cases = BASIS_MOVE_NAMES.flatMap((move) =>
      REVISION_STATES.flatMap((state) => (Object.keys(PEOPLE) as Who[]).map((who) => [move, state, who] as const)),
    );
    const made = cases.filter(([move, state, who]) => mayMake(move, state, who));
    const refused = cases.filter(([move, state, who]) => !mayMake(move, state, who));

    it('covers the table', () => {
      expect(cases).toHaveLength(5 * 6 * 8);
      expect(made.map(([move, state, who]) => `${move} ${state} ${who}`)).toEqual([
        'submit draft author',
        'submit draft another engineer',
        'submit draft author with every role',
        'check in_check checker',
        'return in_check checker',
        'return checked approver',
        'issue checked approver',
        'withdraw issued approver',
        'withdraw issued author with every role',
      ]);
    });

    it.each(refused)('%s from %s by %s is refused and changes nothing', async (move, state, who) => {
      const code = codes.get(state)!;
      const { status, problem } = await send(code, move, actor(who));
      const passesGate = (PEOPLE[who] as readonly Role[]).some((role) =>
        (moveBasis.access as readonly Role[]).includes(role),
      );
      expect(status).toBe(passesGate && basisTransition(move, state) === null ? 409 : 403);
      expect(problem.detail).toMatch(/\w+ \w+/);
      expect((await standing(code)).moves).toHaveLength(WAYS[state].length);
    });

    it.each(made)('%s from %s by %s is made, as the answer had said', async (move, state, who) => {
      const code = await line('author with every role');
      await make(code, WAYS[state]);
      const before = await standing(code, 1, who);
      expect(before.allowed.find(({ name }) => name === move)).toEqual({ name: move, allowed: true, why: null });
      const { status, answer } = await send(code, move, actor(who));
      expect(status).toBe(201);
      expect(answer.state).toBe(TRANSITIONS[basisTransition(move, state)!].to);
      expect(answer.moves.at(-1)).toEqual({
        move,
        by: who,
        on: expect.stringMatching(/^\d{4}-\d\d-\d\d$/),
        note: `${move} it`,
      });
      const events = (await test.database
        .owner('audit_events')
        .where({ entity: 'design-basis', actor_id: actor(who).person.id })
        .orderBy('id', 'desc')
        .limit(1)
        .pluck('action')) as string[];
      expect(events).toEqual([
        {
          submit: 'basis.submitted',
          check: 'basis.checked',
          return: 'basis.returned',
          issue: 'basis.issued',
          withdraw: 'basis.withdrawn',
        }[move],
      ]);
    });
  });

  it('needs three people, and names the day of the own work', async () => {
    const code = await line('author with every role');
    await make(code, ['submit']);
    const own = await send(code, 'check', actor('author with every role'));
    expect([own.status, own.problem.detail]).toEqual([
      403,
      expect.stringMatching(/^You wrote this revision on \d{4}-\d\d-\d\d; nobody checks or approves his own work\.$/),
    ]);
    const both = await test.signedIn({ roles: ['checker', 'approver'] });
    expect((await send(code, 'check', both)).status).toBe(201);
    const again = await send(code, 'issue', both);
    expect([again.status, again.problem.detail]).toEqual([
      403,
      'You have checked this revision; somebody else approves it.',
    ]);
  });

  it('is guarded by the database too, whoever writes there', async () => {
    const code = await line();
    const { id } = await standing(code);
    const write = (move: BasisMove, who: Who) =>
      test.database
        .owner('design_basis_moves')
        .insert({ basis_id: id, move, by: actor(who).person.id, note: 'By hand' })
        .then(
          () => 'written',
          (error: { constraint?: string }) => error.constraint,
        );
    expect(await write('issue', 'approver')).toBe('design_basis_moves_order');
    expect(await write('submit', 'author')).toBe('written');
    expect(await write('check', 'author')).toBe('design_basis_moves_own_work');
    expect(await write('check', 'checker')).toBe('written');
    expect(await write('issue', 'checker')).toBe('design_basis_moves_own_work');
    expect(await write('issue', 'author')).toBe('design_basis_moves_own_work');
    await expect(test.database.owner('design_basis_moves').where({ basis_id: id }).delete()).rejects.toThrow(/never/);
  });

  it('takes a wrong or missing password, and a missing reason, at their fields', async () => {
    const code = await line();
    await make(code, ['submit']);
    const wrong = await send(code, 'check', actor('checker'), { password: 'a guess' });
    expect([wrong.status, wrong.problem.errors]).toEqual([
      422,
      [{ path: 'password', message: 'Password: is not right' }],
    ]);
    const missing = await send(code, 'check', actor('checker'), { password: null });
    expect([missing.status, missing.problem.errors?.[0]?.path]).toEqual([422, 'password']);
    const { status, problem } = await actor('checker').client.call(moveBasis, {
      params: { code, revision: '1' },
      body: { move: 'return', note: ' ', password: null },
    });
    expect([status, problem.errors?.[0]?.path]).toEqual([422, 'note']);
    expect((await standing(code)).state).toBe('in_check');
  });

  it('lets one of two win who act at once', async () => {
    const code = await line();
    await make(code, ['submit']);
    const second = await test.signedIn({ roles: ['checker'] });
    const both = await Promise.all([send(code, 'check', actor('checker')), send(code, 'check', second)]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    const approver = await test.signedIn({ roles: ['approver'] });
    const decided = await Promise.all([send(code, 'issue', actor('approver')), send(code, 'return', approver)]);
    expect(decided.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect((await standing(code)).moves).toHaveLength(3);
  });

  it('takes no older revision further once a newer one is issued', async () => {
    const code = await line();
    await make(code, ['submit', 'check']);
    await revise(code, 1, 40);
    await revise(code, 2, 50);
    await make(code, WAYS.issued, 3);
    const refusal = [409, 'Revision 3 was issued since; an older one goes no further.'];
    const draft = await send(code, 'submit', actor('author'), { at: 2 });
    expect([draft.status, draft.problem.detail]).toEqual(refusal);
    const late = await send(code, 'issue', actor('approver'));
    expect([late.status, late.problem.detail]).toEqual(refusal);
    expect((await send(code, 'return', actor('approver'))).status).toBe(201);
    expect((await send(code, 'submit', actor('author'), { at: 9 })).status).toBe(404);
  });

  it('marks specifications only when a newer revision is issued, once any is', async () => {
    const code = await line();
    const engineer = actor('author').client;
    const params = { code, number: `${code}-1`, label: 'latest' };
    const draft = await begin(engineer, code, params.number);
    await engineer.call(saveRevision, {
      params,
      version: draft.lockVersion,
      body: { title: draft.title, input: lineInput(), overrides: [] },
    });
    const newer = async () => (await engineer.call(revision, { params })).answer.newerBasisRevision;
    const outdated = async () =>
      (await engineer.call(desk)).answer.outdated.filter(({ projectCode }) => projectCode === code).length;
    await make(code, WAYS.issued);
    await revise(code, 1, 40);
    expect([await newer(), await outdated()]).toEqual([null, 0]);
    expect((await begin(engineer, code, `${code}-2`)).basis?.revision).toBe(1);
    expect((await engineer.call(project, { params: { code } })).answer.basisRevision).toBe(1);

    await make(code, ['submit', 'check'], 2);
    expect([await newer(), await outdated()]).toEqual([null, 0]);
    await make(code, ['issue'], 2);
    expect([await newer(), await outdated()]).toEqual([2, 2]);
    expect((await standing(code)).state).toBe('superseded');
    const { lockVersion: version } = (await engineer.call(revision, { params })).answer;
    const { answer } = await engineer.call(takeBasis, { params, version });
    expect(answer).toMatchObject({ basis: { revision: 2 }, newerBasisRevision: null });
  });

  it('tells who is to act, and the approver of a specification that its basis is a draft', async () => {
    const story = await WorkflowStory.begin(test, 'BASX');
    await test.database.owner('graphile_worker._private_jobs').delete();
    const checked = await story.checked();
    const params = story.at(checked);
    const assumed = async () => (await story.approver.client.call(approval, { params })).answer.assumed;
    expect(await assumed()).toContainEqual({ path: null, text: 'Design basis DB-BASX revision 1 is a draft.' });
    await make('BASX', ['submit', 'check', 'issue']);
    expect((await assumed()).map(({ text }) => text).join()).not.toContain('Design basis');
    const sent = (await test.database.owner('graphile_worker._private_jobs').select('payload')) as {
      payload: { kind: string; toUserId: string; data: { record?: string; number: string } };
    }[];
    const to = (kind: string) =>
      sent
        .filter(({ payload }) => payload.data.record === 'design-basis' && payload.kind === kind)
        .map(({ payload }) => payload.toUserId);
    expect(to('waits-for-check')).toContain(story.checker.person.id);
    expect(to('waits-for-approval')).toContain(story.approver.person.id);
    expect(to('issued')).toContain(story.engineer.person.id);
    expect(to('issued')).not.toContain(actor('approver').person.id);
  });
});
