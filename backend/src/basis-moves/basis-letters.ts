import { Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import { BASIS_CHECK_CATEGORY, type BasisMove } from '@bellgap/common/api';
import { MailService, type LetterKind, type RevisionNews } from '../mail/mail.service';
import type { SignedIn } from '../platform/person';
import type { BasisInProject } from '../projects/design-bases.service';
import { GrantsService } from '../users/grants.service';

/** The letter of a move; nobody holds copies of a basis, so its withdrawal is told by the marks on what rests on it. */
const KINDS = {
  submit: 'waits-for-check',
  check: 'waits-for-approval',
  return: 'returned',
  issue: 'issued',
  withdraw: null,
} as const satisfies Record<BasisMove, LetterKind | null>;

/** Letters to whom a revision of a design basis waits for, in the transaction of the move. */
@Injectable()
export class BasisLetters {
  constructor(
    private readonly grants: GrantsService,
    private readonly mail: MailService,
  ) {}

  async moved(
    db: Knex.Transaction,
    found: BasisInProject,
    { move, by, note }: { move: BasisMove; by: SignedIn; note: string },
  ): Promise<void> {
    const kind = KINDS[move];
    if (kind === null) return;
    const told = await this.readers(db, move, found);
    await this.mail.send(
      db,
      told.filter((id) => id !== by.id),
      { kind, data: newsOf(found, by, note) },
    );
  }

  private async readers(
    db: Knex.Transaction,
    move: BasisMove,
    { project, stored: { authorId, moves } }: BasisInProject,
  ): Promise<string[]> {
    const others = (people: string[]) => people.filter((id) => id !== authorId);
    if (move === 'submit') return others(await this.grants.checkers(project.id, BASIS_CHECK_CATEGORY, db));
    if (move === 'check') return others(await this.grants.holders(['approver'], project.id, db));
    const part = move === 'return' ? moves.filter((made) => made.move === 'submit') : moves;
    const writers = [authorId, ...part.map(({ byId }) => byId)];
    return move === 'return' ? writers : [...writers, ...(await this.grants.holders(['engineer'], project.id, db))];
  }
}

function newsOf({ project, stored: { basis } }: BasisInProject, by: SignedIn, note: string): RevisionNews {
  return {
    record: 'design-basis',
    number: basis.number,
    title: `Design basis of ${project.title}`,
    label: String(basis.revision),
    projectCode: project.code,
    byName: by.name,
    dueOn: null,
    note: note || null,
    path: `/projects/${encodeURIComponent(project.code)}/basis`,
  };
}
