import { Inject, Injectable } from '@nestjs/common';
import { KNEX, isUuid, type Database } from '../platform/knex';

export interface StoredRemark {
  id: string;
  label: string;
  path: string | null;
  text: string;
  raisedById: string;
  raisedBy: string;
  raisedAt: Date;
  closedAt: Date | null;
  answers: { id: string; text: string; by: string; at: string }[];
}

interface RemarkRow {
  id: string;
  label: string;
  path: string | null;
  text: string;
  raised_by: string;
  raised_by_name: string;
  raised_at: Date;
  closed_at: Date | null;
  answers: { id: string; text: string; by: string; at: string }[];
}

@Injectable()
export class RemarksRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  /** Remarks of a revision over all its letters, the oldest first. */
  async ofRevision(revisionId: string, db: Database = this.knex): Promise<StoredRemark[]> {
    const rows = (await this.select(db)
      .where('m.revision_id', revisionId)
      .orderBy(['m.raised_at', 'm.id'])) as RemarkRow[];
    return rows.map(toRemark);
  }

  async find(revisionId: string, id: string, db: Database): Promise<StoredRemark | null> {
    if (!isUuid(id)) return null;
    const [row] = (await this.select(db).where({ 'm.revision_id': revisionId, 'm.id': id })) as RemarkRow[];
    return row ? toRemark(row) : null;
  }

  async insert(
    remark: { revisionId: string; label: string; path: string | null; text: string; by: string; at: Date },
    db: Database,
  ): Promise<string> {
    const [row] = await db('review_remarks')
      .insert({
        revision_id: remark.revisionId,
        label: remark.label,
        path: remark.path,
        text: remark.text,
        raised_by: remark.by,
        raised_at: remark.at,
      })
      .returning<{ id: string }[]>('id');
    return row!.id;
  }

  async answer(answer: { remarkId: string; text: string; by: string; at: Date }, db: Database): Promise<void> {
    await db('review_answers').insert({
      remark_id: answer.remarkId,
      text: answer.text,
      written_by: answer.by,
      written_at: answer.at,
    });
  }

  async close(id: string, at: Date, db: Database): Promise<void> {
    await db('review_remarks').where({ id }).update({ closed_at: at });
  }

  private select(db: Database) {
    return db('review_remarks as m')
      .join('users as u', 'u.id', 'm.raised_by')
      .select(
        'm.id',
        'm.label',
        'm.path',
        'm.text',
        'm.raised_by',
        'u.name as raised_by_name',
        'm.raised_at',
        'm.closed_at',
        db.raw(`(select coalesce(json_agg(json_build_object('id', a.id, 'text', a.text, 'by', w.name, 'at', a.written_at)
            order by a.written_at, a.id), '[]')
          from review_answers as a join users as w on w.id = a.written_by where a.remark_id = m.id) as answers`),
      );
  }
}

function toRemark(row: RemarkRow): StoredRemark {
  return {
    id: row.id,
    label: row.label,
    path: row.path,
    text: row.text,
    raisedById: row.raised_by,
    raisedBy: row.raised_by_name,
    raisedAt: row.raised_at,
    closedAt: row.closed_at,
    answers: row.answers.map((answer) => ({ ...answer, at: new Date(answer.at).toISOString() })),
  };
}
