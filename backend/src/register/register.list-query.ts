import { Inject, Injectable } from '@nestjs/common';
import type { QueryOf, RegisterRow, contract } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';
import { likePattern, listPage, orderedBy, type Page, type SortColumn } from '../platform/list';
import { REGISTER_COLUMNS, issuedSheets, toRegisterRow, type RegisterColumns } from './register-row';

/** Each order stands in an index, so that a deep page costs no more than the first. */
const SORTS: Record<string, SortColumn> = {
  issuedAt: orderedBy('s.drawn_at', 'timestamptz'),
  number: orderedBy('s.number', 'text'),
  title: orderedBy('s.title', 'text'),
  units: {
    column: 's.units',
    type: 'integer',
    ordered: { up: 'coalesce(s.units, 999999999)', down: 'coalesce(s.units, -1)' },
  },
  highestVoltageKv: {
    column: 's.highest_voltage_kv',
    type: 'double precision',
    ordered: { up: 'coalesce(s.highest_voltage_kv, 1e9)', down: 'coalesce(s.highest_voltage_kv, -1e9)' },
  },
  altitudeM: {
    column: 's.altitude_m',
    type: 'double precision',
    ordered: { up: 'coalesce(s.altitude_m, 1e9)', down: 'coalesce(s.altitude_m, -1e9)' },
  },
};

const LATE_DAYS = 30;
const LATE_LIMIT = 20;

/** The register as a person may know it: issued sheets of the projects of his grants. */
@Injectable()
export class RegisterListQuery {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  page(projects: 'all' | string[], asked: QueryOf<typeof contract.sheets>): Promise<Page<RegisterRow>> {
    const query = this.rows(projects);
    if (asked.projectCode) void query.where('p.code', asked.projectCode);
    if (asked.standing) void query.where('s.standing', asked.standing);
    if (asked.insulatorCode) void query.where('s.insulator_code', asked.insulatorCode);
    if (asked.kind) void query.where('s.specification_kind', asked.kind);
    if (asked.search) {
      const pattern = likePattern(asked.search);
      void query.where((either) => void either.whereILike('s.number', pattern).orWhereILike('s.title', pattern));
    }
    return listPage<RegisterColumns, RegisterRow>({
      query,
      knex: this.knex,
      asked,
      sorts: SORTS,
      defaultSort: '-issuedAt',
      idColumn: 's.id',
      toItem: toRegisterRow,
    });
  }

  /** Issued in the last month, the newest first. */
  async ofLate(projects: 'all' | string[], now: Date): Promise<RegisterRow[]> {
    const rows = (await this.rows(projects)
      .where('s.drawn_at', '>', new Date(now.getTime() - LATE_DAYS * 86_400_000))
      .orderBy([
        { column: 's.drawn_at', order: 'desc' },
        { column: 's.id', order: 'desc' },
      ])
      .limit(LATE_LIMIT)) as RegisterColumns[];
    return rows.map(toRegisterRow);
  }

  private rows(projects: 'all' | string[]) {
    const query = issuedSheets(this.knex).select([...REGISTER_COLUMNS]);
    return projects === 'all' ? query : query.whereIn('s.project_id', projects);
  }
}
