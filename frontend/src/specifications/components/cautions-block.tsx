import type { Evaluation, Severity } from '@bellgap/common/api';
import { STANDING_CAUTIONS } from '@bellgap/common/schemas';
import { CautionList, SEVERITY_ORDER } from '../../ui/caution';
import { partWords } from '../../ui/part-words';
import { LedgerBlock } from './ledger-rows';

/** What the answer warns of, the gravest first. */
export function CautionsBlock({ evaluation }: { evaluation: Evaluation }) {
  const { cautions } = evaluation;
  return (
    <LedgerBlock
      title="Cautions"
      aside={cautions.length === 0 ? undefined : countWords(cautions.map(({ severity }) => severity))}
    >
      {cautions.length === 0 ? (
        <p className="zone-note">None from the figures given. The standing cautions below hold all the same.</p>
      ) : (
        <CautionList cautions={cautions} />
      )}
    </LedgerBlock>
  );
}

const SINGULAR: Record<Severity, string> = {
  stop: 'stop',
  fail: 'fail',
  acceptance: 'acceptance',
  caution: 'caution',
  info: 'note',
};
const PLURAL: Record<Severity, string> = {
  stop: 'stops',
  fail: 'fails',
  acceptance: 'acceptances',
  caution: 'cautions',
  info: 'notes',
};

function countWords(severities: Severity[]): string {
  return SEVERITY_ORDER.map((severity) => [severity, severities.filter((one) => one === severity).length] as const)
    .filter(([, count]) => count > 0)
    .map(([severity, count]) => `${count} ${count === 1 ? SINGULAR[severity] : PLURAL[severity]}`)
    .join(', ');
}

/** What this answer does not cover, and why: never to be taken as passed. */
export function NotAssessedBlock({ evaluation }: { evaluation: Evaluation }) {
  if (evaluation.notAssessed.length === 0) return null;
  return (
    <LedgerBlock title="Not assessed" aside="not passed">
      <ul className="not-assessed">
        {evaluation.notAssessed.map(({ part, why }) => (
          <li key={part + why}>
            <b>{partWords(part)}</b> <span>{why}</span>
          </li>
        ))}
      </ul>
    </LedgerBlock>
  );
}

export function StandingCautions() {
  return (
    <details className="standing">
      <summary>Standing cautions</summary>
      <ol>
        {STANDING_CAUTIONS.map((text) => (
          <li key={text}>{text}</li>
        ))}
      </ol>
    </details>
  );
}
