import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { User } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';

export type Grant = User['grants'][number];

export interface NewGrant {
  userId: string;
  role: Grant['role'];
  projectId: string | null;
  checkCategory: number | null;
  validFrom: string;
  validTo: string | null;
  grantedBy: string | null;
  grantedAt: Date;
}

interface GrantRow {
  id: string;
  user_id: string;
  role: Grant['role'];
  project_code: string | null;
  check_category: number | null;
  valid_from: string;
  valid_to: string | null;
  granted_by: string | null;
  granted_at: Date;
}

@Injectable()
export class GrantsRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  /** Grants that were not ended, by person, the oldest first; those of other dates are shown with their dates. */
  async ofUsers(userIds: readonly string[], db: Knex = this.knex): Promise<Map<string, Grant[]>> {
    const grants = new Map<string, Grant[]>(userIds.map((id) => [id, []]));
    const rows = await this.select(db)
      .whereIn('g.user_id', [...userIds])
      .orderBy(['g.granted_at', 'g.id']);
    for (const row of rows) grants.get(row.user_id)?.push(toGrant(row));
    return grants;
  }

  /** Active people who hold one of the roles on a day, for everything or for the project; null asks for all projects. */
  async holders(
    asked: { roles: readonly Grant['role'][]; projectId: string | null; checkCategory?: number; day: string },
    db: Knex = this.knex,
  ): Promise<string[]> {
    const query = db('role_grants as g')
      .join('users as u', 'u.id', 'g.user_id')
      .where('u.active', true)
      .whereNull('g.ended_at')
      .whereIn('g.role', [...asked.roles])
      .where('g.valid_from', '<=', asked.day)
      .where((open) => open.whereNull('g.valid_to').orWhere('g.valid_to', '>=', asked.day))
      .distinct('g.user_id');
    const { checkCategory } = asked;
    if (checkCategory !== undefined) {
      query.where((open) => open.whereNull('g.check_category').orWhere('g.check_category', '>=', checkCategory));
    }
    if (asked.projectId !== null) {
      const { projectId } = asked;
      query.where((either) => either.whereNull('g.project_id').orWhere('g.project_id', projectId));
    }
    return (await query.pluck('g.user_id')) as string[];
  }

  async find(userId: string, id: string, db: Knex): Promise<Grant | null> {
    const [row] = await this.select(db).where('g.id', id).where('g.user_id', userId);
    return row ? toGrant(row) : null;
  }

  async insert(grant: NewGrant, db: Knex): Promise<string> {
    const [row] = (await db('role_grants').insert(
      {
        user_id: grant.userId,
        role: grant.role,
        project_id: grant.projectId,
        check_category: grant.checkCategory,
        valid_from: grant.validFrom,
        valid_to: grant.validTo,
        granted_by: grant.grantedBy,
        granted_at: grant.grantedAt,
      },
      ['id'],
    )) as { id: string }[];
    return row!.id;
  }

  async end(id: string, at: Date, db: Knex): Promise<void> {
    await db('role_grants').where({ id }).whereNull('ended_at').update({ ended_at: at });
  }

  private select(db: Knex): Knex.QueryBuilder<GrantRow, GrantRow[]> {
    return db('role_grants as g')
      .leftJoin('projects as p', 'p.id', 'g.project_id')
      .leftJoin('users as by', 'by.id', 'g.granted_by')
      .whereNull('g.ended_at')
      .select(
        'g.id',
        'g.user_id',
        'g.role',
        'p.code as project_code',
        'g.check_category',
        'g.valid_from',
        'g.valid_to',
        'by.name as granted_by',
        'g.granted_at',
      ) as unknown as Knex.QueryBuilder<GrantRow, GrantRow[]>;
  }
}

function toGrant(row: GrantRow): Grant {
  return {
    id: row.id,
    role: row.role,
    projectCode: row.project_code,
    checkCategory: row.check_category,
    validFrom: row.valid_from,
    validTo: row.valid_to,
    grantedBy: row.granted_by,
    grantedAt: row.granted_at.toISOString(),
  };
}
