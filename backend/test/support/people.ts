import { createHash } from 'node:crypto';
import { hashSync } from 'bcryptjs';
import type { Knex } from 'knex';
import type { Role } from '@bellgap/common/api';

export interface NewPerson {
  name?: string;
  roles?: readonly Role[];
  /** Limits the roles to these projects. */
  projects?: readonly string[];
  validFrom?: string;
  validTo?: string | null;
  demo?: boolean;
  active?: boolean;
}

export interface TestPerson {
  id: string;
  email: string;
  name: string;
  password: string;
}

const PASSWORD = 'heron over calm water';
const PASSWORD_HASH = hashSync(createHash('sha256').update(PASSWORD).digest('base64'), 4);

/** People as a test needs them, put straight into the database. */
export class People {
  private count = 0;

  constructor(private readonly owner: Knex) {}

  async add(person: NewPerson = {}): Promise<TestPerson> {
    const { roles = [], projects, validFrom = '2020-01-01', validTo = null, demo = false, active = true } = person;
    this.count += 1;
    const name = person.name ?? `Test Person ${this.count}`;
    const email = `person${this.count}@company.example`;
    const [row] = (await this.owner('users').insert(
      {
        email,
        name,
        password_hash: PASSWORD_HASH,
        is_demo: demo,
        active,
        deactivated_at: active ? null : new Date(),
      },
      ['id'],
    )) as { id: string }[];
    const userId = row!.id;
    const projectIds = projects
      ? await this.owner('projects')
          .whereIn('code', [...projects])
          .pluck<string[]>('id')
      : [null];
    const grants = roles.flatMap((role) => projectIds.map((projectId) => ({ role, project_id: projectId })));
    if (grants.length > 0) {
      await this.owner('role_grants').insert(
        grants.map((grant) => ({ ...grant, user_id: userId, valid_from: validFrom, valid_to: validTo })),
      );
    }
    return { id: userId, email, name, password: PASSWORD };
  }
}
