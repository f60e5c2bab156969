import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { Project } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';

/** A project by itself, as other features need it. */
export interface ProjectRecord {
  id: string;
  code: string;
  title: string;
  kind: Project['kind'];
  siteTimeZone: string;
  paper: Project['paper'];
  description: string;
  lockVersion: number;
}

export type ProjectContent = Pick<ProjectRecord, 'title' | 'kind' | 'siteTimeZone' | 'paper' | 'description'>;

interface ProjectRow {
  id: string;
  code: string;
  title: string;
  kind: Project['kind'];
  site_time_zone: string;
  paper: Project['paper'];
  description: string;
  lock_version: number;
}

const COLUMNS = [
  'p.id',
  'p.code',
  'p.title',
  'p.kind',
  'p.site_time_zone',
  'p.paper',
  'p.description',
  'p.lock_version',
];

@Injectable()
export class ProjectsRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  async findByCode(code: string, db: Knex = this.knex, { forUpdate = false } = {}): Promise<ProjectRecord | null> {
    const query = db('projects as p').where('p.code', code).select(COLUMNS);
    if (forUpdate) query.forUpdate();
    const [row] = (await query) as ProjectRow[];
    return row ? toProject(row) : null;
  }

  async insert(project: ProjectContent & { code: string; by: string; at: Date }, db: Knex): Promise<string> {
    const { code, by, at } = project;
    const [row] = (await db('projects').insert(
      { code, ...toColumns(project), created_by: by, created_at: at, updated_by: by, updated_at: at },
      ['id'],
    )) as { id: string }[];
    return row!.id;
  }

  async update(id: string, project: ProjectContent & { by: string; at: Date }, db: Knex): Promise<void> {
    await db('projects')
      .where({ id })
      .update({
        ...toColumns(project),
        updated_by: project.by,
        updated_at: project.at,
        lock_version: db.raw('lock_version + 1'),
      });
  }
}

function toProject(row: ProjectRow): ProjectRecord {
  return {
    id: row.id,
    code: row.code,
    title: row.title,
    kind: row.kind,
    siteTimeZone: row.site_time_zone,
    paper: row.paper,
    description: row.description,
    lockVersion: row.lock_version,
  };
}

function toColumns({ title, kind, siteTimeZone, paper, description }: ProjectContent) {
  return { title, kind, site_time_zone: siteTimeZone, paper, description };
}
