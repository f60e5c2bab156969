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
  draftedById: string;
  /** Letters and number that the revision has had, in order. */
  labels: string[];
  derivedFrom: { id: string; label: string } | null;
  /** Who has changed the content, the first first, with his last change: when, and in which field. */
  authors: { id: string; name: string; at: Date; path: string }[];
  submitted: {
    id: string;
    by: string;
    byId: string;
    at: Date;
    label: string;
    dueOn: string | null;
    checkCategory: number;
    note: string;
  } | null;
  /** Checkers who have entered their own figures for this submission. */
  ownFiguresBy: string[];
  checked: { by: string; byId: string; at: Date } | null;
  approved: { by: string; byId: string; at: Date } | null;
  returned: { at: Date; note: string } | null;
  contentCode: string | null;
  openRemarks: number;
  issuedSheetId: string | null;
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
  drafted_by: string;
  labels: string[];
  derived_from: string | null;
  derived_from_label: string;
  authors: { id: string; name: string; at: string; path: string }[];
  submission: {
    id: string;
    by: string;
    by_id: string;
    at: string;
    label: string;
    due_on: string | null;
    check_category: number;
    note: string;
    own_figures_by: string[];
  } | null;
  checked_by: string | null;
  checked_by_name: string;
  checked_at: Date;
  approved_by: string | null;
  approved_by_name: string;
  issued_at: Date;
  returned_at: Date | null;
  return_note: string;
  content_code: string | null;
  open_remarks: number;
  issued_sheet_id: string | null;
  basis_id: string | null;
  basis_number: string;
  basis_revision: number;
  basis_basis: string;
  basis_system: DesignBasis['system'];
  basis_rules: DesignBasis['rules'];
  basis_worksheet: DesignBasis['worksheet'];
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
    'r.drafted_by',
    'r.derived_from',
    'r.checked_by',
    'r.checked_at',
    'r.approved_by',
    'r.issued_at',
    'r.returned_at',
    'r.return_note',
    'r.content_code',
    'checker.name as checked_by_name',
    'approver.name as approved_by_name',
    'issued_sheet.id as issued_sheet_id',
    ...workflowColumns(db),
    'b.id as basis_id',
    'b.number as basis_number',
    'b.revision as basis_revision',
    'b.basis as basis_basis',
    'b.system as basis_system',
    'b.rules as basis_rules',
    'b.worksheet as basis_worksheet',
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

/** What stands in tables of its own and is needed whole: few rows each. */
function workflowColumns(db: Knex): Knex.Raw[] {
  return [
    `array(select l.label from revision_labels as l where l.revision_id = r.id order by l.given_at, l.label) as labels`,
    `(select parent.label from revisions as parent where parent.id = r.derived_from) as derived_from_label`,
    `(select coalesce(json_agg(json_build_object('id', u.id, 'name', u.name, 'at', c.at, 'path', c.path)
        order by c.first), '[]')
      from (select distinct on (changed_by) changed_by, at, paths[1] as path,
          min(id) over (partition by changed_by) as first
        from revision_changes where revision_id = r.id order by changed_by, id desc) as c
      join users as u on u.id = c.changed_by) as authors`,
    `(select json_build_object('id', m.id, 'by', u.name, 'by_id', m.submitted_by, 'at', m.submitted_at,
        'label', m.label, 'due_on', m.due_on, 'check_category', m.check_category, 'note', m.note, 'own_figures_by',
        array(select k.checker_id from check_records as k where k.submission_id = m.id))
      from submissions as m join users as u on u.id = m.submitted_by
      where m.revision_id = r.id and r.state <> 'draft'
      order by m.submitted_at desc limit 1) as submission`,
    `(select count(*)::integer from review_remarks as m where m.revision_id = r.id and m.closed_at is null) as open_remarks`,
  ].map((column) => db.raw(column));
}

/** The revision of the design basis in force in the project `s.project_id`: the issued one, else the newest. */
export function newestBasisRevision(db: Knex): Knex.Raw {
  return db.raw('basis_in_force(s.project_id) as newest_basis_revision');
}

/** The revision of the basis in force where it is newer than the one that is pinned, else null. */
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
    draftedById: row.drafted_by,
    labels: row.labels,
    derivedFrom: row.derived_from === null ? null : { id: row.derived_from, label: row.derived_from_label },
    authors: row.authors.map((author) => ({ ...author, at: new Date(author.at) })),
    submitted: row.submission && {
      id: row.submission.id,
      by: row.submission.by,
      byId: row.submission.by_id,
      at: new Date(row.submission.at),
      label: row.submission.label,
      dueOn: row.submission.due_on,
      checkCategory: row.submission.check_category,
      note: row.submission.note,
    },
    ownFiguresBy: row.submission?.own_figures_by ?? [],
    checked: row.checked_by === null ? null : { by: row.checked_by_name, byId: row.checked_by, at: row.checked_at },
    approved: row.approved_by === null ? null : { by: row.approved_by_name, byId: row.approved_by, at: row.issued_at },
    returned: row.returned_at === null ? null : { at: row.returned_at, note: row.return_note },
    contentCode: row.content_code,
    openRemarks: row.open_remarks,
    issuedSheetId: row.issued_sheet_id,
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
    worksheet: row.basis_worksheet,
    note: row.basis_note,
    createdAt: row.basis_created_at.toISOString(),
    createdBy: row.basis_created_by_name,
  };
}
