import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { BasisMove, DesignBasis, RevisionState } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';

export type BasisContent = Pick<DesignBasis, 'number' | 'basis' | 'system' | 'rules' | 'worksheet' | 'note'>;

export interface BasisMoveMade {
  move: BasisMove;
  by: string;
  byId: string;
  at: Date;
  note: string;
}

/** A revision with its author, where it stands, and what was done with it. */
export interface StoredBasis {
  basis: DesignBasis;
  authorId: string;
  state: RevisionState;
  moves: BasisMoveMade[];
}

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

interface StoredRow extends BasisRow {
  author_id: string;
  state: RevisionState;
  moves: { move: BasisMove; by: string; by_id: string; at: string; note: string }[];
}

/** Revisions of the design basis of a project, and their moves: added, never changed. */
@Injectable()
export class DesignBasesRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  /** All revisions, the newest first. */
  async ofProject(projectId: string, db: Knex = this.knex): Promise<StoredBasis[]> {
    return (await this.standing(db).where('b.project_id', projectId)).map(toStored);
  }

  /** The issued revision; where none is issued, the one saved last. */
  async inForce(projectId: string, db: Knex = this.knex): Promise<DesignBasis | null> {
    const [row] = await this.select(db)
      .where('b.project_id', projectId)
      .whereRaw('b.revision = basis_in_force(b.project_id)');
    return row ? toBasis(row) : null;
  }

  async stateOf(basisId: string, db: Knex = this.knex): Promise<RevisionState | null> {
    const row = await db('design_basis_states')
      .where({ basis_id: basisId })
      .first<{ state: RevisionState } | undefined>('state');
    return row?.state ?? null;
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

  async insertMove(
    move: { basisId: string; move: BasisMove; by: string; at: Date; note: string },
    db: Knex,
  ): Promise<void> {
    const { basisId, ...made } = move;
    await db('design_basis_moves').insert({ basis_id: basisId, ...made });
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

  private standing(db: Knex): Knex.QueryBuilder<StoredRow, StoredRow[]> {
    return this.select(db)
      .join('design_basis_states as st', 'st.basis_id', 'b.id')
      .select(
        'b.created_by as author_id',
        'st.state',
        db.raw(
          `(select coalesce(json_agg(json_build_object(
              'move', m.move, 'by', u.name, 'by_id', m."by", 'at', m.at, 'note', m.note) order by m.id), '[]')
            from design_basis_moves as m join users as u on u.id = m."by" where m.basis_id = b.id) as moves`,
        ),
      ) as unknown as Knex.QueryBuilder<StoredRow, StoredRow[]>;
  }
}

function toBasis(row: BasisRow): DesignBasis {
  const { id, number, revision, basis, system, rules, worksheet, note } = row;
  const created = { createdAt: row.created_at.toISOString(), createdBy: row.created_by };
  return { id, number, revision, basis, system, rules, worksheet, note, ...created };
}

function toStored(row: StoredRow): StoredBasis {
  return {
    basis: toBasis(row),
    authorId: row.author_id,
    state: row.state,
    moves: row.moves.map(({ by_id: byId, at, ...made }) => ({ ...made, byId, at: new Date(at) })),
  };
}
