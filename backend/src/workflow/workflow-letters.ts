import { Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { MailService, type RevisionNews } from '../mail/mail.service';
import type { SignedIn } from '../platform/person';
import type { StoredRevision } from '../specifications/specifications.service';
import { GrantsService } from '../users/grants.service';

type By = Pick<SignedIn, 'id' | 'name'>;

/** Letters to whom a revision waits for, in the transaction of the move. */
@Injectable()
export class WorkflowLetters {
  constructor(
    private readonly grants: GrantsService,
    private readonly mail: MailService,
  ) {}

  async waitsForCheck(
    db: Knex.Transaction,
    revision: StoredRevision,
    { by, dueOn, note, checkCategory }: { by: By; dueOn: string | null; note: string; checkCategory: number },
  ): Promise<void> {
    const checkers = await this.grants.checkers(revision.projectId, checkCategory, db);
    await this.mail.send(db, withoutAuthors(checkers, revision), {
      kind: 'waits-for-check',
      data: { ...newsOf(revision, by, 'check'), dueOn, note: note || null },
    });
  }

  async waitsForApproval(db: Knex.Transaction, revision: StoredRevision, by: By, note: string): Promise<void> {
    const approvers = await this.grants.holders(['approver'], revision.projectId, db);
    const others = withoutAuthors(approvers, revision).filter((id) => id !== by.id);
    await this.mail.send(db, others, {
      kind: 'waits-for-approval',
      data: { ...newsOf(revision, by, 'approval'), dueOn: revision.submitted?.dueOn ?? null, note: note || null },
    });
  }

  /** To all who have written in it: one of them will go on. */
  async returned(db: Knex.Transaction, revision: StoredRevision, by: By, note: string): Promise<void> {
    const authors = revision.authors.map(({ id }) => id).filter((id) => id !== by.id);
    await this.mail.send(db, authors, { kind: 'returned', data: { ...newsOf(revision, by), note: note || null } });
  }
}

function withoutAuthors(people: readonly string[], { authors }: StoredRevision): string[] {
  return people.filter((id) => !authors.some((author) => author.id === id));
}

/** With the page that the letter leads to: that of the work, or the specification itself. */
function newsOf(revision: StoredRevision, by: By, page: 'check' | 'approval' | null = null): RevisionNews {
  const { number, title, label, projectCode } = revision;
  const specification = `/projects/${encodeURIComponent(projectCode)}/specifications/${encodeURIComponent(number)}`;
  const path = page === null ? specification : `${specification}/revisions/${label}/${page}`;
  return { number, title, label, projectCode, byName: by.name, dueOn: null, note: null, path };
}
