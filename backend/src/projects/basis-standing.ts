import {
  BASIS_CHECK_CATEGORY,
  REVISION_STATE_WORDS,
  TRANSITIONS,
  basisMovesFrom,
  basisTransition,
  coversCategory,
  type BasisMove,
  type Role,
  type StandingBasis,
} from '@bellgap/common/api';
import { holdsRole, type SignedIn } from '../platform/person';
import { siteDay } from '../platform/site-day';
import type { StoredBasis } from './design-bases.repository';
import type { ProjectRecord } from './projects.repository';

type Asker = Pick<SignedIn, 'id' | 'grants'>;
type Site = Pick<ProjectRecord, 'id' | 'siteTimeZone'>;

/** Why a move does not start from where the revision stands, whoever asks; null where it does. */
export function orderRefusal(move: BasisMove, stored: StoredBasis, all: readonly StoredBasis[]): string | null {
  if (basisTransition(move, stored.state) === null) {
    return `This revision is ${REVISION_STATE_WORDS[stored.state]}.`;
  }
  if (move === 'return') return null;
  const later = all.find(
    ({ basis, moves }) => basis.revision > stored.basis.revision && moves.some((made) => made.move === 'issue'),
  );
  return later ? `Revision ${later.basis.revision} was issued since; an older one goes no further.` : null;
}

/** Why a person may not make a move that starts here; null where he may. */
export function personRefusal(
  person: Asker,
  move: BasisMove,
  { state, authorId, moves, basis }: StoredBasis,
  { id: projectId, siteTimeZone }: Site,
): string | null {
  const name = basisTransition(move, state);
  const role = name && TRANSITIONS[name].role;
  if (!role || !holdsFor(person, role, projectId)) return `Only ${role}s of this project ${WORDS[move]}.`;
  if (move === 'submit' || move === 'withdraw') return null;
  if (authorId === person.id) {
    const day = siteDay(new Date(basis.createdAt), siteTimeZone);
    return `You wrote this revision on ${day}; nobody checks or approves his own work.`;
  }
  const checkedBy = moves.findLast((made) => made.move === 'check')?.byId;
  return role === 'approver' && checkedBy === person.id
    ? 'You have checked this revision; somebody else approves it.'
    : null;
}

function holdsFor(person: Asker, role: Role, projectId: string): boolean {
  if (role !== 'checker') return holdsRole(person, [role], projectId);
  const grants = person.grants.filter(({ checkCategory }) => coversCategory(checkCategory, BASIS_CHECK_CATEGORY));
  return holdsRole({ grants }, ['checker'], projectId);
}

const WORDS: Record<BasisMove, string> = {
  submit: 'submit',
  check: 'check',
  return: 'return it from here',
  issue: 'issue',
  withdraw: 'withdraw',
};

/** A revision as a person sees it. */
export function standingOf(person: Asker, stored: StoredBasis, all: readonly StoredBasis[], site: Site): StandingBasis {
  return {
    ...stored.basis,
    state: stored.state,
    moves: stored.moves.map(({ move, by, at, note }) => ({ move, by, on: siteDay(at, site.siteTimeZone), note })),
    allowed: basisMovesFrom(stored.state).map((name) => {
      const why = orderRefusal(name, stored, all) ?? personRefusal(person, name, stored, site);
      return { name, allowed: why === null, why };
    }),
  };
}
