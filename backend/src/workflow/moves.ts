import { TRANSITIONS, type RevisionState, type TransitionName } from '@bellgap/common/api';
import { forbidden, wrongState } from '../platform/domain-error';
import type { SignedIn } from '../platform/person';
import { moveRefusal, type StoredRevision } from '../specifications/specifications.service';

/** Refuses a move by the one table of transitions: 409 from a wrong state, 403 to who may not make it. */
export function requireMove(person: SignedIn, name: TransitionName, revision: StoredRevision): void {
  const why = moveRefusal(person, name, revision);
  if (why === null) return;
  throw (TRANSITIONS[name].from as readonly RevisionState[]).includes(revision.state)
    ? forbidden(why)
    : wrongState(why);
}
