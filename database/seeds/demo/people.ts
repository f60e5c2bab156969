import type { Knex } from 'knex';
import { storyDay } from './dates';
import { demoId } from './identity';

/** One password for all accounts of the demonstration; they may sign in on loopback only. */
export const DEMO_PASSWORD = 'Glaze-and-Fog-2310';

/** bcrypt, cost 11, of base64(SHA-256(DEMO_PASSWORD)). */
export const DEMO_PASSWORD_HASH = '$2b$11$aWnTxSEuBHYJqnZMUc9p5e1rfNhXE9s7t31GyooAiWW0YCPtcjAWu';

interface DemoGrant {
  role: 'engineer' | 'checker' | 'approver' | 'procurement' | 'reader' | 'administrator';
  checkCategory?: 1 | 2 | 3;
  /** Codes of the projects the grant is limited to; all where left out. */
  projects?: string[];
  /** Days of the story. */
  from?: string;
  to?: string;
}

export interface DemoPerson {
  email: string;
  name: string;
  title: string;
  grants: DemoGrant[];
}

/** People of the invented Kelmarra Interconnected Grid Company and its consultant. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [
  {
    email: 't.orvelle@kigc.example',
    name: 'Tamsin Orvelle',
    title: 'line engineer',
    grants: [{ role: 'engineer' }],
  },
  {
    email: 'j.bakkarash@kigc.example',
    name: 'Jorin Bakkarash',
    title: 'junior line engineer',
    grants: [{ role: 'engineer', projects: ['KL221', 'KL132'] }],
  },
  {
    email: 'n.felthamosei@kigc.example',
    name: 'Nadira Feltham-Osei',
    title: 'substation engineer',
    grants: [{ role: 'engineer' }],
  },
  {
    email: 'r.castellary@kigc.example',
    name: 'Ruben Castellary',
    title: 'checker, also drafts',
    grants: [{ role: 'checker', checkCategory: 2 }, { role: 'engineer' }],
  },
  {
    email: 'y.sandermo@brackwater.example',
    name: 'Yuki Sandermo',
    title: 'independent checker of Brackwater Review',
    grants: [{ role: 'checker', checkCategory: 3, projects: ['KL221', 'KL132'] }],
  },
  {
    email: 'a.holvenstein@kigc.example',
    name: 'Amara Holvenstein',
    title: 'approver',
    grants: [{ role: 'approver' }],
  },
  {
    email: 'p.ulundimarsh@kigc.example',
    name: 'Piers Ulundi-Marsh',
    title: 'deputy approver',
    grants: [{ role: 'approver', from: '2026-03-02', to: '2026-03-20' }],
  },
  {
    email: 'l.brant@kigc.example',
    name: 'Leocadia Brant',
    title: 'buyer',
    grants: [{ role: 'procurement' }],
  },
  {
    email: 's.dhorel@kigc.example',
    name: 'Samir Dhorel',
    title: 'inspector and expediter',
    grants: [{ role: 'reader' }],
  },
  {
    email: 'o.grebe@kigc.example',
    name: 'Ottoline Grebe',
    title: 'site stores',
    grants: [{ role: 'reader' }],
  },
  {
    email: 'w.tollarsson@kigc.example',
    name: 'Wen Tollarsson',
    title: 'administrator',
    grants: [{ role: 'administrator' }],
  },
];

export const demoUserId = (email: string): string => demoId('user', email);

export async function seedPeople(knex: Knex, today: string): Promise<void> {
  const createdAt = `${storyDay('2024-08-05', today)}T05:00:00Z`;
  await knex('users')
    .insert(
      DEMO_PEOPLE.map(({ email, name }) => ({
        id: demoUserId(email),
        email,
        name,
        password_hash: DEMO_PASSWORD_HASH,
        is_demo: true,
        created_at: createdAt,
      })),
    )
    .onConflict()
    .ignore();
}

export async function seedRoleGrants(
  knex: Knex,
  today: string,
  projectIds: ReadonlyMap<string, string>,
): Promise<void> {
  const administrator = demoUserId('w.tollarsson@kigc.example');
  const rows = DEMO_PEOPLE.flatMap(({ email, grants }) =>
    grants.flatMap((grant) =>
      (grant.projects ?? [null]).map((code) => ({
        id: demoId('role grant', `${email} ${grant.role} ${code ?? 'all'}`),
        user_id: demoUserId(email),
        role: grant.role,
        project_id: code === null ? null : projectIds.get(code),
        check_category: grant.checkCategory ?? null,
        valid_from: storyDay(grant.from ?? '2024-08-05', today),
        valid_to: grant.to ? storyDay(grant.to, today) : null,
        granted_by: demoUserId(email) === administrator ? null : administrator,
        granted_at: `${storyDay(grant.from ?? '2024-08-05', today)}T05:10:00Z`,
      })),
    ),
  );
  await knex('role_grants').insert(rows).onConflict().ignore();
}
