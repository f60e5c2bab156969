import { contract, type Approval, type IssuedSheet, type Revision, type SpecificationInput } from '@bellgap/common/api';
import { CHECKLIST, filledPaths } from '@bellgap/common/schemas';
import { begin, lineInput } from './line-project';
import type { TestApp } from './test-app';
import type { TestClient } from './test-client';

export interface Place {
  code: string;
  number: string;
}

export interface Signers {
  engineer: TestClient;
  checker: TestClient;
  approver: TestClient;
  password: string;
}

/** A string whose clearance is set by the printed table, without anything that has to be accepted. */
export const QUIET: SpecificationInput = lineInput({
  clearance: {
    method: 'iec-table',
    shapePhaseToEarth: 'conductor-structure',
    shapePhaseToPhase: 'conductor-conductor',
    fastFrontFrom: 'level',
    enGap: 'structure',
    externalClearanceMm: null,
    safetySource: null,
  },
});

export async function signersOf(test: TestApp, projects?: readonly string[]): Promise<Signers> {
  const engineer = await test.signedIn({ name: 'Edda Rowan', roles: ['engineer'], projects });
  const checker = await test.signedIn({ name: 'Corin Ashby', roles: ['checker'], projects });
  const approver = await test.signedIn({ name: 'Asta Velin', roles: ['approver'], projects });
  return {
    engineer: engineer.client,
    checker: checker.client,
    approver: approver.client,
    password: approver.person.password,
  };
}

const at = ({ code, number }: Place, label = 'latest') => ({ code, number, label });
const answered = <T>({ status, answer, problem }: { status: number; answer: T; problem: unknown }): T => {
  if (status >= 400) throw new Error(`${status}: ${JSON.stringify(problem)}`);
  return answer;
};

/** Saves the draft and hands it in. */
export async function submit(
  { engineer }: Pick<Signers, 'engineer'>,
  place: Place,
  input: SpecificationInput = QUIET,
): Promise<Revision> {
  const draft = answered(await engineer.call(contract.revision, { params: at(place) }));
  const params = at(place, draft.label);
  const body = { title: draft.title, input, overrides: draft.overrides };
  const saved = answered(await engineer.call(contract.saveRevision, { params, version: draft.lockVersion, body }));
  const handedIn = { checkCategory: 2, dueOn: null, note: '' };
  return answered(await engineer.call(contract.submitRevision, { params, version: saved.lockVersion, body: handedIn }));
}

/** Checks what is handed in as it has to be, and passes it. */
export async function pass({ checker, password }: Pick<Signers, 'checker' | 'password'>, place: Place): Promise<void> {
  const params = at(place);
  const { input } = answered(await checker.call(contract.revision, { params }));
  const ownFigures = { units: null, unitsCard: null, clearanceMm: null, clearanceCard: null, note: 'By hand' };
  answered(await checker.call(contract.enterOwnFigures, { params, body: ownFigures }));
  const body = {
    ticks: filledPaths(input).map((path) => ({ path, seenIn: 'line list', agreed: true })),
    checklist: Object.keys(CHECKLIST).map((item) => ({ item, answer: 'yes', note: '' })),
    differenceReason: '',
    independent: true,
  };
  const { mine } = answered(await checker.call(contract.saveCheck, { params, version: 1, body }));
  const verdict = { verdict: 'pass', note: '', password };
  answered(await checker.call(contract.decideCheck, { params, version: mine!.lockVersion, body: verdict }));
}

/** A new specification that waits for its approval. */
export async function toApproval(signers: Signers, place: Place, input?: SpecificationInput): Promise<void> {
  await begin(signers.engineer, place.code, place.number);
  await submit(signers, place, input);
  await pass(signers, place);
}

/** What an approver sends who accepts everything that is to be accepted. */
export function acceptingAll({ acceptances, fails, laterChanges }: Approval, password: string) {
  return {
    acceptances: acceptances.map((one) => ({ ...one, reason: 'Seen and accepted' })),
    concessions: fails.map((one) => ({ ...one, reason: 'Until the change', validUntil: '2099-12-31' })),
    laterChangesReason: laterChanges.length === 0 ? null : 'Does not touch this sheet',
    password,
  };
}

export async function tryToIssue({ approver, password }: Pick<Signers, 'approver' | 'password'>, place: Place) {
  const params = at(place);
  const { lockVersion } = answered(await approver.call(contract.revision, { params }));
  const approval = answered(await approver.call(contract.approval, { params }));
  const body = acceptingAll(approval, password);
  return approver.call(contract.issueRevision, { params, version: lockVersion, body });
}

export async function issue(signers: Signers, place: Place, input?: SpecificationInput): Promise<IssuedSheet> {
  await toApproval(signers, place, input);
  return answered(await tryToIssue(signers, place));
}

/** Begins the next revision from the one in force and brings it to issue. */
export async function issueNext(signers: Signers, place: Place, input?: SpecificationInput): Promise<IssuedSheet> {
  answered(await signers.engineer.call(contract.startRevision, { params: { ...place } }));
  await submit(signers, place, input);
  await pass(signers, place);
  return answered(await tryToIssue(signers, place));
}
