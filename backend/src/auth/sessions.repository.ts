import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { Role } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';

export interface StoredGrant {
  role: Role;
  projectId: string | null;
  checkCategory: number | null;
  validFrom: string;
  validTo: string | null;
}

/** A session with its person and all grants that were not ended, whatever their dates. */
export interface StoredSession {
  id: string;
  userId: string;
  name: string;
  email: string;
  isDemo: boolean;
  lastActiveAt: Date;
  expiresAt: Date;
  grants: StoredGrant[];
}

export interface SessionRow {
  id: string;
  created_at: Date;
  last_active_at: Date;
  expires_at: Date;
  address: string | null;
  user_agent: string | null;
}

/** Everything that a request needs to know of who asks, in one indexed read. */
const READ = `
  select s.id, s.user_id as "userId", s.last_active_at as "lastActiveAt", s.expires_at as "expiresAt",
    u.name, u.email, u.is_demo as "isDemo",
    coalesce((
      select json_agg(json_build_object('role', g.role, 'projectId', g.project_id, 'checkCategory', g.check_category,
        'validFrom', g.valid_from, 'validTo', g.valid_to))
      from role_grants g where g.user_id = u.id and g.ended_at is null
    ), '[]') as grants
  from sessions s join users u on u.id = s.user_id
  where s.id = ? and s.ended_at is null and u.active`;

@Injectable()
export class SessionsRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  async read(id: string): Promise<StoredSession | null> {
    const { rows } = await this.knex.raw<{ rows: StoredSession[] }>(READ, [id]);
    return rows[0] ?? null;
  }

  async insert(
    row: { userId: string; at: Date; expiresAt: Date; address: string | null; userAgent: string | null },
    db: Knex,
  ): Promise<string> {
    const [inserted] = (await db('sessions').insert(
      {
        user_id: row.userId,
        created_at: row.at,
        last_active_at: row.at,
        expires_at: row.expiresAt,
        address: row.address,
        user_agent: row.userAgent,
      },
      ['id'],
    )) as { id: string }[];
    return inserted!.id;
  }

  async touch(id: string, at: Date): Promise<void> {
    await this.knex('sessions').where({ id }).where('last_active_at', '<', at).update({ last_active_at: at });
  }

  /** Sessions of a person that still hold, newest first. */
  async open(userId: string, { now, activeSince }: { now: Date; activeSince: Date }): Promise<SessionRow[]> {
    return (await this.knex('sessions as s')
      .where('s.user_id', userId)
      .whereNull('s.ended_at')
      .where('s.expires_at', '>', now)
      .where('s.last_active_at', '>', activeSince)
      .orderBy('s.created_at', 'desc')
      .select('s.id', 's.created_at', 's.last_active_at', 's.expires_at', 's.address', 's.user_agent')) as SessionRow[];
  }

  /** Ends the sessions of a person that match; answers how many. */
  async end(which: { userId: string; id?: string; exceptId?: string }, at: Date, db: Knex): Promise<number> {
    const query = db('sessions').where({ user_id: which.userId }).whereNull('ended_at').where('expires_at', '>', at);
    if (which.id !== undefined) query.where({ id: which.id });
    if (which.exceptId !== undefined) query.whereNot({ id: which.exceptId });
    return query.update({ ended_at: at });
  }

  async forget(before: Date): Promise<void> {
    await this.knex('sessions').where('expires_at', '<', before).delete();
  }
}
