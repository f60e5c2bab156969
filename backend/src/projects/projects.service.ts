import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import {
  DRAFT_WRITERS,
  type BodyOf,
  type DesignBasis,
  type Project,
  type QueryOf,
  type RevisionState,
  type contract,
} from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { changesBetween } from '../platform/values';
import { Clock } from '../platform/clock';
import { forbidden, invalidAt, newerVersion, notFound } from '../platform/domain-error';
import { KNEX } from '../platform/knex';
import type { Page } from '../platform/list';
import { holdsRole, knownProjects, mayWriteDrafts, type SignedIn } from '../platform/person';
import { DesignBasesRepository } from './design-bases.repository';
import { ProjectsListQuery } from './projects.list-query';
import { ProjectsRepository, type ProjectContent, type ProjectRecord } from './projects.repository';
import { TowerFamiliesRepository, type TowerFamily } from './tower-families.repository';

/** Lines and yards. */
@Injectable()
export class ProjectsService {
  constructor(
    @Inject(KNEX) private readonly knex: Knex,
    private readonly clock: Clock,
    private readonly projects: ProjectsRepository,
    private readonly lists: ProjectsListQuery,
    private readonly bases: DesignBasesRepository,
    private readonly towers: TowerFamiliesRepository,
    private readonly audit: AuditService,
  ) {}

  list(person: SignedIn, asked: QueryOf<typeof contract.projects>): Promise<Page<Project>> {
    return this.lists.list(person, asked);
  }

  async get(person: SignedIn, code: string, db?: Knex): Promise<Project> {
    const project = await this.lists.find(person, code, db);
    if (!project) throw notFound('project');
    return project;
  }

  /** The project by itself; 404 to who may not know of it. */
  async known(person: SignedIn, code: string, db?: Knex, options?: { forUpdate?: boolean }): Promise<ProjectRecord> {
    const project = await this.projects.findByCode(code, db, options);
    const known = knownProjects(person);
    if (!project || (known !== 'all' && !known.includes(project.id))) throw notFound('project');
    return project;
  }

  async idOf(code: string, db?: Knex): Promise<string | null> {
    return (await this.projects.findByCode(code, db))?.id ?? null;
  }

  /** What specifications rest on: the issued revision of the basis; where none is issued, the one saved last. */
  async basisInForce(projectId: string, db?: Knex): Promise<DesignBasis | null> {
    return this.bases.inForce(projectId, db);
  }

  /** Where a revision of a basis stands. */
  async basisState(basisId: string, db?: Knex): Promise<RevisionState | null> {
    return this.bases.stateOf(basisId, db);
  }

  async create(person: SignedIn, given: BodyOf<typeof contract.createProject>): Promise<Project> {
    if (!holdsRole(person, DRAFT_WRITERS, null)) {
      throw forbidden('Your role is limited to some projects; somebody without that limit must begin a new one.');
    }
    return this.knex.transaction(async (db) => {
      const id = await this.projects.insert({ ...given, by: person.id, at: this.clock.now() }, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'project.created',
        entity: 'project',
        entityId: id,
        projectId: id,
        changes: changesBetween({}, given),
      });
      return this.get(person, given.code, db);
    });
  }

  async update(
    person: SignedIn,
    code: string,
    madeFrom: number,
    given: BodyOf<typeof contract.updateProject>,
  ): Promise<Project> {
    return this.knex.transaction(async (db) => {
      const before = await this.known(person, code, db, { forUpdate: true });
      if (!mayWriteDrafts(person, before.id)) throw forbidden();
      const current = await this.get(person, code, db);
      if (before.lockVersion !== madeFrom) {
        throw newerVersion({ current, changedBy: current.updatedBy, changedAt: current.updatedAt });
      }
      if (given.kind !== before.kind && current.specificationCount > 0) {
        throw invalidAt('kind', 'Kind: cannot change any more, the project has specifications');
      }
      const changes = changesBetween(contentOf(before), given);
      if (Object.keys(changes).length === 0) return current;
      await this.projects.update(before.id, { ...given, by: person.id, at: this.clock.now() }, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'project.changed',
        entity: 'project',
        entityId: before.id,
        projectId: before.id,
        changes,
      });
      return this.get(person, code, db);
    });
  }

  async towerFamilies(person: SignedIn, code: string): Promise<TowerFamily[]> {
    return this.towers.ofProject(await this.known(person, code));
  }
}

function contentOf({ title, kind, siteTimeZone, paper, description }: ProjectRecord): ProjectContent {
  return { title, kind, siteTimeZone, paper, description };
}
