import { alreadyExists, type DomainError } from './domain-error';

/** Rules that the database states, by the name of the constraint, in the user's terms. */
const CONSTRAINTS: Record<string, { path: string; message: string }> = {
  users_email_key: { path: 'email', message: 'E-mail address: an account with this address exists already' },
  projects_code_key: { path: 'code', message: 'Code: a project with this code exists already' },
  specifications_project_id_number_key: {
    path: 'number',
    message: 'Number: a specification with this number exists already in this project',
  },
};

export function domainErrorOfConstraint(exception: unknown): DomainError | null {
  const known = isUniqueViolation(exception) && exception.constraint ? CONSTRAINTS[exception.constraint] : undefined;
  return known ? alreadyExists(known.path, known.message) : null;
}

export function isUniqueViolation(exception: unknown): exception is { code: '23505'; constraint?: string } {
  return (exception as { code?: unknown } | null)?.code === '23505';
}
