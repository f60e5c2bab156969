import { Injectable } from '@nestjs/common';
import { DRAFT_READERS, type Concession, type QueryOf, type contract } from '@bellgap/common/api';
import { Clock } from '../platform/clock';
import type { Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { ConcessionsRepository, type NewConcession } from './concessions.repository';

export type { NewConcession };

/** What approvers took upon themselves: reasons for what lies outside a source, and concessions with their end. */
@Injectable()
export class ConcessionsService {
  constructor(
    private readonly clock: Clock,
    private readonly concessions: ConcessionsRepository,
  ) {}

  /** Concessions in force, for those who may read what they were given for. */
  list(person: SignedIn, { projectCode, within }: QueryOf<typeof contract.concessions>): Promise<Concession[]> {
    return this.concessions.ending(
      {
        projects: projectsOfDrafts(person),
        projectCode,
        withinDays: within === undefined ? undefined : Number(within),
      },
      this.clock.now(),
    );
  }

  /** For the desk: those that end soon, or have ended. */
  ending(person: SignedIn, withinDays: number): Promise<Concession[]> {
    return this.concessions.ending({ projects: projectsOfDrafts(person), withinDays }, this.clock.now());
  }

  ofRevision(revisionId: string): Promise<Concession[]> {
    return this.concessions.ofRevision(revisionId, this.clock.now());
  }

  record(
    given: readonly NewConcession[],
    to: { revisionId: string; by: string; at: Date },
    db: Database,
  ): Promise<void> {
    return this.concessions.insert(given, to, db);
  }
}

/** Projects of whose drafts a person may know. */
function projectsOfDrafts({ grants }: SignedIn): 'all' | string[] {
  const ids = grants.filter(({ role }) => DRAFT_READERS.includes(role)).map(({ projectId }) => projectId);
  return ids.includes(null) ? 'all' : ids.filter((id) => id !== null);
}
