import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { DesignBasis } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';

export type BasisContent = Pick<DesignBasis, 'number' | 'basis' | 'system' | 'rules' | 'worksheet' | 'note'>;

interface BasisRow {
  id: string;
  number: string;
  revision: number;
  basis: string;
  system: DesignBasis['system'];
  rules: DesignBasis['rules'];
  worksheet: DesignBasis['worksheet'];
  note: string;
  created_at: Date;
  created_by: string | null;
}

/** Revisions of the design basis of a project: added, never changed. */
@Injectable()
export class DesignBasesRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  /** All revisions, the newest first. */
  async ofProject(projectId: string, db: Knex = this.knex): Promise<DesignBasis[]> {
    return (await this.select(db).where('b.project_id', projectId)).map(toBasis);
  }

  async newest(projectId: string, db: Knex = this.knex): Promise<DesignBasis | null> {
    const [row] = await this.select(db).where('b.project_id', projectId).limit(1);
    return row ? toBasis(row) : null;
  }

  async insert(
    basis: BasisContent & { projectId: string; revision: number; by: string; at: Date },
    db: Knex,
  ): Promise<void> {
    await db('design_bases').insert({
      project_id: basis.projectId,
      revision: basis.revision,
      number: basis.number,
      basis: basis.basis,
      system: JSON.stringify(basis.system),
      rules: JSON.stringify(basis.rules),
      worksheet: basis.worksheet ? JSON.stringify(basis.worksheet) : null,
      note: basis.note,
      created_by: basis.by,
      created_at: basis.at,
    });
  }

  private select(db: Knex): Knex.QueryBuilder<BasisRow, BasisRow[]> {
    return db('design_bases as b')
      .leftJoin('users as by', 'by.id', 'b.created_by')
      .orderBy('b.revision', 'desc')
      .select(
        'b.id',
        'b.number',
        'b.revision',
        'b.basis',
        'b.system',
        'b.rules',
        'b.worksheet',
        'b.note',
        'b.created_at',
        'by.name as created_by',
      ) as unknown as Knex.QueryBuilder<BasisRow, BasisRow[]>;
  }
}

function toBasis({ created_at: createdAt, created_by: createdBy, ...row }: BasisRow): DesignBasis {
  return { ...row, createdAt: createdAt.toISOString(), createdBy };
}
