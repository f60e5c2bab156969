import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { BodyOf, Role, contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { changesBetween } from '../platform/values';
import { SessionsService } from '../auth/sessions.service';
import { MailService } from '../mail/mail.service';
import { Clock } from '../platform/clock';
import { alreadyExists, forbidden, invalidAt, notFound } from '../platform/domain-error';
import { KNEX, isUuid } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { ProjectsService } from '../projects/projects.service';
import { GrantsRepository, type Grant } from './grants.repository';
import { UsersService } from './users.service';

/** Roles that let a person sign: whoever gets one is made known. */
const SIGNING_ROLES: readonly Role[] = ['checker', 'approver'];

type Given = BodyOf<typeof contract.grantRole>;

/** Who may do what, where and until when. Nobody changes his own grants, administrators included. */
@Injectable()
export class GrantsService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly grants: GrantsRepository,
    private readonly users: UsersService,
    private readonly projects: ProjectsService,
    private readonly sessions: SessionsService,
    private readonly mail: MailService,
    private readonly audit: AuditService,
  ) {}

  async grant(actor: SignedIn, userId: string, given: Given): Promise<Grant> {
    const grant = await this.knex.transaction(async (db) => {
      const { name } = await this.users.require(userId, db, { forUpdate: true });
      refuseOwn(actor, userId);
      this.refuseContradictions(given);
      const projectId = given.projectCode === null ? null : await this.projectIdOf(given.projectCode, db);
      await this.refuseTwice(userId, given, db);
      const { role, checkCategory, validFrom } = given;
      const id = await this.grants.insert(
        {
          userId,
          role,
          projectId,
          checkCategory,
          validFrom,
          validTo: given.validTo ?? null,
          grantedBy: actor.id,
          grantedAt: this.clock.now(),
        },
        db,
      );
      await this.audit.record(db, {
        actorId: actor.id,
        action: 'grant.given',
        entity: 'user',
        entityId: userId,
        projectId,
        changes: changesBetween({}, { grantId: id, ...given }),
      });
      if (SIGNING_ROLES.includes(role)) await this.tellApprovers(actor, { userId, name, projectId }, given, db);
      return this.require(userId, id, db);
    });
    this.sessions.forgetPerson(userId);
    return grant;
  }

  async end(actor: SignedIn, userId: string, grantId: string): Promise<void> {
    await this.knex.transaction(async (db) => {
      await this.users.require(userId, db, { forUpdate: true });
      refuseOwn(actor, userId);
      const grant = await this.require(userId, grantId, db);
      await this.grants.end(grant.id, this.clock.now(), db);
      await this.audit.record(db, {
        actorId: actor.id,
        action: 'grant.ended',
        entity: 'user',
        entityId: userId,
        projectId: grant.projectCode === null ? null : await this.projectIdOf(grant.projectCode, db),
        changes: changesBetween({ grantId: grant.id, role: grant.role, projectCode: grant.projectCode }, {}),
      });
    });
    this.sessions.forgetPerson(userId);
  }

  /** People who hold one of the roles today, everywhere or for the project. */
  async holders(roles: readonly Role[], projectId: string | null, db: Knex): Promise<string[]> {
    return this.grants.holders({ roles, projectId, day: this.clock.today() }, db);
  }

  /** Checkers of the project today whose grant covers the category. */
  async checkers(projectId: string, checkCategory: number, db: Knex): Promise<string[]> {
    return this.grants.holders({ roles: ['checker'], projectId, checkCategory, day: this.clock.today() }, db);
  }

  private async tellApprovers(
    actor: SignedIn,
    granted: { userId: string; name: string; projectId: string | null },
    { role, projectCode, checkCategory, validFrom, validTo }: Given,
    db: Knex.Transaction,
  ): Promise<void> {
    const approvers = await this.holders(['approver'], granted.projectId, db);
    const others = approvers.filter((id) => id !== granted.userId);
    const data = { personName: granted.name, role, projectCode, checkCategory, validFrom, byName: actor.name };
    await this.mail.send(db, others, {
      kind: 'grant-of-checker-or-approver',
      data: { ...data, validTo: validTo ?? null },
    });
  }

  private async require(userId: string, id: string, db: Knex): Promise<Grant> {
    const grant = isUuid(id) ? await this.grants.find(userId, id, db) : null;
    if (!grant) throw notFound('grant');
    return grant;
  }

  private async projectIdOf(code: string, db: Knex): Promise<string> {
    const id = await this.projects.idOf(code, db);
    if (id === null) throw invalidAt('projectCode', `Project: there is no project ${code}`);
    return id;
  }

  private refuseContradictions({ role, projectCode, checkCategory, validTo }: Given): void {
    if (role === 'administrator' && projectCode !== null) {
      throw invalidAt('projectCode', 'Project: the role of administrator is not limited to a project');
    }
    if (role !== 'checker' && checkCategory !== null) {
      throw invalidAt('checkCategory', 'Check category: only for the role of checker');
    }
    if (validTo && validTo < this.clock.today()) throw invalidAt('validTo', 'Valid to: lies in the past');
  }

  private async refuseTwice(userId: string, given: Given, db: Knex): Promise<void> {
    const held = (await this.grants.ofUsers([userId], db)).get(userId) ?? [];
    const same = held.some(
      (grant) =>
        grant.role === given.role &&
        grant.projectCode === given.projectCode &&
        grant.checkCategory === given.checkCategory &&
        (grant.validTo === null || grant.validTo >= given.validFrom) &&
        (!given.validTo || grant.validFrom <= given.validTo),
    );
    if (same) throw alreadyExists('role', 'Role: is granted already for these days');
  }
}

function refuseOwn(actor: SignedIn, userId: string): void {
  if (actor.id === userId) throw forbidden('Nobody changes his own grants.');
}
