import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { Project, QueryOf, SpecificationInput, contract } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';
import { likePattern, listPage, type Page } from '../platform/list';
import { knownProjects, mayReadDrafts, mayWriteDrafts, type SignedIn } from '../platform/person';

interface Row {
  id: string;
  code: string;
  title: string;
  kind: Project['kind'];
  site_time_zone: string;
  paper: Project['paper'];
  description: string;
  lock_version: number;
  updated_at: Date;
  updated_by: string | null;
  basis_number: string | null;
  basis_revision: number | null;
  basis_system: SpecificationInput['system'];
  specification_count: number;
  issued_count: number;
}

const SORTS = {
  code: { column: 'p.code', type: 'text' },
  title: { column: 'p.title', type: 'text' },
  updatedAt: { column: 'p.updated_at', type: 'timestamptz' },
} as const;

const BASIS_IN_FORCE = `left join lateral (
  select b.number, b.revision, b.system from design_bases b
  where b.project_id = p.id and b.revision = basis_in_force(p.id)
) basis on true`;

const COUNTS = [
  '(select count(*) from specifications s where s.project_id = p.id) as specification_count',
  `(select count(*) from specifications s where s.project_id = p.id and exists (
    select 1 from revisions r where r.specification_id = s.id and r.state in ('issued', 'superseded', 'withdrawn')
  )) as issued_count`,
];

/** Projects as a person may see them: with their basis, their drafts and his rights, or without. */
@Injectable()
export class ProjectsListQuery {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  list(person: SignedIn, asked: QueryOf<typeof contract.projects>): Promise<Page<Project>> {
    const query = this.select(this.knex, person);
    if (asked.kind) query.where('p.kind', asked.kind);
    if (asked.search) {
      const pattern = likePattern(asked.search);
      query.where((either) => either.whereILike('p.code', pattern).orWhereILike('p.title', pattern));
    }
    return listPage({
      query,
      knex: this.knex,
      asked,
      sorts: SORTS,
      defaultSort: 'code',
      idColumn: 'p.id',
      toItem: (row: Row) => toProject(row, person),
    });
  }

  async find(person: SignedIn, code: string, db: Knex = this.knex): Promise<Project | null> {
    const [row] = (await this.select(db, person).where('p.code', code)) as Row[];
    return row ? toProject(row, person) : null;
  }

  private select(db: Knex, person: SignedIn): Knex.QueryBuilder {
    const query = db('projects as p')
      .leftJoin('users as by', 'by.id', 'p.updated_by')
      .joinRaw(BASIS_IN_FORCE)
      .select(
        'p.id',
        'p.code',
        'p.title',
        'p.kind',
        'p.site_time_zone',
        'p.paper',
        'p.description',
        'p.lock_version',
        'p.updated_at',
        'by.name as updated_by',
        'basis.number as basis_number',
        'basis.revision as basis_revision',
        'basis.system as basis_system',
        ...COUNTS.map((sql) => db.raw(sql)),
      );
    const known = knownProjects(person);
    return known === 'all' ? query : query.whereIn('p.id', known);
  }
}

function toProject(row: Row, person: SignedIn): Project {
  const drafts = mayReadDrafts(person, row.id);
  const basis = drafts ? row : null;
  return {
    id: row.id,
    code: row.code,
    title: row.title,
    kind: row.kind,
    siteTimeZone: row.site_time_zone,
    paper: row.paper,
    description: row.description,
    lockVersion: row.lock_version,
    updatedAt: row.updated_at.toISOString(),
    updatedBy: row.updated_by,
    specificationCount: drafts ? row.specification_count : row.issued_count,
    nominalVoltageKv: basis?.basis_system?.nominalVoltageKv ?? null,
    highestVoltageKv: basis?.basis_system?.highestVoltageKv ?? null,
    basisNumber: basis?.basis_number ?? null,
    basisRevision: basis?.basis_revision ?? null,
    mayEdit: mayWriteDrafts(person, row.id),
  };
}
