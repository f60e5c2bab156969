import { SEVERITIES, type Caution, type Severity } from './model';

/** The worst kind of caution; null where there is nothing but notes. */
export function worstSeverity(cautions: readonly Pick<Caution, 'severity'>[]): Severity | null {
  let worst = 0;
  for (const { severity } of cautions) worst = Math.max(worst, SEVERITIES.indexOf(severity));
  return worst === 0 ? null : (SEVERITIES[worst] ?? null);
}
