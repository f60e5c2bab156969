import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type { Role } from '@bellgap/common/api';
import { DRAFT_READERS, DRAFT_WRITERS } from '@bellgap/common/api';
import { forbidden, notFound, notSignedIn } from './domain-error';

/** A role held today. */
export interface HeldGrant {
  role: Role;
  /** Null for all projects. */
  projectId: string | null;
  checkCategory: number | null;
}

/** Who is asking, with what he may do today. */
export interface SignedIn {
  id: string;
  name: string;
  email: string;
  grants: readonly HeldGrant[];
  sessionId: string;
}

export type PersonRequest = Request & { person?: SignedIn };

/** The signed-in person of a request. */
export const CurrentPerson = createParamDecorator((_: unknown, context: ExecutionContext): SignedIn => {
  const { person } = context.switchToHttp().getRequest<PersonRequest>();
  if (!person) throw notSignedIn();
  return person;
});

/** The same on open routes: null for a stranger. */
export const MaybePerson = createParamDecorator(
  (_: unknown, context: ExecutionContext): SignedIn | null =>
    context.switchToHttp().getRequest<PersonRequest>().person ?? null,
);

type Grants = Pick<SignedIn, 'grants'>;

/** Holds one of the roles in any project. */
export function holdsAnywhere({ grants }: Grants, roles: readonly Role[]): boolean {
  return grants.some(({ role }) => roles.includes(role));
}

/** Holds one of the roles for this project; null asks for a grant that is limited to no project. */
export function holdsRole({ grants }: Grants, roles: readonly Role[], projectId: string | null): boolean {
  return grants.some(
    (grant) => roles.includes(grant.role) && (grant.projectId === null || grant.projectId === projectId),
  );
}

export function requireRole(person: Grants, roles: readonly Role[], projectId: string | null): void {
  if (!holdsRole(person, roles, projectId)) throw forbidden();
}

export const mayReadDrafts = (person: Grants, projectId: string) => holdsRole(person, DRAFT_READERS, projectId);
export const mayWriteDrafts = (person: Grants, projectId: string) => holdsRole(person, DRAFT_WRITERS, projectId);

/** To who may not see drafts of this project they do not exist. */
export function requireDraftReader(person: Grants, projectId: string, what: string): void {
  if (!mayReadDrafts(person, projectId)) throw notFound(what);
}

/** Projects that a person may know of: those of his grants, all where one of them is not limited. */
export function knownProjects({ grants }: Grants): 'all' | string[] {
  const ids = grants.map(({ projectId }) => projectId);
  return ids.includes(null) ? 'all' : ids.filter((id) => id !== null);
}
