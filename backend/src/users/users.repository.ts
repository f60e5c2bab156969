import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { QueryOf, contract } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';
import { likePattern, listPage, type Page } from '../platform/list';

export interface UserRecord {
  id: string;
  email: string;
  name: string;
  active: boolean;
  hasPassword: boolean;
  createdAt: Date;
}

interface UserRow {
  id: string;
  email: string;
  name: string;
  active: boolean;
  has_password: boolean;
  created_at: Date;
}

const COLUMNS = ['u.id', 'u.email', 'u.name', 'u.active', 'u.created_at'];
const SORTS = {
  name: { column: 'u.name', type: 'text' },
  email: { column: 'u.email', type: 'text' },
  createdAt: { column: 'u.created_at', type: 'timestamptz' },
} as const;

@Injectable()
export class UsersRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  list(asked: QueryOf<typeof contract.users>): Promise<Page<UserRecord>> {
    const query = this.select(this.knex);
    if (asked.search) {
      const pattern = likePattern(asked.search);
      query.where((either) => either.whereILike('u.name', pattern).orWhereILike('u.email', pattern));
    }
    return listPage({
      query,
      knex: this.knex,
      asked,
      sorts: SORTS,
      defaultSort: 'name',
      idColumn: 'u.id',
      toItem: toUser,
    });
  }

  async find(id: string, db: Knex = this.knex, { forUpdate = false } = {}): Promise<UserRecord | null> {
    const query = this.select(db).where('u.id', id);
    if (forUpdate) query.forUpdate();
    const [row] = (await query) as UserRow[];
    return row ? toUser(row) : null;
  }

  async findIdByEmail(email: string, db: Knex): Promise<string | null> {
    const row = (await db('users as u').whereRaw('lower(u.email) = lower(?)', [email]).first('u.id')) as
      { id: string } | undefined;
    return row?.id ?? null;
  }

  async insert(user: { email: string; name: string; createdAt: Date }, db: Knex): Promise<string> {
    const { email, name, createdAt } = user;
    const [row] = (await db('users').insert({ email, name, created_at: createdAt }, ['id'])) as { id: string }[];
    return row!.id;
  }

  async update(id: string, user: { email: string; name: string; active: boolean }, at: Date, db: Knex): Promise<void> {
    await db('users')
      .where({ id })
      .update({
        email: user.email,
        name: user.name,
        active: user.active,
        deactivated_at: user.active ? null : db.raw('coalesce(deactivated_at, ?)', [at]),
        lock_version: db.raw('lock_version + 1'),
      });
  }

  private select(db: Knex): Knex.QueryBuilder {
    return db('users as u').select(...COLUMNS, db.raw('u.password_hash is not null as has_password'));
  }
}

function toUser(row: UserRow): UserRecord {
  return {
    id: row.id,
    email: row.email,
    name: row.name,
    active: row.active,
    hasPassword: row.has_password,
    createdAt: row.created_at,
  };
}
