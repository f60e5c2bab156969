import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { AnswerOf, BodyOf, CompanySettings, DesignBasis, SpecificationInput, contract } from '@bellgap/common/api';
import { inputFaults } from '@bellgap/common/engine';
import { AuditService, changesBetween } from '../audit/audit.service';
import { CompanySettingsService } from '../company-settings/company-settings.service';
import { Clock } from '../platform/clock';
import { forbidden, invalid, newerVersion } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import { mayWriteDrafts, requireDraftReader, type SignedIn } from '../platform/person';
import { DesignBasesRepository } from './design-bases.repository';
import { ProjectsService } from './projects.service';

type Given = BodyOf<typeof contract.saveDesignBasis>;
type System = DesignBasis['system'];

/** The design basis of a line or yard: each save is a new revision, the highest one is inherited. */
@Injectable()
export class DesignBasesService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly projects: ProjectsService,
    private readonly bases: DesignBasesRepository,
    private readonly settings: CompanySettingsService,
    private readonly audit: AuditService,
  ) {}

  async history(person: SignedIn, code: string): Promise<AnswerOf<typeof contract.designBasis>> {
    const project = await this.projects.known(person, code);
    requireDraftReader(person, project.id, 'design basis');
    const [current = null, ...earlier] = await this.bases.ofProject(project.id);
    return { current, earlier };
  }

  async save(person: SignedIn, code: string, madeFrom: number, given: Given): Promise<DesignBasis> {
    return this.knex.transaction(async (db) => {
      const project = await this.projects.known(person, code, db, { forUpdate: true });
      if (!mayWriteDrafts(person, project.id)) throw forbidden();
      const before = await this.bases.newest(project.id, db);
      const revision = before?.revision ?? 0;
      if (revision !== madeFrom) {
        throw newerVersion({
          current: before,
          changedBy: before?.createdBy ?? null,
          changedAt: before?.createdAt ?? this.clock.now().toISOString(),
        });
      }
      await this.refuseUnreadable(given, db);
      const content = {
        ...given,
        system: given.system as System,
        worksheet: (given.worksheet ?? null) as DesignBasis['worksheet'],
      };
      const changes = changesBetween(before ? contentOf(before) : {}, content);
      if (before && Object.keys(changes).length === 0) return before;
      const next = { ...content, projectId: project.id, revision: revision + 1, by: person.id, at: this.clock.now() };
      await this.bases.insert(next, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'design-basis.revised',
        entity: 'design-basis',
        entityId: `${project.id} ${next.revision}`,
        projectId: project.id,
        changes,
        reason: given.note || null,
      });
      return (await this.bases.newest(project.id, db))!;
    });
  }

  private async refuseUnreadable({ basis, system }: Given, db: Knex): Promise<void> {
    const { version, settings } = await this.settings.inForce(db);
    const input = { kind: 'line', basis, system, site: null } as SpecificationInput;
    const context = { insulator: null, settings: { version, ...settings } as CompanySettings, confirmations: [] };
    const faults = inputFaults(input, context);
    if (faults.length > 0) throw invalid(faults);
  }
}

function contentOf({ number, basis, system, rules, worksheet, note }: DesignBasis) {
  return { number, basis, system, rules, worksheet, note };
}
