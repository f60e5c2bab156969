import { Injectable } from '@nestjs/common';
import { DRAFT_READERS, type QueryOf, type TrailChange, type TrailEvent, type contract } from '@bellgap/common/api';
import { invalidAt, notFound } from '../platform/domain-error';
import { readLimit, type Page } from '../platform/list';
import { holdsRole, requireDraftReader, type SignedIn } from '../platform/person';
import { ProjectsService } from '../projects/projects.service';
import { endOfDay, startOfDay } from './day-bounds';
import { isOfField } from './field-match';
import { pageOf, readTrailCursor } from './trail-page';
import { TrailVeils, type Veil, type VeiledRecord } from './trail-veils';
import { TrailRepository, type Sight, type TrailFilters, type TrailRow } from './trail.repository';

type Asked = QueryOf<typeof contract.trail>;
type AskedOfFile = QueryOf<typeof contract.trailFile>;

const FILE_BATCH_ROWS = 1000;

/** Reading the trail: each sees of it what his grants let him see. */
@Injectable()
export class TrailService {
  constructor(
    private readonly trail: TrailRepository,
    private readonly projects: ProjectsService,
    private readonly veils: TrailVeils,
  ) {}

  async list(person: SignedIn, asked: Asked): Promise<Page<TrailEvent>> {
    return this.page(person, asked, await this.filters(person, asked));
  }

  /** One specification over all its revisions, with what belongs to them. */
  async ofSpecification(
    person: SignedIn,
    code: string,
    number: string,
    asked: QueryOf<typeof contract.specificationTrail>,
  ): Promise<Page<TrailEvent>> {
    return this.list(person, { ...asked, project: code, specification: number });
  }

  /** All that the filters leave, read as it is taken. */
  async everything(person: SignedIn, asked: AskedOfFile): Promise<AsyncIterable<TrailEvent>> {
    return this.read(person, asked, await this.filters(person, asked));
  }

  private async *read(person: SignedIn, asked: AskedOfFile, filters: TrailFilters): AsyncGenerator<TrailEvent> {
    let pastId: number | null = null;
    for (;;) {
      const place = { pastId, descending: asked.sort !== 'at' };
      const rows: TrailRow[] = await this.trail.rows(sightOf(person), filters, place, FILE_BATCH_ROWS);
      yield* await this.answers(person, rows, asked.path);
      if (rows.length < FILE_BATCH_ROWS) return;
      pastId = rows.at(-1)!.id;
    }
  }

  private async filters(person: SignedIn, asked: AskedOfFile): Promise<TrailFilters> {
    const { specification, project: code } = asked;
    if (!specification) return filtersOf(asked);
    if (!code) throw invalidAt('project', 'Project: is needed with the number of a specification');
    const project = await this.projects.known(person, code);
    requireDraftReader(person, project.id, 'specification');
    const recordIds = await this.trail.recordsOfSpecification(project.id, specification);
    if (!recordIds) throw notFound('specification');
    return { ...filtersOf(asked), recordIds };
  }

  private async page(
    person: SignedIn,
    asked: Omit<Asked, 'project'>,
    filters: TrailFilters,
  ): Promise<Page<TrailEvent>> {
    const limit = readLimit(asked.limit);
    const cursor = readTrailCursor(asked.cursor);
    const descending = (asked.sort !== 'at') !== (cursor?.back ?? false);
    const place = { pastId: cursor?.id ?? null, descending };
    const rows = await this.trail.rows(sightOf(person), filters, place, limit + 1);
    const { items, ...cursors } = pageOf(rows, limit, cursor);
    return { items: await this.answers(person, items, asked.path), ...cursors };
  }

  private async answers(person: SignedIn, rows: readonly TrailRow[], path: string | undefined): Promise<TrailEvent[]> {
    const veil = await this.veils.over(person, rows.map(recordOf));
    return rows.map((row) => answerOf(row, path, veil));
  }
}

const recordOf = (row: TrailRow): VeiledRecord => ({
  entity: row.entity,
  entityId: row.entity_id,
  revisionId: row.revision_id,
});

/** Administrators of the whole company see everything; others the records of projects whose drafts they may read. */
function sightOf(person: SignedIn): Sight {
  if (holdsRole(person, ['administrator'], null)) return 'everything';
  const ids = person.grants.filter(({ role }) => DRAFT_READERS.includes(role)).map(({ projectId }) => projectId);
  return { projects: ids.includes(null) ? 'all' : ids.filter((id) => id !== null) };
}

function filtersOf({
  entity,
  entityId,
  project,
  person,
  action,
  path,
  from,
  to,
  zone = 'UTC',
}: AskedOfFile): TrailFilters {
  return {
    entity,
    entityId,
    projectCode: project,
    person,
    action,
    path,
    atOrAfter: from ? startOfDay(from, zone) : undefined,
    before: to ? endOfDay(to, zone) : undefined,
  };
}

function answerOf(row: TrailRow, askedPath: string | undefined, veil: Veil): TrailEvent {
  const record = recordOf(row);
  const changes = Object.entries(row.changes)
    .filter(([path]) => !askedPath || isOfField(path, askedPath))
    .map(([path, { from = null, to = null }]): TrailChange =>
      veil(record, path)
        ? { path, from: null, to: null, hidden: true }
        : { path, from: from as object, to: to as object, hidden: false },
    );
  const { specification_number: number, revision_label: label } = row;
  return {
    id: row.id,
    at: row.at.toISOString(),
    actor: row.actor_id === null ? null : { id: row.actor_id, name: row.actor_name ?? '' },
    action: row.action,
    entity: row.entity,
    entityId: row.entity_id,
    projectCode: row.project_code,
    specification: number === null || label === null ? null : { number, label },
    personName: row.person_name,
    changes,
    reason: veil(record, 'reason') ? null : row.reason,
    seal: row.seal,
  };
}
