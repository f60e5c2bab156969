import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { RecordedConfirmation, TableConfirmation } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';

export interface NewConfirmation {
  key: string;
  outcome: TableConfirmation['outcome'];
  edition: string;
  page: string;
  on: string;
  note: string;
  by: string;
  at: Date;
}

interface ConfirmationRow {
  id: string;
  key: string;
  outcome: TableConfirmation['outcome'];
  edition: string;
  page: string;
  confirmed_on: string;
  note: string;
  confirmed_by_name: string;
  created_at: Date;
}

/** What owners of the print have recorded: added, never changed; of a key the newest word holds. */
@Injectable()
export class ConfirmationsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  /** The newest word on each table row or formula, by key. */
  async inForce(db: Database = this.knex): Promise<RecordedConfirmation[]> {
    const rows = await this.select(db)
      .distinctOn('c.key')
      .orderBy([{ column: 'c.key' }, { column: 'c.sequence', order: 'desc' }]);
    return rows.map(toConfirmation);
  }

  /** Every word, the newest first. */
  async all(): Promise<RecordedConfirmation[]> {
    return (await this.select(this.knex).orderBy('c.sequence', 'desc')).map(toConfirmation);
  }

  async insert({ by, at, on, ...confirmation }: NewConfirmation, db: Database): Promise<RecordedConfirmation> {
    const [row] = await db('table_confirmations')
      .insert({ ...confirmation, confirmed_on: on, confirmed_by: by, created_at: at })
      .returning<{ id: string }[]>('id');
    const [made] = await this.select(db).where('c.id', row!.id);
    return toConfirmation(made!);
  }

  private select(db: Database): Knex.QueryBuilder<ConfirmationRow, ConfirmationRow[]> {
    return db('table_confirmations as c')
      .join('users as u', 'u.id', 'c.confirmed_by')
      .select(
        'c.id',
        'c.key',
        'c.outcome',
        'c.edition',
        'c.page',
        'c.confirmed_on',
        'c.note',
        'c.created_at',
        'u.name as confirmed_by_name',
      ) as unknown as Knex.QueryBuilder<ConfirmationRow, ConfirmationRow[]>;
  }
}

function toConfirmation(row: ConfirmationRow): RecordedConfirmation {
  return {
    id: row.id,
    key: row.key,
    outcome: row.outcome,
    edition: row.edition,
    page: row.page,
    on: row.confirmed_on,
    note: row.note,
    by: row.confirmed_by_name,
    recordedAt: row.created_at.toISOString(),
  };
}
