import { Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { MailService, type RevisionNews } from '../mail/mail.service';
import type { SignedIn } from '../platform/person';
import type { StoredRevision } from '../specifications/specifications.service';
import { GrantsService } from '../users/grants.service';

type Told = Pick<StoredRevision, 'number' | 'title' | 'label' | 'projectCode'>;

/** Letters about what is issued, replaced and withdrawn, in the transaction of the move. */
@Injectable()
export class IssueLetters {
  constructor(
    private readonly grants: GrantsService,
    private readonly mail: MailService,
  ) {}

  /** To who wrote it, who checked it, and who buys by it. */
  async issued(
    db: Knex.Transaction,
    revision: Told & Pick<StoredRevision, 'projectId' | 'authors' | 'submitted' | 'checked'>,
    { by, sheetId }: { by: SignedIn; sheetId: string },
  ): Promise<void> {
    const { authors, submitted, checked, projectId } = revision;
    const buyers = await this.grants.holders(['procurement'], projectId, db);
    const people = [...authors.map(({ id }) => id), submitted?.byId, checked?.byId, ...buyers];
    await this.mail.send(db, others(people, by), { kind: 'issued', data: newsOf(revision, by, sheetId) });
  }

  /** To who took a copy of the sheet before. */
  async superseded(
    db: Knex.Transaction,
    revision: Told,
    of: { by: SignedIn; sheetId: string; holders: readonly string[]; formerLabel: string },
  ): Promise<void> {
    await this.mail.send(db, others(of.holders, of.by), {
      kind: 'superseded-you-hold-a-copy',
      data: { ...newsOf(revision, of.by, of.sheetId), note: `You hold a copy of revision ${of.formerLabel}.` },
    });
  }

  async withdrawn(
    db: Knex.Transaction,
    sheet: Told,
    of: { by: SignedIn; sheetId: string; holders: readonly string[]; reason: string },
  ): Promise<void> {
    await this.mail.send(db, others(of.holders, of.by), {
      kind: 'withdrawn-you-hold-a-copy',
      data: { ...newsOf(sheet, of.by, of.sheetId), note: of.reason },
    });
  }
}

const others = (people: readonly (string | undefined)[], by: SignedIn): string[] =>
  people.filter((id): id is string => id !== undefined && id !== by.id);

function newsOf({ number, title, label, projectCode }: Told, by: SignedIn, sheetId: string): RevisionNews {
  return { number, title, label, projectCode, byName: by.name, dueOn: null, note: null, path: `/sheets/${sheetId}` };
}
