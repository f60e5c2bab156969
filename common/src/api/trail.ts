import { fieldOf } from '../schemas/fields';

/** The words of everything that the trail tells of: what was done, to what kind of record, and in which field. */

export const ACTION_LABELS: Record<string, string> = {
  'session.began': 'Signed in',
  'session.ended': 'Signed out',
  'user.created': 'Invited a new person',
  'user.changed': 'Changed a person',
  'user.invited': 'Gave a new invitation',
  'user.administrator-invited': 'Invited an administrator by command',
  'user.password-changed': 'Changed the own password',
  'grant.given': 'Gave a role',
  'grant.ended': 'Ended a role',
  'company-settings.set': 'Set the company settings',
  'table.confirmed': 'Confirmed a table or formula by the print',
  'table.disputed': 'Recorded that the print differs',
  'project.created': 'Began a project',
  'project.changed': 'Changed a project',
  'design-basis.revised': 'Revised the design basis',
  'basis.submitted': 'Submitted the design basis for check',
  'basis.checked': 'Passed the check of the design basis',
  'basis.returned': 'Returned the design basis to the engineer',
  'basis.issued': 'Approved and issued the design basis',
  'basis.superseded': 'Design basis superseded by its successor',
  'basis.withdrawn': 'Withdrew the design basis',
  'specification.created': 'Began a specification',
  'revision.saved': 'Saved a draft',
  'revision.started': 'Began the next revision',
  'revision.submitted': 'Submitted for check',
  'revision.recalled': 'Took a submission back',
  'revision.checked': 'Passed the check',
  'revision.returned': 'Returned to the engineer by the checker',
  'revision.refused': 'Returned to the engineer by the approver',
  'check.begun': 'Entered the own figures of a check',
  'check.saved': 'Went on with a check',
  'remark.raised': 'Raised a remark',
  'remark.answered': 'Answered a remark',
  'remark.closed': 'Closed a remark',
  'revision.issued': 'Approved and issued',
  'revision.superseded': 'Superseded by its successor',
  'revision.withdrawn': 'Withdrew an issued sheet',
  'revision-note.written': 'Wrote a note',
  'revision-note.removed': 'Took a note away',
  'sheet.drawn': 'Drew the sheet',
};

export const actionLabel = (action: string): string => ACTION_LABELS[action] ?? inWords(action);

export const RECORD_LABELS: Record<string, string> = {
  session: 'Session',
  user: 'Person',
  'company-settings': 'Company settings',
  table: 'Table or formula',
  project: 'Project',
  'design-basis': 'Design basis',
  revision: 'Specification',
  'revision-note': 'Note',
  'review-remark': 'Remark',
  sheet: 'Sheet',
};

export const recordLabel = (entity: string): string => RECORD_LABELS[entity] ?? inWords(entity);

/** Records about people: administrators only, also where a project is named in them. */
export const PEOPLE_RECORDS: readonly string[] = ['session', 'user'];

/** Fields of the trail that are no inputs of a specification. */
export const TRAIL_FIELD_LABELS: Record<string, string> = {
  title: 'Title',
  number: 'Number',
  label: 'Revision',
  state: 'State',
  units: 'Units',
  basisId: 'Design basis taken',
  basisRevision: 'Design basis, revision',
  code: 'Code',
  siteTimeZone: 'Site time zone',
  paper: 'Paper',
  description: 'Description',
  sha256: 'File hash',
  text: 'Text',
  figures: 'Figures',
  outcome: 'Outcome',
  dueOn: 'Wanted by',
  contentCode: 'Content code',
  verdict: 'Verdict',
  verdictNote: 'Note to the verdict',
  differenceReason: 'Reason for the difference',
  independent: 'Independence declared',
  ownUnits: 'Own count',
  ownUnitsCard: 'Rule for the count',
  ownClearanceMm: 'Own clearance to earth',
  ownClearanceCard: 'Rule for the clearance',
  ownNote: 'How the own figures were reached',
  ticks: 'Inputs seen',
  checklist: 'Checklist',
  path: 'Field',
  answer: 'Answer',
  closed: 'Closed',
  edition: 'Edition',
  page: 'Page',
  on: 'On',
  name: 'Name',
  email: 'E-mail address',
  active: 'Account active',
  role: 'Role',
  projectCode: 'Project',
  checkCategory: 'Check category',
  validFrom: 'Valid from',
  validTo: 'Valid to',
  grantId: 'Grant',
  successor: 'Successor',
  concessions: 'Acceptances and concessions',
};

const INPUT = 'input.';
const OVERRIDES = 'overrides.';
const TICKS = 'ticks.';
const CHECKLIST_POINTS = 'checklist.';

/** The words of a path such as "input.site.altitudeM", "overrides.system.highestVoltageKv" or "title". */
export function trailFieldLabel(path: string): string {
  if (path.startsWith(OVERRIDES))
    return `Reason of the override, ${lowered(trailFieldLabel(path.slice(OVERRIDES.length)))}`;
  if (path.startsWith(TICKS)) return `Input seen, ${lowered(trailFieldLabel(path.slice(TICKS.length)))}`;
  if (path.startsWith(CHECKLIST_POINTS)) {
    return `Checklist, ${lowered(inWords(path.slice(CHECKLIST_POINTS.length)))}`;
  }
  const own = TRAIL_FIELD_LABELS[path];
  if (own !== undefined) return own;
  const field = path.startsWith(INPUT) ? path.slice(INPUT.length) : path;
  const rows = [...field.matchAll(/\.(\d+)(?=\.|$)/g)].map(([, row]) => Number(row) + 1);
  const label = fieldOf(field.replace(/\.(\d+)(?=\.|$)/g, '[$1]'))?.label ?? inWords(field);
  return rows.length === 0 ? label : `${label}, row ${rows.join('.')}`;
}

/** The input field that a path of the trail names, without the row of a list; null where it names none. */
export function inputFieldOf(path: string): string | null {
  const field = path.replace(/^(input|overrides)\./, '').replace(/\.\d+(?=\.|$)/g, '');
  return fieldOf(field) ? field : null;
}

const lowered = (label: string): string => label.charAt(0).toLowerCase() + label.slice(1);

/** "revision-note.written" and "crestFactor" as words, for what has none of its own. */
function inWords(name: string): string {
  const words = name
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .replace(/[-_.]/g, ' ')
    .toLowerCase()
    .trim();
  return words.charAt(0).toUpperCase() + words.slice(1);
}
