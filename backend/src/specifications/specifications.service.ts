import { Inject, Injectable } from '@nestjs/common';
import type { BodyOf, Evaluation, QueryOf, Revision, SpecificationInput, SpecificationRow } from '@bellgap/common/api';
import { DRAFT_READERS, DRAFT_WRITERS, type Role, type contract } from '@bellgap/common/api';
import { AuditService } from '../audit/audit.service';
import { EvaluationsService } from '../evaluations/evaluations.service';
import { Clock } from '../platform/clock';
import { forbidden, invalid, invalidAt, newerVersion, notFound, wrongState } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import type { Page } from '../platform/list';
import { mayReadDrafts, mayWriteDrafts, type SignedIn } from '../platform/person';
import { ProjectsService } from '../projects/projects.service';
import { inheritanceFaults, inputFromBasis, overrideCautions, takeBasisOver, type Override } from './inheritance';
import { revisionAnswer } from './revision-answer';
import { OWN_COUNT_FIRST, figuresHidden, maySee } from './rights';
import type { RevisionMove } from './revision-moves';
import type { StoredRevision } from './revision-row';
import { RevisionsRepository, type RevisionAddress, type RevisionContent } from './revisions.repository';
import { SpecificationsListQuery } from './specifications.list-query';
import { changesBetween, sameValue } from '../platform/values';

export type { RevisionAddress, RevisionMove, StoredRevision };
export { listColumnsOf } from './list-columns';
export { OWN_COUNT_FIRST, figuresHidden, isAuthor, isChecker, maySee, moveRefusal, ownWork } from './rights';

const FIRST_LABEL = 'A';

type Create = BodyOf<typeof contract.createSpecification>;
type Save = Omit<BodyOf<typeof contract.saveRevision>, 'input'> & { input: SpecificationInput };

/** Specifications and their revisions: begun from the design basis, saved whole, evaluated at each save. */
@Injectable()
export class SpecificationsService {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly clock: Clock,
    private readonly audit: AuditService,
    private readonly projects: ProjectsService,
    private readonly evaluations: EvaluationsService,
    private readonly revisions: RevisionsRepository,
    private readonly lists: SpecificationsListQuery,
  ) {}

  async list(
    person: SignedIn,
    projectCode: string,
    asked: QueryOf<typeof contract.specifications>,
  ): Promise<Page<SpecificationRow>> {
    const project = await this.projects.known(person, projectCode);
    return this.lists.ofProject(project.id, asked, person, { drafts: mayReadDrafts(person, project.id) });
  }

  ownDrafts(person: SignedIn): Promise<SpecificationRow[]> {
    return this.lists.draftsOf(person, projectsOf(person, DRAFT_READERS));
  }

  outdatedDrafts(person: SignedIn): Promise<SpecificationRow[]> {
    return this.lists.outdatedDrafts(person, projectsOf(person, DRAFT_WRITERS));
  }

  /** Rows of these specifications as a person sees them, each in its newest revision, by their ids. */
  rowsOf(person: SignedIn, ids: readonly string[]): Promise<Map<string, SpecificationRow>> {
    return this.lists.ofIds(person, ids);
  }

  /**
   * What is stored of a revision, for features that build on it; 404 to who may not see it. For a move it is locked
   * until the transaction ends.
   */
  async stored(
    person: SignedIn,
    address: RevisionAddress,
    options?: { db: Database; forUpdate?: boolean },
  ): Promise<StoredRevision> {
    return this.find(person, address, options);
  }

  /** Every label that revisions of a specification have had. */
  labelsOf(specificationId: string, db?: Database): Promise<string[]> {
    return this.revisions.labelsOf(specificationId, db);
  }

  /** Label of the revision in force; null where none is. */
  labelInForce(specificationId: string, db?: Database): Promise<string | null> {
    return this.revisions.labelInForce(specificationId, db);
  }

  /** The label stays with the revision for ever; one that was given already is refused by the database. */
  giveLabel(label: { specificationId: string; revisionId: string; label: string; at: Date }, db: Database) {
    return this.revisions.giveLabel(label, db);
  }

  /** The same for what shows figures of the author: a checker enters his own first. */
  async storedWithFigures(person: SignedIn, address: RevisionAddress): Promise<StoredRevision> {
    const stored = await this.find(person, address);
    if (figuresHidden(person, stored)) throw forbidden(OWN_COUNT_FIRST);
    return stored;
  }

  /** The revision in force, and the one in work, of a specification that the person knows. */
  async standing(person: SignedIn, projectCode: string, number: string, db: Database) {
    await this.find(person, { projectCode, number, label: 'latest' }, { db, forUpdate: true });
    return this.revisions.standing(projectCode, number, db);
  }

  /** Writes a move that the caller has found to be allowed. */
  moveTo(db: Database, revision: StoredRevision, move: RevisionMove): Promise<void> {
    return this.revisions.move(revision, move, db);
  }

  /** A draft with the content of another revision, evaluated anew; who begins it counts as its author. */
  async deriveFrom(person: SignedIn, from: StoredRevision, label: string, db: Database): Promise<string> {
    const { title, specificationId, input, overrides, basis } = from;
    const at = this.clock.now();
    const content = await this.evaluated(input, overrides, basis?.id ?? null, db);
    const made = { specificationId, title, label, derivedFrom: from.id, by: person.id, at, ...content };
    const revisionId = await this.revisions.insertRevision(made, db);
    await this.revisions.recordChange({ revisionId, by: person.id, at, paths: ['input'] }, db);
    return revisionId;
  }

  /** What the stored input would be answered now. */
  async evaluatedNow({ input, overrides, basis }: StoredRevision, db: Database): Promise<RevisionContent> {
    return this.evaluated(input, overrides, basis?.id ?? null, db);
  }

  /** Refuses what was made from an older version. */
  requireVersion(standing: StoredRevision, version: number, person: SignedIn): void {
    if (standing.lockVersion !== version) throw this.saved(standing, person);
  }

  /** Those of the revisions whose figures a person may not see yet. */
  hiddenAmong(person: SignedIn, revisionIds: readonly string[]): Promise<Set<string>> {
    return this.lists.hiddenAmong(person, revisionIds);
  }

  async get(person: SignedIn, address: RevisionAddress): Promise<Revision> {
    return revisionAnswer(await this.find(person, address), person);
  }

  async create(person: SignedIn, projectCode: string, { number, title, kind }: Create): Promise<Revision> {
    const project = await this.projects.known(person, projectCode);
    if (!mayWriteDrafts(person, project.id)) throw forbidden();
    await this.knex.transaction(async (db) => {
      const basis = await this.projects.basisInForce(project.id, db);
      if (!basis) {
        throw invalidAt('projectCode', `${project.code} has no design basis yet; enter its voltages and level first`);
      }
      const at = this.clock.now();
      const content = await this.evaluated(inputFromBasis(kind, basis), [], basis.id, db);
      const specificationId = await this.revisions.insertSpecification(
        { projectId: project.id, number, title, kind, by: person.id, at },
        db,
      );
      const revisionId = await this.revisions.insertRevision(
        { specificationId, title, label: FIRST_LABEL, by: person.id, at, ...content },
        db,
      );
      await this.revisions.recordChange({ revisionId, by: person.id, at, paths: ['input'] }, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'specification.created',
        entity: 'revision',
        entityId: revisionId,
        projectId: project.id,
        changes: changesBetween({}, { number, title, kind, label: FIRST_LABEL, basisRevision: basis.revision }),
      });
    });
    return this.get(person, { projectCode, number, label: FIRST_LABEL });
  }

  /** Saves a draft whole. A save that changes nothing makes no new version. */
  async save(
    person: SignedIn,
    address: RevisionAddress,
    version: number,
    { title, input, overrides }: Save,
  ): Promise<Revision> {
    await this.change(person, address, version, async (before, db) => {
      if (input.kind !== before.kind)
        throw invalidAt('input.kind', 'Kind: is chosen when a specification is begun, and stays');
      const faults = inheritanceFaults(input, before.basis, overrides);
      if (faults.length > 0) throw invalid(faults);
      return { title, ...(await this.evaluated(input, overrides, before.basis?.id ?? null, db)) };
    });
    return this.get(person, address);
  }

  /** Pins the revision of the design basis in force and takes its values, save those that are overridden. */
  async takeBasis(person: SignedIn, address: RevisionAddress, version: number): Promise<Revision> {
    await this.change(person, address, version, async ({ projectId, title, input, overrides, projectCode }, db) => {
      const basis = await this.projects.basisInForce(projectId, db);
      if (!basis) throw wrongState(`${projectCode} has no design basis.`);
      return { title, ...(await this.evaluated(takeBasisOver(input, basis, overrides), overrides, basis.id, db)) };
    });
    return this.get(person, address);
  }

  private async change(
    person: SignedIn,
    address: RevisionAddress,
    version: number,
    make: (before: StoredRevision, db: Database) => Promise<RevisionContent & { title: string }>,
  ): Promise<void> {
    await this.knex.transaction(async (db) => {
      const before = await this.find(person, address, { db, forUpdate: true });
      if (!mayWriteDrafts(person, before.projectId)) throw forbidden();
      if (before.state !== 'draft') throw wrongState('Only a draft can be changed.');
      this.requireVersion(before, version, person);
      const { title, ...after } = await make(before, db);
      const content = contentOf(before);
      const isSame = title === before.title && sameValue(content, { ...after, overrides: sorted(after.overrides) });
      if (isSame) return;
      const at = this.clock.now();
      await this.revisions.update(before.id, { ...after, title, by: person.id, at }, db);
      if (title !== before.title) await this.revisions.rename(before.specificationId, title, db);
      const changes = changesBetween(trailOf(before.title, content), trailOf(title, after));
      const paths = Object.keys(changes).filter((path) => path !== 'units');
      await this.revisions.recordChange({ revisionId: before.id, by: person.id, at, paths: atLeastOne(paths) }, db);
      await this.audit.record(db, {
        actorId: person.id,
        action: 'revision.saved',
        entity: 'revision',
        entityId: before.id,
        projectId: before.projectId,
        changes,
      });
    });
  }

  private saved(standing: StoredRevision, person: SignedIn) {
    return newerVersion({
      current: revisionAnswer(standing, person),
      changedBy: standing.savedBy,
      changedAt: standing.savedAt.toISOString(),
    });
  }

  private async find(
    person: SignedIn,
    address: RevisionAddress,
    options?: { db: Database; forUpdate?: boolean },
  ): Promise<StoredRevision> {
    const stored = await this.revisions.find(address, options);
    if (stored && maySee(person, stored)) return stored;
    // The newest that others may know of: a draft that is newer does not exist for them.
    const shown =
      address.label === 'latest' ? await this.revisions.find(address, { ...options, shownOnly: true }) : null;
    if (!shown || !maySee(person, shown)) throw notFound('specification');
    return shown;
  }

  private async evaluated(
    input: SpecificationInput,
    overrides: readonly Override[],
    basisId: string | null,
    db: Database,
  ): Promise<RevisionContent> {
    const { context, evaluation } = await this.evaluations.evaluateForStore(input, db);
    const cautions = [...evaluation.cautions, ...overrideCautions(overrides)];
    return { input, overrides, basisId, context, evaluation: { ...evaluation, cautions } satisfies Evaluation };
  }
}

/** Projects for which a person holds one of the roles. */
function projectsOf({ grants }: SignedIn, roles: readonly Role[]): 'all' | string[] {
  const ids = grants.filter(({ role }) => roles.includes(role)).map(({ projectId }) => projectId);
  return ids.includes(null) ? 'all' : ids.filter((id) => id !== null);
}

function contentOf({ input, overrides, basis, context, evaluation }: StoredRevision): RevisionContent {
  return { input, overrides: sorted(overrides), basisId: basis?.id ?? null, context, evaluation };
}

/** What the trail tells of a save: what a person changed, and what came out in one line. */
function trailOf(title: string, { input, overrides, basisId, evaluation }: RevisionContent) {
  return {
    title,
    input,
    overrides: Object.fromEntries(overrides.map(({ path, reason }) => [path, reason || '(no reason)'])),
    basisId,
    units: evaluation.string?.units ?? null,
  };
}

/** A save may change what was looked up alone, such as a catalogue unit in a newer version. */
const atLeastOne = (paths: string[]): string[] => (paths.length > 0 ? paths : ['context']);

function sorted(overrides: readonly Override[]): Override[] {
  return [...overrides].sort((one, other) => (one.path < other.path ? -1 : 1));
}
