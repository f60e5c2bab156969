import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { BodyOf, contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { changesBetween } from '../platform/values';
import { Clock } from '../platform/clock';
import { newerVersion } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { CompanySettingsRepository, type SettingsVersion } from './company-settings.repository';

const LOCK = "select pg_advisory_xact_lock(hashtextextended('company settings', 0))";

@Injectable()
export class CompanySettingsService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly repository: CompanySettingsRepository,
    private readonly audit: AuditService,
  ) {}

  /** The version in force; the first comes with the product. */
  async inForce(db?: Knex): Promise<SettingsVersion> {
    const settings = await this.repository.newest(db);
    if (!settings) throw new Error('There are no company settings: the reference rows are not seeded.');
    return settings;
  }

  async save(
    person: SignedIn,
    madeFrom: number,
    { settings, reason }: BodyOf<typeof contract.saveCompanySettings>,
  ): Promise<SettingsVersion> {
    return this.knex.transaction(async (db) => {
      await db.raw(LOCK);
      const before = await this.inForce(db);
      if (before.version !== madeFrom) {
        throw newerVersion({ current: before, changedBy: before.setBy, changedAt: before.setAt });
      }
      const version = before.version + 1;
      await this.repository.insert({ version, settings, reason, setBy: person.id, setAt: this.clock.now() }, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'company-settings.set',
        entity: 'company-settings',
        entityId: String(version),
        changes: changesBetween(before.settings, settings),
        reason,
      });
      return this.inForce(db);
    });
  }
}
