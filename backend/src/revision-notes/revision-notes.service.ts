import { Inject, Injectable } from '@nestjs/common';
import type { BodyOf, RevisionNote, contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../platform/clock';
import { forbidden, notFound } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { SpecificationsService, type RevisionAddress } from '../specifications/specifications.service';
import { RevisionNotesRepository, type StoredNote } from './revision-notes.repository';

type Given = BodyOf<typeof contract.writeRevisionNote>;

/** Notes beside a revision, among them kept cases with their figures; they change nothing of the revision itself. */
@Injectable()
export class RevisionNotesService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly specifications: SpecificationsService,
    private readonly notes: RevisionNotesRepository,
  ) {}

  async list(person: SignedIn, address: RevisionAddress): Promise<RevisionNote[]> {
    const revision = await this.specifications.storedWithFigures(person, address);
    return (await this.notes.ofRevision(revision.id)).map((note) => noteAnswer(note, person));
  }

  async write(person: SignedIn, address: RevisionAddress, given: Given): Promise<RevisionNote> {
    const revision = await this.specifications.stored(person, address);
    return this.knex.transaction(async (db) => {
      const made = { ...given, revisionId: revision.id, by: person.id, at: this.clock.now() };
      const note = await this.notes.insert(made, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'revision-note.written',
        entity: 'revision-note',
        entityId: note.id,
        projectId: revision.projectId,
        changes: { title: { to: given.title }, figures: { to: given.figures }, text: { to: given.text } },
      });
      return noteAnswer(note, person);
    });
  }

  async remove(person: SignedIn, address: RevisionAddress, id: string): Promise<void> {
    const revision = await this.specifications.stored(person, address);
    await this.knex.transaction(async (db) => {
      const note = await this.notes.find(revision.id, id, db);
      if (!note) throw notFound('note');
      if (note.writtenById !== person.id) throw forbidden('Only who wrote a note may take it away.');
      await this.notes.delete(note.id, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'revision-note.removed',
        entity: 'revision-note',
        entityId: note.id,
        projectId: revision.projectId,
        changes: { title: { from: note.title }, figures: { from: note.figures }, text: { from: note.text } },
      });
    });
  }
}

function noteAnswer(note: StoredNote, person: Pick<SignedIn, 'id'>): RevisionNote {
  return {
    id: note.id,
    title: note.title,
    figures: note.figures,
    text: note.text,
    writtenBy: note.writtenBy,
    writtenAt: note.writtenAt.toISOString(),
    own: note.writtenById === person.id,
  };
}
