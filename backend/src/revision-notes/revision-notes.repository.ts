import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { RevisionNote } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';

type Figures = RevisionNote['figures'];

export interface StoredNote {
  id: string;
  title: string;
  figures: Figures;
  text: string;
  writtenById: string;
  writtenBy: string;
  writtenAt: Date;
}

interface NoteRow {
  id: string;
  title: string;
  figures: Figures;
  text: string;
  written_by: string;
  written_by_name: string;
  written_at: Date;
}

@Injectable()
export class RevisionNotesRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  /** Notes of a revision, the newest first. */
  async ofRevision(revisionId: string): Promise<StoredNote[]> {
    const rows = await this.select(this.knex)
      .where('n.revision_id', revisionId)
      .orderBy([{ column: 'n.written_at', order: 'desc' }, 'n.id']);
    return rows.map(toNote);
  }

  /** The id is compared as text, so that one that is no id finds nothing. */
  async find(revisionId: string, id: string, db: Database): Promise<StoredNote | null> {
    const [row] = await this.select(db).where('n.revision_id', revisionId).whereRaw('n.id::text = ?', [id]);
    return row ? toNote(row) : null;
  }

  async insert(
    note: { revisionId: string; title: string; figures: Figures; text: string; by: string; at: Date },
    db: Database,
  ): Promise<StoredNote> {
    const [row] = await db('revision_notes')
      .insert({
        revision_id: note.revisionId,
        title: note.title,
        figures: note.figures && JSON.stringify(note.figures),
        text: note.text,
        written_by: note.by,
        written_at: note.at,
      })
      .returning<{ id: string }[]>('id');
    return (await this.find(note.revisionId, row!.id, db))!;
  }

  async delete(id: string, db: Database): Promise<void> {
    await db('revision_notes').where({ id }).delete();
  }

  private select(db: Database): Knex.QueryBuilder<NoteRow, NoteRow[]> {
    return db('revision_notes as n')
      .join('users as u', 'u.id', 'n.written_by')
      .select(
        'n.id',
        'n.title',
        'n.figures',
        'n.text',
        'n.written_by',
        'n.written_at',
        'u.name as written_by_name',
      ) as unknown as Knex.QueryBuilder<NoteRow, NoteRow[]>;
  }
}

function toNote(row: NoteRow): StoredNote {
  return {
    id: row.id,
    title: row.title,
    figures: row.figures,
    text: row.text,
    writtenById: row.written_by,
    writtenBy: row.written_by_name,
    writtenAt: row.written_at,
  };
}
