import { Inject, Injectable } from '@nestjs/common';
import type { EvaluationContext } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';

export type TableConfirmation = EvaluationContext['confirmations'][number];

interface ConfirmationRow {
  key: string;
  outcome: TableConfirmation['outcome'];
  edition: string;
  page: string;
  confirmed_on: string;
  confirmed_by_name: string;
}

@Injectable()
export class ConfirmationsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  /** The newest word on each table row or formula, by key. */
  async inForce(db: Database = this.knex): Promise<TableConfirmation[]> {
    const rows = (await db('table_confirmations as c')
      .join('users as u', 'u.id', 'c.confirmed_by')
      .distinctOn('c.key')
      .orderBy([{ column: 'c.key' }, { column: 'c.created_at', order: 'desc' }])
      .select(
        'c.key',
        'c.outcome',
        'c.edition',
        'c.page',
        'c.confirmed_on',
        'u.name as confirmed_by_name',
      )) as ConfirmationRow[];
    return rows.map((row) => ({
      key: row.key,
      outcome: row.outcome,
      edition: row.edition,
      page: row.page,
      on: row.confirmed_on,
      by: row.confirmed_by_name,
    }));
  }
}
