import { peopleEndpoints, DRAFT_READERS, DRAFT_WRITERS, type Person, type Role } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { queryOf } from './queries';

export const sessionQuery = { ...queryOf(peopleEndpoints.currentSession), staleTime: Infinity };

/** Who is signed in, once that is known; pages inside the frame always have a person. */
export function useSession() {
  return useQuery(sessionQuery);
}

const NOBODY: Person = { id: '', email: '', name: '', roles: [] };

export function usePerson(): Person {
  return useSession().data?.user ?? NOBODY;
}

export function holds(person: Person, roles: readonly Role[]): boolean {
  return person.roles.some((role) => roles.includes(role));
}

export function maySeeDrafts(person: Person): boolean {
  return holds(person, DRAFT_READERS);
}

export function mayWriteDrafts(person: Person): boolean {
  return holds(person, DRAFT_WRITERS);
}
