import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { CatalogueUnit, QueryOf } from '@bellgap/common/api';
import type { contract } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';
import { likePattern, listPage, type Page, type SortColumn } from '../platform/list';
import { fromUnit, INSULATOR_COLUMNS, toUnit, type InsulatorRow } from './insulator-row';

export type InsulatorsQuery = QueryOf<typeof contract.insulators>;

const SORTS: Record<string, SortColumn> = {
  code: { column: 'i.code', type: 'text' },
  failingLoadKn: { column: 'i.failing_load_kn', type: 'double precision' },
  spacingMm: { column: 'i.spacing_mm', type: 'double precision' },
  creepageMm: { column: 'i.creepage_mm', type: 'double precision' },
  diameterMm: { column: 'i.diameter_mm', type: 'double precision' },
};

@Injectable()
export class InsulatorsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  list(asked: InsulatorsQuery): Promise<Page<CatalogueUnit>> {
    const query = this.newest(this.knex).select(...INSULATOR_COLUMNS);
    for (const column of ['family', 'kind', 'material', 'profile'] as const) {
      if (asked[column]) void query.where(`i.${column}`, asked[column]);
    }
    if (asked.search) {
      const pattern = likePattern(asked.search);
      void query.where((either) => void either.whereILike('i.code', pattern).orWhereILike('i.note', pattern));
    }
    return listPage<InsulatorRow, CatalogueUnit>({
      query,
      knex: this.knex,
      asked,
      sorts: SORTS,
      defaultSort: 'code',
      idColumn: 'i.id',
      toItem: toUnit,
    });
  }

  async newestOf(code: string, db: Database = this.knex): Promise<CatalogueUnit | null> {
    const row = await db('insulators as i')
      .where('i.code', code)
      .orderBy('i.version', 'desc')
      .first<InsulatorRow | undefined>(...INSULATOR_COLUMNS);
    return row ? toUnit(row) : null;
  }

  async newestOfFamilies(families: readonly CatalogueUnit['family'][], db: Database): Promise<CatalogueUnit[]> {
    const rows = (await this.newest(db)
      .whereIn('i.family', [...families])
      .select(...INSULATOR_COLUMNS)) as InsulatorRow[];
    return rows.map(toUnit);
  }

  async newestLike({ family, kind, failingLoadKn }: CatalogueUnit): Promise<CatalogueUnit[]> {
    const rows = (await this.newest(this.knex)
      .where({ 'i.family': family, 'i.kind': kind, 'i.failing_load_kn': failingLoadKn })
      .select(...INSULATOR_COLUMNS)) as InsulatorRow[];
    return rows.map(toUnit);
  }

  /** A version that another process has added in the meantime is left as it is. */
  async add(units: readonly CatalogueUnit[], db: Database): Promise<void> {
    if (units.length === 0) return;
    await db('insulators').insert(units.map(fromUnit)).onConflict(['code', 'version']).ignore();
  }

  private newest(db: Database): Knex.QueryBuilder {
    return db('insulators as i').whereNotExists(
      db('insulators as n').select(db.raw('1')).whereRaw('n.code = i.code and n.version > i.version'),
    );
  }
}
