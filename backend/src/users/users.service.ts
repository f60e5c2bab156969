import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { AnswerOf, BodyOf, QueryOf, User, contract } from '@bellgap/common/api';
import { AccountLinksService } from '../account-links/account-links.service';
import { AuditService } from '../audit/audit.service';
import { changesBetween } from '../platform/values';
import { SessionsService } from '../auth/sessions.service';
import { MailService } from '../mail/mail.service';
import { Clock } from '../platform/clock';
import { invalidAt, notFound, wrongState } from '../platform/domain-error';
import { KNEX, isUuid } from '../platform/knex';
import type { Page } from '../platform/list';
import type { SignedIn } from '../platform/person';
import { GrantsRepository, type Grant } from './grants.repository';
import { UsersRepository, type UserRecord } from './users.repository';

type Invited = AnswerOf<typeof contract.createUser>;

/** People as the administrator keeps them: invited, changed, deactivated; never deleted. */
@Injectable()
export class UsersService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly users: UsersRepository,
    private readonly grants: GrantsRepository,
    private readonly sessions: SessionsService,
    private readonly links: AccountLinksService,
    private readonly mail: MailService,
    private readonly audit: AuditService,
  ) {}

  async list(asked: QueryOf<typeof contract.users>): Promise<Page<User>> {
    const page = await this.users.list(asked);
    const grants = await this.grants.ofUsers(page.items.map(({ id }) => id));
    return { ...page, items: page.items.map((user) => toAnswer(user, grants.get(user.id) ?? [])) };
  }

  async create(actor: SignedIn, given: BodyOf<typeof contract.createUser>): Promise<Invited> {
    return this.knex.transaction(async (db) => {
      const id = await this.users.insert({ ...given, createdAt: this.clock.now() }, db);
      const changes = changesBetween({}, given);
      await this.audit.record(db, { actorId: actor.id, action: 'user.created', entity: 'user', entityId: id, changes });
      return { user: await this.answer(id, db), ...(await this.sendInvitation(id, db)) };
    });
  }

  async update(actor: SignedIn, id: string, given: BodyOf<typeof contract.updateUser>): Promise<User> {
    const user = await this.knex.transaction(async (db) => {
      const before = await this.require(id, db, { forUpdate: true });
      if (id === actor.id && !given.active) throw invalidAt('active', 'Active: you cannot deactivate your own account');
      const { email, name, active } = before;
      const changes = changesBetween({ email, name, active }, given);
      if (Object.keys(changes).length === 0) return this.answer(id, db);
      await this.users.update(id, given, this.clock.now(), db);
      if (!given.active) await this.sessions.endAll(id, db);
      // A link was mailed to the address as it was; whoever reads there now is not known.
      if (!given.active || given.email !== email) await this.links.withdraw(id, db);
      await this.audit.record(db, { actorId: actor.id, action: 'user.changed', entity: 'user', entityId: id, changes });
      return this.answer(id, db);
    });
    this.sessions.forgetPerson(id);
    return user;
  }

  async invite(actor: SignedIn, id: string): Promise<Invited> {
    return this.knex.transaction(async (db) => {
      const { active } = await this.require(id, db, { forUpdate: true });
      if (!active) throw wrongState('This account is not active; activate it first.');
      await this.audit.record(db, { actorId: actor.id, action: 'user.invited', entity: 'user', entityId: id });
      return { user: await this.answer(id, db), ...(await this.sendInvitation(id, db)) };
    });
  }

  /** The first administrator of an installation, or a new link for one who lost his password. */
  async inviteAdministrator(given: { email: string; name: string }): Promise<Invited> {
    return this.knex.transaction(async (db) => {
      const at = this.clock.now();
      const id =
        (await this.users.findIdByEmail(given.email, db)) ?? (await this.users.insert({ ...given, createdAt: at }, db));
      const user = await this.answer(id, db);
      if (!user.active) throw wrongState('This account is not active.');
      if (!user.grants.some(({ role, validTo }) => role === 'administrator' && validTo === null)) {
        await this.grants.insert(
          {
            userId: id,
            role: 'administrator',
            projectId: null,
            checkCategory: null,
            validFrom: this.clock.today(),
            validTo: null,
            grantedBy: null,
            grantedAt: at,
          },
          db,
        );
      }
      await this.audit.record(db, {
        actorId: null,
        action: 'user.administrator-invited',
        entity: 'user',
        entityId: id,
      });
      return { user: await this.answer(id, db), ...(await this.sendInvitation(id, db)) };
    });
  }

  /** The person, or 404; also for features that act on people. */
  async require(id: string, db: Knex, options: { forUpdate?: boolean } = {}): Promise<UserRecord> {
    const user = isUuid(id) ? await this.users.find(id, db, options) : null;
    if (!user) throw notFound('person');
    return user;
  }

  /** The link is mailed, and answered once for whoever invites. */
  private async sendInvitation(userId: string, db: Knex.Transaction): Promise<{ link: string; expiresAt: string }> {
    const { id, ...invitation } = await this.links.issue({ userId, purpose: 'invitation' }, db);
    await this.mail.send(db, userId, { kind: 'invitation', data: { linkId: id } });
    return invitation;
  }

  private async answer(id: string, db: Knex): Promise<User> {
    const user = await this.require(id, db);
    return toAnswer(user, (await this.grants.ofUsers([id], db)).get(id) ?? []);
  }
}

function toAnswer({ createdAt, ...user }: UserRecord, grants: Grant[]): User {
  return { ...user, createdAt: createdAt.toISOString(), grants };
}
