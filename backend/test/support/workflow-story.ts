import {
  contract,
  type BodyOf,
  type Check,
  type Revision,
  type Role,
  type SpecificationInput,
} from '@bellgap/common/api';
import { CHECKLIST, filledPaths, type ChecklistItem } from '@bellgap/common/schemas';
import { begin, lineInput, makeLine } from './line-project';
import type { TestPerson } from './people';
import type { TestApp } from './test-app';
import type { TestClient } from './test-client';

/** Somebody who is signed in. */
export interface Actor {
  client: TestClient;
  person: TestPerson;
}

export interface At extends Record<string, string> {
  code: string;
  number: string;
  label: string;
}

const CLEARANCE: NonNullable<SpecificationInput['clearance']> = {
  method: 'iec-table',
  shapePhaseToEarth: 'conductor-structure',
  shapePhaseToPhase: 'conductor-conductor',
  fastFrontFrom: 'level',
  enGap: 'structure',
  externalClearanceMm: null,
  safetySource: null,
};

/** A whole input that may be submitted: no stop, no fail. */
export const submittableInput = (changes: Partial<SpecificationInput> = {}): SpecificationInput =>
  lineInput({ clearance: CLEARANCE, ...changes });

/** One project with its people, and the shortest ways to a revision in a state. */
export class WorkflowStory {
  private count = 0;

  private constructor(
    private readonly test: TestApp,
    readonly code: string,
    readonly engineer: Actor,
    readonly checker: Actor,
    readonly approver: Actor,
  ) {}

  static async begin(test: TestApp, code: string): Promise<WorkflowStory> {
    const actor = (name: string, role: Role) => test.signedIn({ name, roles: [role] });
    const engineer = await actor('Edda Rowan', 'engineer');
    const checker = await actor('Corin Vashti', 'checker');
    const approver = await actor('Anneke Thorold', 'approver');
    await makeLine(engineer.client, code);
    return new WorkflowStory(test, code, engineer, checker, approver);
  }

  /** A draft of a new number, saved whole. */
  async draft(changes: Partial<SpecificationInput> = {}, by: Actor = this.engineer): Promise<Revision> {
    this.count += 1;
    const begun = await begin(by.client, this.code, `W-${this.count}`);
    return this.save(begun, submittableInput(changes), by);
  }

  async save(revision: Revision, input: SpecificationInput, by: Actor = this.engineer): Promise<Revision> {
    const { title, overrides, lockVersion: version } = revision;
    const body = { title, input, overrides };
    const { status, answer } = await by.client.call(contract.saveRevision, {
      params: this.at(revision),
      version,
      body,
    });
    expect(status).toBe(200);
    return answer;
  }

  async submitted(changes: Partial<SpecificationInput> = {}): Promise<Revision> {
    return this.submit(await this.draft(changes));
  }

  async submit(
    revision: Revision,
    { by = this.engineer, ...asked }: { by?: Actor; checkCategory?: number; dueOn?: string | null; note?: string } = {},
  ): Promise<Revision> {
    const { status, answer, problem } = await by.client.call(contract.submitRevision, {
      params: this.at(revision),
      version: revision.lockVersion,
      body: { checkCategory: 2, dueOn: null, note: '', ...asked },
    });
    if (status !== 201) throw new Error(`not submitted: ${problem.detail} ${JSON.stringify(problem.errors)}`);
    return answer;
  }

  /** Own figures that agree with those of the sheet, by whatever cards mean something. */
  async enterOwnFigures(
    revision: Revision,
    { by = this.checker, units }: { by?: Actor; units?: number } = {},
  ): Promise<Check> {
    const params = this.at(revision);
    const { cards } = (await by.client.call(contract.check, { params })).answer;
    const cardOf = (unit: string) => cards.find((card) => card.inRange && card.unit === unit)?.id ?? null;
    const { evaluation } = (await this.engineer.client.call(contract.revision, { params })).answer;
    const clearanceMm = evaluation?.clearances?.phaseToEarthMm ?? null;
    const count = units ?? evaluation?.string?.units ?? null;
    const { status, answer, problem } = await by.client.call(contract.enterOwnFigures, {
      params,
      body: {
        units: cardOf('units') === null ? null : count,
        unitsCard: cardOf('units'),
        clearanceMm: cardOf('mm') === null ? null : clearanceMm,
        clearanceCard: cardOf('mm'),
        note: 'By the rules named',
      },
    });
    if (status !== 201) throw new Error(`no own figures: ${problem.detail}`);
    return answer;
  }

  /** Every input ticked and every point answered, so that it may be passed. */
  async fillCheck(
    revision: Revision,
    check: Check,
    { by = this.checker, differenceReason = '' }: { by?: Actor; differenceReason?: string } = {},
  ): Promise<Check> {
    const body = { ...wholeCheck(revision.input), differenceReason };
    const { status, answer, problem } = await by.client.call(contract.saveCheck, {
      params: this.at(revision),
      version: check.mine!.lockVersion,
      body,
    });
    if (status !== 200) throw new Error(`check not saved: ${problem.detail}`);
    return answer;
  }

  decide(
    revision: Revision,
    check: Check,
    {
      by = this.checker,
      verdict = 'pass',
      note = '',
    }: { by?: Actor; verdict?: 'pass' | 'pass-with-notes' | 'return'; note?: string } = {},
  ) {
    return by.client.call(contract.decideCheck, {
      params: this.at(revision),
      version: check.mine!.lockVersion,
      body: { verdict, note, password: by.person.password },
    });
  }

  /** From submitted to checked. */
  async pass(revision: Revision, { by = this.checker }: { by?: Actor } = {}): Promise<Revision> {
    const begun = await this.enterOwnFigures(revision, { by });
    const whole = await this.fillCheck(revision, begun, { by });
    const { status, problem } = await this.decide(revision, whole, { by });
    if (status !== 201) throw new Error(`not passed: ${problem.detail} ${JSON.stringify(problem.errors)}`);
    return this.get(revision);
  }

  async checked(changes: Partial<SpecificationInput> = {}): Promise<Revision> {
    return this.pass(await this.submitted(changes));
  }

  /** From submitted back to a draft, by the checker. */
  async returned(revision: Revision, note = 'Altitude: which structure is it?'): Promise<Revision> {
    const check = await this.enterOwnFigures(revision);
    const { status, problem } = await this.decide(revision, check, { verdict: 'return', note });
    if (status !== 201) throw new Error(`not returned: ${problem.detail}`);
    return this.get(revision);
  }

  async get({ number, label }: Pick<Revision, 'number' | 'label'>, by: Actor = this.engineer): Promise<Revision> {
    const { status, answer } = await by.client.call(contract.revision, { params: this.at({ number, label }) });
    expect(status).toBe(200);
    return answer;
  }

  at({ number, label }: Pick<Revision, 'number' | 'label'>): At {
    return { code: this.code, number, label };
  }
}

export function wholeCheck(input: SpecificationInput): BodyOf<typeof contract.saveCheck> {
  return {
    ticks: filledPaths(input).map((path) => ({ path, seenIn: 'Design basis', agreed: true })),
    checklist: (Object.keys(CHECKLIST) as ChecklistItem[]).map((item) => ({ item, answer: 'yes', note: '' })),
    differenceReason: '',
    independent: true,
  };
}
