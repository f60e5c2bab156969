import type { User } from '@bellgap/common/api';

export type Grant = User['grants'][number];

export function standingOf(user: User): string {
  if (!user.active) return 'deactivated';
  return user.hasPassword ? 'active' : 'invited, no password yet';
}

/** Today's date where the reader is, YYYY-MM-DD. */
export function today(): string {
  const now = new Date();
  return [now.getFullYear(), String(now.getMonth() + 1).padStart(2, '0'), String(now.getDate()).padStart(2, '0')].join(
    '-',
  );
}

export function grantStanding({ validFrom, validTo }: Grant, on: string): 'in force' | 'to come' | 'ended' {
  if (validTo !== null && validTo < on) return 'ended';
  return validFrom > on ? 'to come' : 'in force';
}

export function grantsInForce(user: User): Grant[] {
  const on = today();
  return user.grants.filter((grant) => grantStanding(grant, on) === 'in force');
}
