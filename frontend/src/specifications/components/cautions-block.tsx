import type { Evaluation, Severity } from '@bellgap/common/api';
import { STANDING_CAUTIONS } from '@bellgap/common/schemas';
import { CautionList, SEVERITY_ORDER } from '../../ui/caution';
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

const PARTS: Record<string, string> = {
  string: 'String',
  clearances: 'Clearances',
  clearance: 'Clearances',
  mechanical: 'Mechanical loads',
  towerHead: 'Tower head and swing',
  midSpan: 'Spacing at mid span',
  bay: 'Substation bay',
  system: 'System',
  site: 'Site',
};

const DETAILS: Record<string, string> = {
  voltageSharing: 'voltage along the string',
  pollution: 'pollution',
  lightning: 'lightning',
  switching: 'switching',
  'power-frequency': 'power frequency, wet',
  minimum: 'minimum count',
  extraUnits: 'extra units',
  arcingDevices: 'arcing devices',
  stringLengthWithFittings: 'length with fittings',
  overvoltages: 'overvoltages',
  safetySource: 'distances for people',
};

function partWords(part: string): string {
  const [head = '', ...rest] = part.split('.');
  const detail = rest.map(
    (name) =>
      DETAILS[name] ??
      name
        .replace(/([A-Z])/g, ' $1')
        .replaceAll('-', ' ')
        .toLowerCase(),
  );
  return [PARTS[head] ?? head, ...detail].join(', ');
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
