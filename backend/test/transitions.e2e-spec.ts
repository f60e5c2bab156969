import {
  REVISION_STATES,
  TRANSITIONS,
  contract,
  type EndpointDefinition,
  type Revision,
  type RevisionState,
  type Role,
  type TransitionName,
} from '@bellgap/common/api';
import { Standing } from './support/standing';
import { TestApp } from './support/test-app';
import { WorkflowStory, submittableInput, type Actor } from './support/workflow-story';

jest.setTimeout(120_000);

/** Everybody who could try: one of each role, the author, and one who holds every role and has written in it. */
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

/** Moves with a route at the revision itself. Withdrawal stands at the issued sheet; nobody supersedes by hand. */
const ROUTES = {
  submit: contract.submitRevision,
  recall: contract.recallRevision,
  pass: contract.decideCheck,
  return: contract.decideCheck,
  refuse: contract.refuseRevision,
  issue: contract.issueRevision,
} as const satisfies Partial<Record<TransitionName, EndpointDefinition>>;
type Move = keyof typeof ROUTES;

describe('every move, from every state, by everybody', () => {
  let test: TestApp;
  let story: WorkflowStory;
  const people = new Map<Who, Actor>();
  const revisions = new Map<RevisionState, Revision>();

  beforeAll(async () => {
    test = await TestApp.start();
    story = await WorkflowStory.begin(test, 'MOV1');
    for (const [who, roles] of Object.entries(PEOPLE) as [Who, readonly Role[]][]) {
      people.set(who, who === 'author' ? story.engineer : await test.signedIn({ name: who, roles }));
    }
    const standing = new Standing(test, story.approver.person.id);
    for (const state of REVISION_STATES) {
      const draft = await withBothAuthors();
      if (state === 'draft') revisions.set(state, draft);
      else if (state === 'in_check') revisions.set(state, await story.submit(draft));
      else {
        const checked = await story.pass(await story.submit(draft));
        if (state !== 'checked') await standing.issue(checked, '0');
        if (state === 'superseded' || state === 'withdrawn') await standing.cease(checked, state);
        revisions.set(state, await story.get({ ...checked, label: 'A' }));
      }
      expect(revisions.get(state)!.state).toBe(state);
    }
  });
  afterAll(() => test.stop());

  /** A draft in which the author and the one with every role have written. */
  async function withBothAuthors(): Promise<Revision> {
    const draft = await story.draft();
    const { site } = submittableInput();
    const input = submittableInput({ site: { ...site!, altitudeM: 950 } });
    return story.save(draft, input, people.get('author with every role')!);
  }

  async function attempt(move: Move, who: Who, revision: Revision) {
    const { client, person } = people.get(who)!;
    const { password } = person;
    const bodies: Record<Move, object> = {
      submit: { checkCategory: 2, dueOn: null, note: '' },
      recall: { reason: 'Wrong unit' },
      pass: { verdict: 'pass', note: '', password },
      return: { verdict: 'return', note: 'Not yet', password },
      refuse: { reason: 'Wait' },
      issue: { acceptances: [], concessions: [], laterChangesReason: null, password },
    };
    const version =
      move === 'pass' || move === 'return'
        ? await versionOfRecord(who, revision)
        : (await story.get(revision)).lockVersion;
    return client.call(ROUTES[move] as EndpointDefinition, {
      params: story.at(revision),
      version,
      body: bodies[move],
    });
  }

  async function versionOfRecord(who: Who, revision: Revision): Promise<number> {
    const { status, answer } = await people.get(who)!.client.call(contract.check, { params: story.at(revision) });
    return status === 200 ? (answer.mine?.lockVersion ?? 1) : 1;
  }

  const isAuthor = (who: Who) => who === 'author' || who === 'author with every role';

  /** By the table, and the two rules beside it: nobody signs his own work, and who submitted takes it back. */
  function mayMake(move: Move, who: Who): boolean {
    if (!(PEOPLE[who] as readonly Role[]).includes(TRANSITIONS[move].role)) return false;
    if (move === 'recall') return who === 'author';
    return move === 'submit' || !isAuthor(who);
  }

  const cases = (Object.keys(ROUTES) as Move[]).flatMap((move) =>
    REVISION_STATES.flatMap((state) => (Object.keys(PEOPLE) as Who[]).map((who) => [move, state, who] as const)),
  );
  const isFrom = (move: Move, state: RevisionState) =>
    (TRANSITIONS[move].from as readonly RevisionState[]).includes(state);
  const refused = cases.filter(([move, state, who]) => !(isFrom(move, state) && mayMake(move, who)));
  const made = cases.filter(([move, state, who]) => isFrom(move, state) && mayMake(move, who));

  it('covers the table', () => {
    expect(cases).toHaveLength(6 * 6 * 8);
    expect([...Object.keys(ROUTES), 'supersede', 'withdraw'].sort()).toEqual(Object.keys(TRANSITIONS).sort());
    expect(made.map(([move, state, who]) => `${move} ${state} ${who}`)).toEqual([
      'submit draft author',
      'submit draft another engineer',
      'submit draft author with every role',
      'recall in_check author',
      'pass in_check checker',
      'return in_check checker',
      'refuse checked approver',
      'issue checked approver',
    ]);
  });

  it.each(refused)('%s from %s by %s is refused and changes nothing', async (move, state, who) => {
    const before = revisions.get(state)!;
    const { status, problem } = await attempt(move, who, before);
    const holdsRole = (PEOPLE[who] as readonly Role[]).includes(TRANSITIONS[move].role);
    expect(status).toBe(holdsRole && !isFrom(move, state) ? 409 : 403);
    expect(problem.detail).toMatch(/\w+ \w+/);
    const after = await story.get(before);
    expect([after.state, after.label, after.lockVersion]).toEqual([before.state, before.label, before.lockVersion]);
  });

  // Issuing has its own file.
  it.each(made.filter(([move]) => move !== 'issue'))('%s from %s by %s is made', async (move, state, who) => {
    let revision = await withBothAuthors();
    if (state !== 'draft') revision = await story.submit(revision);
    if (state === 'checked') revision = await story.pass(revision);
    if (move === 'pass' || move === 'return') {
      const by = people.get(who)!;
      await story.fillCheck(revision, await story.enterOwnFigures(revision, { by }), { by });
    }
    const listed = (await people.get(who)!.client.call(contract.revision, { params: story.at(revision) })).answer;
    expect(listed.moves.find(({ name }) => name === move)).toMatchObject({ allowed: true, why: null });
    expect((await attempt(move, who, revision)).status).toBe(201);
    expect((await story.get(revision)).state).toBe(TRANSITIONS[move].to);
    const events = (await test.database
      .owner('audit_events')
      .where({ entity: 'revision', entity_id: revision.id, actor_id: people.get(who)!.person.id })
      .pluck('action')) as string[];
    const actions = {
      submit: 'revision.submitted',
      recall: 'revision.recalled',
      pass: 'revision.checked',
      return: 'revision.returned',
      refuse: 'revision.refused',
      issue: 'revision.issued',
    };
    expect(events).toContain(actions[move]);
  });

  it('is not approved by who has checked it, whatever roles he holds', async () => {
    const both = await test.signedIn({ roles: ['checker', 'approver'] });
    const checked = await story.pass(await story.submitted(), { by: both });
    const { status, problem } = await both.client.call(contract.refuseRevision, {
      params: story.at(checked),
      version: checked.lockVersion,
      body: { reason: 'Wait' },
    });
    expect([status, problem.detail]).toEqual([403, 'You have checked this revision; somebody else approves it.']);
  });

  it('is not known to who has no part in the project', async () => {
    await test.database.owner('projects').insert({ ...(await otherProject()) });
    const elsewhere = await test.signedIn({ roles: ['engineer', 'checker', 'approver'], projects: ['MOV2'] });
    const revision = revisions.get('in_check')!;
    for (const endpoint of [contract.revision, contract.check, contract.remarks] as EndpointDefinition[]) {
      expect((await elsewhere.client.call(endpoint, { params: story.at(revision) })).status).toBe(404);
    }
    const recalled = await elsewhere.client.call(contract.recallRevision, {
      params: story.at(revision),
      version: 1,
      body: { reason: 'x' },
    });
    expect(recalled.status).toBe(404);
  });

  async function otherProject() {
    const row = (await test.database.owner('projects').where({ code: 'MOV1' }).first()) as Record<string, unknown>;
    const { id: _id, ...columns } = row;
    return { ...columns, code: 'MOV2' };
  }

  describe('the next revision', () => {
    const start = (number: string, by: Actor = story.engineer) =>
      by.client.call(contract.startRevision, { params: { code: 'MOV1', number } });

    it('begins from the one in force: A, B, then 0, then C', async () => {
      const other = await test.signedIn({ name: 'Ilse Norrland', roles: ['engineer'] });
      const returned = await story.returned(await story.submitted());
      const checked = await story.pass(await story.submit(returned));
      expect((await start(checked.number)).status).toBe(409);
      await new Standing(test, story.approver.person.id).issue(checked, '0');
      const { status, answer } = await start(checked.number, other);
      expect(status).toBe(201);
      expect(answer).toMatchObject({
        label: 'C',
        labels: ['C'],
        state: 'draft',
        derivedFrom: '0',
        input: checked.input,
        title: checked.title,
        authors: ['Ilse Norrland'],
        basis: { revision: 1 },
      });
      expect(answer.evaluation).toEqual((await story.get(checked)).evaluation);
      for (const label of ['A', 'B', '0']) {
        expect(await story.get({ ...checked, label })).toMatchObject({ id: checked.id, labels: ['A', 'B', '0'] });
      }
      const again = await start(checked.number);
      expect([again.status, again.problem.detail]).toEqual([
        409,
        'Revision C is in work already; the next one begins when it is issued.',
      ]);
    });

    it('needs one in force, and is begun once where two begin at once', async () => {
      const withdrawn = revisions.get('withdrawn')!;
      const none = await start(withdrawn.number);
      expect([none.status, none.problem.detail]).toEqual([
        409,
        'No revision is in force; the next one begins from an issued one.',
      ]);
      const issued = revisions.get('issued')!;
      const both = await Promise.all([start(issued.number), start(issued.number)]);
      expect(both.map(({ status }) => status).sort()).toEqual([201, 409]);
    });
  });
});
