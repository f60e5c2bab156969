import { alreadyExists, forbidden, wrongState, type DomainError } from './domain-error';

/** Rules that the database states, by the name of the constraint, in the user's terms. */
const CONSTRAINTS: Record<string, { path: string; message: string }> = {
  users_email_key: { path: 'email', message: 'E-mail address: an account with this address exists already' },
  projects_code_key: { path: 'code', message: 'Code: a project with this code exists already' },
  specifications_project_id_number_key: {
    path: 'number',
    message: 'Number: a specification with this number exists already in this project',
  },
};

const OWN_WORK =
  'Nobody checks or approves what he has worked on himself: author, checker and approver are three people.';
const GONE_ON = 'Somebody has gone on with this revision in the meantime; open it again.';

/** Rules of the way from draft to issued: the last word where two act at once. */
const REFUSALS: Record<string, () => DomainError> = {
  revisions_own_work: () => forbidden(OWN_WORK),
  revisions_three_people_check: () => forbidden(OWN_WORK),
  design_basis_moves_order: () => wrongState(GONE_ON),
  design_basis_moves_own_work: () => forbidden(OWN_WORK),
  revisions_content_kept: () => wrongState('The content of a revision changes only while it is a draft.'),
  revisions_state_order: () => wrongState(GONE_ON),
  revisions_issued_kept: () => wrongState(GONE_ON),
  revisions_in_work_key: () => wrongState('A revision of this specification is in work already.'),
  revisions_in_force_key: () => wrongState('A revision of this specification is in force already.'),
  revisions_specification_id_label_key: () => wrongState('This label has been given to another revision meanwhile.'),
  revision_labels_pkey: () => wrongState('This label has been given to another revision meanwhile.'),
  submissions_revision_id_label_key: () => wrongState(GONE_ON),
  check_records_submission_id_checker_id_key: () => wrongState('You have entered your own figures already.'),
  check_records_kept: () => wrongState('A decided check, and the figures that a checker entered, stay as they are.'),
  review_remarks_kept: () => wrongState('This remark is closed already.'),
};

export function domainErrorOfConstraint(exception: unknown): DomainError | null {
  const refusal = isRefusal(exception) ? REFUSALS[exception.constraint] : undefined;
  if (refusal) return refusal();
  const known = isUniqueViolation(exception) && exception.constraint ? CONSTRAINTS[exception.constraint] : undefined;
  return known ? alreadyExists(known.path, known.message) : null;
}

export function isUniqueViolation(exception: unknown): exception is { code: '23505'; constraint?: string } {
  return (exception as { code?: unknown } | null)?.code === '23505';
}

function isRefusal(exception: unknown): exception is { constraint: string } {
  const { code, constraint } = (exception ?? {}) as { code?: unknown; constraint?: unknown };
  return (code === '23505' || code === '23514') && typeof constraint === 'string';
}
