import type { Database } from '../platform/knex';
import type { HeldGrant, SignedIn } from '../platform/person';

/** People of the story who act on documents, by the name before the @ of their address. */
export const AUTHORS = {
  orvelle: 't.orvelle@kigc.example',
  bakkarash: 'j.bakkarash@kigc.example',
  castellary: 'r.castellary@kigc.example',
  sandermo: 'y.sandermo@brackwater.example',
  holvenstein: 'a.holvenstein@kigc.example',
  ulundimarsh: 'p.ulundimarsh@kigc.example',
  brant: 'l.brant@kigc.example',
  grebe: 'o.grebe@kigc.example',
} as const;
export type Author = keyof typeof AUTHORS;

/** A demo account as the services know the person who asks, with the roles that are granted now. */
export async function readAuthor(author: Author, knex: Database): Promise<SignedIn> {
  const email = AUTHORS[author];
  const user = await knex('users as u')
    .where({ 'u.email': email, 'u.is_demo': true })
    .first<{ id: string; name: string } | undefined>('u.id', 'u.name');
  if (!user) throw new Error(`There is no demo account ${email}; seed the demonstration first.`);
  const grants = (await knex('role_grants as g')
    .where('g.user_id', user.id)
    .select('g.role', 'g.project_id as projectId', 'g.check_category as checkCategory')) as HeldGrant[];
  return { ...user, email, grants, sessionId: 'demo' };
}
