import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type {
  AnswerOf,
  BasisMove,
  BodyOf,
  CompanySettings,
  DesignBasis,
  SpecificationInput,
  StandingBasis,
  contract,
} from '@bellgap/common/api';
import { inputFaults } from '@bellgap/common/engine';
import { AuditService } from '../audit/audit.service';
import { changesBetween } from '../platform/values';
import { CompanySettingsService } from '../company-settings/company-settings.service';
import { Clock } from '../platform/clock';
import { forbidden, invalid, newerVersion, notFound, wrongState } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import { mayWriteDrafts, requireDraftReader, type SignedIn } from '../platform/person';
import { orderRefusal, personRefusal, standingOf } from './basis-standing';
import { DesignBasesRepository, type StoredBasis } from './design-bases.repository';
import type { ProjectRecord } from './projects.repository';
import { ProjectsService } from './projects.service';

export type { StoredBasis } from './design-bases.repository';

type Given = BodyOf<typeof contract.saveDesignBasis>;
type System = DesignBasis['system'];

/** A revision of a basis in its project, among all the others, the newest first. */
export interface BasisInProject {
  project: ProjectRecord;
  stored: StoredBasis;
  all: StoredBasis[];
}

/** The design basis of a line or yard: each save is a new revision, the issued one is inherited. */
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
    const all = await this.bases.ofProject(project.id);
    const [current = null, ...earlier] = all.map((stored) => standingOf(person, stored, all, project));
    return { current, earlier };
  }

  async get(person: SignedIn, code: string, revision: number): Promise<StandingBasis> {
    const { project, stored, all } = await this.find(person, code, revision);
    return standingOf(person, stored, all, project);
  }

  /** With a transaction, the project is locked, so that one moves after the other. */
  async find(person: SignedIn, code: string, revision: number, db?: Knex.Transaction): Promise<BasisInProject> {
    const project = await this.projects.known(person, code, db, { forUpdate: db !== undefined });
    requireDraftReader(person, project.id, 'design basis');
    const all = await this.bases.ofProject(project.id, db);
    const stored = all.find(({ basis }) => basis.revision === revision);
    if (!stored) throw notFound('revision of the design basis');
    return { project, stored, all };
  }

  /** Refuses a move: 409 from a wrong state, 403 to who may not make it. */
  requireMove(person: SignedIn, move: BasisMove, { project, stored, all }: BasisInProject): void {
    const order = orderRefusal(move, stored, all);
    if (order !== null) throw wrongState(order);
    const why = personRefusal(person, move, stored, project);
    if (why !== null) throw forbidden(why);
  }

  recordMove(db: Knex.Transaction, move: { basisId: string; move: BasisMove; by: string; at: Date; note: string }) {
    return this.bases.insertMove(move, db);
  }

  async save(person: SignedIn, code: string, madeFrom: number, given: Given): Promise<StandingBasis> {
    const revision = await this.knex.transaction(async (db) => {
      const project = await this.projects.known(person, code, db, { forUpdate: true });
      if (!mayWriteDrafts(person, project.id)) throw forbidden();
      const before = (await this.bases.ofProject(project.id, db))[0]?.basis ?? null;
      const newest = before?.revision ?? 0;
      if (newest !== madeFrom) {
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
      if (before && Object.keys(changes).length === 0) return before.revision;
      const next = { ...content, projectId: project.id, revision: newest + 1, by: person.id, at: this.clock.now() };
      await this.bases.insert(next, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'design-basis.revised',
        entity: 'design-basis',
        entityId: entityIdOf(project.id, next.revision),
        projectId: project.id,
        changes,
        reason: given.note || null,
      });
      return next.revision;
    });
    return this.get(person, code, revision);
  }

  private async refuseUnreadable({ basis, system }: Given, db: Knex): Promise<void> {
    const { version, settings } = await this.settings.inForce(db);
    const input = { kind: 'line', basis, system, site: null } as SpecificationInput;
    const context = { insulator: null, settings: { version, ...settings } as CompanySettings, confirmations: [] };
    const faults = inputFaults(input, context);
    if (faults.length > 0) throw invalid(faults);
  }
}

/** By what the trail names a revision of a basis. */
export const entityIdOf = (projectId: string, revision: number): string => `${projectId} ${revision}`;

function contentOf({ number, basis, system, rules, worksheet, note }: DesignBasis) {
  return { number, basis, system, rules, worksheet, note };
}
