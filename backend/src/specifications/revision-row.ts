import type {
  DesignBasis,
  Evaluation,
  EvaluationContext,
  RevisionState,
  SpecificationInput,
} from '@bellgap/common/api';
import type { Knex } from 'knex';
import type { Override } from './inheritance';

/** A revision with what stands around it, as it is stored; names of people, no rights. */
export interface StoredRevision {
  id: string;
  specificationId: string;
  projectId: string;
  projectCode: string;
  projectTitle: string;
  siteTimeZone: string;
  paper: 'A4' | 'Letter';
  number: string;
  title: string;
  kind: 'line' | 'bay';
  label: string;
  state: RevisionState;
  input: SpecificationInput;
  overrides: Override[];
  basis: DesignBasis | null;
  newestBasisRevision: number | null;
  context: EvaluationContext;
  evaluation: Evaluation;
  lockVersion: number;
  savedAt: Date;
  savedBy: string | null;
  createdAt: Date;
  draftedBy: string | null;
  lastSheet: StoredSheet | null;
}

/** The last sheet drawn of a revision, without its bytes. */
export interface StoredSheet {
  id: string;
  drawnAt: Date;
  drawnBy: string | null;
  pages: number;
  sha256: string;
}

export interface RevisionRow {
  id: string;
  specification_id: string;
  project_id: string;
  project_code: string;
  project_title: string;
  site_time_zone: string;
  paper: 'A4' | 'Letter';
  number: string;
  title: string;
  kind: 'line' | 'bay';
  label: string;
  state: RevisionState;
  input: SpecificationInput;
  overrides: Record<string, string>;
  context: EvaluationContext;
  evaluation: Evaluation;
  lock_version: number;
  saved_at: Date;
  saved_by_name: string | null;
  created_at: Date;
  drafted_by_name: string | null;
  basis_id: string | null;
  basis_number: string;
  basis_revision: number;
  basis_basis: string;
  basis_system: DesignBasis['system'];
  basis_rules: DesignBasis['rules'];
  basis_note: string;
  basis_created_at: Date;
  basis_created_by_name: string | null;
  newest_basis_revision: number | null;
  sheet_id: string | null;
  sheet_drawn_at: Date;
  sheet_drawn_by_name: string | null;
  sheet_pages: number;
  sheet_sha256: string;
}

export function revisionColumns(db: Knex) {
  return [
    'r.id',
    'r.specification_id',
    's.project_id',
    'p.code as project_code',
    'p.title as project_title',
    'p.site_time_zone',
    'p.paper',
    's.number',
    'r.title',
    's.kind',
    'r.label',
    'r.state',
    'r.input',
    'r.overrides',
    'r.context',
    'r.evaluation',
    'r.lock_version',
    'r.saved_at',
    'saver.name as saved_by_name',
    'r.created_at',
    'drafter.name as drafted_by_name',
    'b.id as basis_id',
    'b.number as basis_number',
    'b.revision as basis_revision',
    'b.basis as basis_basis',
    'b.system as basis_system',
    'b.rules as basis_rules',
    'b.note as basis_note',
    'b.created_at as basis_created_at',
    'basis_author.name as basis_created_by_name',
    'sheet.id as sheet_id',
    'sheet.drawn_at as sheet_drawn_at',
    'sheet_author.name as sheet_drawn_by_name',
    'sheet.pages as sheet_pages',
    'sheet.file_sha256 as sheet_sha256',
    newestBasisRevision(db),
  ];
}

/** Number of the newest revision of the design basis of the project `s.project_id`. */
export function newestBasisRevision(db: Knex): Knex.Raw {
  return db.raw(
    '(select max(n.revision) from design_bases as n where n.project_id = s.project_id) as newest_basis_revision',
  );
}

/** The newest revision of the basis where it is newer than the one that is pinned, else null. */
export function newerBasisRevision(pinned: number | null, newest: number | null): number | null {
  return newest !== null && newest > (pinned ?? 0) ? newest : null;
}

export function toStoredRevision(row: RevisionRow): StoredRevision {
  return {
    id: row.id,
    specificationId: row.specification_id,
    projectId: row.project_id,
    projectCode: row.project_code,
    projectTitle: row.project_title,
    siteTimeZone: row.site_time_zone,
    paper: row.paper,
    number: row.number,
    title: row.title,
    kind: row.kind,
    label: row.label,
    state: row.state,
    input: row.input,
    overrides: Object.entries(row.overrides).map(([path, reason]) => ({ path, reason })),
    basis: row.basis_id === null ? null : toBasis(row, row.basis_id),
    newestBasisRevision: row.newest_basis_revision,
    context: row.context,
    evaluation: row.evaluation,
    lockVersion: row.lock_version,
    savedAt: row.saved_at,
    savedBy: row.saved_by_name,
    createdAt: row.created_at,
    draftedBy: row.drafted_by_name,
    lastSheet:
      row.sheet_id === null
        ? null
        : {
            id: row.sheet_id,
            drawnAt: row.sheet_drawn_at,
            drawnBy: row.sheet_drawn_by_name,
            pages: row.sheet_pages,
            sha256: row.sheet_sha256,
          },
  };
}

function toBasis(row: RevisionRow, id: string): DesignBasis {
  return {
    id,
    number: row.basis_number,
    revision: row.basis_revision,
    basis: row.basis_basis,
    system: row.basis_system,
    rules: row.basis_rules,
    note: row.basis_note,
    createdAt: row.basis_created_at.toISOString(),
    createdBy: row.basis_created_by_name,
  };
}
