import { Inject, Injectable } from '@nestjs/common';
import type { AnswerOf, contract } from '@bellgap/common/api';
import { KNEX, type Database } from '../platform/knex';

export type Conductor = AnswerOf<typeof contract.conductors>[number];

const COLUMNS = [
  'c.code',
  'c.version',
  'c.title',
  'c.kind',
  'c.area_mm2',
  'c.diameter_mm',
  'c.weight_n_per_m',
  'c.rated_strength_kn',
  'c.note',
  'c.withdrawn',
] as const;

interface ConductorRow {
  code: string;
  version: number;
  title: string;
  kind: string;
  area_mm2: number;
  diameter_mm: number;
  weight_n_per_m: number;
  rated_strength_kn: number;
  note: string | null;
  withdrawn: boolean;
}

@Injectable()
export class ConductorsRepository {
  constructor(@Inject(KNEX) private readonly knex: Database) {}

  async newest(): Promise<Conductor[]> {
    const rows = (await this.knex('conductors as c')
      .whereNotExists(
        this.knex('conductors as n').select(this.knex.raw('1')).whereRaw('n.code = c.code and n.version > c.version'),
      )
      .orderBy('c.code')
      .select(...COLUMNS)) as ConductorRow[];
    return rows.map(toConductor);
  }
}

function toConductor(row: ConductorRow): Conductor {
  return {
    code: row.code,
    version: row.version,
    title: row.title,
    kind: row.kind,
    areaMm2: row.area_mm2,
    diameterMm: row.diameter_mm,
    weightNPerM: row.weight_n_per_m,
    ratedStrengthKn: row.rated_strength_kn,
    note: row.note,
    withdrawn: row.withdrawn,
  };
}
