import {
  REVISION_STATE_WORDS,
  STATES_SHOWN,
  TRANSITIONS,
  coversCategory,
  trailFieldLabel,
  transitionsFrom,
  type Revision,
  type RevisionState,
  type TransitionName,
} from '@bellgap/common/api';
import { holdsRole, knownProjects, mayReadDrafts, mayWriteDrafts, type SignedIn } from '../platform/person';
import { siteDay } from '../platform/site-day';
import type { StoredRevision } from './revision-row';

type Asker = Pick<SignedIn, 'id' | 'grants'>;

/** Issued revisions are for all who know the project; the others for those who may read drafts. */
export function maySee(person: Asker, { state, projectId }: { state: RevisionState; projectId: string }): boolean {
  if (mayReadDrafts(person, projectId)) return true;
  const known = knownProjects(person);
  return STATES_SHOWN.includes(state) && (known === 'all' || known.includes(projectId));
}

/** Holds a checker's grant for the project, for a category or for any. */
export function isChecker({ grants }: Asker, projectId: string, category: number | null): boolean {
  return grants.some(
    (grant) =>
      grant.role === 'checker' &&
      (grant.projectId === null || grant.projectId === projectId) &&
      (category === null || coversCategory(grant.checkCategory, category)),
  );
}

export const isAuthor = ({ id }: Pick<Asker, 'id'>, { authors }: { authors: readonly { id: string }[] }): boolean =>
  authors.some((author) => author.id === id);

/**
 * A checker does not see the author's figures, by any route, before he has entered his own. Whoever has written in the
 * revision knows them, and cannot check it.
 */
export function figuresHidden(
  person: Asker,
  revision: Pick<StoredRevision, 'state' | 'projectId' | 'ownFiguresBy'> & { authors: readonly { id: string }[] },
): boolean {
  return (
    (revision.state === 'draft' || revision.state === 'in_check') &&
    isChecker(person, revision.projectId, null) &&
    !isAuthor(person, revision) &&
    !revision.ownFiguresBy.includes(person.id)
  );
}

export const OWN_COUNT_FIRST = 'Enter your own count first: until then the figures of the author stay hidden.';

/** Why a person may not make a move from where the revision stands; null where he may. */
export function moveRefusal(person: Asker, name: TransitionName, revision: StoredRevision): string | null {
  const { projectId, submitted, checked } = revision;
  if (!(TRANSITIONS[name].from as readonly RevisionState[]).includes(revision.state)) {
    return `This revision is ${REVISION_STATE_WORDS[revision.state]}.`;
  }
  switch (name) {
    case 'submit':
      return mayWriteDrafts(person, projectId) ? null : 'Only engineers of this project submit.';
    case 'recall':
      return submitted?.byId === person.id ? null : `Only ${submitted?.by ?? 'who submitted it'} can take it back.`;
    case 'pass':
    case 'return':
      if (!isChecker(person, projectId, null)) return 'Only checkers of this project check.';
      if (!isChecker(person, projectId, submitted?.checkCategory ?? null)) {
        return `Check category ${submitted?.checkCategory} is asked for; your grant does not cover it.`;
      }
      return ownWork(person, revision);
    case 'refuse':
    case 'issue':
      if (!holdsRole(person, ['approver'], projectId)) return 'Only approvers of this project issue.';
      return (
        ownWork(person, revision) ??
        (checked?.byId === person.id ? 'You have checked this revision; somebody else approves it.' : null)
      );
    case 'withdraw':
      return holdsRole(person, ['approver'], projectId) ? null : 'Only approvers of this project withdraw.';
    case 'supersede':
      return 'It is superseded when its successor is issued.';
  }
}

export function movesOf(person: Asker, revision: StoredRevision): Revision['moves'] {
  return transitionsFrom(revision.state).map((name) => {
    const why = moveRefusal(person, name, revision);
    return { name, allowed: why === null, why };
  });
}

/** One who could sign this revision loses that with his first edit; he is asked before. */
export function editBarsSigning(person: Asker, revision: StoredRevision): boolean {
  const { projectId } = revision;
  const couldSign = isChecker(person, projectId, null) || holdsRole(person, ['approver'], projectId);
  return revision.state === 'draft' && couldSign && mayWriteDrafts(person, projectId) && !isAuthor(person, revision);
}

/** Names the field and the day of the asker's last change; null where he has changed nothing. */
export function ownWork(
  { id }: Pick<Asker, 'id'>,
  { authors, siteTimeZone }: Pick<StoredRevision, 'authors' | 'siteTimeZone'>,
): string | null {
  const author = authors.find((one) => one.id === id);
  if (!author) return null;
  const what = WHOLE_CHANGES[author.path] ?? trailFieldLabel(author.path);
  return `You changed ${what} on ${siteDay(author.at, siteTimeZone)}; nobody checks or approves his own work.`;
}

/** Changes that are more than a field. */
const WHOLE_CHANGES: Record<string, string> = { input: 'the input', context: 'what the figures rest on' };
